//go:build deep && unfinished

package proofs

import (
	"fmt"
	"path/filepath"
	"regexp"
	"strconv"
	"strings"
	"testing"
	"time"
)

var (
	covered  = regexp.MustCompile(`^ *([0-9]+|-|#####|=====)\*?: *(\d+):(.*)$`)
	untaken  = regexp.MustCompile(`^branch +(\d+) (?:taken 0|never executed)`)
	anyTaken = regexp.MustCompile(`^branch +\d+ `)
	splitter = regexp.MustCompile(`&&|\|\||\?`)
	heads    = regexp.MustCompile(`^(?:\} else if |if |while |return |const bool \w+ = |(?:const )?u?int\d+_t \w+ = |changed = |[\w>-]+ = )`)
)

// TestCoverage runs the check of every example under gcov. Each branch has to
// be taken both ways. Where one is not, the model checker has to prove that no
// run takes it: the branch is replaced by a claim that it is not reached.
func TestCoverage(t *testing.T) {
	gcc := tool(t, "gcc")
	tool(t, "gcov")
	for _, d := range examples(t) {
		t.Run(d.name, func(t *testing.T) {
			t.Parallel()
			dir := d.folder(t)
			if out, _, err := run(dir, patience, gcc, "-std=c99", "-O0", "--coverage", d.id+".c", d.id+"_check.c", "-o", "covered"); err != nil {
				t.Fatalf("%v: %s", err, out)
			}
			if out, _, err := run(dir, patience, "./covered"); err != nil {
				t.Fatalf("%v: %s", err, out)
			}
			if out, _, err := run(dir, patience, "gcov", "-b", "-c", "covered-"+d.id+".gcda"); err != nil {
				t.Fatalf("%v: %s", err, out)
			}
			lines := strings.Split(d.files[d.id+".c"], "\n")
			branches, missing, proven := 0, 0, 0
			at := 0
			for _, l := range strings.Split(read(t, filepath.Join(dir, d.id+".c.gcov")), "\n") {
				if m := covered.FindStringSubmatch(l); m != nil {
					at, _ = strconv.Atoi(m[2])
					continue
				}
				if anyTaken.MatchString(l) {
					branches++
				}
				if m := untaken.FindStringSubmatch(l); m != nil {
					missing++
					n, _ := strconv.Atoi(m[1])
					if d.unreachable(t, lines, at-1, n) {
						proven++
					} else if why := unreached[strings.TrimSpace(lines[at-1])]; why == "" {
						t.Errorf("line %d, branch %d: not taken by the check, and not proven to be out of reach: %s", at, n, strings.TrimSpace(lines[at-1]))
					}
				}
			}
			if branches < 50 {
				t.Fatalf("gcov tells of %d branches", branches)
			}
			note(d.name, "branches", float64(branches))
			note(d.name, "branches_taken", float64(branches-missing))
			note(d.name, "branches_proven_unreachable", float64(proven))
			t.Logf("%d branches, %d taken, %d proven to be out of reach, %d not", branches, branches-missing, proven, missing-proven)
		})
	}
}

// unreached are branches that the check does not take and that the model
// checker cannot prove to be out of reach, each with its reason.
var unreached = map[string]string{}

// unreachable proves that no run takes a branch: the term behind it gets a
// claim that it never comes out that way. gcov numbers the branches of a line
// in pairs, one pair a term, and does not say which of a pair is true, so that
// the run that the check made has to say which way is missing.
func (d design) unreachable(t *testing.T, lines []string, at, branch int) bool {
	t.Helper()
	found := terms(lines[at])
	if branch/2 >= len(found) {
		t.Errorf("line %d has no branch %d: %s", at+1, branch, lines[at])
		return false
	}
	term := found[branch/2]
	for _, way := range []bool{true, false} {
		if d.visits(t, lines, at, term, way) {
			continue
		}
		return d.neverReached(t, lines, at, term, way)
	}
	t.Errorf("line %d: gcov and the run disagree about %s", at+1, lines[at][term[0]:term[1]])
	return false
}

// terms gives where the terms of a condition stand in a line.
func terms(line string) [][2]int {
	from := len(line) - len(strings.TrimLeft(line, " "))
	from += len(heads.FindString(line[from:]))
	var all [][2]int
	add := func(a, b int) {
		for a < b && strings.ContainsRune(" ;{", rune(line[b-1])) {
			b--
		}
		for a < b && line[a] == ' ' {
			a++
		}
		for a < b {
			text := line[a:b]
			open, closed := strings.Count(text, "("), strings.Count(text, ")")
			switch {
			case strings.HasPrefix(text, "!"):
				a++
			case open > closed && text[0] == '(':
				a++
			case closed > open && text[len(text)-1] == ')':
				b--
			default:
				all = append(all, [2]int{a, b})
				return
			}
		}
	}
	for _, m := range splitter.FindAllStringIndex(line[from:], -1) {
		add(from, from+m[0])
		line = line[:from] + strings.Repeat(" ", m[1]) + line[from+m[1]:]
	}
	add(from, len(line))
	return all
}

// instrumented is the program with something that is done where a term comes
// out one way.
func instrumented(lines []string, at int, term [2]int, way bool, do string) string {
	l := lines[at]
	text := l[term[0]:term[1]]
	with := fmt.Sprintf("((%s) ? (%s, true) : false)", text, do)
	if !way {
		with = fmt.Sprintf("((%s) ? true : (%s, false))", text, do)
	}
	changed := append([]string(nil), lines...)
	changed[at] = l[:term[0]] + with + l[term[1]:]
	return strings.Join(changed, "\n")
}

// visits reports whether the check makes a term come out one way.
func (d design) visits(t *testing.T, lines []string, at int, term [2]int, way bool) bool {
	t.Helper()
	dir := d.folder(t)
	write(t, filepath.Join(dir, "visit.c"), "#include <stdlib.h>\n"+instrumented(lines, at, term, way, "exit(77)"))
	if out, _, err := run(dir, patience, tool(t, "gcc"), "-std=c99", "-w", "visit.c", d.id+"_check.c", "-o", "visit"); err != nil {
		t.Fatalf("%v: %s", err, out)
	}
	_, _, err := run(dir, time.Minute, "./visit")
	return err != nil
}

// neverReached proves that a term does not come out one way: in the first
// steps from a start, and after them from any state inside the invariant.
func (d design) neverReached(t *testing.T, lines []string, at int, term [2]int, way bool) bool {
	t.Helper()
	m := mutant{text: instrumented(lines, at, term, way, `__CPROVER_assert(0, "reached")`)}
	return d.same(t, m)
}
