package survey

import (
	"bytes"
	"encoding/json"
	"flag"
	"os"
	"path/filepath"
	"strings"
	"testing"

	"github.com/google/go-cmp/cmp"
	"github.com/santhosh-tekuri/jsonschema/v6"
	"go.yaml.in/yaml/v4"
	"pgregory.net/rapid"
)

var update = flag.Bool("update", false, "rewrite the golden files")

// Each folder of testdata/bad holds a sheet and what has to be said about it.
func TestBadSheets(t *testing.T) {
	sheets, err := filepath.Glob("testdata/bad/*/sheet.yaml")
	if err != nil || len(sheets) < 40 {
		t.Fatalf("%d cases found: %v", len(sheets), err)
	}
	for _, sheet := range sheets {
		t.Run(filepath.Base(filepath.Dir(sheet)), func(t *testing.T) {
			data, err := os.ReadFile(sheet)
			if err != nil {
				t.Fatal(err)
			}
			_, diags := Read("sheet.yaml", data)
			if !diags.HasErrors() {
				t.Fatal("nothing was found wrong")
			}
			var lines []string
			for _, d := range diags {
				if d.Line < 1 || d.Fits == "" {
					t.Errorf("%v: has no place or does not say what would fit", d)
				}
				lines = append(lines, d.String())
			}
			golden(t, filepath.Join(filepath.Dir(sheet), "errors.txt"), strings.Join(lines, "\n")+"\n")
		})
	}
}

func golden(t *testing.T, file, got string) {
	t.Helper()
	if *update {
		if err := os.WriteFile(file, []byte(got), 0o666); err != nil {
			t.Fatal(err)
		}
	}
	want, err := os.ReadFile(file)
	if err != nil {
		t.Fatal(err)
	}
	if diff := cmp.Diff(string(want), got); diff != "" {
		t.Errorf("%s (- wanted, + got):\n%s", file, diff)
	}
}

func goodSheets(t *testing.T) map[string][]byte {
	t.Helper()
	all := map[string][]byte{"template": Template()}
	for _, pattern := range []string{"../examples/*/sheet.yaml", "../translate/testdata/scenarios/*/sheet.yaml", "testdata/good/*.yaml"} {
		files, err := filepath.Glob(pattern)
		if err != nil {
			t.Fatal(err)
		}
		for _, f := range files {
			data, err := os.ReadFile(f)
			if err != nil {
				t.Fatal(err)
			}
			all[f] = data
		}
	}
	if len(all) < 10 {
		t.Fatalf("only %d sheets found", len(all))
	}
	return all
}

func TestGoodSheets(t *testing.T) {
	for name, data := range goodSheets(t) {
		if _, diags := Read(name, data); len(diags) > 0 {
			t.Errorf("%s:\n%v", name, diags)
		}
	}
}

// A quantity written in different units is one value. 140 °F is exactly 60 degC;
// an interval of 10 degF is 5.556 K and never a point on the scale
// (definition of the Fahrenheit scale: 32 °F at 0 degC, 180 degrees to 100 degC).
func TestQuantities(t *testing.T) {
	for _, c := range []struct {
		text, unit string
		want       float64
	}{
		{"140 °F", "temperature", 60}, {"140 degF", "temperature", 60}, {"60 degC", "temperature", 60}, {"333.15 K", "temperature", 60},
		{"-40 degF", "temperature", -40}, {"32 °F", "temperature", 0}, {"212 °F", "temperature", 100},
		{"10 degF", "interval", 50.0 / 9}, {"6 K", "interval", 6}, {"6 degC", "interval", 6},
		{"9 min 30 s", "time", 570}, {"6 h", "time", 21600}, {"250 ms", "time", 0.25}, {"1 h 1 min 1 s", "time", 3661},
		{"13 A", "current", 13}, {"250 mA", "current", 0.25}, {"8 mV", "voltage", 0.008}, {"9 kW", "power", 9000},
		{"10 kohm", "resistance", 10000}, {"10 kΩ", "resistance", 10000}, {"5 %", "share", 0.05}, {"90 /min", "rate", 1.5}, {"8 mm", "length", 0.008},
		{"-2 mV/K", "voltage_per_kelvin", -0.002}, {"3977 K", "interval", 3977},
	} {
		got, m := quantity(c.text, c.unit)
		if m != nil || abs(got-c.want) > 1e-12*max(1, abs(c.want)) {
			t.Errorf("%s as %s: %v (%v), want %v", c.text, c.unit, got, m, c.want)
		}
	}
}

func abs(x float64) float64 { return max(x, -x) }

// 50 MB, an alias bomb, 200,000 brackets: refused before anything is built of them.
func TestHostileSizes(t *testing.T) {
	bomb := "a: &a [x,x,x,x,x,x,x,x]\n"
	for c := 'b'; c < 'z'; c++ {
		p := string(c - 1)
		bomb += string(c) + ": &" + string(c) + " [*" + strings.TrimSuffix(strings.Repeat(p+",*", 8), ",*") + "]\n"
	}
	for name, data := range map[string][]byte{
		"50 MB":            bytes.Repeat([]byte("# much\n"), 50<<20/7),
		"alias bomb":       []byte(bomb),
		"brackets":         []byte("format: 1\nx: " + strings.Repeat("[", 200_000)),
		"brackets in text": []byte("format: 1\nloads:\n  - runs_when: \"" + strings.Repeat("(", 200_000) + "\"\n"),
		"indent":           []byte(nested(10_000)),
		"one line":         []byte("format: " + strings.Repeat("1", 900_000)),
	} {
		if _, diags := Read("sheet.yaml", data); !diags.HasErrors() {
			t.Errorf("%s: nothing was said", name)
		}
	}
}

func nested(depth int) string {
	var b strings.Builder
	for i := 0; i < depth && b.Len() < 900_000; i++ {
		b.WriteString(strings.Repeat(" ", i) + "a:\n")
	}
	return b.String()
}

// The reader and the schema agree on every sheet of the project, and on the
// keys: whatever the one knows, the other does.
func TestSchema(t *testing.T) {
	schema := compiled(t)
	for name, data := range goodSheets(t) {
		if err := schema.Validate(asJSON(t, data)); err != nil {
			t.Errorf("%s: the schema refuses what the reader takes: %v", name, err)
		}
	}
	for _, c := range []string{"misspelt_key", "missing_unit", "wrong_unit", "bare_c", "identifier_form", "missing_required", "wrong_format", "value_for_list", "date", "list_for_value"} {
		data, err := os.ReadFile("testdata/bad/" + c + "/sheet.yaml")
		if err != nil {
			t.Fatal(err)
		}
		if schema.Validate(asJSON(t, data)) == nil {
			t.Errorf("%s: the schema takes what the reader refuses", c)
		}
	}
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
	if tag := n.ShortTag(); tag == "!!int" || tag == "!!float" || tag == "!!bool" {
		var v any
		if err := n.Decode(&v); err != nil {
			t.Fatal(err)
		}
		return v
	}
	return n.Value
}

// Whatever is cut out of or put into a sheet: the reader says what is wrong,
// with a place, or takes it; it never fails otherwise.
func TestReadNeverFails(t *testing.T) {
	sheet := string(Template())
	rapid.Check(t, func(rt *rapid.T) {
		from := rapid.IntRange(0, len(sheet)).Draw(rt, "from")
		to := rapid.IntRange(from, min(from+40, len(sheet))).Draw(rt, "to")
		put := rapid.StringN(0, 12, 40).Draw(rt, "put")
		_, diags := Read("sheet.yaml", []byte(sheet[:from]+put+sheet[to:]))
		for _, d := range diags {
			if d.Line < 1 || d.Severity != Error || strings.ContainsAny(d.String(), "\x1b\x00\n") {
				rt.Fatalf("%q", d.String())
			}
		}
	})
}

func FuzzRead(f *testing.F) {
	f.Add(Template())
	sheets, _ := filepath.Glob("testdata/bad/*/sheet.yaml")
	for _, s := range sheets {
		data, err := os.ReadFile(s)
		if err != nil {
			f.Fatal(err)
		}
		f.Add(data)
	}
	f.Fuzz(func(t *testing.T, data []byte) {
		s, diags := Read("sheet.yaml", data)
		if s == nil {
			t.Fatal("no survey")
		}
		for _, d := range diags {
			if strings.ContainsAny(d.String(), "\x1b\x00\r\n") {
				t.Fatalf("a diagnostic could move the cursor: %q", d.String())
			}
		}
	})
}

func BenchmarkRead(b *testing.B) {
	data, err := os.ReadFile("../examples/calorifier/sheet.yaml")
	if err != nil {
		b.Fatal(err)
	}
	for b.Loop() {
		if _, diags := Read("sheet.yaml", data); diags.HasErrors() {
			b.Fatal(diags)
		}
	}
}
