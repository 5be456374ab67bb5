package risk

import (
	"os"
	"strings"
	"testing"

	"makebreak/survey"
)

// judged assesses an example with some of its text changed.
func judged(t *testing.T, example string, changes ...string) *Assessment {
	t.Helper()
	data, err := os.ReadFile("../../examples/" + example + "/sheet.yaml")
	if err != nil {
		t.Fatal(err)
	}
	text := string(data)
	for i := 0; i+1 < len(changes); i += 2 {
		if !strings.Contains(text, changes[i]) {
			t.Fatalf("%s has no %q", example, changes[i])
		}
		text = strings.Replace(text, changes[i], changes[i+1], 1)
	}
	s, diags := survey.Read("sheet.yaml", []byte(text))
	if diags.HasErrors() {
		t.Fatal(diags)
	}
	view, err := NewView(s, Computed{Figures: map[Key]Figure{}, NotTranslated: map[string]string{}})
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

func stops(a *Assessment) string {
	var ids []string
	for _, f := range a.Findings {
		if f.Grade == Stop {
			ids = append(ids, f.ID)
		}
	}
	return strings.Join(ids, " ")
}

// A barrier counts only where it is hardware of its own, points the right way,
// acts in time and cuts the load that drives to the danger (common practice;
// IEC 60335-1 19.11 for the sensor of its own).
func TestWhatStopsACalorifier(t *testing.T) {
	for name, c := range map[string]struct {
		changes []string
		stop    string // "" where the plant must not be stopped
	}{
		"as it is":                    {nil, ""},
		"limit filed as operating":    {[]string{"duty: protective", "duty: operating"}, "duty_understated"},
		"limit beyond the danger":     {[]string{"breaks_at: 85 degC", "breaks_at: 100 degC"}, "danger_without_barrier"},
		"limit with tolerance beyond": {[]string{"breaks_at: 85 degC", "breaks_at: 92 degC"}, "danger_without_barrier"},
		"limit the other way":         {[]string{"action: breaks_on_rise\n    breaks_at: 85 degC\n    makes_at: 70 degC", "action: makes_on_rise\n    breaks_at: 70 degC\n    makes_at: 85 degC"}, "danger_without_barrier"},
		"limit cuts nothing":          {[]string{"    cuts: [heater]\n", ""}, "danger_without_barrier"},
		"limit shares the sensor":     {[]string{"shares: [pocket]", "shares: [sensor]"}, "limit_shares_sensor"},
		"same coil":                   {[]string{"cuts_by: own_contactor", "cuts_by: same_coil"}, "same_final_element"},
		"shared supply":               {[]string{"shares: [pocket]", "shares: [supply]"}, ""},
		"twin pockets":                {[]string{"shares: [pocket]", "shares: []"}, ""},
		"panel in a zone":             {[]string{"45 degC], area: non_hazardous", "45 degC], area: zone_2"}, "panel_in_hazardous_area"},
	} {
		t.Run(name, func(t *testing.T) {
			got := stops(judged(t, "calorifier", c.changes...))
			if c.stop == "" && got != "" || !strings.Contains(got, c.stop) {
				t.Errorf("stops: %q, want %q", got, c.stop)
			}
		})
	}
}

func TestHarmlessPlantsAreNotStopped(t *testing.T) {
	for _, e := range []string{"calorifier", "coldroom", "oven", "airheater", "frost"} {
		if got := stops(judged(t, e)); got != "" {
			t.Errorf("%s: stopped by %s", e, got)
		}
	}
}

// A frost heater that rests off is another matter: a dead board lets the line freeze.
func TestFrostHeaterThatRestsOff(t *testing.T) {
	if got := stops(judged(t, "frost", "rest: on", "rest: off")); !strings.Contains(got, "safe_on_but_rests_off") {
		t.Errorf("stops: %q", got)
	}
}

func TestNoDangerStated(t *testing.T) {
	const danger = `  - id: lint_fire
    above: 150 degC
    what: lint in the exhaust ignites
    harm: serious
    exposure: frequent
    avoidance: scarcely
`
	if got := stops(judged(t, "dryer", "dangers:\n"+danger, "")); !strings.Contains(got, "no_danger_stated") {
		t.Errorf("stops: %q", got)
	}
}

// An answer is quoted and never lifts a stop; about another figure it is stale.
func TestAnswers(t *testing.T) {
	a := judged(t, "dryer", "must:", `answers:
  - {finding: danger_without_barrier, about: lint_fire/battery, answer: We accept it., role: owner, date: 2026-11-20}
must:`)
	if !a.Stopped() || a.Findings[0].Answer == "" || !a.Findings[0].Open() {
		t.Errorf("%+v", a.Findings[0])
	}
	a = judged(t, "calorifier", "must:", `must:`)
	for _, f := range a.Findings {
		if f.ID == "limit_shares_pocket" && (f.Open() || !strings.Contains(f.Answer, "responsible electrical engineer")) {
			t.Errorf("%+v", f)
		}
	}
}

// The sixty of the list an assessor would raise are all there, in its order.
func TestSixty(t *testing.T) {
	rules, err := Builtin()
	if err != nil {
		t.Fatal(err)
	}
	ids := strings.Fields(`danger_without_barrier duty_understated same_final_element flame_supervision_replaced gas_relit_without_flame
gas_valve_driven_direct fuse_link_replaced limit_shares_sensor limit_shares_pocket limit_shares_supply limit_beyond_danger limit_nuisance
no_danger_stated failure_direction_unknown kept_limit_fails_as_cold kept_limit_never_proved latch_lost trips_dead_no_more first_start_armed
trip_free_absent reset_remote reset_by_power restarts_by_itself frost_load_safe_on safe_on_but_rests_off fan_stopped_on_fault heat_without_flow
proving_switch_not_checked_open broken_wire_permits welded_output ssr_shorts_on leakage_holds_load earth_fault_bypasses_limit watchdog_absent
watchdog_inside brown_out_absent probe_out_of_pocket moisture_direction thermocouple_reversed_or_shorted probe_elsewhere point_for_coldest_spot
insulation_of_new_probe probe_in_hazardous_area panel_in_hazardous_area enclosure_too_hot_cold damp_dust_washdown resolution limit_error_budget
reference_common_to_both contact_life time_proportioning_eats_contacts compressor_short_cycle self_powered_lost actuator_fail_position
scald_and_storage model_beyond_evidence mercury_asbestos_refrigerant approval_lapses pl_not_reachable paperwork_open`)
	if len(ids) != 60 {
		t.Fatalf("%d ids", len(ids))
	}
	at := 0
	for _, r := range rules.All() {
		if at < len(ids) && r.ID == ids[at] {
			at++
		}
	}
	if at != len(ids) {
		t.Errorf("%s is missing or out of order", ids[at])
	}
}

func TestSiteRules(t *testing.T) {
	rules, err := Builtin()
	if err != nil {
		t.Fatal(err)
	}
	rule := func(id, when string) string {
		return "rules:\n  - {id: " + id + ", grade: act, each: load, when: '" + when + "', was: a, becomes: b, consequence: c, needed: d, basis: e, status: common practice}\n"
	}
	for name, c := range map[string]struct {
		text string
		bad  bool
	}{
		"adds":          {rule("site_one", `load.kind == "fan"`), false},
		"redefines":     {rule("danger_without_barrier", "true"), true},
		"unknown name":  {rule("site_one", `load.knid == "fan"`), true},
		"no condition":  {rule("site_one", `load.kind`), true},
		"no expression": {rule("site_one", `load.kind ==`), true},
		"no YAML":       {"rules: [", true},
	} {
		merged, diags := rules.Merge([]byte(c.text), "site.yaml")
		if diags.HasErrors() != c.bad {
			t.Errorf("%s: %v", name, diags)
		}
		for _, d := range diags {
			if d.Line < 1 || d.File != "site.yaml" {
				t.Errorf("%s: no place: %v", name, d)
			}
		}
		if len(merged.All()) < len(rules.All()) {
			t.Errorf("%s: rules were lost", name)
		}
	}
}
