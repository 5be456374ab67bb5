package risk

import (
	"fmt"
	"math"
	"slices"
	"strings"

	"makebreak/survey"
)

// weigh decides whether a hardware control is a barrier on a way whose load is
// dangerous when on. The first reason against it is the one given.
func (j *judge) weigh(c *survey.Control, w *way) barrier {
	if !c.Cuts.Has(w.load.ID.V) {
		return barrier{c, false, "does not cut " + w.load.ID.V}
	}
	if w.danger.When.Set {
		return j.weighForState(c, w)
	}
	if reason := j.wrongDirection(c, w.danger); reason != "" {
		return barrier{c, false, reason}
	}
	if reason := j.notIndependent(c, w.load); reason != "" {
		return barrier{c, false, reason}
	}
	return j.weighThreshold(c, w.danger)
}

// weighForState: a flame guard for a gas valve, any limiting or protective
// part otherwise.
func (j *judge) weighForState(c *survey.Control, w *way) barrier {
	if w.load.Kind.V == "gas_valve" && c.Action.V != survey.HoldsWhileHot {
		return barrier{c, false, "is no flame safeguard"}
	}
	if c.Action.V != survey.HoldsWhileHot && c.Duty.V == survey.Operating {
		return barrier{c, false, "is filed as operating"}
	}
	if sharesSensor(c) {
		return barrier{c, false, "shares its sensor with the program"}
	}
	return barrier{c, true, "cuts it by itself"}
}

// directed reports whether the control switches its load off towards the
// danger: it breaks, or closes, on the side where the danger is.
func directed(c *survey.Control, d *survey.Danger) bool {
	switch c.Action.V {
	case survey.BreaksOnRise, survey.ClosesOnRise:
		return d.Above.Set
	case survey.MakesOnRise, survey.OpensOnRise:
		return d.Below.Set
	}
	return false
}

func (j *judge) wrongDirection(c *survey.Control, d *survey.Danger) string {
	switch {
	case directed(c, d):
		return ""
	case c.Action.V == survey.HoldsWhileHot:
		return "guards the flame and not the temperature"
	case c.Action.V == survey.Indicates || c.Action.V == survey.Pulses:
		return "has no trip"
	case d.Above.Set:
		return "points the other way: it does not break as the temperature rises"
	}
	return "points the other way: it does not break as the temperature falls"
}

// notIndependent gives the reason why the control cannot be counted on when
// the operating control has failed.
func (j *judge) notIndependent(c *survey.Control, l *survey.Load) string {
	switch {
	case c.Shares.Has("sensor"):
		return "shares its sensor with the program"
	case c.Shares.Has("converter"):
		return "shares its converter with the program"
	case c.Duty.V == survey.Operating:
		return "is filed as an operating control: it works every cycle and is what may fail"
	}
	if c.Duty.V != survey.Protective && !j.hasOtherStat(c, l) {
		return "is the only control of the load: it does the operating work as well"
	}
	if p := controlOf(j.s, c.SamePartAs.V); p != nil && hardware(p.Plan.V) && p.Duty.V == survey.Operating {
		return "is one part with " + p.ID.V + ", which does the operating work"
	}
	return ""
}

// hasOtherStat reports whether another control switches the load in ordinary
// work.
func (j *judge) hasOtherStat(c *survey.Control, l *survey.Load) bool {
	return slices.ContainsFunc(controlsOf(j.s, l), func(id string) bool {
		other := controlOf(j.s, id)
		return other != c && other.Duty.V != survey.Protective
	})
}

func (j *judge) weighThreshold(c *survey.Control, d *survey.Danger) barrier {
	t := j.trip(c, d)
	if math.IsNaN(t.worst) {
		return barrier{c, false, t.missing}
	}
	if t.beyond(d) {
		return barrier{c, false, fmt.Sprintf("trips too late: %s against %s", t.sum, Celsius(limitOf(d)))}
	}
	said := fmt.Sprintf("trips in time: %s against %s", t.sum, Celsius(limitOf(d)))
	if math.IsNaN(t.overshoot) {
		said += "; overshoot after the cut not determined, " + t.noOvershoot
	}
	return barrier{c, true, said}
}

func limitOf(d *survey.Danger) float64 {
	if d.Above.Set {
		return d.Above.V
	}
	return d.Below.V
}

// trip is where a hardware control cuts, at worst, on its way to a danger.
type trip struct {
	at          float64 // degC, the far stop of a dial included
	tolerance   float64 // K
	toleranceIs string  // where it comes from
	overshoot   float64 // K; NaN: not determined
	noOvershoot string  // why it is not
	worst       float64 // degC; NaN: not known
	missing     string  // why it is not
	sum         string  // how worst was worked out
}

func (t trip) beyond(d *survey.Danger) bool { return beyond(t.worst, d) }

// trip adds up threshold, tolerance and overshoot towards the danger.
func (j *judge) trip(c *survey.Control, d *survey.Danger) trip {
	t := trip{at: math.NaN(), tolerance: math.NaN(), worst: math.NaN()}
	t.overshoot, t.noOvershoot = j.overshoot(c)
	at, ok := breaksAt(c, d)
	if !ok {
		t.missing = "its threshold is not stated"
		return t
	}
	t.at = at
	if t.tolerance, t.toleranceIs, ok = j.tolerance(c); !ok {
		t.missing = "its tolerance is not stated and none is usual for its element"
		return t
	}
	sign, word := 1.0, " + "
	if d.Below.Set {
		sign, word = -1, " - "
	}
	t.worst = t.at + sign*t.tolerance
	t.sum = Celsius(t.at) + word + Kelvin(t.tolerance) + " tolerance"
	if t.toleranceIs != "" {
		t.sum += " (" + t.toleranceIs + ")"
	}
	if !math.IsNaN(t.overshoot) {
		t.worst += sign * t.overshoot
		t.sum += word + Kelvin(t.overshoot) + " overshoot"
	}
	if bound, ok := j.measuredOvershoot(c); ok && math.IsNaN(t.overshoot) {
		t.worst += sign * bound
		t.sum += word + Kelvin(bound) + " overshoot at the measured rise, not at the worst one"
	}
	t.sum += " = " + Celsius(t.worst)
	return t
}

// measuredOvershoot is what the fastest measured rise says, in K. At the worst
// it is more: it may count against a limit, and never makes one good.
func (j *judge) measuredOvershoot(c *survey.Control) (k float64, ok bool) {
	f := j.computed.Figures[Key{c.ID.V, OvershootAsMeasured}]
	if f.Value == nil {
		return 0, false
	}
	return math.Max(0, *f.Value), true
}

// overshoot is the predicted rise (or fall) after the control has cut, in K.
func (j *judge) overshoot(c *survey.Control) (k float64, why string) {
	f, ok := j.computed.Figures[Key{c.ID.V, OvershootAfterCut}]
	switch {
	case !ok:
		return math.NaN(), "no process is stated"
	case f.Value == nil:
		return math.NaN(), strings.TrimPrefix(f.Reason, "not determined: ")
	}
	return math.Max(0, *f.Value), ""
}

// tolerance is the control's own, or the far end of what is usual for its
// element where the sheet gives none.
func (j *judge) tolerance(c *survey.Control) (k float64, from string, ok bool) {
	if c.Tolerance.Set {
		if c.Tolerance.Assumed != "" {
			return c.Tolerance.V, "assumed", true
		}
		return c.Tolerance.V, "", true
	}
	e, known := j.cat.Element(c.Element.V)
	if !known || e.Tolerance == nil {
		return math.NaN(), "", false
	}
	return e.Tolerance.To, "not stated; the most that is usual for " + e.Title, true
}

// breaksAt is the temperature at which the control cuts its loads; where a
// dial is left to the user, the stop of it that is nearest to the danger.
func breaksAt(c *survey.Control, d *survey.Danger) (float64, bool) {
	at, ok := breakEdge(c)
	if c.Dial.Set {
		stop := math.Max(c.Dial.V[0], c.Dial.V[1])
		if d.Below.Set {
			stop = math.Min(c.Dial.V[0], c.Dial.V[1])
		}
		switch {
		case !ok:
			return stop, true
		case d.Below.Set:
			return math.Min(at, stop), true
		}
		return math.Max(at, stop), true
	}
	return at, ok
}

func breakEdge(c *survey.Control) (float64, bool) {
	switch c.Action.V {
	case survey.ClosesOnRise:
		return c.FullAt.V, c.FullAt.Set
	case survey.OpensOnRise:
		return c.StartsAt.V, c.StartsAt.Set
	}
	if c.BreaksAt.Set {
		return c.BreaksAt.V, true
	}
	at, _, ok := edges(c)
	return at, ok
}

// edges works out both edges of a two-position control from whichever keys
// the sheet gives.
func edges(c *survey.Control) (breaks, makes float64, ok bool) {
	if c.BreaksAt.Set && c.MakesAt.Set {
		return c.BreaksAt.V, c.MakesAt.V, true
	}
	if !c.SetPoint.Set || !c.Differential.Set {
		return 0, 0, false
	}
	width := c.Differential.V // break above make
	if c.Action.V == survey.MakesOnRise {
		width = -width
	}
	switch c.Marks.V {
	case "break":
		return c.SetPoint.V, c.SetPoint.V - width, true
	case "make":
		return c.SetPoint.V + width, c.SetPoint.V, true
	case "middle":
		return c.SetPoint.V + width/2, c.SetPoint.V - width/2, true
	}
	return 0, 0, false
}
