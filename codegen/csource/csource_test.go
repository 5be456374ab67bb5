package csource_test

import (
	"errors"
	"flag"
	"fmt"
	"os"
	"os/exec"
	"path/filepath"
	"strings"
	"syscall"
	"testing"

	"github.com/google/go-cmp/cmp"

	"makebreak/codegen"
	"makebreak/codegen/csource"
	"makebreak/survey"
	"makebreak/translate"
	"makebreak/translate/logic"
)

var (
	update   = flag.Bool("update", false, "rewrite the golden files")
	programs = flag.Uint64("programs", 12, "how many random programs are compiled")
)

// strict is what the emitted C has to pass without a warning.
var strict = strings.Fields(`-std=c99 -O2 -Wall -Wextra -Wpedantic -pedantic-errors -Wconversion -Wsign-conversion -Wshadow -Wundef
-Wcast-qual -Wcast-align -Wstrict-prototypes -Wmissing-prototypes -Wswitch-default -Wswitch-enum -Wdouble-promotion -Wfloat-equal
-Wformat=2 -Wvla -Wbad-function-cast -Wredundant-decls -Wwrite-strings -Werror`)

var sanitized = strings.Fields(`-std=c99 -O1 -g -fsanitize=address,undefined -fno-sanitize-recover=all`)

// compiler finds a C compiler, or skips aloud; where CI is set it has to be there.
func compiler(t *testing.T, name string) string {
	t.Helper()
	path, err := exec.LookPath(name)
	if err != nil {
		without(t, name)
	}
	return path
}

// without skips aloud for want of a tool; where CI is set that is a failure.
func without(t *testing.T, tool string) {
	t.Helper()
	if os.Getenv("CI") != "" {
		t.Fatalf("%s is not here", tool)
	}
	t.Skipf("SKIPPED: %s is not here", tool)
}

func write(t *testing.T, dir string, files map[string]string) {
	t.Helper()
	for name, text := range files {
		if err := os.WriteFile(filepath.Join(dir, name), []byte(text), 0o666); err != nil {
			t.Fatal(err)
		}
	}
}

func command(t *testing.T, dir, name string, args ...string) string {
	t.Helper()
	out, err := try(dir, name, args...)
	if err != nil {
		t.Fatalf("%s %s: %v\n%s", name, strings.Join(args, " "), err, clip(out, 4000))
	}
	return out
}

func try(dir, name string, args ...string) (string, error) {
	run := func(name string, args ...string) (string, error) {
		cmd := exec.Command(name, args...)
		cmd.Dir = dir
		out, err := cmd.CombinedOutput()
		return string(out), err
	}
	out, err := run(name, args...)
	if errors.Is(err, syscall.ENOEXEC) { // a kernel without 32-bit programs
		return run("qemu-i386", append([]string{name}, args...)...)
	}
	return out, err
}

func clip(s string, n int) string {
	if len(s) > n {
		return s[:n] + "…"
	}
	return s
}

func with(flags []string, more ...string) []string {
	return append(append([]string(nil), flags...), more...)
}

// pack is every file of C that a source gives, and the harness.
func pack(s csource.Source, steps int) map[string]string {
	id := s.Program.ID
	return map[string]string{
		id + ".h": s.Header(), id + ".c": s.Body(),
		id + "_port.h": s.PortHeader(), id + "_port.c": s.PortBody(),
		id + "_check.c": s.Check(recorded(s.Program), nil),
		"harness.c":     s.Harness(steps),
	}
}

const (
	randomSteps = 200_000 // with gcc, for every program
	fewSteps    = 20_000  // with the other compilers
)

func checksum(s csource.Source, steps int) string {
	return fmt.Sprintf("%08x\n", csource.Checksum(s.Program, steps))
}

// recorded runs inputs that change now and then through the interpreter, with
// and without a record at the start.
func recorded(c *logic.Checked) []csource.Vector {
	var vectors []csource.Vector
	run := c.NewRun()
	run.Start(nil)
	records := []*logic.Record{nil}
	for _, values := range [][]int64{lowest(c), highest(c)} {
		records = append(records, &logic.Record{Values: values, Check: c.CheckWord(values)})
	}
	for i, rec := range records {
		v := csource.Vector{Start: rec}
		run.Start(rec)
		for r := int64(0); r < 120; r++ {
			row := csource.Row{}
			for n, in := range c.Inputs {
				row.Inputs = append(row.Inputs, drawn(in, r*7+int64(n)*13+int64(i)))
			}
			for row.Outputs == nil || (row.Steps < 300 && cmp.Equal(row.Outputs, after(run, c.Outputs, row.Inputs))) {
				if row.Outputs == nil {
					row.Outputs = after(run, c.Outputs, row.Inputs)
				}
				run.Step(row.Inputs)
				row.Steps++
			}
			row.State = values(run, c.State)
			v.Rows = append(v.Rows, row)
		}
		vectors = append(vectors, v)
	}
	return vectors
}

func lowest(c *logic.Checked) (vs []int64) {
	for _, v := range c.Survivors() {
		vs = append(vs, v.Range.Lo)
	}
	return vs
}

func highest(c *logic.Checked) (vs []int64) {
	for _, v := range c.Survivors() {
		vs = append(vs, v.Range.Hi)
	}
	return vs
}

func drawn(in *logic.Var, n int64) int64 {
	switch {
	case in.Kind == logic.Bool:
		return n / 5 % 2
	case in.Signed:
		return []int64{-32768, -1, 0, 250, 601, 32767}[n%6]
	}
	return []int64{0, 80, 81, 404, 405, 608, 609, 806, 807, 893, 894, 895, 950, 4019, 4020, 65535}[n%16]
}

func values(run *logic.Run, vs []*logic.Var) []int64 {
	all := []int64{}
	for _, v := range vs {
		all = append(all, run.Get(v))
	}
	return all
}

// after gives the outputs of one step more, without taking it.
func after(run *logic.Run, outputs []*logic.Var, inputs []int64) []int64 {
	f := run.Fork()
	f.Step(inputs)
	return values(f, outputs)
}

// proven compiles a pack with the strictest flags, runs its check, and runs
// the same pseudo-random inputs through interpreter and C.
func proven(t *testing.T, src csource.Source, cc string) {
	t.Helper()
	id, dir, want := src.Program.ID, t.TempDir(), checksum(src, randomSteps)
	write(t, dir, pack(src, randomSteps))
	command(t, dir, cc, with(strict, "-c", id+"_port.c")...)
	for _, flags := range [][]string{strict, sanitized} {
		command(t, dir, cc, with(flags, id+".c", "harness.c", "-o", "harness")...)
		if got := command(t, dir, "./harness"); got != want {
			t.Errorf("C gives %s, the interpreter %s", got, want)
		}
		command(t, dir, cc, with(flags, id+".c", id+"_check.c", "-o", "check")...)
		if got := command(t, dir, "./check"); !strings.HasSuffix(got, " 0 failed\n") {
			t.Errorf("its own check: %s", got)
		}
	}
}

func TestPrograms(t *testing.T) {
	gcc := compiler(t, "gcc")
	for _, src := range sources(t) {
		t.Run(src.Program.ID, func(t *testing.T) {
			t.Parallel()
			proven(t, src, gcc)
		})
	}
}

func TestSheets(t *testing.T) {
	gcc := compiler(t, "gcc")
	for _, sheet := range sheets(t) {
		t.Run(filepath.Base(filepath.Dir(sheet)), func(t *testing.T) {
			t.Parallel()
			proven(t, sourceOf(t, sheet), gcc)
		})
	}
}

// TestProgramsWithOtherCompilers compiles and runs the programs written for the
// printer, and those of all sheets, with whatever else is here.
func TestProgramsWithOtherCompilers(t *testing.T) {
	for _, c := range []struct {
		name, cc string
		flags    []string
		run      bool
	}{
		{"clang", "clang", with(strict), true},
		{"tcc", "tcc", []string{"-Wall", "-Werror"}, true},
		{"gcc 32 bit", "gcc", with(strict, "-m32", "-fsanitize=undefined", "-fno-sanitize-recover=all"), true},
		{"gcc short enumerations", "gcc", with(strict, "-fshort-enums"), true},
		{"avr-gcc", "avr-gcc", with(strict, "-mmcu=atmega328p", "-Os"), false},
	} {
		t.Run(c.name, func(t *testing.T) {
			t.Parallel()
			cc := compiler(t, c.cc)
			if c.name == "gcc 32 bit" && !works(t, cc, "-m32") {
				without(t, "gcc's 32-bit library")
			}
			all := sources(t)
			for _, sheet := range sheets(t) {
				all = append(all, sourceOf(t, sheet))
			}
			for _, src := range all {
				id, dir := src.Program.ID, t.TempDir()
				write(t, dir, pack(src, fewSteps))
				for _, file := range []string{id, id + "_port"} {
					command(t, dir, cc, with(c.flags, "-c", file+".c", "-o", file+".o")...)
				}
				if !c.run {
					continue
				}
				command(t, dir, cc, with(c.flags, id+".c", "harness.c", "-o", "harness")...)
				if got, want := command(t, dir, "./harness"), checksum(src, fewSteps); got != want {
					t.Errorf("%s: C gives %s, the interpreter %s", id, got, want)
				}
			}
		})
	}
}

func works(t *testing.T, cc string, flags ...string) bool {
	dir := t.TempDir()
	write(t, dir, map[string]string{"a.c": "int main(void) { return 0; }\n"})
	_, err := try(dir, cc, with(flags, "a.c", "-o", "a")...)
	if err != nil && os.Getenv("CI") != "" {
		t.Fatalf("%s %v does not work here", cc, flags)
	}
	return err == nil
}

// TestCheckNotices changes the C in one place: its own check has to see it.
func TestCheckNotices(t *testing.T) {
	gcc := compiler(t, "gcc")
	for _, c := range []struct{ id, what, from, to string }{
		{"tank1", "threshold", "TANK_STAT_MAKE 894u", "TANK_STAT_MAKE 895u"},
		{"tank1", "safe state of the limit", "default: /* not a state: memory was upset */\n        m->high_limit = (uint8_t)TANK1_HIGH_LIMIT_TRIPPED", "default: /* not a state: memory was upset */\n        m->high_limit = (uint8_t)TANK1_HIGH_LIMIT_CLOSED"},
		{"tank1", "start", "m->reset_before = true", "m->reset_before = false"},
		{"tank1", "check word not compared", "(r->check == tank1_check_word(r))", "(r->check != 1u)"},
		{"tank1", "range of the record", "(r->high_limit <= 1u)", "(r->high_limit <= 2u)"},
		{"tank1", "record not up to date", "now.high_limit = m->high_limit", "now.high_limit = r->high_limit"},
		{"tank1", "fault bit", "fault | TANK1_FAULT_HIGH_LIMIT", "fault | TANK1_FAULT_TANK_PROBE"},
		{"num", "check word of a wide variable", "((uint32_t)r->large >> 16)", "((uint32_t)r->large >> 15)"},
		{"num", "table", "1501", "1502"},
	} {
		t.Run(c.id+" "+c.what, func(t *testing.T) {
			t.Parallel()
			for _, src := range sources(t) {
				if src.Program.ID != c.id {
					continue
				}
				dir, files := t.TempDir(), pack(src, fewSteps)
				if n := strings.Count(files[c.id+".c"], c.from); n != 1 {
					t.Fatalf("%q stands %d times in the C", c.from, n)
				}
				files[c.id+".c"] = strings.Replace(files[c.id+".c"], c.from, c.to, 1)
				write(t, dir, files)
				command(t, dir, gcc, "-std=c99", c.id+".c", c.id+"_check.c", "-o", "check")
				out, err := try(dir, "./check")
				if err == nil || strings.HasSuffix(out, " 0 failed\n") {
					t.Errorf("not noticed: %s", clip(out, 500))
				}
			}
		})
	}
}

// TestAlternatingRow replays outputs that change from step to step.
func TestAlternatingRow(t *testing.T) {
	gcc := compiler(t, "gcc")
	was, now := truth("was"), truth("pump_drive")
	c := checked(t, &logic.Program{ID: "alt", StepMS: 10, State: []*logic.Var{was}, Outputs: []*logic.Var{now}, Order: []logic.Block{
		&logic.Define{Var: now, As: logic.Not(logic.Prev(was))},
		&logic.Set{Var: was, To: logic.Use(now)},
	}})
	src := csource.Source{Program: c}
	row := csource.Row{Steps: 5, Outputs: []int64{1}, Then: []int64{0}, State: []int64{1}}
	for _, good := range []bool{true, false} {
		if !good {
			row.Then = nil
		}
		dir := t.TempDir()
		write(t, dir, map[string]string{"alt.h": src.Header(), "alt.c": src.Body(), "alt_check.c": src.Check([]csource.Vector{{Rows: []csource.Row{row}}}, nil)})
		command(t, dir, gcc, with(strict, "alt.c", "alt_check.c", "-o", "check")...)
		if out, err := try(dir, "./check"); (err == nil) != good {
			t.Errorf("row as it is %v: %v %s", good, err, out)
		}
	}
}

// TestGolden keeps one whole program for reading.
func TestGolden(t *testing.T) {
	src := csource.Source{Program: checked(t, waterHeater()), Facts: waterHeaterFacts()}
	compareGolden(t, src, []string{"tank1.h", "tank1.c", "tank1_port.h", "tank1_port.c"})
	compareGolden(t, csource.Source{Program: checked(t, numbers())}, []string{"num.c"})
}

func compareGolden(t *testing.T, src csource.Source, names []string) {
	t.Helper()
	files := pack(src, fewSteps)
	for _, name := range names {
		path := filepath.Join("testdata", name)
		if *update {
			if err := os.WriteFile(path, []byte(files[name]), 0o666); err != nil {
				t.Fatal(err)
			}
		}
		want, err := os.ReadFile(path)
		if err != nil {
			t.Fatal(err)
		}
		if diff := cmp.Diff(string(want), files[name]); diff != "" {
			t.Errorf("%s differs (- wanted, + got):\n%s", path, diff)
		}
	}
}

// TestWidth: lines of the C are at most 100 columns wide, of what people read.
func TestWidth(t *testing.T) {
	all := sources(t)
	for _, sheet := range sheets(t) {
		all = append(all, sourceOf(t, sheet))
	}
	for _, src := range all {
		for name, text := range pack(src, fewSteps) {
			if name == "harness.c" {
				continue
			}
			for i, l := range strings.Split(text, "\n") {
				if len([]rune(l)) > 100 {
					t.Errorf("%s:%d: %d columns: %s", name, i+1, len([]rune(l)), l)
				}
				if strings.TrimRight(l, " \t") != l {
					t.Errorf("%s:%d: blanks at the end", name, i+1)
				}
			}
		}
	}
}

// TestSameBytes: the same program gives the same text.
func TestSameBytes(t *testing.T) {
	a, b := sources(t), sources(t)
	for i := range a {
		if diff := cmp.Diff(pack(a[i], fewSteps), pack(b[i], fewSteps)); diff != "" {
			t.Errorf("%s: two runs differ: %s", a[i].Program.ID, diff)
		}
	}
}

// TestSizeOnAVR: the function of the hand-written yardstick in less than half
// of its 776 bytes (ATmega328P, avr-gcc 5.4 -Os; our own measurement).
func TestSizeOnAVR(t *testing.T) {
	cc := compiler(t, "avr-gcc")
	src := csource.Source{Program: checked(t, waterHeater()), Facts: waterHeaterFacts()}
	dir := t.TempDir()
	write(t, dir, pack(src, fewSteps))
	command(t, dir, cc, with(strict, "-mmcu=atmega328p", "-Os", "-c", "tank1.c", "-o", "tank1.o")...)
	out := command(t, dir, compiler(t, "avr-size"), "tank1.o")
	var text, data int
	if _, err := fmt.Sscanf(strings.Split(out, "\n")[1], "%d %d", &text, &data); err != nil {
		t.Fatalf("%v in %s", err, out)
	}
	t.Logf("%d bytes of flash, %d of data", text, data)
	if text > 776/2 || data != 0 {
		t.Errorf("%d bytes of flash and %d of data, at most %d and 0 wanted", text, data, 776/2)
	}
}

// sheets lists all sheets of the project that give a program.
func sheets(t *testing.T) []string {
	t.Helper()
	var all []string
	for _, pattern := range []string{"../../examples/*/sheet.yaml", "../../translate/testdata/scenarios/*/sheet.yaml"} {
		found, err := filepath.Glob(pattern)
		if err != nil {
			t.Fatal(err)
		}
		all = append(all, found...)
	}
	if len(all) < 6 {
		t.Fatalf("only %d sheets found", len(all))
	}
	return all
}

func sourceOf(t testing.TB, sheet string) csource.Source {
	t.Helper()
	data, err := os.ReadFile(sheet)
	if err != nil {
		t.Fatal(err)
	}
	s, diags := survey.Read("sheet.yaml", data)
	if diags.HasErrors() {
		t.Fatalf("%s: %v", sheet, diags)
	}
	var with []translate.Option
	if s.Process.Log.Set {
		log, err := os.ReadFile(filepath.Join(filepath.Dir(sheet), s.Process.Log.V))
		if err != nil {
			t.Fatal(err)
		}
		with = append(with, translate.WithLog(s.Process.Log.V, log))
	}
	spec, diags := translate.Translate(s, with...)
	if diags.HasErrors() || spec.Program == nil {
		t.Fatalf("%s: no program: %v", sheet, diags)
	}
	return csource.Source{Program: spec.Program, Facts: codegen.Facts(spec, nil)}
}

func BenchmarkPack(b *testing.B) {
	src := csource.Source{Program: checked(b, waterHeater()), Facts: waterHeaterFacts()}
	for b.Loop() {
		_ = src.Header() + src.Body() + src.PortHeader() + src.PortBody()
	}
}
