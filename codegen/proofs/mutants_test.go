//go:build deep && unfinished

package proofs

import (
	"fmt"
	"os"
	"os/exec"
	"path/filepath"
	"strings"
	"sync"
	"testing"
	"time"
)

// enough of the mutants that are no equivalents have to be killed.
const enough = 0.98

// TestMutants changes the C of every example, one thing at a time. Its own
// check has to notice. What it does not notice has to be the same program: the
// model checker proves that for each such mutant, or it stands in equivalents
// with a reason.
func TestMutants(t *testing.T) {
	cc := "tcc"
	if _, err := exec.LookPath(cc); err != nil && os.Getenv("CI") == "" {
		cc = "gcc"
	}
	cc = tool(t, cc)
	for _, d := range examples(t) {
		t.Run(d.name, func(t *testing.T) {
			t.Parallel()
			began := time.Now()
			all := mutants(d.files[d.id+".c"], d.files[d.id+".h"])
			if len(all) < 200 {
				t.Fatalf("only %d mutants", len(all))
			}
			dir := d.folder(t)
			if out, _, err := run(dir, patience, cc, "-c", d.id+"_check.c", "-o", "check.o"); err != nil {
				t.Fatalf("%v: %s", err, out)
			}
			killed, stillborn, survivors := d.hunt(t, dir, cc, all)
			alive := len(all) - stillborn
			note(d.name, "mutants", float64(alive))
			note(d.name, "mutants_killed", float64(killed))
			note(d.name, "seconds_mutants", time.Since(began).Seconds())
			proven, listed := 0, 0
			for _, m := range survivors {
				switch reason := equivalents[unnumbered(m.what)]; {
				case d.same(t, m):
					proven++
				case reason != "":
					listed++
				default:
					t.Errorf("not noticed: %s", m.what)
				}
			}
			note(d.name, "mutants_proven_equivalent", float64(proven))
			note(d.name, "mutants_listed_equivalent", float64(listed))
			share := float64(killed) / float64(alive)
			t.Logf("%d mutants compile, %d do not; %d killed (%.1f %%), %d survive: %d proven the same, %d listed; %.0f s",
				alive, stillborn, killed, 100*share, len(survivors), proven, listed, time.Since(began).Seconds())
			if different := float64(killed) / float64(alive-proven-listed); different < enough {
				t.Errorf("%.1f %% of the mutants that are no equivalents killed", 100*different)
			}
		})
	}
}

// hunt runs the check on every mutant. One that does not compile is no mutant.
func (d design) hunt(t *testing.T, dir, cc string, all []mutant) (killed, stillborn int, survivors []mutant) {
	t.Helper()
	verdict := make([]string, len(all))
	var wait sync.WaitGroup
	next := make(chan int)
	for range 2 {
		wait.Go(func() {
			for i := range next {
				verdict[i] = try(dir, cc, fmt.Sprintf("m%d", i), all[i].text)
			}
		})
	}
	for i := range all {
		next <- i
	}
	close(next)
	wait.Wait()
	for i, v := range verdict {
		switch v {
		case "killed":
			killed++
		case "stillborn":
			stillborn++
		case "survived":
			survivors = append(survivors, all[i])
		default:
			t.Fatal(v)
		}
	}
	return killed, stillborn, survivors
}

func try(dir, cc, name, text string) string {
	if err := os.WriteFile(filepath.Join(dir, name+".c"), []byte(text), 0o666); err != nil {
		return err.Error()
	}
	if _, _, err := run(dir, patience, cc, "-w", name+".c", "check.o", "-o", name); err != nil {
		return "stillborn"
	}
	defer os.Remove(filepath.Join(dir, name))
	out, _, err := run(dir, 20*time.Second, "./"+name)
	if err == nil && strings.HasSuffix(out, " 0 failed\n") {
		return "survived"
	}
	return "killed"
}

// same asks the model checker whether a mutant does the same as the program
// from every state inside the invariant, or from every one that one or two
// steps lead to from there and in the first steps from a start.
func (d design) same(t *testing.T, m mutant) bool {
	t.Helper()
	dir := d.folder(t)
	renamed := ""
	for _, f := range []string{"start", "step", "remember"} {
		renamed += fmt.Sprintf("#define %s_%s %s_other_%s\n", d.id, f, d.id, f)
	}
	write(t, filepath.Join(dir, "other.c"), renamed+m.text)
	for _, steps := range []string{"1", "2", "3"} {
		out, _, err := run(dir, patience, tool(t, "cbmc"), d.id+"_proof.c", d.id+".c", "other.c", "-DSAME", "-DSTEPS="+steps, "--32", "--unwind", "17", "--unwinding-assertions")
		if err == nil && strings.Contains(out, "VERIFICATION SUCCESSFUL") {
			return true
		}
	}
	return false
}

// unnumbered is what a mutant is without the number of its line and the names
// that differ from sheet to sheet left as they are.
func unnumbered(what string) string {
	_, rest, _ := strings.Cut(what, ": ")
	return rest
}

// equivalents are mutants that change nothing, although one step from some
// state inside the invariant shows a difference: no run gets into that state.
var equivalents = map[string]string{}
