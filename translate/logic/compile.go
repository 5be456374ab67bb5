package logic

// The interpreter runs a flat list of instructions over one array of numbers:
// inputs, variables, outputs and locals first, then the constants, then
// intermediate results. Nothing is allocated in a step.

type code uint8

const (
	cMove code = iota
	cAdd
	cSub
	cMul
	cDiv
	cEq
	cNe
	cLt
	cLe
	cGt
	cGe
	cNot
	cAnd
	cOr
	cSelect // d = a ? b : c
	cClamp
	cToward
	cLookup // table c at a
	cTick   // d = min(d+1, a)
	cJump   // to c
	cJumpIf0
	cSwitch // to targets[c][a], or its last entry where a is no state
	cFlag   // d = d | a<<c
	cProbe  // report decision c
)

type instruction struct {
	op         code
	d, a, b, c int32
}

// Decision is a point where the program chooses: a guard, a condition, or a
// truth value that is worked out. Atoms are the terms that the choice is made
// of: comparisons and bare truth values.
type Decision struct {
	Block int   // index in Order, beyond it for what properties watch
	Of    *Expr // the whole condition
	Atoms []*Expr

	slot  int32
	atoms []int32
	sides [][2]int32 // operands of a comparison, -1 for a bare truth value
}

type compiled struct {
	code      []instruction
	targets   [][]int32
	tables    []*Table
	decisions []*Decision
	presets   []int64 // constants, placed behind the variables
	size      int     // of the array
	bad       []int32 // where each property's verdict is after a step
}

type compiler struct {
	*Checked
	out    compiled
	consts map[int64]int32
	next   int32
	probes bool
	placed map[*Expr]int32 // within a decision: where each node's value already is
}

func (c *Checked) compile(probes, properties bool) *compiled {
	k := &compiler{Checked: c, consts: map[int64]int32{}, probes: probes}
	k.gatherConstants(properties)
	for i, b := range c.Order {
		k.block(i, b)
	}
	if properties {
		for _, p := range c.Never {
			for i, b := range p.Watch {
				k.block(len(c.Order)+i, b)
			}
			k.out.bad = append(k.out.bad, k.expr(p.Bad))
		}
	}
	k.out.size = int(k.next)
	return &k.out
}

// gatherConstants places every number of the program behind the variables, so
// that reading one costs nothing.
func (k *compiler) gatherConstants(properties bool) {
	k.next = int32(len(k.slots))
	place := func(v int64) {
		if _, ok := k.consts[v]; !ok {
			k.consts[v] = k.next
			k.next++
			k.out.presets = append(k.out.presets, v)
		}
	}
	place(0)
	collect := func(b Block) {
		switch b := b.(type) {
		case *Timer:
			place(b.Limit.Value)
		case *Machine:
			if b.Limit != nil {
				place(b.Limit.Value)
			}
			for i := range b.At {
				place(int64(i))
			}
		}
		Expressions(b, func(e *Expr) { e.Walk(func(n *Expr) { k.constant(n, place) }) })
	}
	for _, b := range k.Order {
		collect(b)
	}
	if properties {
		for _, p := range k.Never {
			for _, b := range p.Watch {
				collect(b)
			}
			p.Bad.Walk(func(n *Expr) { k.constant(n, place) })
		}
	}
}

func (k *compiler) constant(n *Expr, place func(int64)) {
	switch n.Op {
	case OpLit:
		place(n.Value)
	case OpConst:
		place(n.Const.Value)
	}
}

func (k *compiler) emit(in instruction) int {
	k.out.code = append(k.out.code, in)
	return len(k.out.code) - 1
}

func (k *compiler) here() int32 { return int32(len(k.out.code)) }

func (k *compiler) temp() int32 {
	k.next++
	return k.next - 1
}

func (k *compiler) slot(v *Var) int32 { return int32(k.slots[v]) }

var exprCode = map[Op]code{
	OpAdd: cAdd, OpSub: cSub, OpMul: cMul, OpDiv: cDiv,
	OpEq: cEq, OpNe: cNe, OpLt: cLt, OpLe: cLe, OpGt: cGt, OpGe: cGe,
	OpNot: cNot, OpSelect: cSelect, OpClamp: cClamp, OpToward: cToward,
}

// expr emits what works an expression out and says where its value will be.
func (k *compiler) expr(e *Expr) int32 {
	at := k.emitExpr(e)
	if k.placed != nil {
		k.placed[e] = at
	}
	return at
}

func (k *compiler) emitExpr(e *Expr) int32 {
	switch e.Op {
	case OpLit:
		return k.consts[e.Value]
	case OpConst:
		return k.consts[e.Const.Value]
	case OpUse, OpPrev:
		return k.slot(e.Var)
	case OpAnd, OpOr:
		op := cAnd
		if e.Op == OpOr {
			op = cOr
		}
		d := k.expr(e.Args[0])
		for _, a := range e.Args[1:] {
			t := k.temp()
			k.emit(instruction{op: op, a: d, b: k.expr(a), d: t})
			d = t
		}
		return d
	case OpLookup:
		a, d := k.expr(e.Args[0]), k.temp()
		k.emit(instruction{op: cLookup, a: a, d: d, c: int32(len(k.out.tables))})
		k.out.tables = append(k.out.tables, e.Table)
		return d
	}
	var at [3]int32
	for i, a := range e.Args {
		at[i] = k.expr(a)
	}
	d := k.temp()
	k.emit(instruction{op: exprCode[e.Op], a: at[0], b: at[1], c: at[2], d: d})
	return d
}

// decide is expr for a truth value that is a decision of the program.
func (k *compiler) decide(block int, e *Expr) int32 {
	if !k.probes {
		return k.expr(e)
	}
	k.placed = map[*Expr]int32{}
	dec := &Decision{Block: block, Of: e, slot: k.expr(e)}
	atoms(e, func(a *Expr) {
		dec.Atoms = append(dec.Atoms, a)
		dec.atoms = append(dec.atoms, k.placed[a])
		sides := [2]int32{-1, -1}
		if a.Op.IsCompare() && a.Args[0].Kind == Int {
			sides = [2]int32{k.placed[a.Args[0]], k.placed[a.Args[1]]}
		}
		dec.sides = append(dec.sides, sides)
	})
	k.placed = nil
	k.emit(instruction{op: cProbe, c: int32(len(k.out.decisions))})
	k.out.decisions = append(k.out.decisions, dec)
	return dec.slot
}

// atoms calls f for each term that a condition is made of.
func atoms(e *Expr, f func(*Expr)) {
	switch e.Op {
	case OpAnd, OpOr, OpNot:
		for _, a := range e.Args {
			atoms(a, f)
		}
	case OpLit:
	default:
		f(e)
	}
}

func (k *compiler) block(i int, b Block) {
	switch b := b.(type) {
	case *Define:
		var s int32
		if b.As.Kind == Bool {
			s = k.decide(i, b.As)
		} else {
			s = k.numeric(i, b.As)
		}
		k.emit(instruction{op: cMove, a: s, d: k.slot(b.Var)})
	case *Set:
		k.set(i, b)
	case *Timer:
		k.timer(i, b)
	case *Flags:
		out := k.slot(b.Out)
		k.emit(instruction{op: cMove, a: k.consts[0], d: out})
		for n, f := range b.Bits {
			k.emit(instruction{op: cFlag, a: k.decide(i, f.When), d: out, c: int32(n)})
		}
	case *Machine:
		k.machine(i, b)
	}
}

// numeric is expr, with the conditions of its selections as decisions.
func (k *compiler) numeric(i int, e *Expr) int32 {
	if k.probes {
		e.Walk(func(n *Expr) {
			if n.Op == OpSelect {
				k.decide(i, n.Args[0])
			}
		})
	}
	return k.expr(e)
}

func (k *compiler) set(i int, s *Set) {
	skip := -1
	if s.When != nil {
		skip = k.emit(instruction{op: cJumpIf0, a: k.decide(i, s.When)})
	}
	k.emit(instruction{op: cMove, a: k.numeric(i, s.To), d: k.slot(s.Var)})
	if skip >= 0 {
		k.out.code[skip].c = k.here()
	}
}

func (k *compiler) timer(i int, t *Timer) {
	v := k.slot(t.Var)
	restart := k.emit(instruction{op: cJumpIf0, a: k.decide(i, t.Restart)})
	k.emit(instruction{op: cMove, a: k.consts[0], d: v})
	done := []int{k.emit(instruction{op: cJump})}
	k.out.code[restart].c = k.here()
	if t.Hold != nil {
		h := k.expr(Not(t.Hold))
		if k.probes {
			k.decide(i, t.Hold)
		}
		done = append(done, k.emit(instruction{op: cJumpIf0, a: h}))
	}
	k.emit(instruction{op: cTick, a: k.consts[t.Limit.Value], d: v})
	for _, j := range done {
		k.out.code[j].c = k.here()
	}
}

func (k *compiler) machine(i int, m *Machine) {
	if m.Timer != nil {
		k.emit(instruction{op: cTick, a: k.consts[m.Limit.Value], d: k.slot(m.Timer)})
	}
	n := len(k.out.targets)
	k.out.targets = append(k.out.targets, make([]int32, len(m.At)+1))
	k.emit(instruction{op: cSwitch, a: k.slot(m.Var), c: int32(n)})
	var ends []int
	for s, st := range m.At {
		k.out.targets[n][s] = k.here()
		for _, t := range st.Goes {
			next := -1
			if t.When != nil {
				next = k.emit(instruction{op: cJumpIf0, a: k.decide(i, t.When)})
			}
			k.enter(m, t.To)
			for _, a := range t.Do {
				k.set(i, a)
			}
			ends = append(ends, k.emit(instruction{op: cJump}))
			if next >= 0 {
				k.out.code[next].c = k.here()
			}
		}
		ends = append(ends, k.emit(instruction{op: cJump}))
	}
	k.out.targets[n][len(m.At)] = k.here()
	k.enter(m, m.Safe)
	for _, j := range ends {
		k.out.code[j].c = k.here()
	}
}

func (k *compiler) enter(m *Machine, state int) {
	k.emit(instruction{op: cMove, a: k.consts[int64(state)], d: k.slot(m.Var)})
	if m.Timer != nil {
		k.emit(instruction{op: cMove, a: k.consts[0], d: k.slot(m.Timer)})
	}
}
