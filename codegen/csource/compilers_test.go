package csource_test

import (
	"fmt"
	"os"
	"os/exec"
	"path/filepath"
	"strings"
	"testing"

	"makebreak/codegen/csource"
)

// TestOtherCompilers takes the programs to other compilers and to a machine
// with 32 bits, where they have to do the same, and to one whose int has 16
// bits, where they have to compile without a warning.
func TestOtherCompilers(t *testing.T) {
	for _, c := range []struct {
		name, command string
		flags         []string
		runs          bool
	}{
		{"clang", "clang", strict, true},
		{"tcc", "tcc", []string{"-std=c99", "-Wall", "-Werror"}, true},
		{"32 bits", "gcc", append([]string{"-m32"}, strict...), true},
		{"16-bit int", "avr-gcc", append([]string{"-mmcu=atmega328p"}, strings.Fields(strings.Replace(strings.Join(strict, " "), "-O2", "-Os", 1))...), false},
	} {
		t.Run(c.name, func(t *testing.T) {
			cc := compiler(t, c.command)
			able(t, cc, c.flags)
			for _, sheet := range sheets(t) {
				src := sourceOf(t, sheet)
				id, dir := src.Program.ID, t.TempDir()
				write(t, dir, map[string]string{id + ".h": src.Header(), id + ".c": src.Body(), "harness.c": src.Harness(20_000)})
				if !c.runs {
					command(t, dir, cc, append(c.flags, "-c", id+".c")...)
					continue
				}
				command(t, dir, cc, append(c.flags, id+".c", "harness.c", "-o", "run")...)
				want := fmt.Sprintf("%08x\n", csource.Checksum(src.Program, 20_000))
				if got := command(t, dir, "./run"); got != want {
					t.Errorf("%s: %s gives %s, the interpreter %s", filepath.Base(filepath.Dir(sheet)), c.name, got, want)
				}
			}
		})
	}
}

// able skips aloud where a compiler is there but cannot do what the flags ask
// for, such as 32 bits without their libraries.
func able(t *testing.T, cc string, flags []string) {
	t.Helper()
	dir := t.TempDir()
	write(t, dir, map[string]string{"try.c": "#include <stdint.h>\nint main(void);\nint main(void)\n{\n    return (int)(uint8_t)0u;\n}\n"})
	cmd := exec.Command(cc, append(flags, "try.c", "-o", "try")...)
	cmd.Dir = dir
	if out, err := cmd.CombinedOutput(); err != nil {
		if os.Getenv("CI") != "" {
			t.Fatalf("%s cannot: %v\n%s", cc, err, out)
		}
		t.Skipf("SKIPPED: %s cannot: %v", cc, err)
	}
}
