package faults

import (
	"fmt"

	"makebreak/survey"
	"makebreak/translate"
)

// withHardware adds what stays hard-wired to an end: a limit that points the
// right way and cuts the load ends what the control leaves on. A limit that
// opens only the coil of the very contactor that has welded ends nothing.
func withHardware(spec *translate.Specification, l *translate.Switched, e end, welded bool) end {
	if e.grade != wrong || l.Load.SafeState.V.Energised() {
		return e
	}
	var why string
	for _, c := range spec.Survey.Controls {
		if !stays(c) || !c.Cuts.Has(l.Load.ID.V) {
			continue
		}
		switch {
		case !pointsRight(spec, c, l):
			why = fmt.Sprintf("; %s points the other way", c.ID.V)
		case welded && c.CutsBy.V == "same_coil":
			why = fmt.Sprintf("; %s opens only the coil of the contact that is welded", c.ID.V)
		case welded && (c.CutsBy.V == "unknown" || !c.CutsBy.Set):
			why = fmt.Sprintf("; through what %s cuts is not known", c.ID.V)
		case c.Shares.Has("sensor"):
			why = fmt.Sprintf("; %s shares its sensor", c.ID.V)
		case !c.BreaksAt.Set:
			return end{bounded, fmt.Sprintf("%s cuts it; at what temperature is not known", c.ID.V)}
		default:
			return end{bounded, fmt.Sprintf("cut by %s at %s%s", c.ID.V, translate.Degrees(c.BreaksAt.V), plusMinus(c))}
		}
	}
	return end{e.grade, e.text + why}
}

func plusMinus(c *survey.Control) string {
	if !c.Tolerance.Set {
		return ", tolerance not stated"
	}
	return " ± " + translate.Kelvins(c.Tolerance.V)
}

func stays(c *survey.Control) bool { return c.Plan.V != survey.Replace }

// pointsRight reports whether a limit acts on the side to which its load
// drives: a load that warms needs one that breaks on rise.
func pointsRight(spec *translate.Specification, c *survey.Control, l *translate.Switched) bool {
	if c.Action.V == survey.HoldsWhileHot {
		return true
	}
	warms, known := l.Warms(spec.Survey)
	if !known {
		return c.Action.V == survey.BreaksOnRise
	}
	return (c.Action.V == survey.BreaksOnRise) == warms
}
