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

// typeOf is the C type of a variable.
func typeOf(v *logic.Var) string {
	if v.Kind == logic.Bool {
		return "bool"
	}
	return storage(v.Range)
}

// inputType is what the board hands over: counts as they come.
func inputType(v *logic.Var) string {
	switch {
	case v.Kind == logic.Bool:
		return "bool"
	case v.Signed:
		return "int16_t"
	}
	return "uint16_t"
}

func (w *printer) enumName(v *logic.Var) string { return "enum " + w.lo + "_" + v.Name }

func (w *printer) word(v *logic.Var, n int64) string {
	return strings.ToUpper(w.lo + "_" + v.Name + "_" + v.Enum.Words[n].Name)
}

func (w *printer) macro(name string) string { return w.up + "_" + name }

// literal is an integer constant of at least int16 width; a wider one carries
// its width.
func literal(v int64, wide bool) string {
	switch {
	case v == -1<<31:
		return "(-INT32_C(2147483647) - 1)"
	case wide || !logic.Int16.Holds(v):
		if v < 0 {
			return fmt.Sprintf("(-INT32_C(%d))", -v)
		}
		return fmt.Sprintf("INT32_C(%d)", v)
	case v < 0:
		return fmt.Sprintf("(%d)", v)
	}
	return fmt.Sprint(v)
}
