package thermal

import (
	"math"
	"testing"

	"pgregory.net/rapid"
)

// Whatever the readings, the filter stays where its plan says.
func TestFilterStaysWithinItsBounds(t *testing.T) {
	rapid.Check(t, func(rt *rapid.T) {
		low := rapid.Int64Range(-2000, 0).Draw(rt, "low")
		high := low + rapid.Int64Range(1, 65535).Draw(rt, "range")
		lag, step := rapid.Float64Range(0, 600).Draw(rt, "lag"), rapid.Float64Range(0.05, 2).Draw(rt, "step")
		p, err := PlanFilter(lag, step, low, high, 1.0/8)
		if err != nil {
			rt.Skip(err)
		}
		y := low * p.Scale
		for _, x := range rapid.SliceOfN(rapid.Int64Range(low, high), 1, 50).Draw(rt, "readings") {
			for range 3 {
				scaled := x * p.Scale
				move := (scaled - y) / p.Divisor
				for i, v := range []int64{scaled, scaled - y, move} {
					if v < p.Bounds[i].Low || v > p.Bounds[i].High {
						rt.Fatalf("%s is %d", p.Bounds[i].Name, v)
					}
				}
				next := y + move
				if got := p.Next(int32(y), int32(x)); int64(got) != next {
					rt.Fatalf("in 32 bits %d, in 64 bits %d", got, next)
				}
				y = next
				if y < low*p.Scale || y > high*p.Scale {
					rt.Fatalf("y left the range: %d", y)
				}
			}
		}
		x := rapid.Int64Range(low, high).Draw(rt, "constant")
		for range 60 * p.Divisor {
			y += (x*p.Scale - y) / p.Divisor
		}
		if off := math.Abs(float64(y)/float64(p.Scale) - float64(x)); off > p.SteadyError+1e-12 {
			rt.Fatalf("stays %g counts off, stated %g", off, p.SteadyError)
		}
	})
}

// The lag that the plan states is the one that a step shows.
func TestFilterLag(t *testing.T) {
	p, err := PlanFilter(60, 0.25, 0, 1023, 1.0/16)
	if err != nil {
		t.Fatal(err)
	}
	agrees(t, "lag", p.Lag, 60, 0.01)
	y, at := int32(0), 0.0
	for float64(y)/float64(p.Scale) < 1000*(1-math.Exp(-1)) {
		y = p.Next(y, 1000)
		at += 0.25
	}
	isNear(t, "time to 63 %", at, 60, 0.6)
	if _, err := PlanFilter(3600, 0.01, 0, 65535, 1.0/16); err == nil {
		t.Error("what needs more than 32 bits was taken")
	}
	if p, err := PlanFilter(0, 0.25, 0, 1023, 1); err != nil || p.Divisor != 1 || p.Next(5, 77) != 77 {
		t.Errorf("%+v %v", p, err)
	}
}

func drawPID(rt *rapid.T) (PIDRequest, PIDPlan) {
	r := PIDRequest{
		Settings:   Settings{Kc: rapid.Float64Range(0.005, 3).Draw(rt, "Kc"), Ti: rapid.SampledFrom([]float64{0, 30, 300, 5000}).Draw(rt, "Ti"), Td: rapid.SampledFrom([]float64{0, 5, 60}).Draw(rt, "Td")},
		CountsPerK: rapid.Float64Range(1, 60).Draw(rt, "counts per K"),
		High:       rapid.SampledFrom([]int64{1023, 4095, 65535}).Draw(rt, "high"),
		Step:       rapid.SampledFrom([]float64{0.25, 1, 5}).Draw(rt, "step"),
		MostOutput: rapid.Int64Range(500, 1000).Draw(rt, "most"), LeastOutput: rapid.SampledFrom([]int64{0, 50}).Draw(rt, "least"),
	}
	p, err := PlanPID(r)
	if err != nil {
		rt.Skip(err)
	}
	return r, p
}

// Whatever the readings, no intermediate leaves its bound, every bound is
// inside 32 bits, and 32-bit arithmetic gives what 64-bit arithmetic gives.
func TestPIDStaysWithinItsBounds(t *testing.T) {
	tried := 0
	rapid.Check(t, func(rt *rapid.T) {
		r, p := drawPID(rt)
		tried++
		if err := fits32(p.Bounds); err != nil {
			rt.Fatal(err)
		}
		first := int32(rapid.Int64Range(r.Low, r.High).Draw(rt, "first"))
		m := p.Start(rapid.Int32Range(0, 1000).Draw(rt, "output"), 0, first)
		sum, y := int64(m.Sum), int64(m.Reading)
		for range 60 {
			reading := rapid.Int64Range(r.Low, r.High).Draw(rt, "reading")
			set := rapid.Int64Range(r.Low, r.High).Draw(rt, "set")
			e := clip(set-reading, -p.Clip, p.Clip)
			before := y
			y += (reading*p.Filter.Scale - y) / p.Filter.Divisor
			out := e*p.P.Mul/p.P.Div + sum/p.I.Div + (before-y)*p.D.Mul/p.D.Div
			values := []int64{set - reading, e * p.P.Mul, e * p.I.Mul, sum + e*p.I.Mul, (before - y) * p.D.Mul, out}
			for i, v := range values {
				if b := p.Bounds[i]; v < b.Low || v > b.High {
					rt.Fatalf("%s is %d, outside %d … %d", b.Name, v, b.Low, b.High)
				}
			}
			if !(out > p.MostOutput && e > 0) && !(out < p.LeastOutput && e < 0) {
				sum = clip(sum+e*p.I.Mul, p.LeastOutput*p.I.Div, p.MostOutput*p.I.Div)
			}
			if got := p.Next(&m, int32(set-reading), int32(reading)); int64(got) != clip(out, p.LeastOutput, p.MostOutput) || int64(m.Sum) != sum {
				rt.Fatalf("in 32 bits %d (%d), in 64 bits %d (%d)", got, m.Sum, out, sum)
			}
		}
	})
	if tried == 0 {
		t.Error("no plan was tried")
	}
}

// In whole numbers the control does what the formula says, within the stated
// error: against a PI in floating point on a ramp of readings.
func TestPIDAgainstFloatingPoint(t *testing.T) {
	r := PIDRequest{Settings: Settings{Kc: 0.1, Ti: 300}, CountsPerK: 6, High: 1023, Step: 1, MostOutput: 1000}
	p, err := PlanPID(r)
	if err != nil {
		t.Fatal(err)
	}
	m := p.Start(300, 0, 500)
	sum := 300.0
	perCount := 1000 * 0.1 / 6
	for i := range 200 {
		e := float64(5 - i/30)
		want := perCount*e + sum
		got := p.Next(&m, int32(e), int32(500-e))
		isNear(t, "output", float64(got), math.Max(0, math.Min(1000, want)), p.OutputError+0.002*math.Abs(want))
		sum += perCount * e / 300
	}
	// no bump at the start, for a deviation that its range allows
	for _, e := range []int32{-10, 0, 10} {
		m := p.Start(400, e, 500)
		isNear(t, "first output", float64(p.Next(&m, e, 500)), 400, p.OutputError)
	}
}

// A long time at the stop does not wind the integral up.
func TestPIDDoesNotWindUp(t *testing.T) {
	p, err := PlanPID(PIDRequest{Settings: Settings{Kc: 0.1, Ti: 60}, CountsPerK: 6, High: 1023, Step: 1, MostOutput: 1000})
	if err != nil {
		t.Fatal(err)
	}
	m := p.Start(0, 0, 0)
	for range 10000 {
		if out := p.Next(&m, 100, 200); out > 1000 {
			t.Fatal(out)
		}
	}
	if out := p.Next(&m, -30, 330); out > 700 {
		t.Errorf("still at %d permille after the deviation has turned", out)
	}
}

func TestPIDPlanRefuses(t *testing.T) {
	good := PIDRequest{Settings: Settings{Kc: 1.3, Ti: 320}, CountsPerK: 6, High: 1023, Step: 1, MostOutput: 1000}
	for name, spoil := range map[string]func(*PIDRequest){
		"no gain":         func(r *PIDRequest) { r.Settings.Kc = 0 },
		"output":          func(r *PIDRequest) { r.MostOutput = 0 },
		"counts":          func(r *PIDRequest) { r.High = 0 },
		"no step":         func(r *PIDRequest) { r.Step = 0 },
		"endless time":    func(r *PIDRequest) { r.Settings.Ti = 1e13 },
		"seventeen bits":  func(r *PIDRequest) { r.High = 1 << 17 },
		"counts per K":    func(r *PIDRequest) { r.CountsPerK = math.NaN() },
		"negative output": func(r *PIDRequest) { r.LeastOutput = -1 },
	} {
		r := good
		spoil(&r)
		if _, err := PlanPID(r); err == nil {
			t.Errorf("%s taken", name)
		}
	}
	p, err := PlanPID(good)
	if err != nil || len(p.Doubts) == 0 {
		t.Errorf("a count moves a fifth of the output, and nothing is said: %+v %v", p, err)
	}
}

func TestWindow(t *testing.T) {
	w, err := PlanWindow(20, 1, 0.25)
	if err != nil {
		t.Fatal(err)
	}
	if w.Steps != 80 || w.MinPulse != 4 {
		t.Fatalf("%+v", w)
	}
	for _, c := range [][2]int32{{0, 0}, {43, 0}, {44, 4}, {500, 40}, {956, 76}, {957, 80}, {1000, 80}} {
		if got := w.On(c[0]); got != c[1] {
			t.Errorf("%d permille: %d steps, want %d", c[0], got, c[1])
		}
	}
	last := int32(0)
	for permille := int32(0); permille <= 1000; permille++ {
		on := w.On(permille)
		if on < last || on > int32(w.Steps) {
			t.Fatalf("%d permille: %d steps after %d", permille, on, last)
		}
		last = on
	}
	for _, bad := range [][3]float64{{0, 0, 1}, {1, 0, 1}, {10, 6, 1}, {1e9, 0, 1e-3}} {
		if _, err := PlanWindow(bad[0], bad[1], bad[2]); err == nil {
			t.Errorf("%v taken", bad)
		}
	}
}
