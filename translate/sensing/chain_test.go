package sensing

import (
	"errors"
	"math"
	"testing"

	"pgregory.net/rapid"

	"makebreak/survey"
)

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

func couple() *survey.Sensor {
	return &survey.Sensor{ID: f("couple"), Kind: f(survey.SensorKind("type_k")), Class: f("1"), Gain: f(60.0), Offset: f(0.2), ColdJunctionError: f(1.0)}
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

// Front ends worked out by hand, an ideal 10-bit converter on 5 V.
func TestFrontEnds(t *testing.T) {
	excited := thermistor(10, true)
	excited.Excitation = f(3.3)
	below := thermistor(10, false)
	pt := &survey.Sensor{ID: f("p"), Kind: f(survey.SensorKind("pt100")), Current: f(0.001), Gain: f(20.0)}
	amplified := &survey.Sensor{ID: f("p"), Kind: f(survey.SensorKind("pt100")), PullUp: f(1000.0), Gain: f(4.0)}
	linear := &survey.Sensor{ID: f("l"), Kind: f(survey.SensorKind("linear")), At: f([][2]float64{{0, 0.4}, {100, 2.0}})}
	diode := &survey.Sensor{ID: f("d"), Kind: f(survey.SensorKind("diode")), At25: f(0.6), Slope: f(-0.002)}
	flame := &survey.Sensor{ID: f("m"), Kind: f(survey.SensorKind("millivolt")), FullScale: f(0.030)}
	for name, x := range map[string]struct {
		s     *survey.Sensor
		at    float64
		count int64
	}{
		"10 kohm of 20 kohm":                 {thermistor(10, true), 25, 512},
		"on 3.3 V":                           {excited, 25, 337}, // 1024 · 0.66 / 2 = 337.9
		"resistor to ground":                 {below, 25, 512},
		"1 mA in 138.5055 ohm, times 20":     {pt, 100, 567},                // 2.77011 V
		"100 of 1100 ohm, times 4":           {amplified, 0, 372},           // 0.363636
		"60 · 4.0962 mV + 0.2 V":             {couple(), 100, 91},           // 0.445772 V
		"1.2 V of a transmitter at half way": {linear, 50, 245},             // 245.76
		"0.55 V of a diode at 50 degC":       {diode, 50, 112},              // 112.64
		"8 mV of 30 mV":                      {flame, 0.008, 1024 * 8 / 30}, // 273.07
	} {
		n, err := chain(t, x.s, 10).Count(x.at)
		if err != nil || n != x.count {
			t.Errorf("%s: count %d (%v), want %d", name, n, err, x.count)
		}
	}
}

// A digital sensor of 16 counts a kelvin: the nearest whole count, signed.
func TestDigital(t *testing.T) {
	c := chain(t, &survey.Sensor{ID: f("d"), Kind: f(survey.SensorKind("digital")), CountsPerKelvin: f(16.0), Error: f(0.5)}, 10)
	if !c.Signed() || !c.Rising() {
		t.Error("signed and rising")
	}
	for temp, want := range map[float64]int64{0: 0, 25: 400, -10: -160, 25.03: 400, 25.04: 401, -0.04: -1} {
		if n, err := c.Count(temp); err != nil || n != want {
			t.Errorf("%g degC: %d (%v), want %d", temp, n, err, want)
		}
	}
	low, high := c.Temperature(400)
	near(t, "lower end of count 400", low, 25-1.0/32, 1e-6)
	near(t, "upper end of count 400", high, 25+1.0/32, 1e-6)
	if _, err := c.Fit(0.05, 0.01); err == nil {
		t.Error("a linear sensor needs no table")
	}
	b, err := c.Budget(25)
	if err != nil {
		t.Fatal(err)
	}
	near(t, "worst case", b.WorstCase, 0.5+1.0/32, 1e-9)
}

// Nothing in a sheet makes a chain panic or divide by nothing.
func TestNewRefuses(t *testing.T) {
	zero, empty := f(0.0), f([][2]float64{})
	far := thermistor(10, true)
	far.Valid = f([2]float64{400, 500})
	flat := thermistor(10, true)
	flat.PullUp = f(1e-6)
	for name, s := range map[string]*survey.Sensor{
		"no kind":           {},
		"no curve":          {Kind: f(survey.SensorKind("ntc")), PullUp: f(1e4)},
		"no front end":      {Kind: f(survey.SensorKind("pt100"))},
		"no resistance":     {Kind: f(survey.SensorKind("ntc")), R25: zero, Beta: f(3977.0), PullUp: f(1e4)},
		"empty table":       {Kind: f(survey.SensorKind("ntc")), Table: empty, PullUp: f(1e4)},
		"empty points":      {Kind: f(survey.SensorKind("linear")), At: empty},
		"no counts":         {Kind: f(survey.SensorKind("digital")), CountsPerKelvin: zero},
		"no full scale":     {Kind: f(survey.SensorKind("millivolt"))},
		"no slope":          {Kind: f(survey.SensorKind("diode")), At25: f(0.6), Slope: zero},
		"negative C":        {Kind: f(survey.SensorKind("ntc")), SteinhartHart: f([3]float64{1e-3, 2e-4, -1e-7}), PullUp: f(1e4)},
		"infinite gain":     {Kind: f(survey.SensorKind("type_k")), Gain: f(math.Inf(1))},
		"beyond its curve":  far,
		"nothing resolved":  flat,
		"above the supply":  {Kind: f(survey.SensorKind("linear")), At: f([][2]float64{{0, 6}, {100, 10}})},
		"kind of nonsense":  {Kind: f(survey.SensorKind("smell"))},
		"junction measured": {Kind: f(survey.SensorKind("type_k")), Gain: f(60.0), ColdJunction: f("other")},
	} {
		if _, err := New(s, converter(10), survey.Enclosure{}); err == nil || err.Error() == "" {
			t.Errorf("%s: taken for a chain", name)
		}
	}
	for _, bits := range []int{0, 7, 17, 64} {
		if _, err := New(thermistor(10, true), converter(bits), survey.Enclosure{}); err == nil {
			t.Errorf("%d bits are taken for a converter", bits)
		}
	}
	if _, err := New(thermistor(10, true), survey.ADC{Bits: f(10)}, survey.Enclosure{}); err == nil {
		t.Error("no reference")
	}
}

// A cold junction that another sensor measures: no count stands for a
// temperature, and the raw count with its shift is one of the compensated couple.
func TestMeasuredColdJunction(t *testing.T) {
	s := couple()
	s.ColdJunction = f("board")
	if _, err := New(s, converter(16), survey.Enclosure{}); !errors.As(err, new(ErrNotFixed)) {
		t.Fatalf("%v, want ErrNotFixed", err)
	}
	j, err := NewJunction(s, converter(16), survey.Enclosure{})
	if err != nil {
		t.Fatal(err)
	}
	for _, cold := range []float64{0, 25, 45} {
		for temp := 50.0; temp < 1000; temp += 7 {
			n, err := j.Count(temp, cold)
			if err != nil {
				t.Fatal(err)
			}
			low, high, err := j.Temperature(n, cold)
			if err != nil || temp < low-1e-6 || temp > high+1e-6 {
				t.Fatalf("%g degC with the junction at %g reads %d, which is %g to %g (%v)", temp, cold, n, low, high, err)
			}
			shift, _ := j.Shift(cold)
			full, _ := j.Compensated.Count(temp)
			if d := float64(n) + shift - float64(full); d < -1 || d > 1 {
				t.Fatalf("count %d and shift %g are not count %d", n, shift, full)
			}
		}
	}
	// IEC 60584-1: E(100) = 4.096, E(25) = 1.000, E(0) = 0 mV. A threshold for
	// 100 degC set with the junction at 0 acts at E⁻¹(5.096 mV) = 124.3 degC with it at 25.
	moved, err := j.Moves(100, 0, 25)
	if err != nil {
		t.Fatal(err)
	}
	near(t, "moved", moved, 24.3, 0.1)
	if _, err := NewJunction(thermistor(12, true), converter(12), survey.Enclosure{}); err == nil {
		t.Error("a thermistor has no cold junction")
	}
}

// Whatever stands in a sheet, a chain is refused or answers: no panic, no
// count outside the converter.
func TestNothingPanics(t *testing.T) {
	kinds := []survey.SensorKind{"ntc", "pt100", "pt1000", "type_k", "type_j", "type_t", "linear", "diode", "digital", "millivolt", "current", ""}
	odd := []float64{0, 1, -1, 1e-9, 1e9, 25, 10000, 3977, 0.001, -0.002, 60, math.NaN(), math.Inf(1), math.MaxFloat64}
	rapid.Check(t, func(rt *rapid.T) {
		field := func(name string) survey.Field[float64] {
			return survey.Field[float64]{V: rapid.SampledFrom(odd).Draw(rt, name), Set: rapid.Bool().Draw(rt, name+" set")}
		}
		pair := func(name string) [2]float64 {
			return [2]float64{rapid.SampledFrom(odd).Draw(rt, name), rapid.SampledFrom(odd).Draw(rt, name)}
		}
		s := &survey.Sensor{Kind: f(rapid.SampledFrom(kinds).Draw(rt, "kind")), R25: field("r25"), Beta: field("beta"), PullUp: field("up"), PullDown: field("down"),
			Excitation: field("excitation"), Current: field("current"), Gain: field("gain"), Offset: field("offset"), At25: field("at_25"), Slope: field("slope"),
			CountsPerKelvin: field("counts"), FullScale: field("full scale"), SelfHeating: field("self-heating"), Lead: field("lead"), Error: field("error")}
		if rapid.Bool().Draw(rt, "points") {
			s.At = f([][2]float64{pair("first"), pair("second")})
			s.Table = s.At
			s.Valid = f(pair("valid"))
		}
		adc := survey.ADC{Bits: f(rapid.IntRange(0, 20).Draw(rt, "bits")), Reference: field("reference"), Offset: field("adc offset"), INL: field("inl"), Gain: field("adc gain")}
		c, err := New(s, adc, survey.Enclosure{})
		if err != nil {
			return
		}
		low, high := c.Believable()
		if low >= high {
			rt.Fatalf("believes %d to %d", low, high)
		}
		for _, temp := range odd {
			n, err := c.Count(temp)
			if err == nil && !c.Signed() && (n < 0 || n >= int64(c.full())) {
				rt.Fatalf("count %d", n)
			}
			_, _ = c.Budget(temp)
			_, _ = c.Divider(temp)
			_, _ = c.Bits(temp, 1)
			_, _ = c.Threshold(temp, AtOrAbove, Nearest)
		}
		_ = c.Failures()
	})
}
