package csource_test

import (
	"fmt"
	"math/rand/v2"
	"os/exec"
	"strings"
	"testing"

	"makebreak/codegen/csource"
	"makebreak/translate/logic"
)

// grower makes random programs out of every part of logic. It offers blocks;
// Check decides which of them mean something.
type grower struct {
	*rand.Rand
	p       *logic.Program
	readers []*logic.Var // what has been written earlier in the step, and inputs
	later   []*logic.Var // state that has still to be written
	n       int
}

func grow(seed uint64, blocks int) *logic.Checked {
	g := &grower{Rand: rand.New(rand.NewPCG(seed, 1)), p: &logic.Program{ID: fmt.Sprintf("p%d", seed), StepMS: 100}}
	signed := number("degrees", -32768, 32767)
	signed.Signed = true
	g.p.Inputs = []*logic.Var{number("count", 0, 65535), number("other", 0, 65535), signed, truth("door"), truth("flow")}
	g.readers = append(g.readers, g.p.Inputs...)
	for i, v := range []int64{1, 7, 200, 300, 32767, 32768, 65535, 70000, -1, -200, -32768, -40000} {
		g.p.Consts = append(g.p.Consts, &logic.Const{Name: fmt.Sprintf("K%d", i), Value: v, Unit: "counts", Means: "drawn", Origin: "test"})
	}
	g.p.Tables = []*logic.Table{
		{Name: "falling", What: "falls", X: []int64{0, 100, 4000, 65535}, Y: []int64{1500, 600, 20, -400}},
		{Name: "bytes", What: "small", X: []int64{10, 20, 200}, Y: []int64{3, 250, 9}},
		{Name: "signed", What: "through zero", X: []int64{-30000, -5, 0, 30000}, Y: []int64{40000, 0, 7, -30000}},
	}
	for i := 0; i < 9; i++ {
		g.later = append(g.later, g.variable())
	}
	g.p.State = append(g.p.State, g.later...)
	for tries := 0; len(g.p.Order) < blocks && tries < blocks*60; tries++ {
		g.offer()
	}
	g.finish()
	c, err := logic.Check(g.p)
	if err != nil {
		panic(err)
	}
	return c
}

func (g *grower) name(what string) string {
	g.n++
	return fmt.Sprintf("%s%d", what, g.n)
}

func (g *grower) variable() *logic.Var {
	var v *logic.Var
	switch g.IntN(8) {
	case 0, 1:
		v = truth(g.name("b"))
		v.Start = g.Int64N(2)
	case 2:
		v = states(g.name("s"), "states", g.Int64N(3), "idle", "busy", "done")
	default:
		r := []logic.Range{{Lo: 0, Hi: 9}, {Lo: 0, Hi: 255}, {Lo: 0, Hi: 256}, {Lo: 0, Hi: 65535}, {Lo: 0, Hi: 65536}, {Lo: -128, Hi: 127}, {Lo: -129, Hi: 10},
			{Lo: -32768, Hi: 32767}, {Lo: -32769, Hi: 5}, {Lo: -1 << 30, Hi: 1 << 30}, {Lo: 0, Hi: 1<<31 - 1}, {Lo: 5, Hi: 40000}}[g.IntN(12)]
		v = number(g.name("n"), r.Lo, r.Hi)
	}
	v.Survives = g.IntN(3) == 0
	return v
}

// offer makes a block and keeps it where the program still means something.
func (g *grower) offer() {
	before := *g.p
	later, readers := g.later, g.readers
	var made logic.Block
	switch g.IntN(14) {
	case 0, 1, 2:
		made = g.local()
	case 3:
		out := g.variable()
		out.Survives = false
		made = &logic.Define{Var: out, As: g.fit(out)}
		g.p.Outputs = append(append([]*logic.Var(nil), g.p.Outputs...), out)
		g.readers = append(append([]*logic.Var(nil), g.readers...), out)
	case 4, 5:
		made = g.set()
	case 6, 7, 8, 9, 10, 11:
		made = g.machine()
	case 12:
		made = g.timer()
	default:
		made = g.flags()
	}
	if made != nil {
		g.p.Order = append(append([]logic.Block(nil), g.p.Order...), made)
	}
	if made == nil || !g.sound() {
		*g.p, g.later, g.readers = before, later, readers
	}
}

// sound reports whether nothing is wrong but that there is more to write.
func (g *grower) sound() bool {
	_, err := logic.Check(g.p)
	if err == nil {
		return true
	}
	for _, l := range strings.Split(strings.TrimPrefix(err.Error(), "program "+g.p.ID+": "), "\n") {
		if !strings.HasSuffix(l, "is never written") {
			return false
		}
	}
	return true
}

// finish writes what is left.
func (g *grower) finish() {
	for _, v := range g.later {
		for {
			before := g.p.Order
			g.p.Order = append(append([]logic.Block(nil), before...), &logic.Set{Var: v, When: g.condition(2), To: g.fit(v)})
			if g.sound() {
				break
			}
			g.p.Order = before
		}
	}
	g.later = nil
}

func (g *grower) local() logic.Block {
	v := g.variable()
	v.Survives = false
	d := &logic.Define{Var: v, As: g.fit(v)}
	g.readers = append(append([]*logic.Var(nil), g.readers...), v)
	return d
}

// take gives a variable that has still to be written, of a kind.
func (g *grower) take(ok func(*logic.Var) bool) *logic.Var {
	for i, v := range g.later {
		if ok(v) {
			g.later = append(append([]*logic.Var(nil), g.later[:i]...), g.later[i+1:]...)
			g.readers = append(append([]*logic.Var(nil), g.readers...), v)
			return v
		}
	}
	return nil
}

func (g *grower) set() logic.Block {
	if len(g.later) == 0 {
		return nil
	}
	s := &logic.Set{Var: g.later[0], To: g.fit(g.later[0]), Why: "drawn"}
	if g.IntN(4) > 0 {
		s.When = g.condition(3)
	}
	g.take(func(v *logic.Var) bool { return v == s.Var })
	return s
}

func (g *grower) machine() logic.Block {
	v := states(g.name("mode"), "drawn machine", g.Int64N(3), "idle", "busy", "done")
	m := &logic.Machine{Var: v, What: "drawn", Safe: g.IntN(3)}
	added := []*logic.Var{v}
	if g.IntN(2) == 0 {
		m.Limit = g.p.Consts[g.IntN(8)]
		m.Timer = number(g.name("age"), 0, m.Limit.Value)
		added = append(added, m.Timer)
	}
	g.p.State = append(append([]*logic.Var(nil), g.p.State...), added...)
	var own *logic.Var
	if len(g.later) > 0 {
		own = g.later[0]
		if g.IntN(2) == 0 {
			g.take(func(v *logic.Var) bool { return v == own })
			g.readers = g.readers[:len(g.readers)-1] // not before the machine is done
		} else {
			own = nil
		}
	}
	for i := 0; i < 3; i++ {
		s := &logic.State{Is: i}
		for n := g.IntN(3); n >= 0; n-- {
			t := &logic.Transition{To: g.IntN(3), When: g.condition(2), Why: "drawn"}
			switch {
			case g.IntN(12) == 0:
				t.When = nil
			case m.Timer != nil && g.IntN(2) == 0:
				t.When = logic.And(t.When, logic.Ge(logic.Use(m.Timer), logic.C(m.Limit)))
			}
			if own != nil {
				t.Do = append(t.Do, &logic.Set{Var: own, To: g.fit(own)})
			}
			s.Goes = append(s.Goes, t)
		}
		m.At = append(m.At, s)
	}
	if own != nil {
		added = append(added, own)
	}
	g.readers = append(append([]*logic.Var(nil), g.readers...), added...)
	return m
}

func (g *grower) timer() logic.Block {
	limit := g.p.Consts[g.IntN(8)]
	v := number(g.name("since"), 0, limit.Value)
	g.p.State = append(append([]*logic.Var(nil), g.p.State...), v)
	t := &logic.Timer{Var: v, Limit: limit, Restart: g.condition(2), Why: "drawn"}
	switch g.IntN(4) {
	case 0:
		t.Restart = logic.False()
	case 1:
		t.Hold = g.condition(2)
	}
	g.readers = append(append([]*logic.Var(nil), g.readers...), v)
	return t
}

func (g *grower) flags() logic.Block {
	f := &logic.Flags{Out: number(g.name("word"), 0, 65535)}
	for i := g.IntN(4); i >= 0; i-- {
		f.Bits = append(f.Bits, logic.Flag{Name: g.name("bit"), What: "drawn", When: g.condition(2)})
	}
	if g.IntN(2) == 0 {
		g.p.Outputs = append(append([]*logic.Var(nil), g.p.Outputs...), f.Out)
	}
	g.readers = append(append([]*logic.Var(nil), g.readers...), f.Out)
	return f
}

// pick reads a variable of a kind: one written earlier, or the previous value
// of one that will be.
func (g *grower) pick(ok func(*logic.Var) bool) *logic.Expr {
	var es []*logic.Expr
	for _, v := range g.readers {
		if ok(v) {
			es = append(es, logic.Use(v))
		}
	}
	for _, v := range g.later {
		if ok(v) {
			es = append(es, logic.Prev(v))
		}
	}
	if len(es) == 0 {
		return nil
	}
	return es[g.IntN(len(es))]
}

func kind(k logic.Kind) func(*logic.Var) bool {
	return func(v *logic.Var) bool { return v.Kind == k }
}

// fit gives an expression that stays in a variable's range.
func (g *grower) fit(v *logic.Var) *logic.Expr {
	switch v.Kind {
	case logic.Bool:
		return g.condition(4)
	case logic.Word:
		return g.state(v.Enum, 2)
	}
	return logic.Clamp(g.number(3), logic.Lit(v.Range.Lo), logic.Lit(v.Range.Hi))
}

func (g *grower) state(e *logic.Enum, depth int) *logic.Expr {
	same := func(v *logic.Var) bool { return v.Enum == e }
	switch g.IntN(3) {
	case 0:
		if x := g.pick(same); x != nil {
			return x
		}
	case 1:
		if depth > 0 {
			return logic.Select(g.condition(1), g.state(e, depth-1), g.state(e, depth-1))
		}
	}
	return logic.StateOf(e, g.IntN(len(e.Words)))
}

func (g *grower) condition(depth int) *logic.Expr {
	if depth > 0 {
		switch g.IntN(7) {
		case 0:
			return logic.And(g.condition(depth-1), g.condition(depth-1))
		case 1:
			return logic.Or(g.condition(depth-1), g.condition(depth-1), g.condition(depth-1))
		case 2:
			return logic.Not(g.condition(depth - 1))
		case 3:
			return logic.Select(g.condition(depth-1), g.condition(depth-1), g.condition(depth-1))
		case 4:
			a, b := g.condition(depth-1), g.condition(depth-1)
			for a.String() == b.String() {
				b = g.condition(depth - 1)
			}
			return []func(a, b *logic.Expr) *logic.Expr{logic.Eq, logic.Ne}[g.IntN(2)](a, b)
		}
	}
	if g.IntN(3) == 0 {
		return g.pick(kind(logic.Bool))
	}
	if s := g.pick(kind(logic.Word)); s != nil && g.IntN(3) == 0 {
		other := g.state(s.Enum, 1)
		for other.String() == s.String() { // a compiler warns of x == x
			other = g.state(s.Enum, 1)
		}
		return logic.Eq(s, other)
	}
	compare := []func(a, b *logic.Expr) *logic.Expr{logic.Eq, logic.Ne, logic.Lt, logic.Le, logic.Gt, logic.Ge}
	a, b := g.number(depth), g.number(depth-1)
	for i := 0; i < 9 && (a.String() == b.String() || a.Op == logic.OpLit || a.Op == logic.OpConst); i++ {
		a = g.number(depth)
	}
	return compare[g.IntN(len(compare))](a, b)
}

func (g *grower) number(depth int) *logic.Expr {
	if depth > 0 {
		a := func() *logic.Expr { return g.number(depth - 1) }
		small := func() *logic.Expr { return logic.Clamp(a(), logic.Lit(-1000), logic.Lit(1000)) }
		switch g.IntN(9) {
		case 0:
			return logic.Add(a(), a())
		case 1:
			return logic.Sub(a(), a())
		case 2:
			return logic.Mul(small(), small())
		case 3:
			return logic.Div(a(), logic.Lit([]int64{1, 3, -7, 250, 40000}[g.IntN(5)]))
		case 4:
			return logic.Clamp(a(), logic.Lit(g.Int64N(300)-150), logic.Lit(150+g.Int64N(70000)))
		case 5:
			return logic.Toward(small(), small(), logic.Lit(1+g.Int64N(9)))
		case 6:
			return logic.Lookup(g.p.Tables[g.IntN(len(g.p.Tables))], a())
		case 7:
			return logic.Select(g.condition(depth-1), a(), a())
		}
	}
	switch g.IntN(4) {
	case 0:
		return logic.Lit([]int64{0, 1, 2, 255, 256, 32767, 32768, 65535, 65536, -1, -128, -32768, -32769}[g.IntN(13)])
	case 1:
		return logic.C(g.p.Consts[g.IntN(len(g.p.Consts))])
	}
	return g.pick(kind(logic.Int))
}

// compiled compiles a random program. Only that a condition always comes out
// the same may be said of it: random conditions contradict each other.
func compiled(t *testing.T, seed uint64, dir, name string, args ...string) {
	t.Helper()
	for _, l := range strings.Split(command(t, dir, name, args...), "\n") {
		if strings.Contains(l, "warning:") && !strings.Contains(l, "always") {
			t.Errorf("seed %d: %s", seed, l)
		}
	}
}

// TestRandomPrograms compiles random programs and runs them beside the
// interpreter. Which tools are here decides how many ways they are compiled.
func TestRandomPrograms(t *testing.T) {
	compiler(t, "gcc")
	const blocks, steps = 25, 3000
	tools := []struct {
		name string
		args []string
		run  bool
	}{
		{"gcc", strict, true},
		{"clang", strict, true},
		{"tcc", []string{"-Wall"}, true},
		{"gcc", with(strict, "-O1", "-m32", "-fsanitize=undefined", "-fno-sanitize-recover=all"), true},
		{"avr-gcc", with(strict, "-mmcu=atmega328p"), false},
	}
	parts, lines := map[string]int{}, 0
	for _, tool := range tools {
		t.Run(tool.name+" "+tool.args[len(tool.args)-1], func(t *testing.T) {
			if _, err := exec.LookPath(tool.name); err != nil {
				compiler(t, tool.name)
			}
			if strings.Contains(strings.Join(tool.args, " "), "-m32") && !works(t, tool.name, "-m32") {
				without(t, "gcc's 32-bit library")
			}
			for seed := uint64(1); seed <= *programs; seed++ {
				c := grow(seed, blocks)
				src := csource.Source{Program: c}
				for _, b := range c.Order {
					parts[fmt.Sprintf("%T", b)]++
				}
				dir := t.TempDir()
				body := src.Body()
				lines += strings.Count(body, "\n")
				write(t, dir, map[string]string{c.ID + ".h": src.Header(), c.ID + ".c": body, "harness.c": src.Harness(steps)})
				if !tool.run {
					compiled(t, seed, dir, tool.name, with(tool.args, "-Wno-error", "-c", c.ID+".c", "-o", "a.o")...)
					continue
				}
				compiled(t, seed, dir, tool.name, with(tool.args, "-Wno-error", c.ID+".c", "harness.c", "-o", "a")...)
				want := fmt.Sprintf("%08x\n", csource.Checksum(c, steps))
				if got := command(t, dir, "./a"); got != want {
					t.Errorf("seed %d: C gives %s, the interpreter %s", seed, got, want)
				}
			}
		})
	}
	t.Logf("%d lines of C from %v", lines, parts)
	if len(parts) < 5 {
		t.Errorf("only %v were made", parts)
	}
}
