package translate

import (
	"fmt"
	"math"

	"makebreak/survey"
	"makebreak/translate/logic"
	"makebreak/translate/sensing"
)

// Monitored is a part that stays hard-wired and that the program watches. The
// program counts, compares and warns; none of it reaches a load.
type Monitored struct {
	Control *survey.Control
	Tripped *logic.Expr // the signal that shows its trip; nil without one
	Trips   *logic.Var  // how often it has been seen to trip; output
	Days    *logic.Var  // since it was last seen to act; output
	Late    *logic.Var  // it was beyond its trip for long and was not seen to act; nil where that cannot be told
	Probe   *Probe      // where a sensor looks on, or nil
	Flame   *Flame      // of a flame supervision
	Image   *Image      // of a motor protector
}

// monitors reports whether a part that stays is watched by the program: it has
// a signal that shows its trip, or a sensor that looks on.
func (b *builder) monitors(c *survey.Control) bool {
	if c.Plan.V != survey.Monitor {
		return false
	}
	return c.ReadBy.Set && c.ReadBy.V != "" || c.Sensor.Set && b.spec.Chains[c.Sensor.V] != nil
}

// Limits of what is counted.
const (
	mostTrips = 60000 // saturates there
	mostDays  = 3660  // ten years, saturates there
	aDay      = 86400.0
	settleOut = 60.0 // s that a limit may take to act beyond its worst trip before it counts as late; common practice, on top of its lag
)

// monitor builds what watches a part that stays.
func (b *builder) monitor(c *survey.Control, w *wiring) *Monitored {
	m := &Monitored{Control: c, Probe: b.plan.Sensors[c.Sensor.V]}
	id := c.ID.V
	var acted *logic.Expr // it has been seen to act
	if c.ReadBy.V != "" {
		m.Tripped = w.name(c.ReadBy.V, c.ReadBy.Source)
		was := b.truth(b.name(id, "was_tripped"), c.What.V+": was seen tripped in the step before", true)
		rising := b.local(b.name(id, "trips_now"), c.What.V+": is seen to trip", logic.And(m.Tripped, logic.Not(logic.Prev(was))))
		b.add(&logic.Set{Var: was, To: m.Tripped})
		m.Trips = b.tally(id+"_trips", c.What.V+": trips seen", mostTrips, logic.Use(rising))
		b.flag(id+"_tripped", c.What.V+": is seen tripped", m.Tripped)
		acted = logic.Use(rising)
	}
	switch {
	case c.Action.V == survey.HoldsWhileHot && m.Probe != nil:
		m.Flame = b.flame(c, m.Probe)
		if acted == nil {
			acted = m.Flame.Lost
		}
	case c.Element.V == "heated_bimetal" && m.Probe != nil && c.RatedCurrent.Set:
		m.Image = b.image(c, m.Probe)
	case c.Switching() && m.Probe != nil && m.Tripped != nil:
		m.Late = b.late(c, m)
	}
	if acted != nil && c.Reset.V != survey.ResetOneShot {
		m.Days = b.daysSince(c, acted)
	}
	return m
}

// tally counts events up to a limit; the count survives a power cut.
func (b *builder) tally(name, what string, most int64, event *logic.Expr) *logic.Var {
	n := b.state(logic.Var{Name: b.name(name, "seen"), What: what, Kind: logic.Int, Range: logic.Range{Lo: 0, Hi: most}, Survives: true})
	b.add(&logic.Set{Var: n, When: logic.And(event, logic.Lt(logic.Prev(n), logic.Lit(most))),
		To: logic.Clamp(logic.Add(logic.Prev(n), logic.Lit(1)), logic.Lit(0), logic.Lit(most)), Why: "one more; the count stops at its end"})
	out := &logic.Var{Name: b.name(name), What: what, Kind: logic.Int, Range: n.Range}
	b.prog.Outputs = append(b.prog.Outputs, out)
	b.add(&logic.Define{Var: out, As: logic.Use(n)})
	return out
}

// daysSince counts days since a part was last seen to act. Only whole days are
// kept over a power cut, so that the memory is written once a day; what is lost
// with the cut makes the count too small by less than a day each time.
func (b *builder) daysSince(c *survey.Control, acted *logic.Expr) *logic.Var {
	id, what := c.ID.V, c.What.V+": days since it was last seen to act"
	day := b.steps(id+"_day", aDay, survey.Source{Assumed: "a day"}, "a day is")
	at := b.counter(b.name(id, "day_at"), "steps of this day", day, 0)
	n := b.state(logic.Var{Name: b.name(id, "days_gone"), What: what, Kind: logic.Int, Range: logic.Range{Lo: 0, Hi: mostDays}, Survives: true})
	over := b.local(b.name(id, "day_over"), "a day is over", logic.Ge(logic.Prev(at), logic.C(day)))
	event := b.local(b.name(id, "acted"), c.What.V+": is seen to act", acted)
	b.add(
		&logic.Timer{Var: at, Limit: day, Restart: logic.Or(logic.Use(over), logic.Use(event)), Why: "the next day"},
		&logic.Set{Var: n, When: logic.Or(logic.Use(event), logic.Use(over)),
			To:  logic.Select(logic.Use(event), logic.Lit(0), logic.Clamp(logic.Add(logic.Prev(n), logic.Lit(1)), logic.Lit(0), logic.Lit(mostDays))),
			Why: "from nothing when it acts"},
	)
	out := &logic.Var{Name: b.name(id, "days"), What: what, Kind: logic.Int, Range: n.Range}
	b.prog.Outputs = append(b.prog.Outputs, out)
	b.add(&logic.Define{Var: out, As: logic.Use(n)})
	if c.ProveEvery.Set {
		due := b.constant(logic.Const{Name: id + "_prove_after", Value: min(max(int64(math.Round(c.ProveEvery.V/aDay)), 1), mostDays), Unit: "days", Means: "to be proved every " + c.ProveEvery.Text,
			Origin: origin(c.ProveEvery.Source), Working: "in days, at most ten years"})
		b.flag(id+"_proof_due", c.What.V+": has not been seen to act for as long as it may go unproved", logic.Ge(logic.Use(n), logic.C(due)))
	}
	return out
}

// late finds a limit that ought to have acted: the reading is beyond its trip
// with its tolerance and the worst error of the reading, for longer than its
// lag and a minute, and its trip is not seen.
func (b *builder) late(c *survey.Control, m *Monitored) *logic.Var {
	id := c.ID.V
	at, known := c.BreaksAt, c.BreaksAt
	if !known.Set {
		return nil
	}
	chain := b.spec.Chains[c.Sensor.V]
	room := c.Tolerance.V
	if budget, err := chain.Budget(at.V); err == nil {
		room += budget.WorstCase
	}
	side, limit := sensing.AtOrAbove, at.V+room
	if c.Action.V == survey.MakesOnRise {
		side, limit = sensing.AtOrBelow, at.V-room
	}
	h, err := chain.Threshold(limit, side, sensing.Nearest)
	if err != nil {
		return nil // its sensor does not reach so far: nothing is claimed
	}
	e := &edge{Const: b.constant(logic.Const{Name: id + "_beyond", Value: h.Counts, Unit: "counts", Means: Degrees(limit) + ": beyond its trip for certain", Origin: origin(at.Source),
		Working: fmt.Sprintf("%s with its tolerance and the worst error of %s; %s", Degrees(at.V), c.Sensor.V, h.Working)}), AtLeast: h.AtLeast}
	lag, _, _ := b.elementLag(c)
	wait := b.steps(id+"_acts_within", lag+settleOut, c.Lag.Source, "acts within")
	beyond := b.counter(b.name(id, "beyond_for"), "steps beyond its trip", wait, 0)
	b.add(&logic.Timer{Var: beyond, Limit: wait, Restart: logic.Or(m.Tripped, logic.Not(m.Probe.good()), logic.Not(e.reached(m.Probe)))})
	late := b.local(b.name(id, "late"), c.What.V+": ought to have acted", logic.Ge(logic.Use(beyond), logic.C(wait)))
	b.flag(id+"_late", c.What.V+": the temperature is beyond its trip and it is not seen to act", logic.Use(late))
	return late
}
