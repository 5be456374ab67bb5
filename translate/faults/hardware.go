package faults

import (
	"fmt"

	"makebreak/survey"
	"makebreak/translate"
)

// withHardware adds what stays hard-wired to an end: a limit that points the
// right way and cuts the load ends what the control leaves on. A limit that
// opens only the coil of the very contactor that has welded ends nothing, and
// one that package risk does not let count against a danger of this load (too
// late, filed as operating …) is not let count here either.
func (a *assessor) withHardware(l *translate.Switched, e end, welded bool) end {
	if e.grade != wrong || l.Load.SafeState.V.Energised() {
		return e
	}
	var why string
	for _, c := range a.spec.Survey.Controls {
		if !stays(c) || !c.Cuts.Has(l.Load.ID.V) {
			continue
		}
		rejected := a.rejected(c)
		switch {
		case !pointsRight(a.spec, c, l):
			why = fmt.Sprintf("; %s points the other way", c.ID.V)
		case welded && c.CutsBy.V == "same_coil":
			why = fmt.Sprintf("; %s opens only the coil of the contact that is welded", c.ID.V)
		case welded && (c.CutsBy.V == "unknown" || !c.CutsBy.Set):
			why = fmt.Sprintf("; through what %s cuts is not known", c.ID.V)
		case c.Shares.Has("sensor"):
			why = fmt.Sprintf("; %s shares its sensor", c.ID.V)
		case rejected != "":
			why = "; " + rejected
		case c.Action.V == survey.HoldsWhileHot:
			return end{unsure, fmt.Sprintf("unknown: %s shuts it when its flame is out, which is another cause", c.ID.V)}
		case !c.BreaksAt.Set:
			return end{unsure, fmt.Sprintf("unknown: %s cuts it, at what temperature is not known", c.ID.V)}
		default:
			return end{bounded, fmt.Sprintf("cut by %s at %s%s", c.ID.V, translate.Degrees(c.BreaksAt.V), plusMinus(c))}
		}
	}
	return end{e.grade, e.text + why}
}

// rejected says why a part does not count against a danger that it points
// against, or nothing.
func (a *assessor) rejected(c *survey.Control) string {
	if a.view == nil {
		return ""
	}
	for _, g := range a.view.Guards {
		switch {
		case g.Control.ID != c.ID.V || g.Counts:
		case g.Beyond:
			return fmt.Sprintf("%s acts at %s at worst, and %s begins at %s", c.ID.V, translate.Degrees(g.Worst), g.Danger.ID, translate.Degrees(g.Limit))
		default:
			return fmt.Sprintf("%s does not count against %s (see the findings)", c.ID.V, g.Danger.ID)
		}
	}
	return ""
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
