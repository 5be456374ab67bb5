package risk

import "strings"

const tankPapers = `answers:
  - {finding: paperwork_open, about: rollback, answer: The old stat is kept for a year., role: engineer, date: 2026-11-20}
  - {finding: paperwork_open, about: spares, answer: Two boards., role: engineer, date: 2026-11-20}
  - {finding: paperwork_open, about: training, answer: Done., role: engineer, date: 2026-11-20}
  - {finding: paperwork_open, about: label, answer: On the vessel., role: engineer, date: 2026-11-20}
`

var tooLate = func(rise, margin float64) figures {
	return figures{{"boiling", "rise_before_fault"}: rise, {"boiling", "margin_to_danger"}: margin}
}

// Sheets and their neighbours for the rules about the plant as a whole, its
// loads and signals, and the board.
var plantCases = []ruleCase{
	{rule: "restarts_by_itself", about: "compressor", grade: Act, base: "cold",
		quiet: change{"kind: compressor", "kind: contactor"}},
	{rule: "restarts_by_itself", about: "fan", grade: Stop, base: "warm_air",
		fire:  change{"dangers:\n", "dangers:\n  - {id: blades, when: fan, what: a hand in the blades, harm: serious}\n"},
		quiet: change{"kind: fan", "kind: contactor"}},
	{rule: "fan_stopped_on_fault", about: "fan", grade: Act, base: "warm_air",
		fire: change{"safe_state: on\n    rest: on", "safe_state: off\n    rest: off"}},
	{rule: "heat_without_flow", about: "heater", grade: Stop, base: "tank",
		fire:  change{"loads:\n", tankPump, "medium: water", "medium: air", "runs_when: tank_stat and flow_proven", "runs_when: tank_stat"},
		quiet: change{"loads:\n", tankPump, "medium: water", "medium: air"}},
	{rule: "heat_without_flow", about: "heater", grade: Stop, base: "tank", // a fan that stands still while it heats, as with a defrost
		fire:  change{"loads:\n", tankPump, "medium: water", "medium: air", "runs_when: tank_stat and flow_proven", "runs_when: tank_stat"},
		quiet: change{"loads:\n", strings.Replace(tankPump, "runs_when: flow_proven", "runs_when: flow_proven and not tank_stat", 1), "medium: water", "medium: air", "runs_when: tank_stat and flow_proven", "runs_when: tank_stat"}},
	{rule: "heat_flow_not_proved", about: "heater", grade: Act, base: "tank",
		fire:  change{"loads:\n", tankPump, "runs_when: tank_stat and flow_proven", "runs_when: tank_stat"},
		quiet: change{"loads:\n", tankPump}},
	{rule: "proving_switch_not_checked_open", about: "flow_proven", grade: Act, base: "tank",
		quiet: change{"seen_off_before_start: false", "seen_off_before_start: true"}},
	{rule: "broken_wire_permits", about: "flow_proven", grade: Stop, base: "tank", fire: change{"broken_wire: false", "broken_wire: true"}},
	{rule: "broken_wire_permits", about: "flow_proven", grade: Act, base: "tank", fire: change{"broken_wire: false", "broken_wire: unknown"}},
	{rule: "signal_never_read", about: "air_proven", grade: Note, base: "warm_air",
		quiet: change{"runs_when: room_calls and exchanger_stat", "runs_when: room_calls and exchanger_stat and air_proven"}},
	{rule: "watchdog_absent", about: "cal2", grade: Stop, base: "tank", fire: change{"watchdog: external", "watchdog: none"}},
	{rule: "watchdog_absent", about: "cal2", grade: Act, base: "tank", fire: change{"watchdog: external", "watchdog: unknown"}},
	{rule: "watchdog_absent", about: "cal2", grade: Act, base: "tank", fire: change{"watchdog: external", "watchdog: none", "drive: level", "drive: pulsed"}},
	{rule: "watchdog_inside", about: "cal2", grade: Act, base: "tank",
		fire: change{"watchdog: external", "watchdog: internal"}, quiet: change{"watchdog: external", "watchdog: internal", "drive: level", "drive: pulsed"}},
	{rule: "brown_out_absent", about: "cal2", grade: Act, base: "tank", fire: change{"brown_out: true", "brown_out: false"}},
	{rule: "panel_in_hazardous_area", about: "cal2", grade: Stop, base: "tank", fire: change{"45 degC], area: non_hazardous", "45 degC], area: zone_2"}},
	{rule: "area_not_stated", about: "cal2", grade: Act, base: "tank", fire: change{"45 degC], area: non_hazardous", "45 degC]"}},
	{rule: "enclosure_too_hot_cold", about: "cal2", grade: Act, base: "tank", fire: change{"45 degC]", "70 degC]"}},
	{rule: "damp_dust_washdown", about: "cal2", grade: Act, base: "tank", fire: change{"conditions: dry", "conditions: washed_down"}},
	{rule: "model_beyond_evidence", about: "cal2", grade: Act, base: "tank", quiet: change{"pressure: vented", "pressure: closed"}},
	{rule: "model_beyond_evidence", about: "cal2", grade: Act, base: "tank",
		fire:  change{"  settles_on: 140 degC     # from the rise of a cold vessel, 9 kW into 1000 l\n", "", "pressure: vented", "pressure: closed"},
		quiet: change{"pressure: vented", "pressure: closed"}},
	{rule: "approval_lapses", about: "cal2", grade: Act, base: "tank", quiet: change{"    plan: replace\n    sensor: tank_probe\n", "    plan: keep\n    cuts: [heater]\n"}},
	{rule: "paperwork_open", about: "cal2", grade: Note, base: "tank",
		quiet: change{"inspected_by: unknown", "inspected_by: the insurer", "answers:\n", tankPapers}},
	{rule: "must_broken", about: "cal2", grade: Stop, base: "tank",
		given: figures{{"cal2", "must_broken"}: 1}, givenQuiet: figures{{"cal2", "must_broken"}: 0}},
	{rule: "fault_found_too_late", about: "boiling", grade: Act, base: "tank",
		fire: change{"    cuts: [heater]\n", ""}, given: tooLate(40, 35), quiet: change{"    cuts: [heater]\n", ""}, givenQuiet: tooLate(2, 35)},
}
