package thermal

import (
	"fmt"
	"math"
)

// Estimate is a figure worked out from measurements, with its standard error
// in the same unit. Where it is not determined Known is false, Value is NaN,
// and Because says why.
type Estimate struct {
	Value, Error float64
	Known        bool
	Because      string
}

// Given is a figure that was stated or read, without an error of its own.
func Given(v float64) Estimate { return known(v, 0) }

// or is the value, or NaN where there is none.
func (e Estimate) or() float64 {
	if !e.Known {
		return math.NaN()
	}
	return e.Value
}

func known(v, e float64) Estimate { return Estimate{Value: v, Error: e, Known: true} }

func unknown(because string, v ...any) Estimate {
	return Estimate{Value: math.NaN(), Error: math.NaN(), Because: fmt.Sprintf(because, v...)}
}

// Identified is a process as far as its own cycle tells it.
//
// A cycle stays near its thresholds, so it fixes how fast the medium moves
// there and the dead time. Where a stuck load would settle, and with it the
// time constant, only follows when the temperature at which the medium settles
// without the load was measured besides.
type Identified struct {
	At       float64  // degC, the temperature that the two rates are for
	RateOn   Estimate // K/s at At with the load on; above 0 heats
	RateOff  Estimate // K/s at At with the load off
	DeadTime Estimate // s, without the sensing lag that was given

	TimeConstant Estimate // s
	SettlesOn    Estimate // degC
	SettlesOff   Estimate // degC

	// Process reproduces the measured cycle. Where SettlesOn is not known it
	// is a stand-in that holds near the thresholds only, good for cycles and
	// for tuning in integrating form, and for nothing far from them.
	Process Process

	FastestOn float64 // K/s, fastest measured with the load on; the bound of StraightLineToDanger

	Fit *Fit // of a log; nil for a cycle taken by stopwatch and thermometer
}

// because a cycle near its thresholds does not tell
const notFromACycle = "a cycle near its thresholds fixes two rates and a dead time; where the load would settle is not among them. Measure settles_off, or state worst"

// TimeToDanger is how long the medium takes to a danger with the load stuck
// on. Worst is where the load would settle at worst, in degC; its zero value
// says that nobody stated it. With SettlesOn known the medium follows the
// process, towards the further of the two. With worst alone it follows the
// first-order rise towards worst that has the measured rate at At. With
// neither it is NotDetermined, with the straight-line bound.
func (d Identified) TimeToDanger(from, danger float64, worst Estimate, vented bool) (Reach, error) {
	p := d.Process
	switch {
	case d.SettlesOn.Known:
		if worst.Known && (worst.Value-p.On)*p.Gain() > 0 {
			p.On = worst.Value
		}
		return p.TimeToDanger(from, danger, true, vented)
	case !worst.Known || !d.RateOn.Known:
		return StraightLineToDanger(d.FastestOn, from, danger, vented)
	}
	p.Tau = (worst.Value - d.At) / d.RateOn.Value
	if !(p.Tau > 0) {
		return Reach{Outcome: NotDetermined, SettlesAt: math.NaN(), Because: fmt.Sprintf(
			"a worst settles_on of %.4g degC is not on the load's side of the measured %.4g degC", worst.Value, d.At)}, nil
	}
	p.On, p.Off = worst.Value, d.At+d.RateOff.Value*p.Tau
	r, err := p.TimeToDanger(from, danger, true, vented)
	if err == nil && r.Outcome == Reached {
		r.Because += fmt.Sprintf("; the time constant of %.4g s follows from the stated worst and the measured %.4g K/min", p.Tau, 60*d.RateOn.Value)
	}
	return r, err
}
