package faults

import (
	"fmt"

	"makebreak/translate"
)

// pulser tells of a device that makes and breaks by itself.
func (a *assessor) pulser(l *translate.Switched, g *translate.Pulser) {
	c := g.Control
	function := "flashes " + l.Load.ID.V
	if g.On == nil {
		function = "gives " + l.Load.ID.V + " the share that its dial says"
	}
	if c.Lamps.OutRate.Set {
		a.lampOut(l, g, function)
	}
	if g.Dial != nil {
		a.regulatorDial(l, g, function)
	}
	old := end{wrong, "the old part welds or burns out as well (common practice)"}
	weld := weldedEnd(l, !l.Load.SafeState.V.Energised())
	a.add(function, c.ID.V, "contact of the new output welds, or its switch shorts", a.withHardware(l, old, true), weld, a.withHardware(l, weld, true), "sheet: kind of output, read_back")
	stop := a.stopped(l)
	a.add(function, c.ID.V, "program stops with the output on", end{works, "there was no program to stop"}, stop, a.withHardware(l, stop, false), "sheet: watchdog and drive of the output")
	a.close()
}

// lampOut takes a lamp out and reads off the period.
func (a *assessor) lampOut(l *translate.Switched, g *translate.Pulser, function string) {
	c := g.Control
	before := end{works, fmt.Sprintf("changes to %.3g a minute: the driver is told", 60*c.Lamps.OutRate.V)}
	now, how := end{wrong, "goes on at its ordinary rate: nobody is told"}, "construction: no current is sensed, or it does not tell the lamps apart"
	if g.LampOut != nil {
		how = "program run with the current of one lamp less"
		b := newBench(a.spec, a.run.Fork())
		b.steps(proving(a.spec))
		b.permit(l.Load.ID.V)
		b.set(g.Probe.Sensor.ID.V, max(g.Threshold-1, 0))
		b.steps(int(4 * g.Period.Value))
		if p := b.periodOf(l.Load.ID.V, int(4*g.Period.Value)); p > 0 {
			now = end{works, fmt.Sprintf("changes to %.3g a minute", 60/a.seconds(p))}
		}
	}
	a.add(function, c.ID.V, "one lamp out", before, now, now, how)
	if g.Probe == nil {
		return
	}
	open, _, _ := circuits(a.spec, g.Probe.Sensor)
	e := end{unsure, "unknown: what an open circuit reads is not on the sheet"}
	if open.known {
		e = end{bounded, "flashes on; a failed lamp is no longer told apart"}
	}
	a.add(function, c.ID.V, "current sensor open", end{works, "the old part sensed the current with its own heater"}, e, e, "front end of the sensor")
}

// periodOf is the time from one make of a load to the next, in steps; 0 where
// there is none within n.
func (b *bench) periodOf(load string, n int) int {
	was, first := b.on(load), -1
	for i := range n {
		b.step()
		on := b.on(load)
		if on && !was {
			if first >= 0 {
				return i - first
			}
			first = i
		}
		was = on
	}
	return 0
}

// regulatorDial takes the wiper off an energy regulator's dial.
func (a *assessor) regulatorDial(l *translate.Switched, g *translate.Pulser, function string) {
	b := newBench(a.spec, a.run.Fork())
	b.steps(proving(a.spec))
	b.permit(l.Load.ID.V)
	b.set(g.Dial.Raw.Name, g.Dial.Marked)
	b.steps(int(g.Period.Value))
	b.set(g.Dial.Raw.Name, 0)
	b.steps(int(2 * g.Period.Value))
	now := end{wrong, "goes on as it was set"}
	on := b.on(l.Load.ID.V)
	for range int(g.Period.Value) {
		b.step()
		on = on || b.on(l.Load.ID.V)
	}
	if !on {
		now = end{safe, "goes and stays " + stateWord(l, false) + ", and reports it"}
	}
	before := end{unsure, "unknown: a knob that slips on its spindle leaves the old part as it was set"}
	a.add(function, g.Control.ID.V, "wiper, track or wire of the dial broken", before, now, now, "program run with the dial's input at 0")
}

// monitored tells of what the program says about a part that stays; whatever
// it says reaches no load.
func (a *assessor) monitored(m *translate.Monitored) {
	c := m.Control
	function := "tells of " + c.ID.V
	before := end{wrong, "nobody was told"}
	same := end{works, "is told of by a fault bit; no load hangs on it"}
	switch {
	case m.Flame != nil:
		a.add(function, c.ID.V, "its thermocouple grows weak", before, same, same, "construction: its voltage is compared with the middle of holding and letting go")
	case m.Image != nil:
		a.add(function, c.ID.V, "the motor draws so much that it is about to act", before, same, same, "construction: first-order image of the square of the current")
	}
	if m.Tripped != nil {
		a.add(function, c.ID.V, "it trips", before, end{works, "is told of, and counted"}, end{works, "is told of, and counted"}, "construction: "+c.ReadBy.V)
	}
	if m.Late != nil {
		a.add(function, c.ID.V, "it ought to have acted and has not", before, same, same, "construction: the reading beyond its trip for longer than its lag and a minute")
	}
	a.close()
}
