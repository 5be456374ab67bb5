package survey

import (
	"fmt"
	"math"
)

// agreement is how far two ways of giving one threshold may be apart, in K.
const agreement = 0.05

func (d *decoder) control(s *Survey, c *Control, w *wiring) {
	c.Action.V = canonical(c.Action.V)
	d.refers(c.Sensor, w, "sensor")
	d.refers(c.ReadBy, w, "signal")
	d.refers(c.SamePartAs, w, "control")
	if c.SamePartAs.Set && c.SamePartAs.V == c.ID.V {
		d.failAt(c.SamePartAs.Source, "the same part as itself", quote(c.SamePartAs.V), "the id of the other contact")
	}
	for _, f := range c.Cuts {
		d.refers(f, w, "load")
	}
	// Harmless where it only says what is so of every part without a manual reset.
	if c.TripFree.Set && !c.TripFree.V && c.Reset.V != ResetManual {
		d.failAt(c.TripFree.Source, notHere, quote(c.TripFree.Text), "only for reset: manual")
	}
	if c.Switching() {
		d.thresholds(s, c)
	}
	d.controlPlan(c)
	d.controlRanges(c)
}

// Switching reports whether the part is a contact that makes and breaks with
// temperature.
func (c *Control) Switching() bool { return c.Action.V == BreaksOnRise || c.Action.V == MakesOnRise }

// Modulating reports whether the part is a valve that moves with temperature.
func (c *Control) Modulating() bool { return c.Action.V == ClosesOnRise || c.Action.V == OpensOnRise }

// DialStays reports whether the user's dial goes on as a potentiometer: one of
// an operating control that is replaced. What limits is not left to whoever
// passes.
func (c *Control) DialStays() bool {
	return c.Dial.Set && c.Plan.V == Replace && c.Switching() && c.Duty.V == Operating && c.Reset.V == ResetAutomatic && c.MakesAt.Set && c.BreaksAt.Set
}

// DialMark is the temperature that the dial marks: the set point, or the break
// where the sheet gives only the edges; of a modulating valve, the middle of
// its band.
func (c *Control) DialMark() Field[float64] {
	switch {
	case c.SetPoint.Set:
		return c.SetPoint
	case c.Modulating() && c.StartsAt.Set && c.FullAt.Set:
		middle := c.StartsAt
		middle.V = (c.StartsAt.V + c.FullAt.V) / 2
		middle.Text = "middle of " + c.StartsAt.Text + " and " + c.FullAt.Text
		return middle
	}
	return c.BreaksAt
}

// Cools reports whether the part lets more through, or switches on, as it
// warms: a cooling control, or a fan control.
func (c *Control) Cools() bool { return c.Action.V == MakesOnRise || c.Action.V == OpensOnRise }

func canonical(a Action) Action {
	switch a {
	case "makes_on_fall":
		return BreaksOnRise
	case "breaks_on_fall":
		return MakesOnRise
	}
	return a
}

// thresholds makes sure that both edges of a switching control are known, or
// known to be unknown. However they were given, BreaksAt and MakesAt hold them
// afterwards.
func (d *decoder) thresholds(s *Survey, c *Control) {
	if c.Differential.Set && c.Differential.V <= 0 {
		d.failAt(c.Differential.Source, "no differential at all", c.Differential.Text, "more than 0 K: a contact that makes and breaks at one temperature cannot be")
		return
	}
	if c.SetPoint.Set && c.Marks.Set && c.Differential.Set {
		d.fromDial(c)
	}
	switch {
	case c.BreaksAt.Set && c.MakesAt.Set:
		d.edgesInOrder(c)
	case unread(c.BreaksAt), unread(c.MakesAt), unread(c.SetPoint), unread(c.Differential), unread(c.Marks):
		return // has been said
	default:
		d.missingEdges(c)
	}
	d.inSensorsRange(s, c)
}

func (d *decoder) edgesInOrder(c *Control) {
	if c.Action.V == BreaksOnRise && c.BreaksAt.V <= c.MakesAt.V {
		d.failAt(c.BreaksAt.Source, "breaks below its make", c.BreaksAt.Text, "above makes_at ("+c.MakesAt.Text+"), for it breaks on rise; or action: makes_on_rise")
	}
	if c.Action.V == MakesOnRise && c.BreaksAt.V >= c.MakesAt.V {
		d.failAt(c.MakesAt.Source, "makes below its break", c.MakesAt.Text, "above breaks_at ("+c.BreaksAt.Text+"), for it makes on rise; or action: breaks_on_rise")
	}
}

// missingEdges says what is missing where not both edges are known. A part that
// stays may have unknown ones: the sheet then has to say so.
func (d *decoder) missingEdges(c *Control) {
	const both = "set_point, marks and differential together, or breaks_at and makes_at"
	replaced := c.Plan.V == Replace
	edge := c.BreaksAt.Written() || c.MakesAt.Written()
	dial := []struct {
		Source
		set  bool
		name string
	}{{c.SetPoint.Source, c.SetPoint.Set, "set_point"}, {c.Marks.Source, c.Marks.Set, "marks"}, {c.Differential.Source, c.Differential.Set, "differential"}}
	onDial, unknown := false, false
	for _, k := range dial {
		onDial = onDial || k.Written()
		unknown = unknown || k.Written() && !k.set
	}
	switch {
	case c.Reset.V == ResetOneShot && (c.BreaksAt.Set || c.MakesAt.Set):
		// it never comes back
	case !edge && !onDial:
		d.failAt(c.Source, "where does it make and break?", "neither breaks_at and makes_at nor set_point, marks and differential", "breaks_at and makes_at, as measured; `unknown` is an answer for a part that stays")
	case edge && replaced:
		d.failAt(c.Source, "a part to be replaced needs both edges", "breaks_at "+stated(c.BreaksAt)+", makes_at "+stated(c.MakesAt), "measure them on the bench, or keep the part")
	case edge, unknown && !replaced:
		// a part that stays: what is not known becomes a finding
	default:
		for _, k := range dial {
			switch {
			case !k.Written():
				d.failAt(c.Source, "key missing", "no "+k.name, both)
			case !k.set:
				d.failAt(k.Source, "a part to be replaced needs both edges", k.name+" unknown", "measure them on the bench, or keep the part")
			}
		}
	}
}

// unread reports a value that was written and could not be read.
func unread[T any](f Field[T]) bool {
	return f.Written() && !f.Set && f.Text != "unknown" && f.Text != ""
}

// given reports a value that the sheet gives, be it one that could not be read.
func given[T any](f Field[T]) bool { return f.Set || unread(f) }

func stated(f Field[float64]) string {
	if f.Written() {
		return f.Text
	}
	return "not given"
}

// fromDial works the edges out of set point, mark and differential. Given
// twice, both have to agree.
func (d *decoder) fromDial(c *Control) {
	low, high := c.SetPoint.V, c.SetPoint.V+c.Differential.V
	upper := (c.Marks.V == "break") == (c.Action.V == BreaksOnRise)
	switch {
	case c.Marks.V == "middle":
		low, high = c.SetPoint.V-c.Differential.V/2, c.SetPoint.V+c.Differential.V/2
	case upper:
		low, high = c.SetPoint.V-c.Differential.V, c.SetPoint.V
	}
	breaks, makes := high, low
	if c.Action.V == MakesOnRise {
		breaks, makes = low, high
	}
	for _, e := range []struct {
		f     *Field[float64]
		v     float64
		which string
	}{{&c.BreaksAt, breaks, "breaks"}, {&c.MakesAt, makes, "makes"}} {
		if e.f.Set {
			if math.Abs(e.f.V-e.v) > agreement {
				d.failAt(e.f.Source, "does not agree with set_point, marks and differential", e.f.Text,
					fmt.Sprintf("%.4g degC by set_point %s, marks %s, differential %s", e.v, c.SetPoint.Text, c.Marks.V, c.Differential.Text))
			}
			continue
		}
		src := c.SetPoint.Source
		src.Text = fmt.Sprintf("%s, marks %s, differential %s", c.SetPoint.Text, c.Marks.V, c.Differential.Text)
		*e.f = Field[float64]{V: e.v, Set: true, Source: src}
	}
}

func (d *decoder) controlPlan(c *Control) {
	switch c.Plan.V {
	case Replace, Monitor:
		needs := c.Switching() || c.Modulating() || c.Action.V == Indicates || c.Action.V == HoldsWhileHot
		switch {
		case !needs || given(c.Sensor) || c.Plan.V == Monitor && given(c.ReadBy):
		case c.Sensor.Written():
			d.failAt(c.Sensor.Source, "the new sensor has to be known", "unknown", "the id of the sensor that takes over from this part")
		default:
			d.failAt(c.Source, "key missing", "no sensor", "sensor: the new sensor that takes over from this part")
		}
	}
	if c.Plan.V == Replace && len(c.Cuts) > 0 {
		d.failAt(c.Cuts[0].Source, "a part that is replaced cuts nothing any more", c.Cuts[0].Text, "cuts only with plan keep, monitor, renew or add")
	}
}

func (d *decoder) controlRanges(c *Control) {
	if c.Dial.Set && c.Dial.V[0] >= c.Dial.V[1] {
		d.failAt(c.Dial.Source, "stops of the dial change places", c.Dial.Text, "the lower stop first")
	} else if c.Dial.Set && c.SetPoint.Set && (c.SetPoint.V < c.Dial.V[0] || c.SetPoint.V > c.Dial.V[1]) {
		d.failAt(c.SetPoint.Source, "outside the dial", c.SetPoint.Text, "within the stops "+c.Dial.Text)
	}
	o := c.Observed
	if o.High.Set && o.Low.Set && o.High.V <= o.Low.V {
		d.failAt(o.High.Source, "highest not above the lowest", o.High.Text, "above low ("+o.Low.Text+")")
	}
	d.positive(o.On, o.Off, c.Rate, c.Period, c.Lamps.Each, c.Lamps.OutRate, c.RatedCurrent, c.HoldsFrom, c.Anticipator.Rise, c.Stroke)
	if v := c.Lamps.Supply; v.Set && (v.V[0] <= 0 || v.V[0] > v.V[1]) {
		d.failAt(v.Source, "no range of supply", v.Text, "two voltages above 0 V, the lower first")
	}
	d.inRows(c.TripsAfter, "multiples above 0 rising, times above 0 s falling", func(a, b [2]float64) bool { return b[0] > a[0] && b[1] < a[1] })
	d.inRows(c.DialShares, "dial marks rising", func(a, b [2]float64) bool { return b[0] > a[0] })
	if n := c.Lamps.Count; n.Set && n.V == 0 {
		d.failAt(n.Source, "no lamp at all", n.Text, "one or more")
	}
	if c.Modulating() && c.StartsAt.Set && c.FullAt.Set && c.StartsAt.V == c.FullAt.V {
		d.failAt(c.FullAt.Source, "no band at all", c.FullAt.Text, "other than starts_at")
	}
	if c.HoldsFrom.Set && c.ReleasesAt.Set && c.HoldsFrom.V <= c.ReleasesAt.V {
		d.failAt(c.HoldsFrom.Source, "holds below its release", c.HoldsFrom.Text, "above releases_at ("+c.ReleasesAt.Text+")")
	}
}

// inRows wants each row of a table to follow the one before it as it should, and
// nothing in it below zero.
func (d *decoder) inRows(f Field[[][2]float64], fits string, follows func(a, b [2]float64) bool) {
	for i, row := range f.V {
		if row[0] < 0 || row[1] < 0 || i > 0 && !follows(f.V[i-1], row) {
			d.failAt(f.Source, "rows that do not follow each other", fmt.Sprintf("row %d of %s", i+1, f.Text), fits)
			return
		}
	}
}
