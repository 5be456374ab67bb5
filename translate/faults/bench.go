package faults

import (
	"fmt"
	"strings"

	"makebreak/survey"
	"makebreak/translate"
	"makebreak/translate/logic"
)

// bench is a program with its inputs in our hands.
type bench struct {
	spec *translate.Specification
	run  *logic.Run
	in   []int64
	at   map[string]int // place of each input
	was  bool           // the load was out of its safe state when a fault was put in

	followers []follower
	calling   []int64 // the inputs before a trip
}

func newBench(spec *translate.Specification, run *logic.Run) *bench {
	b := &bench{spec: spec, run: run, in: make([]int64, len(spec.Program.Inputs)), at: map[string]int{}}
	for i, v := range spec.Program.Inputs {
		b.at[v.Name] = i
	}
	for _, l := range spec.Survey.Loads {
		if s := spec.Plan.Loads[l.ID.V]; s != nil && s.Seen != nil {
			b.followers = append(b.followers, follower{b.at[s.Seen.Name], s.Out})
		}
	}
	for _, k := range spec.Plan.Contacts {
		if k.Dial != nil {
			b.set(k.Dial.Raw.Name, k.Dial.Marked)
		}
	}
	for _, g := range spec.Plan.Pulsers {
		if g.Dial != nil {
			b.set(g.Dial.Raw.Name, g.Dial.Marked)
		}
	}
	for _, g := range spec.Plan.Regulators {
		if g.Dial != nil {
			b.set(g.Dial.Raw.Name, g.Dial.Marked)
		}
	}
	b.run.Start(nil)
	return b
}

func (b *bench) set(input string, value int64) {
	if i, ok := b.at[input]; ok {
		b.in[i] = value
	}
}

// warm puts a sensor at a temperature.
func (b *bench) warm(sensor string, temp float64) bool {
	count, err := b.spec.Count(sensor, temp)
	if err != nil {
		return false
	}
	b.set(sensor, count)
	return true
}

// steps runs the program, with the read-back contacts following.
func (b *bench) steps(n int) {
	for range n {
		b.step()
	}
}

func (b *bench) step() {
	b.run.Step(b.in)
	for _, f := range b.followers {
		b.in[f.at] = b.run.Get(f.out)
	}
}

// follower is a read-back contact: an input that does what an output says.
type follower struct {
	at  int
	out *logic.Var
}

func (b *bench) on(load string) bool { return b.run.Get(b.spec.Plan.Loads[load].Out) != 0 }

// until runs until the load is as wanted, at most n steps, and says after how many.
func (b *bench) until(load string, want bool, n int) (int, bool) {
	for i := 1; i <= n; i++ {
		b.step()
		if b.on(load) == want {
			return i, true
		}
	}
	return n, false
}

// fork is a second bench in the same state.
func (b *bench) fork() *bench {
	return &bench{spec: b.spec, run: b.run.Fork(), in: append([]int64(nil), b.in...), at: b.at, followers: b.followers, calling: b.calling}
}

// longest is how many steps a scenario may take.
const longest = 40_000

// settling is long enough for probes to prove themselves, contacts to settle,
// minimum times and run-ons to pass.
func settling(spec *translate.Specification) int {
	n := 60
	for _, c := range spec.Program.Consts {
		for _, suffix := range []string{"_MIN_ON", "_MIN_OFF", "_CLEAR_AFTER", "_PROVE_WITHIN", "_CONTACT_SETTLES", "_SAMPLE"} {
			if strings.HasSuffix(c.Name, suffix) {
				n = max(n, min(int(c.Value), longest)+20)
			}
		}
	}
	return n
}

// brought gives a bench on which a load is on, or off. Each is looked for once.
func (a *assessor) brought(load string, want bool) (*bench, bool) {
	key := fmt.Sprint(load, want)
	b, known := a.found[key]
	if !known {
		b, _ = a.bring(load, want)
		a.found[key] = b
	}
	if b == nil {
		return nil, false
	}
	return b.fork(), true
}

// bring finds a state in which a load is on, or off, with everything in
// order: signals permit, limits are reset, and the probes stand where their
// contacts say so.
func (a *assessor) bring(load string, want bool) (*bench, bool) {
	spec := a.spec
	l := spec.Plan.Loads[load]
	var sensors []string
	for _, p := range l.Probes {
		sensors = append(sensors, p.Sensor.ID.V)
	}
	choices := make([][]float64, len(sensors))
	for i, s := range sensors {
		choices[i] = temperatures(spec, s)
	}
	temps := map[string]float64{}
	var try func(i int) (*bench, bool)
	try = func(i int) (*bench, bool) {
		if i == len(sensors) {
			return attempt(newBench(spec, a.run.Fork()), load, want, temps)
		}
		for _, t := range choices[i] {
			temps[sensors[i]] = t
			if b, ok := try(i + 1); ok {
				return b, true
			}
		}
		return nil, false
	}
	return try(0)
}

// temperatures lists what is worth trying for a sensor: just beyond each edge
// of each control that it serves.
func temperatures(spec *translate.Specification, sensor string) []float64 {
	var ts []float64
	for _, c := range spec.Survey.Controls {
		if c.Sensor.V != sensor || !c.BreaksAt.Set || !c.MakesAt.Set {
			continue
		}
		beyond := 1.0
		if c.Action.V == survey.BreaksOnRise {
			beyond = -1
		}
		makes, breaks := c.MakesAt.V, c.BreaksAt.V
		if t, ok := spec.Thresholds[c.ID.V]; ok { // those of the program, which may have been matched
			makes, breaks = t.Make.SwitchesAt, t.Break.SwitchesAt
		}
		ts = append(ts, makes+beyond, breaks-beyond)
	}
	if len(ts) == 0 {
		ts = []float64{20}
	}
	return ts
}

func attempt(b *bench, load string, want bool, temps map[string]float64) (*bench, bool) {
	spec := b.spec
	for _, s := range spec.Survey.Electronics.Sensors {
		if _, given := temps[s.ID.V]; !given && spec.Plan.Sensors[s.ID.V] != nil {
			b.warm(s.ID.V, temperatures(spec, s.ID.V)[0])
		}
	}
	for s, t := range temps {
		if !b.warm(s, t) {
			return nil, false
		}
	}
	n := settling(spec)
	b.steps(proving(spec)) // signals are seen off, buttons released
	b.permit(load)
	for _, k := range spec.Plan.Contacts {
		if k.Reset != nil {
			b.set(k.Reset.Name, 1)
		}
	}
	b.steps(3)
	for _, k := range spec.Plan.Contacts {
		if k.Reset != nil {
			b.set(k.Reset.Name, 0)
		}
	}
	if !want {
		b.steps(n) // whatever would come on has had its time
		return b, !b.on(load)
	}
	_, ok := b.until(load, true, n)
	if ok {
		b.steps(4)
	}
	return b, ok && b.on(load)
}

// proving is long enough for the probes to prove themselves.
func proving(spec *translate.Specification) int {
	n := 20
	for _, c := range spec.Program.Consts {
		if strings.HasSuffix(c.Name, "_PROVE_WITHIN") {
			n = max(n, min(int(c.Value), longest)+10)
		}
	}
	return n
}

// permit puts every signal where the wiring of a load wants it.
func (b *bench) permit(load string) {
	var visit func(c *survey.Cond, positive bool)
	visit = func(c *survey.Cond, positive bool) {
		if c == nil {
			return
		}
		switch c.Op {
		case survey.CondName:
			if b.spec.Plan.Signals[c.Name] != nil {
				value := int64(0)
				if positive {
					value = 1
				}
				b.set(c.Name, value)
			}
			if l := b.spec.Plan.Loads[c.Name]; l != nil {
				visit(l.Load.RunsWhen.V.Tree, positive)
			}
		case survey.CondNot:
			visit(c.Args[0], !positive)
		default:
			for _, a := range c.Args {
				visit(a, positive)
			}
		}
	}
	visit(b.spec.Plan.Loads[load].Load.RunsWhen.V.Tree, true)
}
