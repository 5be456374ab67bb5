package codegen

import (
	"makebreak/codegen/csource"
	"makebreak/survey"
	"makebreak/translate"
)

// Facts gathers what a reader of the C wants to know besides the program.
func Facts(spec *translate.Specification, cautions []string) csource.Facts {
	s := spec.Survey
	f := csource.Facts{
		Title:       s.Equipment.Title.V,
		Site:        s.Equipment.Site.V,
		Sheet:       s.File,
		Hash:        s.Hash,
		Cautions:    cautions,
		Nonvolatile: s.Electronics.Nonvolatile.V == "true",
		Watchdog:    s.Electronics.Watchdog.V,
		Version:     Version,
	}
	for _, c := range s.Controls {
		line := c.ID.V + ": " + c.What.V
		switch c.Plan.V {
		case survey.Replace:
			f.Replaces = append(f.Replaces, line)
		default:
			f.Stays = append(f.Stays, line)
		}
	}
	for _, l := range s.Loads {
		if spec.Plan == nil || spec.Plan.Loads[l.ID.V] == nil {
			continue
		}
		p := spec.Plan.Loads[l.ID.V]
		f.Loads = append(f.Loads, csource.Load{
			Name: l.ID.V, What: l.What.V,
			SafeState: string(l.SafeState.V), Rest: string(l.Rest.V), RestsOn: l.Rest.V.Energised(),
			Pulsed:   p.Output != nil && p.Output.Drive.V == "pulsed",
			ReadBack: p.Seen != nil,
		})
	}
	return f
}
