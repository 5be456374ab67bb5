package sensing

import (
	"errors"
	"math"
	"strings"
	"testing"

	"pgregory.net/rapid"
)

func near(t *testing.T, what string, got, want, within float64) {
	t.Helper()
	if !(math.Abs(got-want) <= within) {
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

func back(t *testing.T, c Curve, q float64) float64 {
	t.Helper()
	temp, err := c.Inverse(q)
	if err != nil {
		t.Fatal(err)
	}
	return temp
}

// IEC 60751, table of Pt100 resistances.
func TestPlatinumTable(t *testing.T) {
	for _, p := range published(t).Platinum.Ohm {
		near(t, "Pt100", at(t, Platinum(100), p[0]), p[1], 0.005001)
		near(t, "Pt1000", at(t, Platinum(1000), p[0]), 10*p[1], 0.05001)
	}
}

// Slope of IEC 60751.
func TestPlatinumSlope(t *testing.T) {
	for _, p := range published(t).Slope.OhmPerKelvin {
		near(t, "slope", Platinum(100).slope(p[0]), p[1], 0.000006)
	}
}

// IEC 60584-1 / ITS-90 reference tables.
func TestThermocoupleTables(t *testing.T) {
	for letter, table := range published(t).Thermocouples.MV {
		c, ok := Thermocouple(letter[0] + 'a' - 'A')
		if !ok {
			t.Fatalf("no type %s", letter)
		}
		for _, p := range table {
			if p[0] < c.Low {
				continue
			}
			near(t, c.Name, 1000*at(t, c, p[0]), p[1], 0.0005001)
		}
	}
}

// The inverse of the reference functions, found by solving them, against the
// inverse polynomials that NIST published: within the errors that NIST states
// for those.
func TestThermocoupleInverse(t *testing.T) {
	const steps, rounding = 2000, 0.005 // NIST states hundredths
	for letter, pieces := range published(t).InversePolynomials.Pieces {
		c, _ := Thermocouple(letter[0] + 'a' - 'A')
		for _, p := range pieces {
			checked := 0
			for i := range steps + 1 {
				mv := p.MV[0] + (p.MV[1]-p.MV[0])*float64(i)/steps
				exact, err := c.Inverse(mv / 1000)
				if err != nil {
					continue // the ends of the range, rounded to 1 µV
				}
				poly := 0.0
				for n := len(p.Coeffs) - 1; n >= 0; n-- {
					poly = poly*mv + p.Coeffs[n]
				}
				if d := poly - exact; d < p.Error[0]-rounding || d > p.Error[1]+rounding {
					t.Fatalf("type %s at %.4f mV: NIST's polynomial gives %.4f, solved %.4f degC; NIST states %g to %g", letter, mv, poly, exact, p.Error[0], p.Error[1])
				}
				checked++
			}
			if checked < steps*9/10 {
				t.Errorf("type %s: only %d of %d points of %v mV were checked", letter, checked, steps, p.MV)
			}
		}
	}
}

func TestThermistorTables(t *testing.T) {
	r := published(t)
	for _, p := range r.ThermistorBeta.Ohm { // cut off to whole ohms
		if got := math.Floor(at(t, Beta(r.ThermistorBeta.R25, r.ThermistorBeta.Beta), p[0]) + 1e-6); got != p[1] {
			t.Errorf("beta, %g degC: %g ohm, want %g", p[0], got, p[1])
		}
	}
	k := r.SteinhartHart.ABC
	for _, p := range r.SteinhartHart.Ohm {
		near(t, "Steinhart-Hart", at(t, SteinhartHart(k[0], k[1], k[2]), p[0]), p[1], 1e-6*p[1])
	}
	k = r.General.ABC
	for _, p := range r.General.Ohm { // temperatures are given to 0.001 K, 5 % of the resistance a kelvin
		near(t, "general 10 kohm curve", at(t, SteinhartHart(k[0], k[1], k[2]), p[0]), p[1], 0.0005*0.052*p[1])
	}
}

// Between the points of a table, ln R over 1/T is exact for a beta thermistor,
// and the points themselves come back.
func TestPointsOfABetaThermistor(t *testing.T) {
	r := published(t).ThermistorBeta
	exact := Beta(r.R25, r.Beta)
	c, err := Points("table", "ohm", [][2]float64{{-25, at(t, exact, -25)}, {25, r.R25}, {125, at(t, exact, 125)}}, true)
	if err != nil {
		t.Fatal(err)
	}
	for temp := -25.0; temp <= 125; temp += 2.5 {
		near(t, "table", at(t, c, temp)/at(t, exact, temp), 1, 1e-12)
	}
	c, err = Points("published table", "ohm", r.Ohm, true)
	if err != nil {
		t.Fatal(err)
	}
	for _, p := range r.Ohm {
		near(t, "at its point", at(t, c, p[0]), p[1], 1e-6)
	}
}

func TestPointsRefuse(t *testing.T) {
	for name, x := range map[string]struct {
		pts        [][2]float64
		thermistor bool
	}{
		"no point":          {nil, false},
		"one point":         {[][2]float64{{0, 1}}, false},
		"the same twice":    {[][2]float64{{0, 1}, {0, 2}}, false},
		"turns back":        {[][2]float64{{0, 1}, {10, 2}, {20, 1.5}}, false},
		"level":             {[][2]float64{{0, 1}, {10, 1}}, false},
		"rising thermistor": {[][2]float64{{0, 100}, {10, 110}}, true},
		"no resistance":     {[][2]float64{{0, 100}, {10, 0}}, true},
		"not a number":      {[][2]float64{{0, 1}, {math.NaN(), 2}}, false},
	} {
		if _, err := Points(name, "V", x.pts, x.thermistor); err == nil {
			t.Errorf("%s is taken for a curve", name)
		}
	}
}

// Every curve goes one way, comes back to the temperature it was given, and
// says nothing outside its range.
func TestCurvesGoOneWay(t *testing.T) {
	linear, err := Points("4 to 20 mA in 100 ohm", "V", [][2]float64{{0, 0.4}, {100, 2}}, false)
	if err != nil {
		t.Fatal(err)
	}
	k, _ := Thermocouple('k')
	j, _ := Thermocouple('j')
	cu, _ := Thermocouple('t')
	curves := []Curve{Beta(10000, 3977), SteinhartHart(1.129241e-3, 2.341077e-4, 8.775468e-8), Platinum(100), Platinum(1000), k, j, cu, linear,
		Straight("10 mV/K", "V", 0, 0.01, -50, 150), Straight("diode", "V", 0.65, -0.002, -55, 150)}
	rapid.Check(t, func(rt *rapid.T) {
		c := rapid.SampledFrom(curves).Draw(rt, "curve")
		a := rapid.Float64Range(c.Low, c.High).Draw(rt, "a")
		b := rapid.Float64Range(c.Low, c.High).Draw(rt, "b")
		qa, errA := c.At(a)
		qb, errB := c.At(b)
		if errA != nil || errB != nil {
			rt.Fatal(errA, errB)
		}
		if math.Abs(a-b) > 1e-6 && (qa < qb) != ((a < b) == c.Rising) {
			rt.Fatalf("%s: %g at %g, %g at %g", c.Name, qa, a, qb, b)
		}
		again, err := c.Inverse(qa)
		if err != nil || math.Abs(again-a) > 1e-6 {
			rt.Fatalf("%s: %g comes back as %g (%v)", c.Name, a, again, err)
		}
	})
	for _, c := range curves {
		for _, temp := range []float64{c.Low - 0.01, c.High + 0.01, math.NaN(), math.Inf(1)} {
			if _, err := c.At(temp); !errors.As(err, new(RangeError)) {
				t.Errorf("%s at %g: %v, want a range error", c.Name, temp, err)
			}
		}
		for _, q := range []float64{math.NaN(), math.Inf(1), math.Inf(-1)} {
			_, err := c.Inverse(q)
			if !errors.As(err, new(RangeError)) {
				t.Errorf("%s at quantity %g: %v, want a range error", c.Name, q, err)
			} else if !strings.Contains(err.Error(), c.Name) {
				t.Errorf("%q does not name the curve", err)
			}
		}
	}
	if got := back(t, linear, 1.2); math.Abs(got-50) > 1e-6 {
		t.Errorf("12 mA in 100 ohm is %g degC, want 50", got)
	}
}
