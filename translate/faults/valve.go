package faults

import (
	"fmt"

	"makebreak/survey"
	"makebreak/survey/catalogue"
	"makebreak/translate"
)

// valve tells of a load that takes any position: what it does when its sensor,
// its actuator, the program or the supply fails.
func (a *assessor) valve(v *translate.Valve) {
	c := v.By.Control
	l := &translate.Switched{Load: v.Load, Output: v.Output} // for what is asked of any load
	function := fmt.Sprintf("moves %s with temperature", v.Load.ID.V)
	for _, f := range sensorFaults(a.spec, v.By.Probe) {
		if f.drift {
			now := end{bounded, fmt.Sprintf("holds a temperature that is %s off; nothing notices", translate.Kelvins(driftOf))}
			a.add(function, c.ID.V, f.cause, oldDrift(a, l, nil), now, a.withHardware(l, now, false), "construction: the reading is all that the control has")
			continue
		}
		now, how := a.positionWith(v, f)
		old := a.oldValve(l, c)
		if f.cause == "reading stands still (old: element sticks)" {
			old = end{wrong, "an element or a stem that sticks leaves the valve where it was (common practice)"}
		}
		a.add(function, c.ID.V, f.cause, a.withHardware(l, old, false), now, a.withHardware(l, now, false), how)
	}
	stuck := end{wrong, "stays where it is, and the program does not see it: nothing tells it where the stem stands"}
	oldStuck := end{wrong, "the old stem stuck too (common practice)"}
	a.add(function, c.ID.V, "actuator or stem sticks", a.withHardware(l, oldStuck, true), stuck, a.withHardware(l, stuck, true), "construction")
	stop := a.valveStopped(v)
	a.add(function, c.ID.V, "program stops with the output as it is", end{works, "there was no program to stop"}, stop, a.withHardware(l, stop, false), "sheet: watchdog")
	lost := powerLoss(v.Load)
	a.add(function, c.ID.V, "supply of actuator and electronics is lost", end{works, "the old valve needed no supply"}, lost, a.withHardware(l, lost, false), "sheet: actuator.on_power_loss and safe_state")
	a.close()
}

// positionWith puts a fault into the running program with the valve half way,
// and reads off where it goes.
func (a *assessor) positionWith(v *translate.Valve, f sensorFault) (end, string) {
	b := newBench(a.spec, a.run.Fork())
	for _, s := range a.spec.Survey.Electronics.Sensors {
		if a.spec.Plan.Sensors[s.ID.V] != nil {
			b.warm(s.ID.V, temperatures(a.spec, s.ID.V)[0])
		}
	}
	sensor := v.By.Probe.Sensor.ID.V
	if !b.warm(sensor, v.By.Control.DialMark().V) {
		return end{unsure, "unknown: the program could not be brought to hold it half way"}, "program run"
	}
	b.permitValve(v.Load)
	n := min(3*settling(a.spec)+travelSteps(a.spec, v.Load), longest)
	b.steps(n)
	truth := b.in[b.at[sensor]]
	last, settled := int64(-1), 0
	for i := 1; i <= longest; i++ {
		count, known := f.reads(b, v.By.Probe, i, truth)
		if !known {
			return end{unsure, "unknown: what it reads then is not on the sheet"}, "program run"
		}
		b.set(sensor, count)
		b.step()
		now := b.run.Get(v.Out)
		if now != last {
			last, settled = now, i
		}
		if i-settled > n {
			break
		}
	}
	how := fmt.Sprintf("program run with the fault put in, the valve half way, %d steps", settled+n)
	position := fmt.Sprintf("%s %.3g %% open", v.Load.ID.V, float64(last)/10)
	if last == v.Safe {
		return end{safe, fmt.Sprintf("goes %s, its safe state, within %s and stays so", v.Load.SafeState.V, translate.Span(a.seconds(settled+1)))}, how
	}
	return end{wrong, "ends with " + position + "; nothing in the control ends it"}, how
}

// permitValve puts every signal where the permit of a valve wants it.
func (b *bench) permitValve(l *survey.Load) {
	for _, n := range l.RunsWhen.V.Tree.Names() {
		if b.spec.Plan.Signals[n] == nil {
			continue
		}
		value := int64(0)
		if positive(l.RunsWhen.V.Tree, n, true) {
			value = 1
		}
		b.set(n, value)
	}
}

func travelSteps(spec *translate.Specification, l *survey.Load) int {
	if !l.Actuator.Travel.Set {
		return 0
	}
	return int(2 * l.Actuator.Travel.V * 1000 / float64(spec.Program.StepMS))
}

// oldValve is where the old valve went when its element failed: what the sheet
// says, else what the catalogue says of such elements.
func (a *assessor) oldValve(l *translate.Switched, c *survey.Control) end {
	what, why := c.OnElementFailure.V, "sheet"
	if what == "unknown" || what == "" {
		element, ok := a.spec.Catalogue.Element(c.Element.V)
		if !ok || len(element.Failures) == 0 {
			return end{unsure, "unknown: neither the sheet nor the catalogue says what " + c.Element.V + " does when it fails"}
		}
		for i, f := range element.Failures {
			does := catalogue.Reads(string(c.Action.V), f.Reads)
			if i > 0 && does != what {
				return end{unsure, "unknown: such an element fails either way (catalogue)"}
			}
			what = does
		}
		why = "catalogue"
	}
	switch what {
	case "opens", "closes":
		return staysIn(l, what == "opens", " ("+why+")")
	case "stays":
		return end{wrong, "stays where it was (" + why + "); nothing ends it"}
	}
	return end{unsure, "unknown (" + why + ")"}
}

func (a *assessor) valveStopped(v *translate.Valve) end {
	switch a.spec.Survey.Electronics.Watchdog.V {
	case "external", "internal":
		return end{bounded, fmt.Sprintf("stays where it is until the %s watchdog starts the board anew; its time is not on the sheet", a.spec.Survey.Electronics.Watchdog.V)}
	case "none":
		return end{wrong, "stays where it is; no watchdog ends it"}
	}
	return end{unsure, "unknown: the sheet does not say whether there is a watchdog"}
}

func powerLoss(l *survey.Load) end {
	goes := map[string]survey.State{"closes": survey.Closed, "opens": survey.Open}
	switch does := l.Actuator.OnPowerLoss.V; {
	case goes[does] == l.SafeState.V && does != "unknown" && does != "":
		return end{safe, does + ", its safe state"}
	case does == "closes" || does == "opens":
		return end{wrong, does + ", not its safe state; nothing ends it"}
	case does == "stays":
		return end{wrong, "stays where it was; nothing ends it"}
	}
	if l.Kind.V != "modulating_valve" {
		return end{unsure, "unknown: what it does without its signal is not on the sheet"}
	}
	return end{unsure, "unknown: on_power_loss of the actuator is not on the sheet"}
}

// indication tells of a dial thermometer that has become a display.
func (a *assessor) indication(n *translate.Indication) {
	c := n.Control
	function := "shows the temperature"
	dark := end{wrong, "shows nothing"}
	a.add(function, c.ID.V, "supply of the electronics is lost", end{works, "the old thermometer needed no supply"}, dark, dark, "construction")
	before := end{unsure, "unknown: what the old pointer does when its element fails is not on the sheet"}
	b := newBench(a.spec, a.run.Fork())
	open, _, _ := circuits(a.spec, n.Probe.Sensor)
	b.warm(n.Probe.Sensor.ID.V, temperatures(a.spec, n.Probe.Sensor.ID.V)[0])
	b.steps(settling(a.spec))
	now := end{unsure, "unknown: what it reads then is not on the sheet"}
	if open.known {
		b.set(n.Probe.Sensor.ID.V, open.value)
		b.steps(settling(a.spec))
		now = end{wrong, fmt.Sprintf("shows %d steps of %g K, which is no temperature", b.run.Get(n.Out), n.Unit)}
		if b.run.Get(n.Out) == n.Out.Range.Lo {
			now = end{safe, "shows that there is no reading"}
		}
	}
	a.add(function, c.ID.V, "sensor open, or its wire broken", before, now, now, "program run with the fault put in")
	a.close()
}
