package translate

import (
	"fmt"
	"math"

	"makebreak/survey"
	"makebreak/translate/logic"
	"makebreak/translate/sensing"
)

// Flame is a flame supervision by thermocouple that the program looks at. The
// valve holds by the flame's own heat and lets go by its own spring; there is
// no output that could open or hold it.
type Flame struct {
	Lost *logic.Expr // its voltage has fallen to the release, in this step
	Weak *logic.Var
}

// weakFor is how long the voltage must have been low with the flame lit before
// a warning: long enough for a draught, s; common practice.
const weakFor = 60.0

// settledFlame is how many times holds_within a flame must have burnt before
// its voltage is judged: a couple goes on warming after it holds; common practice.
const settledFlame = 5.0

// flameFigures says at what voltage a warning comes.
func (b *builder) flameFigures(c *survey.Control) {
	if c.Action.V != survey.HoldsWhileHot || !c.HoldsFrom.Set || !c.ReleasesAt.Set {
		return
	}
	b.spec.Figures.add(c.ID.V, "weak_below", weakBelow(c), "V", c.HoldsFrom.Path,
		"midway between the voltage from which it holds and the one at which it lets go: a couple that no longer gets above that is about to shut down without cause (common practice)")
	b.spec.Figures.add(c.ID.V, "flame_margin", c.HoldsFrom.V-c.ReleasesAt.V, "V", c.HoldsFrom.Path, "from holding to letting go")
}

func weakBelow(c *survey.Control) float64 { return (c.HoldsFrom.V + c.ReleasesAt.V) / 2 }

// States of a flame as the program sees it.
const (
	flameOut = iota
	flameWarming
	flameSettled
)

// flame follows the thermocouple's voltage. A flame that has burnt long enough
// and still gives little is warned of, before the valve lets go without cause.
func (b *builder) flame(c *survey.Control, p *Probe) *Flame {
	id := c.ID.V
	chain := b.spec.Chains[c.Sensor.V]
	level := func(name string, volts float64, side sensing.Side, from survey.Source, means string) *edge {
		h, err := chain.Threshold(volts, side, sensing.Nearest)
		if err != nil {
			b.fail(from, "the voltage of the thermocouple cannot be seen by "+c.Sensor.V, err.Error(), "another gain or full_scale")
			return &edge{Const: &logic.Const{}}
		}
		return &edge{Const: b.constant(logic.Const{Name: id + "_" + name, Value: h.Counts, Unit: "counts", Means: fmt.Sprintf("%.3g mV: %s", 1000*volts, means), Origin: origin(from), Working: h.Working}), AtLeast: h.AtLeast}
	}
	if !c.HoldsFrom.Set || !c.ReleasesAt.Set {
		b.fail(c.Source, "a flame supervision is watched by its voltages", "no holds_from or releases_at", "both, as measured")
		return &Flame{Lost: logic.False()}
	}
	lit := level("holds", c.HoldsFrom.V, sensing.AtOrAbove, c.HoldsFrom.Source, "it holds")
	gone := level("releases", c.ReleasesAt.V, sensing.AtOrBelow, c.ReleasesAt.Source, "it lets go")
	low := level("weak", weakBelow(c), sensing.AtOrBelow, c.HoldsFrom.Source, "midway between the two")
	settle := b.steps(id+"_settled_after", settledFlame*math.Max(c.HoldsWithin.V, 10), c.HoldsWithin.Source, "judged after")
	v := b.machine(b.name(id, "flame"), c.What.V+": the flame by its voltage", flameOut,
		logic.EnumWord{Name: "out", What: "no flame is seen"}, logic.EnumWord{Name: "warming", What: "lit, not judged yet"}, logic.EnumWord{Name: "settled", What: "has burnt long enough to be judged"})
	age := b.counter(b.name(id, "flame_for"), "steps in this state", settle, 0)
	lost := logic.And(p.good(), gone.reached(p))
	b.add(&logic.Machine{Var: v, What: c.What.V + ": the flame by its voltage", Timer: age, Limit: settle, Safe: flameOut, At: []*logic.State{
		{Is: flameOut, Goes: []*logic.Transition{{To: flameWarming, When: logic.And(p.good(), lit.reached(p)), Why: "the voltage holds the valve"}}},
		{Is: flameWarming, Goes: []*logic.Transition{
			{To: flameOut, When: lost, Why: "the valve lets go"},
			{To: flameSettled, When: logic.Ge(logic.Use(age), logic.C(settle)), Why: "has burnt long enough"}}},
		{Is: flameSettled, Goes: []*logic.Transition{{To: flameOut, When: lost, Why: "the valve lets go"}}},
	}})
	within := b.steps(id+"_weak_for", weakFor, survey.Source{Assumed: "common practice: a draught passes"}, "weak for")
	weakTime := b.counter(b.name(id, "weak_time"), "steps with a settled flame and little voltage", within, 0)
	b.add(&logic.Timer{Var: weakTime, Limit: within, Restart: logic.Not(logic.And(logic.Is(v, flameSettled), p.good(), low.reached(p)))})
	weak := b.local(b.name(id, "weak_couple"), c.What.V+": little voltage from a settled flame", logic.Ge(logic.Use(weakTime), logic.C(within)))
	b.flag(id+"_weak", c.What.V+": the thermocouple gives little; it will shut down without cause before long", logic.Use(weak))
	was := b.truth(b.name(id, "was_lit"), c.What.V+": a flame was seen in the step before", false)
	now := logic.Not(logic.Is(v, flameOut))
	lostNow := b.local(b.name(id, "goes_out"), c.What.V+": the flame goes out", logic.And(logic.Prev(was), logic.Not(now)))
	b.add(&logic.Set{Var: was, To: now})
	b.flag(id+"_flame_out", c.What.V+": no flame is seen", logic.Is(v, flameOut))
	return &Flame{Lost: logic.Use(lostNow), Weak: weak}
}
