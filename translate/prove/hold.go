package prove

import (
	"math"
	"slices"

	"makebreak/translate/logic"
)

// leaper knows how far a program may be carried on with its inputs held and
// nothing but counters moving, without running the steps. A counter is a
// variable that is only ever compared with numbers, divided by a number, or
// counted on by itself: between two numbers at which one of these changes, one
// step is like the next.
type leaper struct {
	stops []counter // for each variable in State
}

type counter struct {
	free  bool    // may be leapt
	at    []int64 // numbers at which something may change, in order
	every int64   // and every multiple of this; 0: none
}

func newLeaper(p *logic.Program, state []*logic.Var) *leaper {
	l := &leaper{stops: make([]counter, len(state))}
	at := map[*logic.Var]*counter{}
	for i, v := range state {
		l.stops[i].free = v.Kind == logic.Int
		at[v] = &l.stops[i]
	}
	blocks := slices.Clone(p.Order)
	for _, prop := range p.Never {
		blocks = append(blocks, prop.Watch...)
		blocks = append(blocks, &logic.Define{Var: &logic.Var{}, As: prop.Bad})
	}
	for _, b := range blocks {
		switch b := b.(type) {
		case *logic.Timer:
			at[b.Var].stop(b.Limit.Value)
		case *logic.Machine:
			if b.Timer != nil {
				at[b.Timer].stop(b.Limit.Value)
			}
		}
		for _, part := range parts(b) {
			l.note(part.expr, part.writes, at)
		}
	}
	for i := range l.stops {
		slices.Sort(l.stops[i].at)
	}
	return l
}

func (c *counter) stop(v int64) { c.at = append(c.at, v) }

// note finds how an expression reads the variables.
func (l *leaper) note(e *logic.Expr, writes *logic.Var, at map[*logic.Var]*counter) {
	if own, ok := at[writes]; ok && own.free {
		if own.countsOn(e, writes) {
			l.noteOthers(e, writes, at)
			return
		}
		own.free = false
	}
	if reads(e) {
		if c, ok := at[e.Var]; ok {
			c.free = false
		}
		return
	}
	for i, a := range e.Args {
		c, ok := at[a.Var]
		if !reads(a) || !ok {
			l.note(a, nil, at)
			continue
		}
		other, isNumber := int64(0), false
		if len(e.Args) == 2 {
			other, isNumber = isConst(e.Args[1-i])
		}
		switch {
		case isNumber && e.Op.IsCompare():
			c.stop(other)
		case isNumber && e.Op == logic.OpDiv && i == 0 && other > 0:
			c.every = gcd(c.every, other)
		default:
			c.free = false
		}
	}
}

// noteOthers notes what an expression that counts v on reads besides v.
func (l *leaper) noteOthers(e *logic.Expr, v *logic.Var, at map[*logic.Var]*counter) {
	switch {
	case reads(e) && e.Var == v:
	case !mentions(e, v):
		l.note(e, nil, at)
	case e.Op == logic.OpSelect:
		l.note(e.Args[0], nil, at)
		l.noteOthers(e.Args[1], v, at)
		l.noteOthers(e.Args[2], v, at)
	default:
		l.noteOthers(e.Args[0], v, at)
	}
}

func mentions(e *logic.Expr, v *logic.Var) bool {
	found := false
	e.Walk(func(n *logic.Expr) { found = found || n.Var == v })
	return found
}

// countsOn reports whether an expression is v plus or minus numbers, held
// between numbers, or something that has nothing to do with v, or a choice
// between such, and notes the numbers.
func (c *counter) countsOn(e *logic.Expr, v *logic.Var) bool {
	if !mentions(e, v) {
		return true
	}
	switch e.Op {
	case logic.OpUse, logic.OpPrev:
		return true
	case logic.OpAdd, logic.OpSub:
		_, ok := isConst(e.Args[1])
		return ok && c.countsOn(e.Args[0], v)
	case logic.OpSelect:
		return c.countsOn(e.Args[1], v) && c.countsOn(e.Args[2], v)
	case logic.OpClamp:
		lo, ok1 := isConst(e.Args[1])
		hi, ok2 := isConst(e.Args[2])
		if !ok1 || !ok2 {
			return false
		}
		c.stop(lo)
		c.stop(hi)
		return c.countsOn(e.Args[0], v)
	}
	return false
}

// margin is how far before a number a leap ends, in steps, so that the values
// next to it are met one by one.
const margin = 2

// rounds gives how many more rounds of the given number of steps may be skipped
// after two rounds that took the variables from first over before to after, and
// 0 where something else than counters moved. Two rounds, because a variable
// that is put to a fixed value may look like a counter for one.
func (l *leaper) rounds(first, before, after []int64, period int64) int64 {
	rounds := int64(math.MaxInt32)
	for i, v := range after {
		d := v - before[i]
		if d == 0 && before[i] == first[i] {
			continue
		}
		if d != period || before[i]-first[i] != period || !l.stops[i].free {
			return 0
		}
		rounds = min(rounds, (l.stops[i].next(first[i])-margin-v)/period)
	}
	return max(rounds, 0)
}

// next is the first number from v on at which something may change.
func (c *counter) next(v int64) int64 {
	n := int64(math.MaxInt32)
	if i, _ := slices.BinarySearch(c.at, v); i < len(c.at) {
		n = c.at[i]
	}
	if c.every > 0 {
		n = min(n, (v/c.every+1)*c.every)
	}
	return n
}

func gcd(a, b int64) int64 {
	for b != 0 {
		a, b = b, a%b
	}
	return a
}

// carry moves the counters on by the rounds leapt.
func carry(before, after []int64, rounds int64) {
	for i := range after {
		after[i] += (after[i] - before[i]) * rounds
	}
}
