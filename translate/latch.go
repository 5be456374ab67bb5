package translate

import (
	"makebreak/survey"
	"makebreak/translate/logic"
)

// States of a limit that remembers its trip. Tripped is first, so that a blank
// memory means tripped.
const (
	latchTripped = iota
	latchClosed
)

// latch builds a limit that stays tripped until somebody presses its button,
// or, for a reset at power off, until the supply returns.
//
// The trip comes before the button in every state, so that the button cannot
// be held in: trip-free by construction. Only the edge of the button counts,
// and only once the temperature is beyond the reset threshold with a good
// probe. The trip survives a power cut; without a good record it comes up
// tripped (a probe that has not proved itself yet has no median to trip by,
// but keeps the contact open all the same), and so it does where the temperature has not come back beyond the
// reset threshold when the supply returns.
func (b *builder) latch(c *survey.Control, p *Probe) *Contact {
	k := &Contact{Control: c, Probe: p, Acts: acts(b.survey, c.ID.V), Latches: true}
	k.Make, k.Break = b.edges(c, p, k.Acts, 1)
	trip, rearm := k.Break, k.Make
	if k.Acts {
		trip, rearm = k.Make, k.Break
	}
	proven := b.proven(p)
	v := b.machine(c.ID.V, c.What.V, latchTripped,
		logic.EnumWord{Name: "tripped", What: "has tripped and stays so"},
		logic.EnumWord{Name: "closed", What: "has not tripped"})
	k.State = v

	var back []*logic.Transition
	switch c.Reset.V {
	case survey.ResetManual:
		v.Survives = true
		pressed := b.button(k)
		back = []*logic.Transition{{To: latchClosed,
			When: logic.And(pressed, p.good(), rearm.reached(p)),
			Why:  "the button was pressed, and the temperature is beyond the reset threshold"}}
	case survey.ResetAtPowerOff:
		v.Start = latchClosed // the supply is its reset, as it was with the old part
	}
	b.add(&logic.Machine{
		Var: v, What: c.What.V, Safe: latchTripped,
		At: []*logic.State{
			{Is: latchTripped, Goes: back},
			{Is: latchClosed, Goes: []*logic.Transition{
				{To: latchTripped, When: logic.And(logic.Not(p.proving()), trip.reached(p)), Why: "temperature has reached the trip"},
				{To: latchTripped, When: p.faulty(), Why: "the probe is not to be believed"},
				{To: latchTripped, When: logic.And(p.good(), logic.Not(logic.Prev(proven)), logic.Not(rearm.reached(p))),
					Why: "the supply returned with the temperature not back beyond the reset threshold"},
			}},
		},
	})
	k.Tripped = logic.Is(v, latchTripped)
	k.Made = logic.Not(k.Tripped)
	if k.Acts {
		k.Made = k.Tripped
	}
	k.Made = k.atOnce(k.Made)
	return k
}

// proven declares, once for a probe, that it has been good since the start.
func (b *builder) proven(p *Probe) *logic.Var {
	if p.Proven == nil {
		p.Proven = b.truth(b.name(p.Sensor.ID.V, "proven"), "has been good since the start", false)
	}
	return p.Proven
}

// settle adds what must be written after all that asks for the step before.
func (b *builder) settle() {
	for _, s := range b.survey.Electronics.Sensors {
		p := b.plan.Sensors[s.ID.V]
		if p != nil && p.Proven != nil {
			b.add(&logic.Set{Var: p.Proven, When: p.good(), To: logic.True(), Why: "the probe has proved itself"})
		}
	}
}

// button gives the edge of a reset button. Held since before the start it is
// no edge.
func (b *builder) button(k *Contact) *logic.Expr {
	id := k.Control.ID.V
	k.Reset = b.input(logic.Var{Name: id + "_reset", What: "reset button of " + k.Control.What.V, Kind: logic.Bool, Range: logic.Truth})
	was := b.truth(b.name(id, "reset_was"), "the button was pressed in the step before", true)
	edge := b.local(b.name(id, "reset_now"), "the button has just been pressed",
		logic.And(logic.Use(k.Reset), logic.Not(logic.Prev(was))))
	b.add(&logic.Set{Var: was, To: logic.Use(k.Reset)})
	return logic.Use(edge)
}
