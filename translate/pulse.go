package translate

import (
	"fmt"
	"math"

	"makebreak/survey"
	"makebreak/translate/logic"
	"makebreak/translate/sensing"
	"makebreak/translate/thermal"
)

// Pulser is a replaced device that makes and breaks by itself: a flasher, or an
// energy regulator.
type Pulser struct {
	Control *survey.Control
	Period  *logic.Const
	On      *logic.Const // steps on in each period; nil where a dial says it
	Made    *logic.Expr
	Dial    *Dial
	Called  *logic.Expr // something that it switches is called for

	// Of a flasher that shows a failed lamp:
	Probe     *Probe
	LampOut   *logic.Var
	OutPeriod *logic.Const
	Threshold int64 // counts
}

// Facts about lamps, common practice.
const (
	filamentPower = 0.55 // the current of a filament goes with about this power of its voltage
	lampTolerance = 0.10 // of a lamp's current
	lampSettles   = 0.2  // s until a cold filament has come down from its inrush
)

// pulses reports whether a pulsing device becomes part of the program: its
// period and what is on of it are known.
func pulses(c *survey.Control) bool {
	return c.Action.V == survey.Pulses && c.Plan.V == survey.Replace && period(c) > 0 && (c.OnShare.Set || c.DialShares.Set)
}

// period is the time from one make to the next, s; 0 where it is not known.
func period(c *survey.Control) float64 {
	switch {
	case c.Period.Set && c.Period.V > 0:
		return c.Period.V
	case c.Rate.Set && c.Rate.V > 0:
		return 1 / c.Rate.V
	}
	return 0
}

// periodFrom is where the period came from.
func periodFrom(c *survey.Control) survey.Source {
	if c.Period.Set {
		return c.Period.Source
	}
	return c.Rate.Source
}

// Lamps is what can be told from the current of a flasher's lamps.
type Lamps struct {
	All, Less  [2]float64 // A: least and greatest current with all lamps, and with one out
	Between    float64    // A, midway between the two
	ToldApart  bool
	LeastApart float64 // least current with all lamps over the greatest with one out
	Working    string
}

// lamps works out the currents of n lamps and of one less over the whole supply
// range and the tolerance of lamps. The power of a lamp is taken at the middle
// of the supply range; a filament's current goes with the 0.55th power of its
// voltage (common practice).
func lamps(l survey.Lamps) Lamps {
	low, high := l.Supply.V[0], l.Supply.V[1]
	middle := (low + high) / 2
	each := l.Each.V / middle
	at := func(n int, volts, tolerance float64) float64 {
		return float64(n) * each * math.Pow(volts/middle, filamentPower) * (1 + tolerance)
	}
	n := l.Count.V
	r := Lamps{
		All:  [2]float64{at(n, low, -lampTolerance), at(n, high, lampTolerance)},
		Less: [2]float64{at(n-1, low, -lampTolerance), at(n-1, high, lampTolerance)},
	}
	r.Between = (r.All[0] + r.Less[1]) / 2
	r.ToldApart = r.All[0] > r.Less[1]
	r.LeastApart = math.Inf(1)
	if r.Less[1] > 0 {
		r.LeastApart = r.All[0] / r.Less[1]
	}
	r.Working = fmt.Sprintf("%d lamps of %.4g W at %.4g V: %.3g to %.3g A from %.4g to %.4g V, lamps ± %g %%; with one out %.3g to %.3g A (filament current ∝ V^%g, common practice)",
		n, l.Each.V, middle, r.All[0], r.All[1], low, high, 100*lampTolerance, r.Less[0], r.Less[1], filamentPower)
	return r
}

// pulseFigures says what the device did and what whole steps make of it.
func (b *builder) pulseFigures(c *survey.Control) {
	if c.Action.V != survey.Pulses || period(c) == 0 {
		return
	}
	fs, from := &b.spec.Figures, periodFrom(c)
	p := period(c)
	steps := math.Max(math.Round(p/b.step), 2)
	fs.add(c.ID.V, "period", p, "s", from.Path, "asked for: "+from.Text)
	fs.add(c.ID.V, "period_really", steps*b.step, "s", from.Path, fmt.Sprintf("%.0f steps of %s", steps, Span(b.step)))
	fs.add(c.ID.V, "rate", 60/(steps*b.step), "/min", from.Path, "60 s / period, as the program has it")
	if c.OnShare.Set {
		on := math.Min(math.Max(math.Round(c.OnShare.V*steps), 1), steps-1)
		fs.add(c.ID.V, "on_share", on/steps, "", c.OnShare.Path, fmt.Sprintf("%.0f of %.0f steps", on, steps))
		fs.add(c.ID.V, "first_light", b.step, "s", c.FirstOnWithin.Path, "it begins lit, in the step in which it is called for")
	}
	if c.Lamps.Count.Set && c.Lamps.Each.Set && c.Lamps.Supply.Set {
		l := lamps(c.Lamps)
		if l.LeastApart < 1e6 {
			fs.add(c.ID.V, "lamps_apart", l.LeastApart, "", c.Lamps.Path, "least current with all lamps over the greatest with one out: "+l.Working)
		} else {
			fs.open(c.ID.V, "lamps_apart", "", c.Lamps.Path, "with the only lamp out there is no current at all: always told apart")
		}
		fs.add(c.ID.V, "lamps_threshold", l.Between, "A", c.Lamps.Path, "midway between the least with all and the greatest with one out: "+l.Working)
	}
}

// pulser builds a pulsing device. It begins with its on time in the very step
// in which something that it switches is called for, and stands ready for that
// while nothing is.
func (b *builder) pulser(c *survey.Control, w *wiring) *Pulser {
	id := c.ID.V
	g := &Pulser{Control: c, Called: b.called(c, w)}
	called := b.local(b.name(id, "called"), c.What.V+": something that it switches is called for", g.Called)
	from := periodFrom(c)
	steps := max(int64(math.Round(period(c)/b.step)), 2)
	g.Period = b.constant(logic.Const{Name: id + "_period", Value: steps, Unit: "steps", Means: Span(period(c)) + " from make to make", Origin: origin(from),
		Working: fmt.Sprintf("%s / %s a step, rounded", Span(period(c)), Span(b.step))})
	if c.DialShares.Set {
		b.regulated(g, called)
		return g
	}
	on := b.onSteps(c, "on", steps, c.OnShare.Source)
	g.On = on
	last := b.constant(logic.Const{Name: id + "_last_step", Value: steps - 1, Unit: "steps", Means: "last step of a period", Origin: origin(from), Working: g.Period.Name + " - 1"})
	longest := last.Value
	lastNow, onNow := logic.C(last), logic.C(on)
	if c.Lamps.OutRate.Set && b.plan.Sensors[c.Sensor.V] != nil && lamps(c.Lamps).ToldApart {
		lastNow, onNow, longest = b.lampOut(g, last, on)
	}
	at := b.state(logic.Var{Name: b.name(id, "at"), What: c.What.V + ": steps since it made", Kind: logic.Int, Range: logic.Range{Lo: 0, Hi: longest}, Start: last.Value})
	b.add(&logic.Set{Var: at, To: logic.Select(logic.Use(called),
		logic.Select(logic.Ge(logic.Prev(at), lastNow), logic.Lit(0), logic.Clamp(logic.Add(logic.Prev(at), logic.Lit(1)), logic.Lit(0), logic.Lit(longest))),
		logic.C(last)), Why: "stands ready to begin lit while nothing is called for"})
	if g.LampOut == nil {
		g.Made = logic.Use(b.local(b.name(id, "lit"), c.What.V+": it is in its on time", logic.Lt(logic.Use(at), onNow)))
		return g
	}
	b.look(g, at, onNow, called)
	return g
}

// onSteps is the on time of a period in whole steps.
func (b *builder) onSteps(c *survey.Control, name string, steps int64, from survey.Source) *logic.Const {
	n := min(max(int64(math.Round(c.OnShare.V*float64(steps))), 1), steps-1)
	return b.constant(logic.Const{Name: c.ID.V + "_" + name, Value: n, Unit: "steps", Means: fmt.Sprintf("%g %% on", number100(c.OnShare.V)), Origin: origin(from),
		Working: fmt.Sprintf("%g %% of %d steps, rounded", number100(c.OnShare.V), steps)})
}

func number100(share float64) float64 { return math.Round(10000*share) / 100 }

// called is true where a load in whose line the device stands would run with
// it made. Where such a line asks for something that is worked out later, the
// device runs all the time.
func (b *builder) called(c *survey.Control, w *wiring) *logic.Expr {
	var lines []*logic.Expr
	for _, l := range b.survey.Loads {
		named := false
		for _, n := range l.RunsWhen.V.Tree.Names() {
			named = named || n == c.ID.V
			if n != c.ID.V && w.known[n] == nil && (timer(b.survey, n) != nil || load(b.survey, n) != nil) {
				return logic.True()
			}
		}
		if named {
			lines = append(lines, w.holding([]string{c.ID.V}).condition(l.RunsWhen.V.Tree, l.RunsWhen.Source))
		}
	}
	return logic.Or(lines...)
}

// lampOut declares what a failed lamp changes: the period, with the same share.
func (b *builder) lampOut(g *Pulser, last, on *logic.Const) (lastNow, onNow *logic.Expr, longest int64) {
	c := g.Control
	id, rate := c.ID.V, c.Lamps.OutRate
	steps := max(int64(math.Round(1/rate.V/b.step)), 2)
	g.OutPeriod = b.constant(logic.Const{Name: id + "_out_period", Value: steps, Unit: "steps", Means: "from make to make with a lamp out", Origin: origin(rate.Source),
		Working: fmt.Sprintf("%s / %s a step, rounded", Span(1/rate.V), Span(b.step))})
	outLast := b.constant(logic.Const{Name: id + "_out_last_step", Value: steps - 1, Unit: "steps", Means: "last step of a period with a lamp out", Origin: origin(rate.Source), Working: g.OutPeriod.Name + " - 1"})
	outOn := b.onSteps(c, "out_on", steps, rate.Source)
	g.Probe = b.plan.Sensors[c.Sensor.V]
	g.LampOut = b.truth(b.name(id, "lamp_out"), c.What.V+": the lamps draw too little", false)
	return logic.Select(logic.Prev(g.LampOut), logic.C(outLast), logic.C(last)), logic.Select(logic.Use(g.LampOut), logic.C(outOn), logic.C(on)), max(last.Value, outLast.Value)
}

// look compares the current with that of all lamps, once in each flash, in its
// last lit step, when a cold filament has long come down from its inrush. What
// was seen counts from the next flash on. A sample that cannot be believed
// changes nothing.
func (b *builder) look(g *Pulser, at *logic.Var, on *logic.Expr, called *logic.Var) {
	c := g.Control
	id := c.ID.V
	l := lamps(c.Lamps)
	h, err := b.spec.Chains[c.Sensor.V].Threshold(l.Between, sensing.AtOrBelow, sensing.Nearest)
	if err != nil {
		b.fail(c.Lamps.Source, "the current of the lamps cannot be seen by "+c.Sensor.V, err.Error(), "another full_scale")
		return
	}
	g.Threshold = h.Counts
	k := b.constant(logic.Const{Name: id + "_lamps", Value: h.Counts, Unit: "counts", Means: fmt.Sprintf("%.3g A", l.Between), Origin: origin(c.Lamps.Source), Working: l.Working})
	e := &edge{Const: k, AtLeast: h.AtLeast}
	dim := b.truth(b.name(id, "dim"), c.What.V+": the last flash drew too little", false)
	begins := logic.Eq(logic.Use(at), logic.Lit(0))
	b.add(&logic.Set{Var: g.LampOut, When: logic.Or(logic.Not(logic.Use(called)), begins), To: logic.And(logic.Use(called), logic.Prev(dim)),
		Why: "counts from the next flash on; forgotten when nothing is called for"})
	g.Made = logic.Use(b.local(b.name(id, "lit"), c.What.V+": it is in its on time", logic.Lt(logic.Use(at), on)))
	lastLit := logic.And(logic.Use(called), logic.Eq(logic.Add(logic.Use(at), logic.Lit(1)), on))
	b.add(&logic.Set{Var: dim, When: logic.Or(logic.Not(logic.Use(called)), logic.And(lastLit, g.Probe.good())),
		To: logic.And(logic.Use(called), e.reached(g.Probe)), Why: "looked at in the last lit step of a flash"})
	b.flag(id+"_lamp_out", c.What.V+": a lamp is out", logic.Use(g.LampOut))
}

// regulated builds an energy regulator: the dial's share of the period is on.
// A wiper that is broken means off. Like the old part it begins with its on
// time when it is turned up from off.
func (b *builder) regulated(g *Pulser, called *logic.Var) {
	c := g.Control
	id, rows := c.ID.V, c.DialShares.V
	marks := [2]float64{math.Min(0, rows[0][0]), rows[len(rows)-1][0]}
	layout, err := sensing.NewDial(marks, b.survey.Electronics.ADC, dialDead, dialTrack)
	if err != nil {
		b.fail(c.DialShares.Source, "the dial cannot be read", err.Error(), "marks from off to full")
		return
	}
	t := &logic.Table{Name: b.name(id, "shares"), What: "share of the period by the dial", Unit: "permille", Working: "straight between the marks of " + c.DialShares.Text}
	add := func(mark, share float64) {
		n, err := layout.Mark(mark)
		if err == nil && (len(t.X) == 0 || n > t.X[len(t.X)-1]) {
			t.X, t.Y = append(t.X, n), append(t.Y, int64(math.Round(thermal.Full*share)))
		}
	}
	if rows[0][0] > 0 {
		add(0, 0)
	}
	for _, r := range rows {
		add(r[0], r[1])
	}
	if len(t.X) < 2 {
		b.fail(c.DialShares.Source, "no dial in two points", c.DialShares.Text, "marks that rise")
		return
	}
	b.prog.Tables = append(b.prog.Tables, t)
	d := &Dial{Layout: layout}
	d.Marked, _ = layout.Mark(rows[len(rows)/2][0])
	bad := b.wiper(c.ID.V, "dial of "+c.What.V, c.DialShares.Source, d, "it stays off")
	g.Dial = d
	share := b.whole(b.name(id, "share"), "share of the period that is on", logic.Select(logic.And(logic.Use(d.Believed), logic.Not(logic.Use(bad))), logic.Lookup(t, logic.Use(d.Raw)), logic.Lit(0)))
	n := b.whole(b.name(id, "steps_on"), "steps on for this share", logic.Div(logic.Mul(logic.Use(share), logic.C(g.Period)), logic.Lit(thermal.Full)))
	on := logic.Use(n)
	if least := b.leastPulse(c, b.runBy(c)); least > 0 {
		k := b.constant(logic.Const{Name: id + "_least_pulse", Value: max(int64(math.Ceil(least/b.step)), 1), Unit: "steps", Means: "shortest pulse " + Span(least), Origin: origin(c.MinOn.Source), Working: "min_pulse of the output, or min_on"})
		if 2*k.Value >= g.Period.Value {
			b.fail(periodFrom(c), "the period holds no two of the least pulses", Span(least), "a longer period or a shorter least pulse")
			return
		}
		longest := b.constant(logic.Const{Name: id + "_longest_pulse", Value: g.Period.Value - k.Value, Unit: "steps", Means: "longest pulse that leaves room for a pause", Origin: k.Origin, Working: g.Period.Name + " - " + k.Name})
		on = logic.Select(logic.Lt(on, logic.C(k)), logic.Lit(0), logic.Select(logic.Gt(on, logic.C(longest)), logic.C(g.Period), on))
	}
	now := b.whole(b.name(id, "on_now"), "steps of this period that are on", on)
	last := b.constant(logic.Const{Name: id + "_last_step", Value: g.Period.Value - 1, Unit: "steps", Means: "last step of a period", Origin: g.Period.Origin, Working: g.Period.Name + " - 1"})
	at := b.state(logic.Var{Name: b.name(id, "at"), What: c.What.V + ": steps since it made", Kind: logic.Int, Range: logic.Range{Lo: 0, Hi: last.Value}, Start: last.Value})
	idle := logic.Or(logic.Not(logic.Use(called)), logic.Eq(logic.Use(now), logic.Lit(0)))
	b.add(&logic.Set{Var: at, To: logic.Select(idle, logic.C(last),
		logic.Select(logic.Ge(logic.Prev(at), logic.C(last)), logic.Lit(0), logic.Add(logic.Prev(at), logic.Lit(1)))),
		Why: "stands ready to begin on while it is off or nothing is called for"})
	g.Made = logic.Use(b.local(b.name(id, "lit"), c.What.V+": it is in its on time", logic.Lt(logic.Use(at), logic.Use(now))))
}
