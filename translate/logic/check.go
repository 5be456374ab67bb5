package logic

import (
	"errors"
	"fmt"
	"regexp"
)

// Checked is a program that has been found sound. It alone is run, printed as
// C and explored.
type Checked struct {
	*Program
	Ranges map[*Expr]Range // what each node can be
	Writer map[*Var]int    // index in Order of the one block that writes a variable
	Locals []*Var          // variables that live for one step, in order of definition

	slots map[*Var]int
}

// maxBits is the width of the fault word.
const maxBits = 16

var identifier = regexp.MustCompile(`^[A-Za-z][A-Za-z0-9_]*$`)

// Check finds out whether a program means something in whole numbers on any
// machine: every variable has one writer and is read in the right order, every
// operation stays inside int32 and every write inside the declared range, no
// comparison is decided beforehand, every machine has a way on from each state.
// The error joins everything that is wrong.
func Check(p *Program) (*Checked, error) {
	k := &checker{
		Checked: &Checked{Program: p, Ranges: map[*Expr]Range{}, Writer: map[*Var]int{}},
		role:    map[*Var]role{},
		names:   map[string]string{},
	}
	k.declare()
	for i, b := range p.Order {
		k.owner(i, b)
	}
	for i, b := range p.Order {
		k.at = i
		k.block(b)
	}
	k.everythingWritten(p.State, "variable")
	k.everythingWritten(p.Outputs, "output")
	for _, prop := range p.Never {
		k.property(prop)
	}
	if len(k.errs) > 0 {
		return nil, fmt.Errorf("program %s: %w", p.ID, errors.Join(k.errs...))
	}
	k.number()
	return k.Checked, nil
}

type role uint8

const (
	isInput role = iota + 1
	isState
	isOutput
	isLocal
)

type checker struct {
	*Checked
	role  map[*Var]role
	names map[string]string
	at    int            // block being checked
	own   Block          // machine whose actions are being checked
	known map[*Var]Range // what is known more closely where the checker stands
	errs  []error
}

func (k *checker) fail(format string, args ...any) {
	err := fmt.Errorf(format, args...)
	for _, e := range k.errs {
		if e.Error() == err.Error() {
			return
		}
	}
	k.errs = append(k.errs, err)
}

func (k *checker) declare() {
	for _, c := range k.Consts {
		k.name(c.Name, "constant")
		if !Int32.Holds(c.Value) {
			k.fail("constant %s = %d (%s) does not fit 32 bits", c.Name, c.Value, c.Origin)
		}
	}
	for _, t := range k.Tables {
		k.name(t.Name, "table")
		k.table(t)
	}
	k.vars(k.Inputs, isInput)
	k.vars(k.State, isState)
	// An output may carry the name of a variable: they live in different structs.
	inside := k.names
	k.names = map[string]string{}
	k.vars(k.Outputs, isOutput)
	k.names = inside
}

func (k *checker) name(name, what string) {
	if !identifier.MatchString(name) {
		k.fail("%s %q: not a name", what, name)
	}
	if old, taken := k.names[name]; taken {
		k.fail("%s %s: there is a %s of that name", what, name, old)
	}
	k.names[name] = what
}

func (k *checker) vars(vs []*Var, r role) {
	what := map[role]string{isInput: "input", isState: "variable", isOutput: "output", isLocal: "local variable"}[r]
	for _, v := range vs {
		k.name(v.Name, what)
		k.role[v] = r
		k.variable(v)
	}
}

func (k *checker) variable(v *Var) {
	switch {
	case v.Kind == Bool && v.Range != Truth:
		k.fail("%s: a truth value has the range 0..1", v.Name)
	case v.Kind == Word && (v.Enum == nil || v.Range != Range{0, int64(len(v.Enum.Words)) - 1}):
		k.fail("%s: its range is not that of its states", v.Name)
	case v.Range.Lo > v.Range.Hi || !v.Range.Within(Int32):
		k.fail("%s: range %d..%d does not fit 32 bits", v.Name, v.Range.Lo, v.Range.Hi)
	case !v.Range.Holds(v.Start):
		k.fail("%s: starts at %d, outside %d..%d", v.Name, v.Start, v.Range.Lo, v.Range.Hi)
	}
}

func (k *checker) table(t *Table) {
	if len(t.X) != len(t.Y) || len(t.X) < 2 {
		k.fail("table %s: needs two or more points, and as many values", t.Name)
		return
	}
	for i := 1; i < len(t.X); i++ {
		dx, dy := t.X[i]-t.X[i-1], t.Y[i]-t.Y[i-1]
		if dx <= 0 {
			k.fail("table %s: point %d is not right of the one before", t.Name, i)
		}
		if !Int32.Holds(dx) || !Int32.Holds(dx*dy) || !Int32.Holds(-dx*dy) {
			k.fail("table %s: piece %d overflows 32 bits", t.Name, i)
		}
	}
	for i := range t.X {
		if !Int32.Holds(t.X[i]) || !Int32.Holds(t.Y[i]) {
			k.fail("table %s: point %d does not fit 32 bits", t.Name, i)
		}
	}
}

// owner notes which block writes what.
func (k *checker) owner(i int, b Block) {
	claim := func(v *Var, local bool) {
		if v == nil {
			return
		}
		if j, taken := k.Writer[v]; taken && (j != i || local) {
			k.fail("%s: written by two blocks", v.Name)
		}
		switch k.role[v] {
		case isInput:
			k.fail("%s: an input is never written", v.Name)
		case 0:
			if !local {
				k.fail("%s: written but not declared", v.Name)
				return
			}
			k.name(v.Name, "local variable")
			k.variable(v)
			k.role[v] = isLocal
			k.Locals = append(k.Locals, v)
		case isState:
			if local {
				k.fail("%s: a variable that lives on is not defined anew each step", v.Name)
			}
		}
		k.Writer[v] = i
	}
	switch b := b.(type) {
	case *Define:
		claim(b.Var, true)
	case *Set:
		claim(b.Var, false)
	case *Timer:
		claim(b.Var, false)
	case *Flags:
		claim(b.Out, true)
	case *Machine:
		claim(b.Var, false)
		claim(b.Timer, false)
		for _, s := range b.At {
			for _, t := range s.Goes {
				for _, a := range t.Do {
					claim(a.Var, false)
				}
			}
		}
	}
}

func (k *checker) everythingWritten(vs []*Var, what string) {
	for _, v := range vs {
		if _, ok := k.Writer[v]; !ok {
			k.fail("%s %s is never written", what, v.Name)
		}
	}
}

func (k *checker) block(b Block) {
	switch b := b.(type) {
	case *Define:
		k.write(b.Var, b.As)
	case *Set:
		k.set(b)
	case *Timer:
		if b.Restart == nil {
			k.fail("%s: nothing restarts the timer; say False where nothing does", b.Var.Name)
		}
		k.truth(b.Restart)
		k.truth(b.Hold)
		k.limit(b.Var, b.Limit)
	case *Flags:
		if len(b.Bits) > maxBits {
			k.fail("%s: %d conditions for %d bits", b.Out.Name, len(b.Bits), maxBits)
		}
		if most := int64(1)<<len(b.Bits) - 1; b.Out.Kind != Int || !(Range{0, most}).Within(b.Out.Range) {
			k.fail("%s: its %d conditions can make %d, it holds %d..%d", b.Out.Name, len(b.Bits), most, b.Out.Range.Lo, b.Out.Range.Hi)
		}
		for _, f := range b.Bits {
			k.truth(f.When)
		}
	case *Machine:
		k.machine(b)
	default:
		k.fail("block %d is of an unknown sort", k.at)
	}
}

func (k *checker) set(s *Set) {
	k.truth(s.When)
	k.write(s.Var, s.To)
}

func (k *checker) limit(v *Var, c *Const) {
	if c == nil || c.Value < 1 {
		k.fail("%s: a timer counts up to a constant of one or more", v.Name)
		return
	}
	if v.Range != (Range{0, c.Value}) {
		k.fail("%s: range %d..%d is not 0..%s (%d)", v.Name, v.Range.Lo, v.Range.Hi, c.Name, c.Value)
	}
}

func (k *checker) machine(m *Machine) {
	if m.Var.Kind != Word || len(m.At) != len(m.Var.Enum.Words) {
		k.fail("%s: a machine has one entry for each of its states", m.Var.Name)
		return
	}
	if m.Safe < 0 || m.Safe >= len(m.At) {
		k.fail("%s: the safe state is none of its states", m.Var.Name)
	}
	if m.Timer != nil {
		k.limit(m.Timer, m.Limit)
	}
	k.own = m
	defer func() { k.own = nil }()
	for i, s := range m.At {
		if s.Is != i {
			k.fail("%s: states out of order", m.Var.Name)
		}
		for _, t := range s.Goes {
			if t.To < 0 || t.To >= len(m.At) {
				k.fail("%s: leads to a state that does not exist", m.Var.Name)
			}
			k.truth(t.When)
			written := map[*Var]bool{}
			for _, a := range t.Do {
				a.To.Walk(func(e *Expr) {
					if e.Var != nil && written[e.Var] {
						k.fail("%s: read after it was written in the same transition", e.Var.Name)
					}
				})
				k.set(a)
				written[a.Var] = true
			}
		}
	}
}

func (k *checker) property(p *Property) {
	k.at = len(k.Order)
	for _, v := range p.Kept {
		k.role[v] = isState
		k.variable(v)
	}
	for i, b := range p.Watch {
		k.owner(len(k.Order)+i, b)
	}
	for i, b := range p.Watch {
		k.at = len(k.Order) + i
		k.block(b)
	}
	k.at = len(k.Order) + len(p.Watch)
	k.truth(p.Bad)
}

func (k *checker) truth(e *Expr) {
	if e == nil {
		return
	}
	k.rangeOf(e)
	if e.Kind != Bool {
		k.fail("%s: not a truth value", e)
	}
}

func (k *checker) write(v *Var, e *Expr) {
	if e == nil {
		k.fail("%s: nothing to write", v.Name)
		return
	}
	r := k.rangeOf(e)
	if e.Kind != v.Kind || (v.Kind == Word && e.Enum != v.Enum) {
		k.fail("%s: cannot hold %s", v.Name, e)
	}
	if !r.Within(v.Range) {
		k.fail("%s: %s can be %d..%d, it holds %d..%d", v.Name, e, r.Lo, r.Hi, v.Range.Lo, v.Range.Hi)
	}
}

// number gives every variable its place in the interpreter's memory.
func (k *checker) number() {
	k.slots = map[*Var]int{}
	add := func(vs []*Var) {
		for _, v := range vs {
			if _, ok := k.slots[v]; !ok {
				k.slots[v] = len(k.slots)
			}
		}
	}
	add(k.Inputs)
	add(k.State)
	for _, p := range k.Never {
		add(p.Kept)
	}
	add(k.Outputs)
	add(k.Locals)
}
