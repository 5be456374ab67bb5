package csource

import (
	"slices"

	"makebreak/translate/logic"
)

// pruned gives the blocks of a step without what has no effect: a local that
// nothing reads but what watches the program, a setting that is never made, a
// transition that is never taken or stands behind one that always is.
func pruned(p *logic.Checked) []logic.Block {
	var kept []logic.Block
	read := map[*logic.Var]bool{}
	for i := len(p.Order) - 1; i >= 0; i-- {
		b := p.Order[i]
		var local *logic.Var
		switch x := b.(type) {
		case *logic.Define:
			local = x.Var
		case *logic.Flags:
			local = x.Out
		case *logic.Set:
			if never(x.When) {
				continue
			}
		case *logic.Machine:
			b = prunedMachine(x)
		}
		if local != nil && !read[local] && !among(p.Outputs, local) {
			continue
		}
		logic.Expressions(b, func(e *logic.Expr) {
			e.Walk(func(n *logic.Expr) { read[n.Var] = true })
		})
		kept = append(kept, b)
	}
	slices.Reverse(kept)
	return kept
}

func prunedMachine(m *logic.Machine) *logic.Machine {
	c := *m
	c.At = nil
	for _, s := range m.At {
		c.At = append(c.At, &logic.State{Is: s.Is, Goes: prunedTransitions(s.Goes)})
	}
	return &c
}

func prunedTransitions(all []*logic.Transition) []*logic.Transition {
	var kept []*logic.Transition
	for _, t := range all {
		if never(t.When) {
			continue
		}
		c := *t
		c.Do = slices.DeleteFunc(slices.Clone(t.Do), func(s *logic.Set) bool { return never(s.When) })
		kept = append(kept, &c)
		if always(t.When) {
			break
		}
	}
	return kept
}

func always(e *logic.Expr) bool { return e == nil || isTruth(e, 1) }
func never(e *logic.Expr) bool  { return e != nil && isTruth(e, 0) }

func isTruth(e *logic.Expr, v int64) bool {
	return e.Op == logic.OpLit && e.Kind == logic.Bool && e.Value == v
}
