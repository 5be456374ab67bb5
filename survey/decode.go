package survey

import (
	"fmt"
	"reflect"
	"regexp"
	"sort"
	"strconv"
	"strings"
	"time"
	"unicode/utf8"

	"go.yaml.in/yaml/v4"
)

// decoder walks the tree of a sheet along the struct tags and collects what is
// wrong.
type decoder struct {
	file  string
	lines []string
	diags Diagnostics
}

func (d *decoder) fail(n *yaml.Node, path, summary, found, fits string) {
	d.diags = append(d.diags, Diagnostic{Error, d.file, n.Line, n.Column, path, summary, found, fits})
}

func (d *decoder) failAt(s Source, summary, found, fits string) {
	d.diags = append(d.diags, Diagnostic{Error, d.file, s.Line, s.Col, s.Path, summary, found, fits})
}

// key is one key of a section, as its struct tag has it.
type key struct {
	name     string
	required bool
	index    int
	tag      reflect.StructTag
	typ      reflect.Type
}

func keysOf(t reflect.Type) []key {
	var ks []key
	for i := 0; i < t.NumField(); i++ {
		f := t.Field(i)
		name, opt, _ := strings.Cut(f.Tag.Get("sheet"), ",")
		if name != "" {
			ks = append(ks, key{name, opt == "required", i, f.Tag, f.Type})
		}
	}
	return ks
}

// section reads a mapping into a struct. A nil node leaves everything at its
// usual value.
func (d *decoder) section(v reflect.Value, n *yaml.Node, path string) {
	d.place(v, n, path)
	keys := keysOf(v.Type())
	given := map[string]*yaml.Node{}
	if n != nil {
		if n.Kind != yaml.MappingNode {
			d.fail(n, path, "a section is wanted here", kindOf(n), "the keys "+nameKeys(keys))
			return
		}
		given = d.entries(n, keys, path)
	}
	for _, k := range keys {
		d.field(v.Field(k.index), k, given[k.name], n, join(path, k.name))
	}
	for _, k := range keys {
		if n := given[k.name]; n != nil && !applies(v, keys, k) {
			c, _ := conditionOf(k.tag)
			d.fail(n, join(path, k.name), notHere, kindOf(n), "only for "+c.String())
		}
	}
}

func (d *decoder) entries(n *yaml.Node, keys []key, path string) map[string]*yaml.Node {
	given := map[string]*yaml.Node{}
	first := map[string]int{}
	for i := 0; i+1 < len(n.Content); i += 2 {
		k, value := n.Content[i], n.Content[i+1]
		at := join(path, clip(k.Value, 40))
		switch {
		case k.Kind != yaml.ScalarNode:
			d.fail(k, path, "a key is a word", kindOf(k), nameKeys(keys))
			continue
		case first[k.Value] > 0:
			d.fail(k, at, "key given twice", quote(k.Value), fmt.Sprintf("once only; first on line %d", first[k.Value]))
		case knows(keys, k.Value):
			given[k.Value] = value
		case k.Value == "<<":
			d.fail(k, at, "no merging in a sheet", quote(k.Value), "write the values where they belong")
		case n.Style&yaml.FlowStyle != 0 && isNull(value) && startsWithDigit(k.Value):
			d.fail(k, at, "a comma ends the value here", quote(","+k.Value), "a decimal point instead of the comma")
		default:
			fits := "a key of this section"
			if len(d.diags) <= mostDiagnostics { // nobody reads further suggestions
				fits = didYouMean(k.Value, keys)
			}
			d.fail(k, at, "unknown key", quote(k.Value), fits)
		}
		first[k.Value] = k.Line
	}
	return given
}

func startsWithDigit(s string) bool { return s != "" && isDigit(s[0]) }

func (d *decoder) place(v reflect.Value, n *yaml.Node, path string) {
	if f := v.FieldByName("Source"); f.IsValid() {
		s := Source{Path: path}
		if n != nil {
			s.Line, s.Col = n.Line, n.Column
		}
		f.Set(reflect.ValueOf(s))
	}
}

func (d *decoder) field(v reflect.Value, k key, n, parent *yaml.Node, path string) {
	if n == nil && k.required {
		if parent != nil {
			d.fail(parent, path, "key missing", "no "+k.name, describeKey(k))
		}
		return
	}
	switch {
	case isField(v.Type()):
		d.value(v, k.tag, n, path)
	case v.Type() == reflect.TypeFor[Names](), v.Type() == reflect.TypeFor[Words]():
		d.list(v, k, n, path)
	case v.Kind() == reflect.Struct:
		if n != nil && isNull(n) {
			d.fail(n, path, "nothing stands here", "nothing", "keys of this section, or leave the key out")
			return
		}
		d.section(v, n, path)
	case v.Kind() == reflect.Slice:
		d.sections(v, n, path, k.required)
	}
}

// sections reads a list of sections.
func (d *decoder) sections(v reflect.Value, n *yaml.Node, path string, required bool) {
	if n != nil && required && (isNull(n) || n.Kind == yaml.SequenceNode && len(n.Content) == 0) {
		d.fail(n, path, "nothing in this list", "no entry", "one entry or more, each beginning with a dash")
		return
	}
	if n == nil || isNull(n) {
		return // an empty list, perhaps with all of its entries commented out
	}
	if n.Kind != yaml.SequenceNode {
		d.fail(n, path, "a list is wanted here", kindOf(n), "entries that begin with a dash")
		return
	}
	for i, item := range n.Content {
		e := reflect.New(v.Type().Elem().Elem())
		d.section(e.Elem(), item, fmt.Sprintf("%s[%d]", path, i))
		v.Set(reflect.Append(v, e))
	}
}

// list reads words: a list of them, or a single one without brackets.
func (d *decoder) list(v reflect.Value, k key, n *yaml.Node, path string) {
	if n == nil {
		return
	}
	if isUnknown(n, k.tag) && k.typ == reflect.TypeFor[Names]() {
		return // nothing is named, so nothing counts on it
	}
	items := []*yaml.Node{n}
	if n.Kind == yaml.SequenceNode {
		items = n.Content
	}
	for i, item := range items {
		p := path
		if n.Kind == yaml.SequenceNode {
			p = fmt.Sprintf("%s[%d]", path, i)
		}
		if isUnknown(item, k.tag) {
			d.fail(item, p, "does not fit", quote(item.Value), "those that are known, or leave the key out")
			continue
		}
		e := reflect.New(v.Type().Elem()).Elem()
		d.value(e, k.tag, item, p)
		if e.FieldByName("Set").Bool() {
			v.Set(reflect.Append(v, e))
		}
	}
}

func isField(t reflect.Type) bool {
	return t.Kind() == reflect.Struct && strings.HasPrefix(t.Name(), "Field[")
}

// value reads one Field. Without a node, or where the sheet says that the value
// is unknown, it takes the usual value, if there is one, and says so: an unknown
// tolerance must not be better than an unstated one.
func (d *decoder) value(f reflect.Value, tag reflect.StructTag, n *yaml.Node, path string) {
	if n == nil {
		usual(f, tag, Source{Path: path}, "")
		return
	}
	src := Source{Path: path, Line: n.Line, Col: n.Column, Text: textOf(n)}
	f.FieldByName("Source").Set(reflect.ValueOf(src))
	if isUnknown(n, tag) && mayBeUnknown(f.FieldByName("V").Type(), tag) {
		usual(f, tag, src, "the sheet says unknown")
		return
	}
	v, bad, m := d.read(n, f.FieldByName("V").Type(), tag)
	if m != nil {
		d.fail(bad, path, "does not fit", m.found, m.fits)
		return
	}
	f.FieldByName("V").Set(v)
	f.FieldByName("Set").SetBool(true)
}

// usual gives a Field the value that its tag assumes.
func usual(f reflect.Value, tag reflect.StructTag, src Source, because string) {
	if text, why, ok := strings.Cut(tag.Get("usual"), "|"); ok {
		if v, m := scalar(text, f.FieldByName("V").Type(), tag); m == nil {
			src.Text, src.Assumed = text, reason(because, why)
			f.FieldByName("V").Set(v)
			f.FieldByName("Set").SetBool(true)
		}
	}
	f.FieldByName("Source").Set(reflect.ValueOf(src))
}

// notStated is the reason of a default that has no other.
const notStated = "not stated"

func reason(because, why string) string {
	switch {
	case because == "":
		return why
	case why == notStated:
		return because
	}
	return because + "; " + why
}

// isUnknown reports whether a node says that nothing is known. The empty text
// says so of a reference.
func isUnknown(n *yaml.Node, tag reflect.StructTag) bool {
	return n.Kind == yaml.ScalarNode && (n.Value == "unknown" || n.Value == "" && tag.Get("unit") == "name")
}

// mayBeUnknown reports whether a key may be answered with `unknown` where that
// is not one of its words. A free text may say what it likes, and without an
// identifier, the format or a required word nothing can be made of a sheet.
func mayBeUnknown(t reflect.Type, tag reflect.StructTag) bool {
	words, isText := tag.Get("oneof"), t.Kind() == reflect.String
	switch {
	case hasWord(tag, "unknown"), isText && words == "" && (tag.Get("unit") == "" || tag.Get("unit") == "identifier"):
		return false
	case strings.HasSuffix(tag.Get("sheet"), ",required"):
		return words == "" && !isText && t != reflect.TypeFor[Expression]()
	}
	return true
}

// read reads a node as a value of the given type; bad is the node at fault.
func (d *decoder) read(n *yaml.Node, t reflect.Type, tag reflect.StructTag) (v reflect.Value, bad *yaml.Node, m *misfit) {
	switch {
	case t.Kind() == reflect.Array:
		return d.row(n, t, []string{tag.Get("unit"), tag.Get("unit"), tag.Get("unit")})
	case t.Kind() == reflect.Slice:
		return d.rows(n, t, tag.Get("unit"))
	case n.Kind != yaml.ScalarNode:
		return v, n, &misfit{kindOf(n), "a single value"}
	case isNull(n):
		return v, n, &misfit{"nothing", "a value, `unknown`, or leave the key out"}
	}
	v, m = scalar(n.Value, t, tag)
	return v, n, m
}

func (d *decoder) row(n *yaml.Node, t reflect.Type, units []string) (reflect.Value, *yaml.Node, *misfit) {
	v := reflect.New(t).Elem()
	if n.Kind != yaml.SequenceNode || len(n.Content) != t.Len() {
		return v, n, &misfit{kindOf(n), fmt.Sprintf("%d values in square brackets", t.Len())}
	}
	for i, item := range n.Content {
		if item.Kind != yaml.ScalarNode {
			return v, item, &misfit{kindOf(item), "a single value"}
		}
		x, m := numberIn(item.Value, units[i])
		if m != nil {
			return v, item, m
		}
		v.Index(i).SetFloat(x)
	}
	return v, nil, nil
}

// rowUnits names the units of the two columns of a table in a sheet.
var rowUnits = map[string][]string{
	"temperature_resistance": {"temperature", "resistance"},
	"temperature_voltage":    {"temperature", "voltage"},
	"dial_share":             {"", "share"},
	"multiple_time":          {"multiple", "time"},
}

func (d *decoder) rows(n *yaml.Node, t reflect.Type, unit string) (reflect.Value, *yaml.Node, *misfit) {
	v := reflect.MakeSlice(t, 0, len(n.Content))
	if n.Kind != yaml.SequenceNode || len(n.Content) == 0 {
		return v, n, &misfit{kindOf(n), "pairs in square brackets"}
	}
	for _, item := range n.Content {
		e, bad, m := d.row(item, t.Elem(), rowUnits[unit])
		if m != nil {
			return v, bad, m
		}
		v = reflect.Append(v, e)
	}
	return v, nil, nil
}

// longestText is how long a free text may be.
const longestText = 2000

var (
	identifierForm = regexp.MustCompile(`^[a-z][a-z0-9_]{0,23}$`)
	wholeForm      = regexp.MustCompile(`^` + wholePattern + `$`)
	plainForm      = regexp.MustCompile(`^[+-]?` + plainPattern + `$`)
	numberForm     = regexp.MustCompile(`^[+-]?` + numberPattern)
)

// scalar reads the text of one value.
func scalar(text string, t reflect.Type, tag reflect.StructTag) (reflect.Value, *misfit) {
	v := reflect.New(t).Elem()
	if words := tag.Get("oneof"); words != "" && !contains(strings.Fields(words), text) {
		return v, &misfit{quote(text), oneOf(text, strings.Fields(words))}
	}
	switch t.Kind() {
	case reflect.Bool:
		if text != "true" && text != "false" {
			return v, &misfit{quote(text), "true or false"}
		}
		v.SetBool(text == "true")
	case reflect.Int:
		if !wholeForm.MatchString(text) {
			return v, &misfit{quote(text), "a whole number"}
		}
		n, _ := strconv.ParseInt(text, 10, 64)
		v.SetInt(n)
	case reflect.Float64:
		x, m := numberIn(text, tag.Get("unit"))
		if m == nil && tag.Get("unit") == "" && x < 0 {
			m = &misfit{quote(text), "not less than nothing"}
		}
		if m != nil {
			return v, m
		}
		v.SetFloat(x)
	case reflect.String:
		if m := wording(text, tag.Get("unit")); m != nil {
			return v, m
		}
		v.SetString(text)
	case reflect.Struct: // Expression: parsed once all names are known
		if n := utf8.RuneCountInString(text); n > longestExpression {
			return v, &misfit{fmt.Sprintf("%d characters", n), fmt.Sprintf("at most %d", longestExpression)}
		}
		v.FieldByName("Text").SetString(text)
	}
	return v, nil
}

func wording(text, unit string) *misfit {
	switch {
	case utf8.RuneCountInString(text) > longestText:
		return &misfit{fmt.Sprintf("%d characters", utf8.RuneCountInString(text)), fmt.Sprintf("at most %d", longestText)}
	case strings.IndexFunc(text, invisible) >= 0:
		return &misfit{quote(text), "text without control characters or characters that turn the direction of writing"}
	case unit == "identifier" && !identifierForm.MatchString(text):
		return &misfit{quote(text), "a lower-case letter, then at most 23 of a-z, 0-9 and _" + asIdentifier(text)}
	case unit == "identifier" && reserved[text]:
		return &misfit{quote(text), "a name that is no word of C, C++ or the expression language"}
	case unit == "date":
		if _, err := time.Parse("2006-01-02", text); err != nil {
			return &misfit{quote(text), "a date such as 2026-03-14"}
		}
	}
	return nil
}

// asIdentifier suggests an identifier that is near to a text.
func asIdentifier(text string) string {
	id := strings.Trim(strings.Map(func(r rune) rune {
		switch {
		case r >= 'a' && r <= 'z', r >= '0' && r <= '9':
			return r
		case r >= 'A' && r <= 'Z':
			return r - 'A' + 'a'
		}
		return '_'
	}, clip(text, 23)), "_0123456789")
	if !identifierForm.MatchString(id) || reserved[id] {
		return ""
	}
	return ", such as " + id
}

func textOf(n *yaml.Node) string {
	if n.Kind == yaml.ScalarNode {
		return n.Value
	}
	var parts []string
	for _, c := range n.Content {
		parts = append(parts, textOf(c))
	}
	return "[" + strings.Join(parts, ", ") + "]"
}

func kindOf(n *yaml.Node) string {
	switch {
	case n.Kind == yaml.MappingNode:
		return "keys and values"
	case n.Kind == yaml.SequenceNode:
		return fmt.Sprintf("a list of %d", len(n.Content))
	case isNull(n):
		return "nothing"
	}
	return quote(n.Value)
}

func isNull(n *yaml.Node) bool {
	return n.Kind == yaml.ScalarNode && n.Style&(yaml.DoubleQuotedStyle|yaml.SingleQuotedStyle) == 0 && (n.Value == "" || n.Value == "~" || n.Value == "null")
}

func join(path, name string) string {
	if path == "" {
		return name
	}
	return path + "." + name
}

func knows(keys []key, name string) bool { return contains(keyNames(keys), name) }

func keyNames(keys []key) []string {
	var names []string
	for _, k := range keys {
		names = append(names, k.name)
	}
	return names
}

func nameKeys(keys []key) string { return strings.Join(keyNames(keys), ", ") }

func describeKey(k key) string {
	s := k.name + ": " + k.tag.Get("about")
	if w := k.tag.Get("oneof"); w != "" {
		s += " (" + strings.Join(strings.Fields(w), ", ") + ")"
	}
	return s
}

func hasWord(tag reflect.StructTag, word string) bool {
	return contains(strings.Fields(tag.Get("oneof")), word)
}

func contains(list []string, s string) bool {
	for _, x := range list {
		if x == s {
			return true
		}
	}
	return false
}

func sortedKeys[V any](m map[string]V) []string {
	var ks []string
	for k := range m {
		ks = append(ks, k)
	}
	sort.Strings(ks)
	return ks
}
