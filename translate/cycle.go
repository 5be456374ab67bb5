package translate

import (
	"fmt"

	"makebreak/survey"
	"makebreak/translate/switching"
	"makebreak/translate/thermal"
)

// cycles works out how each operating control on the process cycles, old and
// new, and what that means for the contact that it drives.
func (b *builder) cycles() {
	for _, c := range b.survey.Controls {
		if c.Duty.V == survey.Operating && c.Switching() && c.BreaksAt.Set && c.MakesAt.Set && c.Reset.V == survey.ResetAutomatic {
			b.cycle(c)
		}
	}
}

// cycle works out one control's cycle, where its load drives the process and
// the process is on the sheet.
func (b *builder) cycle(c *survey.Control) {
	l := b.driven(c)
	if l == nil {
		return
	}
	pr := b.survey.Process
	if !pr.SettlesOn.Set || !pr.SettlesOff.Set || !pr.TimeConstant.Set {
		b.openCycle(c, l, "not determined: settles_on, settles_off and time_constant of the process are not all on the sheet")
		return
	}
	loop := thermal.Loop{
		Process:   thermal.Process{On: pr.SettlesOn.V, Off: pr.SettlesOff.V, Tau: pr.TimeConstant.V, Dead: pr.DeadTime.V},
		Switching: thermal.Switching{Make: c.MakesAt.V, Break: c.BreaksAt.V},
	}
	if lag, from, ok := b.elementLag(c); ok {
		loop.Sensing.Lag = lag
		if c.Anticipator.Rise.Set && c.Anticipator.Lag.Set {
			loop.Sensing.Anticipator = thermal.Anticipator{Rise: c.Anticipator.Rise.V, Lag: c.Anticipator.Lag.V}
		}
		b.cycleFigures(c, "old_", loop, from)
		b.describing(c, loop)
	}
	if tuning, continuous := b.settingsOf(c.ID.V); continuous && wantsPID(c) {
		b.held(c, l, tuning)
		return
	}
	t, ok := b.spec.Thresholds[c.ID.V]
	if !ok {
		return
	}
	s := b.sensor(c.Sensor.V)
	loop.Sensing = thermal.Sensing{Lag: s.Lag.V}
	if anticipates(c) {
		loop.Sensing.Anticipator = thermal.Anticipator{Rise: c.Anticipator.Rise.V, Lag: c.Anticipator.Lag.V}
	}
	loop.Switching = thermal.Switching{Make: t.Make.SwitchesAt, Break: t.Break.SwitchesAt, MinOn: c.MinOn.V, MinOff: c.MinOff.V}
	figures, err := b.cycleFigures(c, "", loop, s.Lag.Path)
	if err != nil {
		b.openContact(l, "not determined: "+err.Error())
		return
	}
	b.contactLife(c, l, figures.Cycle.Period(), "process")
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

// cycleFigures notes on and off times, high, low and mean of the medium.
func (b *builder) cycleFigures(c *survey.Control, prefix string, loop thermal.Loop, lagFrom string) (thermal.Figures, error) {
	fs := &b.spec.Figures
	cycle, err := loop.Steady()
	if err != nil {
		for _, n := range []string{"on_s", "off_s", "high", "low", "mean"} {
			fs.open(c.ID.V, prefix+n, "", "process", "not determined: "+err.Error())
		}
		return cycle, err
	}
	working := cycleText(loop, lagFrom)
	fs.add(c.ID.V, prefix+"on_s", cycle.On, "s", "process", working)
	fs.add(c.ID.V, prefix+"off_s", cycle.Off, "s", "process", working)
	fs.add(c.ID.V, prefix+"high", cycle.High, "degC", "process", working)
	fs.add(c.ID.V, prefix+"low", cycle.Low, "degC", "process", working)
	fs.add(c.ID.V, prefix+"mean", cycle.Mean, "degC", "process", working)
	return cycle, nil
}

func cycleText(l thermal.Loop, lagFrom string) string {
	p, s, w := l.Process, l.Sensing, l.Switching
	text := fmt.Sprintf("steady cycle of a first-order process with dead time: settles at %s and %s, time constant %s, dead time %s; makes at %s, breaks at %s, lag %s (%s)",
		Degrees(p.On), Degrees(p.Off), Span(p.Tau), Span(p.Dead), Degrees(w.Make), Degrees(w.Break), Span(s.Lag), describe(lagFrom, "none stated"))
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
		b.spec.Figures.open(c.ID.V, n, "degC", "process", reason)
	}
	b.openContact(l, reason)
}

func (b *builder) openContact(l *survey.Load, reason string) {
	b.spec.Figures.open(l.ID.V, "operations_per_year", "1/year", "process", reason)
	b.spec.Figures.open(l.ID.V, "years_to_endurance", "years", "process", reason)
	b.spec.Figures.open(l.ID.V, "mttfd", "years", "process", reason)
}

// contactLife works out how long the new output's contact lives on a cycle.
func (b *builder) contactLife(c *survey.Control, l *survey.Load, period float64, from string) {
	note := func(name string, r switching.Result, from string) { b.result(l.ID.V, name, r, from) }
	year := switching.OperationsPerYear(period, 1)
	note("operations_per_year", year, from)
	o := output(b.survey, l.ID.V)
	if o == nil || o.Kind.V != "relay" {
		return // nothing wears in a semiconductor by switching
	}
	kind := "" // the derating holds for resistive loads only
	if l.Kind.V == "heater" {
		kind = l.SupplyIs.V
	}
	life := switching.Life(known(o.Endurance), known(o.RatedCurrent), known(l.Current), known(o.MechanicalLife), kind)
	note("years_to_endurance", switching.Years(life, year), o.Endurance.Path)
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
