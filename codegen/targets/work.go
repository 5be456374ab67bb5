package targets

import (
	"fmt"
	"os"
	"path/filepath"
	"regexp"
	"sort"
	"strconv"
	"strings"
	"time"

	"makebreak/codegen"
	"makebreak/codegen/csource"
	"makebreak/survey"
	"makebreak/translate"
	"makebreak/translate/prove"
)

// Piece is one program with its C.
type Piece struct {
	Name   string // of the example
	ID     string
	Source csource.Source
	Files  map[string]string // <id>.c, <id>.h, harness.c, <id>_port.*, <id>_check.c
}

// tourSteps is how many steps the search for recorded inputs may run, as in
// the pack.
const tourSteps = 80_000

// Examples makes a piece of every example below root that gives a program.
func Examples(root string) ([]*Piece, error) {
	sheets, err := filepath.Glob(filepath.Join(root, "examples", "*", "sheet.yaml"))
	if err != nil {
		return nil, err
	}
	sort.Strings(sheets)
	var all []*Piece
	for _, sheet := range sheets {
		p, err := FromSheet(sheet)
		if err != nil {
			return nil, err
		}
		if p != nil {
			all = append(all, p)
		}
	}
	return all, nil
}

// FromSheet makes the piece of one sheet, or nothing where no program comes of it.
func FromSheet(sheet string) (*Piece, error) {
	data, err := os.ReadFile(sheet)
	if err != nil {
		return nil, err
	}
	s, diags := survey.Read(filepath.Base(sheet), data)
	if diags.HasErrors() {
		return nil, fmt.Errorf("%s: %v", sheet, diags)
	}
	var options []translate.Option
	if log := s.Process.Log.V; log != "" {
		data, err := os.ReadFile(filepath.Join(filepath.Dir(sheet), log))
		if err != nil {
			return nil, err
		}
		options = append(options, translate.WithLog(log, data))
	}
	spec, diags := translate.Translate(s, options...)
	if diags.HasErrors() {
		return nil, fmt.Errorf("%s: %v", sheet, diags)
	}
	if spec.Program == nil {
		return nil, nil
	}
	return NewPiece(filepath.Base(filepath.Dir(sheet)), csource.Source{Program: spec.Program, Facts: codegen.Facts(spec, nil)}), nil
}

// NewPiece prints everything of one program.
func NewPiece(name string, src csource.Source) *Piece {
	id := src.Program.ID
	return &Piece{Name: name, ID: id, Source: src, Files: map[string]string{
		id + ".h": src.Header(), id + ".c": src.Body(), id + "_port.h": src.PortHeader(), id + "_port.c": src.PortBody(),
		"harness.c": src.Harness(fast), id + "_check.c": codegen.Check(src, prove.Visit(src.Program, prove.Budget{Steps: tourSteps})),
	}}
}

// Want is the interpreter's checksum over so many steps.
func (p *Piece) Want(steps int) string {
	return fmt.Sprintf("%08x", csource.Checksum(p.Source.Program, steps))
}

// Result is what one piece came to on one target.
type Result struct {
	Piece, Target string
	Sum           string // checksum over Steps steps, or "" where it was not run
	Steps         int
	Checked       string  // what <id>_check.c said, where it was run
	Flash, State  int     // bytes; 0 where no tool counts them
	Average, Most float64 // cycles a step; 0 where they were not counted
	Stack         int
	Took          time.Duration
}

// On compiles a piece for a target and runs it, in a folder of its own.
func (p *Piece) On(t Target, dir string) (Result, error) {
	begun := time.Now()
	r := Result{Piece: p.Name, Target: t.Name, Steps: t.Steps}
	if err := Unpack(dir, p.Files); err != nil {
		return r, err
	}
	if err := t.CompileC(dir, p.ID+".c", p.ID+"_port.c"); err != nil {
		return r, err
	}
	var err error
	if r.Flash, r.State, err = p.sizes(t, dir); err != nil {
		return r, err
	}
	if t.Compiled {
		return r, nil
	}
	out, err := t.RunMain(dir, "harness.c", []string{fmt.Sprintf("-DSTEPS=%d", t.Steps)}, p.ID+".c")
	if err != nil {
		return r, err
	}
	r.Sum = t.Checksum(out)
	if t.Check {
		if r.Checked, err = t.RunMain(dir, p.ID+"_check.c", nil, p.ID+".c"); err != nil {
			return r, err
		}
		r.Checked = strings.TrimSpace(r.Checked)
	}
	if t.Name == "AVR" {
		if err := p.cycles(t, dir, &r); err != nil {
			return r, err
		}
	}
	r.Took = time.Since(begun)
	return r, nil
}

var sizeRow = regexp.MustCompile(`(?m)^\s*(\d+)\s+(\d+)\s+(\d+)\s+\d+\s+[0-9a-f]+\s`)

// sizes counts the bytes of the object file, and of one instance of the state.
func (p *Piece) sizes(t Target, dir string) (flash, state int, err error) {
	if t.Size == "" {
		return 0, 0, nil
	}
	out, err := command(dir, time.Minute, t.Size, t.object(p.ID+".c"))
	if err != nil {
		return 0, 0, err
	}
	if m := sizeRow.FindStringSubmatch(out); m != nil {
		text, _ := strconv.Atoi(m[1])
		data, _ := strconv.Atoi(m[2])
		flash = text + data
	}
	probe := fmt.Sprintf("#include \"%s.h\"\nchar probe[sizeof(struct %s)] = {1};\n", p.ID, p.ID)
	if err := os.WriteFile(filepath.Join(dir, "probe.c"), []byte(probe), 0o666); err != nil {
		return 0, 0, err
	}
	if len(t.Stub) == 0 {
		return flash, 0, nil
	}
	if _, err := command(dir, time.Minute, with(t.Stub, "-c", "probe.c", "-o", t.object("probe.c"))...); err != nil {
		return 0, 0, err
	}
	if out, err = command(dir, time.Minute, t.Size, t.object("probe.c")); err != nil {
		return 0, 0, err
	}
	if m := sizeRow.FindStringSubmatch(out); m != nil {
		state, _ = strconv.Atoi(m[2])
	}
	return flash, state, nil
}

// counted is over how many steps cycles are counted.
const counted = 10_000

// cycles counts those of <id>_step on the AVR, by the simulator's own counter.
func (p *Piece) cycles(t Target, dir string, r *Result) error {
	if _, err := command(dir, time.Minute, "gcc", "-O2", "stubs/cycles.c", "-o", "cycles", "-lsimavr", "-lelf"); err != nil {
		return err
	}
	out, err := command(dir, time.Minute, "avr-nm", "run.elf")
	if err != nil {
		return err
	}
	at := regexp.MustCompile(`(?m)^([0-9a-f]+) T ` + p.ID + `_step$`).FindStringSubmatch(out)
	if at == nil {
		return fmt.Errorf("%s_step is not in the image", p.ID)
	}
	if out, err = command(dir, 3*time.Minute, "./cycles", "run.elf", "atmega1284p", at[1], fmt.Sprint(counted)); err != nil {
		return err
	}
	var calls, least int
	if _, err := fmt.Sscan(out, &calls, &r.Average, &least, &r.Most, &r.Stack); err != nil || calls < counted/2 {
		return fmt.Errorf("cycles: %q: %v", out, err)
	}
	return nil
}
