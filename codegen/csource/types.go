package csource

import (
	"fmt"
	"strings"

	"makebreak/translate/logic"
)

// storage is the smallest type that holds a range.
func storage(r logic.Range) string {
	switch {
	case r.Lo >= 0 && r.Hi <= 255:
		return "uint8_t"
	case r.Lo >= 0 && r.Hi <= 65535:
		return "uint16_t"
	case r.Within(logic.Range{Lo: -128, Hi: 127}):
		return "int8_t"
	case r.Within(logic.Int16):
		return "int16_t"
	case r.Lo >= 0:
		return "uint32_t"
	}
	return "int32_t"
}

// holds is what a type can hold.
func holds(typ string) logic.Range {
	switch typ {
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

func unsigned(typ string) bool { return strings.HasPrefix(typ, "uint") }

// typeOf is the C type of a variable, an input or an output.
func (w *printer) typeOf(v *logic.Var) string {
	switch {
	case v.Kind == logic.Bool:
		return "bool"
	case w.isInput(v) && v.Signed:
		return "int16_t"
	case w.isInput(v), w.isFlags(v):
		return "uint16_t"
	case w.isOutput(v) && storage(v.Range) == "int8_t":
		return "int16_t"
	}
	return storage(v.Range)
}

// keptType is the type of a variable in the record: no bool, for what comes
// back from a memory may be any pattern of bits.
func keptType(v *logic.Var) string { return storage(v.Range) }

func (w *printer) isInput(v *logic.Var) bool  { return among(w.p.Inputs, v) }
func (w *printer) isOutput(v *logic.Var) bool { return among(w.p.Outputs, v) }
func (w *printer) isLocal(v *logic.Var) bool  { return !w.isOutput(v) && among(w.p.Locals, v) }

func (w *printer) isFlags(v *logic.Var) bool {
	_, ok := w.gathered[v]
	return ok
}

// read prints where a variable stands.
func (w *printer) read(v *logic.Var) string {
	name := w.vars[v]
	switch {
	case w.isInput(v):
		return "in->" + name
	case w.isLocal(v):
		return name
	case w.isOutput(v):
		return "out->" + name
	}
	if w.proof.watched[v] {
		return "watch->" + name
	}
	return "m->" + name
}

// operand prints what a Use or a Prev reads. Inside a step both stand in the
// same place; seen from behind the step, what was is kept apart.
func (w *printer) operand(e *logic.Expr) string {
	if e.Op == logic.OpPrev && w.proof.after && !w.proof.watched[e.Var] {
		return "before->" + w.vars[e.Var]
	}
	return w.read(e.Var)
}

// literal is a signed integer constant: an int where it fits 16 bits and no
// more is asked for, else as wide as an int32_t.
func literal(v int64, k width) string {
	switch {
	case v == -1<<31:
		return "(-INT32_C(2147483647) - 1)"
	case k == wide || !logic.Int16.Holds(v):
		if v < 0 {
			return fmt.Sprintf("(-INT32_C(%d))", -v)
		}
		return fmt.Sprintf("INT32_C(%d)", v)
	case v == -32768:
		return "(-32767 - 1)"
	case v < 0:
		return fmt.Sprintf("(%d)", v)
	}
	return fmt.Sprint(v)
}

// natural is an unsigned integer constant.
func natural(v int64) string {
	if v > 65535 {
		return fmt.Sprintf("UINT32_C(%d)", v)
	}
	return fmt.Sprintf("%du", v)
}

// numeral is a constant of a type.
func numeral(v int64, typ string) string {
	switch {
	case typ == "bool" && v != 0:
		return "true"
	case typ == "bool":
		return "false"
	case unsigned(typ):
		return natural(v)
	case v < 0 && v > -32768 && typ != "int32_t":
		return fmt.Sprint(v)
	case typ == "int32_t":
		return literal(v, wide)
	}
	return literal(v, narrow)
}
