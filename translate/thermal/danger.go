package thermal

import (
	"fmt"
	"math"
)

// Outcome says whether a temperature is reached.
type Outcome string

// Outcomes of a run towards a temperature.
const (
	Reached       Outcome = "reached"
	NeverReached  Outcome = "never_reached"
	NotDetermined Outcome = "not_determined"
)

// Reach is the time to a temperature.
type Reach struct {
	Outcome   Outcome
	Seconds   float64 // Reached: the time in s, 0 where it is there already
	AtLeast   float64 // NotDetermined: a time in s that it takes at least; 0 where no bound holds either
	SettlesAt float64 // degC, where it ends up; NaN where not determined
	Because   string  // the working, or why it is never reached or not determined
}

// TimeToDanger is how long the medium takes from one temperature to another
// with the load stuck: on, or off for a danger on that side. The medium is
// taken as moving at full rate from the first moment, without the dead time,
// which is the short side.
//
//	t = Tau · ln((settles − from) / (settles − danger))
//
// Water in a vented vessel does not pass VentedWater; set vented for it.
func (p Process) TimeToDanger(from, danger float64, loadOn, vented bool) (Reach, error) {
	if err := firstError(p.Validate(), finite("starting temperature", from), finite("danger", danger)); err != nil {
		return Reach{}, err
	}
	settles, side := p.Off, "off"
	if loadOn {
		settles, side = p.On, "on"
	}
	r := Reach{Outcome: Reached, SettlesAt: settles}
	if vented && settles > VentedWater {
		r.SettlesAt = VentedWater
	}
	rising := danger > from
	switch {
	case loadOn && p.Cooling() == rising && danger != from, !loadOn && p.Cooling() != rising && danger != from:
		r.Outcome, r.Because = NeverReached, fmt.Sprintf("load %s moves the medium away from %.4g degC, towards %.4g degC", side, danger, settles)
	case rising && r.SettlesAt <= danger, !rising && danger < from && settles >= danger:
		r.Outcome, r.Because = NeverReached, fmt.Sprintf("with the load %s the medium settles at %.4g degC", side, r.SettlesAt)
		if vented && rising && settles > danger {
			r.Because = fmt.Sprintf("water in a vented vessel does not pass %.0f degC; it boils there", VentedWater)
		}
	case danger == from:
		r.Because = "it is there already"
	default:
		r.Seconds = p.Tau * math.Log((settles-from)/(settles-danger))
		r.Because = fmt.Sprintf("%.6g s · ln((%.4g − %.4g)/(%.4g − %.4g))", p.Tau, settles, from, settles, danger)
	}
	return r, nil
}

// StraightLineToDanger is what can be said where it is not known where a stuck
// load settles. A first-order rise only slows down, so the straight line of
// the fastest rise measured from a temperature no higher than from is reached
// no later than the medium itself: the time is a lower bound under the load
// and the ambient of the measurement, and under no others.
//
// Rate is in K/s, above 0 for a rise, below 0 for a fall.
func StraightLineToDanger(rate, from, danger float64, vented bool) (Reach, error) {
	err := firstError(finite("fastest rise", rate), finite("starting temperature", from), finite("danger", danger))
	if err != nil {
		return Reach{}, err
	}
	r := Reach{Outcome: NotDetermined, SettlesAt: math.NaN()}
	distance := danger - from
	switch {
	case distance == 0:
		r.Outcome, r.Because = Reached, "it is there already"
	case vented && distance > 0 && danger >= VentedWater:
		r.Outcome, r.SettlesAt = NeverReached, VentedWater
		r.Because = fmt.Sprintf("water in a vented vessel does not pass %.0f degC; it boils there", VentedWater)
	case rate == 0 || (rate > 0) != (distance > 0):
		r.Because = "where a stuck load settles is not known, and no movement towards the danger was measured"
	default:
		r.AtLeast = distance / rate
		r.Because = fmt.Sprintf("where a stuck load settles is not known; on the straight line of the fastest measured rise, %.4g K/min, it takes %.4g s, and not less under the load and ambient of the measurement",
			60*rate, r.AtLeast)
	}
	return r, nil
}

// Rates are how fast the medium moves over a range of temperatures, as
// magnitudes in K/s.
type Rates struct {
	FastestOn, SlowestOn   float64 // load on
	FastestOff, SlowestOff float64 // load off
}

// Rates works out how fast the medium moves between two temperatures in degC.
// A rate is 0 where the range reaches the settling temperature.
func (p Process) Rates(low, high float64) (Rates, error) {
	err := firstError(p.Validate(), finite("low", low), finite("high", high))
	if err != nil {
		return Rates{}, err
	}
	at := func(settles float64) (fast, slow float64) {
		a, b := math.Abs(settles-low)/p.Tau, math.Abs(settles-high)/p.Tau
		if (settles-low)*(settles-high) <= 0 {
			return math.Max(a, b), 0
		}
		return math.Max(a, b), math.Min(a, b)
	}
	var r Rates
	r.FastestOn, r.SlowestOn = at(p.On)
	r.FastestOff, r.SlowestOff = at(p.Off)
	return r, nil
}

// Cut is a limit that cuts a load which has stuck on.
type Cut struct {
	Process Process
	Sensing Sensing // of the limit: its element's lag, and a filter where the limit is a program
	Trip    float64 // degC: breaks as the sensed temperature gets here
	From    float64 // degC of the medium, with the element settled on it, when the load goes on for good
	Vented  bool    // water in a vented vessel: the medium does not pass VentedWater
}

// Overshoot is what the medium does beyond the trip of a limit.
type Overshoot struct {
	Outcome   Outcome // NeverReached: the limit does not trip
	TripAfter float64 // s from the moment the medium began to move
	AtTrip    float64 // degC of the medium at the moment of the trip
	Peak      float64 // degC, furthest the medium goes
	PeakAfter float64 // s from the same moment
	Beyond    float64 // K, how far the peak is beyond the trip, 0 or more
	Bound     bool    // a straight-line bound, not the figure itself
	Because   string
}

// Overshoot follows the medium from Cut.From with the load on for good until
// the limit trips, and on through the dead time, in which the load still acts.
func (c Cut) Overshoot() (Overshoot, error) {
	s := c.Sensing
	s.Anticipator = Anticipator{}
	err := firstError(c.Process.Validate(), s.Validate(), finite("trip", c.Trip), finite("starting temperature", c.From))
	if err != nil {
		return Overshoot{}, err
	}
	p, sign := c.Process, 1.0
	if p.Cooling() {
		sign = -1
	}
	settles, trip, from := sign*p.On, sign*c.Trip, sign*c.From
	ceiling := math.Inf(1)
	if c.Vented && sign > 0 {
		ceiling = VentedWater
	}
	if math.Min(settles, ceiling) <= trip {
		why := fmt.Sprintf("the medium settles at %.4g degC and the limit trips at %.4g degC: it does not trip", sign*math.Min(settles, ceiling), c.Trip)
		return Overshoot{Outcome: NeverReached, Because: why}, nil
	}
	chain := newChain(p, s)
	start := settled(drive{medium: from})
	d := drive{medium: settles}
	course := newCourse(&chain, start, d, trip)
	after, found := course.first(true, 60*(p.Tau+s.Lag+s.Filter), 0)
	if !found {
		return Overshoot{Outcome: NeverReached, Because: "the sensed temperature does not get to the trip"}, nil
	}
	m := chain.advance(start, d, after)
	peak := chain.advance(m, d, p.Dead)
	o := Overshoot{
		Outcome: Reached, TripAfter: after, PeakAfter: after + p.Dead,
		AtTrip: sign * math.Min(m.stage[0], ceiling), Peak: sign * math.Min(peak.stage[0], ceiling),
	}
	o.Beyond = sign * (o.Peak - c.Trip)
	o.Because = fmt.Sprintf("trips after %.4g s with the medium at %.5g degC; the load acts for another %.4g s of dead time", after, o.AtTrip, p.Dead)
	if peak.stage[0] > ceiling {
		o.Because += fmt.Sprintf("; water in a vented vessel does not pass %.0f degC", VentedWater)
	}
	return o, nil
}

// OvershootOfRise bounds the overshoot where it is not known where the load
// settles: on the straight line of the fastest measured rise (K/s) the medium
// is ahead of a settled element by rate · lag, and the load acts for the dead
// time after the trip.
func OvershootOfRise(rate, lag, deadTime, trip float64, vented bool) (Overshoot, error) {
	err := firstError(finite("fastest rise", rate), notNegative("sensing lag", lag), notNegative("dead_time", deadTime), finite("trip", trip))
	if err != nil {
		return Overshoot{}, err
	}
	o := Overshoot{Outcome: NotDetermined, Bound: true, TripAfter: math.NaN(), PeakAfter: math.NaN(), AtTrip: trip + rate*lag, Peak: trip + rate*(lag+deadTime)}
	o.Because = fmt.Sprintf("at most, under the load and ambient of the measurement: %.4g K/min · (%.4g s lag + %.4g s dead time)", 60*rate, lag, deadTime)
	if vented && rate > 0 {
		o.AtTrip, o.Peak = math.Min(o.AtTrip, math.Max(trip, VentedWater)), math.Min(o.Peak, math.Max(trip, VentedWater))
	}
	o.Beyond = math.Abs(o.Peak - trip)
	return o, nil
}
