package sensing

import (
	"errors"
	"fmt"
	"math"

	"makebreak/survey"
)

// Junction is a thermocouple behind an amplifier that does not compensate the
// cold junction: another sensor measures it. The amplifier sees E(t) − E(cold),
// so that a raw count stands for a temperature only together with that of the
// cold junction. With Shift added to it, it is a count of Compensated.
type Junction struct {
	Compensated *Chain // the same couple and amplifier, cold junction at 0 degC
}

// NewJunction builds the chain of a thermocouple with a cold junction that is
// measured.
func NewJunction(s *survey.Sensor, adc survey.ADC, box survey.Enclosure) (*Junction, error) {
	if !isThermocouple(s.Kind.V) {
		return nil, fmt.Errorf("%s is no thermocouple", s.ID.V)
	}
	c, err := newChain(s, adc, box)
	if err != nil {
		return nil, err
	}
	return &Junction{c}, nil
}

// Shift is what has to be added to a raw count at a cold junction of cold degC,
// in counts: the E(cold) that the couple does not give.
func (j *Junction) Shift(cold float64) (float64, error) {
	e, err := j.Compensated.Curve.At(cold)
	if err != nil {
		return 0, err
	}
	c := j.Compensated
	return e * c.gain() / c.ADC.Reference.V * c.full(), nil
}

func (c *Chain) gain() float64 {
	if c.Sensor.Gain.Set {
		return c.Sensor.Gain.V
	}
	return 1
}

// Count is the raw count with the couple at t and its cold junction at cold
// degC.
func (j *Junction) Count(t, cold float64) (int64, error) {
	q, err := j.Compensated.Curve.At(t)
	if err != nil {
		return 0, err
	}
	shift, err := j.Shift(cold)
	if err != nil {
		return 0, err
	}
	return j.Compensated.cut(j.Compensated.counts(q) - shift + 1e-9), nil
}

// Temperature gives the temperatures in degC, lower first, that a raw count
// stands for at a cold junction of cold degC.
func (j *Junction) Temperature(count int64, cold float64) (low, high float64, err error) {
	shift, err := j.Shift(cold)
	if err != nil {
		return 0, 0, err
	}
	c := j.Compensated
	x := float64(count) + shift
	a, b := c.whereIs(x, c.Curve.Low, c.Curve.High), c.whereIs(x+1, c.Curve.Low, c.Curve.High)
	return math.Min(a, b), math.Max(a, b), nil
}

// Moves is by how many K the switching temperature of a fixed raw count, right
// for t with the cold junction at low degC, has moved with it at high degC.
func (j *Junction) Moves(t, low, high float64) (float64, error) {
	var e [3]float64
	for i, x := range []float64{t, low, high} {
		q, err := j.Compensated.Curve.At(x)
		if err != nil {
			return 0, err
		}
		e[i] = q
	}
	moved, err := j.Compensated.Curve.Inverse(e[0] - e[1] + e[2])
	return moved - t, err
}

// Believable gives the lowest and highest raw count that can be believed with
// a cold junction between two temperatures in degC: what the couple gives over
// its believable range, short of the converter's ends.
func (j *Junction) Believable(coldFrom, coldTo float64) (low, high int64, err error) {
	c := j.Compensated
	least, errA := j.Shift(coldFrom)
	most, errB := j.Shift(coldTo)
	if err := errors.Join(errA, errB); err != nil {
		return 0, 0, err
	}
	bottom, top := c.rails()
	low = max(bottom, int64(math.Floor(c.coordinate(c.low)-most)))
	high = min(top, int64(math.Ceil(c.coordinate(c.high)-least)))
	if low >= high {
		return 0, 0, fmt.Errorf("with the cold junction at %.4g to %.4g degC the converter reads only %d to %d counts", coldFrom, coldTo, low, high)
	}
	return low, high, nil
}
