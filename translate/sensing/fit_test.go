package sensing

import (
	"fmt"
	"math"
	"os"
	"os/exec"
	"path/filepath"
	"strings"
	"testing"

	"pgregory.net/rapid"

	"makebreak/survey"
)

// closedForm is a sensor whose temperature at a count can be written down.
type closedForm struct {
	name   string
	sensor *survey.Sensor
	exact  func(x float64) float64 // degC at 2^N·ratio = x of full, given as x/full
}

func closedForms() []closedForm {
	valid := func(s *survey.Sensor, low, high float64) *survey.Sensor {
		s.Valid = f([2]float64{low, high})
		return s
	}
	kelvin := func(r float64) float64 { return 1/(math.Log(r/10000)/3977+1/298.15) - Kelvin }
	pt := &survey.Sensor{ID: f("p"), Kind: f(survey.SensorKind("pt1000")), PullUp: f(2200.0)}
	const a, b = 3.9083e-3, -5.775e-7 // IEC 60751 above 0 degC: a quadratic
	return []closedForm{
		{"ntc above ground", valid(thermistor(12, true), -40, 125), func(ratio float64) float64 { return kelvin(10000 * ratio / (1 - ratio)) }},
		{"ntc below reference", valid(thermistor(12, false), -40, 125), func(ratio float64) float64 { return kelvin(10000 * (1 - ratio) / ratio) }},
		{"pt1000", valid(pt, 0.5, 250), func(ratio float64) float64 {
			r := 2.2 * ratio / (1 - ratio)
			return (-a + math.Sqrt(a*a-4*b*(1-r))) / (2 * b)
		}},
	}
}

// Every count of a 10, 12 and 16 bit converter through the table and the exact
// curve, which is written down here in closed form and not taken from Chain.
func TestTableEveryCount(t *testing.T) {
	for _, x := range closedForms() {
		for _, bits := range []int{10, 12, 16} {
			for _, bound := range []float64{0.05, 0.2} {
				c := chain(t, x.sensor, bits)
				fit, err := c.Fit(bound, 0.01)
				if err != nil {
					t.Fatalf("%s, %d bits: %v", x.name, bits, err)
				}
				worst := 0.0
				low, high := c.Believable()
				for n := low; n <= high; n++ {
					want := x.exact((float64(n) + 0.5) / math.Ldexp(1, bits))
					want = math.Min(math.Max(want, c.Curve.Low), c.Curve.High)
					worst = math.Max(worst, math.Abs(0.01*float64(fit.At(uint16(n)))-want))
				}
				if worst > bound+1e-6 {
					t.Errorf("%s, %d bits: %g K from the curve, %g allowed", x.name, bits, worst, bound)
				}
				near(t, x.name+": worst error", fit.Worst, worst, 1e-6)
				if fit.Pieces() < fit.AtLeast || fit.Fewest != (fit.Pieces() == fit.AtLeast) || fit.Bytes() != 4*(fit.Pieces()+1) {
					t.Errorf("%s: %+v", x.name, fit)
				}
				if fit.Equal.Found && fit.Equal.Pieces < fit.Pieces() {
					t.Errorf("%s: equal spacing does with %d pieces, the fewest are said to be %d", x.name, fit.Equal.Pieces, fit.Pieces())
				}
				t.Logf("%s, %d bits: %s", x.name, bits, fit.Working)
			}
		}
	}
}

// The other kinds, against the curve solved count by count.
func TestTableOfEveryKind(t *testing.T) {
	for name, s := range sensors() {
		if s.Kind.V == "digital" {
			continue
		}
		c := chain(t, s, 12)
		unit := 0.01
		if c.Curve.High > 300 {
			unit = 0.05 // so that the range fits 16 bits
		}
		fit, err := c.Fit(0.25, unit)
		if err != nil {
			t.Errorf("%s: %v", name, err)
			continue
		}
		low, high := c.Believable()
		for n := low; n <= high; n++ {
			a, b := c.Temperature(n)
			if a < c.Curve.Low+1e-6 || b > c.Curve.High-1e-6 {
				continue // the count reaches beyond the curve
			}
			// The middle of a count is about the mean of its edges.
			mean := (a + b) / 2
			if got := unit * float64(fit.At(uint16(n))); math.Abs(got-mean) > 0.25+(b-a)/4 {
				t.Fatalf("%s: count %d is %g in the table, %g to %g by the curve", name, n, got, a, b)
			}
		}
		t.Logf("%s: %s", name, fit.Working)
	}
}

// few finds the least number of pieces the slow way: every pair of knots, every
// count between them, by the arithmetic itself.
func few(low int64, want []float64, bound, unit float64) int {
	type state struct {
		x int
		y int16
	}
	var at [][]int16
	for _, w := range want {
		var ys []int16
		for y := int16(math.Ceil((w-bound)/unit - 1e-9)); float64(y)*unit <= w+bound+1e-9*unit; y++ {
			ys = append(ys, y)
		}
		at = append(at, ys)
	}
	fits := func(a, b state) bool {
		for x := a.x; x <= b.x; x++ {
			v := between(uint16(low+int64(a.x)), uint16(low+int64(b.x)), a.y, b.y, uint16(low+int64(x)))
			if math.Abs(float64(v)*unit-want[x]) > bound+1e-9*unit {
				return false
			}
		}
		return true
	}
	pieces := map[state]int{}
	for _, y := range at[0] {
		pieces[state{0, y}] = 0
	}
	best := math.MaxInt
	rising := want[len(want)-1] > want[0]
	for x := 1; x < len(want); x++ {
		for _, y := range at[x] {
			b := state{x, y}
			for a, n := range pieces {
				if a.x >= x || (y != a.y && (y > a.y) != rising) || !fits(a, b) {
					continue
				}
				if old, ok := pieces[b]; !ok || n+1 < old {
					pieces[b] = n + 1
				}
			}
			if n, ok := pieces[b]; ok && x == len(want)-1 {
				best = min(best, n)
			}
		}
	}
	return best
}

// The number of pieces is the fewest there is, and the bound from below never
// above it: curves of any shape that rise or fall, against trying everything.
func TestFewestAgainstTryingEverything(t *testing.T) {
	rapid.Check(t, func(rt *rapid.T) {
		n := rapid.IntRange(2, 22).Draw(rt, "counts")
		steps := rapid.SliceOfN(rapid.Float64Range(0.05, 6), n, n).Draw(rt, "steps")
		sign := rapid.SampledFrom([]float64{1, -1}).Draw(rt, "sign")
		bound := rapid.Float64Range(0.5, 2.5).Draw(rt, "bound")
		v := rapid.Float64Range(-40, 10).Draw(rt, "first")
		want := make([]float64, n)
		for i, s := range steps {
			v += s
			want[i] = sign * v
		}
		fit, err := FitTable(100, want, bound, 1)
		if err != nil {
			rt.Fatal(err)
		}
		slow := few(100, want, bound, 1)
		if fit.Pieces() != slow || !fit.Fewest || fit.AtLeast != slow {
			rt.Fatalf("%d pieces, at least %d, fewest: %v; trying everything gives %d", fit.Pieces(), fit.AtLeast, fit.Fewest, slow)
		}
		g := must(newGates(want, bound, 1))
		if lines, back := len(g.stops())-1, len(g.before())-1; lines > slow || lines != back {
			rt.Fatalf("%d lines from the left, %d from the right, %d pieces", lines, back, slow)
		}
	})
}

func must[T any](v T, err error) T {
	if err != nil {
		panic(err)
	}
	return v
}

// A straight line needs one piece, whichever way it goes.
func TestStraightLineIsOnePiece(t *testing.T) {
	for _, slope := range []float64{0.37, -0.37} {
		want := make([]float64, 4000)
		for i := range want {
			want[i] = 20 + slope*float64(i)
		}
		fit, err := FitTable(17, want, 0.05, 0.05)
		if err != nil || fit.Pieces() != 1 || !fit.Fewest {
			t.Errorf("slope %g: %d pieces, %v (%v)", slope, fit.Pieces(), fit.Fewest, err)
		}
	}
}

func TestFitRefuses(t *testing.T) {
	rising := []float64{1, 2, 3}
	for name, x := range map[string]struct {
		low         int64
		want        []float64
		bound, unit float64
	}{
		"one value":           {0, []float64{1}, 1, 1},
		"beyond 16 bits":      {65534, rising, 1, 1},
		"below nothing":       {-1, rising, 1, 1},
		"turns back":          {0, []float64{1, 3, 2}, 1, 1},
		"level":               {0, []float64{1, 1, 2}, 1, 1},
		"not a number":        {0, []float64{1, math.NaN(), 3}, 1, 1},
		"no bound":            {0, rising, 0, 1},
		"no unit":             {0, rising, 1, 0},
		"no whole step":       {0, []float64{1.5, 2.5}, 0.1, 1},
		"values too large":    {0, []float64{0, 40000}, 1, 1},
		"infinite":            {0, rising, math.Inf(1), 1},
		"steeper than 32 bit": {0, steep(), 0.5, 1},
	} {
		if fit, err := FitTable(x.low, x.want, x.bound, x.unit); err == nil && x.want[0] != -32000 {
			t.Errorf("%s: %s", name, fit.Working)
		} else if err == nil && fit.Fits32() != nil {
			t.Errorf("%s: does not fit 32 bits", name)
		}
	}
}

// steep is a line whose single piece would overflow 32 bits.
func steep() []float64 {
	want := make([]float64, 65536)
	for i := range want {
		want[i] = -32000 + 0.976*float64(i)
	}
	return want
}

func TestFits32(t *testing.T) {
	for _, bad := range []Table{
		{}, {X: []uint16{1}, Y: []int16{1}}, {X: []uint16{1, 2}, Y: []int16{1}}, {X: []uint16{2, 2}, Y: []int16{1, 2}}, {X: []uint16{3, 2}, Y: []int16{1, 2}},
		{X: []uint16{0, 65535}, Y: []int16{-32768, 32767}},
	} {
		if bad.Fits32() == nil {
			t.Errorf("%+v is taken for a table", bad)
		}
	}
	// 65535 · 32767 = 2 147 385 345, just within 2^31 − 1.
	if err := (Table{X: []uint16{0, 65535}, Y: []int16{0, 32767}}).Fits32(); err != nil {
		t.Error(err)
	}
}

// Equal spacing by hand: 0, 1, 4, 9, 16 in whole units. One piece is 4 off at
// count 2, two pieces (0, 4, 16) are 1 off, and four are exact.
func TestEqualSpacingByHand(t *testing.T) {
	want := []float64{0, 1, 4, 9, 16}
	for bound, x := range map[float64]EqualSpacing{4: {1, 4, 4, true}, 1: {2, 6, 1, true}, 0.9: {4, 10, 0, true}} {
		if got := equalSpacing(want, bound, 1); got != x {
			t.Errorf("within %g: %+v, want %+v", bound, got, x)
		}
	}
	if got := equalSpacing([]float64{0, 0.5, 1}, 0.4, 1); got.Found {
		t.Errorf("%+v", got)
	}
}

// Cutting off towards zero, worked by hand: falling from 10 to 0 over 4 counts
// is 10, 10−2, 10−5, 10−7, 0; rising from −10 to 0 is its mirror.
func TestTableByHand(t *testing.T) {
	down := Table{X: []uint16{4, 8}, Y: []int16{10, 0}}
	up := Table{X: []uint16{4, 8}, Y: []int16{-10, 0}}
	for i, want := range []int16{10, 10, 8, 5, 3, 0, 0} {
		n := uint16(3 + i)
		if got := down.At(n); got != want {
			t.Errorf("falling, count %d: %d, want %d", n, got, want)
		}
		if got := up.At(n); got != -want {
			t.Errorf("rising, count %d: %d, want %d", n, got, -want)
		}
	}
	if down.Pieces() != 1 || down.Bytes() != 8 {
		t.Errorf("%d pieces, %d bytes", down.Pieces(), down.Bytes())
	}
}

// The same arithmetic in C99, all counts of 16 bits, bit for bit.
func TestTableInC(t *testing.T) {
	gcc, err := exec.LookPath("gcc")
	if err != nil {
		if os.Getenv("CI") != "" {
			t.Fatal("no C compiler")
		}
		t.Skip("no C compiler: the arithmetic in C is not compared")
	}
	for _, up := range []bool{true, false} {
		s := thermistor(16, up)
		s.Valid = f([2]float64{-40, 125})
		fit, err := chain(t, s, 16).Fit(0.05, 0.01)
		if err != nil {
			t.Fatal(err)
		}
		dir := t.TempDir()
		src, bin := filepath.Join(dir, "table.c"), filepath.Join(dir, "table")
		if err := os.WriteFile(src, []byte(inC(fit.Table)), 0o600); err != nil {
			t.Fatal(err)
		}
		if out, err := exec.Command(gcc, "-std=c99", "-Wall", "-Wextra", "-Werror", "-ftrapv", "-o", bin, src).CombinedOutput(); err != nil {
			t.Fatalf("%v\n%s", err, out)
		}
		out, err := exec.Command(bin).Output()
		if err != nil {
			t.Fatal(err)
		}
		lines := strings.Fields(string(out))
		if len(lines) != 65536 {
			t.Fatalf("%d values", len(lines))
		}
		for n, l := range lines {
			if want := fmt.Sprint(fit.At(uint16(n))); l != want {
				t.Fatalf("count %d: C says %s, At %s", n, l, want)
			}
		}
	}
}

func inC(t Table) string {
	list := func(v any) string { return strings.Trim(strings.ReplaceAll(fmt.Sprint(v), " ", ", "), "[]") }
	return fmt.Sprintf(`#include <stdint.h>
#include <stdio.h>
static const uint16_t xs[] = {%s};
static const int16_t ys[] = {%s};
enum { KNOTS = %d };
static int16_t at(uint16_t x)
{
    int i = 1;
    if (x <= xs[0]) { return ys[0]; }
    if (x >= xs[KNOTS - 1]) { return ys[KNOTS - 1]; }
    while (xs[i] <= x) { i++; }
    return (int16_t)((int32_t)ys[i - 1] + ((int32_t)ys[i] - (int32_t)ys[i - 1]) * ((int32_t)x - (int32_t)xs[i - 1]) / ((int32_t)xs[i] - (int32_t)xs[i - 1]));
}
int main(void)
{
    int32_t x;
    for (x = 0; x <= 65535; x++) { printf("%%d\n", at((uint16_t)x)); }
    return 0;
}
`, list(t.X), list(t.Y), len(t.X))
}
