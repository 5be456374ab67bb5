package translate

import (
	"errors"
	"fmt"
	"math"
	"slices"

	"makebreak/survey"
	"makebreak/translate/thermal"
)

// Tuning is what the process of one control asks of a continuous control:
// published rules side by side, and the one that is taken.
type Tuning struct {
	Control  string
	Transfer thermal.Transfer
	Rules    []thermal.Tuned
	Chosen   thermal.Tuned
	TauC     float64 // s, closed-loop time constant of the SIMC rules
	Window   float64 // s, 0 for a permille output
	Because  string  // why this rule
}

// leastWindow is the shortest window that is taken for time proportioning
// where the sheet states none, s; common practice for a semiconductor switch.
const leastWindow = 2.0

// tune puts the rules side by side for a control whose process is known, and
// notes the figures of the one that is taken. They are worked out whether a
// continuous control is wanted or not: the old control has run the experiment.
func (b *builder) tune(c *survey.Control, l *survey.Load, tr thermal.Transfer, from string) {
	window := 0.0
	if wantsPID(c) {
		window = b.window(l)
	}
	t := Tuning{Control: c.ID.V, Transfer: tr, Window: window, TauC: math.Max(tr.Dead, window)}
	if t.TauC == 0 {
		b.openTuning(c, from, "not determined: without a dead time and a window nothing bounds the gain")
		return
	}
	rules, err := tr.Tune(t.TauC)
	if err != nil {
		b.openTuning(c, from, "not determined: "+err.Error())
		return
	}
	t.Rules = rules
	if err := t.choose(); err != nil {
		b.openTuning(c, from, "not determined: "+err.Error())
		return
	}
	b.spec.Tunings = append(b.spec.Tunings, t)
	b.tuningFigures(c, t, from)
}

// tunings works out the settings of every operating control whose process is
// known.
func (b *builder) tunings() {
	for _, c := range b.survey.Controls {
		if c.Duty.V != survey.Operating || c.Plan.V != survey.Replace || !b.translated(c) || !c.Switching() && !c.Modulating() || c.Reset.V != survey.ResetAutomatic {
			continue
		}
		l := b.runBy(c)
		if !drives(b.survey, l.ID.V) {
			if wantsPID(c) {
				b.openTuning(c, c.Want.Path, "not determined: its load is not one that drives the process (driven_by)")
			}
			continue
		}
		tr, from, err := b.transfer(c)
		if err != nil {
			b.openTuning(c, from, "not determined: "+err.Error())
			continue
		}
		b.tune(c, l, tr, from)
	}
}

// transfer is the process as the new control of c sees it: the dead time is
// that of the process, without the lag of the old element, and the lag of the
// new probe is put in. Identified from a cycle it is integrating.
func (b *builder) transfer(c *survey.Control) (tr thermal.Transfer, from string, err error) {
	m := b.model
	if m == nil {
		return tr, theProcess, errors.New(b.noModel)
	}
	if m.Process.Cooling() != c.Cools() {
		return tr, m.Path, fmt.Errorf("the process moves the other way: it settles at %s with the load on and %s with it off", Degrees(m.Process.On), Degrees(m.Process.Off))
	}
	return m.Transfer(thermal.Sensing{Lag: b.sensor(c.Sensor.V).Lag.V}), m.Path, nil
}

// choose takes SIMC: with derivative only where the second lag is longer than
// the dead time, for there alone it brings much (Skogestad 2003, section 4).
func (t *Tuning) choose() error {
	name, because := "SIMC PI", "no second lag longer than the dead time, so derivative would bring little and amplify the noise of the converter"
	if second, err := t.Transfer.Reduced(2); err == nil && second.Tau2 > second.Dead {
		name, because = "SIMC PID", fmt.Sprintf("the second lag, %s, is longer than the dead time", Span(second.Tau2))
	}
	i := slices.IndexFunc(t.Rules, func(r thermal.Tuned) bool { return r.Name == name })
	if i < 0 || t.Rules[i].Refused != "" {
		return fmt.Errorf("%s gives no settings here", name)
	}
	t.Chosen, t.Because = t.Rules[i], because
	return nil
}

var tuningNames = []struct{ name, unit string }{
	{"gain", "1/K"}, {"integral_time", "s"}, {"derivative_time", "s"}, {"ultimate_gain", "1/K"}, {"ultimate_period", "s"},
}

func (b *builder) openTuning(c *survey.Control, from, reason string) {
	for _, n := range tuningNames {
		b.spec.Figures.open(c.ID.V, n.name, n.unit, from, reason)
	}
	if wantsPID(c) {
		b.spec.Figures.open(c.ID.V, "sample", "s", from, reason)
	}
}

func (b *builder) tuningFigures(c *survey.Control, t Tuning, from string) {
	fs, s := &b.spec.Figures, t.Chosen.Settings.Parallel()
	working := fmt.Sprintf("%s (%s), closed-loop time constant %s: %s; %s", t.Chosen.Name, t.Chosen.Source, Span(t.TauC), t.Chosen.Working, t.Because)
	fs.add(c.ID.V, "gain", s.Kc, "1/K", from, working+"; output 0 to 1")
	fs.add(c.ID.V, "integral_time", s.Ti, "s", from, working)
	fs.add(c.ID.V, "derivative_time", s.Td, "s", from, working)
	u, found, err := t.Transfer.Ultimate()
	if err != nil || !found {
		reason := "not determined: proportional control alone never makes this process oscillate"
		fs.open(c.ID.V, "ultimate_gain", "1/K", from, reason)
		fs.open(c.ID.V, "ultimate_period", "s", from, reason)
	} else {
		exact := fmt.Sprintf("exact, where the phase of the process reaches −180°: gain %.5g K, lags %s, dead time %s", t.Transfer.Gain, spans(t.Transfer.Lags), Span(t.Transfer.Dead))
		fs.add(c.ID.V, "ultimate_gain", u.Gain, "1/K", from, exact)
		fs.add(c.ID.V, "ultimate_period", u.Period, "s", from, exact)
	}
	fs.add(c.ID.V, "band", 1/s.Kc, "K", from, "1 / gain: deviation for the whole output")
	if chain := b.spec.Chains[c.Sensor.V]; chain != nil {
		fs.add(c.ID.V, "output_per_count", 100*s.Kc*chain.CountWidth(c.DialMark().V), "%", from, "share of the output that one count moves: gain × width of a count")
	}
	fs.add(c.ID.V, "sensitivity", t.Chosen.Margins.Sensitivity, "", from, fmt.Sprintf("peak sensitivity Ms; gain margin %.3g, phase margin %.3g°", t.Chosen.Margins.Gain, t.Chosen.Margins.Phase))
}

func spans(lags []float64) string {
	text := ""
	for i, l := range lags {
		if i > 0 {
			text += " and "
		}
		text += Span(l)
	}
	return text
}

// window is the time-proportioning window of a load's output: as stated, or
// twenty of the least pulses, or what is usual; 0 for a permille output.
func (b *builder) window(l *survey.Load) float64 {
	o := output(b.survey, l.ID.V)
	switch {
	case o == nil || o.Kind.V == "analogue" || l.Kind.V == "modulating_valve":
		return 0
	case o.Window.Set:
		return o.Window.V
	case o.Kind.V == "relay":
		return usualRelayWindow
	case o.MinPulse.Set:
		return math.Max(leastWindow, 20*o.MinPulse.V)
	}
	return leastWindow
}

// usualRelayWindow is taken for a contact where the sheet states no window, s;
// common practice.
const usualRelayWindow = 20.0

// settingsOf is the tuning of a control, where there is one.
func (b *builder) settingsOf(control string) (Tuning, bool) {
	for _, t := range b.spec.Tunings {
		if t.Control == control {
			return t, true
		}
	}
	return Tuning{}, false
}

// wantsPID reports whether a control of the sheet is to become continuous.
func wantsPID(c *survey.Control) bool {
	return c.Plan.V == survey.Replace && c.Want.V == "pid" && c.Duty.V == survey.Operating && c.Reset.V == survey.ResetAutomatic
}

// held says what a PID control does where a two-position one cycles: how far
// it lets the temperature go, and how often it switches.
func (b *builder) held(c *survey.Control, l *survey.Load) {
	t, _ := b.settingsOf(c.ID.V)
	fs, at := &b.spec.Figures, c.Want.Path
	away := t.Chosen.Response.Disturbed
	working := fmt.Sprintf("set point %s, and %s after the load has taken or given a tenth of the output: %s on the process, by simulation", Degrees(c.DialMark().V), Kelvins(away), t.Chosen.Name)
	fs.add(c.ID.V, "high", c.DialMark().V+away, "degC", at, working)
	fs.add(c.ID.V, "low", c.DialMark().V-away, "degC", at, working)
	fs.add(c.ID.V, "mean", c.DialMark().V, "degC", at, "integral action leaves no lasting offset")
	if t.Window > 0 {
		b.contactLifeAt(l, t.Window, 0, "process; one operation in every window, at most")
	}
}

// describing notes the ultimate gain as the describing function has it from the
// old cycle, where that is valid, with its difference from the exact one.
func (b *builder) describing(c *survey.Control, old thermal.Loop) {
	const name = "describing_gain"
	d, err := old.Describing()
	switch {
	case err != nil:
		b.spec.Figures.open(c.ID.V, name, "1/K", "process", "not determined: "+err.Error())
	case !d.Valid:
		b.spec.Figures.open(c.ID.V, name, "1/K", "process", "not shown: "+d.Because)
	default:
		b.spec.Figures.add(c.ID.V, name, d.Gain, "1/K", "process", fmt.Sprintf("4d/(π·√(a² − ε²)) from the old cycle (Åström and Hägglund 1984): %+.0f %% off the exact %.4g; %s", 100*d.Difference, d.Exact, d.Because))
	}
}
