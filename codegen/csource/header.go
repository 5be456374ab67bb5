package csource

import (
	"fmt"
	"strings"

	"makebreak/translate/logic"
)

// Header prints <id>.h: constants, states and structs that a caller needs, and
// the three functions.
func (s Source) Header() string {
	w := s.printer()
	guard := w.up + "_H"
	w.banner(s.Facts, w.lo+".h", "control program, what a caller needs")
	w.line("#ifndef %s\n#define %s\n", guard, guard)
	w.line("#include <stdbool.h>\n#include <stdint.h>\n")
	w.line("#define %s %du /* ms from one call of %s_step to the next */", w.macro("STEP_MS"), w.p.StepMS, w.lo)
	w.faultBits()
	w.enums()
	w.structs(s.Facts)
	w.prototypes()
	w.line("\n#endif")
	return w.String()
}

func (w *printer) faultBits() {
	for _, b := range w.p.Order {
		f, ok := b.(*logic.Flags)
		if !ok {
			continue
		}
		w.line("")
		w.comment("", "Bits of "+f.Out.Name+" in struct "+w.lo+"_out; 0 means none.")
		for i, bit := range f.Bits {
			w.line("#define %s 0x%04Xu /* %s */", w.macro(strings.ToUpper(f.Out.Name+"_"+bit.Name)), 1<<i, Comment(bit.What))
		}
	}
}

func (w *printer) enums() {
	for _, v := range w.p.State {
		if v.Kind != logic.Word {
			continue
		}
		w.line("")
		w.comment("", v.What)
		w.line("%s {", w.enumName(v))
		for i, word := range v.Enum.Words {
			comma := ","
			if i == len(v.Enum.Words)-1 {
				comma = ""
			}
			w.line("    %s = %d%s /* %s */", w.word(v, int64(i)), i, comma, Comment(word.What))
		}
		w.line("};")
	}
}

func (w *printer) structs(f Facts) {
	w.line("")
	w.comment("", "What the board hands over at every step.")
	w.line("struct %s_in {", w.lo)
	for _, v := range w.p.Inputs {
		w.member(inputType(v), v.Name, v.What)
	}
	if len(w.p.Inputs) == 0 {
		w.member("bool", "none", "this program reads nothing")
	}
	w.line("};\n")
	w.comment("", "What the program wants. True means the load is on, or open. Which way the coil is driven follows from what the load does with no supply:")
	w.line("struct %s_out {", w.lo)
	for _, v := range w.p.Outputs {
		what := v.What
		for _, l := range f.Loads {
			if l.Name == v.Name {
				what += "; rests " + l.Rest + ", safe " + l.SafeState
			}
		}
		w.member(typeOf(v), v.Name, what)
	}
	w.line("};\n")
	w.comment("", "What must survive a power cut. The check word tells a good record from blank or foreign memory.")
	w.line("struct %s_remembered {", w.lo)
	for _, v := range w.p.Survivors() {
		w.member(storage(v.Range), v.Name, v.What)
	}
	w.member("uint16_t", "check", "check word over the rest")
	w.line("};\n")
	w.comment("", "The state of the program. The caller keeps it and changes nothing in it.")
	w.line("struct %s {", w.lo)
	for _, v := range w.p.State {
		if v.Kind == logic.Word {
			w.member("uint8_t", v.Name, w.enumName(v)+": "+v.What)
			continue
		}
		w.member(typeOf(v), v.Name, v.What)
	}
	w.line("};")
}

func (w *printer) member(typ, name, what string) {
	decl := fmt.Sprintf("    %s %s;", typ, name)
	note := Comment(what)
	if len(decl)+len(note)+7 <= lineWidth {
		w.line("%s /* %s */", decl, note)
		return
	}
	w.comment("    ", what)
	w.line("%s", decl)
}

func (w *printer) prototypes() {
	w.line("")
	w.comment("", "Once after every start of the processor, before the first step. Without a record (NULL), or with a blank, wrong or foreign one, everything that remembers a trip comes up tripped.")
	w.line("void %s_start(struct %s *m, const struct %s_remembered *r);\n", w.lo, w.lo, w.lo)
	w.comment("", fmt.Sprintf("Once every %s_STEP_MS. The times of the program are counts of these calls.", w.up))
	w.line("void %s_step(struct %s *m, const struct %s_in *in, struct %s_out *out);\n", w.lo, w.lo, w.lo, w.lo)
	w.comment("", "After every step: brings the record up to date. True when it has changed and must be written to the memory that survives.")
	w.line("bool %s_remember(const struct %s *m, struct %s_remembered *r);", w.lo, w.lo, w.lo)
}
