package prove

import (
	"reflect"
	"slices"
	"sort"
	"strings"
	"testing"

	"makebreak/translate/logic"

	"pgregory.net/rapid"
)

func each(t *testing.T, f func(t *testing.T, c *logic.Checked)) {
	ps := programs()
	names := make([]string, 0, len(ps))
	for n := range ps {
		names = append(names, n)
	}
	sort.Strings(names)
	for _, n := range names {
		t.Run(n, func(t *testing.T) { f(t, checked(t, ps[n])) })
	}
}

// replay runs a vector step by step on a fresh run, without leaving any out,
// and fails where it does not do what the rows say.
func replay(t interface {
	Helper()
	Fatalf(string, ...any)
}, c *logic.Checked, v Vector) {
	t.Helper()
	r := c.NewRun()
	r.Start(v.Start)
	for i, row := range v.Rows {
		if row.Steps < 1 {
			t.Fatalf("row %d holds for %d steps", i, row.Steps)
		}
		for n := range row.Steps {
			r.Step(row.Inputs)
			want := row.Outputs
			if row.Then != nil && n%2 == 1 {
				want = row.Then
			}
			for k, o := range c.Outputs {
				if r.Get(o) != want[k] {
					t.Fatalf("row %d, step %d: %s is %d, recorded %d", i, n, o.Name, r.Get(o), want[k])
				}
			}
		}
		for k, s := range c.State {
			if r.Get(s) != row.State[k] {
				t.Fatalf("end of row %d: %s is %d, recorded %d", i, s.Name, r.Get(s), row.State[k])
			}
		}
	}
}

func TestRowsReplay(t *testing.T) {
	each(t, func(t *testing.T, c *logic.Checked) {
		tour := Visit(c, Budget{})
		for _, v := range tour.Vectors {
			replay(t, c, v)
		}
		if tour.Rows() > 600 {
			t.Errorf("%d rows; a person should be able to look through them", tour.Rows())
		}
		for _, u := range tour.Upsets {
			r := c.NewRun()
			r.Restore(u.State)
			r.Step(u.Inputs)
			if got := r.Snapshot(nil)[:len(c.State)]; !slices.Equal(got, u.After) {
				t.Errorf("upset of %s ends at %v, recorded %v", u.Machine, got, u.After)
			}
		}
	})
}

// anyProgram draws one of the programs with its times and limits at random.
func anyProgram(t *rapid.T) *logic.Program {
	switch rapid.IntRange(0, 4).Draw(t, "program") {
	case 0:
		return calorifier(rapid.Int64Range(1, 3000).Draw(t, "min on"), rapid.Int64Range(1, 3000).Draw(t, "min off"))
	case 1:
		return oven()
	case 2:
		return valve()
	case 3:
		return clockwork(rapid.Int64Range(1, 5).Draw(t, "by"), rapid.Int64Range(2, 40).Draw(t, "limit"))
	}
	every := rapid.Int64Range(64, 90000).Draw(t, "every")
	return defroster(every, rapid.Int64Range(1, every/2).Draw(t, "lasts"))
}

// clockwork has counters of every sort, made to trip up a leap: one that counts
// by more than one, one that is put to a number next to where it was, one that
// runs down, one that is copied, and two conditions that alternate.
func clockwork(by, limit int64) *logic.Program {
	p := &logic.Program{ID: "clockwork", StepMS: 100}
	raw, hold := number("raw", 0, 65535, 0), truth("hold", 0)
	p.Inputs = []*logic.Var{raw, hold}
	up, down, put, copied, toggle := number("up", 0, 1000, 0), number("down", 0, 1000, 1000), number("put", 0, 65535, 0), number("copied", 0, 1000, 0), truth("toggle", 0)
	k := constant(p, "LIMIT", limit)
	p.State = []*logic.Var{up, down, put, copied, toggle}
	slow := stepCounter(p, "slow", k, 0)
	out, half := truth("out", 0), number("half", 0, 1000, 0)
	p.Outputs = []*logic.Var{out, half}
	p.Order = []logic.Block{
		&logic.Set{Var: copied, To: logic.Prev(up)},
		&logic.Set{Var: up, When: logic.Not(logic.Use(hold)), To: logic.Select(logic.Ge(logic.Prev(up), logic.Lit(900)), logic.Lit(0), logic.Clamp(logic.Add(logic.Prev(up), logic.Lit(by)), logic.Lit(0), logic.Lit(1000)))},
		&logic.Set{Var: down, To: logic.Clamp(logic.Sub(logic.Prev(down), logic.Lit(1)), logic.Lit(0), logic.Lit(1000))},
		&logic.Set{Var: put, To: logic.Use(raw)},
		&logic.Set{Var: toggle, To: logic.And(logic.Not(logic.Prev(toggle)), logic.Ge(logic.Use(raw), logic.Lit(50)))},
		&logic.Timer{Var: slow, Limit: k, Restart: logic.Lt(logic.Use(raw), logic.Lit(10)), Hold: logic.Use(toggle)},
		&logic.Define{Var: out, As: logic.Or(logic.Use(toggle), logic.Ge(logic.Use(slow), logic.C(k)), logic.Eq(logic.Use(down), logic.Lit(500)))},
		&logic.Define{Var: half, As: logic.Div(logic.Use(up), logic.Lit(7))},
	}
	return p
}

// TestLeapsAreExact records random sequences, with leaps, and runs them without.
func TestLeapsAreExact(t *testing.T) {
	rapid.Check(t, func(t *rapid.T) {
		c, err := logic.Check(anyProgram(t))
		if err != nil {
			t.Fatal(err)
		}
		s := newSearch(c, 1)
		d := &draft{}
		for range rapid.IntRange(1, 12).Draw(t, "legs") {
			l := leg{inputs: make([]int64, len(c.Inputs)), steps: rapid.OneOf(rapid.IntRange(1, 6), rapid.IntRange(1, 5000)).Draw(t, "steps")}
			for i, v := range c.Inputs {
				l.inputs[i] = rapid.OneOf(rapid.SampledFrom(s.levels.values[i]), rapid.Int64Range(v.Range.Lo, v.Range.Hi)).Draw(t, v.Name)
			}
			d.legs = append(d.legs, l)
		}
		v := s.recorded(d)
		total := 0
		for _, l := range d.legs {
			total += l.steps
		}
		if v.Length() != total {
			t.Fatalf("%d steps recorded of %d", v.Length(), total)
		}
		replay(t, c, v)
	})
}

func TestVisitIsDeterministicAndExact(t *testing.T) {
	rapid.Check(t, func(t *rapid.T) {
		c, err := logic.Check(anyProgram(t))
		if err != nil {
			t.Fatal(err)
		}
		b := Budget{Steps: rapid.IntRange(200, 4000).Draw(t, "budget")}
		one, two := Visit(c, b), Visit(c, b)
		if !reflect.DeepEqual(one, two) {
			t.Fatal("two visits of the same program differ")
		}
		for _, v := range one.Vectors {
			replay(t, c, v)
		}
	})
}

// TestEveryTransition names by hand what a person would expect to be shown.
func TestEveryTransition(t *testing.T) {
	c := checked(t, calorifier(120, 240))
	tour := Visit(c, Budget{})
	taken := map[string]bool{}
	states := map[string]bool{}
	for _, v := range tour.Vectors {
		walk(c, v, func(machine, from, to string) {
			states[machine+" "+to] = true
			if from != to {
				taken[machine+": "+from+" to "+to] = true
			}
		})
	}
	for _, want := range []string{
		"tank_state: proving to good", "tank_state: proving to faulty", "tank_state: good to suspicious",
		"tank_state: suspicious to faulty", "tank_state: suspicious to good", "tank_state: faulty to good",
		"stat: open to made", "stat: made to open", "limit: tripped to closed", "limit: closed to tripped",
		"heater_state: off to on", "heater_state: on to off",
	} {
		if !taken[want] {
			t.Errorf("%s is not in the recorded sequences", want)
		}
	}
	for _, b := range c.Order {
		if m, ok := b.(*logic.Machine); ok {
			for _, w := range m.Var.Enum.Words {
				if !states[m.Var.Name+" "+w.Name] {
					t.Errorf("%s is never %s", m.Var.Name, w.Name)
				}
			}
		}
	}
	for _, g := range tour.Missed {
		if g.Kind == TransitionGoal || g.Kind == StateGoal {
			t.Errorf("missed: %s", g.Text)
		}
		if g.Why == "" {
			t.Errorf("missed without a reason: %s", g.Text)
		}
	}
	if tour.Broken != nil {
		t.Errorf("%s broken", tour.Broken.Property.Name)
	}
}

// walk runs a vector and tells every step of every machine.
func walk(c *logic.Checked, v Vector, tell func(machine, from, to string)) {
	r := c.NewRun()
	r.Start(v.Start)
	for _, row := range v.Rows {
		for range row.Steps {
			var was []int64
			for _, s := range c.State {
				was = append(was, r.Get(s))
			}
			r.Step(row.Inputs)
			for i, s := range c.State {
				if s.Kind == logic.Word {
					tell(s.Name, s.Enum.Words[was[i]].Name, s.Enum.Words[r.Get(s)].Name)
				}
			}
		}
	}
}

func TestRecordsAreTried(t *testing.T) {
	c := checked(t, calorifier(4, 8))
	tour := Visit(c, Budget{})
	seen := map[int64]bool{}
	refused := 0
	for _, v := range tour.Vectors {
		switch {
		case v.Start == nil:
		case v.Start.Check == c.CheckWord(v.Start.Values) && v.Start.Values[0] <= 1:
			seen[v.Start.Values[0]] = true
		default:
			refused++
		}
	}
	if !seen[0] || !seen[1] {
		t.Errorf("starts from a remembered limit: %v, want from tripped (0) and from closed (1)", seen)
	}
	if refused < 3 {
		t.Errorf("%d starts from records that must be refused, want a wrong check word, a blank one and an impossible value", refused)
	}
}

// TestContradictionsAreSaid: a term that excludes another can never decide.
func TestContradictionsAreSaid(t *testing.T) {
	m := machine("m", 0, "a", "b", "c")
	in := number("in", 0, 65535, 0)
	out := truth("out", 0)
	p := &logic.Program{ID: "t", Inputs: []*logic.Var{in}, State: []*logic.Var{m}, Outputs: []*logic.Var{out}, Order: []logic.Block{
		&logic.Machine{Var: m, At: []*logic.State{
			at(0, way(1, logic.Ge(logic.Use(in), logic.Lit(10)), "up")),
			at(1, way(2, logic.Ge(logic.Use(in), logic.Lit(20)), "up"), way(0, logic.Lt(logic.Use(in), logic.Lit(10)), "down")),
			at(2, way(0, logic.Lt(logic.Use(in), logic.Lit(20)), "down"))}},
		&logic.Define{Var: out, As: logic.And(logic.Is(m, 1), logic.Not(logic.Is(m, 2)))},
	}}
	tour := Visit(checked(t, p), Budget{})
	var excluded []string
	for _, g := range tour.Missed {
		if !g.Excluded {
			t.Errorf("missed, though it can be reached: %s", g.Text)
		}
		excluded = append(excluded, g.Text)
	}
	if len(excluded) != 1 || !strings.Contains(excluded[0], "(m is not c) does not hold decides") {
		t.Errorf("excluded: %q, want that (m is not c) can never decide where m must be b", excluded)
	}
}

func BenchmarkVisit(b *testing.B) {
	for _, n := range []string{"calorifier", "oven", "defroster", "valve"} {
		c := checked(b, programs()[n])
		b.Run(n, func(b *testing.B) {
			for b.Loop() {
				Visit(c, Budget{})
			}
		})
	}
}
