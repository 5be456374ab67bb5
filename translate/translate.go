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
	spec := &Specification{Survey: s, Chains: map[string]*sensing.Chain{}, Thresholds: map[string]Thresholds{}, Junctions: map[string]*Junction{}, Matches: map[string]Match{}}
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
		if s.ColdJunction.Set {
			continue
		}
		chain, err := sensing.New(s, e.ADC, b.survey.Equipment.Enclosure)
		if err != nil {
			b.fail(s.Source, "the measuring chain of "+s.ID.V+" does not work", err.Error(), "another front end or another sensor")
			continue
		}
		b.spec.Chains[s.ID.V] = chain
	}
	b.junctions()
}

// translated reports whether a control becomes part of the program.
func (b *builder) translated(c *survey.Control) bool {
	switch {
	case c.Plan.V == survey.Monitor:
		return b.monitors(c)
	case c.Plan.V != survey.Replace:
		return false
	case c.Action.V == survey.Pulses:
		return pulses(c)
	case c.Switching():
		return c.BreaksAt.Set && c.MakesAt.Set
	case c.Modulating():
		return b.modulates(c)
	}
	return c.Action.V == survey.Indicates && c.Sensor.Set
}

// refuse names every part that is to be replaced or watched by the program and
// is not.
func (b *builder) refuse() {
	for _, c := range b.survey.Controls {
		if c.Plan.V != survey.Replace && c.Plan.V != survey.Monitor || b.translated(c) {
			continue
		}
		b.spec.Refused = append(b.spec.Refused, Refusal{About: c.ID.V, Why: whyNot(c), Source: c.Plan.Source})
	}
}

func whyNot(c *survey.Control) string {
	if c.Plan.V == survey.Monitor {
		return "neither a signal (read_by) shows its trip, nor does a sensor look on"
	}
	switch c.Action.V {
	case survey.ClosesOnRise, survey.OpensOnRise:
		return "no load follows it, or neither its band nor a set point with want: pid is known"
	case survey.Pulses:
		return "its rate or period, or what is on of it (on_share, dial_shares), is not known"
	case survey.HoldsWhileHot:
		return "flame supervision is never moved into the program"
	case survey.Indicates:
		return "no sensor takes over from it"
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
		if b.translated(c) {
			b.control(c, w)
		}
	}
	b.pulsers(w)
	for _, id := range b.order() {
		if t := timer(b.survey, id); t != nil {
			w.known[id] = b.clock(t, w)
			continue
		}
		l := load(b.survey, id)
		if g := b.follows(l); g != nil {
			v := b.positioned(l, g, w)
			b.plan.Valves[id] = v
			w.known[id] = logic.Use(b.local(b.name(id, "open"), l.What.V+": is not shut", logic.Gt(logic.Use(v.Out), logic.Lit(0))))
			continue
		}
		if l.Follows.Set {
			continue // what it follows is no part of the program
		}
		s := b.switched(l, w)
		b.plan.Loads[id] = s
		w.known[id] = logic.Use(s.Out)
	}
	b.settle()
	b.faultWord()
	b.must(w)
	if b.diags.HasErrors() || len(b.plan.Loads)+len(b.plan.Valves)+len(b.plan.Indications)+len(b.plan.Monitors) == 0 {
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

// control builds one replaced part: what makes and breaks, what moves, what
// shows.
func (b *builder) control(c *survey.Control, w *wiring) {
	p, id := b.plan.Sensors[c.Sensor.V], c.ID.V
	var k *Contact
	switch {
	case c.Plan.V == survey.Monitor:
		b.plan.Monitors[id] = b.monitor(c, w)
		return
	case c.Action.V == survey.Pulses:
		return // once all contacts are known: see pulsers
	case c.Action.V == survey.Indicates:
		b.plan.Indications[id] = b.indication(c, p)
		return
	case b.continuous(c):
		t, _ := b.settingsOf(id)
		g := b.pid(c, p, t)
		if g == nil {
			return // has been said
		}
		b.plan.Regulators[id] = g
		if g.Window == nil {
			return
		}
		k = &Contact{Control: c, Probe: p, Acts: acts(b.survey, id), Made: g.Made, Dial: g.Dial, PID: g}
	case c.Modulating() && !(c.StartsAt.Set && c.FullAt.Set):
		f, _ := b.spec.Figures.Get(id, "gain")
		b.fail(c.Want.Source, "a PID control of "+id+" cannot be worked out", describe(f.Working, "its process is not known"), "the figures of the process; or starts_at and full_at, for the like of the old valve")
		return
	case c.Modulating():
		b.plan.Regulators[id] = b.proportional(c, p)
		return
	case c.Reset.V == survey.ResetAutomatic:
		k = b.contact(c, p)
	default:
		k = b.latch(c, p)
		b.flag(id+"_tripped", c.What.V+": has tripped", k.Tripped)
	}
	b.plan.Contacts[id] = k
	made := b.local(b.name(id, "contact"), c.What.V+": its contact is made", k.Made)
	w.known[id] = logic.Use(made)
}

// pulsers builds the pulsing devices, which begin when what they switch is
// called for.
func (b *builder) pulsers(w *wiring) {
	for _, c := range b.survey.Controls {
		if !pulses(c) {
			continue
		}
		g := b.pulser(c, w)
		b.plan.Pulsers[c.ID.V] = g
		if g.Made == nil {
			return // has been said
		}
		w.known[c.ID.V] = g.Made
	}
}

// continuous reports whether a control becomes a PID control: it is wanted, and
// there are settings for it.
func (b *builder) continuous(c *survey.Control) bool {
	_, ok := b.settingsOf(c.ID.V)
	return ok && wantsPID(c)
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
	for _, measured := range []bool{false, true} { // a couple comes after the sensor of its cold junction
		for _, s := range b.survey.Electronics.Sensors {
			if s.ColdJunction.Set != measured || !b.needed(s.ID.V) {
				continue
			}
			p := b.probe(s)
			b.plan.Sensors[s.ID.V] = p
			b.flag(s.ID.V, describe(s.What.V, "sensor "+s.ID.V)+": not believed", logic.Is(p.State, probeFaulty))
		}
	}
}

// needed reports whether a sensor is read by a translated control or compared
// in an expression.
func (b *builder) needed(sensor string) bool {
	for _, s := range b.survey.Electronics.Sensors {
		if s.ColdJunction.V == sensor && b.needed(s.ID.V) {
			return true
		}
	}
	for _, c := range b.survey.Controls {
		if b.translated(c) && c.Sensor.V == sensor {
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
		if l := load(b.survey, id); l == nil || b.programmed(l) {
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

// programmed reports whether the program has to do with a load: it has an output
// stage, it follows something, or something other than parts that stay stands
// in its line.
func (b *builder) programmed(l *survey.Load) bool {
	if l.Follows.Set {
		return true
	}
	if l.RunsWhen.V.Tree == nil {
		return false
	}
	if output(b.survey, l.ID.V) != nil {
		return true
	}
	for _, n := range l.RunsWhen.V.Tree.Names() {
		if c := control(b.survey, n); c == nil || c.Plan.V == survey.Replace {
			return true
		}
	}
	return false
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
		if v := b.plan.Valves[l.ID.V]; v != nil && len(v.Probes) > 0 {
			b.prog.Never = append(b.prog.Never, &logic.Property{
				Name: l.ID.V + "_safe_on_fault",
				Why:  "a probe that is not believed puts " + l.ID.V + " into its safe position in the same step",
				Bad:  logic.And(logic.Or(each(v.Probes, (*Probe).failed)...), logic.Ne(logic.Use(v.Out), logic.Lit(v.Safe))),
			})
		}
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
