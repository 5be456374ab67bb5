package thermal

import (
	"errors"
	"fmt"
	"math"
)

// The steady cycle once more, in the plainest way: both states propagated
// exactly, the threshold found by bisection, the return map iterated. It
// shares no code with Loop.Steady and is here to check it.

// plainSwitch is a two-position control: it switches the load on at OnAt and off at
// OffAt, in degC, by an element that lags the medium by Lag s (first order).
type plainSwitch struct {
	OnAt, OffAt float64
	Lag         float64
}

// plainNoCycle says why there is no steady cycle.
type plainNoCycle struct{ Why string }

func (e plainNoCycle) Error() string { return "no cycle: " + e.Why }

// plainSteady works out the periodic cycle. The error is an plainNoCycle where the
// process never reaches one of the thresholds.
func plainSteady(p Process, s plainSwitch) (Cycle, error) {
	if p.On < p.Off { // cooling is heating upside down
		c, err := plainSteady(Process{-p.On, -p.Off, p.Tau, p.Dead}, plainSwitch{-s.OnAt, -s.OffAt, s.Lag})
		c.High, c.Low, c.Mean = -c.Low, -c.High, -c.Mean
		return c, err
	}
	switch {
	case !(p.Tau > 0) || p.Dead < 0 || s.Lag < 0:
		return Cycle{}, plainNoCycle{"time constant, dead time and lag must be known and not negative"}
	case s.OnAt > s.OffAt:
		return Cycle{}, plainNoCycle{"it would switch on above where it switches off"}
	case p.On <= s.OffAt:
		return Cycle{}, plainNoCycle{fmt.Sprintf("with the load on it settles at %.4g degC and never reaches %.4g degC", p.On, s.OffAt)}
	case p.Off >= s.OnAt:
		return Cycle{}, plainNoCycle{fmt.Sprintf("with the load off it settles at %.4g degC and never falls to %.4g degC", p.Off, s.OnAt)}
	case p.Dead == 0 && s.Lag == 0 && s.OnAt == s.OffAt:
		return Cycle{}, plainNoCycle{"without dead time, lag and differential it would switch for ever"}
	}
	if s.Lag == 0 {
		return closed(p, s), nil
	}
	return propagated(p, s)
}

// closed is the cycle without a sensing lag, in closed form: after a command
// the medium goes on for the dead time, so that with g = e^(−L/τ)
//
//	high = On + (OffAt − On)·g        low = Off + (OnAt − Off)·g
//	on = L + τ·ln((On − low)/(On − OffAt))
//	off = L + τ·ln((high − Off)/(OnAt − Off))
//
// derived from the first-order equation between events; in Wang, Hang and Zou
// (1997) for a symmetric relay.
func closed(p Process, s plainSwitch) Cycle {
	g := math.Exp(-p.Dead / p.Tau)
	c := Cycle{High: p.On + (s.OffAt-p.On)*g, Low: p.Off + (s.OnAt-p.Off)*g}
	c.On = p.Dead + p.Tau*math.Log((p.On-c.Low)/(p.On-s.OffAt))
	c.Off = p.Dead + p.Tau*math.Log((c.High-p.Off)/(s.OnAt-p.Off))
	c.Mean = p.Off + (p.On-p.Off)*c.Duty()
	return c
}

// state is the medium and the element at one moment.
type state struct{ medium, element float64 }

// after propagates a state exactly for t s towards a settling temperature: the
// medium by its time constant, the element behind it by its lag.
func (x state) after(t, settles, tau, lag float64) state {
	a := x.medium - settles
	m, e := math.Exp(-t/tau), math.Exp(-t/lag)
	b := x.element - settles
	if math.Abs(tau-lag) < 1e-9*tau {
		return state{settles + a*m, settles + (b+a*t/lag)*e}
	}
	k := a * tau / (tau - lag)
	return state{settles + a*m, settles + k*m + (b-k)*e}
}

// reach is how long it takes the element to come to a threshold towards which
// it is driven, and the state there. The element may first go the other way
// for a while; it crosses the threshold once.
func (x state) reach(threshold, settles, tau, lag float64) (float64, state) {
	up := settles > threshold
	past := func(t float64) bool { return (x.after(t, settles, tau, lag).element >= threshold) == up }
	low, high := 0.0, tau
	for !past(high) {
		low, high = high, 2*high
	}
	for i := 0; i < 200 && high-low > 1e-12*high; i++ {
		mid := (low + high) / 2
		if mid == low || mid == high {
			break
		}
		if past(mid) {
			high = mid
		} else {
			low = mid
		}
	}
	return high, x.after(high, settles, tau, lag)
}

// rounds is how many cycles the return map may take to settle.
const rounds = 2000

var errUnsettled = errors.New("the cycle does not settle")

// propagated finds the cycle with a sensing lag: both states are propagated
// exactly between events, the threshold is found by bisection, and the return
// map from one switching-on to the next is iterated to its fixed point.
func propagated(p Process, s plainSwitch) (Cycle, error) {
	x := state{s.OnAt, s.OnAt} // at the moment of switching on
	var c Cycle
	for i := 0; i < rounds; i++ {
		before := x
		x, c = around(x, p, s)
		if math.Abs(x.medium-before.medium)+math.Abs(x.element-before.element) < 1e-11*(math.Abs(x.medium)+1) {
			c.Mean = p.Off + (p.On-p.Off)*c.Duty()
			return c, nil
		}
	}
	return Cycle{}, errUnsettled
}

// around goes once through a cycle from switching on.
func around(x state, p Process, s plainSwitch) (state, Cycle) {
	var c Cycle
	half := func(x state, from, to, threshold float64) (state, float64, float64) {
		turn := x.after(p.Dead, from, p.Tau, s.Lag) // the old course goes on for the dead time
		t, end := turn.reach(threshold, to, p.Tau, s.Lag)
		return end, p.Dead + t, turn.medium
	}
	x, c.On, c.Low = half(x, p.Off, p.On, s.OffAt)
	x, c.Off, c.High = half(x, p.On, p.Off, s.OnAt)
	return x, c
}
