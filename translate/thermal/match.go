package thermal

import (
	"fmt"
	"math"
)

// Keep is what a new control keeps of the old one.
type Keep string

// What can be kept.
const (
	KeepThresholds Keep = "thresholds"
	KeepSwing      Keep = "swing"
	KeepCycleRate  Keep = "cycle_rate"
)

// MatchRequest asks for a new control that keeps a chosen thing.
type MatchRequest struct {
	Old             Loop
	Keep            Keep
	NewLag          float64     // s, of the new probe
	NewAnticipator  Anticipator // that the program carries on; zero: none
	MinOn, MinOff   float64     // s, of the new control
	MostOperations  float64     // a year, that the new contact's life allows; 0: not limited
	MinDifferential float64     // K between the new make and break, such as two counts; 0: any above none
	LowestEdge      Estimate    // degC that no new threshold may go below, where there is one
	HighestEdge     Estimate    // degC that no new threshold may go above, where there is one
}

// Matched is a new control.
type Matched struct {
	Feasible  bool
	Switching Switching
	Filter    float64 // s, software lag; 0: none
	Old, New  Figures
	Because   string   // how it was found; where not feasible, what stands in the way and what the nearest is
	Costs     []string // what the choice costs, against the old control
}

// Match finds thresholds, and where they are not free a software lag, with
// which the new control keeps the chosen thing. Where that cannot be done
// within minimum times, contact life and the edges' limits, Feasible is false
// and the nearest control that keeps the limits is returned. Errors:
// *InputError, and *NoCycle where the old loop does not cycle or no new one
// near does.
//
// Keeping the swing keeps everything: between the same high and low the medium
// takes the same times. The thresholds are then what the new, quicker probe
// reads at the moments at which the old control switched, exactly.
func Match(r MatchRequest) (Matched, error) {
	err := firstError(r.Old.Validate(), notNegative("new lag", r.NewLag), notNegative("min_on", r.MinOn), notNegative("min_off", r.MinOff),
		notNegative("operations a year", r.MostOperations), notNegative("least differential", r.MinDifferential))
	if err != nil {
		return Matched{}, err
	}
	old, err := r.Old.Steady()
	if err != nil {
		return Matched{}, err
	}
	m := matching{MatchRequest: r, old: old}
	var out Matched
	switch r.Keep {
	case KeepThresholds:
		out, err = m.thresholds()
	case KeepSwing:
		out, err = m.swing()
	case KeepCycleRate:
		out, err = m.rate()
	default:
		return Matched{}, &InputError{"match", math.NaN(), fmt.Sprintf("%q is none of thresholds, swing, cycle_rate", string(r.Keep))}
	}
	if err != nil {
		return Matched{}, err
	}
	return m.within(out)
}

// LagAt finds the software lag with which a control with the given thresholds,
// in degC, keeps the swing or the rate: for thresholds that were rounded since
// Match chose a lag. Feasible is false where none does. Errors are those of
// Match.
func LagAt(r MatchRequest, makes, breaks float64) (Matched, error) {
	old, err := r.Old.Steady()
	if err != nil {
		return Matched{}, err
	}
	m := matching{MatchRequest: r, old: old}
	m.Old.Switching.Make, m.Old.Switching.Break = makes, breaks // what bySoftwareLag keeps
	if err := m.Old.Validate(); err != nil {
		return Matched{}, err
	}
	miss := func(f Figures) float64 { return f.Period() - old.Period() }
	if r.Keep == KeepSwing {
		miss = func(f Figures) float64 { return f.Swing() - old.Swing() }
	}
	return m.bySoftwareLag("with rounded thresholds", miss)
}

// Widened widens the differential of a new control about its middle, with its
// software lag as it is, until it operates no oftener than r.MostOperations a
// year. Feasible is false, with the reason, where no differential within the
// limits of the request does. Errors are those of Match.
func Widened(r MatchRequest, s Switching, filter float64) (Matched, error) {
	old, err := r.Old.Steady()
	if err != nil {
		return Matched{}, err
	}
	if err := positive("operations a year", r.MostOperations); err != nil {
		return Matched{}, err
	}
	m := matching{MatchRequest: r, old: old}
	middle, half := (s.Make+s.Break)/2, (s.Break-s.Make)/2
	slower := func(factor float64) float64 {
		f, err := m.loop(middle+factor*half, middle-factor*half, filter).Steady()
		if err != nil {
			return math.NaN()
		}
		return f.Period() - secondsPerYear/r.MostOperations
	}
	factor, found := crossing(slower, 1, 0.1, 1e3)
	if !found || half == 0 {
		return Matched{Old: old, Because: fmt.Sprintf("no differential brings it to %.0f operations a year", r.MostOperations)}, nil
	}
	makes, breaks := middle-factor*half, middle+factor*half
	if why := m.allowed(makes, breaks); why != "" {
		return Matched{Old: old, Because: why}, nil
	}
	return m.matched(m.loop(breaks, makes, filter), "a differential of %.3g K about the same middle", 2*factor*math.Abs(half))
}

type matching struct {
	MatchRequest
	old Figures
}

// loop is the new control with given thresholds and software lag.
func (m matching) loop(brk, make, filter float64) Loop {
	return Loop{
		Process:   m.Old.Process,
		Sensing:   Sensing{Lag: m.NewLag, Filter: filter, Anticipator: m.NewAnticipator},
		Switching: Switching{Make: make, Break: brk, MinOn: m.MinOn, MinOff: m.MinOff},
	}
}

func (m matching) matched(l Loop, because string, v ...any) (Matched, error) {
	f, err := l.Steady()
	if err != nil {
		return Matched{}, err
	}
	return Matched{Feasible: true, Switching: l.Switching, Filter: l.Sensing.Filter, Old: m.old, New: f, Because: fmt.Sprintf(because, v...)}, nil
}

func (m matching) thresholds() (Matched, error) {
	s := m.Old.Switching
	return m.matched(m.loop(s.Break, s.Make, 0), "make and break as they were")
}

// swing reads off what the new probe shows at the old control's switchings.
func (m matching) swing() (Matched, error) {
	o := newRelay(m.Old)
	p, no := o.periodic()
	if no != nil {
		return Matched{}, no
	}
	n := newRelay(m.loop(m.Old.Switching.Break, m.Old.Switching.Make, 0))
	q := periodic{relay: &n, onTime: p.onTime, offTime: p.offTime}
	atMake, atBreak := q.misses()
	make := n.real(n.make + atMake)
	brk := n.real(n.brk + atBreak)
	if m.allowed(make, brk) == "" {
		return m.matched(m.loop(brk, make, 0), "thresholds at which the new probe stands as the old control switches: the medium does exactly what it did")
	}
	return m.bySoftwareLag(m.allowed(make, brk), func(f Figures) float64 { return f.Swing() - m.old.Swing() })
}

// rate widens or narrows the differential about its middle until the new
// control switches as often as the old.
func (m matching) rate() (Matched, error) {
	s := m.Old.Switching
	middle, half := (s.Make+s.Break)/2, (s.Break-s.Make)/2
	slower := func(factor float64) float64 {
		f, err := m.loop(middle+factor*half, middle-factor*half, 0).Steady()
		if err != nil {
			return math.NaN()
		}
		return f.Period() - m.old.Period()
	}
	why := "no differential about the old middle gives the old rate"
	if held := slower(1); held > 0 && m.heldAt(middle, half) {
		why = "a minimum time alone makes the cycle longer than the old one"
	}
	if half != 0 {
		if factor, found := crossing(slower, 1e-3, 1, 20); found {
			make, brk := middle-factor*half, middle+factor*half
			if why = m.allowed(make, brk); why == "" {
				return m.matched(m.loop(brk, make, 0), "differential %+.3g K about the same middle, so that the rate is the old one", 2*math.Abs(half)*(factor-1))
			}
		}
	}
	return m.bySoftwareLag(why, func(f Figures) float64 { return f.Period() - m.old.Period() })
}

// heldAt reports whether a minimum time holds the new control with thresholds
// about a middle.
func (m matching) heldAt(middle, half float64) bool {
	f, err := m.loop(middle+half, middle-half, 0).Steady()
	return err == nil && (f.HeldOn || f.HeldOff)
}

// bySoftwareLag keeps the thresholds and slows the reading down instead.
func (m matching) bySoftwareLag(why string, miss func(Figures) float64) (Matched, error) {
	s := m.Old.Switching
	at := func(lag float64) float64 {
		f, err := m.loop(s.Break, s.Make, lag).Steady()
		if err != nil {
			return math.NaN()
		}
		return miss(f)
	}
	if v := at(0); v >= 0 || math.IsNaN(v) {
		out, err := m.thresholds()
		out.Feasible = false
		out.Because = why + "; and the new control is no quicker than the old one with the old thresholds, so that a software lag does not help. Nearest: the old thresholds"
		return out, err
	}
	scale := m.Old.Sensing.Lag + m.Old.Sensing.Filter + m.Old.Process.Dead + 1e-3*m.old.Period()
	lag, found := crossing(at, 0, scale, 1e3)
	if !found {
		out, err := m.thresholds()
		out.Feasible = false
		out.Because = why + "; and no software lag gives it. Nearest: the old thresholds"
		return out, err
	}
	return m.matched(m.loop(s.Break, s.Make, lag), "%s; thresholds as they were, with a software lag instead", why)
}

// allowed says what stands against a pair of thresholds, or nothing.
func (m matching) allowed(make, brk float64) string {
	s := m.Old.Switching
	apart := brk - make
	if m.Old.Process.Cooling() {
		apart = -apart
	}
	low, high := math.Min(make, brk), math.Max(make, brk)
	switch {
	case apart < m.MinDifferential || apart <= 0 && s.Make != s.Break:
		return fmt.Sprintf("make at %.4g and break at %.4g degC would leave a differential of %.3g K, and %.3g K is the least", make, brk, apart, m.MinDifferential)
	case m.LowestEdge.Known && low < m.LowestEdge.Value:
		return fmt.Sprintf("a threshold would be at %.4g degC, below the lowest allowed, %.4g degC", low, m.LowestEdge.Value)
	case m.HighestEdge.Known && high > m.HighestEdge.Value:
		return fmt.Sprintf("a threshold would be at %.4g degC, above the highest allowed, %.4g degC", high, m.HighestEdge.Value)
	}
	return ""
}

// within checks a control against contact life, and where it fails looks for
// the nearest that passes: the smallest software lag with the same thresholds.
func (m matching) within(out Matched) (Matched, error) {
	if out.Feasible && (out.New.HeldOn && !m.old.HeldOn || out.New.HeldOff && !m.old.HeldOff) && m.Keep != KeepThresholds {
		out.Feasible = false
		out.Because += "; a minimum time holds the command, so that it is not kept exactly. Nearest: as given, with the minimum time"
	}
	if m.MostOperations > 0 && out.New.OperationsPerYear > m.MostOperations*(1+1e-9) {
		s := out.Switching
		over := out.New.OperationsPerYear
		at := func(lag float64) float64 {
			f, err := m.loop(s.Break, s.Make, lag).Steady()
			if err != nil {
				return math.NaN()
			}
			return secondsPerYear/m.MostOperations - f.Period()
		}
		wanted := func(lag float64) float64 { return -at(lag) }
		lag, found := crossing(wanted, out.Filter, m.NewLag+m.Old.Process.Dead+1e-3*m.old.Period(), 1e3)
		why := fmt.Sprintf("%s: %.0f operations a year, and the contact's life allows %.0f", out.Because, over, m.MostOperations)
		if !found {
			out.Feasible, out.Because = false, why+"; no software lag brings it there"
		} else {
			near, err := m.matched(m.loop(s.Break, s.Make, lag), "%s. Nearest: a software lag of %.4g s with these thresholds", why, lag)
			if err != nil {
				return Matched{}, err
			}
			near.Feasible = false
			out = near
		}
	}
	return m.withCosts(out), nil
}

// withCosts says what the choice costs against the old control.
func (m matching) withCosts(out Matched) Matched {
	out.Costs = []string{
		fmt.Sprintf("operations a year: %.0f, before %.0f (%+.1f %%)", out.New.OperationsPerYear, m.old.OperationsPerYear, 100*(out.New.OperationsPerYear/m.old.OperationsPerYear-1)),
		fmt.Sprintf("swing of the medium: %.3g K, before %.3g K", out.New.Swing(), m.old.Swing()),
		fmt.Sprintf("mean of the medium: %.4g degC, before %.4g degC (%+.2g K)", out.New.Mean, m.old.Mean, out.New.Mean-m.old.Mean),
	}
	if out.Filter > 0 {
		out.Costs = append(out.Costs, fmt.Sprintf("a software lag of %.4g s: limits that read the same probe must not read it behind the lag", out.Filter))
	}
	return out
}

// crossing finds where a rising function passes 0, from a start outwards by
// doubling up to a number of times the scale. Places where the function is NaN
// count as not reached on the way up.
func crossing(f func(float64) float64, start, scale, times float64) (float64, bool) {
	low, high := start, start+scale
	v := f(low)
	if v == 0 {
		return low, true
	}
	if v > 0 {
		return 0, false
	}
	for !(f(high) >= 0) {
		if high-start > times*scale || math.IsNaN(f(high)) && high-start > scale {
			return 0, false
		}
		low, high = high, start+2*(high-start)
	}
	// False position of the Illinois kind where both ends have a value, halves
	// otherwise, and whenever it gains less than half in two steps.
	vLow, vHigh := f(low), f(high)
	side, width := 0, math.Inf(1)
	for i := range 200 {
		middle := (low + high) / 2
		if high-low <= 1e-13*math.Abs(high) || middle == low || middle == high {
			break
		}
		if straight := (low*vHigh - high*vLow) / (vHigh - vLow); straight > low && straight < high && (i%3 != 2 || high-low < width/2) {
			middle = straight
		}
		if i%3 == 2 {
			width = high - low
		}
		v := f(middle)
		if v >= 0 {
			high, vHigh = middle, v
			if side > 0 {
				vLow /= 2
			}
			side = 1
		} else {
			low, vLow = middle, v
			if side < 0 {
				vHigh /= 2
			}
			side = -1
		}
		if v == 0 {
			break
		}
	}
	return high, true
}
