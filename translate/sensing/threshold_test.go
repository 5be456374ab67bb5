package sensing

import (
	"errors"
	"maps"
	"math"
	"slices"
	"testing"

	"pgregory.net/rapid"

	"makebreak/survey"
)

// sensors are one of each kind that measures a temperature, on a converter of
// any width.
func sensors() map[string]*survey.Sensor {
	excited := thermistor(12, true)
	excited.Excitation = f(3.3)
	return map[string]*survey.Sensor{
		"ntc above ground":    thermistor(12, true),
		"ntc below reference": thermistor(12, false),
		"ntc on 3.3 V":        excited,
		"pt1000":              {ID: f("p"), Kind: f(survey.SensorKind("pt1000")), PullUp: f(2200.0), Valid: f([2]float64{-40, 200})},
		"pt100 on a source":   {ID: f("p"), Kind: f(survey.SensorKind("pt100")), Current: f(0.001), Gain: f(20.0), Valid: f([2]float64{-40, 200})},
		"type k":              couple(),
		"transmitter":         {ID: f("l"), Kind: f(survey.SensorKind("linear")), At: f([][2]float64{{-50, 0.4}, {150, 4.4}})},
		"diode":               {ID: f("d"), Kind: f(survey.SensorKind("diode")), At25: f(0.6), Slope: f(-0.002)},
		"digital":             {ID: f("d"), Kind: f(survey.SensorKind("digital")), CountsPerKelvin: f(16.0)},
	}
}

// A threshold, however rounded, switches within one count of what was asked
// for, on the side demanded; and its comparison agrees with it.
func TestThresholdSides(t *testing.T) {
	all := sensors()
	names := slices.Sorted(maps.Keys(all))
	rapid.Check(t, func(rt *rapid.T) {
		bits := rapid.IntRange(8, 16).Draw(rt, "bits")
		c := chain(t, all[rapid.SampledFrom(names).Draw(rt, "sensor")], bits)
		asked := rapid.Float64Range(-20, 110).Draw(rt, "asked")
		round := rapid.SampledFrom([]Round{Nearest, Down, Up}).Draw(rt, "round")
		side := rapid.SampledFrom([]Side{AtOrAbove, AtOrBelow}).Draw(rt, "side")
		h, err := c.Threshold(asked, side, round)
		if err != nil {
			return // outside what the converter can tell apart
		}
		if round == Down && h.SwitchesAt > asked+1e-6 || round == Up && h.SwitchesAt < asked-1e-6 {
			rt.Fatalf("%.4f rounded %v switches at %.4f", asked, round, h.SwitchesAt)
		}
		cold, warm := c.Temperature(h.edge)
		if a, b := c.Temperature(h.edge - 1); true {
			cold, warm = math.Min(cold, a), math.Max(warm, b)
		}
		if asked < cold-1e-6 || asked > warm+1e-6 {
			rt.Fatalf("%.4f switches at %.4f, more than one count away", asked, h.SwitchesAt)
		}
		for _, d := range []float64{-1e-4, 1e-4} {
			n, _ := c.Count(h.SwitchesAt + d)
			reached := n <= h.Counts
			if h.AtLeast {
				reached = n >= h.Counts
			}
			if want := (d > 0) == (side == AtOrAbove); reached != want {
				rt.Fatalf("%+v: at %+.4f of its edge the comparison says %v", h, d, reached)
			}
		}
	})
}

// However coarse the converter, make and break are never less apart than asked
// for, and at least two counts.
func TestApart(t *testing.T) {
	all := sensors()
	names := slices.Sorted(maps.Keys(all))
	rapid.Check(t, func(rt *rapid.T) {
		bits := rapid.IntRange(8, 14).Draw(rt, "bits")
		c := chain(t, all[rapid.SampledFrom(names).Draw(rt, "sensor")], bits)
		low := rapid.Float64Range(0, 80).Draw(rt, "low")
		high := low + rapid.Float64Range(0.1, 10).Draw(rt, "differential")
		a, err1 := c.Threshold(low, AtOrBelow, Nearest)
		b, err2 := c.Threshold(high, AtOrAbove, Nearest)
		if err1 != nil || err2 != nil {
			return
		}
		a, b, err := Apart(a, b, rapid.Bool().Draw(rt, "keep"))
		if err != nil {
			return
		}
		if b.SwitchesAt-a.SwitchesAt < high-low-1e-6 || math.Abs(float64(b.edge-a.edge)) < 2 {
			rt.Fatalf("%.3f and %.3f end %.4f K and %d counts apart", low, high, b.SwitchesAt-a.SwitchesAt, b.edge-a.edge)
		}
	})
}

// Worked by hand: 10 kohm at 25 degC on 10 kohm and 10 bits is exactly the
// edge of count 512. Colder is a higher count.
func TestThresholdByHand(t *testing.T) {
	c := chain(t, thermistor(10, true), 10)
	for _, x := range []struct {
		side   Side
		counts int64
		least  bool
	}{{AtOrAbove, 511, false}, {AtOrBelow, 512, true}} {
		for _, round := range []Round{Nearest, Down, Up} {
			h, err := c.Threshold(25, x.side, round)
			if err != nil || h.Counts != x.counts || h.AtLeast != x.least || (h.Compare() == ">=") != x.least || math.Abs(h.SwitchesAt-25) > 1e-6 {
				t.Errorf("rounded %v: %+v (%v), want %d, at least: %v", round, h, err, x.counts, x.least)
			}
		}
	}
	// 54 degC: R = 10000·exp(3977·(1/327.15 − 1/298.15)) = 3064.7 ohm, ratio
	// 0.234576, 240.2 counts of 1024. Rounded down (colder) it is edge 241, up 240.
	for round, edge := range map[Round]int64{Down: 241, Up: 240, Nearest: 240} {
		h, err := c.Threshold(54, AtOrAbove, round)
		if err != nil || h.Counts != edge-1 || h.AtLeast {
			t.Errorf("54 degC rounded %v: %+v (%v), want at most %d", round, h, err, edge-1)
		}
	}
}

func TestThresholdRefuses(t *testing.T) {
	c := chain(t, thermistor(10, true), 10)
	for _, temp := range []float64{-60, 151, math.NaN(), math.Inf(1)} {
		if _, err := c.Threshold(temp, AtOrAbove, Nearest); !errors.As(err, new(RangeError)) {
			t.Errorf("%g degC: %v, want a range error", temp, err)
		}
	}
	a, err := c.Threshold(50, AtOrBelow, Nearest)
	if err != nil {
		t.Fatal(err)
	}
	b, err := chain(t, thermistor(10, true), 10).Threshold(60, AtOrAbove, Nearest)
	if err != nil {
		t.Fatal(err)
	}
	for name, pair := range map[string][2]Threshold{"nothing": {}, "upside down": {b, a}, "of two sensors": {a, b}, "one twice": {a, a}} {
		if _, _, err := Apart(pair[0], pair[1], false); err == nil {
			t.Errorf("%s: taken for a pair", name)
		}
	}
}
