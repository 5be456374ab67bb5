package translate

import (
	"fmt"
	"math"

	"makebreak/survey"
	"makebreak/translate/switching"
	"makebreak/translate/thermal"
)

// ControlCycle is how an operating two-position control cycles: the old part,
// and the new control in its place.
type ControlCycle struct {
	Control  *survey.Control
	Old, New Side
}

// Side is one of the two.
type Side struct {
	Loop    thermal.Loop
	Figures thermal.Figures
	Busiest thermal.Yearly // the year of the demand at which it switches oftenest; zero where there is none
	Why     string         // why there is no cycle; Loop and Figures mean nothing then
	Working string
}

// cycles works out how each operating control on the process cycles, old and
// new, and what that means for the contact that it drives.
func (b *builder) cycles() {
	for _, c := range b.survey.Controls {
		if cycles(c) {
			b.spec.Cycles = append(b.spec.Cycles, b.cycle(c))
		}
	}
}

// cycle works out one control's cycle, where its load drives the process and
// the process is known.
func (b *builder) cycle(c *survey.Control) *ControlCycle {
	k := &ControlCycle{Control: c}
	l := b.driven(c)
	if l == nil {
		k.Old.Why = "its load is not one that the sheet says drives the process"
		k.New.Why = k.Old.Why
		return k
	}
	if b.model == nil {
		k.Old.Why = "not determined: " + b.noModel
		k.New.Why = k.Old.Why
		b.openCycle(c, l, k.Old.Why)
		return k
	}
	if old, from, reason := b.oldLoop(c); reason == "" {
		k.Old = b.side(c, "old_", old, from)
		b.describing(c, old)
	} else {
		k.Old.Why = "not determined: " + reason
	}
	b.compareObserved(c, k.Old)
	t, ok := b.spec.Thresholds[c.ID.V]
	switch {
	case b.continuous(c):
		b.held(c, l)
		k.New.Why = "it becomes a continuous control, which does not cycle between two thresholds"
		return k
	case !ok:
		k.New.Why = "it does not become part of the program"
		return k
	}
	s := b.sensor(c.Sensor.V)
	sensing := thermal.Sensing{Lag: s.Lag.V, Filter: b.spec.Matches[c.ID.V].Filter.Lag}
	if anticipates(c) {
		sensing.Anticipator = thermal.Anticipator{Rise: c.Anticipator.Rise.V, Lag: c.Anticipator.Lag.V}
	}
	k.New = b.side(c, "", thermal.Loop{
		Process:   b.model.Process,
		Sensing:   sensing,
		Switching: thermal.Switching{Make: t.Make.SwitchesAt, Break: t.Break.SwitchesAt, MinOn: c.MinOn.V, MinOff: c.MinOff.V},
	}, s.Lag.Path)
	if k.New.Why != "" {
		b.openContact(l, k.New.Why)
		return k
	}
	b.contactLife(l, k.New)
	b.cycleTolerances(c, k.New)
	return k
}

// cycleTolerances works out how far a sound new control may be from its cycle:
// high and low by the worst error of its chain at that edge, on and off by what
// they change when both edges are off by that, the same way or against each
// other by a count.
func (b *builder) cycleTolerances(c *survey.Control, s Side) {
	worst := map[string]float64{}
	for _, x := range b.spec.Budgets {
		if x.Control == c.ID.V {
			worst[x.Edge] = x.WorstCase
		}
	}
	t := b.spec.Thresholds[c.ID.V]
	makes, breaks := worst["make"], worst["break"]
	if makes == 0 || breaks == 0 {
		return
	}
	on, off := 0.0, 0.0
	for _, sign := range []float64{-1, 1} {
		for _, count := range []float64{-1, 0, 1} {
			l := s.Loop
			l.Switching.Make += sign * makes
			l.Switching.Break += sign*breaks + count*t.Break.CountWidth
			f, err := l.Steady()
			if err != nil {
				return
			}
			on, off = math.Max(on, math.Abs(f.On-s.Figures.On)), math.Max(off, math.Abs(f.Off-s.Figures.Off))
		}
	}
	high, low := breaks, makes
	if b.model.Process.Cooling() {
		high, low = low, high
	}
	fs, path := &b.spec.Figures, b.model.Path
	fs.add(c.ID.V, "on_s_tolerance", on, "s", path, "change of the on time with both edges off by the worst error of the chain, and by a count against each other; the process taken as it stands")
	fs.add(c.ID.V, "off_s_tolerance", off, "s", path, "the same for the off time")
	fs.add(c.ID.V, "high_tolerance", high, "K", path, "worst error of the chain at that edge")
	fs.add(c.ID.V, "low_tolerance", low, "K", path, "worst error of the chain at that edge")
}

// oldLoop is the old control on its process; reason says what is missing.
func (b *builder) oldLoop(c *survey.Control) (l thermal.Loop, lagFrom, reason string) {
	if b.model == nil {
		return l, "", b.noModel
	}
	lag, from, ok := b.elementLag(c)
	if b.oldLagFrom != "" && !c.Lag.Set {
		lag, from = b.oldLag, b.oldLagFrom
	}
	if !ok {
		return l, "", "neither the sheet nor the catalogue gives the lag of " + c.Element.V
	}
	l = thermal.Loop{Process: b.model.Process, Sensing: thermal.Sensing{Lag: lag}, Switching: thermal.Switching{Make: c.MakesAt.V, Break: c.BreaksAt.V}}
	if c.Anticipator.Rise.Set && c.Anticipator.Lag.Set {
		l.Sensing.Anticipator = thermal.Anticipator{Rise: c.Anticipator.Rise.V, Lag: c.Anticipator.Lag.V}
	}
	return l, from, ""
}

// compareObserved sets the period that the model gives the old control beside
// the one that was taken with the stopwatch, where the model is not made from
// that.
func (b *builder) compareObserved(c *survey.Control, old Side) {
	o := c.Observed
	if !o.On.Set || !o.Off.Set || old.Why != "" || b.model.Path == o.On.Path {
		return
	}
	observed := o.On.V + o.Off.V
	b.spec.Figures.add(c.ID.V, "period_against_observed", old.Figures.Period()/observed, "", o.On.Path,
		fmt.Sprintf("period of the old control by the process as it stands, %s, over the observed one, %s: far from 1, one of the two is wrong", Span(old.Figures.Period()), Span(observed)))
}

// driven is the load of the process that a control runs.
func (b *builder) driven(c *survey.Control) *survey.Load {
	for _, l := range b.survey.Loads {
		if !drives(b.survey, l.ID.V) {
			continue
		}
		for _, n := range l.RunsWhen.V.Tree.Names() {
			if n == c.ID.V {
				return l
			}
		}
	}
	return nil
}

// side works out one side of a control's cycle and notes its figures: on and
// off times of the contact; high, low, swing and mean of the medium; what it
// comes to in a year.
func (b *builder) side(c *survey.Control, prefix string, loop thermal.Loop, lagFrom string) Side {
	fs, path := &b.spec.Figures, b.model.Path
	s := Side{Loop: loop, Working: b.cycleText(loop, lagFrom)}
	cycle, err := loop.Steady()
	if err != nil {
		s.Why = "not determined: " + err.Error()
		for _, n := range []struct{ name, unit string }{
			{"on_s", "s"}, {"off_s", "s"}, {"high", "degC"}, {"low", "degC"}, {"swing", "K"}, {"mean", "degC"}, {"cycles_per_year", "1/year"}, {"hours_on", "h/year"}, {"energy_share", ""},
		} {
			fs.open(c.ID.V, prefix+n.name, n.unit, path, s.Why)
		}
		return s
	}
	s.Figures = cycle
	add := func(name string, value float64, unit, working string) {
		fs.add(c.ID.V, prefix+name, value, unit, path, working)
	}
	add("on_s", cycle.On, "s", s.Working)
	add("off_s", cycle.Off, "s", s.Working)
	add("high", cycle.High, "degC", s.Working)
	add("low", cycle.Low, "degC", s.Working)
	add("swing", cycle.Swing(), "K", "high less low")
	add("mean", cycle.Mean, "degC", s.Working)
	add("cycles_per_year", cycle.OperationsPerYear, "1/year", "a year over the period, "+Span(cycle.Period())+", at the demand of the cycle")
	add("hours_on", 8760*cycle.Duty(), "h/year", "8760 h times the share of the period that it is on")
	add("energy_share", cycle.Duty(), "", "energy used, as a share of what the load left on all year would use")
	busiest, err := loop.Busiest()
	if err != nil {
		fs.open(c.ID.V, prefix+"cycles_per_year_busiest", "1/year", path, "not determined: "+err.Error())
		return s
	}
	s.Busiest = busiest
	add("cycles_per_year_busiest", busiest.Operations, "1/year", fmt.Sprintf("at the ambient at which it switches oftenest: on for %.0f %% of the time", 100*busiest.EnergyShare))
	return s
}

// cycleText is the working of a cycle. Where it is not known where the load
// settles, the rates near the thresholds stand for that.
func (b *builder) cycleText(l thermal.Loop, lagFrom string) string {
	p, s, w := l.Process, l.Sensing, l.Switching
	text := fmt.Sprintf("steady cycle of a first-order process with dead time: settles at %s and %s, time constant %s, dead time %s; makes at %s, breaks at %s, lag %s (%s)",
		Degrees(p.On), Degrees(p.Off), Span(p.Tau), Span(p.Dead), Degrees(w.Make), Degrees(w.Break), Span(s.Lag), describe(lagFrom, "none stated"))
	if !b.model.Far() {
		middle := (w.Make + w.Break) / 2
		text = fmt.Sprintf("steady cycle of a process with dead time that moves at %.4g K/min with the load on and %.4g K/min with it off near the thresholds, dead time %s; makes at %s, breaks at %s, lag %s (%s)",
			60*(p.On-middle)/p.Tau, 60*(p.Off-middle)/p.Tau, Span(p.Dead), Degrees(w.Make), Degrees(w.Break), Span(s.Lag), describe(lagFrom, "none stated"))
	}
	if s.Filter > 0 {
		text += fmt.Sprintf(", software lag %s", Span(s.Filter))
	}
	if a := s.Anticipator; a.Rise > 0 {
		text += fmt.Sprintf(", anticipator %s in %s", Kelvins(a.Rise), Span(a.Lag))
	}
	if w.MinOn > 0 || w.MinOff > 0 {
		text += fmt.Sprintf(", at least %s on and %s off", Span(w.MinOn), Span(w.MinOff))
	}
	return text
}

func (b *builder) openCycle(c *survey.Control, l *survey.Load, reason string) {
	for _, n := range []string{"high", "low"} {
		b.spec.Figures.open(c.ID.V, n, "degC", theProcess, reason)
	}
	b.openContact(l, reason)
}

func (b *builder) openContact(l *survey.Load, reason string) {
	b.spec.Figures.open(l.ID.V, "operations_per_year", "1/year", theProcess, reason)
	b.spec.Figures.open(l.ID.V, "years_to_endurance", "years", theProcess, reason)
	b.spec.Figures.open(l.ID.V, "mttfd", "years", theProcess, reason)
}

// contactLife works out how long the new output's contact lives, at the demand
// of the cycle and at the one at which it switches oftenest.
func (b *builder) contactLife(l *survey.Load, s Side) {
	b.contactLifeAt(l, s.Figures.Period(), s.Busiest.Operations, theProcess)
}

// contactLifeAt does so for one operation in a period, s; busiest is the most
// operations a year at any demand, 0 where that is not known.
func (b *builder) contactLifeAt(l *survey.Load, period, busiest float64, from string) {
	note := func(name string, r switching.Result, from string) { b.result(l.ID.V, name, r, from) }
	year := switching.OperationsPerYear(period, 1)
	note("operations_per_year", year, from)
	o := output(b.survey, l.ID.V)
	if o == nil || o.Kind.V != "relay" {
		return // nothing wears in a semiconductor by switching
	}
	life, _ := b.life(l)
	note("years_to_endurance", switching.Years(life, year), o.Endurance.Path)
	if busiest > 0 {
		most := switching.OperationsPerYear(switching.SecondsAYear/busiest, 1)
		note("years_to_endurance_busiest", switching.Years(life, most), o.Endurance.Path)
	}
	mttfd, t10d := switching.MTTFd(known(o.B10d), year)
	note("mttfd", mttfd, o.B10d.Path)
	note("t10d", t10d, o.B10d.Path)
}

// result notes what package switching worked out.
func (b *builder) result(about, name string, r switching.Result, from string) {
	if r.Determined {
		b.spec.Figures.add(about, name, r.Value, r.Unit, from, r.Working)
		return
	}
	b.spec.Figures.open(about, name, r.Unit, from, r.Working)
}

// known is a value, or zero where the sheet does not give it.
func known(f survey.Field[float64]) float64 {
	if !f.Set {
		return 0
	}
	return f.V
}
