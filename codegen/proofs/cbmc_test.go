//go:build deep

package proofs

import (
	"fmt"
	"path/filepath"
	"regexp"
	"strconv"
	"strings"
	"testing"

	"makebreak/codegen/csource"
)

// A claim of the model checker's answer: its text and what became of it.
var claim = regexp.MustCompile(`(?m)^\[[^\]]*\] (?:line \d+ )?(.*): (SUCCESS|FAILURE|UNKNOWN|ERROR)$`)

// checked runs the model checker and gives what it says of each claim. Claims
// with one text count as one, which fails where any of them fails.
func checked(t *testing.T, dir, id string, args ...string) (verdicts map[string]string, n int, took float64, out string) {
	t.Helper()
	checks := unwindings.ReplaceAllString(csource.ModelChecks, fmt.Sprintf("--unwind %d", unwinding(t, dir, id)))
	all := append(append([]string{id + "_proof.c", id + ".c"}, words(checks)...), args...)
	out, took, _ = run(dir, patience, tool(t, "cbmc"), all...)
	verdicts = map[string]string{}
	for _, m := range claim.FindAllStringSubmatch(out, -1) {
		n++
		if v := verdicts[m[1]]; v == "" || v == "SUCCESS" {
			verdicts[m[1]] = m[2]
		}
	}
	if n == 0 {
		t.Fatalf("cbmc %v said nothing of any claim:\n%s", args, clip(out, 3000))
	}
	return verdicts, n, took, out
}

var (
	points     = regexp.MustCompile(`_x\[(\d+)\]`)
	unwindings = regexp.MustCompile(`--unwind \d+`)
)

// tooHard are the designs that the model checker does not finish in its time,
// with the reason. The value analysis covers them all the same.
var tooHard = map[string]string{
	"flame": "two memories that outlive a power cut, counters of 32 bits and a count of days in one step; the like of it is proved in the example waterheater",
}

// unwinding is how often the one loop there is, the search in a table, goes
// round at most: as often as the largest table has points.
func unwinding(t *testing.T, dir, id string) int {
	t.Helper()
	most := 16
	for _, m := range points.FindAllStringSubmatch(read(t, filepath.Join(dir, id+".c")), -1) {
		n, err := strconv.Atoi(m[1])
		if err != nil {
			t.Fatal(err)
		}
		most = max(most, n)
	}
	return most + 1
}

func failures(verdicts map[string]string) []string {
	var failed []string
	for _, text := range sortedKeys(verdicts) {
		if verdicts[text] != "SUCCESS" {
			failed = append(failed, text+": "+verdicts[text])
		}
	}
	return failed
}

// widths of int that the C has to be right for, each with the options of the
// model checker.
func widths(t *testing.T) map[string][]string {
	own, err := filepath.Abs("testdata/int16")
	if err != nil {
		t.Fatal(err)
	}
	return map[string][]string{"16": {"--16", "-I", own}, "32": {"--32"}, "64": {"--64"}}
}

// TestModelChecker proves of every design: from each state inside the
// invariant, on any inputs, a step does nothing undefined, keeps the invariant
// and breaks no property, with an int of 16, 32 and 64 bits; every start gives
// such a state; and what is claimed falsely on purpose is found to be false.
func TestModelChecker(t *testing.T) {
	tool(t, "cbmc")
	for _, d := range append(examples(t), scenarios(t)...) {
		t.Run(d.name, func(t *testing.T) {
			t.Parallel()
			if why := tooHard[d.name]; why != "" {
				t.Skipf("SKIPPED: not proved: %s", why)
			}
			dir := d.folder(t)
			if left := d.src.Unproven(); len(left) > 0 {
				t.Errorf("no claim is made about %v", left)
			}
			for _, mode := range []string{"step", "base"} {
				for width, flags := range widths(t) {
					if mode == "base" {
						flags = append(flags, "-DBASE")
					}
					verdicts, n, took, out := checked(t, dir, d.id, flags...)
					if failed := failures(verdicts); len(failed) > 0 || !strings.Contains(out, "VERIFICATION SUCCESSFUL") {
						t.Errorf("%s, int of %s bits: %v\n%s", mode, width, failed, clip(out, 200))
					}
					note(d.name, "claims_"+mode+"_"+width, float64(n))
					note(d.name, "seconds_"+mode+"_"+width, took)
					if mode == "step" {
						d.everythingClaimed(t, verdicts)
					}
				}
			}
			note(d.name, "properties", float64(len(d.src.Program.Never)))
			d.falseOnPurpose(t, dir)
		})
	}
}

// everythingClaimed makes sure that each property and each variable with a
// range of its own is among the claims.
func (d design) everythingClaimed(t *testing.T, verdicts map[string]string) {
	t.Helper()
	for _, p := range d.src.Program.Never {
		if verdicts["property: "+p.Name] != "SUCCESS" {
			t.Errorf("property %s: %q", p.Name, verdicts["property: "+p.Name])
		}
	}
	ranges := 0
	for text := range verdicts {
		if strings.HasPrefix(text, "invariant: ") {
			ranges++
		}
	}
	if len(d.src.Program.State) > 0 && ranges == 0 {
		t.Error("no range is claimed")
	}
}

// falseOnPurpose makes sure that the claims are not true for want of anything
// to be true of: without any one of its conditions each property is broken,
// and the end of a step and of a start is reached.
func (d design) falseOnPurpose(t *testing.T, dir string) {
	t.Helper()
	const prefix = "false on purpose: "
	verdicts, _, took, _ := checked(t, dir, d.id, "--32", "-DFALSE_PROPERTY")
	found := 0
	for text, verdict := range verdicts {
		switch {
		case strings.HasPrefix(text, prefix):
			found++
			if verdict != "FAILURE" {
				t.Errorf("%s: %s", text, verdict)
			}
		case verdict != "SUCCESS":
			t.Errorf("%s: %s", text, verdict)
		}
	}
	if found < 1+len(d.src.Program.Never) {
		t.Errorf("only %d claims are false on purpose", found)
	}
	note(d.name, "false_on_purpose", float64(found))
	note(d.name, "seconds_false_32", took)

	verdicts, _, _, _ = checked(t, dir, d.id, "--32", "-DFALSE_PROPERTY", "-DBASE")
	if v := verdicts[prefix+"the end of a start is never reached"]; v != "FAILURE" {
		t.Errorf("the end of a start: %q", v)
	}
}

// TestModelCheckerNotices breaks the C of the calorifier in ways that matter
// and expects the claim that each of them breaks.
func TestModelCheckerNotices(t *testing.T) {
	tool(t, "cbmc")
	for _, c := range []struct{ what, from, to, broken, width string }{
		{"flow is not asked for once on", "} else if (!in->flow_proven) {", "} else if (false) {", "property: must_1", "32"},
		{"a faulty probe is believed", "(m->tank_probe_state == CAL2_TANK_PROBE_STATE_FAULTY) ||\n            m->heater_no_effect", "m->heater_no_effect", "property: heater_safe_on_fault", "32"},
		{"a timer runs beyond its limit", "m->heater_for < CAL2_HEATER_MIN_OFF", "m->heater_for <= CAL2_HEATER_MIN_OFF", "invariant: heater_for", "32"},
		{"casts left out, int of 16 bits", "((int32_t)m->heater_effect_from - (int32_t)tank_probe_counts) >=\n        (int32_t)CAL2_HEATER_EFFECT",
			"((int)m->heater_effect_from - (int)tank_probe_counts) >=\n        CAL2_HEATER_EFFECT", "arithmetic overflow on", "16"},
		{"start leaves the heater on", "m->heater = (uint8_t)CAL2_HEATER_OFF;\n    m->heater_for = 0u;\n    m->heater_apart_for", "m->heater = 2u;\n    m->heater_for = 0u;\n    m->heater_apart_for", "invariant: heater", "base"},
	} {
		t.Run(c.what, func(t *testing.T) {
			t.Parallel()
			d := named(t, "calorifier")
			if n := strings.Count(d.files["cal2.c"], c.from); n != 1 {
				t.Fatalf("%q stands %d times in the C", c.from, n)
			}
			d.files["cal2.c"] = strings.Replace(d.files["cal2.c"], c.from, c.to, 1)
			flags := widths(t)[c.width]
			if c.width == "base" {
				flags = []string{"--32", "-DBASE"}
			}
			verdicts, _, _, _ := checked(t, d.folder(t), d.id, flags...)
			found := false
			for _, f := range failures(verdicts) {
				found = found || strings.HasPrefix(f, c.broken)
			}
			if !found {
				t.Errorf("%s not found false; false are %v", c.broken, failures(verdicts))
			}
		})
	}
}

func named(t *testing.T, name string) design {
	t.Helper()
	for _, d := range examples(t) {
		if d.name == name {
			return d
		}
	}
	t.Fatalf("no example %s", name)
	return design{}
}
