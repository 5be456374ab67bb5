package prove

import (
	"regexp"
	"slices"
	"testing"

	"makebreak/translate/logic"
)

// sameEffect says of mutants why no input could ever show them. Whatever is
// excused here is also run beside the program for a long while, below.
var sameEffect = map[string][]struct{ mutant, why string }{
	"calorifier": {
		{`^tank_(less|more): .*<= previous`, "with both samples the same it does not matter which is called the smaller"},
		{`^tank_before starts at 1 `, "overwritten in the first step, in which the probe is not good and nothing looks at the median"},
		{`^stat starts at 1 `, "the probe has not proved itself in the first step, which opens the stat"},
		{`^reset_was starts at 0 `, "an edge in the first step resets nothing, for the probe is not good yet"},
	},
	"oven": {
		{`^(chamber|flue)_(less|more): .*<= previous`, "with both samples the same it does not matter which is called the smaller"},
		{`^(chamber|flue)_before starts at 1 `, "overwritten in the first step, in which the probe is not good and nothing looks at the median"},
		{`^stat starts at 1 `, "the probe is not good in the first step, which opens the stat"},
		{`^pulse starts at 1 `, "the load is off in the first step, which ends the pulse"},
		{`^chamber_state: faulty to good: \(chamber_good_for (<=) CHAMBER_PROVE\)`, "the count of good samples stops at CHAMBER_PROVE, so that it is never more"},
		{`^flue_state: faulty to good: \(flue_good_for (<=) FLUE_PROVE\)`, "the count of good samples stops at FLUE_PROVE, so that it is never more"},
	},
	"defroster": {
		{`^value of place: \(LAST_STEP if .*> LAST_STEP\)`, "the place is never below 0"},
		{`^value of place: \(0 if .*< 0\)`, "the place is never above LAST_STEP: 16 parts of it are less"},
		{`^value of place: \(-1\) instead of \(0\)`, "the place is never below 0: it is held there, or never gets there"},
		{`^place starts at 1 `, "worked out anew from the remembered part in the first step"},
	},
	"valve": {
		{`^DEAD 16 instead of 15`, "the stroke moves in fives, so that no difference of 16 comes up"},
		{`^stroke: \(1001\) instead of \(1000\)`, "over 0 to 200 the quotient is the same, cut off or held"},
	},
}

func TestMutantsAreKilled(t *testing.T) {
	each(t, func(t *testing.T, c *logic.Checked) {
		tour := Visit(c, Budget{})
		mutants := Mutants(c.Program)
		excuses := sameEffect[t.Name()[len("TestMutantsAreKilled/"):]]
		killed, excused, alive := 0, 0, 0
		for _, m := range mutants {
			if !tour.Lives(c, m) {
				killed++
				continue
			}
			if why := excuse(excuses, m.What); why != "" {
				excused++
				t.Logf("of the same effect: %s: %s", m.What, why)
				if n := differsAfter(c, m.Program, 60000); n >= 0 {
					t.Errorf("not of the same effect at all, it shows after %d steps: %s", n, m.What)
				}
				continue
			}
			alive++
			t.Logf("alive: %s", m.What)
		}
		share := float64(killed) / float64(len(mutants)-excused)
		t.Logf("%d mutants, %d killed, %d of the same effect, %d alive: %.1f %%", len(mutants), killed, excused, alive, 100*share)
		if share < 0.98 {
			t.Errorf("only %.1f %% of the mutants are killed", 100*share)
		}
	})
}

func excuse(excuses []struct{ mutant, why string }, what string) string {
	for _, e := range excuses {
		if regexp.MustCompile(e.mutant).MatchString(what) {
			return e.why
		}
	}
	return ""
}

// differsAfter runs a mutant beside the program on inputs at and about all
// boundaries, now held and now changing, from many starts. It gives the step at
// which an output or a state differs, or -1.
func differsAfter(c *logic.Checked, mutant *logic.Program, steps int) int {
	s := newSearch(c, 1)
	one, two := c.NewRun(), mutantRun(c, mutant)
	outs, others := newReader(c), newReader(c)
	in := make([]int64, len(c.Inputs))
	n := 0
	for n < steps {
		one.Start(nil)
		startAs(c, mutant, two, nil)
		for range 40 {
			for i, v := range c.Inputs {
				if s.random.below(3) > 0 {
					in[i] = min(max(s.levels.values[i][s.random.below(len(s.levels.values[i]))], v.Range.Lo), v.Range.Hi)
				}
			}
			hold := 1 + s.random.below(4)
			if s.random.below(6) == 0 {
				hold = 300
			}
			for range hold {
				one.Step(in)
				two.Step(in)
				n++
				if !slices.Equal(outs.read(one), others.read(two)) || !slices.Equal(one.Snapshot(nil)[:len(c.State)], two.Snapshot(nil)[:len(c.State)]) {
					return n
				}
			}
		}
	}
	return -1
}

// TestMutants counts the mistakes that can be made in a small program, worked
// out by hand.
func TestMutants(t *testing.T) {
	in, on := number("in", 0, 65535, 0), truth("on", 0)
	p := &logic.Program{ID: "t", Inputs: []*logic.Var{in}, State: []*logic.Var{on}}
	limit := constant(p, "LIMIT", 7)
	p.Order = []logic.Block{&logic.Set{Var: on, When: logic.And(logic.Ge(logic.Use(in), logic.C(limit)), logic.Ne(logic.Use(in), logic.Lit(9))), To: logic.True()}}
	checked(t, p)
	got := map[string]int{}
	for _, m := range Mutants(p) {
		got[m.What]++
	}
	for what, n := range map[string]int{
		"LIMIT 6 instead of 7":        1,
		"LIMIT 8 instead of 7":        1,
		"change of on left out":       1,
		"on starts at 1 instead of 0": 1,
		"change of on: ((in >= LIMIT) or (in is not 9)) instead of ((in >= LIMIT) and (in is not 9))": 1,
		"change of on: (in < LIMIT) instead of (in >= LIMIT)":                                         1,
		"change of on: (in <= LIMIT) instead of (in >= LIMIT)":                                        1,
		"change of on: (in > LIMIT) instead of (in >= LIMIT)":                                         1,
		"change of on: (in is 9) instead of (in is not 9)":                                            1,
		"change of on: (8) instead of (9)":                                                            1,
		"change of on: (10) instead of (9)":                                                           1,
		"value of on: (false) instead of (true)":                                                      1,
	} {
		if got[what] != n {
			t.Errorf("%q: %d times, want %d", what, got[what], n)
		}
		delete(got, what)
	}
	for what := range got {
		t.Errorf("not expected: %q", what)
	}
}

func BenchmarkMutants(b *testing.B) {
	c := checked(b, calorifier(120, 240))
	tour := Visit(c, Budget{})
	mutants := Mutants(c.Program)
	for b.Loop() {
		for _, m := range mutants {
			tour.Lives(c, m)
		}
	}
}
