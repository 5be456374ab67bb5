package csource_test

import (
	"fmt"
	"os"
	"os/exec"
	"path/filepath"
	"strings"
	"testing"

	"makebreak/codegen"
	"makebreak/codegen/csource"
	"makebreak/survey"
	"makebreak/translate"
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
		if os.Getenv("CI") != "" {
			t.Fatalf("%s is not here", name)
		}
		t.Skipf("SKIPPED: %s is not here", name)
	}
	return path
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
	cmd := exec.Command(name, args...)
	cmd.Dir = dir
	out, err := cmd.CombinedOutput()
	if err != nil {
		t.Fatalf("%s %s: %v\n%s", name, strings.Join(args, " "), err, clip(string(out), 4000))
	}
	return string(out)
}

func clip(s string, n int) string {
	if len(s) > n {
		return s[:n] + "…"
	}
	return s
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
	spec, diags := translate.Translate(s)
	if diags.HasErrors() || spec.Program == nil {
		t.Fatalf("%s: no program: %v", sheet, diags)
	}
	return csource.Source{Program: spec.Program, Facts: codegen.Facts(spec, nil)}
}

const randomSteps = 200_000

// TestBitEqual compiles every program with the strictest flags, and runs the
// same pseudo-random inputs through interpreter and C.
func TestBitEqual(t *testing.T) {
	gcc := compiler(t, "gcc")
	for _, sheet := range sheets(t) {
		t.Run(filepath.Base(filepath.Dir(sheet)), func(t *testing.T) {
			t.Parallel()
			src := sourceOf(t, sheet)
			id := src.Program.ID
			dir := t.TempDir()
			write(t, dir, map[string]string{
				id + ".h": src.Header(), id + ".c": src.Body(),
				id + "_port.h": src.PortHeader(), id + "_port.c": src.PortBody(),
				"harness.c": src.Harness(randomSteps),
			})
			want := fmt.Sprintf("%08x\n", csource.Checksum(src.Program, randomSteps))
			command(t, dir, gcc, append(strict, "-c", id+"_port.c")...)
			command(t, dir, gcc, append(strict, id+".c", "harness.c", "-o", "strict")...)
			if got := command(t, dir, "./strict"); got != want {
				t.Errorf("C gives %s, the interpreter %s", got, want)
			}
			command(t, dir, gcc, append(sanitized, id+".c", "harness.c", "-o", "sanitized")...)
			if got := command(t, dir, "./sanitized"); got != want {
				t.Errorf("C under sanitizers gives %s, the interpreter %s", got, want)
			}
		})
	}
}
