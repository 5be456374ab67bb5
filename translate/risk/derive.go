package risk

import (
	"math"
	"slices"

	"makebreak/survey"
	"makebreak/survey/catalogue"
)

func nan() float64 { return math.NaN() }

func contains(list []string, word string) bool { return slices.Contains(list, word) }

func addOnce(list []string, word string) []string {
	if contains(list, word) {
		return list
	}
	return append(list, word)
}

// load derives what the wiring and the rest of the sheet say of a load.
func (b *builder) load(v *Load, l *survey.Load) {
	v.Effect = b.judge.effects[v.ID]
	v.Heats = v.Effect == heats
	v.Rest = string(restOf(l))
	v.SafeOn = l.SafeState.V.Energised()
	v.RestsOn = restOf(l).Energised()
	v.Controls = controlsOf(b.s, l)
	v.Driven = b.driven(v, l)
	v.Proving = b.proving(l)
	v.Excludes = b.excludes(l)
	v.ThermalStart = b.thermalStart(l)
	v.RunsOn = v.ThermalStart || b.timedRunOn(l)
	v.MinOff = 0
	var sensors []string
	guarded := false
	for _, id := range v.Controls {
		c := controlOf(b.s, id)
		v.MinOff = math.Max(v.MinOff, c.MinOff.V)
		if c.Duty.V == survey.Operating {
			v.Stats = append(v.Stats, id)
		}
		if c.Duty.V != survey.Operating && c.Reset.V == survey.ResetAutomatic {
			v.RestartsItself = true
		}
		if c.Plan.V == survey.Replace && c.Sensor.V != "" && b.onConverter(c.Sensor.V) {
			sensors = addOnce(sensors, c.Sensor.V)
			guarded = guarded || c.Duty.V != survey.Operating
		}
	}
	if guarded && len(sensors) > 1 {
		v.Redundant = sensors
	}
	b.cutBy(v)
}

// onConverter reports whether the sensor is read by the analogue converter.
func (b *builder) onConverter(id string) bool {
	s := find(b.s.Electronics.Sensors, func(s *survey.Sensor) bool { return s.ID.V == id })
	return s != nil && s.Kind.V != "digital"
}

// cutBy derives what hardware cuts the load by itself.
func (b *builder) cutBy(v *Load) {
	for _, c := range b.s.Controls {
		if !hardware(c.Plan.V) || !c.Cuts.Has(v.ID) {
			continue
		}
		if c.Action.V == survey.BreaksOnRise && c.Duty.V != survey.Operating {
			v.HighLimit = true
		}
		if c.Action.V == survey.HoldsWhileHot {
			v.FlameGuard = true
			v.BurnerControl = v.BurnerControl || c.Plan.V == survey.Renew
		}
		if ownElement(c) && !sharesSensor(c) && c.Duty.V != survey.Operating {
			v.SupplySideCut = true
		}
	}
}

// ownElement reports whether the control breaks its loads through an element
// of its own and not through what the new output drives.
func ownElement(c *survey.Control) bool {
	switch c.CutsBy.V {
	case "own_contactor", "own_valve", "direct":
		return true
	}
	return false
}

// driven reports whether the new program switches the load: it has an output
// stage, or its wiring holds anything that is not a part that stays.
func (b *builder) driven(v *Load, l *survey.Load) bool {
	if v.Output.Kind != unknown {
		return true
	}
	for _, name := range namesOf(l) {
		if c := controlOf(b.s, name); c == nil || c.Plan.V == survey.Replace {
			return true
		}
	}
	return false
}

// proving lists the signals that the load's wiring wants true.
func (b *builder) proving(l *survey.Load) []string {
	var ids []string
	for _, name := range wanted(l) {
		if find(b.s.Signals, func(s *survey.Signal) bool { return s.ID.V == name }) != nil {
			ids = append(ids, name)
		}
	}
	return ids
}

// thermalStart reports whether the load starts on a rising temperature.
func (b *builder) thermalStart(l *survey.Load) bool {
	for _, name := range wanted(l) {
		if c := controlOf(b.s, name); c != nil && c.Action.V == survey.MakesOnRise {
			return true
		}
	}
	return false
}

// timedRunOn reports whether a timer keeps the load on after a heating load.
func (b *builder) timedRunOn(l *survey.Load) bool {
	for _, name := range wanted(l) {
		if t := timerOf(b.s, name); t != nil && b.judge.effects[t.After.V] == heats {
			return true
		}
	}
	return false
}

// loadDangers derives which dangers each load can reach.
func (b *builder) loadDangers() {
	for _, p := range b.view.Paths {
		l, d := p.Load, p.Danger
		if d.When != unknown {
			l.StateSerious = l.StateSerious || d.Harm == "serious"
		}
		l.Drives = true
		l.DrivesWhenOn = l.DrivesWhenOn || p.State == "on" || p.State == "open"
		l.Serious = l.Serious || d.Harm == "serious"
		l.DrivesBelow = l.DrivesBelow || !math.IsNaN(d.Below)
	}
}

// control derives what the rest of the sheet and the catalogue say of a control.
func (b *builder) control(v *Control, c *survey.Control) {
	v.Breaks, v.Makes, v.Band = nan(), nan(), nan()
	if breaks, makes, ok := edges(c); ok {
		v.Breaks, v.Makes, v.Band = breaks, makes, math.Abs(breaks-makes)
	} else if c.BreaksAt.Set {
		v.Breaks = c.BreaksAt.V
	}
	v.Hardware = hardware(c.Plan.V)
	v.ProtectivePart = protectivePart(c)
	v.Switching = c.Action.V == survey.BreaksOnRise || c.Action.V == survey.MakesOnRise
	v.DialStays = c.DialStays()
	v.SelfActing = selfActing(c)
	v.ActsOn = b.actsOn(c)
	b.controlDangers(v, c)
	v.SoleInDirection = b.soleInDirection(v, c)
	v.SupplyLossSafe = len(v.ActsOn) > 0
	for _, id := range v.ActsOn {
		l := b.loadView(id)
		v.Heats = v.Heats || l.Heats
		v.CutsDriven = v.CutsDriven || l.Driven && c.Cuts.Has(id)
		v.SupplyLossSafe = v.SupplyLossSafe && l.SafeOn == l.RestsOn
	}
	v.SecondElement = b.secondElement(c)
	v.MediumLimit = b.mediumLimit(v)
	v.Mains = b.mains()
	v.Sensor = orUnknown(c.Sensor.V)
	v.SensorWhat = unknown
	if s := find(b.view.Sensors, func(s *Sensor) bool { return s.ID == v.Sensor }); s != nil {
		v.SensorWhat = s.What
	}
	b.fromCatalogue(v, c)
	v.NotTranslated = b.judge.computed.NotTranslated[v.ID]
	v.ProofDue, v.ProofOverdue = b.proof(c)
}

// protectivePart: a part with a manual or one-shot reset, or that holds while
// hot, is protective whatever the sheet calls it.
func protectivePart(c *survey.Control) bool {
	return c.Duty.V == survey.Protective || c.Reset.V == survey.ResetManual || c.Reset.V == survey.ResetOneShot ||
		c.Action.V == survey.HoldsWhileHot || c.Element.V == "fusible_link"
}

func selfActing(c *survey.Control) bool {
	if c.Action.V == survey.ClosesOnRise || c.Action.V == survey.OpensOnRise {
		return true
	}
	return c.Element.V == "wax" || c.Element.V == "thermocouple_valve"
}

func (b *builder) actsOn(c *survey.Control) []string {
	var ids []string
	for _, f := range c.Cuts {
		ids = addOnce(ids, f.V)
	}
	for _, l := range b.s.Loads {
		if contains(controlsOf(b.s, l), c.ID.V) {
			ids = addOnce(ids, l.ID.V)
		}
	}
	return ids
}

func (b *builder) controlDangers(v *Control, c *survey.Control) {
	for _, p := range b.view.Paths {
		if !contains(v.ActsOn, p.Load.ID) {
			continue
		}
		v.GuardsBelow = v.GuardsBelow || !math.IsNaN(p.Danger.Below)
		if p.Danger.Harm == "serious" {
			v.GuardsSerious = true
			v.GuardsScarcely = v.GuardsScarcely || p.Danger.Avoidance == "scarcely"
		}
	}
}

// soleInDirection: filed as operating, and the outermost of what stands in the
// way of a danger of serious harm, with nothing limiting or protective beside
// it on the same load.
func (b *builder) soleInDirection(v *Control, c *survey.Control) bool {
	if c.Duty.V != survey.Operating {
		return false
	}
	for _, w := range b.ways {
		if !w.on || !w.open() || w.danger.When.Set || w.danger.Harm.V != "serious" {
			continue
		}
		if contains(v.ActsOn, w.load.ID.V) && directed(c, w.danger) && b.outermost(c, w) {
			return true
		}
	}
	return false
}

func (b *builder) outermost(c *survey.Control, w *way) bool {
	mine, known := breaksAt(c, w.danger)
	for _, other := range b.s.Controls {
		if other == c || !directed(other, w.danger) || !contains(b.actsOn(other), w.load.ID.V) {
			continue
		}
		if other.Duty.V != survey.Operating {
			return false
		}
		at, ok := breaksAt(other, w.danger)
		if ok && known && (at > mine) == w.danger.Above.Set && at != mine {
			return false
		}
	}
	return true
}

// secondElement reports whether other hardware cuts one of the same loads
// through an element of its own.
func (b *builder) secondElement(c *survey.Control) bool {
	for _, other := range b.s.Controls {
		if other == c || !hardware(other.Plan.V) || !ownElement(other) {
			continue
		}
		for _, f := range c.Cuts {
			if other.Cuts.Has(f.V) {
				return true
			}
		}
	}
	return false
}

// mediumLimit reports whether every heating load of the control is still cut
// by hardware that senses the medium.
func (b *builder) mediumLimit(v *Control) bool {
	found := false
	for _, id := range v.ActsOn {
		l := b.loadView(id)
		if !l.Heats {
			continue
		}
		if !l.HighLimit {
			return false
		}
		found = true
	}
	return found
}

// mains: from 50 V alternating on, a fault from the load's side to the probe
// is a shock hazard (IEC 61140).
func (b *builder) mains() bool {
	return slices.ContainsFunc(b.s.Loads, func(l *survey.Load) bool { return !l.Supply.Set || l.Supply.V >= 50 })
}

func (b *builder) fromCatalogue(v *Control, c *survey.Control) {
	v.UsualFailure = unknown
	if e, ok := b.cat.Element(c.Element.V); ok {
		for _, s := range e.Contains {
			v.Contains = append(v.Contains, s.What+" ("+s.Where+"): "+s.Do+" Source: "+s.Source.String()+".")
		}
		v.UsualFailure = usualFailure(e, string(c.Action.V))
	}
	if c.Plan.V != survey.Replace && c.Plan.V != survey.Monitor {
		return
	}
	if r, ok := b.cat.RefusedBy(c.What.V); ok {
		v.Refused, v.RefusedWhy = r.Title, r.Why
	}
}

// usualFailure says in words what the first failure of the catalogue's entry
// does to the contact or valve.
func usualFailure(e *catalogue.Element, action string) string {
	if len(e.Failures) == 0 {
		return unknown
	}
	f := e.Failures[0]
	text := f.ID + ": " + f.What
	if does := catalogue.Reads(action, f.Reads); does != catalogue.Unknown {
		text += " The part then " + does + "."
	}
	return text + " Source: " + f.Source.String() + "."
}
