package survey

import (
	"fmt"
	"math"
	"reflect"
	"strings"
	"testing"

	"pgregory.net/rapid"
)

// oneStat is a sheet with one control, whose thresholds and other keys are given.
func oneStat(keys string) string {
	return `format: 1
equipment: {id: tank, title: Tank}
loads: [{id: heater, what: heater, kind: contactor, safe_state: off, runs_when: stat}]
controls:
  - {id: stat, what: stat, duty: operating, element: rod_tube, ` + withAction(keys) + `, plan: replace, sensor: probe}
electronics:
  sensors: [{id: probe, kind: ntc, r25: 10 kohm, beta: 3977 K, pull_up: 10 kohm}]
  outputs: [{load: heater, kind: relay}]
`
}

func withAction(keys string) string {
	if strings.Contains(keys, "action:") {
		return keys
	}
	return "action: breaks_on_rise, " + keys
}

// However the thresholds are given, both edges are known afterwards. Break and
// make of a bimetal stat by its dial: the differential lies below the mark of a
// contact that breaks on rise, above that of one that makes on rise, and half on
// each side of a mark in the middle (the trade's own definitions).
func TestEdges(t *testing.T) {
	for _, c := range []struct {
		keys          string
		breaks, makes float64
		action        Action
	}{
		{"set_point: 60 degC, marks: break, differential: 6 K", 60, 54, BreaksOnRise},
		{"set_point: 60 degC, marks: make, differential: 6 K", 66, 60, BreaksOnRise},
		{"set_point: 60 degC, marks: middle, differential: 6 K", 63, 57, BreaksOnRise},
		{"action: makes_on_rise, set_point: 60 degC, marks: make, differential: 6 K", 54, 60, MakesOnRise},
		{"action: makes_on_rise, set_point: 60 degC, marks: break, differential: 6 K", 60, 66, MakesOnRise},
		{"action: makes_on_rise, set_point: 60 degC, marks: middle, differential: 6 K", 57, 63, MakesOnRise},
		{"action: makes_on_fall, set_point: 60 degC, marks: break, differential: 6 K", 60, 54, BreaksOnRise},
		{"action: breaks_on_fall, set_point: 60 degC, marks: break, differential: 6 K", 60, 66, MakesOnRise},
		{"set_point: 140 °F, marks: break, differential: 10 degF", 60, 60 - 50.0/9, BreaksOnRise},
		{"breaks_at: 60 degC, makes_at: 54 degC", 60, 54, BreaksOnRise},
		{"set_point: 60 degC, marks: break, differential: 6 K, makes_at: 54.04 degC", 60, 54.04, BreaksOnRise},
	} {
		s, diags := Read("sheet.yaml", []byte(oneStat(c.keys)))
		if diags.HasErrors() {
			t.Errorf("%s: %v", c.keys, diags)
			continue
		}
		got := s.Controls[0]
		if !got.BreaksAt.Set || !got.MakesAt.Set || math.Abs(got.BreaksAt.V-c.breaks) > 1e-9 || math.Abs(got.MakesAt.V-c.makes) > 1e-9 || got.Action.V != c.action {
			t.Errorf("%s: %s, breaks at %v, makes at %v", c.keys, got.Action.V, got.BreaksAt.V, got.MakesAt.V)
		}
		if got.BreaksAt.Line != 5 || got.BreaksAt.Assumed != "" {
			t.Errorf("%s: break comes from line %d, assumed %q", c.keys, got.BreaksAt.Line, got.BreaksAt.Assumed)
		}
	}
}

// Two ways of giving one threshold may be 0.05 K apart, no more.
func TestEdgesGivenTwice(t *testing.T) {
	for makes, good := range map[string]bool{"54 degC": true, "54.05 degC": true, "53.95 degC": true, "54.06 degC": false, "53.9 degC": false} {
		_, diags := Read("sheet.yaml", []byte(oneStat("set_point: 60 degC, marks: break, differential: 6 K, makes_at: "+makes)))
		if diags.HasErrors() == good {
			t.Errorf("makes_at %s: %v", makes, diags)
		}
	}
}

// A contact never makes and breaks at one temperature, whatever the sheet says,
// and the differential comes out again.
func TestEdgesKeepTheDifferential(t *testing.T) {
	rapid.Check(t, func(rt *rapid.T) {
		point := rapid.IntRange(-20, 100).Draw(rt, "set point")
		diff := rapid.IntRange(1, 25).Draw(rt, "differential")
		mark := rapid.SampledFrom([]string{"break", "make", "middle"}).Draw(rt, "marks")
		action := rapid.SampledFrom([]string{"breaks_on_rise", "makes_on_rise", "makes_on_fall", "breaks_on_fall"}).Draw(rt, "action")
		s, diags := Read("sheet.yaml", []byte(oneStat(fmt.Sprintf("action: %s, set_point: %d degC, marks: %s, differential: %d K", action, point, mark, diff))))
		if diags.HasErrors() {
			rt.Fatal(diags)
		}
		c := s.Controls[0]
		width := c.BreaksAt.V - c.MakesAt.V
		if c.Action.V == MakesOnRise {
			width = -width
		}
		if math.Abs(width-float64(diff)) > 1e-9 {
			rt.Fatalf("%v to %v", c.BreaksAt.V, c.MakesAt.V)
		}
	})
}

// An unknown that has a usual value is no better than an unstated one: both are
// assumed, and the reason says which it was.
func TestUnknownIsNoBetterThanUnstated(t *testing.T) {
	sheet := oneStat("breaks_at: 60 degC, makes_at: 54 degC")
	unstated, _ := Read("sheet.yaml", []byte(sheet))
	said, diags := Read("sheet.yaml", []byte(strings.Replace(sheet, "pull_up: 10 kohm", "pull_up: 10 kohm, r25_tolerance: unknown, pull_up_tolerance: unknown, fault_after: unknown", 1)))
	if diags.HasErrors() {
		t.Fatal(diags)
	}
	a, b := unstated.Electronics.Sensors[0], said.Electronics.Sensors[0]
	for _, f := range [][2]Field[float64]{{a.R25Tolerance, b.R25Tolerance}, {a.PullTolerance, b.PullTolerance}, {a.FaultAfter, b.FaultAfter}} {
		if !f[1].Set || f[0].V != f[1].V || f[1].V == 0 || !strings.HasPrefix(f[1].Assumed, "the sheet says unknown") || !f[1].Written() || f[0].Written() {
			t.Errorf("unstated %+v, unknown %+v", f[0], f[1])
		}
	}
}

// Without a usual value unknown stays unknown: not set, but written.
func TestUnknownStaysUnknown(t *testing.T) {
	s, diags := Read("sheet.yaml", []byte(oneStat("breaks_at: 60 degC, makes_at: 54 degC, tolerance: unknown, lag: unknown, trip_free: unknown, last_proved: unknown, read_by: unknown, same_part_as: ''")))
	if diags.HasErrors() {
		t.Fatal(diags)
	}
	c := s.Controls[0]
	for name, f := range map[string]struct {
		set     bool
		written bool
	}{"tolerance": {c.Tolerance.Set, c.Tolerance.Written()}, "lag": {c.Lag.Set, c.Lag.Written()}, "trip_free": {c.TripFree.Set, c.TripFree.Written()},
		"last_proved": {c.LastProved.Set, c.LastProved.Written()}, "read_by": {c.ReadBy.Set, c.ReadBy.Written()}, "same_part_as": {c.SamePartAs.Set, c.SamePartAs.Written()}} {
		if f.set || !f.written {
			t.Errorf("%s: set %v, written %v", name, f.set, f.written)
		}
	}
}

// Each default of the format reads as a value of its own key, and has a reason.
func TestDefaultsAreValues(t *testing.T) {
	found := 0
	var walk func(reflect.Type)
	walk = func(typ reflect.Type) {
		for _, k := range keysOf(typ) {
			inner := k.typ
			if inner.Kind() == reflect.Slice && inner.Elem().Kind() == reflect.Pointer {
				inner = inner.Elem().Elem()
			}
			if inner.Kind() == reflect.Struct && !isField(inner) {
				walk(inner)
			}
			text, why, ok := strings.Cut(k.tag.Get("usual"), "|")
			if !ok {
				continue
			}
			found++
			v, _ := k.typ.FieldByName("V")
			if _, m := scalar(text, v.Type, k.tag); m != nil || why == "" {
				t.Errorf("%s of %s: %v, %q", k.name, typ, m, why)
			}
		}
	}
	walk(reflect.TypeFor[Survey]())
	if found < 30 {
		t.Errorf("only %d defaults found", found)
	}
}

// The sheets of the tests use every key of the format, so none is read untested.
func TestEveryKeyIsInAGoodSheet(t *testing.T) {
	written := map[string]bool{}
	for name, data := range goodSheets(t) {
		s, _ := Read(name, data)
		for _, e := range s.Entries() {
			written[strings.TrimPrefix(e.Key, "- ")] = true
		}
		var walk func(v reflect.Value)
		walk = func(v reflect.Value) {
			for _, k := range keysOf(v.Type()) {
				f := v.Field(k.index)
				switch {
				case isField(f.Type()):
					if f.FieldByName("Source").Interface().(Source).Written() {
						written[v.Type().Name()+"."+k.name] = true
					}
				case f.Kind() == reflect.Struct:
					walk(f)
				case f.Kind() == reflect.Slice && f.Len() > 0:
					written[v.Type().Name()+"."+k.name] = true
					for i := 0; i < f.Len() && f.Index(i).Kind() == reflect.Pointer; i++ {
						walk(f.Index(i).Elem())
					}
				}
			}
		}
		walk(reflect.ValueOf(s).Elem())
	}
	var missing func(reflect.Type)
	missing = func(typ reflect.Type) {
		for _, k := range keysOf(typ) {
			inner := k.typ
			if inner.Kind() == reflect.Slice && inner.Elem().Kind() == reflect.Pointer {
				inner = inner.Elem().Elem()
			}
			if inner.Kind() == reflect.Struct && !isField(inner) {
				missing(inner)
			} else if !written[typ.Name()+"."+k.name] {
				t.Errorf("%s.%s is in no good sheet", typ.Name(), k.name)
			}
		}
	}
	missing(reflect.TypeFor[Survey]())
}
