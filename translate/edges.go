package translate

import (
	"fmt"
	"math"

	"makebreak/survey"
	"makebreak/translate/logic"
	"makebreak/translate/sensing"
)

// rounding says how the two edges of a contact are brought to counts, in terms
// of the real temperatures at which the program will switch.
type rounding struct {
	makes, breaks sensing.Round
	why           string
}

// roundingOf decides by what the contact is for:
//
//	limit that acts as it warms     trip and re-arm down
//	limit that acts as it cools     trip and re-arm up
//	frost heater (danger below)     make up, break to nearest
//	cold store (danger above)       make down, break to nearest
//	other operating controls        each edge to nearest
func (b *builder) roundingOf(c *survey.Control, acts bool) rounding {
	if c.Duty.V != survey.Operating || c.Reset.V != survey.ResetAutomatic {
		actsWarming := (c.Action.V == survey.BreaksOnRise) != acts
		if actsWarming {
			return rounding{sensing.Down, sensing.Down, "a limit that acts as it warms is rounded down"}
		}
		return rounding{sensing.Up, sensing.Up, "a limit that acts as it cools is rounded up"}
	}
	r := rounding{sensing.Nearest, sensing.Nearest, "an operating control is rounded to the nearest"}
	for _, d := range b.survey.Dangers {
		switch {
		case d.Below.Set && c.Action.V == survey.BreaksOnRise:
			r.makes, r.why = sensing.Up, "danger "+d.ID.V+" lies below: the make is rounded up"
		case d.Above.Set && c.Action.V == survey.MakesOnRise:
			r.makes, r.why = sensing.Down, "danger "+d.ID.V+" lies above: the make is rounded down"
		}
	}
	return r
}

// edges brings make and break of a control to counts and declares them; scale
// is how many units of the reading one count is, more than 1 behind a software
// lag.
func (b *builder) edges(c *survey.Control, p *Probe, acts bool, scale int64) (makes, breaks *edge) {
	t, ok := b.spec.Thresholds[c.ID.V]
	if !ok {
		return &edge{Const: &logic.Const{}}, &edge{Const: &logic.Const{}}
	}
	declare := func(h sensing.Threshold, name string, from survey.Source) *edge {
		k := logic.Const{
			Name: c.ID.V + "_" + name, Value: h.Counts, Unit: "counts", Means: Degrees(h.Asked),
			Origin: origin(from), Working: b.matchWorking(c) + h.Working,
		}
		if scale > 1 {
			k.Value, k.Unit = smoothedEdge(h.Counts, h.AtLeast, scale), fmt.Sprintf("1/%d counts", scale)
			k.Working += fmt.Sprintf("; its edge, half a count on, in parts: %d", k.Value)
		}
		return &edge{Const: b.constant(k), AtLeast: h.AtLeast, At: h.SwitchesAt}
	}
	return declare(t.Make, "make", b.evidence(c, c.MakesAt)), declare(t.Break, "break", b.evidence(c, c.BreaksAt))
}

// Thresholds are the two edges of a control in counts.
type Thresholds struct {
	Make, Break sensing.Threshold
	Why         string // of the rounding
}

// thresholds works out both edges; ok is false where the converter cannot tell
// them apart, which has been reported.
func (b *builder) thresholds(c *survey.Control, chain *sensing.Chain) (Thresholds, bool) {
	r := b.roundingOf(c, acts(b.survey, c.ID.V))
	makeSide, breakSide := sensing.AtOrBelow, sensing.AtOrAbove
	if c.Action.V == survey.MakesOnRise {
		makeSide, breakSide = sensing.AtOrAbove, sensing.AtOrBelow
	}
	t := Thresholds{Why: r.why}
	var err error
	makes, breaks := b.wanted(c)
	if t.Make, err = chain.Threshold(makes, makeSide, r.makes); err != nil {
		b.fail(c.MakesAt.Source, "this threshold cannot be seen by "+c.Sensor.V, err.Error(), "another divider, gain or range of "+c.Sensor.V)
		return t, false
	}
	if t.Break, err = chain.Threshold(breaks, breakSide, r.breaks); err != nil {
		b.fail(c.BreaksAt.Source, "this threshold cannot be seen by "+c.Sensor.V, err.Error(), "another divider, gain or range of "+c.Sensor.V)
		return t, false
	}
	// A limit keeps its trip and lets the re-arm give way; an operating control
	// keeps its break, or its make where that was rounded to one side.
	heats := c.Action.V == survey.BreaksOnRise
	keepUpper := heats
	if r.makes != sensing.Nearest && r.breaks == sensing.Nearest {
		keepUpper = !heats
	}
	if heats {
		t.Make, t.Break, err = sensing.Apart(t.Make, t.Break, keepUpper)
	} else {
		t.Break, t.Make, err = sensing.Apart(t.Break, t.Make, keepUpper)
	}
	if err != nil {
		b.fail(c.Source, "make and break cannot be told apart by "+c.Sensor.V, err.Error(), fmt.Sprintf("more converter bits, or another divider: one count is %s here", Kelvins(t.Break.CountWidth)))
		return t, false
	}
	return t, true
}

// comparison lowers a comparison of a sensor with a temperature in an
// expression of the sheet.
func (b *builder) comparison(p *Probe, cmp string, limit float64, text string, at survey.Source) *logic.Expr {
	side := sensing.AtOrAbove
	if cmp == "<" || cmp == "<=" {
		side = sensing.AtOrBelow
	}
	h, err := b.spec.Chains[p.Sensor.ID.V].Threshold(limit, side, sensing.Nearest)
	if err != nil {
		b.fail(at, "this temperature cannot be seen by "+p.Sensor.ID.V, err.Error(), "a temperature inside its range")
		return logic.False()
	}
	k := b.constant(logic.Const{Name: p.Sensor.ID.V + "_limit", Value: h.Counts, Unit: "counts", Means: text, Origin: origin(at), Working: h.Working})
	e := &edge{Const: k, AtLeast: h.AtLeast, At: h.SwitchesAt}
	return e.reached(p)
}

// edge of the believable range of a sensor, as a constant.
func (b *builder) edge(name string, count int64, s *survey.Sensor, what string) *logic.Expr {
	chain := b.spec.Chains[s.ID.V]
	low, high := chain.Temperature(count)
	t := math.Min(math.Max((low+high)/2, chain.Curve.Low), chain.Curve.High)
	from := s.Valid.Source
	if !s.Valid.Set {
		from = survey.Source{Assumed: "the range of its kind, short of both rails", Path: s.Valid.Path}
	}
	means := what + ", about " + number(t, 1) + " degC"
	switch s.Kind.V {
	case "millivolt":
		means = what + ", about " + number(1000*t, 2) + " mV"
	case "current":
		means = what + ", about " + number(t, 2) + " A"
	}
	return logic.C(b.constant(logic.Const{Name: name, Value: count, Unit: "counts", Means: means, Origin: origin(from), Working: chain.Curve.Name}))
}
