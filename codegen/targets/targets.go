// Package targets compiles the emitted C for many processors, runs it on them
// or on their simulators, and counts bytes and cycles. It is what stands behind
// the words "portable C": the same inputs have to give one checksum everywhere,
// that of the interpreter.
//
// Nothing in the program itself needs this package. Its tests carry the build
// tag deep, for they want a dozen compilers and simulators; the command report
// prints the table.
package targets

import (
	"bytes"
	"context"
	"embed"
	"errors"
	"fmt"
	"io/fs"
	"os"
	"os/exec"
	"path/filepath"
	"regexp"
	"strings"
	"syscall"
	"time"
)

//go:embed stubs
var stubs embed.FS

// Strict are the warnings that gcc and clang have to be silent about.
var Strict = strings.Fields(`-std=c99 -Wall -Wextra -Wpedantic -pedantic-errors -Wconversion -Wsign-conversion -Wshadow -Wundef
-Wcast-qual -Wcast-align -Wstrict-prototypes -Wmissing-prototypes -Wswitch-default -Wswitch-enum -Wdouble-promotion -Wfloat-equal
-Wformat=2 -Wvla -Wbad-function-cast -Wredundant-decls -Wwrite-strings -Werror`)

// Target is a processor with its compiler and what runs its programs.
type Target struct {
	Name     string
	Tools    []string // that have to be there
	Compile  []string // command and flags for one file of the emitted C; the file and -o follow
	Stub     []string // command and flags for the harness and the stubs, which are less strict
	Support  []string // stub files
	Link     []string // command and flags; the objects and -o follow
	Image    func(dir string) []string
	Run      []string // command; "{}" is the image. Nil: compiled only
	Monitor  bool     // the simulator is told by its standard input to run and to quit
	Bare     bool     // without a C library's output
	Steps    int      // of the harness
	Check    bool     // <id>_check.c fits and is run too
	Size     string   // tool that counts bytes
	Object   string   // how an object file's name ends
	Compiled bool     // never run: there is no simulator
}

func gnu(name, prefix string, flags ...string) Target {
	cc := prefix + "gcc"
	return Target{Name: name, Tools: []string{cc}, Compile: with([]string{cc}, append(Strict, flags...)...), Stub: with([]string{cc, "-std=c99", "-w"}, flags...),
		Link: with([]string{cc}, flags...), Size: prefix + "size", Object: ".o"}
}

func with(list []string, more ...string) []string {
	return append(append([]string{}, list...), more...)
}

func bare(t Target, steps int, support ...string) Target {
	t.Bare, t.Steps, t.Support = true, steps, support
	t.Stub = with(t.Stub, "-DBARE", "-Istubs")
	return t
}

// Fast and slow targets run so many steps of the harness.
const (
	fast   = 100_000
	middle = 20_000
	slow   = 1_000
)

// All lists the targets.
func All() []Target {
	var all []Target
	host := func(name, cc string, flags ...string) {
		t := Target{Name: name, Tools: []string{cc}, Compile: with([]string{cc}, append(Strict, flags...)...), Stub: with([]string{cc, "-std=c99", "-w"}, flags...),
			Link: with([]string{cc}, flags...), Run: []string{"./{}"}, Steps: fast, Check: true, Object: ".o"}
		if cc == "tcc" {
			t.Compile, t.Stub = []string{"tcc", "-Wall", "-Werror"}, []string{"tcc"}
		}
		if cc == "gcc" && len(flags) == 1 {
			t.Size = "size"
		}
		all = append(all, t)
	}
	host("x86-64 gcc", "gcc", "-Os")
	host("x86-64 gcc sanitized", "gcc", "-O1", "-g", "-fsanitize=address,undefined", "-fno-sanitize-recover=all")
	host("x86-64 clang sanitized", "clang", "-O1", "-g", "-fsanitize=address,undefined", "-fno-sanitize-recover=all")
	host("x86-64 tcc", "tcc")
	host("i386 gcc", "gcc", "-m32", "-O2", "-fsanitize=undefined", "-fno-sanitize-recover=all")
	host("i386 clang", "clang", "-m32", "-O2")

	avr := bare(gnu("AVR", "avr-", "-mmcu=atmega1284p", "-Os"), middle, "avr.c")
	avr.Tools = append(avr.Tools, "simavr")
	avr.Run = []string{"simavr", "-m", "atmega1284p", "-f", "16000000", "{}"}
	all = append(all, avr)

	for _, core := range []struct{ name, cpu, machine string }{{"Cortex-M0", "cortex-m0", "microbit"}, {"Cortex-M3", "cortex-m3", "mps2-an385"}} {
		t := bare(gnu(core.name, "arm-none-eabi-", "-mcpu="+core.cpu, "-mthumb", "-Os", "-ffreestanding"), fast, "arm.c", "memory.c")
		t.Tools = append(t.Tools, "qemu-system-arm")
		t.Link = with(t.Link, "-nostdlib", "-T", "stubs/arm.ld")
		t.Run = []string{"qemu-system-arm", "-M", core.machine, "-kernel", "{}", "-display", "none", "-serial", "none", "-monitor", "none", "-semihosting"}
		t.Check = core.name == "Cortex-M3"
		all = append(all, t)
	}

	rv := bare(gnu("RISC-V 32", "riscv64-unknown-elf-", "-march=rv32imac", "-mabi=ilp32", "-mcmodel=medany", "-Os", "-ffreestanding"), fast, "riscv.c", "memory.c")
	rv.Tools = append(rv.Tools, "qemu-system-riscv32")
	rv.Link = with(rv.Link, "-nostdlib", "-T", "stubs/riscv.ld")
	rv.Run = []string{"qemu-system-riscv32", "-M", "virt", "-bios", "none", "-kernel", "{}", "-display", "none", "-monitor", "none", "-serial", "stdio"}
	rv.Check = true
	all = append(all, rv)

	ppc := gnu("PowerPC, big-endian", "powerpc-linux-gnu-", "-O2")
	ppc.Tools = append(ppc.Tools, "qemu-ppc")
	ppc.Link, ppc.Run, ppc.Steps, ppc.Check = with(ppc.Link, "-static"), []string{"qemu-ppc", "./{}"}, fast, true
	all = append(all, ppc)

	msp := []string{"clang", "--target=msp430", "-ffreestanding", "-nostdlibinc", "-Os"}
	all = append(all, Target{Name: "MSP430, int of 16 bits", Tools: []string{"clang"}, Compile: with(msp, Strict...), Compiled: true, Size: "size", Object: ".o"})

	// 110 tells that its optimizer took a branch out, 165 that an unsigned product
	// wraps: the check word's, which is meant to.
	sdcc := func(name, port, sim string, simulator []string, flags ...string) {
		cc := with([]string{"sdcc", "-m" + port, "--std-c99"}, flags...)
		all = append(all, Target{Name: name, Tools: []string{"sdcc", sim}, Compile: with(cc, "--Werror", "--disable-warning", "110", "--disable-warning", "165"), Stub: with(cc, "-DBARE", "-Istubs"), Link: cc,
			Support: []string{"sdcc.c"}, Bare: true, Steps: slow, Run: append(simulator, "-b", "-q", "{}"), Monitor: true, Object: ".rel"})
	}
	sdcc("8051", "mcs51", "s51", []string{"s51", "-tC52", "-I", "if=xram[0xffff]"}, "--model-large", "--opt-code-size")
	sdcc("STM8", "stm8", "sstm8", []string{"sstm8", "-tSTM8S105", "-I", "if=rom[0xffff]"}, "--opt-code-size")
	sdcc("Z80", "z80", "sz80", []string{"sz80", "-I", "if=outputs[0xff]"}, "--opt-code-size")
	return all
}

// Missing names the tools of a target that are not here.
func (t Target) Missing() []string {
	var missing []string
	for _, tool := range t.Tools {
		if _, err := exec.LookPath(tool); err != nil {
			missing = append(missing, tool)
		}
	}
	return missing
}

// Unpack writes files and the stubs into a folder.
func Unpack(dir string, files map[string]string) error {
	if err := os.MkdirAll(filepath.Join(dir, "stubs"), 0o777); err != nil {
		return err
	}
	entries, err := fs.ReadDir(stubs, "stubs")
	if err != nil {
		return err
	}
	for _, e := range entries {
		data, err := stubs.ReadFile("stubs/" + e.Name())
		if err == nil {
			err = os.WriteFile(filepath.Join(dir, "stubs", e.Name()), data, 0o666)
		}
		if err != nil {
			return err
		}
	}
	for name, text := range files {
		if err := os.WriteFile(filepath.Join(dir, name), []byte(text), 0o666); err != nil {
			return err
		}
	}
	return nil
}

// object is the object file of a source file for this target.
func (t Target) object(source string) string {
	return strings.TrimSuffix(filepath.Base(source), ".c") + t.Object
}

// CompileC compiles files of the emitted C with every warning an error.
func (t Target) CompileC(dir string, sources ...string) error {
	for _, s := range sources {
		if _, err := command(dir, time.Minute, with(t.Compile, "-c", s, "-o", t.object(s))...); err != nil {
			return err
		}
	}
	return nil
}

// RunMain links objects that have been compiled with a main program, which is
// compiled without strictness, and gives what it prints.
func (t Target) RunMain(dir, main string, flags []string, objects ...string) (string, error) {
	support := t.Support
	if t.Bare && strings.HasSuffix(main, "_check.c") {
		support = with(support, "print.c")
	}
	objs := []string{t.object(main)} // the linker of some targets starts at the first
	if _, err := command(dir, time.Minute, with(with(t.Stub, flags...), "-c", main, "-o", t.object(main))...); err != nil {
		return "", err
	}
	for _, s := range support {
		if _, err := command(dir, time.Minute, with(t.Stub, "-c", "stubs/"+s, "-o", t.object(s))...); err != nil {
			return "", err
		}
		objs = append(objs, t.object(s))
	}
	for _, o := range objects {
		objs = append(objs, t.object(o))
	}
	image := "run.elf"
	if t.Monitor {
		image = "run.ihx"
	}
	link := with(with(t.Link, objs...), "-o", image)
	if strings.Contains(strings.Join(t.Link, " "), "-nostdlib") {
		link = append(link, "-lgcc")
	}
	if _, err := command(dir, time.Minute, link...); err != nil {
		return "", err
	}
	run := make([]string, len(t.Run))
	for i, a := range t.Run {
		run[i] = strings.ReplaceAll(a, "{}", image)
	}
	if t.Monitor {
		return monitored(dir, run)
	}
	out, err := command(dir, 3*time.Minute, run...)
	if errors.Is(err, syscall.ENOEXEC) { // a kernel without 32-bit programs
		out, err = command(dir, 3*time.Minute, with([]string{"qemu-i386"}, run...)...)
	}
	return out, err
}

// Sum finds the checksum in what a harness printed: simulators talk besides.
var Sum = regexp.MustCompile(`sum ([0-9a-f]{8})`)

// Checksum gives the checksum that a harness printed.
func (t Target) Checksum(output string) string {
	if !t.Bare {
		return strings.TrimSpace(output)
	}
	if m := Sum.FindStringSubmatch(output); m != nil {
		return m[1]
	}
	return "none in: " + output
}

// Failure is a command that did not do what it should.
type Failure struct {
	Command []string
	Output  string
	Err     error
}

func (f *Failure) Error() string {
	out := f.Output
	if len(out) > 3000 {
		out = out[:3000] + "…"
	}
	return fmt.Sprintf("%s: %v\n%s", strings.Join(f.Command, " "), f.Err, out)
}

func (f *Failure) Unwrap() error { return f.Err }

func command(dir string, most time.Duration, args ...string) (string, error) {
	ctx, cancel := context.WithTimeout(context.Background(), most)
	defer cancel()
	cmd := exec.CommandContext(ctx, args[0], args[1:]...)
	cmd.Dir = dir
	out, err := cmd.CombinedOutput()
	if err != nil {
		return string(out), &Failure{args, string(out), err}
	}
	return string(out), nil
}

// monitored runs a simulator that takes its orders from its standard input,
// until a checksum has come or a minute has passed.
func monitored(dir string, args []string) (string, error) {
	cmd := exec.Command("stdbuf", with([]string{"-o0"}, args...)...) // it keeps its output back otherwise
	cmd.Dir = dir
	in, err := cmd.StdinPipe()
	if err != nil {
		return "", err
	}
	var out watched
	out.seen = make(chan struct{})
	cmd.Stdout, cmd.Stderr = &out, &out
	if err := cmd.Start(); err != nil {
		return "", err
	}
	fmt.Fprintln(in, "run")
	select {
	case <-out.seen:
	case <-time.After(time.Minute):
	}
	fmt.Fprintln(in, "quit")
	in.Close()
	time.AfterFunc(2*time.Second, func() { _ = cmd.Process.Kill() })
	_ = cmd.Wait() // it is told to quit, or killed; what it printed counts
	return out.said.String(), nil
}

// watched gathers output and tells when a checksum has come.
type watched struct {
	said bytes.Buffer
	seen chan struct{}
	done bool
}

func (w *watched) Write(p []byte) (int, error) {
	n, err := w.said.Write(p)
	if !w.done && Sum.Match(w.said.Bytes()) {
		w.done = true
		close(w.seen)
	}
	return n, err
}
