// Package faults finds out what happens when something fails: for every
// function of the old control and every cause, what the load did with the old
// part, what it does with the new control alone, and what the hardware that
// stays makes of it.
//
// Old outcomes come from the sheet and the catalogue. New outcomes are not
// asserted: the fault is put into the inputs of the running program, and the
// result is read off.
package faults

// Verdict says what became of a function under one cause of failure.
type Verdict string

const (
	Kept     Verdict = "kept"     // ends no worse than before
	Stronger Verdict = "stronger" // ends better than before
	Weaker   Verdict = "weaker"   // ends worse, but something still ends it
	Lost     Verdict = "lost"     // ended safely before, and nothing ends it now
	Unknown  Verdict = "unknown"  // cannot be told from what is known
)

// Row is one function under one cause.
type Row struct {
	Function        string // what the old part did
	About           string // id of the part
	Cause           string
	OldOutcome      string
	NewAlone        string
	NewWithHardware string
	Verdict         Verdict
	Evidence        string
}
