package survey

import (
	"encoding/json"
	"reflect"
	"strings"
)

// Schema gives the JSON Schema (draft 2020-12) of the sheet, for editors. It is
// made from the same tags that drive the reader, so the two cannot part.
func Schema() ([]byte, error) {
	root := schemaOf(reflect.TypeFor[Survey]())
	root["$schema"] = "https://json-schema.org/draft/2020-12/schema"
	root["title"] = "makebreak survey sheet, format 1"
	return json.MarshalIndent(root, "", "  ")
}

type object = map[string]any

// schemaOf is the schema of a section: a closed object.
func schemaOf(t reflect.Type) object {
	properties := object{}
	var required []string
	for _, k := range keysOf(t) {
		s := schemaFor(k)
		if about := k.tag.Get("about"); about != "" {
			s["description"] = describeUsual(about, k.tag)
		}
		properties[k.name] = s
		if k.required {
			required = append(required, k.name)
		}
	}
	o := object{"type": "object", "additionalProperties": false, "properties": properties}
	if required != nil {
		o["required"] = required
	}
	if rules := conditional(t); rules != nil {
		o["allOf"] = rules
	}
	return o
}

// conditional refuses the keys of other kinds of part.
func conditional(t reflect.Type) []any {
	refused := map[string]object{}
	conditions := map[string]condition{}
	for _, k := range keysOf(t) {
		if c, ok := conditionOf(k.tag); ok {
			if refused[c.String()] == nil {
				refused[c.String()], conditions[c.String()] = object{}, c
			}
			refused[c.String()][k.name] = false
		}
	}
	var rules []any
	for _, name := range sortedKeys(refused) {
		c := conditions[name]
		rules = append(rules, object{
			"if":   object{"properties": object{c.key: object{"not": object{"enum": c.words}}}, "required": []string{c.key}},
			"then": object{"properties": refused[name]},
		})
	}
	return rules
}

func describeUsual(about string, tag reflect.StructTag) string {
	if value, why, ok := strings.Cut(tag.Get("usual"), "|"); ok {
		return about + "; " + value + " is assumed otherwise: " + why
	}
	return about
}

func schemaFor(k key) object {
	switch {
	case isField(k.typ):
		f, _ := k.typ.FieldByName("V")
		return fieldSchema(f.Type, k.tag)
	case k.typ == reflect.TypeFor[Names](), k.typ == reflect.TypeFor[Words]():
		one := valueSchema(reflect.TypeFor[string](), k.tag)
		return object{"anyOf": []any{one, object{"type": "array", "items": one}}}
	case k.typ.Kind() == reflect.Slice && k.required:
		return object{"type": "array", "minItems": 1, "items": schemaOf(k.typ.Elem().Elem())}
	case k.typ.Kind() == reflect.Slice:
		return object{"type": []string{"array", "null"}, "items": schemaOf(k.typ.Elem().Elem())}
	}
	return schemaOf(k.typ)
}

// fieldSchema is what one key takes: its values, and `unknown` where that is an answer.
func fieldSchema(t reflect.Type, tag reflect.StructTag) object {
	s := valueSchema(t, tag)
	if !mayBeUnknown(t, tag) {
		return s
	}
	if words, ok := s["enum"].([]any); ok {
		return object{"enum": append(words, "unknown")}
	}
	answers := []any{s, object{"const": "unknown"}}
	if tag.Get("unit") == "name" {
		answers = append(answers, object{"const": ""})
	}
	return object{"anyOf": answers}
}

func valueSchema(t reflect.Type, tag reflect.StructTag) object {
	unit := tag.Get("unit")
	if words := strings.Fields(tag.Get("oneof")); len(words) > 0 {
		return enumSchema(words)
	}
	switch t.Kind() {
	case reflect.Bool:
		return enumSchema([]string{"true", "false"})
	case reflect.Int:
		return numberSchema("integer", wholePattern)
	case reflect.Float64:
		return quantitySchema(unit)
	case reflect.Array:
		return object{"type": "array", "minItems": t.Len(), "maxItems": t.Len(), "items": columnSchema(unit)}
	case reflect.Slice:
		return rowsSchema(rowUnits[unit])
	}
	switch unit {
	case "identifier", "name":
		return object{"type": "string", "pattern": identifierForm.String(), "not": object{"enum": sortedKeys(reserved)}}
	case "date":
		return object{"type": "string", "pattern": `^[0-9]{4}-[0-9]{2}-[0-9]{2}$`}
	case "expression":
		return object{"type": []string{"string", "boolean"}, "maxLength": longestExpression}
	}
	return object{"type": []string{"string", "number", "boolean"}, "maxLength": longestText}
}

// enumSchema allows the words; those that YAML reads as numbers or truth values
// are allowed as such too.
func enumSchema(words []string) object {
	var list []any
	for _, w := range words {
		switch {
		case w == "true" || w == "false":
			list = append(list, w == "true", w)
		case wholeForm.MatchString(w):
			list = append(list, json.Number(w), w)
		default:
			list = append(list, w)
		}
	}
	return object{"enum": list}
}

// numberSchema is a plain number that is not negative, in quotes or not.
func numberSchema(kind, pattern string) object {
	return object{"anyOf": []any{
		object{"type": kind, "minimum": 0},
		object{"type": "string", "pattern": `^\+?` + pattern + "$"},
	}}
}

func quantitySchema(unit string) object {
	if unit == "" {
		return numberSchema("number", plainPattern)
	}
	return object{"type": "string", "pattern": quantityPattern(unit)}
}

// quantityPattern is the form of a quantity: a number and a unit, several of
// them for a time.
func quantityPattern(dim string) string {
	sign, units := `\+?`, dimensions[dim].unitNames()
	signed := dimensions[dim].signed
	for _, p := range mixed[dim] {
		units = append(units, dimensions[p].unitNames()...)
		signed = signed || dimensions[p].signed
	}
	if signed {
		sign = "[+-]?"
	}
	one := sign + numberPattern + " *(" + strings.Join(units, "|") + ")"
	if dim == "time" {
		return "^ *" + one + "( +" + one + ")* *$"
	}
	return "^ *" + one + " *$"
}

// columnSchema is one column of a row: a quantity, a plain number of either
// sign, or a multiple such as 2x.
func columnSchema(unit string) object {
	switch unit {
	case "":
		return object{"anyOf": []any{object{"type": "number"}, object{"type": "string", "pattern": "^[+-]?" + plainPattern + "$"}}}
	case "multiple":
		return object{"anyOf": []any{object{"type": "number"}, object{"type": "string", "pattern": "^[+-]?" + plainPattern + "x?$"}}}
	}
	return quantitySchema(unit)
}

func rowsSchema(units []string) object {
	return object{"type": "array", "minItems": 1, "items": object{
		"type": "array", "minItems": 2, "maxItems": 2,
		"prefixItems": []any{columnSchema(units[0]), columnSchema(units[1])},
	}}
}
