package translate

import (
	"makebreak/survey"
	"makebreak/translate/logic"
)

// States of a switched load: off is first, and what a load starts in unless
// its safe state is on.
const (
	loadOff = iota
	loadOn
)

// contactSettles is how long a contact may take to follow its coil before the
// read-back counts as wrong. Common practice: relays and contactors settle in
// well under a tenth of this.
const contactSettles = 1.0 // s

// Switched is a load in the program.
type Switched struct {
	Load     *survey.Load
	Output   *survey.Output // nil where the sheet names none
	State    *logic.Var     // off, on
	Out      *logic.Var     // what the board is told
	Probes   []*Probe       // whose faults put it into its safe state
	Seen     *logic.Var     // read-back input, or nil
	Welded   *logic.Var     // the contact did not open, or nil
	NoEffect *logic.Var     // it was on long enough without effect, or nil
}

// switched builds one load: the old wiring, the safe state on any fault that
// touches it, minimum times, proof of signals before a start, and the
// read-back of its contact.
//
// Leaving the safe state needs every probe good. Minimum on holds back only
// the opening of the operating contacts themselves: whatever else opens the
// circuit does so at once. Minimum off counts from the moment the load went
// off, for whatever reason, and from every return of the supply; only a safe
// state that is on may cut it short.
func (b *builder) switched(l *survey.Load, w *wiring) *Switched {
	id := l.ID.V
	s := &Switched{Load: l, Output: output(b.survey, id)}
	tree, at := l.RunsWhen.V.Tree, l.RunsWhen.Source
	names := reach(b.survey, tree)
	s.Probes = b.probesOf(names)
	safeOn := l.SafeState.V.Energised()

	wanted := b.local(b.name(id, "wanted"), "the old wiring calls for it", w.condition(tree, at))
	want := logic.Use(wanted)
	minOn, minOff, held := b.minimumTimes(l, tree)

	start := loadOff
	if safeOn {
		start = loadOn
	}
	on, off := logic.EnumWord{Name: "on", What: "on"}, logic.EnumWord{Name: "off", What: "off"}
	if l.Kind.V.Opens() {
		on, off = logic.EnumWord{Name: "open", What: "open"}, logic.EnumWord{Name: "closed", What: "closed"}
	}
	s.State = b.machine(id, l.What.V, start, off, on)
	m := &logic.Machine{Var: s.State, What: l.What.V, Safe: start}

	var inState *logic.Var
	if limit := longer(minOn, minOff); limit != nil {
		inState = b.counter(b.name(id, "for"), "steps since it last switched", limit, 0)
		m.Timer, m.Limit = inState, limit
	}
	lasted := func(c *logic.Const) *logic.Expr {
		if c == nil {
			return nil
		}
		return logic.Ge(logic.Use(inState), logic.C(c))
	}

	fault := b.faultOf(s)
	good := logic.And(each(s.Probes, (*Probe).good)...)
	proofs := b.proofs(l, s, names)
	b.readBack(s, start)
	b.withoutEffect(s, w)

	var goesOn, goesOff []*logic.Transition
	kept := logic.Or(flag(s.NoEffect, logic.Use), flag(s.Welded, logic.Use))
	stop := logic.Or(fault, kept)
	free := logic.And(good, logic.Not(kept)) // a good probe has not failed
	if safeOn {
		goesOn = append(goesOn, unless(stop, loadOn, "its safe state is on")...)
		goesOn = append(goesOn, &logic.Transition{To: loadOn, When: logic.And(want, proofs, lasted(minOff)), Why: "called for"})
		goesOff = append(goesOff, &logic.Transition{To: loadOff, When: logic.And(logic.Not(want), free, lasted(minOn)), Why: "no longer called for"})
	} else {
		goesOn = append(goesOn, &logic.Transition{To: loadOn, When: logic.And(want, free, proofs, lasted(minOff)), Why: "called for"})
		goesOff = append(goesOff, unless(stop, loadOff, "its safe state is off, before any minimum on time")...)
		if minOn != nil {
			permit := w.holding(held).condition(tree, at)
			if !isTrue(permit) {
				goesOff = append(goesOff, &logic.Transition{To: loadOff, When: logic.Not(permit), Why: "something other than its operating contact has opened the circuit"})
			}
		}
		goesOff = append(goesOff, &logic.Transition{To: loadOff, When: logic.And(logic.Not(want), lasted(minOn)), Why: "no longer called for"})
	}
	m.At = []*logic.State{{Is: loadOff, Goes: goesOn}, {Is: loadOn, Goes: goesOff}}
	b.add(m)
	s.Out = b.out(id, l.What.V)
	b.add(&logic.Define{Var: s.Out, As: logic.Is(s.State, loadOn)})
	b.pulse(s)
	return s
}

// out declares an output that is true or false.
func (b *builder) out(name, what string) *logic.Var {
	v := &logic.Var{Name: name, What: what, Kind: logic.Bool, Range: logic.Truth}
	b.prog.Outputs = append(b.prog.Outputs, v)
	return v
}

// pulse gives a load with a pulsed drive a second output that changes at every
// step while the coil is driven, and rests otherwise: when the program stops,
// so do the pulses, and the drive lets go.
func (b *builder) pulse(s *Switched) {
	if s.Output == nil || s.Output.Drive.V != "pulsed" {
		return
	}
	id := s.Load.ID.V
	driven := logic.Use(s.Out)
	if s.Load.Rest.V.Energised() {
		driven = logic.Not(driven)
	}
	was := b.truth(b.name(id, "pulse"), "level of the pulsed drive", false)
	now := b.out(id+"_drive", "pulses for the drive of "+s.Load.What.V)
	b.add(
		&logic.Define{Var: now, As: logic.And(driven, logic.Not(logic.Prev(was)))},
		&logic.Set{Var: was, To: logic.Use(now)},
	)
}

// minimumTimes takes the longest of the times of the controls in a load's own
// line, and lists the controls whose opening the minimum on time holds back.
func (b *builder) minimumTimes(l *survey.Load, tree *survey.Cond) (minOn, minOff *logic.Const, held []string) {
	var on, off *survey.Control
	for _, n := range tree.Names() {
		c := control(b.survey, n)
		if c == nil || c.Plan.V != survey.Replace {
			continue
		}
		if c.MinOn.V > 0 && c.Duty.V == survey.Operating {
			held = append(held, n)
			if on == nil || c.MinOn.V > on.MinOn.V {
				on = c
			}
		}
		if c.MinOff.V > 0 && (off == nil || c.MinOff.V > off.MinOff.V) {
			off = c
		}
	}
	if on != nil {
		minOn = b.steps(l.ID.V+"_min_on", on.MinOn.V, on.MinOn.Source, "on for at least")
	}
	if off != nil {
		minOff = b.steps(l.ID.V+"_min_off", off.MinOff.V, off.MinOff.Source, "off for at least")
	}
	return minOn, minOff, held
}

// proofs makes a load wait until each signal that asks for it has been seen
// false since the load last ran: one that never falls is welded or bridged.
func (b *builder) proofs(l *survey.Load, s *Switched, names []string) *logic.Expr {
	proofs := logic.True()
	for _, n := range names {
		sig := signal(b.survey, n)
		if sig == nil || !sig.SeenOffBeforeStart.V {
			continue
		}
		v := b.truth(b.name(l.ID.V, n, "seen_off"), n+" was seen off since "+l.ID.V+" last ran", false)
		in := logic.Use(b.plan.Signals[n])
		b.add(&logic.Set{Var: v, To: logic.Or(logic.Not(in), logic.And(logic.Prev(v), logic.Was(s.State, loadOff))),
			Why: "a signal that never goes off proves nothing"})
		proofs = logic.And(proofs, logic.Use(v))
	}
	return proofs
}

// readBack compares the contact with what it was told, and keeps a contact
// that did not open until the next start.
func (b *builder) readBack(s *Switched, start int) {
	if s.Output == nil || !s.Output.ReadBack.V {
		return
	}
	id := s.Load.ID.V
	s.Seen = b.input(logic.Var{Name: id + "_seen", What: "read-back contact of " + s.Load.What.V, Kind: logic.Bool, Range: logic.Truth})
	settles := b.steps(id+"_contact_settles", contactSettles, survey.Source{Assumed: "common practice: a contact settles well within this"}, "a contact follows within")
	apart := b.counter(b.name(id, "apart_for"), "steps that contact and command have differed", settles, 0)
	told := logic.Was(s.State, loadOn)
	b.add(&logic.Timer{Var: apart, Limit: settles, Restart: logic.Or(
		logic.And(logic.Use(s.Seen), told), logic.And(logic.Not(logic.Use(s.Seen)), logic.Not(told)))})
	late := logic.Ge(logic.Use(apart), logic.C(settles))
	s.Welded = b.truth(b.name(id, "welded"), "the contact did not open when told to", false)
	b.add(&logic.Set{Var: s.Welded, When: logic.And(late, logic.Use(s.Seen)), To: logic.True(),
		Why: "seen made although told to open; stays until the next start, for it must be looked at"})
	b.flag(id+"_welded", s.Load.What.V+": the contact did not open", logic.Use(s.Welded))
	b.flag(id+"_not_made", s.Load.What.V+": the contact did not make", logic.And(late, logic.Not(logic.Use(s.Seen))))
}

func (b *builder) flag(name, what string, when *logic.Expr) {
	b.flags = append(b.flags, logic.Flag{Name: name, What: what, When: when})
}

// faultOf is true where a probe that touches the load calls for its safe state.
func (b *builder) faultOf(s *Switched) *logic.Expr {
	return logic.Or(each(s.Probes, (*Probe).failed)...)
}

func (b *builder) probesOf(names []string) []*Probe {
	seen := map[string]bool{}
	for _, n := range names {
		if k := b.plan.Contacts[n]; k != nil {
			seen[k.Probe.Sensor.ID.V] = true
		}
		if g := b.plan.Regulators[n]; g != nil {
			seen[g.Probe.Sensor.ID.V] = true
		}
		if b.plan.Sensors[n] != nil {
			seen[n] = true
		}
	}
	var ps []*Probe
	for _, s := range b.survey.Electronics.Sensors {
		if seen[s.ID.V] {
			ps = append(ps, b.plan.Sensors[s.ID.V])
		}
	}
	return ps
}

func each(ps []*Probe, f func(*Probe) *logic.Expr) []*logic.Expr {
	var es []*logic.Expr
	for _, p := range ps {
		es = append(es, f(p))
	}
	return es
}

func flag(v *logic.Var, read func(*logic.Var) *logic.Expr) *logic.Expr {
	if v == nil {
		return nil
	}
	return read(v)
}

// unless gives a transition for a condition that can come true at all.
func unless(stop *logic.Expr, to int, why string) []*logic.Transition {
	if stop.Op == logic.OpLit {
		return nil
	}
	return []*logic.Transition{{To: to, When: stop, Why: why}}
}

func isTrue(e *logic.Expr) bool { return e.Op == logic.OpLit && e.Kind == logic.Bool && e.Value == 1 }

func longer(a, b *logic.Const) *logic.Const {
	switch {
	case a == nil:
		return b
	case b == nil || a.Value >= b.Value:
		return a
	}
	return b
}

func output(s *survey.Survey, load string) *survey.Output {
	for _, o := range s.Electronics.Outputs {
		if o.Load.V == load {
			return o
		}
	}
	return nil
}

func signal(s *survey.Survey, id string) *survey.Signal {
	for _, g := range s.Signals {
		if g.ID.V == id {
			return g
		}
	}
	return nil
}

// Warms reports whether the load, switched on, raises the temperature of the
// control that runs it; known is false where no such control tells.
func (s *Switched) Warms(v *survey.Survey) (warms, known bool) {
	if c := control(v, s.Load.Follows.V); c != nil && (c.Switching() || c.Modulating()) {
		return !c.Cools(), true
	}
	for _, n := range s.Load.RunsWhen.V.Tree.Names() {
		if c := control(v, n); c != nil && c.Switching() && c.Duty.V == survey.Operating {
			return c.Action.V == survey.BreaksOnRise, true
		}
	}
	for _, n := range s.Load.RunsWhen.V.Tree.Names() {
		if c := control(v, n); c != nil && c.Switching() {
			return c.Action.V == survey.BreaksOnRise, true
		}
	}
	return false, false
}
