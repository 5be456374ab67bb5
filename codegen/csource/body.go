package csource

import (
	"fmt"
	"strings"

	"makebreak/translate/logic"
)

// Body prints <id>.c.
func (s Source) Body() string {
	w := s.printer()
	w.banner(s.Facts, w.lo+".c", "control program")
	w.line("#include \"%s.h\"\n\n#include <stddef.h>\n", w.lo)
	w.asserts()
	w.constants()
	w.tables()
	w.helpers()
	w.checkWord()
	for _, b := range w.p.Order {
		if m, ok := b.(*logic.Machine); ok {
			w.machine(m)
		}
	}
	w.start()
	w.remember()
	w.step()
	return strings.TrimRight(w.String(), "\n") + "\n"
}

// asserts stop a compiler on which an assumption of this file does not hold.
func (w *printer) asserts() {
	w.comment("", "These do not compile where an assumption of this file does not hold.")
	w.line("typedef char %s_assert_int_has_16_bits[(((unsigned)-1) >= 0xFFFFu) ? 1 : -1];", w.lo)
	w.line("typedef char %s_assert_division_cuts_off_towards_zero[(((-7) / 2) == -3) ? 1 : -1];", w.lo)
	w.line("")
}

func (w *printer) constants() {
	for _, c := range w.p.Consts {
		value := fmt.Sprintf("%du", c.Value)
		switch {
		case c.Value < 0:
			value = literal(c.Value, false)
		case c.Value > 65535:
			value = fmt.Sprintf("UINT32_C(%d)", c.Value)
		}
		note := c.Unit + ": " + c.Means + " (" + c.Origin + ")"
		if c.Working != "" {
			note += ": " + c.Working
		}
		lines := wrap(Comment(note), lineWidth-3)
		def := fmt.Sprintf("#define %s %s", w.macro(c.Name), value)
		if len(lines) == 1 && len(def)+len(lines[0])+7 <= lineWidth {
			w.line("%s /* %s */", def, lines[0])
			continue
		}
		w.comment("", note)
		w.line("%s", def)
	}
	w.line("")
}

func (w *printer) tables() {
	if len(w.p.Tables) == 0 {
		return
	}
	w.comment("", "A board that keeps constants apart from its other memory defines these two before this file.")
	w.line("#ifndef %s\n#define %s /* where tables are placed */\n#endif", w.macro("TABLE"), w.macro("TABLE"))
	w.line("#ifndef %s\n#define %s(x) (x) /* how an entry is read */\n#endif\n", w.macro("ENTRY"), w.macro("ENTRY"))
	for _, t := range w.p.Tables {
		w.table(t)
	}
}

func span(vs []int64) logic.Range {
	r := logic.Range{Lo: vs[0], Hi: vs[0]}
	for _, v := range vs {
		r.Lo, r.Hi = min(r.Lo, v), max(r.Hi, v)
	}
	return r
}

func (w *printer) table(t *logic.Table) {
	tx, ty := storage(span(t.X)), storage(span(t.Y))
	n := len(t.X)
	w.comment("", t.What+" ("+t.Unit+"): "+t.Working)
	list := func(typ, name string, vs []int64) {
		var parts []string
		for _, v := range vs {
			parts = append(parts, literal(v, typ == "int32_t" || typ == "uint32_t"))
		}
		w.line("static const %s %s_%s[%d] %s = {", typ, t.Name, name, n, w.macro("TABLE"))
		for _, l := range wrap(strings.Join(parts, ", "), lineWidth-8) {
			w.line("    %s", l)
		}
		w.line("};")
	}
	list(tx, "x", t.X)
	list(ty, "y", t.Y)
	x := func(i string) string { return fmt.Sprintf("(int32_t)%s(%s_x[%s])", w.macro("ENTRY"), t.Name, i) }
	y := func(i string) string { return fmt.Sprintf("(int32_t)%s(%s_y[%s])", w.macro("ENTRY"), t.Name, i) }
	w.line("\nstatic int32_t %s_%s(int32_t x)\n{", w.lo, t.Name)
	w.line("    uint16_t i = 1u;\n    int32_t x0;\n    int32_t y0;\n")
	w.line("    if (x <= %s) {\n        return %s;\n    }", x("0"), y("0"))
	w.line("    if (x >= %s) {\n        return %s;\n    }", x(fmt.Sprint(n-1)), y(fmt.Sprint(n-1)))
	w.line("    while (x > %s) {\n        i++;\n    }", x("i"))
	w.line("    x0 = %s;\n    y0 = %s;", x("i - 1u"), y("i - 1u"))
	w.line("    return y0 + (((%s - y0) * (x - x0)) / (%s - x0));\n}\n", y("i"), x("i"))
}

// helpers prints the small functions that the program uses.
func (w *printer) helpers() {
	used := map[string]bool{}
	for _, b := range w.p.Order {
		logic.Expressions(b, func(e *logic.Expr) {
			e.Walk(func(n *logic.Expr) {
				switch {
				case n.Op == logic.OpClamp && w.unsigned16(n.Args...):
					used["clamp_u16"] = true
				case n.Op == logic.OpClamp:
					used["clamp_i32"] = true
				case n.Op == logic.OpToward:
					used["toward_i32"] = true
				}
			})
		})
	}
	clamp := func(name, typ string) {
		if used[name] {
			w.line("static %s %s(%s x, %s low, %s high)\n{", typ, name, typ, typ, typ)
			w.line("    if (x < low) {\n        return low;\n    }\n    return (x > high) ? high : x;\n}\n")
		}
	}
	clamp("clamp_u16", "uint16_t")
	clamp("clamp_i32", "int32_t")
	if used["toward_i32"] {
		w.line("static int32_t toward_i32(int32_t y, int32_t x, int32_t n)\n{\n    return y + ((x - y) / n);\n}\n")
	}
}

// machine prints one machine as a function of what it reads.
func (w *printer) machine(m *logic.Machine) {
	w.comment("", m.What)
	w.line("static void %s(%s)\n{", w.function(m), strings.Join(w.parameters(m, true), ", "))
	if m.Timer != nil {
		w.line("    if (m->%s < %s) {\n        m->%s++;\n    }", m.Timer.Name, w.macro(m.Limit.Name), m.Timer.Name)
	}
	w.line("    switch ((%s)m->%s) {", w.enumName(m.Var), m.Var.Name)
	for i, s := range m.At {
		w.line("    case %s:", w.word(m.Var, int64(i)))
		w.transitions(m, s)
		w.line("        break;")
	}
	w.line("    default: /* not a state: memory was upset */")
	w.enter("        ", m, m.Safe)
	w.line("        break;\n    }\n}\n")
}

func (w *printer) function(m *logic.Machine) string { return w.lo + "_" + m.Var.Name }

func (w *printer) transitions(m *logic.Machine, s *logic.State) {
	for i, t := range s.Goes {
		word := "if"
		if i > 0 {
			word = "} else if"
		}
		w.guard("        ", word, t.When)
		if t.Why != "" {
			w.comment("            ", t.Why)
		}
		w.enter("            ", m, t.To)
		for _, a := range t.Do {
			w.set("            ", a, false)
		}
	}
	if len(s.Goes) > 1 {
		w.line("        } else {\n            /* stays */\n        }")
	} else if len(s.Goes) == 1 {
		w.line("        }")
	}
}

// guard prints an if, broken at its junctions where it is long.
func (w *printer) guard(indent, word string, e *logic.Expr) {
	text := "true"
	if e != nil {
		text = w.boolean(e, false)
	}
	first := indent + word + " ("
	if len(first)+len(text)+3 <= lineWidth || (e.Op != logic.OpAnd && e.Op != logic.OpOr) {
		w.line("%s%s) {", first, text)
		return
	}
	pad := strings.Repeat(" ", len(first))
	for i, a := range e.Args {
		lead, tail := pad, strings.TrimRight(junction(e.Op), " ")
		if i == 0 {
			lead = first
		}
		if i == len(e.Args)-1 {
			tail = ") {"
		}
		w.line("%s%s%s", lead, w.boolean(a, true), tail)
	}
}

func (w *printer) enter(indent string, m *logic.Machine, state int) {
	w.line("%sm->%s = (uint8_t)%s;", indent, m.Var.Name, w.word(m.Var, int64(state)))
	if m.Timer != nil {
		w.line("%sm->%s = 0u;", indent, m.Timer.Name)
	}
}

// parameters lists what a machine reads: the state, the inputs, outputs and
// locals. With types they declare, without they call.
func (w *printer) parameters(m *logic.Machine, types bool) []string {
	ps := []string{"m"}
	if types {
		ps[0] = "struct " + w.lo + " *m"
	}
	seen := map[*logic.Var]bool{}
	in, out := false, false
	var locals []*logic.Var
	logic.Expressions(m, func(e *logic.Expr) {
		e.Walk(func(n *logic.Expr) {
			switch {
			case n.Var == nil || seen[n.Var]:
			case w.isInput(n.Var):
				in = true
			case w.isOutput(n.Var):
				out = true
			case w.isLocal(n.Var):
				seen[n.Var] = true
				locals = append(locals, n.Var)
			}
		})
	})
	add := func(decl, name string) {
		if types {
			name = decl + name
		}
		ps = append(ps, name)
	}
	if in {
		add("const struct "+w.lo+"_in *", "in")
	}
	if out {
		add("const struct "+w.lo+"_out *", "out")
	}
	for _, v := range locals {
		add(typeOf(v)+" ", v.Name)
	}
	return ps
}

func (w *printer) start() {
	w.line("void %s_start(struct %s *m, const struct %s_remembered *r)\n{", w.lo, w.lo, w.lo)
	for _, v := range w.p.State {
		w.line("    m->%s = %s;", v.Name, w.initial(v))
	}
	survivors := w.p.Survivors()
	if len(survivors) == 0 {
		w.line("    (void)r; /* nothing of this program survives a power cut */\n}\n")
		return
	}
	conds := []string{"(r != NULL)", "(r->check == check_word(r))"}
	for _, v := range survivors {
		t := storage(v.Range)
		if v.Range.Lo > typeRange(t).Lo {
			conds = append(conds, fmt.Sprintf("(r->%s >= %s)", v.Name, w.numeral(v.Range.Lo, t)))
		}
		if v.Range.Hi < typeRange(t).Hi {
			conds = append(conds, fmt.Sprintf("(r->%s <= %s)", v.Name, w.numeral(v.Range.Hi, t)))
		}
	}
	w.line("    if (%s) {", strings.Join(conds, " &&\n        "))
	for _, v := range survivors {
		if v.Kind == logic.Bool {
			w.line("        m->%s = (r->%s != 0u);", v.Name, v.Name)
			continue
		}
		w.line("        m->%s = r->%s;", v.Name, v.Name)
	}
	w.line("    }\n}\n")
}

func typeRange(t string) logic.Range {
	switch t {
	case "uint8_t":
		return logic.Range{Lo: 0, Hi: 255}
	case "uint16_t":
		return logic.Count
	case "int8_t":
		return logic.Range{Lo: -128, Hi: 127}
	case "int16_t":
		return logic.Int16
	case "uint32_t":
		return logic.Range{Lo: 0, Hi: 1<<32 - 1}
	}
	return logic.Int32
}

func (w *printer) initial(v *logic.Var) string {
	switch {
	case v.Kind == logic.Bool && v.Start != 0:
		return "true"
	case v.Kind == logic.Bool:
		return "false"
	case v.Kind == logic.Word:
		return "(uint8_t)" + w.word(v, v.Start)
	}
	return w.numeral(v.Start, typeOf(v))
}

// numeral is a literal of a type.
func (w *printer) numeral(v int64, typ string) string {
	if !strings.HasPrefix(typ, "uint") {
		return literal(v, typ == "int32_t")
	}
	if v > 65535 {
		return fmt.Sprintf("UINT32_C(%d)", v)
	}
	return fmt.Sprintf("%du", v)
}

// checkWord prints logic.Program.CheckWord.
func (w *printer) checkWord() {
	survivors := w.p.Survivors()
	w.comment("", "Check word of a record. It starts from a number that belongs to this program's record alone, and no blank record has it.")
	w.line("static uint16_t check_word(const struct %s_remembered *r)\n{", w.lo)
	w.line("    uint32_t word = UINT32_C(%d);\n", w.p.CheckSeed())
	add := func(value string) {
		w.line("    word = ((word * UINT32_C(%d)) + %s) & UINT32_C(0xFFFF);", logic.CheckFactor, value)
	}
	for _, v := range survivors {
		u := "(uint32_t)r->" + v.Name
		if v.Range.Hi > 65535 || v.Range.Lo < -32768 {
			add("(" + u + " >> 16)")
		}
		add("(" + u + " & UINT32_C(0xFFFF))")
	}
	if len(survivors) == 0 {
		w.line("    (void)r;")
	}
	w.line("    return (uint16_t)word;\n}\n")
}

func (w *printer) remember() {
	w.line("bool %s_remember(const struct %s *m, struct %s_remembered *r)\n{", w.lo, w.lo, w.lo)
	w.line("    uint16_t check;\n    bool changed = false;\n")
	for _, v := range w.p.Survivors() {
		now := "m->" + v.Name
		if v.Kind == logic.Bool {
			now = "(m->" + v.Name + " ? 1u : 0u)"
		}
		w.line("    if (r->%s != %s) {", v.Name, now)
		if v.Kind == logic.Bool {
			w.line("        r->%s = (uint8_t)%s;", v.Name, now)
		} else {
			w.line("        r->%s = %s;", v.Name, now)
		}
		w.line("        changed = true;\n    }")
	}
	if len(w.p.Survivors()) == 0 {
		w.line("    (void)m;")
	}
	w.line("    check = check_word(r);\n    if (r->check != check) {\n        r->check = check;\n        changed = true;\n    }\n    return changed;\n}\n")
}

func (w *printer) step() {
	w.line("void %s_step(struct %s *m, const struct %s_in *in, struct %s_out *out)\n{", w.lo, w.lo, w.lo, w.lo)
	for _, v := range w.p.Locals {
		w.member(typeOf(v), v.Name, v.What)
	}
	if len(w.p.Locals) > 0 {
		w.line("")
	}
	if !w.readsInputs() {
		w.line("    (void)in;")
	}
	for _, b := range w.p.Order {
		switch b := b.(type) {
		case *logic.Define:
			w.assign("    ", w.read(b.Var), w.value(b.As, b.Var, typeOf(b.Var)), b.As)
		case *logic.Set:
			w.set("    ", b, true)
		case *logic.Timer:
			w.timer(b)
		case *logic.Machine:
			w.line("    %s(%s);", w.function(b), strings.Join(w.parameters(b, false), ", "))
		case *logic.Flags:
			w.flags(b)
		}
	}
	w.line("}")
}

func (w *printer) readsInputs() bool {
	reads := false
	for _, b := range w.p.Order {
		logic.Expressions(b, func(e *logic.Expr) {
			e.Walk(func(n *logic.Expr) { reads = reads || (n.Var != nil && w.isInput(n.Var)) })
		})
	}
	return reads
}

// assign prints an assignment, broken at its junctions where it is long.
func (w *printer) assign(indent, to, value string, e *logic.Expr) {
	fits := len(indent)+len(to)+len(value)+4 <= lineWidth
	if condition, branches, ok := strings.Cut(value, " ? "); !fits && ok && e.Op == logic.OpSelect {
		w.line("%s%s = %s", indent, to, condition)
		w.line("%s    ? %s;", indent, branches)
		return
	}
	if fits || (e.Op != logic.OpAnd && e.Op != logic.OpOr) {
		w.line("%s%s = %s;", indent, to, value)
		return
	}
	for i, a := range e.Args {
		lead, tail := indent+"    ", strings.TrimRight(junction(e.Op), " ")
		if i == 0 {
			lead = indent + to + " = "
		}
		if i == len(e.Args)-1 {
			tail = ";"
		}
		w.line("%s%s%s", lead, w.boolean(a, true), tail)
	}
}

func (w *printer) set(indent string, s *logic.Set, why bool) {
	inner := indent
	if s.When != nil {
		w.guard(indent, "if", s.When)
		inner += "    "
	}
	if why && s.Why != "" {
		w.comment(inner, s.Why)
	}
	w.assign(inner, w.read(s.Var), w.value(s.To, s.Var, typeOf(s.Var)), s.To)
	if s.When != nil {
		w.line("%s}", indent)
	}
}

func (w *printer) timer(t *logic.Timer) {
	w.guard("    ", "if", t.Restart)
	if t.Why != "" {
		w.comment("        ", t.Why)
	}
	w.line("        m->%s = 0u;", t.Var.Name)
	tick := fmt.Sprintf("m->%s < %s", t.Var.Name, w.macro(t.Limit.Name))
	if t.Hold != nil {
		tick = w.boolean(logic.Not(t.Hold), true) + " && (" + tick + ")"
	}
	w.line("    } else if (%s) {\n        m->%s++;\n    } else {\n        /* stays */\n    }", tick, t.Var.Name)
}

func (w *printer) flags(f *logic.Flags) {
	to := w.read(f.Out)
	w.line("    %s = 0u;", to)
	for _, bit := range f.Bits {
		w.guard("    ", "if", bit.When)
		w.line("        %s = (%s)(%s | %s);\n    }", to, typeOf(f.Out), to, w.macro(strings.ToUpper(f.Out.Name+"_"+bit.Name)))
	}
}
