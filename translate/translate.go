package translate

import (
	"fmt"

	"makebreak/survey"
	"makebreak/survey/catalogue"
	"makebreak/translate/logic"
	"makebreak/translate/sensing"
)

// Translate works out the specification of the new control. Diagnostics name
// what in the sheet stands in the way; the specification is returned as far as
// it goes. Options hand in what the sheet only names. Program is nil where any diagnostic is an error, or where nothing
// in the sheet is to be replaced.
func Translate(s *survey.Survey, with ...Option) (*Specification, survey.Diagnostics) {
	spec := &Specification{Survey: s, Chains: map[string]*sensing.Chain{}, Thresholds: map[string]Thresholds{}, Matches: map[string]Match{}}
	b := newBuilder(spec)
	for _, option := range with {
		option(b)
	}
	cat, err := catalogue.Load()
	if err != nil {
		b.fail(survey.Source{}, "the catalogue does not load", err.Error(), "a sound build of this program")
		return spec, b.diags
	}
	spec.Catalogue = cat

	b.chains()
	b.refuse()
	b.figures()
	if !b.diags.HasErrors() {
		b.program()
	}
	return spec, b.diags
}

// chains builds the measuring chain of every new sensor.
func (b *builder) chains() {
	e := b.survey.Electronics
	for _, s := range e.Sensors {
		chain, err := sensing.New(s, e.ADC, b.survey.Equipment.Enclosure)
		if err != nil {
			b.fail(s.Source, "the measuring chain of "+s.ID.V+" does not work", err.Error(), "another front end or another sensor")
			continue
		}
		b.spec.Chains[s.ID.V] = chain
	}
}

// translated reports whether a control becomes part of the program.
func translated(c *survey.Control) bool {
	switching := c.Action.V == survey.BreaksOnRise || c.Action.V == survey.MakesOnRise
	return switching && c.Plan.V == survey.Replace && c.BreaksAt.Set && c.MakesAt.Set
}

// refuse names every part that is to be replaced or watched by the program and
// is not.
func (b *builder) refuse() {
	for _, c := range b.survey.Controls {
		if c.Plan.V != survey.Replace && c.Plan.V != survey.Monitor || translated(c) {
			continue
		}
		b.spec.Refused = append(b.spec.Refused, Refusal{About: c.ID.V, Why: whyNot(c), Source: c.Plan.Source})
	}
}

func whyNot(c *survey.Control) string {
	if c.Plan.V == survey.Monitor {
		return "watching a part that stays is not translated"
	}
	switch c.Action.V {
	case survey.ClosesOnRise, survey.OpensOnRise:
		return "a modulating valve is not translated"
	case survey.Pulses:
		return "a pulsing device is not translated"
	case survey.HoldsWhileHot:
		return "flame supervision is never moved into the program"
	case survey.Indicates:
		return "an indication is not translated"
	}
	return "its make and break temperatures are not known"
}

// program puts the blocks together: probes, contacts, then loads and timers in
// the order in which they depend on each other.
func (b *builder) program() {
	w := b.wiring()
	for _, s := range b.survey.Signals {
		v := b.input(logic.Var{Name: s.ID.V, What: s.What.V, Kind: logic.Bool, Range: logic.Truth})
		b.plan.Signals[s.ID.V] = v
		w.known[s.ID.V] = logic.Use(v)
	}
	b.probes()
	for _, c := range b.survey.Controls {
		if !translated(c) {
			continue
		}
		p := b.plan.Sensors[c.Sensor.V]
		var k *Contact
		if c.Reset.V == survey.ResetAutomatic {
			k = b.contact(c, p)
		} else {
			k = b.latch(c, p)
			b.flag(c.ID.V+"_tripped", c.What.V+": has tripped", k.Tripped)
		}
		b.plan.Contacts[c.ID.V] = k
		made := b.local(b.name(c.ID.V, "contact"), c.What.V+": its contact is made", k.Made)
		w.known[c.ID.V] = logic.Use(made)
	}
	for _, id := range b.order() {
		if t := timer(b.survey, id); t != nil {
			w.known[id] = b.clock(t, w)
			continue
		}
		s := b.switched(load(b.survey, id), w)
		b.plan.Loads[id] = s
		w.known[id] = logic.Use(s.Out)
	}
	b.settle()
	b.faultWord()
	b.must(w)
	if b.diags.HasErrors() || len(b.plan.Loads) == 0 {
		return
	}
	b.prune()
	checked, err := logic.Check(b.prog)
	if err != nil {
		b.fail(b.survey.Equipment.Source, "no sound program comes out of this sheet", err.Error(), "see the figures named")
		return
	}
	b.spec.Program, b.spec.Plan = checked, b.plan
	b.comesUp()
}

// prune takes out what was worked out for a step and is read by nothing, such
// as the contact of a control that stands in no line.
func (b *builder) prune() {
	for {
		read := map[*logic.Var]bool{}
		note := func(e *logic.Expr) {
			e.Walk(func(n *logic.Expr) {
				if n.Var != nil {
					read[n.Var] = true
				}
			})
		}
		for _, block := range b.prog.Order {
			logic.Expressions(block, note)
		}
		for _, p := range b.prog.Never {
			note(p.Bad)
		}
		for _, out := range b.prog.Outputs {
			read[out] = true
		}
		var kept []logic.Block
		for _, block := range b.prog.Order {
			if d, ok := block.(*logic.Define); !ok || read[d.Var] {
				kept = append(kept, block)
			}
		}
		if len(kept) == len(b.prog.Order) {
			return
		}
		b.prog.Order = kept
	}
}

// probes builds the sensors that the program needs.
func (b *builder) probes() {
	for _, s := range b.survey.Electronics.Sensors {
		if b.needed(s.ID.V) {
			p := b.probe(s)
			b.plan.Sensors[s.ID.V] = p
			b.flag(s.ID.V, describe(s.What.V, "sensor "+s.ID.V)+": not believed", logic.Is(p.State, probeFaulty))
		}
	}
}

// needed reports whether a sensor is read by a translated control or compared
// in an expression.
func (b *builder) needed(sensor string) bool {
	for _, c := range b.survey.Controls {
		if translated(c) && c.Sensor.V == sensor {
			return true
		}
	}
	named := func(c *survey.Cond) bool {
		for _, n := range c.Names() {
			if n == sensor {
				return true
			}
		}
		return false
	}
	for _, l := range b.survey.Loads {
		if named(l.RunsWhen.V.Tree) {
			return true
		}
	}
	for _, t := range b.survey.Timers {
		if named(t.EndsOn.V.Tree) {
			return true
		}
	}
	return false
}

// order lists loads and timers so that each comes after what it depends on.
// The sheet has been checked for circles.
func (b *builder) order() []string {
	var ids, done []string
	seen := map[string]bool{}
	var visit func(id string)
	visit = func(id string) {
		if seen[id] {
			return
		}
		seen[id] = true
		var on []string
		switch {
		case load(b.survey, id) != nil:
			on = load(b.survey, id).RunsWhen.V.Tree.Names()
		case timer(b.survey, id) != nil:
			t := timer(b.survey, id)
			on = append(t.EndsOn.V.Tree.Names(), t.After.V, t.Starts.V)
		default:
			return
		}
		for _, n := range on {
			visit(n)
		}
		if l := load(b.survey, id); l == nil || l.RunsWhen.V.Tree != nil {
			done = append(done, id)
		}
	}
	for _, t := range b.survey.Timers {
		ids = append(ids, t.ID.V)
	}
	for _, l := range b.survey.Loads {
		ids = append(ids, l.ID.V)
	}
	for _, id := range ids {
		visit(id)
	}
	return done
}

// faultWord gathers every fault into one number for the outside.
func (b *builder) faultWord() {
	v := &logic.Var{Name: "fault", What: "0: none; one bit for each fault", Kind: logic.Int, Range: logic.Count}
	b.prog.Outputs = append(b.prog.Outputs, v)
	b.add(&logic.Flags{Out: v, Bits: b.flags})
	b.plan.Fault, b.plan.Bits = v, b.flags
}

// must carries the plant's own safety properties, and those that every program
// of this kind has to keep.
func (b *builder) must(w *wiring) {
	for i, m := range b.survey.Must {
		b.prog.Never = append(b.prog.Never, &logic.Property{
			Name: fmt.Sprintf("must_%d", i+1),
			Why:  describe(m.Why.V, m.Never.V.Text) + " (" + origin(m.Source) + ")",
			Bad:  w.condition(m.Never.V.Tree, m.Never.Source),
		})
	}
	for _, l := range b.survey.Loads {
		s := b.plan.Loads[l.ID.V]
		if s == nil || len(s.Probes) == 0 {
			continue
		}
		safe := logic.Is(s.State, loadOff)
		if l.SafeState.V.Energised() {
			safe = logic.Is(s.State, loadOn)
		}
		b.prog.Never = append(b.prog.Never, &logic.Property{
			Name: l.ID.V + "_safe_on_fault",
			Why:  "a probe that is not believed puts " + l.ID.V + " into its safe state in the same step",
			Bad:  logic.And(b.faultOf(s), logic.Not(safe)),
		})
	}
}
