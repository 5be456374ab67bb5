package sheets

import (
	"fmt"
	"strings"

	"makebreak/survey"
)

// stays gives the rows that come before anything is touched: each piece of
// hardware that stays as it is.
func stays(s *survey.Survey) []check {
	var cs []check
	for _, c := range s.Controls {
		if c.Plan.V == survey.Keep || c.Plan.V == survey.Monitor {
			cs = append(cs, proof(c, "before anything is touched: "))
		}
	}
	if len(cs) == 0 {
		cs = append(cs, check{"hardware limits", "before anything is touched: look for hardware that limits this plant", "the sheet names none that stays; if there is any, it stays and is proved first"})
	}
	return cs
}

// fitted gives the rows for hardware that is new: it is proved once it is
// there, before the program may run.
func fitted(s *survey.Survey) []check {
	var cs []check
	for _, c := range s.Controls {
		if c.Plan.V == survey.Add || c.Plan.V == survey.Renew {
			cs = append(cs, proof(c, "once fitted, before the program runs: "))
		}
	}
	return cs
}

// proof is how one piece of hardware shows that it works.
func proof(c *survey.Control, when string) check {
	do, expect := "", ""
	switch {
	case c.Reset.V == survey.ResetOneShot:
		do = "do not heat it, it opens only once; isolate, look at it, open its circuit at its terminals, give the supply back"
		expect = fmt.Sprintf("whole, free, not painted, greased, jammed or bridged, and rated %s; with its circuit open, %s cannot run", at(c.BreaksAt), cutBy(c))
	case c.Action.V == survey.HoldsWhileHot:
		do = "put the flame out at its own cock and time the valve"
		expect = "shuts by itself"
		if c.ShutsWithin.Set {
			expect += " within " + span(c.ShutsWithin.V)
		} else {
			expect += "; within what time is not on the sheet: write it down"
		}
	case c.Action.V == survey.ClosesOnRise, c.Action.V == survey.OpensOnRise:
		word := map[survey.Action]string{survey.ClosesOnRise: "close", survey.OpensOnRise: "open"}[c.Action.V]
		do = "warm its element slowly and watch the valve"
		expect = fmt.Sprintf("begins to %s %s, has done so %s", word, at(c.StartsAt), at(c.FullAt))
	case c.Action.V == survey.Pulses:
		do, expect = "count its pulses with a stopwatch", "a rate is not on the sheet: write it down"
		if c.Rate.Set {
			expect = fmt.Sprintf("%.4g /min", c.Rate.V*60)
		}
	case c.Action.V == survey.Indicates:
		do, expect = "compare it with a reference thermometer", "reads the same"
		if c.Tolerance.Set {
			expect += fmt.Sprintf(" ± %s", kelvins(c.Tolerance.V))
		}
	case len(c.Cuts) == 0:
		do = "warm its element slowly, then let it cool, and watch its contact"
		expect = fmt.Sprintf("breaks %s, makes %s%s", at(c.BreaksAt), at(c.MakesAt), within(c))
	default:
		do, expect = cuts(c)
	}
	return check{c.ID.V, when + do, expect}
}

// cuts is the proof of a limit that breaks its loads by itself.
func cuts(c *survey.Control) (do, expect string) {
	do = "warm its element slowly and watch the load"
	if c.Action.V == survey.MakesOnRise { // the same as breaks on fall
		do = "cool its element slowly and watch the load"
	}
	expect = fmt.Sprintf("it cuts %s by itself %s%s", cutBy(c), at(c.BreaksAt), within(c))
	if c.Reset.V == survey.ResetManual {
		expect += ", and stays so until its button is pressed"
		if c.TripFree.V {
			expect += "; with the button held in it cuts all the same"
		}
	}
	return do, expect
}

// at is a temperature of the sheet, or a word that it is not there.
func at(f survey.Field[float64]) string {
	if !f.Set {
		return "at a temperature that is not on the sheet (write it down)"
	}
	return "at " + degrees(f.V)
}

func within(c *survey.Control) string {
	if !c.Tolerance.Set {
		return ""
	}
	return " ± " + kelvins(c.Tolerance.V)
}

func cutBy(c *survey.Control) string {
	var parts []string
	for _, n := range c.Cuts {
		parts = append(parts, n.V)
	}
	if len(parts) == 0 {
		return "its load (the sheet does not say which)"
	}
	return strings.Join(parts, " and ")
}
