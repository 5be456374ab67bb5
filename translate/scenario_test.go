package translate_test

import (
	"bufio"
	"fmt"
	"math"
	"os"
	"path/filepath"
	"strconv"
	"strings"
	"testing"

	"makebreak/survey"
	"makebreak/translate"
	"makebreak/translate/logic"
)

// Each folder below testdata/scenarios holds a sheet and one or more .txt
// files that say, step by step, what the new control has to do. One line each:
//
//	start              power up without a record
//	power_cut          power off and on, with the record that was kept
//	start_with false X power up with a record of which the check word is wrong
//	set NAME VALUE     an input: a temperature, open, short, true, false, or a count
//	mix NAME V1 V2 …   from now on the input takes these values in turn
//	run TIME           let the program run
//	expect NAME VALUE  an output: on, off, a number, or a span of numbers such as
//	                   445..455; fault: none, or a bit's name
//	never NAME VALUE TIME   run for this long; the output must never be that
//	until NAME VALUE MIN MAX  run until the output is that: not before MIN, not after MAX
func TestScenarios(t *testing.T) {
	files, err := filepath.Glob("testdata/scenarios/*/*.txt")
	if err != nil || len(files) == 0 {
		t.Fatalf("no scenarios found: %v", err)
	}
	for _, f := range files {
		t.Run(strings.TrimSuffix(strings.TrimPrefix(filepath.ToSlash(f), "testdata/scenarios/"), ".txt"), func(t *testing.T) {
			playScenario(t, filepath.Join(filepath.Dir(f), "sheet.yaml"), f)
		})
	}
}

// bench is a program on the test bench.
type bench struct {
	t     *testing.T
	spec  *translate.Specification
	run   *logic.Run
	in    []int64
	mixes map[int][]int64
	steps int
	where string
}

func loadSpec(t testing.TB, sheet string) *translate.Specification {
	t.Helper()
	data, err := os.ReadFile(sheet)
	if err != nil {
		t.Fatal(err)
	}
	s, diags := survey.Read(filepath.Base(sheet), data)
	if diags.HasErrors() {
		t.Fatalf("%s does not load:\n%v", sheet, diags)
	}
	spec, diags := translate.Translate(s, withLog(t, sheet, s)...)
	if diags.HasErrors() {
		t.Fatalf("%s does not translate:\n%v", sheet, diags)
	}
	return spec
}

func playScenario(t *testing.T, sheet, script string) {
	spec := loadSpec(t, sheet)
	if spec.Program == nil {
		t.Fatal("no program")
	}
	f, err := os.Open(script)
	if err != nil {
		t.Fatal(err)
	}
	defer f.Close()
	b := &bench{t: t, spec: spec, run: spec.Program.NewRun(), in: make([]int64, len(spec.Program.Inputs)), mixes: map[int][]int64{}}
	sc := bufio.NewScanner(f)
	for n := 1; sc.Scan(); n++ {
		line := strings.TrimSpace(strings.SplitN(sc.Text(), "#", 2)[0])
		if line == "" {
			continue
		}
		b.where = fmt.Sprintf("%s:%d: %s", script, n, line)
		b.do(strings.Fields(line))
		if t.Failed() {
			return
		}
	}
	if b.steps == 0 {
		t.Error("the scenario ran no step")
	}
}

func (b *bench) fail(format string, args ...any) {
	b.t.Helper()
	b.t.Errorf("%s: %s", b.where, fmt.Sprintf(format, args...))
}

func (b *bench) do(f []string) {
	switch f[0] {
	case "start":
		b.run.Start(nil)
	case "start_wrong":
		r := b.run.Remember()
		r.Check++
		b.run.Start(&r)
	case "power_cut":
		r := b.run.Remember()
		b.run.Start(&r)
	case "set":
		delete(b.mixes, b.input(f[1]))
		b.in[b.input(f[1])] = b.value(f[1], strings.Join(f[2:], " "))
	case "mix":
		var vs []int64
		for _, w := range f[2:] {
			vs = append(vs, b.value(f[1], strings.ReplaceAll(w, "_", " ")))
		}
		b.mixes[b.input(f[1])] = vs
	case "run":
		for range b.ticks(f[1:]) {
			b.step()
		}
	case "expect":
		if !b.is(f[1], f[2]) {
			b.fail("it is not%s", b.now(f[1]))
		}
	case "never":
		for i := range b.ticks(f[3:]) {
			b.step()
			if b.is(f[1], f[2]) {
				b.fail("it was, after %d steps", i+1)
				return
			}
		}
	case "until":
		b.until(f)
	default:
		b.fail("no such line")
	}
}

func (b *bench) until(f []string) {
	least, most := b.ticks([]string{strings.ReplaceAll(f[3], "_", " ")}), b.ticks([]string{strings.ReplaceAll(f[4], "_", " ")})
	for n := 1; n <= most; n++ {
		b.step()
		if b.is(f[1], f[2]) {
			if n < least {
				b.fail("already after %d steps", n)
			}
			return
		}
	}
	b.fail("not within %d steps", most)
}

func (b *bench) step() {
	for i, vs := range b.mixes {
		b.in[i] = vs[b.steps%len(vs)]
	}
	b.run.Step(b.in)
	b.steps++
	if p := b.run.Violated(); p != nil {
		b.fail("property %s is broken: %s", p.Name, p.Why)
	}
}

func (b *bench) input(name string) int {
	for i, v := range b.spec.Program.Inputs {
		if v.Name == name {
			return i
		}
	}
	b.fail("no input %s", name)
	return 0
}

func (b *bench) value(input, word string) int64 {
	v := b.spec.Program.Inputs[b.input(input)]
	switch word {
	case "true":
		return 1
	case "false":
		return 0
	case "open":
		return b.rail(input, true)
	case "short":
		return b.rail(input, false)
	}
	if number, ok := strings.CutSuffix(word, "degC"); ok {
		temp, err := strconv.ParseFloat(strings.TrimSpace(number), 64)
		if err != nil {
			b.fail("%v", err)
		}
		count, err := b.spec.Chains[v.Name].Count(temp)
		if err != nil {
			b.fail("%v", err)
		}
		return count
	}
	n, err := strconv.ParseInt(word, 10, 64)
	if err != nil {
		b.fail("%v", err)
	}
	return n
}

// rail is the count at which an open or shorted thermistor with a pull-up
// reads: the top, the bottom; with a pull-down the other way round.
func (b *bench) rail(sensor string, open bool) int64 {
	for _, s := range b.spec.Survey.Electronics.Sensors {
		if s.ID.V == sensor && s.PullDown.Set {
			open = !open
		}
	}
	if open {
		return int64(1)<<b.spec.Survey.Electronics.ADC.Bits.V - 1
	}
	return 0
}

func (b *bench) ticks(words []string) int {
	text := strings.Join(words, " ")
	var total float64
	fields := strings.Fields(text)
	for i := 0; i+1 < len(fields); i += 2 {
		n, err := strconv.ParseFloat(fields[i], 64)
		unit, ok := map[string]float64{"ms": 0.001, "s": 1, "min": 60, "h": 3600, "steps": b.spec.Survey.Electronics.CalledEvery.V}[fields[i+1]]
		if err != nil || !ok {
			b.fail("%q is no time", text)
			return 0
		}
		total += n * unit
	}
	return int(math.Round(total / b.spec.Survey.Electronics.CalledEvery.V))
}

func (b *bench) is(name, word string) bool {
	if name == "fault" {
		return b.fault(word)
	}
	for _, v := range b.spec.Program.Outputs {
		if v.Name == name {
			now := b.run.Get(v)
			if low, high, ok := numbers(word); ok {
				return low <= now && now <= high
			}
			on := now != 0
			return on == (word == "on" || word == "open")
		}
	}
	b.fail("no output %s", name)
	return false
}

// now tells what an output is, where it is a number.
func (b *bench) now(name string) string {
	for _, v := range b.spec.Program.Outputs {
		if v.Name == name && v.Kind == logic.Int {
			return fmt.Sprintf(", but %d", b.run.Get(v))
		}
	}
	return ""
}

func (b *bench) fault(word string) bool {
	value := b.run.Get(b.spec.Plan.Fault)
	if word == "none" {
		return value == 0
	}
	for i, bit := range b.spec.Plan.Bits {
		if bit.Name == word {
			return value>>i&1 == 1
		}
	}
	b.fail("no fault %s", word)
	return false
}

// numbers reads a number or a span of numbers.
func numbers(word string) (low, high int64, ok bool) {
	from, to, span := strings.Cut(word, "..")
	if !span {
		to = from
	}
	low, errLow := strconv.ParseInt(from, 10, 64)
	high, errHigh := strconv.ParseInt(to, 10, 64)
	return low, high, errLow == nil && errHigh == nil
}
