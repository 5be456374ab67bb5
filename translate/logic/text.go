package logic

import (
	"fmt"
	"strings"
)

var opText = map[Op]string{
	OpAdd: "+", OpSub: "-", OpMul: "*", OpDiv: "/",
	OpEq: "is", OpNe: "is not", OpLt: "<", OpLe: "<=", OpGt: ">", OpGe: ">=",
	OpAnd: "and", OpOr: "or",
}

// String gives the expression as a person would write it down. Operands are
// bracketed by node, never by looking at text.
func (e *Expr) String() string {
	if e == nil {
		return "always"
	}
	switch e.Op {
	case OpLit:
		return literal(e)
	case OpConst:
		return e.Const.Name
	case OpUse:
		return e.Var.Name
	case OpPrev:
		return "previous " + e.Var.Name
	case OpNot:
		return "not " + operand(e.Args[0])
	case OpSelect:
		return fmt.Sprintf("%s if %s else %s", operand(e.Args[1]), operand(e.Args[0]), operand(e.Args[2]))
	case OpClamp:
		return fmt.Sprintf("%s held within %s..%s", operand(e.Args[0]), operand(e.Args[1]), operand(e.Args[2]))
	case OpToward:
		return fmt.Sprintf("%s moved towards %s by 1/%s of the way", operand(e.Args[0]), operand(e.Args[1]), operand(e.Args[2]))
	case OpLookup:
		return fmt.Sprintf("%s at %s", e.Table.Name, operand(e.Args[0]))
	}
	parts := make([]string, len(e.Args))
	for i, a := range e.Args {
		parts[i] = operand(a)
	}
	return strings.Join(parts, " "+opText[e.Op]+" ")
}

func operand(e *Expr) string {
	switch e.Op {
	case OpLit, OpConst, OpUse, OpPrev, OpNot:
		return e.String()
	}
	return "(" + e.String() + ")"
}

func literal(e *Expr) string {
	switch {
	case e.Kind == Word && int(e.Value) < len(e.Enum.Words):
		return e.Enum.Words[e.Value].Name
	case e.Kind == Bool && e.Value != 0:
		return "true"
	case e.Kind == Bool:
		return "false"
	}
	return fmt.Sprint(e.Value)
}

// Expressions calls f for every whole expression of a block, in the order in
// which a step meets them.
func Expressions(b Block, f func(*Expr)) {
	each := func(e *Expr) {
		if e != nil {
			f(e)
		}
	}
	set := func(s *Set) { each(s.When); each(s.To) }
	switch b := b.(type) {
	case *Define:
		each(b.As)
	case *Set:
		set(b)
	case *Timer:
		each(b.Restart)
		each(b.Hold)
	case *Flags:
		for _, bit := range b.Bits {
			each(bit.When)
		}
	case *Machine:
		for _, s := range b.At {
			for _, t := range s.Goes {
				each(t.When)
				for _, a := range t.Do {
					set(a)
				}
			}
		}
	}
}
