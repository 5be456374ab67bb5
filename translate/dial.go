package translate

import (
	"fmt"
	"math"

	"makebreak/survey"
	"makebreak/translate/logic"
	"makebreak/translate/sensing"
)

// What a dial is built of, where the sheet cannot say.
const (
	dialDead  = 0.05 // share of the reference that a resistor at either end of the track keeps free; common practice
	dialTrack = 0.2  // tolerance of the track; common practice
	dialFault = 2.0  // s for which a wiper must be wrong, or right again; common practice
)

// Dial is a set-point dial that the user keeps, as a potentiometer.
//
// Between its stops the set point follows the wiper; beyond them it stays at
// the stop, so that the stops are limits in the program too. A wiper, track or
// wire that is broken reads inside the dead zones: it is a fault, and the
// control then works at the set point of the sheet, which somebody has
// reviewed, by the counts that it would have without a dial.
type Dial struct {
	Raw      *logic.Var // the input
	SetPoint *logic.Var // in steps of the reading
	Believed *logic.Var
	Marked   int64 // count of the sheet's set point
	Layout   sensing.Dial
}

// dialEdges gives the lowest and the highest edge that the dial can ask for.
func (b *builder) dialEdges(c *survey.Control) (low, high float64) {
	at := c.DialMark().V
	makes, breaks := b.wanted(c)
	lower, upper := math.Min(makes, breaks), math.Max(makes, breaks)
	return c.Dial.V[0] + lower - at, c.Dial.V[1] + upper - at
}

// dialFigures says how the dial is laid out, and that the sensor sees it all.
func (b *builder) dialFigures(c *survey.Control, chain *sensing.Chain) {
	if !c.DialStays() {
		return
	}
	low, high := b.dialEdges(c)
	for _, t := range []float64{low, high} {
		if _, err := chain.Threshold(t, sensing.AtOrAbove, sensing.Nearest); err != nil {
			b.fail(c.Dial.Source, "a stop of the dial cannot be seen by "+c.Sensor.V, err.Error(), "stops inside its range, or another divider")
			return
		}
	}
	d, err := sensing.NewDial(c.Dial.V, b.survey.Electronics.ADC, dialDead, dialTrack)
	if err != nil {
		b.fail(c.Dial.Source, "the dial cannot be read", err.Error(), "other stops, or another converter")
		return
	}
	fs, at := &b.spec.Figures, c.Dial.Path
	fs.add(c.ID.V, "dial_low_counts", float64(d.Bottom), "counts", at, fmt.Sprintf("stop at %s; below %d counts: wiper, track or wire broken", Degrees(d.Low), d.FaultBelow))
	fs.add(c.ID.V, "dial_high_counts", float64(d.Top), "counts", at, fmt.Sprintf("stop at %s; above %d counts: broken", Degrees(d.High), d.FaultAbove))
	fs.add(c.ID.V, "dial_count_width", d.Width(), "K", at, "change of the set point with one count of the dial")
	fs.add(c.ID.V, "dial_end_resistor", sensing.EndResistor(1, dialDead), "of the track", at,
		fmt.Sprintf("at either end of the track, so that %g %% of the reference stay free; the track on the converter's own reference, taken as good to %g %% (common practice)", 100*dialDead, 100*dialTrack))
}

// dial builds the blocks of a control's dial, or gives nil where it has none.
func (b *builder) dial(c *survey.Control, p *Probe) *Dial {
	if !c.DialStays() {
		return nil
	}
	layout, err := sensing.NewDial(c.Dial.V, b.survey.Electronics.ADC, dialDead, dialTrack)
	if err != nil {
		return nil // has been said
	}
	id, r := c.ID.V, b.reading(p)
	table, err := layout.Table(r.Unit)
	if err != nil {
		b.fail(c.Dial.Source, "the dial cannot be read", err.Error(), "other stops")
		return nil
	}
	d := &Dial{Layout: layout}
	d.Marked, _ = layout.Mark(c.DialMark().V)
	what := "dial of " + c.What.V
	bad := b.wiper(id, what, c.Dial.Source, d, "the set point of the sheet holds")
	t := &logic.Table{Name: b.name(id, "dial_marks"), What: "set point of " + what, Unit: fmt.Sprintf("%g K", r.Unit), Working: "linear between the stops " + c.Dial.Text}
	span := logic.Range{Lo: int64(min(table.Y[0], table.Y[1])), Hi: int64(max(table.Y[0], table.Y[1]))}
	for i := range table.X {
		t.X, t.Y = append(t.X, int64(table.X[i])), append(t.Y, int64(table.Y[i]))
	}
	b.prog.Tables = append(b.prog.Tables, t)
	d.SetPoint = b.state(logic.Var{Name: b.name(id, "set_point"), What: "set point by the dial, in steps of " + t.Unit, Kind: logic.Int, Range: span,
		Start: min(max(r.in(c.DialMark().V), span.Lo), span.Hi)})
	b.add(&logic.Set{Var: d.SetPoint, When: logic.Not(logic.Use(bad)), To: logic.Lookup(t, logic.Use(d.Raw)), Why: "the stops hold beyond them"})
	return d
}

// wiper declares the input of a dial and whether it is believed; otherwise
// says what holds where it is not. The result is true for a sample that is no
// setting.
func (b *builder) wiper(id, what string, from survey.Source, d *Dial, otherwise string) (bad *logic.Var) {
	count := func(name string, v int64, means string) *logic.Const {
		return b.constant(logic.Const{Name: id + "_dial_" + name, Value: v, Unit: "counts", Means: means, Origin: origin(from),
			Working: fmt.Sprintf("a track of %g %% too much, and a third of the way to the rail", 100*dialTrack)})
	}
	low, high := count("lowest", d.Layout.FaultBelow, "below: wiper, track or wire broken"), count("highest", d.Layout.FaultAbove, "above: wiper, track or wire broken")
	d.Raw = b.input(logic.Var{Name: b.name(id, "dial"), What: what + ", raw counts", Kind: logic.Int, Range: logic.Count})
	bad = b.local(b.name(id, "dial_bad"), what+": this sample is no setting",
		logic.Or(logic.Lt(logic.Use(d.Raw), logic.C(low)), logic.Gt(logic.Use(d.Raw), logic.C(high))))
	fault := b.steps(id+"_dial_fault_after", dialFault, survey.Source{Assumed: "common practice"}, "no setting for")
	lost := b.counter(b.name(id, "dial_lost_for"), "steps since the dial was last believed", fault, fault.Value)
	b.add(&logic.Timer{Var: lost, Limit: fault, Restart: logic.Not(logic.Use(bad)), Why: "a setting ends the doubt"})
	d.Believed = b.local(b.name(id, "dial_believed"), what+": is believed", logic.Lt(logic.Use(lost), logic.C(fault)))
	b.flag(id+"_dial", what+": wiper, track or wire broken; "+otherwise, logic.Not(logic.Use(d.Believed)))
	return bad
}

// reached is true where the temperature is at or beyond an edge that lies
// offset K from the dial's mark. Where the dial is not believed, the edge is
// that of the sheet. Counts are compared as long as nothing moves the edge or
// warms the reading.
func (b *builder) reached(k *Contact, reads *logic.Var, scale int64, e *edge, name string, offset float64, rising bool) *logic.Expr {
	c, p, d, a := k.Control, k.Probe, k.Dial, k.Anticipator
	if d == nil && a == nil {
		return e.reachedBy(reads)
	}
	r := b.reading(p)
	at, value, sheet := b.mark(k, r), logic.Use(r.Value), e.reachedBy(reads)
	if reads != p.Value {
		value = logic.Use(b.smoothedReading(k, r, reads, scale))
	}
	if a != nil {
		value = logic.Use(a.Warm)
	}
	if n := r.in(math.Abs(offset)); n != 0 {
		side, shift := "below", logic.Sub
		if offset > 0 {
			side, shift = "above", logic.Add
		}
		k := b.constant(logic.Const{Name: c.ID.V + "_" + name + "_" + side + "_mark", Value: n, Unit: fmt.Sprintf("%g K", r.Unit),
			Means: Kelvins(math.Abs(offset)) + " " + side + " the set point", Origin: origin(c.DialMark().Source), Working: "differential as on the sheet"})
		at = shift(at, logic.C(k))
	}
	beyond := logic.Le(value, at)
	if rising {
		beyond = logic.Ge(value, at)
	}
	if a == nil {
		believed := logic.Use(d.Believed)
		beyond = logic.Or(logic.And(believed, beyond), logic.And(logic.Not(believed), sheet))
	}
	v := b.local(b.name(c.ID.V, name+"_reached"), "the temperature is at or beyond the "+name, beyond)
	return logic.Use(v)
}

// mark is the set point in steps of the reading: by the dial, or of the sheet.
func (b *builder) mark(k *Contact, r Reading) *logic.Expr {
	if k.Dial != nil && k.Anticipator == nil {
		return logic.Use(k.Dial.SetPoint)
	}
	if k.mark == nil {
		k.mark = b.aimed(k.Control, k.Dial, r)
	}
	return k.mark
}

// aimed is the set point by a dial that is believed, else that of the sheet.
func (b *builder) aimed(c *survey.Control, d *Dial, r Reading) *logic.Expr {
	at := c.DialMark()
	k := b.constant(logic.Const{Name: c.ID.V + "_set_point", Value: r.in(at.V), Unit: fmt.Sprintf("%g K", r.Unit), Means: Degrees(at.V), Origin: origin(at.Source), Working: "in steps of the reading"})
	if d == nil {
		return logic.C(k)
	}
	return logic.Use(b.whole(b.name(c.ID.V, "wanted"), "set point by the dial or, without it, by the sheet",
		logic.Select(logic.Use(d.Believed), logic.Use(d.SetPoint), logic.C(k))))
}
