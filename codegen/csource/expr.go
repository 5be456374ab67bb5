package csource

import (
	"strings"

	"makebreak/translate/logic"
)

// How numbers are worked out in C. A bare unsigned value is compared as it
// stands. Arithmetic is done in int where all of it fits 16 bits, else every
// leaf is widened to int32_t first: casting a result would come too late where
// int has 16 bits.
type width int

const (
	narrow width = iota + 1 // int is enough
	wide                    // int32_t
)

// boolean prints a truth value; nested tells that it stands inside another one.
func (w *printer) boolean(e *logic.Expr, nested bool) string {
	switch e.Op {
	case logic.OpLit:
		if e.Value != 0 {
			return "true"
		}
		return "false"
	case logic.OpUse, logic.OpPrev:
		return w.read(e.Var)
	case logic.OpNot:
		if leaf(e.Args[0]) {
			return "!" + w.boolean(e.Args[0], true)
		}
		return "!(" + w.boolean(e.Args[0], false) + ")"
	case logic.OpSelect:
		return "(" + w.boolean(e.Args[0], true) + " ? " + w.boolean(e.Args[1], true) + " : " + w.boolean(e.Args[2], true) + ")"
	case logic.OpAnd, logic.OpOr:
		parts := make([]string, len(e.Args))
		for i, a := range e.Args {
			parts[i] = w.boolean(a, true)
		}
		return bracket(strings.Join(parts, junction(e.Op)), nested)
	}
	return bracket(w.comparison(e), nested)
}

func junction(op logic.Op) string {
	if op == logic.OpAnd {
		return " && "
	}
	return " || "
}

func bracket(s string, yes bool) string {
	if yes {
		return "(" + s + ")"
	}
	return s
}

func leaf(e *logic.Expr) bool {
	return e.Op == logic.OpUse || e.Op == logic.OpPrev || e.Op == logic.OpConst || e.Op == logic.OpLit
}

var comparisons = map[logic.Op]string{
	logic.OpEq: "==", logic.OpNe: "!=", logic.OpLt: "<", logic.OpLe: "<=", logic.OpGt: ">", logic.OpGe: ">=",
}

func (w *printer) comparison(e *logic.Expr) string {
	a, b := e.Args[0], e.Args[1]
	sign := " " + comparisons[e.Op] + " "
	switch {
	case a.Kind == logic.Bool:
		return w.boolean(a, true) + sign + w.boolean(b, true)
	case a.Kind == logic.Word:
		return w.state(a, b) + sign + w.state(b, a)
	case w.bare(a) && w.bare(b):
		return w.plain(a) + sign + w.plain(b)
	}
	k := w.widthOf(a, b)
	return w.number(a, k) + sign + w.number(b, k)
}

// state prints a machine's state, or the name of one; other tells whose.
func (w *printer) state(e, other *logic.Expr) string {
	if e.Op == logic.OpLit {
		return w.word(other.Var, e.Value)
	}
	return w.read(e.Var)
}

// bare reports whether an operand is an unsigned value just as it stands.
func (w *printer) bare(e *logic.Expr) bool {
	switch e.Op {
	case logic.OpLit:
		return e.Value >= 0
	case logic.OpConst:
		return e.Const.Value >= 0
	case logic.OpUse, logic.OpPrev:
		return strings.HasPrefix(w.typeNow(e.Var), "uint")
	}
	return false
}

func (w *printer) plain(e *logic.Expr) string {
	switch e.Op {
	case logic.OpLit:
		if e.Value > 65535 {
			return strings.Replace(literal(e.Value, true), "INT32_C", "UINT32_C", 1)
		}
		return literal(e.Value, false)[:len(literal(e.Value, false))] + unsignedSuffix(e.Value)
	case logic.OpConst:
		return w.macro(e.Const.Name)
	}
	return w.read(e.Var)
}

func unsignedSuffix(v int64) string {
	if v > 32767 { // literal has widened it already
		return ""
	}
	return "u"
}

// typeNow is the type under which a variable is read.
func (w *printer) typeNow(v *logic.Var) string {
	if w.isInput(v) {
		return inputType(v)
	}
	return typeOf(v)
}

// widthOf finds the width in which all of some expressions can be worked out.
func (w *printer) widthOf(es ...*logic.Expr) width {
	k := narrow
	for _, e := range es {
		w.numbers(e, func(n *logic.Expr) {
			if !w.p.Ranges[n].Within(logic.Int16) {
				k = wide
			}
		})
	}
	return k
}

// numbers walks the numeric nodes that are worked out together.
func (w *printer) numbers(e *logic.Expr, f func(*logic.Expr)) {
	f(e)
	switch e.Op {
	case logic.OpAdd, logic.OpSub, logic.OpMul, logic.OpDiv:
		for _, a := range e.Args {
			w.numbers(a, f)
		}
	case logic.OpSelect:
		w.numbers(e.Args[1], f)
		w.numbers(e.Args[2], f)
	}
}

var arithmetic = map[logic.Op]string{logic.OpAdd: " + ", logic.OpSub: " - ", logic.OpMul: " * ", logic.OpDiv: " / "}

// number prints a numeric expression in the given width; the result is signed.
func (w *printer) number(e *logic.Expr, k width) string {
	cast := "(int16_t)"
	if k == wide {
		cast = "(int32_t)"
	}
	switch e.Op {
	case logic.OpLit:
		return literal(e.Value, k == wide)
	case logic.OpConst:
		return cast + w.macro(e.Const.Name)
	case logic.OpUse, logic.OpPrev:
		if t := w.typeNow(e.Var); t == "int32_t" || (k == narrow && t == "int16_t") {
			return w.read(e.Var)
		}
		return cast + w.read(e.Var)
	case logic.OpSelect:
		return "(" + w.boolean(e.Args[0], true) + " ? " + w.number(e.Args[1], k) + " : " + w.number(e.Args[2], k) + ")"
	case logic.OpClamp, logic.OpToward, logic.OpLookup:
		return cast + w.call(e)
	}
	return "(" + w.number(e.Args[0], k) + arithmetic[e.Op] + w.number(e.Args[1], k) + ")"
}

// call prints one of the small helpers. Clamp has a cheap form for counts.
func (w *printer) call(e *logic.Expr) string {
	switch e.Op {
	case logic.OpLookup:
		return w.lo + "_" + e.Table.Name + "(" + w.number(e.Args[0], wide) + ")"
	case logic.OpClamp:
		if w.unsigned16(e.Args...) {
			return "clamp_u16(" + w.short(e.Args[0]) + ", " + w.short(e.Args[1]) + ", " + w.short(e.Args[2]) + ")"
		}
		return "clamp_i32(" + w.arguments(e.Args) + ")"
	}
	return "toward_i32(" + w.arguments(e.Args) + ")"
}

func (w *printer) arguments(args []*logic.Expr) string {
	parts := make([]string, len(args))
	for i, a := range args {
		parts[i] = w.number(a, wide)
	}
	return strings.Join(parts, ", ")
}

// unsigned16 reports whether all operands are counts: bare values of 16 bits.
func (w *printer) unsigned16(args ...*logic.Expr) bool {
	for _, a := range args {
		if !w.bare(a) || !w.p.Ranges[a].Within(logic.Count) {
			return false
		}
	}
	return true
}

// short prints a bare unsigned value of 16 bits.
func (w *printer) short(e *logic.Expr) string { return w.plain(e) }

// value prints what is assigned to a variable of the given type.
func (w *printer) value(e *logic.Expr, v *logic.Var, typ string) string {
	switch {
	case e.Kind == logic.Bool:
		return w.boolean(e, false)
	case e.Kind == logic.Word && e.Op == logic.OpLit:
		return "(uint8_t)" + w.word(v, e.Value)
	case w.bare(e) && leaf(e) && (e.Op == logic.OpLit || w.fitsType(e, typ)):
		return w.plain(e)
	case e.Op == logic.OpSelect && w.bare(e.Args[1]) && w.bare(e.Args[2]) && strings.HasPrefix(typ, "uint"):
		return "(" + typ + ")(" + w.boolean(e.Args[0], true) + " ? " + w.plain(e.Args[1]) + " : " + w.plain(e.Args[2]) + ")"
	case e.Op == logic.OpClamp && typ == "uint16_t" && w.unsigned16(e.Args...):
		return w.call(e)
	}
	return "(" + typ + ")" + bracket(w.number(e, w.widthOf(e)), !strings.HasPrefix(w.number(e, w.widthOf(e)), "("))
}

// fitsType reports whether a bare value needs no cast to go into a type.
func (w *printer) fitsType(e *logic.Expr, typ string) bool {
	if e.Op == logic.OpConst {
		return strings.HasPrefix(typ, "uint")
	}
	t := w.typeNow(e.Var)
	return t == typ || (strings.HasPrefix(typ, "uint") && size(t) <= size(typ))
}

func size(t string) int {
	switch {
	case strings.Contains(t, "32"):
		return 4
	case strings.Contains(t, "16"):
		return 2
	}
	return 1
}

// read prints where a variable stands.
func (w *printer) read(v *logic.Var) string {
	switch {
	case w.isInput(v):
		return "in->" + v.Name
	case w.isLocal(v):
		return v.Name
	case w.isOutput(v):
		return "out->" + v.Name
	}
	return "m->" + v.Name
}

func (w *printer) isInput(v *logic.Var) bool  { return among(w.p.Inputs, v) }
func (w *printer) isOutput(v *logic.Var) bool { return among(w.p.Outputs, v) }
func (w *printer) isLocal(v *logic.Var) bool  { return !w.isOutput(v) && among(w.p.Locals, v) }

func among(vs []*logic.Var, v *logic.Var) bool {
	for _, x := range vs {
		if x == v {
			return true
		}
	}
	return false
}
