package thermal

import (
	"fmt"
	"math"
)

// Bound is the range that an intermediate result of an integer computation
// cannot leave, for any input and in any order.
type Bound struct {
	Name      string
	Low, High int64
}

// fits32 reports whether every bound lies in a signed 32-bit integer.
func fits32(bounds []Bound) error {
	for _, b := range bounds {
		if b.Low < math.MinInt32 || b.High > math.MaxInt32 {
			return &InputError{b.Name, float64(max(-b.Low, b.High)), "it must stay within 32 bits"}
		}
	}
	return nil
}

func symmetric(name string, v int64) Bound { return Bound{name, -v, v} }

// FilterPlan is a first-order lag in whole numbers,
//
//	y += (x·Scale − y) / Divisor,   result y / Scale,
//
// with division towards zero as in C and Go. As the move is never longer than
// the way, y stays between the least and the greatest x·Scale.
type FilterPlan struct {
	Divisor     int64
	Scale       int64   // a power of two
	Lag         float64 // s that the divisor really gives: −step / ln(1 − 1/Divisor)
	LagError    float64 // relative, against the lag asked for
	SteadyError float64 // counts, furthest that y/Scale stays from a constant x: (Divisor−1)/Scale
	Bounds      []Bound
}

// PlanFilter chooses divisor and scale for a lag in s, called every step s, of
// a reading between low and high counts, so that the result stays within
// tolerance counts of a constant reading. The smallest scale that does it is
// taken. It returns *InputError where 32 bits do not hold it: call it less
// often then.
func PlanFilter(lag, step float64, low, high int64, tolerance float64) (FilterPlan, error) {
	err := firstError(notNegative("software lag", lag), positive("step", step), positive("tolerance", tolerance))
	if err != nil {
		return FilterPlan{}, err
	}
	if low >= high || low < math.MinInt32/2 || high > math.MaxInt32/2 {
		return FilterPlan{}, &InputError{"highest count", float64(high), fmt.Sprintf("it must be above the lowest (%d), and both within 31 bits", low)}
	}
	p := FilterPlan{Divisor: 1, Scale: 1}
	if lag > 0 {
		n := math.Round(1 / -math.Expm1(-step/lag))
		if n > math.MaxInt32/4 {
			return FilterPlan{}, &InputError{"software lag", lag, "it is too many steps long; call the filter less often"}
		}
		p.Divisor = int64(n)
	}
	for float64(p.Divisor-1)/float64(p.Scale) > tolerance {
		p.Scale *= 2
		if p.Scale > math.MaxInt32 {
			break
		}
	}
	if p.Divisor > 1 {
		p.Lag = -step / math.Log1p(-1/float64(p.Divisor))
	}
	if lag > 0 {
		p.LagError = p.Lag/lag - 1
	}
	p.SteadyError = float64(p.Divisor-1) / float64(p.Scale)
	p.Bounds = []Bound{
		{"x·Scale and y", low * p.Scale, high * p.Scale},
		symmetric("x·Scale − y", (high-low)*p.Scale),
		symmetric("the move of y", (high-low)*p.Scale/p.Divisor),
	}
	if err := fits32(p.Bounds); err != nil {
		return p, &InputError{"software lag", lag, fmt.Sprintf("with counts from %d to %d it needs more than 32 bits to stay within %g counts; call the filter less often", low, high, tolerance)}
	}
	return p, nil
}

// Next is one step of the filter.
func (p FilterPlan) Next(y, x int32) int32 {
	return y + (x*int32(p.Scale)-y)/int32(p.Divisor)
}

// Fraction is a factor as Mul/Div.
type Fraction struct {
	Mul, Div int64
	Error    float64 // relative, against the factor asked for
}

// fraction takes the smallest power-of-two divisor with which the factor is
// met within a tenth of a percent, or else the finest for which inputs up to
// limit, times Mul, plus room·Div, stay within 32 bits. Mul is 0 for a factor
// of 0.
func fraction(what string, factor float64, limit, room int64) (Fraction, error) {
	if factor == 0 {
		return Fraction{Mul: 0, Div: 1}, nil
	}
	best := Fraction{Error: math.Inf(1)}
	for div := int64(1); div <= 1<<24; div *= 2 {
		mul := math.Round(factor * float64(div))
		if mul*float64(limit)+float64(room)*float64(div) > math.MaxInt32 {
			break
		}
		if e := mul/float64(div)/factor - 1; mul >= 1 && math.Abs(e) < math.Abs(best.Error) {
			best = Fraction{int64(mul), div, e}
		}
		if math.Abs(best.Error) <= closeFraction {
			return best, nil
		}
	}
	if math.Abs(best.Error) > mostFractionError {
		return best, &InputError{what, factor, fmt.Sprintf("as a fraction it cannot be held within 32 bits and %g %%; change the control's step or the resolution of its reading", 100*mostFractionError)}
	}
	return best, nil
}

// closeFraction is near enough to look no further.
const closeFraction = 1e-3

// mostFractionError is how far an action may be from the one asked for.
const mostFractionError = 0.05

// Full is the whole output in the program: permille.
const Full = 1000

// PIDRequest is a control to be put into whole numbers.
type PIDRequest struct {
	Settings     Settings
	CountsPerK   float64 // counts of the reading for one kelvin, above 0
	Low, High    int64   // least and greatest reading, counts
	Step         float64 // s between calls
	LeastOutput  int64   // permille, 0 to Full
	MostOutput   int64   // permille, 0 to Full, above LeastOutput
	SmoothFactor float64 // derivative: Td over the lag of its filter; 0: 8, common practice
}

// PIDPlan is a PID control in whole numbers, with every intermediate within 32
// bits. With e the deviation in counts, positive where more output is wanted,
// clipped to ±Clip, and y a filtered reading (Filter; only with derivative
// action):
//
//	p = e·P.Mul / P.Div
//	d = (y before − y)·D.Mul / D.Div
//	out = p + sum/I.Div + d, clipped to LeastOutput … MostOutput
//	sum += e·I.Mul, clipped to LeastOutput·I.Div … MostOutput·I.Div,
//	       but not while out is clipped and e pushes it further out
//
// with division towards zero. Derivative acts on the reading, not on the set
// point. The integral loses nothing to rounding: one count of deviation moves
// it in every step.
type PIDPlan struct {
	Clip                    int64
	P, I, D                 Fraction
	Filter                  FilterPlan
	LeastOutput, MostOutput int64
	Bounds                  []Bound
	OutputError             float64 // permille, most that the divisions cut off: less than 1 for each action
	PerCount                float64 // permille of output that one count moves by the proportional action
	Doubts                  []string
}

// clipBeyond is how many times the whole output the proportional action may
// ask for before the deviation is clipped: beyond it nothing changes.
const clipBeyond = 4

// PlanPID chooses the multipliers and divisors of a PID control. It returns
// *InputError where an action cannot be held within 32 bits and 5 %.
func PlanPID(r PIDRequest) (PIDPlan, error) {
	s := r.Settings.Parallel()
	err := firstError(
		positive("control gain", s.Kc), notNegative("integral time", s.Ti), notNegative("derivative time", s.Td),
		positive("counts per kelvin", r.CountsPerK), positive("step", r.Step), notNegative("smoothing of the derivative", r.SmoothFactor),
	)
	if err != nil {
		return PIDPlan{}, err
	}
	if r.LeastOutput < 0 || r.MostOutput > Full || r.LeastOutput >= r.MostOutput {
		return PIDPlan{}, &InputError{"most output", float64(r.MostOutput), fmt.Sprintf("it must be above the least (%d), and both within 0 to %d", r.LeastOutput, Full)}
	}
	if r.Low >= r.High || r.Low < math.MinInt16 || r.High > math.MaxUint16 {
		return PIDPlan{}, &InputError{"highest count", float64(r.High), "counts must rise and stay within 16 bits"}
	}
	if s.Td > 0 && s.Ti == 0 && r.Step > s.Td {
		return PIDPlan{}, &InputError{"step", r.Step, "it must not be longer than the derivative time"}
	}
	p := PIDPlan{LeastOutput: r.LeastOutput, MostOutput: r.MostOutput}
	p.PerCount = Full * s.Kc / r.CountsPerK
	p.Clip = min(r.High-r.Low, max(16, int64(math.Ceil(clipBeyond*Full/p.PerCount))))
	if p.P, err = fraction("proportional action per count", p.PerCount, p.Clip, 0); err != nil {
		return p, err
	}
	p.OutputError = 1
	if s.Ti > 0 {
		if p.I, err = fraction("integral action per count and step", p.PerCount*r.Step/s.Ti, p.Clip, Full); err != nil {
			return p, err
		}
		p.OutputError++
	} else {
		p.I = Fraction{0, 1, 0}
	}
	if err = p.planDerivative(s, r); err != nil {
		return p, err
	}
	p.bounds(r)
	p.doubts()
	return p, fits32(p.Bounds)
}

// planDerivative chooses the filter and the fraction of the derivative action.
func (p *PIDPlan) planDerivative(s Settings, r PIDRequest) error {
	p.D = Fraction{0, 1, 0}
	p.Filter = FilterPlan{Divisor: 1, Scale: 1}
	if s.Td == 0 {
		return nil
	}
	smooth := r.SmoothFactor
	if smooth == 0 {
		smooth = 8
	}
	var err error
	if p.Filter, err = PlanFilter(s.Td/smooth, r.Step, r.Low, r.High, 1.0/16); err != nil {
		return err
	}
	move := (r.High - r.Low) * p.Filter.Scale / p.Filter.Divisor
	p.D, err = fraction("derivative action per count", p.PerCount*s.Td/r.Step/float64(p.Filter.Scale), max(1, move), 0)
	p.OutputError++
	return err
}

func (p *PIDPlan) bounds(r PIDRequest) {
	move := max(1, (r.High-r.Low)*p.Filter.Scale/p.Filter.Divisor)
	pMost, dMost := p.Clip*p.P.Mul/p.P.Div, move*p.D.Mul/p.D.Div
	p.Bounds = append([]Bound{
		symmetric("deviation before clipping", r.High-r.Low),
		symmetric("e·P.Mul", p.Clip*p.P.Mul),
		symmetric("e·I.Mul", p.Clip*p.I.Mul),
		{"sum + e·I.Mul", p.LeastOutput*p.I.Div - p.Clip*p.I.Mul, p.MostOutput*p.I.Div + p.Clip*p.I.Mul},
		symmetric("(y before − y)·D.Mul", move*p.D.Mul),
		symmetric("p + sum/I.Div + d", pMost+dMost+Full),
	}, p.Filter.Bounds...)
}

// doubts says what a reviewer should know of the numbers.
func (p *PIDPlan) doubts() {
	if p.PerCount > 100 {
		p.Doubts = append(p.Doubts, fmt.Sprintf("one count moves the output by %.0f permille: the control follows the converter's noise", p.PerCount))
	}
	for _, f := range []struct {
		what string
		Fraction
	}{{"proportional", p.P}, {"integral", p.I}, {"derivative", p.D}} {
		if math.Abs(f.Error) > 0.01 {
			p.Doubts = append(p.Doubts, fmt.Sprintf("the %s action is %+.1f %% off, as 32 bits hold it", f.what, 100*f.Error))
		}
	}
}

// PIDState is the memory of a PID control in whole numbers.
type PIDState struct {
	Sum     int32
	Reading int32 // filtered, scaled
	Started bool
}

// Start sets the memory so that the first output is the given one, as far as
// the limits allow: no bump. Deviation and reading are in counts.
func (p PIDPlan) Start(output, deviation, reading int32) PIDState {
	e := clip(int64(deviation), -p.Clip, p.Clip)
	sum := clip((int64(output)-e*p.P.Mul/p.P.Div), p.LeastOutput, p.MostOutput) * p.I.Div
	return PIDState{Sum: int32(sum), Reading: reading * int32(p.Filter.Scale), Started: true}
}

// Next is one step of the control: the output in permille, for a deviation
// (positive: more output wanted) and a reading in counts. A rising reading
// lowers the output through the derivative; for a cooling plant the caller
// turns both signs.
func (p PIDPlan) Next(m *PIDState, deviation, reading int32) int32 {
	e := int32(clip(int64(deviation), -p.Clip, p.Clip))
	before := m.Reading
	m.Reading = p.Filter.Next(m.Reading, reading)
	least, most := int32(p.LeastOutput), int32(p.MostOutput)
	out := e*int32(p.P.Mul)/int32(p.P.Div) + m.Sum/int32(p.I.Div) + (before-m.Reading)*int32(p.D.Mul)/int32(p.D.Div)
	if !(out > most && e > 0) && !(out < least && e < 0) {
		m.Sum = min(max(m.Sum+e*int32(p.I.Mul), least*int32(p.I.Div)), most*int32(p.I.Div))
	}
	return min(max(out, least), most)
}

func clip(v, low, high int64) int64 { return min(max(v, low), high) }

// WindowPlan is time proportioning in whole steps: in every window of Steps
// steps the output is on for the first (permille·Steps + 500)/1000, none where
// that is less than MinPulse, all where less than MinPulse would be left.
type WindowPlan struct {
	Steps, MinPulse int64
	Resolution      float64 // permille that one step is worth
	Least, Most     float64 // permille, between which the output is really proportional
	Bounds          []Bound
}

// PlanWindow turns window and least pulse, in s, into steps.
func PlanWindow(window, minPulse, step float64) (WindowPlan, error) {
	err := firstError(positive("window", window), notNegative("least pulse", minPulse), positive("step", step))
	if err != nil {
		return WindowPlan{}, err
	}
	w := WindowPlan{Steps: int64(math.Min(1e15, math.Round(window/step))), MinPulse: int64(math.Min(1e15, math.Ceil(minPulse/step-1e-9)))}
	if w.Steps < 2 || 2*w.MinPulse > w.Steps {
		return WindowPlan{}, &InputError{"window", window, "it must hold at least two steps and two of the least pulses"}
	}
	w.Resolution = float64(Full) / float64(w.Steps)
	w.Least = float64(w.MinPulse) * w.Resolution
	w.Most = Full - w.Least
	w.Bounds = []Bound{{"permille·Steps + 500", 0, Full*w.Steps + 500}}
	return w, fits32(w.Bounds)
}

// On is how many of a window's steps the output is on.
func (w WindowPlan) On(permille int32) int32 {
	on := (permille*int32(w.Steps) + Full/2) / Full
	switch {
	case on < int32(w.MinPulse):
		return 0
	case int32(w.Steps)-on < int32(w.MinPulse):
		return int32(w.Steps)
	}
	return on
}
