package risk

import (
	"fmt"
	"strings"
)

// template is a text with expressions in braces; two opening braces stand for
// one, and so do two closing ones.
type template struct {
	parts []part
}

// part is a piece of plain text, or an expression.
type part struct {
	text string
	expr *expression
}

// compileTemplate parses a text and checks its expressions.
func compileTemplate(text, each string) (*template, *fault) {
	t := &template{}
	var plain strings.Builder
	runes := []rune(text)
	for i := 0; i < len(runes); i++ {
		r := runes[i]
		switch {
		case (r == '{' || r == '}') && i+1 < len(runes) && runes[i+1] == r:
			plain.WriteRune(r)
			i++
		case r == '}':
			return nil, &fault{i, "a closing brace without its opening one"}
		case r == '{':
			end := closingBrace(runes, i+1)
			if end < 0 {
				return nil, &fault{i, "an opening brace without its closing one"}
			}
			e, f := compile(string(runes[i+1:end]), each, aText)
			if f != nil {
				return nil, &fault{i + 1 + f.offset, f.message}
			}
			t.parts = append(t.parts, part{text: plain.String()}, part{expr: e})
			plain.Reset()
			i = end
		default:
			plain.WriteRune(r)
		}
	}
	t.parts = append(t.parts, part{text: plain.String()})
	return t, nil
}

// closingBrace finds the end of an expression, braces in quotes left alone.
func closingBrace(runes []rune, from int) int {
	var quote rune
	for i := from; i < len(runes); i++ {
		switch r := runes[i]; {
		case quote != 0 && r == '\\':
			i++
		case quote != 0 && r == quote:
			quote = 0
		case quote == 0 && (r == '"' || r == '\''):
			quote = r
		case quote == 0 && r == '}':
			return i
		}
	}
	return -1
}

// fill puts in the values. Text that comes out of the sheet is put in as it
// is and never read as a template.
func (t *template) fill(env map[string]any) (string, error) {
	var b strings.Builder
	for _, p := range t.parts {
		if p.expr == nil {
			b.WriteString(p.text)
			continue
		}
		value, err := p.expr.run(env)
		if err != nil {
			return "", err
		}
		switch v := value.(type) {
		case string:
			b.WriteString(v)
		case float64:
			b.WriteString(number(v, 3))
		default:
			fmt.Fprint(&b, v)
		}
	}
	return b.String(), nil
}

// figures lists the figures that the text asks for.
func (t *template) figures() []string {
	var names []string
	for _, p := range t.parts {
		if p.expr == nil {
			continue
		}
		for _, n := range p.expr.figures {
			names = addOnce(names, n)
		}
	}
	return names
}
