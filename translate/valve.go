package translate

import (
	"fmt"
	"math"

	"makebreak/survey"
	"makebreak/translate/logic"
	"makebreak/translate/thermal"
)

// band is where a self-acting valve moves, degC, the lower end first.
func band(c *survey.Control) (low, high float64) {
	return math.Min(c.StartsAt.V, c.FullAt.V), math.Max(c.StartsAt.V, c.FullAt.V)
}

// modulates reports whether a self-acting valve becomes part of the program:
// its band is known, or a PID control with a set point is wanted, and a load
// follows it.
func (b *builder) modulates(c *survey.Control) bool {
	if !c.Modulating() || c.Plan.V != survey.Replace || !c.Sensor.Set {
		return false
	}
	known := c.StartsAt.Set && c.FullAt.Set || wantsPID(c) && c.SetPoint.Set
	return known && b.runBy(c).Follows.V == c.ID.V
}

// proportional builds the like of a self-acting valve: the opening goes with
// the temperature through its band, with the same offset, and with the same
// hysteresis, as play between the temperature and the stem.
//
// The play keeps a motor from following every count. At both ends of the band
// it is taken up, so that the valve shuts and opens in full.
func (b *builder) proportional(c *survey.Control, p *Probe) *Regulator {
	id := c.ID.V
	r := b.reading(p)
	low, high := band(c)
	g := &Regulator{Control: c, Probe: p}
	k := func(name string, v int64, unit, means, working string, from survey.Source) *logic.Const {
		return b.constant(logic.Const{Name: id + "_" + name, Value: v, Unit: unit, Means: means, Origin: origin(from), Working: working})
	}
	unit := fmt.Sprintf("%g K", r.Unit)
	lowest, highest := c.StartsAt, c.FullAt
	if lowest.V > highest.V {
		lowest, highest = highest, lowest
	}
	shut, open := "it is shut", "it is fully open"
	if !c.Cools() {
		shut, open = open, shut
	}
	bottom := k("band_from", r.in(low), unit, Degrees(low)+": below, "+shut, "in steps of the reading", lowest.Source)
	top := k("band_to", r.in(high), unit, Degrees(high)+": above, "+open, "in steps of the reading", highest.Source)
	width := k("band", top.Value-bottom.Value, unit, Kelvins(high-low), top.Name+" - "+bottom.Name, c.FullAt.Source)
	into := logic.Sub(logic.Use(r.Value), logic.C(bottom))
	if !c.Cools() { // opens as it cools
		into = logic.Sub(logic.C(top), logic.Use(r.Value))
	}
	past := b.whole(b.name(id, "past_shut"), "how far the reading is past where it is shut", into)
	in := b.whole(b.name(id, "into_band"), "the same, within the band", logic.Clamp(logic.Use(past), logic.Lit(0), logic.C(width)))
	demand := b.whole(b.name(id, "demand"), "opening for this reading", logic.Div(logic.Mul(logic.Use(in), logic.Lit(thermal.Full)), logic.C(width)))

	play := int64(math.Round(thermal.Full * known(c.Hysteresis) / 2 / (high - low)))
	g.Permille = b.state(logic.Var{Name: b.name(id, "permille"), What: c.What.V + ": opening", Kind: logic.Int, Range: logic.Range{Lo: 0, Hi: thermal.Full}, Start: g.Safe})
	to := logic.Use(demand)
	if play > 0 {
		half := k("play", play, "permille", "half of the hysteresis of "+Kelvins(c.Hysteresis.V), "1000 × hysteresis / 2 / band", c.Hysteresis.Source)
		least := b.whole(b.name(id, "least"), "the play's lower end", logic.Sub(logic.Use(demand), logic.C(half)))
		most := b.whole(b.name(id, "most"), "the play's upper end", logic.Add(logic.Use(demand), logic.C(half)))
		held := b.whole(b.name(id, "held"), "where the play leaves it", logic.Clamp(logic.Prev(g.Permille), logic.Use(least), logic.Use(most)))
		to = logic.Select(logic.Eq(logic.Use(demand), logic.Lit(0)), logic.Lit(0),
			logic.Select(logic.Eq(logic.Use(demand), logic.Lit(thermal.Full)), logic.Lit(thermal.Full),
				logic.Clamp(logic.Use(held), logic.Lit(0), logic.Lit(thermal.Full))))
	}
	b.add(&logic.Set{Var: g.Permille, When: p.good(), To: to, Why: "stays where it is while the probe is in doubt"})
	return g
}

// valveFigures says what the old valve did and the new one will: band, gain and
// the offset that goes with the load.
func (b *builder) valveFigures(c *survey.Control) {
	if !c.Modulating() || !c.StartsAt.Set || !c.FullAt.Set {
		return
	}
	fs, at := &b.spec.Figures, c.FullAt.Path
	low, high := band(c)
	fs.add(c.ID.V, "band", high-low, "K", at, fmt.Sprintf("%s to %s", Degrees(low), Degrees(high)))
	fs.add(c.ID.V, "valve_gain", 1/(high-low), "1/K", at, "share of the opening for one kelvin: 1 / band")
	for _, share := range []float64{0.25, 0.5, 0.75} {
		t := low + share*(high-low)
		if !c.Cools() {
			t = high - share*(high-low)
		}
		fs.add(c.ID.V, fmt.Sprintf("at_%g_percent", 100*share), t, "degC", at, fmt.Sprintf("the valve is %g %% open there: what it holds moves through the band with the load", 100*share))
	}
	b.settles(c, low, high)
}

// settles works out where the process comes to rest under the proportional
// action: T = Toff + K·u with u through the band gives
//
//	closes on rise  T = (Toff·B + K·high)/(B + K)
//	opens on rise   T = (Toff·B − K·low)/(B − K), K below 0 where opening cools
//
// for a first-order process with B the band and K = settles_on − settles_off;
// held to the ends of the band (proportional control, closed form).
func (b *builder) settles(c *survey.Control, low, high float64) {
	fs, p := &b.spec.Figures, b.survey.Process
	from := "process"
	open := func(reason string) { fs.open(c.ID.V, "settles_at", "degC", from, "not determined: "+reason) }
	if !drives(b.survey, b.runBy(c).ID.V) || !p.SettlesOn.Set || !p.SettlesOff.Set {
		open("settles_on and settles_off of the process, with the valve open and shut, are not both on the sheet")
		return
	}
	t, u := rest(p.SettlesOn.V, p.SettlesOff.V, low, high, c.Cools())
	middle := (low + high) / 2
	fs.add(c.ID.V, "settles_at", t, "degC", from, fmt.Sprintf("settles at %s open and %s shut: with the valve %.3g %% open; offset from the middle of the band %s",
		Degrees(p.SettlesOn.V), Degrees(p.SettlesOff.V), 100*u, Kelvins(t-middle)))
	if w := p.Worst; w.SettlesOn.Set {
		off := p.SettlesOff.V
		if w.SettlesOff.Set {
			off = w.SettlesOff.V
		}
		t, u := rest(w.SettlesOn.V, off, low, high, c.Cools())
		fs.add(c.ID.V, "settles_at_worst", t, "degC", w.SettlesOn.Path, fmt.Sprintf("settles at %s open and %s shut: with the valve %.3g %% open", Degrees(w.SettlesOn.V), Degrees(off), 100*u))
	}
}

// rest is where a first-order process comes to rest with an opening that goes
// through a band, and the opening there.
func rest(on, off, low, high float64, cools bool) (t, opening float64) {
	k, b := on-off, high-low
	if cools {
		t = (off*b - k*low) / (b - k)
		opening = (t - low) / b
	} else {
		t = (off*b + k*high) / (b + k)
		opening = (high - t) / b
	}
	opening = math.Min(math.Max(opening, 0), 1)
	return off + k*opening, opening
}
