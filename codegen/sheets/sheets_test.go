package sheets

import (
	"encoding/json"
	"flag"
	"math"
	"os"
	"slices"
	"strings"
	"testing"

	"github.com/google/go-cmp/cmp"
	"pgregory.net/rapid"

	"makebreak/survey"
	"makebreak/translate"
	"makebreak/translate/faults"
	"makebreak/translate/risk"
)

var update = flag.Bool("update", false, "rewrite the golden papers")

// golden compares a paper with the one that a reviewer has read.
func golden(t *testing.T, name, got string) {
	t.Helper()
	path := "testdata/" + name
	if *update {
		if err := os.WriteFile(path, []byte(got), 0o666); err != nil {
			t.Fatal(err)
		}
	}
	want, err := os.ReadFile(path)
	if err != nil {
		t.Fatal(err)
	}
	if diff := cmp.Diff(string(want), got); diff != "" {
		t.Errorf("%s (- wanted, + got):\n%s", path, diff)
	}
}

func plant(t *testing.T) *translate.Specification {
	t.Helper()
	data, err := os.ReadFile("testdata/plant.yaml")
	if err != nil {
		t.Fatal(err)
	}
	s, diags := survey.Read("plant.yaml", data)
	if diags.HasErrors() {
		t.Fatal(diags)
	}
	spec, diags := translate.Translate(s)
	if diags.HasErrors() || spec.Program == nil {
		t.Fatal(diags)
	}
	return spec
}

// judged are findings of every kind, with text that would like to be markup.
func judged() *risk.Assessment {
	return &risk.Assessment{
		Findings: []risk.Finding{
			{No: 1, ID: "no_barrier", Grade: risk.Stop, About: "fire", Was: "<script>alert(1)</script>", Needed: "another design", Basis: "ISO 13849-1", Answer: "we accept it (manager, 2026-01-01)"},
			{No: 2, ID: "open_act", Grade: risk.Act, About: "heater", Becomes: "a | b\nc", Consequence: "=1+1"},
			{No: 3, ID: "answered", Grade: risk.Act, About: "heater", Answer: "done (engineer, 2026-02-02)"},
			{No: 4, ID: "stale", Grade: risk.Act, About: "probe", Figure: "9.7 years", Answer: "renewed at 12 years (engineer, 2025-02-02)", AnswerStale: true},
			{No: 5, ID: "unbound", Grade: risk.Act, About: "probe", Figure: "3.2 K", Answer: "accepted (engineer, 2026-03-03)", AnswerUnbound: true},
			{No: 6, ID: "to_know", Grade: risk.Note, About: "*plant*"},
		},
		Waiting:   []risk.Waiting{{ID: "waits", Figures: []string{"cycle"}}},
		NotJudged: []risk.NotJudged{{ID: "cannot", About: "probe", Figure: "lag", Reason: "no figure"}},
	}
}

func TestRisks(t *testing.T) {
	golden(t, "risks.md", Risks("Plant | <b>east</b>", judged()))
	golden(t, "risks.csv", CSV(RiskColumns, RiskRows(judged().Findings)))
}

func TestFunctions(t *testing.T) {
	golden(t, "functions.csv", CSV(FunctionColumns, FunctionRows([]faults.Row{
		{Function: "switches heater", About: "stat", Cause: "sensor open, or its wire broken", OldOutcome: "=cmd|'/c calc'!A1", NewAlone: "goes off\nafter 2.2 s", NewWithHardware: `"cut"`, Verdict: faults.Kept, Evidence: "-1.5"},
	})))
}

func TestCommissioning(t *testing.T) {
	spec := plant(t)
	golden(t, "commissioning.md", Commissioning(spec, &risk.Assessment{}))
	golden(t, "commissioning_stopped.md", Commissioning(spec, judged()))

	// Hardware that stays is proved before isolation, isolation comes before
	// hardware that is new, and that before the program.
	var parts []string
	for _, c := range checks(spec, &risk.Assessment{}) {
		parts = append(parts, c.part)
	}
	order := []string{"link", "high_alarm", "frost", "isolation", "added", "probe", "stat", "heater", "stat"}
	if got := slices.Compact(parts); !slices.Equal(got, order) {
		t.Errorf("order of testing: %v, want %v", got, order)
	}
	// A link that opens once is never tested by heat.
	if c := checks(spec, &risk.Assessment{})[0]; !strings.Contains(c.do, "do not heat it") {
		t.Errorf("%s: %s", c.part, c.do)
	}
}

// Every paper carries every caution and names what is open.
func TestCautionsAreInEveryPaper(t *testing.T) {
	spec, a := plant(t), judged()
	for name, paper := range map[string]string{"risks.md": Risks("t", a), "commissioning.md": Commissioning(spec, a)} {
		for _, c := range CautionsFor(a) {
			if !strings.Contains(paper, Markdown(c)) {
				t.Errorf("%s lacks %q", name, c)
			}
		}
	}
	all := CautionsFor(a)
	want := "Open findings: 1 no_barrier (stop, fire); 2 open_act (act, heater); 4 stale (act, probe). Not judged, for want of a figure: 2; risks.md says which."
	if got := all[len(all)-1]; got != want {
		t.Errorf("%q, want %q", got, want)
	}
	if n := len(Cautions); len(all) != n+1 || !slices.Equal(all[:n], Cautions) {
		t.Errorf("%q", all)
	}
	if got := CautionsFor(&risk.Assessment{}); got[len(got)-1] != "No finding is open." {
		t.Errorf("%q", got)
	}
}

// What a line does when one signal is known, against the whole truth table.
func TestClosesAgainstTheTruthTable(t *testing.T) {
	names := []string{"a", "b", "c"}
	var cond func(depth int) *rapid.Generator[*survey.Cond]
	cond = func(depth int) *rapid.Generator[*survey.Cond] {
		return rapid.Custom(func(rt *rapid.T) *survey.Cond {
			op := rapid.SampledFrom([]survey.CondOp{survey.CondName, survey.CondNot, survey.CondAnd, survey.CondOr}).Draw(rt, "op")
			if depth == 0 || op == survey.CondName {
				return &survey.Cond{Op: survey.CondName, Name: rapid.SampledFrom(names).Draw(rt, "name")}
			}
			n := 2
			if op == survey.CondNot {
				n = 1
			}
			return &survey.Cond{Op: op, Args: rapid.SliceOfN(cond(depth-1), n, n).Draw(rt, "args")}
		})
	}
	rapid.Check(t, func(rt *rapid.T) {
		c, value := cond(3).Draw(rt, "line"), rapid.Bool().Draw(rt, "value")
		can := map[bool]bool{}
		for row := range 4 {
			can[whole(c, map[string]bool{"a": value, "b": row&1 != 0, "c": row&2 != 0})] = true
		}
		// What is told must be so; what is not told may still be so.
		if got := closes(c, "a", value); got == yes && can[false] || got == no && can[true] {
			rt.Fatalf("says %v, but the line can be %v", got, can)
		}
	})
	for line, want := range map[string]answer{"a": no, "not a": yes, "a and b": no, "a or b": perhaps, "b": perhaps} {
		if got := closes(parse(t, line), "a", false); got != want {
			t.Errorf("%s with a false: %v, want %v", line, got, want)
		}
	}
}

// whole works a line out with every name known.
func whole(c *survey.Cond, v map[string]bool) bool {
	switch c.Op {
	case survey.CondNot:
		return !whole(c.Args[0], v)
	case survey.CondAnd:
		return whole(c.Args[0], v) && whole(c.Args[1], v)
	case survey.CondOr:
		return whole(c.Args[0], v) || whole(c.Args[1], v)
	}
	return v[c.Name]
}

func parse(t *testing.T, line string) *survey.Cond {
	t.Helper()
	name := func(n string) *survey.Cond { return &survey.Cond{Op: survey.CondName, Name: n} }
	switch words := strings.Fields(line); {
	case len(words) == 1:
		return name(line)
	case words[0] == "not":
		return &survey.Cond{Op: survey.CondNot, Args: []*survey.Cond{name(words[1])}}
	case words[1] == "and":
		return &survey.Cond{Op: survey.CondAnd, Args: []*survey.Cond{name(words[0]), name(words[2])}}
	default:
		return &survey.Cond{Op: survey.CondOr, Args: []*survey.Cond{name(words[0]), name(words[2])}}
	}
}

// specification.json has the keys that scripts hold on to; what is not
// determined is null with its reason, and a list without entries is a list.
func TestSpecification(t *testing.T) {
	inf := math.Inf(1)
	spec := plant(t)
	spec.Figures = append(spec.Figures,
		translate.Figure{About: "a", Name: "open", Unit: "K", From: "x", Working: "no figure"},
		translate.Figure{About: "a", Name: "endless", Value: &inf, Unit: "s", From: "x", Working: "1 / 0"})
	data, err := Specification(spec, judged(), nil)
	if err != nil {
		t.Fatal(err)
	}
	var got struct {
		Format    int
		Figures   []map[string]any
		Findings  []map[string]string
		Functions []map[string]string
		Program   map[string]any
	}
	if err := json.Unmarshal(data, &got); err != nil {
		t.Fatal(err)
	}
	if got.Format != 1 || got.Functions == nil || len(got.Findings) != 6 || got.Findings[0]["finding"] != "no_barrier" {
		t.Errorf("%d %v %v", got.Format, got.Functions, got.Findings)
	}
	for _, f := range got.Figures {
		keys := []string{"about", "from", "name", "unit", "value", "working"}
		for _, k := range keys {
			if _, there := f[k]; !there || len(f) != len(keys) {
				t.Fatalf("a figure has the keys %v", f)
			}
		}
		if reason := map[string]string{"open": "no figure", "endless": "not determined"}[f["name"].(string)]; reason != "" {
			if f["value"] != nil || !strings.Contains(f["working"].(string), reason) {
				t.Errorf("%v", f)
			}
		}
	}
	machines, ok := got.Program["machines"].([]any)
	if !ok || len(machines) == 0 {
		t.Fatalf("machines: %v", got.Program["machines"])
	}
	for _, key := range []string{"constants", "inputs", "state", "outputs", "steps", "never"} {
		if _, list := got.Program[key].([]any); !list {
			t.Errorf("%s is %v", key, got.Program[key])
		}
	}

	empty, err := Specification(&translate.Specification{Survey: &survey.Survey{}}, &risk.Assessment{}, nil)
	if err != nil {
		t.Fatal(err)
	}
	if n := strings.Count(string(empty), "null"); n != 1 || !strings.Contains(string(empty), `"program": null`) {
		t.Errorf("nothing but the program may be null:\n%s", empty)
	}
}
