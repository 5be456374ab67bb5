package translate

import (
	"fmt"
	"math"

	"makebreak/survey"
	"makebreak/translate/logic"
	"makebreak/translate/thermal"
)

// drive is the process at its worst: where it settles with the load on and
// off, and how fast.
type drive struct {
	settles, off, tau, dead float64
	offKnown                bool
	path                    string
}

// worstDrive takes the figure that drives furthest from a temperature; reason
// says what is missing. Where the process was identified and nothing tells
// where the load settles but the stated worst, the time constant is that with
// which the rise towards the worst has the measured rate.
func (b *builder) worstDrive(from float64) (d drive, reason string) {
	p, m := b.survey.Process, b.model
	w := p.Worst.SettlesOn
	switch {
	case m != nil && m.Far():
		d = drive{settles: m.Process.On, off: m.Process.Off, offKnown: true, tau: m.Process.Tau, dead: m.Process.Dead, path: m.Path}
		if p.SettlesOn.Set {
			d.path = p.SettlesOn.Path
		}
		if w.Set && math.Abs(w.V-from) > math.Abs(d.settles-from) {
			d.settles, d.path = w.V, w.Path
		}
	case m != nil && w.Set && (w.V-m.At)*m.RateOn.Value > 0:
		d = drive{settles: w.V, tau: (w.V - m.At) / m.RateOn.Value, dead: m.Process.Dead, path: w.Path}
		d.off, d.offKnown = m.At+m.RateOff.Value*d.tau, true
	case m != nil:
		return d, "not determined: where the load would settle does not follow from " + m.Path + ", and worst is not on the sheet"
	case !p.SettlesOn.Set && !w.Set:
		return d, "not determined: where the process settles with the load on is not on the sheet"
	case !p.TimeConstant.Set:
		return d, "not determined: the time constant of the process is not on the sheet"
	default:
		d = drive{settles: p.SettlesOn.V, off: p.SettlesOff.V, offKnown: p.SettlesOff.Set, tau: p.TimeConstant.V, dead: p.DeadTime.V, path: p.SettlesOn.Path}
		if w.Set && (!p.SettlesOn.Set || math.Abs(w.V-from) > math.Abs(d.settles-from)) {
			d.settles, d.path = w.V, w.Path
		}
	}
	return d, ""
}

// slope is how fast the temperature moves at t, K/s: (settles − t)/τ for a
// first-order process.
func (d drive) slope(t float64) float64 { return (d.settles - t) / d.tau }

// overshoot works out by how much the medium goes on after a hardware limit
// has cut its load: from where the process settles with the load off, on to the
// trip behind the element's lag, and through the dead time (thermal.Cut).
func (b *builder) overshoot(c *survey.Control) {
	if c.Plan.V == survey.Replace || !c.Switching() || len(c.Cuts) == 0 {
		return
	}
	const name = "overshoot_after_cut"
	fs, at := &b.spec.Figures, c.BreaksAt
	open := func(path, reason string) { fs.open(c.ID.V, name, "K", path, "not determined: "+reason) }
	if !at.Set {
		open(at.Path, "the temperature at which it acts is not on the sheet")
		return
	}
	d, reason := b.worstDrive(at.V)
	if reason != "" {
		fs.open(c.ID.V, name, "K", theProcess, reason)
		b.overshootBound(c)
		return
	}
	if (c.Action.V == survey.BreaksOnRise) != (d.settles > at.V) {
		fs.add(c.ID.V, name, 0, "K", d.path, "the load does not drive beyond this limit: it settles at "+Degrees(d.settles))
		return
	}
	if !d.offKnown || (d.off < at.V) != (d.settles > at.V) {
		open("process.settles_off", "where the process comes from is not on the sheet, or lies beyond the limit")
		return
	}
	lag, lagFrom, ok := b.elementLag(c)
	if !ok {
		open(c.Lag.Path, "neither the sheet nor the catalogue gives the lag of "+c.Element.V)
		return
	}
	o, err := thermal.Cut{
		Process: thermal.Process{On: d.settles, Off: d.off, Tau: d.tau, Dead: d.dead},
		Sensing: thermal.Sensing{Lag: lag}, Trip: at.V, From: d.off,
	}.Overshoot()
	switch {
	case err != nil:
		open(d.path, err.Error())
	case o.Outcome != thermal.Reached:
		open(d.path, o.Because)
	default:
		fs.add(c.ID.V, name, o.Beyond, "K", d.path, fmt.Sprintf("load on for good, settling at %s, time constant %s; lag %s (%s): %s",
			Degrees(d.settles), Span(d.tau), Span(lag), lagFrom, o.Because))
	}
}

// overshootBound notes what the measured rise says about an overshoot where it
// is not known where the load settles.
func (b *builder) overshootBound(c *survey.Control) {
	m := b.model
	lag, lagFrom, ok := b.elementLag(c)
	if m == nil || !ok || math.IsNaN(m.FastestOn) || (m.FastestOn > 0) != (c.Action.V == survey.BreaksOnRise) {
		return
	}
	o, err := thermal.OvershootOfRise(m.FastestOn, lag, m.Process.Dead, c.BreaksAt.V, b.vented())
	if err == nil {
		b.spec.Figures.add(c.ID.V, "overshoot_as_measured", o.Beyond, "K", m.Path, fmt.Sprintf("%s; lag from %s", o.Because, lagFrom))
	}
}

// elementLag is the sensing lag of an old element: as the sheet has it, else
// the longest that is usual for it.
func (b *builder) elementLag(c *survey.Control) (seconds float64, from string, ok bool) {
	if c.Lag.Set {
		return c.Lag.V, c.Lag.Path, true
	}
	e, found := b.spec.Catalogue.Element(c.Element.V)
	if !found {
		return 0, "", false
	}
	lag, found := e.Lag(b.survey.Equipment.Medium.V)
	return lag.To, "the longest usual for " + c.Element.V + ", " + lag.Source.String(), found
}

// margins compares, for every danger that is a temperature, how far the medium
// can move before a bad probe is declared with how far away the danger is.
func (b *builder) margins() {
	for _, x := range b.survey.Dangers {
		limit := x.Above
		if x.Below.Set {
			limit = x.Below
		}
		if !limit.Set {
			continue
		}
		for _, c := range b.survey.Controls {
			if b.translated(c) && c.Plan.V == survey.Replace && c.Switching() && c.Duty.V == survey.Operating && b.spec.Chains[c.Sensor.V] != nil {
				b.margin(x, limit, c)
				break
			}
		}
	}
}

func (b *builder) margin(x *survey.Danger, limit survey.Field[float64], c *survey.Control) {
	fs := &b.spec.Figures
	makes, edge := b.wanted(c)
	if x.Below.Set == (c.Action.V == survey.BreaksOnRise) {
		edge = makes
	}
	fs.add(x.ID.V, "margin_to_danger", math.Abs(limit.V-edge), "K", limit.Path, fmt.Sprintf("from %s of %s to %s", Degrees(edge), c.ID.V, Degrees(limit.V)))
	d, reason := b.worstDrive(edge)
	if reason != "" {
		fs.open(x.ID.V, "rise_before_fault", "K", theProcess, reason)
		return
	}
	s := b.sensor(c.Sensor.V)
	wait := s.FaultAfter.V + 3*b.step + s.Lag.V + d.dead
	fs.add(x.ID.V, "rise_before_fault", math.Abs(d.slope(edge))*wait, "K", d.path,
		fmt.Sprintf("|%s − %s| / %s × (fault_after %s + three steps + lag %s + dead time %s)", Degrees(d.settles), Degrees(edge), Span(d.tau), Span(s.FaultAfter.V), Span(s.Lag.V), Span(d.dead)))
}

func (b *builder) sensor(id string) *survey.Sensor {
	for _, s := range b.survey.Electronics.Sensors {
		if s.ID.V == id {
			return s
		}
	}
	return &survey.Sensor{}
}

// comesUp runs the finished program from bad memories and notes, for every
// limit with a manual reset, whether it comes up tripped from all of them.
func (b *builder) comesUp() {
	run := b.spec.Program.NewRun()
	n := len(b.spec.Program.Survivors())
	bad := []*logic.Record{nil, {Values: make([]int64, n)}, {Values: make([]int64, n), Check: 0xFFFF}}
	for _, c := range b.survey.Controls {
		k := b.plan.Contacts[c.ID.V]
		if k == nil || !k.Latches || c.Reset.V != survey.ResetManual {
			continue
		}
		tripped := 1.0
		for _, r := range bad {
			run.Start(r)
			if run.Get(k.State) != latchTripped {
				tripped = 0
			}
		}
		b.spec.Figures.add(c.ID.V, "comes_up_tripped", tripped, "", c.Reset.Path, "program started without a record, with a blank one and with a wrong check word; 1: tripped after each")
	}
}
