package switching

import (
	"fmt"

	"makebreak/survey"
)

// Check is one question about an output stage and its load. Without a figure
// it is not determined, and then nothing holds.
type Check struct {
	Name       string // rating, voltage, kind of current, usable current, inrush, least current, leakage, temperature
	Holds      bool
	Determined bool
	Value      float64 // what is compared with the limit, as a share of it, where there is a number
	Working    string  // or the reason
}

// Stage is an output stage, its load and their surroundings.
type Stage struct {
	Output *survey.Output
	Load   *survey.Load
	Inrush Result                // peak at switching on, A: see Inrush
	Box    survey.Field[float64] // warmest air around the stage, degC
}

// Check asks everything that a stage of this kind has to answer, in a fixed order.
func (s Stage) Check() []Check {
	if s.kind() == "analogue" {
		return nil // nothing is switched
	}
	cs := []Check{s.rating(), s.voltage(), s.current(), s.usable(), s.inrush(), s.least()}
	if s.semiconductor() {
		cs = append(cs, s.leakage(), s.temperature())
	}
	return cs
}

func (s Stage) kind() string { return s.Output.Kind.V }

func (s Stage) semiconductor() bool { return s.kind() == "ssr" || s.kind() == "triac" }

// limit compares a value with the most that is allowed.
func limit(name string, value, most float64, format string, args ...any) Check {
	return Check{Name: name, Holds: value <= most, Determined: true, Value: value / most, Working: fmt.Sprintf(format, args...)}
}

func undetermined(name, format string, args ...any) Check {
	return Check{Name: name, Working: notDetermined + fmt.Sprintf(format, args...)}
}

func verdict(name string, holds bool, why string) Check {
	return Check{Name: name, Holds: holds, Determined: true, Working: why}
}

func stated(fs ...survey.Field[float64]) bool {
	for _, f := range fs {
		if !f.Set || !(f.V > 0) {
			return false
		}
	}
	return true
}

func (s Stage) rating() Check {
	i, r := s.Load.Current, s.Output.RatedCurrent
	if !stated(i, r) {
		return undetermined("rating", "the current of the load or the rating of the output is not stated")
	}
	return limit("rating", i.V, r.V, "%.4g A of %.4g A rated", i.V, r.V)
}

func (s Stage) voltage() Check {
	u, r := s.Load.Supply, s.Output.RatedVoltage
	if !stated(u, r) {
		return undetermined("voltage", "the supply of the load or the rated voltage of the output is not stated")
	}
	return limit("voltage", u.V, r.V, "%.4g V of %.4g V rated", u.V, r.V)
}

// easyDC is the direct voltage up to which a contact's AC rating is commonly
// good for DC too; above, there is no zero crossing to put out the arc.
const easyDC = 30.0 // V

// current asks whether the stage can switch alternating or direct current.
func (s Stage) current() Check {
	const name = "kind of current"
	supply, kind := s.Load.SupplyIs.V, s.kind()
	switch {
	case supply != AC && supply != DC:
		return undetermined(name, "it is not stated whether the supply of the load is AC or DC (supply_is)")
	case kind == "triac" && supply == DC:
		return verdict(name, false, "a triac does not let go of direct current: it stays on")
	case kind == "transistor" && supply == AC:
		return verdict(name, false, "a transistor does not switch alternating current")
	case kind == "ssr" && supply == DC:
		return undetermined(name, "a solid-state relay for AC stays on on DC: it must be one for DC")
	case kind == "relay" && supply == DC && !stated(s.Load.Supply):
		return undetermined(name, "the voltage of the load is not stated; above %g V a contact breaks far less DC than AC", easyDC)
	case kind == "relay" && supply == DC && s.Load.Supply.V > easyDC:
		return undetermined(name, "%.4g V DC: above %g V a contact breaks far less DC than AC (common practice), the rating for DC decides", s.Load.Supply.V, easyDC)
	}
	return verdict(name, true, kind+" on "+supply)
}

// share is the part of a resistive rating that is left for a kind of load.
type share struct {
	part float64
	why  string
}

// Parts of a resistive contact rating, common practice for AC; a rating that
// the part has for the very category (AC-15, AC-3, DC-13) goes before.
var (
	coilShare  = share{0.4, "coil, power factor 0.4"}
	motorShare = share{0.35, "motor"}
	lampShare  = share{0.15, "cold filament"}
)

var shares = map[survey.LoadKind]share{
	"contactor": coilShare, "solenoid_valve": coilShare, "gas_valve": coilShare,
	"motor": motorShare, "compressor": motorShare, "pump": motorShare, "fan": motorShare, "damper": motorShare,
	"lamp": lampShare,
}

// usable compares the load with what a contact's resistive rating leaves for its kind.
func (s Stage) usable() Check {
	const name = "usable current"
	i, r := s.Load.Current, s.Output.RatedCurrent
	if !stated(i, r) {
		return undetermined(name, "the current of the load or the rating of the output is not stated")
	}
	if s.kind() != "relay" {
		return limit(name, i.V, r.V, "no arc in a semiconductor: %.4g A of %.4g A; an inductive load needs its voltage clamped", i.V, r.V)
	}
	d, ok := shares[s.Load.Kind.V]
	if !ok {
		return limit(name, i.V, r.V, "taken as resistive: %.4g A of %.4g A", i.V, r.V)
	}
	return limit(name, i.V, d.part*r.V, "%.4g A of %.4g A: %.2g of a resistive rating of %.4g A (%s; common practice, unless the part has a rating for this category)", i.V, d.part*r.V, d.part, r.V, d.why)
}

func (s Stage) inrush() Check {
	const name = "inrush"
	r := s.Output.RatedCurrent
	switch {
	case !s.Inrush.Determined:
		return undetermined(name, "%s", s.Inrush.reason())
	case !stated(r):
		return undetermined(name, "the rating of the output is not stated")
	}
	c := limit(name, s.Inrush.Value, r.V, "%.4g A (%s) of %.4g A rated", s.Inrush.Value, s.Inrush.Working, r.V)
	if !c.Holds {
		c.Working += "; the part's own making or surge rating must cover it"
	}
	return c
}

// cleanAbove is the current above which a contact of silver is commonly said to
// keep itself clean.
const cleanAbove = 0.1 // A

// least asks for the least current: what keeps a contact clean, or a triac on.
func (s Stage) least() Check {
	const name = "least current"
	i, m := s.Load.Current, s.Output.MinCurrent
	switch {
	case !stated(i):
		return undetermined(name, "the current of the load is not stated")
	case stated(m):
		return Check{Name: name, Holds: i.V >= m.V, Determined: true, Value: i.V / m.V, Working: fmt.Sprintf("%.4g A, at least %.4g A", i.V, m.V)}
	case s.kind() == "relay" && i.V >= cleanAbove:
		return verdict(name, true, fmt.Sprintf("%.4g A keeps a contact clean (common practice: from about %g A)", i.V, cleanAbove))
	case s.kind() == "transistor":
		return verdict(name, true, "a transistor needs none")
	}
	return undetermined(name, "the least current of the output is not stated (min_current), and %.4g A is little", i.V)
}

// leakage asks whether a load lets go although the switch leaks: its drop-out
// must be above the leakage. A heater has no drop-out.
func (s Stage) leakage() Check {
	const name = "leakage"
	l, d := s.Output.Leakage, s.Output.DropOut
	switch {
	case !stated(l):
		return undetermined(name, "the leakage of the output is not stated")
	case s.Load.Kind.V == "heater" && stated(s.Load.Current):
		part := l.V / s.Load.Current.V
		return Check{Name: name, Holds: true, Determined: true, Value: part,
			Working: fmt.Sprintf("a heater has no drop-out: %.3g mA is %.2g %% of its power", 1000*l.V, 100*part*part)}
	case !stated(d):
		return undetermined(name, "the current below which the load lets go is not stated (drop_out); the switch leaks %.3g mA", 1000*l.V)
	}
	c := limit(name, l.V, d.V, "%.3g mA leak, the load lets go below %.3g mA", 1000*l.V, 1000*d.V)
	c.Holds = l.V < d.V
	return c
}

func (s Stage) temperature() Check {
	const name = "temperature"
	o := s.Output
	if !s.Box.Set {
		return undetermined(name, "the temperature of the enclosure is not stated")
	}
	hot := Hottest(Heat(o.OnDrop.V, s.Load.Current.V), o.ThermalRes.V, s.Box.V)
	switch {
	case !hot.Determined:
		return undetermined(name, "%s", hot.reason())
	case !o.MaxJunction.Set:
		return undetermined(name, "the highest temperature of the output is not stated; it reaches %.4g degC", hot.Value)
	}
	c := Check{Name: name, Holds: hot.Value <= o.MaxJunction.V, Determined: true, Working: fmt.Sprintf("%s, of %.4g degC", hot.Working, o.MaxJunction.V)}
	if room := o.MaxJunction.V - s.Box.V; room > 0 {
		c.Value = (hot.Value - s.Box.V) / room
	}
	return c
}
