package thermal

import "math"

// stages is the most first-order lags in a row: medium, element, filter.
const stages = 3

// chain is medium, element and filter, each a first-order lag behind the one
// before, and the anticipator beside them. Its state is carried over any time
// exactly: the matrix exponential of so small a triangular system is known in
// closed form, with divided differences of the exponential off the diagonal,
// so that equal lags need no special case.
type chain struct {
	n          int             // lags in use
	rate       [stages]float64 // 1/s, of each
	warmerRate float64         // 1/s, of the anticipator; 0: none
}

// temperatures is the state of a chain: each stage, and how far the
// anticipator has warmed the element.
type temperatures struct {
	stage  [stages]float64
	warmer float64
}

// drive is where the medium and the anticipator settle with the present
// inputs.
type drive struct {
	medium float64
	warmer float64
}

// transition is the lower triangular matrix exponential over one time.
type transition struct {
	e11, e21, e22, e31, e32, e33 float64
	warmer                       float64
}

func newChain(p Process, s Sensing) chain {
	c := chain{n: 1}
	c.rate[0] = 1 / p.Tau
	for _, lag := range [2]float64{s.Lag, s.Filter} {
		if lag > 1e-12*p.Tau { // less could not be told from none
			c.rate[c.n] = 1 / lag
			c.n++
		}
	}
	if s.Anticipator.Rise > 0 {
		c.warmerRate = 1 / s.Anticipator.Lag
	}
	return c
}

// over is the transition over t seconds, t 0 or more.
func (c *chain) over(t float64) transition {
	var m transition
	a := -c.rate[0] * t
	m.e11 = math.Exp(a)
	if c.n > 1 {
		b := -c.rate[1] * t
		m.e22 = math.Exp(b)
		m.e21 = c.rate[1] * t * slope(a, b, m.e11, m.e22)
		if c.n > 2 {
			d := -c.rate[2] * t
			m.e33 = math.Exp(d)
			m.e32 = c.rate[2] * t * slope(b, d, m.e22, m.e33)
			m.e31 = c.rate[1] * t * c.rate[2] * t * curvature(a, b, d)
		}
	}
	if c.warmerRate > 0 {
		m.warmer = math.Exp(-c.warmerRate * t)
	}
	return m
}

// after carries temperatures over the transition's time under a constant drive.
func (m *transition) after(s temperatures, d drive) temperatures {
	x, y, z := s.stage[0]-d.medium, s.stage[1]-d.medium, s.stage[2]-d.medium
	return temperatures{
		stage: [stages]float64{
			d.medium + m.e11*x,
			d.medium + m.e21*x + m.e22*y,
			d.medium + m.e31*x + m.e32*y + m.e33*z,
		},
		warmer: d.warmer + m.warmer*(s.warmer-d.warmer),
	}
}

// advance carries temperatures over t seconds under a constant drive.
func (c *chain) advance(s temperatures, d drive, t float64) temperatures {
	if t <= 0 {
		return s
	}
	m := c.over(t)
	return m.after(s, d)
}

// sensed is what the contact acts on.
func (c *chain) sensed(s temperatures) float64 { return s.stage[c.n-1] + s.warmer }

// settled is the chain after a long time under one drive.
func settled(d drive) temperatures {
	return temperatures{stage: [stages]float64{d.medium, d.medium, d.medium}, warmer: d.warmer}
}

// slope is the first divided difference of the exponential, given its values.
// Where the arguments are close it is evaluated by expm1, which loses nothing.
func slope(x, y, ex, ey float64) float64 {
	d := x - y
	if d > 0.5 || d < -0.5 {
		return (ex - ey) / d
	}
	if d == 0 {
		return ex
	}
	return ey * math.Expm1(d) / d
}

// curvature is the second divided difference of the exponential. Where the
// arguments are close it is summed as a series in complete homogeneous
// symmetric polynomials about their middle.
func curvature(x, y, z float64) float64 {
	if x > y {
		x, y = y, x
	}
	if y > z {
		y, z = z, y
	}
	if x > y {
		x, y = y, x
	}
	if z-x > 1 {
		ex, ey, ez := math.Exp(x), math.Exp(y), math.Exp(z)
		return (slope(z, y, ez, ey) - slope(y, x, ey, ex)) / (z - x)
	}
	middle := (x + y + z) / 3
	x, y, z = x-middle, y-middle, z-middle
	h1, h2, h3 := 1.0, 1.0, 1.0 // complete homogeneous polynomials of {x}, {x,y}, {x,y,z}
	sum, factorial := 0.5, 2.0
	for k := 1; k <= 18; k++ {
		h1 *= x
		h2 = h1 + y*h2
		h3 = h2 + z*h3
		factorial *= float64(k + 2)
		sum += h3 / factorial
	}
	return math.Exp(middle) * sum
}
