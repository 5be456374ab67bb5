package sensing

import (
	"math"
	"testing"
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
			best, ok := c.BestPull(temp)
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
	bits, ok := c.FewestBits(60, 6)
	if !ok {
		t.Fatal("no advice")
	}
	if w := chain(t, thermistor(bits, true), bits).CountWidth(60); w > 0.6 {
		t.Errorf("%d bits give %g K a count", bits, w)
	}
	if w := chain(t, thermistor(bits-1, true), bits-1).CountWidth(60); bits > 8 && w <= 0.6 {
		t.Errorf("%d bits would do", bits-1)
	}
	if _, ok := c.FewestBits(60, 1e-6); ok {
		t.Error("16 bits cannot be enough")
	}
}
