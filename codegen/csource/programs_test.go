package csource_test

import (
	"testing"

	"makebreak/codegen/csource"
	"makebreak/translate/logic"
)

// Programs that use every part of logic between them.

func number(name string, lo, hi int64) *logic.Var {
	return &logic.Var{Name: name, What: "number " + name, Kind: logic.Int, Range: logic.Range{Lo: lo, Hi: hi}, Start: max(lo, min(0, hi))}
}

func truth(name string) *logic.Var {
	return &logic.Var{Name: name, What: "truth " + name, Kind: logic.Bool, Range: logic.Truth}
}

func states(name, what string, start int64, words ...string) *logic.Var {
	e := &logic.Enum{}
	for _, word := range words {
		e.Words = append(e.Words, logic.EnumWord{Name: word, What: "is " + word})
	}
	return &logic.Var{Name: name, What: what, Kind: logic.Word, Enum: e, Range: logic.Range{Lo: 0, Hi: int64(len(words)) - 1}, Start: start}
}

func steps(name string, n int64, means, origin string) *logic.Const {
	return &logic.Const{Name: name, Value: n, Unit: "steps", Means: means, Origin: origin, Working: means + " / 250 ms"}
}

func counts(name string, n int64, means, origin string) *logic.Const {
	return &logic.Const{Name: name, Value: n, Unit: "counts", Means: means, Origin: origin}
}

func goes(to int, why string, when *logic.Expr, do ...*logic.Set) *logic.Transition {
	return &logic.Transition{To: to, Why: why, When: when, Do: do}
}

// waterHeater is a rod stat with minimum times and a limit with a manual
// reset: the function of a two-position control as it is mostly met.
func waterHeater() *logic.Program {
	lowest := counts("PROBE_LOWEST", 81, "about 150 degC, a short beyond it", "electronics.sensors[0].valid")
	highest := counts("PROBE_HIGHEST", 4019, "about -44 degC, a broken wire beyond it", "electronics.sensors[0].valid")
	settled := steps("PROBE_SETTLED", 2, "500 ms", "assumed for electronics.sensors[0].fault_after: common practice")
	trips := counts("HIGH_LIMIT_BREAK", 404, "85 degC", "controls[1].set_point")
	rearm := counts("HIGH_LIMIT_REARM", 609, "70 degC", "controls[1].reset_below")
	made := counts("TANK_STAT_MAKE", 894, "58.5 degC", "controls[0].set_point")
	opens := counts("TANK_STAT_BREAK", 806, "61.5 degC", "controls[0].set_point")
	minOn := steps("HEATER_MIN_ON", 120, "30 s", "controls[0].min_on")
	minOff := steps("HEATER_MIN_OFF", 240, "60 s", "controls[0].min_off")

	probe := &logic.Var{Name: "tank_probe", What: "thermistor in the pocket of the old stat, raw counts", Kind: logic.Int, Range: logic.Count}
	reset := truth("high_limit_reset")
	reset.What = "reset button of the limit, true while pressed"

	good := truth("probe_good")
	good.What = "the probe has been proved"
	since := number("probe_since", 0, 2)
	since.What = "samples in a row that say otherwise"
	limit := states("high_limit", "capillary limit: latched cut-out", 1, "closed", "tripped")
	limit.Survives = true
	before := truth("reset_before")
	before.What, before.Start = "the button as it was; one that is held is no edge", 1
	heater := states("heater", "9 kW immersion heater", 0, "off", "on")
	age := number("heater_for", 0, 240)
	age.What = "steps since it last switched"

	bad := truth("probe_bad")
	bad.What = "this sample cannot be believed"
	on, fault := truth("heater"), number("fault", 0, 65535)
	on.What, fault.What = "9 kW immersion heater", "0: none; one bit for each fault"

	is, use, prev, c := logic.Is, logic.Use, logic.Prev, logic.C
	fit := logic.And(logic.Not(use(bad)), use(good))
	return &logic.Program{
		ID: "tank1", Title: "Tank 1", StepMS: 250,
		Consts:  []*logic.Const{lowest, highest, settled, trips, rearm, made, opens, minOn, minOff},
		Inputs:  []*logic.Var{probe, reset},
		State:   []*logic.Var{good, since, limit, before, heater, age},
		Outputs: []*logic.Var{on, fault},
		Order: []logic.Block{
			&logic.Define{Var: bad, As: logic.Or(logic.Lt(use(probe), c(lowest)), logic.Gt(use(probe), c(highest)))},
			&logic.Timer{Var: since, Limit: settled, Restart: logic.Ne(use(bad), prev(good)), Why: "as it was"},
			&logic.Set{Var: good, When: logic.Ge(use(since), c(settled)), To: logic.Not(use(bad)), Why: "has been so for long enough"},
			&logic.Machine{Var: limit, What: limit.What, Safe: 1, At: []*logic.State{
				{Is: 0, Goes: []*logic.Transition{
					goes(1, "too hot", logic.And(logic.Not(use(bad)), logic.Le(use(probe), c(trips)))),
				}},
				{Is: 1, Goes: []*logic.Transition{
					goes(0, "button newly pressed, and cool enough", logic.And(use(reset), logic.Not(prev(before)), fit, logic.Ge(use(probe), c(rearm)))),
				}},
			}},
			&logic.Set{Var: before, To: use(reset)},
			&logic.Machine{Var: heater, What: heater.What, Timer: age, Limit: minOff, Safe: 0, At: []*logic.State{
				{Is: 0, Goes: []*logic.Transition{
					goes(1, "cold", logic.And(is(limit, 0), use(good), logic.Ge(use(probe), c(made)), logic.Ge(use(age), c(minOff)))),
				}},
				{Is: 1, Goes: []*logic.Transition{
					goes(0, "safety comes before the minimum on time", logic.Or(is(limit, 1), logic.Not(use(good)))),
					goes(0, "warm", logic.And(logic.Le(use(probe), c(opens)), logic.Ge(use(age), c(minOn)))),
				}},
			}},
			&logic.Define{Var: on, As: is(heater, 1)},
			&logic.Flags{Out: fault, Bits: []logic.Flag{
				{Name: "tank_probe", What: "probe not believed", When: logic.Not(use(good))},
				{Name: "high_limit", What: "limit has tripped", When: is(limit, 1)},
			}},
		},
	}
}

func waterHeaterFacts() csource.Facts {
	return csource.Facts{
		Title: "Tank 1, laundry", Site: "Harbour Lane", Sheet: "sheet.yaml", Hash: "0123456789abcdef", Version: "0.0.0",
		Replaces: []string{"tank_stat: rod stat", "high_limit: capillary limit, manual reset"},
		Stays:    []string{"second_limit: in a pocket of its own, cuts the contactor"},
		Cautions: []string{"Independent hardware limits stay in place, hard-wired."},
		Loads:    []csource.Load{{Name: "heater", What: "9 kW immersion heater", Rest: "off", SafeState: "off"}},
		Sensors:  []csource.Sensor{{Name: "tank_probe", What: "thermistor", Bits: 12}},
		Watchdog: "external", Nonvolatile: true,
	}
}

// numbers uses every operation, on counts, signed readings and numbers that
// need 32 bits, and remembers one variable of each type.
func numbers() *logic.Program {
	count, other := number("count", 0, 65535), number("other", 0, 65535)
	degrees := number("degrees", -32768, 32767)
	degrees.Signed = true
	up, down := truth("up"), truth("down")
	curve := &logic.Table{Name: "curve", What: "counts to tenths of a degree", Unit: "0.1 degC", Working: "thermistor",
		X: []int64{80, 400, 1200, 2900, 4020}, Y: []int64{1501, 851, 462, 63, -439}}
	wide := &logic.Table{Name: "wide", What: "tenths to power", X: []int64{-40000, 0, 40000}, Y: []int64{0, 50000, 35000}}

	small, large := number("small", -100, 100), number("large", 0, 1_000_000)
	middle, deep := number("middle", -30000, 30000), number("deep", -2_000_000_000, 2_000_000_000)
	steady := number("steady", 0, 65535)
	flag, mode := truth("flag"), states("mode", "which way it goes", 1, "low", "middle", "high")
	for _, v := range []*logic.Var{small, large, middle, deep, steady, flag, mode} {
		v.Survives = true
	}
	since := number("since", 0, 70000)
	long := &logic.Const{Name: "LONG", Value: 70000, Unit: "steps", Means: "more than 16 bits", Origin: "test"}
	cold := &logic.Const{Name: "COLD", Value: -250, Unit: "0.1 degC", Means: "-25 degC", Origin: "test"}
	warm := &logic.Const{Name: "WARM", Value: 600, Unit: "0.1 degC", Means: "60 degC", Origin: "test"}
	gain := &logic.Const{Name: "GAIN", Value: 31, Unit: "1", Means: "31", Origin: "test"}

	temperature := number("temperature", -439, 1501)
	narrowSum := number("narrow_sum", -32768, 32767)
	power := number("power", 0, 50000)
	next := &logic.Var{Name: "next", What: "where it would go", Kind: logic.Word, Enum: mode.Enum, Range: mode.Range}
	valve := number("valve", 0, 1000)
	offset := number("offset", -50, 50)
	direction := &logic.Var{Name: "direction", What: "which way it goes", Kind: logic.Word, Enum: mode.Enum, Range: mode.Range}
	alarms := number("alarms", 0, 65535)

	use, prev, lit, c := logic.Use, logic.Prev, logic.Lit, logic.C
	return &logic.Program{
		ID: "num", Title: "Numbers", StepMS: 100,
		Consts:  []*logic.Const{long, cold, warm, gain},
		Tables:  []*logic.Table{curve, wide},
		Inputs:  []*logic.Var{count, other, degrees, up, down},
		State:   []*logic.Var{small, large, middle, deep, steady, flag, mode, since},
		Outputs: []*logic.Var{valve, offset, direction, alarms},
		Order: []logic.Block{
			&logic.Define{Var: temperature, As: logic.Lookup(curve, use(count))},
			&logic.Define{Var: power, As: logic.Lookup(wide, logic.Add(use(degrees), use(temperature)))},
			&logic.Define{Var: narrowSum, As: logic.Add(logic.Mul(logic.Clamp(use(degrees), lit(-100), lit(100)), c(gain)), use(temperature))},
			&logic.Set{Var: small, To: logic.Clamp(logic.Add(prev(small), logic.Select(use(up), lit(3), lit(-2))), lit(-100), lit(100))},
			&logic.Set{Var: large, When: logic.Ne(use(up), use(down)),
				To: logic.Div(logic.Mul(use(count), logic.Clamp(use(other), lit(1), lit(30000))), lit(2000))},
			&logic.Set{Var: middle, To: logic.Toward(prev(middle), logic.Clamp(use(degrees), lit(-30000), lit(30000)), lit(7))},
			&logic.Set{Var: deep, To: logic.Sub(logic.Mul(use(degrees), lit(60000)), use(power))},
			&logic.Set{Var: steady, To: logic.Clamp(use(count), prev(steady), use(other))},
			&logic.Set{Var: flag, When: logic.Or(logic.Gt(use(degrees), c(warm)), logic.Lt(use(narrowSum), c(cold))), To: logic.Not(prev(flag))},
			&logic.Timer{Var: since, Limit: long, Restart: logic.And(use(up), use(down)), Hold: logic.Or(use(flag), logic.Lt(use(small), lit(-90))), Why: "both at once"},
			&logic.Define{Var: next, As: logic.Select(logic.Ge(use(small), lit(50)), logic.StateOf(mode.Enum, 2),
				logic.Select(use(down), logic.StateOf(mode.Enum, 0), prev(mode)))},
			&logic.Machine{Var: mode, What: mode.What, Safe: 1, At: []*logic.State{
				{Is: 0, Goes: []*logic.Transition{goes(1, "never left low", logic.False()), goes(2, "asked for high", logic.Eq(use(next), logic.StateOf(mode.Enum, 2)))}},
				{Is: 1, Goes: []*logic.Transition{goes(0, "asked for something else", logic.Ne(use(next), prev(mode)))}},
				{Is: 2, Goes: []*logic.Transition{goes(1, "warm enough", logic.Ge(logic.Mul(use(temperature), use(temperature)), lit(90000))), goes(1, "at any rate", nil)}},
			}},
			&logic.Define{Var: valve, As: logic.Clamp(logic.Div(use(power), lit(40)), lit(0), lit(1000))},
			&logic.Define{Var: offset, As: logic.Div(use(small), lit(2))},
			&logic.Define{Var: direction, As: use(mode)},
			&logic.Flags{Out: alarms, Bits: []logic.Flag{
				{Name: "far", What: "large", When: logic.Gt(use(large), lit(500_000))},
				{Name: "odd", What: "differs", When: logic.Eq(logic.Lt(use(middle), use(small)), use(flag))},
				{Name: "deep", What: "deep", When: logic.Lt(logic.Toward(use(deep), use(power), lit(3)), lit(-1_000_000))},
				{Name: "late", What: "late", When: logic.Ge(use(since), c(long))},
			}},
		},
	}
}

// bare has no state and no input; keywords has names that C has other uses for.
func bare() *logic.Program {
	lamp := truth("lamp")
	return &logic.Program{ID: "bare", StepMS: 70000, Outputs: []*logic.Var{lamp}, Order: []logic.Block{&logic.Define{Var: lamp, As: logic.True()}}}
}

func mute() *logic.Program {
	door, open := truth("door"), truth("open")
	return &logic.Program{ID: "mute", StepMS: 10, Inputs: []*logic.Var{door}, State: []*logic.Var{open}, Order: []logic.Block{&logic.Set{Var: open, To: logic.Use(door)}}}
}

func keywords() *logic.Program {
	in, wait := truth("switch"), number("wait", 0, 65535)
	step := states("step", "called as the function is", 0, "ms", "on")
	out := states("out", "called as a struct is", 0, "a", "b")
	check := truth("check")
	check.Survives = true
	m := truth("m")
	register := truth("register")
	fault := number("fault", 0, 65535)
	clash := counts("OUT_A", 7, "called as a state is", "test")
	h := counts("H", 8, "called as the guard is", "test")
	lamp := truth("double")
	return &logic.Program{
		ID: "key", StepMS: 10, Consts: []*logic.Const{clash, h},
		Inputs: []*logic.Var{in, wait}, State: []*logic.Var{step, out, check}, Outputs: []*logic.Var{lamp, fault},
		Order: []logic.Block{
			&logic.Define{Var: m, As: logic.Gt(logic.Use(wait), logic.C(clash))},
			&logic.Define{Var: register, As: logic.And(logic.Use(m), logic.Use(in))},
			&logic.Machine{Var: step, At: []*logic.State{
				{Is: 0, Goes: []*logic.Transition{goes(1, "", logic.Use(register))}},
				{Is: 1, Goes: []*logic.Transition{goes(0, "", logic.Lt(logic.Use(wait), logic.C(h)))}},
			}},
			&logic.Machine{Var: out, At: []*logic.State{
				{Is: 0, Goes: []*logic.Transition{goes(1, "", logic.And(logic.Is(step, 1), logic.Use(m)))}},
				{Is: 1, Goes: []*logic.Transition{goes(0, "", logic.Not(logic.Use(register)))}},
			}},
			&logic.Set{Var: check, To: logic.Is(out, 1)},
			&logic.Define{Var: lamp, As: logic.Use(check)},
			&logic.Flags{Out: fault, Bits: []logic.Flag{{Name: "register", What: "", When: logic.Use(register)}}},
		},
	}
}

func checked(t testing.TB, p *logic.Program) *logic.Checked {
	t.Helper()
	c, err := logic.Check(p)
	if err != nil {
		t.Fatal(err)
	}
	return c
}

// sources are the programs of this file.
func sources(t testing.TB) []csource.Source {
	t.Helper()
	var all []csource.Source
	for _, p := range []*logic.Program{waterHeater(), numbers(), bare(), mute(), keywords()} {
		f := csource.Facts{}
		if p.ID == "tank1" {
			f = waterHeaterFacts()
		}
		all = append(all, csource.Source{Program: checked(t, p), Facts: f})
	}
	return all
}
