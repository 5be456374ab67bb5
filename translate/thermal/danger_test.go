package thermal

import (
	"math"
	"strings"
	"testing"
)

// Expected times are worked by hand from t = τ ln((Ton−a)/(Ton−b)).
func TestTimeToDanger(t *testing.T) {
	p := Process{140, 18, 12600, 40}
	for _, c := range []struct {
		name         string
		from, danger float64
		on, vented   bool
		outcome      Outcome
		seconds      float64
		says         string
	}{
		{"stuck on", 60, 95, true, false, Reached, 12600 * math.Log(80.0/45), "ln"},
		{"stuck on, vented", 60, 95, true, true, Reached, 12600 * math.Log(80.0/45), "ln"},
		{"beyond boiling", 60, 110, true, true, NeverReached, 0, "boils"},
		{"beyond boiling, closed", 60, 110, true, false, Reached, 12600 * math.Log(80.0/30), "ln"},
		{"beyond settling", 60, 141, true, false, NeverReached, 0, "settles"},
		{"at boiling", 60, 100, true, true, NeverReached, 0, "boils"},
		{"cooling down", 60, 25, false, true, Reached, 12600 * math.Log(42.0/7), "ln"},
		{"below the surroundings", 60, 10, false, false, NeverReached, 0, "settles"},
		{"the other way", 60, 25, true, false, NeverReached, 0, "away"},
		{"there already", 60, 60, true, false, Reached, 0, "already"},
	} {
		r, err := p.TimeToDanger(c.from, c.danger, c.on, c.vented)
		if err != nil {
			t.Fatal(err)
		}
		if r.Outcome != c.outcome || !strings.Contains(r.Because, c.says) {
			t.Errorf("%s: %+v", c.name, r)
		}
		isNear(t, c.name, r.Seconds, c.seconds, 1e-6)
	}
	cold := Process{-30, 25, 3600, 30}
	r, err := cold.TimeToDanger(-18, -5, false, false)
	if err != nil || r.Outcome != Reached {
		t.Fatalf("%+v %v", r, err)
	}
	agrees(t, "cold store without cooling", r.Seconds, 3600*math.Log(43.0/30), 1e-12)
	if r, _ := cold.TimeToDanger(-18, -5, true, false); r.Outcome != NeverReached {
		t.Errorf("cooling warms: %+v", r)
	}
	if _, err := p.TimeToDanger(math.NaN(), 95, true, false); err == nil {
		t.Error("NaN taken")
	}
}

// A straight line of the steepest slope is never behind the exponential.
func TestStraightLineIsABound(t *testing.T) {
	for _, settles := range []float64{90, 110, 140, 1000} {
		p := Process{settles, 18, 12600, 40}
		low, danger := 54.0, 85.0
		r, err := StraightLineToDanger((p.On-low)/p.Tau, low, danger, true)
		if err != nil || r.Outcome != NotDetermined || r.AtLeast <= 0 {
			t.Fatalf("%+v %v", r, err)
		}
		exact, err := p.TimeToDanger(low, danger, true, true)
		if err != nil || r.AtLeast > exact.Seconds {
			t.Errorf("settles at %g: at least %g, exact %+v, %v", settles, r.AtLeast, exact, err)
		}
	}
	for _, c := range []struct {
		rate, from, danger float64
		vented             bool
		outcome            Outcome
	}{
		{0.01, 60, 105, true, NeverReached},
		{-0.01, 60, 95, false, NotDetermined},
		{0, 60, 95, false, NotDetermined},
		{0.01, 60, 60, false, Reached},
	} {
		r, err := StraightLineToDanger(c.rate, c.from, c.danger, c.vented)
		if err != nil || r.Outcome != c.outcome || r.Because == "" || r.AtLeast != 0 {
			t.Errorf("%+v: %+v %v", c, r, err)
		}
	}
}

// A slow ramp: with the lag small beside the time constant a first-order
// element is rate·lag behind, and the medium goes on for the dead time.
func TestOvershootAfterACut(t *testing.T) {
	p := Process{140, 18, 12600, 40}
	o, err := Cut{Process: p, Sensing: Sensing{Lag: 45}, Trip: 85, From: 18}.Overshoot()
	if err != nil || o.Outcome != Reached {
		t.Fatalf("%+v %v", o, err)
	}
	// exactly, by hand: the element is behind by lag·(140−T)/τ·τ/(τ−lag)
	atTrip := 140 - (140-85)*(12600-45)/12600.0
	isNear(t, "medium at trip", o.AtTrip, atTrip, 1e-9)
	isNear(t, "peak", o.Peak, 140-(140-atTrip)*math.Exp(-40.0/12600), 1e-9)
	isNear(t, "beyond", o.Beyond, o.Peak-85, 1e-12)
	isNear(t, "time", o.TripAfter, 12600*math.Log((140-18)/(140-atTrip)), 1e-6)

	bound, err := OvershootOfRise((p.On-85)/p.Tau, 45, 40, 85, false)
	if err != nil || bound.Beyond < o.Beyond || !bound.Bound || bound.Outcome != NotDetermined {
		t.Errorf("%+v does not bound %+v, %v", bound, o, err)
	}
	o, err = Cut{Process: p, Sensing: Sensing{Lag: 45}, Trip: 99.9, From: 18, Vented: true}.Overshoot()
	if err != nil || o.Peak != VentedWater {
		t.Errorf("%+v %v", o, err)
	}
	o, err = Cut{Process: p, Trip: 105, From: 18, Vented: true}.Overshoot()
	if err != nil || o.Outcome != NeverReached {
		t.Errorf("trips above boiling: %+v %v", o, err)
	}
	o, err = Cut{Process: Process{-30, 25, 3600, 30}, Sensing: Sensing{Lag: 60}, Trip: -25, From: 25}.Overshoot()
	if err != nil || o.Outcome != Reached || o.Peak >= -25 || o.Beyond <= 0 {
		t.Errorf("low limit of a cold plant: %+v %v", o, err)
	}
}

func TestRates(t *testing.T) {
	r, err := Process{140, 18, 12600, 40}.Rates(54, 60)
	if err != nil {
		t.Fatal(err)
	}
	agrees(t, "fastest on", r.FastestOn, 86.0/12600, 1e-12)
	agrees(t, "slowest on", r.SlowestOn, 80.0/12600, 1e-12)
	agrees(t, "fastest off", r.FastestOff, 42.0/12600, 1e-12)
	agrees(t, "slowest off", r.SlowestOff, 36.0/12600, 1e-12)
	r, err = Process{140, 18, 12600, 40}.Rates(10, 150)
	if err != nil || r.SlowestOn != 0 || r.SlowestOff != 0 {
		t.Errorf("%+v %v", r, err)
	}
}
