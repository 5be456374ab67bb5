package translate

import (
	"fmt"

	"makebreak/survey"
	"makebreak/translate/logic"
)

// A software lag makes a quick probe as slow as the old element was. It stands
// behind everything that protects: whether a sample is believed is decided on
// the raw one, limits read the median, and only the operating contact that was
// matched reads the smoothed value.

// smoothed gives what a control's contact compares its edges with, and how
// many units of it one count is: the median of the probe, or behind it a
// first-order lag in whole numbers (thermal.FilterPlan),
//
//	y += (x·Scale − y) / Divisor
//
// While the probe is not believed yet, or no more, the lag follows at once, so
// that it starts from the temperature that there is.
func (b *builder) smoothed(c *survey.Control, p *Probe) (reads *logic.Var, scale int64) {
	m, ok := b.spec.Matches[c.ID.V]
	if !ok || m.Filter.Lag == 0 {
		return p.Value, 1
	}
	f, id := m.Filter, c.ID.V
	divisor := b.constant(logic.Const{
		Name: id + "_lag", Value: f.Divisor, Unit: "steps", Means: "software lag " + Span(f.Lag), Origin: origin(c.Match.Source),
		Working: lagText(m, b.step),
	})
	one := b.constant(logic.Const{
		Name: id + "_count", Value: f.Scale, Unit: "parts a count", Means: "as fine as the lag keeps a reading", Origin: origin(c.Match.Source),
		Working: fmt.Sprintf("the smallest power of two with which (%d − 1)/%d counts is no more than the error allowed", f.Divisor, f.Scale),
	})
	y := b.state(logic.Var{
		Name: b.name(id, "smoothed"), What: fmt.Sprintf("reading behind a lag of %s, in parts of a count", Span(f.Lag)), Kind: logic.Int,
		Range: logic.Range{Lo: p.Low * f.Scale, Hi: p.High * f.Scale}, Start: p.Low * f.Scale,
	})
	parts := &logic.Var{Name: b.name(id, "parts"), What: "reading in parts of a count", Kind: logic.Int, Range: y.Range, Start: y.Start}
	b.add(
		&logic.Define{Var: parts, As: logic.Mul(logic.Clamp(logic.Use(p.Value), p.lowest, p.highest), logic.C(one))},
		&logic.Set{Var: y, To: logic.Select(p.failed(), logic.Use(parts), logic.Toward(logic.Prev(y), logic.Use(parts), logic.C(divisor))),
			Why: "a lag as the old element had one"},
	)
	return y, f.Scale
}

// smoothedEdge is an edge of a smoothed reading: the edge of a count lies half
// a count beyond the middle of the counts that it divides.
func smoothedEdge(counts int64, atLeast bool, scale int64) int64 {
	if atLeast {
		return counts*scale - scale/2
	}
	return counts*scale + scale/2
}

// smoothedReading is the temperature behind a software lag, once for a contact.
func (b *builder) smoothedReading(k *Contact, r Reading, reads *logic.Var, scale int64) *logic.Var {
	if k.smoothed == nil {
		as := logic.Lookup(r.table, logic.Div(logic.Use(reads), logic.Lit(scale)))
		k.smoothed = &logic.Var{Name: b.name(k.Control.ID.V, "smoothed_reading"), What: "temperature behind the lag, in steps of " + r.table.Unit, Kind: logic.Int,
			Range: logic.Range{Lo: r.Low, Hi: r.High}, Start: r.Low}
		b.add(&logic.Define{Var: k.smoothed, As: as})
	}
	return k.smoothed
}
