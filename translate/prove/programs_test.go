package prove

import (
	"testing"

	"makebreak/translate/logic"
)

// The programs of these tests are written by hand in the way in which sheets
// are translated, so that they stand still while the translation grows.

func number(name string, lo, hi, start int64) *logic.Var {
	return &logic.Var{Name: name, What: name, Kind: logic.Int, Range: logic.Range{Lo: lo, Hi: hi}, Start: start}
}

func truth(name string, start int64) *logic.Var {
	return &logic.Var{Name: name, What: name, Kind: logic.Bool, Range: logic.Truth, Start: start}
}

func machine(name string, start int64, words ...string) *logic.Var {
	e := &logic.Enum{}
	for _, w := range words {
		e.Words = append(e.Words, logic.EnumWord{Name: w, What: w})
	}
	return &logic.Var{Name: name, What: name, Kind: logic.Word, Enum: e, Range: logic.Range{Lo: 0, Hi: int64(len(words)) - 1}, Start: start}
}

func constant(p *logic.Program, name string, v int64) *logic.Const {
	c := &logic.Const{Name: name, Value: v, Unit: "steps", Origin: "test"}
	p.Consts = append(p.Consts, c)
	return c
}

func stepCounter(p *logic.Program, name string, limit *logic.Const, start int64) *logic.Var {
	v := number(name, 0, limit.Value, start)
	p.State = append(p.State, v)
	return v
}

func way(to int, when *logic.Expr, why string) *logic.Transition {
	return &logic.Transition{To: to, When: when, Why: why}
}

func at(is int, ways ...*logic.Transition) *logic.State { return &logic.State{Is: is, Goes: ways} }

func checked(t testing.TB, p *logic.Program) *logic.Checked {
	t.Helper()
	c, err := logic.Check(p)
	if err != nil {
		t.Fatal(err)
	}
	return c
}

const (
	proving = iota
	good
	suspicious
	faulty
)

// probe is a sensor with a count of bad samples that goes up and down, a state
// of belief and the median of three samples.
type probe struct {
	state, value *logic.Var
}

func addProbe(p *logic.Program, id string, lowest, highest, suspectAt, faultAt, proveFor int64) probe {
	C, Use, Prev := logic.C, logic.Use, logic.Prev
	raw := number(id, 0, 65535, 0)
	p.Inputs = append(p.Inputs, raw)
	low, high := constant(p, up(id)+"_LOWEST", lowest), constant(p, up(id)+"_HIGHEST", highest)
	suspect, fault, prove := constant(p, up(id)+"_SUSPECT", suspectAt), constant(p, up(id)+"_FAULT", faultAt), constant(p, up(id)+"_PROVE", proveFor)
	weight := constant(p, up(id)+"_BAD_WEIGHT", 2)

	bad := truth(id+"_bad", 0)
	doubts := number(id+"_doubts", 0, faultAt, 0)
	goodFor := stepCounter(p, id+"_good_for", prove, 0)
	state := machine(id+"_state", proving, "proving", "good", "suspicious", "faulty")
	last, before := number(id+"_last", 0, 65535, 0), number(id+"_before", 0, 65535, 0)
	p.State = append(p.State, doubts, state, last, before)
	now, less, more, value := number(id+"_now", 0, 65535, 0), number(id+"_less", 0, 65535, 0), number(id+"_more", 0, 65535, 0), number(id+"_counts", 0, 65535, 0)
	falling := logic.Lt(Prev(last), Prev(before))
	p.Order = append(p.Order,
		&logic.Define{Var: bad, As: logic.Or(logic.Lt(Use(raw), C(low)), logic.Gt(Use(raw), C(high)))},
		&logic.Set{Var: doubts, To: logic.Clamp(logic.Select(Use(bad), logic.Add(Prev(doubts), C(weight)), logic.Sub(Prev(doubts), logic.Lit(1))), logic.Lit(0), C(fault)), Why: "bad samples count up, good ones down"},
		&logic.Timer{Var: goodFor, Limit: prove, Restart: Use(bad)},
		&logic.Machine{Var: state, Safe: faulty, At: []*logic.State{
			at(proving, way(good, logic.Ge(Use(goodFor), C(prove)), "proved itself"), way(faulty, logic.Ge(Use(doubts), C(fault)), "too many bad samples")),
			at(good, way(suspicious, logic.Ge(Use(doubts), C(suspect)), "bad samples")),
			at(suspicious, way(faulty, logic.Ge(Use(doubts), C(fault)), "too many bad samples"), way(good, logic.Eq(Use(doubts), logic.Lit(0)), "all forgotten")),
			at(faulty, way(good, logic.And(logic.Eq(Use(doubts), logic.Lit(0)), logic.Ge(Use(goodFor), C(prove))), "good for long enough")),
		}},
		&logic.Define{Var: now, As: logic.Select(Use(bad), Prev(last), Use(raw))},
		&logic.Define{Var: less, As: logic.Select(falling, Prev(last), Prev(before))},
		&logic.Define{Var: more, As: logic.Select(falling, Prev(before), Prev(last))},
		&logic.Define{Var: value, As: logic.Clamp(Use(now), Use(less), Use(more))},
		&logic.Set{Var: before, To: Prev(last)},
		&logic.Set{Var: last, To: Use(now)},
	)
	return probe{state, value}
}

func up(s string) string {
	b := []byte(s)
	for i := range b {
		if 'a' <= b[i] && b[i] <= 'z' {
			b[i] -= 'a' - 'A'
		}
	}
	return string(b)
}

// calorifier is a tank with an operating stat, a latched limit with a reset
// button, minimum on and off times, a flow signal and a fault word. Hot is a
// low count.
func calorifier(minOn, minOff int64) *logic.Program {
	C, Use, Prev, And, Not := logic.C, logic.Use, logic.Prev, logic.And, logic.Not
	p := &logic.Program{ID: "cal", Title: "calorifier", StepMS: 250}
	tank := addProbe(p, "tank", 81, 4019, 4, 12, 8)
	flow, button := truth("flow_proven", 0), truth("limit_reset", 0)
	p.Inputs = append(p.Inputs, flow, button)
	makeAt, breakAt := constant(p, "STAT_MAKE", 1502), constant(p, "STAT_BREAK", 1251)
	trip, rearm := constant(p, "LIMIT_TRIP", 610), constant(p, "LIMIT_REARM", 980)
	on, off := constant(p, "HEATER_MIN_ON", minOn), constant(p, "HEATER_MIN_OFF", minOff)
	longer := on
	if off.Value > on.Value {
		longer = off
	}

	stat := machine("stat", 0, "open", "made")
	limit := machine("limit", 0, "tripped", "closed")
	limit.Survives = true
	was, edge := truth("reset_was", 1), truth("reset_now", 0)
	heater := machine("heater_state", 0, "off", "on")
	p.State = append(p.State, stat, limit, was, heater)
	heaterFor := stepCounter(p, "heater_for", longer, 0)
	wanted, out := truth("wanted", 0), truth("heater", 0)
	fault := number("fault", 0, 65535, 0)
	p.Outputs = append(p.Outputs, out, fault)

	failed := logic.Or(logic.Is(tank.state, proving), logic.Is(tank.state, faulty))
	p.Order = append(p.Order,
		&logic.Machine{Var: stat, Safe: 0, At: []*logic.State{
			at(0, way(1, And(logic.Is(tank.state, good), logic.Ge(Use(tank.value), C(makeAt))), "cold")),
			at(1, way(0, logic.Or(failed, logic.Le(Use(tank.value), C(breakAt))), "warm, or not to be believed")),
		}},
		&logic.Define{Var: edge, As: And(Use(button), Not(Prev(was)))},
		&logic.Set{Var: was, To: Use(button)},
		&logic.Machine{Var: limit, Safe: 0, At: []*logic.State{
			at(0, way(1, And(Use(edge), logic.Is(tank.state, good), logic.Ge(Use(tank.value), C(rearm))), "reset")),
			at(1, way(0, And(logic.Is(tank.state, good), logic.Le(Use(tank.value), C(trip))), "too hot"), way(0, logic.Is(tank.state, faulty), "not to be believed")),
		}},
		&logic.Define{Var: wanted, As: And(logic.Is(stat, 1), Use(flow))},
		&logic.Machine{Var: heater, Timer: heaterFor, Limit: longer, Safe: 0, At: []*logic.State{
			at(0, way(1, And(Use(wanted), logic.Is(limit, 1), logic.Is(tank.state, good), logic.Ge(Use(heaterFor), C(off))), "called for")),
			at(1,
				way(0, logic.Or(logic.Is(limit, 0), Not(Use(flow))), "protection comes before the minimum on time"),
				way(0, And(Not(Use(wanted)), logic.Ge(Use(heaterFor), C(on))), "no longer called for")),
		}},
		&logic.Define{Var: out, As: logic.Is(heater, 1)},
		&logic.Flags{Out: fault, Bits: []logic.Flag{
			{Name: "tank_suspicious", When: logic.Is(tank.state, suspicious)},
			{Name: "tank_faulty", When: logic.Is(tank.state, faulty)},
			{Name: "limit_tripped", When: logic.Is(limit, 0)},
		}},
	)
	p.Never = []*logic.Property{
		{Name: "hot_while_tripped", Bad: And(Use(out), logic.Is(limit, 0))},
		{Name: "hot_without_flow", Bad: And(Use(out), Not(Use(flow)))},
		{Name: "hot_on_a_bad_probe", Bad: And(Use(out), logic.Is(tank.state, faulty))},
	}
	return p
}

// ovens is two probes, each with its stat, one load, a limit that resets
// itself, and a pulsed drive.
func oven() *logic.Program {
	C, Use, Prev, And, Not := logic.C, logic.Use, logic.Prev, logic.And, logic.Not
	p := &logic.Program{ID: "oven", Title: "oven", StepMS: 500}
	chamber := addProbe(p, "chamber", 20, 1000, 2, 6, 3)
	flue := addProbe(p, "flue", 30, 990, 2, 8, 4)
	makeAt, breakAt, high := constant(p, "OVEN_MAKE", 300), constant(p, "OVEN_BREAK", 320), constant(p, "FLUE_HIGH", 700)
	off := constant(p, "MIN_OFF", 1200)
	stat, heat := machine("stat", 0, "open", "made"), machine("elements_state", 0, "off", "on")
	pulse := truth("pulse", 0)
	p.State = append(p.State, stat, heat, pulse)
	offFor := stepCounter(p, "elements_for", off, 0)
	out, drive := truth("elements", 0), truth("elements_drive", 0)
	p.Outputs = append(p.Outputs, out, drive)
	cool := And(logic.Is(flue.state, good), logic.Lt(Use(flue.value), C(high)))
	p.Order = append(p.Order,
		&logic.Machine{Var: stat, Safe: 0, At: []*logic.State{
			at(0, way(1, And(logic.Is(chamber.state, good), logic.Le(Use(chamber.value), C(makeAt))), "cold")),
			at(1, way(0, logic.Or(Not(logic.Is(chamber.state, good)), logic.Ge(Use(chamber.value), C(breakAt))), "warm")),
		}},
		&logic.Machine{Var: heat, Timer: offFor, Limit: off, Safe: 0, At: []*logic.State{
			at(0, way(1, And(logic.Is(stat, 1), cool, logic.Ge(Use(offFor), C(off))), "called for")),
			at(1, way(0, logic.Or(logic.Is(stat, 0), Not(cool)), "warm, or the flue is hot")),
		}},
		&logic.Define{Var: out, As: logic.Is(heat, 1)},
		&logic.Define{Var: drive, As: And(Use(out), Not(Prev(pulse)))},
		&logic.Set{Var: pulse, To: Use(drive)},
	)
	return p
}

// defroster is a clock that runs once in a period, remembers its place in
// parts, and is ended early by a warm coil.
func defroster(every, lasts int64) *logic.Program {
	C, Use, Prev := logic.C, logic.Use, logic.Prev
	p := &logic.Program{ID: "frost", Title: "defrost clock", StepMS: 500}
	warm := truth("coil_warm", 0)
	p.Inputs = append(p.Inputs, warm)
	last, length, part := constant(p, "LAST_STEP", every-1), constant(p, "LASTS", lasts), constant(p, "PART", every/16)
	place := number("place", 0, every, 0)
	kept := number("kept", 0, every/(every/16), 0)
	kept.Survives = true
	awake := truth("awake", 0)
	clock := machine("clock", 0, "idle", "running")
	p.State = append(p.State, place, kept, awake, clock)
	out := truth("defrost", 0)
	p.Outputs = append(p.Outputs, out)
	next := logic.Select(logic.Ge(Prev(place), C(last)), logic.Lit(0), logic.Add(Prev(place), logic.Lit(1)))
	p.Order = append(p.Order,
		&logic.Set{Var: place, To: logic.Clamp(logic.Select(Prev(awake), next, logic.Mul(Prev(kept), C(part))), logic.Lit(0), C(last))},
		&logic.Machine{Var: clock, Safe: 0, At: []*logic.State{
			at(0, way(1, logic.Eq(Use(place), logic.Lit(0)), "its time has come")),
			at(1, way(0, logic.Or(logic.Ge(Use(place), C(length)), Use(warm)), "has run its time, or was ended")),
		}},
		&logic.Set{Var: kept, To: logic.Div(Use(place), C(part))},
		&logic.Set{Var: awake, To: logic.True()},
		&logic.Define{Var: out, As: logic.Is(clock, 1)},
	)
	return p
}

// valve does arithmetic: a table, a lag, a proportional band with hysteresis.
func valve() *logic.Program {
	C, Use, Prev := logic.C, logic.Use, logic.Prev
	p := &logic.Program{ID: "valve", Title: "modulating valve", StepMS: 1000}
	raw := number("water", 0, 65535, 0)
	p.Inputs = append(p.Inputs, raw)
	table := &logic.Table{Name: "WATER_TABLE", X: []int64{100, 400, 700, 1000}, Y: []int64{1100, 700, 450, 0}, Unit: "0.1 degC"}
	p.Tables = append(p.Tables, table)
	start, band, lag, dead := constant(p, "STARTS_AT", 500), constant(p, "BAND", 200), constant(p, "LAG", 4), constant(p, "DEAD", 15)
	smooth := number("smooth", 0, 1100, 0)
	held := number("held", 0, 1000, 0)
	p.State = append(p.State, smooth, held)
	deg, stroke := number("degrees", 0, 1100, 0), number("stroke", 0, 1000, 0)
	out := number("position", 0, 1000, 0)
	p.Outputs = append(p.Outputs, out)
	p.Order = append(p.Order,
		&logic.Define{Var: deg, As: logic.Lookup(table, Use(raw))},
		&logic.Set{Var: smooth, To: logic.Toward(Prev(smooth), Use(deg), C(lag))},
		&logic.Define{Var: stroke, As: logic.Clamp(logic.Div(logic.Mul(logic.Sub(Use(smooth), C(start)), logic.Lit(1000)), C(band)), logic.Lit(0), logic.Lit(1000))},
		&logic.Set{Var: held, When: logic.Or(logic.Gt(logic.Sub(Use(stroke), Prev(held)), C(dead)), logic.Gt(logic.Sub(Prev(held), Use(stroke)), C(dead))), To: Use(stroke)},
		&logic.Define{Var: out, As: Use(held)},
	)
	return p
}

// programs are those that the tests walk.
func programs() map[string]*logic.Program {
	return map[string]*logic.Program{
		"calorifier": calorifier(120, 240),
		"oven":       oven(),
		"defroster":  defroster(1600, 90),
		"valve":      valve(),
	}
}
