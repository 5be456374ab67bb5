package translate

import (
	"fmt"
	"math"
	"strings"

	"makebreak/survey"
	"makebreak/translate/sensing"
)

// figures works out everything that has a number before the program is built.
func (b *builder) figures() {
	b.identify()
	b.tunings()
	for _, c := range b.survey.Controls {
		b.asked(c)
		if chain := b.spec.Chains[c.Sensor.V]; chain != nil && b.translated(c) && c.Switching() && c.Plan.V == survey.Replace {
			b.match(c, chain)
			b.switching(c, chain)
		}
		b.valveFigures(c)
		b.pulseFigures(c)
		b.flameFigures(c)
		b.imageFigures(c)
		b.overshoot(c)
	}
	b.margins()
	b.cycles()
	b.conversions()
	b.timesToDanger()
	b.outputs()
	b.failures()
}

// asked lists what the sheet asks for, whether the part is replaced or stays.
func (b *builder) asked(c *survey.Control) {
	if !c.Switching() {
		return
	}
	b.askedEdge(c, "make", c.MakesAt)
	b.askedEdge(c, "break", c.BreaksAt)
}

func (b *builder) askedEdge(c *survey.Control, name string, f survey.Field[float64]) {
	if !f.Set {
		b.spec.Figures.open(c.ID.V, name, "degC", f.Path, "not known")
		return
	}
	b.spec.Figures.add(c.ID.V, name, f.V, "degC", f.Path, "asked for: "+f.Text)
}

// switching works out thresholds and errors of a translated control.
func (b *builder) switching(c *survey.Control, chain *sensing.Chain) {
	t, ok := b.thresholds(c, chain)
	if !ok {
		return
	}
	b.spec.Thresholds[c.ID.V] = t
	b.edgeFigures(c, "make", b.evidence(c, c.MakesAt), t.Make, t.Why)
	b.edgeFigures(c, "break", b.evidence(c, c.BreaksAt), t.Break, t.Why)
	b.advise(c, chain)
	b.dialFigures(c, chain)
}

// advise says which divider and which converter would suit the break best, for
// comparison with what is there.
func (b *builder) advise(c *survey.Control, chain *sensing.Chain) {
	fs, at := &b.spec.Figures, c.BreaksAt
	differential := math.Abs(c.BreaksAt.V - c.MakesAt.V)
	if a, ok := chain.Divider(at.V); ok {
		fs.add(c.ID.V, "divider_advised", a.Advised, "ohm", at.Path, a.Working)
	}
	if a, ok := chain.Bits(at.V, differential); ok && a.Fewest > 0 {
		fs.add(c.ID.V, "bits_needed", float64(a.Fewest), "bits", at.Path, a.Working)
	} else if ok {
		fs.open(c.ID.V, "bits_needed", "bits", at.Path, a.Working)
	}
}

func (b *builder) edgeFigures(c *survey.Control, name string, from survey.Source, h sensing.Threshold, why string) {
	fs := &b.spec.Figures
	fs.add(c.ID.V, name+"_counts", float64(h.Counts), "counts", from.Path, h.Working+"; "+why)
	fs.add(c.ID.V, name+"_switches_at", h.SwitchesAt, "degC", from.Path, h.Working)

	// The first control on a sensor names its edges plainly; a second one says whose they are.
	about := c.Sensor.V + "/" + name
	if _, taken := fs.Get(about, "count_width"); taken {
		about = c.Sensor.V + "/" + c.ID.V + "/" + name
	}
	fs.add(about, "count_width", h.CountWidth, "K", from.Path, "change of temperature for one count at this threshold")
	budget, err := b.spec.Chains[c.Sensor.V].Budget(h.Asked)
	if err != nil {
		fs.open(about, "error_worst", "K", from.Path, err.Error())
		return
	}
	b.spec.Budgets = append(b.spec.Budgets, ErrorBudget{Control: c.ID.V, Sensor: c.Sensor.V, Edge: name, Budget: budget})
	working := budgetText(budget)
	fs.add(about, "error_worst", budget.WorstCase, "K", from.Path, "all causes at their worst, the same way: "+working)
	fs.add(about, "error_rss", budget.RSS, "K", from.Path, "root sum of squares, for independent causes: "+working)
}

func budgetText(b sensing.Budget) string {
	var parts []string
	for _, l := range b.Lines {
		parts = append(parts, fmt.Sprintf("%s %s", l.Name, Kelvins(l.Kelvin)))
	}
	text := strings.Join(parts, ", ")
	if len(b.Missing) > 0 {
		text += "; without: " + strings.Join(b.Missing, ", ")
	}
	return text
}
