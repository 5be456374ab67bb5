package prove

import (
	"strings"
	"testing"

	"makebreak/translate/logic"
)

// spoilt is the calorifier with one condition taken out of one guard of the
// machine of its heater.
func spoilt(t *testing.T, change func(heater *logic.Machine)) *logic.Checked {
	p := calorifier(120, 240)
	for i, b := range p.Order {
		if m, ok := b.(*logic.Machine); ok && m.Var.Name == "heater_state" {
			c := copied(m)
			change(c)
			p.Order[i] = c
		}
	}
	return checked(t, p)
}

func TestHoldsFindsWhatIsBroken(t *testing.T) {
	for _, c := range []struct {
		name     string
		change   func(*logic.Machine)
		property string
		atLeast  int // steps that no sequence can do without
		atMost   int
	}{
		// Off for 240 steps from the start comes first, then the trip.
		{"a trip does not stop the heater", func(m *logic.Machine) {
			m.At[1].Goes[0].When = logic.Not(logic.Use(flowOf(m)))
		}, "hot_while_tripped", 241, 245},
		{"the flow is not asked for any more once on", func(m *logic.Machine) {
			m.At[1].Goes = m.At[1].Goes[1:]
		}, "hot_without_flow", 241, 242},
	} {
		t.Run(c.name, func(t *testing.T) {
			k := spoilt(t, c.change)
			r := Holds(k, Budget{})
			var found *Counterexample
			for _, b := range r.Broken {
				if b.Property.Name == c.property {
					found = b
				}
			}
			if found == nil {
				t.Fatalf("%s not found broken: %s", c.property, r)
			}
			replay(t, k, found.Vector)
			run := alone(k, found.Property)
			run.Start(found.Vector.Start)
			steps, broken := 0, 0
			for _, row := range found.Vector.Rows {
				for range row.Steps {
					run.Step(row.Inputs)
					steps++
					if run.Violated() != nil {
						broken = steps
					}
				}
			}
			if broken != steps {
				t.Errorf("the sequence of %d steps does not end in the violation (last at %d)", steps, broken)
			}
			if steps < c.atLeast || steps > c.atMost {
				t.Errorf("broken after %d steps; worked out by hand: %d to %d", steps, c.atLeast, c.atMost)
			}
			if tour := Visit(k, Budget{}); tour.Broken == nil {
				t.Error("Visit did not tell of the broken property")
			}
		})
	}
}

// flowOf finds the flow signal in the guards of the heater.
func flowOf(m *logic.Machine) *logic.Var {
	var flow *logic.Var
	m.At[1].Goes[0].When.Walk(func(e *logic.Expr) {
		if e.Var != nil && e.Var.Name == "flow_proven" {
			flow = e.Var
		}
	})
	return flow
}

func TestHoldsClaimsNoProof(t *testing.T) {
	r := Holds(checked(t, calorifier(120, 240)), Budget{Steps: 5000})
	if len(r.Broken) > 0 {
		t.Fatalf("%s", r)
	}
	if !strings.HasPrefix(r.String(), "not broken in ") || r.Steps < 5000 {
		t.Errorf("it says %q after %d steps", r, r.Steps)
	}
}

// TestWatchedProperty: properties may keep variables of their own, with the
// same names as others.
func TestWatchedProperty(t *testing.T) {
	p := calorifier(120, 240)
	out := p.Outputs[0]
	for _, name := range []string{"on_for_one_step", "on_for_two_steps"} {
		was := truth("was_on", 0)
		bad := logic.And(logic.Prev(was), logic.Not(logic.Use(out)))
		now := truth(name+"_now", 0)
		p.Never = append(p.Never, &logic.Property{Name: name, Kept: []*logic.Var{was},
			Watch: []logic.Block{&logic.Define{Var: now, As: bad}, &logic.Set{Var: was, To: logic.Use(out)}}, Bad: logic.Use(now)})
	}
	r := Holds(checked(t, p), Budget{})
	if len(r.Broken) != 2 {
		t.Errorf("%d properties broken, want the two that no heater can keep: %s", len(r.Broken), r)
	}
	for _, b := range r.Broken {
		if n := b.Vector.Length(); n != 241 {
			t.Errorf("%s: after %d steps, want 241 (240 off, one on)", b.Property.Name, n)
		}
	}
}
