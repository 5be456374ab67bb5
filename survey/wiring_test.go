package survey

import (
	"fmt"
	"strings"
	"testing"
	"unicode/utf8"

	"github.com/expr-lang/expr/builtin"
	"pgregory.net/rapid"
)

// bracketed writes a tree with every bracket.
func bracketed(c *Cond) string {
	switch c.Op {
	case CondName:
		return c.Name
	case CondLiteral:
		return fmt.Sprint(c.Value)
	case CondNot:
		return "not(" + bracketed(c.Args[0]) + ")"
	case CondCompare:
		return fmt.Sprintf("%s%s%g", c.Name, c.Cmp, c.Limit)
	}
	var parts []string
	for _, a := range c.Args {
		parts = append(parts, bracketed(a))
	}
	return "(" + strings.Join(parts, map[CondOp]string{CondAnd: " and ", CondOr: " or "}[c.Op]) + ")"
}

func wired(line string) (*Cond, Diagnostics) {
	sheet := `format: 1
equipment: {id: tank, title: Tank}
signals: [{id: a, what: a}, {id: b, what: b}, {id: c, what: c}]
loads:
  - id: heater
    runs_when: ` + asYAML(line) + `
    what: heater
    kind: contactor
    safe_state: off
controls: [{id: stat, what: stat, duty: operating, element: rod_tube, action: breaks_on_rise, breaks_at: 60 degC, makes_at: 54 degC, plan: replace, sensor: probe}]
electronics:
  sensors: [{id: probe, kind: ntc, r25: 10 kohm, beta: 3977 K, pull_up: 10 kohm}]
  outputs: [{load: heater, kind: relay}]
`
	s, diags := Read("sheet.yaml", []byte(sheet))
	return s.Loads[0].RunsWhen.V.Tree, diags
}

// not binds closest, then and, then or; the sensor comes to the left.
func TestTrees(t *testing.T) {
	for line, want := range map[string]string{
		"a":                                   "a",
		"not a and b or c":                    "((not(a) and b) or c)",
		"a or b and not c":                    "(a or (b and not(c)))",
		"a && (b || !c)":                      "(a and (b or not(c)))",
		"a and b and c":                       "(a and b and c)",
		"not (a or b)":                        "not((a or b))",
		"stat and true":                       "(stat and true)",
		`probe > "60 degC"`:                   "probe>60",
		`"140 °F" >= probe`:                   "probe<=60",
		`probe < '10 degC' or probe>="90 °C"`: "(probe<10 or probe>=90)",
	} {
		tree, diags := wired(line)
		if diags.HasErrors() {
			t.Errorf("%s: %v", line, diags)
		} else if got := bracketed(tree); got != want {
			t.Errorf("%s is %s, want %s", line, got, want)
		}
	}
}

// A tree written out with all its brackets is the same tree again.
func TestTreesReadBack(t *testing.T) {
	var draw func(rt *rapid.T, depth int) string
	draw = func(rt *rapid.T, depth int) string {
		if depth == 0 {
			return rapid.SampledFrom([]string{"a", "b", "c", "stat", "true", `probe < "60 degC"`}).Draw(rt, "part")
		}
		switch rapid.IntRange(0, 3).Draw(rt, "kind") {
		case 0:
			return "not (" + draw(rt, depth-1) + ")"
		case 1:
			return "(" + draw(rt, depth-1) + ") and (" + draw(rt, depth-1) + ")"
		case 2:
			return "(" + draw(rt, depth-1) + ") or (" + draw(rt, depth-1) + ")"
		}
		return draw(rt, 0)
	}
	rapid.Check(t, func(rt *rapid.T) {
		line := draw(rt, rapid.IntRange(0, 4).Draw(rt, "depth"))
		first, diags := wired(line)
		if diags.HasErrors() {
			rt.Fatalf("%s: %v", line, diags)
		}
		again := strings.ReplaceAll(bracketed(first), "probe<60", `probe < "60 degC"`)
		second, diags := wired(again)
		if diags.HasErrors() || bracketed(first) != bracketed(second) {
			rt.Fatalf("%s is %s, and that is %s (%v)", line, bracketed(first), bracketed(second), diags)
		}
	})
}

// A name that is allowed works as a name in a line of wiring: none of the
// expression language's own functions comes between.
func TestEveryNameWorksInWiring(t *testing.T) {
	for _, name := range builtin.Names {
		if reserved[name] || !identifierForm.MatchString(name) {
			continue
		}
		sheet := strings.ReplaceAll(`format: 1
equipment: {id: tank, title: Tank}
signals: [{id: NAME, what: a signal}, {id: other, what: b}]
loads: [{id: heater, what: heater, kind: contactor, safe_state: off, runs_when: not (NAME) and (other or NAME) or NAME and other}]
`+stayingPart+"\n", "NAME", name)
		if _, diags := Read("sheet.yaml", []byte(sheet)); diags.HasErrors() {
			t.Errorf("%s: %v", name, diags)
		}
	}
}

// Any line of text: a tree or a diagnostic inside the sheet, never both or neither.
func TestWiringNeverFails(t *testing.T) {
	words := []string{"a", "b", "stat", "probe", "and", "or", "not", "(", ")", "<", ">=", `"60 degC"`, "==", "+", "in", "?", ":", ".", "[", "]", "{", "}", "|", "#", "$env", "let", "=", ";", "1", "nil", "matches", "all", "..", "/", "*"}
	rapid.Check(t, func(rt *rapid.T) {
		line := rapid.OneOf(rapid.StringMatching(`[ -~]{1,30}`), rapid.Map(rapid.SliceOfN(rapid.SampledFrom(words), 1, 12), func(w []string) string { return strings.Join(w, " ") })).Draw(rt, "line")
		tree, diags := wired(line)
		if (tree == nil) == !diags.HasErrors() && line != "unknown" {
			rt.Fatalf("%q: tree %v, %v", line, tree, diags)
		}
		for _, d := range diags {
			if d.Line != 6 {
				rt.Fatalf("%q: %v", line, d)
			}
		}
	})
}

// The place of a slip is exact wherever the line stands as it is in the sheet,
// and at the start of the value where the sheet folds or escapes it.
func TestPlacesInWiring(t *testing.T) {
	const before = `  - {id: heater, what: ° °, kind: fan, safe_state: off, runs_when: `
	for value, offset := range map[string]int{
		`c and WRONG`:              6,
		`"c and WRONG"`:            7,
		`'c and WRONG'`:            7,
		`'not (c) or c and WRONG'`: 18,
		`"c and \u0057RONG"`:       0,
	} {
		sheet := "format: 1\nequipment: {id: tank, title: °Tank}\nloads:\n" + before + value + "}\n" + stayingPart + "\n"
		_, diags := Read("sheet.yaml", []byte(sheet))
		want := utf8.RuneCountInString(before) + 1 + offset
		if len(diags) != 1 || diags[0].Line != 4 || diags[0].Col != want {
			t.Errorf("%s: %v, want 4:%d", value, diags, want)
		}
	}
}
