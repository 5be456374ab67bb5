package survey

import (
	"bytes"
	"crypto/sha256"
	"errors"
	"fmt"
	"reflect"
	"sort"
	"strings"
	"unicode/utf8"

	"go.yaml.in/yaml/v4"
)

// Limits of a sheet. A sheet is written by hand; whatever is larger is no sheet.
const (
	longestSheet      = 1 << 20 // bytes
	deepest           = 24      // levels of lists and sections
	mostNodes         = 50_000
	longestExpression = 2000 // characters
	mostDiagnostics   = 100
)

// Read reads a sheet. The survey is as complete as the sheet allows; it may be
// used where the diagnostics hold no error. Nothing in here reads a file: the
// name is only for the messages.
func Read(file string, data []byte) (*Survey, Diagnostics) {
	s := &Survey{File: file}
	d := &decoder{file: file}
	root, ok := d.tree(data)
	if !ok {
		return s, d.sorted()
	}
	s.Hash = fmt.Sprintf("%x", sha256.Sum256(data))
	d.lines = strings.Split(string(data), "\n")
	d.section(reflect.ValueOf(s).Elem(), root, "")
	d.check(s)
	return s, d.sorted()
}

// sorted gives the diagnostics in the order of the sheet, as many as anybody reads.
func (d *decoder) sorted() Diagnostics {
	sort.SliceStable(d.diags, func(i, j int) bool {
		a, b := d.diags[i], d.diags[j]
		if a.Line != b.Line {
			return a.Line < b.Line
		}
		return a.Col < b.Col
	})
	if n := len(d.diags); n > mostDiagnostics {
		rest := Diagnostic{Severity: Error, File: d.file, Summary: fmt.Sprintf("and %d more", n-mostDiagnostics), Found: fmt.Sprintf("%d errors", n), Fits: "mend these first"}
		return append(d.diags[:mostDiagnostics:mostDiagnostics], rest)
	}
	return d.diags
}

// tree turns the bytes into the tree of a YAML document, and refuses what no
// sheet needs before anything is built from it.
func (d *decoder) tree(data []byte) (*yaml.Node, bool) {
	refuse := func(line, col int, summary, found, fits string) (*yaml.Node, bool) {
		d.diags = append(d.diags, Diagnostic{Error, d.file, line, col, "", summary, found, fits})
		return nil, false
	}
	if len(data) > longestSheet {
		return refuse(1, 1, "too large for a sheet", fmt.Sprintf("%d bytes", len(data)), fmt.Sprintf("at most %d bytes", longestSheet))
	}
	if i := bytes.IndexByte(data, 0); i >= 0 {
		line, col := placeOf(data, i)
		return refuse(line, col, "no text", "a NUL byte", "a text file in UTF-8")
	}
	if i := invalidUTF8(data); i >= 0 {
		line, col := placeOf(data, i)
		return refuse(line, col, "not UTF-8", fmt.Sprintf("the byte 0x%02X", data[i]), "a text file in UTF-8")
	}
	if d.misleading(data); len(d.diags) > 0 {
		return nil, false
	}
	if line, col, depth := bracketDepth(data); depth > deepest {
		return refuse(line, col, "nested too deeply", fmt.Sprintf("%d open brackets", depth), fmt.Sprintf("at most %d levels", deepest))
	}
	var docs []yaml.Node
	if err := yaml.Load(data, &docs, yaml.WithAllDocuments()); err != nil {
		line, col, text := yamlError(err)
		return refuse(line, col, "not readable as YAML", text, yamlFix(text, lineOf(data, line)))
	}
	if len(docs) > 1 {
		return refuse(max(docs[1].Line, 1), max(docs[1].Column, 1), "more than one document", fmt.Sprintf("%d documents", len(docs)), "one sheet a file, without a line of three dashes inside")
	}
	if len(docs) == 0 || len(docs[0].Content) == 0 || isNull(docs[0].Content[0]) {
		return refuse(1, 1, "nothing in this sheet", "no keys", "a sheet; `makebreak survey new` writes one to start from")
	}
	doc := docs[0]
	nodes := 0
	if !d.plainTree(doc.Content[0], 0, &nodes) {
		return nil, false
	}
	return doc.Content[0], true
}

// misleading reports characters that hide what a sheet says, wherever they stand.
func (d *decoder) misleading(data []byte) {
	text := string(bytes.TrimPrefix(data, []byte("\ufeff")))
	if strings.IndexFunc(text, misleading) < 0 {
		return
	}
	for i, line := range strings.Split(text, "\n") {
		at := strings.IndexFunc(line, misleading)
		if at < 0 {
			continue
		}
		r, _ := utf8.DecodeRuneInString(line[at:])
		d.diags = append(d.diags, Diagnostic{Error, d.file, i + 1, utf8.RuneCountInString(line[:at]) + 1, "",
			"a character that hides what the sheet says", fmt.Sprintf("U+%04X", r), "text without control characters and without characters that turn the direction of writing"})
	}
}

// plainTree refuses anchors, aliases, merges, tags and depth.
func (d *decoder) plainTree(n *yaml.Node, depth int, nodes *int) bool {
	*nodes++
	switch {
	case n.Kind == yaml.AliasNode, n.Anchor != "":
		d.fail(n, "", "no anchors and aliases in a sheet", "*"+n.Value+n.Anchor, "write the value where it belongs")
		return false
	case depth > deepest:
		d.fail(n, "", "nested too deeply", fmt.Sprintf("%d levels", depth), fmt.Sprintf("at most %d", deepest))
		return false
	case *nodes > mostNodes:
		d.fail(n, "", "too many values for a sheet", fmt.Sprintf("more than %d", mostNodes), "one piece of equipment a sheet")
		return false
	case n.Style&yaml.TaggedStyle != 0:
		d.fail(n, "", "no tags in a sheet", n.Tag, "the plain value")
		return false
	}
	ok := true
	for _, c := range n.Content {
		ok = d.plainTree(c, depth+1, nodes) && ok
		if !ok && len(d.diags) > mostDiagnostics {
			return false
		}
	}
	return ok
}

// bracketDepth finds the deepest nesting of brackets, so that a hostile file
// is refused before a parser descends into it.
func bracketDepth(data []byte) (line, col, depth int) {
	open, l, c := 0, 1, 0
	for _, b := range data {
		c++
		switch b {
		case '\n':
			l, c = l+1, 0
		case '[', '{':
			open++
			if open > depth {
				line, col, depth = l, c, open
			}
		case ']', '}':
			open = max(open-1, 0)
		}
	}
	return line, col, depth
}

func placeOf(data []byte, at int) (line, col int) {
	before := data[:at]
	line = bytes.Count(before, []byte{'\n'}) + 1
	return line, utf8.RuneCount(before[bytes.LastIndexByte(before, '\n')+1:]) + 1
}

func lineOf(data []byte, line int) string {
	lines := bytes.Split(data, []byte("\n"))
	if line > len(lines) {
		return ""
	}
	return string(lines[line-1])
}

func invalidUTF8(data []byte) int {
	for i := 0; i < len(data); {
		r, n := utf8.DecodeRune(data[i:])
		if r == utf8.RuneError && n == 1 {
			return i
		}
		i += n
	}
	return -1
}

// yamlError takes place and text out of the YAML reader's error.
func yamlError(err error) (line, col int, text string) {
	var one *yaml.LoadError
	var many *yaml.LoadErrors
	switch {
	case errors.As(err, &many) && len(many.Errors) > 0:
		one = many.Errors[0]
	case errors.As(err, &one):
	default:
		return 1, 1, oneLine(clip(err.Error(), 200))
	}
	text = strings.NewReplacer("found ", "", "did not find expected ", "no ", "could not find expected ", "no ").Replace(one.Message)
	return max(one.Mark.Line, 1), max(one.Mark.Column, 1), oneLine(clip(text, 200))
}

// yamlFixes are the usual slips behind the YAML reader's messages.
var yamlFixes = []struct{ message, fix string }{
	{"tab", "spaces in front of a line, never a tab"},
	{"cannot start any token", "quotes around a text that begins with @, ` or %"},
	{"mapping values are not allowed", "one key a line, all of a section equally far in, and quotes around a text that holds a colon"},
	{"no ',' or", "a closing bracket or brace, a comma between entries, and quotes around a text that holds , : # [ ] { or }"},
	{"no key", "all keys of a section equally far in"},
	{"no ':'", "key: value, with a space behind the colon"},
	{"unexpected end of stream", "a closing quote"},
	{"escape character", "single quotes around a text with backslashes"},
	{"anchor", "the value itself: there are no anchors and aliases in a sheet"},
	{"max depth", fmt.Sprintf("at most %d levels", deepest)},
}

func yamlFix(message, line string) string {
	if indent := line[:len(line)-len(strings.TrimLeft(line, " \t"))]; strings.Contains(indent, "\t") {
		return yamlFixes[0].fix
	}
	for _, f := range yamlFixes {
		if strings.Contains(message, f.message) {
			return f.fix
		}
	}
	return "one YAML document; `makebreak survey new` writes one to start from"
}

// String gives the diagnostic as one line: place, key, what is wrong, what was
// found and what would fit. Nothing of it can move a terminal's cursor.
func (d Diagnostic) String() string {
	var b strings.Builder
	fmt.Fprintf(&b, "%s:", d.File)
	if d.Line > 0 {
		fmt.Fprintf(&b, "%d:%d:", d.Line, d.Col)
	}
	if d.Path != "" {
		fmt.Fprintf(&b, " %s:", d.Path)
	}
	fmt.Fprintf(&b, " %s", d.Summary)
	if d.Found != "" {
		fmt.Fprintf(&b, ": found %s", d.Found)
	}
	if d.Fits != "" {
		fmt.Fprintf(&b, "; fits %s", d.Fits)
	}
	return oneLine(b.String())
}
