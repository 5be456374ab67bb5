package translate

import (
	"bytes"
	"errors"
	"fmt"
	"math"
	"strings"

	"makebreak/survey"
	"makebreak/translate/thermal"
)

// Option hands Translate what it needs besides the sheet.
type Option func(*builder)

// WithLog hands in the logger file that process.log of the sheet names: the
// name is for messages, the data are the file's bytes (columns time_s,
// temperature_c, state). It is read only where the sheet asks for it.
func WithLog(name string, data []byte) Option {
	return func(b *builder) { b.log = &logFile{name, data} }
}

type logFile struct {
	name string
	data []byte
}

// Model is what is known of how the process behaves, and from what.
type Model struct {
	thermal.Identified
	Path string // key path of the evidence
	Text string // the evidence in words
	Log  string // name of the logger file, where there is one
}

// Far reports whether the process holds far from the thresholds too, which is
// so where it is known where the load settles.
func (m *Model) Far() bool { return m.SettlesOn.Known }

// theProcess is what the figures of the process are filed under.
const theProcess = "process"

// identify finds out how the process behaves: from figures on the sheet, from
// a logger file, or from the cycle of the old control, the first of them that
// there is.
func (b *builder) identify() {
	pr := b.survey.Process
	switch c := b.observedControl(); {
	case pr.SettlesOn.Set && pr.SettlesOff.Set && pr.TimeConstant.Set:
		b.byFigures(pr)
	case pr.Log.Set:
		b.byLog(pr)
	case c != nil:
		b.byCycle(c)
	default:
		b.noModel = "settles_on, settles_off and time_constant of the process are not all on the sheet, and neither is a log or an observed cycle"
	}
	b.spec.Model = b.model
	b.modelFigures()
}

// byFigures takes the process as the sheet states it.
func (b *builder) byFigures(pr survey.Process) {
	p := thermal.Process{On: pr.SettlesOn.V, Off: pr.SettlesOff.V, Tau: pr.TimeConstant.V, Dead: pr.DeadTime.V}
	if err := p.Validate(); err != nil {
		b.noModel = err.Error()
		return
	}
	b.model = &Model{Path: theProcess, Text: "as stated on the sheet", Identified: thermal.Identified{
		Process: p, At: (p.On + p.Off) / 2,
		SettlesOn: thermal.Given(p.On), SettlesOff: thermal.Given(p.Off), TimeConstant: thermal.Given(p.Tau), DeadTime: thermal.Given(p.Dead),
	}}
}

// byLog fits the process to the logger file.
func (b *builder) byLog(pr survey.Process) {
	if b.log == nil {
		b.noModel = "the logger file " + pr.Log.V + " was not handed in"
		return
	}
	rows, err := thermal.ReadLog(bytes.NewReader(b.log.data))
	if err != nil {
		b.logErrors(err)
		return
	}
	known := thermal.Known{SettlesOff: given(pr.SettlesOff)}
	if c := b.operating(); c != nil && !c.Anticipator.Rise.Set {
		if lag, _, ok := b.elementLag(c); ok {
			known.Make, known.Break, known.Lag = given(c.MakesAt), given(c.BreaksAt), lag
		}
	}
	d, err := thermal.Identify(rows, known)
	if err != nil {
		b.logErrors(err)
		return
	}
	if heats, stated := b.heats(); stated && d.Process.Cooling() == heats {
		b.logErrors(fmt.Errorf("the temperature %s while state is 1, and the sheet has a load that %s: is state the wrong way round?", movement(d.Process.Cooling()), movement(!heats)))
		return
	}
	f := d.Fit
	text := fmt.Sprintf("first-order process with dead time fitted to %d of %d rows of %s by least squares: residuals %s rms beside %s of noise",
		f.Used, f.Rows, b.log.name, Kelvins(f.RMS), Kelvins(f.Noise))
	if f.FromCycle {
		text = fmt.Sprintf("mean undisturbed cycle in %s (on %s, off %s, %s to %s): %s", b.log.name, Span(f.On), Span(f.Off), Degrees(f.Low), Degrees(f.High), f.Doubt)
	}
	var out []string
	for _, l := range f.LeftOut {
		out = append(out, fmt.Sprintf("%.0f to %.0f s: %s", l.From, l.To, l.Why))
	}
	if len(out) > 0 {
		text += "; left out: " + strings.Join(out, "; ")
	}
	b.model = &Model{Identified: d, Path: pr.Log.Path, Text: text, Log: b.log.name}
}

func movement(falls bool) string {
	if falls {
		return "falls"
	}
	return "rises"
}

// byCycle takes the process from the old control's own cycle.
//
// Where the lag of the old element is not on the sheet, the usual ones are
// tried from the longest down: a lag with which no process has this cycle
// cannot be that of the old part.
func (b *builder) byCycle(c *survey.Control) {
	if c.Anticipator.Rise.Set {
		b.noModel = "an anticipator stands between the process and the observed cycle; state the process or give a log"
		return
	}
	lags, from := b.possibleLags(c)
	if len(lags) == 0 {
		b.noModel = "neither the sheet nor the catalogue gives the lag of " + c.Element.V
		return
	}
	o := thermal.Observed{
		On: c.Observed.On.V, Off: c.Observed.Off.V, High: given(c.Observed.High), Low: given(c.Observed.Low),
		Make: c.MakesAt.V, Break: c.BreaksAt.V, SettlesOff: given(b.survey.Process.SettlesOff),
	}
	for _, lag := range lags {
		o.Lag = lag
		d, err := o.Identify()
		if err != nil {
			b.noModel = err.Error()
			return
		}
		text := fmt.Sprintf("the process that cycles as observed on %s (on %s, off %s%s) with make %s, break %s and an element lag of %s (%s)",
			c.ID.V, c.Observed.On.Text, c.Observed.Off.Text, highLow(c.Observed), Degrees(o.Make), Degrees(o.Break), Span(lag), from)
		b.model = &Model{Identified: d, Path: c.Observed.On.Path, Text: text}
		if !d.RateOn.Known {
			b.noModel, b.model = d.RateOn.Because, nil
			return
		}
		if d.DeadTime.Known {
			b.oldLag, b.oldLagFrom = lag, from
			return
		}
	}
}

func highLow(o survey.Observed) string {
	if !o.High.Set || !o.Low.Set {
		return ""
	}
	return ", high " + Degrees(o.High.V) + ", low " + Degrees(o.Low.V)
}

// possibleLags are the sensing lags that an old element may have, in s, the
// likeliest first.
func (b *builder) possibleLags(c *survey.Control) (lags []float64, from string) {
	if c.Lag.Set {
		return []float64{c.Lag.V}, c.Lag.Path
	}
	e, found := b.spec.Catalogue.Element(c.Element.V)
	if !found {
		return nil, ""
	}
	lag, found := e.Lag(b.survey.Equipment.Medium.V)
	if !found {
		return nil, ""
	}
	for i := range 5 {
		lags = append(lags, lag.To+(lag.From-lag.To)*float64(i)/4)
	}
	return append(lags, lag.From/2, 0), "the longest usual for " + c.Element.V + " that the cycle allows, " + lag.Source.String()
}

// given is a field of the sheet as an estimate.
func given(f survey.Field[float64]) thermal.Estimate {
	if !f.Set {
		return thermal.Estimate{Because: "not on the sheet"}
	}
	return thermal.Given(f.V)
}

// operating is the operating two-position control that runs the load of the
// process.
func (b *builder) operating() *survey.Control {
	for _, c := range b.survey.Controls {
		if cycles(c) && b.driven(c) != nil {
			return c
		}
	}
	return nil
}

// observedControl is the one whose cycle was taken.
func (b *builder) observedControl() *survey.Control {
	for _, c := range b.survey.Controls {
		if cycles(c) && c.Observed.On.Set && b.driven(c) != nil {
			return c
		}
	}
	return nil
}

// heats reports whether the load of the process heats; stated is false where
// no operating control tells.
func (b *builder) heats() (heats, stated bool) {
	c := b.operating()
	return c != nil && c.Action.V == survey.BreaksOnRise, c != nil
}

// logErrors notes everything that is wrong with the logger file at its place.
func (b *builder) logErrors(err error) {
	var all interface{ Unwrap() []error }
	if errors.As(err, &all) {
		for _, e := range all.Unwrap() {
			b.logErrors(e)
		}
		return
	}
	d := survey.Diagnostic{Severity: survey.Error, File: b.log.name, Summary: "the log cannot be used", Found: err.Error(),
		Fits: "columns time_s, temperature_c and state (0 or 1), several undisturbed cycles"}
	var at *thermal.LogError
	if errors.As(err, &at) {
		d.Line, d.Col, d.Found = at.Line, at.Col, at.What
	}
	b.diags = append(b.diags, d)
	b.noModel = "the logger file cannot be used"
}

// modelFigures lists what is known of the process; what the evidence does not
// determine stands there with the reason.
func (b *builder) modelFigures() {
	fs := &b.spec.Figures
	names := [...]struct {
		name, unit string
		of         func(*Model) thermal.Estimate
	}{
		{"settles_on", "degC", func(m *Model) thermal.Estimate { return m.SettlesOn }},
		{"settles_off", "degC", func(m *Model) thermal.Estimate { return m.SettlesOff }},
		{"time_constant", "s", func(m *Model) thermal.Estimate { return m.TimeConstant }},
		{"dead_time", "s", func(m *Model) thermal.Estimate { return m.DeadTime }},
		{"rate_on", "K/min", func(m *Model) thermal.Estimate { return perMinute(m.RateOn) }},
		{"rate_off", "K/min", func(m *Model) thermal.Estimate { return perMinute(m.RateOff) }},
	}
	m := b.model
	for _, n := range names {
		if m == nil {
			fs.open(theProcess, n.name, n.unit, theProcess, "not determined: "+b.noModel)
			continue
		}
		switch e := n.of(m); {
		case e.Known:
			fs.add(theProcess, n.name, e.Value, n.unit, m.Path, m.Text)
			if e.Error > 0 {
				fs.add(theProcess, n.name+"_error", e.Error, difference(n.unit), m.Path, "standard error of "+n.name)
			}
		case e.Because != "":
			fs.open(theProcess, n.name, n.unit, m.Path, "not determined: "+e.Because)
		}
	}
	if m == nil || m.Fit == nil {
		return
	}
	fs.add(theProcess, "log_rows_used", float64(m.Fit.Used), "", m.Path, fmt.Sprintf("of %d rows", m.Fit.Rows))
	fs.add(theProcess, "fit_rms", m.Fit.RMS, "K", m.Path, "root mean square of measured less computed")
	fs.add(theProcess, "fit_worst", m.Fit.Worst, "K", m.Path, "largest of the same")
	fs.add(theProcess, "log_noise", m.Fit.Noise, "K", m.Path, "scatter from row to row, which no process would explain")
	if m.Fit.Doubt != "" {
		fs.open(theProcess, "first_order", "", m.Path, m.Fit.Doubt)
	}
}

func perMinute(e thermal.Estimate) thermal.Estimate {
	e.Value *= 60
	e.Error *= 60
	return e
}

// difference is the unit of an error of a figure.
func difference(unit string) string {
	if unit == "degC" {
		return "K"
	}
	return unit
}

// vented reports water that boils before it gets hotter than 100 degC.
func (b *builder) vented() bool {
	e := b.survey.Equipment
	return e.Medium.V == "water" && e.Pressure.V == "vented"
}

// timesToDanger works out, for every danger that is a temperature, how long
// the medium takes to it from the end of its ordinary swing with the load
// stuck in the state that drives there.
func (b *builder) timesToDanger() {
	c := b.operating()
	if c == nil {
		return
	}
	for _, x := range b.survey.Dangers {
		limit, above := x.Above, true
		if x.Below.Set {
			limit, above = x.Below, false
		}
		if limit.Set {
			b.timeToDanger(x, limit, above, c)
		}
	}
}

func (b *builder) timeToDanger(x *survey.Danger, limit survey.Field[float64], above bool, c *survey.Control) {
	const name = "time_to_danger"
	fs, m := &b.spec.Figures, b.model
	if m == nil {
		fs.open(x.ID.V, name, "s", theProcess, "not determined: "+b.noModel)
		return
	}
	from := b.swingEnd(c, above)
	on := above != m.Process.Cooling()
	r, err := b.reach(from, limit.V, on)
	if err != nil {
		fs.open(x.ID.V, name, "s", m.Path, "not determined: "+err.Error())
		return
	}
	state := "on"
	if !on {
		state = "off"
	}
	working := fmt.Sprintf("load stuck %s, from %s, the end of the swing of %s: %s", state, Degrees(from), c.ID.V, r.Because)
	switch r.Outcome {
	case thermal.Reached:
		fs.add(x.ID.V, name, r.Seconds, "s", limit.Path, working)
	case thermal.NeverReached:
		fs.open(x.ID.V, name, "s", limit.Path, "never reached: "+working)
	default:
		fs.open(x.ID.V, name, "s", limit.Path, "not determined: "+working+". State worst")
		if r.AtLeast > 0 {
			fs.add(x.ID.V, name+"_at_least", r.AtLeast, "s", m.Path, "under the load and the ambient of the measurement only: "+working)
		}
	}
}

// reach is the time to a temperature with the load stuck on or off.
func (b *builder) reach(from, danger float64, on bool) (thermal.Reach, error) {
	m, worst := b.model, b.survey.Process.Worst
	if on {
		return m.TimeToDanger(from, danger, given(worst.SettlesOn), b.vented())
	}
	p := m.Process
	switch far := m.SettlesOff.Known && m.TimeConstant.Known; {
	case far:
		if w := worst.SettlesOff; w.Set && (w.V-p.Off)*p.Gain() < 0 {
			p.Off = w.V
		}
		return p.TimeToDanger(from, danger, false, b.vented())
	case worst.SettlesOff.Set && m.RateOff.Known && (worst.SettlesOff.V-m.At)/m.RateOff.Value > 0:
		p.Tau = (worst.SettlesOff.V - m.At) / m.RateOff.Value
		p.Off = worst.SettlesOff.V
		p.On = m.At + m.RateOn.Value*p.Tau
		return p.TimeToDanger(from, danger, false, b.vented())
	}
	return thermal.StraightLineToDanger(m.RateOff.Value, from, danger, b.vented())
}

// swingEnd is the end of a control's ordinary swing on one side: of the new
// cycle or the old one, whichever goes further, and never short of its edge.
func (b *builder) swingEnd(c *survey.Control, above bool) float64 {
	end, names, further := math.Min(c.MakesAt.V, c.BreaksAt.V), [2]string{"low", "old_low"}, math.Min
	if above {
		end, names, further = math.Max(c.MakesAt.V, c.BreaksAt.V), [2]string{"high", "old_high"}, math.Max
	}
	for _, n := range names {
		if v, ok := b.spec.Figures.Value(c.ID.V, n); ok {
			end = further(end, v)
		}
	}
	return end
}
