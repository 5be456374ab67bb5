package csource

import (
	"fmt"
	"strings"

	"makebreak/translate/logic"
)

// PortHeader prints <id>_port.h: what the board must provide.
func (s Source) PortHeader() string {
	w := s.printer()
	guard := w.macro("PORT_H")
	w.banner(s.Facts, w.lo+"_port.h", "what the board must provide")
	w.line("#ifndef %s\n#define %s\n\n#include \"%s.h\"\n", guard, guard, w.lo)
	w.comment("", "Time. Returns once the next step is due, with the number of steps that have become due since the last return: 1 when all is well, more when steps were missed, 0 when there is no clock.")
	w.line("uint16_t %s(void);\n", w.portName("wait"))
	for _, v := range w.p.Inputs {
		w.comment("", inputNote(s.Facts, v))
		w.line("%s %s(void);\n", w.typeOf(v), w.reader(v))
	}
	for _, d := range w.driven(s.Facts) {
		w.comment("", w.driveNote(d))
		w.line("void %s(%s %s);\n", w.driver(d), w.typeOf(d.out), d.parameter())
	}
	if fault := w.faultOutput(); fault != nil {
		w.comment("", "Shows the faults to somebody: a lamp, a display, a bus. Bits are named in "+w.lo+".h.")
		w.line("void %s(uint16_t fault);\n", w.portName("show"))
	}
	w.recordNote(s.Facts)
	w.statement("", "bool ", call(w.portName("recall"), atom("struct "+w.lo+"_remembered *r")), ";")
	w.statement("", "void ", call(w.portName("keep"), atom("const struct "+w.lo+"_remembered *r")), ";\n")
	w.comment("", "Tells the watchdog that a step has been done. Call it nowhere else: not from an interrupt, not from a waiting loop.")
	w.line("void %s(void);\n\n#endif", w.portName("alive"))
	return w.String()
}

func inputNote(f Facts, v *logic.Var) string {
	switch {
	case v.Signed:
		return v.What + bits(f, v) + "; -32768 where there is no new reading"
	case v.Kind == logic.Int:
		return v.What + bits(f, v) + ", as the converter gives them"
	}
	return v.What
}

func (w *printer) recordNote(f Facts) {
	size := 2
	for _, v := range w.p.Survivors() {
		r := holds(keptType(v))
		for n := r.Hi - r.Lo; n > 0; n >>= 8 {
			size++
		}
	}
	lines := []string{fmt.Sprintf("The memory that survives a power cut, for a record of %d bytes (sizeof, where the compiler leaves gaps). Reading returns false where there is none or it cannot be read. A write that is torn is found by the check word and comes up tripped; keep two copies in turn to avoid that.", size)}
	switch {
	case len(w.p.Survivors()) == 0:
		lines = append(lines, "This program has nothing to remember: both may do nothing.")
	case !f.Nonvolatile:
		lines = append(lines, "The sheet names no such memory: without one, every start is a start after a trip.")
	}
	w.comment("", lines...)
}

func (w *printer) reader(v *logic.Var) string { return w.portName("read_" + v.Name) }

// drive is an output of the program that goes to a pin or a converter.
type drive struct {
	out  *logic.Var
	load *Load // nil where the facts do not name one
	name string
}

func (d drive) pulsed() bool { return d.load != nil && d.load.Pulsed }

func (d drive) parameter() string {
	if d.out.Kind == logic.Bool {
		return "current"
	}
	return "value"
}

// driven lists the outputs that go to the board, in their order. Of a load
// with a pulsed drive that is the pulse and not the level; the fault word goes
// to somebody's eyes instead.
func (w *printer) driven(f Facts) []drive {
	var ds []drive
	for _, v := range w.p.Outputs {
		name, pulse := strings.CutSuffix(v.Name, "_drive")
		of := f.load(name)
		pulse = pulse && of != nil && of.Pulsed
		switch {
		case w.isFlags(v):
		case pulse:
			ds = append(ds, drive{v, of, name})
		case f.load(v.Name) != nil && f.load(v.Name).Pulsed && w.output(v.Name+"_drive") != nil:
		default:
			ds = append(ds, drive{v, f.load(v.Name), v.Name})
		}
	}
	return ds
}

func (w *printer) output(name string) *logic.Var {
	for _, v := range w.p.Outputs {
		if v.Name == name {
			return v
		}
	}
	return nil
}

func (w *printer) faultOutput() *logic.Var {
	for _, v := range w.p.Outputs {
		if v.Name == "fault" && w.isFlags(v) {
			return v
		}
	}
	return nil
}

func (w *printer) driver(d drive) string { return w.portName("drive_" + d.name) }

func (d drive) what() string {
	if d.load != nil && d.load.What != "" {
		return d.load.What
	}
	if d.out.What != "" {
		return d.out.What
	}
	return d.name
}

func (w *printer) driveNote(d drive) string {
	switch {
	case d.pulsed():
		return "Sets the pin in front of the pulsed drive of " + d.what() + ": the drive holds while this changes at every step, and lets go when it stands still, either way."
	case d.out.Kind == logic.Bool:
		return "Drives the coil or gate of " + d.what() + ": true puts current into it."
	}
	return fmt.Sprintf("Sets %s, from %d to %d.", d.what(), d.out.Range.Lo, d.out.Range.Hi)
}

// PortBody prints <id>_port.c: the main loop and stubs that the user fills in.
func (s Source) PortBody() string {
	w := s.printer()
	f := s.Facts
	w.comment("", w.lo+"_port.c: main loop and board, to start from.", "",
		"This file is yours: it was written once and is never overwritten. The functions of the board, below the loop, do nothing yet. As they stand no coil gets current, and the loop stops at its first turn, because there is no clock.", "",
		"Still to be supplied: every function marked YOURS, the start of clock, pins and converter before the loop, the watchdog's own setting, and what the C library of the board needs.")
	w.line("#include \"%s_port.h\"\n\n#include <stddef.h>\n", w.lo)
	w.rest(f)
	w.drive(f)
	w.sense()
	w.mainLoop()
	w.stubs(f)
	return w.String()
}

func (w *printer) rest(f Facts) {
	w.comment("", "No current anywhere: what the loads do with no supply.")
	w.line("static void rest(void)\n{")
	for _, d := range w.driven(f) {
		w.annotated("    ", w.driver(d)+"("+numeral(w.resting(d), w.typeOf(d.out))+");", d.name+" then rests"+restWord(d))
	}
	w.line("}\n")
}

func restWord(d drive) string {
	if d.load == nil || d.load.Rest == "" {
		return ""
	}
	return " " + d.load.Rest
}

// resting is the value of an output that puts the least into its load.
func (w *printer) resting(d drive) int64 {
	if d.out.Kind == logic.Bool {
		return 0
	}
	return max(d.out.Range.Lo, min(0, d.out.Range.Hi))
}

func (w *printer) drive(f Facts) {
	w.comment("", "From what the program wants to current in the coils.")
	w.line("static void drive(const struct %s_out *out)\n{", w.lo)
	for _, d := range w.driven(f) {
		out := "out->" + w.vars[d.out]
		switch {
		case d.pulsed():
			w.comment("    ", d.what()+": rests"+restWord(d)+". The pulses carry the load and which way it rests; the level of the load itself goes to no pin.")
		case d.out.Kind != logic.Bool:
			w.comment("    ", d.what()+": goes out as it is.")
		case d.load == nil:
			w.comment("    ", d.what()+": which way it rests is not stated; true puts current into the coil.")
		case d.load.RestsOn:
			w.comment("    ", d.what()+": rests"+restWord(d)+" with no supply, so it is current in the coil that takes it the other way. Current where the program does not want it.")
			out = "!" + out
		default:
			w.comment("    ", d.what()+": rests"+restWord(d)+" with no supply. Current where the program wants it.")
		}
		w.line("    %s(%s);", w.driver(d), out)
	}
	if fault := w.faultOutput(); fault != nil {
		w.line("    %s(out->%s);", w.portName("show"), w.vars[fault])
	}
	if len(w.driven(f)) == 0 && w.faultOutput() == nil {
		w.line("    (void)out;")
	}
	w.line("}\n")
}

func (w *printer) sense() {
	w.line("static void sense(struct %s_in *in)\n{", w.lo)
	for _, v := range w.p.Inputs {
		w.line("    in->%s = %s();", w.vars[v], w.reader(v))
	}
	if len(w.p.Inputs) == 0 {
		w.line("    in->nothing = 0u;")
	}
	w.line("}\n")
}

func (w *printer) mainLoop() {
	w.comment("", "One step that comes late is made up for. More of them, or no clock, mean that the times of the program are wrong: the coils go without current, and the watchdog is left to start the board anew.")
	w.line("#define MOST_STEPS_AT_ONCE 2u\n")
	w.line("int main(void)\n{\n    static struct %s m;\n    static struct %s_remembered kept;\n    struct %s_in in;\n    struct %s_out out;\n    bool recalled;\n", w.lo, w.lo, w.lo, w.lo)
	w.line("    rest();\n    recalled = %s(&kept);\n    %s_start(&m, recalled ? &kept : NULL);\n", w.portName("recall"), w.lo)
	w.line("    for (;;) {\n        uint16_t due = %s();\n", w.portName("wait"))
	w.line("        if ((due == 0u) || (due > MOST_STEPS_AT_ONCE)) {\n            rest();\n            for (;;) {\n                /* the watchdog ends this */\n            }\n        }")
	w.line("        while (due > 0u) {\n            sense(&in);\n            %s_step(&m, &in, &out);\n            drive(&out);\n            due--;\n        }", w.lo)
	w.comment("        ", "The loads first: a memory may take its time.")
	w.line("        if (%s_remember(&m, &kept)) {\n            %s(&kept);\n        }\n        %s();\n    }\n}\n", w.lo, w.portName("keep"), w.portName("alive"))
}

func (w *printer) stubs(f Facts) {
	w.comment("", "The board. Nothing below is done yet.")
	w.line("")
	w.line("uint16_t %s(void)\n{\n    /* YOURS: wait for a hardware timer of %s ms */\n    return 0u; /* no clock */\n}\n", w.portName("wait"), w.macro("STEP_MS"))
	for _, v := range w.p.Inputs {
		value, note := "false", "read the pin; which level a broken wire gives is said in the sheet"
		if v.Kind == logic.Int {
			value, note = "0u", "read the converter; 0 counts as a broken sensor"
			if v.Signed {
				value, note = "INT16_MIN", "read the sensor; this value means no new reading"
			}
		}
		w.line("%s %s(void)\n{\n    /* YOURS: %s */\n    return %s;\n}\n", w.typeOf(v), w.reader(v), note, value)
	}
	for _, d := range w.driven(f) {
		what := "set the pin; it must be without current before the program starts, too"
		if d.out.Kind != logic.Bool {
			what = "set the converter"
		}
		w.line("void %s(%s %s)\n{\n    /* YOURS: %s */\n    (void)%s;\n}\n", w.driver(d), w.typeOf(d.out), d.parameter(), what, d.parameter())
	}
	if w.faultOutput() != nil {
		w.line("void %s(uint16_t fault)\n{\n    /* YOURS: show it */\n    (void)fault;\n}\n", w.portName("show"))
	}
	w.line("bool %s(struct %s_remembered *r)\n{\n    /* YOURS: read it from the memory that survives */\n    (void)r;\n    return false;\n}\n", w.portName("recall"), w.lo)
	w.line("void %s(const struct %s_remembered *r)\n{\n    /* YOURS: write it to the memory that survives */\n    (void)r;\n}\n", w.portName("keep"), w.lo)
	w.line("void %s(void)\n{\n    /* YOURS: %s */\n}", w.portName("alive"), watchdogNote(f.Watchdog))
}

func watchdogNote(kind string) string {
	switch kind {
	case "external":
		return "toggle the pin of the external watchdog"
	case "internal":
		return "reload the watchdog of the controller"
	case "none":
		return "the sheet says there is no watchdog: add one"
	}
	return "the sheet does not say which watchdog there is: find out"
}
