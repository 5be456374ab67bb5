package csource

import (
	"fmt"
	"strings"

	"makebreak/translate/logic"
)

// PortHeader prints <id>_port.h: what the board must provide.
func (s Source) PortHeader() string {
	w := s.printer()
	guard := w.up + "_PORT_H"
	w.banner(s.Facts, w.lo+"_port.h", "what the board must provide")
	w.line("#ifndef %s\n#define %s\n\n#include \"%s.h\"\n", guard, guard, w.lo)
	w.comment("", "Time. Returns once the next step is due, with the number of steps that have become due since the last return: 1 when all is well, more when steps were missed.")
	w.line("uint16_t %s(void);\n", w.portName("wait"))
	for _, v := range w.p.Inputs {
		what := v.What
		switch {
		case v.Signed:
			what += "; -32768 where there is no new reading"
		case v.Kind == logic.Int:
			what += ", as the converter gives them"
		}
		w.comment("", what)
		w.line("%s %s(void);\n", inputType(v), w.portName(v.Name))
	}
	for _, v := range w.p.Outputs {
		if v.Kind == logic.Bool && !w.levelOfPulsed(s.Facts, v) {
			w.comment("", fmt.Sprintf("Drives the coil or gate of %s: true puts current into it.", v.What))
			w.line("void %s(bool driven);\n", w.portName("drive_"+baseOf(v.Name)))
		}
	}
	w.comment("", "Shows the faults to somebody: a lamp, a display, a bus. Bits are named in "+w.lo+".h.")
	w.line("void %s(uint16_t fault);\n", w.portName("show"))
	w.comment("", "The memory that survives a power cut. Reading returns false where there is none or it cannot be read. A write must not be torn: write a second copy, or let the check word find the torn one, which then comes up tripped.")
	w.line("bool %s(struct %s_remembered *r);\nvoid %s(const struct %s_remembered *r);\n", w.portName("recall"), w.lo, w.portName("keep"), w.lo)
	w.comment("", "Tells the watchdog that a step has been done. Call it nowhere else: not from an interrupt, not from a waiting loop.")
	w.line("void %s(void);\n", w.portName("alive"))
	w.line("#endif")
	return w.String()
}

func (w *printer) portName(what string) string { return w.lo + "_port_" + what }

// baseOf is the load that a pulsed drive belongs to.
func baseOf(output string) string { return strings.TrimSuffix(output, "_drive") }

// levelOfPulsed reports whether an output is the level of a load whose drive
// is pulsed: that one does not go to a pin.
func (w *printer) levelOfPulsed(f Facts, v *logic.Var) bool {
	for _, l := range f.Loads {
		if l.Name == v.Name && l.Pulsed {
			return true
		}
	}
	return false
}

// PortBody prints <id>_port.c: the main loop and stubs that the user fills in.
func (s Source) PortBody() string {
	w := s.printer()
	f := s.Facts
	w.comment("", w.lo+"_port.c: main loop and board, to start from. This file is yours: it was written once and is never overwritten. The functions of the board below do nothing yet; they leave every coil without current. Fill in each of them, then take the line with "+w.macro("BOARD_IS_FILLED_IN")+" out.")
	w.line("#include \"%s_port.h\"\n\n#include <stddef.h>\n", w.lo)
	w.mainLoop(f)
	w.stubs(f)
	return w.String()
}

func (w *printer) mainLoop(f Facts) {
	w.comment("", "Coils without current: what the loads do with no supply.")
	w.line("static void rest(void)\n{")
	for _, v := range w.p.Outputs {
		if v.Kind == logic.Bool && !w.levelOfPulsed(f, v) {
			w.line("    %s(false);", w.portName("drive_"+baseOf(v.Name)))
		}
	}
	w.line("}\n")
	w.line("static void drive(const struct %s_out *out)\n{", w.lo)
	for _, l := range f.Loads {
		name := l.Name
		switch {
		case l.Pulsed:
			w.comment("    ", l.What+": pulses hold it; when the program stops, so do they. Rests "+l.Rest+".")
			w.line("    %s(out->%s_drive);", w.portName("drive_"+name), name)
		case l.RestsOn:
			w.comment("    ", l.What+": rests "+l.Rest+", so current in the coil takes it the other way.")
			w.line("    %s(!out->%s);", w.portName("drive_"+name), name)
		default:
			w.comment("    ", l.What+": rests "+l.Rest+".")
			w.line("    %s(out->%s);", w.portName("drive_"+name), name)
		}
	}
	w.line("    %s(out->fault);\n}\n", w.portName("show"))
	w.line("static void sense(struct %s_in *in)\n{", w.lo)
	for _, v := range w.p.Inputs {
		w.line("    in->%s = %s();", v.Name, w.portName(v.Name))
	}
	w.line("}\n")
	w.comment("", "A step that comes late by one is made up for; more of them mean that the times of the program are wrong, so the coils go without current and the watchdog is left to start the board anew.")
	w.line("#define MOST_STEPS_AT_ONCE 2u\n")
	w.line("int main(void)\n{\n    static struct %s m;\n    static struct %s_remembered kept;\n    struct %s_in in;\n    struct %s_out out;\n    bool recalled;\n", w.lo, w.lo, w.lo, w.lo)
	w.line("    rest();\n    recalled = %s(&kept);\n    %s_start(&m, recalled ? &kept : NULL);\n", w.portName("recall"), w.lo)
	w.line("    for (;;) {\n        uint16_t due = %s();\n", w.portName("wait"))
	w.line("        if ((due == 0u) || (due > MOST_STEPS_AT_ONCE)) {\n            rest();\n            for (;;) {\n                /* the watchdog ends this */\n            }\n        }")
	w.line("        while (due > 0u) {\n            sense(&in);\n            %s_step(&m, &in, &out);\n            due--;\n        }", w.lo)
	w.line("        drive(&out);\n        if (%s_remember(&m, &kept)) {\n            %s(&kept);\n        }\n        %s();\n    }\n}\n", w.lo, w.portName("keep"), w.portName("alive"))
}

func (w *printer) stubs(f Facts) {
	w.comment("", "The board. Nothing below is done yet.")
	w.line("#define %s 0 /* 1 once every function below does its work */\n", w.macro("BOARD_IS_FILLED_IN"))
	w.line("uint16_t %s(void)\n{\n    /* wait for a hardware timer of %s ms */\n    return %s;\n}\n", w.portName("wait"), w.macro("STEP_MS"), "(uint16_t)"+w.macro("BOARD_IS_FILLED_IN"))
	for _, v := range w.p.Inputs {
		value, note := "false", "read the pin; which level a broken wire gives is said in the sheet"
		if v.Kind == logic.Int {
			value, note = "0u", "read the converter; 0 counts as a broken sensor"
			if v.Signed {
				value, note = "INT16_MIN", "read the sensor; this value means no new reading"
			}
		}
		w.line("%s %s(void)\n{\n    /* %s */\n    return %s;\n}\n", inputType(v), w.portName(v.Name), note, value)
	}
	for _, v := range w.p.Outputs {
		if v.Kind == logic.Bool && !w.levelOfPulsed(f, v) {
			w.line("void %s(bool driven)\n{\n    (void)driven; /* set the pin */\n}\n", w.portName("drive_"+baseOf(v.Name)))
		}
	}
	w.line("void %s(uint16_t fault)\n{\n    (void)fault; /* show it */\n}\n", w.portName("show"))
	w.line("bool %s(struct %s_remembered *r)\n{\n    (void)r; /* read it from the memory that survives */\n    return false;\n}\n", w.portName("recall"), w.lo)
	w.line("void %s(const struct %s_remembered *r)\n{\n    (void)r; /* write it to the memory that survives */\n}\n", w.portName("keep"), w.lo)
	note := map[string]string{"external": "toggle the pin of the external watchdog", "internal": "reload the watchdog of the controller", "none": "the sheet says there is no watchdog: add one"}[f.Watchdog]
	if note == "" {
		note = "the sheet does not say which watchdog there is: find out"
	}
	w.line("void %s(void)\n{\n    /* %s */\n}", w.portName("alive"), note)
}
