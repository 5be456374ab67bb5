package sensing

import (
	"fmt"
	"math"
)

// Contribution is one cause of error at one temperature.
type Contribution struct {
	Name    string
	Kelvin  float64 // ±
	Share   float64 // of the worst case
	Working string
}

// Budget is how far the reading may be from the truth at one temperature.
type Budget struct {
	At        float64 // degC
	Lines     []Contribution
	WorstCase float64  // K: all at their worst, the same way
	RSS       float64  // K: root sum of squares, for independent causes
	Missing   []string // causes for which the sheet gives no figure
}

// resistorDrift is the temperature coefficient taken for a divider's resistor,
// common practice for metal film.
const resistorDrift = 50e-6 // /K

// leadMismatch is the part of one lead's resistance by which the leads of a
// three-wire connection are taken to differ; common practice.
const leadMismatch = 0.05

// tally is a budget being drawn up.
type tally struct {
	Budget
	q     float64 // quantity of the sensor
	slope float64 // its change with temperature, without sign, per K
	width float64 // K a count
}

func (b *tally) add(name string, kelvin float64, format string, args ...any) {
	if kelvin > 0 {
		b.Lines = append(b.Lines, Contribution{Name: name, Kelvin: kelvin, Working: fmt.Sprintf(format, args...)})
	}
}

// Budget adds up every cause of error at t degC, to the first order: each is
// brought to K by the slope of the curve, or the width of a count, there. The
// error is a RangeError where t is outside the curve.
func (c *Chain) Budget(t float64) (Budget, error) {
	q, err := c.Curve.At(t)
	if err != nil {
		return Budget{}, err
	}
	b := &tally{Budget: Budget{At: t}, q: q, slope: math.Abs(c.Curve.slope(t)), width: c.CountWidth(t)}
	c.sensorError(b)
	c.selfHeating(b)
	c.junctionError(b)
	c.dividerError(b)
	c.leadError(b)
	c.supplyError(b)
	c.converterError(b)
	b.sum()
	return b.Budget, nil
}

func (b *tally) sum() {
	squares := 0.0
	for _, l := range b.Lines {
		b.WorstCase += l.Kelvin
		squares += l.Kelvin * l.Kelvin
	}
	b.RSS = math.Sqrt(squares)
	for i := range b.Lines {
		b.Lines[i].Share = b.Lines[i].Kelvin / b.WorstCase
	}
}

func (c *Chain) sensorError(b *tally) {
	s := c.Sensor
	switch kind := s.Kind.V; {
	case kind == "ntc":
		b.add("sensor: resistance at 25 degC", s.R25Tolerance.V*b.q/b.slope, "%.3g %% of %.4g ohm over %.4g ohm/K", 100*s.R25Tolerance.V, b.q, b.slope)
		if !s.Beta.Set {
			b.missing("tolerance of the thermistor's curve away from 25 degC")
			return
		}
		d := s.Beta.V * s.BetaTolerance.V * math.Abs(1/(b.At+Kelvin)-1/298.15) * b.q
		b.add("sensor: beta", d/b.slope, "%.3g %% of beta, away from 25 degC: %.4g ohm over %.4g ohm/K", 100*s.BetaTolerance.V, d, b.slope)
	case isPlatinum(kind), isThermocouple(kind):
		b.byClass(string(kind), s.Class.V, s.Class.Set)
	case s.Error.Set:
		b.add("sensor: stated error", s.Error.V, "as stated")
	default:
		b.missing("error of the sensor")
	}
}

// selfHeating is what the measuring current warms the sensor by: I²R over the
// dissipation constant.
func (c *Chain) selfHeating(b *tally) {
	s := c.Sensor
	power := c.Power(b.q)
	switch {
	case power == 0:
	case s.SelfHeating.Set && s.SelfHeating.V > 0:
		b.add("self-heating", power/s.SelfHeating.V, "%.3g mW over %.3g mW/K", 1000*power, 1000*s.SelfHeating.V)
	default:
		b.missing("self-heating by %.2g mW (no dissipation constant)", 1000*power)
	}
}

// Power is what a sensor of q ohm dissipates in its circuit, W; 0 for a sensor
// that is no resistor.
func (c *Chain) Power(q float64) float64 {
	s := c.Sensor
	supply := c.ADC.Reference.V
	if s.Excitation.Set {
		supply = s.Excitation.V
	}
	i := 0.0
	switch {
	case s.PullUp.Set:
		i = supply / (q + s.PullUp.V)
	case s.PullDown.Set:
		i = supply / (q + s.PullDown.V)
	case isPlatinum(s.Kind.V):
		i = s.Current.V
	}
	return i * i * q
}

// junctionError is the error of the cold junction: E(Tcj) is added before the
// curve is read, so it counts by the slopes there and here.
func (c *Chain) junctionError(b *tally) {
	s := c.Sensor
	if !isThermocouple(s.Kind.V) {
		return
	}
	at25 := c.Curve.slope(25)
	kelvin, from := s.ColdJunctionError.V, ""
	if c.JunctionError.Kelvin > 0 {
		kelvin, from = c.JunctionError.Kelvin, " ("+c.JunctionError.Working+")"
	}
	b.add("cold junction", kelvin*at25/b.slope, "%.3g K at the junction%s × %.3g µV/K there over %.3g µV/K here", kelvin, from, 1e6*at25, 1e6*b.slope)
	b.add(c.Counts.Name, c.Counts.Kelvin*b.width, "%.3g counts of %.3g K: %s", c.Counts.Kelvin, b.width, c.Counts.Working)
}

// dividerError is that of the divider's resistor: one wrong by a part p looks
// like a sensor wrong by the same part.
func (c *Chain) dividerError(b *tally) {
	s := c.Sensor
	pull := s.PullUp.V
	if s.PullDown.Set {
		pull = s.PullDown.V
	}
	if pull == 0 {
		return
	}
	b.add("divider resistor", s.PullTolerance.V*b.q/b.slope, "%.3g %% of the ratio to %.4g ohm", 100*s.PullTolerance.V, pull)
	r := c.Box.Temperature
	if !r.Set {
		b.missing("drift of the divider's resistor (temperatures of the enclosure not stated)")
		return
	}
	away := math.Max(math.Abs(r.V[1]-25), math.Abs(r.V[0]-25))
	b.add("divider resistor: drift", resistorDrift*away*b.q/b.slope, "50 ppm/K (common practice) over %.3g K of enclosure", away)
}

// leadError is that of the leads of a resistance sensor: both with two wires,
// what they differ by with three, nothing with four.
func (c *Chain) leadError(b *tally) {
	s := c.Sensor
	if s.Lead.V <= 0 || s.Wires.V == 4 {
		return
	}
	if s.Wires.V == 3 {
		b.add("leads", leadMismatch*s.Lead.V/b.slope, "three wires: 5 %% of %.3g ohm (common practice) over %.4g ohm/K", s.Lead.V, b.slope)
		return
	}
	b.add("leads", 2*s.Lead.V/b.slope, "two wires of %.3g ohm over %.4g ohm/K", s.Lead.V, b.slope)
}

// supplyError is that of reference, excitation, measuring current and
// amplifier. A ratiometric divider has none: its supply is the reference.
func (c *Chain) supplyError(b *tally) {
	s := c.Sensor
	if s.Gain.Set && isThermometer(s.Kind.V) {
		b.missing("gain and offset errors of the amplifier")
	}
	if c.Signed() || c.Ratiometric() {
		return
	}
	counts := c.front.share(b.q) * c.full()
	b.add("reference", math.Abs(counts)*c.ADC.ReferenceTolerance.V*b.width, "%.3g %% of %.4g counts; it does not cancel", 100*c.ADC.ReferenceTolerance.V, counts)
	switch {
	case s.Excitation.Set:
		b.add("excitation", counts*s.ExcitationTol.V*b.width, "%.3g %% of %.4g counts", 100*s.ExcitationTol.V, counts)
	case isPlatinum(s.Kind.V):
		b.missing("error of the measuring current")
	}
}

func (c *Chain) converterError(b *tally) {
	if c.Signed() {
		b.add("half a count", 0.5*b.width, "half of %.3g K", b.width)
		return
	}
	a, counts := c.ADC, c.coordinate(b.At)
	offset, gain, inl := math.Abs(a.Offset.V), math.Abs(a.Gain.V), math.Abs(a.INL.V)
	b.add("converter: offset", offset*b.width, "%.3g counts of %.3g K", offset, b.width)
	b.add("converter: gain", gain*math.Abs(counts)*b.width, "%.3g %% of %.4g counts", 100*gain, counts)
	b.add("converter: non-linearity", inl*b.width, "%.3g counts of %.3g K", inl, b.width)
	b.add("converter: half a count", 0.5*b.width, "half of %.3g K", b.width)
}
