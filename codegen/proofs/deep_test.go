//go:build deep

package proofs

import (
	"context"
	"encoding/json"
	"fmt"
	"os"
	"os/exec"
	"path/filepath"
	"sort"
	"strings"
	"sync"
	"testing"
	"time"

	"makebreak/codegen"
	"makebreak/codegen/csource"
	"makebreak/survey"
	"makebreak/translate"
)

// design is one program with its C in a folder of its own.
type design struct {
	name  string // folder of the sheet
	id    string
	src   csource.Source
	files map[string]string
}

// examples are the designs that stand as packs in the project.
func examples(t *testing.T) []design {
	t.Helper()
	var all []design
	for _, sheet := range find(t, "../../examples/*/sheet.yaml") {
		d, ok := translated(t, sheet)
		pack := filepath.Join(filepath.Dir(sheet), "pack")
		if _, err := os.Stat(filepath.Join(pack, d.id+".c")); !ok || err != nil {
			continue // a stop is open: the C is withheld
		}
		for _, name := range []string{d.id + ".h", d.id + ".c", d.id + "_check.c", d.id + "_port.h", d.id + "_port.c"} {
			d.files[name] = read(t, filepath.Join(pack, name))
		}
		all = append(all, d)
	}
	if len(all) < 5 {
		t.Fatalf("only %d examples with C", len(all))
	}
	return all
}

// scenarios are the designs that the tests of translate use. Nobody would be
// given their C as it stands; as programs they are as good as any.
func scenarios(t *testing.T) []design {
	t.Helper()
	var all []design
	for _, sheet := range find(t, "../../translate/testdata/scenarios/*/sheet.yaml") {
		if d, ok := translated(t, sheet); ok {
			d.files[d.id+".h"], d.files[d.id+".c"] = d.src.Header(), d.src.Body()
			all = append(all, d)
		}
	}
	if len(all) < 5 {
		t.Fatalf("only %d scenarios with a program", len(all))
	}
	return all
}

func translated(t *testing.T, sheet string) (design, bool) {
	t.Helper()
	s, diags := survey.Read(filepath.Base(sheet), []byte(read(t, sheet)))
	if diags.HasErrors() {
		t.Fatalf("%s: %v", sheet, diags)
	}
	spec, diags := translate.Translate(s)
	if diags.HasErrors() {
		t.Fatalf("%s: %v", sheet, diags)
	}
	if spec.Program == nil {
		return design{}, false
	}
	d := design{name: filepath.Base(filepath.Dir(sheet)), id: spec.Program.ID}
	d.src = csource.Source{Program: spec.Program, Facts: codegen.Facts(spec, nil)}
	d.files = map[string]string{d.id + "_proof.c": d.src.Proof()}
	return d, true
}

// folder writes the files of a design for the tools.
func (d design) folder(t *testing.T) string {
	t.Helper()
	dir := t.TempDir()
	for name, text := range d.files {
		write(t, filepath.Join(dir, name), text)
	}
	return dir
}

func find(t *testing.T, pattern string) []string {
	t.Helper()
	found, err := filepath.Glob(pattern)
	if err != nil {
		t.Fatal(err)
	}
	return found
}

func read(t *testing.T, file string) string {
	t.Helper()
	data, err := os.ReadFile(file)
	if err != nil {
		t.Fatal(err)
	}
	return string(data)
}

func write(t *testing.T, file, text string) {
	t.Helper()
	if err := os.WriteFile(file, []byte(text), 0o666); err != nil {
		t.Fatal(err)
	}
}

// tool finds a program, or skips aloud; where CI is set it has to be there.
func tool(t *testing.T, name string) string {
	t.Helper()
	path, err := exec.LookPath(name)
	if err != nil {
		if os.Getenv("CI") != "" {
			t.Fatalf("%s is not here", name)
		}
		t.Skipf("SKIPPED: %s is not here", name)
	}
	return path
}

// patience is how long one run of a tool may take.
const patience = 3 * time.Minute

// run gives what a tool says, its error if it failed, and the seconds it took.
func run(dir string, limit time.Duration, name string, args ...string) (out string, took float64, err error) {
	ctx, cancel := context.WithTimeout(context.Background(), limit)
	defer cancel()
	cmd := exec.CommandContext(ctx, name, args...)
	cmd.Dir = dir
	began := time.Now()
	data, err := cmd.CombinedOutput()
	if ctx.Err() != nil {
		err = ctx.Err()
	}
	return string(data), time.Since(began).Seconds(), err
}

func clip(s string, n int) string {
	if len(s) > n {
		return s[:n] + "…"
	}
	return s
}

// figures is what has been measured of each design, for a report.
var figures = struct {
	sync.Mutex
	of map[string]map[string]float64
}{of: map[string]map[string]float64{}}

func note(design, what string, value float64) {
	figures.Lock()
	defer figures.Unlock()
	if figures.of[design] == nil {
		figures.of[design] = map[string]float64{}
	}
	figures.of[design][what] = value
}

func TestMain(m *testing.M) {
	code := m.Run()
	if err := report(os.Getenv("MAKEBREAK_PROOFS")); err != nil {
		fmt.Fprintln(os.Stderr, err)
		code = 1
	}
	os.Exit(code)
}

// report writes the figures to proofs.json in a folder, if one is named.
func report(dir string) error {
	if dir == "" {
		return nil
	}
	if err := os.MkdirAll(dir, 0o777); err != nil {
		return err
	}
	data, err := json.MarshalIndent(figures.of, "", "  ")
	if err != nil {
		return err
	}
	return os.WriteFile(filepath.Join(dir, "proofs.json"), append(data, '\n'), 0o666)
}

func sortedKeys[V any](m map[string]V) []string {
	keys := make([]string, 0, len(m))
	for k := range m {
		keys = append(keys, k)
	}
	sort.Strings(keys)
	return keys
}

func words(s string) []string { return strings.Fields(s) }
