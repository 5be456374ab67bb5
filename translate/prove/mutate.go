package prove

import (
	"fmt"
	"slices"

	"makebreak/translate/logic"
)

// Mutant is a program with one small mistake put into it.
type Mutant struct {
	What    string // what was changed, and where
	Program *logic.Program
}

// Mutants lists every program that differs from p in one small thing: a number
// one more or one less, another comparison, "and" for "or", a missing "not", a
// change of a variable left out, a transition that leads to another state,
// another start value, a bound left off. Some of them may be of the same
// effect as p. A mutant need not pass logic.Check; Lives runs it all the same.
func Mutants(p *logic.Program) []Mutant {
	m := &mutator{p: p}
	m.constants()
	m.out = append(m.out, tableMutants(p)...)
	for i, b := range p.Order {
		m.block(i, b)
		for n, part := range parts(b) {
			m.expression(i, n, part)
		}
	}
	m.starts()
	return m.out
}

type mutator struct {
	p   *logic.Program
	out []Mutant
}

func (m *mutator) add(p *logic.Program, format string, args ...any) {
	m.out = append(m.out, Mutant{What: fmt.Sprintf(format, args...), Program: p})
}

// constants makes each named number one more and one less, wherever it is used.
func (m *mutator) constants() {
	divisors, used := divisors(m.p), used(m.p)
	for i, c := range m.p.Consts {
		if !used[c] {
			continue // it says where another number came from
		}
		for _, d := range []int64{-1, 1} {
			if c.Value+d == 0 && divisors[c] {
				continue
			}
			other := *c
			other.Value += d
			q := *m.p
			q.Consts = slices.Clone(m.p.Consts)
			q.Consts[i] = &other
			q.Order = substituted(m.p.Order, c, &other)
			m.add(&q, "%s %d instead of %d", c.Name, other.Value, c.Value)
		}
	}
}

// used lists the constants that a step reads.
func used(p *logic.Program) map[*logic.Const]bool {
	found := map[*logic.Const]bool{}
	for _, b := range p.Order {
		switch b := b.(type) {
		case *logic.Timer:
			found[b.Limit] = true
		case *logic.Machine:
			found[b.Limit] = true
		}
		logic.Expressions(b, func(e *logic.Expr) {
			e.Walk(func(n *logic.Expr) {
				if n.Op == logic.OpConst {
					found[n.Const] = true
				}
			})
		})
	}
	return found
}

// divisors lists the constants that something is divided by.
func divisors(p *logic.Program) map[*logic.Const]bool {
	found := map[*logic.Const]bool{}
	for _, b := range p.Order {
		logic.Expressions(b, func(e *logic.Expr) {
			e.Walk(func(n *logic.Expr) {
				if n.Op == logic.OpDiv || n.Op == logic.OpToward {
					if last := n.Args[len(n.Args)-1]; last.Op == logic.OpConst {
						found[last.Const] = true
					}
				}
			})
		})
	}
	return found
}

// substituted is the order with one constant in place of another.
func substituted(order []logic.Block, from, to *logic.Const) []logic.Block {
	swap := func(n *logic.Expr) *logic.Expr {
		if n.Op == logic.OpConst && n.Const == from {
			n.Const = to
		}
		return n
	}
	return rewritten(order, func(e *logic.Expr) *logic.Expr { return rebuilt(e, swap) }, func(b logic.Block) {
		switch b := b.(type) {
		case *logic.Timer:
			if b.Limit == from {
				b.Limit = to
			}
		case *logic.Machine:
			if b.Limit == from {
				b.Limit = to
			}
		}
	})
}

// rewritten copies every block, with f applied to its expressions and then
// tail to the copy.
func rewritten(order []logic.Block, f func(*logic.Expr) *logic.Expr, tail func(logic.Block)) []logic.Block {
	out := make([]logic.Block, len(order))
	for i, b := range order {
		out[i] = mapped(b, f)
		tail(out[i])
	}
	return out
}

// tableMutants moves each point of each table by one.
func tableMutants(p *logic.Program) []Mutant {
	m := &mutator{p: p}
	for i, t := range p.Tables {
		for n := range t.X {
			for _, d := range []int64{-1, 1} {
				m.table(i, t, fmt.Sprintf("value %d of %s %+d", n+1, t.Name, d), func(c *logic.Table) { c.Y[n] += d })
				m.table(i, t, fmt.Sprintf("point %d of %s %+d", n+1, t.Name, d), func(c *logic.Table) { c.X[n] += d })
			}
		}
	}
	return m.out
}

// table puts a changed copy in place of a table, unless its points no longer rise.
func (m *mutator) table(i int, t *logic.Table, what string, change func(*logic.Table)) {
	other := *t
	other.X, other.Y = slices.Clone(t.X), slices.Clone(t.Y)
	change(&other)
	for n := 1; n < len(other.X); n++ {
		if other.X[n] <= other.X[n-1] {
			return
		}
	}
	swap := func(n *logic.Expr) *logic.Expr {
		if n.Table == t {
			n.Table = &other
		}
		return n
	}
	q := *m.p
	q.Tables = slices.Clone(m.p.Tables)
	q.Tables[i] = &other
	q.Order = rewritten(m.p.Order, func(e *logic.Expr) *logic.Expr { return rebuilt(e, swap) }, func(logic.Block) {})
	m.add(&q, "%s", what)
}

// block leaves out what a block does, and sends transitions elsewhere.
func (m *mutator) block(i int, b logic.Block) {
	switch b := b.(type) {
	case *logic.Set:
		m.add(withBlock(m.p, i, unchanged(b)), "change of %s left out", b.Var.Name)
	case *logic.Machine:
		for s := range b.At {
			for t := range b.At[s].Goes {
				m.transition(i, b, s, t)
			}
		}
	}
}

// unchanged is a Set that does nothing.
func unchanged(s *logic.Set) *logic.Set {
	c := *s
	c.To, c.When = logic.Prev(s.Var), nil
	return &c
}

func (m *mutator) transition(i int, b *logic.Machine, s, t int) {
	way := &transition{machine: b, from: s, way: b.At[s].Goes[t]}
	for to := range b.At {
		if to == way.way.To {
			continue
		}
		c := copied(b)
		c.At[s].Goes[t].To = to
		m.add(withBlock(m.p, i, c), "%s leads to %s", way, b.Var.Enum.Words[to].Name)
	}
	for n, a := range way.way.Do {
		m.add(withBlock(m.p, i, withoutAction(b, s, t, n)), "%s, change of %s left out", way, a.Var.Name)
	}
}

func copied(b *logic.Machine) *logic.Machine {
	return mapped(b, func(e *logic.Expr) *logic.Expr { return e }).(*logic.Machine)
}

// withoutAction is a machine with the n-th action of a transition left out.
func withoutAction(b *logic.Machine, state, way, n int) *logic.Machine {
	c := copied(b)
	t := c.At[state].Goes[way]
	t.Do = slices.Delete(t.Do, n, n+1)
	return c
}

// expression changes one node of an expression at a time.
func (m *mutator) expression(i, n int, p part) {
	at := 0
	var visit func(e *logic.Expr, divides bool)
	visit = func(e *logic.Expr, divides bool) {
		here := at
		at++
		for _, c := range changes(e, divides) {
			block := replaced(m.p.Order[i], n, func(whole *logic.Expr) *logic.Expr {
				return edited(whole, here, func(*logic.Expr) *logic.Expr { return c.to })
			})
			m.add(withBlock(m.p, i, block), "%s: %s", p.where, c.what)
		}
		for k, a := range e.Args {
			visit(a, divisor(e, k))
		}
	}
	visit(p.expr, false)
}

// divisor reports whether the k-th operand of a node divides.
func divisor(e *logic.Expr, k int) bool {
	return (e.Op == logic.OpDiv || e.Op == logic.OpToward) && k == len(e.Args)-1
}

type change struct {
	what string
	to   *logic.Expr
}

// changes lists what may be mistaken at one node.
func changes(e *logic.Expr, divides bool) []change {
	var cs []change
	add := func(to *logic.Expr) {
		cs = append(cs, change{fmt.Sprintf("(%s) instead of (%s)", to, e), to})
	}
	as := func(op logic.Op) *logic.Expr {
		c := *e
		c.Op = op
		return &c
	}
	switch e.Op {
	case logic.OpLit:
		for _, v := range neighbours(e) {
			if v == 0 && divides {
				continue
			}
			c := *e
			c.Value = v
			add(&c)
		}
	case logic.OpAnd:
		add(as(logic.OpOr))
	case logic.OpOr:
		add(as(logic.OpAnd))
	case logic.OpNot:
		add(e.Args[0])
	case logic.OpAdd:
		add(as(logic.OpSub))
	case logic.OpSub:
		add(as(logic.OpAdd))
	case logic.OpEq:
		add(as(logic.OpNe))
	case logic.OpNe:
		add(as(logic.OpEq))
	case logic.OpLt, logic.OpLe, logic.OpGt, logic.OpGe:
		for op := logic.OpLt; op <= logic.OpGe; op++ {
			if op != e.Op {
				add(as(op))
			}
		}
	case logic.OpSelect:
		c := *e
		c.Args = []*logic.Expr{e.Args[0], e.Args[2], e.Args[1]}
		add(&c)
	case logic.OpClamp:
		// One bound left off at a time.
		add(logic.Select(logic.Gt(e.Args[0], e.Args[2]), e.Args[2], e.Args[0]))
		add(logic.Select(logic.Lt(e.Args[0], e.Args[1]), e.Args[1], e.Args[0]))
	}
	return cs
}

// neighbours lists the values that a literal may be mistaken for.
func neighbours(e *logic.Expr) []int64 {
	switch e.Kind {
	case logic.Bool:
		return []int64{1 - e.Value}
	case logic.Word:
		var vs []int64
		for _, v := range []int64{e.Value - 1, e.Value + 1} {
			if v >= 0 && v < int64(len(e.Enum.Words)) {
				vs = append(vs, v)
			}
		}
		return vs
	}
	return []int64{e.Value - 1, e.Value + 1}
}

// starts changes what each variable starts from.
func (m *mutator) starts() {
	for i, v := range m.p.State {
		for _, d := range []int64{-1, 1} {
			if !v.Range.Holds(v.Start + d) {
				continue
			}
			other := *v
			other.Start += d
			q := *m.p
			q.State = slices.Clone(m.p.State)
			q.State[i] = &other
			m.add(&q, "%s starts at %d instead of %d", v.Name, other.Start, v.Start)
		}
	}
}

// mutantRun makes a run of a mutant. Mutants share their variables with the
// program, so its numbering holds; a start value is put in by hand.
func mutantRun(c *logic.Checked, p *logic.Program) *logic.Run {
	m := *c
	q := *p
	q.State, q.Never = c.State, nil
	m.Program = &q
	return m.NewRun()
}

// Lives reports whether a mutant of the program passes all vectors and upsets
// unnoticed.
func (t *Tour) Lives(c *logic.Checked, m Mutant) bool {
	r := mutantRun(c, m.Program)
	for _, v := range t.Vectors {
		if !v.passes(c, m.Program, r) {
			return false
		}
	}
	return true
}

// passes runs a vector and reports whether all outputs and states were as
// recorded.
func (v *Vector) passes(c *logic.Checked, p *logic.Program, r *logic.Run) bool {
	startAs(c, p, r, v.Start)
	outs := newReader(c)
	var state []int64
	for i := range v.Rows {
		row := &v.Rows[i]
		for n := range row.Steps {
			r.Step(row.Inputs)
			if !slices.Equal(outs.read(r), row.due(n)) {
				return false
			}
		}
		state = r.Snapshot(state)
		if !slices.Equal(state[:len(c.State)], row.State) {
			return false
		}
	}
	return true
}

// startAs starts a run that shares the variables of c with the start values of p.
func startAs(c *logic.Checked, p *logic.Program, r *logic.Run, rec *logic.Record) {
	r.Start(rec)
	if slices.Equal(p.State, c.State) {
		return
	}
	got := r.Remember()
	believed := rec != nil && got.Check == rec.Check && slices.Equal(got.Values, rec.Values)
	s := r.Snapshot(nil)
	for i, v := range p.State {
		if !believed || !v.Survives {
			s[i] = v.Start
		}
	}
	r.Restore(s)
}

// outputs reads the outputs of a run.
type outputs struct {
	vars []*logic.Var
	buf  []int64
}

func newReader(c *logic.Checked) *outputs {
	return &outputs{vars: c.Outputs, buf: make([]int64, len(c.Outputs))}
}

func (o *outputs) read(r *logic.Run) []int64 {
	for i, v := range o.vars {
		o.buf[i] = r.Get(v)
	}
	return o.buf
}
