package thermal

import (
	"fmt"
	"math"
)

// identified turns the fit into what it determines.
func (f *logFit) identified() (Identified, error) {
	fit := f.report()
	c := f.covariance()
	estimate := func(of func(*logFit) float64) Estimate { return known(of(f), f.deviation(c, of)) }
	d := Identified{At: f.middle, Fit: &fit}
	d.RateOn = estimate(func(q *logFit) float64 { return q.on / q.tau })
	d.RateOff = estimate(func(q *logFit) float64 { return q.off / q.tau })
	d.DeadTime = estimate(func(q *logFit) float64 { return q.dead })
	// logger and control may keep step, so that all switchings are off alike
	d.DeadTime.Error = math.Hypot(d.DeadTime.Error, f.log.usual/math.Sqrt(12))
	d.Process = Process{On: f.middle + f.on, Off: f.middle + f.off, Tau: f.tau, Dead: f.dead}
	tau := estimate(func(q *logFit) float64 { return q.tau })
	on := estimate(func(q *logFit) float64 { return q.middle + q.on })
	off := estimate(func(q *logFit) float64 { return q.middle + q.off })
	switch why := f.undetermined(fit, tau); {
	case why == "":
		d.TimeConstant, d.SettlesOn, d.SettlesOff = tau, on, off
	default:
		d.TimeConstant, d.SettlesOn, d.SettlesOff = unknown("%s", why), unknown("%s", why), unknown("%s", why)
	}
	if f.known.SettlesOff.Known {
		d.SettlesOff = Given(f.known.SettlesOff.Value)
	}
	cold := fit.Low
	if f.on < f.off {
		cold = fit.High
	}
	if math.IsNaN(cold) {
		cold = f.middle
	}
	d.FastestOn = (d.Process.On - cold) / f.tau
	if steep := f.steepestOn(); math.Abs(steep) > math.Abs(d.FastestOn) {
		d.FastestOn = steep
	}
	if fit.Doubt != "" {
		f.fromCycle(&d)
	}
	return d, d.Process.Validate()
}

// kink is by how much a switching changes the rate, K/s.
func (f *logFit) kink() float64 { return math.Abs(f.on-f.off) / f.tau }

// unexplained is the part of the residuals that is left when the times of the
// switchings, known to half a row's distance only, have been allowed for.
func (f *logFit) unexplained(fit Fit) float64 {
	timing := f.kink() * f.log.usual / math.Sqrt(12)
	return math.Sqrt(math.Max(0, fit.RMS*fit.RMS-timing*timing))
}

// fromCycle takes rates, dead time and process from the mean undisturbed cycle.
// Without thresholds given, the temperatures logged at the switchings stand
// for them.
func (f *logFit) fromCycle(d *Identified) {
	o := Observed{On: d.Fit.On, Off: d.Fit.Off, High: Given(d.Fit.High), Low: Given(d.Fit.Low), Lag: f.known.Lag, SettlesOff: f.known.SettlesOff}
	if f.known.Make.Known && f.known.Break.Known {
		o.Make, o.Break = f.known.Make.Value, f.known.Break.Value
	} else {
		o.Make, o.Break, o.Lag = f.log.atSwitching(true), f.log.atSwitching(false), 0
	}
	o.Resolution, o.Watch = math.Sqrt(12)*d.Fit.Noise, f.log.usual
	c, err := o.Identify()
	if err != nil || !c.RateOn.Known {
		return
	}
	d.Fit.FromCycle = true
	d.At, d.RateOn, d.RateOff, d.DeadTime, d.Process = c.At, c.RateOn, c.RateOff, c.DeadTime, c.Process
}

// atSwitching is the mean temperature logged as the contact goes on, or off,
// between two undisturbed phases; NaN where there is none.
func (g *logbook) atSwitching(on bool) float64 {
	sum, n := 0.0, 0.0
	for i := 1; i < len(g.phases); i++ {
		if a, b := g.phases[i-1], g.phases[i]; b.on == on && a.out == "" && b.out == "" {
			sum += (g.rows[a.last].Temperature + g.rows[b.first].Temperature) / 2
			n++
		}
	}
	return sum / n
}

// undetermined says why time constant and settling temperatures do not follow
// from the log, or nothing where they do.
func (f *logFit) undetermined(fit Fit, tau Estimate) string {
	if !f.known.SettlesOff.Known && f.log.longest() < longEnough*f.tau {
		return notFromACycle
	}
	if fit.Doubt != "" || !f.known.SettlesOff.Known && f.unexplained(fit) > residualQuality*fit.Noise {
		return "the plant is not first order by its own log, so that where a stuck load settles cannot be drawn out of it. State worst"
	}
	if !(tau.Error < tauError*tau.Value) {
		return fmt.Sprintf("the log leaves the time constant open by %.0f %%", 100*tau.Error/tau.Value)
	}
	return ""
}

// steepestOn is the fastest straight line measured with the load on: over a
// quarter of each on phase that is used, but over no fewer than five rows.
func (f *logFit) steepestOn() float64 {
	rows, steepest := f.log.rows, 0.0
	for _, p := range f.log.phases {
		if !p.on || p.out != "" {
			continue
		}
		n := max(5, (p.last-p.first+1)/4)
		for i := p.first; i+n-1 <= p.last; i++ {
			if s := straight(rows[i : i+n]); math.Abs(s) > math.Abs(steepest) {
				steepest = s
			}
		}
	}
	return steepest
}

// straight is the slope of the regression line, K/s.
func straight(rows []Row) float64 {
	var t, y float64
	for _, r := range rows {
		t += r.Time
		y += r.Temperature
	}
	t /= float64(len(rows))
	y /= float64(len(rows))
	var ty, tt float64
	for _, r := range rows {
		ty += (r.Time - t) * (r.Temperature - y)
		tt += (r.Time - t) * (r.Time - t)
	}
	if tt == 0 {
		return 0
	}
	return ty / tt
}

// report gathers the quality of the fit and the cycle as logged.
func (f *logFit) report() Fit {
	g := f.log
	fit := Fit{Rows: len(g.rows), Used: f.used, Switchings: len(g.phases) - 1, Noise: f.noise(), Correlation: f.correlation()}
	for _, r := range f.residuals {
		fit.RMS += r * r
		fit.Worst = math.Max(fit.Worst, math.Abs(r))
	}
	fit.RMS = math.Sqrt(fit.RMS / float64(len(f.residuals)))
	if f.unexplained(fit) > moreThanNoise*fit.Noise || fit.Worst > worstOfNoise*fit.Noise+f.kink()*f.log.usual {
		fit.Doubt = fmt.Sprintf("residuals of %.2g K rms, %.2g K at worst, beside a noise of %.2g K: the plant is not first order with dead time; rates and cycle are means, and nothing far from the cycle follows",
			fit.RMS, fit.Worst, fit.Noise)
	}
	fit.On, fit.Off = g.meanTime(true), g.meanTime(false)
	fit.High, fit.Low = g.meanExtreme(true), g.meanExtreme(false)
	fit.LeftOut = append(fit.LeftOut, g.gaps...)
	for _, p := range g.phases {
		if p.out != "" {
			fit.LeftOut = append(fit.LeftOut, LeftOut{p.from, p.to, p.out})
		}
	}
	return fit
}

// meanTime is that of the undisturbed complete phases of one kind.
func (g *logbook) meanTime(on bool) float64 {
	sum, n := 0.0, 0.0
	for _, p := range g.phases {
		if p.on == on && p.whole && p.out == "" {
			sum += p.to - p.from
			n++
		}
	}
	return sum / n
}

// meanExtreme is the mean of the highest, or lowest, temperatures about the
// switchings between two undisturbed phases.
func (g *logbook) meanExtreme(high bool) float64 {
	sum, n := 0.0, 0.0
	for i := 1; i < len(g.phases); i++ {
		a, b := g.phases[i-1], g.phases[i]
		warms := g.rows[a.last].Temperature > g.rows[a.first].Temperature
		if a.out != "" || b.out != "" || warms != high {
			continue
		}
		extreme := g.rows[a.last].Temperature
		for j := a.first; j <= b.last; j++ {
			if v := g.rows[j].Temperature; v > extreme == high {
				extreme = v
			}
		}
		sum += extreme
		n++
	}
	return sum / n
}
