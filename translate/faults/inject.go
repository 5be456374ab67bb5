package faults

import (
	"fmt"
	"math"

	"makebreak/survey"
	"makebreak/translate"
)

// sensorFault is something wrong with a sensor, as the program gets to see it.
type sensorFault struct {
	cause string
	reads func(b *bench, p *translate.Probe, step int, truth int64) (count int64, known bool)
	drift bool
	shift float64                                                            // K by which the reading is wrong
	old   func(a *assessor, l *translate.Switched, k *translate.Contact) end // what the old part did under the like of it
}

// driftOf is the drift that is put in, in K.
const driftOf = 5.0

// sensorFaults lists what can be wrong with the sensor of a control. What an
// open or a short reads follows from the front end.
func sensorFaults(spec *translate.Specification, p *translate.Probe) []sensorFault {
	open, short, ambient := circuits(spec, p.Sensor)
	fixed := func(c count) func(*bench, *translate.Probe, int, int64) (int64, bool) {
		return func(*bench, *translate.Probe, int, int64) (int64, bool) { return c.value, c.known }
	}
	fs := []sensorFault{
		{cause: "sensor open, or its wire broken (old: element fails)", reads: fixed(open), old: (*assessor).oldElement},
		{cause: "sensor shorted (old: element fails)", reads: fixed(short), old: (*assessor).oldElement},
		{cause: "sensor open in one sample of three (old: element fails)", reads: func(_ *bench, _ *translate.Probe, step int, truth int64) (int64, bool) {
			if step%3 == 0 {
				return open.value, open.known
			}
			return truth, true
		}, old: (*assessor).oldElement},
		{cause: "reading stands still (old: element sticks)", reads: func(_ *bench, _ *translate.Probe, _ int, truth int64) (int64, bool) { return truth, true }, old: oldStuck},
		{cause: "out of its pocket: reads the surroundings (old: bulb out of its pocket)", reads: fixed(ambient), old: oldOutOfPocket},
	}
	for _, k := range []float64{-driftOf, driftOf} {
		fs = append(fs, sensorFault{cause: fmt.Sprintf("reads %s too %s (old: element drifts)", translate.Kelvins(driftOf), map[bool]string{true: "cold", false: "hot"}[k < 0]), drift: true, shift: k, old: oldDrift})
	}
	return fs
}

func oldStuck(_ *assessor, l *translate.Switched, _ *translate.Contact) end {
	return end{wrong, "an element that sticks leaves the contact as it was; nothing in the control ends it (common practice)"}
}

func oldDrift(*assessor, *translate.Switched, *translate.Contact) end {
	return end{unsure, "unknown: the old element drifts too; how far is not known"}
}

// oldOutOfPocket: the old element felt the surroundings as well.
func oldOutOfPocket(a *assessor, l *translate.Switched, k *translate.Contact) end {
	c, t := k.Control, surroundings(a.spec.Survey)
	low, high := min(c.MakesAt.V, c.BreaksAt.V), max(c.MakesAt.V, c.BreaksAt.V)
	if t > low && t < high {
		return end{wrong, "its contact stays as it was, for the surroundings lie inside its differential"}
	}
	made := (t <= low) == (c.Action.V == survey.BreaksOnRise)
	on := made == positive(l.Load.RunsWhen.V.Tree, c.ID.V, true)
	return staysIn(l, on, fmt.Sprintf(": the old element felt %s", translate.Degrees(t)))
}

func surroundings(s *survey.Survey) float64 {
	if s.Process.Ambient.Set {
		return s.Process.Ambient.V
	}
	return 20
}

// count is a number that the converter reads; known is false where nobody can
// say which.
type count struct {
	value int64
	known bool
}

// circuits gives what the converter reads with the sensor open, shorted (a
// transmitter: its wire off, joined to the supply) and at the temperature of
// the surroundings, as package sensing has it.
func circuits(spec *translate.Specification, s *survey.Sensor) (open, short, ambient count) {
	chain := spec.Chains[s.ID.V]
	for _, f := range chain.Failures() {
		c := count{f.Count, f.Known}
		switch f.What {
		case "open", "wire off":
			open = c
		case "short", "short to the supply":
			short = c
		}
	}
	n, err := spec.Count(s.ID.V, surroundings(spec.Survey))
	ambient = count{n, err == nil}
	switch s.Kind.V {
	case "type_k", "type_j", "type_t":
		short = ambient // shorted in its cable it reads the place of the short
	case "digital":
		open = count{-32768, true} // the port says so where nothing new has come
	}
	return open, short, ambient
}

// inject puts a fault into the running program, once with the load on and once
// with it off, and reads off the worse end.
func (a *assessor) inject(l *translate.Switched, k *translate.Contact, f sensorFault) (end, string) {
	if f.drift {
		return a.drifting(l, k, f)
	}
	id := l.Load.ID.V
	result := end{works, ""}
	how := ""
	tried := 0
	for _, on := range []bool{true, false} {
		b, ok := a.brought(id, on)
		if !ok {
			continue
		}
		tried++
		b.was = on != l.Load.SafeState.V.Energised()
		e, steps := a.withFault(l, k, f, b)
		if tried == 1 || e.grade > result.grade {
			result = e
		}
		how = fmt.Sprintf("program run with the fault put in, up to %d steps", steps)
	}
	if tried == 0 {
		return end{unsure, "unknown: the program could not be brought to switch the load"}, "program run"
	}
	return result, how
}

// withFault runs with the fault until the load has come to its safe state and
// stayed there, or nothing changes any more.
func (a *assessor) withFault(l *translate.Switched, k *translate.Contact, f sensorFault, b *bench) (end, int) {
	id, sensor := l.Load.ID.V, k.Probe.Sensor.ID.V
	safeOn := l.Load.SafeState.V.Energised()
	truth := b.in[b.at[sensor]]
	horizon := min(horizonOf(a.spec, l), longest)
	wrongFor, reached, settled := 0, 0, settling(a.spec)
	load := a.spec.Plan.Loads[id].Out
	for n := 1; n <= horizon; n++ {
		count, known := f.reads(b, k.Probe, n, truth)
		if !known {
			return end{unsure, "unknown: what it reads then is not on the sheet"}, n
		}
		b.set(sensor, count)
		b.step()
		if (b.run.Get(load) != 0) != safeOn {
			wrongFor, reached = n, 0
			continue
		}
		if reached++; reached > settled {
			return a.ended(l, b.was, wrongFor), n
		}
	}
	if reached > 0 {
		return a.ended(l, b.was, wrongFor), horizon
	}
	return end{wrong, fmt.Sprintf("stays %s; nothing in the control ends it within %s", stateWord(l, !safeOn), translate.Span(a.seconds(horizon)))}, horizon
}

// ended words the end in the safe state; harmful tells that the load was not
// in it when the fault began.
func (a *assessor) ended(l *translate.Switched, harmful bool, steps int) end {
	word := stateWord(l, l.Load.SafeState.V.Energised())
	switch {
	case steps == 0 && harmful:
		return end{safe, "goes " + word + ", its safe state, in the same step and stays so"}
	case steps == 0:
		return end{safe, "is and stays " + word + ", its safe state"}
	}
	return end{safe, fmt.Sprintf("goes %s, its safe state, after %s and stays so", word, translate.Span(a.seconds(steps+1)))}
}

// horizonOf is long enough for the slowest supervision of a load.
func horizonOf(spec *translate.Specification, l *translate.Switched) int {
	n := settling(spec) * 3
	if l.NoEffect != nil {
		for _, v := range spec.Program.State {
			if v.Name == l.Load.ID.V+"_effect_for" {
				n = max(n, int(v.Range.Hi)+settling(spec)*2)
			}
		}
	}
	return n
}

// drifting moves the true temperature slowly through the edge at which the
// control acts, with the reading wrong, and reads off where it acts.
func (a *assessor) drifting(l *translate.Switched, k *translate.Contact, f sensorFault) (end, string) {
	if k.PID != nil {
		return end{bounded, fmt.Sprintf("holds a temperature that is %s off; nothing notices", translate.Kelvins(driftOf))}, "construction: the reading is all that the control has"
	}
	asked := actsAt(k)
	chain := a.spec.Chains[k.Probe.Sensor.ID.V]
	t := a.spec.Thresholds[k.Control.ID.V]
	h := t.Break
	if k.Acts {
		h = t.Make
	}
	reached := func(truth float64) bool {
		n, err := chain.Count(truth + f.shift)
		if err != nil {
			return false
		}
		if h.AtLeast {
			return n >= h.Counts
		}
		return n <= h.Counts
	}
	low, high := asked-3*driftOf, asked+3*driftOf
	if reached(low) == reached(high) {
		return end{unsure, "unknown: the edge lies outside what the sensor reads"}, "counts of the threshold"
	}
	for high-low > 0.01 {
		m := (low + high) / 2
		if reached(m) == reached(high) {
			high = m
		} else {
			low = m
		}
	}
	return end{bounded, fmt.Sprintf("acts at %s instead of %s; nothing notices", translate.Degrees(math.Round(high*10)/10), translate.Degrees(asked))}, "counts of the threshold at a reading that is wrong"
}
