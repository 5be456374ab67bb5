// Package csource prints a checked control program as C.
//
// The C is C99 for any compiler: integers only, no heap, no library, nothing
// global, right where int has 16 bits. It is meant to be read: every constant
// says what it stands for and where in the sheet it came from, every machine
// is one function with an exhaustive switch, every branch says why.
//
// Names are chosen here once (names.go) and only then printed. Text of the
// sheet is defused where it enters a comment or a string (text.go).
package csource

import (
	"fmt"
	"strings"
	"unicode/utf8"

	"makebreak/translate/logic"
)

// Facts is what a reader of the C wants to know besides the program.
type Facts struct {
	Title, Site string
	Sheet       string   // name of the sheet
	Hash        string   // SHA-256 of the sheet
	Replaces    []string // what the program takes over, one line each
	Stays       []string // what stays hard-wired
	Cautions    []string
	Loads       []Load
	Sensors     []Sensor
	Nonvolatile bool
	Watchdog    string // none internal external unknown
	Version     string
}

// Load is an output of the board.
type Load struct {
	Name, What string
	SafeState  string
	Rest       string
	RestsOn    bool // with no supply to the output the load is on or open
	Pulsed     bool
	ReadBack   bool
}

// Sensor is an input of the board.
type Sensor struct {
	Name, What string
	Signed     bool
	Bits       int
}

// Source is a program with the facts around it.
type Source struct {
	Program *logic.Checked
	Facts   Facts
}

// printer gathers lines of C.
type printer struct {
	strings.Builder
	*names
	p     *logic.Checked
	order []logic.Block // what is printed of a step
	lo    string        // lower-case prefix of everything but macros

	uses
	used  uses // of the whole program, known from a first printing
	proof view
}

// uses is what the printed C makes use of.
type uses struct {
	signedUse, unsignedUse map[*logic.Const]bool
	helpersUsed            map[string]bool
	tablesUsed             map[*logic.Table]bool
}

func newUses() uses {
	return uses{map[*logic.Const]bool{}, map[*logic.Const]bool{}, map[string]bool{}, map[*logic.Table]bool{}}
}

// printer starts a file. Constants and helpers stand at the top of the C but
// depend on how the program below uses them, so that is printed once for
// nothing.
func (s Source) printer() *printer {
	first := &printer{p: s.Program, order: pruned(s.Program), names: chooseNames(s.Program), lo: s.Program.ID, uses: newUses()}
	first.machineFunctions()
	first.step()
	return &printer{p: first.p, order: first.order, names: first.names, lo: first.lo, uses: newUses(), used: first.uses}
}

func (w *printer) line(format string, args ...any) {
	fmt.Fprintf(w, format, args...)
	w.WriteByte('\n')
}

// comment prints a comment of one or more lines.
func (w *printer) comment(indent string, lines ...string) {
	var wrapped []string
	for _, l := range lines {
		wrapped = append(wrapped, wrap(Comment(l), lineWidth-len(indent)-3)...)
	}
	if len(wrapped) == 1 && len(indent)+columns(wrapped[0])+6 <= lineWidth {
		w.line("%s/* %s */", indent, wrapped[0])
		return
	}
	for i, l := range wrapped {
		lead := " * "
		if i == 0 {
			lead = "/* "
		}
		w.line("%s", strings.TrimRight(indent+lead+l, " "))
	}
	w.line("%s */", indent)
}

// wrap breaks a text at blanks. A word that is too long stays whole.
func wrap(text string, width int) []string {
	var lines []string
	line := ""
	for _, word := range strings.Fields(text) {
		switch {
		case line == "":
			line = word
		case columns(line)+1+columns(word) <= width:
			line += " " + word
		default:
			lines = append(lines, line)
			line = word
		}
	}
	return append(lines, line)
}

// columns is how wide a text stands on the screen, near enough.
func columns(s string) int { return utf8.RuneCountInString(s) }

// statement prints one statement or the head of one, broken at its junctions
// where it is long. What is not in brackets goes on one step further in.
func (w *printer) statement(indent, head string, p piece, tail string) {
	column := len(indent) + len(head)
	hang := len(indent) + 8
	if !p.closed() && column+len(p.flat())+len(tail) > lineWidth {
		w.line("%s%s%s%s", indent, head, p.layoutHanging(column, len(indent)+4, len(tail)), tail)
		return
	}
	w.line("%s%s%s%s", indent, head, p.layout(column, hang, len(tail)), tail)
}

// banner opens every file.
func (w *printer) banner(f Facts, file, what string) {
	lines := []string{file + ": " + what, "", "Equipment: " + f.Title}
	if f.Site != "" {
		lines = append(lines, "Site: "+f.Site)
	}
	lines = append(lines, "Printed by makebreak "+f.Version+" from "+f.Sheet, "Sheet SHA-256: "+f.Hash)
	if len(f.Replaces) > 0 {
		lines = append(lines, "", "Replaces:")
		for _, r := range f.Replaces {
			lines = append(lines, "- "+r)
		}
	}
	if len(f.Stays) > 0 {
		lines = append(lines, "", "Stays hard-wired, and must:")
		for _, r := range f.Stays {
			lines = append(lines, "- "+r)
		}
	}
	lines = append(lines, "")
	lines = append(lines, f.Cautions...)
	w.comment("", lines...)
}
