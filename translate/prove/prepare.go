package prove

import (
	"strconv"

	"makebreak/translate/logic"
)

// prepared gives the program in the form in which it is searched. It does the
// same as the program and keeps the same variables, in the same order, before
// any others. Truth values that are remembered are worked out in a local first,
// so that they are decisions too; what properties watch runs as part of the
// step, with the verdict of each property as a local.
//
// Should that form not pass the check, the program itself is searched: the
// search is then less well guided, and nothing else.
func prepared(c *logic.Checked) (ready *logic.Checked, own int, verdicts []*logic.Var) {
	p := *c.Program
	p.Never = nil
	p.Order = nil
	names := taken(c)
	for _, b := range c.Order {
		if s, ok := b.(*logic.Set); ok && s.To.Kind == logic.Bool && !reads(s.To) && s.To.Op != logic.OpLit {
			v := &logic.Var{Name: names.fresh(s.Var.Name + "_next"), What: s.Var.What, Kind: logic.Bool, Range: logic.Truth}
			p.Order = append(p.Order, &logic.Define{Var: v, As: s.To})
			c := *s
			c.To = logic.Use(v)
			b = &c
		}
		p.Order = append(p.Order, b)
	}
	own = len(p.Order)
	p.State = append([]*logic.Var(nil), c.State...)
	for _, prop := range c.Never {
		watch, kept, bad := watched(prop, names)
		p.State = append(p.State, kept...)
		p.Order = append(p.Order, watch...)
		v := &logic.Var{Name: names.fresh("broken_" + prop.Name), What: prop.Why, Kind: logic.Bool, Range: logic.Truth}
		p.Order = append(p.Order, &logic.Define{Var: v, As: bad})
		verdicts = append(verdicts, v)
	}
	ready, err := logic.Check(&p)
	if err != nil {
		return c, len(c.Order), nil
	}
	return ready, own, verdicts
}

// watched gives what a property watches, with names that nothing else has.
func watched(prop *logic.Property, names nameSet) (blocks []logic.Block, kept []*logic.Var, bad *logic.Expr) {
	renamed := map[*logic.Var]*logic.Var{}
	own := func(v *logic.Var) *logic.Var {
		c := *v
		c.Name = names.fresh(v.Name)
		renamed[v] = &c
		return &c
	}
	for _, v := range prop.Kept {
		kept = append(kept, own(v))
	}
	for _, b := range prop.Watch {
		switch b := b.(type) {
		case *logic.Define:
			own(b.Var)
		case *logic.Flags:
			own(b.Out)
		}
	}
	swap := func(n *logic.Expr) *logic.Expr {
		if v, ok := renamed[n.Var]; ok {
			n.Var = v
		}
		return n
	}
	rename := func(e *logic.Expr) *logic.Expr { return rebuilt(e, swap) }
	blocks = rewritten(prop.Watch, rename, func(b logic.Block) { renameWritten(b, renamed) })
	return blocks, kept, rename(prop.Bad)
}

// renameWritten renames the variables that a block writes, in place.
func renameWritten(b logic.Block, renamed map[*logic.Var]*logic.Var) {
	swap := func(v **logic.Var) {
		if r, ok := renamed[*v]; ok {
			*v = r
		}
	}
	switch b := b.(type) {
	case *logic.Define:
		swap(&b.Var)
	case *logic.Set:
		swap(&b.Var)
	case *logic.Timer:
		swap(&b.Var)
	case *logic.Flags:
		swap(&b.Out)
	case *logic.Machine:
		swap(&b.Var)
		swap(&b.Timer)
		for _, s := range b.At {
			for _, t := range s.Goes {
				for _, a := range t.Do {
					swap(&a.Var)
				}
			}
		}
	}
}

type nameSet map[string]bool

func taken(c *logic.Checked) nameSet {
	names := nameSet{}
	for _, vs := range [][]*logic.Var{c.Inputs, c.State, c.Outputs, c.Locals} {
		for _, v := range vs {
			names[v.Name] = true
		}
	}
	for _, k := range c.Consts {
		names[k.Name] = true
	}
	for _, t := range c.Tables {
		names[t.Name] = true
	}
	return names
}

func (n nameSet) fresh(name string) string {
	free := name
	for i := 2; n[free]; i++ {
		free = name + "_" + strconv.Itoa(i)
	}
	n[free] = true
	return free
}

// choicesOf lists the decisions of a run made by NewProbed, with their place in
// the program. Those that cannot be placed have no part and no goals.
func choicesOf(c *logic.Checked, decisions []*logic.Decision, inputs *levels) []*choice {
	at := candidates(c)
	choices := make([]*choice, len(decisions))
	for i, d := range decisions {
		ch := &choice{atoms: d.Atoms}
		choices[i] = ch
		for len(at) > 0 && at[0].expr != d.Of {
			at = at[1:]
		}
		if len(at) == 0 {
			continue
		}
		place := at[0]
		at = at[1:]
		ch.part, ch.block = place.part, place.block
		n := 0
		ch.tree = treeOf(d.Of, &n)
		ch.sides = make([][]side, n)
		sidesOf(ch.tree, nil, ch.sides)
		ch.flip = place.flipped(c)
		ch.inputs = inputs.behind(d.Of)
	}
	return choices
}

// place is where a decision stands: a node of a whole expression of a block.
type place struct {
	part
	expr  *logic.Expr
	block int
	n     int // expression of the block
	node  int // node of the expression
}

// candidates lists whatever may be a decision, in the order of a step.
func candidates(c *logic.Checked) []place {
	var at []place
	for i, b := range c.Order {
		for n, p := range parts(b) {
			if p.choice || p.expr.Kind == logic.Bool {
				at = append(at, place{part: p, expr: p.expr, block: i, n: n})
			}
			if p.choice {
				continue
			}
			k := 0
			p.expr.Walk(func(e *logic.Expr) {
				if e.Op == logic.OpSelect {
					q := p
					q.expr, q.where, q.choice = e.Args[0], "selection in "+p.where, true
					at = append(at, place{part: q, expr: e.Args[0], block: i, n: n, node: k + 1})
				}
				k++
			})
		}
	}
	return at
}

// flipped gives a run in which the decision comes out the other way round,
// made when it is first asked for.
func (p place) flipped(c *logic.Checked) func() *logic.Run {
	return func() *logic.Run {
		block := replaced(c.Order[p.block], p.n, func(whole *logic.Expr) *logic.Expr { return edited(whole, p.node, not) })
		return mutantRun(c, withBlock(c.Program, p.block, block))
	}
}
