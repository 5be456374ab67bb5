package csource

import "makebreak/translate/logic"

// How numbers are worked out in C. A bare unsigned value is compared as it
// stands. Arithmetic is done in int where all of it fits 16 bits, else every
// leaf is widened to int32_t first: casting a result would come too late where
// int has 16 bits.
type width int

const (
	narrow width = iota + 1 // int is enough
	wide                    // int32_t
)

func (k width) typ() string {
	if k == wide {
		return "int32_t"
	}
	return "int16_t"
}

// boolean is a truth value.
func (w *printer) boolean(e *logic.Expr) piece {
	switch e.Op {
	case logic.OpLit:
		return atom(numeral(e.Value, "bool"))
	case logic.OpUse, logic.OpPrev:
		return atom(w.operand(e))
	case logic.OpNot:
		return w.boolean(e.Args[0]).prefixed("!")
	case logic.OpSelect:
		return choice(w.term(e.Args[0]), w.term(e.Args[1]), w.term(e.Args[2]))
	case logic.OpAnd, logic.OpOr:
		parts := make([]piece, len(e.Args))
		for i, a := range e.Args {
			parts[i] = w.term(a)
		}
		return chain(junctions[e.Op], parts...)
	}
	return w.comparison(e)
}

// term is a truth value inside another one.
func (w *printer) term(e *logic.Expr) piece { return w.boolean(e).bracketed() }

// side is a truth value beside == or !=, where a bare ! would look as if it
// went for the whole comparison.
func (w *printer) side(e *logic.Expr) piece {
	p := w.term(e)
	if e.Op == logic.OpNot {
		return chain("", p).bracketed()
	}
	return p
}

var junctions = map[logic.Op]string{logic.OpAnd: "&&", logic.OpOr: "||"}

var comparisons = map[logic.Op]string{
	logic.OpEq: "==", logic.OpNe: "!=", logic.OpLt: "<", logic.OpLe: "<=", logic.OpGt: ">", logic.OpGe: ">=",
}

func (w *printer) comparison(e *logic.Expr) piece {
	a, b := e.Args[0], e.Args[1]
	sign := comparisons[e.Op]
	switch {
	case a.Kind == logic.Bool:
		return chain(sign, w.side(a), w.side(b))
	case a.Kind == logic.Word:
		return chain(sign, w.state(a).bracketed(), w.state(b).bracketed())
	case w.bare(a) != "" && w.bare(b) != "":
		return chain(sign, w.plain(a), w.plain(b))
	}
	k := w.widthOf(a, b)
	return chain(sign, w.number(a, k).bracketed(), w.number(b, k).bracketed())
}

// state is the state of a machine, or the name of one.
func (w *printer) state(e *logic.Expr) piece {
	switch e.Op {
	case logic.OpLit:
		return atom(w.word(e.Enum, e.Value))
	case logic.OpSelect:
		return choice(w.term(e.Args[0]), w.storedState(e.Args[1]), w.storedState(e.Args[2]))
	}
	return atom(w.operand(e))
}

// storedState is a state as it is kept in a variable.
func (w *printer) storedState(e *logic.Expr) piece {
	if e.Op == logic.OpUse || e.Op == logic.OpPrev {
		return w.state(e)
	}
	return w.state(e).prefixed("(uint8_t)")
}

// bare gives the type of what is an unsigned value just as it stands, and
// nothing for what is not.
func (w *printer) bare(e *logic.Expr) string {
	typ := ""
	switch e.Op {
	case logic.OpLit, logic.OpConst:
		if r := w.p.Ranges[e]; r.Lo >= 0 {
			typ = storage(r)
		}
	case logic.OpUse, logic.OpPrev:
		typ = w.typeOf(e.Var)
	default:
		typ = w.helperType(e)
	}
	if !unsigned(typ) {
		return ""
	}
	return typ
}

// plain prints what is bare.
func (w *printer) plain(e *logic.Expr) piece {
	switch e.Op {
	case logic.OpLit:
		return atom(natural(e.Value))
	case logic.OpConst:
		return atom(w.asUnsigned(e.Const))
	case logic.OpUse, logic.OpPrev:
		return atom(w.operand(e))
	}
	return w.helperCall(e)
}

// asUnsigned and asSigned print a constant, and note how it is used: one that
// is used in signed arithmetic alone is defined as a signed number.
func (w *printer) asUnsigned(c *logic.Const) string {
	w.unsignedUse[c] = true
	return w.consts[c]
}

func (w *printer) asSigned(c *logic.Const, k width) piece {
	w.signedUse[c] = true
	name := atom(w.consts[c])
	if w.signed(c) && (k == narrow || !logic.Int16.Holds(c.Value)) {
		return name
	}
	return name.prefixed("(" + k.typ() + ")")
}

// signed reports whether a constant is defined as a signed number.
func (w *printer) signed(c *logic.Const) bool {
	return c.Value < 0 || (w.used.signedUse[c] && !w.used.unsignedUse[c])
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

var arithmetic = map[logic.Op]string{logic.OpAdd: "+", logic.OpSub: "-", logic.OpMul: "*", logic.OpDiv: "/"}

// number is a numeric expression in the given width; the result is signed.
func (w *printer) number(e *logic.Expr, k width) piece {
	switch e.Op {
	case logic.OpLit:
		return atom(literal(e.Value, k))
	case logic.OpConst:
		return w.asSigned(e.Const, k)
	case logic.OpUse, logic.OpPrev:
		return widened(atom(w.operand(e)), w.typeOf(e.Var), k)
	case logic.OpSelect:
		return choice(w.term(e.Args[0]), w.number(e.Args[1], k).bracketed(), w.number(e.Args[2], k).bracketed())
	}
	if t := w.helperType(e); t != "" {
		return widened(w.helperCall(e), t, k)
	}
	return chain(arithmetic[e.Op], w.number(e.Args[0], k).bracketed(), w.number(e.Args[1], k).bracketed())
}

// widened casts a value of a type to a width, where it does not become an int
// of that width by itself.
func widened(p piece, typ string, k width) piece {
	if typ == k.typ() || (k == narrow && holds(typ).Within(logic.Int16)) {
		return p
	}
	return p.prefixed("(" + k.typ() + ")")
}

// helperType is the type that a helper gives, or nothing where an expression is
// not worked out by one.
func (w *printer) helperType(e *logic.Expr) string {
	switch e.Op {
	case logic.OpClamp:
		return w.clampType(e)
	case logic.OpToward:
		return w.towardType(e)
	case logic.OpLookup:
		return storage(span(e.Table.Y))
	}
	return ""
}

// clampType and towardType choose the helper that is used: its numbers are of
// that type.
func (w *printer) clampType(e *logic.Expr) string {
	counts := true
	for _, a := range e.Args {
		counts = counts && w.bare(a) != "" && holds(w.bare(a)).Within(logic.Count)
	}
	if counts {
		return "uint16_t"
	}
	return w.widthOf(e.Args...).typ()
}

func (w *printer) towardType(e *logic.Expr) string {
	y, x := w.p.Ranges[e.Args[0]], w.p.Ranges[e.Args[1]]
	way := logic.Range{Lo: x.Lo - y.Hi, Hi: x.Hi - y.Lo}
	if w.widthOf(e.Args...) == narrow && way.Within(logic.Int16) {
		return "int16_t"
	}
	return "int32_t"
}

// helperCall is a call of one of the small functions.
func (w *printer) helperCall(e *logic.Expr) piece {
	switch e.Op {
	case logic.OpLookup:
		w.tablesUsed[e.Table] = true
		return call(w.tables[e.Table], w.argument(e.Args[0], w.tableArgument(e.Table)))
	case logic.OpClamp:
		return w.helper("clamp", w.clampType(e), e.Args)
	}
	return w.helper("toward", w.towardType(e), e.Args)
}

func (w *printer) helper(what, typ string, args []*logic.Expr) piece {
	name := what + map[string]string{"uint16_t": "_u16", "int16_t": "_i16", "int32_t": "_i32"}[typ]
	w.helpersUsed[name] = true
	var parts []piece
	for _, a := range args {
		parts = append(parts, w.argument(a, typ))
	}
	return call(w.function(name), parts...)
}

// argument is a number as a parameter of a helper.
func (w *printer) argument(e *logic.Expr, typ string) piece {
	switch {
	case unsigned(typ):
		return w.plain(e)
	case e.Op == logic.OpLit:
		return atom(numeral(e.Value, typ))
	case typ == "int32_t":
		return w.number(e, wide)
	}
	p := w.number(e, narrow)
	if !p.closed() { // arithmetic gives an int
		p = p.prefixed("(int16_t)")
	}
	return p
}

// value is what is assigned to a variable of the given type.
func (w *printer) value(e *logic.Expr, typ string) piece {
	switch {
	case e.Kind == logic.Bool:
		return w.boolean(e)
	case e.Kind == logic.Word:
		return w.storedState(e)
	case unsigned(typ) && w.fits(e, typ):
		return w.plain(e)
	case unsigned(typ) && e.Op == logic.OpSelect && w.fits(e.Args[1], typ) && w.fits(e.Args[2], typ):
		return choice(w.term(e.Args[0]), w.plain(e.Args[1]), w.plain(e.Args[2])).prefixed("(" + typ + ")")
	}
	if t := w.helperType(e); t != "" {
		p := w.helperCall(e)
		if t != typ {
			p = p.prefixed("(" + typ + ")")
		}
		return p
	}
	k := w.widthOf(e)
	p := w.number(e, k)
	if k.typ() == typ && (k == wide || p.text != "") {
		return p
	}
	return p.prefixed("(" + typ + ")")
}

// fits reports whether a value is bare and goes into an unsigned type as it is.
func (w *printer) fits(e *logic.Expr, typ string) bool {
	t := w.bare(e)
	return t != "" && holds(t).Within(holds(typ))
}
