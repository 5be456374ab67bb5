// Package sensing answers what a new sensor and its front end can see: which
// count belongs to which temperature, at which temperature a threshold in
// counts really switches, and how far the reading may be wrong.
package sensing

import (
	"fmt"
	"math"
	"sort"
)

// A Curve relates a temperature in degC to the quantity that a sensor turns it
// into: ohm, or V. It is strictly monotone between Low and High, and says
// nothing outside.
type Curve struct {
	Name      string
	Unit      string // ohm or V
	Low, High float64
	Rising    bool
	at        func(t float64) float64
}

// RangeError says that a temperature or a quantity lies outside a curve.
type RangeError struct {
	Curve string
	What  string
	Low   float64
	High  float64
	Unit  string
}

func (e RangeError) Error() string {
	return fmt.Sprintf("%s is outside the curve of %s, %.6g to %.6g %s", e.What, e.Curve, e.Low, e.High, e.Unit)
}

// At gives the quantity at a temperature in degC.
func (c Curve) At(t float64) (float64, error) {
	if !(t >= c.Low && t <= c.High) {
		return 0, RangeError{c.Name, fmt.Sprintf("%.6g degC", t), c.Low, c.High, "degC"}
	}
	return c.at(t), nil
}

// tolerance is how closely a temperature is solved for: a million-millionth of
// the curve's range.
func (c Curve) tolerance() float64 { return 1e-12 * (c.High - c.Low) }

// Inverse gives the temperature in degC at a quantity, by bisection of the
// forward curve. The error is a RangeError.
func (c Curve) Inverse(q float64) (float64, error) {
	a, b := c.Low, c.High
	qa, qb := c.at(a), c.at(b)
	if !(q >= math.Min(qa, qb) && q <= math.Max(qa, qb)) {
		return 0, RangeError{c.Name, fmt.Sprintf("%.6g %s", q, c.Unit), math.Min(qa, qb), math.Max(qa, qb), c.Unit}
	}
	for b-a > c.tolerance() {
		m := (a + b) / 2
		if m == a || m == b {
			break
		}
		if (c.at(m) < q) == c.Rising {
			a = m
		} else {
			b = m
		}
	}
	return (a + b) / 2, nil
}

// slope is the change of the quantity per kelvin, by a central difference.
func (c Curve) slope(t float64) float64 {
	const h = 0.01
	a, b := math.Max(t-h, c.Low), math.Min(t+h, c.High)
	return (c.at(b) - c.at(a)) / (b - a)
}

// Kelvin is 0 degC in K.
const Kelvin = 273.15

// Beta is a thermistor by R = R25·exp(β(1/T − 1/298.15)), T in K.
func Beta(r25, beta float64) Curve {
	return Curve{Name: "thermistor (beta)", Unit: "ohm", Low: -55, High: 300, at: func(t float64) float64 {
		return r25 * math.Exp(beta*(1/(t+Kelvin)-1/298.15))
	}}
}

// SteinhartHart is a thermistor by 1/T = A + B·ln R + C·(ln R)³, T in K
// (Steinhart and Hart, 1968). The cubic in ln R is solved in closed form.
func SteinhartHart(a, b, c float64) Curve {
	return Curve{Name: "thermistor (Steinhart-Hart)", Unit: "ohm", Low: -55, High: 300, at: func(t float64) float64 {
		x := (a - 1/(t+Kelvin)) / c
		y := math.Sqrt(math.Pow(b/(3*c), 3) + x*x/4)
		return math.Exp(math.Cbrt(y-x/2) - math.Cbrt(y+x/2))
	}}
}

// Points is a sensor by a table of temperature in degC and quantity, rising in
// temperature and strictly one way in the quantity. Resistances of a thermistor
// are interpolated as ln R over 1/T, which is exact for a beta curve; other
// quantities by straight lines. Nothing is said outside the table.
func Points(name, unit string, pts [][2]float64, thermistor bool) (Curve, error) {
	pts = append([][2]float64(nil), pts...)
	n := len(pts)
	if n < 2 {
		return Curve{}, fmt.Errorf("no curve: two or more points are needed")
	}
	up := pts[1][1] > pts[0][1]
	for i, p := range pts {
		if thermistor && (p[1] <= 0 || up || p[0] <= -Kelvin) {
			return Curve{}, fmt.Errorf("point %d: a thermistor's resistance is more than nothing and falls as it warms", i+1)
		}
		if i > 0 && !(p[0] > pts[i-1][0] && p[1] != pts[i-1][1] && (p[1] > pts[i-1][1]) == up) {
			return Curve{}, fmt.Errorf("point %d: temperatures must rise and the other column go one way", i+1)
		}
	}
	x := func(t float64) float64 { return t }
	y := func(q float64) float64 { return q }
	back := y
	if thermistor {
		x = func(t float64) float64 { return 1 / (t + Kelvin) }
		y, back = math.Log, math.Exp
	}
	return Curve{Name: name, Unit: unit, Low: pts[0][0], High: pts[n-1][0], Rising: up, at: func(t float64) float64 {
		i := sort.Search(n-1, func(i int) bool { return pts[i][0] >= t })
		i = max(i, 1)
		a, b := pts[i-1], pts[i]
		f := (x(t) - x(a[0])) / (x(b[0]) - x(a[0]))
		return back(y(a[1]) + f*(y(b[1])-y(a[1])))
	}}, nil
}

// Coefficients of IEC 60751: R(t) = R0·(1 + At + Bt²) for t ≥ 0, and
// + R0·C(t − 100)t³ below.
const (
	platinumA = 3.9083e-3
	platinumB = -5.775e-7
	platinumC = -4.183e-12
)

// Platinum is a platinum resistor by IEC 60751, −200 to 850 degC.
func Platinum(r0 float64) Curve {
	return Curve{Name: "platinum (IEC 60751)", Unit: "ohm", Low: -200, High: 850, Rising: true, at: func(t float64) float64 {
		r := 1 + platinumA*t + platinumB*t*t
		if t < 0 {
			r += platinumC * (t - 100) * t * t * t
		}
		return r0 * r
	}}
}

// Straight is a quantity that changes linearly from a value at 0 degC.
func Straight(name, unit string, atZero, perKelvin, low, high float64) Curve {
	return Curve{Name: name, Unit: unit, Low: low, High: high, Rising: perKelvin > 0, at: func(t float64) float64 {
		return atZero + perKelvin*t
	}}
}
