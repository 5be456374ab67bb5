package translate

import (
	"fmt"
	"math"

	"makebreak/survey"
	"makebreak/translate/logic"
	"makebreak/translate/thermal"
)

// Valve is a load in the program that takes any position between shut and
// open: a modulating valve, or what hangs on an analogue output.
type Valve struct {
	Load        *survey.Load
	Output      *survey.Output // nil where the sheet names none
	By          *Regulator
	Probes      []*Probe   // whose faults put it into its safe position
	Out         *logic.Var // permille, what the board is told
	Safe        int64      // permille
	Open, Close *logic.Var // of a three-point drive, else nil
}

// follows gives the regulator that a load follows, or nil for one that only
// goes on and off.
func (b *builder) follows(l *survey.Load) *Regulator {
	if l.Follows.Set {
		return b.plan.Regulators[l.Follows.V]
	}
	if o := output(b.survey, l.ID.V); o == nil || o.Kind.V != "analogue" {
		return nil
	}
	for _, n := range l.RunsWhen.V.Tree.Names() {
		if g := b.plan.Regulators[n]; g != nil {
			return g
		}
	}
	return nil
}

// positioned builds a load that takes any position.
//
// Any fault of a probe that it hangs on, and a permit of the old wiring that is
// not there, send it to its safe position in the same step. Otherwise it goes
// after its regulator, no faster than the actuator can follow.
func (b *builder) positioned(l *survey.Load, g *Regulator, w *wiring) *Valve {
	id := l.ID.V
	v := &Valve{Load: l, Output: output(b.survey, id), By: g}
	if l.SafeState.V.Energised() {
		v.Safe = thermal.Full
	}
	permit := logic.True()
	names := []string{g.Control.ID.V}
	if tree := l.RunsWhen.V.Tree; tree != nil {
		permit = w.holding(names).condition(tree, l.RunsWhen.Source)
		names = append(names, reach(b.survey, tree)...)
	}
	v.Probes = b.probesOf(names)
	stop := logic.Or(logic.Or(each(v.Probes, (*Probe).failed)...), logic.Not(permit))
	safe := b.constant(logic.Const{Name: id + "_safe", Value: v.Safe, Unit: "permille", Means: string(l.SafeState.V), Origin: origin(l.SafeState.Source), Working: "its safe state"})
	to := b.local(b.name(id, "stopped"), "it has to be in its safe position", stop)
	position := b.state(logic.Var{Name: b.name(id, "position"), What: l.What.V + ": position", Kind: logic.Int, Range: logic.Range{Lo: 0, Hi: thermal.Full}, Start: v.Safe})
	after := logic.Use(g.Permille)
	if rate := b.slew(l); rate != nil {
		after = logic.Clamp(logic.Clamp(after, logic.Sub(logic.Prev(position), logic.C(rate)), logic.Add(logic.Prev(position), logic.C(rate))), logic.Lit(0), logic.Lit(thermal.Full))
	}
	b.add(&logic.Set{Var: position, To: logic.Select(logic.Use(to), logic.C(safe), after), Why: "its safe position, or after its control no faster than the actuator follows"})
	v.Out = &logic.Var{Name: id, What: l.What.V, Kind: logic.Int, Range: position.Range}
	b.prog.Outputs = append(b.prog.Outputs, v.Out)
	b.add(&logic.Define{Var: v.Out, As: logic.Use(position)})
	if l.Actuator.Drive.V == "three_point" {
		b.threePoint(v, position)
	}
	return v
}

// slew is how far the actuator moves in a step, permille; nil where its travel
// is not stated, or where it moves less than one permille in a step and is the
// slower of the two by itself.
func (b *builder) slew(l *survey.Load) *logic.Const {
	travel := l.Actuator.Travel
	if !travel.Set || travel.V <= 0 {
		return nil
	}
	n := int64(math.Ceil(thermal.Full * b.step / travel.V))
	if n < 1 || n >= thermal.Full || thermal.Full*b.step/travel.V < 1 {
		return nil
	}
	return b.constant(logic.Const{Name: l.ID.V + "_slew", Value: n, Unit: "permille", Means: "most in one step",
		Origin: origin(travel.Source), Working: fmt.Sprintf("1000 × %s / %s of travel, rounded up", Span(b.step), Span(travel.V))})
}

// Figures of a three-point drive.
const (
	learnBeyond = 0.2 // share of the travel that it is driven beyond an end, to know it; common practice
	deadShare   = 50  // a move shorter than this part of the travel is not begun; common practice
)

// States of a three-point drive.
const (
	driveRests = iota
	driveOpens
	driveCloses
)

// threePoint builds a drive with one contact for each direction. Where the
// stem stands is counted from the running time, so it has to be learned: after
// each start the drive runs to its safe end for longer than its travel, and
// whenever the position is at an end it is driven a little beyond, so that
// what was counted wrong is lost there.
func (b *builder) threePoint(v *Valve, position *logic.Var) {
	id, l := v.Load.ID.V, v.Load
	travel := l.Actuator.Travel
	if !travel.Set {
		b.fail(l.Actuator.Source, "a three-point drive needs its travel", "no travel", "travel: the time from shut to full open")
		return
	}
	full := b.steps(id+"_travel", travel.V, travel.Source, "from shut to full open in")
	if full.Value < deadShare {
		b.fail(travel.Source, "the drive is too fast for the step", travel.Text, fmt.Sprintf("at least %d steps of %s from shut to full open", deadShare, Span(b.step)))
		return
	}
	beyond := b.steps(id+"_beyond", learnBeyond*travel.V, travel.Source, "driven beyond an end for")
	learn := b.constant(logic.Const{Name: id + "_learn", Value: full.Value + beyond.Value, Unit: "steps", Means: "after a start it runs to its safe end for this long", Origin: full.Origin, Working: full.Name + " + " + beyond.Name})
	dead := b.constant(logic.Const{Name: id + "_dead", Value: max(full.Value/deadShare, 1), Unit: "steps", Means: "a shorter move is not begun", Origin: full.Origin, Working: fmt.Sprintf("%s / %d", full.Name, deadShare)})

	age := b.counter(b.name(id, "awake_for"), "steps since the start", learn, 0)
	safeEnd := full.Value
	if v.Safe == 0 {
		safeEnd = 0
	}
	stem := b.state(logic.Var{Name: b.name(id, "stem"), What: "steps that the stem stands open, as counted", Kind: logic.Int, Range: logic.Range{Lo: 0, Hi: full.Value}, Start: safeEnd})
	drive := b.machine(b.name(id, "move"), l.What.V+": which way it runs", driveRests,
		logic.EnumWord{Name: "rests", What: "stands"}, logic.EnumWord{Name: "opens", What: "runs open"}, logic.EnumWord{Name: "closes", What: "runs shut"})
	b.add(&logic.Timer{Var: age, Limit: learn, Restart: logic.False(), Why: "counts from the start"})
	learned := b.local(b.name(id, "learned"), "its safe end has been found", logic.Ge(logic.Use(age), logic.C(learn)))
	b.add(&logic.Set{Var: stem, To: logic.Select(logic.Use(learned),
		logic.Clamp(logic.Add(logic.Prev(stem), logic.Select(logic.Was(drive, driveOpens), logic.Lit(1), logic.Select(logic.Was(drive, driveCloses), logic.Lit(-1), logic.Lit(0)))), logic.Lit(0), logic.C(full)),
		logic.Lit(safeEnd)), Why: "counted from the running time"})
	want := b.whole(b.name(id, "stem_wanted"), "steps that the stem should stand open", logic.Div(logic.Mul(logic.Use(position), logic.C(full)), logic.Lit(thermal.Full)))
	way := b.whole(b.name(id, "way"), "steps still to go, open positive", logic.Sub(logic.Use(want), logic.Use(stem)))
	end := b.counter(b.name(id, "end_for"), "steps at an end", beyond, 0)
	atShut := logic.And(logic.Eq(logic.Use(want), logic.Lit(0)), logic.Eq(logic.Use(stem), logic.Lit(0)))
	atOpen := logic.And(logic.Ge(logic.Use(want), logic.C(full)), logic.Ge(logic.Use(stem), logic.C(full)))
	b.add(&logic.Timer{Var: end, Limit: beyond, Restart: logic.Not(logic.Or(atShut, atOpen)), Why: "at neither end"})
	way0 := logic.Lit(0)
	m := &logic.Machine{Var: drive, What: l.What.V + ": which way it runs", Safe: driveRests, At: []*logic.State{
		{Is: driveRests, Goes: []*logic.Transition{
			{To: driveOpens, When: logic.Or(logic.Ge(logic.Use(way), logic.C(dead)), logic.And(logic.Ge(logic.Use(want), logic.C(full)), logic.Gt(logic.Use(way), way0))), Why: "it has to open"},
			{To: driveCloses, When: logic.Or(logic.Le(logic.Use(way), logic.Lit(-dead.Value)), logic.And(logic.Eq(logic.Use(want), way0), logic.Lt(logic.Use(way), way0))), Why: "it has to close"}}},
		{Is: driveOpens, Goes: []*logic.Transition{{To: driveRests, When: logic.Le(logic.Use(way), way0), Why: "there, or beyond"}}},
		{Is: driveCloses, Goes: []*logic.Transition{{To: driveRests, When: logic.Ge(logic.Use(way), way0), Why: "there, or beyond"}}},
	}}
	b.add(m)
	short := logic.Lt(logic.Use(end), logic.C(beyond))
	learning := logic.Not(logic.Use(learned))
	toOpen, toShut := logic.And(learning, boolean(safeEnd != 0)), logic.And(learning, boolean(safeEnd == 0))
	v.Open, v.Close = b.out(id+"_opens", l.What.V+": run open"), b.out(id+"_closes", l.What.V+": run shut")
	b.add(
		&logic.Define{Var: v.Open, As: logic.Or(toOpen, logic.And(logic.Use(learned), logic.Or(logic.Is(drive, driveOpens), logic.And(atOpen, short))))},
		&logic.Define{Var: v.Close, As: logic.Or(toShut, logic.And(logic.Use(learned), logic.Or(logic.Is(drive, driveCloses), logic.And(atShut, short))))},
	)
	b.prog.Never = append(b.prog.Never, &logic.Property{Name: id + "_never_both", Why: "the drive is never told to run both ways",
		Bad: logic.And(logic.Use(v.Open), logic.Use(v.Close))})
}

func boolean(v bool) *logic.Expr {
	if v {
		return logic.True()
	}
	return logic.False()
}
