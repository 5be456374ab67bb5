package survey

import (
	"fmt"
	"reflect"
	"strings"
)

// Entry is one line of a sheet printed in full.
type Entry struct {
	Depth   int
	Key     string // with a dash in front where a list entry begins
	Value   string // empty for a section
	Assumed string // why the value is what it is although the sheet does not give it
	Path    string
}

// Entries lists every key of a survey that has a value, written or assumed, in
// the order of the format.
func (s *Survey) Entries() []Entry {
	var l lister
	l.section(reflect.ValueOf(s).Elem(), 0, "")
	return l.entries
}

// String prints an entry as a line that reads like the sheet.
func (e Entry) String() string {
	line := strings.Repeat("  ", e.Depth) + e.Key + ":"
	if e.Value != "" {
		line += " " + e.Value
	}
	if e.Assumed != "" {
		line += "   # assumed: " + e.Assumed
	}
	return line
}

type lister struct{ entries []Entry }

func (l *lister) section(v reflect.Value, depth int, dash string) {
	for _, k := range keysOf(v.Type()) {
		f := v.Field(k.index)
		before := len(l.entries)
		switch {
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
	if !f.FieldByName("Set").Bool() && !src.Written() {
		return
	}
	text := src.Text
	if text == "" {
		text = fmt.Sprint(f.FieldByName("V").Interface())
	}
	l.entries = append(l.entries, Entry{Depth: depth, Key: name, Value: text, Assumed: src.Assumed, Path: src.Path})
}
