package thermal

import "math"

// hoursPerYear is a year of 365 days.
const hoursPerYear = 365 * 24.0

// Yearly is what a steady demand costs over a year of 365 days.
type Yearly struct {
	Operations  float64 // make and break together are one
	HoursOn     float64 // h
	Mean        float64 // degC, time mean of the medium
	EnergyShare float64 // energy used as a share of the load left on all year: the duty
	Demand      float64 // where the middle of the thresholds lies between settling off (0) and on (1)
}

// Yearly is the year of one demand: the loop as it stands, all year. Errors
// are those of Steady.
func (l Loop) Yearly() (Yearly, error) {
	f, err := l.Steady()
	if err != nil {
		return Yearly{}, err
	}
	middle := (l.Switching.Make + l.Switching.Break) / 2
	return Yearly{
		Operations: f.OperationsPerYear, HoursOn: hoursPerYear * f.Duty(), Mean: f.Mean, EnergyShare: f.Duty(),
		Demand: (middle - l.Process.Off) / l.Process.Gain(),
	}, nil
}

// Busiest is the year of the demand at which the contact works most. The load
// keeps its power and the process its time constant and dead time; the ambient
// moves, and both settling temperatures with it. The rate follows the parabola
// N = 4·Nmax·X·(1−X) of a small differential without dead time (J. Henderson
// and K. Rengarajan, 1996, relation from memory) and is highest near X = 1/2,
// which is where the search begins. Errors are those of Steady.
func (l Loop) Busiest() (Yearly, error) {
	if err := l.Validate(); err != nil {
		return Yearly{}, err
	}
	at := func(x float64) (Yearly, error) { return l.atDemand(x).Yearly() }
	if _, err := at(0.5); err != nil {
		return Yearly{}, err
	}
	rate := func(x float64) float64 {
		y, err := at(x)
		if err != nil {
			return 0
		}
		return y.Operations
	}
	return at(highest(rate, 0.02, 0.98))
}

// atDemand moves the ambient so that the middle of the thresholds lies at a
// share of the way between settling off and on.
func (l Loop) atDemand(x float64) Loop {
	gain := l.Process.Gain()
	l.Process.Off = (l.Switching.Make+l.Switching.Break)/2 - x*gain
	l.Process.On = l.Process.Off + gain
	return l
}

// highest finds the place of the highest value of a function with one peak, to
// a part in a million, by golden section.
func highest(f func(float64) float64, a, b float64) float64 {
	golden := (math.Sqrt(5) - 1) / 2
	width := b - a
	c, d := b-golden*(b-a), a+golden*(b-a)
	fc, fd := f(c), f(d)
	for b-a > 1e-6*width {
		if fc >= fd {
			b, d, fd = d, c, fc
			c = b - golden*(b-a)
			fc = f(c)
		} else {
			a, c, fc = c, d, fd
			d = a + golden*(b-a)
			fd = f(d)
		}
	}
	return (a + b) / 2
}
