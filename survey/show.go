package survey

import (
	"encoding/json"
	"reflect"
	"regexp"
	"strconv"
	"strings"
)

// Entry is one line of a sheet printed in full.
type Entry struct {
	Depth   int
	Key     string // with a dash in front where a list entry begins
	Value   string // empty for a section
	Assumed string // why the value is what it is although the sheet does not give it
	From    string // how the value was worked out of other keys
	Path    string // key path of the value, or of what it was worked out of
}

// Entries lists every key of a survey that has a value, written or assumed, in
// the order of the format.
func (s *Survey) Entries() []Entry {
	var l lister
	l.section(reflect.ValueOf(s).Elem(), 0, "")
	return l.entries
}

// String prints an entry as a line of a sheet: the lines of all entries read as
// one.
func (e Entry) String() string {
	line := strings.Repeat("  ", e.Depth) + e.Key + ":"
	if e.Value != "" {
		line += " " + e.Value
	}
	if e.Assumed != "" {
		line += "   # assumed: " + oneLine(e.Assumed)
	}
	if e.From != "" {
		line += "   # worked out of " + oneLine(e.From)
	}
	return line
}

type lister struct{ entries []Entry }

func (l *lister) section(v reflect.Value, depth int, dash string) {
	keys := keysOf(v.Type())
	for _, k := range keys {
		f := v.Field(k.index)
		before := len(l.entries)
		switch {
		case !applies(v, keys, k):
		case isField(f.Type()):
			l.value(f, k.name, depth)
		case f.Kind() == reflect.Struct:
			l.nested(f, k.name, depth)
		case f.Kind() == reflect.Slice && f.Len() > 0 && f.Type().Elem().Kind() == reflect.Pointer:
			l.entries = append(l.entries, Entry{Depth: depth, Key: k.name})
			for i := 0; i < f.Len(); i++ {
				l.section(f.Index(i).Elem(), depth+2, "- ")
			}
		case f.Kind() == reflect.Slice && f.Len() > 0:
			l.list(f, k.name, depth)
		}
		if dash != "" && len(l.entries) > before {
			e := &l.entries[before]
			e.Depth, e.Key = e.Depth-1, dash+e.Key
			dash = ""
		}
	}
}

// nested prints a section only where something of it is known or assumed.
func (l *lister) nested(v reflect.Value, name string, depth int) {
	inner := &lister{}
	inner.section(v, depth+1, "")
	source := v.FieldByName("Source")
	written := source.IsValid() && source.Interface().(Source).Written()
	always := name == "equipment" || name == "electronics" || name == "adc" || name == "enclosure"
	if len(inner.entries) == 0 || (!written && !always) {
		return
	}
	l.entries = append(append(l.entries, Entry{Depth: depth, Key: name}), inner.entries...)
}

func (l *lister) list(v reflect.Value, name string, depth int) {
	var words []string
	for i := 0; i < v.Len(); i++ {
		words = append(words, v.Index(i).FieldByName("V").String())
	}
	l.entries = append(l.entries, Entry{Depth: depth, Key: name, Value: "[" + strings.Join(words, ", ") + "]"})
}

func (l *lister) value(f reflect.Value, name string, depth int) {
	src := f.FieldByName("Source").Interface().(Source)
	set := f.FieldByName("Set").Bool()
	if !set && !src.Written() {
		return
	}
	e := Entry{Depth: depth, Key: name, Value: src.Text, Assumed: src.Assumed, Path: src.Path}
	if set && f.FieldByName("V").Kind() == reflect.Float64 && !strings.HasSuffix("."+src.Path, "."+name) { // an edge out of set point, mark and differential
		e.Value, e.From = strconv.FormatFloat(f.FieldByName("V").Float(), 'g', 6, 64)+" degC", "set_point "+src.Text
	} else if f.FieldByName("V").Kind() != reflect.Array && f.FieldByName("V").Kind() != reflect.Slice {
		e.Value = asYAML(e.Value)
	}
	l.entries = append(l.entries, e)
}

// plainText matches texts that YAML reads as they are.
var plainText = regexp.MustCompile(`^[0-9\pL+./°(-]([0-9\pL_.,;+/°()<>=% -]*[0-9\pL_.;+/°()%-])?$`)

// asYAML puts a text in quotes where YAML would read it otherwise.
func asYAML(text string) string {
	if plainText.MatchString(text) && text != "null" && text != "-" && !strings.HasPrefix(text, "- ") && !strings.HasPrefix(text, "---") && !strings.HasPrefix(text, "...") {
		return text
	}
	var b strings.Builder
	enc := json.NewEncoder(&b) // a JSON string is a double-quoted text of YAML
	enc.SetEscapeHTML(false)
	if err := enc.Encode(text); err != nil {
		return strconv.Quote(text)
	}
	return strings.TrimSpace(b.String())
}
