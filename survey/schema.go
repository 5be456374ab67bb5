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
	return o
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
		return valueSchema(f.Type, k.tag)
	case k.typ == reflect.TypeFor[Names](), k.typ == reflect.TypeFor[Words]():
		one := valueSchema(reflect.TypeFor[string](), k.tag)
		return object{"anyOf": []any{one, object{"type": "array", "items": one}}}
	case k.typ.Kind() == reflect.Slice:
		return object{"type": "array", "items": schemaOf(k.typ.Elem().Elem())}
	}
	return schemaOf(k.typ)
}

// number is the beginning of every quantity's pattern.
const numberPattern = `[+-]?[0-9.]+([eE][+-]?[0-9]+)?`

func valueSchema(t reflect.Type, tag reflect.StructTag) object {
	unit := tag.Get("unit")
	if words := strings.Fields(tag.Get("oneof")); len(words) > 0 {
		return enumSchema(t, words)
	}
	switch t.Kind() {
	case reflect.Bool:
		return object{"type": "boolean"}
	case reflect.Int:
		return orUnknown(object{"type": "integer", "minimum": 0})
	case reflect.Float64:
		if unit == "" {
			return orUnknown(object{"type": "number", "minimum": 0})
		}
		return orUnknown(quantitySchema(unit))
	case reflect.Array:
		return orUnknown(object{"type": "array", "minItems": t.Len(), "maxItems": t.Len(), "items": quantitySchema(unit)})
	case reflect.Slice:
		return orUnknown(rowsSchema(rowUnits[unit]))
	}
	switch unit {
	case "identifier":
		return object{"type": "string", "pattern": identifierForm.String()}
	case "date":
		return object{"type": "string", "pattern": `^[0-9]{4}-[0-9]{2}-[0-9]{2}$`}
	case "expression":
		return object{"type": []string{"string", "boolean"}, "maxLength": longestExpression}
	}
	return object{"type": []string{"string", "number", "boolean"}, "maxLength": longestText}
}

// enumSchema allows the words; those that YAML reads as numbers or truth values
// are allowed as such too.
func enumSchema(t reflect.Type, words []string) object {
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

func orUnknown(s object) object { return object{"anyOf": []any{s, object{"const": "unknown"}}} }

func quantitySchema(unit string) object {
	if unit == "" || unit == "multiple" {
		return object{"type": []string{"number", "string"}}
	}
	return object{"type": "string", "pattern": "^" + numberPattern + ` ?(` + strings.Join(unitsOf(unit), "|") + ")" + more(unit) + "$"}
}

// more allows a time to have several parts.
func more(unit string) string {
	if unit != "time" {
		return ""
	}
	return "( " + numberPattern + " ?(" + strings.Join(unitsOf(unit), "|") + "))*"
}

func unitsOf(unit string) []string {
	var units []string
	switch unit {
	case "temperature":
		units = []string{"degC", "°C", "degF", "°F", "K"}
	case "volt_or_ampere":
		units = append(sortedKeys(dimensions["voltage"].units), sortedKeys(dimensions["current"].units)...)
	default:
		units = sortedKeys(dimensions[unit].units)
	}
	return units
}

func rowsSchema(units []string) object {
	return object{"type": "array", "minItems": 1, "items": object{
		"type": "array", "minItems": 2, "maxItems": 2,
		"prefixItems": []any{quantitySchema(units[0]), quantitySchema(units[1])},
	}}
}
