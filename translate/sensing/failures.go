package sensing

import (
	"fmt"
	"math"
)

// Failure is what a broken circuit makes the converter read.
type Failure struct {
	What  string // open, short, wet, short in the cable, reversed, wire off, short to the supply
	Known bool   // the count can be said
	Count int64
	// Inside says that the reading may lie in the believable range: the program
	// cannot tell it from a temperature. It is true where nothing is known.
	Inside  bool
	Reads   string // hot, cold, or "" where neither
	Working string
}

// Failures lists how the circuit of a sensor fails and what is then read, with
// an ideal converter.
func (c *Chain) Failures() []Failure {
	switch kind := c.Sensor.Kind.V; {
	case c.Signed():
		return []Failure{c.unknown("wire off", "the last or any number may stand in the register: only its age tells (stale_after)")}
	case isThermocouple(kind):
		return c.thermocoupleFailures()
	case kind == "linear":
		return []Failure{
			c.reads("wire off", 0, "no current through the shunt, or an input pulled down, 0 V; an input that nothing pulls floats"),
			c.reads("short to the supply", 1, "the input at the reference"),
		}
	case !isThermometer(kind):
		return []Failure{
			c.unknown("open", "an open input floats, unless a resistor pulls it to one end"),
			c.reads("short", 0, "reads nothing, like a cold flame or a load that is off"),
		}
	}
	failures := []Failure{
		c.reads("open", c.front.open, "the sensor's resistance without end"),
		c.reads("short", c.front.short, "the sensor's terminals joined"),
	}
	if !c.resistive() {
		return failures
	}
	wet := c.unknown("wet", "water across the terminals or in the head lowers the resistance, by how much nobody knows")
	wet.Reads = "hot"
	if c.Curve.Rising {
		wet.Reads = "cold"
	}
	return append(failures, wet)
}

func (c *Chain) resistive() bool { return c.Curve.Unit == "ohm" }

// WithLeak is the temperature in degC that a resistance sensor at t degC shows
// with a leak of ohm across it, such as water in its head.
func (c *Chain) WithLeak(t, ohm float64) (float64, error) {
	if !c.resistive() || !(ohm > 0) {
		return 0, fmt.Errorf("a leak of %g ohm across a sensor in %s is not determined", ohm, c.Curve.Unit)
	}
	q, err := c.Curve.At(t)
	if err != nil {
		return 0, err
	}
	return c.Curve.Inverse(q * ohm / (q + ohm))
}

func (c *Chain) unknown(what, why string) Failure {
	return Failure{What: what, Inside: true, Working: "not determined: " + why}
}

// reads works out the failure that gives a share of the reference.
func (c *Chain) reads(what string, share float64, why string) Failure {
	if math.IsNaN(share) {
		return c.unknown(what, why)
	}
	f := Failure{What: what, Known: true, Count: c.cut(math.Min(share*c.full(), c.full()))}
	low, high := c.Believable()
	f.Inside = f.Count >= low && f.Count <= high
	place := "outside"
	switch {
	case f.Inside:
		place = "INSIDE"
	case (f.Count > high) == c.rising:
		f.Reads = "hot"
	default:
		f.Reads = "cold"
	}
	f.Working = fmt.Sprintf("%s: count %d, %s the believable %d to %d", why, f.Count, place, low, high)
	return f
}

// thermocoupleFailures are those of a thermocouple behind an amplifier that
// compensates its cold junction.
func (c *Chain) thermocoupleFailures() []Failure {
	s := c.Sensor
	open := c.unknown("open", "what the amplifier does with an open input is not stated (open_reads), or it floats")
	switch s.OpenReads.V {
	case "high":
		open = c.reads("open", 1, "the amplifier goes to its upper end")
	case "low":
		open = c.reads("open", 0, "the amplifier goes to its lower end")
	}
	room := [2]float64{5, 45}
	from := "taken as 5 to 45 degC"
	if c.Box.Temperature.Set {
		room, from = c.Box.Temperature.V, "as the enclosure"
	}
	short := c.unknown("short in the cable", "reads the temperature of the place where the wires touch")
	short.Inside = room[1] >= c.low && room[0] <= c.high
	short.Working += fmt.Sprintf("; surroundings of %.4g to %.4g degC (%s) lie %s the believable range", room[0], room[1], from,
		map[bool]string{true: "INSIDE", false: "outside"}[short.Inside])
	reversed := c.unknown("reversed", "the reading falls as the junction warms, from the temperature of its terminals down")
	reversed.Reads = "cold"
	return []Failure{open, short, reversed}
}
