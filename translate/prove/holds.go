package prove

import (
	"fmt"
	"slices"

	"makebreak/translate/logic"
)

// Result is what a search for broken properties has found.
type Result struct {
	Steps  int               // steps of the program that were run
	Broken []*Counterexample // in the order of Program.Never
}

// String says what was found and claims no more.
func (r Result) String() string {
	if len(r.Broken) == 0 {
		return fmt.Sprintf("not broken in %d steps", r.Steps)
	}
	b := r.Broken[0]
	return fmt.Sprintf("%s: broken after %d steps", b.Property.Name, b.Vector.Length())
}

// Holds searches for sequences that break the properties of the program, for
// the whole of the budget. That none was found is no proof.
func Holds(c *logic.Checked, budget Budget) Result {
	if len(c.Never) == 0 {
		return Result{}
	}
	s := newSearch(c, budget.steps())
	s.patience = s.budget
	s.run()
	r := Result{Steps: s.spent}
	for _, p := range c.Never {
		for _, v := range s.violated {
			if v.property == p {
				r.Broken = append(r.Broken, s.shortest(v))
			}
		}
	}
	return r
}

// counterexample gives the first property of the program that was broken.
func (s *search) counterexample() *Counterexample {
	if len(s.violated) == 0 {
		return nil
	}
	return s.shortest(s.violated[0])
}

// shortest shortens the way to a violation as far as leaving out legs and
// steps will do it.
func (s *search) shortest(v *violation) *Counterexample {
	root, way := wayTo(v.at)
	t := &trial{run: alone(s.c, v.property), record: root.record}
	if n, ok := t.breaks(way); ok {
		way = cutTo(way, n)
	}
	for shorter := true; shorter; {
		shorter = false
		for i := 0; i < len(way); i++ {
			for _, steps := range []int{0, 1, way[i].steps / 2, way[i].steps - 1} {
				if steps >= way[i].steps {
					continue
				}
				other := slices.Clone(way)
				other[i].steps = steps
				if n, ok := t.breaks(other); ok {
					way = cutTo(other, n)
					shorter = true
					break
				}
			}
		}
	}
	return &Counterexample{Property: v.property, Vector: s.recorded(&draft{record: root.record, legs: way})}
}

// mostTrial bounds the steps spent on shortening.
const mostTrial = 2_000_000

type trial struct {
	run    *logic.Run
	record *logic.Record
	spent  int
}

// alone makes a run that watches one property only.
func alone(c *logic.Checked, p *logic.Property) *logic.Run {
	k, q := *c, *c.Program
	q.Never = []*logic.Property{p}
	k.Program = &q
	return k.NewRun()
}

// breaks reports after how many steps the legs break the property.
func (t *trial) breaks(way []leg) (steps int, ok bool) {
	if t.spent > mostTrial {
		return 0, false
	}
	t.run.Start(t.record)
	for _, l := range way {
		for range l.steps {
			t.run.Step(l.inputs)
			steps++
			t.spent++
			if t.run.Violated() != nil {
				return steps, true
			}
		}
	}
	return steps, false
}

// cutTo is the first steps of a way.
func cutTo(way []leg, steps int) []leg {
	var out []leg
	for _, l := range way {
		if l.steps = min(l.steps, steps); l.steps > 0 {
			out = join(out, l)
			steps -= l.steps
		}
	}
	return out
}
