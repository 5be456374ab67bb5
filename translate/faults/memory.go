package faults

import (
	"fmt"

	"makebreak/survey"
	"makebreak/translate"
	"makebreak/translate/logic"
)

// memory tells what becomes of a trip: over a power cut, with a bad memory,
// with the button held in.
func (a *assessor) memory(l *translate.Switched, k *translate.Contact, function string) {
	id, load := k.Control.ID.V, l.Load.ID.V
	b, ok := a.brought(load, true)
	if !ok {
		return
	}
	safeOn := l.Load.SafeState.V.Energised()
	tripped := b.fork()
	tripped.trip(k)
	n, acted := tripped.until(load, safeOn, settling(a.spec))
	if !acted {
		e := end{wrong, fmt.Sprintf("does not act within %s", translate.Span(a.seconds(n)))}
		a.add(function, id, "temperature beyond the trip", end{works, "trips"}, e, withHardware(a.spec, l, e, false), "program run beyond the trip")
		return
	}
	manual := k.Control.Reset.V == survey.ResetManual
	before := end{works, "the mechanical latch needs no supply: still tripped"}
	if !manual {
		before = end{works, "reset by the power cut, as before"}
	}
	cut := tripped.fork()
	rec := cut.run.Remember()
	if a.spec.Survey.Electronics.Nonvolatile.V == "true" {
		cut.run.Start(&rec)
	} else {
		cut.run.Start(nil)
	}
	cut.cool(k)
	a.add(function, id, "power cut after a trip", before, a.heldOff(l, cut, manual), a.heldOff(l, cut.fork(), manual), "program run: tripped, cooled, started again with its record")

	bad := tripped.fork()
	rec.Check++
	bad.run.Start(&rec)
	bad.cool(k)
	a.add(function, id, "memory blank or wrong after a power cut", before, a.heldOff(l, bad, manual), a.heldOff(l, bad.fork(), manual), "program run: started with a wrong check word")

	if k.Reset != nil {
		held := b.fork()
		held.set(k.Reset.Name, 1)
		held.steps(2)
		held.trip(k)
		held.steps(4)
		text := end{unsure, "unknown: the sheet does not say whether it was trip-free"}
		if k.Control.TripFree.Set {
			text = end{works, "trip-free: tripped all the same"}
			if !k.Control.TripFree.V {
				text = end{wrong, "could be held in"}
			}
		}
		a.add(function, id, "reset button held in or stuck", text, a.heldOff(l, held, true), a.heldOff(l, held.fork(), true), "program run with the button pressed all the time")
	}
	e := end{wrong, "the program cannot trip while it has no supply; it comes up tripped where the temperature has not come back"}
	a.add(function, id, "temperature goes beyond while the supply is off (stored heat, solid fuel)", end{works, "the old part tripped with no supply"}, e, withHardware(a.spec, l, e, false), "construction: the program needs its supply")
}

// trip takes the probe of a limit beyond its trip; cool takes it back beyond
// the reset threshold.
func (b *bench) trip(k *translate.Contact) { b.warm(k.Probe.Sensor.ID.V, beyond(k, true)) }
func (b *bench) cool(k *translate.Contact) { b.warm(k.Probe.Sensor.ID.V, beyond(k, false)) }

func beyond(k *translate.Contact, acted bool) float64 {
	makes, breaks := k.Control.MakesAt.V, k.Control.BreaksAt.V
	step := 2.0
	if makes > breaks {
		step = -step
	}
	if acted != k.Acts {
		return breaks + step
	}
	return makes - step
}

// heldOff runs on and sees whether the load stays in its safe state.
func (a *assessor) heldOff(l *translate.Switched, b *bench, should bool) end {
	safeOn := l.Load.SafeState.V.Energised()
	n, left := b.until(l.Load.ID.V, !safeOn, settling(a.spec))
	switch {
	case !left:
		return end{works, "still tripped: stays " + stateWord(l, safeOn)}
	case !should:
		return end{works, "ready again after the power cut, as before"}
	}
	return end{wrong, fmt.Sprintf("comes back by itself after %s: the trip is lost", translate.Span(a.seconds(n)))}
}

// flipped upsets every variable of the program in turn, with the load in its
// safe state and its controls satisfied, and reads off the worst that happens.
func (a *assessor) flipped(l *translate.Switched) (end, string) {
	id := l.Load.ID.V
	safeOn := l.Load.SafeState.V.Energised()
	b, ok := a.brought(id, safeOn)
	if !ok {
		return end{unsure, "unknown: the program could not be brought to its safe state"}, "program run"
	}
	start := b.run.Snapshot(nil)
	worst, culprit, tried := 0, "", 0
	horizon := min(settling(a.spec), longest)
	for i, v := range a.spec.Program.State {
		for _, value := range upsets(v, start[i]) {
			tried++
			f := b.fork()
			s := append([]int64(nil), start...)
			s[i] = value
			f.run.Restore(s)
			if n := wrongFor(f, id, safeOn, horizon); n > worst {
				worst, culprit = n, v.Name
			}
		}
	}
	how := fmt.Sprintf("program run with each of %d variables upset in turn, %d upsets", len(a.spec.Program.State), tried)
	switch {
	case worst == 0:
		return end{safe, "the load does not leave its safe state"}, how
	case worst >= horizon:
		return end{wrong, "may leave its safe state and stay so (" + culprit + ")"}, how
	}
	return end{bounded, fmt.Sprintf("at worst %s for %s (%s)", stateWord(l, !safeOn), translate.Span(a.seconds(worst)), culprit)}, how
}

// upsets lists values that single flipped bits make of a variable. Bits beyond
// its range are upsets too; the machines send those to their safe state.
func upsets(v *logic.Var, now int64) []int64 {
	if v.Kind == logic.Bool {
		return []int64{1 - now}
	}
	var out []int64
	for bit := int64(1); bit <= max(v.Range.Hi, 255) && bit <= 1<<15; bit <<= 1 {
		out = append(out, now^bit)
	}
	return out
}

func wrongFor(b *bench, load string, safeOn bool, horizon int) int {
	last := 0
	for n := 1; n <= horizon; n++ {
		b.step()
		if b.on(load) != safeOn {
			last = n
		} else if n > last+40 {
			break
		}
	}
	return last
}
