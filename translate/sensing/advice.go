package sensing

import (
	"fmt"
	"math"
	"sort"
)

// e96 are the values of the E96 series between 1 and 10 (IEC 60063).
var e96 = []float64{
	1.00, 1.02, 1.05, 1.07, 1.10, 1.13, 1.15, 1.18, 1.21, 1.24, 1.27, 1.30, 1.33, 1.37, 1.40, 1.43, 1.47, 1.50, 1.54, 1.58, 1.62, 1.65, 1.69, 1.74,
	1.78, 1.82, 1.87, 1.91, 1.96, 2.00, 2.05, 2.10, 2.15, 2.21, 2.26, 2.32, 2.37, 2.43, 2.49, 2.55, 2.61, 2.67, 2.74, 2.80, 2.87, 2.94, 3.01, 3.09,
	3.16, 3.24, 3.32, 3.40, 3.48, 3.57, 3.65, 3.74, 3.83, 3.92, 4.02, 4.12, 4.22, 4.32, 4.42, 4.53, 4.64, 4.75, 4.87, 4.99, 5.11, 5.23, 5.36, 5.49,
	5.62, 5.76, 5.90, 6.04, 6.19, 6.34, 6.49, 6.65, 6.81, 6.98, 7.15, 7.32, 7.50, 7.68, 7.87, 8.06, 8.25, 8.45, 8.66, 8.87, 9.09, 9.31, 9.53, 9.76,
}

// E96 gives the value of the series that is nearest to a resistance in ohm, by
// ratio.
func E96(ohm float64) float64 {
	decade := math.Pow(10, math.Floor(math.Log10(ohm)))
	m := ohm / decade
	i := sort.SearchFloat64s(e96, m)
	below, above := e96[max(i-1, 0)], 10.0
	if i < len(e96) {
		above = e96[i]
	}
	if m/below < above/m {
		above = below
	}
	return above * decade
}

// bestPull is the divider resistor that gives the finest count at t degC: the
// slope of q/(q+R) over temperature is greatest where R equals the sensor's
// own resistance q there, whichever side the sensor is on. The value is the
// nearest of the E96 series. ok is false where there is no divider.
func (c *Chain) bestPull(t float64) (ohm float64, ok bool) {
	if !c.hasDivider() {
		return 0, false
	}
	q, err := c.Curve.At(t)
	if err != nil {
		return 0, false
	}
	return E96(q), true
}

func (c *Chain) hasDivider() bool { return c.Sensor.PullUp.Set || c.Sensor.PullDown.Set }

// fewestBits is how many bits a converter needs at least, 8 to 16, for one count
// to be no more than a tenth of the differential in K at t degC (common
// practice), with the front end as it is. ok is false where 16 are not enough.
func (c *Chain) fewestBits(t, differential float64) (bits int, ok bool) {
	if c.Signed() {
		return 0, false
	}
	width := c.CountWidth(t) * c.full() // K for the whole range, were it one count
	for bits = 8; bits <= 16; bits++ {
		if width/math.Ldexp(1, bits) <= differential/10 {
			return bits, true
		}
	}
	return 0, false
}

// DividerAdvice compares the divider that is there with the one advised.
type DividerAdvice struct {
	At           float64 // degC
	Present      float64 // ohm
	Advised      float64 // ohm, of the E96 series
	WidthPresent float64 // K a count at At
	WidthAdvised float64
	PowerPresent float64 // W in the sensor
	PowerAdvised float64
	Working      string
}

// Divider advises on the divider's resistor for a set point of t degC. ok is
// false where there is no divider or t lies outside the curve.
func (c *Chain) Divider(t float64) (a DividerAdvice, ok bool) {
	best, ok := c.bestPull(t)
	if !ok {
		return a, false
	}
	other := *c.Sensor
	field := &other.PullUp
	if other.PullDown.Set {
		field = &other.PullDown
	}
	a.At, a.Present, a.Advised = t, field.V, best
	field.V = best
	changed, err := newChain(&other, c.ADC, c.Box)
	if err != nil {
		return a, false
	}
	q := c.Curve.at(t)
	a.WidthPresent, a.WidthAdvised = c.CountWidth(t), changed.CountWidth(t)
	a.PowerPresent, a.PowerAdvised = c.Power(q), changed.Power(q)
	a.Working = fmt.Sprintf("the sensor has %.4g ohm at %.4g degC, nearest of E96 %.4g ohm: one count %.3g K, %.3g mW in the sensor; kept at %.4g ohm: %.3g K, %.3g mW",
		q, t, best, a.WidthAdvised, 1000*a.PowerAdvised, a.Present, a.WidthPresent, 1000*a.PowerPresent)
	return a, true
}

// BitsAdvice compares the converter that is there with the least one that would do.
type BitsAdvice struct {
	Present int
	Fewest  int     // 8 to 16; 0 where 16 are not enough
	Enough  bool    // the present one will do
	Width   float64 // K a count as it is
	Wanted  float64 // K a count at most
	Working string
}

// Bits advises on the converter for a differential in K at a set point of t
// degC: one count is to be at most a tenth of it (common practice). ok is false
// for a digital sensor.
func (c *Chain) Bits(t, differential float64) (a BitsAdvice, ok bool) {
	if c.Signed() || !(differential > 0) {
		return a, false
	}
	a = BitsAdvice{Present: c.ADC.Bits.V, Width: c.CountWidth(t), Wanted: differential / 10}
	a.Fewest, _ = c.fewestBits(t, differential)
	a.Enough = a.Width <= a.Wanted
	need := fmt.Sprintf("%d bits are the fewest that do", a.Fewest)
	if a.Fewest == 0 {
		need = "not even 16 bits do with this front end"
	}
	keep := "the present one does"
	if !a.Enough {
		keep = fmt.Sprintf("kept, one count is 1/%.3g of the differential", differential/a.Width)
	}
	a.Working = fmt.Sprintf("one count at most %.3g K, a tenth of %.4g K (common practice): %s; with %d bits it is %.3g K, %s", a.Wanted, differential, need, a.Present, a.Width, keep)
	return a, true
}
