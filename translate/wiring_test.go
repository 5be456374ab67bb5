package translate_test

import (
	"fmt"
	"testing"

	"github.com/expr-lang/expr"

	"makebreak/survey"
	"makebreak/translate"
)

// The old wiring in the program against the expression language's own
// evaluator, over every row of the truth table.
func TestWiringTruthTables(t *testing.T) {
	names := []string{"a", "b", "c", "d"}
	for _, line := range []string{
		"a", "not a", "a and b", "a or b", "a and not b or c", "a and (b or not c)", "not (a and b) or (c and d)",
		"a or b and c or d", "not (not a or b)", "a and b and c and d", "(a or b) and (c or d)", "not a and not b", "true and a", "a or false",
		"a && (!b || c)",
	} {
		var signals string
		for _, n := range names {
			signals += fmt.Sprintf("  - {id: %s, what: %s, broken_wire: false}\n", n, n)
		}
		sheet := "format: 1\nequipment: {id: t, title: T}\nsignals:\n" + signals +
			"loads:\n  - {id: load, what: load, kind: motor, safe_state: off, runs_when: '" + line + "'}\n" +
			"controls:\n  - {id: s, what: s, duty: protective, element: rod_tube, action: breaks_on_rise, breaks_at: 60 degC, makes_at: 50 degC, plan: keep, cuts: load}\n" +
			"electronics:\n  outputs:\n    - {load: load, kind: relay}\n"
		s, diags := survey.Read("sheet.yaml", []byte(sheet))
		if diags.HasErrors() {
			t.Fatalf("%s: %v", line, diags)
		}
		spec, diags := translate.Translate(s)
		if diags.HasErrors() || spec.Program == nil {
			t.Fatalf("%s: %v", line, diags)
		}
		run := spec.Program.NewRun()
		for row := 0; row < 1<<len(names); row++ {
			env := map[string]any{}
			in := make([]int64, len(spec.Program.Inputs))
			for i, v := range spec.Program.Inputs {
				in[i] = int64(row >> i & 1)
				env[v.Name] = in[i] != 0
			}
			want, err := expr.Eval(line, env)
			if err != nil {
				t.Fatal(err)
			}
			run.Start(nil)
			run.Step(in)
			if got := run.Get(spec.Plan.Loads["load"].Out) != 0; got != want {
				t.Errorf("%s with %v: the program says %v, the evaluator %v", line, env, got, want)
			}
		}
	}
}
