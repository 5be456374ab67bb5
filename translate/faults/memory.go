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
		a.add(function, id, "temperature beyond the trip", end{works, "trips"}, e, a.withHardware(l, e, false), "program run beyond the trip")
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
	cut.call()
	a.add(function, id, "power cut after a trip", before, a.heldOff(l, cut, manual), a.heldOff(l, cut.fork(), manual), "program run: tripped, everything calling for the load again, started with its record")

	bad := tripped.fork()
	rec.Check++
	bad.run.Start(&rec)
	bad.call()
	a.add(function, id, "memory blank or wrong after a power cut", before, a.heldOff(l, bad, manual), a.heldOff(l, bad.fork(), manual), "program run: started with a wrong check word")

	if k.Reset != nil {
		held := b.fork()
		held.set(k.Reset.Name, 1)
		held.steps(2)
		held.trip(k)
		held.steps(4)
		held.call() // cool again, and the button still in
		text := end{unsure, "unknown: the sheet does not say whether it was trip-free"}
		if k.Control.TripFree.Set {
			text = end{works, "trip-free: tripped all the same"}
			if !k.Control.TripFree.V {
				text = end{wrong, "could be held in"}
			}
		}
		a.add(function, id, "reset button held in or stuck", text, a.heldOff(l, held, true), a.heldOff(l, held.fork(), true), "program run: tripped and everything calling again, with the button pressed all the time")
	}
	e := end{wrong, "the program cannot trip while it has no supply; it comes up tripped where the temperature has not come back"}
	a.add(function, id, "temperature goes beyond while the supply is off (stored heat, solid fuel)", end{works, "the old part tripped with no supply"}, e, a.withHardware(l, e, false), "construction: the program needs its supply")
}

// trip takes the probe of a limit beyond its trip, and remembers the inputs of
// before; call brings those back, with which the load was on, so that nothing
// but the trip keeps it off.
func (b *bench) trip(k *translate.Contact) {
	b.calling = append([]int64(nil), b.in...)
	b.warm(k.Probe.Sensor.ID.V, beyond(k))
}

func (b *bench) call() { copy(b.in, b.calling) }

// beyond is a temperature at which a limit acts.
func beyond(k *translate.Contact) float64 {
	acts, other := k.Control.BreaksAt.V, k.Control.MakesAt.V
	if k.Acts {
		acts, other = other, acts
	}
	if acts > other {
		return acts + 2
	}
	return acts - 2
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

// flipped upsets every variable of the program in turn and reads off the worst
// that happens: with the load in its safe state and its controls satisfied, or,
// for a limit, tripped, cooled, and with everything else calling for the load.
func (a *assessor) flipped(l *translate.Switched, k *translate.Contact) (end, string) {
	id := l.Load.ID.V
	safeOn := l.Load.SafeState.V.Energised()
	from := "from its safe state with its controls satisfied"
	b, ok := a.brought(id, safeOn)
	quiet := proving(a.spec) + 10
	if k.Latches {
		from, quiet = "from its trip, cooled, with the rest calling for the load", settling(a.spec)
		if b, ok = a.brought(id, !safeOn); ok {
			b.trip(k)
			_, ok = b.until(id, safeOn, settling(a.spec))
			b.call()
			b.steps(settling(a.spec))
			ok = ok && b.on(id) == safeOn
		}
	}
	if !ok {
		return end{unsure, "unknown: the program could not be brought to the state to start from"}, "program run"
	}
	start := b.run.Snapshot(nil)
	worst, culprit, tried := 0, "", 0
	horizon := min(settling(a.spec), longest) + quiet
	for i, v := range a.spec.Program.State {
		for _, value := range upsets(v, start[i]) {
			tried++
			f := b.fork()
			s := append([]int64(nil), start...)
			s[i] = value
			f.run.Restore(s)
			if n := wrongFor(f, id, safeOn, horizon, quiet); n > worst {
				worst, culprit = n, v.Name
			}
		}
	}
	how := fmt.Sprintf("program run %s, each of %d variables upset in turn, %d upsets; other states were not tried", from, len(a.spec.Program.State), tried)
	switch {
	case worst == 0:
		return end{safe, "the load does not leave its safe state"}, how
	case worst >= horizon-quiet:
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

// wrongFor is the last step in which the load is out of its safe state; it looks
// on until the load has been in it for a while.
func wrongFor(b *bench, load string, safeOn bool, horizon, quiet int) int {
	last := 0
	for n := 1; n <= horizon; n++ {
		b.step()
		if b.on(load) != safeOn {
			last = n
		} else if n > last+quiet {
			break
		}
	}
	return last
}
