package survey

import (
	"fmt"
	"io/fs"
	"math"
	"path"
	"strings"
)

// check looks at what single values cannot show: names, references, words that
// fit each other, and ranges that make physical sense.
func (d *decoder) check(s *Survey) {
	w := &wiring{decoder: d, known: d.identities(s), lines: d.lines}
	for _, c := range s.Controls {
		d.control(s, c, w)
	}
	for _, l := range s.Loads {
		d.load(s, l, w)
	}
	for _, t := range s.Timers {
		d.timer(t, w)
	}
	for _, x := range s.Dangers {
		d.danger(x, w)
	}
	for _, x := range s.Electronics.Sensors {
		d.sensor(s, x, w)
	}
	d.electronics(s, w)
	d.process(s, w)
	for _, m := range s.Must {
		w.read(&m.Never)
	}
	d.circles(s)
}

// identities gives every name of the sheet its meaning and reports doubles.
func (d *decoder) identities(s *Survey) map[string]string {
	known := map[string]string{}
	at := map[string]Source{}
	add := func(f Field[string], what string) {
		name := f.Text // also of an id that does not fit: what refers to it is not wrong as well
		switch {
		case !f.Written() || name == "":
		case known[name] != "":
			d.failAt(f.Source, "name given twice", quote(name), fmt.Sprintf("a name of its own; there is a %s of that name on line %d", known[name], at[name].Line))
		default:
			known[name], at[name] = what, f.Source
		}
	}
	if id := s.Equipment.ID; takenFiles[id.V] {
		d.failAt(id.Source, "no name for a file", quote(id.V), "another id: the pack holds "+id.V+".h, which is a header of C or a device elsewhere")
	}
	for _, x := range s.Dangers {
		add(x.ID, "danger")
	}
	for _, x := range s.Signals {
		add(x.ID, "signal")
	}
	for _, x := range s.Timers {
		add(x.ID, "timer")
	}
	for _, x := range s.Loads {
		add(x.ID, "load")
	}
	for _, x := range s.Controls {
		add(x.ID, "control")
	}
	for _, x := range s.Electronics.Sensors {
		add(x.ID, "sensor")
	}
	for _, name := range sortedKeys(known) {
		for _, suffix := range []string{"_reset", "_seen", "_drive"} {
			if base, ok := strings.CutSuffix(name, suffix); ok && known[base] != "" {
				d.failAt(at[name], "name is taken by the program", quote(name), fmt.Sprintf("another name: %s makes a %s of its own", base, name))
			}
		}
	}
	return known
}

// refers checks a name of another part.
func (d *decoder) refers(f Field[string], w *wiring, kinds ...string) {
	if !f.Set || contains(kinds, w.known[f.V]) {
		return
	}
	fits := "the id of a " + strings.Join(kinds, " or ") + "; " + didYouMeanName(f.V, w.names(kinds...))
	if len(w.names(kinds...)) == 0 {
		fits = "the id of a " + strings.Join(kinds, " or ") + "; the sheet has none"
	}
	d.failAt(f.Source, "no such part", w.alsoSay(f.V), fits)
}

func (d *decoder) load(s *Survey, l *Load, w *wiring) {
	w.read(&l.RunsWhen)
	words, rest := []State{On, Off}, Off
	if l.Kind.V.Opens() {
		words, rest = []State{Open, Closed}, Closed
	}
	for _, f := range []Field[State]{l.SafeState, l.Rest} {
		if f.Set && l.Kind.Set && f.V != words[0] && f.V != words[1] {
			d.failAt(f.Source, "word does not fit the kind of load", quote(string(f.V)), fmt.Sprintf("%s or %s for a %s", words[0], words[1], l.Kind.V))
		}
	}
	if !l.Rest.Set {
		l.Rest = Field[State]{V: rest, Set: true, Source: Source{Path: join(l.Path, "rest"), Text: string(rest), Assumed: "common practice: most loads rest with no supply"}}
	}
	d.refers(l.Follows, w, "control")
	d.followed(s, l)
	d.wired(s, l)
	if l.Supply.Set && l.Supply.V <= 0 {
		d.failAt(l.Supply.Source, "no supply at all", l.Supply.Text, "more than 0 V; supply_is says ac or dc")
	}
	if l.Current.Set && l.Inrush.Set && l.Inrush.V < l.Current.V {
		d.failAt(l.Inrush.Source, "less than the running current", l.Inrush.Text, "the peak at switching on, at least "+l.Current.Text)
	}
}

// wired wants to know when a load runs, unless hardware that stays decides it
// alone.
func (d *decoder) wired(s *Survey, l *Load) {
	unknown := l.RunsWhen.Written() && l.RunsWhen.Text == "unknown"
	switch {
	case l.RunsWhen.Set || l.Follows.Set || l.RunsWhen.Written() && !unknown:
	case hasOutput(s, l.ID.V) && unknown:
		d.failAt(l.RunsWhen.Source, "the wiring has to be known", "unknown", "the old wiring of this load, for the new electronics switches it: follow the wires")
	case hasOutput(s, l.ID.V):
		d.failAt(l.Source, "key missing", "no runs_when", "runs_when: the old wiring of this load, for the new electronics switches it")
	case !unknown && !isCut(s, l.ID.V):
		d.failAt(l.Source, "key missing", "no runs_when, and no control that cuts "+l.ID.V, "runs_when: the old wiring of this load; or cuts on the part that switches it alone")
	}
}

func isCut(s *Survey, load string) bool {
	for _, c := range s.Controls {
		if c.Cuts.Has(load) {
			return true
		}
	}
	return false
}

// followed wants a control that gives more than on and off.
func (d *decoder) followed(s *Survey, l *Load) {
	for _, c := range s.Controls {
		if l.Follows.Set && c.ID.V == l.Follows.V && c.Action.Set && !c.Modulating() && (!c.Want.Set || c.Want.V == "two_position") {
			d.failAt(l.Follows.Source, "nothing to follow", quote(l.Follows.V)+", action "+c.Action.Text, "a control with closes_on_rise or opens_on_rise, or one with want: proportional or pid")
		}
	}
}

func hasOutput(s *Survey, load string) bool {
	for _, o := range s.Electronics.Outputs {
		if o.Load.V == load {
			return true
		}
	}
	return false
}

func (d *decoder) timer(t *Timer, w *wiring) {
	n := 0
	for _, written := range []bool{t.Every.Written(), t.After.Written(), t.Starts.Written()} {
		if written {
			n++
		}
	}
	if n != 1 {
		d.failAt(t.Source, "what sets the clock going?", fmt.Sprintf("%d of every, after and starts", n), "exactly one of every, after, starts")
	}
	d.refers(t.After, w, "load", "control", "signal", "timer")
	d.refers(t.Starts, w, "load", "control", "signal", "timer")
	if t.Every.Set && t.Lasts.Set && t.Lasts.V >= t.Every.V {
		d.failAt(t.Lasts.Source, "never ends", t.Lasts.Text, "shorter than every: "+t.Every.Text)
	}
	if t.Lasts.Set && t.Lasts.V <= 0 {
		d.failAt(t.Lasts.Source, "no time at all", t.Lasts.Text, "longer than nothing")
	}
	w.read(&t.EndsOn)
	for _, k := range []struct {
		Source
		set bool
	}{{t.Every.Source, t.Every.Set}, {t.After.Source, t.After.Set}, {t.Starts.Source, t.Starts.Set}, {t.Lasts.Source, t.Lasts.Set}, {t.EndsOn.Source, t.EndsOn.Set}} {
		if k.Written() && !k.set && k.Text == "unknown" {
			d.failAt(k.Source, "the clock has to be known", "unknown", "what it is: the new electronics takes the clock over")
		}
	}
}

func (d *decoder) danger(x *Danger, w *wiring) {
	w.read(&x.When)
	n := 0
	for _, written := range []bool{x.Above.Written(), x.Below.Written(), x.When.Written()} {
		if written {
			n++
		}
	}
	if n != 1 {
		d.failAt(x.Source, "where does the danger begin?", fmt.Sprintf("%d of above, below and when", n), "exactly one of above, below, when")
	}
}

func (d *decoder) process(s *Survey, w *wiring) {
	p := &s.Process
	for _, f := range p.DrivenBy {
		d.refers(f, w, "load")
	}
	if l := p.Log; l.Set && (!fs.ValidPath(path.Clean(l.V)) || strings.ContainsAny(l.V, `\:`)) {
		d.failAt(l.Source, "no file beside the sheet", quote(l.V), "the name of a file in the sheet's folder or below it, such as cal2-log.csv")
	}
	if p.TimeConstant.Set && p.TimeConstant.V <= 0 {
		d.failAt(p.TimeConstant.Source, "no time at all", p.TimeConstant.Text, "longer than nothing")
	}
	if !p.SettlesOff.Written() && p.Ambient.Set {
		p.SettlesOff = p.Ambient
		p.SettlesOff.Source = Source{Path: "process.settles_off", Text: p.Ambient.Text, Assumed: "process.ambient: with the load off the process settles at its surroundings"}
	}
	if p.SettlesOn.Set && p.SettlesOff.Set && p.SettlesOn.V == p.SettlesOff.V {
		d.failAt(p.SettlesOn.Source, "the load has no effect", p.SettlesOn.Text, "other than settles_off")
	}
}

func (d *decoder) electronics(s *Survey, w *wiring) {
	e := &s.Electronics
	if e.CalledEvery.Set && (e.CalledEvery.V < 0.001 || e.CalledEvery.V > 60) {
		d.failAt(e.CalledEvery.Source, "no sensible step", e.CalledEvery.Text, "1 ms to 60 s")
	}
	if ms := e.CalledEvery.V * 1000; math.Abs(ms-math.Round(ms)) > 1e-6 {
		d.failAt(e.CalledEvery.Source, "no whole number of milliseconds", e.CalledEvery.Text, "whole milliseconds")
	}
	if b := e.ADC.Bits; b.Set && (b.V < 8 || b.V > 16) {
		d.failAt(b.Source, "no such converter", b.Text, "8 to 16 bits")
	}
	if r := e.ADC.Reference; r.Set && r.V <= 0 {
		d.failAt(r.Source, "no reference at all", r.Text, "more than 0 V")
	}
	if r := s.Equipment.Enclosure.Temperature; r.Set && r.V[0] >= r.V[1] {
		d.failAt(r.Source, "lowest and highest change places", r.Text, "the lower temperature first")
	}
	seen := map[string]int{}
	for _, o := range e.Outputs {
		d.refers(o.Load, w, "load")
		if first := seen[o.Load.V]; first > 0 {
			d.failAt(o.Load.Source, "output given twice", quote(o.Load.V), fmt.Sprintf("one output a load; first on line %d", first))
		}
		seen[o.Load.V] = o.Load.Line
		d.positive(o.RatedCurrent, o.RatedVoltage, o.Endurance, o.MechanicalLife, o.B10d, o.ThermalRes, o.Window, o.MinPulse)
	}
}

// positive refuses nothing where something is needed.
func (d *decoder) positive(fs ...Field[float64]) {
	for _, f := range fs {
		if f.Set && f.V <= 0 {
			d.failAt(f.Source, "must be more than nothing", f.Text, "a positive value")
		}
	}
}

// circles finds loads and timers that wait for each other.
func (d *decoder) circles(s *Survey) {
	next := map[string][]string{}
	where := map[string]Source{}
	for _, l := range s.Loads {
		next[l.ID.V], where[l.ID.V] = l.RunsWhen.V.Tree.Names(), l.RunsWhen.Source
	}
	for _, t := range s.Timers {
		next[t.ID.V] = append(t.EndsOn.V.Tree.Names(), t.After.V, t.Starts.V)
		where[t.ID.V] = t.Source
	}
	done := map[string]bool{}
	var visit func(id string, chain []string)
	visit = func(id string, chain []string) {
		for i, p := range chain {
			if p == id {
				d.failAt(where[chain[i]], "a circle", strings.Join(append(chain[i:], id), " → "), "a load or timer that does not wait for itself")
				return
			}
		}
		if done[id] {
			return
		}
		for _, n := range next[id] {
			if _, ok := next[n]; ok {
				visit(n, append(chain[:len(chain):len(chain)], id))
			}
		}
		done[id] = true
	}
	for _, l := range s.Loads {
		visit(l.ID.V, nil)
	}
	for _, t := range s.Timers {
		visit(t.ID.V, nil)
	}
}
