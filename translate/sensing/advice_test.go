package sensing

import (
	"math"
	"testing"

	"makebreak/survey"
)

// IEC 60063: E96 has 96 values a decade, each the rounded power of 10^(1/96).
func TestE96IsTheSeries(t *testing.T) {
	if len(e96) != 96 {
		t.Fatalf("%d values", len(e96))
	}
	for i, v := range e96 {
		if want := math.Round(100*math.Pow(10, float64(i)/96)) / 100; v != want {
			t.Errorf("value %d is %g, want %g", i, v, want)
		}
	}
	for in, want := range map[float64]float64{10000: 10000, 3065: 3090, 999: 1000, 1.01e6: 1.02e6} {
		if got := E96(in); math.Abs(got-want) > 1e-9*want {
			t.Errorf("E96 of %g is %g, want %g", in, got, want)
		}
	}
}

// No value of the series, tried one by one, gives a finer count than the
// advised one by more than what lies between two neighbours.
func TestBestPullIsBest(t *testing.T) {
	for _, up := range []bool{true, false} {
		for _, temp := range []float64{-10, 25, 60, 100} {
			c := chain(t, thermistor(12, up), 12)
			best, ok := c.bestPull(temp)
			if !ok {
				t.Fatal("no advice")
			}
			width := func(ohm float64) float64 {
				s := thermistor(12, up)
				if up {
					s.PullUp.V = ohm
				} else {
					s.PullDown.V = ohm
				}
				return chain(t, s, 12).CountWidth(temp)
			}
			advised := width(best)
			for _, decade := range []float64{100, 1000, 10000, 100000} {
				for _, v := range e96 {
					if w := width(v * decade); w < advised*0.9995 {
						t.Errorf("at %g degC %g ohm gives %.5f K, the advised %g ohm %.5f K", temp, v*decade, w, best, advised)
					}
				}
			}
		}
	}
}

func TestFewestBits(t *testing.T) {
	c := chain(t, thermistor(12, true), 12)
	bits, ok := c.fewestBits(60, 6)
	if !ok {
		t.Fatal("no advice")
	}
	if w := chain(t, thermistor(bits, true), bits).CountWidth(60); w > 0.6 {
		t.Errorf("%d bits give %g K a count", bits, w)
	}
	if w := chain(t, thermistor(bits-1, true), bits-1).CountWidth(60); bits > 8 && w <= 0.6 {
		t.Errorf("%d bits would do", bits-1)
	}
	if _, ok := c.fewestBits(60, 1e-6); ok {
		t.Error("16 bits cannot be enough")
	}
}

// What is kept and what is advised, worked out by hand: 10 kohm at 25 degC with
// 40 kohm above it. The slope of q/(q+R) is qR/(q+R)² times the sensor's own:
// 0.16 with 40 kohm, 0.25 with 10 kohm, so one count is 25/16 as wide. On 5 V
// the sensor turns 0.1 mA and 0.25 mA into 0.1 and 0.625 mW.
func TestDividerAdvice(t *testing.T) {
	s := thermistor(12, true)
	s.PullUp = f(40000.0)
	a, ok := chain(t, s, 12).Divider(25)
	if !ok {
		t.Fatal("no advice")
	}
	if a.Present != 40000 || a.Advised != 10000 {
		t.Errorf("%+v", a)
	}
	near(t, "ratio of the widths", a.WidthPresent/a.WidthAdvised, 25.0/16, 1e-5)
	near(t, "power kept", a.PowerPresent, 0.1e-3, 1e-12)
	near(t, "power advised", a.PowerAdvised, 0.625e-3, 1e-12)
	if s.PullUp.V != 40000 {
		t.Error("the sheet was changed")
	}
	if _, ok := chain(t, couple(), 12).Divider(25); ok {
		t.Error("a thermocouple has no divider")
	}
}

func TestBitsAdvice(t *testing.T) {
	c := chain(t, thermistor(8, true), 8)
	a, ok := c.Bits(60, 6)
	if !ok || a.Present != 8 || a.Wanted != 0.6 {
		t.Fatalf("%+v", a)
	}
	if a.Enough != (a.Width <= 0.6) || a.Enough != (a.Fewest <= 8) {
		t.Errorf("%+v", a)
	}
	a, ok = c.Bits(60, 0.6)
	if !ok || a.Enough || a.Fewest < 11 || a.Fewest > 13 {
		// 0.42 K a count with 8 bits: 0.06 K wants 2^8 · 0.42/0.06, 11 bits.
		t.Errorf("%+v", a)
	}
	if a, ok = c.Bits(60, 1e-6); !ok || a.Fewest != 0 || a.Enough {
		t.Errorf("%+v", a)
	}
	d := chain(t, &survey.Sensor{ID: f("d"), Kind: f(survey.SensorKind("digital")), CountsPerKelvin: f(16.0)}, 10)
	if _, ok := d.Bits(20, 1); ok {
		t.Error("a digital sensor has no converter of ours")
	}
}
