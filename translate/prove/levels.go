package prove

import (
	"slices"

	"makebreak/translate/logic"
)

// levels are the values of the inputs that are worth trying: for each input,
// the boundaries of all comparisons that it, or a variable made of it, can meet.
type levels struct {
	prog   *logic.Program
	number map[*logic.Var]int // of the inputs
	stateN map[*logic.Var]int // place of a variable in State
	writes map[*logic.Var][]*logic.Expr
	locals map[*logic.Var]*logic.Expr // what a local stands for
	guards map[*logic.Var]uint64      // inputs that a machine's guards read directly
	feeds  map[*logic.Var]uint64      // inputs whose values a variable carries

	values  [][]int64
	spread  []bool    // arithmetic is done on it: try values in between as well
	steps   [][]int64 // differences from remembered values that matter
	carries [][]int   // variables in State that carry the input's values
}

// mostInputs is how many inputs are told apart; the rest count as one.
const mostInputs = 64

func bitOf(i int) uint64 { return 1 << min(i, mostInputs-1) }

func newLevels(c *logic.Checked) *levels {
	l := &levels{
		prog: c.Program, number: map[*logic.Var]int{}, stateN: map[*logic.Var]int{},
		writes: map[*logic.Var][]*logic.Expr{}, locals: map[*logic.Var]*logic.Expr{},
		guards: map[*logic.Var]uint64{}, feeds: map[*logic.Var]uint64{},
	}
	for i, v := range c.Inputs {
		l.number[v] = i
		l.feeds[v] = bitOf(i)
	}
	for i, v := range c.State {
		l.stateN[v] = i
	}
	n := len(c.Inputs)
	l.values, l.spread, l.steps, l.carries = make([][]int64, n), make([]bool, n), make([][]int64, n), make([][]int, n)
	l.noteWrites()
	l.follow()
	l.compared()
	l.machineGuards()
	l.finish()
	return l
}

func (l *levels) noteWrites() {
	for _, b := range l.prog.Order {
		if d, ok := b.(*logic.Define); ok {
			l.locals[d.Var] = d.As
		}
		for _, p := range parts(b) {
			if p.writes != nil {
				l.writes[p.writes] = append(l.writes[p.writes], p.expr)
			}
		}
	}
}

// follow finds which inputs' values each variable can carry.
func (l *levels) follow() {
	for changed := true; changed; {
		changed = false
		for _, b := range l.prog.Order {
			for _, p := range parts(b) {
				if p.writes == nil || p.writes.Kind != logic.Int {
					continue
				}
				if m := l.feeds[p.writes] | l.carried(p.expr); m != l.feeds[p.writes] {
					l.feeds[p.writes] = m
					changed = true
				}
			}
		}
	}
}

// carried gives the inputs whose values flow into that of an expression.
func (l *levels) carried(e *logic.Expr) uint64 {
	if reads(e) {
		return l.feeds[e.Var]
	}
	args := e.Args
	switch {
	case e.Op == logic.OpSelect:
		args = args[1:]
	case e.Kind != logic.Int:
		return 0
	}
	var m uint64
	for _, a := range args {
		m |= l.carried(a)
	}
	return m
}

// compared traces the number of each comparison back to the inputs, and so the
// bounds that something is held within and the points of tables.
func (l *levels) compared() {
	back := func(e *logic.Expr, want ...int64) { l.trace(e, want, map[*logic.Var]bool{}) }
	l.each(func(e *logic.Expr) {
		switch {
		case e.Op == logic.OpLookup:
			l.spreadOver(e)
			back(e.Args[0], about(e.Table.X)...)
		case e.Op == logic.OpClamp:
			for _, bound := range e.Args[1:] {
				if c, ok := isConst(bound); ok {
					back(e.Args[0], c-1, c, c+1)
				}
			}
		case e.Op.IsCompare() && e.Args[0].Kind == logic.Int:
			a, b := e.Args[0], e.Args[1]
			if c, ok := isConst(b); ok {
				back(a, c-1, c, c+1)
			} else if c, ok := isConst(a); ok {
				back(b, c-1, c, c+1)
			} else {
				l.relative(l.carried(a)&l.carried(b), 0)
			}
		}
	})
}

// about lists numbers and their neighbours.
func about(vs []int64) []int64 {
	var out []int64
	for _, v := range vs {
		out = append(out, v-1, v, v+1)
	}
	return out
}

// each calls f for every node of the step.
func (l *levels) each(f func(*logic.Expr)) {
	for _, b := range l.prog.Order {
		logic.Expressions(b, func(e *logic.Expr) { e.Walk(f) })
	}
}

// trace asks for inputs that give an expression one of the values.
func (l *levels) trace(e *logic.Expr, want []int64, seen map[*logic.Var]bool) {
	if l.carried(e) == 0 {
		return
	}
	shifted := func(f func(int64) int64) []int64 {
		out := make([]int64, len(want))
		for i, v := range want {
			out[i] = f(v)
		}
		return out
	}
	switch e.Op {
	case logic.OpUse, logic.OpPrev:
		l.traceVar(e.Var, want, seen)
	case logic.OpSelect:
		l.trace(e.Args[1], want, seen)
		l.trace(e.Args[2], want, seen)
	case logic.OpLookup:
		l.spreadOver(e)
		l.trace(e.Args[0], inverse(e.Table, want), seen)
	case logic.OpAdd, logic.OpSub:
		l.traceSum(e, want, seen, shifted)
	case logic.OpMul:
		l.spreadOver(e)
		if k, ok := isConst(e.Args[1]); ok && k != 0 {
			l.trace(e.Args[0], append(shifted(func(v int64) int64 { return v / k }), shifted(func(v int64) int64 { return v/k + 1 })...), seen)
		}
	case logic.OpDiv:
		l.spreadOver(e)
		if k, ok := isConst(e.Args[1]); ok {
			l.trace(e.Args[0], append(shifted(func(v int64) int64 { return v * k }), shifted(func(v int64) int64 { return v*k - 1 })...), seen)
		}
	default: // Clamp, Toward
		if e.Op == logic.OpToward {
			l.spreadOver(e)
		}
		for _, a := range e.Args {
			l.trace(a, want, seen)
		}
	}
}

func (l *levels) traceVar(v *logic.Var, want []int64, seen map[*logic.Var]bool) {
	if i, ok := l.number[v]; ok {
		l.values[i] = append(l.values[i], want...)
		return
	}
	if seen[v] {
		return
	}
	seen[v] = true
	for _, w := range l.writes[v] {
		l.trace(w, want, seen)
	}
	delete(seen, v)
}

func (l *levels) traceSum(e *logic.Expr, want []int64, seen map[*logic.Var]bool, shifted func(func(int64) int64) []int64) {
	a, b := e.Args[0], e.Args[1]
	plus := e.Op == logic.OpAdd
	if k, ok := isConst(b); ok {
		l.trace(a, shifted(func(v int64) int64 {
			if plus {
				return v - k
			}
			return v + k
		}), seen)
		return
	}
	if k, ok := isConst(a); ok {
		l.trace(b, shifted(func(v int64) int64 {
			if plus {
				return v - k
			}
			return k - v
		}), seen)
		return
	}
	both := l.carried(a) | l.carried(b)
	for _, v := range want {
		l.relative(both, v)
	}
}

// relative notes a difference from a remembered value that matters.
func (l *levels) relative(inputs uint64, by int64) {
	for _, i := range inputsOf(inputs) {
		if !has(l.steps[i], by) {
			l.steps[i] = append(l.steps[i], by)
		}
		if !has(l.steps[i], -by) {
			l.steps[i] = append(l.steps[i], -by)
		}
	}
}

func (l *levels) spreadOver(e *logic.Expr) {
	for _, i := range inputsOf(l.carried(e)) {
		l.spread[i] = true
	}
}

// inverse lists the numbers at which a table passes the values.
func inverse(t *logic.Table, want []int64) []int64 {
	var xs []int64
	for i := 1; i < len(t.X); i++ {
		lo, hi := min(t.Y[i-1], t.Y[i]), max(t.Y[i-1], t.Y[i])
		for _, y := range want {
			if y < lo || y > hi || lo == hi {
				continue
			}
			x := t.X[i-1] + (y-t.Y[i-1])*(t.X[i]-t.X[i-1])/(t.Y[i]-t.Y[i-1])
			xs = append(xs, x-1, x, x+1)
		}
	}
	return xs
}

// machineGuards notes which inputs the guards of each machine read directly.
func (l *levels) machineGuards() {
	for _, b := range l.prog.Order {
		m, ok := b.(*logic.Machine)
		if !ok {
			continue
		}
		for _, p := range parts(b) {
			l.guards[m.Var] |= l.direct(p.expr, 0)
		}
	}
}

// direct gives the inputs that an expression is worked out from in the same step.
func (l *levels) direct(e *logic.Expr, depth int) uint64 {
	var m uint64
	e.Walk(func(n *logic.Expr) {
		if !reads(n) {
			return
		}
		m |= l.feeds[n.Var]
		if as, ok := l.locals[n.Var]; ok && depth < 6 {
			m |= l.direct(as, depth+1)
		}
	})
	return m
}

// behind gives the inputs that a condition is made of: directly, and through
// the machines that it asks for their state.
func (l *levels) behind(e *logic.Expr) [2]uint64 {
	m := [2]uint64{l.direct(e, 0), 0}
	var visit func(e *logic.Expr, depth int)
	visit = func(e *logic.Expr, depth int) {
		e.Walk(func(n *logic.Expr) {
			if !reads(n) {
				return
			}
			m[1] |= l.guards[n.Var]
			for _, w := range l.writes[n.Var] {
				m[1] |= l.direct(w, 0)
			}
			if as, ok := l.locals[n.Var]; ok && depth < 6 {
				visit(as, depth+1)
			}
		})
	}
	visit(e, 0)
	return m
}

// finish adds the ends of each range, and puts the values in order.
func (l *levels) finish() {
	for i, v := range l.prog.Inputs {
		vs := l.values[i]
		if v.Kind != logic.Int {
			vs = nil
			for n := v.Range.Lo; n <= v.Range.Hi; n++ {
				vs = append(vs, n)
			}
			l.values[i] = vs
			continue
		}
		if l.spread[i] {
			vs = append(vs, between(vs, v.Range)...)
		}
		vs = append(vs, v.Range.Lo, v.Range.Hi)
		if v.Range.Holds(0) {
			vs = append(vs, 0)
		}
		vs = slices.DeleteFunc(vs, func(n int64) bool { return !v.Range.Holds(n) })
		slices.Sort(vs)
		l.values[i] = slices.Compact(vs)
		for s, w := range l.prog.State {
			if w.Kind == logic.Int && l.feeds[w]&bitOf(i) != 0 {
				l.carries[i] = append(l.carries[i], s)
			}
		}
	}
}

// between gives values evenly spread between the outermost ones that matter.
func between(vs []int64, r logic.Range) []int64 {
	lo, hi := r.Lo, r.Hi
	inside := slices.DeleteFunc(slices.Clone(vs), func(n int64) bool { return !r.Holds(n) })
	if len(inside) > 1 {
		lo, hi = slices.Min(inside), slices.Max(inside)
	}
	const pieces = 8
	var out []int64
	for i := int64(0); i <= pieces; i++ {
		out = append(out, lo+(hi-lo)*i/pieces)
	}
	return out
}
