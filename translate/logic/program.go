// Package logic holds the control program: what the new control does, step by
// step, in whole numbers.
//
// A Program is a list of blocks that one step runs from top to bottom. Its
// meaning is fixed by this package and by nothing else: Run is the definition,
// the C that is printed from a Program must agree with it bit for bit, and
// whatever explores or proves a program walks the same code.
//
// A kind of device is added by building a Program out of these parts. Nothing
// in here knows about thermostats.
package logic

// Kind of a variable or an expression.
type Kind uint8

const (
	Bool Kind = iota + 1
	Int
	Word // a state of an Enum
)

// Range is a closed interval of whole numbers.
type Range struct{ Lo, Hi int64 }

// Holds reports whether v lies in the range.
func (r Range) Holds(v int64) bool { return r.Lo <= v && v <= r.Hi }

// Within reports whether the whole of r lies in o.
func (r Range) Within(o Range) bool { return o.Lo <= r.Lo && r.Hi <= o.Hi }

// Ranges that have a meaning of their own.
var (
	Truth = Range{0, 1}
	Count = Range{0, 65535}            // what a uint16_t input can hold, whatever the converter
	Int16 = Range{-32768, 32767}       // int is at least this wide in C
	Int32 = Range{-1 << 31, 1<<31 - 1} // nothing in a program is wider
)

// Const is a named number with its history.
type Const struct {
	Name    string // upper case, unique in the program
	Value   int64
	Unit    string // counts, steps, permille, …
	Means   string // the value in engineering units: "60 degC"
	Origin  string // where it came from: a key of the sheet, or "assumed: …"
	Working string // how it was worked out
}

// Enum is the set of states of a machine.
type Enum struct {
	Words []EnumWord
}

// EnumWord is one state: its name in C (lower case) and what it means.
type EnumWord struct{ Name, What string }

// Var is an input, an output, a variable that lives from step to step, or (in
// a Define) one that lives for one step.
type Var struct {
	Name  string
	What  string
	Kind  Kind
	Enum  *Enum // Kind Word
	Range Range // proven by Check to hold after every write
	Start int64 // value after start; for a surviving variable: when there is no good record
	// Survives: the value is part of the record that outlives a power cut.
	Survives bool
	Signed   bool // an input that C receives as int16_t
}

// Program is the one meaning of the new control.
type Program struct {
	ID, Title string
	StepMS    int64
	Consts    []*Const
	Tables    []*Table
	Inputs    []*Var
	State     []*Var
	Outputs   []*Var
	Order     []Block // one step, top to bottom; nothing else decides the order
	Never     []*Property
}

// Table maps a number to a number by straight pieces between its points. X
// rises strictly. Left of the first and right of the last point the end values
// hold. Between, y = y0 + (y1-y0)*(x-x0)/(x1-x0), the division cutting off
// towards zero.
type Table struct {
	Name, What string
	X, Y       []int64
	Unit       string
	Working    string
}

// Block is one part of a step.
type Block interface{ block() }

// Define works something out once a step. It may define a local or an output.
type Define struct {
	Var *Var
	As  *Expr
}

// Set changes a variable that lives from step to step. When nil: always.
type Set struct {
	Var  *Var
	When *Expr
	To   *Expr
	Why  string
}

// Timer counts steps: 0 while Restart, unchanged while Hold, else one more up to Limit.
type Timer struct {
	Var     *Var
	Limit   *Const
	Restart *Expr
	Hold    *Expr // may be nil
	Why     string
}

// Machine is a set of states of which one is current.
type Machine struct {
	Var   *Var // Kind Word
	What  string
	Timer *Var   // steps since the last transition, up to Limit; may be nil
	Limit *Const // with Timer
	Safe  int    // where a value that is no state goes
	At    []*State
}

// State lists the ways out of one state; At holds one for each word of the
// machine's Enum, in its order.
type State struct {
	Is   int
	Goes []*Transition // the first that holds is taken; at most one a step
}

type Transition struct {
	To   int
	When *Expr
	Do   []*Set
	Why  string
}

// Flags gathers conditions into one number, one bit each, lowest first.
type Flags struct {
	Out  *Var
	Bits []Flag
}

type Flag struct {
	Name string // lower case
	What string
	When *Expr
}

func (*Define) block()  {}
func (*Set) block()     {}
func (*Timer) block()   {}
func (*Machine) block() {}
func (*Flags) block()   {}

// Property says what must never be true at the end of a step. Watch blocks run
// after Order and may keep variables of their own, so that a property can
// speak of the step before.
type Property struct {
	Name, Why string
	Kept      []*Var
	Watch     []Block
	Bad       *Expr
}

// Record is what survives a power cut: the values of the surviving variables
// in the order of Program.Survivors, and a check word over them.
type Record struct {
	Values []int64
	Check  uint16
}

// Survivors lists the variables that outlive a power cut.
func (p *Program) Survivors() []*Var {
	var vs []*Var
	for _, v := range p.State {
		if v.Survives {
			vs = append(vs, v)
		}
	}
	return vs
}

// CheckSeed is what the check word of a record starts from. It depends on
// which variables the record holds, so that the record of another program is
// refused. The factor and the seed are odd or nonzero such that a blank
// record, all zeros or all ones, is refused as well.
func (p *Program) CheckSeed() uint16 {
	seed := uint32(23131)
	for _, v := range p.Survivors() {
		for i := 0; i < len(v.Name); i++ {
			seed = (seed*31 + uint32(v.Name[i])) & 0xFFFF
		}
	}
	return uint16(seed | 1)
}

// CheckFactor multiplies the check word before each value is added.
const CheckFactor = 31

// CheckWord works out the check word over the values of a record: starting at
// CheckSeed, word = word*CheckFactor + value for each, modulo 65536, high half of a
// value before its low half where it needs more than 16 bits.
func (p *Program) CheckWord(values []int64) uint16 {
	word := uint32(p.CheckSeed())
	for i, v := range p.Survivors() {
		u := uint32(int32(values[i]))
		if v.Range.Hi > 65535 || v.Range.Lo < -32768 {
			word = (word*CheckFactor + u>>16) & 0xFFFF
		}
		word = (word*CheckFactor + u&0xFFFF) & 0xFFFF
	}
	return uint16(word)
}
