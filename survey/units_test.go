package survey

import (
	"fmt"
	"math"
	"math/big"
	"strings"
	"testing"

	"pgregory.net/rapid"
)

// Factors of the units, as exact fractions of the stored unit: decimal prefixes
// and the degree Celsius from the SI Brochure (9th edition, tables 4, 7 and 8),
// 9 degF = 5 K and 32 degF = 0 degC (NIST SP 811, B.8), minute, hour and day
// (SI Brochure, table 8); month and year of the Julian calendar.
var unitFactors = map[string]map[string][2]int64{
	"interval":           {"K": {1, 1}, "degC": {1, 1}, "°C": {1, 1}, "degF": {5, 9}, "°F": {5, 9}},
	"time":               {"ms": {1, 1000}, "s": {1, 1}, "min": {60, 1}, "h": {3600, 1}, "d": {86400, 1}, "days": {86400, 1}, "weeks": {604800, 1}, "months": {2629800, 1}, "years": {31557600, 1}},
	"voltage":            {"kV": {1000, 1}, "V": {1, 1}, "mV": {1, 1000}, "uV": {1, 1000000}, "\u00b5V": {1, 1000000}, "\u03bcV": {1, 1000000}},
	"current":            {"A": {1, 1}, "mA": {1, 1000}, "uA": {1, 1000000}, "\u00b5A": {1, 1000000}, "\u03bcA": {1, 1000000}},
	"power":              {"kW": {1000, 1}, "W": {1, 1}, "mW": {1, 1000}},
	"resistance":         {"Mohm": {1000000, 1}, "M\u03a9": {1000000, 1}, "kohm": {1000, 1}, "k\u03a9": {1000, 1}, "k\u2126": {1000, 1}, "ohm": {1, 1}, "\u03a9": {1, 1}, "mohm": {1, 1000}},
	"share":              {"%": {1, 100}},
	"rate":               {"/s": {1, 1}, "/min": {1, 60}, "/h": {1, 3600}},
	"length":             {"m": {1, 1}, "cm": {1, 100}, "mm": {1, 1000}},
	"voltage_per_kelvin": {"V/K": {1, 1}, "mV/K": {1, 1000}, "uV/K": {1, 1000000}},
	"dissipation":        {"W/K": {1, 1}, "mW/K": {1, 1000}},
	"thermal_resistance": {"K/W": {1, 1}},
}

// The value of a quantity is the exact product of its decimal number and its
// unit, to within the last place of a float64.
func TestQuantityIsExact(t *testing.T) {
	rapid.Check(t, func(rt *rapid.T) {
		dim := rapid.SampledFrom(sortedKeys(unitFactors)).Draw(rt, "dimension")
		unit := rapid.SampledFrom(sortedKeys(unitFactors[dim])).Draw(rt, "unit")
		digits := rapid.Int64Range(0, 99_999).Draw(rt, "digits")
		places := rapid.Int64Range(0, 4).Draw(rt, "places")
		number := new(big.Rat).SetFrac(big.NewInt(digits), new(big.Int).Exp(big.NewInt(10), big.NewInt(places), nil))
		if dim == "share" && number.Cmp(big.NewRat(100, 1)) > 0 {
			return
		}
		text := number.FloatString(int(places)) + rapid.SampledFrom([]string{"", " ", "  "}).Draw(rt, "space") + unit
		got, m := quantity(text, dim)
		if m != nil {
			rt.Fatalf("%s: %v", text, m)
		}
		f := unitFactors[dim][unit]
		exact, _ := number.Mul(number, big.NewRat(f[0], f[1])).Float64()
		if math.Abs(got-exact) > 4e-16*exact {
			rt.Fatalf("%s is %v, want %v", text, got, exact)
		}
	})
}

// Degrees Fahrenheit as points, from the definition of the scale: 32 degF at
// 0 degC, 9 degF for 5 K; -40 is the same on both. Absolute zero is
// -273.15 degC = -459.67 degF (ITS-90; NIST SP 811).
func TestPointsOnTheScale(t *testing.T) {
	for text, want := range map[string]float64{
		"140 °F": 60, "140 degF": 60, "60 degC": 60, "60°C": 60, "-40 degF": -40, "-40 °C": -40, "32 °F": 0, "212 °F": 100,
		"273.15 K": 0, "0 K": -273.15, "-459.67 degF": -273.15, "-273.15 degC": -273.15, "333.15 K": 60, "350 degF": 1590.0 / 9,
	} {
		if got, m := quantity(text, "temperature"); m != nil || math.Abs(got-want) > 1e-12*math.Abs(want) {
			t.Errorf("%s: %v %v, want %v", text, got, m, want)
		}
	}
	for c := -200; c <= 1000; c += 5 { // nine fifths of a multiple of five is whole: no rounding anywhere
		f := c*9/5 + 32
		if got, m := quantity(fmt.Sprintf("%d degF", f), "temperature"); m != nil || got != float64(c) {
			t.Fatalf("%d degF: %v %v, want exactly %d", f, got, m, c)
		}
	}
	for _, text := range []string{"-273.16 degC", "-1 K", "-460 degF", "4000 degC"} {
		if v, m := quantity(text, "temperature"); m == nil {
			t.Errorf("%s was taken: %v", text, v)
		}
	}
}

// An interval is a difference: 10 degF is 5.556 K, never -12.2 degC.
func TestIntervalIsNoPoint(t *testing.T) {
	if v, m := quantity("10 degF", "interval"); m != nil || math.Abs(v-5.556) > 0.0005 {
		t.Errorf("10 degF: %v %v", v, m)
	}
	if v, m := quantity("18 degF", "interval"); m != nil || v != 10 {
		t.Errorf("18 degF: %v %v", v, m)
	}
}

func TestCompoundTimes(t *testing.T) {
	for text, want := range map[string]float64{
		"9 min 30 s": 570, "1 h 1 min 1 s": 3661, "1 d 2 h": 93600, "16 min 8 s": 968, "1min 30s": 90, "1.5 h": 5400, "0 s": 0, "12 months": 31557600,
	} {
		if got, m := quantity(text, "time"); m != nil || got != want {
			t.Errorf("%s: %v %v, want %v", text, got, m, want)
		}
	}
}

func TestVoltOrAmpere(t *testing.T) {
	for text, want := range map[string]float64{"30 mV": 0.03, "10 A": 10} {
		if got, m := quantity(text, "volt_or_ampere"); m != nil || got != want {
			t.Errorf("%s: %v %v, want %v", text, got, m, want)
		}
	}
	if v, m := quantity("3 W", "volt_or_ampere"); m == nil {
		t.Errorf("3 W was taken: %v", v)
	}
}

// What does not fit is refused, and the message names the slip.
func TestMisfits(t *testing.T) {
	for _, c := range []struct{ text, dim, says string }{
		{"60", "temperature", "without a unit"}, {"60 C", "temperature", "did you mean degC"}, {"140F", "temperature", "did you mean degF"},
		{"60,5 degC", "temperature", "a decimal point"}, {"60 kelvin", "temperature", "did you mean K"}, {"60 ºC", "temperature", "did you mean degC"},
		{"60 deg C", "temperature", "did you mean degC"}, {"60 degrees C", "temperature", "did you mean degC"}, {"60\u00a0degC", "temperature", "did you mean degC"},
		{"\u22125 degC", "temperature", "a plain minus"}, {"60 degC 5", "temperature", "60 degC 5"}, {"", "temperature", "with its unit"}, {"degC", "temperature", "with its unit"},
		{"1e999 degC", "temperature", "with its unit"}, {"NaN degC", "temperature", "with its unit"}, {"Inf degC", "temperature", "with its unit"}, {"0x10 degC", "temperature", "unit"},
		{"60..5 degC", "temperature", "with its unit"}, {"6 0 degC", "temperature", "one of the units"},
		{"90 secs", "time", "did you mean s"}, {"2 hours", "time", "did you mean h"}, {"1 min 1 min", "time", "each one once"}, {"30 s 1 h", "time", "larger unit first"}, {"-1 s", "time", "not less"}, {"1:30", "time", "unit"},
		{"10 k", "resistance", "did you mean kohm"}, {"10 KOhm", "resistance", "did you mean kohm"}, {"10 MOHM", "resistance", "one of the units"}, {"1e20 ohm", "resistance", "occurs in a plant"},
		{"5 percent", "share", "did you mean %"}, {"101 %", "share", "100 %"}, {"0.05", "share", "without a unit"}, {"90 rpm", "rate", "did you mean /min"}, {"2 volts", "voltage", "did you mean V"},
		{"5 ma", "current", "did you mean mA"}, {"5 V 3 V", "voltage", "one quantity"},
	} {
		v, m := quantity(c.text, c.dim)
		if m == nil {
			t.Errorf("%q was taken as a %s: %v", c.text, c.dim, v)
		} else if !strings.Contains(m.found+"; "+m.fits, c.says) {
			t.Errorf("%q as a %s: found %s; fits %s", c.text, c.dim, m.found, m.fits)
		}
	}
}

// A plain number is what all YAML readers agree about.
func TestPlainNumbers(t *testing.T) {
	for text, want := range map[string]float64{"100000": 1e5, "1e7": 1e7, "-2.5": -2.5, "0": 0, ".5": 0.5, "5.": 5, "8.775e-8": 8.775e-8} {
		if got, m := plain(text); m != nil || got != want {
			t.Errorf("%s: %v %v", text, got, m)
		}
	}
	for _, text := range []string{"0755", "0x10", "1_000", "0b1", "0o17", ".nan", ".inf", "1e999", "1,5", "", "1 000", "12:30", "0x1p4", "Infinity", "1e16"} {
		if got, m := plain(text); m == nil {
			t.Errorf("%q was taken: %v", text, got)
		}
	}
}

// Whatever stands there, a value or a misfit comes back, and a value is finite.
func TestQuantityNeverFails(t *testing.T) {
	rapid.Check(t, func(rt *rapid.T) {
		dim := rapid.SampledFrom(append(sortedKeys(dimensions), "volt_or_ampere")).Draw(rt, "dimension")
		text := rapid.OneOf(rapid.String(), rapid.StringMatching(`[-+]?[0-9.,eE]{0,12} ?[a-zA-Z°%/Ωµ ]{0,8}`)).Draw(rt, "text")
		v, m := quantity(text, dim)
		if m == nil && (math.IsNaN(v) || math.IsInf(v, 0) || math.Abs(v) > largest) {
			rt.Fatalf("%q as %s: %v", text, dim, v)
		}
		if m != nil && (m.found == "" || m.fits == "") {
			rt.Fatalf("%q as %s: %v", text, dim, m)
		}
	})
}
