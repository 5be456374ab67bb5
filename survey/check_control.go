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
	for _, f := range c.Cuts {
		d.refers(f, w, "load")
	}
	d.controlKeys(c)
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

func canonical(a Action) Action {
	switch a {
	case "makes_on_fall":
		return BreaksOnRise
	case "breaks_on_fall":
		return MakesOnRise
	}
	return a
}

func (d *decoder) controlKeys(c *Control) {
	if !c.Action.Set {
		return
	}
	switching, modulating := c.Switching(), c.Modulating()
	only := func(s Source, fits bool, forWhat string) { d.belongs(s, true, fits, forWhat) }
	only(c.SetPoint.Source, switching || modulating, "controls with thresholds")
	only(c.Marks.Source, switching, "switching controls")
	only(c.Differential.Source, switching, "switching controls")
	only(c.BreaksAt.Source, switching, "switching controls")
	only(c.MakesAt.Source, switching, "switching controls")
	only(c.MinOn.Source, switching, "switching controls")
	only(c.MinOff.Source, switching, "switching controls")
	only(c.StartsAt.Source, modulating, "closes_on_rise and opens_on_rise")
	only(c.FullAt.Source, modulating, "closes_on_rise and opens_on_rise")
	only(c.Hysteresis.Source, modulating, "closes_on_rise and opens_on_rise")
	only(c.Stroke.Source, modulating, "closes_on_rise and opens_on_rise")
	pulses, holds := c.Action.V == Pulses, c.Action.V == HoldsWhileHot
	for _, k := range []Source{c.Rate.Source, c.OnShare.Source, c.Period.Source, c.DialShares.Source, c.Lamps.Source, c.FirstOnWithin.Source, c.RoadVehicle.Source} {
		only(k, pulses, "action: pulses")
	}
	for _, k := range []Source{c.Supervises.Source, c.HoldsFrom.Source, c.ReleasesAt.Source, c.HoldsWithin.Source, c.ShutsWithin.Source} {
		only(k, holds, "action: holds_while_hot")
	}
	only(c.Anticipator.Source, switching, "switching controls")
	only(c.RatedCurrent.Source, c.Element.V == "heated_bimetal", "element: heated_bimetal")
	only(c.TripsAfter.Source, c.Element.V == "heated_bimetal", "element: heated_bimetal")
	// Harmless where it only says what is so of every part without a manual reset.
	only(c.TripFree.Source, c.Reset.V == ResetManual || c.TripFree.V, "reset: manual")
}

// thresholds makes sure that both edges of a switching control are known, or
// known to be unknown. However they were given, BreaksAt and MakesAt hold them
// afterwards.
func (d *decoder) thresholds(s *Survey, c *Control) {
	fromDial := c.SetPoint.Set && c.Marks.Set && c.Differential.Set
	some := c.SetPoint.Written() || c.Marks.Written() || c.Differential.Written()
	if some && !fromDial && !(c.BreaksAt.Set && c.MakesAt.Set) {
		for _, k := range []struct {
			s   Source
			set bool
			n   string
		}{{c.SetPoint.Source, c.SetPoint.Set, "set_point"}, {c.Marks.Source, c.Marks.Set, "marks"}, {c.Differential.Source, c.Differential.Set, "differential"}} {
			if !k.set && k.s.Line == 0 {
				d.failAt(c.Source, "key missing", "no "+k.n, "set_point, marks and differential together, or breaks_at and makes_at")
			}
		}
	}
	if c.Differential.Set && c.Differential.V <= 0 {
		d.failAt(c.Differential.Source, "no differential at all", c.Differential.Text, "more than 0 K: a contact that makes and breaks at one temperature cannot be")
		return
	}
	if fromDial {
		d.fromDial(c)
	}
	oneEdge := c.Reset.V == ResetOneShot && (c.BreaksAt.Set || c.MakesAt.Set)
	if !c.BreaksAt.Set || !c.MakesAt.Set {
		if unread(c.BreaksAt) || unread(c.MakesAt) || unread(c.SetPoint) || unread(c.Differential) {
			return // has been said
		}
		unknown := c.BreaksAt.Written() || c.MakesAt.Written() || c.SetPoint.Written()
		if !some && !unknown && !oneEdge {
			d.failAt(c.Source, "where does it make and break?", "neither breaks_at and makes_at nor set_point, marks and differential", "breaks_at and makes_at, as measured; `unknown` is an answer for a part that stays")
		} else if c.Plan.V == Replace && !oneEdge && !some {
			d.failAt(c.Source, "a part to be replaced needs both edges", "breaks_at "+stated(c.BreaksAt)+", makes_at "+stated(c.MakesAt), "measure them on the bench, or keep the part")
		}
		return
	}
	if c.Action.V == BreaksOnRise && c.BreaksAt.V <= c.MakesAt.V {
		d.failAt(c.BreaksAt.Source, "breaks below its make", c.BreaksAt.Text, "above makes_at ("+c.MakesAt.Text+"), for it breaks on rise; or action: makes_on_rise")
	}
	if c.Action.V == MakesOnRise && c.BreaksAt.V >= c.MakesAt.V {
		d.failAt(c.MakesAt.Source, "makes below its break", c.MakesAt.Text, "above breaks_at ("+c.BreaksAt.Text+"), for it makes on rise; or action: breaks_on_rise")
	}
	d.inSensorsRange(s, c)
}

// unread reports a value that was written and could not be read.
func unread(f Field[float64]) bool { return f.Written() && !f.Set && f.Text != "unknown" }

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
		needs := c.Switching() || c.Modulating() || c.Action.V == Indicates
		if needs && !c.Sensor.Set && !(c.Plan.V == Monitor && c.ReadBy.Set) {
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
	for _, f := range []Field[float64]{o.On, o.Off} {
		if f.Set && f.V <= 0 {
			d.failAt(f.Source, "no time at all", f.Text, "longer than nothing")
		}
	}
	if c.Modulating() && c.StartsAt.Set && c.FullAt.Set && c.StartsAt.V == c.FullAt.V {
		d.failAt(c.FullAt.Source, "no band at all", c.FullAt.Text, "other than starts_at")
	}
	if c.HoldsFrom.Set && c.ReleasesAt.Set && c.HoldsFrom.V <= c.ReleasesAt.V {
		d.failAt(c.HoldsFrom.Source, "holds below its release", c.HoldsFrom.Text, "above releases_at ("+c.ReleasesAt.Text+")")
	}
}
