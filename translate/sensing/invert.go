package sensing

import "math"

// middles gives the temperature in the middle of every count from low to high,
// in degC.
func (c *Chain) middles(low, high int64) []float64 {
	ts := make([]float64, 0, high-low+1)
	for n := low; n <= high; n++ {
		x := float64(n) + 0.5
		switch i := len(ts); {
		case i < 2:
			ts = append(ts, c.whereIs(x, c.Curve.Low, c.Curve.High))
		default:
			step := ts[i-1] - ts[i-2]
			ts = append(ts, c.whereNear(x, ts[i-1]+step, step/8))
		}
	}
	return ts
}

// whereIs gives the temperature between a and b at which the coordinate is x,
// by bisection; the nearer end where there is none.
func (c *Chain) whereIs(x, a, b float64) float64 {
	for b-a > c.Curve.tolerance() {
		m := (a + b) / 2
		if m == a || m == b {
			break
		}
		if (c.coordinate(m) < x) == c.rising {
			a = m
		} else {
			b = m
		}
	}
	return (a + b) / 2
}

// whereNear is whereIs where the temperature is about known: secant steps from
// there, and bisection should they lead away.
func (c *Chain) whereNear(x, t, h float64) float64 {
	clip := func(t float64) float64 { return math.Max(c.Curve.Low, math.Min(c.Curve.High, t)) }
	a, b := clip(t-h), clip(t)
	fa, fb := c.coordinate(a)-x, c.coordinate(b)-x
	for range 12 {
		if fa == fb {
			break
		}
		next := clip(b - fb*(b-a)/(fb-fa))
		if math.Abs(next-b) <= c.Curve.tolerance() {
			return next
		}
		a, fa = b, fb
		b, fb = next, c.coordinate(next)-x
	}
	return c.whereIs(x, c.Curve.Low, c.Curve.High)
}
