package sheets

import (
	"fmt"
	"slices"

	"makebreak/survey"
	"makebreak/translate"
)

// dialled is what to test of a dial that the user keeps; without tells what the
// control does without it.
func dialled(c *survey.Control, d *translate.Dial, without string) []check {
	width := fmt.Sprintf("%.2g K", d.Layout.Width())
	return []check{
		{c.ID.V, fmt.Sprintf("turn the dial to its stops, and to the mark of %s", degrees(c.DialMark().V)),
			fmt.Sprintf("%d counts at the stop of %s, %d at that of %s, %d at the mark; one count is %s", d.Layout.Bottom, degrees(d.Layout.Low), d.Layout.Top, degrees(d.Layout.High), d.Marked, width)},
		{c.ID.V, "take the wiper's wire off", "fault " + c.ID.V + "_dial within 2 s; " + without},
	}
}

// regulators is what to test of the controls that give a position or a share.
func regulators(spec *translate.Specification) []check {
	var cs []check
	for _, c := range spec.Survey.Controls {
		g := spec.Plan.Regulators[c.ID.V]
		switch {
		case g == nil:
		case g.Sample != nil:
			cs = append(cs, held(spec, c, g)...)
		default:
			low, high := c.StartsAt, c.FullAt
			if low.V > high.V {
				low, high = high, low
			}
			below, above := "open", "shut"
			if c.Cools() {
				below, above = above, below
			}
			cs = append(cs,
				check{c.ID.V, fmt.Sprintf("take the probe slowly from below %s to above %s, beside a reference thermometer", degrees(low.V), degrees(high.V)),
					fmt.Sprintf("%s below %s, half way at %s, %s above %s; half a hysteresis of %s either way", below, degrees(low.V), degrees((low.V+high.V)/2), above, degrees(high.V), kelvins(c.Hysteresis.V))})
		}
	}
	return cs
}

// held is what to test of a PID control.
func held(spec *translate.Specification, c *survey.Control, g *translate.Regulator) []check {
	expect := fmt.Sprintf("comes to %s and stays there once the load is steady%s", degrees(c.DialMark().V), heldWithin(spec, c))
	i := slices.IndexFunc(spec.Tunings, func(t translate.Tuning) bool { return t.Control == c.ID.V })
	wait := ""
	if i >= 0 {
		wait = fmt.Sprintf("; wait for at least %s, four integral times", span(4*spec.Tunings[i].Chosen.Settings.Parallel().Ti))
	}
	cs := []check{{c.ID.V, "let it hold" + wait + ", with a recorder on it", expect + "; no lasting swing: with one, halve the gain and tell the designer"}}
	if g.Window != nil {
		cs = append(cs, check{c.ID.V, "count the switchings while it holds", fmt.Sprintf("no more than one on and one off in every %s; no pulse and no pause below %s",
			span(steps(spec, g.Window.Steps)), span(steps(spec, max(g.Window.MinPulse, 1))))})
	}
	if g.Dial != nil {
		cs = append(cs, dialled(c, g.Dial, "it holds the set point of the sheet, "+degrees(c.DialMark().V))...)
	}
	return cs
}

// heldWithin is how far a sound chain may hold from the set point.
func heldWithin(spec *translate.Specification, c *survey.Control) string {
	b, err := spec.Chains[c.Sensor.V].Budget(c.DialMark().V)
	if err != nil {
		return ""
	}
	return fmt.Sprintf(", within %s by a reference thermometer (worst error of the chain)", kelvins(b.WorstCase))
}

// valves is what to test of a load that takes any position.
func valves(spec *translate.Specification, v *translate.Valve) []check {
	l := v.Load
	goes := map[string]string{"closes": "shuts", "opens": "opens fully", "stays": "stays where it is"}[l.Actuator.OnPowerLoss.V]
	if goes == "" {
		goes = "not on the sheet: write down where it goes"
	}
	cs := []check{
		{l.ID.V, "take the supply of actuator and electronics away with the valve half way", goes},
		{l.ID.V, atHand + "stop the program (hold the processor in reset)", stopped(spec, &translate.Switched{Load: l, Output: v.Output})},
	}
	if l.Actuator.Travel.Set {
		cs = append(cs, check{l.ID.V, "run it from shut to open with a stopwatch", fmt.Sprintf("%s; the stem meets both ends", span(l.Actuator.Travel.V))})
	}
	if v.Open != nil {
		cs = append(cs, check{l.ID.V, "give the supply, and watch which way it runs", fmt.Sprintf("runs %s for a fifth longer than its travel before it follows; never both ways at once", map[bool]string{true: "open", false: "shut"}[v.Safe != 0])})
	}
	for _, g := range spec.Survey.Signals {
		if slices.Contains(l.RunsWhen.V.Tree.Names(), g.ID.V) {
			cs = append(cs, check{l.ID.V, "pull the wire of " + g.ID.V + " off while it moves", broken(g, l)})
		}
	}
	return cs
}

// indications is what to test of a display that was a dial thermometer.
func indications(spec *translate.Specification) []check {
	var cs []check
	for _, c := range spec.Survey.Controls {
		n := spec.Plan.Indications[c.ID.V]
		if n == nil {
			continue
		}
		cs = append(cs,
			check{c.ID.V, "hold the probe beside a reference thermometer at two temperatures of ordinary work", fmt.Sprintf("the same, to a step of %g K and the error of the sensor", n.Unit)},
			check{c.ID.V, "pull one wire of " + n.Probe.Sensor.ID.V + " off", "shows that there is no reading, never the last one"})
	}
	return cs
}
