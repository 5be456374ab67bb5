package prove

import (
	"slices"

	"makebreak/translate/logic"
)

// leg is a stretch of a sequence with its inputs held.
type leg struct {
	inputs []int64
	steps  int
}

// assembler puts what the search has found into few sequences: it goes on from
// where it is whenever the last legs of the way to the next goal lead there
// from here as well, and starts anew only where they do not.
type assembler struct {
	*search
	drafts []*draft
}

// draft is a sequence in the making.
type draft struct {
	record *logic.Record
	why    string
	legs   []leg
}

func (s *search) assemble() Tour {
	a := &assembler{search: s}
	s.thorough = true
	goals := a.again()
	a.begin(nil)
	for _, g := range goals {
		if !g.done {
			a.lead(g)
		}
	}
	a.returns()
	t := Tour{}
	for _, d := range a.drafts {
		if len(d.legs) > 0 {
			t.Vectors = append(t.Vectors, s.recorded(d))
		}
	}
	t.Vectors = append(t.Vectors, s.refused()...)
	t.Upsets = s.upsets()
	t.Broken = s.counterexample()
	t.Reached, t.Missed = s.told()
	return t
}

// again takes all goals that were reached as not reached, and forgets those
// that were not.
func (a *assembler) again() []*goal {
	found := a.found
	a.found = nil
	for _, c := range a.choices {
		c.open = nil
	}
	a.watch, a.changes, a.starts = nil, nil, nil
	var goals []*goal
	for _, g := range found {
		if g.then != nil || a.broken[g.choice] != nil {
			continue // has a sequence of its own
		}
		g.done = false
		goals = append(goals, g)
		switch {
		case g.choice != nil:
			g.choice.open = append(g.choice.open, g)
		case g.seen != nil:
			a.watch = append(a.watch, g)
		case g.change != nil:
			a.changes = append(a.changes, g)
		default:
			a.starts = append(a.starts, g)
		}
	}
	return goals
}

// begin starts a new sequence.
func (a *assembler) begin(rec *logic.Record) {
	a.plain.Start(rec)
	a.probed.set(a.plain.Snapshot(nil))
	a.at = &node{record: rec, snap: slices.Clone(a.probed.after)}
	a.drafts = append(a.drafts, &draft{record: rec})
}

// tails are how many of the last legs of a way are tried from where a sequence is.
var tails = []int{1, 2, 3, 4, 6, 8, 12, 16, 24, 32}

// lead extends the present sequence to a goal, or begins another one.
func (a *assembler) lead(g *goal) {
	root, way := wayTo(g.node)
	if !a.mustStart(g) {
		from := slices.Clone(a.probed.after)
		for _, n := range tails {
			if n > len(way) {
				n = len(way)
			}
			if legs, ok := a.attempt(from, way[len(way)-n:], g); ok {
				a.extend(from, a.shortened(from, legs, g))
				return
			}
			if n == len(way) {
				break
			}
		}
	}
	a.begin(root.record)
	if !a.mustStart(g) {
		way = a.shortened(root.snap, way, g)
	}
	a.extend(root.snap, way)
}

// longLeg is how many steps a leg may have before it is tried with fewer.
const longLeg = 64

// shortened takes steps away from long legs as far as the goal is still reached.
func (a *assembler) shortened(from []int64, legs []leg, g *goal) []leg {
	for i := range legs {
		for steps := 1; steps < legs[i].steps && legs[i].steps > longLeg; steps *= 8 {
			other := slices.Clone(legs)
			other[i].steps = steps
			if shorter, ok := a.attempt(from, other, g); ok {
				legs = shorter
				break
			}
		}
		if i >= len(legs)-1 {
			break
		}
	}
	return legs
}

// mustStart reports whether a goal is about the first step.
func (a *assembler) mustStart(g *goal) bool {
	return g.choice == nil && g.seen == nil && g.change == nil
}

// wayTo gives the legs that lead to a node, neighbours with like inputs joined.
func wayTo(n *node) (root *node, way []leg) {
	for ; n.parent != nil; n = n.parent {
		way = append(way, leg{n.inputs, n.steps})
	}
	slices.Reverse(way)
	var joined []leg
	for _, l := range way {
		joined = join(joined, l)
	}
	return n, joined
}

func join(legs []leg, l leg) []leg {
	if last := len(legs) - 1; last >= 0 && slices.Equal(legs[last].inputs, l.inputs) {
		legs[last].steps += l.steps
		return legs
	}
	return append(legs, l)
}

// grace is how many more steps than on the first way the last leg may take.
const grace = 3

// attempt runs legs from a state and reports where the goal is reached.
func (a *assembler) attempt(from []int64, way []leg, g *goal) (legs []leg, ok bool) {
	a.probed.set(from)
	a.held = 0
	for i, l := range way {
		a.inputs = l.inputs
		a.probed.turn()
		most := l.steps
		if i == len(way)-1 {
			most += grace
		}
		for n := 0; n < most; {
			a.step()
			n++
			if a.reached(g) {
				return append(slices.Clone(way[:i]), leg{l.inputs, n}), true
			}
			leapt, still := a.probed.leap(most-n, 1)
			if still && n > 1 && i == len(way)-1 {
				return nil, false
			}
			n += leapt
			a.held += leapt
		}
	}
	return nil, false
}

// reached reports whether the step at hand reaches one goal.
func (a *assembler) reached(g *goal) bool {
	if g.choice == nil {
		return a.happened(g)
	}
	for i := range a.hits {
		if h := &a.hits[i]; a.choices[h.n] == g.choice {
			return a.away(g, h) == 0
		}
	}
	return false
}

// extend runs legs at the end of the present sequence, and ends a leg wherever
// a goal is reached, so that the state is looked at there.
func (a *assembler) extend(from []int64, way []leg) {
	d := a.drafts[len(a.drafts)-1]
	a.probed.set(from)
	a.held = 0
	for _, l := range way {
		a.inputs = l.inputs
		a.probed.turn()
		cut := 0
		for n := 0; n < l.steps; {
			a.step()
			n++
			before := len(a.found)
			a.last = 0
			a.judge()
			if len(a.found) > before {
				d.legs = append(d.legs, leg{l.inputs, n - cut})
				cut = n
			}
			leapt, _ := a.probed.leap(l.steps-n, 1)
			n += leapt
			a.held += leapt
		}
		if cut < l.steps {
			d.legs = append(d.legs, leg{l.inputs, l.steps - cut})
		}
	}
	a.here() // what follows is no start any more
}

// returns adds a sequence for each remembered start, long enough for what was
// remembered to show.
func (a *assembler) returns() {
	for _, root := range a.roots[1:] {
		d := &draft{record: root.record}
		a.at = root
		a.inputs = root.inputs
		for range 16 {
			a.probed.set(root.snap)
			a.held = 0
			a.step()
			if root.shown = a.showsMemory(); root.shown {
				break
			}
			a.inputs = a.pickInputs(root, nil)
		}
		d.legs = append(d.legs, leg{a.inputs, 1})
		a.drafts = append(a.drafts, d)
	}
}

// showsMemory reports whether each remembered value makes a difference in the
// step at hand.
func (a *assembler) showsMemory() bool {
	for i, v := range a.c.State {
		if !v.Survives {
			continue
		}
		other := slices.Clone(a.probed.before)
		if other[i]++; !v.Range.Holds(other[i]) {
			other[i] -= 2
		}
		if v.Range.Holds(other[i]) && !a.differs(a.plain, other) {
			return false
		}
	}
	return true
}

// refused gives starts from records that must not be believed.
func (s *search) refused() []Vector {
	vars := s.c.Survivors()
	if len(vars) == 0 {
		return nil
	}
	var good *logic.Record
	for _, r := range s.roots[1:] {
		for i, v := range vars {
			if r.record.Values[i] != v.Start {
				good = r.record
			}
		}
	}
	if good == nil {
		return nil
	}
	var vs []Vector
	add := func(why string, rec logic.Record) {
		inputs := make([]int64, len(s.c.Inputs))
		for i, v := range s.c.Inputs {
			inputs[i] = max(v.Range.Lo, 0)
		}
		v := s.recorded(&draft{record: &rec, legs: []leg{{inputs, 1}}})
		v.Why = why
		vs = append(vs, v)
	}
	add("a record with a wrong check word is refused", logic.Record{Values: good.Values, Check: good.Check ^ 1})
	add("a blank record is refused", logic.Record{Values: make([]int64, len(vars))})
	for i, v := range vars {
		values := slices.Clone(good.Values)
		values[i] = v.Range.Hi + 1
		switch values[i] {
		case 128, 256, 32768, 65536, 1 << 31:
			continue // the variable could not hold it
		}
		if v.Kind == logic.Bool {
			continue
		}
		add("a record with a value of "+v.Name+" that cannot be is refused", logic.Record{Values: values, Check: s.c.CheckWord(values)})
	}
	return vs
}

// upsets gives a step from an impossible value of each machine, with the rest
// as it is after a start.
func (s *search) upsets() []Upset {
	r := s.c.NewRun()
	var us []Upset
	for _, b := range s.c.Order {
		m, ok := b.(*logic.Machine)
		if !ok {
			continue
		}
		r.Start(nil)
		u := Upset{Machine: m.Var.Name, Inputs: make([]int64, len(s.c.Inputs))}
		state := r.Snapshot(nil)
		for i, v := range s.c.State {
			if v == m.Var {
				state[i] = int64(len(m.At))
			}
		}
		u.State = state[:len(s.c.State):len(s.c.State)]
		r.Restore(state)
		for i, v := range s.c.Inputs {
			u.Inputs[i] = max(v.Range.Lo, 0)
		}
		r.Step(u.Inputs)
		u.Outputs = slices.Clone(newReader(s.c).read(r))
		u.After = r.Snapshot(nil)[:len(s.c.State):len(s.c.State)]
		us = append(us, u)
	}
	return us
}

// told gives the goals in the order in which they were set.
func (s *search) told() (reached, missed []Goal) {
	for _, g := range s.goals {
		if s.broken[g.choice] != nil {
			continue
		}
		switch {
		case g.done && (g.root == nil || g.root.shown):
			reached = append(reached, g.Goal)
		case g.soft:
		default:
			if !g.Excluded && g.excluded() {
				g.Excluded = true
			}
			g.Why = "not found in the steps searched"
			if g.Excluded {
				g.Why = "its conditions exclude each other"
			}
			missed = append(missed, g.Goal)
		}
	}
	return reached, missed
}
