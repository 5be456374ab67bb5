package risk

import (
	"math"
	"time"

	"makebreak/survey"
)

// plant derives what can be said of the sheet before its parts are looked at.
func (b *builder) plant() {
	p, s := b.view.Plant, b.s
	for _, c := range s.Controls {
		if c.Plan.V == survey.Replace {
			p.Replaced = append(p.Replaced, c.ID.V)
		}
		if protectivePart(c) && (c.Plan.V == survey.Replace || c.Plan.V == survey.Renew) {
			p.ProtectiveTouched = true
		}
		if hardware(c.Plan.V) && c.Duty.V != survey.Operating {
			p.HardLimits = append(p.HardLimits, c.ID.V)
		}
		p.Observed = p.Observed || c.Observed.On.Set
	}
	for _, d := range s.Dangers {
		p.SeriousDanger = p.SeriousDanger || d.Harm.V == "serious"
		p.DangerAbove = p.DangerAbove || d.Above.Set
		p.DangerBelow = p.DangerBelow || d.Below.Set
	}
	w := &s.Process.Worst
	p.SupervisionPossible = w.SettlesOn.Set && (w.SettlesOff.Set || s.Process.SettlesOff.Set || s.Process.Ambient.Set) &&
		s.Process.TimeConstant.Set && s.Process.DeadTime.Set
	p.NewestDate = newestDate(s)
	p.PaperMissing = paperMissing(s)
}

// plantDangers derives what needs the paths.
func (b *builder) plantDangers() {
	p := b.view.Plant
	for _, l := range b.view.Loads {
		if l.Driven && l.Serious && l.DrivesWhenOn && l.Output.Drive != "pulsed" {
			p.SeriousLevelDriven = append(p.SeriousLevelDriven, l.ID)
		}
	}
	if b.view.Equipment.Enclosure.Area == unknown {
		p.AreasNotStated = append(p.AreasNotStated, "enclosure")
	}
	for _, place := range b.view.Places {
		if place.Area == unknown {
			p.AreasNotStated = append(p.AreasNotStated, place.ID)
		}
	}
}

// paperMissing lists what of the paperwork of a change is not there: the two
// keys of the sheet, and the answers about the rest.
func paperMissing(s *survey.Survey) []string {
	var missing []string
	if orUnknown(s.Equipment.Change.V) == unknown {
		missing = append(missing, "change")
	}
	if orUnknown(s.Equipment.InspectedBy.V) == unknown {
		missing = append(missing, "inspector")
	}
	for _, paper := range papers {
		if find(s.Answers, func(a *survey.Answer) bool { return a.Finding.V == paperFinding && a.About.V == paper }) == nil {
			missing = append(missing, paper)
		}
	}
	return missing
}

// paperFinding is answered paper by paper.
const paperFinding = "paperwork_open"

var papers = []string{"rollback", "spares", "training", "label"}

// dateForm is how a sheet writes a date.
const dateForm = "2006-01-02"

// newestDate is the newest date in the sheet, the nearest thing to a clock
// that gives the same result every time; unknown where there is none.
func newestDate(s *survey.Survey) string {
	newest := ""
	take := func(date string) {
		if _, err := time.Parse(dateForm, date); err == nil && date > newest {
			newest = date
		}
	}
	for _, a := range s.Answers {
		take(a.Date.V)
	}
	for _, c := range s.Controls {
		take(c.LastProved.V)
	}
	return orUnknown(newest)
}

// proof works out when the control has to be proved next, and whether that day
// lies before the newest date in the sheet.
func (b *builder) proof(c *survey.Control) (due string, overdue bool) {
	last, err := time.Parse(dateForm, c.LastProved.V)
	if err != nil || !c.ProveEvery.Set {
		return unknown, false
	}
	days := int(math.Round(c.ProveEvery.V / 86400))
	due = last.AddDate(0, 0, days).Format(dateForm)
	newest := b.view.Plant.NewestDate
	return due, newest != unknown && due < newest
}

// sensors derives what each new sensor is used for.
func (b *builder) sensors() {
	for _, s := range b.view.Sensors {
		s.Mains = b.mains()
		for _, c := range b.view.Controls {
			if c.Sensor != s.ID {
				continue
			}
			s.Controls = append(s.Controls, c.ID)
			if c.Plan == "replace" {
				s.Replaces = append(s.Replaces, c.ID)
			}
			for _, id := range c.ActsOn {
				s.Cools = s.Cools || b.loadView(id).Effect == cools
				b.sensorDangers(s, id)
			}
		}
	}
}

func (b *builder) sensorDangers(s *Sensor, load string) {
	for _, p := range b.view.Paths {
		if p.Load.ID == load {
			s.Serious = s.Serious || p.Danger.Harm == "serious"
			s.GuardsAbove = s.GuardsAbove || !math.IsNaN(p.Danger.Above)
			s.GuardsBelow = s.GuardsBelow || !math.IsNaN(p.Danger.Below)
		}
	}
}

// signals derives what each signal permits.
func (b *builder) signals() {
	for _, s := range b.view.Signals {
		for _, l := range b.view.Loads {
			if !contains(l.Proving, s.ID) {
				continue
			}
			s.Permits = append(s.Permits, l.ID)
			if l.Heats {
				s.Proves = append(s.Proves, l.ID)
			}
			s.Serious = s.Serious || l.Serious && l.DrivesWhenOn
		}
	}
}
