package catalogue

import (
	"io/fs"
	"reflect"
	"strings"
	"testing"
	"testing/fstest"
)

func mustLoad(t *testing.T) *Catalogue {
	t.Helper()
	c, err := Load()
	if err != nil {
		t.Fatal(err)
	}
	return c
}

// The words of format 1 of the survey sheet.
const (
	elementWords = "bimetal_disc bimetal_strip bimetal_coil_mercury bimetal_coil rod_tube liquid_bulb vapour_bulb " +
		"gas_bulb wax heated_bimetal fusible_link thermocouple_valve curie_magnet"
	sensorWords = "ntc pt100 pt1000 type_k type_j type_t linear diode digital millivolt current"
	outputWords = "relay ssr triac transistor analogue"
	loadWords   = "heater contactor solenoid_valve gas_valve motor compressor pump fan damper lamp alarm modulating_valve control_input"
)

func TestEveryWordOfTheSheetIsThere(t *testing.T) {
	c := mustLoad(t)
	for _, w := range strings.Fields(elementWords) {
		if _, ok := c.Element(w); !ok {
			t.Errorf("no element %s", w)
		}
	}
	for _, w := range strings.Fields(sensorWords) {
		if _, ok := c.Sensor(w); !ok {
			t.Errorf("no sensor %s", w)
		}
	}
	for _, w := range strings.Fields(outputWords) {
		if _, ok := c.Output(w); !ok {
			t.Errorf("no output %s", w)
		}
	}
	for _, w := range strings.Fields(loadWords) {
		if _, ok := c.Load(w); !ok {
			t.Errorf("no load %s", w)
		}
	}
	counts := [][2]int{
		{len(c.Elements), len(strings.Fields(elementWords))},
		{len(c.Sensors), len(strings.Fields(sensorWords))},
		{len(c.Outputs), len(strings.Fields(outputWords))},
		{len(c.Loads), len(strings.Fields(loadWords))},
	}
	for _, n := range counts {
		if n[0] != n[1] {
			t.Errorf("%d entries for %d words", n[0], n[1])
		}
	}
}

// Walks the whole catalogue by reflection, so that a line that is added with a
// new type cannot escape.
func TestEveryLineHasASourceAndStatus(t *testing.T) {
	sources := 0
	var walk func(path string, v reflect.Value)
	walk = func(path string, v reflect.Value) {
		switch v.Kind() {
		case reflect.Pointer:
			if !v.IsNil() {
				walk(path, v.Elem())
			}
		case reflect.Slice:
			for i := range v.Len() {
				walk(path, v.Index(i))
			}
		case reflect.Struct:
			if s, ok := v.Interface().(Source); ok {
				sources++
				switch s.Status {
				case Sure, SecondHand, FromMemory, CommonPractice:
				default:
					t.Errorf("%s: status %q", path, s.Status)
				}
				if s.Name == "" || (s.Status == CommonPractice) != (s.Name == string(CommonPractice)) {
					t.Errorf("%s: source %q with status %q", path, s.Name, s.Status)
				}
				return
			}
			for i := range v.NumField() {
				walk(path+"."+v.Type().Field(i).Name, v.Field(i))
			}
		}
	}
	walk("catalogue", reflect.ValueOf(*mustLoad(t)))
	if sources < 200 {
		t.Errorf("only %d sources seen: the walk is broken", sources)
	}
}

func TestLagIsThatOfTheMedium(t *testing.T) {
	c := mustLoad(t)
	bulb, _ := c.Element("liquid_bulb")
	water, _ := bulb.Lag("water")
	air, _ := bulb.Lag("air")
	if water.Usual >= air.Usual {
		t.Errorf("a bulb lags %g s in water and %g s in air", water.Usual, air.Usual)
	}
	coil, _ := c.Element("bimetal_coil_mercury")
	if lag, ok := coil.Lag("water"); !ok || lag != *coil.LagAir {
		t.Errorf("a coil that is made for air only has the lag %v", lag)
	}
	shunt, _ := c.Sensor("current")
	if lag, ok := shunt.Lag("water"); ok {
		t.Errorf("a current sensor has the lag %v", lag)
	}
}

// Usual inrush multiples: resistive 1, solenoid 10 to 20, motor 5 to 10,
// tungsten 10 to 15 (published rules of thumb, seen second-hand).
func TestInrush(t *testing.T) {
	c := mustLoad(t)
	for kind, band := range map[string][2]float64{
		"heater": {1, 1.5}, "solenoid_valve": {10, 20}, "contactor": {10, 20}, "gas_valve": {10, 20},
		"motor": {5, 10}, "compressor": {5, 10}, "pump": {5, 10}, "fan": {5, 10}, "lamp": {10, 15},
	} {
		l, _ := c.Load(kind)
		if l.Inrush.From != band[0] || l.Inrush.To != band[1] {
			t.Errorf("%s: %g to %g, not %v", kind, l.Inrush.From, l.Inrush.To, band)
		}
	}
}

// Common practice: the usual dominant failure of a semiconductor switch is shorted.
func TestDominantFailureOfASemiconductorIsOn(t *testing.T) {
	c := mustLoad(t)
	for _, kind := range []string{"ssr", "triac", "transistor"} {
		o, _ := c.Output(kind)
		if d := o.Dominant(); d.ID != "shorted" || d.Leaves != "on" {
			t.Errorf("%s: dominant failure %q leaves the load %s", kind, d.ID, d.Leaves)
		}
	}
}

func TestRefusedByName(t *testing.T) {
	c := mustLoad(t)
	for what, want := range map[string]string{
		"Thermostatic expansion valve on the evaporator": "superheat_control",
		"SUPERHEAT control":                          "superheat_control",
		"solar temperature difference control":       "temperature_difference",
		"boiler pressure-temperature control":        "pressure_temperature",
		"duct humidistat":                            "humidistat",
		"thermal door lock of the washer, door lock": "door_interlock",
		"stack switch in the flue":                   "stack_switch",
		"flue spillage switch":                       "flue_spillage",
		"drop-weight fire valve over the oil line":   "drop_weight_fire_valve",
		"rod immersion stat in the top boss":         "",
		"stat on the haystack dryer":                 "",
		"stack of trays, upper oven stat":            "",
		"door-side room stat":                        "",
	} {
		got := ""
		if r, ok := c.RefusedBy(what); ok {
			got = r.ID
		}
		if got != want {
			t.Errorf("%q: %q, want %q", what, got, want)
		}
	}
}

// with gives the embedded files with one text in one of them replaced.
func with(t *testing.T, file, old, repl string) fs.FS {
	t.Helper()
	out := fstest.MapFS{}
	for _, name := range []string{"elements.yaml", "sensors.yaml", "outputs.yaml"} {
		data, err := fs.ReadFile(files, name)
		if err != nil {
			t.Fatal(err)
		}
		text := string(data)
		if name == file {
			if !strings.Contains(text, old) {
				t.Fatalf("%s has no %q", file, old)
			}
			text = strings.Replace(text, old, repl, 1)
		}
		out[name] = &fstest.MapFile{Data: []byte(text)}
	}
	return out
}

func TestLoaderIsStrict(t *testing.T) {
	for name, c := range map[string]struct{ file, old, repl, says string }{
		"unknown key":           {"elements.yaml", "silent: true", "silnet: true", "silnet"},
		"unknown key in source": {"elements.yaml", "{name: IEC 60691, status: sure}", "{name: IEC 60691, state: sure}", "state"},
		"twice the same key":    {"elements.yaml", "title: snap disc", "title: snap disc\n    title: disc", "title"},
		"twice the same id":     {"elements.yaml", "id: wax", "id: rod_tube", "twice"},
		"no source":             {"sensors.yaml", ", source: common practice}", "}", "source"},
		"source without status": {"sensors.yaml", "source: common practice", "source: a book", "status"},
		"status not a word":     {"sensors.yaml", "status: sure", "status: certain", "certain"},
		"reading not a word":    {"elements.yaml", "reads: cold", "reads: chilly", "chilly"},
		"unknown without why":   {"elements.yaml", "depends: Either way.", `depends: ""`, "depends"},
		"figure out of range":   {"elements.yaml", "{usual: 4, from: 2.5, to: 8", "{usual: 9, from: 2.5, to: 8", "between"},
		"not a number":          {"elements.yaml", "{usual: 4, from: 2.5, to: 8", "{usual: .nan, from: 2.5, to: 8", "between"},
		"two dominant":          {"outputs.yaml", "dominant: false", "dominant: true", "dominant"},
		"a file is missing":     {"", "", "", ""},
	} {
		t.Run(name, func(t *testing.T) {
			fsys := fs.FS(fstest.MapFS{})
			if c.file != "" {
				fsys = with(t, c.file, c.old, c.repl)
			}
			_, err := read(fsys)
			if err == nil {
				t.Fatal("no error")
			}
			if !strings.Contains(err.Error(), c.says) {
				t.Errorf("error %q does not say %q", err, c.says)
			}
		})
	}
}
