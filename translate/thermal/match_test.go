package thermal

import (
	"math"
	"testing"

	"pgregory.net/rapid"
)

func matched(t testing.TB, r MatchRequest) Matched {
	t.Helper()
	m, err := Match(r)
	if err != nil {
		t.Fatal(err)
	}
	if m.Because == "" || len(m.Costs) < 3 {
		t.Errorf("says nothing: %+v", m)
	}
	return m
}

func TestMatchThresholds(t *testing.T) {
	m := matched(t, MatchRequest{Old: tank(45), Keep: KeepThresholds, NewLag: 8})
	if !m.Feasible || m.Filter != 0 || m.Switching.Make != 54 || m.Switching.Break != 60 || m.New.OperationsPerYear <= m.Old.OperationsPerYear {
		t.Errorf("%+v", m)
	}
}

// The same medium, checked by the independent fixed-step integration.
func TestMatchSwing(t *testing.T) {
	m := matched(t, MatchRequest{Old: tank(45), Keep: KeepSwing, NewLag: 8})
	if !m.Feasible || m.Filter != 0 || m.Switching.Break <= 60 || m.Switching.Make >= 54 {
		t.Errorf("%+v", m)
	}
	f := integrated(Loop{Process{140, 18, 12600, 40}, Sensing{Lag: 8}, m.Switching}, 1, 10)
	isNear(t, "high", f.High, m.Old.High, 1e-4)
	isNear(t, "low", f.Low, m.Old.Low, 1e-4)
	agrees(t, "on", f.On, m.Old.On, 1e-5)
	agrees(t, "off", f.Off, m.Old.Off, 1e-5)

	// where no threshold may go higher, a software lag does it
	m = matched(t, MatchRequest{Old: tank(45), Keep: KeepSwing, NewLag: 8, HighestEdge: Given(60)})
	if !m.Feasible || m.Filter <= 0 || m.Switching.Break != 60 {
		t.Errorf("%+v", m)
	}
	f = integrated(Loop{Process{140, 18, 12600, 40}, Sensing{Lag: 8, Filter: m.Filter}, m.Switching}, 1, 10)
	isNear(t, "swing by software lag", f.High-f.Low, m.Old.Swing(), 1e-4)

	// a slower probe than the bulb needs a narrower differential
	m = matched(t, MatchRequest{Old: tank(45), Keep: KeepSwing, NewLag: 120})
	if !m.Feasible || m.Switching.Break >= 60 {
		t.Errorf("%+v", m)
	}
	// and one that is far slower leaves no differential to speak of
	m = matched(t, MatchRequest{Old: tank(45), Keep: KeepSwing, NewLag: 3000, MinDifferential: 0.3})
	if m.Feasible || m.New.Period() == 0 {
		t.Errorf("%+v", m)
	}
}

func TestMatchCycleRate(t *testing.T) {
	m := matched(t, MatchRequest{Old: tank(45), Keep: KeepCycleRate, NewLag: 8})
	if !m.Feasible {
		t.Errorf("%+v", m)
	}
	isNear(t, "middle", (m.Switching.Make+m.Switching.Break)/2, 57, 1e-9)
	f := integrated(Loop{Process{140, 18, 12600, 40}, Sensing{Lag: 8}, m.Switching}, 1, 10)
	agrees(t, "period", f.Period(), m.Old.Period(), 1e-5)
	m = matched(t, MatchRequest{Old: tank(45), Keep: KeepCycleRate, NewLag: 8, LowestEdge: Given(54)})
	if !m.Feasible || m.Filter <= 0 {
		t.Errorf("%+v", m)
	}
	agrees(t, "period by software lag", m.New.Period(), m.Old.Period(), 1e-8)
}

func TestMatchKeepsItsLimits(t *testing.T) {
	m := matched(t, MatchRequest{Old: tank(45), Keep: KeepThresholds, NewLag: 8, MostOperations: 9000})
	if m.Feasible || m.New.OperationsPerYear > 9000*(1+1e-6) || m.Filter <= 0 {
		t.Errorf("contact life: %+v", m)
	}
	m = matched(t, MatchRequest{Old: tank(45), Keep: KeepSwing, NewLag: 8, MinOff: 2700})
	if m.Feasible || !m.New.HeldOff || m.New.Off < 2700*(1-1e-9) {
		t.Errorf("minimum off: %+v", m)
	}
	m = matched(t, MatchRequest{Old: tank(45), Keep: KeepSwing, NewLag: 120, MinDifferential: 5.9})
	if m.Feasible {
		t.Errorf("differential: %+v", m)
	}
	for name, r := range map[string]MatchRequest{
		"word":      {Old: tank(45), Keep: "rate"},
		"lag":       {Old: tank(45), Keep: KeepSwing, NewLag: -1},
		"no cycle":  {Old: Loop{Process{55, 18, 100, 1}, Sensing{}, Switching{Make: 50, Break: 60}}, Keep: KeepSwing},
		"old edges": {Old: Loop{Process{155, 18, 100, 1}, Sensing{}, Switching{Make: 70, Break: 60}}, Keep: KeepSwing},
	} {
		if _, err := Match(r); err == nil {
			t.Errorf("%s taken", name)
		}
	}
}

// A wider differential that keeps to a number of operations does keep to it,
// and is refused where an edge may not go there.
func TestWidened(t *testing.T) {
	r := MatchRequest{Old: tank(45), Keep: KeepThresholds, NewLag: 8, MostOperations: 8000}
	m, err := Widened(r, r.Old.Switching, 0)
	if err != nil || !m.Feasible {
		t.Fatalf("%+v, %v", m, err)
	}
	agrees(t, "operations", m.New.OperationsPerYear, 8000, 1e-9)
	isNear(t, "middle", (m.Switching.Make+m.Switching.Break)/2, 57, 1e-9)
	if m.Switching.Break-m.Switching.Make <= 6 {
		t.Errorf("not wider: %+v", m.Switching)
	}
	r.HighestEdge = Given(60.2)
	if m, err = Widened(r, r.Old.Switching, 0); err != nil || m.Feasible {
		t.Errorf("past the highest edge: %+v, %v", m, err)
	}
}

func TestMatchOfCooling(t *testing.T) {
	old := Loop{Process{-30, 25, 3600, 30}, Sensing{Lag: 60}, Switching{Make: -16, Break: -20}}
	m := matched(t, MatchRequest{Old: old, Keep: KeepSwing, NewLag: 10})
	if !m.Feasible || m.Switching.Break >= -20 || m.Switching.Make <= -16 {
		t.Errorf("%+v", m)
	}
	isNear(t, "swing", m.New.Swing(), m.Old.Swing(), 1e-9)
	isNear(t, "high", m.New.High, m.Old.High, 1e-9)
}

// Keeping the swing with a quicker probe always keeps times and temperatures.
func TestMatchSwingProperty(t *testing.T) {
	rapid.Check(t, func(rt *rapid.T) {
		draw := func(what string, low, high float64) float64 { return rapid.Float64Range(low, high).Draw(rt, what) }
		gain := draw("gain", 40, 300)
		middle := 20 + draw("demand", 0.15, 0.85)*gain
		half := draw("half", 0.005, 0.03) * gain
		lag := draw("lag", 10, 200)
		old := Loop{Process{20 + gain, 20, draw("tau", 500, 20000), draw("dead", 0, 100)}, Sensing{Lag: lag}, Switching{Make: middle - half, Break: middle + half}}
		m, err := Match(MatchRequest{Old: old, Keep: KeepSwing, NewLag: draw("new", 0.01, 1) * lag})
		if err != nil {
			rt.Fatal(err)
		}
		if !m.Feasible {
			rt.Fatalf("%+v", m)
		}
		if math.Abs(m.New.High-m.Old.High)+math.Abs(m.New.Low-m.Old.Low) > 1e-7*gain || math.Abs(m.New.Period()-m.Old.Period()) > 1e-6*m.Old.Period() {
			rt.Fatalf("%+v", m)
		}
	})
}
