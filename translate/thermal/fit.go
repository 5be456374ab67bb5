package thermal

import (
	"errors"
	"fmt"
	"math"
	"slices"

	"gonum.org/v1/gonum/optimize"
)

// Known is what is known of the plant besides a log.
type Known struct {
	SettlesOff  Estimate // degC, where the medium settles without the load
	Make, Break Estimate // degC, of the control that made the log
	Lag         float64  // s, of its element; read only with Make and Break
}

// Fit says how well a first-order process with dead time reproduces a log.
type Fit struct {
	Rows, Used int     // rows of the log, and rows that the fit is made on
	RMS        float64 // K, root mean square of measured less computed
	Worst      float64 // K, largest magnitude of the same
	Noise      float64 // K, scatter from row to row: what no process would explain
	FromCycle  bool    // rates, dead time and Process are those of the mean cycle, not of the least squares
	Doubt      string  // empty where the residuals are no more than noise; otherwise what they say

	On, Off     float64 // s, mean of the undisturbed complete phases in the log; NaN where there is none
	High, Low   float64 // degC, mean of the extremes of the undisturbed complete phases, as logged
	Switchings  int
	LeftOut     []LeftOut
	Correlation float64 // of neighbouring residuals, 0 to 1; the standard errors are widened by it
}

// LeftOut is a time that the fit does not use.
type LeftOut struct {
	From, To float64 // s
	Why      string
}

// Errors of a log from which nothing can be identified.
var (
	ErrTooShort  = errors.New("the log is too short")
	ErrOneSided  = errors.New("the log never shows the load in both states")
	ErrNoWhole   = errors.New("the log holds no complete phase")
	ErrDisturbed = errors.New("no undisturbed time is left in the log")
)

const (
	leastRows       = 20   // rows in which a process can be told from noise
	gapFactor       = 5    // a pause so many times the usual distance of rows is a gap
	odd             = 0.2  // a phase whose time is so far from the others of its kind is disturbed
	oddResidual     = 2.5  // a phase whose residuals are so many times the usual ones is disturbed
	worstOfNoise    = 6.0  // likewise the largest of them
	moreThanNoise   = 2.0  // residuals so many times the scatter are not first order
	straightTau     = 50   // a time constant so many times the longest phase is as good as a straight line
	shortTau        = 0.05 // a time constant so small a part of the shortest phase is none
	tauError        = 0.25 // relative standard error above which a time constant is not determined
	longEnough      = 1.0  // a phase so many time constants long shows where it settles
	residualQuality = 1.5  // and only if the residuals are no more than so many times the noise
)

// Identify fits a first-order process with dead time to a log by least
// squares. Time constant and dead time, as logarithms, are found by the
// simplex of Nelder and Mead; the settling temperatures and the temperature at
// the start of every stretch enter linearly and are solved for exactly within
// (variable projection, G. H. Golub and V. Pereyra, 1973). The dead time need
// not be a whole number of rows. Standard errors come from the Jacobian,
// widened by (1+ρ)/(1−ρ) for the correlation ρ of neighbouring residuals, and
// by what it does that a switching is only known to lie between two rows.
//
// Gaps, phases whose time is out of the ordinary, phases after those, and
// phases that do not fit with the others are left out and listed.
//
// Where the residuals say that the plant is not first order, rates, dead time
// and Process are those of the mean undisturbed cycle instead, as Observed
// works them out, so that the cycle at least is met; Fit still tells how far
// the first-order course is from the log.
//
// Errors: ErrTooShort, ErrOneSided, ErrNoWhole, ErrDisturbed, wrapped with
// what was found, and *InputError.
func Identify(rows []Row, k Known) (Identified, error) {
	for _, e := range [3]Estimate{k.SettlesOff, k.Make, k.Break} {
		if e.Known && finite("", e.Value) != nil {
			return Identified{}, &InputError{"a figure given with the log", e.Value, "a number is needed"}
		}
	}
	if err := notNegative("lag", k.Lag); err != nil {
		return Identified{}, err
	}
	g, err := newLog(rows)
	if err != nil {
		return Identified{}, err
	}
	g.leaveOutOdd()
	f, err := g.fit(k)
	if err != nil {
		return Identified{}, err
	}
	g.skipUnknownPast(f.dead)
	if f, err = g.fit(k); err != nil {
		return Identified{}, err
	}
	if g.leaveOutMisfits(f) {
		if f, err = g.fit(k); err != nil {
			return Identified{}, err
		}
	}
	return f.identified()
}

// phase is a time in which the contact does not change.
type phase struct {
	from, to    float64 // s
	first, last int     // rows, last included
	on          bool
	whole       bool // both its switchings are in the log
	gaps        bool
	out         string // why it is not used; empty: it is
}

// logbook is a log cut into phases.
type logbook struct {
	rows   []Row
	usual  float64 // s, usual distance of rows
	phases []phase
	gaps   []LeftOut
	begin  float64 // s, before which a switching that is not in the log may still be felt
}

// newLog cuts a log into phases. A switching is taken as halfway between the
// two rows that show it.
func newLog(rows []Row) (*logbook, error) {
	if len(rows) < leastRows {
		return nil, fmt.Errorf("%w: %d rows, and at least %d are needed", ErrTooShort, len(rows), leastRows)
	}
	steps := make([]float64, len(rows)-1)
	for i := range steps {
		steps[i] = rows[i+1].Time - rows[i].Time
		if !(steps[i] > 0) {
			return nil, &InputError{fmt.Sprintf("time_s of row %d", i+2), rows[i+1].Time, "times must rise"}
		}
	}
	slices.Sort(steps)
	g := &logbook{rows: rows, usual: steps[len(steps)/2], begin: math.Inf(-1)}
	p := phase{from: rows[0].Time, on: rows[0].On}
	for i := 1; i < len(rows); i++ {
		pause := rows[i].Time - rows[i-1].Time
		if pause > gapFactor*g.usual {
			p.gaps = true
			g.gaps = append(g.gaps, LeftOut{rows[i-1].Time, rows[i].Time, "nothing logged"})
		}
		if rows[i].On == p.on {
			continue
		}
		at := (rows[i].Time + rows[i-1].Time) / 2
		p.to, p.last = at, i-1
		p.whole = len(g.phases) > 0 && pause <= gapFactor*g.usual
		g.phases = append(g.phases, p)
		p = phase{from: at, first: i, on: rows[i].On}
		if pause > gapFactor*g.usual {
			p.out = "its switching fell into a gap"
		}
	}
	p.to, p.last = rows[len(rows)-1].Time, len(rows)-1
	g.phases = append(g.phases, p)
	switch {
	case len(g.phases) == 1:
		return nil, fmt.Errorf("%w: it is %s from beginning to end", ErrOneSided, onOff(p.on))
	case len(g.phases) == 2:
		return nil, fmt.Errorf("%w: it shows one switching only, and a dead time and two rates need at least two", ErrNoWhole)
	}
	return g, nil
}

func onOff(on bool) string {
	if on {
		return "on"
	}
	return "off"
}

// leaveOutOdd marks phases whose time is out of the ordinary, and those that
// follow one, which start from a disturbed state.
func (g *logbook) leaveOutOdd() {
	for _, on := range [2]bool{false, true} {
		var times []float64
		for _, p := range g.phases {
			if p.on == on && p.whole {
				times = append(times, p.to-p.from)
			}
		}
		if len(times) < 3 {
			continue
		}
		slices.Sort(times)
		usual := times[len(times)/2]
		for i := range g.phases {
			p := &g.phases[i]
			if p.on != on || !p.whole || math.Abs(p.to-p.from-usual) <= odd*usual {
				continue
			}
			p.out = fmt.Sprintf("%s for %.0f s where %.0f s is usual: disturbed", onOff(on), p.to-p.from, usual)
			if i+1 < len(g.phases) && g.phases[i+1].out == "" {
				g.phases[i+1].out = "follows a disturbed phase"
			}
		}
	}
}

// skipUnknownPast leaves out the beginning, in which the medium may still feel
// a switching from before the log.
func (g *logbook) skipUnknownPast(dead float64) {
	first := g.phases[0]
	g.begin = math.Min(first.from+1.5*dead+g.usual, first.to)
	g.gaps = append([]LeftOut{{first.from, g.begin, "what was switched before may still be felt"}}, g.gaps...)
}

// leaveOutMisfits marks phases whose residuals stand out from the others of
// their kind, and reports whether there were any.
func (g *logbook) leaveOutMisfits(f *logFit) bool {
	found := false
	for _, on := range [2]bool{false, true} {
		var each []float64
		for i, p := range g.phases {
			if r, n := f.phaseRMS(i); p.on == on && n > 0 {
				each = append(each, r)
			}
		}
		if len(each) < 3 {
			continue
		}
		slices.Sort(each)
		usual := math.Max(each[(len(each)-1)/2], f.noise())
		for i, p := range g.phases {
			if r, n := f.phaseRMS(i); p.on == on && n > 0 && r > oddResidual*usual {
				g.phases[i].out = fmt.Sprintf("%.2g K off the course, where the others of its kind keep within %.2g K: disturbed", r, usual)
				found = true
			}
		}
	}
	return found
}

// stretches are the runs of rows that the fit uses: undisturbed phases in a
// row, cut at gaps. Each has a starting temperature of its own.
func (g *logbook) stretches() [][2]int {
	var out [][2]int
	open := false
	for _, p := range g.phases {
		if p.out != "" {
			open = false
			continue
		}
		for i := p.first; i <= p.last; i++ {
			if g.rows[i].Time < g.begin {
				continue
			}
			if open && g.rows[i].Time-g.rows[i-1].Time > gapFactor*g.usual {
				open = false
			}
			if !open {
				out = append(out, [2]int{i, i})
				open = true
			}
			out[len(out)-1][1] = i
		}
	}
	return slices.DeleteFunc(out, func(s [2]int) bool { return s[1]-s[0] < 5 })
}

// longest is the time of the longest phase.
func (g *logbook) longest() float64 {
	longest := 0.0
	for _, p := range g.phases {
		longest = math.Max(longest, p.to-p.from)
	}
	return longest
}

// shortest is the time of the shortest whole phase that is used; a dead time
// longer than that cannot be told.
func (g *logbook) shortest() float64 {
	shortest := g.longest()
	for _, p := range g.phases {
		if p.whole && p.out == "" {
			shortest = math.Min(shortest, p.to-p.from)
		}
	}
	return shortest
}

// fit finds the best process.
func (g *logbook) fit(k Known) (*logFit, error) {
	f := &logFit{log: g, known: k, stretches: g.stretches()}
	states := [2]bool{}
	for _, s := range f.stretches {
		for i := s[0]; i <= s[1]; i++ {
			f.used++
			f.middle += g.rows[i].Temperature
			if g.rows[i].On {
				states[1] = true
			} else {
				states[0] = true
			}
		}
	}
	if f.used < leastRows || !states[0] || !states[1] {
		return nil, fmt.Errorf("%w: %d rows of %d", ErrDisturbed, f.used, len(g.rows))
	}
	f.middle /= float64(f.used)
	tau, dead := f.gridStart()
	problem := optimize.Problem{Func: func(x []float64) float64 {
		return math.Log(f.squares(math.Exp(x[0]), math.Exp(x[1])) + 1e-300)
	}}
	settings := &optimize.Settings{Converger: &optimize.FunctionConverge{Absolute: 1e-10, Iterations: 60}, FuncEvaluations: 2000}
	best, err := optimize.Minimize(problem, []float64{math.Log(tau), math.Log(dead)}, settings, &optimize.NelderMead{SimplexSize: 0.2})
	if err != nil {
		return nil, fmt.Errorf("the fit did not come to an end: %w", err)
	}
	f.tau, f.dead = math.Exp(best.X[0]), math.Exp(best.X[1])
	f.solve(f.tau, f.dead)
	return f, nil
}

// gridStart tries a coarse grid; the valley of the squares is long and curved,
// and a start in it saves the search.
func (f *logFit) gridStart() (tau, dead float64) {
	longest, shortest, best := f.log.longest(), f.log.shortest(), math.Inf(1)
	for _, t := range [...]float64{0.3, 1, 3, 10, 30} {
		for _, d := range [...]float64{0.01, 0.05, 0.1, 0.2, 0.4} {
			if s := f.squares(t*longest, d*shortest); s < best {
				best, tau, dead = s, t*longest, d*shortest
			}
		}
	}
	return tau, dead
}
