package sensing

import (
	"fmt"
	"math"

	"makebreak/survey"
)

// Dial is a set-point dial kept as a potentiometer on the converter's own
// reference, so that the reference cancels. A fixed resistor at either end of
// the track keeps the wiper off the rails by the dead zone: a reading in there
// is no setting but a broken wiper, track or wire.
//
//	reference ── end resistor ── track ── end resistor ── ground
//
// A resistor from the wiper to ground (Pull) takes an open wiper to count 0.
type Dial struct {
	Low, High   float64 // degC at the stops
	Bottom, Top int64   // counts at the stops with a track of its rated value
	FaultBelow  int64   // a count below this, or
	FaultAbove  int64   // above this, is a fault
	Dead        float64 // dead zone as a share of the reference
	full        float64
}

// WiperFault says that a count is no setting of the dial.
type WiperFault struct {
	Count, Low, High int64
}

func (e WiperFault) Error() string {
	return fmt.Sprintf("count %d is no setting of the dial, %d to %d: wiper, track or wire is broken", e.Count, e.Low, e.High)
}

// NewDial lays out a dial from stops[0] at the bottom to stops[1] degC at the
// top of the track; they may fall. dead is the dead zone at either end as a
// share of the reference, 0.02 to 0.2 (0.05 is common practice), and track the
// tolerance of the track's resistance, less than 1 (20 % is common practice).
// A reading counts as a fault from where the stop would lie with the largest
// track, less a third of the way to the rail.
func NewDial(stops [2]float64, adc survey.ADC, dead, track float64) (Dial, error) {
	switch {
	case stops[0] == stops[1] || math.IsNaN(stops[0]) || math.IsNaN(stops[1]):
		return Dial{}, fmt.Errorf("the stops of the dial, %g and %g degC, leave nothing to set", stops[0], stops[1])
	case !(dead >= 0.02 && dead <= 0.2):
		return Dial{}, fmt.Errorf("a dead zone of %g of the reference: 0.02 to 0.2 can be used", dead)
	case !(track >= 0 && track < 1):
		return Dial{}, fmt.Errorf("a track tolerance of %g: 0 to less than 1 can be used", track)
	case adc.Bits.V < 8 || adc.Bits.V > 16:
		return Dial{}, fmt.Errorf("a converter of %d bits: 8 to 16 can be used", adc.Bits.V)
	}
	d := Dial{Low: stops[0], High: stops[1], Dead: dead, full: math.Ldexp(1, adc.Bits.V)}
	d.Bottom, d.Top = int64(math.Round(dead*d.full)), int64(math.Round((1-dead)*d.full))-1
	// End resistors r of a track R are r/R = dead/(1 − 2·dead); with R too large
	// by track the stop lies at r/(R(1 + track) + 2r).
	r := EndResistor(1, dead)
	least := r / (1 + track + 2*r)
	d.FaultBelow = int64(math.Floor(least * d.full * 2 / 3))
	d.FaultAbove = int64(d.full) - 1 - d.FaultBelow
	return d, nil
}

// EndResistor is the resistor in ohm at either end of a track of the given ohm
// that makes a dead zone of the given share of the reference: dead/(1 − 2·dead)
// of the track.
func EndResistor(track, dead float64) float64 { return track * dead / (1 - 2*dead) }

// SetPoint is the set point in degC of a count. Between a stop and the fault
// limit it is that of the stop: the stops are limits in the program too. The
// error is a WiperFault.
func (d Dial) SetPoint(count int64) (float64, error) {
	if count < d.FaultBelow || count > d.FaultAbove {
		return 0, WiperFault{count, d.FaultBelow, d.FaultAbove}
	}
	at := float64(min(max(count, d.Bottom), d.Top)-d.Bottom) / float64(d.Top-d.Bottom)
	return d.Low + at*(d.High-d.Low), nil
}

// Mark is the count nearest to a mark of the dial in degC, for one between the
// stops.
func (d Dial) Mark(t float64) (int64, error) {
	at := (t - d.Low) / (d.High - d.Low)
	if !(at >= 0 && at <= 1) {
		return 0, RangeError{"the dial", fmt.Sprintf("%.6g degC", t), math.Min(d.Low, d.High), math.Max(d.Low, d.High), "degC"}
	}
	return d.Bottom + int64(math.Round(at*float64(d.Top-d.Bottom))), nil
}

// Width is how many K the set point moves with one count.
func (d Dial) Width() float64 { return math.Abs(d.High-d.Low) / float64(d.Top-d.Bottom) }

// Table is the dial as a conversion table with values in whole units of K: one
// straight piece that stays at the stops' values beyond them.
func (d Dial) Table(unit float64) (Table, error) {
	low, high := math.Round(d.Low/unit), math.Round(d.High/unit)
	if !(unit > 0) || math.Abs(low) > math.MaxInt16 || math.Abs(high) > math.MaxInt16 {
		return Table{}, fmt.Errorf("%g to %g degC in steps of %g do not fit 16 bits", d.Low, d.High, unit)
	}
	t := Table{X: []uint16{uint16(d.Bottom), uint16(d.Top)}, Y: []int16{int16(low), int16(high)}}
	return t, t.Fits32()
}

// PullError is how far a resistor of pull ohm from the wiper to ground takes
// the reading down at the worst, as a share of the reference, on a track of
// track ohm between the rails: the divider's own resistance a(1 − a)·track
// against it, at the wiper position a that is worst, about 2/3 (4/27 of
// track/pull where pull is much the larger).
func PullError(track, pull float64) float64 {
	worst := 0.0
	for i := 1; i < 1000; i++ {
		a := float64(i) / 1000
		source := a * (1 - a) * track
		worst = math.Max(worst, a*source/(source+pull))
	}
	return worst
}
