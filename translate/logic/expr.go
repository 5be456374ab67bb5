package logic

// Op is what a node of an expression does.
type Op uint8

const (
	OpLit   Op = iota + 1 // Value
	OpConst               // the named constant
	OpUse                 // the variable, written earlier in this step (or an input)
	OpPrev                // the variable as it was at the end of the previous step
	OpAdd                 // a + b
	OpSub                 // a - b
	OpMul                 // a * b
	OpDiv                 // a / b, cutting off towards zero; b never holds 0
	OpEq                  // a == b …
	OpNe
	OpLt
	OpLe
	OpGt
	OpGe
	OpNot
	OpAnd    // all of Args
	OpOr     // any of Args
	OpSelect // Args[0] ? Args[1] : Args[2]
	OpClamp  // Args[0] held between Args[1] and Args[2]; Args[1] ≤ Args[2]
	OpToward // y + (x - y)/n for y, x, n: never leaves the span of y and x
	OpLookup // Table at Args[0]
)

// Expr is a tree of operations on whole numbers. Every value, intermediate
// ones included, fits int32.
type Expr struct {
	Op    Op
	Args  []*Expr
	Var   *Var
	Const *Const
	Table *Table
	Value int64
	Kind  Kind
	Enum  *Enum // of a literal that names a state
}

// Lit is a bare number.
func Lit(v int64) *Expr { return &Expr{Op: OpLit, Value: v, Kind: Int} }

// True and False are the truth values as expressions.
func True() *Expr  { return &Expr{Op: OpLit, Value: 1, Kind: Bool} }
func False() *Expr { return &Expr{Op: OpLit, Value: 0, Kind: Bool} }

// C is a named constant.
func C(c *Const) *Expr { return &Expr{Op: OpConst, Const: c, Kind: Int} }

// Use reads a variable that was written earlier in this step, or an input.
func Use(v *Var) *Expr { return &Expr{Op: OpUse, Var: v, Kind: v.Kind, Enum: v.Enum} }

// Prev reads a variable as it was at the end of the previous step.
func Prev(v *Var) *Expr { return &Expr{Op: OpPrev, Var: v, Kind: v.Kind, Enum: v.Enum} }

// State is the state of an enumeration with the given number.
func StateOf(e *Enum, n int) *Expr {
	return &Expr{Op: OpLit, Value: int64(n), Kind: Word, Enum: e}
}

// Is reports whether a machine is in a state, In whether it was before this step.
func Is(v *Var, n int) *Expr  { return two(OpEq, Use(v), StateOf(v.Enum, n), Bool) }
func Was(v *Var, n int) *Expr { return two(OpEq, Prev(v), StateOf(v.Enum, n), Bool) }

func two(op Op, a, b *Expr, k Kind) *Expr { return &Expr{Op: op, Args: []*Expr{a, b}, Kind: k} }

func Add(a, b *Expr) *Expr { return two(OpAdd, a, b, Int) }
func Sub(a, b *Expr) *Expr { return two(OpSub, a, b, Int) }
func Mul(a, b *Expr) *Expr { return two(OpMul, a, b, Int) }
func Div(a, b *Expr) *Expr { return two(OpDiv, a, b, Int) }
func Eq(a, b *Expr) *Expr  { return two(OpEq, a, b, Bool) }
func Ne(a, b *Expr) *Expr  { return two(OpNe, a, b, Bool) }
func Lt(a, b *Expr) *Expr  { return two(OpLt, a, b, Bool) }
func Le(a, b *Expr) *Expr  { return two(OpLe, a, b, Bool) }
func Gt(a, b *Expr) *Expr  { return two(OpGt, a, b, Bool) }
func Ge(a, b *Expr) *Expr  { return two(OpGe, a, b, Bool) }

// Select is a where c holds, b elsewhere.
func Select(c, a, b *Expr) *Expr {
	return &Expr{Op: OpSelect, Args: []*Expr{c, a, b}, Kind: a.Kind, Enum: a.Enum}
}

// Clamp holds x between lo and hi.
func Clamp(x, lo, hi *Expr) *Expr { return &Expr{Op: OpClamp, Args: []*Expr{x, lo, hi}, Kind: Int} }

// Toward moves y towards x by the n-th part of the way.
func Toward(y, x, n *Expr) *Expr { return &Expr{Op: OpToward, Args: []*Expr{y, x, n}, Kind: Int} }

// Lookup is the table's value at x.
func Lookup(t *Table, x *Expr) *Expr {
	return &Expr{Op: OpLookup, Table: t, Args: []*Expr{x}, Kind: Int}
}

// Not, And and Or simplify where an operand is a bare truth value or a
// comparison, so that a line of old wiring without a term does not leave one
// behind in the C, and a comparison reads the way a person would write it.
func Not(a *Expr) *Expr {
	if v, ok := truth(a); ok {
		return boolean(!v)
	}
	if a.Op == OpNot {
		return a.Args[0]
	}
	if opposite, ok := negated[a.Op]; ok {
		return two(opposite, a.Args[0], a.Args[1], Bool)
	}
	return &Expr{Op: OpNot, Args: []*Expr{a}, Kind: Bool}
}

func And(args ...*Expr) *Expr { return gather(OpAnd, true, args) }
func Or(args ...*Expr) *Expr  { return gather(OpOr, false, args) }

func gather(op Op, neutral bool, args []*Expr) *Expr {
	var kept []*Expr
	for _, a := range args {
		if a == nil {
			continue
		}
		if v, ok := truth(a); ok {
			if v != neutral {
				return boolean(!neutral)
			}
			continue
		}
		if a.Op == op {
			kept = append(kept, a.Args...)
			continue
		}
		kept = append(kept, a)
	}
	switch len(kept) {
	case 0:
		return boolean(neutral)
	case 1:
		return kept[0]
	}
	return &Expr{Op: op, Args: kept, Kind: Bool}
}

func truth(e *Expr) (value, ok bool) {
	if e.Op == OpLit && e.Kind == Bool {
		return e.Value != 0, true
	}
	return false, false
}

func boolean(v bool) *Expr {
	if v {
		return True()
	}
	return False()
}

// Walk calls f for the expression and everything in it, outside in.
func (e *Expr) Walk(f func(*Expr)) {
	if e == nil {
		return
	}
	f(e)
	for _, a := range e.Args {
		a.Walk(f)
	}
}

// IsCompare reports whether the node compares two numbers or states.
func (o Op) IsCompare() bool { return o >= OpEq && o <= OpGe }
