package csource_test

import (
	"fmt"
	"strings"
	"testing"

	"makebreak/codegen/csource"
	"makebreak/translate/logic"
)

// TestWiringTruthTables tries every row of lines of old wiring in C. What is
// wanted comes from Go's own operators and brackets, not from the interpreter.
func TestWiringTruthTables(t *testing.T) {
	gcc := compiler(t, "gcc")
	vs := []*logic.Var{truth("a"), truth("b"), truth("c"), truth("d")}
	a, b, c, d := logic.Use(vs[0]), logic.Use(vs[1]), logic.Use(vs[2]), logic.Use(vs[3])
	not, and, or := logic.Not, logic.And, logic.Or
	lines := []struct {
		e    *logic.Expr
		want func(a, b, c, d bool) bool
	}{
		{and(a, or(not(b), c)), func(a, b, c, d bool) bool { return a && (!b || c) }},
		{or(and(a, not(b)), c), func(a, b, c, d bool) bool { return a && !b || c }},
		{not(and(a, or(b, not(c)))), func(a, b, c, d bool) bool { return !(a && (b || !c)) }},
		{and(or(a, b), or(c, d)), func(a, b, c, d bool) bool { return (a || b) && (c || d) }},
		{or(and(a, b), and(c, d), not(or(a, d))), func(a, b, c, d bool) bool { return a && b || c && d || !(a || d) }},
		{logic.Eq(and(a, b), or(c, d)), func(a, b, c, d bool) bool { return (a && b) == (c || d) }},
		{logic.Ne(not(a), logic.Eq(b, c)), func(a, b, c, d bool) bool { return !a != (b == c) }},
		{logic.Select(or(a, b), not(c), and(c, d)), func(a, b, c, d bool) bool {
			if a || b {
				return !c
			}
			return c && d
		}},
		{and(not(logic.Select(a, b, c)), d), func(a, b, c, d bool) bool {
			x := c
			if a {
				x = b
			}
			return !x && d
		}},
		{logic.Eq(logic.Select(a, b, c), logic.Ne(c, d)), func(a, b, c, d bool) bool {
			x := c
			if a {
				x = b
			}
			return x == (c != d)
		}},
		{not(logic.Eq(a, not(logic.Select(b, c, d)))), func(a, b, c, d bool) bool {
			x := d
			if b {
				x = c
			}
			return a != !x
		}},
	}
	p := &logic.Program{ID: "wires", StepMS: 10, Inputs: vs}
	for i, l := range lines {
		out := truth(fmt.Sprintf("line%d", i))
		p.Outputs = append(p.Outputs, out)
		p.Order = append(p.Order, &logic.Define{Var: out, As: l.e})
	}
	src := csource.Source{Program: checked(t, p)}
	dir := t.TempDir()
	var main strings.Builder
	main.WriteString("#include \"wires.h\"\n#include <stdio.h>\nint main(void)\n{\n    struct wires m;\n    struct wires_in in;\n    struct wires_out out;\n    unsigned i;\n")
	main.WriteString("    wires_start(&m, NULL);\n    for (i = 0u; i < 16u; i++) {\n        in.a = (i & 1u) != 0u;\n        in.b = (i & 2u) != 0u;\n        in.c = (i & 4u) != 0u;\n        in.d = (i & 8u) != 0u;\n        wires_step(&m, &in, &out);\n")
	for i := range lines {
		fmt.Fprintf(&main, "        (void)putchar(out.line%d ? '1' : '0');\n", i)
	}
	main.WriteString("        (void)putchar('\\n');\n    }\n    return 0;\n}\n")
	write(t, dir, map[string]string{"wires.h": src.Header(), "wires.c": src.Body(), "main.c": main.String()})
	command(t, dir, gcc, with(strict, "wires.c", "main.c", "-o", "wires")...)
	rows := strings.Fields(command(t, dir, "./wires"))
	if len(rows) != 16 {
		t.Fatalf("%d rows", len(rows))
	}
	for i, row := range rows {
		for n, l := range lines {
			want := "0"
			if l.want(i&1 != 0, i&2 != 0, i&4 != 0, i&8 != 0) {
				want = "1"
			}
			if row[n:n+1] != want {
				t.Errorf("line %s, row %04b: C says %c, want %s", l.e, i, row[n], want)
			}
		}
	}
}
