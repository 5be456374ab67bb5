package thermal

import (
	"math"
	"slices"

	"gonum.org/v1/gonum/mat"
)

// logFit is a first-order process with dead time on a log. In the unknowns it
// is
//
//	T(t) = T0·E(t) + SettlesOn·φ(t) + SettlesOff·(1 − E(t) − φ(t)),
//
// with E the decay since the start of the stretch and φ the answer to the
// delayed contact: linear in all but time constant and dead time.
type logFit struct {
	log       *logbook
	known     Known
	stretches [][2]int
	used      int
	middle    float64 // degC, mean of the rows used; temperatures are solved for as differences from it

	tau, dead float64
	on, off   float64   // differences from the middle
	starts    []float64 // likewise, of each stretch
	residuals []float64 // K, in the order of the stretches
}

// each goes through the rows used and shows E and φ of each.
func (f *logFit) each(tau, dead float64, see func(stretch, row int, e, phi float64)) {
	phases := f.log.phases
	for n, s := range f.stretches {
		now := f.log.rows[s[0]].Time
		at := 0 // phase that the medium feels
		for at+1 < len(phases) && phases[at+1].from+dead <= now {
			at++
		}
		e, phi := 1.0, 0.0
		lastStep, lastDecay := math.NaN(), 0.0
		advance := func(to float64) {
			step := to - now
			if step != lastStep {
				lastStep, lastDecay = step, math.Exp(-step/tau)
			}
			u := 0.0
			if phases[at].on {
				u = 1
			}
			e *= lastDecay
			phi = u + (phi-u)*lastDecay
			now = to
		}
		for i := s[0]; i <= s[1]; i++ {
			t := f.log.rows[i].Time
			for at+1 < len(phases) && phases[at+1].from+dead < t {
				advance(phases[at+1].from + dead)
				at++
			}
			advance(t)
			see(n, i, e, phi)
		}
	}
}

// solve finds the linear unknowns for a time constant and a dead time, by the
// normal equations with the columns scaled, and keeps the residuals. It
// reports the sum of their squares.
func (f *logFit) solve(tau, dead float64) float64 {
	given := f.known.SettlesOff.Known
	off := f.known.SettlesOff.or() - f.middle
	scale := math.Max(1, tau/f.log.longest()) // φ and 1−E−φ are of the order of phase over time constant
	sums := make([]normalSums, len(f.stretches))
	f.each(tau, dead, func(s, row int, e, phi float64) {
		y := f.log.rows[row].Temperature - f.middle
		if given {
			y -= off * (1 - e - phi)
		}
		sums[s].add(e, scale*phi, scale*(1-e-phi), y)
	})
	n := len(f.stretches)
	normal, right := normalEquations(sums, given)
	var cholesky mat.Cholesky
	var x mat.VecDense
	if !cholesky.Factorize(normal) || cholesky.SolveVecTo(&x, right) != nil {
		return math.Inf(1)
	}
	f.starts = f.starts[:0]
	for i := range n {
		f.starts = append(f.starts, x.AtVec(i))
	}
	f.on, f.off = scale*x.AtVec(n), off
	if !given {
		f.off = scale * x.AtVec(n+1)
	}
	return f.measure(tau, dead)
}

// normalSums are the sums of products of one stretch: e of its start, a of
// SettlesOn, b of SettlesOff, y of the measured temperature.
type normalSums struct{ ee, ea, eb, ey, aa, ab, ay, bb, by float64 }

func (s *normalSums) add(e, a, b, y float64) {
	s.ee += e * e
	s.ea += e * a
	s.eb += e * b
	s.ey += e * y
	s.aa += a * a
	s.ab += a * b
	s.ay += a * y
	s.bb += b * b
	s.by += b * y
}

// normalEquations puts the stretches together: their starts first, SettlesOn,
// and SettlesOff where it is not given.
func normalEquations(sums []normalSums, given bool) (*mat.SymDense, *mat.VecDense) {
	n, size := len(sums), len(sums)+2
	if given {
		size--
	}
	normal, right := mat.NewSymDense(size, nil), mat.NewVecDense(size, nil)
	var all normalSums
	for i, s := range sums {
		normal.SetSym(i, i, s.ee)
		normal.SetSym(i, n, s.ea)
		right.SetVec(i, s.ey)
		if !given {
			normal.SetSym(i, n+1, s.eb)
		}
		all.aa, all.ab, all.ay, all.bb, all.by = all.aa+s.aa, all.ab+s.ab, all.ay+s.ay, all.bb+s.bb, all.by+s.by
	}
	normal.SetSym(n, n, all.aa)
	right.SetVec(n, all.ay)
	if !given {
		normal.SetSym(n, n+1, all.ab)
		normal.SetSym(n+1, n+1, all.bb)
		right.SetVec(n+1, all.by)
	}
	return normal, right
}

// measure fills in the residuals of the present unknowns.
func (f *logFit) measure(tau, dead float64) float64 {
	f.residuals = f.residuals[:0]
	sum := 0.0
	f.each(tau, dead, func(s, row int, e, phi float64) {
		r := f.log.rows[row].Temperature - f.middle - (f.starts[s]*e + f.on*phi + f.off*(1-e-phi))
		f.residuals = append(f.residuals, r)
		sum += r * r
	})
	return sum
}

// squares is what the search makes least: the residuals' squares, with a wall
// where time constant or dead time leave the range in which they can be told.
func (f *logFit) squares(tau, dead float64) float64 {
	longest, shortest := f.log.longest(), f.log.shortest()
	wall := 0.0
	if limit := straightTau * longest; tau > limit {
		wall += math.Log(tau / limit)
		tau = limit
	}
	if limit := shortTau * shortest; tau < limit {
		wall += math.Log(limit / tau)
		tau = limit
	}
	if limit := 0.9 * shortest; dead > limit {
		wall += math.Log(dead / limit)
		dead = limit
	}
	if limit := 1e-3 * f.log.usual; dead < limit {
		wall += math.Log(limit / dead)
		dead = limit
	}
	return f.solve(tau, dead) * (1 + wall)
}

// noise is the scatter of neighbouring residuals, which no slow course
// explains, but never less than rounding to the logger's own step leaves.
func (f *logFit) noise() float64 {
	sum, n := 0.0, 0
	for i := 1; i < len(f.residuals); i++ {
		d := f.residuals[i] - f.residuals[i-1]
		sum += d * d
		n++
	}
	return math.Sqrt(sum / 2 / float64(max(n, 1)))
}

// correlation is that of neighbouring residuals, between 0 and 0.999.
func (f *logFit) correlation() float64 {
	var cross, square float64
	for i, r := range f.residuals {
		square += r * r
		if i > 0 {
			cross += r * f.residuals[i-1]
		}
	}
	if square == 0 {
		return 0
	}
	return math.Max(0, math.Min(0.999, cross/square))
}

// phaseRMS is that of the residuals in one phase, and the rows it is made of.
func (f *logFit) phaseRMS(which int) (float64, int) {
	p := f.log.phases[which]
	sum, n, i := 0.0, 0, 0
	for _, s := range f.stretches {
		for row := s[0]; row <= s[1]; row++ {
			if row >= p.first && row <= p.last {
				sum += f.residuals[i] * f.residuals[i]
				n++
			}
			i++
		}
	}
	return math.Sqrt(sum / float64(max(n, 1))), n
}

// parameters in the order of the covariance: ln tau, ln dead, on, off (where
// not given), starts.
func (f *logFit) parameters() []float64 {
	p := []float64{math.Log(f.tau), math.Log(f.dead), f.on}
	if !f.known.SettlesOff.Known {
		p = append(p, f.off)
	}
	return append(p, f.starts...)
}

// with is a copy with other parameters.
func (f *logFit) with(p []float64) *logFit {
	q := *f
	q.residuals = nil
	q.tau, q.dead, q.on = math.Exp(p[0]), math.Exp(p[1]), p[2]
	rest := p[3:]
	if !f.known.SettlesOff.Known {
		q.off, rest = rest[0], rest[1:]
	}
	q.starts = append([]float64(nil), rest...)
	return &q
}

// covariance of the parameters, from the Jacobian by differences. It is nil
// where the parameters cannot be told apart.
func (f *logFit) covariance() *mat.SymDense {
	at := f.parameters()
	jacobian := mat.NewDense(len(f.residuals), len(at), nil)
	for j := range at {
		h := 1e-5 * math.Max(1, math.Abs(at[j]))
		up, down := append([]float64(nil), at...), append([]float64(nil), at...)
		up[j] += h
		down[j] -= h
		a, b := f.with(up), f.with(down)
		a.measure(a.tau, a.dead)
		b.measure(b.tau, b.dead)
		for i := range f.residuals {
			jacobian.Set(i, j, (a.residuals[i]-b.residuals[i])/(2*h))
		}
	}
	var normal mat.SymDense
	normal.SymOuterK(1, jacobian.T())
	var cholesky mat.Cholesky
	var inverse mat.SymDense
	if !cholesky.Factorize(&normal) || cholesky.InverseTo(&inverse) != nil {
		return nil
	}
	sum := 0.0
	for _, r := range f.residuals {
		sum += r * r
	}
	rho := f.correlation()
	var covariance mat.SymDense
	covariance.ScaleSym(sum/float64(max(1, f.used-len(at)))*(1+rho)/(1-rho), &inverse)
	f.addTiming(&covariance, &inverse, jacobian)
	return &covariance
}

// addTiming adds what the uncertain times of the switchings do: each is known
// to half a row's distance either way and taken as uniform over it. A moved
// switching moves the parameters by the least-squares solution of the change
// that it makes to the residuals.
func (f *logFit) addTiming(covariance, inverse *mat.SymDense, jacobian *mat.Dense) {
	moved := *f
	log := *f.log
	moved.log, moved.residuals = &log, nil
	change := mat.NewVecDense(len(f.residuals), nil)
	var projected, shift mat.VecDense
	for i := 1; i < len(f.log.phases); i++ {
		log.phases = slices.Clone(f.log.phases)
		h := f.log.usual / 4
		log.phases[i].from += h
		moved.measure(f.tau, f.dead)
		for n := range f.residuals {
			change.SetVec(n, (moved.residuals[n]-f.residuals[n])/h)
		}
		projected.MulVec(jacobian.T(), change)
		shift.MulVec(inverse, &projected)
		covariance.SymRankOne(covariance, f.log.usual*f.log.usual/12, &shift)
	}
}

// deviation is the standard error of a function of the parameters.
func (f *logFit) deviation(covariance *mat.SymDense, of func(*logFit) float64) float64 {
	if covariance == nil {
		return math.Inf(1)
	}
	at := f.parameters()
	gradient := mat.NewVecDense(len(at), nil)
	for j := range at {
		h := 1e-5 * math.Max(1, math.Abs(at[j]))
		up, down := append([]float64(nil), at...), append([]float64(nil), at...)
		up[j] += h
		down[j] -= h
		gradient.SetVec(j, (of(f.with(up))-of(f.with(down)))/(2*h))
	}
	return math.Sqrt(math.Max(0, mat.Inner(gradient, covariance, gradient)))
}
