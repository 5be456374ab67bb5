package csource

import (
	"slices"
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
// everywhere. Every so often the power is cut; the record is good, or gone.
func (s Source) Harness(steps int) string {
	w := s.printer()
	w.line("#include \"%s.h\"\n\n#include <stddef.h>\n#ifdef BARE\n#include \"plat.h\"\n#else\n#include <stdio.h>\n#endif\n", w.lo)
	w.line("#ifndef STEPS\n#define STEPS %s\n#endif\n", natural(int64(steps)))
	w.line("static void fill(void *at, size_t size, unsigned char with)\n{\n    unsigned char *p = (unsigned char *)at;\n    size_t i;\n\n    for (i = 0u; i < size; i++) {\n        p[i] = with;\n    }\n}\n")
	w.line("static void show(uint32_t v)\n{\n#ifdef BARE\n    int shift;\n\n    plat_putc('s');\n    plat_putc('u');\n    plat_putc('m');\n    plat_putc(' ');\n    for (shift = 28; shift >= 0; shift -= 4) {\n        plat_putc(\"0123456789abcdef\"[(v >> shift) & 15u]);\n    }\n    plat_putc('\\n');\n    plat_exit();\n#else\n    (void)printf(\"%%08lx\\n\", (unsigned long)v);\n#endif\n}\n")
	w.line("static uint32_t sum = UINT32_C(2166136261);\n")
	if len(w.p.Inputs) > 0 {
		w.line("static uint32_t seed = UINT32_C(%d);", uint32(harnessSeed))
		w.line("static uint32_t draw(void)\n{\n    seed ^= (seed << 13) & UINT32_C(0xFFFFFFFF);\n    seed ^= seed >> 17;\n    seed ^= (seed << 5) & UINT32_C(0xFFFFFFFF);\n    return seed;\n}\n")
	}
	w.line("static void add(int32_t v)\n{\n    sum = ((sum ^ (uint32_t)v) * UINT32_C(16777619)) & UINT32_C(0xFFFFFFFF);\n}\n")
	values := interesting(s.Program)
	w.line("static const int32_t value[] = {%s};\n", strings.Join(numerals(values), ", "))
	w.line("static const uint32_t mask[3] = {3u, 63u, 1023u};\n")
	w.line("int main(void)\n{\n    struct %s m;\n    struct %s_in in;\n    struct %s_out out;\n    struct %s_remembered kept;\n    uint32_t i;\n    uint32_t r = 0u;\n", w.lo, w.lo, w.lo, w.lo)
	w.line("    fill(&m, sizeof m, 0xA5u);\n    fill(&in, sizeof in, 0u);\n    fill(&kept, sizeof kept, 0u);\n    %s_start(&m, NULL);\n    (void)mask;\n    (void)value;\n    for (i = 0u; i < STEPS; i++) {", w.lo)
	for _, v := range w.p.Inputs {
		w.line("        r = draw();\n        if ((r & mask[(i >> 11) %% 3u]) == 0u) {")
		name := w.vars[v]
		switch {
		case v.Kind == logic.Bool:
			w.line("            in.%s = ((r >> 12) & 1u) != 0u;", name)
		case v.Signed:
			w.line("            in.%s = (int16_t)((((r >> 12) & 7u) == 0u) ? ((int32_t)(r >> 16) - 32768) : value[(r >> 15) %% %du]);", name, len(values))
		default:
			w.line("            in.%s = (uint16_t)((((r >> 12) & 7u) == 0u) ? (int32_t)(r >> 16) : value[(r >> 15) %% %du]);", name, len(values))
		}
		w.line("        }")
	}
	w.line("        (void)r;\n        %s_step(&m, &in, &out);", w.lo)
	for _, v := range w.p.Outputs {
		w.line("        add((int32_t)out.%s);", w.vars[v])
	}
	for _, v := range w.p.State {
		w.line("        add((int32_t)m.%s);", w.vars[v])
	}
	w.line("        if ((i %% %du) == %du) {\n            add(%s_remember(&m, &kept) ? 1 : 0);\n            add((int32_t)kept.check);\n            fill(&m, sizeof m, 0x5Au);", powerCut, powerCut-1, w.lo)
	w.line("            %s_start(&m, ((i & 1u) == 0u) ? &kept : NULL);\n        }", w.lo)
	w.line("    }\n    show(sum);\n    return 0;\n}")
	return w.String()
}

func numerals(vs []int64) []string {
	var all []string
	for _, v := range vs {
		all = append(all, literal(v, wide))
	}
	return all
}

const (
	harnessSeed = 2463534242
	powerCut    = 3001 // steps from one cut to the next
)

// drawing is the harness's source of inputs (Marsaglia, Xorshift RNGs, Journal
// of Statistical Software 8(14), 2003: shifts 13, 17, 5).
type drawing struct {
	seed   uint32
	values []int64
}

func (d *drawing) draw() uint32 {
	d.seed ^= d.seed << 13
	d.seed ^= d.seed >> 17
	d.seed ^= d.seed << 5
	return d.seed
}

// change draws once for an input and gives its next value.
func (d *drawing) change(i uint32, v *logic.Var, now int64) int64 {
	r := d.draw()
	if r&[3]uint32{3, 63, 1023}[(i>>11)%3] != 0 {
		return now
	}
	anywhere := r>>12&7 == 0
	near := d.values[(r>>15)%uint32(len(d.values))]
	switch {
	case v.Kind == logic.Bool:
		return int64(r >> 12 & 1)
	case v.Signed && anywhere:
		return int64(r>>16) - 32768
	case v.Signed:
		return int64(int16(near))
	case anywhere:
		return int64(r >> 16)
	}
	return int64(uint16(near))
}

// Checksum is what the harness prints, from the interpreter.
func Checksum(c *logic.Checked, steps int) uint32 {
	d := &drawing{harnessSeed, interesting(c)}
	sum := uint32(2166136261)
	add := func(v int64) { sum = (sum ^ uint32(v)) * 16777619 }
	run := c.NewRun()
	run.Start(nil)
	written := logic.Record{Values: make([]int64, len(c.Survivors()))}
	in := make([]int64, len(c.Inputs))
	for i := uint32(0); i < uint32(steps); i++ {
		for n, v := range c.Inputs {
			in[n] = d.change(i, v, in[n])
		}
		run.Step(in)
		for _, vs := range [][]*logic.Var{c.Outputs, c.State} {
			for _, v := range vs {
				add(run.Get(v))
			}
		}
		if i%powerCut != powerCut-1 {
			continue
		}
		now := run.Remember()
		add(bit(now.Check != written.Check || !slices.Equal(now.Values, written.Values)))
		add(int64(now.Check))
		written = now
		if i&1 == 0 {
			run.Start(&now)
		} else {
			run.Start(nil)
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
