package csource

import "strings"

// piece is a stretch of C that can be broken into lines where it is joined.
// Brackets are part of a piece: they are decided by what the piece is, never
// by looking at text.
type piece struct {
	text        string  // an atom: all of it
	open, close string  // around the parts; empty where nothing needs a bracket
	joint       string  // between the parts: an operator or a comma
	parts       []piece // of a chain; of a choice: condition, then, else
	choice      bool
}

func atom(text string) piece { return piece{text: text} }

// chain joins parts by an operator.
func chain(joint string, parts ...piece) piece { return piece{joint: joint, parts: parts} }

// choice is c ? a : b.
func choice(c, a, b piece) piece { return piece{choice: true, parts: []piece{c, a, b}} }

// call is a function with its arguments.
func call(name string, args ...piece) piece {
	return piece{open: name + "(", close: ")", joint: ",", parts: args}
}

// closed reports whether a piece can stand beside any operator as it is.
func (p piece) closed() bool { return p.text != "" || p.open != "" }

// bracketed puts a piece into brackets where it needs them inside another one.
func (p piece) bracketed() piece {
	if !p.closed() {
		p.open, p.close = "(", ")"
	}
	return p
}

// prefixed puts a unary operator or a cast in front.
func (p piece) prefixed(operator string) piece {
	p = p.bracketed()
	if p.text != "" {
		p.text = operator + p.text
	} else {
		p.open = operator + p.open
	}
	return p
}

// flat is the piece on one line.
func (p piece) flat() string {
	switch {
	case p.text != "":
		return p.text
	case p.choice:
		return p.open + p.parts[0].flat() + " ? " + p.parts[1].flat() + " : " + p.parts[2].flat() + p.close
	}
	parts := make([]string, len(p.parts))
	for i, a := range p.parts {
		parts[i] = a.flat()
	}
	glue := " " + p.joint + " "
	if p.joint == "," {
		glue = ", "
	}
	return p.open + strings.Join(parts, glue) + p.close
}

const (
	lineWidth = 100
	farRight  = 60 // a continuation is not lined up further right than this
)

// layout gives the piece from a column on, with room left for what follows it.
// It stays on one line where it fits; otherwise it is broken at its outermost
// junctions first. Lines that follow are lined up with the first part, or stand
// at hang where that would be too far to the right.
func (p piece) layout(column, hang, after int) string {
	next := column + len(p.open)
	if next > farRight {
		next = hang
	}
	if p.open != "" && next+p.widest()+after+len(p.close) > lineWidth {
		return p.layoutBelow(column, hang, after)
	}
	return p.layoutAt(column, next, hang, after)
}

// widest is how much room the parts need, each on one line with its junction.
func (p piece) widest() int {
	n := len(p.text)
	for _, a := range p.parts {
		n = max(n, len(a.flat())+len(p.joint)+2)
	}
	return n
}

// layoutBelow is layout with the first part on a line of its own, too.
func (p piece) layoutBelow(column, hang, after int) string {
	flat := p.flat()
	if p.text != "" || column+len(flat)+after <= lineWidth {
		return flat
	}
	inner := p
	inner.open, inner.close = "", ""
	return p.open + newline(hang) + inner.layoutAt(hang, hang, hang+4, after+len(p.close)) + p.close
}

// layoutHanging is layout with the lines that follow at a given column.
func (p piece) layoutHanging(column, hang, after int) string {
	return p.layoutAt(column, hang, hang, after)
}

func (p piece) layoutAt(column, next, hang, after int) string {
	flat := p.flat()
	if p.text != "" || column+len(flat)+after <= lineWidth {
		return flat
	}
	at := column + len(p.open)
	after += len(p.close)
	if p.choice {
		return p.open + p.layoutChoice(at, next, hang, after) + p.close
	}
	var b strings.Builder
	b.WriteString(p.open)
	for i, a := range p.parts {
		last := i == len(p.parts)-1
		switch {
		case last:
			b.WriteString(a.layout(at, hang+4, after))
		case p.joint == ",":
			b.WriteString(a.layout(at, hang+4, 1) + ",")
		default:
			b.WriteString(a.layout(at, hang+4, 1+len(p.joint)) + " " + p.joint)
		}
		if !last {
			b.WriteString(newline(next))
			at = next
		}
	}
	b.WriteString(p.close)
	return b.String()
}

func (p piece) layoutChoice(at, next, hang, after int) string {
	c := p.parts[0].layout(at, hang+4, 0) + newline(next) + "? "
	both := p.parts[1].flat() + " : " + p.parts[2].flat()
	if next+2+len(both)+after <= lineWidth {
		return c + both
	}
	return c + p.parts[1].layout(next+2, hang+4, 0) + newline(next) + ": " + p.parts[2].layout(next+2, hang+4, after)
}

func newline(column int) string { return "\n" + strings.Repeat(" ", column) }
