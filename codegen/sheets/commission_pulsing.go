package sheets

import (
	"fmt"
	"math"

	"makebreak/survey"
	"makebreak/translate"
)

// pulsers is what to test of flashers and energy regulators.
func pulsers(spec *translate.Specification) []check {
	var cs []check
	for _, c := range spec.Survey.Controls {
		g := spec.Plan.Pulsers[c.ID.V]
		if g == nil {
			continue
		}
		if g.Dial != nil {
			cs = append(cs, regulator(spec, c, g)...)
			continue
		}
		period := steps(spec, g.Period.Value)
		cs = append(cs,
			check{c.ID.V, "call for it and count over half a minute with a stopwatch", fmt.Sprintf("%.0f makes in 30 s; lit %.0f %% of the time; the first light at once", 30/period, 100*float64(g.On.Value)/float64(g.Period.Value))})
		switch {
		case g.LampOut != nil:
			cs = append(cs,
				check{c.ID.V, "take one lamp out, at the lowest and at the highest supply, and count again", fmt.Sprintf("%.0f makes in 30 s from the second flash on; fault %s_lamp_out", 30/steps(spec, g.OutPeriod.Value), c.ID.V)},
				check{c.ID.V, "put the lamp back and call again", "the ordinary rate, and no fault"})
		case c.Lamps.OutRate.Set:
			cs = append(cs, check{c.ID.V, "take one lamp out", "the program does not see it: write down who is told, and how"})
		}
	}
	return cs
}

func regulator(spec *translate.Specification, c *survey.Control, g *translate.Pulser) []check {
	var cs []check
	period := steps(spec, g.Period.Value)
	for _, r := range c.DialShares.V {
		cs = append(cs, check{c.ID.V, fmt.Sprintf("turn the dial to mark %g and take two periods with a stopwatch", r[0]),
			fmt.Sprintf("on %s of every %s; at full it stays on", span(math.Round(10*r[1]*period)/10), span(period))})
	}
	return append(cs,
		check{c.ID.V, "turn the dial to off", "goes off at once and stays so"},
		check{c.ID.V, "take the wiper's wire off", "goes off at once; fault " + c.ID.V + "_dial within 2 s"})
}

// monitors is what to test of the parts that stay and are watched. That they
// work by themselves has been proved before.
func monitors(spec *translate.Specification) []check {
	var cs []check
	for _, c := range spec.Survey.Controls {
		m := spec.Plan.Monitors[c.ID.V]
		if m == nil {
			continue
		}
		if m.Tripped != nil {
			cs = append(cs, check{c.ID.V, "let it act, or open its loop where it cannot be made to", fmt.Sprintf("fault %s_tripped; %s_trips one more; the same after a power cut", c.ID.V, c.ID.V)})
		}
		if m.Flame != nil {
			cs = append(cs,
				check{c.ID.V, "light the flame, wait, and read its voltage", fmt.Sprintf("above %.3g mV once it has burnt for a while; no fault %s_weak", 1000*weak(spec, c), c.ID.V)},
				check{c.ID.V, "put the flame out by its cock, not by the program", fmt.Sprintf("the valve shuts by itself within %s, with the electronics on and with them off; fault %s_flame_out", span(c.ShutsWithin.V), c.ID.V)})
		}
		if m.Image != nil {
			v, _ := spec.Figures.Value(c.ID.V, "image_lag")
			cs = append(cs, check{c.ID.V, "run the motor as heavily as it ever runs, from cold, with a clamp meter", fmt.Sprintf("fault %s_hot before it acts and never without cause; the image has a time constant of %s", c.ID.V, span(v))})
		}
	}
	return cs
}

func weak(spec *translate.Specification, c *survey.Control) float64 {
	v, _ := spec.Figures.Value(c.ID.V, "weak_below")
	return v
}
