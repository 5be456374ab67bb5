package main

import (
	"bytes"
	"flag"
	"fmt"
	"os"
	"os/exec"
	"path/filepath"
	"strings"
	"testing"

	"github.com/google/go-cmp/cmp"

	"makebreak/codegen/sheets"
)

var update = flag.Bool("update", false, "rewrite the golden packs")

// stopped are the examples that have to end in a stop.
var stopped = map[string]bool{"dryer": true, "waterheater_replaced": true}

func examples(t testing.TB) []string {
	t.Helper()
	found, err := filepath.Glob("../../examples/*/sheet.yaml")
	if err != nil || len(found) < 6 {
		t.Fatalf("%d examples: %v", len(found), err)
	}
	return found
}

// TestExamples runs the main job on every example: the pack has to be the one
// that stands beside the sheet for a reviewer to read, and twice the same.
func TestExamples(t *testing.T) {
	for _, sheet := range examples(t) {
		name := filepath.Base(filepath.Dir(sheet))
		t.Run(name, func(t *testing.T) {
			dir, again := filepath.Join(t.TempDir(), "pack"), filepath.Join(t.TempDir(), "pack")
			want := exitDone
			if stopped[name] {
				want = exitStopOpen
			}
			for _, d := range []string{dir, again} {
				var out, errw bytes.Buffer
				if code := run([]string{"retrofit", sheet, "-o", d}, &out, &errw); code != want {
					t.Fatalf("exit %d, want %d\n%s", code, want, errw.String())
				}
				for _, c := range sheets.Cautions {
					if !strings.Contains(errw.String(), c) {
						t.Errorf("the caution %q is not shown", c)
					}
				}
			}
			got := folder(t, dir)
			if diff := cmp.Diff(got, folder(t, again)); diff != "" {
				t.Errorf("two runs differ: %s", diff)
			}
			golden := filepath.Join(filepath.Dir(sheet), "pack")
			if *update {
				rewrite(t, golden, got)
			}
			if diff := cmp.Diff(folder(t, golden), got); diff != "" {
				t.Errorf("pack differs from %s (- wanted, + got):\n%s", golden, diff)
			}
			if _, c := got[programOf(got)+".c"]; c == stopped[name] {
				t.Errorf("C in the pack: %v, a stop open: %v", c, stopped[name])
			}
		})
	}
}

func folder(t *testing.T, dir string) map[string]string {
	t.Helper()
	files := map[string]string{}
	entries, err := os.ReadDir(dir)
	if err != nil && !os.IsNotExist(err) {
		t.Fatal(err)
	}
	for _, e := range entries {
		data, err := os.ReadFile(filepath.Join(dir, e.Name()))
		if err != nil {
			t.Fatal(err)
		}
		files[e.Name()] = string(data)
	}
	return files
}

func rewrite(t *testing.T, dir string, files map[string]string) {
	t.Helper()
	if err := os.RemoveAll(dir); err != nil {
		t.Fatal(err)
	}
	if err := os.MkdirAll(dir, 0o777); err != nil {
		t.Fatal(err)
	}
	for name, data := range files {
		if err := os.WriteFile(filepath.Join(dir, name), []byte(data), 0o666); err != nil {
			t.Fatal(err)
		}
	}
}

// programOf gives the id that the files of C begin with, or nothing.
func programOf(files map[string]string) string {
	for name := range files {
		if id, ok := strings.CutSuffix(name, "_check.c"); ok {
			return id
		}
	}
	return ""
}

var strict = strings.Fields("-std=c99 -Wall -Wextra -Wpedantic -Wconversion -Wsign-conversion -Wshadow -Wmissing-prototypes -Werror")

// compiler finds a C compiler, or skips aloud; where CI is set it has to be there.
func compiler(t *testing.T, name string) string {
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

func shell(dir, name string, args ...string) (string, error) {
	cmd := exec.Command(name, args...)
	cmd.Dir = dir
	out, err := cmd.CombinedOutput()
	return string(out), err
}

// TestPackCompilesAndChecks takes every golden pack as a user would: strictest
// flags, sanitizers, and its own check.
func TestPackCompilesAndChecks(t *testing.T) {
	gcc := compiler(t, "gcc")
	for _, sheet := range examples(t) {
		name := filepath.Base(filepath.Dir(sheet))
		files := folder(t, filepath.Join(filepath.Dir(sheet), "pack"))
		id := programOf(files)
		if id == "" {
			if !stopped[name] {
				t.Errorf("%s: no C in the pack", name)
			}
			continue
		}
		t.Run(name, func(t *testing.T) {
			t.Parallel()
			dir := t.TempDir()
			rewrite(t, dir, files)
			for _, args := range [][]string{
				append(strict, "-c", id+"_port.c", "-o", "port.o"),
				append(strict, "-O2", id+".c", id+"_check.c", "-o", "check"),
				{"-std=c99", "-g", "-fsanitize=address,undefined", "-fno-sanitize-recover=all", id + ".c", id + "_check.c", "-o", "sanitized"},
			} {
				if out, err := shell(dir, gcc, args...); err != nil {
					t.Fatalf("gcc %v: %v\n%s", args, err, out)
				}
			}
			for _, program := range []string{"./check", "./sanitized"} {
				out, err := shell(dir, program)
				if err != nil || !strings.HasSuffix(out, " 0 failed\n") || strings.HasPrefix(out, "0 passed") {
					t.Errorf("%s: %v: %s", program, err, out)
				}
			}
		})
	}
}

// TestMutantsFailTheCheck changes the C of the calorifier, one constant or one
// comparison at a time. The check of the pack has to notice. The few changes
// that no check can notice, because the program does the same, are listed.
func TestMutantsFailTheCheck(t *testing.T) {
	cc := "tcc"
	if _, err := exec.LookPath(cc); err != nil {
		cc = compiler(t, "gcc")
	}
	files := folder(t, "../../examples/calorifier/pack")
	id := programOf(files)
	dir := t.TempDir()
	rewrite(t, dir, files)
	if out, err := shell(dir, cc, "-c", id+"_check.c", "-o", "check.o"); err != nil {
		t.Fatalf("%v: %s", err, out)
	}
	killed, all := 0, mutants(files[id+".c"])
	var survived []string
	for i, m := range all {
		name := fmt.Sprintf("m%d", i)
		if err := os.WriteFile(filepath.Join(dir, name+".c"), []byte(m.text), 0o666); err != nil {
			t.Fatal(err)
		}
		if out, err := shell(dir, cc, "-I.", name+".c", "check.o", "-o", name); err != nil {
			killed++ // does not compile: a static assertion, or no program at all
			_ = out
			continue
		}
		if out, err := shell(dir, "./"+name); err != nil && strings.Contains(out, " failed\n") {
			killed++
			continue
		}
		survived = append(survived, m.what)
	}
	t.Logf("%d of %d mutants killed", killed, len(all))
	for _, s := range survived {
		if equivalent[s] == "" {
			t.Errorf("not noticed: %s", s)
		}
	}
	if len(all) < 80 {
		t.Errorf("only %d mutants were made", len(all))
	}
}

// equivalent are changes that change nothing, each with its reason.
var equivalent = map[string]string{
	"if (x < low) {: < -> <=":                "at equality both branches give low",
	"return (x > high) ? high : x;: > -> >=": "at equality both branches give high",
	"const uint16_t tank_probe_less = (uint16_t)((m->tank_probe_last < m->tank_probe_before): < -> <=": "at equality both branches give the same number",
	"const uint16_t tank_probe_more = (uint16_t)((m->tank_probe_last < m->tank_probe_before): < -> <=": "at equality both branches give the same number",
	"(tank_probe_counts > m->heater_effect_from)) {: > -> >=":                                          "at equality the variable takes the value that it has",
	"} else if (!in->limit_open && (m->heater_effect_for < CAL2_HEATER_EFFECT_WITHIN)) {: < -> <=":     "in the step that reaches the limit the heater goes off, which restarts the count before it could go further",
}
