package translate

import (
	"fmt"

	"makebreak/survey"
	"makebreak/translate/logic"
	"makebreak/translate/thermal"
)

// Anticipator warms the reading of a room control while its contact is made,
// as the heater in the old part warmed its element: the cycle keeps its rate,
// and the droop comes with it. In a cooling control it warms while the contact
// is open (common practice of room controls).
type Anticipator struct {
	Warm *logic.Var // the reading with what the anticipator adds
	Plan thermal.FilterPlan
}

// anticipates reports whether the program carries an anticipator on.
func anticipates(c *survey.Control) bool {
	return c.Anticipator.Rise.Set && c.Anticipator.Lag.Set && c.Plan.V == survey.Replace && c.Switching() &&
		c.Duty.V == survey.Operating && c.Reset.V == survey.ResetAutomatic
}

// anticipator builds the first-order lag of the heater, in steps of the
// reading, from the state of the contact in the step before; nil without one.
func (b *builder) anticipator(c *survey.Control, p *Probe, contact *logic.Var) *Anticipator {
	if !anticipates(c) {
		return nil
	}
	id, r, from := c.ID.V, b.reading(p), c.Anticipator.Rise.Source
	rise := r.in(c.Anticipator.Rise.V)
	plan, err := thermal.PlanFilter(c.Anticipator.Lag.V, b.step, 0, max(rise, 1), 0.5)
	if err != nil {
		b.fail(from, "the anticipator cannot be held in whole numbers", err.Error(), "a longer called_every")
		return nil
	}
	k := func(name string, v int64, unit, means, working string, from survey.Source) *logic.Const {
		return b.constant(logic.Const{Name: id + "_" + name, Value: v, Unit: unit, Means: means, Origin: origin(from), Working: working})
	}
	scale := k("heat_scale", plan.Scale, "", "the warmth is kept so many times finer", fmt.Sprintf("so that it comes within %.2g steps of its end", plan.SteadyError), c.Anticipator.Lag.Source)
	full := k("heat", rise*plan.Scale, fmt.Sprintf("%g K / %d", r.Unit, plan.Scale), Kelvins(c.Anticipator.Rise.V)+" in the end", "rise in steps of the reading × "+scale.Name, from)
	n := k("heat_lag", plan.Divisor, "steps", "lag "+Span(plan.Lag), fmt.Sprintf("1 / (1 − exp(−%s / %s)), rounded", Span(b.step), Span(c.Anticipator.Lag.V)), c.Anticipator.Lag.Source)
	heat := b.state(logic.Var{Name: b.name(id, "warmth"), What: "what the anticipator adds, × " + scale.Name, Kind: logic.Int, Range: logic.Range{Lo: 0, Hi: full.Value}})
	heating := logic.Was(contact, contactMade)
	if c.Cools() {
		heating = logic.Was(contact, contactOpen)
	}
	b.add(&logic.Set{Var: heat, To: logic.Toward(logic.Prev(heat), logic.Select(heating, logic.C(full), logic.Lit(0)), logic.C(n)),
		Why: "warms and cools as the heater in the old part did"})
	added := logic.Use(heat)
	if plan.Scale > 1 {
		added = logic.Div(added, logic.C(scale))
	}
	return &Anticipator{Plan: plan, Warm: b.whole(b.name(id, "warm_reading"), "the reading with what the anticipator adds", logic.Add(logic.Use(r.Value), added))}
}
