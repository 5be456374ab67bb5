package switching

import (
	"math"
	"strings"
	"testing"

	"makebreak/survey"
)

func f[T any](v T) survey.Field[T] { return survey.Field[T]{V: v, Set: true} }

// relay is a 10 A relay on a 0.3 A contactor coil, everything stated.
func relay() Stage {
	return Stage{
		Output: &survey.Output{Kind: f("relay"), RatedCurrent: f(10.0), RatedVoltage: f(250.0), MinCurrent: f(0.1)},
		Load:   &survey.Load{Kind: f(survey.LoadKind("contactor")), Supply: f(230.0), SupplyIs: f(AC), Current: f(0.3)},
		Inrush: Inrush(2.5, 0.3, 15, "common practice"),
		Box:    f(45.0),
	}
}

// solid is a solid-state relay on a 5 A heater, everything stated.
func solid() Stage {
	return Stage{
		Output: &survey.Output{Kind: f("ssr"), RatedCurrent: f(25.0), RatedVoltage: f(280.0), MinCurrent: f(0.05), Leakage: f(0.005), OnDrop: f(1.2), ThermalRes: f(8.0), MaxJunction: f(100.0)},
		Load:   &survey.Load{Kind: f(survey.LoadKind("heater")), Supply: f(230.0), SupplyIs: f(AC), Current: f(5.0)},
		Inrush: Inrush(0, 5, 1, "resistive"),
		Box:    f(45.0),
	}
}

func find(t *testing.T, s Stage, name string) Check {
	t.Helper()
	for _, c := range s.Check() {
		if c.Name == name {
			return c
		}
	}
	t.Fatalf("no check %q", name)
	return Check{}
}

func TestStageHolds(t *testing.T) {
	for name, s := range map[string]Stage{"relay": relay(), "solid state": solid()} {
		for _, c := range s.Check() {
			if !c.Determined || !c.Holds || c.Working == "" || math.IsNaN(c.Value) || math.IsInf(c.Value, 0) {
				t.Errorf("%s: %+v", name, c)
			}
		}
	}
}

// Each answer turns with the one figure that it is about.
func TestStageFails(t *testing.T) {
	for _, x := range []struct {
		name  string
		stage func() Stage
		spoil func(s *Stage)
		value float64
	}{
		{"rating", relay, func(s *Stage) { s.Load.Current = f(12.0) }, 1.2},
		{"voltage", relay, func(s *Stage) { s.Load.Supply = f(400.0) }, 1.6},
		{"usable current", relay, func(s *Stage) { s.Load.Current = f(5.0) }, 1.25}, // 5 A of 4 A
		{"inrush", relay, func(s *Stage) { s.Inrush = Inrush(15, 0.3, 15, "") }, 1.5},
		{"least current", relay, func(s *Stage) { s.Load.Current = f(0.02) }, 0.2},
		{"kind of current", solid, func(s *Stage) { s.Output.Kind, s.Load.SupplyIs = f("triac"), f(DC) }, 0},
		{"kind of current", relay, func(s *Stage) { s.Output.Kind = f("transistor") }, 0},
		{"leakage", solid, func(s *Stage) { s.Load.Kind, s.Output.DropOut = f(survey.LoadKind("contactor")), f(0.004) }, 1.25},
		{"temperature", solid, func(s *Stage) { s.Output.MaxJunction = f(85.0) }, 1.2}, // 48 K of 40 K
		{"temperature", solid, func(s *Stage) { s.Output.MaxJunction = f(45.0) }, 0},
	} {
		s := x.stage()
		x.spoil(&s)
		c := find(t, s, x.name)
		if !c.Determined || c.Holds || math.Abs(c.Value-x.value) > 1e-9 {
			t.Errorf("%s: %+v, want it to fail at %g", x.name, c, x.value)
		}
	}
}

// Without its figure a question is open, and says what is missing.
func TestStageUnknown(t *testing.T) {
	none := survey.Field[float64]{}
	for _, x := range []struct {
		name, word string
		stage      func() Stage
		spoil      func(s *Stage)
	}{
		{"rating", "rating", relay, func(s *Stage) { s.Output.RatedCurrent = none }},
		{"usable current", "rating", relay, func(s *Stage) { s.Output.RatedCurrent = none }},
		{"inrush", "rating", relay, func(s *Stage) { s.Output.RatedCurrent = none }},
		{"inrush", "current", relay, func(s *Stage) { s.Inrush = Inrush(0, 0, 15, "") }},
		{"voltage", "voltage", relay, func(s *Stage) { s.Output.RatedVoltage = none }},
		{"kind of current", "supply_is", relay, func(s *Stage) { s.Load.SupplyIs = f("unknown") }},
		{"kind of current", "30 V", relay, func(s *Stage) { s.Load.SupplyIs, s.Load.Supply = f(DC), f(110.0) }},
		{"kind of current", "30 V", relay, func(s *Stage) { s.Load.SupplyIs, s.Load.Supply = f(DC), none }},
		{"kind of current", "DC", solid, func(s *Stage) { s.Load.SupplyIs = f(DC) }},
		{"least current", "min_current", relay, func(s *Stage) { s.Output.MinCurrent, s.Load.Current = none, f(0.02) }},
		{"least current", "min_current", solid, func(s *Stage) { s.Output.MinCurrent = none }},
		{"leakage", "leakage", solid, func(s *Stage) { s.Output.Leakage = none }},
		{"leakage", "drop_out", solid, func(s *Stage) { s.Load.Kind = f(survey.LoadKind("contactor")) }},
		{"temperature", "enclosure", solid, func(s *Stage) { s.Box = none }},
		{"temperature", "thermal resistance", solid, func(s *Stage) { s.Output.ThermalRes = none }},
		{"temperature", "highest temperature", solid, func(s *Stage) { s.Output.MaxJunction = none }},
	} {
		s := x.stage()
		x.spoil(&s)
		c := find(t, s, x.name)
		if c.Determined || c.Holds || !strings.HasPrefix(c.Working, notDetermined) || !strings.Contains(c.Working, x.word) {
			t.Errorf("%s: %+v, want it open for want of %q", x.name, c, x.word)
		}
	}
	for _, c := range (Stage{Output: &survey.Output{Kind: f("relay")}, Load: &survey.Load{}}).Check() {
		if c.Determined {
			t.Errorf("of nothing: %+v", c)
		}
	}
}

// What is left of a resistive rating, against makers' advice.
func TestUsableShares(t *testing.T) {
	p := published(t).PowerFactor
	if got := coilShare.part * p.Rated; got != p.Coil {
		t.Errorf("a coil on %g A: %g, want %g", p.Rated, got, p.Coil)
	}
	if motorShare.part != p.LowestPart {
		t.Errorf("a motor: %g, want %g", motorShare.part, p.LowestPart)
	}
	s := relay()
	s.Load.Kind, s.Load.Current = f(survey.LoadKind("heater")), f(9.0)
	if c := find(t, s, "usable current"); !c.Holds || math.Abs(c.Value-0.9) > 1e-12 {
		t.Errorf("%+v", c)
	}
}

// Nothing is switched by an analogue output.
func TestAnalogueOutput(t *testing.T) {
	s := relay()
	s.Output.Kind = f("analogue")
	if cs := s.Check(); len(cs) != 0 {
		t.Errorf("%+v", cs)
	}
}
