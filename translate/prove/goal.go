package prove

import (
	"fmt"
	"math/bits"

	"makebreak/translate/logic"
)

// Kind says what sort of thing a goal is.
type Kind string

const (
	StateGoal      Kind = "state"      // a machine is in a state
	TransitionGoal Kind = "transition" // a machine goes from one state to another
	OutcomeGoal    Kind = "outcome"    // a condition comes out one way
	AtomGoal       Kind = "term"       // a term of a condition decides what happens
	BoundaryGoal   Kind = "boundary"   // a comparison decides at its very boundary
	ChangeGoal     Kind = "change"     // a change of a variable, or the value of a number, shows
	TimerGoal      Kind = "timer"      // a timer reaches its limit, or stays at it
	StartGoal      Kind = "start"      // a start value shows, or a remembered one comes back
)

// Goal is something that the recorded inputs should make happen.
type Goal struct {
	Kind     Kind
	Machine  string // of a state or a transition: the machine's name
	From, To string // of a transition; To alone of a state
	Text     string // in words
	Why      string // why it was missed
	Excluded bool   // missed, and it can never happen: its conditions exclude each other
}

// goal is a Goal while it is looked for.
type goal struct {
	Goal
	soft  bool // not worth telling when missed
	done  bool
	node  *node
	best  []*node // where the search has been nearest to it
	dist  int     // how near
	tried int     // attempts since it last came nearer

	// One of these says when it is reached.
	choice *choice
	atom   int  // of the choice, or outcome
	value  bool // of the atom or the outcome
	near   near
	seen   func() bool
	slot   int   // in State: of a start value, or of the machine that a term asks
	wrong  int64 // what a start value, or the state asked for, must not be taken for
	change *logic.Program

	changed *logic.Run // of change, once it is asked for
	checks  int
	then    func() // what else is done when it is reached
	root    *node  // the start from what was remembered then
	rest    int    // steps to let pass before it is asked for again
}

const outcome = -1

// near is how far apart the sides of a comparison are to be.
type near uint8

const (
	anywhere near = iota
	equal
	oneApart
	unequal
	neighbour // the machine asked is in the state next to the one asked for
)

// distance is how far a step was from a goal of a choice: 0 when its atom
// decides as wanted, more the further the terms are from that.
func (g *goal) distance(atoms, same, next uint64) int {
	c := g.choice
	if g.atom == outcome {
		return 2 * c.tree.cost(g.value, atoms)
	}
	bit := uint64(1) << g.atom
	d := 2 * c.undecided(g.atom, atoms)
	if (atoms&bit != 0) != g.value {
		d += 2
	}
	switch g.near {
	case equal:
		if same&bit == 0 {
			d += 2
			if next&bit == 0 {
				d++
			}
		}
	case oneApart:
		if next&bit == 0 {
			d += 2
			if same&bit == 0 {
				d++
			}
		}
	case unequal:
		if same&bit != 0 && next&bit == 0 {
			d++
		}
	}
	return d
}

// mostAtoms is how many terms of a condition a probe tells apart.
const mostAtoms = 64

// goalsOf lists what is wanted of a choice.
func goalsOf(c *choice, ranges map[*logic.Expr]logic.Range, slots map[*logic.Var]int) []*goal {
	gs := outcomes(c)
	if len(c.atoms) > mostAtoms {
		return gs
	}
	for i, a := range c.atoms {
		for _, value := range []bool{true, false} {
			g := &goal{choice: c, atom: i, value: value}
			g.Kind, g.Text = AtomGoal, fmt.Sprintf("%s: (%s) %s decides", c.part.where, a, holds(value))
			gs = append(gs, g)
		}
		switch {
		case !a.Op.IsCompare():
		case a.Args[0].Kind == logic.Int:
			gs = append(gs, boundaries(c, i, a, ranges)...)
		case a.Args[0].Kind == logic.Word:
			gs = append(gs, mistaken(c, i, a, slots)...)
		}
	}
	return gs
}

func outcomes(c *choice) []*goal {
	var gs []*goal
	for _, value := range []bool{true, false} {
		g := &goal{choice: c, atom: outcome, value: value}
		g.Kind, g.Text = OutcomeGoal, fmt.Sprintf("%s: (%s) %s", c.part.where, c.part.expr, holds(value))
		if t := c.part.to; t != nil && value {
			g.Kind, g.Text = TransitionGoal, fmt.Sprintf("%s (%s)", t, t.way.Why)
			words := t.machine.Var.Enum.Words
			g.Machine, g.From, g.To = t.machine.Var.Name, words[t.from].Name, words[t.way.To].Name
		}
		if c.part.expr.Op == logic.OpLit && (c.part.expr.Value != 0) != value {
			continue
		}
		gs = append(gs, g)
	}
	return gs
}

func holds(value bool) string {
	if value {
		return "holds"
	}
	return "does not hold"
}

// boundaries lists what is wanted of a comparison of numbers: both sides the
// same, one apart on the other side, and further apart on the same side as
// where they are the same.
func boundaries(c *choice, i int, a *logic.Expr, ranges map[*logic.Expr]logic.Range) []*goal {
	same := a.Op == logic.OpEq || a.Op == logic.OpLe || a.Op == logic.OpGe
	want := func(n near, value bool, text string) *goal {
		g := &goal{choice: c, atom: i, value: value, near: n}
		g.Kind, g.Text = BoundaryGoal, fmt.Sprintf("%s: (%s) decides with %s", c.part.where, a, text)
		return g
	}
	gs := []*goal{
		want(equal, same, "both sides the same"),
		want(oneApart, !same, "its sides one apart"),
	}
	if a.Op != logic.OpEq && a.Op != logic.OpNe && beyond(a, ranges) {
		g := want(unequal, same, "its sides well apart")
		g.soft = true
		gs = append(gs, g)
	}
	return gs
}

// mistaken lists what is wanted of a term that asks a machine for its state:
// that the states before and after that one are told from it.
func mistaken(c *choice, i int, a *logic.Expr, slots map[*logic.Var]int) []*goal {
	var gs []*goal
	slot, ok := slots[a.Args[0].Var]
	if !ok || a.Args[1].Op != logic.OpLit {
		return nil
	}
	for _, n := range neighbours(a.Args[1]) {
		g := &goal{choice: c, atom: i, value: a.Op == logic.OpNe, near: neighbour, slot: slot, wrong: n, soft: true}
		g.Kind, g.Text = AtomGoal, fmt.Sprintf("%s: (%s) is told from %s", c.part.where, a, a.Args[0].Enum.Words[n].Name)
		gs = append(gs, g)
	}
	return gs
}

// beyond reports whether a comparison can have the outcome of equal sides
// without equal sides.
func beyond(a *logic.Expr, ranges map[*logic.Expr]logic.Range) bool {
	l, r := ranges[a.Args[0]], ranges[a.Args[1]]
	if a.Op == logic.OpGe || a.Op == logic.OpLt {
		return l.Hi > r.Lo
	}
	return l.Lo < r.Hi
}

// excluded finds out whether a goal of a choice contradicts itself, whatever
// the program does: no value of the variables that its terms read would do.
// It says no where there is too much to try.
func (g *goal) excluded() bool {
	if g.choice == nil || len(g.choice.atoms) > mostAtoms {
		return false
	}
	r := newReadings(g.choice.atoms)
	if r == nil {
		return false
	}
	for {
		atoms, same, next := r.now()
		if g.distance(atoms, same, next) == 0 {
			return false
		}
		if !r.advance() {
			return true
		}
	}
}

// mostReadings bounds the values tried by excluded.
const mostReadings = 1 << 14

// readings walks through all values that matter of what the atoms read.
type readings struct {
	atoms []*logic.Expr
	names map[reading]int
	doms  [][]int64
	at    []int
}

type reading struct {
	v    *logic.Var
	prev bool
	atom int // a term of its own, free to be true or false
}

func newReadings(atoms []*logic.Expr) *readings {
	r := &readings{atoms: atoms, names: map[reading]int{}}
	for i, a := range atoms {
		v, c := simple(a)
		if v == nil {
			r.domain(reading{atom: i + 1}, 0, 1)
			continue
		}
		key := reading{v: v.Var, prev: v.Op == logic.OpPrev}
		if v.Var.Kind != logic.Int {
			for n := v.Var.Range.Lo; n <= v.Var.Range.Hi; n++ {
				r.domain(key, n)
			}
			continue
		}
		for _, n := range []int64{c - 2, c - 1, c, c + 1, c + 2} {
			if v.Var.Range.Holds(n) {
				r.domain(key, n)
			}
		}
	}
	product := 1
	for _, d := range r.doms {
		if product *= len(d); product > mostReadings {
			return nil
		}
	}
	r.at = make([]int, len(r.doms))
	return r
}

func (r *readings) domain(k reading, values ...int64) {
	i, ok := r.names[k]
	if !ok {
		i = len(r.doms)
		r.names[k] = i
		r.doms = append(r.doms, nil)
	}
	for _, v := range values {
		if !has(r.doms[i], v) {
			r.doms[i] = append(r.doms[i], v)
		}
	}
}

func has(vs []int64, v int64) bool {
	for _, x := range vs {
		if x == v {
			return true
		}
	}
	return false
}

// simple gives what an atom reads and the number it compares it with, where it
// is as simple as that.
func simple(a *logic.Expr) (read *logic.Expr, c int64) {
	if reads(a) {
		return a, 0
	}
	if !a.Op.IsCompare() || !reads(a.Args[0]) {
		return nil, 0
	}
	c, ok := isConst(a.Args[1])
	if !ok {
		return nil, 0
	}
	return a.Args[0], c
}

// now gives what the atoms come out as, for the present values.
func (r *readings) now() (atoms, same, next uint64) {
	value := func(k reading) int64 { i := r.names[k]; return r.doms[i][r.at[i]] }
	for i, a := range r.atoms {
		read, c := simple(a)
		var t bool
		switch {
		case read == nil:
			t = value(reading{atom: i + 1}) != 0
			same |= 1 << i // how near its sides are is not known: either way
			next |= 1 << i
		case reads(a):
			t = value(reading{v: read.Var, prev: read.Op == logic.OpPrev}) != 0
		default:
			v := value(reading{v: read.Var, prev: read.Op == logic.OpPrev})
			t = compare(a.Op, v, c)
			if v == c {
				same |= 1 << i
			}
			if v-c == 1 || c-v == 1 {
				next |= 1 << i
			}
		}
		if t {
			atoms |= 1 << i
		}
	}
	return atoms, same, next
}

func compare(op logic.Op, a, b int64) bool {
	switch op {
	case logic.OpEq:
		return a == b
	case logic.OpNe:
		return a != b
	case logic.OpLt:
		return a < b
	case logic.OpLe:
		return a <= b
	case logic.OpGt:
		return a > b
	}
	return a >= b
}

func (r *readings) advance() bool {
	for i := range r.at {
		if r.at[i]++; r.at[i] < len(r.doms[i]) {
			return true
		}
		r.at[i] = 0
	}
	return false
}

// inputsOf lists the numbers of the set bits.
func inputsOf(mask uint64) []int {
	var is []int
	for ; mask != 0; mask &= mask - 1 {
		is = append(is, bits.TrailingZeros64(mask))
	}
	return is
}
