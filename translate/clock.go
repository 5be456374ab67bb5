package translate

import (
	"fmt"

	"makebreak/survey"
	"makebreak/translate/logic"
)

// States of the two kinds of clock that something else sets going.
const (
	clockIdle = iota
	clockRunning
	clockWaiting // armed (after) or done (starts)
)

// clock builds a timer of the old control and gives the condition that it is
// running. All times are counts of steps that stop at their limit.
func (b *builder) clock(t *survey.Timer, w *wiring) *logic.Expr {
	switch {
	case t.Every.Set:
		return b.periodic(t, w)
	case t.After.Set:
		return b.triggered(t, w, w.name(t.After.V, t.After.Source), true)
	default:
		return b.triggered(t, w, w.name(t.Starts.V, t.Starts.Source), false)
	}
}

// triggered builds a clock that runs after something went off, or from the
// moment something came on.
func (b *builder) triggered(t *survey.Timer, w *wiring, cause *logic.Expr, after bool) *logic.Expr {
	id := t.ID.V
	lasts := b.steps(id+"_lasts", t.Lasts.V, t.Lasts.Source, "runs for")
	waiting := logic.EnumWord{Name: "done", What: "has run; waits for its cause to go off"}
	if after {
		waiting = logic.EnumWord{Name: "armed", What: "its cause is on"}
	}
	start := clockIdle
	if t.AfterPowerCut.V == "run" {
		start = clockRunning
	}
	what := describe(t.What.V, "timer "+id)
	v := b.machine(id, what, start,
		logic.EnumWord{Name: "idle", What: "nothing to do"},
		logic.EnumWord{Name: "running", What: "running"}, waiting)
	v.Survives = t.AfterPowerCut.V == "resume"
	age := b.counter(b.name(id, "for"), "steps in this state", lasts, 0)
	over := logic.Or(logic.Ge(logic.Use(age), logic.C(lasts)), w.condition(t.EndsOn.V.Tree, t.EndsOn.Source))
	m := &logic.Machine{Var: v, What: what, Timer: age, Limit: lasts, Safe: start}
	if after {
		m.At = []*logic.State{
			{Is: clockIdle, Goes: []*logic.Transition{{To: clockWaiting, When: cause, Why: "its cause came on"}}},
			{Is: clockRunning, Goes: []*logic.Transition{
				{To: clockWaiting, When: cause, Why: "its cause came on again"},
				{To: clockIdle, When: over, Why: "has run its time"}}},
			{Is: clockWaiting, Goes: []*logic.Transition{{To: clockRunning, When: logic.Not(cause), Why: "its cause went off"}}},
		}
	} else {
		m.At = []*logic.State{
			{Is: clockIdle, Goes: []*logic.Transition{{To: clockRunning, When: cause, Why: "its cause came on"}}},
			{Is: clockRunning, Goes: []*logic.Transition{{To: clockWaiting, When: over, Why: "has run its time"}}},
			{Is: clockWaiting, Goes: []*logic.Transition{{To: clockIdle, When: logic.Not(cause), Why: "its cause went off"}}},
		}
	}
	b.add(m)
	b.plan.Timers[id] = v
	return logic.Is(v, clockRunning)
}

// periodic builds a clock that runs once in a period, counted from start to start.
func (b *builder) periodic(t *survey.Timer, w *wiring) *logic.Expr {
	id := t.ID.V
	what := describe(t.What.V, "timer "+id)
	lasts := b.steps(id+"_lasts", t.Lasts.V, t.Lasts.Source, "runs for")
	every := b.steps(id+"_every", t.Every.V, t.Every.Source, "once in")
	last := b.constant(logic.Const{
		Name: id + "_last_step", Value: every.Value - 1, Unit: "steps", Means: "last step of a period",
		Origin: origin(t.Every.Source), Working: every.Name + " - 1",
	})
	at := b.counter(b.name(id, "at"), "steps since the period began", every, 0)
	next := logic.Select(logic.Ge(logic.Prev(at), logic.C(last)), logic.Lit(0), logic.Add(logic.Prev(at), logic.Lit(1)))
	begins := logic.Eq(logic.Use(at), logic.Lit(0))
	var after []logic.Block

	switch t.AfterPowerCut.V {
	case "run":
		at.Start = last.Value // the first step begins a period
	case "resume":
		p := b.place(t, at, lasts, every)
		next = logic.Select(logic.Prev(p.awake), next, logic.Mul(logic.Prev(p.kept), logic.C(p.part)))
		begins = logic.Or(begins, logic.And(logic.Not(logic.Prev(p.awake)), logic.Lt(logic.Use(at), logic.C(lasts))))
		after = p.keep
	}

	b.add(&logic.Set{Var: at, To: next})
	v := b.machine(id, what, clockIdle,
		logic.EnumWord{Name: "idle", What: "waits for its time"},
		logic.EnumWord{Name: "running", What: "running"})
	over := logic.Or(logic.Ge(logic.Use(at), logic.C(lasts)), w.condition(t.EndsOn.V.Tree, t.EndsOn.Source))
	b.add(&logic.Machine{
		Var: v, What: what, Safe: clockIdle,
		At: []*logic.State{
			{Is: clockIdle, Goes: []*logic.Transition{{To: clockRunning, When: begins, Why: "its time has come"}}},
			{Is: clockRunning, Goes: []*logic.Transition{{To: clockIdle, When: over, Why: "has run its time, or was ended"}}},
		},
	})
	b.add(after...)
	b.plan.Timers[id] = v
	return logic.Is(v, clockRunning)
}

// keptParts is about how finely a periodic clock remembers its place. Every
// part costs one write to the memory that survives.
const keptParts = 16

// place is the memory of a clock that goes on where it was, to the part below.
type place struct {
	kept  *logic.Var // parts of the period gone by; survives
	awake *logic.Var // the place has been found again
	part  *logic.Const
	keep  []logic.Block
}

func (b *builder) place(t *survey.Timer, at *logic.Var, lasts, every *logic.Const) place {
	id := t.ID.V
	p := place{part: b.constant(logic.Const{
		Name: id + "_part", Value: max(every.Value/keptParts, 1), Unit: "steps", Means: "how finely the place is kept over a power cut",
		Origin: origin(t.AfterPowerCut.Source), Working: fmt.Sprintf("%s / %d, at least 1", every.Name, keptParts),
	})}
	p.kept = b.state(logic.Var{Name: b.name(id, "place"), What: "parts of the period gone by", Kind: logic.Int,
		Range: logic.Range{Lo: 0, Hi: every.Value / p.part.Value}, Survives: true})
	// Without a record it begins where it would have just finished running.
	p.kept.Start = min((lasts.Value+p.part.Value-1)/p.part.Value, p.kept.Range.Hi)
	p.awake = b.truth(b.name(id, "awake"), "the place has been found again after the start", false)
	p.keep = []logic.Block{
		&logic.Set{Var: p.kept, To: logic.Div(logic.Use(at), logic.C(p.part))},
		&logic.Set{Var: p.awake, To: logic.True()},
	}
	return p
}
