package translate

import (
	"fmt"
	"math"

	"makebreak/survey"
	"makebreak/translate/logic"
	"makebreak/translate/thermal"
)

// Regulator is a replaced control that gives an output between none and all:
// a PID control, or the proportional action of a self-acting valve.
type Regulator struct {
	Control  *survey.Control
	Probe    *Probe
	Permille *logic.Var // the output, 0 to 1000
	Plan     thermal.PIDPlan
	Window   *thermal.WindowPlan // time proportioning; nil for a permille output
	Made     *logic.Expr         // with a window: the contact is made, in this step
	Sample   *logic.Const        // steps between two outputs
	Dial     *Dial
	Safe     int64 // permille that it goes to where its probe is not believed
}

// samples is how many outputs a permille control works out in the shorter of
// dead time and closed-loop time constant; common practice: ten.
const samples = 10.0

// bandRoom is how many times its band a PID control's reading must reach to
// either side of the set point: beyond one band the output is all or none.
const bandRoom = 1.25

// pidSpan is what a PID control needs of its sensor's temperature.
func pidSpan(c *survey.Control, t Tuning) span {
	room := math.Max(5, bandRoom/t.Chosen.Settings.Parallel().Kc)
	at := c.DialMark().V
	low, high := at, at
	if c.DialStays() {
		low, high = c.Dial.V[0], c.Dial.V[1]
	}
	return span{low - room, high + room}
}

// pid builds a PID control in whole numbers, by the plan of package thermal:
// with e the deviation, clipped to where the output is all or none anyway,
//
//	p = e·P.Mul / P.Div
//	d = (y before − y)·D.Mul / D.Div      y: the reading behind a first-order lag
//	out = p + sum/I.Div + d, held between none and all
//	sum += e·I.Mul, held likewise, but not while out is held and e pushes on
//
// once in a sample. Derivative acts on the reading and not on the set point.
// While the probe is not believed the output is none and the sum is emptied,
// so that the control begins from none again: no bump.
func (b *builder) pid(c *survey.Control, p *Probe, t Tuning) *Regulator {
	id := c.ID.V
	r := b.reading(p)
	l := b.runBy(c)
	req := thermal.PIDRequest{Settings: t.Chosen.Settings, CountsPerK: 1 / r.Unit, Low: r.Low, High: r.High, MostOutput: thermal.Full}
	g := &Regulator{Control: c, Probe: p}
	sample := b.sampleTime(c, t)
	if t.Window > 0 {
		w, err := thermal.PlanWindow(t.Window, b.leastPulse(c, l), b.step)
		if err != nil {
			b.fail(c.Want.Source, "no time proportioning for "+l.ID.V, err.Error(), "a longer window, a shorter called_every, or shorter minimum times")
			return nil
		}
		g.Window, sample = &w, float64(w.Steps)*b.step
	}
	steps := max(int64(math.Round(sample/b.step)), 1)
	req.Step = float64(steps) * b.step
	plan, err := thermal.PlanPID(req)
	if err != nil {
		b.fail(c.Want.Source, "no PID control for "+id, err.Error(), "another sample time, or two_position")
		return nil
	}
	g.Plan = plan
	b.pidNotes(c, t, plan, req)

	k := func(name string, v int64, unit, means, working string) *logic.Const {
		return b.constant(logic.Const{Name: id + "_" + name, Value: v, Unit: unit, Means: means, Origin: origin(c.Want.Source), Working: working})
	}
	name := t.Chosen.Name
	s := t.Chosen.Settings.Parallel()
	g.Sample = k("sample", steps, "steps", "a new output every "+Span(req.Step), Span(req.Step)+" / "+Span(b.step)+" a step")
	at := b.due(c, p, g.Sample)
	running := b.local(b.name(id, "running"), c.What.V+": its probe is believed", logic.Not(p.failed()))
	due := b.local(b.name(id, "due"), c.What.V+": a new output is due", logic.And(logic.Use(running), logic.Eq(logic.Use(at), logic.Lit(0))))

	g.Dial = b.dial(c, p)
	setPoint := b.aimed(c, g.Dial, r)
	deviation := logic.Sub(setPoint, logic.Use(r.Value))
	if c.Cools() { // more output where it is too warm
		deviation = logic.Sub(logic.Use(r.Value), setPoint)
	}
	clip := k("clip", plan.Clip, fmt.Sprintf("%g K", r.Unit), "deviation beyond which the output is all or none", fmt.Sprintf("four times the band, 1 / %.4g /K, or the whole range", s.Kc))
	e := b.whole(b.name(id, "deviation"), "deviation, positive where more output is wanted", logic.Clamp(deviation, logic.Lit(-plan.Clip), logic.C(clip)))
	out := b.fractionOf(logic.Use(e), plan.P, func(n string, v int64) *logic.Const {
		return k("p_"+n, v, "", fmt.Sprintf("proportional: %.4g permille for %g K", plan.PerCount, r.Unit), fmt.Sprintf("%s: gain %.4g /K; %+.2f %% off as a fraction", name, s.Kc, 100*plan.P.Error))
	})
	var sum *logic.Var
	if plan.I.Mul != 0 {
		sum = b.state(logic.Var{Name: b.name(id, "sum"), What: c.What.V + ": integral", Kind: logic.Int, Range: logic.Range{Lo: 0, Hi: plan.MostOutput * plan.I.Div}})
		div := k("i_div", plan.I.Div, "", "integral: divisor", fmt.Sprintf("%s: integral time %s; %+.2f %% off as a fraction", name, Span(s.Ti), 100*plan.I.Error))
		out = logic.Add(out, logic.Div(logic.Prev(sum), logic.C(div)))
	}
	if plan.D.Mul != 0 {
		out = logic.Add(out, b.derivative(c, r, plan, s.Td, due, running, k))
	}
	most := k("most", plan.MostOutput, "permille", "all", "the whole output")
	raw := b.whole(b.name(id, "unheld"), "output, where one is due, before it is held between none and all", logic.Select(logic.Use(due), out, logic.Lit(0)))
	if sum != nil {
		mul := k("i_mul", plan.I.Mul, "", "integral: factor of the deviation in each sample", fmt.Sprintf("%s: integral time %s", name, Span(s.Ti)))
		pushes := b.local(b.name(id, "pushes_on"), "the output is held, and the deviation pushes it on", logic.Or(
			logic.And(logic.Gt(logic.Use(raw), logic.C(most)), logic.Gt(logic.Use(e), logic.Lit(0))),
			logic.And(logic.Lt(logic.Use(raw), logic.Lit(0)), logic.Lt(logic.Use(e), logic.Lit(0)))))
		b.add(&logic.Set{Var: sum, When: logic.Or(logic.Not(logic.Use(running)), logic.And(logic.Use(due), logic.Not(logic.Use(pushes)))),
			To: logic.Select(logic.Use(running),
				logic.Clamp(logic.Add(logic.Prev(sum), logic.Mul(logic.Use(e), logic.C(mul))), logic.Lit(0), logic.Lit(plan.MostOutput*plan.I.Div)), logic.Lit(0)),
			Why: "not while the output is held and the deviation pushes it on; emptied while the probe is not believed"})
	}
	g.Permille = b.state(logic.Var{Name: b.name(id, "permille"), What: c.What.V + ": output", Kind: logic.Int, Range: logic.Range{Lo: 0, Hi: thermal.Full}})
	b.add(&logic.Set{Var: g.Permille, When: logic.Or(logic.Not(logic.Use(running)), logic.Use(due)),
		To:  logic.Select(logic.Use(running), logic.Clamp(logic.Use(raw), logic.Lit(0), logic.C(most)), logic.Lit(0)),
		Why: "none while the probe is not believed"})
	if g.Window != nil {
		b.proportion(c, g, at, due, running, k)
	}
	return g
}

// due counts the steps of a sample, from the first step in which the probe is
// believed.
func (b *builder) due(c *survey.Control, p *Probe, sample *logic.Const) *logic.Var {
	id := c.ID.V
	if sample.Value == 1 {
		at := &logic.Var{Name: b.name(id, "at"), What: "always due", Kind: logic.Int}
		b.add(&logic.Define{Var: at, As: logic.Lit(0)})
		return at
	}
	last := b.constant(logic.Const{Name: id + "_last_step", Value: sample.Value - 1, Unit: "steps", Means: "last step of a sample", Origin: sample.Origin, Working: sample.Name + " - 1"})
	at := b.state(logic.Var{Name: b.name(id, "at"), What: c.What.V + ": steps since its last output", Kind: logic.Int, Range: logic.Range{Lo: 0, Hi: last.Value}, Start: last.Value})
	b.add(&logic.Set{Var: at, To: logic.Select(p.failed(), logic.C(last),
		logic.Select(logic.Ge(logic.Prev(at), logic.C(last)), logic.Lit(0), logic.Add(logic.Prev(at), logic.Lit(1))))})
	return at
}

// fractionOf is x·Mul/Div; a divisor of one is left out.
func (b *builder) fractionOf(x *logic.Expr, f thermal.Fraction, k func(name string, v int64) *logic.Const) *logic.Expr {
	e := logic.Mul(x, logic.C(k("mul", f.Mul)))
	if f.Div == 1 {
		return e
	}
	return logic.Div(e, logic.C(k("div", f.Div)))
}

// derivative is the action on the filtered reading.
func (b *builder) derivative(c *survey.Control, r Reading, plan thermal.PIDPlan, td float64, due, running *logic.Var, k func(name string, v int64, unit, means, working string) *logic.Const) *logic.Expr {
	id, f := c.ID.V, plan.Filter
	scale := k("scale", f.Scale, "", "the smoothed reading is kept so many times finer", fmt.Sprintf("so that it stays within %.2g steps of a constant reading", f.SteadyError))
	n := k("smooth", f.Divisor, "samples", "lag of the smoothed reading "+Span(f.Lag), "an eighth of the derivative time (common practice)")
	y := b.state(logic.Var{Name: b.name(id, "smoothed"), What: "reading behind a first-order lag, × " + scale.Name, Kind: logic.Int,
		Range: logic.Range{Lo: r.Low * f.Scale, Hi: r.High * f.Scale}, Start: min(max(0, r.Low*f.Scale), r.High*f.Scale)})
	now := logic.Mul(logic.Use(r.Value), logic.C(scale))
	was := b.truth(b.name(id, "was_running"), "its probe was believed in the step before", false)
	next := b.whole(b.name(id, "smoothed_now"), "the smoothed reading as it is about to be",
		logic.Select(logic.Prev(was), logic.Select(logic.Use(due), logic.Toward(logic.Prev(y), now, logic.C(n)), logic.Prev(y)), now))
	move := b.whole(b.name(id, "moved"), "how far the smoothed reading has come down",
		logic.Select(logic.Prev(was), logic.Sub(logic.Prev(y), logic.Use(next)), logic.Lit(0)))
	span := max(1, (r.High-r.Low)*f.Scale/f.Divisor)
	held := b.whole(b.name(id, "moved_by"), "the same, within what the filter can move", logic.Clamp(logic.Use(move), logic.Lit(-span), logic.Lit(span)))
	e := logic.Use(held)
	if c.Cools() {
		e = logic.Sub(logic.Lit(0), e)
	}
	b.add(&logic.Set{Var: y, To: logic.Use(next)}, &logic.Set{Var: was, To: logic.Use(running)})
	return b.fractionOf(e, plan.D, func(name string, v int64) *logic.Const {
		return k("d_"+name, v, "", "derivative on the smoothed reading", fmt.Sprintf("derivative time %s; %+.2f %% off as a fraction", Span(td), 100*plan.D.Error))
	})
}

// proportion turns the output into whole steps of a window. The window begins
// with the sample, so that an output is carried out once.
func (b *builder) proportion(c *survey.Control, g *Regulator, at, due, running *logic.Var, k func(name string, v int64, unit, means, working string) *logic.Const) {
	id, w := c.ID.V, *g.Window
	half := logic.Lit(thermal.Full / 2)
	n := b.whole(b.name(id, "steps_on"), "steps of the window for this output",
		logic.Select(logic.Use(due), logic.Div(logic.Add(logic.Mul(logic.Use(g.Permille), logic.C(g.Sample)), half), logic.Lit(thermal.Full)), logic.Lit(0)))
	on := logic.Use(n)
	if w.MinPulse > 0 {
		least := k("least_pulse", w.MinPulse, "steps", "shortest pulse "+Span(float64(w.MinPulse)*b.step), "min_pulse of the output, or the minimum times of the control")
		longest := k("longest_pulse", w.Steps-w.MinPulse, "steps", "longest pulse that leaves room for a shortest pause", g.Sample.Name+" - "+least.Name)
		on = logic.Select(logic.Lt(on, logic.C(least)), logic.Lit(0), logic.Select(logic.Gt(on, logic.C(longest)), logic.C(g.Sample), on))
	}
	length := b.state(logic.Var{Name: b.name(id, "on_for"), What: "steps of this window that are on", Kind: logic.Int, Range: logic.Range{Lo: 0, Hi: w.Steps}})
	b.add(&logic.Set{Var: length, When: logic.Or(logic.Not(logic.Use(running)), logic.Use(due)), To: logic.Select(logic.Use(running), on, logic.Lit(0))})
	g.Made = logic.Lt(logic.Use(at), logic.Use(length))
}

// leastPulse is the shortest time for which a window may switch, s.
func (b *builder) leastPulse(c *survey.Control, l *survey.Load) float64 {
	least := math.Max(c.MinOn.V, c.MinOff.V)
	if o := output(b.survey, l.ID.V); o != nil {
		least = math.Max(least, known(o.MinPulse))
	}
	return least
}

// sampleTime is how often a permille output is worked out, s.
func (b *builder) sampleTime(c *survey.Control, t Tuning) float64 {
	closed := t.TauC
	if t.Transfer.Dead > 0 {
		closed = math.Min(closed, t.Transfer.Dead)
	}
	return math.Max(b.step, math.Floor(closed/samples/b.step)*b.step)
}

// runBy is the load that a control runs: the one that follows it, or the first
// in whose line it stands.
func (b *builder) runBy(c *survey.Control) *survey.Load {
	for _, l := range b.survey.Loads {
		if l.Follows.V == c.ID.V {
			return l
		}
		for _, n := range l.RunsWhen.V.Tree.Names() {
			if n == c.ID.V {
				return l
			}
		}
	}
	return &survey.Load{}
}

// pidNotes lists what the whole numbers cost.
func (b *builder) pidNotes(c *survey.Control, t Tuning, plan thermal.PIDPlan, req thermal.PIDRequest) {
	fs, at := &b.spec.Figures, c.Want.Path
	fs.add(c.ID.V, "sample", req.Step, "s", at, "time between two outputs")
	fs.add(c.ID.V, "output_error", plan.OutputError, "permille", at, "most that the divisions of one output cut off: less than 1 for each action")
	widest := int64(0)
	name := ""
	for _, x := range plan.Bounds {
		if m := max(-x.Low, x.High); m > widest {
			widest, name = m, x.Name
		}
	}
	fs.add(c.ID.V, "widest_intermediate", float64(widest), "", at, fmt.Sprintf("%s; 32 bits hold 2147483647", name))
	for i, d := range plan.Doubts {
		fs.add(c.ID.V, fmt.Sprintf("doubt_%d", i+1), 1, "", at, d)
	}
}

// whole declares a whole number that lives for one step and is worked out now.
func (b *builder) whole(name, what string, as *logic.Expr) *logic.Var {
	v := &logic.Var{Name: name, What: what, Kind: logic.Int, Range: logic.Span(as)}
	v.Start = v.Range.Lo
	b.add(&logic.Define{Var: v, As: as})
	return v
}
