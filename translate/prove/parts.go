package prove

import (
	"slices"

	"makebreak/translate/logic"
)

// part is one whole expression of a block, in the order in which a step meets
// them, with what it is for.
type part struct {
	expr   *logic.Expr
	choice bool   // the block branches on it, or it is a truth value worked out
	where  string // what a person calls it
	to     *transition
	writes *logic.Var // what it is written to
}

// transition is a way out of a state of a machine.
type transition struct {
	machine *logic.Machine
	from    int
	way     *logic.Transition
}

func (t *transition) String() string {
	words := t.machine.Var.Enum.Words
	return t.machine.Var.Name + ": " + words[t.from].Name + " to " + words[t.way.To].Name
}

// parts lists the expressions of a block in the order of logic.Expressions.
func parts(b logic.Block) []part {
	var ps []part
	add := func(p part) {
		if p.expr != nil {
			ps = append(ps, p)
		}
	}
	set := func(s *logic.Set, where string) {
		add(part{expr: s.When, choice: true, where: where})
		add(part{expr: s.To, where: "value of " + s.Var.Name, writes: s.Var})
	}
	switch b := b.(type) {
	case *logic.Define:
		add(part{expr: b.As, choice: b.As.Kind == logic.Bool, where: b.Var.Name, writes: b.Var})
	case *logic.Set:
		set(b, "change of "+b.Var.Name)
	case *logic.Timer:
		add(part{expr: b.Restart, choice: true, where: "restart of " + b.Var.Name})
		add(part{expr: b.Hold, choice: true, where: "hold of " + b.Var.Name})
	case *logic.Flags:
		for _, f := range b.Bits {
			add(part{expr: f.When, choice: true, where: "flag " + f.Name})
		}
	case *logic.Machine:
		for _, s := range b.At {
			for _, t := range s.Goes {
				way := &transition{machine: b, from: s.Is, way: t}
				add(part{expr: t.When, choice: true, where: way.String(), to: way})
				for _, a := range t.Do {
					set(a, way.String()+", change of "+a.Var.Name)
				}
			}
		}
	}
	return ps
}

// replaced gives a copy of a block in which f has been applied to its n-th
// expression. Everything else is shared with the original.
func replaced(b logic.Block, n int, f func(*logic.Expr) *logic.Expr) logic.Block {
	at := -1
	next := func(e *logic.Expr) *logic.Expr {
		if e == nil {
			return nil
		}
		if at++; at == n {
			return f(e)
		}
		return e
	}
	return mapped(b, next)
}

// mapped gives a copy of a block with f applied to each of its expressions,
// nil ones included, in the order of logic.Expressions.
func mapped(b logic.Block, f func(*logic.Expr) *logic.Expr) logic.Block {
	set := func(s *logic.Set) *logic.Set {
		c := *s
		c.When, c.To = f(s.When), f(s.To)
		return &c
	}
	switch b := b.(type) {
	case *logic.Define:
		c := *b
		c.As = f(b.As)
		return &c
	case *logic.Set:
		return set(b)
	case *logic.Timer:
		c := *b
		c.Restart, c.Hold = f(b.Restart), f(b.Hold)
		return &c
	case *logic.Flags:
		c := *b
		c.Bits = slices.Clone(b.Bits)
		for i := range c.Bits {
			c.Bits[i].When = f(c.Bits[i].When)
		}
		return &c
	case *logic.Machine:
		return mappedMachine(b, f, set)
	}
	return b
}

func mappedMachine(b *logic.Machine, f func(*logic.Expr) *logic.Expr, set func(*logic.Set) *logic.Set) *logic.Machine {
	c := *b
	c.At = make([]*logic.State, len(b.At))
	for i, s := range b.At {
		state := &logic.State{Is: s.Is}
		for _, t := range s.Goes {
			way := *t
			way.When = f(t.When)
			way.Do = nil
			for _, a := range t.Do {
				way.Do = append(way.Do, set(a))
			}
			state.Goes = append(state.Goes, &way)
		}
		c.At[i] = state
	}
	return &c
}

// edited applies f to the n-th node of an expression, counted as Walk meets
// them, and copies only what lies above it.
func edited(e *logic.Expr, n int, f func(*logic.Expr) *logic.Expr) *logic.Expr {
	at := -1
	var visit func(e *logic.Expr) *logic.Expr
	visit = func(e *logic.Expr) *logic.Expr {
		if at++; at == n {
			at += size(e) - 1
			return f(e)
		}
		var c *logic.Expr
		for i, a := range e.Args {
			if b := visit(a); b != a {
				if c == nil {
					copied := *e
					copied.Args = slices.Clone(e.Args)
					c = &copied
				}
				c.Args[i] = b
			}
		}
		if c != nil {
			return c
		}
		return e
	}
	return visit(e)
}

func size(e *logic.Expr) int {
	n := 1
	for _, a := range e.Args {
		n += size(a)
	}
	return n
}

// rebuilt applies f to every node of an expression, inside out, where f
// returns its argument or a node in its place.
func rebuilt(e *logic.Expr, f func(*logic.Expr) *logic.Expr) *logic.Expr {
	if e == nil {
		return nil
	}
	c := *e
	c.Args = nil
	for _, a := range e.Args {
		c.Args = append(c.Args, rebuilt(a, f))
	}
	return f(&c)
}

// withBlock is the program with another block in place of its i-th.
func withBlock(p *logic.Program, i int, b logic.Block) *logic.Program {
	q := *p
	q.Order = slices.Clone(p.Order)
	q.Order[i] = b
	return &q
}

// not is the opposite, without any simplification.
func not(e *logic.Expr) *logic.Expr {
	return &logic.Expr{Op: logic.OpNot, Args: []*logic.Expr{e}, Kind: logic.Bool}
}

func isConst(e *logic.Expr) (int64, bool) {
	switch e.Op {
	case logic.OpLit:
		return e.Value, true
	case logic.OpConst:
		return e.Const.Value, true
	}
	return 0, false
}

func reads(e *logic.Expr) bool { return e.Op == logic.OpUse || e.Op == logic.OpPrev }
