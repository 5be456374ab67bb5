package risk

import (
	"math"
	"reflect"

	"makebreak/survey"
)

// unknown is the word for what the sheet does not say.
const unknown = "unknown"

// fill copies a struct of the survey into a struct of the view: every field of
// the view whose expr tag is a key of the sheet takes that key's value. Fields
// of the view with other tags are derived and left alone.
func fill(view, sheet any) {
	fillStruct(reflect.ValueOf(view).Elem(), reflect.Indirect(reflect.ValueOf(sheet)))
}

func fillStruct(view, sheet reflect.Value) {
	byKey := map[string]reflect.Value{}
	for i := range sheet.NumField() {
		if tag, ok := sheet.Type().Field(i).Tag.Lookup("sheet"); ok {
			byKey[keyOf(tag)] = sheet.Field(i)
		}
	}
	for i := range view.NumField() {
		key := view.Type().Field(i).Tag.Get("expr")
		if source, ok := byKey[key]; ok {
			fillField(view.Field(i), source)
		}
	}
}

// keyOf is the key in a sheet tag, which may go on with `,required`.
func keyOf(tag string) string {
	for i, r := range tag {
		if r == ',' {
			return tag[:i]
		}
	}
	return tag
}

func fillField(view, sheet reflect.Value) {
	switch list := sheet.Interface().(type) {
	case survey.Names:
		view.Set(reflect.ValueOf(wordsOf(list)))
		return
	case survey.Words:
		view.Set(reflect.ValueOf(wordsOf(list)))
		return
	}
	value := sheet.FieldByName("V")
	if !value.IsValid() {
		if view.Kind() == reflect.Struct && sheet.Kind() == reflect.Struct {
			fillStruct(view, sheet)
		}
		return
	}
	set := sheet.FieldByName("Set").Bool()
	switch view.Kind() {
	case reflect.Float64:
		view.SetFloat(numberOf(value, set))
	case reflect.String:
		view.SetString(wordOf(value, set))
	case reflect.Slice:
		if pair, ok := value.Interface().([2]float64); ok && set {
			view.Set(reflect.ValueOf(pair[:]))
		}
	}
}

func wordsOf(list []survey.Field[string]) []string {
	words := make([]string, 0, len(list))
	for _, f := range list {
		words = append(words, f.V)
	}
	return words
}

func numberOf(value reflect.Value, set bool) float64 {
	switch {
	case !set:
		return math.NaN()
	case value.Kind() == reflect.Int:
		return float64(value.Int())
	case value.Kind() == reflect.Float64:
		return value.Float()
	}
	return math.NaN()
}

func wordOf(value reflect.Value, set bool) string {
	if !set {
		return unknown
	}
	if value.Kind() == reflect.Bool {
		if value.Bool() {
			return "true"
		}
		return "false"
	}
	if e, ok := value.Interface().(survey.Expression); ok {
		return orUnknown(e.Text)
	}
	return orUnknown(value.String())
}

func orUnknown(s string) string {
	if s == "" {
		return unknown
	}
	return s
}
