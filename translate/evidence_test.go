package translate_test

import (
	"fmt"
	"math"
	"os"
	"path/filepath"
	"strings"
	"testing"

	"makebreak/survey"
	"makebreak/translate"
	"makebreak/translate/thermal"
)

// withLog reads what a sheet names besides itself, as cmd does.
func withLog(t testing.TB, sheet string, s *survey.Survey) []translate.Option {
	t.Helper()
	if !s.Process.Log.Set {
		return nil
	}
	data, err := os.ReadFile(filepath.Join(filepath.Dir(sheet), s.Process.Log.V))
	if err != nil {
		t.Fatal(err)
	}
	return []translate.Option{translate.WithLog(s.Process.Log.V, data)}
}

// changed translates an example with some of its text replaced.
func changed(t testing.TB, sheet string, pairs ...string) (*translate.Specification, survey.Diagnostics) {
	t.Helper()
	data, err := os.ReadFile(sheet)
	if err != nil {
		t.Fatal(err)
	}
	text := string(data)
	for i := 0; i < len(pairs); i += 2 {
		if !strings.Contains(text, pairs[i]) {
			t.Fatalf("%q is not in %s", pairs[i], sheet)
		}
		text = strings.Replace(text, pairs[i], pairs[i+1], 1)
	}
	s, diags := survey.Read("sheet.yaml", []byte(text))
	if diags.HasErrors() {
		t.Fatal(diags)
	}
	return translate.Translate(s, withLog(t, sheet, s)...)
}

func figure(t testing.TB, spec *translate.Specification, about, name string) float64 {
	t.Helper()
	v, ok := spec.Figures.Value(about, name)
	if !ok {
		f, _ := spec.Figures.Get(about, name)
		t.Fatalf("%s/%s is not determined: %s", about, name, f.Working)
	}
	return v
}

// open checks that a figure is there without a value, and that its reason says
// a given thing.
func open(t testing.TB, spec *translate.Specification, about, name, says string) {
	t.Helper()
	f, ok := spec.Figures.Get(about, name)
	if !ok || f.Value != nil || !strings.Contains(f.Working, says) {
		t.Errorf("%s/%s: %v, %q; it should be open and say %q", about, name, f.Value, f.Working, says)
	}
}

func near(t testing.TB, what string, got, want, within float64) {
	t.Helper()
	if !(math.Abs(got-want) <= within) {
		t.Errorf("%s: %g, want %g ± %g", what, got, want, within)
	}
}

const (
	hotLiquor  = "../examples/hotliquor/sheet.yaml"
	proofer    = "../examples/proofer/sheet.yaml"
	calorifier = "../examples/calorifier/sheet.yaml"
)

// The log is not of our own making; its undisturbed times are those that its
// maker states: on 521.5 s, off 8823 s (thermal/testdata/README.md).
func TestProcessFromALog(t *testing.T) {
	spec, diags := changed(t, hotLiquor)
	if diags.HasErrors() {
		t.Fatal(diags)
	}
	near(t, "old on", figure(t, spec, "liquor_stat", "old_on_s"), 521.5, 0.02*521.5)
	near(t, "old off", figure(t, spec, "liquor_stat", "old_off_s"), 8823, 0.02*8823)
	open(t, spec, "process", "settles_on", "not determined")
	open(t, spec, "process", "first_order", "not first order")
	open(t, spec, "boiling", "time_to_danger", "State worst")
	// The straight line of the fastest measured rise, which is faster than the
	// mean one from 54.9 to 61.6 degC in 521.5 s, and not twice as fast.
	bound, mean := figure(t, spec, "boiling", "time_to_danger_at_least"), (95-61.66)/(61.6-54.9)*521.5
	if bound > mean || bound < mean/2 {
		t.Errorf("at least %g s to danger, on the mean rise %g s", bound, mean)
	}
	if v := figure(t, spec, "tank_limit", "overshoot_as_measured"); !(v > 0 && v < 2) {
		t.Errorf("overshoot at the measured rise: %g K", v)
	}
	open(t, spec, "tank_limit", "overshoot_after_cut", "worst")
	if m := spec.Matches["liquor_stat"]; !m.Kept || m.Filter.Lag != 0 || m.Break <= 61 {
		t.Errorf("matched: %+v", m)
	}
	near(t, "swing kept, but for the rounding to counts", figure(t, spec, "liquor_stat", "swing"), figure(t, spec, "liquor_stat", "old_swing"), 0.06)
}

// With worst on the sheet there is a time to danger, and it is shorter than no
// straight line: the first-order rise towards 130 degC with the measured rate.
func TestWorstMakesTheTimeToDanger(t *testing.T) {
	spec, _ := changed(t, hotLiquor, "  log: hlt1", "  worst: {settles_on: 130 degC, settles_off: 30 degC}\n  log: hlt1")
	got := figure(t, spec, "boiling", "time_to_danger")
	rate := figure(t, spec, "process", "rate_on") / 60
	from, at := figure(t, spec, "liquor_stat", "high"), 58.0
	tau := (130 - at) / rate
	near(t, "time to danger", got, tau*math.Log((130-from)/(130-95)), 0.02*got)
	if _, ok := spec.Figures.Value("tank_limit", "overshoot_after_cut"); !ok {
		t.Error("no overshoot with worst given")
	}
}

func TestProcessFromAnObservedCycle(t *testing.T) {
	spec, diags := changed(t, proofer)
	if diags.HasErrors() {
		t.Fatal(diags)
	}
	// The readings were taken of a process with 75 and 22 degC, 1500 s, 15 s,
	// whose rates at 37 degC are 1.52 and −0.6 K/min; the readings are rounded
	// to 1 s and 0.1 K.
	near(t, "rate on", figure(t, spec, "process", "rate_on"), 1.52, 0.06)
	near(t, "rate off", figure(t, spec, "process", "rate_off"), -0.6, 0.03)
	near(t, "dead time", figure(t, spec, "process", "dead_time"), 15, 6)
	near(t, "old on", figure(t, spec, "cabinet_stat", "old_on_s"), 192, 1e-3)
	near(t, "old off", figure(t, spec, "cabinet_stat", "old_off_s"), 464, 1e-3)
	open(t, spec, "process", "settles_on", "not determined")
	if v := figure(t, spec, "process", "dead_time_error"); !(v > 0 && v < 10) {
		t.Errorf("error of the dead time: %g s", v)
	}
	m := spec.Matches["cabinet_stat"]
	if !m.Kept || m.Filter.Lag == 0 || m.Break != 38 {
		t.Errorf("matched: %+v", m)
	}
	near(t, "rate kept, but for the rounding of the lag", figure(t, spec, "cabinet_stat", "cycles_per_year")/figure(t, spec, "cabinet_stat", "old_cycles_per_year"), 1, 0.002)
}

func TestWhatIsNotDeterminedIsSaid(t *testing.T) {
	spec, _ := changed(t, proofer, "    observed: {on: 3 min 12 s, off: 7 min 44 s, high: 40.0 degC, low: 35.2 degC}\n", "")
	open(t, spec, "process", "rate_on", "neither is a log or an observed cycle")
	near(t, "kept", figure(t, spec, "cabinet_stat", "match_kept"), 0, 0)
	if k := spec.Cycles[0]; k.Old.Why == "" || k.New.Why == "" {
		t.Errorf("a cycle without a process: %+v", k)
	}
	// times alone do not tell the rates
	spec, _ = changed(t, proofer, ", high: 40.0 degC, low: 35.2 degC", "")
	open(t, spec, "process", "rate_on", "no less than the differential")
}

// A minimum time that holds the command, and a limit that is in the way, are
// said, with what is nearest.
func TestInfeasibleMatchingIsSaid(t *testing.T) {
	spec, _ := changed(t, proofer, "    match: cycle_rate\n", "    match: cycle_rate\n    min_off: 12 min\n")
	near(t, "kept", figure(t, spec, "cabinet_stat", "match_kept"), 0, 0)
	f, _ := spec.Figures.Get("cabinet_stat", "match_kept")
	if !strings.Contains(f.Working, "minimum time") || !strings.Contains(f.Working, "Nearest") {
		t.Errorf("%s", f.Working)
	}
	spec, _ = changed(t, proofer)
	if v := figure(t, spec, "cabinet_stat", "operations_over_budget"); v <= 1 {
		t.Errorf("over budget: %g", v)
	}
	if v := figure(t, spec, "cabinet_stat", "nearest_operations_per_year"); v > 48073/figure(t, spec, "cabinet_stat", "operations_over_budget")*1.001 {
		t.Errorf("the nearest makes %g operations a year", v)
	}
	open(t, spec, "cabinet_stat", "nearest_differential", "above the highest allowed")
}

func TestLogErrorsHaveTheirPlace(t *testing.T) {
	data, err := os.ReadFile(hotLiquor)
	if err != nil {
		t.Fatal(err)
	}
	rows := func(n int) string {
		var b strings.Builder
		b.WriteString("time_s,temperature_c,state\n")
		for i := range n {
			fmt.Fprintf(&b, "%d,%.1f,%d\n", 10*i, 57+float64(i%3), i/40%2)
		}
		return b.String()
	}
	for name, c := range map[string]struct {
		log       string
		line, col int
		says      string
	}{
		"column":     {strings.Replace(rows(50), "temperature_c", "temp", 1), 1, 1, "temperature_c"},
		"number":     {strings.Replace(rows(50), "\n20,59.0,", "\n20,warm,", 1), 4, 4, "warm"},
		"state":      {strings.Replace(rows(50), "\n20,59.0,0", "\n20,59.0,on", 1), 4, 9, "on"},
		"time":       {strings.Replace(rows(50), "\n20,", "\n5,", 1), 4, 1, "not after"},
		"fields":     {strings.Replace(rows(50), "\n20,59.0,0", "\n20,59.0", 1), 4, 0, "2 fields"},
		"quote":      {strings.Replace(rows(50), "\n20,", "\n20\",", 1), 4, 3, "quote"},
		"empty":      {"", 0, 0, "empty"},
		"short":      {rows(5), 0, 0, "too short"},
		"one state":  {rows(40), 0, 0, "both states"},
		"wrong load": {wrongWay(), 0, 0, "the wrong way round"},
	} {
		s, diags := survey.Read("sheet.yaml", data)
		if diags.HasErrors() {
			t.Fatal(diags)
		}
		spec, diags := translate.Translate(s, translate.WithLog("hlt1-log.csv", []byte(c.log)))
		if !diags.HasErrors() {
			t.Errorf("%s: no error", name)
			continue
		}
		d := diags[0]
		if d.File != "hlt1-log.csv" || d.Line != c.line || d.Col != c.col || !strings.Contains(d.Found+d.Summary, c.says) {
			t.Errorf("%s: %s:%d:%d: %s: %s, want %d:%d and %q", name, d.File, d.Line, d.Col, d.Summary, d.Found, c.line, c.col, c.says)
		}
		if spec.Program != nil {
			t.Errorf("%s: a program all the same", name)
		}
	}
}

// wrongWay is a log in which the temperature falls while state is 1.
func wrongWay() string {
	var b strings.Builder
	b.WriteString("time_s,temperature_c,state\n")
	temp, on := 58.0, false
	for i := range 2000 {
		if temp > 61 {
			on = true
		} else if temp < 55 {
			on = false
		}
		if on {
			temp -= 0.05
		} else {
			temp += 0.03
		}
		state := 0
		if on {
			state = 1
		}
		fmt.Fprintf(&b, "%d,%.3f,%d\n", 10*i, temp, state)
	}
	return b.String()
}

// plant is a process and a probe in steps of the program, by a simulation of
// its own: explicit Euler in small parts of a step, a delay line for the dead
// time, the probe's resistance through the divider to counts.
type plant struct {
	medium, probe float64
	delay         []bool
	step          float64
	p             thermal.Process
	lag           float64
}

func (x *plant) next(on bool) {
	x.delay = append(x.delay, on)
	felt := x.delay[0]
	x.delay = x.delay[1:]
	to := x.p.Off
	if felt {
		to = x.p.On
	}
	const parts = 4
	for range parts {
		h := x.step / parts
		x.probe += h / x.lag * (x.medium - x.probe)
		x.medium += h / x.p.Tau * (to - x.medium)
	}
}

// The program in a loop with a simulated plant cycles as was predicted: the
// software lag in whole numbers does to the medium what the exact cycle says,
// and the swing of the old control is kept.
func TestSmoothedProgramOnAPlant(t *testing.T) {
	const sheet = "testdata/scenarios/smoothed/sheet.yaml"
	spec := loadSpec(t, sheet)
	m := spec.Matches["stat"]
	if m.Filter.Lag < 100 || m.Make != 57 || m.Break != 60 {
		t.Fatalf("not matched by a software lag: %+v", m)
	}
	side := spec.Cycles[0].New
	step := spec.Survey.Electronics.CalledEvery.V
	x := &plant{medium: 57, probe: 57, p: side.Loop.Process, lag: 8, step: step}
	x.delay = make([]bool, int(math.Round(x.p.Dead/step)))
	run := spec.Program.NewRun()
	run.Start(nil)
	in := make([]int64, len(spec.Program.Inputs))
	var switched []float64
	was, high, low := false, math.Inf(-1), math.Inf(1)
	for n := 0; len(switched) < 11 && n < 20_000_000; n++ {
		count, err := spec.Chains["probe"].Count(x.probe)
		if err != nil {
			t.Fatal(err)
		}
		in[0] = count
		run.Step(in)
		on := run.Get(spec.Plan.Loads["heater"].Out) != 0
		if on != was {
			switched = append(switched, float64(n)*step)
			was = on
		}
		x.next(on)
		if len(switched) >= 8 {
			high, low = math.Max(high, x.medium), math.Min(low, x.medium)
		}
	}
	if len(switched) < 11 {
		t.Fatalf("it switched %d times", len(switched))
	}
	on, off := switched[9]-switched[8], switched[10]-switched[9]
	f := side.Figures
	// One count is 0.03 K, and the medium moves at 0.39 and 0.19 K/min.
	near(t, "on", on, f.On, 6)
	near(t, "off", off, f.Off, 12)
	near(t, "high", high, f.High, 0.03)
	near(t, "low", low, f.Low, 0.03)
	near(t, "swing of the old control", high-low, spec.Cycles[0].Old.Figures.Swing(), 0.04)
	t.Logf("software lag %.1f s: on %.2f s, predicted %.2f; off %.2f s, predicted %.2f; swing %.3f K, old %.3f K", m.Filter.Lag, on, f.On, off, f.Off, high-low, spec.Cycles[0].Old.Figures.Swing())
}
