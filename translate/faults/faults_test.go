package faults

import (
	"os"
	"strings"
	"testing"

	"makebreak/survey"
	"makebreak/translate"
	"makebreak/translate/risk"
)

// load reads an example, with some of its text changed.
func load(t testing.TB, sheet string, changes ...string) *translate.Specification {
	t.Helper()
	data, err := os.ReadFile("../../examples/" + sheet + "/sheet.yaml")
	if err != nil {
		t.Fatal(err)
	}
	text := string(data)
	for i := 0; i+1 < len(changes); i += 2 {
		if !strings.Contains(text, changes[i]) {
			t.Fatalf("%s has no %q", sheet, changes[i])
		}
		text = strings.Replace(text, changes[i], changes[i+1], 1)
	}
	return read(t, text)
}

func read(t testing.TB, text string) *translate.Specification {
	t.Helper()
	s, diags := survey.Read("sheet.yaml", []byte(text))
	if diags.HasErrors() {
		t.Fatal(diags)
	}
	spec, diags := translate.Translate(s)
	if diags.HasErrors() {
		t.Fatal(diags)
	}
	return spec
}

func viewOf(t testing.TB, spec *translate.Specification) *risk.View {
	t.Helper()
	view, err := risk.NewView(spec.Survey, risk.Computed{})
	if err != nil {
		t.Fatal(err)
	}
	return view
}

func rows(t testing.TB, spec *translate.Specification) []Row {
	t.Helper()
	return Assess(spec, viewOf(t, spec))
}

func find(t *testing.T, rows []Row, about, cause string) Row {
	t.Helper()
	for _, r := range rows {
		if r.About == about && strings.Contains(r.Cause, cause) {
			return r
		}
	}
	t.Fatalf("no row about %s with the cause %q", about, cause)
	return Row{}
}

// A kept limit ends what the control leaves on; a program that can stop is new.
func TestCalorifier(t *testing.T) {
	all := rows(t, load(t, "calorifier"))
	for _, c := range []struct {
		about, cause string
		verdict      Verdict
		alone, with  string
	}{
		{"tank_stat", "sensor open, or", Stronger, "goes off", "goes off"},
		{"tank_stat", "one sample of three", Stronger, "goes off", "goes off"},
		{"tank_stat", "out of its pocket", Stronger, "goes off", "goes off"},
		{"tank_stat", "welds", Kept, "cannot open it, but sees it", "cut by high_limit at 85 degC"},
		{"tank_stat", "program stops", Weaker, "watchdog", "watchdog"},
		{"tank_stat", "too cold", Unknown, "65 degC instead of 60 degC", "65 degC"},
		{"flow_proven", "its wire breaks", Kept, "same step", "same step"},
		{"flow_proven", "contact of the new output", Weaker, "cannot open", "cut by high_limit"},
		{"high_limit", "any failure", Kept, "as before", "as before"},
	} {
		r := find(t, all, c.about, c.cause)
		if r.Verdict != c.verdict || !strings.Contains(r.NewAlone, c.alone) || !strings.Contains(r.NewWithHardware, c.with) {
			t.Errorf("%s, %s: %+v", c.about, c.cause, r)
		}
	}
}

// A limit that moves into the program is lost where the output welds.
func TestLimitInTheProgramIsLost(t *testing.T) {
	all := rows(t, load(t, "dryer"))
	if r := find(t, all, "cut_out", "welds"); r.Verdict != Lost {
		t.Errorf("%+v", r)
	}
	if r := find(t, all, "cut_out", "all causes"); r.Verdict != Lost {
		t.Errorf("%+v", r)
	}
	if r := find(t, all, "cut_out", "power cut after a trip"); r.Verdict != Kept || !strings.Contains(r.NewAlone, "still tripped") {
		t.Errorf("%+v", r)
	}
	if r := find(t, all, "cut_out", "while the supply is off"); r.Verdict != Lost {
		t.Errorf("%+v", r)
	}
}

// A trip that a flipped bit forgets is a function lost, for nothing ends it.
func TestFlippedTripIsFound(t *testing.T) {
	r := find(t, rows(t, load(t, "dryer")), "cut_out", "a bit of the program's memory flips")
	if r.Verdict != Lost || !strings.Contains(r.NewAlone, "cut_out") {
		t.Errorf("%+v", r)
	}
}

// A limit that the supply resets is ready after a power cut, and the load comes
// back: the run has to call for it, or nothing would be seen.
func TestPowerCutIsSeenWithTheLoadCalledFor(t *testing.T) {
	spec := load(t, "dryer", "reset: manual\n    trip_free: true", "reset: at_power_off")
	r := find(t, rows(t, spec), "cut_out", "power cut after a trip")
	if r.Verdict != Kept || !strings.Contains(r.NewAlone, "ready again") {
		t.Errorf("%+v", r)
	}
}

// A limit that acts beyond the danger ends nothing in time, whatever it cuts; one
// whose temperature nobody knows is unknown.
func TestHardwareThatDoesNotCount(t *testing.T) {
	r := find(t, rows(t, load(t, "calorifier", "breaks_at: 85 degC", "breaks_at: 100 degC")), "flow_proven", "contact of the new output")
	if r.Verdict != Lost || !strings.Contains(r.NewWithHardware, "boiling begins at 95 degC") {
		t.Errorf("%+v", r)
	}
	r = find(t, rows(t, load(t, "calorifier", "breaks_at: 85 degC", "breaks_at: unknown")), "flow_proven", "contact of the new output")
	if r.Verdict == Kept || r.Verdict == Stronger || r.Verdict == Weaker {
		t.Errorf("%+v", r)
	}
}

// A frost heater whose safe and resting state is on loses nothing by a bad
// probe, a dead board or a welded contact.
func TestFrostHeaterIsNotAccused(t *testing.T) {
	all := rows(t, load(t, "frost"))
	for _, cause := range []string{"sensor open, or", "sensor shorted", "welds", "supply of the electronics is lost"} {
		for _, r := range all {
			if strings.Contains(r.Cause, cause) && r.Verdict != Kept {
				t.Errorf("%s: %+v", cause, r)
			}
		}
	}
}

// What loss of charge does (common practice): it reads as if cold, so a heating
// control stays made and a cooling control stays open.
func TestOldElement(t *testing.T) {
	sheet := func(action, edges, safe string) string {
		return `
format: 1
equipment: {id: t, title: T}
loads: [{id: l, what: l, kind: contactor, safe_state: ` + safe + `, rest: ` + safe + `, runs_when: c}]
controls: [{id: c, what: c, duty: operating, element: liquid_bulb, action: ` + action + `, ` + edges + `, on_element_failure: %s, plan: replace, sensor: p}]
electronics: {sensors: [{id: p, kind: ntc, r25: 10 kohm, beta: 3977 K, pull_up: 10 kohm}], outputs: [{load: l, kind: relay}]}
`
	}
	for _, c := range []struct {
		action, edges, safe, fails string
		want                       grade
	}{
		{"breaks_on_rise", "breaks_at: 60 degC, makes_at: 54 degC", "off", "makes", wrong},
		{"breaks_on_rise", "breaks_at: 60 degC, makes_at: 54 degC", "off", "breaks", safe},
		{"breaks_on_rise", "breaks_at: 8 degC, makes_at: 5 degC", "on", "makes", safe},
		{"makes_on_rise", "makes_at: 5 degC, breaks_at: 2 degC", "off", "breaks", safe},
		{"makes_on_rise", "makes_at: 60 degC, breaks_at: 50 degC", "on", "breaks", wrong},
		{"breaks_on_rise", "breaks_at: 60 degC, makes_at: 54 degC", "off", "stays", wrong},
	} {
		spec := read(t, strings.Replace(sheet(c.action, c.edges, c.safe), "%s", c.fails, 1))
		a := &assessor{spec: spec}
		if got := a.oldElement(spec.Plan.Loads["l"], spec.Plan.Contacts["c"]); got.grade != c.want {
			t.Errorf("%+v: %+v", c, got)
		}
	}
}

// No row says more than its evidence: nothing is kept or stronger where the new
// control ends harmfully, no hardware acts, and the old part did better.
func TestNoFlattery(t *testing.T) {
	for _, sheet := range []string{"calorifier", "coldroom", "oven", "airheater", "frost", "dryer"} {
		for _, r := range rows(t, load(t, sheet)) {
			harmful := strings.Contains(r.NewWithHardware, "nothing in the control ends it") || strings.Contains(r.NewWithHardware, "cannot open it")
			if harmful && (r.Verdict == Stronger || r.Verdict == Kept && !strings.Contains(r.Evidence, "no worse, and no better")) {
				t.Errorf("%s: %+v", sheet, r)
			}
			if strings.Contains(r.NewWithHardware, "unknown") && r.Verdict != Unknown {
				t.Errorf("%s: unknown became %s: %+v", sheet, r.Verdict, r)
			}
			if r.Evidence == "" || r.OldOutcome == "" || r.NewAlone == "" {
				t.Errorf("%s: a row with a hole: %+v", sheet, r)
			}
		}
	}
}

func BenchmarkAssess(b *testing.B) {
	spec := load(b, "calorifier")
	view := viewOf(b, spec)
	for b.Loop() {
		Assess(spec, view)
	}
}
