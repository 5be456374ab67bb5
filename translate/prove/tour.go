// Package prove walks a control program: it finds inputs that make everything
// happen that the program can do, keeps them as recorded sequences, and looks
// for sequences that break a property. It proves nothing by itself: what it
// has not found in its steps it has not found.
package prove

import "makebreak/translate/logic"

// Budget bounds a search.
type Budget struct {
	Steps int // steps of the program that may be run; 0 means DefaultSteps
}

// DefaultSteps is enough for a control with a few probes and machines.
const DefaultSteps = 16000

func (b Budget) steps() int {
	if b.Steps > 0 {
		return b.Steps
	}
	return DefaultSteps
}

// Tour is a set of recorded sequences that together make the program do all
// that the search could make it do.
type Tour struct {
	Vectors []Vector
	Upsets  []Upset
	Reached []Goal
	Missed  []Goal
	Broken  *Counterexample // of the first property found broken; nil: none was
	Steps   int             // how many steps the search ran
}

// Vector is one recorded sequence from a start.
type Vector struct {
	Start *logic.Record // what was remembered; nil: nothing
	Why   string        // what the sequence is for, where that is more than its goals
	Rows  []Row
}

// Row holds the inputs still for a number of steps.
type Row struct {
	Inputs  []int64 // in the order of Program.Inputs
	Steps   int     // one or more
	Outputs []int64 // after every step of the row, in the order of Program.Outputs
	Then    []int64 // nil, or the outputs after the second, fourth … step, where they alternate (a pulsed drive)
	State   []int64 // at the end of the row, in the order of Program.State
}

// Upset is a step from a state that cannot be, as if memory had been disturbed:
// a machine is in none of its states.
type Upset struct {
	Machine string
	State   []int64 // before the step, in the order of Program.State
	Inputs  []int64
	Outputs []int64
	After   []int64 // state after the step
}

// Counterexample is a sequence at the end of which a property is broken.
type Counterexample struct {
	Property *logic.Property
	Vector   Vector
}

// Length is how many steps a vector runs.
func (v *Vector) Length() int {
	n := 0
	for i := range v.Rows {
		n += v.Rows[i].Steps
	}
	return n
}

// Rows is how many rows the tour has.
func (t *Tour) Rows() int {
	n := 0
	for i := range t.Vectors {
		n += len(t.Vectors[i].Rows)
	}
	return n
}

// Visit searches for inputs that make the program do everything: be in every
// state, take every transition, let every term of every condition decide both
// ways and at the boundary of its comparison, run every timer to its limit,
// saturate every bound, start from every remembered value. A goal counts only
// when a mistake there would show in the outputs or in the state after the
// step. The search is the same at every call; it ends when its budget is used
// up or when it finds nothing new for a good while.
func Visit(c *logic.Checked, budget Budget) Tour {
	s := newSearch(c, budget.steps())
	s.patience = s.budget / 8
	s.run()
	t := s.assemble()
	t.Steps = s.spent
	return t
}
