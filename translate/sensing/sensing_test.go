package sensing

import (
	"errors"
	"math"
	"testing"

	"pgregory.net/rapid"

	"makebreak/survey"
)

func near(t *testing.T, what string, got, want, within float64) {
	t.Helper()
	if math.Abs(got-want) > within {
		t.Errorf("%s: %.6g, want %.6g ± %.3g", what, got, want, within)
	}
}

func at(t *testing.T, c Curve, temp float64) float64 {
	t.Helper()
	q, err := c.At(temp)
	if err != nil {
		t.Fatal(err)
	}
	return q
}

// IEC 60751, table of Pt100 resistances, two decimals (seen in public material).
func TestPlatinumTable(t *testing.T) {
	for temp, ohm := range map[float64]float64{-200: 18.52, -100: 60.26, -50: 80.31, 0: 100, 50: 119.40, 100: 138.51, 200: 175.86, 400: 247.09, 600: 313.71, 850: 390.48} {
		near(t, "Pt100", at(t, Platinum(100), temp), ohm, 0.005001)
		back, err := Platinum(1000).Inverse(at(t, Platinum(1000), temp))
		if err != nil {
			t.Error(err)
		}
		near(t, "back again", back, temp, 1e-6)
	}
	if _, err := Platinum(100).At(851); !errors.As(err, new(RangeError)) {
		t.Errorf("851 degC gives %v, want a range error", err)
	}
}

// IEC 60584-1 / ITS-90 reference tables, mV to three decimals; the points that
// were independently seen in public material.
func TestThermocoupleTables(t *testing.T) {
	for letter, table := range map[byte]map[float64]float64{
		'k': {-200: -5.891, -100: -3.554, 0: 0, 100: 4.096, 200: 8.138},
		'j': {-200: -7.890, -100: -4.633, 0: 0, 100: 5.269, 200: 10.779},
		't': {-200: -5.603, -100: -3.379, 0: 0, 100: 4.279, 200: 9.288},
	} {
		c, _ := Thermocouple(letter)
		for temp, mv := range table {
			near(t, c.Name, 1000*at(t, c, temp), mv, 0.0005001)
		}
	}
}

// Beta formula, R25 = 10 kohm, beta = 3974 K: a published table whose entries
// are cut off to whole ohms.
func TestBetaTable(t *testing.T) {
	for temp, ohm := range map[float64]float64{-25: 146676, -15: 78875, -5: 44424, 5: 26075, 15: 15881, 25: 10000, 35: 6488, 45: 4326, 55: 2956, 65: 2066, 75: 1474, 85: 1072, 95: 793, 105: 596, 115: 454, 125: 351} {
		if got := math.Floor(at(t, Beta(10000, 3974), temp) + 1e-6); got != ohm {
			t.Errorf("%g degC: %g ohm, want %g", temp, got, ohm)
		}
	}
}

// Steinhart–Hart with A = 1.40e-3, B = 2.37e-4, C = 9.90e-8: the worked values
// of an open thermistor library's tests, four decimals.
func TestSteinhartHartTable(t *testing.T) {
	for temp, ohm := range map[float64]float64{-10: 17000.0073, 0: 10030.2176, 10: 6110.3822, 20: 3833.3276, 30: 2470.6001, 40: 1632.3751, 50: 1103.5474} {
		near(t, "Steinhart-Hart", at(t, SteinhartHart(1.40e-3, 2.37e-4, 9.90e-8), temp), ohm, 1e-3)
	}
}

// IEC 60751 and IEC 60584-1:2013 tolerance classes, with their crossovers.
func TestToleranceClasses(t *testing.T) {
	for _, c := range []struct {
		kind, class string
		t, want     float64
	}{
		{"pt100", "A", 100, 0.35}, {"pt100", "A", 400, 0.95},
		{"pt100", "B", -200, 1.3}, {"pt100", "B", 100, 0.80}, {"pt100", "B", 400, 2.3}, {"pt100", "B", 600, 3.3},
		{"type_k", "1", 375, 1.5}, {"type_k", "2", 1000.0 / 3, 2.5}, {"type_t", "1", 125, 0.5}, {"type_t", "2", 400.0 / 3, 1.0},
		{"type_k", "1", 1000, 4.0}, {"type_j", "2", 600, 4.5},
	} {
		got, ok := Tolerance(c.kind, c.class, c.t)
		if !ok {
			t.Errorf("%s class %s is not known", c.kind, c.class)
		}
		near(t, c.kind+" "+c.class, got, c.want, 1e-9)
	}
}

func f[T any](v T) survey.Field[T] { return survey.Field[T]{V: v, Set: true} }

func thermistor(bits int, up bool) *survey.Sensor {
	s := &survey.Sensor{ID: f("probe"), Kind: f(survey.SensorKind("ntc")), R25: f(10000.0), Beta: f(3977.0), R25Tolerance: f(0.01), BetaTolerance: f(0.0075)}
	if up {
		s.PullUp = f(10000.0)
	} else {
		s.PullDown = f(10000.0)
	}
	s.PullTolerance = f(0.001)
	return s
}

func converter(bits int) survey.ADC {
	return survey.ADC{Bits: f(bits), Reference: f(5.0), ReferenceTolerance: f(0.005), INL: f(2.0), Offset: f(0.0), Gain: f(0.0)}
}

func chain(t testing.TB, s *survey.Sensor, bits int) *Chain {
	t.Helper()
	c, err := New(s, converter(bits), survey.Enclosure{})
	if err != nil {
		t.Fatal(err)
	}
	return c
}

// The edge rule of the converter: `count <= c` changes at ratio (c+1)/2^N, and
// an ideal converter reads floor(2^N · ratio).
func TestEveryCountOfAConverter(t *testing.T) {
	for _, bits := range []int{10, 12, 16} {
		c := chain(t, thermistor(bits, true), bits)
		lo, hi := c.Believable()
		for n := lo + 1; n < hi; n++ {
			cold, warm := c.Temperature(n)
			got, err := c.Count((cold + warm) / 2)
			if err != nil || got != n {
				t.Fatalf("%d bits: the middle of count %d reads %d (%v)", bits, n, got, err)
			}
			r := 10000 * math.Exp(3977*(1/(cold+Kelvin)-1/298.15))
			if ratio := r / (r + 10000); math.Abs(ratio*math.Ldexp(1, bits)-float64(n+1)) > 1e-5 {
				t.Fatalf("%d bits: count %d gives way at ratio %.9g, want (c+1)/2^N", bits, n, ratio)
			}
		}
	}
}

// A threshold, however rounded, switches within one count of what was asked
// for, on the side demanded; and its comparison agrees with it.
func TestThresholdSides(t *testing.T) {
	rapid.Check(t, func(rt *rapid.T) {
		bits := rapid.IntRange(8, 16).Draw(rt, "bits")
		c := chain(t, thermistor(bits, rapid.Bool().Draw(rt, "up")), bits)
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

func TestApart(t *testing.T) {
	rapid.Check(t, func(rt *rapid.T) {
		bits := rapid.IntRange(8, 14).Draw(rt, "bits")
		c := chain(t, thermistor(bits, true), bits)
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

// Two-wire Pt100 with 1 ohm a lead reads 5.27 K too much at 100 degC: 2 ohm over
// the slope of IEC 60751 there, 0.37928 ohm/K.
func TestTwoWireLead(t *testing.T) {
	s := &survey.Sensor{ID: f("p"), Kind: f(survey.SensorKind("pt100")), Class: f("B"), Wires: f(2), Lead: f(1.0), PullUp: f(1000.0), PullTolerance: f(0.0)}
	b, err := chain(t, s, 16).Budget(100)
	if err != nil {
		t.Fatal(err)
	}
	found := false
	for _, l := range b.Lines {
		if l.Name == "leads" {
			found = true
			near(t, "lead error", l.Kelvin, 5.273, 0.001)
		}
	}
	if !found {
		t.Error("the budget has no line for the leads")
	}
	sum, squares := 0.0, 0.0
	for _, l := range b.Lines {
		sum, squares = sum+l.Kelvin, squares+l.Kelvin*l.Kelvin
	}
	near(t, "worst case", b.WorstCase, sum, 1e-12)
	near(t, "root sum of squares", b.RSS, math.Sqrt(squares), 1e-12)
}

// The budget of a thermistor against the exact curve: every cause pushed to its
// worst one at a time must move the reading by what the budget says, to the
// first order.
func TestBudgetAgainstTheExactCurve(t *testing.T) {
	c := chain(t, thermistor(12, true), 12)
	const temp = 60.0
	b, err := c.Budget(temp)
	if err != nil {
		t.Fatal(err)
	}
	reads := func(r25, beta, pull float64) float64 {
		r := r25 * math.Exp(beta*(1/(temp+Kelvin)-1/298.15))
		seen := 10000 * r / pull // what the nominal divider takes it for
		got, err := Beta(10000, 3977).Inverse(seen)
		if err != nil {
			t.Fatal(err)
		}
		return math.Abs(got - temp)
	}
	for _, l := range b.Lines {
		switch l.Name {
		case "sensor: resistance at 25 degC":
			near(t, l.Name, l.Kelvin, reads(10100, 3977, 10000), 0.01*l.Kelvin)
		case "sensor: beta":
			near(t, l.Name, l.Kelvin, reads(10000, 3977*1.0075, 10000), 0.02*l.Kelvin)
		case "divider resistor":
			near(t, l.Name, l.Kelvin, reads(10000, 3977, 10010), 0.01*l.Kelvin)
		}
	}
}

func BenchmarkBudget(b *testing.B) {
	c := chain(b, thermistor(12, true), 12)
	for b.Loop() {
		if _, err := c.Budget(60); err != nil {
			b.Fatal(err)
		}
	}
}
