package survey

import (
	"reflect"
	"strings"
)

// notHere is said of a key that another kind of part has.
const notHere = "this key does not belong here"

// A condition says for which kinds of part a key is: the values of another key
// of the same section.
type condition struct {
	key   string
	words []string
}

func (c condition) String() string { return c.key + ": " + strings.Join(c.words, ", ") }

// groups are conditions with a name.
var groups = map[string]condition{
	"switching":  {"action", []string{"breaks_on_rise", "makes_on_fall", "makes_on_rise", "breaks_on_fall"}},
	"modulating": {"action", []string{"closes_on_rise", "opens_on_rise"}},
}

// conditionOf reads the tag `for` of a key; without one the key is for all.
func conditionOf(tag reflect.StructTag) (c condition, ok bool) {
	for _, part := range strings.Fields(tag.Get("for")) {
		next, named := groups[part]
		if !named {
			key, words, _ := strings.Cut(part, "=")
			next = condition{key, strings.Split(words, ",")}
		}
		c = condition{next.key, append(c.words, next.words...)}
	}
	return c, c.key != ""
}

// applies reports whether a key is for the part that a section describes. Where
// the section does not say what part it is, every key may be.
func applies(section reflect.Value, keys []key, k key) bool {
	c, conditional := conditionOf(k.tag)
	if !conditional {
		return true
	}
	for _, other := range keys {
		if other.name == c.key {
			f := section.Field(other.index)
			return !f.FieldByName("Set").Bool() || contains(c.words, f.FieldByName("V").String())
		}
	}
	return true
}
