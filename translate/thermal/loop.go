package thermal

import (
	"fmt"
	"math"
)

// Figures are those of the steady cycle of a two-position control, from make
// to make. On and Off are times of the command; High, Low and Mean are those
// of the medium.
type Figures struct {
	Cycle

	// What the contact acts on: the element with its anticipator, behind the
	// filter. Without lags and anticipator it is the medium.
	SensedHigh, SensedLow float64 // degC

	OperationsPerYear float64 // make and break together are one; 365 days of 24 h

	HeldOn, HeldOff bool // a minimum time, not the threshold, ended the phase
	InFlight        int  // most switchings on their way through the dead time at once
	ClosedForm      bool // no root had to be found
}

// Reason says why there is no steady cycle.
type Reason string

// Reasons for which there is no cycle.
const (
	NeverBreaks   Reason = "never_breaks"   // the load cannot bring the sensed temperature to break
	NeverMakes    Reason = "never_makes"    // the sensed temperature does not come back to make
	NoInterval    Reason = "no_interval"    // equal edges and nothing that delays: it would switch without end
	TooManyWaves  Reason = "too_many_waves" // it switches again and again within one dead time, and never repeats
	Alternates    Reason = "alternates"     // a minimum time is held in some cycles and not in others: two to four different ones in turn
	DoesNotSettle Reason = "does_not_settle"
)

// NoCycle is the answer where the control does not cycle steadily. It is an
// error, so that a caller cannot take empty Figures for an answer.
type NoCycle struct {
	Reason    Reason
	StaysOn   bool    // the load stays on for good
	SettlesAt float64 // degC, where the medium ends up, for NeverBreaks and NeverMakes
	Turns     []Cycle // Alternates: the cycles in turn, times only (s)

	// OperationsPerYear is the mean where the contact works all the same:
	// Alternates, DoesNotSettle, TooManyWaves; 0 otherwise.
	OperationsPerYear float64
	Working           string
}

func (n *NoCycle) Error() string { return "no steady cycle: " + n.Working }

// Steady works out the steady cycle. It returns *InputError for figures that
// cannot be, and *NoCycle where there is none.
//
// Without lags, anticipator and minimum times the closed form of the relay on
// a first-order process with dead time holds (the same as Tu1, Tu2, Au, Ad of
// Q. G. Wang, C. C. Hang and B. Zou, 1997). Otherwise the on and off times are
// found for which the exact periodic state meets both thresholds, and the
// cycle is then run through once, event by event, to see that no threshold is
// crossed before its time. Where that fails the loop is run from rest, event
// by event, until it repeats.
func (l Loop) Steady() (Figures, error) {
	if err := l.Validate(); err != nil {
		return Figures{}, err
	}
	r := newRelay(l)
	if no := r.impossible(); no != nil {
		return Figures{}, no
	}
	if r.plain() {
		on, off := r.closedForm(r.dead)
		if on >= r.minOn && off >= r.minOff {
			return r.plainFigures(on, off), nil
		}
	}
	general := r // the closed form above needs no memory of its own
	p, no := general.periodic()
	if no != nil {
		return Figures{}, no
	}
	return p.figures(), nil
}

// plain reports whether the sensed temperature is the medium itself.
func (r *relay) plain() bool { return r.chain.n == 1 && r.chain.warmerRate == 0 }

// real turns a temperature of the medium back.
func (r *relay) real(t float64) float64 { return r.sign * t }

// sensedReal turns a sensed temperature back.
func (r *relay) sensedReal(t float64) float64 { return r.sign * (t - r.shift) }

// impossible recognises the loops that cannot cycle.
func (r *relay) impossible() *NoCycle {
	switch {
	case r.on+r.rise <= r.brk:
		return &NoCycle{Reason: NeverBreaks, StaysOn: true, SettlesAt: r.real(r.on), Working: fmt.Sprintf(
			"with the load left on the sensed temperature settles at %.6g degC and does not reach break at %.6g degC; the load stays on",
			r.sensedReal(r.on+r.rise), r.sensedReal(r.brk))}
	case r.off >= r.make:
		return &NoCycle{Reason: NeverMakes, SettlesAt: r.real(r.off), Working: fmt.Sprintf(
			"with the load off the sensed temperature settles at %.6g degC and does not come back to make at %.6g degC; the load stays off",
			r.sensedReal(r.off), r.sensedReal(r.make))}
	case r.make == r.brk && r.minOn == 0 && r.minOff == 0 && (r.dead == 0 || r.rise > 0):
		// an anticipator acts on the contact without any dead time
		return &NoCycle{Reason: NoInterval, Working: "make and break are the same and nothing delays the answer: it would switch without end"}
	}
	return nil
}

// closedForm gives the on and off times of a process without sensing lag.
func (r *relay) closedForm(dead float64) (on, off float64) {
	tau := 1 / r.chain.rate[0]
	extra := (r.on-r.off)*math.Expm1(dead/tau) + r.brk - r.make // what dead time and differential add
	on = tau * math.Log1p(extra/(r.on-r.brk))
	off = tau * math.Log1p(extra/(r.make-r.off))
	return on, off
}

func (r *relay) plainFigures(on, off float64) Figures {
	g := math.Exp(-r.dead * r.chain.rate[0])
	high := r.on - (r.on-r.brk)*g
	low := r.off + (r.make-r.off)*g
	f := r.turned(on, off, high, low, high, low)
	f.ClosedForm = true
	if r.dead > 0 {
		f.InFlight = 1
	}
	return f
}

// turned fills Figures from mirrored temperatures.
func (r *relay) turned(on, off, high, low, sensedHigh, sensedLow float64) Figures {
	var f Figures
	f.On, f.Off = on, off
	f.High, f.Low = r.real(high), r.real(low)
	f.SensedHigh, f.SensedLow = r.sensedReal(sensedHigh), r.sensedReal(sensedLow)
	if r.sign < 0 {
		f.High, f.Low = f.Low, f.High
		f.SensedHigh, f.SensedLow = f.SensedLow, f.SensedHigh
	}
	f.Mean = r.real(r.off + (r.on-r.off)*on/(on+off))
	f.OperationsPerYear = secondsPerYear / (on + off)
	return f
}
