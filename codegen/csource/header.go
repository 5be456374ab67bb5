package csource

import (
	"fmt"

	"makebreak/translate/logic"
)

// Header prints <id>.h: the step, fault bits, states and structs that a caller
// needs, and the three functions.
func (s Source) Header() string {
	w := s.printer()
	guard := w.macro("H")
	w.banner(s.Facts, w.lo+".h", "control program, what a caller needs")
	w.line("#ifndef %s\n#define %s\n", guard, guard)
	w.line("#include <stdbool.h>\n#include <stdint.h>\n")
	w.definition(w.macro("STEP_MS"), natural(w.p.StepMS), "ms from one call of "+w.lo+"_step to the next")
	w.faultBits()
	w.enumerations()
	w.inStruct(s.Facts)
	w.outStruct(s.Facts)
	w.keptStruct()
	w.stateStruct()
	w.prototypes()
	w.line("\n#endif")
	return w.String()
}

// definition prints a macro with its comment: behind it where there is room,
// above it where there is not.
func (w *printer) definition(name, value, note string) {
	w.annotated("", "#define "+name+" "+value, note)
}

// annotated prints a line with its comment behind it, or above it.
func (w *printer) annotated(indent, text, note string) {
	note = Comment(note)
	if note == "" {
		w.line("%s%s", indent, text)
		return
	}
	if len(indent)+len(text)+columns(note)+7 <= lineWidth {
		w.line("%s%s /* %s */", indent, text, note)
		return
	}
	w.comment(indent, note)
	w.line("%s%s", indent, text)
}

func (w *printer) faultBits() {
	for _, b := range w.p.Order {
		f, ok := b.(*logic.Flags)
		if !ok {
			continue
		}
		w.line("")
		if w.isOutput(f.Out) {
			w.comment("", "Bits of "+w.vars[f.Out]+" in struct "+w.lo+"_out; 0 means none.")
		} else {
			w.comment("", "Bits of "+w.vars[f.Out]+"; 0 means none.")
		}
		for i, bit := range f.Bits {
			w.definition(w.flags[f.Out][i], fmt.Sprintf("0x%04Xu", 1<<i), bit.What)
		}
	}
}

func (w *printer) enumerations() {
	for _, e := range enumsOf(w.p) {
		w.line("")
		if what := w.enumMeaning(e); what != "" {
			w.comment("", what)
		}
		w.line("%s {", w.tag(e))
		for i, word := range e.Words {
			comma := ","
			if i == len(e.Words)-1 {
				comma = ""
			}
			w.annotated("    ", fmt.Sprintf("%s = %d%s", w.word(e, int64(i)), i, comma), word.What)
		}
		w.line("};")
	}
}

// enumMeaning is what the first variable of an enumeration says.
func (w *printer) enumMeaning(e *logic.Enum) string {
	for _, vs := range [][]*logic.Var{w.p.State, w.p.Outputs, w.p.Locals} {
		for _, v := range vs {
			if v.Enum == e {
				return v.What
			}
		}
	}
	return ""
}

// member prints one member of a struct.
func (w *printer) member(typ, name, what string) {
	w.annotated("    ", typ+" "+name+";", what)
}

// nothing stands in a struct that would be empty, which C does not allow.
func (w *printer) nothing(vs []*logic.Var, why string) {
	if len(vs) == 0 {
		w.member("uint8_t", "nothing", why)
	}
}

func (w *printer) inStruct(f Facts) {
	w.line("")
	w.comment("", "What the board hands over at every step.")
	w.line("struct %s_in {", w.lo)
	for _, v := range w.p.Inputs {
		w.member(w.typeOf(v), w.vars[v], v.What+bits(f, v))
	}
	w.nothing(w.p.Inputs, "this program reads no input")
	w.line("};")
}

// bits says how wide the converter of an input is, where that is known.
func bits(f Facts, v *logic.Var) string {
	for _, s := range f.Sensors {
		if s.Name == v.Name && s.Bits > 0 {
			return fmt.Sprintf(" (%d bits)", s.Bits)
		}
	}
	return ""
}

func (w *printer) outStruct(f Facts) {
	w.line("")
	w.comment("", "What the program wants. True means that the load is on, or open, whichever way its coil has to be driven for that: "+w.lo+"_port.c does the rest.")
	w.line("struct %s_out {", w.lo)
	for _, v := range w.p.Outputs {
		what := v.What
		if l := f.load(v.Name); l != nil {
			what += "; rests " + l.Rest + ", safe " + l.SafeState
		}
		typ := w.typeOf(v)
		if v.Kind == logic.Word {
			what = w.tag(v.Enum) + ": " + what
		}
		w.member(typ, w.vars[v], what)
	}
	w.nothing(w.p.Outputs, "this program drives no output")
	w.line("};")
}

func (f Facts) load(name string) *Load {
	for i := range f.Loads {
		if f.Loads[i].Name == name {
			return &f.Loads[i]
		}
	}
	return nil
}

func (w *printer) keptStruct() {
	w.line("")
	w.comment("", "What must survive a power cut. The check word tells a good record from blank, torn or foreign memory.")
	w.line("struct %s_remembered {", w.lo)
	for _, v := range w.p.Survivors() {
		w.member(keptType(v), w.kept[v], v.What)
	}
	w.member("uint16_t", "check", "check word over the rest")
	w.line("};")
}

func (w *printer) stateStruct() {
	w.line("")
	w.comment("", "The state of the program. The caller keeps it and changes nothing in it.")
	w.line("struct %s {", w.lo)
	for _, v := range w.p.State {
		what := v.What
		if v.Kind == logic.Word {
			what = w.tag(v.Enum) + ": " + what
		}
		w.member(w.typeOf(v), w.vars[v], what)
	}
	w.nothing(w.p.State, "this program remembers nothing from step to step")
	w.line("};")
}

func (w *printer) prototypes() {
	w.line("")
	w.comment("", "Once after every start of the processor, before the first step. Without a record (NULL), or with a blank, wrong or foreign one, everything that remembers a trip comes up tripped.")
	w.statement("", "void ", w.startHead(), ";\n")
	w.comment("", "Once every "+w.macro("STEP_MS")+". The times of the program are counts of these calls.")
	w.statement("", "void ", w.stepHead(), ";\n")
	w.comment("", "After every step: brings the record up to date. True when it has changed and must be written to the memory that survives.")
	w.statement("", "bool ", w.rememberHead(), ";")
}

func (w *printer) stepHead() piece {
	return call(w.lo+"_step", atom("struct "+w.lo+" *m"), atom("const struct "+w.lo+"_in *in"), atom("struct "+w.lo+"_out *out"))
}

func (w *printer) startHead() piece {
	return call(w.lo+"_start", atom("struct "+w.lo+" *m"), atom("const struct "+w.lo+"_remembered *r"))
}

func (w *printer) rememberHead() piece {
	return call(w.lo+"_remember", atom("const struct "+w.lo+" *m"), atom("struct "+w.lo+"_remembered *r"))
}
