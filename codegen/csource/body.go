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
	w.constants()
	w.asserts()
	w.tableFunctions()
	w.helpers()
	w.checkWord()
	w.machineFunctions()
	w.start()
	w.remember()
	w.step()
	return strings.TrimRight(w.String(), "\n") + "\n"
}

// constants prints what the sheet and the calculation have come to.
func (w *printer) constants() {
	if len(w.p.Consts) == 0 {
		return
	}
	w.comment("", "Constants. What the program below can reach was worked out for these values: after a change in the plant, change the sheet and print the program anew.")
	for _, c := range w.p.Consts {
		value := natural(c.Value)
		if w.signed(c) {
			value = literal(c.Value, narrow)
		}
		w.definition(w.consts[c], value, history(c))
	}
	w.line("")
}

// history is what a constant stands for and where it came from.
func history(c *logic.Const) string {
	note := c.Unit
	if c.Means != "" {
		note += ": " + c.Means
	}
	if c.Origin != "" {
		note += " (" + c.Origin + ")"
	}
	if c.Working != "" {
		note += ": " + c.Working
	}
	return note
}

// asserts stop a compiler on which an assumption of the file does not hold,
// and a change by hand that a counter has no room for.
func (w *printer) asserts() {
	w.comment("", "These do not compile where an assumption of this file does not hold.")
	w.assert("int_has_16_bits", "((unsigned)-1) >= 0xFFFFu")
	w.assert("division_cuts_off_towards_zero", "((-7) / 2) == -3")
	n := 0
	room := func(v *logic.Var, limit *logic.Const) {
		if n++; holds(w.typeOf(v)).Hi > logic.Int32.Hi {
			return // a constant has no more than that
		}
		holds := w.asUnsigned(limit) + " <= " + natural(holds(w.typeOf(v)).Hi)
		name := "room_" + w.vars[v]
		if len(name)+len(holds)+len(w.lo) > lineWidth-len("typedef char _[() ? 1 : -1];") {
			name = fmt.Sprintf("room_%d", n)
		}
		w.assert(name, holds)
	}
	for _, b := range w.order {
		switch b := b.(type) {
		case *logic.Timer:
			room(b.Var, b.Limit)
		case *logic.Machine:
			if b.Timer != nil {
				room(b.Timer, b.Limit)
			}
		}
	}
	w.line("")
}

func (w *printer) assert(what, holds string) {
	w.line("typedef char %s_%s[(%s) ? 1 : -1];", w.lo, what, holds)
}

// helpers prints the small functions that the program uses.
func (w *printer) helpers() {
	for _, h := range []struct{ name, typ string }{
		{"clamp_u16", "uint16_t"}, {"clamp_i16", "int16_t"}, {"clamp_i32", "int32_t"},
	} {
		if w.used.helpersUsed[h.name] {
			w.comment("", "x, held between low and high")
			w.line("static %s %s(%s x, %s low, %s high)\n{", h.typ, w.function(h.name), h.typ, h.typ, h.typ)
			w.line("    if (x < low) {\n        return low;\n    }\n    return (x > high) ? high : x;\n}\n")
		}
	}
	for _, h := range []struct{ name, typ, result string }{
		{"toward_i16", "int16_t", "(int16_t)(y + ((x - y) / n))"}, {"toward_i32", "int32_t", "y + ((x - y) / n)"},
	} {
		if w.used.helpersUsed[h.name] {
			w.comment("", "y, moved towards x by the n-th part of the way")
			w.line("static %s %s(%s y, %s x, %s n)\n{\n    return %s;\n}\n", h.typ, w.function(h.name), h.typ, h.typ, h.typ, h.result)
		}
	}
}

func span(vs []int64) logic.Range {
	r := logic.Range{Lo: vs[0], Hi: vs[0]}
	for _, v := range vs {
		r.Lo, r.Hi = min(r.Lo, v), max(r.Hi, v)
	}
	return r
}

// start prints the function that brings the state up.
func (w *printer) start() {
	w.statement("", "void ", w.startHead(), "")
	w.line("{")
	for _, v := range w.p.State {
		w.line("    m->%s = %s;", w.vars[v], w.initial(v))
	}
	if len(w.p.State) == 0 {
		w.line("    m->nothing = 0u;")
	}
	survivors := w.p.Survivors()
	if len(survivors) == 0 {
		w.line("    (void)r; /* nothing of this program survives a power cut */\n}\n")
		return
	}
	w.line("")
	w.condition("    ", "if ", chain("&&", w.believed(survivors)...))
	for _, v := range survivors {
		value := "r->" + w.kept[v]
		if v.Kind == logic.Bool {
			value = "(" + value + " != 0u)"
		}
		w.line("        m->%s = %s;", w.vars[v], value)
	}
	w.line("    }\n}\n")
}

// believed lists what has to hold for a record to be taken over.
func (w *printer) believed(survivors []*logic.Var) []piece {
	is := func(format string, args ...any) piece { return atom("(" + fmt.Sprintf(format, args...) + ")") }
	conditions := []piece{is("r != NULL"), is("r->check == %s(r)", w.function("check_word"))}
	for _, v := range survivors {
		t := keptType(v)
		if v.Range.Lo > holds(t).Lo {
			conditions = append(conditions, is("r->%s >= %s", w.kept[v], numeral(v.Range.Lo, t)))
		}
		if v.Range.Hi < holds(t).Hi {
			conditions = append(conditions, is("r->%s <= %s", w.kept[v], numeral(v.Range.Hi, t)))
		}
	}
	return conditions
}

func (w *printer) initial(v *logic.Var) string {
	if v.Kind == logic.Word {
		return "(uint8_t)" + w.word(v.Enum, v.Start)
	}
	return numeral(v.Start, w.typeOf(v))
}

// checkWord prints logic.Program.CheckWord.
func (w *printer) checkWord() {
	survivors := w.p.Survivors()
	if len(survivors) == 0 {
		return
	}
	w.comment("", "Check word of a record. It starts from a number that belongs to records of this program alone; no blank record has it.")
	w.line("static uint16_t %s(const struct %s_remembered *r)\n{", w.function("check_word"), w.lo)
	w.line("    uint16_t word = %s;\n", natural(int64(w.p.CheckSeed())))
	add := func(value string) {
		w.statement("    ", "word = ", chain("&", atom(fmt.Sprintf("((word * %du) + %s)", logic.CheckFactor, value)), atom("0xFFFFu")).prefixed("(uint16_t)"), ";")
	}
	for _, v := range survivors {
		value := "r->" + w.kept[v]
		switch t := keptType(v); {
		case v.Range.Hi > 65535 || v.Range.Lo < -32768:
			add("(uint16_t)((uint32_t)" + value + " >> 16)")
			add("(uint16_t)((uint32_t)" + value + " & UINT32_C(0xFFFF))")
		case unsigned(t):
			add(value)
		default: // no shorter cast: an old avr-gcc warns of the sign
			add("((uint32_t)" + value + " & UINT32_C(0xFFFF))")
		}
	}
	w.line("    return word;\n}\n")
}

// remember prints the function that fills the record.
func (w *printer) remember() {
	survivors := w.p.Survivors()
	w.statement("", "bool ", w.rememberHead(), "")
	w.line("{")
	if len(survivors) == 0 {
		w.line("    const bool changed = r->check != %s;\n", natural(int64(w.p.CheckSeed())))
		w.line("    (void)m; /* nothing of this program survives a power cut */")
		w.line("    r->check = %s;\n    return changed;\n}\n", natural(int64(w.p.CheckSeed())))
		return
	}
	w.line("    struct %s_remembered now;\n    bool changed;\n", w.lo)
	for _, v := range survivors {
		value := "m->" + w.vars[v]
		if v.Kind == logic.Bool {
			value = "(uint8_t)(" + value + " ? 1u : 0u)"
		}
		w.line("    now.%s = %s;", w.kept[v], value)
	}
	w.line("    now.check = %s(&now);", w.function("check_word"))
	var differs []piece
	for _, v := range survivors {
		differs = append(differs, atom(fmt.Sprintf("(now.%s != r->%s)", w.kept[v], w.kept[v])))
	}
	w.statement("    ", "changed = ", chain("||", append(differs, atom("(now.check != r->check)"))...), ";")
	w.line("    *r = now;\n    return changed;\n}\n")
}
