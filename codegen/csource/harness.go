package csource

import (
	"fmt"
	"sort"
	"strings"

	"makebreak/translate/logic"
)

// Harness prints a program that runs pseudo-random inputs through the C and
// prints one checksum over every output and every variable of every step.
// Checksum gives the same number from the interpreter: that the two agree is
// what bit-equal means here.
//
// Inputs change rarely in some stretches and often in others, and numbers are
// mostly taken from around what the program compares with, so that a run gets
// everywhere.
func (s Source) Harness(steps int) string {
	w := s.printer()
	w.line("#include \"%s.h\"\n\n#include <stddef.h>\n#include <stdio.h>\n#include <string.h>\n", w.lo)
	w.line("static uint32_t seed = UINT32_C(%d);", harnessSeed)
	w.line("static uint32_t sum = UINT32_C(2166136261);\n")
	w.line("static uint32_t draw(void)\n{\n    seed ^= (seed << 13) & UINT32_C(0xFFFFFFFF);\n    seed ^= seed >> 17;\n    seed ^= (seed << 5) & UINT32_C(0xFFFFFFFF);\n    return seed;\n}\n")
	w.line("static void add(int32_t v)\n{\n    sum = ((sum ^ (uint32_t)v) * UINT32_C(16777619)) & UINT32_C(0xFFFFFFFF);\n}\n")
	values := interesting(s.Program)
	w.line("static const int32_t value[] = {%s};\n", strings.Trim(strings.ReplaceAll(fmt.Sprint(values), " ", ", "), "[]"))
	w.line("static const uint32_t mask[3] = {3u, 63u, 1023u};\n")
	w.line("int main(void)\n{\n    struct %s m;\n    struct %s_in in;\n    struct %s_out out;\n    uint32_t i;\n    uint32_t r;\n", w.lo, w.lo, w.lo)
	w.line("    (void)memset(&in, 0, sizeof in);\n    %s_start(&m, NULL);\n    (void)mask;\n    (void)value;\n    for (i = 0u; i < %du; i++) {", w.lo, steps)
	for _, v := range w.p.Inputs {
		w.line("        r = draw();\n        if ((r & mask[(i >> 11) %% 3u]) == 0u) {")
		switch {
		case v.Kind == logic.Bool:
			w.line("            in.%s = ((r >> 12) & 1u) != 0u;", v.Name)
		case v.Signed:
			w.line("            in.%s = (int16_t)((((r >> 12) & 7u) == 0u) ? ((int32_t)(r >> 16) - 32768) : value[(r >> 15) %% %du]);", v.Name, len(values))
		default:
			w.line("            in.%s = (uint16_t)((((r >> 12) & 7u) == 0u) ? (int32_t)(r >> 16) : value[(r >> 15) %% %du]);", v.Name, len(values))
		}
		w.line("        }")
	}
	w.line("        (void)r;\n        %s_step(&m, &in, &out);", w.lo)
	for _, v := range w.p.Outputs {
		w.line("        add((int32_t)out.%s);", v.Name)
	}
	for _, v := range w.p.State {
		w.line("        add((int32_t)m.%s);", v.Name)
	}
	w.line("    }\n    (void)printf(\"%%08lx\\n\", (unsigned long)sum);\n    return 0;\n}")
	return w.String()
}

const harnessSeed = 2463534242

// Checksum is what the harness prints, from the interpreter.
func Checksum(c *logic.Checked, steps int) uint32 {
	seed, sum := uint32(harnessSeed), uint32(2166136261)
	draw := func() uint32 {
		seed ^= seed << 13
		seed ^= seed >> 17
		seed ^= seed << 5
		return seed
	}
	mask := [3]uint32{3, 63, 1023}
	values := interesting(c)
	run := c.NewRun()
	run.Start(nil)
	in := make([]int64, len(c.Inputs))
	for i := uint32(0); i < uint32(steps); i++ {
		for n, v := range c.Inputs {
			r := draw()
			if r&mask[(i>>11)%3] != 0 {
				continue
			}
			switch {
			case v.Kind == logic.Bool:
				in[n] = int64(r >> 12 & 1)
			case r>>12&7 != 0:
				in[n] = values[(r>>15)%uint32(len(values))]
				if v.Signed {
					in[n] = int64(int16(in[n]))
				} else {
					in[n] = int64(uint16(in[n]))
				}
			case v.Signed:
				in[n] = int64(r>>16) - 32768
			default:
				in[n] = int64(r >> 16)
			}
		}
		run.Step(in)
		for _, v := range c.Outputs {
			sum = (sum ^ uint32(run.Get(v))) * 16777619
		}
		for _, v := range c.State {
			sum = (sum ^ uint32(run.Get(v))) * 16777619
		}
	}
	return sum
}

// interesting lists the numbers around everything that the program compares with.
func interesting(c *logic.Checked) []int64 {
	seen := map[int64]bool{0: true}
	note := func(v int64) {
		if logic.Count.Holds(v) || logic.Int16.Holds(v) {
			seen[v] = true
		}
	}
	for _, b := range c.Order {
		logic.Expressions(b, func(e *logic.Expr) {
			e.Walk(func(n *logic.Expr) {
				if !n.Op.IsCompare() || n.Args[0].Kind != logic.Int {
					return
				}
				for _, a := range n.Args {
					if r := c.Ranges[a]; r.Lo == r.Hi {
						note(r.Lo - 1)
						note(r.Lo)
						note(r.Lo + 1)
					}
				}
			})
		})
	}
	var vs []int64
	for v := range seen {
		vs = append(vs, v)
	}
	sort.Slice(vs, func(i, j int) bool { return vs[i] < vs[j] })
	return vs
}
