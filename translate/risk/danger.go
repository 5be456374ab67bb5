package risk

import (
	"fmt"
	"slices"
	"strings"

	"makebreak/survey"
	"makebreak/survey/catalogue"
)

// judge decides, danger by danger and load by load, what hardware is left
// between the new program and harm.
type judge struct {
	s        *survey.Survey
	cat      *catalogue.Catalogue
	computed Computed
	effects  map[string]string // by load
}

// way is one way to a danger: a load, and the state of it that leads there.
type way struct {
	danger   *survey.Danger
	load     *survey.Load
	on       bool // the energised state leads there
	why      string
	barriers []barrier
	warnings []string // independent alarms
}

// barrier is the verdict on one hardware control for one way.
type barrier struct {
	control *survey.Control
	counts  bool
	words   string // what is to be said for it, or why it does not count
}

func newJudge(s *survey.Survey, cat *catalogue.Catalogue, computed Computed) *judge {
	j := &judge{s: s, cat: cat, computed: computed, effects: map[string]string{}}
	for _, l := range s.Loads {
		j.effects[l.ID.V] = effectOf(s, l)
	}
	return j
}

// ways lists every way to every danger, in the order of the sheet. unclear
// names, by danger, loads of which the sheet does not say which way they drive
// and whose kind does not usually drive anything.
func (j *judge) ways() (list []*way, unclear map[string][]string) {
	unclear = map[string][]string{}
	for _, d := range j.s.Dangers {
		if d.When.Set {
			list = append(list, j.stateWays(d)...)
			continue
		}
		ways, open := j.temperatureWays(d)
		list = append(list, ways...)
		unclear[d.ID.V] = open
	}
	return list, unclear
}

func (j *judge) temperatureWays(d *survey.Danger) (list []*way, unclear []string) {
	above := d.Above.Set
	var off []*way
	for _, l := range j.s.Loads {
		switch e := j.effects[l.ID.V]; {
		case e == noEffect:
		case e == unknown && usuallyMoves(l.Kind.V):
			list = append(list, &way{danger: d, load: l, on: true,
				why: "the sheet does not say which way it drives; taken as towards the danger"})
		case e == unknown:
			unclear = append(unclear, l.ID.V)
		case (e == heats) == above:
			list = append(list, &way{danger: d, load: l, on: true, why: drives(l, above)})
		default:
			off = append(off, &way{danger: d, load: l})
		}
	}
	list = slices.DeleteFunc(list, func(w *way) bool { return j.outOfReach(w.load, d) })
	if settles, known := j.settlesOff(); known {
		if beyond(settles, d) {
			for _, w := range off {
				w.why = fmt.Sprintf("%s, the temperature goes to %s by itself", stateWord(w.load, false), Celsius(settles))
			}
			list = append(list, off...)
		}
	} else if len(list) == 0 {
		for _, w := range off {
			w.why = fmt.Sprintf("%s, nothing in the sheet holds the temperature away from the danger", stateWord(w.load, false))
		}
		list = append(list, off...)
	}
	for _, w := range list {
		j.findBarriers(w)
	}
	return list, unclear
}

// usuallyMoves tells the kinds of load that move a temperature although the
// wiring does not say which way.
func usuallyMoves(k survey.LoadKind) bool {
	switch k {
	case "heater", "contactor", "solenoid_valve", "gas_valve", "compressor", "modulating_valve", "control_input":
		return true
	}
	return false
}

func drives(l *survey.Load, above bool) string {
	if above {
		return stateWord(l, true) + ", it drives the temperature up"
	}
	return stateWord(l, true) + ", it drives the temperature down"
}

// outOfReach: the sheet states where the process settles at worst with this
// load left on, and that is on the safe side.
func (j *judge) outOfReach(l *survey.Load, d *survey.Danger) bool {
	p := &j.s.Process
	return p.DrivenBy.Has(l.ID.V) && p.Worst.SettlesOn.Set && !beyond(p.Worst.SettlesOn.V, d)
}

// settlesOff is where the temperature goes with everything off.
func (j *judge) settlesOff() (float64, bool) {
	p := &j.s.Process
	for _, f := range []survey.Field[float64]{p.Worst.SettlesOff, p.SettlesOff, p.Ambient} {
		if f.Set {
			return f.V, true
		}
	}
	return 0, false
}

// beyond reports whether a temperature lies in the danger, its edge included.
func beyond(t float64, d *survey.Danger) bool {
	if d.Above.Set {
		return t >= d.Above.V
	}
	return t <= d.Below.V
}

// stateWays lists the loads that a dangerous state wants on; where it wants
// none on, those that it wants off.
func (j *judge) stateWays(d *survey.Danger) []*way {
	signs := map[string]int{}
	collectSigns(d.When.V.Tree, 1, signs)
	var on, off []*way
	for _, name := range d.When.V.Tree.Names() {
		l := loadOf(j.s, name)
		if l == nil {
			continue
		}
		w := &way{danger: d, load: l, on: signs[name] >= 0,
			why: fmt.Sprintf("%s, it makes the state %q possible", stateWord(l, signs[name] >= 0), d.When.V.Text)}
		if w.on {
			on = append(on, w)
		} else {
			off = append(off, w)
		}
	}
	if len(on) == 0 {
		on = off
	}
	for _, w := range on {
		j.findBarriers(w)
	}
	return on
}

func stateWord(l *survey.Load, on bool) string {
	switch {
	case l.Kind.V.Opens() && on:
		return string(survey.Open)
	case l.Kind.V.Opens():
		return string(survey.Closed)
	case on:
		return string(survey.On)
	}
	return string(survey.Off)
}

// open reports whether no barrier is left.
func (w *way) open() bool {
	return !slices.ContainsFunc(w.barriers, func(b barrier) bool { return b.counts })
}

// away reports whether the load's safe state and its rest both lead away from
// the danger although the energised state does not lead there: a frost heater
// that is on in both. A load that drives to the danger when on never
// qualifies, for a welded contact does not ask for the safe state.
func (w *way) away() bool {
	return !w.on && w.load.SafeState.V.Energised() && restOf(w.load).Energised()
}

// restOf is what the load does with no supply to the new output; off or
// closed where the sheet does not say.
func restOf(l *survey.Load) survey.State {
	if l.Rest.Set {
		return l.Rest.V
	}
	return survey.State(stateWord(l, false))
}

func (j *judge) findBarriers(w *way) {
	for _, c := range j.s.Controls {
		if !hardware(c.Plan.V) {
			continue
		}
		if w.on {
			w.barriers = append(w.barriers, j.weigh(c, w))
		} else if j.alarms(c, w.danger) {
			w.warnings = append(w.warnings, c.ID.V)
		}
	}
}

// hardware reports whether a part with this plan is there in the end, hard-wired.
func hardware(p survey.Plan) bool {
	switch p {
	case survey.Keep, survey.Monitor, survey.Renew, survey.Add:
		return true
	}
	return false
}

// alarms reports whether the control drives an alarm by itself before the
// danger, on a sensor of its own.
func (j *judge) alarms(c *survey.Control, d *survey.Danger) bool {
	if c.Duty.V == survey.Operating || sharesSensor(c) || d.When.Set {
		return false
	}
	wired := slices.ContainsFunc(c.Cuts, func(f survey.Field[string]) bool {
		l := loadOf(j.s, f.V)
		return l != nil && (l.Kind.V == "alarm" || l.Kind.V == "lamp")
	})
	at, known := alarmsAt(c, d.Above.Set)
	tolerance, _, sure := j.tolerance(c)
	if !wired || !known || !sure {
		return false
	}
	if d.Above.Set {
		return at+tolerance < d.Above.V
	}
	return at-tolerance > d.Below.V
}

// alarmsAt is the edge that the temperature reaches last on its way to the
// danger: the upper one for a danger above, the lower one for a danger below.
func alarmsAt(c *survey.Control, above bool) (float64, bool) {
	breaks, makes, ok := edges(c)
	switch {
	case ok && above:
		return max(breaks, makes), true
	case ok:
		return min(breaks, makes), true
	case c.MakesAt.Set:
		return c.MakesAt.V, true
	}
	return c.BreaksAt.V, c.BreaksAt.Set
}

func sharesSensor(c *survey.Control) bool { return c.Shares.Has("sensor") || c.Shares.Has("converter") }

// words joins what is to be said, in order.
func words(parts []string) string { return strings.Join(parts, "; ") }

// barrierWords splits the verdicts of a way into those that count and those
// that do not, each with its reason.
func (w *way) barrierWords() (counting, rejected string) {
	var yes, no []string
	for _, b := range w.barriers {
		line := b.control.ID.V + " (" + b.words + ")"
		if b.counts {
			yes = append(yes, line)
		} else {
			no = append(no, line)
		}
	}
	if len(no) == 0 && len(yes) == 0 {
		return "", "there is no hardware part on the sheet"
	}
	return words(yes), words(no)
}
