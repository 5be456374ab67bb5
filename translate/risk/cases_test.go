package risk

import (
	"os"
	"slices"
	"strings"
	"testing"

	"makebreak/survey"
)

// change replaces one text of a sheet by another, pair by pair.
type change []string

// figures are worked-out values, as the figures of a specification.
type figures map[Key]float64

// ruleCase is a sheet on which a rule raises its finding, and a neighbour of
// that sheet on which it does not.
type ruleCase struct {
	rule, about string
	grade       Grade
	base        string // sheet in testdata
	fire, quiet change
	given       figures // worked out on the sheet that fires
	givenQuiet  figures // worked out on its neighbour
	quietBase   string  // the neighbour's sheet where it is another one
	refused     string  // why the translator made nothing of it, on the sheet that fires
}

func sheetWith(t *testing.T, base string, changes change) *survey.Survey {
	t.Helper()
	data, err := os.ReadFile("testdata/" + base + ".yaml")
	if err != nil {
		t.Fatal(err)
	}
	text := string(data)
	for i := 0; i+1 < len(changes); i += 2 {
		if !strings.Contains(text, changes[i]) {
			t.Fatalf("%s has no %q", base, changes[i])
		}
		text = strings.Replace(text, changes[i], changes[i+1], 1)
	}
	s, ds := survey.Read(base+".yaml", []byte(text))
	if ds.HasErrors() {
		t.Fatal(ds)
	}
	return s
}

func assessed(t *testing.T, s *survey.Survey, given figures) *Assessment {
	t.Helper()
	return assessedWith(t, s, given, nil)
}

func assessedWith(t *testing.T, s *survey.Survey, given figures, refused map[string]string) *Assessment {
	t.Helper()
	computed := Computed{Figures: map[Key]Figure{}, NotTranslated: refused}
	for key, value := range given {
		computed.Figures[key] = Figure{Value: &value, Reason: "as given"}
	}
	view, err := NewView(s, computed)
	if err != nil {
		t.Fatal(err)
	}
	rules, err := Builtin()
	if err != nil {
		t.Fatal(err)
	}
	a, err := rules.Assess(view)
	if err != nil {
		t.Fatal(err)
	}
	return a
}

func findingOf(a *Assessment, id, about string) *Finding {
	i := slices.IndexFunc(a.Findings, func(f Finding) bool { return f.ID == id && f.About == about })
	if i < 0 {
		return nil
	}
	return &a.Findings[i]
}

func runCases(t *testing.T, cases []ruleCase) {
	for _, c := range cases {
		t.Run(c.rule+"_"+string(c.grade), func(t *testing.T) {
			refused := map[string]string{}
			if c.refused != "" {
				refused[c.about] = c.refused
			}
			f := findingOf(assessedWith(t, sheetWith(t, c.base, c.fire), c.given, refused), c.rule, c.about)
			if f == nil {
				t.Fatalf("not raised about %s", c.about)
			}
			if f.Grade != c.grade {
				t.Errorf("grade %s, want %s", f.Grade, c.grade)
			}
			for part, text := range map[string]string{"was": f.Was, "becomes": f.Becomes, "consequence": f.Consequence, "needed": f.Needed, "basis": f.Basis} {
				if text == "" || strings.Contains(text, "NaN") {
					t.Errorf("%s: %q", part, text)
				}
			}
			base := c.base
			if c.quietBase != "" {
				base = c.quietBase
			}
			if f := findingOf(assessed(t, sheetWith(t, base, c.quiet), c.givenQuiet), c.rule, c.about); f != nil {
				t.Errorf("raised about its harmless neighbour too: %s", f.Becomes)
			}
		})
	}
}

func TestRulesAboutBarriers(t *testing.T) { runCases(t, barrierCases) }
func TestRulesAboutParts(t *testing.T)    { runCases(t, partCases) }
func TestRulesAboutPlant(t *testing.T)    { runCases(t, plantCases) }

// Every rule has a case, and no case is about a rule that is not there.
func TestEveryRuleHasACase(t *testing.T) {
	rules, err := Builtin()
	if err != nil {
		t.Fatal(err)
	}
	seen := map[string]bool{}
	for _, c := range slices.Concat(barrierCases, partCases, plantCases) {
		seen[c.rule] = true
		if _, ok := rules.Rule(c.rule); !ok {
			t.Errorf("no rule %s", c.rule)
		}
	}
	for _, r := range rules.All() {
		if !seen[r.ID] {
			t.Errorf("%s has no case", r.ID)
		}
	}
}

// The grades that the assessor's list gives each finding: S stop, A act,
// N note. Several letters: the grade depends on the plant.
const gradesOfTheSixty = `
danger_without_barrier SA, duty_understated S, same_final_element SA, flame_supervision_replaced S, gas_relit_without_flame S,
gas_valve_driven_direct S, fuse_link_replaced S, limit_shares_sensor S, limit_shares_pocket A, limit_shares_supply AN,
limit_beyond_danger S, limit_nuisance A, no_danger_stated SA, failure_direction_unknown SA, kept_limit_fails_as_cold A,
kept_limit_never_proved A, latch_lost SA, trips_dead_no_more A, first_start_armed S, trip_free_absent A, reset_remote A,
reset_by_power A, restarts_by_itself SA, frost_load_safe_on A, safe_on_but_rests_off SA, fan_stopped_on_fault A, heat_without_flow S,
proving_switch_not_checked_open A, broken_wire_permits SA, welded_output A, ssr_shorts_on SA, leakage_holds_load A,
earth_fault_bypasses_limit A, watchdog_absent SA, watchdog_inside A, brown_out_absent A, probe_out_of_pocket A, moisture_direction A,
thermocouple_reversed_or_shorted A, probe_elsewhere A, point_for_coldest_spot SA, insulation_of_new_probe A,
probe_in_hazardous_area S, panel_in_hazardous_area S, enclosure_too_hot_cold A, damp_dust_washdown A, resolution SA,
limit_error_budget A, reference_common_to_both A, contact_life A, time_proportioning_eats_contacts SA, compressor_short_cycle A,
self_powered_lost A, actuator_fail_position SA, scald_and_storage A, model_beyond_evidence A, mercury_asbestos_refrigerant A,
approval_lapses A, pl_not_reachable A, paperwork_open N`

func TestGradesOfTheSixty(t *testing.T) {
	rules, err := Builtin()
	if err != nil {
		t.Fatal(err)
	}
	entries := strings.Split(strings.ReplaceAll(gradesOfTheSixty, "\n", " "), ",")
	if len(entries) != 60 {
		t.Fatalf("%d entries", len(entries))
	}
	for i, entry := range entries {
		words := strings.Fields(entry)
		r := rules.All()[i]
		if r.ID != words[0] {
			t.Fatalf("rule %d is %s, want %s", i+1, r.ID, words[0])
		}
		if got := gradesOf(r); got != words[1] {
			t.Errorf("%s: grades %s, want %s", r.ID, got, words[1])
		}
	}
}

func gradesOf(r *Rule) string {
	letters := map[Grade]string{Stop: "S", Act: "A", Note: "N"}
	may := map[Grade]bool{r.Grade: true, Stop: r.stopWhen != nil, Act: r.actWhen != nil, Note: r.noteWhen != nil}
	may[r.Grade] = true
	text := ""
	for _, g := range []Grade{Stop, Act, Note} {
		if may[g] {
			text += letters[g]
		}
	}
	return text
}

// Figures that nobody has worked out make a rule wait, and one that is not
// determined is said; neither is taken for a good one.
func TestWaitingAndNotJudged(t *testing.T) {
	s := sheetWith(t, "tank", nil)
	a := assessed(t, s, nil)
	if !slices.ContainsFunc(a.Waiting, func(w Waiting) bool { return w.ID == "contact_life" }) {
		t.Errorf("waiting: %v", a.Waiting)
	}
	view, err := NewView(s, Computed{Figures: map[Key]Figure{{About: "heater", Name: "years_to_endurance"}: {Reason: "no cycle is known"}}})
	if err != nil {
		t.Fatal(err)
	}
	rules, err := Builtin()
	if err != nil {
		t.Fatal(err)
	}
	a, err = rules.Assess(view)
	if err != nil {
		t.Fatal(err)
	}
	want := NotJudged{"contact_life", "heater", "years_to_endurance", "no cycle is known"}
	if !slices.Contains(a.NotJudged, want) {
		t.Errorf("not judged: %v", a.NotJudged)
	}
}
