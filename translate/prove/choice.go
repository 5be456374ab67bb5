package prove

import "makebreak/translate/logic"

// A choice is a decision of the program as the search sees it: the tree of its
// condition over its atoms.
type choice struct {
	part    part
	block   int
	atoms   []*logic.Expr
	tree    *tree
	sides   [][]side // for each atom: what the rest must be for it to decide
	open    []*goal  // not reached yet
	flipped *logic.Run
	flip    func() *logic.Run
	inputs  [2]uint64 // inputs that its terms are made of, directly and one state behind
}

// tree is a condition over atoms. A leaf is an atom or a fixed truth value.
type tree struct {
	op    logic.Op // OpAnd, OpOr, OpNot, OpUse for an atom, OpLit
	args  []*tree
	atom  int
	value bool
}

// side is a neighbour of an atom in the tree and the value that lets the atom
// decide.
type side struct {
	tree *tree
	want bool
}

// treeOf builds the tree of a condition, numbering atoms as logic.Decision
// does: in the order in which they stand.
func treeOf(e *logic.Expr, next *int) *tree {
	switch e.Op {
	case logic.OpAnd, logic.OpOr, logic.OpNot:
		t := &tree{op: e.Op}
		for _, a := range e.Args {
			t.args = append(t.args, treeOf(a, next))
		}
		return t
	case logic.OpLit:
		return &tree{op: logic.OpLit, value: e.Value != 0}
	}
	*next++
	return &tree{op: logic.OpUse, atom: *next - 1}
}

// cost is how many atoms have to change, at the least, for the tree to have
// the wanted value.
func (t *tree) cost(want bool, atoms uint64) int {
	switch t.op {
	case logic.OpNot:
		return t.args[0].cost(!want, atoms)
	case logic.OpLit:
		if t.value == want {
			return 0
		}
		return never
	case logic.OpUse:
		if (atoms>>t.atom&1 == 1) == want {
			return 0
		}
		return 1
	}
	if all := (t.op == logic.OpAnd) == want; all {
		sum := 0
		for _, a := range t.args {
			sum += a.cost(want, atoms)
		}
		return min(sum, never)
	}
	least := never
	for _, a := range t.args {
		least = min(least, a.cost(want, atoms))
	}
	return least
}

// never is a cost that no change of atoms can pay.
const never = 1 << 20

// sidesOf lists, for each atom of the tree, what lets it decide.
func sidesOf(t *tree, above []side, out [][]side) {
	switch t.op {
	case logic.OpUse:
		out[t.atom] = above
	case logic.OpNot:
		sidesOf(t.args[0], above, out)
	case logic.OpAnd, logic.OpOr:
		for i, a := range t.args {
			s := append([]side(nil), above...)
			for j, b := range t.args {
				if i != j {
					s = append(s, side{b, t.op == logic.OpAnd})
				}
			}
			sidesOf(a, s, out)
		}
	}
}

// undecided is how many atoms have to change for atom i to decide.
func (c *choice) undecided(i int, atoms uint64) int {
	n := 0
	for _, s := range c.sides[i] {
		n += s.tree.cost(s.want, atoms)
	}
	return n
}
