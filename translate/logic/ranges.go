package logic

// rangeOf works out what an expression can be, and notes it for every node. A
// node that stands in several places is noted with all that it can be.
func (k *checker) rangeOf(e *Expr) Range {
	args := make([]Range, len(e.Args))
	for i, a := range e.Args {
		if e.Op == OpSelect && i > 0 {
			k.within(e.Args[0], i == 1, func() { args[i] = k.rangeOf(a) })
			continue
		}
		args[i] = k.rangeOf(a)
	}
	k.kinds(e)
	r := k.node(e, args)
	if !r.Within(Int32) {
		k.fail("%s can be %d..%d, more than 32 bits", e, r.Lo, r.Hi)
		r = Int32
	}
	if before, seen := k.Ranges[e]; seen {
		k.Ranges[e] = before.with(r)
	} else {
		k.Ranges[e] = r
	}
	return r
}

// within runs f under the assumption that a condition came out as stated: what
// it compares with a number is then known more closely.
func (k *checker) within(c *Expr, outcome bool, f func()) {
	before := k.known
	k.known = map[*Var]Range{}
	for v, r := range before {
		k.known[v] = r
	}
	k.assume(c, outcome)
	f()
	k.known = before
}

func (k *checker) assume(c *Expr, outcome bool) {
	switch {
	case c.Op == OpNot:
		k.assume(c.Args[0], !outcome)
	case c.Op == OpAnd && outcome, c.Op == OpOr && !outcome:
		for _, a := range c.Args {
			k.assume(a, outcome)
		}
	case c.Op.IsCompare() && c.Args[0].Var != nil:
		op := c.Op
		if !outcome {
			op = negated[op]
		}
		v, to := c.Args[0].Var, k.Ranges[c.Args[1]]
		r := k.rangeNow(v)
		switch op {
		case OpLt:
			r.Hi = min(r.Hi, to.Hi-1)
		case OpLe:
			r.Hi = min(r.Hi, to.Hi)
		case OpGt:
			r.Lo = max(r.Lo, to.Lo+1)
		case OpGe:
			r.Lo = max(r.Lo, to.Lo)
		case OpEq:
			r = Range{max(r.Lo, to.Lo), min(r.Hi, to.Hi)}
		}
		if r.Lo <= r.Hi {
			k.known[v] = r
		}
	}
}

var negated = map[Op]Op{OpEq: OpNe, OpNe: OpEq, OpLt: OpGe, OpGe: OpLt, OpLe: OpGt, OpGt: OpLe}

// rangeNow is what a variable can be where the checker stands.
func (k *checker) rangeNow(v *Var) Range {
	if r, ok := k.known[v]; ok {
		return r
	}
	return v.Range
}

func (k *checker) node(e *Expr, a []Range) Range {
	switch e.Op {
	case OpLit:
		return Range{e.Value, e.Value}
	case OpConst:
		return Range{e.Const.Value, e.Const.Value}
	case OpUse, OpPrev:
		k.read(e)
		return k.rangeNow(e.Var)
	case OpAdd:
		return Range{a[0].Lo + a[1].Lo, a[0].Hi + a[1].Hi}
	case OpSub:
		return Range{a[0].Lo - a[1].Hi, a[0].Hi - a[1].Lo}
	case OpMul:
		return corners(a[0], a[1], func(x, y int64) int64 { return x * y })
	case OpDiv:
		if a[1].Holds(0) {
			k.fail("%s: may divide by zero", e)
			return Int32
		}
		return corners(a[0], a[1], func(x, y int64) int64 { return x / y })
	case OpSelect:
		return a[1].with(a[2])
	case OpClamp:
		x, lo, hi := a[0], a[1], a[2]
		if lo.Hi > hi.Lo {
			return x.with(lo).with(hi)
		}
		return Range{clamp(x.Lo, lo.Lo, hi.Lo), clamp(x.Hi, lo.Hi, hi.Hi)}
	case OpToward:
		span := a[0].with(a[1])
		if a[2].Lo < 1 {
			k.fail("%s: the part of the way is one or more", e)
		}
		if d := (Range{a[1].Lo - a[0].Hi, a[1].Hi - a[0].Lo}); !d.Within(Int32) {
			k.fail("%s: the way can be more than 32 bits", e)
		}
		return span
	case OpLookup:
		r := Range{e.Table.Y[0], e.Table.Y[0]}
		for _, y := range e.Table.Y {
			r = r.with(Range{y, y})
		}
		return r
	}
	if e.Op.IsCompare() {
		k.decided(e, a[0], a[1])
	}
	return Truth
}

// decided refuses a comparison whose outcome the ranges already fix: it would
// hide a mistake here and be refused by a strict C compiler.
func (k *checker) decided(e *Expr, a, b Range) {
	var fixed bool
	switch e.Op {
	case OpEq, OpNe:
		fixed = a.Hi < b.Lo || b.Hi < a.Lo || (a.Lo == a.Hi && a == b)
	case OpLt, OpGe:
		fixed = a.Hi < b.Lo || a.Lo >= b.Hi
	case OpLe, OpGt:
		fixed = a.Hi <= b.Lo || a.Lo > b.Hi
	}
	if fixed {
		k.fail("%s: always comes out the same, for %d..%d against %d..%d", e, a.Lo, a.Hi, b.Lo, b.Hi)
	}
}

// kinds checks that the operands are of the right sort.
func (k *checker) kinds(e *Expr) {
	want := func(kind Kind, args ...*Expr) {
		for _, a := range args {
			if a.Kind != kind {
				k.fail("%s: %s is of the wrong sort", e, a)
			}
		}
	}
	switch {
	case e.Op == OpNot || e.Op == OpAnd || e.Op == OpOr:
		want(Bool, e.Args...)
	case e.Op == OpEq || e.Op == OpNe:
		if e.Args[0].Kind != e.Args[1].Kind || e.Args[0].Enum != e.Args[1].Enum {
			k.fail("%s: compares different sorts", e)
		}
	case e.Op == OpSelect:
		want(Bool, e.Args[0])
		if e.Args[1].Kind != e.Args[2].Kind || e.Args[1].Enum != e.Args[2].Enum {
			k.fail("%s: chooses between different sorts", e)
		}
	case e.Op.IsCompare(), e.Op >= OpAdd && e.Op <= OpDiv, e.Op == OpClamp, e.Op == OpToward, e.Op == OpLookup:
		want(Int, e.Args...)
	}
}

// read enforces the order of a step: what has been written is used, what will
// be written is read as it was.
func (k *checker) read(e *Expr) {
	v := e.Var
	r := k.role[v]
	w, written := k.Writer[v]
	switch {
	case r == 0:
		k.fail("%s: read but not declared", v.Name)
	case e.Op == OpUse && r == isInput:
	case e.Op == OpUse && written && w < k.at:
	case e.Op == OpUse && k.ownTimer(v):
	case e.Op == OpUse:
		k.fail("%s: used before it is written in this step; its previous value must be asked for", v.Name)
	case r != isState:
		k.fail("%s: has no previous value", v.Name)
	case written && w < k.at:
		k.fail("%s: has been written in this step already; its previous value is gone", v.Name)
	}
}

func (k *checker) ownTimer(v *Var) bool {
	m, ok := k.own.(*Machine)
	return ok && m.Timer == v
}

func (r Range) with(o Range) Range { return Range{min(r.Lo, o.Lo), max(r.Hi, o.Hi)} }

func corners(a, b Range, f func(x, y int64) int64) Range {
	r := Range{f(a.Lo, b.Lo), f(a.Lo, b.Lo)}
	for _, v := range []int64{f(a.Lo, b.Hi), f(a.Hi, b.Lo), f(a.Hi, b.Hi)} {
		r = r.with(Range{v, v})
	}
	return r
}

func clamp(x, lo, hi int64) int64 {
	if x < lo {
		return lo
	}
	if x > hi {
		return hi
	}
	return x
}

// Span is what an expression can be, by the declared ranges of its variables,
// for those who build programs and have to declare the range of what they
// write. What would not fit 32 bits is reported by Check, later.
func Span(e *Expr) Range {
	k := &checker{
		Checked: &Checked{Program: &Program{}, Ranges: map[*Expr]Range{}, Writer: map[*Var]int{}},
		role:    map[*Var]role{},
	}
	return k.rangeOf(e)
}
