package thermal

import "math"

// functional is a weighted sum of the chain's deviations from where it
// settles, plus a constant: a sensed temperature less a threshold, or a
// derivative of it.
type functional struct {
	weight   [stages]float64
	warmer   float64
	constant float64
}

// maxModes is the most exponentials in a sensed temperature, with the constant.
const maxModes = stages + 2

// course follows a functional through a time in which no input changes.
type course struct {
	chain  *chain
	from   [stages]float64 // deviations from where the chain settles, at the start
	warmer float64
	level  [maxModes]functional
	levels int
}

// newCourse prepares the sensed temperature less a threshold.
//
// A sum of k decaying exponentials and a constant has at most k zeros. They
// are found without sampling: F and e^(λt)F have the same zeros, and between
// two zeros of its derivative, e^(λt)(F' + λF), the latter is monotone. F' + λF
// has one exponential less, is again a functional of the state, and so on down
// to a single exponential, which has no zero. Level 0 is F, level i+1 is made
// from level i with the i-th rate.
func newCourse(c *chain, s temperatures, d drive, threshold float64) course {
	k := course{chain: c, warmer: s.warmer - d.warmer}
	for i := 0; i < c.n; i++ {
		k.from[i] = s.stage[i] - d.medium
	}
	f := functional{constant: d.medium + d.warmer - threshold}
	f.weight[c.n-1] = 1
	if c.warmerRate > 0 {
		f.warmer = 1
	}
	k.push(f)
	k.push(c.reduced(f, 0))
	if c.warmerRate > 0 {
		k.push(c.reduced(k.level[k.levels-1], c.warmerRate))
	}
	for i := c.n - 1; i > 0; i-- {
		k.push(c.reduced(k.level[k.levels-1], c.rate[i]))
	}
	return k
}

func (k *course) push(f functional) {
	k.level[k.levels] = f
	k.levels++
}

// reduced is F' + rate·F.
func (c *chain) reduced(f functional, rate float64) functional {
	g := functional{constant: rate * f.constant}
	for i := 0; i < c.n; i++ {
		g.weight[i] = (rate - c.rate[i]) * f.weight[i]
		if i+1 < c.n {
			g.weight[i] += c.rate[i+1] * f.weight[i+1]
		}
	}
	g.warmer = (rate - c.warmerRate) * f.warmer
	return g
}

// at is the value of one level after t seconds.
func (k *course) at(level int, t float64) float64 {
	f := &k.level[level]
	m := k.chain.over(t)
	x := &k.from
	v := f.weight[0]*m.e11*x[0] + f.constant + f.warmer*m.warmer*k.warmer
	if k.chain.n > 1 {
		v += f.weight[1] * (m.e21*x[0] + m.e22*x[1])
	}
	if k.chain.n > 2 {
		v += f.weight[2] * (m.e31*x[0] + m.e32*x[1] + m.e33*x[2])
	}
	return v
}

// zeros lists the times in (0, until) at which a level changes sign, in order.
func (k *course) zeros(level int, until float64, into []float64) []float64 {
	if level >= k.levels-1 {
		return into
	}
	if level == 1 && k.chain.n == 2 && k.chain.warmerRate == 0 {
		if t, found := k.turn(); found && t < until {
			into = append(into, t)
		}
		return into
	}
	var buffer [maxModes]float64
	marks := append(k.zeros(level+1, until, buffer[:0]), until)
	before, vBefore := 0.0, k.at(level, 0)
	for _, t := range marks {
		v := k.at(level, t)
		if vBefore*v < 0 {
			into = append(into, k.zero(level, before, t, vBefore, v))
		}
		if v != 0 {
			before, vBefore = t, v
		}
	}
	return into
}

// turn is the time at which a medium and one lag behind it stand equal, which
// is where the sensed temperature turns. With deviations x and y at the start
// and rates a and b, x·e^(−at) = (y − x·b/(b−a))·e^(−bt) + x·b/(b−a)·e^(−at); it
// follows
//
//	(e^((b−a)t) − 1)/(b − a) = (1 − y/x)/a,
//
// which needs no special case for equal lags.
func (k *course) turn() (t float64, found bool) {
	x, y, apart := k.from[0], k.from[1], k.chain.rate[1]-k.chain.rate[0]
	u := (1 - y/x) / k.chain.rate[0]
	switch {
	case !(u > 0) || apart*u <= -1: // never, or behind
		return 0, false
	case math.Abs(apart*u) < 1e-300:
		return u, true
	}
	return math.Log1p(apart*u) / apart, true
}

// first is the first time in [0, until] at which the sensed temperature has
// risen (or fallen) to the threshold. A start beyond the threshold by more
// than the tolerance counts at once; a start on it does not, so that a control
// with equal edges leaves its threshold before it can come back to it.
func (k *course) first(rising bool, until, tolerance float64) (float64, bool) {
	sign := 1.0
	if rising {
		sign = -1
	}
	before, vBefore := 0.0, k.at(0, 0)
	if sign*vBefore < -tolerance {
		return 0, true
	}
	var buffer [maxModes]float64
	marks := append(k.zeros(1, until, buffer[:0]), until)
	for _, t := range marks {
		v := k.at(0, t)
		if sign*v <= 0 && sign*vBefore > 0 {
			return k.zero(0, before, t, vBefore, v), true
		}
		if sign*v < -tolerance && before == 0 { // left the threshold on the far side
			return 0, true
		}
		before, vBefore = t, v
	}
	return 0, false
}

// zero finds the time between a and b at which a level is zero, given its
// values there, of opposite sign, to the last few bits (T. R. Chandrupatla, "A
// new hybrid quadratic/bisection algorithm", Advances in Engineering Software
// 28 (1997) 145-149).
func (k *course) zero(level int, a, b, fa, fb float64) float64 {
	if fa == 0 {
		return a
	}
	if fb == 0 {
		return b
	}
	var c, fc float64
	t := fa / (fa - fb) // the first guess is the secant
	for range 100 {
		x := a + t*(b-a)
		fx := k.at(level, x)
		if math.Signbit(fx) == math.Signbit(fa) {
			c, fc = a, fa
		} else {
			c, fc = b, fb
			b, fb = a, fa
		}
		a, fa = x, fx
		best := a
		if math.Abs(fb) < math.Abs(fa) {
			best = b
		}
		limit := (4e-16*math.Abs(best) + 1e-300) / math.Abs(b-a)
		if limit > 0.5 || fa == 0 {
			return best
		}
		xi, phi := (a-b)/(c-b), (fa-fb)/(fc-fb)
		t = 0.5
		if phi*phi < xi && (1-phi)*(1-phi) < 1-xi {
			t = fa/(fb-fa)*fc/(fb-fc) + (c-a)/(b-a)*fa/(fc-fa)*fb/(fc-fb)
		}
		t = math.Min(1-limit, math.Max(limit, t))
	}
	return a
}
