//go:build deep

package targets_test

import (
	"os"
	"strings"
	"testing"

	"makebreak/codegen/targets"
)

// There is one checksum everywhere, equal to the interpreter's, for every
// example; no compiler warns; <id>_check.c passes wherever it fits. (On the
// 8-bit targets and the Cortex-M0 it does not fit into the memory that their
// simulators have.)
func TestEveryTarget(t *testing.T) {
	pieces, err := targets.Examples("../..")
	if err != nil {
		t.Fatal(err)
	}
	if len(pieces) < 15 {
		t.Fatalf("only %d examples give a program", len(pieces))
	}
	for _, target := range targets.All() {
		t.Run(target.Name, func(t *testing.T) {
			if missing := target.Missing(); len(missing) > 0 {
				if os.Getenv("CI") != "" {
					t.Fatalf("not here: %v", missing)
				}
				t.Skipf("SKIPPED: not here: %v", missing)
			}
			t.Parallel()
			for _, p := range pieces {
				r, err := p.On(target, t.TempDir())
				if err != nil {
					t.Errorf("%s: %v", p.Name, err)
					continue
				}
				if target.Compiled {
					continue
				}
				if want := p.Want(r.Steps); r.Sum != want {
					t.Errorf("%s: %d steps give %s, the interpreter %s", p.Name, r.Steps, r.Sum, want)
				}
				if target.Check && !strings.HasSuffix(r.Checked, " 0 failed") {
					t.Errorf("%s: its own check says %q", p.Name, r.Checked)
				}
			}
		})
	}
}
