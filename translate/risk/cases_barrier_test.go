package risk

const (
	tankLimitKept = `    plan: keep
    cuts: [heater]
    cuts_by: own_contactor
    shares: [pocket]
    read_by: limit_open
    last_proved: 2026-09-14
    prove_every: 12 months
`
	tankLimitReplaced = "    plan: replace\n    sensor: tank_probe\n"
	tankDanger        = `dangers:
  - id: boiling
    above: 95 degC
    for: 0 s
    what: boiling in a vented cylinder, scalding at the taps
    harm: serious
    exposure: seldom
    avoidance: scarcely
`
	tankWorst = "  worst: {settles_on: 150 degC, settles_off: 25 degC}\n"
	tankPump  = `loads:
  - {id: pump, what: primary pump, kind: pump, supply: 230 V, current: 1 A, safe_state: off, rest: off, runs_when: flow_proven, area: non_hazardous}
`
	frostLimit = `controls:
  - id: tape_limit
    what: limit on the tape
    duty: protective
    element: bimetal_disc
    action: breaks_on_rise
    breaks_at: 60 degC
    makes_at: 40 degC
    on_element_failure: breaks
    plan: add
    cuts: [tape]
    cuts_by: direct
`
	gasGuardKept = "    plan: keep\n    cuts: [gas]\n    cuts_by: own_valve\n    last_proved: 2026-05-04\n    prove_every: 12 months\n\nelectronics:"
)

// Sheets and their neighbours for the rules about what stands between the
// program and harm.
var barrierCases = []ruleCase{
	{rule: "danger_without_barrier", about: "boiling/heater", grade: Stop, base: "tank",
		fire: change{"    cuts: [heater]\n", ""}},
	{rule: "danger_without_barrier", about: "boiling/heater", grade: Act, base: "tank",
		fire: change{"    cuts: [heater]\n", "", "harm: serious", "harm: slight"}},
	{rule: "danger_without_barrier", about: "freezing/tape", grade: Act, base: "frost",
		quiet: change{"worst: {settles_on: 22 degC, settles_off: -15 degC}", "worst: {settles_on: 22 degC, settles_off: 3 degC}"}},
	{rule: "danger_without_barrier", about: "freezing/tape", grade: Stop, base: "frost",
		fire:  change{"rest: on", "rest: off"},
		quiet: change{"worst: {settles_on: 22 degC, settles_off: -15 degC}", "worst: {settles_on: 22 degC, settles_off: 3 degC}"}},
	{rule: "danger_without_barrier", about: "unburnt_gas/gas", grade: Stop, base: "gas",
		fire: change{gasGuardKept, "    plan: keep\n\nelectronics:"}},
	{rule: "duty_understated", about: "high_limit", grade: Stop, base: "tank",
		fire: change{"duty: protective", "duty: operating"}},
	{rule: "duty_understated", about: "tank_stat", grade: Stop, base: "tank",
		fire: change{"- id: high_limit\n    what: capillary limit in the same boss, manual reset\n    duty: protective\n    element: liquid_bulb\n    action: breaks_on_rise",
			"- id: high_limit\n    what: low alarm\n    duty: protective\n    element: liquid_bulb\n    action: makes_on_rise",
			"breaks_at: 85 degC\n    makes_at: 70 degC", "breaks_at: 20 degC\n    makes_at: 25 degC"}},
	{rule: "same_final_element", about: "high_limit", grade: Stop, base: "tank",
		fire: change{"own_contactor", "same_coil"}},
	{rule: "same_final_element", about: "high_limit", grade: Act, base: "tank",
		fire: change{"own_contactor", "same_coil", "avoidance: scarcely", "avoidance: possible"}},
	{rule: "limit_shares_sensor", about: "high_limit", grade: Stop, base: "tank",
		fire: change{"shares: [pocket]", "shares: [sensor]"}},
	{rule: "limit_shares_converter", about: "high_limit", grade: Stop, base: "tank",
		fire: change{"shares: [pocket]", "shares: [converter]"}},
	{rule: "limit_shares_pocket", about: "high_limit", grade: Act, base: "tank",
		quiet: change{"shares: [pocket]", "shares: []"}},
	{rule: "limit_shares_supply", about: "high_limit", grade: Note, base: "tank",
		fire: change{"shares: [pocket]", "shares: [supply]"}},
	{rule: "limit_shares_supply", about: "high_limit", grade: Act, base: "tank",
		fire: change{"shares: [pocket]", "shares: [supply]", "rest: off", "rest: on"}},
	{rule: "limit_beyond_danger", about: "high_limit/boiling", grade: Stop, base: "tank",
		fire: change{"breaks_at: 85 degC", "breaks_at: 92 degC"}, quiet: change{"breaks_at: 85 degC", "breaks_at: 90 degC"}},
	{rule: "limit_beyond_danger", about: "high_limit/boiling", grade: Stop, base: "tank",
		given: figures{{"high_limit", OvershootAfterCut}: 7}, givenQuiet: figures{{"high_limit", OvershootAfterCut}: 5}},
	{rule: "limit_trips_late", about: "high_limit/boiling", grade: Act, base: "tank",
		fire: change{"breaks_at: 85 degC", "breaks_at: 92 degC", "harm: serious", "harm: slight"}, quiet: change{"harm: serious", "harm: slight"}},
	{rule: "limit_nuisance", about: "high_limit/boiling", grade: Act, base: "tank",
		given: figures{{"tank_stat", "high"}: 76}, givenQuiet: figures{{"tank_stat", "high"}: 60.3}},
	{rule: "overshoot_not_determined", about: "high_limit/boiling", grade: Act, base: "tank",
		givenQuiet: figures{{"high_limit", OvershootAfterCut}: 2}},
	{rule: "no_danger_stated", about: "cal2", grade: Act, base: "tank", fire: change{tankDanger, ""}},
	{rule: "no_danger_stated", about: "cal2", grade: Stop, base: "tank",
		fire: change{tankDanger, "", "plan: keep", "plan: renew"}, quiet: change{"plan: keep", "plan: renew"}},
	{rule: "danger_not_judged", about: "flood", grade: Act, base: "tank",
		fire: change{"dangers:\n", "dangers:\n  - {id: flood, when: limit_open and not flow_proven, what: no flow, harm: slight}\n"}},
	{rule: "load_effect_unknown", about: "pump", grade: Act, base: "tank",
		fire: change{"loads:\n", tankPump}, quiet: change{"loads:\n", tankPump, "driven_by: heater", "driven_by: [heater, pump]"}},
	{rule: "danger_words_assumed", about: "boiling", grade: Note, base: "tank",
		fire: change{"    exposure: seldom\n", ""}},
	{rule: "frost_load_safe_on", about: "tape", grade: Act, base: "frost", quiet: change{"controls:\n", frostLimit}},
	{rule: "safe_on_but_rests_off", about: "tape", grade: Stop, base: "frost", fire: change{"rest: on", "rest: off"}},
	{rule: "safe_on_but_rests_off", about: "fan", grade: Act, base: "warm_air", fire: change{"rest: on", "rest: off"}},
	{rule: "pl_not_reachable", about: "boiling", grade: Act, base: "tank", fire: change{"    cuts: [heater]\n", ""}},
	{rule: "cut_path_unknown", about: "high_limit", grade: Act, base: "tank", fire: change{"own_contactor", "unknown"}},
	{rule: "limit_threshold_unknown", about: "high_limit", grade: Act, base: "tank",
		fire: change{"    breaks_at: 85 degC\n    makes_at: 70 degC\n", "    breaks_at: unknown\n    makes_at: unknown\n"}},
	{rule: "limit_trip_unseen", about: "high_limit", grade: Note, base: "tank", fire: change{"    read_by: limit_open\n", ""}},
	{rule: "earth_fault_bypasses_limit", about: "cal2", grade: Act, base: "tank", quiet: change{tankLimitKept, tankLimitReplaced}},
	{rule: "gas_relit_without_flame", about: "gas", grade: Stop, base: "gas", fire: change{"standing_pilot", "none"}},
	{rule: "gas_relit_without_flame", about: "gas", grade: Stop, base: "gas", fire: change{"lit_by: standing_pilot", "lit_by: standing_pilot\n    low_fire: 20 %"}},
	{rule: "gas_relit_without_flame", about: "gas", grade: Stop, base: "gas", fire: change{"standing_pilot", "each_start"},
		quiet: change{"standing_pilot", "each_start", gasGuardKept, "    plan: renew\n    cuts: [gas]\n    cuts_by: own_valve\n\nelectronics:"}},
	{rule: "gas_valve_driven_direct", about: "gas", grade: Stop, base: "gas", fire: change{gasGuardKept, "    plan: keep\n\nelectronics:"}},
}
