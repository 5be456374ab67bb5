package csource

import (
	"fmt"
	"strings"

	"makebreak/translate/logic"
)

// readers are the macros through which an entry of a table is read, by type.
var readers = map[string]string{
	"uint8_t": "READ_U8", "uint16_t": "READ_U16", "uint32_t": "READ_U32",
	"int8_t": "READ_I8", "int16_t": "READ_I16", "int32_t": "READ_I32",
}

// tableFunctions prints the tables and one function each that reads it.
func (w *printer) tableFunctions() {
	var tables []*logic.Table
	for _, t := range w.p.Tables {
		if w.used.tablesUsed[t] {
			tables = append(tables, t)
		}
	}
	if len(tables) == 0 {
		return
	}
	w.comment("", fmt.Sprintf("Tables. A board that keeps constants in a memory of their own says on the compiler's command line, or in a header that it includes, where a table goes (%s) and how an entry is read (the others, by its type). Elsewhere they are ordinary constants.", w.macro("FLASH")))
	w.line("#ifndef %s\n#define %s\n#endif", w.macro("FLASH"), w.macro("FLASH"))
	done := map[string]bool{}
	for _, t := range tables {
		for _, typ := range []string{storage(span(t.X)), storage(span(t.Y))} {
			if !done[typ] {
				done[typ] = true
				r := w.macro(readers[typ])
				w.line("#ifndef %s\n#define %s(entry) (entry)\n#endif", r, r)
			}
		}
	}
	w.line("")
	for _, t := range tables {
		w.table(t)
	}
}

func (w *printer) table(t *logic.Table) {
	name, tx, ty := w.tables[t], storage(span(t.X)), storage(span(t.Y))
	last := len(t.X) - 1
	w.comment("", tableNote(t))
	w.points(tx, name+"_x", t.X)
	w.points(ty, name+"_y", t.Y)
	x := func(i string) string { return "(int32_t)" + w.macro(readers[tx]) + "(" + name + "_x[" + i + "])" }
	y := func(i string) string { return "(int32_t)" + w.macro(readers[ty]) + "(" + name + "_y[" + i + "])" }
	end := func(i string) string { return w.macro(readers[ty]) + "(" + name + "_y[" + i + "])" }
	arg := w.tableArgument(t)
	at, bound := "x", x // compared as counts where both sides are
	switch {
	case arg == "int32_t":
	case unsigned(tx) && holds(tx).Within(logic.Count):
		bound = func(i string) string { return w.macro(readers[tx]) + "(" + name + "_x[" + i + "])" }
	default:
		at = "(int32_t)x"
	}
	x0 := "x"
	if arg != "int32_t" {
		x0 = "(int32_t)x"
	}
	index := "uint8_t"
	if last > 255 {
		index = "uint16_t"
	}
	w.line("\nstatic %s %s(%s x)\n{", ty, name, arg)
	w.line("    %s i = 1u;\n    int32_t x0;\n    int32_t y0;\n", index)
	w.line("    if (%s <= %s) {\n        return %s;\n    }", at, bound("0"), end("0"))
	w.line("    if (%s >= %s) {\n        return %s;\n    }", at, bound(fmt.Sprint(last)), end(fmt.Sprint(last)))
	w.line("    while (%s > %s) {\n        i++;\n    }", at, bound("i"))
	w.line("    x0 = %s;\n    y0 = %s;", x("i - 1u"), y("i - 1u"))
	w.statement("    ", "return ", chain("+", atom("y0"),
		chain("/",
			chain("*", atom("("+y("i")+" - y0)"), atom("("+x0+" - x0)")).bracketed(),
			atom("("+x("i")+" - x0)")).bracketed()).prefixed("("+ty+")"), ";")
	w.line("}\n")
}

func tableNote(t *logic.Table) string {
	note := t.What
	if t.Unit != "" {
		note += " (" + t.Unit + ")"
	}
	if t.Working != "" {
		note += ": " + t.Working
	}
	return note + "; straight between the points, the end values beyond them"
}

func (w *printer) points(typ, name string, vs []int64) {
	var parts []string
	for _, v := range vs {
		parts = append(parts, numeral(v, typ))
	}
	w.line("static const %s %s[%d] %s = {", typ, name, len(vs), w.macro("FLASH"))
	for _, l := range wrap(strings.Join(parts, ", "), lineWidth-4) {
		w.line("    %s", l)
	}
	w.line("};")
}

// tableArgument is the type that a table's function takes: counts where the
// program asks for nothing else.
func (w *printer) tableArgument(t *logic.Table) string {
	counts := true
	for _, b := range w.order {
		logic.Expressions(b, func(e *logic.Expr) {
			e.Walk(func(n *logic.Expr) {
				if n.Op == logic.OpLookup && n.Table == t {
					counts = counts && w.fits(n.Args[0], "uint16_t")
				}
			})
		})
	}
	if counts {
		return "uint16_t"
	}
	return "int32_t"
}
