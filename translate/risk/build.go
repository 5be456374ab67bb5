package risk

import (
	"fmt"

	"makebreak/survey"
	"makebreak/survey/catalogue"
)

// NewView builds what the rules see out of a checked sheet and the figures
// that were worked out from it. The error is one of the program's own
// catalogue, never of the sheet.
func NewView(s *survey.Survey, computed Computed) (*View, error) {
	cat, err := catalogue.Load()
	if err != nil {
		return nil, err
	}
	b := &builder{s: s, cat: cat, judge: newJudge(s, cat, computed), view: &View{computed: computed}}
	b.copySheet()
	b.ways, b.unclear = b.judge.ways()
	b.plant()
	for i, l := range s.Loads {
		b.load(b.view.Loads[i], l)
	}
	b.paths()
	b.loadDangers()
	for i, c := range s.Controls {
		b.control(b.view.Controls[i], c)
	}
	b.dangers()
	b.guards()
	b.sensors()
	b.signals()
	b.places()
	b.plantDangers()
	b.answers()
	return b.view, nil
}

// builder fills a view step by step; later steps use what earlier ones found.
type builder struct {
	s       *survey.Survey
	cat     *catalogue.Catalogue
	judge   *judge
	view    *View
	ways    []*way
	unclear map[string][]string
}

// copySheet takes over every key of the sheet.
func (b *builder) copySheet() {
	v, s := b.view, b.s
	v.Equipment, v.Process, v.Electronics, v.Plant = new(Equipment), new(Process), new(Electronics), new(Plant)
	fill(v.Equipment, &s.Equipment)
	fill(v.Process, &s.Process)
	fill(v.Electronics, &s.Electronics)
	v.Dangers = copyList[Danger](s.Dangers)
	v.Loads = copyList[Load](s.Loads)
	v.Controls = copyList[Control](s.Controls)
	v.Sensors = copyList[Sensor](s.Electronics.Sensors)
	v.Outputs = copyList[Output](s.Electronics.Outputs)
	v.Signals = copyList[Signal](s.Signals)
	v.Timers = copyList[Timer](s.Timers)
	for _, o := range v.Outputs {
		o.Of = b.loadView(o.Load)
	}
	for _, l := range v.Loads {
		l.Output = b.outputView(l)
	}
}

func copyList[V, S any](sheet []*S) []*V {
	list := make([]*V, len(sheet))
	for i, item := range sheet {
		list[i] = new(V)
		fill(list[i], item)
	}
	return list
}

func (b *builder) loadView(id string) *Load {
	if l := find(b.view.Loads, func(l *Load) bool { return l.ID == id }); l != nil {
		return l
	}
	none := new(Load)
	fill(none, &survey.Load{})
	none.Output = new(Output)
	fill(none.Output, &survey.Output{})
	return none
}

func (b *builder) outputView(l *Load) *Output {
	if o := find(b.view.Outputs, func(o *Output) bool { return o.Load == l.ID }); o != nil {
		return o
	}
	none := new(Output)
	fill(none, &survey.Output{})
	none.Of = l
	return none
}

func (b *builder) dangerView(id string) *Danger {
	return find(b.view.Dangers, func(d *Danger) bool { return d.ID == id })
}

// paths gives every way to a danger as the rules see it.
func (b *builder) paths() {
	for _, w := range b.ways {
		p := &Path{
			Danger: b.dangerView(w.danger.ID.V), Load: b.loadView(w.load.ID.V),
			State: stateWord(w.load, w.on), Open: w.open(), Away: w.away(), Warned: len(w.warnings) > 0, Why: w.why,
		}
		p.Touched = p.Load.Driven
		p.Barriers, p.Rejected = w.barrierWords()
		if w.on {
			b.view.Paths = append(b.view.Paths, p)
			continue
		}
		p.Rejected = "no hardware part can switch it " + stateWord(w.load, true)
		if p.Warned {
			p.Rejected += "; an independent alarm tells of it: " + joined(w.warnings)
		}
		b.view.Paths = append(b.view.Paths, p)
	}
}

// dangers fills in what follows from the ways that lead to each danger.
func (b *builder) dangers() {
	for i, d := range b.view.Dangers {
		sheet := b.s.Dangers[i]
		d.WordsAssumed = sheet.Exposure.Assumed != "" || sheet.Avoidance.Assumed != ""
		d.PLr = requiredLevel(d)
		d.UnclearLoads = b.unclear[d.ID]
		for _, p := range b.view.Paths {
			if p.Danger != d {
				continue
			}
			d.Judged = true
			if p.Touched && (p.Open && !p.Away || b.protectiveReplaced(p.Load.ID, sheet)) {
				d.InProgram = true
			}
		}
	}
}

// requiredLevel is the performance level that the risk graph of ISO 13849-1
// requires (Annex A; the letters from memory), or unknown.
func requiredLevel(d *Danger) string {
	harm := map[string]int{"slight": 0, "serious": 4}
	exposure := map[string]int{"seldom": 0, "frequent": 2}
	avoidance := map[string]int{"possible": 0, "scarcely": 1}
	s, okS := harm[d.Harm]
	f, okF := exposure[d.Exposure]
	p, okP := avoidance[d.Avoidance]
	if !okS || !okF || !okP {
		return unknown
	}
	return [8]string{"a", "b", "b", "c", "c", "d", "d", "e"}[s+f+p]
}

func (b *builder) protectiveReplaced(load string, d *survey.Danger) bool {
	for i, c := range b.s.Controls {
		v := b.view.Controls[i]
		if c.Plan.V == survey.Replace && v.ProtectivePart && directed(c, d) && contains(v.ActsOn, load) {
			return true
		}
	}
	return false
}

// guards lists the hardware parts that point against a danger.
func (b *builder) guards() {
	for i, d := range b.s.Dangers {
		if d.When.Set {
			continue
		}
		for k, c := range b.s.Controls {
			if hardware(c.Plan.V) && directed(c, d) {
				b.guard(b.view.Dangers[i], d, b.view.Controls[k], c)
			}
		}
	}
}

func (b *builder) guard(dv *Danger, d *survey.Danger, cv *Control, c *survey.Control) {
	on := false
	g := &Guard{Danger: dv, Control: cv, Covered: true, Stat: unknown, StatTol: nan()}
	for _, w := range b.ways {
		if w.danger != d || !w.on || !c.Cuts.Has(w.load.ID.V) {
			continue
		}
		on = true
		g.Covered = g.Covered && !w.open()
		for _, bar := range w.barriers {
			g.Counts = g.Counts || bar.control == c && bar.counts
		}
		b.findStat(g, w.load, c)
	}
	if !on {
		return
	}
	t := b.judge.trip(c, d)
	g.TripsAt, g.Tolerance, g.ToleranceIs = t.at, t.tolerance, t.toleranceIs
	g.Overshoot, g.NoOvershoot, g.Worst, g.Limit = t.overshoot, t.noOvershoot, t.worst, limitOf(d)
	g.Beyond = beyond(t.worst, d)
	b.view.Guards = append(b.view.Guards, g)
}

// findStat finds the control that works every cycle on a load which the guard
// cuts, in the same direction.
func (b *builder) findStat(g *Guard, l *survey.Load, guard *survey.Control) {
	for _, id := range controlsOf(b.s, l) {
		c := controlOf(b.s, id)
		if g.Stat == unknown && c.Duty.V == survey.Operating && c.Action.V == guard.Action.V {
			g.Stat = id
			g.StatDial = dialReach(c, guard)
			if tolerance, _, ok := b.judge.tolerance(c); ok {
				g.StatTol = tolerance
			}
		}
	}
}

// places lists every probe and load with the area it stands in.
func (b *builder) places() {
	for _, s := range b.view.Sensors {
		b.view.Places = append(b.view.Places, &Place{ID: s.ID, Is: "probe", What: s.What, Area: s.Area})
	}
	for _, l := range b.view.Loads {
		b.view.Places = append(b.view.Places, &Place{ID: l.ID, Is: "load", What: l.What, Area: l.Area})
	}
}

// answers takes over what the responsible person decided.
func (b *builder) answers() {
	for i, a := range b.s.Answers {
		b.view.answers = append(b.view.answers, answer{
			finding: a.Finding.V, about: a.About.V, text: a.Answer.V, role: a.Role.V, date: a.Date.V, figure: a.Figure.V,
			path: fmt.Sprintf("answers[%d]", i),
		})
	}
}

// dialReach is how far the user can turn a control's dial from the set point of
// the sheet towards a guard, K.
func dialReach(c, guard *survey.Control) float64 {
	if !c.DialStays() {
		return 0
	}
	if guard.Action.V == survey.BreaksOnRise {
		return c.Dial.V[1] - c.DialMark().V
	}
	return c.DialMark().V - c.Dial.V[0]
}
