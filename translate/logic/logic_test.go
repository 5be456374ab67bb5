package logic

import (
	"strings"
	"testing"

	"pgregory.net/rapid"
)

func intVar(name string, lo, hi int64) *Var {
	return &Var{Name: name, Kind: Int, Range: Range{lo, hi}, Start: max(lo, 0)}
}

func boolVar(name string) *Var { return &Var{Name: name, Kind: Bool, Range: Truth} }

// stat is a small two-position control: on at 10 or less, off at 20 or more,
// at least three steps off.
func stat() (*Program, *Var, *Var) {
	in := intVar("count", 0, 65535)
	e := &Enum{Words: []EnumWord{{"off", ""}, {"on", ""}}}
	v := &Var{Name: "stat", Kind: Word, Enum: e, Range: Range{0, 1}}
	limit := &Const{Name: "MIN_OFF", Value: 3}
	age := intVar("stat_for", 0, 3)
	out := boolVar("heater")
	p := &Program{
		ID: "t", StepMS: 100, Consts: []*Const{limit},
		Inputs: []*Var{in}, State: []*Var{v, age}, Outputs: []*Var{out},
		Order: []Block{
			&Machine{Var: v, Timer: age, Limit: limit, Safe: 0, At: []*State{
				{Is: 0, Goes: []*Transition{{To: 1, When: And(Le(Use(in), Lit(10)), Ge(Use(age), C(limit)))}}},
				{Is: 1, Goes: []*Transition{{To: 0, When: Ge(Use(in), Lit(20))}}},
			}},
			&Define{Var: out, As: Is(v, 1)},
		},
	}
	return p, v, out
}

func mustCheck(t testing.TB, p *Program) *Checked {
	t.Helper()
	c, err := Check(p)
	if err != nil {
		t.Fatal(err)
	}
	return c
}

func TestMachineWaitsForItsTimer(t *testing.T) {
	p, _, out := stat()
	r := mustCheck(t, p).NewRun()
	r.Start(nil)
	var got []int64
	for _, count := range []int64{5, 5, 5, 15, 20, 5, 5, 5} {
		r.Step([]int64{count})
		got = append(got, r.Get(out))
	}
	// Off from the start: the third step is the first with three steps off.
	want := []int64{0, 0, 1, 1, 0, 0, 0, 1}
	for i := range want {
		if got[i] != want[i] {
			t.Fatalf("step %d: heater %d, want %d (all: %v)", i, got[i], want[i], got)
		}
	}
}

func TestImpossibleStateGoesToSafe(t *testing.T) {
	p, v, out := stat()
	r := mustCheck(t, p).NewRun()
	r.Start(nil)
	s := r.Snapshot(nil)
	s[0] = 9 // the machine's variable
	r.Restore(s)
	r.Step([]int64{5})
	if r.Get(v) != 0 || r.Get(out) != 0 {
		t.Errorf("after an impossible state: machine %d, heater %d; want the safe state", r.Get(v), r.Get(out))
	}
}

func boundTo(lo, hi int64) *Var { return intVar("bits", lo, hi) }

// TestCheckRefuses puts one mistake at a time into a sound program.
func TestCheckRefuses(t *testing.T) {
	x, y := intVar("x", 0, 100), intVar("y", 0, 100)
	in := intVar("in1", 0, 65535)
	one := &Const{Name: "ONE", Value: 1}
	base := func(order ...Block) *Program {
		return &Program{ID: "t", Consts: []*Const{one}, Inputs: []*Var{in}, State: []*Var{x, y}, Order: order}
	}
	setY := &Set{Var: y, To: Lit(1)}
	for name, c := range map[string]struct {
		p    *Program
		says string
	}{
		"never written":           {base(setY), "x is never written"},
		"two writers":             {base(&Set{Var: x, To: Lit(1)}, &Set{Var: x, To: Lit(2)}, setY), "written by two blocks"},
		"input written":           {base(&Set{Var: in, To: Lit(1)}, &Set{Var: x, To: Lit(1)}, setY), "an input is never written"},
		"read too early":          {base(&Set{Var: x, To: Use(y)}, setY), "its previous value must be asked for"},
		"previous gone":           {base(setY, &Set{Var: x, To: Prev(y)}), "its previous value is gone"},
		"out of range":            {base(&Set{Var: x, To: Add(Prev(x), Lit(1))}, setY), "can be 1..101, it holds 0..100"},
		"more than 32 bits":       {base(&Set{Var: x, To: Clamp(Mul(Mul(Use(in), Use(in)), Lit(2)), Lit(0), Lit(100))}, setY), "more than 32 bits"},
		"divides by zero":         {base(&Set{Var: x, To: Clamp(Div(Lit(5), Prev(y)), Lit(0), Lit(5))}, setY), "may divide by zero"},
		"always true":             {base(&Set{Var: x, When: Ge(Use(in), Lit(0)), To: Lit(1)}, setY), "always comes out the same"},
		"never true":              {base(&Set{Var: x, When: Gt(Prev(y), Lit(100)), To: Lit(1)}, setY), "always comes out the same"},
		"wrong sort":              {base(&Set{Var: x, When: Lit(1), To: Lit(1)}, setY), "not a truth value"},
		"flags without room":      {base(setY, &Flags{Out: boundTo(0, 1), Bits: []Flag{{Name: "a", When: Eq(Use(in), Lit(1))}, {Name: "b", When: Eq(Use(in), Lit(2))}}}), "can make 3, it holds 0..1"},
		"timer never restarted":   {base(setY, &Timer{Var: x, Limit: one}), "nothing restarts the timer"},
		"table too wide":          {&Program{ID: "t", Tables: []*Table{{Name: "tab", X: []int64{-1 << 31, 1<<31 - 1}, Y: []int64{5, 5}}}}, "overflows 32 bits"},
		"timer without range":     {base(&Timer{Var: x, Limit: one, Restart: False()}, setY), "is not 0..ONE"},
		"name taken":              {&Program{ID: "t", Inputs: []*Var{intVar("x", 0, 9)}, State: []*Var{x}, Order: []Block{&Set{Var: x, To: Lit(1)}}}, "there is a"},
		"table goes back":         {&Program{ID: "t", Tables: []*Table{{Name: "tab", X: []int64{1, 1}, Y: []int64{0, 1}}}}, "is not right of"},
		"comparison of two sorts": {base(&Set{Var: x, When: Eq(Use(in), True()), To: Lit(1)}, setY), "compares different sorts"},
	} {
		t.Run(name, func(t *testing.T) {
			_, err := Check(c.p)
			if err == nil || !strings.Contains(err.Error(), c.says) {
				t.Errorf("Check says %v, want something with %q", err, c.says)
			}
		})
	}
}

// TestOperations runs each operation on random numbers against Go's own
// arithmetic, which cuts off towards zero as C99 does (ISO/IEC 9899:1999, 6.5.5).
func TestOperations(t *testing.T) {
	rapid.Check(t, func(t *rapid.T) {
		a := rapid.Int64Range(-30000, 30000).Draw(t, "a")
		b := rapid.Int64Range(-30000, 30000).Draw(t, "b")
		n := rapid.Int64Range(1, 1000).Draw(t, "n")
		va, vb, vn := intVar("a", -30000, 30000), intVar("b", -30000, 30000), intVar("n", 1, 1000)
		va.Start, vb.Start, vn.Start = 0, 0, 1
		vn.Signed = false
		table := &Table{Name: "tab", X: []int64{-20000, 0, 100, 30000}, Y: []int64{-7, 5, 5, 900}}
		for name, c := range map[string]struct {
			e    *Expr
			want int64
		}{
			"add":    {Add(Use(va), Use(vb)), a + b},
			"sub":    {Sub(Use(va), Use(vb)), a - b},
			"mul":    {Mul(Use(va), Use(vb)), a * b},
			"div":    {Div(Use(va), Use(vn)), a / n},
			"select": {Select(Lt(Use(va), Use(vb)), Use(va), Use(vb)), min(a, b)},
			"clamp":  {Clamp(Use(va), Lit(-5), Lit(7)), max(-5, min(7, a))},
			"toward": {Toward(Use(va), Use(vb), Use(vn)), a + (b-a)/n},
			"lookup": {Lookup(table, Use(va)), interpolated(table, a)},
		} {
			out := &Var{Name: "o", Kind: Int, Range: Int32}
			p := &Program{ID: "t", Tables: []*Table{table}, Inputs: []*Var{va, vb, vn}, Outputs: []*Var{out}, Order: []Block{&Define{Var: out, As: c.e}}}
			k, err := Check(p)
			if err != nil {
				t.Fatalf("%s: %v", name, err)
			}
			r := k.NewRun()
			r.Start(nil)
			r.Step([]int64{a, b, n})
			if got := r.Get(out); got != c.want {
				t.Errorf("%s of %d, %d, %d is %d, want %d", name, a, b, n, got, c.want)
			}
			if !k.Ranges[c.e].Holds(r.Get(out)) {
				t.Errorf("%s: %d outside the inferred range %v", name, r.Get(out), k.Ranges[c.e])
			}
		}
	})
}

// interpolated is the straight piece through two points, in real numbers, cut
// off towards the first point's value as the integer division does.
func interpolated(t *Table, x int64) int64 {
	n := len(t.X)
	switch {
	case x <= t.X[0]:
		return t.Y[0]
	case x >= t.X[n-1]:
		return t.Y[n-1]
	}
	for i := 1; i < n; i++ {
		if x <= t.X[i] {
			part := float64(x-t.X[i-1]) / float64(t.X[i]-t.X[i-1]) * float64(t.Y[i]-t.Y[i-1])
			return t.Y[i-1] + int64(part+1e-9)
		}
	}
	return t.Y[n-1]
}

func TestRecord(t *testing.T) {
	kept := &Var{Name: "trip", Kind: Bool, Range: Truth, Start: 1, Survives: true}
	in := boolVar("clear")
	p := &Program{ID: "t", Inputs: []*Var{in}, State: []*Var{kept}, Order: []Block{&Set{Var: kept, To: Not(Use(in))}}}
	r := mustCheck(t, p).NewRun()
	r.Start(nil)
	if r.Get(kept) != 1 {
		t.Error("without a record it must start as after a trip")
	}
	r.Step([]int64{1})
	good := r.Remember()
	r.Start(&good)
	if r.Get(kept) != 0 {
		t.Error("a good record is not taken over")
	}
	for name, bad := range map[string]Record{
		"zeros":                     {Values: []int64{0}, Check: 0},
		"ones":                      {Values: []int64{255}, Check: 0xFFFF},
		"wrong word":                {Values: []int64{0}, Check: good.Check + 1},
		"too short":                 {Check: good.Check},
		"no truth value, good word": {Values: []int64{2}, Check: p.CheckWord([]int64{2})},
	} {
		r.Start(&bad)
		if r.Get(kept) != 1 {
			t.Errorf("%s: the record was believed", name)
		}
	}
}

func TestPropertyWatches(t *testing.T) {
	p, v, _ := stat()
	was := boolVar("was_on")
	p.Never = []*Property{{
		Name: "never_on", Kept: []*Var{was},
		Watch: []Block{&Set{Var: was, To: Is(v, 1)}},
		Bad:   Use(was),
	}}
	r := mustCheck(t, p).NewRun()
	r.Start(nil)
	for i := 0; i < 3; i++ {
		if r.Violated() != nil {
			t.Fatal("broken before the heater was ever on")
		}
		r.Step([]int64{5})
	}
	if r.Violated() == nil {
		t.Error("a property that is broken was not found")
	}
}

func BenchmarkStep(b *testing.B) {
	p, _, _ := stat()
	r := mustCheck(b, p).NewRun()
	r.Start(nil)
	in := []int64{5}
	for b.Loop() {
		in[0] = (in[0] + 7) % 40
		r.Step(in)
	}
}
