package translate

import (
	"fmt"
	"math"

	"makebreak/survey"
	"makebreak/translate/logic"
	"makebreak/translate/sensing"
	"makebreak/translate/thermal"
)

// Image is the thermal image of a motor protector that heats with the current
// it carries: a warning before the protector acts, and nothing else.
type Image struct {
	Heat  *logic.Var // permille of what trips it, × Scale
	Scale int64
	Warns *logic.Var
}

// Figures of the image.
const (
	warnsAt  = 0.9    // of the heat that trips it; common practice
	mostLoad = 8000.0 // permille of the rated current that the image follows: a locked rotor
)

// imageLag is the time constant of a protector from its trip times, s. A
// first-order image that would trip at rated current for ever, started cold, is
// there after t = τ·ln(m²/(m² − 1)) at m times that current (first-order thermal
// image of the square of the current, as in IEC 60255-149; from memory). Each
// point of the sheet gives its own τ; the shortest is taken, so that the image
// is never later than the protector at any of them.
func imageLag(rows [][2]float64) (tau float64, at [2]float64, ok bool) {
	tau = math.Inf(1)
	for _, r := range rows {
		m := r[0]
		if !(m > 1) || !(r[1] > 0) {
			continue
		}
		if t := r[1] / math.Log(m*m/(m*m-1)); t < tau {
			tau, at, ok = t, r, true
		}
	}
	return tau, at, ok
}

// imageTrip is when a first-order image of that time constant is at the trip,
// started cold, at m times rated current, s.
func imageTrip(tau, m float64) float64 { return tau * math.Log(m*m/(m*m-1)) }

// imageFigures says what image is taken, and how it differs from the protector.
func (b *builder) imageFigures(c *survey.Control) {
	if c.Element.V != "heated_bimetal" || !c.TripsAfter.Set {
		return
	}
	fs, from := &b.spec.Figures, c.TripsAfter.Path
	tau, at, ok := imageLag(c.TripsAfter.V)
	if !ok {
		fs.open(c.ID.V, "image_lag", "s", from, "not determined: no point above rated current")
		return
	}
	fs.add(c.ID.V, "image_lag", tau, "s", from, fmt.Sprintf("%s at %g times rated current, by t = τ·ln(m²/(m² − 1)); the shortest of the points", Span(at[1]), at[0]))
	for _, r := range c.TripsAfter.V {
		if r[0] > 1 {
			fs.add(c.ID.V, fmt.Sprintf("image_at_%gx", r[0]), imageTrip(tau, r[0]), "s", from, fmt.Sprintf("the protector: %s; the image warns at %g %% of that heat", Span(r[1]), 100*warnsAt))
		}
	}
}

// image builds the first-order lag of the square of the current.
func (b *builder) image(c *survey.Control, p *Probe) *Image {
	id := c.ID.V
	tau, _, ok := imageLag(c.TripsAfter.V)
	if !ok {
		b.fail(c.Source, "no thermal image without trip times", "no trips_after", "trips_after: [[2x, 40 s], [6x, 6 s]]")
		return nil
	}
	chain := b.spec.Chains[c.Sensor.V]
	h, err := chain.Threshold(c.RatedCurrent.V, sensing.AtOrAbove, sensing.Nearest)
	if err != nil {
		b.fail(c.RatedCurrent.Source, "the rated current cannot be seen by "+c.Sensor.V, err.Error(), "another full_scale")
		return nil
	}
	most := int64(mostLoad * mostLoad / 1000)
	plan, err := thermal.PlanFilter(tau, b.step, 0, most, 5)
	if err != nil {
		b.fail(c.TripsAfter.Source, "the thermal image does not fit whole numbers", err.Error(), "a longer called_every")
		return nil
	}
	k := func(name string, v int64, unit, means, working string, from survey.Source) *logic.Const {
		return b.constant(logic.Const{Name: id + "_" + name, Value: v, Unit: unit, Means: means, Origin: origin(from), Working: working})
	}
	rated := k("rated", max(h.Counts, 1), "counts", fmt.Sprintf("rated current %.4g A", c.RatedCurrent.V), h.Working, c.RatedCurrent.Source)
	scale := k("heat_scale", plan.Scale, "", "the heat is kept so many times finer", fmt.Sprintf("so that it stays within %.2g permille of its end", plan.SteadyError), c.TripsAfter.Source)
	n := k("heat_lag", plan.Divisor, "steps", "time constant "+Span(plan.Lag), fmt.Sprintf("%s, the shortest that the trip times give", Span(tau)), c.TripsAfter.Source)
	warn := k("warns_at", int64(math.Round(1000*warnsAt))*plan.Scale, "permille, finer", fmt.Sprintf("%g %% of the heat that trips it", 100*warnsAt), "× "+scale.Name, survey.Source{Assumed: "common practice"})

	load := b.whole(b.name(id, "load"), "current in permille of the rated one", logic.Clamp(
		logic.Div(logic.Mul(logic.Clamp(logic.Use(p.Value), logic.Lit(0), logic.Lit(int64(math.Min(float64(rated.Value)*mostLoad/1000, 65535)))), logic.Lit(1000)), logic.C(rated)),
		logic.Lit(0), logic.Lit(int64(mostLoad))))
	heating := b.whole(b.name(id, "heating"), "square of that, in permille", logic.Div(logic.Mul(logic.Use(load), logic.Use(load)), logic.Lit(1000)))
	heat := b.state(logic.Var{Name: b.name(id, "heat"), What: c.What.V + ": heat in permille of what trips it, × " + scale.Name, Kind: logic.Int, Range: logic.Range{Lo: 0, Hi: most * plan.Scale}})
	b.add(&logic.Set{Var: heat, When: p.good(), To: logic.Toward(logic.Prev(heat), logic.Mul(logic.Use(heating), logic.C(scale)), logic.C(n)),
		Why: "heats with the square of the current and cools as the protector does; stands while the current is not believed"})
	warns := b.local(b.name(id, "hot"), c.What.V+": is about to act", logic.Ge(logic.Use(heat), logic.C(warn)))
	b.flag(id+"_hot", c.What.V+": the motor has drawn so much that it is about to act", logic.Use(warns))
	return &Image{Heat: heat, Scale: plan.Scale, Warns: warns}
}
