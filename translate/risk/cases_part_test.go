package risk

const (
	tankBothReplaced = "runs_when: tank_stat and high_limit and flow_proven"
	tankThermocouple = "kind: type_k\n      class: 2\n      gain: 100\n      open_reads: floats\n"
	tankThermistor   = "kind: ntc\n      r25: 10 kohm\n      r25_tolerance: 1 %\n      beta: 3977 K\n      beta_tolerance: 0.75 %\n      pull_up: 3.3 kohm\n      pull_up_tolerance: 0.1 %\n"
	secondProbe      = "  sensors:\n    - {id: probe_two, what: beside it, kind: ntc, r25: 10 kohm, beta: 3977 K, pull_up: 3.3 kohm, area: non_hazardous}\n"
)

var (
	countWidth = func(k float64) figures {
		return figures{{"tank_probe/break", "count_width"}: k, {"tank_probe/make", "count_width"}: k}
	}
	errorWorst = func(k float64) figures {
		return figures{{"tank_probe/break", "error_worst"}: k, {"tank_probe/make", "error_worst"}: k}
	}
	contactYears = func(y float64) figures {
		return figures{{"heater", "years_to_endurance"}: y, {"heater", "operations_per_year"}: 1e5 / y}
	}
)

// Sheets and their neighbours for the rules about single parts, old and new.
var partCases = []ruleCase{
	{rule: "flame_supervision_replaced", about: "flame_guard", grade: Stop, base: "gas",
		fire: change{gasGuardKept, "    plan: replace\n    sensor: water_probe\n\nelectronics:"}},
	{rule: "fuse_link_replaced", about: "high_limit", grade: Stop, base: "tank",
		fire:  change{tankLimitKept, tankLimitReplaced, "reset: manual\n    trip_free: true", "reset: one_shot"},
		quiet: change{"reset: manual\n    trip_free: true", "reset: one_shot"}},
	{rule: "failure_direction_unknown", about: "tank_stat", grade: Act, base: "tank",
		fire: change{"on_element_failure: makes", "on_element_failure: unknown"}},
	{rule: "failure_direction_unknown", about: "high_limit", grade: Stop, base: "tank",
		fire: change{"on_element_failure: breaks", "on_element_failure: unknown", tankLimitKept, tankLimitReplaced}},
	{rule: "kept_limit_fails_as_cold", about: "high_limit", grade: Act, base: "tank",
		fire: change{"on_element_failure: breaks", "on_element_failure: makes"}},
	{rule: "kept_limit_never_proved", about: "high_limit", grade: Act, base: "tank", fire: change{"    last_proved: 2026-09-14\n", ""}},
	{rule: "kept_limit_never_proved", about: "high_limit", grade: Act, base: "tank", fire: change{"2026-09-14", "2025-11-01"}},
	{rule: "proof_due", about: "high_limit", grade: Note, base: "tank", quiet: change{"2026-09-14", "2025-11-01"}},
	{rule: "latch_lost", about: "high_limit", grade: Stop, base: "tank",
		fire:  change{tankLimitKept, tankLimitReplaced, "nonvolatile: true", "nonvolatile: false"},
		quiet: change{tankLimitKept, tankLimitReplaced}},
	{rule: "trips_dead_no_more", about: "high_limit", grade: Act, base: "tank", fire: change{tankLimitKept, tankLimitReplaced}},
	{rule: "first_start_armed", about: "high_limit", grade: Stop, base: "tank",
		fire: change{tankLimitKept, tankLimitReplaced}, given: figures{{"high_limit", "comes_up_tripped"}: 0},
		quiet: change{tankLimitKept, tankLimitReplaced}, givenQuiet: figures{{"high_limit", "comes_up_tripped"}: 1}},
	{rule: "trip_free_absent", about: "high_limit", grade: Act, base: "tank", fire: change{"trip_free: true", "trip_free: false"}},
	{rule: "reset_remote", about: "high_limit", grade: Act, base: "tank", fire: change{tankLimitKept, tankLimitReplaced}},
	{rule: "reset_by_power", about: "high_limit", grade: Act, base: "tank",
		fire: change{"reset: manual\n    trip_free: true", "reset: at_power_off"}},
	{rule: "self_powered_lost", about: "self_acting", grade: Act, base: "valve",
		quiet: change{"plan: replace\n    sensor: flow_probe", "plan: keep"}},
	{rule: "mercury_asbestos_refrigerant", about: "tank_stat", grade: Act, base: "tank",
		quiet: change{"element: rod_tube", "element: bimetal_strip"}},
	{rule: "current_no_longer_sensed", about: "tank_stat", grade: Act, base: "tank",
		fire: change{"element: rod_tube", "element: heated_bimetal"}},
	{rule: "dial_becomes_fixed", about: "tank_stat", grade: Act, base: "tank",
		fire: change{"tolerance: 3 K", "tolerance: 3 K\n    dial: [40 degC, 70 degC]"}},
	{rule: "anticipator_not_carried_over", about: "tank_stat", grade: Act, base: "tank",
		fire: change{"tolerance: 3 K", "tolerance: 3 K\n    anticipator: {rise: 1.5 K, lag: 3 min}"}},
	{rule: "stays_two_position", about: "tank_stat", grade: Act, base: "tank", fire: change{"plan: replace", "plan: replace\n    want: pid"}},
	{rule: "control_in_no_line", about: "tank_stat", grade: Act, base: "tank",
		fire: change{"runs_when: tank_stat and flow_proven", "runs_when: flow_proven"}},
	{rule: "kind_not_translated", about: "self_acting", grade: Stop, base: "valve",
		quiet: change{"plan: replace\n    sensor: flow_probe", "plan: keep"}},
	{rule: "refused_by_name", about: "tank_stat", grade: Stop, base: "tank",
		fire: change{"what: rod immersion stat in the top boss", "what: humidistat in the top boss"}},
	{rule: "indication_lost", about: "tank_stat", grade: Note, base: "tank",
		fire: change{"    action: breaks_on_rise\n    senses: point\n    set_point: 60 degC\n    marks: break\n    differential: 6 K\n", "    action: indicates\n",
			"    min_on: 30 s\n    min_off: 60 s\n    observed: {on: 16 min 8 s, off: 34 min 18 s, high: 60.3 degC, low: 53.9 degC}\n    match: thresholds\n", "",
			"runs_when: tank_stat and flow_proven", "runs_when: flow_proven"}},

	{rule: "probe_out_of_pocket", about: "tank_stat", grade: Act, base: "tank", fire: change{tankWorst, ""}},
	{rule: "moisture_direction", about: "room_probe", grade: Act, base: "cold",
		quiet: change{"kind: ntc", "kind: pt1000", "      r25: 10 kohm\n      r25_tolerance: 1 %\n      beta: 3435 K\n      beta_tolerance: 1 %\n", "      class: B\n      wires: 4\n",
			"    above: 8 degC", "    below: -8 degC"}},
	{rule: "moisture_direction", about: "exchanger_probe", grade: Act, base: "warm_air", quiet: change{"dangers:\n  - id: exchanger_hot\n    above: 130 degC", "dangers:\n  - id: exchanger_hot\n    below: -10 degC"}},
	{rule: "thermocouple_reversed_or_shorted", about: "tank_probe", grade: Act, base: "tank", fire: change{tankThermistor, tankThermocouple}},
	{rule: "probe_elsewhere", about: "tank_stat", grade: Act, base: "tank",
		fire: change{"      what: thermistor in the pocket of the old rod stat\n", ""}},
	{rule: "point_for_coldest_spot", about: "tank_stat", grade: Act, base: "tank", fire: change{"senses: point", "senses: coldest"}},
	{rule: "point_for_coldest_spot", about: "line_stat", grade: Stop, base: "frost", fire: change{"element: gas_bulb", "element: vapour_bulb\n    senses: coldest"}},
	{rule: "insulation_of_new_probe", about: "tank_probe", grade: Act, base: "tank",
		quiet: change{"      lag: 8 s\n", "      lag: 8 s\n      insulation: reinforced\n"}},
	{rule: "probe_in_hazardous_area", about: "tank_probe", grade: Stop, base: "tank",
		fire: change{"lag: 8 s\n      area: non_hazardous", "lag: 8 s\n      area: zone_1"}},
	{rule: "resolution", about: "tank_stat", grade: Act, base: "tank", given: countWidth(0.7), givenQuiet: countWidth(0.5)},
	{rule: "resolution", about: "tank_stat", grade: Stop, base: "tank", given: countWidth(3.1), givenQuiet: countWidth(0.5)},
	{rule: "limit_error_budget", about: "tank_stat", grade: Act, base: "tank", given: errorWorst(3.2), givenQuiet: errorWorst(2.9)},
	{rule: "reference_common_to_both", about: "heater", grade: Act, base: "tank",
		fire:  change{tankLimitKept, "    plan: replace\n    sensor: probe_two\n", "runs_when: tank_stat and flow_proven", tankBothReplaced, "  sensors:\n", secondProbe},
		quiet: change{tankLimitKept, tankLimitReplaced, "runs_when: tank_stat and flow_proven", tankBothReplaced}},

	{rule: "welded_output", about: "heater", grade: Act, base: "tank",
		fire:  change{"read_back: true", "read_back: false", "own_contactor", "unknown"},
		quiet: change{"read_back: true", "read_back: false"}},
	{rule: "ssr_shorts_on", about: "heater", grade: Act, base: "tank", fire: change{"kind: relay", "kind: ssr"}},
	{rule: "ssr_shorts_on", about: "heater", grade: Stop, base: "tank", fire: change{"kind: relay", "kind: triac", "own_contactor", "unknown"}},
	{rule: "leakage_holds_load", about: "heater", grade: Act, base: "tank",
		fire:  change{"kind: relay", "kind: ssr\n      leakage: 40 mA"},
		quiet: change{"kind: relay", "kind: ssr\n      leakage: 1 mA"}},
	{rule: "contact_life", about: "heater", grade: Act, base: "tank", given: contactYears(9.6), givenQuiet: contactYears(12)},
	{rule: "contact_life", about: "heater", grade: Act, base: "tank",
		given:      figures{{"heater", "years_to_endurance"}: 12, {"heater", "years_to_endurance_busiest"}: 8, {"heater", "operations_per_year"}: 8000},
		givenQuiet: figures{{"heater", "years_to_endurance"}: 12, {"heater", "years_to_endurance_busiest"}: 11, {"heater", "operations_per_year"}: 8000}},
	// The measured rise may count against a limit: 85 + 4 K tolerance + 8 K is past 95 degC.
	{rule: "limit_beyond_danger", about: "high_limit/boiling", grade: Stop, base: "tank",
		given: figures{{"high_limit", "overshoot_as_measured"}: 8}, givenQuiet: figures{{"high_limit", "overshoot_as_measured"}: 5}},
	{rule: "match_not_kept", about: "tank_stat", grade: Act, base: "tank",
		given: figures{{"tank_stat", "match_kept"}: 0}, givenQuiet: figures{{"tank_stat", "match_kept"}: 1}},
	{rule: "match_beyond_contact_life", about: "tank_stat", grade: Note, base: "tank",
		given: figures{{"tank_stat", "operations_over_budget"}: 1.03}, givenQuiet: figures{{"tank_stat", "operations_over_budget"}: 0.97}},
	{rule: "like_for_like_costs", about: "tank_stat", grade: Note, base: "tank",
		given:      figures{{"tank_stat", "operations_ratio"}: 1.6, {"tank_stat", "old_cycles_per_year"}: 48083, {"tank_stat", "cycles_per_year"}: 78121},
		givenQuiet: figures{{"tank_stat", "operations_ratio"}: 1.05, {"tank_stat", "old_cycles_per_year"}: 48083, {"tank_stat", "cycles_per_year"}: 50000}},
	{rule: "time_proportioning_eats_contacts", about: "heater", grade: Act, base: "tank",
		fire: change{"plan: replace", "plan: replace\n    want: pid"}, given: contactYears(3), givenQuiet: contactYears(3)},
	{rule: "time_proportioning_eats_contacts", about: "heater", grade: Stop, base: "tank",
		fire: change{"plan: replace", "plan: replace\n    want: pid"}, given: contactYears(0.1), givenQuiet: contactYears(0.1)},
	{rule: "compressor_short_cycle", about: "compressor", grade: Act, base: "cold", fire: change{"min_off: 5 min", "min_off: 2 min"}},
	{rule: "actuator_fail_position", about: "valve", grade: Stop, base: "valve", fire: change{"on_power_loss: closes", "on_power_loss: stays"}},
	{rule: "actuator_fail_position", about: "valve", grade: Act, base: "valve", fire: change{"on_power_loss: closes", "on_power_loss: opens"}},
	{rule: "scald_and_storage", about: "tank_stat", grade: Act, base: "tank",
		given:      figures{{"tank_stat", "low"}: 53.9, {"tank_stat", "high"}: 60.3},
		givenQuiet: figures{{"tank_stat", "low"}: 60, {"tank_stat", "high"}: 60}},
}
