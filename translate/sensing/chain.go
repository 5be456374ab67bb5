package sensing

import (
	"fmt"
	"math"

	"makebreak/survey"
)

// Chain is a sensor with its front end and converter: temperature in, count out.
//
// An ideal converter of N bits reads floor(2^N · ratio), at most 2^N − 1, of
// its input as a share of its reference. So `count <= c` changes at the ratio
// (c + 1)/2^N. A digital sensor gives a signed 16-bit count, the whole number
// nearest to temperature in degC times counts_per_kelvin, which changes half a
// count below that number. For the kinds millivolt and current, read V or A
// wherever this package says degC or K.
type Chain struct {
	Sensor *survey.Sensor
	ADC    survey.ADC
	Curve  Curve
	Box    survey.Enclosure // where resistors and reference drift

	// A couple whose cold junction is measured: the error of that measurement in
	// K, where it is better known than the sheet says, and an error in counts of
	// the program's own table.
	JunctionError, Counts Contribution

	low, high float64 // believable temperatures, degC
	rising    bool    // the count rises with temperature
	front     frontEnd
}

// ErrNotFixed says that a count does not stand for one temperature.
type ErrNotFixed struct{ Why string }

func (e ErrNotFixed) Error() string { return "no fixed count for a temperature: " + e.Why }

// New builds the chain of a sensor. The errors name what is missing or does
// not work together; ErrNotFixed is returned for a thermocouple whose cold
// junction another sensor measures: see NewJunction.
func New(s *survey.Sensor, adc survey.ADC, box survey.Enclosure) (*Chain, error) {
	if s.ColdJunction.Set && isThermocouple(s.Kind.V) {
		return nil, ErrNotFixed{"the cold junction is measured by " + s.ColdJunction.V + ", so the count moves with it; let the amplifier compensate"}
	}
	return newChain(s, adc, box)
}

func newChain(s *survey.Sensor, adc survey.ADC, box survey.Enclosure) (*Chain, error) {
	if err := positive(s, adc); err != nil {
		return nil, err
	}
	c := &Chain{Sensor: s, ADC: adc, Box: box}
	var err error
	if c.Curve, err = curveOf(s); err != nil {
		return nil, err
	}
	if c.front, err = newFrontEnd(s, adc.Reference.V); err != nil {
		return nil, err
	}
	c.rising = c.coordinate(c.Curve.High) > c.coordinate(c.Curve.Low)
	c.low, c.high = c.Curve.Low, c.Curve.High
	if own, ok := usual[s.Kind.V]; ok {
		c.low, c.high = math.Max(c.low, own[0]), math.Min(c.high, own[1])
	}
	if s.Valid.Set {
		c.low, c.high = math.Max(s.Valid.V[0], c.Curve.Low), math.Min(s.Valid.V[1], c.Curve.High)
	}
	if !(c.low < c.high) {
		return nil, RangeError{c.Curve.Name, fmt.Sprintf("the believable range %.6g to %.6g", c.low, c.high), c.Curve.Low, c.Curve.High, "degC"}
	}
	if lo, hi := c.Believable(); lo >= hi {
		return nil, fmt.Errorf("between %.4g and %.4g degC the converter reads only %d to %d counts", c.low, c.high, lo, hi)
	}
	return c, nil
}

// positive refuses what would divide by nothing.
func positive(s *survey.Sensor, adc survey.ADC) error {
	for _, x := range []struct {
		name string
		f    survey.Field[float64]
	}{
		{"reference", adc.Reference}, {"r25", s.R25}, {"beta", s.Beta}, {"pull_up", s.PullUp}, {"pull_down", s.PullDown},
		{"excitation", s.Excitation}, {"current", s.Current}, {"gain", s.Gain}, {"full_scale", s.FullScale}, {"counts_per_kelvin", s.CountsPerKelvin},
	} {
		if x.f.Set && !(x.f.V > 0 && x.f.V <= math.MaxFloat64) {
			return fmt.Errorf("%s is %g: it must be more than nothing", x.name, x.f.V)
		}
	}
	if s.Kind.V == "digital" {
		return nil
	}
	if adc.Bits.V < 8 || adc.Bits.V > 16 {
		return fmt.Errorf("a converter of %d bits: 8 to 16 can be used", adc.Bits.V)
	}
	if !adc.Reference.Set {
		return fmt.Errorf("the reference of the converter is not stated")
	}
	return nil
}

// usual is the believable range of kinds whose curve reaches further than what
// is common practice for the part.
var usual = map[survey.SensorKind][2]float64{
	"ntc":     {-55, 150},
	"diode":   {-40, 125},
	"digital": {-55, 125},
}

// Signed reports whether the program receives the count as int16_t.
func (c *Chain) Signed() bool { return c.front.signed }

// Ratiometric reports whether the reference cancels.
func (c *Chain) Ratiometric() bool { return c.front.ratiometric }

// full is the number of counts of the converter.
func (c *Chain) full() float64 { return math.Ldexp(1, c.ADC.Bits.V) }

// Rising reports whether the count rises with temperature.
func (c *Chain) Rising() bool { return c.rising }

// coordinate is the temperature expressed in counts, not yet cut off, such that
// count ≥ k begins where the coordinate reaches k.
func (c *Chain) coordinate(t float64) float64 { return c.counts(c.Curve.at(t)) }

// counts is a quantity of the sensor in counts.
func (c *Chain) counts(q float64) float64 {
	share := c.front.share(q)
	if c.Signed() {
		return share + 0.5
	}
	return share * c.full()
}

// Ratio is the converter's input as a share of its reference at t degC, not cut
// off at 0 and 1; for a digital sensor it is the count before rounding.
func (c *Chain) Ratio(t float64) (float64, error) {
	q, err := c.Curve.At(t)
	if err != nil {
		return 0, err
	}
	return c.front.share(q), nil
}

// Count is what the converter reads at t degC.
func (c *Chain) Count(t float64) (int64, error) {
	q, err := c.Curve.At(t)
	if err != nil {
		return 0, err
	}
	return c.reading(c.counts(q)), nil
}

// reading is the count at a coordinate. One that is a whole number but for the
// last bits of the arithmetic counts as that number.
func (c *Chain) reading(x float64) int64 {
	if c.Signed() {
		return int64(math.Floor(x + 1e-9))
	}
	return c.cut(x + 1e-9)
}

// cut keeps a count within the converter.
func (c *Chain) cut(n float64) int64 {
	return int64(math.Max(0, math.Min(math.Floor(n), c.full()-1)))
}

// Temperature gives the temperatures in degC, lower first, that a count stands
// for, as far as the curve goes.
func (c *Chain) Temperature(count int64) (low, high float64) {
	low, high = c.edgeAt(count), c.edgeAt(count+1)
	return math.Min(low, high), math.Max(low, high)
}

// Valid is the believable range in degC.
func (c *Chain) Valid() (low, high float64) { return c.low, c.high }

// Believable gives the lowest and highest count that can be believed: the
// counts of the believable range, short of what the converter can make of an
// open or shorted circuit with its own errors of offset, gain and linearity.
// The counts 0 and 2^N − 1 are never believed of a thermometer. An input for V
// or A reads 0 in ordinary service, so 0 is believed there.
func (c *Chain) Believable() (low, high int64) {
	a, _ := c.Count(c.low)
	b, _ := c.Count(c.high)
	low, high = min(a, b), max(a, b)
	if c.Signed() {
		return max(low, -32767), min(high, 32766)
	}
	bottom, top := c.rails()
	return max(low, bottom), min(high, top)
}

// rails are the counts next to those that a failed circuit reads.
func (c *Chain) rails() (bottom, top int64) {
	dead := c.full() - 1 // what an open or shorted circuit reads at the upper end
	if end := math.Max(c.front.open, c.front.short); end > 0 && end < 1 {
		dead = float64(c.cut(end * c.full()))
	}
	slack := math.Abs(c.ADC.Offset.V) + math.Abs(c.ADC.INL.V)
	bottom = 1 + int64(math.Ceil(slack))
	top = int64(dead) - 1 - int64(math.Ceil(slack+math.Abs(c.ADC.Gain.V)*dead))
	if !isThermometer(c.Sensor.Kind.V) {
		bottom = 0
	}
	return bottom, top
}

// CountWidth is how many kelvins one count is at t degC.
func (c *Chain) CountWidth(t float64) float64 {
	const h = 0.01
	a, b := math.Max(t-h, c.Curve.Low), math.Min(t+h, c.Curve.High)
	return math.Abs((b - a) / (c.coordinate(b) - c.coordinate(a)))
}

// edgeAt is the temperature at which count ≥ k begins to hold, or ceases to.
func (c *Chain) edgeAt(k int64) float64 {
	return c.whereIs(float64(k), c.Curve.Low, c.Curve.High)
}
