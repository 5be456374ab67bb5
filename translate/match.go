package translate

import (
	"errors"
	"fmt"
	"math"

	"makebreak/survey"
	"makebreak/translate/sensing"
	"makebreak/translate/switching"
	"makebreak/translate/thermal"
)

// Match is what a new control asks of its program so that it keeps what the
// sheet wants kept of the old one.
type Match struct {
	Keep        thermal.Keep
	Make, Break float64            // degC, before they are rounded to counts
	Filter      thermal.FilterPlan // software lag; Lag 0: none
	Kept        bool               // the chosen thing is kept exactly
	Solved      bool               // thresholds or lag are not simply those of the sheet
	Working     string
	Costs       []string // against the old control, one a line
}

// leastYears is the life that a contact ought to reach: what the finding
// contact_life asks for.
const leastYears = 10

// tolerances are how far, in counts, the integers of a software lag may stay
// from a constant reading: the finest for which 32 bits suffice is taken.
var tolerances = [...]float64{0.125, 0.25, 0.5}

// match solves for what the new control has to ask of its program, where the
// process and the old control's cycle are known.
//
// What the sheet wants kept decides the program. The life of the contact does
// not: where the kept thing costs more than the contact lives for, the nearest
// control that does not is worked out beside it, for somebody to choose.
func (b *builder) match(c *survey.Control, chain *sensing.Chain) {
	if !cycles(c) || b.continuous(c) {
		return
	}
	l, fs, from, keep := b.driven(c), &b.spec.Figures, c.Match.Path, thermal.Keep(c.Match.V)
	asked := Match{Keep: keep, Make: c.MakesAt.V, Break: c.BreaksAt.V}
	r, reason := thermal.MatchRequest{}, "its load is not one that the sheet says drives the process"
	if l != nil {
		r, reason = b.matchRequest(c, chain, keep)
	}
	if reason == "" {
		found, err := thermal.Match(r)
		if err == nil {
			b.matched(c, l, chain, r, found)
			return
		}
		reason = err.Error()
	}
	asked.Working = "cannot be worked out: " + reason + ". Thresholds as they were"
	if keep != thermal.KeepThresholds {
		fs.add(c.ID.V, "match_kept", 0, "", from, asked.Working)
		b.spec.Matches[c.ID.V] = asked
	}
}

// matchRequest gathers what matching needs; reason says what is missing.
func (b *builder) matchRequest(c *survey.Control, chain *sensing.Chain, keep thermal.Keep) (r thermal.MatchRequest, reason string) {
	old, _, reason := b.oldLoop(c)
	if reason != "" {
		return r, reason
	}
	low, high := b.edgeLimits(c, chain)
	var warms thermal.Anticipator
	if anticipates(c) {
		warms = thermal.Anticipator{Rise: c.Anticipator.Rise.V, Lag: c.Anticipator.Lag.V}
	}
	return thermal.MatchRequest{
		NewAnticipator: warms,
		Old:            old, Keep: keep, NewLag: b.sensor(c.Sensor.V).Lag.V, MinOn: c.MinOn.V, MinOff: c.MinOff.V,
		MinDifferential: 2 * math.Max(chain.CountWidth(c.MakesAt.V), chain.CountWidth(c.BreaksAt.V)),
		LowestEdge:      thermal.Given(low), HighestEdge: thermal.Given(high),
	}, ""
}

// edgeLimits are how low and how high a new threshold may lie: inside what the
// probe can be believed in, short of every danger, and short of where a limit
// might trip, with its tolerance and the worst error of the new chain. The
// sheet's own thresholds are always allowed; where they are too near to a
// limit, a finding says so.
func (b *builder) edgeLimits(c *survey.Control, chain *sensing.Chain) (low, high float64) {
	worst := 0.0
	if budget, err := chain.Budget(c.BreaksAt.V); err == nil {
		worst = budget.WorstCase
	}
	low, high = chain.Valid()
	floor, ceiling := b.ends(c, worst, 1)
	low, high = math.Max(low, floor), math.Min(high, ceiling)
	return math.Min(low, math.Min(c.MakesAt.V, c.BreaksAt.V)), math.Max(high, math.Max(c.MakesAt.V, c.BreaksAt.V))
}

// ends are the nearest dangers and limits below and above a control, less an
// error in K and so many times the limits' own tolerances; infinite where
// there is none.
func (b *builder) ends(c *survey.Control, less, tolerances float64) (floor, ceiling float64) {
	floor, ceiling = math.Inf(-1), math.Inf(1)
	for _, d := range b.survey.Dangers {
		if d.Above.Set {
			ceiling = math.Min(ceiling, d.Above.V-less)
		}
		if d.Below.Set {
			floor = math.Max(floor, d.Below.V+less)
		}
	}
	load := b.driven(c)
	for _, x := range b.survey.Controls {
		tolerance := less + tolerances*x.Tolerance.V
		switch {
		case x == c || !x.Switching() || !x.BreaksAt.Set || x.Duty.V == survey.Operating, x.Plan.V != survey.Replace && !x.Cuts.Has(load.ID.V):
		case x.Action.V == survey.BreaksOnRise:
			ceiling = math.Min(ceiling, x.BreaksAt.V-tolerance)
		default:
			floor = math.Max(floor, x.BreaksAt.V+tolerance)
		}
	}
	return floor, ceiling
}

// matched notes the new control that was found, and the nearest one that the
// contact lives for, where that is another.
func (b *builder) matched(c *survey.Control, l *survey.Load, chain *sensing.Chain, r thermal.MatchRequest, found thermal.Matched) {
	fs, from := &b.spec.Figures, c.Match.Path
	m := Match{Keep: r.Keep, Make: found.Switching.Make, Break: found.Switching.Break, Kept: found.Feasible, Working: found.Because, Costs: found.Costs}
	if found.Filter > 0 {
		found.Filter = b.lagAfterRounding(c, chain, r, found.Filter)
		plan, err := b.lagInIntegers(c, chain, found.Filter)
		if err != nil {
			m.Kept = false
			m.Working += "; but " + err.Error() + ": thresholds as they were, without the lag"
			m.Make, m.Break = c.MakesAt.V, c.BreaksAt.V
		}
		m.Filter = plan
	}
	m.Solved = m.Filter.Lag > 0 || m.Make != c.MakesAt.V || m.Break != c.BreaksAt.V
	b.spec.Matches[c.ID.V] = m

	kept := 0.0
	if m.Kept {
		kept = 1
	}
	if r.Keep != thermal.KeepThresholds {
		fs.add(c.ID.V, "match_kept", kept, "", from, string(r.Keep)+": "+m.Working)
	}
	if m.Solved {
		fs.add(c.ID.V, "make_matched", m.Make, "degC", from, m.Working)
		fs.add(c.ID.V, "break_matched", m.Break, "degC", from, m.Working)
		fs.add(c.ID.V, "software_lag", m.Filter.Lag, "s", from, lagText(m, b.step))
	}
	fs.add(c.ID.V, "operations_ratio", found.New.OperationsPerYear/found.Old.OperationsPerYear, "", from,
		fmt.Sprintf("operations a year of the new control over those of the old one: %.0f / %.0f", found.New.OperationsPerYear, found.Old.OperationsPerYear))
	b.nearest(c, l, r, found)
}

// lagAfterRounding solves for the software lag anew with the thresholds at
// which the program will really switch.
func (b *builder) lagAfterRounding(c *survey.Control, chain *sensing.Chain, r thermal.MatchRequest, lag float64) float64 {
	said := len(b.diags)
	t, ok := b.thresholds(c, chain)
	b.diags = b.diags[:said] // it will be said when the thresholds are worked out for good
	if !ok {
		return lag
	}
	again, err := thermal.LagAt(r, t.Make.SwitchesAt, t.Break.SwitchesAt)
	if err != nil || !again.Feasible || again.Filter == 0 {
		return lag
	}
	return again.Filter
}

// nearest notes the control next to a found one whose contact lives for
// leastYears, where the found one's does not.
func (b *builder) nearest(c *survey.Control, l *survey.Load, r thermal.MatchRequest, found thermal.Matched) {
	life, reason := b.life(l)
	if reason != "" {
		return
	}
	r.MostOperations = life.Value / leastYears
	fs, from := &b.spec.Figures, c.Match.Path
	fs.add(c.ID.V, "operations_over_budget", found.New.OperationsPerYear/r.MostOperations, "", from,
		fmt.Sprintf("%.0f operations a year over the %.0f with which the contact lives for %d years", found.New.OperationsPerYear, r.MostOperations, leastYears))
	if found.New.OperationsPerYear <= r.MostOperations {
		return
	}
	b.nearestDifferential(c, r, found)
	near, err := thermal.Match(r)
	if err != nil || near.New.OperationsPerYear > r.MostOperations*(1+1e-6) {
		fs.open(c.ID.V, "nearest_software_lag", "s", from, fmt.Sprintf("no software lag brings it to the %.0f operations a year that the contact's life allows", r.MostOperations))
		return
	}
	if floor, ceiling := b.ends(c, 0, 0); near.New.High >= ceiling || near.New.Low <= floor {
		fs.open(c.ID.V, "nearest_software_lag", "s", from, fmt.Sprintf("none: a software lag of %s would bring it to %.0f operations a year, but the medium would swing from %s to %s, into a limit or a danger",
			Span(near.Filter), r.MostOperations, Degrees(near.New.Low), Degrees(near.New.High)))
		return
	}
	near.Because += fmt.Sprintf(", with which the medium swings by %s", Kelvins(near.New.Swing()))
	fs.add(c.ID.V, "nearest_software_lag", near.Filter, "s", from, near.Because)
	fs.add(c.ID.V, "nearest_operations_per_year", near.New.OperationsPerYear, "1/year", from, near.Because)
	fs.add(c.ID.V, "nearest_swing", near.New.Swing(), "K", from, near.Because)
}

// nearestDifferential is the same with a wider differential instead of a lag.
func (b *builder) nearestDifferential(c *survey.Control, r thermal.MatchRequest, found thermal.Matched) {
	fs, from := &b.spec.Figures, c.Match.Path
	wide, err := thermal.Widened(r, found.Switching, found.Filter)
	switch {
	case err != nil:
		fs.open(c.ID.V, "nearest_differential", "K", from, "not determined: "+err.Error())
	case !wide.Feasible:
		fs.open(c.ID.V, "nearest_differential", "K", from, "none: "+wide.Because)
	default:
		s := wide.Switching
		fs.add(c.ID.V, "nearest_differential", math.Abs(s.Break-s.Make), "K", from, fmt.Sprintf("%s, make %s and break %s, with which the contact lives for %d years and the medium swings by %s",
			wide.Because, Degrees(s.Make), Degrees(s.Break), leastYears, Kelvins(wide.New.Swing())))
	}
}

// life is how many operations the contact that drives a load lives; reason
// says why it is not known, or that nothing wears.
func (b *builder) life(l *survey.Load) (life switching.Result, reason string) {
	o := output(b.survey, l.ID.V)
	if o == nil || o.Kind.V != "relay" {
		return life, "nothing wears in it by switching"
	}
	kind := "" // the derating holds for resistive loads only
	if l.Kind.V == "heater" {
		kind = l.SupplyIs.V
	}
	life = switching.Life(known(o.Endurance), known(o.RatedCurrent), known(l.Current), known(o.MechanicalLife), kind)
	if !life.Determined {
		return life, life.Working
	}
	return life, ""
}

// lagInIntegers puts a software lag into whole numbers.
func (b *builder) lagInIntegers(c *survey.Control, chain *sensing.Chain, lag float64) (thermal.FilterPlan, error) {
	low, high := chain.Believable()
	var err error
	for _, t := range tolerances {
		var p thermal.FilterPlan
		if p, err = thermal.PlanFilter(lag, b.step, low, high, t); err == nil {
			if p.Lag == 0 {
				return thermal.FilterPlan{}, errors.New("a software lag of " + Span(lag) + " is shorter than the step")
			}
			return p, nil
		}
	}
	return thermal.FilterPlan{}, err
}

func lagText(m Match, step float64) string {
	p := m.Filter
	if p.Lag == 0 {
		return "none"
	}
	return fmt.Sprintf("first-order lag in the program: each step of %s goes 1/%d of the way to %d times the reading, which is %s (%+.2g %% of what was solved for); it comes to within %s counts of a constant reading",
		Span(step), p.Divisor, p.Scale, Span(p.Lag), 100*p.LagError, number(p.SteadyError, 3))
}

// wanted are the make and break that the program is asked for, in degC.
func (b *builder) wanted(c *survey.Control) (makes, breaks float64) {
	if m, ok := b.spec.Matches[c.ID.V]; ok {
		return m.Make, m.Break
	}
	return c.MakesAt.V, c.BreaksAt.V
}

// evidence is where an edge of the program comes from: the sheet's own field,
// or the key that says what is kept, where the edge was solved for.
func (b *builder) evidence(c *survey.Control, f survey.Field[float64]) survey.Source {
	if m, ok := b.spec.Matches[c.ID.V]; ok && (m.Make != c.MakesAt.V || m.Break != c.BreaksAt.V) {
		return c.Match.Source
	}
	return f.Source
}

// cycles reports whether a control is of the kind that cycles.
func cycles(c *survey.Control) bool {
	return c.Duty.V == survey.Operating && c.Switching() && c.BreaksAt.Set && c.MakesAt.Set && c.Reset.V == survey.ResetAutomatic
}

// matchWorking goes before the working of a threshold that was solved for.
func (b *builder) matchWorking(c *survey.Control) string {
	m, ok := b.spec.Matches[c.ID.V]
	if !ok || !m.Solved {
		return ""
	}
	return fmt.Sprintf("the sheet has make %s and break %s; match %s: %s; ", Degrees(c.MakesAt.V), Degrees(c.BreaksAt.V), m.Keep, m.Working)
}
