package survey

import (
	"errors"
	"fmt"
	"regexp"
	"strings"
	"unicode/utf8"

	"github.com/expr-lang/expr/ast"
	"github.com/expr-lang/expr/file"
	"github.com/expr-lang/expr/parser"
)

// mostBrackets is how deeply a line of wiring may be nested.
const mostBrackets = 40

// wiring reads expressions: the language is expr's, of which only names, the
// words and, or, not, true, false, brackets, and comparisons of a sensor with
// a quoted temperature are let in. The list is one of what is allowed;
// everything else is refused at its place.
type wiring struct {
	*decoder
	known map[string]string // name → what it is: control, signal, timer, load, sensor
	lines []string
}

// read parses an expression in place; a missing one stays empty.
func (w *wiring) read(f *Field[Expression]) {
	if !f.Set {
		return
	}
	text := f.V.Text
	at := func(offset int) Source { return w.within(f.Source, text, offset) }
	if depth, offset := brackets(text); depth > mostBrackets {
		w.failAt(at(offset), "nested too deeply", fmt.Sprintf("%d open brackets", depth), fmt.Sprintf("at most %d", mostBrackets))
		f.Set = false
		return
	}
	if offset := comment(text); offset >= 0 {
		w.failAt(at(offset), "not part of a line of wiring", quote("/"), "no comments and no division here; a comment stands behind a # of the sheet")
		f.Set = false
		return
	}
	tree, err := parser.Parse(text)
	if err != nil {
		offset, message := 0, err.Error()
		var fe *file.Error
		if errors.As(err, &fe) {
			offset, message = fe.From, fe.Message
		}
		w.failAt(at(offset), "the expression does not read", plainMessage(message), "names joined by and, or, not; such as: tank_stat and flow_proven")
		f.Set = false
		return
	}
	before := len(w.diags)
	c := w.cond(tree.Node, at)
	if len(w.diags) > before {
		f.Set = false
		return
	}
	f.V.Tree = c
}

var unexpected = regexp.MustCompile(`unexpected token \w+\((".*")\)`)

// plainMessage puts the parser's words into those of a sheet.
func plainMessage(message string) string {
	message = strings.ReplaceAll(message, "unexpected token EOF", "an end where a name is wanted")
	return oneLine(clip(unexpected.ReplaceAllString(message, "$1 at the wrong place"), 120))
}

// within gives the place of a character of an expression in the sheet, or the
// start of the value where the sheet folds or escapes it.
func (w *wiring) within(s Source, text string, offset int) Source {
	if s.Line < 1 || s.Line > len(w.lines) {
		return s
	}
	line := []rune(w.lines[s.Line-1])
	start := s.Col - 1
	if start < len(line) && (line[start] == '"' || line[start] == '\'') {
		start++
	}
	if start <= len(line) && strings.HasPrefix(string(line[min(start, len(line)):]), text) {
		s.Col = start + 1 + offset
	}
	return s
}

func (w *wiring) cond(n ast.Node, at func(int) Source) *Cond {
	here := func() Source { return at(n.Location().From) }
	refuse := func(found string) *Cond {
		w.failAt(here(), "not part of a line of wiring", found, allowed)
		return nil
	}
	switch n := n.(type) {
	case *ast.IdentifierNode:
		return w.name(n.Value, here())
	case *ast.BoolNode:
		return &Cond{Op: CondLiteral, Value: n.Value}
	case *ast.UnaryNode:
		if n.Operator != "not" && n.Operator != "!" {
			return refuse("the sign " + quote(n.Operator))
		}
		if a := w.cond(n.Node, at); a != nil {
			return &Cond{Op: CondNot, Args: []*Cond{a}}
		}
		return nil
	case *ast.BinaryNode:
		switch n.Operator {
		case "and", "&&":
			return w.pair(CondAnd, n, at)
		case "or", "||":
			return w.pair(CondOr, n, at)
		case "<", "<=", ">", ">=":
			return w.compare(n, at)
		}
		return refuse("the operator " + quote(n.Operator))
	case *ast.StringNode:
		return refuse("a text that is not compared with a sensor")
	case *ast.IntegerNode, *ast.FloatNode:
		return refuse("a bare number")
	}
	w.failAt(at(begins(n)), "not part of a line of wiring", quote(clip(n.String(), 40)), allowed)
	return nil
}

// begins gives the offset of the first part of a node: the place of some nodes
// is where they end.
func begins(n ast.Node) int {
	first := leftmost(n.Location().From)
	ast.Walk(&n, &first)
	return int(first)
}

type leftmost int

// Visit is called for every part of a node.
func (l *leftmost) Visit(n *ast.Node) { *l = min(*l, leftmost((*n).Location().From)) }

// allowed is all that a line of wiring may say.
const allowed = "names, and, or, not, brackets, and a sensor compared with a quoted temperature"

func (w *wiring) pair(op CondOp, n *ast.BinaryNode, at func(int) Source) *Cond {
	left, right := w.cond(n.Left, at), w.cond(n.Right, at)
	if left == nil || right == nil {
		return nil
	}
	c := &Cond{Op: op}
	for _, a := range []*Cond{left, right} {
		if a.Op == op {
			c.Args = append(c.Args, a.Args...)
		} else {
			c.Args = append(c.Args, a)
		}
	}
	return c
}

func (w *wiring) name(name string, at Source) *Cond {
	switch what := w.known[name]; what {
	case "control", "signal", "timer", "load":
		return &Cond{Op: CondName, Name: name}
	case "sensor":
		w.failAt(at, "a sensor is neither true nor false", name, name+` > "60 degC", or the control that it serves`)
	default:
		w.failAt(at, "no such part", w.alsoSay(name), didYouMeanName(name, w.names("control", "signal", "timer", "load")))
	}
	return nil
}

// alsoSay quotes a name, with what it stands for where that is something else.
func (w *wiring) alsoSay(name string) string {
	if what := w.known[name]; what != "" {
		return quote(name) + ", a " + what
	}
	return quote(name)
}

func (w *wiring) names(kinds ...string) []string {
	var names []string
	for _, n := range sortedKeys(w.known) {
		if contains(kinds, w.known[n]) && identifierForm.MatchString(n) && !reserved[n] {
			names = append(names, n)
		}
	}
	return names
}

var mirrored = map[string]string{"<": ">", "<=": ">=", ">": "<", ">=": "<="}

func (w *wiring) compare(n *ast.BinaryNode, at func(int) Source) *Cond {
	left, right, op := n.Left, n.Right, n.Operator
	if _, ok := left.(*ast.StringNode); ok {
		left, right, op = right, left, mirrored[op]
	}
	id, isName := left.(*ast.IdentifierNode)
	limit, isText := right.(*ast.StringNode)
	switch {
	case !isName || !isText:
		w.failAt(at(n.Location().From), "not a comparison of a sensor with a temperature", quote(clip(n.String(), 40)), `a sensor and a quoted temperature, such as tank_probe > "60 degC"`)
		return nil
	case w.known[id.Value] != "sensor":
		w.failAt(at(id.Location().From), "no such sensor", w.alsoSay(id.Value), didYouMeanName(id.Value, w.names("sensor")))
		return nil
	}
	v, m := quantity(limit.Value, "temperature")
	if m != nil {
		w.failAt(at(limit.Location().From), "not a temperature", m.found, m.fits)
		return nil
	}
	return &Cond{Op: CondCompare, Name: id.Value, Cmp: op, Limit: v, LimitText: limit.Value}
}

// comment finds the sign with which the expression language begins a comment.
// What a comment swallows would look like wiring to a reader.
func comment(text string) int {
	if i := strings.IndexByte(text, '/'); i >= 0 {
		return utf8.RuneCountInString(text[:i])
	}
	return -1
}

func brackets(text string) (deepest, offset int) {
	open := 0
	for i, r := range []rune(text) {
		switch r {
		case '(', '[', '{':
			if open++; open > deepest {
				deepest, offset = open, i
			}
		case ')', ']', '}':
			open--
		}
	}
	return deepest, offset
}
