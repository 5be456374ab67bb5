package prove

import (
	"slices"

	"makebreak/translate/logic"
)

// search looks for inputs that reach goals. It keeps a tree of states that it
// has been in, each with the way that leads there; for each goal it remembers
// the states from which it came nearest to it, and goes on from those with
// other inputs.
type search struct {
	c        *logic.Checked // the program as it was given
	ready    *logic.Checked // the form that is searched
	own      int            // how many of its blocks are the program's own
	verdicts []*logic.Var   // in it, of the properties
	levels   *levels
	leaper   *leaper
	given    *leaper // of the program as it was given
	random   random

	budget   int
	patience int // steps without anything new after which the search ends
	spent    int
	news     int // spent when something new was found last

	probed  *driver
	plain   *logic.Run // of the same program
	choices []*choice
	broken  map[*choice]*logic.Property
	goals   []*goal
	found   []*goal // in the order in which they were reached
	watch   []*goal // goals that look at the state, not reached yet
	starts  []*goal // goals of the first step, not reached yet
	changes []*goal // goals that run a changed program, not reached yet

	roots []*node // starts; the first with nothing remembered
	swept int     // roots from which every input has been tried
	fresh []*node // states that are unlike all others
	known map[uint64]bool

	// The step at hand.
	at      *node // last node on the way
	inputs  []int64
	held    int // steps since that node
	hits    []hit
	pattern uint64 // of all decisions in the step, and of the step before
	last    uint64
	out     []int64
	read    bool // out is of this step
	buf     []int64

	thorough bool // look at every goal in every step
	violated []*violation
}

// hit is a decision as it was taken in the present step.
type hit struct {
	n                 int32
	outcome           bool
	shown, asked      bool // whether its flip has been tried, and showed
	atoms, same, next uint64
}

// violation is where a property was first found broken.
type violation struct {
	property *logic.Property
	at       *node
}

// node is a state of the program, and how it was reached: from another one by
// holding inputs for some steps.
type node struct {
	parent *node
	inputs []int64
	steps  int
	snap   []int64
	record *logic.Record // of a root
	shown  bool          // of a root: what was remembered makes a difference in the recorded step
	tried  int
}

func newSearch(c *logic.Checked, budget int) *search {
	s := &search{c: c, budget: budget, random: 0x9E3779B97F4A7C15, known: map[uint64]bool{}, broken: map[*choice]*logic.Property{}}
	s.ready, s.own, s.verdicts = prepared(c)
	s.levels = newLevels(s.ready)
	s.leaper = newLeaper(s.ready.Program, lasting(s.ready))
	s.given = newLeaper(c.Program, lasting(c))
	run := s.ready.NewProbed()
	s.probed = &driver{run: run, leaper: s.leaper}
	s.plain = s.ready.NewRun()
	s.choices = choicesOf(s.ready, run.Decisions(), s.levels)
	run.Probe = s.note
	s.out = make([]int64, len(c.Outputs))
	s.setGoals()
	s.root(nil, s.rest())
	return s
}

// lasting lists all that lives from step to step, in the order of a snapshot.
func lasting(c *logic.Checked) []*logic.Var {
	vs := slices.Clone(c.State)
	for _, p := range c.Never {
		vs = append(vs, p.Kept...)
	}
	return vs
}

// root adds a start from a record.
func (s *search) root(rec *logic.Record, inputs []int64) *node {
	s.plain.Start(rec)
	n := &node{record: rec, inputs: inputs, snap: s.plain.Snapshot(nil)}
	s.fresh = append(s.fresh, n)
	s.roots = append(s.roots, n)
	return n
}

// rest gives inputs to start from: numbers in the middle of what matters.
func (s *search) rest() []int64 {
	inputs := make([]int64, len(s.c.Inputs))
	for i, v := range s.c.Inputs {
		if v.Kind == logic.Int {
			vs := s.levels.values[i]
			inputs[i] = vs[len(vs)/2]
		}
	}
	return inputs
}

// settles is how many changes are waited for where every input is tried.
const settles = 8

// sweep tries every value of every input from a start, one input at a time,
// for one step and for as long as it takes to settle.
func (s *search) sweep(root *node) {
	for i := range s.c.Inputs {
		for _, v := range s.levels.values[i] {
			inputs := slices.Clone(root.inputs)
			inputs[i] = v
			s.hold(root, inputs, 1)
			s.hold(root, inputs, -settles)
		}
	}
}

// note is called at every decision of a step.
func (s *search) note(d int, outcome bool, atoms, same, next uint64) {
	h := (s.pattern ^ uint64(d) ^ atoms<<8 ^ same<<28 ^ next<<46) * 0x9E3779B97F4A7C15
	s.pattern = h ^ h>>29
	if len(s.choices[d].open) > 0 {
		s.hits = append(s.hits, hit{n: int32(d), outcome: outcome, atoms: atoms, same: same, next: next})
	}
}

// run searches until the budget is used up, nothing is left to find, or
// nothing new has been found for too long.
func (s *search) run() {
	for s.spent < s.budget && s.spent-s.news < s.patience {
		if s.swept < len(s.roots) {
			s.sweep(s.roots[s.swept])
			s.swept++
			continue
		}
		g := s.pick()
		if g == nil && s.left() == 0 {
			return
		}
		from := s.pickNode(g)
		from.tried++
		steps := s.pickSteps()
		s.hold(from, s.pickInputs(from, g), steps)
		for n := 0; n < 4 && s.random.below(3) > 0; n++ {
			from = s.here()
			s.hold(from, s.pickInputs(from, g), 1)
		}
	}
}

func (s *search) left() int {
	n := 0
	for _, g := range s.goals {
		if !g.done && !g.Excluded {
			n++
		}
	}
	return n
}

// hopeless is after how many fruitless attempts a goal is examined for a
// contradiction.
const hopeless = 6

// pick chooses the goal that has been tried least since it last came nearer,
// now and then none at all.
func (s *search) pick() *goal {
	if s.random.below(4) == 0 {
		return nil
	}
	var least *goal
	for _, g := range s.goals {
		if g.done || g.Excluded || len(g.best) == 0 {
			continue
		}
		if least == nil || g.tried < least.tried {
			least = g
		}
	}
	if least != nil {
		if least.tried++; least.tried == hopeless && least.excluded() {
			least.Excluded = true
			s.close(least)
			return nil
		}
	}
	return least
}

// close stops looking for a goal.
func (s *search) close(g *goal) {
	is := func(o *goal) bool { return o == g }
	if g.choice != nil {
		g.choice.open = slices.DeleteFunc(g.choice.open, is)
		return
	}
	s.watch = slices.DeleteFunc(s.watch, is)
	s.starts = slices.DeleteFunc(s.starts, is)
	s.changes = slices.DeleteFunc(s.changes, is)
}

func (s *search) pickNode(g *goal) *node {
	if g != nil {
		return g.best[s.random.below(len(g.best))]
	}
	// The least tried of three.
	n := s.fresh[s.random.below(len(s.fresh))]
	for range 2 {
		if o := s.fresh[s.random.below(len(s.fresh))]; o.tried < n.tried {
			n = o
		}
	}
	return n
}

// pickInputs changes one or a few of the inputs that led to a state, rather
// those that matter to the goal.
func (s *search) pickInputs(from *node, g *goal) []int64 {
	inputs := slices.Clone(from.inputs)
	if len(inputs) == 0 {
		return inputs
	}
	var direct, behind []int
	if g != nil && g.choice != nil {
		direct, behind = inputsOf(g.choice.inputs[0]), inputsOf(g.choice.inputs[1])
	}
	changes := 1
	switch s.random.below(8) {
	case 0:
		changes = 0
	case 1, 2:
		changes = 2
	case 3:
		changes = len(inputs)
	}
	for range changes {
		i := s.random.below(len(inputs))
		switch s.random.below(4) {
		case 0, 1:
			if len(direct) > 0 {
				i = direct[s.random.below(len(direct))]
			}
		case 2:
			if len(behind) > 0 {
				i = behind[s.random.below(len(behind))]
			}
		}
		inputs[i] = s.pickValue(i, from)
	}
	return inputs
}

// pickValue chooses a value of an input: a boundary, or one that is near a
// remembered value.
func (s *search) pickValue(i int, from *node) int64 {
	l := s.levels
	if len(l.steps[i]) > 0 && len(l.carries[i]) > 0 && s.random.below(4) == 0 {
		v := from.snap[l.carries[i][s.random.below(len(l.carries[i]))]]
		v += l.steps[i][s.random.below(len(l.steps[i]))] + int64(s.random.below(3)) - 1
		r := s.c.Inputs[i].Range
		return min(max(v, r.Lo), r.Hi)
	}
	return l.values[i][s.random.below(len(l.values[i]))]
}

// pickSteps chooses how long to hold the inputs: a few steps, or (negative)
// until so many changes have been seen.
func (s *search) pickSteps() int {
	switch n := s.random.below(10); {
	case n < 4:
		return 1 + n
	case n < 6:
		return 1
	case n < 7:
		return 3
	default:
		return -(1 + s.random.below(6))
	}
}

// longestHold bounds the steps that are really run while inputs are held until
// something changes.
const longestHold = 400

// hold holds inputs from a state for a number of steps or, if steps is
// negative, until the decisions have changed so many times or nothing moves
// any more. Wherever something new comes up, the state is kept.
func (s *search) hold(from *node, inputs []int64, steps int) {
	s.probed.set(from.snap)
	s.at, s.held, s.inputs, s.last = from, 0, inputs, 0
	changes, limit := 0, steps
	if steps < 0 {
		changes, limit = -steps, longestHold
	}
	for n := range limit {
		last := s.last
		s.step()
		s.judge()
		if steps > 0 {
			continue
		}
		if n > 0 && s.pattern != last {
			if changes--; changes == 0 {
				break
			}
		}
		leapt, still := s.probed.leap(farthest, 1)
		if still {
			break
		}
		s.held += leapt
	}
	if s.held > 0 {
		s.novel()
	}
}

// farthest is longer than any counter counts.
const farthest = 1 << 31

// step runs one step and notes its decisions.
func (s *search) step() {
	s.hits = s.hits[:0]
	s.pattern = 0
	s.read = false
	s.probed.step(s.inputs)
	s.held++
	s.spent++
}

// here makes the present state a node.
func (s *search) here() *node {
	if s.held == 0 {
		return s.at
	}
	s.at = &node{parent: s.at, inputs: s.inputs, steps: s.held, snap: slices.Clone(s.probed.after)}
	s.held = 0
	return s.at
}

// mostFresh bounds how many unlike states are kept.
const mostFresh = 2000

// novel keeps the present state if it is unlike all others.
func (s *search) novel() {
	sig := s.signature(s.probed.after)
	if s.known[sig] || len(s.fresh) >= mostFresh {
		return
	}
	s.known[sig] = true
	s.fresh = append(s.fresh, s.here())
}

// signature is alike for states that the program tells apart by nothing but
// how far its counters and remembered values are.
func (s *search) signature(state []int64) uint64 {
	h := uint64(14695981039346656037)
	for i, v := range s.ready.State {
		x := state[i]
		if v.Kind == logic.Int {
			c := &s.leaper.stops[i]
			if !c.free {
				continue
			}
			at, exact := slices.BinarySearch(c.at, x)
			x = int64(2 * at)
			if exact {
				x++
			}
		}
		h = (h ^ uint64(x)) * 0x100000001B3
	}
	return h
}

// random is a small generator of numbers, the same at every run (Marsaglia,
// Xorshift RNGs, 2003, 64 bits, shifts 13, 7, 17).
type random uint64

func (r *random) below(n int) int {
	x := *r
	x ^= x << 13
	x ^= x >> 7
	x ^= x << 17
	*r = x
	return int(uint64(x>>16) % uint64(n))
}

// rememberedRoot gives a start from what would be remembered now.
func (s *search) rememberedRoot() *node {
	s.plain.Restore(s.probed.after)
	rec := s.plain.Remember()
	for _, r := range s.roots[1:] {
		if slices.Equal(r.record.Values, rec.Values) {
			return r
		}
	}
	return s.root(&rec, s.inputs)
}
