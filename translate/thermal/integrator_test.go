package thermal

import (
	"math"
	"testing"
)

// dormandPrince is a general-purpose integrator with adaptive steps, dense
// output and event location, for comparison in benchmarks only: J. R. Dormand
// and P. J. Prince, "A family of embedded Runge-Kutta formulae", Journal of
// Computational and Applied Mathematics 6 (1980) 19-26, the pair RK5(4)7M, with
// first same as last.
type dormandPrince struct {
	f           func(t float64, x, dx []float64)
	relative    float64
	absolute    float64
	x, next     []float64
	k           [7][]float64
	work, blend []float64
	t, h        float64
	fresh       bool // k[0] holds the slopes at t
	evaluations int
}

var (
	dpNodes   = [7]float64{0, 1.0 / 5, 3.0 / 10, 4.0 / 5, 8.0 / 9, 1, 1}
	dpWeights = [7][6]float64{
		{},
		{1.0 / 5},
		{3.0 / 40, 9.0 / 40},
		{44.0 / 45, -56.0 / 15, 32.0 / 9},
		{19372.0 / 6561, -25360.0 / 2187, 64448.0 / 6561, -212.0 / 729},
		{9017.0 / 3168, -355.0 / 33, 46732.0 / 5247, 49.0 / 176, -5103.0 / 18656},
		{35.0 / 384, 0, 500.0 / 1113, 125.0 / 192, -2187.0 / 6784, 11.0 / 84},
	}
	// fifth order less embedded fourth order
	dpError = [7]float64{71.0 / 57600, 0, -71.0 / 16695, 71.0 / 1920, -17253.0 / 339200, 22.0 / 525, -1.0 / 40}
)

func newDormandPrince(f func(t float64, x, dx []float64), x []float64, tolerance float64) *dormandPrince {
	n := len(x)
	d := &dormandPrince{f: f, relative: tolerance, absolute: tolerance, x: append([]float64(nil), x...), next: make([]float64, n), work: make([]float64, n), blend: make([]float64, n)}
	for i := range d.k {
		d.k[i] = make([]float64, n)
	}
	return d
}

func (d *dormandPrince) slopes(t float64, x, dx []float64) {
	d.evaluations++
	d.f(t, x, dx)
}

// try makes one step of length h into next and returns the error as a share of
// the tolerance.
func (d *dormandPrince) try(h float64) float64 {
	if !d.fresh {
		d.slopes(d.t, d.x, d.k[0])
		d.fresh = true
	}
	for s := 1; s < 7; s++ {
		for i := range d.x {
			sum := 0.0
			for j := range s {
				sum += dpWeights[s][j] * d.k[j][i]
			}
			d.work[i] = d.x[i] + h*sum
		}
		if s == 6 {
			copy(d.next, d.work)
		}
		d.slopes(d.t+dpNodes[s]*h, d.work, d.k[s])
	}
	sum := 0.0
	for i := range d.x {
		e := 0.0
		for s := range d.k {
			e += dpError[s] * d.k[s][i]
		}
		scale := d.absolute + d.relative*math.Max(math.Abs(d.x[i]), math.Abs(d.next[i]))
		sum += (h * e / scale) * (h * e / scale)
	}
	return math.Sqrt(sum / float64(len(d.x)))
}

// run integrates to the end, or to the first zero of the event, which is
// located to the integrator's own accuracy: a step across it is repeated with
// the length at which the event is 0.
func (d *dormandPrince) run(end float64, event func(x []float64) float64) bool {
	if d.h == 0 {
		d.h = (end - d.t) / 100
	}
	before := event(d.x)
	for d.t < end {
		h := math.Min(d.h, end-d.t)
		e := d.try(h)
		factor := math.Min(5, math.Max(0.2, 0.9*math.Pow(math.Max(e, 1e-10), -0.2)))
		if e > 1 {
			d.h = h * factor
			continue
		}
		if after := event(d.next); before < 0 && after >= 0 {
			d.locate(h, before, after, event)
			return true
		} else {
			before = after
		}
		d.accept(h)
		if h == d.h || factor < 1 {
			d.h = h * factor
		}
	}
	return false
}

func (d *dormandPrince) accept(h float64) {
	d.t += h
	copy(d.x, d.next)
	d.k[0], d.k[6] = d.k[6], d.k[0]
}

// locate repeats the step with the length at which the event is 0 (regula
// falsi of the Illinois kind).
func (d *dormandPrince) locate(h, fa, fb float64, event func(x []float64) float64) {
	a, b := 0.0, h
	side := 0
	for range 60 {
		m := (a*fb - b*fa) / (fb - fa)
		d.try(m)
		fm := event(d.next)
		if b-a < 1e-14*(1+h) || math.Abs(fm) < d.absolute*1e-2 {
			b = m
			break
		}
		if fm >= 0 {
			b, fb = m, fm
			if side == 1 {
				fa /= 2
			}
			side = 1
		} else {
			a, fa = m, fm
			if side == -1 {
				fb /= 2
			}
			side = -1
		}
	}
	d.try(b)
	d.accept(b)
}

// generalCycle finds the steady cycle of a loop as one would with a
// general-purpose integrator: from rest, through delayed switchings and
// located thresholds, until a cycle is the same as the last within the
// tolerance. It returns the figures and how often the slopes were evaluated.
func generalCycle(l Loop, tolerance float64) (Figures, int) {
	p, s := l.Process, l.Sensing
	felt := false
	n := 1
	if s.Lag > 0 {
		n = 2
	}
	x := make([]float64, n)
	for i := range x {
		x[i] = l.Switching.Make
	}
	d := newDormandPrince(func(_ float64, x, dx []float64) {
		to := p.Off
		if felt {
			to = p.On
		}
		dx[0] = (to - x[0]) / p.Tau
		if n > 1 {
			dx[1] = (x[0] - x[1]) / s.Lag
		}
	}, x, tolerance)
	sensed := n - 1
	never := func([]float64) float64 { return -1 }
	phase := func(event func([]float64) float64) (float64, float64) {
		began := d.t
		d.run(began+p.Dead, never)
		felt = !felt
		d.fresh = false
		d.h = math.Max(1e-3, p.Dead/10) // begin carefully after a jump
		turn := d.x[0]
		d.run(began+1e7, event)
		return d.t - began, turn
	}
	var f Figures
	for range 500 {
		last := f
		f.On, f.Low = phase(func(x []float64) float64 { return x[sensed] - l.Switching.Break })
		f.Off, f.High = phase(func(x []float64) float64 { return l.Switching.Make - x[sensed] })
		if math.Abs(f.On-last.On) <= 10*tolerance*f.On && math.Abs(f.Off-last.Off) <= 10*tolerance*f.Off {
			break
		}
	}
	return f, d.evaluations
}

// The integrator is a fair opponent: it converges to the exact cycle.
func TestGeneralIntegratorAgrees(t *testing.T) {
	for _, lag := range []float64{0, 45} {
		want := steady(t, tank(lag))
		for _, tolerance := range []float64{1e-6, 1e-9, 1e-12} {
			got, _ := generalCycle(tank(lag), tolerance)
			agrees(t, "on", got.On, want.On, 3e2*tolerance+1e-12)
			agrees(t, "off", got.Off, want.Off, 3e2*tolerance+1e-12)
			agrees(t, "high", got.High, want.High, 3e2*tolerance+1e-12)
		}
	}
}
