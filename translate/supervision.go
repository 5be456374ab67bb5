package translate

import (
	"fmt"
	"math"

	"makebreak/survey"
	"makebreak/translate/logic"
)

// slack is how many times the slowest expected answer of the process is waited
// for before a load counts as being without effect: long enough for a draw-off
// or an opened door to pass.
const slack = 3.0

// effectShare is the part of the differential by which the temperature must
// have moved for the load to count as having an effect.
const effectShare = 0.5

// withoutEffect watches a load that should move a temperature. A probe that
// has fallen out of its pocket reads a believable temperature that the load
// cannot change: on for long enough without an effect is a fault that stays
// until the next start.
//
// The reference is the temperature furthest back since the load came on, so
// that a draw-off does not count against it. While a limit that stays is seen
// open, time stands still: it has cut the load, and there is no effect to see.
func (b *builder) withoutEffect(s *Switched, w *wiring) {
	e, ok := b.effect(s)
	if !ok {
		return
	}
	id, p := s.Load.ID.V, e.probe
	limit := b.steps(id+"_effect_within", e.within, e.from, "an effect is expected within")
	limit.Working = e.working + "; " + limit.Working
	least := b.constant(logic.Const{Name: id + "_effect", Value: e.counts, Unit: "counts", Means: Kelvins(e.kelvin) + " towards the set point",
		Origin: origin(e.from), Working: fmt.Sprintf("%s of the differential", number(effectShare, 2))})

	from := b.state(logic.Var{Name: b.name(id, "effect_from"), What: "reading furthest back since " + id + " came on", Kind: logic.Int, Range: p.Raw.Range})
	idle := b.counter(b.name(id, "effect_for"), "steps on without an effect", limit, 0)
	s.NoEffect = b.truth(b.name(id, "no_effect"), "was on for long without an effect", false)

	value, was := logic.Use(p.Value), logic.Prev(from)
	gained, back := logic.Sub(value, was), logic.Lt(value, was)
	if e.countsFall {
		gained, back = logic.Sub(was, value), logic.Gt(value, was)
	}
	running := logic.Was(s.State, loadOn)
	moved := b.local(b.name(id, "effect_seen"), "the temperature has moved as it should", logic.Ge(gained, logic.C(least)))
	b.add(
		&logic.Timer{Var: idle, Limit: limit,
			Restart: logic.Or(logic.Not(running), logic.Use(moved)),
			Hold:    b.cutElsewhere(s, w)},
		&logic.Set{Var: from, When: logic.Or(logic.Not(running), logic.Use(moved), back), To: value},
		&logic.Set{Var: s.NoEffect, When: logic.Ge(logic.Use(idle), logic.C(limit)), To: logic.True(),
			Why: "on, and nothing follows: is the probe in its pocket?"},
	)
	b.flag(id+"_no_effect", s.Load.What.V+": on for long without effect on "+p.Sensor.ID.V, logic.Use(s.NoEffect))
}

// cutElsewhere is true while a limit that stays is seen to have cut the load,
// or nil where none is read.
func (b *builder) cutElsewhere(s *Switched, w *wiring) *logic.Expr {
	var cut []*logic.Expr
	for _, c := range b.survey.Controls {
		if c.Plan.V != survey.Replace && c.ReadBy.V != "" && c.Cuts.Has(s.Load.ID.V) {
			cut = append(cut, w.name(c.ReadBy.V, c.ReadBy.Source))
		}
	}
	if len(cut) == 0 {
		return nil
	}
	return logic.Or(cut...)
}

// effect is what a load is expected to do to a temperature, at the slowest.
type effect struct {
	probe      *Probe
	countsFall bool // the load's effect makes the counts fall
	kelvin     float64
	counts     int64
	within     float64 // s
	from       survey.Source
	working    string
}

// effect works out what a load must do to the temperature of the operating
// control that runs it, from what is known of the process. Where nothing is,
// or where the load could never reach the break, there is nothing to expect.
func (b *builder) effect(s *Switched) (effect, bool) {
	if !drives(b.survey, s.Load.ID.V) || b.model == nil {
		return effect{}, false
	}
	for _, n := range s.Load.RunsWhen.V.Tree.Names() {
		k := b.plan.Contacts[n]
		if k == nil || k.Latches || k.Control.Duty.V != survey.Operating {
			continue
		}
		return b.slowest(k)
	}
	return effect{}, false
}

// slowest takes the slowest of the figures given: at the edge where the load
// goes off, the temperature moves at (settles − edge)/τ (first-order process).
func (b *builder) slowest(k *Contact) (effect, bool) {
	m := b.model
	makes, edge := b.wanted(k.Control)
	differential := math.Abs(edge - makes)
	heats := k.Control.Action.V == survey.BreaksOnRise
	if k.Dial != nil { // the stop where the load does least
		low, high := b.dialEdges(k.Control)
		edge = low
		if heats {
			edge = high
		}
	}
	settles, from := m.Process.On, b.survey.Process.SettlesOn.Source
	if !m.Far() {
		from = survey.Source{Path: m.Path}
	}
	if w := b.survey.Process.Worst.SettlesOn; m.Far() && w.Set && (w.V < settles) == heats {
		settles, from = w.V, w.Source
	}
	drive := settles - edge
	if !heats {
		drive = -drive
	}
	if drive <= 0 {
		return effect{}, false
	}
	chain := b.spec.Chains[k.Probe.Sensor.ID.V]
	e := effect{probe: k.Probe, from: from}
	e.kelvin = effectShare * differential
	e.countsFall = chain.Rising() != heats
	width := chain.CountWidth(edge)
	if k.Dial != nil {
		low, high := b.dialEdges(k.Control)
		width = math.Max(chain.CountWidth(low), chain.CountWidth(high))
	}
	e.counts = max(int64(math.Floor(e.kelvin/width)), 2)
	e.kelvin = float64(e.counts) * width
	// Through the last e.kelvin before the edge, where the drive is least.
	answer := m.Process.Tau * math.Log((drive+e.kelvin)/drive)
	delay := m.Process.Dead + k.Probe.Sensor.Lag.V
	e.within = slack * (answer + delay)
	e.working = fmt.Sprintf("%s times the slowest expected answer: %s × ln((%s + %s)/%s) = %s, and %s of dead time and lag",
		number(slack, 1), Span(m.Process.Tau), Kelvins(drive), Kelvins(e.kelvin), Kelvins(drive), Span(answer), Span(delay))
	return e, true
}

// drives reports whether a load is one that moves the temperature of the
// process: one that driven_by names, or the only load there is.
func drives(s *survey.Survey, load string) bool {
	if len(s.Process.DrivenBy) == 0 {
		return len(s.Loads) == 1 && s.Loads[0].ID.V == load
	}
	return s.Process.DrivenBy.Has(load)
}
