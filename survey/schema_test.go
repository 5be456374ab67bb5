package survey

import (
	"bytes"
	"encoding/json"
	"fmt"
	"os"
	"path/filepath"
	"reflect"
	"regexp"
	"sort"
	"strings"
	"testing"

	"github.com/google/go-cmp/cmp"
	"github.com/santhosh-tekuri/jsonschema/v6"
	"go.yaml.in/yaml/v4"
	"pgregory.net/rapid"
)

// Whatever sheet the reader takes, an editor with the schema takes as well.
func TestSchemaTakesGoodSheets(t *testing.T) {
	schema := compiled(t)
	for name, data := range goodSheets(t) {
		if err := schema.Validate(asJSON(t, data)); err != nil {
			t.Errorf("%s: the schema refuses what the reader takes: %v", name, err)
		}
	}
}

// seenByReaderOnly are slips that no schema of single values can see: they lie
// between values, in ranges and references, or inside a line of wiring.
var seenByReaderOnly = regexp.MustCompile(`^(wiring_|circle|log_|rows_turned|name_of_header|name_of_device|name_of_program|name_twice|name_drive|name_seen|no_such|outside_|both_given|replaced_part|ends_on|when_wrong|never_unknown|` +
	`range_turned|dial_|valid_turned|observed|edges_|holds_turned|no_band|inrush|timer_|clock_of|danger_where|danger_two|process_without|called_|converter|output_twice|output_figures|` +
	`ntc_|pt_|couple_|linear_|diode_|digital_|cold_junction|follows_a|trip_free|kept_|marks_missing|no_thresholds|one_|unknown_edge|` +
	`sensor_|runs_when|load_in|two_dividers|zero_|valve_state|wrong_state|breaks_below|makes_on|below_absolute|not_finite|negative_supply|no_differential|set_point_outside|monitored|same_part|` +
	`read_by|driven_by|cuts_no|excitation|clock_unknown|zero_width|hostile_text|time_wrong_order|time_given_twice|share_above|too_large|octal|hexadecimal|grouped|tag)`)

// A slip in a single value is marked by the editor already.
func TestSchemaRefusesBadValues(t *testing.T) {
	schema := compiled(t)
	sheets, err := filepath.Glob("testdata/bad/*/sheet.yaml")
	if err != nil {
		t.Fatal(err)
	}
	seen := 0
	for _, sheet := range sheets {
		name := filepath.Base(filepath.Dir(sheet))
		data, err := os.ReadFile(sheet)
		if err != nil {
			t.Fatal(err)
		}
		d := &decoder{}
		root, ok := d.tree(data)
		if !ok || seenByReaderOnly.MatchString(name) || doubled(root) {
			continue // no YAML, or no slip of a single value
		}
		seen++
		if schema.Validate(asJSON(t, data)) == nil {
			t.Errorf("%s: the schema takes what the reader refuses", name)
		}
	}
	if seen < 40 {
		t.Errorf("only %d sheets were held against the schema", seen)
	}
}

// doubled reports a key given twice or one that is no text: JSON has neither.
func doubled(n *yaml.Node) bool {
	keys := map[string]bool{}
	for i, c := range n.Content {
		if n.Kind == yaml.MappingNode && i%2 == 0 {
			if keys[c.Value] || c.Kind != yaml.ScalarNode || c.Value == "<<" {
				return true
			}
			keys[c.Value] = true
		}
		if doubled(c) {
			return true
		}
	}
	return false
}

// Each key that the schema knows is one that the reader knows at that place, and
// the reverse. The reader is asked by giving it the key, not by its tags.
func TestSchemaAndReaderKnowTheSameKeys(t *testing.T) {
	var schema map[string]any
	if err := json.Unmarshal(must(Schema()), &schema); err != nil {
		t.Fatal(err)
	}
	var inSchema []string
	walkSchema(schema, nil, func(path []string) { inSchema = append(inSchema, strings.Join(path, ".")) })
	var inTypes []string
	walkTypes(reflect.TypeFor[Survey](), nil, func(path []string) { inTypes = append(inTypes, strings.Join(path, ".")) })
	sort.Strings(inSchema)
	sort.Strings(inTypes)
	if diff := cmp.Diff(inTypes, inSchema); diff != "" {
		t.Errorf("keys of the types and of the schema (- types, + schema):\n%s", diff)
	}
	if len(inSchema) < 200 {
		t.Errorf("only %d keys found", len(inSchema))
	}
	for _, path := range inSchema {
		if said := complaint(path); said != "" {
			t.Errorf("%s is in the schema, but the reader says: %s", path, said)
		}
		if said := complaint(path + "x"); said == "" {
			t.Errorf("the reader knows %sx", path)
		}
	}
}

// complaint gives what the reader says of a key as such, whatever the value.
func complaint(path string) string {
	parts := strings.Split(path, ".")
	sheet := ""
	for i, p := range parts {
		name, list := strings.CutSuffix(p, "[]")
		indent := strings.Repeat("    ", i)
		if i > 0 && strings.HasSuffix(parts[i-1], "[]") {
			indent = strings.Repeat("    ", i-1) + "  - "
		}
		sheet += indent + name + ":"
		if i == len(parts)-1 && !list {
			sheet += " 0"
		}
		sheet += "\n"
	}
	_, ds := Read("sheet.yaml", []byte(sheet))
	for _, d := range ds {
		if d.Summary == "unknown key" || d.Summary == "not readable as YAML" {
			return d.String()
		}
	}
	return ""
}

func walkSchema(s map[string]any, path []string, found func([]string)) {
	properties, _ := s["properties"].(map[string]any)
	for name, p := range properties {
		inner := p.(map[string]any)
		here := append(path[:len(path):len(path)], name)
		if items, ok := inner["items"].(map[string]any); ok && items["properties"] != nil {
			here[len(here)-1] += "[]"
			inner = items
		}
		found(here)
		walkSchema(inner, here, found)
	}
}

func walkTypes(t reflect.Type, path []string, found func([]string)) {
	for i := range t.NumField() {
		f := t.Field(i)
		name, _, _ := strings.Cut(f.Tag.Get("sheet"), ",")
		if name == "" {
			continue
		}
		here, inner := append(path[:len(path):len(path)], name), f.Type
		if inner.Kind() == reflect.Slice && inner.Elem().Kind() == reflect.Pointer {
			here[len(here)-1] += "[]"
			inner = inner.Elem().Elem()
		}
		found(here)
		if inner.Kind() == reflect.Struct && !strings.HasPrefix(inner.Name(), "Field[") {
			walkTypes(inner, here, found)
		}
	}
}

// Every object of the schema is closed, and every key says what it is for.
func TestSchemaIsClosedAndDescribed(t *testing.T) {
	var schema map[string]any
	if err := json.Unmarshal(must(Schema()), &schema); err != nil {
		t.Fatal(err)
	}
	var check func(s map[string]any, path string)
	check = func(s map[string]any, path string) {
		if s["properties"] != nil && s["additionalProperties"] != false {
			t.Errorf("%s is open", path)
		}
		properties, _ := s["properties"].(map[string]any)
		for name, p := range properties {
			inner := p.(map[string]any)
			if inner["description"] == nil {
				t.Errorf("%s.%s says nothing", path, name)
			}
			if items, ok := inner["items"].(map[string]any); ok {
				check(items, path+"."+name)
			}
			check(inner, path+"."+name)
		}
	}
	check(schema, "")
}

// A quantity that the reader takes has the form that the schema asks for.
func TestSchemaTakesQuantities(t *testing.T) {
	patterns := map[string]*regexp.Regexp{}
	for dim := range dimensions {
		patterns[dim] = regexp.MustCompile(quantityPattern(dim))
	}
	rapid.Check(t, func(rt *rapid.T) {
		dim := rapid.SampledFrom(sortedKeys(dimensions)).Draw(rt, "dimension")
		text := ""
		for i := range rapid.IntRange(1, 3).Draw(rt, "parts") {
			number := rapid.OneOf(
				rapid.Map(rapid.IntRange(-50, 5000), func(n int) string { return fmt.Sprint(n) }),
				rapid.StringMatching(`[+-]?[0-9]{0,3}[.,]?[0-9]{0,3}([eE][+-]?[0-9]{1,2})?`)).Draw(rt, "number")
			unit := rapid.SampledFrom(append(dimensions[dim].unitNames(), "C", "")).Draw(rt, "unit")
			if i > 0 {
				text += " "
			}
			text += number + rapid.SampledFrom([]string{"", " ", "  "}).Draw(rt, "space") + unit
		}
		if _, m := quantity(text, dim); m == nil && !patterns[dim].MatchString(text) {
			rt.Fatalf("the schema refuses the %s %q, which the reader takes", dim, text)
		}
	})
}

// `unknown` is an answer wherever reader and schema agree that it is.
func TestUnknownInBoth(t *testing.T) {
	schema := compiled(t)
	for _, line := range []string{
		"equipment: {id: t, title: T, medium: unknown, pressure: unknown, enclosure: {temperature: unknown, area: unknown}}",
		"equipment: {id: unknown, title: T}",
		"format: unknown",
		"process: {ambient: unknown, settles_on: unknown, driven_by: unknown, log: unknown}",
		"dangers: [{id: d, above: unknown, what: w, harm: serious, exposure: unknown, avoidance: unknown, for: unknown}]",
		"dangers: [{id: d, above: 90 degC, what: w, harm: unknown}]",
		"signals: [{id: s, what: s, broken_wire: unknown, seen_off_before_start: unknown}]",
		"electronics: {word: unknown, called_every: unknown, adc: {bits: unknown, inl: unknown, reference: unknown}, watchdog: unknown, brown_out: unknown}",
		"loads: [{id: l, what: l, kind: fan, safe_state: unknown, runs_when: true}]",
		"loads: [{id: l, what: l, kind: unknown, safe_state: off, runs_when: true}]",
		"loads: [{id: l, what: l, kind: fan, safe_state: off, rest: unknown, current: unknown, supply_is: unknown, runs_when: true}]",
		"must: [{never: true, why: unknown}]",
		"answers: [{finding: f, answer: a, role: r, date: unknown}]",
	} {
		sheet := line + "\n"
		for _, rest := range []string{"format: 1", "equipment: {id: t, title: T}", "loads: [{id: l, what: l, kind: fan, safe_state: off, runs_when: true}]", stayingPart} {
			if key, _, _ := strings.Cut(rest, ":"); !strings.HasPrefix(line, key+":") {
				sheet += rest + "\n"
			}
		}
		_, ds := Read("sheet.yaml", []byte(sheet))
		if err := schema.Validate(asJSON(t, []byte(sheet))); (err != nil) != ds.HasErrors() {
			t.Errorf("%s\nreader: %v\nschema: %v", line, ds, err)
		}
	}
}

const stayingPart = "controls: [{id: c, what: c, duty: protective, element: liquid_bulb, action: breaks_on_rise, breaks_at: unknown, plan: keep}]"

func must(text []byte, err error) []byte {
	if err != nil {
		panic(err)
	}
	return text
}

func compiled(t *testing.T) *jsonschema.Schema {
	t.Helper()
	text, err := Schema()
	if err != nil {
		t.Fatal(err)
	}
	doc, err := jsonschema.UnmarshalJSON(bytes.NewReader(text))
	if err != nil {
		t.Fatal(err)
	}
	c := jsonschema.NewCompiler()
	if err := c.AddResource("sheet.json", doc); err != nil {
		t.Fatal(err)
	}
	s, err := c.Compile("sheet.json")
	if err != nil {
		t.Fatal(err)
	}
	return s
}

// asJSON is what an editor's schema check sees of a sheet: dates are texts.
func asJSON(t *testing.T, data []byte) any {
	t.Helper()
	var n yaml.Node
	if err := yaml.Load(data, &n); err != nil {
		t.Fatal(err)
	}
	text, err := json.Marshal(plainValue(t, n.Content[0]))
	if err != nil {
		t.Fatal(err)
	}
	doc, err := jsonschema.UnmarshalJSON(bytes.NewReader(text))
	if err != nil {
		t.Fatal(err)
	}
	return doc
}

func plainValue(t *testing.T, n *yaml.Node) any {
	t.Helper()
	switch n.Kind {
	case yaml.MappingNode:
		m := map[string]any{}
		for i := 0; i+1 < len(n.Content); i += 2 {
			m[n.Content[i].Value] = plainValue(t, n.Content[i+1])
		}
		return m
	case yaml.SequenceNode:
		list := []any{}
		for _, c := range n.Content {
			list = append(list, plainValue(t, c))
		}
		return list
	}
	switch n.ShortTag() {
	case "!!int", "!!float", "!!bool", "!!null":
		var v any
		if err := n.Decode(&v); err != nil {
			t.Fatal(err)
		}
		if f, ok := v.(float64); ok && (f != f || f > 1e300 || f < -1e300) {
			return n.Value // JSON has no such number
		}
		return v
	}
	return n.Value
}
