package risk

import (
	"strings"
	"testing"
)

// secondHeater adds a heating load that the replaced stat switches as well.
var secondHeater = change{"loads:\n", `loads:
  - {id: booster, what: second immersion heater, kind: heater, supply: 230 V, current: 13 A, safe_state: off, rest: off, runs_when: tank_stat and flow_proven, area: non_hazardous}
`}

func stopped(a *Assessment, about string) bool {
	f := findingOf(a, "danger_without_barrier", about)
	return f != nil && f.Grade == Stop
}

// Every load that can drive to the danger needs its barrier (per danger and
// load, not per part): one limit over one of two heaters is not enough.
func TestEveryLoadNeedsItsBarrier(t *testing.T) {
	a := assessed(t, sheetWith(t, "tank", secondHeater), nil)
	if !stopped(a, "boiling/booster") || stopped(a, "boiling/heater") {
		t.Errorf("stops: %s", stops(a))
	}
	both := append(change{"cuts: [heater]", "cuts: [heater, booster]"}, secondHeater...)
	if a := assessed(t, sheetWith(t, "tank", both), nil); a.Stopped() {
		t.Errorf("stops: %s", stops(a))
	}
}

// What makes a kept limit count, and what does not (common practice).
func TestWhatCountsAsABarrier(t *testing.T) {
	const limit = "breaks_at: 85 degC"
	for name, c := range map[string]struct {
		changes change
		counts  bool
	}{
		"kept":                  {nil, true},
		"renewed":               {change{"plan: keep", "plan: renew"}, true},
		"added":                 {change{"plan: keep", "plan: add"}, true},
		"stays and is watched":  {change{"plan: keep", "plan: monitor\n    sensor: tank_probe"}, true},
		"replaced":              {change{tankLimitKept, tankLimitReplaced}, false},
		"filed as operating":    {change{"duty: protective", "duty: operating"}, false},
		"filed as limiting":     {change{"duty: protective", "duty: limiting"}, true},
		"shares the pocket":     {change{"shares: [pocket]", "shares: [pocket]"}, true},
		"shares the supply":     {change{"shares: [pocket]", "shares: [supply]"}, true},
		"shares the sensor":     {change{"shares: [pocket]", "shares: [sensor]"}, false},
		"shares the converter":  {change{"shares: [pocket]", "shares: [converter]"}, false},
		"cuts nothing":          {change{"    cuts: [heater]\n", ""}, false},
		"at the danger":         {change{limit, "breaks_at: 91 degC"}, false}, // 91 + 4 is 95
		"just before it":        {change{limit, "breaks_at: 90.9 degC"}, true},
		"no threshold":          {change{limit + "\n    makes_at: 70 degC", "breaks_at: unknown\n    makes_at: unknown"}, false},
		"dial up to the danger": {change{limit, limit + "\n    dial: [60 degC, 92 degC]"}, false},
		"dial short of it":      {change{limit, limit + "\n    dial: [60 degC, 88 degC]"}, true},
		"tolerance not stated":  {change{"    tolerance: 4 K\n", "", limit, "breaks_at: 80 degC"}, true},
		"fails as if cold":      {change{"on_element_failure: breaks", "on_element_failure: makes"}, true},
	} {
		t.Run(name, func(t *testing.T) {
			a := assessed(t, sheetWith(t, "tank", c.changes), nil)
			if stopped(a, "boiling/heater") == c.counts {
				t.Errorf("counts %v, stops: %s", c.counts, stops(a))
			}
		})
	}
}

// The cut comes before the danger by 6 K; the medium goes on by more or less
// than that. A limit is judged by where the medium ends (common practice).
func TestOvershootAfterTheCutCounts(t *testing.T) {
	s := sheetWith(t, "tank", nil)
	key := Key{"high_limit", OvershootAfterCut}
	if a := assessed(t, s, figures{key: 5.9}); stopped(a, "boiling/heater") {
		t.Error("5.9 K overshoot stopped")
	}
	if a := assessed(t, s, figures{key: 6}); !stopped(a, "boiling/heater") {
		t.Error("6 K overshoot not stopped")
	}
}

// A welded contact does not ask for the safe state: a heater without hardware
// is a stop whatever its safe state and rest are.
func TestSafeStateIsNoBarrierForAHeater(t *testing.T) {
	for _, safe := range []string{"off", "on"} {
		a := assessed(t, sheetWith(t, "tank", change{"    cuts: [heater]\n", "", "safe_state: off\n    rest: off", "safe_state: " + safe + "\n    rest: " + safe}), nil)
		if !stopped(a, "boiling/heater") {
			t.Errorf("safe and resting state %s: %s", safe, stops(a))
		}
	}
}

// A load that is dangerous when off cannot be helped by cutting; its safe and
// resting state, or an alarm of its own, can (common practice in cold stores).
func TestCoolingThatStops(t *testing.T) {
	serious := change{"harm: slight", "harm: serious"}
	a := assessed(t, sheetWith(t, "cold", serious), nil)
	if !stopped(a, "spoilage/compressor") {
		t.Errorf("stops: %s", stops(a))
	}
	restsOn := append(change{"safe_state: off\n    rest: off", "safe_state: on\n    rest: on"}, serious...)
	if a := assessed(t, sheetWith(t, "cold", restsOn), nil); stopped(a, "spoilage/compressor") {
		t.Errorf("safe and resting on: %s", stops(a))
	}
	alarm := append(change{"    breaks_at: 6 degC\n    tolerance: 1 K\n    on_element_failure: breaks\n    plan: replace\n    sensor: room_probe\n",
		"    breaks_at: 6 degC\n    tolerance: 0.9 K\n    on_element_failure: breaks\n    plan: keep\n    cuts: [warm_alarm]\n    cuts_by: direct\n"}, serious...)
	a = assessed(t, sheetWith(t, "cold", alarm), nil)
	f := findingOf(a, "danger_without_barrier", "spoilage/compressor")
	if f == nil || f.Grade != Act || !strings.Contains(f.Becomes, "warm_stat") {
		t.Errorf("with an alarm of its own: %+v", f)
	}
}

// A low limit counts against a danger below and not against one above, with
// its tolerance the other way.
func TestLowLimit(t *testing.T) {
	low := func(breaks, makes, danger string) change {
		return change{
			"    above: 130 degC", "    below: " + danger,
			"    action: breaks_on_rise\n    breaks_at: 100 degC\n    makes_at: 60 degC", "    action: makes_on_rise\n    breaks_at: " + breaks + "\n    makes_at: " + makes,
			"cuts: [burner_call]", "cuts: [fan]",
			"settles_off: 15 degC", "settles_off: 40 degC",
		}
	}
	if a := assessed(t, sheetWith(t, "warm_air", low("12 degC", "20 degC", "5 degC")), nil); stopped(a, "exchanger_hot/fan") {
		t.Errorf("12 less 6 is above 5: %s", stops(a))
	}
	if a := assessed(t, sheetWith(t, "warm_air", low("10 degC", "20 degC", "5 degC")), nil); !stopped(a, "exchanger_hot/fan") {
		t.Errorf("10 less 6 is below 5: %s", stops(a))
	}
}

// The sheet states where the process settles at worst, and that is on the safe
// side: nothing drives to the danger.
func TestOutOfReach(t *testing.T) {
	cool := change{"    cuts: [heater]\n", "", "settles_on: 150 degC", "settles_on: 90 degC"}
	a := assessed(t, sheetWith(t, "tank", cool), nil)
	if stopped(a, "boiling/heater") {
		t.Errorf("stops: %s", stops(a))
	}
	if findingOf(a, "danger_not_judged", "boiling") == nil {
		t.Error("a danger to which nothing leads is passed over in silence")
	}
}

// A dangerous state with a gas valve in it asks for a flame safeguard that
// stays; a temperature limit is none.
func TestDangerousState(t *testing.T) {
	if a := assessed(t, sheetWith(t, "gas", nil), nil); a.Stopped() {
		t.Errorf("with its flame safeguard: %s", stops(a))
	}
	a := assessed(t, sheetWith(t, "gas", change{gasGuardKept, "    plan: keep\n\nelectronics:"}), nil)
	if !stopped(a, "unburnt_gas/gas") || stopped(a, "boiling/gas") {
		t.Errorf("without it: %s", stops(a))
	}
}

// Which way a load drives is read from its wiring (common practice): a contact
// in series that breaks on rise belongs to heat, one that makes on rise to
// cooling, and a `not` turns it round.
func TestWhichWayALoadDrives(t *testing.T) {
	const none = "process:\n  driven_by: heater"
	without := func(more ...string) change {
		return append(change{none, "process:\n  driven_by: []"}, more...)
	}
	for name, c := range map[string]struct {
		changes change
		want    string
	}{
		"breaks on rise":        {without(), heats},
		"makes on rise, turned": {without("set_point: 60 degC\n    marks: break\n    differential: 6 K", "breaks_at: 54 degC\n    makes_at: 60 degC", "action: breaks_on_rise", "action: makes_on_rise", "runs_when: tank_stat and", "runs_when: not tank_stat and"), heats},
		"makes on rise":         {without("set_point: 60 degC\n    marks: break\n    differential: 6 K", "breaks_at: 54 degC\n    makes_at: 60 degC", "action: breaks_on_rise", "action: makes_on_rise"), cools},
		"no control":            {without("runs_when: tank_stat and flow_proven", "runs_when: flow_proven"), unknown},
		"a heater by its kind":  {without("runs_when: tank_stat and flow_proven", "runs_when: flow_proven", "kind: contactor", "kind: heater"), heats},
		"an alarm":              {change{"kind: contactor", "kind: alarm"}, noEffect},
		"the process says":      {change{"runs_when: tank_stat and flow_proven", "runs_when: flow_proven"}, heats},
	} {
		s := sheetWith(t, "tank", c.changes)
		if got := effectOf(s, s.Loads[0]); got != c.want {
			t.Errorf("%s: %s, want %s", name, got, c.want)
		}
	}
}

// A contactor of which nothing says which way it drives is taken as driving
// towards the danger, and is said to be taken so.
func TestUnknownDirectionIsTheWorse(t *testing.T) {
	a := assessed(t, sheetWith(t, "tank", change{"process:\n  driven_by: heater", "process:\n  driven_by: []",
		"runs_when: tank_stat and flow_proven", "runs_when: flow_proven", "    cuts: [heater]\n", ""}), nil)
	if !stopped(a, "boiling/heater") || findingOf(a, "load_effect_unknown", "heater") == nil {
		t.Errorf("stops: %s", stops(a))
	}
}

// The risk graph of ISO 13849-1 Annex A, letters from memory.
func TestRequiredPerformanceLevel(t *testing.T) {
	for words, want := range map[string]string{
		"slight seldom possible": "a", "slight seldom scarcely": "b", "slight frequent possible": "b", "slight frequent scarcely": "c",
		"serious seldom possible": "c", "serious seldom scarcely": "d", "serious frequent possible": "d", "serious frequent scarcely": "e",
		"serious unknown possible": unknown,
	} {
		w := strings.Fields(words)
		if got := requiredLevel(&Danger{Harm: w[0], Exposure: w[1], Avoidance: w[2]}); got != want {
			t.Errorf("%s: %s, want %s", words, got, want)
		}
	}
}
