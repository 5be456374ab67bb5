package risk

import (
	"math"
	"os"
	"reflect"
	"slices"
	"strings"
	"testing"

	"makebreak/survey"
)

// Every key of the sheet that holds one value or a list of words is there for
// rules to use, under its own name.
func TestEveryKeyOfTheSheetIsInTheView(t *testing.T) {
	left := strings.Fields("steinhart_hart table at dial_shares trips_after") // tables, of no use in a condition
	for _, pair := range [][2]reflect.Type{
		{reflect.TypeFor[survey.Equipment](), reflect.TypeFor[Equipment]()},
		{reflect.TypeFor[survey.Process](), reflect.TypeFor[Process]()},
		{reflect.TypeFor[survey.Danger](), reflect.TypeFor[Danger]()},
		{reflect.TypeFor[survey.Load](), reflect.TypeFor[Load]()},
		{reflect.TypeFor[survey.Control](), reflect.TypeFor[Control]()},
		{reflect.TypeFor[survey.Sensor](), reflect.TypeFor[Sensor]()},
		{reflect.TypeFor[survey.Output](), reflect.TypeFor[Output]()},
		{reflect.TypeFor[survey.Signal](), reflect.TypeFor[Signal]()},
		{reflect.TypeFor[survey.Timer](), reflect.TypeFor[Timer]()},
		{reflect.TypeFor[survey.Electronics](), reflect.TypeFor[Electronics]()},
		{reflect.TypeFor[survey.ADC](), reflect.TypeFor[ADC]()},
	} {
		have := map[string]bool{}
		for i := range pair[1].NumField() {
			have[pair[1].Field(i).Tag.Get("expr")] = true
		}
		for i := range pair[0].NumField() {
			key := keyOf(pair[0].Field(i).Tag.Get("sheet"))
			if key == "" || key == "sensors" || key == "outputs" || have[key] || slices.Contains(left, key) {
				continue
			}
			t.Errorf("%s.%s is not in the view", pair[0].Name(), key)
		}
	}
}

// What the sheet does not say is unknown or NaN, and never good.
func TestWhatTheSheetDoesNotSay(t *testing.T) {
	v, err := NewView(sheetWith(t, "valve", nil), Computed{})
	if err != nil {
		t.Fatal(err)
	}
	c := v.Controls[1]
	if !math.IsNaN(c.RatedCurrent) || c.ReadBy != unknown || v.Equipment.InspectedBy != unknown || !math.IsNaN(v.Process.SettlesOn) {
		t.Errorf("rated_current %v, read_by %q, inspected_by %q, settles_on %v", c.RatedCurrent, c.ReadBy, v.Equipment.InspectedBy, v.Process.SettlesOn)
	}
	if v.Loads[0].Output.Kind != "analogue" || v.Loads[1].Output.Kind != unknown {
		t.Errorf("outputs %q, %q", v.Loads[0].Output.Kind, v.Loads[1].Output.Kind)
	}
}

const siteRule = `rules:
  - id: site_rule
    grade: act
    each: load
    when: load.kind == "contactor"
    was: "was {load.id}"
    becomes: becomes
    consequence: consequence
    needed: needed
    basis: our own
    status: common practice
`

// A broken rule is an error at its place in the file, in whichever style YAML
// lets the text be written.
func TestBrokenRulesAreErrorsWithTheirPlace(t *testing.T) {
	rules, err := Builtin()
	if err != nil {
		t.Fatal(err)
	}
	for name, c := range map[string]struct {
		changes   change
		line, col int
		says      string
	}{
		"unknown key of a load":    {change{`load.kind ==`, `load.knid ==`}, 5, 16, "knid"},
		"unknown thing":            {change{`load.kind ==`, `control.kind ==`}, 5, 11, "control"},
		"wrong type":               {change{`load.kind == "contactor"`, `load.kind > 3`}, 5, 21, ""},
		"not a condition":          {change{`load.kind == "contactor"`, `load.kind`}, 5, 11, "true or false"},
		"does not parse":           {change{`load.kind == "contactor"`, `load.kind == and`}, 5, 0, ""},
		"folded over two lines":    {change{`when: load.kind == "contactor"`, "when: >-\n      load.kind == \"contactor\" and\n      load.knid == \"fan\""}, 7, 12, "knid"},
		"literal block":            {change{`when: load.kind == "contactor"`, "when: |\n      load.kind == \"contactor\" and\n      load.knid == \"fan\""}, 7, 12, "knid"},
		"template, unknown key":    {change{`{load.id}`, `{load.idd}`}, 6, 21, "idd"},
		"template, list":           {change{`{load.id}`, `{load.stats}`}, 6, 16, "text or a number"},
		"template, brace open":     {change{`{load.id}`, `{load.id`}, 6, 15, "brace"},
		"template, brace closed":   {change{`{load.id}`, `load.id}`}, 6, 22, "brace"},
		"unknown grade":            {change{"grade: act", "grade: stopp"}, 3, 12, "word"},
		"unknown kind of thing":    {change{"each: load", "each: boiler"}, 4, 11, "word"},
		"unknown status":           {change{"status: common practice", "status: certain"}, 11, 13, "word"},
		"unknown key of a rule":    {change{"needed:", "neded:"}, 9, 5, "no key"},
		"key missing":              {change{"    basis: our own\n", ""}, 2, 5, "missing"},
		"redefines":                {change{"id: site_rule", "id: danger_without_barrier"}, 2, 5, "already"},
		"twice":                    {change{"status: common practice\n", "status: common practice\n" + strings.TrimPrefix(siteRule, "rules:\n")}, 12, 5, "already"},
		"figure not waited for":    {change{`load.kind == "contactor"`, `fig("years", load.id) < 1`}, 5, 11, "waits_for"},
		"figure name not constant": {change{`load.kind == "contactor"`, `fig(load.id, load.id) < 1`}, 5, 0, "quotes"},
		"another top key":          {change{"rules:", "rule:"}, 1, 1, "one key"},
		"same key twice":           {change{"    grade: act\n", "    grade: act\n    grade: note\n"}, 4, 5, "twice"},
		"alias":                    {change{"basis: our own", "basis: &b our own", "status: common practice", "status: *b"}, 11, 13, "text"},
	} {
		t.Run(name, func(t *testing.T) {
			text := siteRule
			for i := 0; i+1 < len(c.changes); i += 2 {
				if !strings.Contains(text, c.changes[i]) {
					t.Fatalf("no %q", c.changes[i])
				}
				text = strings.Replace(text, c.changes[i], c.changes[i+1], 1)
			}
			_, ds := rules.Merge([]byte(text), "site.yaml")
			if !ds.HasErrors() {
				t.Fatal("no error")
			}
			d := ds[0]
			if d.File != "site.yaml" || d.Line != c.line || c.col > 0 && d.Col != c.col {
				t.Errorf("%s:%d:%d, want %d:%d (%s)", d.File, d.Line, d.Col, c.line, c.col, d.Summary)
			}
			if !strings.Contains(d.Summary, c.says) {
				t.Errorf("%q does not say %q", d.Summary, c.says)
			}
			if strings.Contains(d.Summary, "risk.") || strings.Contains(d.Summary, "float64") {
				t.Errorf("%q speaks of Go", d.Summary)
			}
		})
	}
	if _, ds := rules.Merge([]byte(siteRule), "site.yaml"); len(ds) > 0 {
		t.Errorf("the sound rule: %v", ds)
	}
}

// A file of rules cannot take the program down.
func TestHostileRuleFiles(t *testing.T) {
	rules, err := Builtin()
	if err != nil {
		t.Fatal(err)
	}
	bomb := "a: &a [x, x, x, x, x, x, x, x, x]\n"
	for _, c := range "bcdefghi" {
		bomb += string(c) + ": &" + string(c) + " [" + strings.Repeat("*"+string(c-1)+", ", 8) + "*" + string(c-1) + "]\n"
	}
	for name, text := range map[string]string{
		"too large":    "#" + strings.Repeat("x", largestRuleFile),
		"brackets":     strings.Replace(siteRule, `load.kind == "contactor"`, strings.Repeat("(", 100_000)+"true"+strings.Repeat(")", 100_000), 1),
		"many nodes":   strings.Replace(siteRule, `load.kind == "contactor"`, strings.Repeat("true and ", 200)+"true", 1),
		"alias bomb":   bomb,
		"not UTF-8":    "rules: \xff\xfe",
		"NUL":          "rules:\x00",
		"a list":       "- rules",
		"nested lists": strings.Repeat("[", 20_000),
	} {
		if _, ds := rules.Merge([]byte(text), "site.yaml"); !ds.HasErrors() {
			t.Errorf("%s: no error", name)
		}
	}
	if _, ds := rules.Merge(nil, "site.yaml"); !ds.HasErrors() {
		t.Error("empty file: no error")
	}
}

// Text from the sheet stays text: it is put in as it is and never read as a
// template or an expression.
func TestTextFromTheSheetStaysText(t *testing.T) {
	hostile := "{control.id} {{x}} */ <b> =1+1 | `rm` ${HOME}"
	s := sheetWith(t, "tank", change{"what: rod immersion stat in the top boss", "what: '" + hostile + "'"})
	s.Controls[0].Reset.V = survey.ResetManual
	f := findingOf(assessed(t, s, nil), "duty_understated", "tank_stat")
	if f == nil || !strings.Contains(f.Was, hostile) {
		t.Errorf("%+v", f)
	}
}

// Answers: quoted; stale when the figure has changed; they lift no stop; an
// answer to nothing is listed.
func TestAnswersAndTheirFigures(t *testing.T) {
	key := Key{"heater", "years_to_endurance"}
	answered := func(figure string) change {
		return change{"answers:\n", "answers:\n  - {finding: contact_life, about: heater, answer: Renewed every five years., role: engineer, date: 2026-11-21" + figure + "}\n"}
	}
	for figure, want := range map[string][2]bool{ // stale, unbound
		`, figure: "5 years"`: {false, false},
		`, figure: "7 years"`: {true, false},
		``:                    {false, true},
	} {
		a := assessed(t, sheetWith(t, "tank", answered(figure)), figures{key: 5, {"heater", "operations_per_year"}: 20000})
		f := findingOf(a, "contact_life", "heater")
		if f == nil || f.Figure != "5 years" || f.Answer != "Renewed every five years. (engineer, 2026-11-21)" {
			t.Fatalf("%+v", f)
		}
		if f.AnswerStale != want[0] || f.AnswerUnbound != want[1] || f.Open() != want[0] {
			t.Errorf("%q: stale %v, unbound %v, open %v", figure, f.AnswerStale, f.AnswerUnbound, f.Open())
		}
	}
	a := assessed(t, sheetWith(t, "tank", answered("")), figures{key: 50})
	if len(a.Unused) != 1 || a.Unused[0].Path != "answers[0]" {
		t.Errorf("unused: %v", a.Unused)
	}
	a = assessed(t, sheetWith(t, "tank", change{"    cuts: [heater]\n", "", "answers:\n",
		"answers:\n  - {finding: danger_without_barrier, about: boiling/heater, answer: Accepted., role: owner, date: 2026-11-21}\n"}), nil)
	f := findingOf(a, "danger_without_barrier", "boiling/heater")
	if f == nil || f.Grade != Stop || !f.Open() || f.Answer == "" || !a.Stopped() {
		t.Errorf("%+v", f)
	}
}

// Stop first, then act, then note; numbered; the same twice.
func TestOrder(t *testing.T) {
	s := sheetWith(t, "cold", change{"harm: slight", "harm: serious"})
	a, again := assessed(t, s, nil), assessed(t, s, nil)
	if !reflect.DeepEqual(a, again) {
		t.Error("two runs differ")
	}
	for i, f := range a.Findings {
		if f.No != i+1 || i > 0 && f.Grade.rank() < a.Findings[i-1].Grade.rank() {
			t.Errorf("%d: %s %s after %s", f.No, f.Grade, f.ID, a.Findings[max(i-1, 0)].Grade)
		}
	}
}

// The next proof: 12 months on; overdue against the newest date of the sheet.
func TestProofWithoutAClock(t *testing.T) {
	for last, want := range map[string]struct {
		due     string
		overdue bool
	}{
		"2026-09-14": {"2027-09-14", false}, "2025-11-20": {"2026-11-20", false}, "2025-11-19": {"2026-11-19", true}, "2024-02-29": {"2025-02-28", true},
	} {
		v, err := NewView(sheetWith(t, "tank", change{"2026-09-14", last}), Computed{})
		if err != nil {
			t.Fatal(err)
		}
		if c := v.Controls[1]; c.ProofDue != want.due || c.ProofOverdue != want.overdue {
			t.Errorf("%s: due %s, overdue %v", last, c.ProofDue, c.ProofOverdue)
		}
	}
}

func TestNumbersAsText(t *testing.T) {
	for got, want := range map[string]string{
		Celsius(60): "60 degC", Celsius(-0.001): "0 degC", Celsius(53.885): "53.88 degC", Kelvin(0.1 + 0.2): "0.3 K", Celsius(math.NaN()): unknown,
		Kelvin(math.Inf(1)): unknown, Amps(0.04): "40 mA", Amps(2.5): "2.5 A", Percent(0.005): "0.5 %", Years(9.649): "9.6 years",
		Duration(570): "9 min 30 s", Duration(0.25): "250 ms", Duration(0): "0 s", Duration(86400 + 61): "1 d 1 min 1 s", Duration(-90): "-1 min 30 s",
	} {
		if got != want {
			t.Errorf("%q, want %q", got, want)
		}
	}
}

func read(b *testing.B) []byte {
	data, err := os.ReadFile("testdata/tank.yaml")
	if err != nil {
		b.Fatal(err)
	}
	return data
}

func BenchmarkAssess(b *testing.B) {
	s, ds := survey.Read("tank.yaml", read(b))
	if ds.HasErrors() {
		b.Fatal(ds)
	}
	rules, err := Builtin()
	if err != nil {
		b.Fatal(err)
	}
	for b.Loop() {
		v, err := NewView(s, Computed{})
		if err != nil {
			b.Fatal(err)
		}
		if _, err := rules.Assess(v); err != nil {
			b.Fatal(err)
		}
	}
}
