package thermal

import (
	"fmt"
	"math"

	"gonum.org/v1/gonum/mat"
)

// Observed is a cycle taken by stopwatch and thermometer, with what is known
// of the control that made it.
type Observed struct {
	On, Off     float64  // s, of the contact
	High, Low   Estimate // degC of the medium, where taken
	Make, Break float64  // degC at the element
	Lag         float64  // s, of the element
	SettlesOff  Estimate // degC, where the medium settles without the load, where known
	Resolution  float64  // K, of the thermometer; 0: 0.1 K
	Watch       float64  // s, of the stopwatch readings; 0: 1 s
}

// readings are the same with NaN for what is not known.
type readings struct {
	On, Off, High, Low, Make, Break, Lag, SettlesOff, Resolution, Watch float64
}

// standInPeriods is how many periods long the time constant of a stand-in is:
// long enough for straight flanks, short enough for the arithmetic.
const standInPeriods = 200

// Identify works out what the observed cycle determines. The on and off times
// and the swing of the medium are met exactly; High and Low themselves may
// stand off by what bench and plant thermometer differ, which is taken as
// common to both.
//
// Errors: *InputError for figures that cannot be. A swing smaller than the
// differential, or too small for the stated lag, leaves the dead time 0 and
// not determined, with the reason.
func (o Observed) Identify() (Identified, error) {
	return readings{
		On: o.On, Off: o.Off, High: o.High.or(), Low: o.Low.or(), Make: o.Make, Break: o.Break,
		Lag: o.Lag, SettlesOff: o.SettlesOff.or(), Resolution: o.Resolution, Watch: o.Watch,
	}.identify()
}

func (o readings) identify() (Identified, error) {
	if err := o.validate(); err != nil {
		return Identified{}, err
	}
	if math.IsNaN(o.High) || math.IsNaN(o.Low) {
		return o.timesOnly(), nil
	}
	d, err := o.solved()
	if err != nil {
		return Identified{}, err
	}
	o.errors(&d)
	return d, nil
}

func (o readings) validate() error {
	err := firstError(
		positive("observed on", o.On), positive("observed off", o.Off),
		finite("make", o.Make), finite("break", o.Break), notNegative("lag", o.Lag),
		notNegative("resolution", o.Resolution), notNegative("watch", o.Watch),
		apart("make", o.Make, o.Break, "it must differ from break to tell a heating control from a cooling one"),
	)
	if err != nil {
		return err
	}
	if !math.IsNaN(o.High) && !math.IsNaN(o.Low) && !(o.High > o.Low) {
		return &InputError{"observed high", o.High, fmt.Sprintf("it must be above the low (%g)", o.Low)}
	}
	if math.IsInf(o.High, 0) || math.IsInf(o.Low, 0) || math.IsInf(o.SettlesOff, 0) {
		return &InputError{"an observed temperature", math.Inf(1), "a number is needed"}
	}
	away := o.SettlesOff < math.Min(o.Make, o.Break)
	if o.cooling() {
		away = o.SettlesOff > math.Max(o.Make, o.Break)
	}
	if !math.IsNaN(o.SettlesOff) && !away {
		return &InputError{"settles_off", o.SettlesOff, "the medium must come back to make with the load off"}
	}
	return nil
}

func (o readings) cooling() bool { return o.Make > o.Break }

// timesOnly is what on and off times alone tell.
func (o readings) timesOnly() Identified {
	why := "without the highest and lowest temperature of the medium its rates are only known to be no less than the differential over the times"
	sign := 1.0
	if o.cooling() {
		sign = -1
	}
	d := math.Abs(o.Break - o.Make)
	return Identified{
		At:     (o.Make + o.Break) / 2,
		RateOn: unknown("%s: %.4g K/min", why, sign*60*d/o.On), RateOff: unknown("%s: %.4g K/min", why, -sign*60*d/o.Off),
		DeadTime: unknown("%s", why), TimeConstant: unknown("%s", why), SettlesOn: unknown("%s", why), SettlesOff: o.settlesOff(),
		FastestOn: math.NaN(),
	}
}

func (o readings) settlesOff() Estimate {
	if math.IsNaN(o.SettlesOff) {
		return unknown(notFromACycle)
	}
	return known(o.SettlesOff, 0)
}

// solved meets on, off and swing.
func (o readings) solved() (Identified, error) {
	swing := o.High - o.Low
	sign := 1.0
	if o.cooling() {
		sign = -1
	}
	middle := (o.Make + o.Break) / 2
	rise, fall := swing/o.On, swing/o.Off // straight flanks: magnitudes
	dead := (swing-math.Abs(o.Break-o.Make))/(rise+fall) - o.Lag
	tau := standInPeriods * (o.On + o.Off)
	if !math.IsNaN(o.SettlesOff) {
		tau = math.Abs(middle-o.SettlesOff) / fall
	}
	start := Process{On: middle + sign*rise*tau, Off: middle - sign*fall*tau, Tau: tau, Dead: math.Max(dead, 0)}
	p, met := o.meet(start)
	d := Identified{At: middle, Process: p, SettlesOff: o.settlesOff()}
	d.RateOn = known((p.On-middle)/p.Tau, 0)
	d.RateOff = known((p.Off-middle)/p.Tau, 0)
	d.FastestOn = (p.On - o.coldEnd()) / p.Tau
	switch {
	case met:
		d.DeadTime = known(p.Dead, 0)
	case dead <= 0:
		d.DeadTime = unknown("a swing of %.4g K leaves no dead time beside a differential of %.4g K and a sensing lag of %.4g s: one of the three is not as stated", swing, math.Abs(o.Break-o.Make), o.Lag)
	default:
		d.DeadTime = unknown("no first-order process with dead time has this cycle with these thresholds and this lag")
	}
	d.TimeConstant, d.SettlesOn = unknown(notFromACycle), unknown(notFromACycle)
	if !math.IsNaN(o.SettlesOff) && met {
		d.TimeConstant, d.SettlesOn = known(p.Tau, 0), known(p.On, 0)
	}
	return d, nil
}

// coldEnd is the end of the swing at which the load moves the medium fastest.
func (o readings) coldEnd() float64 {
	if o.cooling() {
		return o.High
	}
	return o.Low
}

// meet refines a process until the loop's on time, off time and swing are the
// observed ones (Newton's method with differences). With SettlesOff known the
// unknowns are SettlesOn, time constant and dead time; otherwise the time
// constant stays and SettlesOff is the third.
func (o readings) meet(p Process) (Process, bool) {
	for range 30 {
		miss, ok := o.misses(p)
		if !ok {
			return p, false
		}
		if math.Max(math.Abs(miss[0]), math.Max(math.Abs(miss[1]), math.Abs(miss[2]))) < 1e-10 {
			return p, true
		}
		var jacobian mat.Dense
		jacobian.ReuseAs(3, 3)
		for j := range 3 {
			const nudge = 1e-6
			q := o.moved(p, j, nudge)
			m, ok := o.misses(q)
			if !ok {
				return p, false
			}
			for i := range 3 {
				jacobian.Set(i, j, (m[i]-miss[i])/nudge)
			}
		}
		var step mat.VecDense
		if err := step.SolveVec(&jacobian, mat.NewVecDense(3, miss[:])); err != nil {
			return p, false
		}
		for j := range 3 {
			p = o.moved(p, j, -math.Max(-0.5, math.Min(0.5, step.AtVec(j))))
		}
	}
	return p, false
}

// moved changes one unknown by a part of itself: the distance of SettlesOn
// from the middle, time constant or distance of SettlesOff, and dead time in
// parts of the on time.
func (o readings) moved(p Process, which int, by float64) Process {
	middle := (o.Make + o.Break) / 2
	switch which {
	case 0:
		p.On = middle + (p.On-middle)*(1+by)
	case 1:
		if math.IsNaN(o.SettlesOff) {
			p.Off = middle + (p.Off-middle)*(1+by)
		} else {
			p.Tau *= 1 + by
			p.Off = o.SettlesOff
		}
	case 2:
		p.Dead += by * o.On * 0.1
	}
	return p
}

func (o readings) misses(p Process) ([3]float64, bool) {
	if p.Dead < 0 {
		return [3]float64{}, false
	}
	f, err := Loop{p, Sensing{Lag: o.Lag}, Switching{Make: o.Make, Break: o.Break}}.Steady()
	if err != nil {
		return [3]float64{}, false
	}
	return [3]float64{f.On/o.On - 1, f.Off/o.Off - 1, f.Swing()/(o.High-o.Low) - 1}, true
}

// errors carries the readings' resolution over to the results, each reading
// taken as uniform over one division, and independent.
func (o readings) errors(d *Identified) {
	if o.Resolution == 0 {
		o.Resolution = 0.1
	}
	if o.Watch == 0 {
		o.Watch = 1
	}
	figures := []*Estimate{&d.RateOn, &d.RateOff, &d.DeadTime, &d.TimeConstant, &d.SettlesOn}
	sums := make([]float64, len(figures))
	for _, nudge := range []func(*readings){
		func(o *readings) { o.High += o.Resolution / math.Sqrt(12) },
		func(o *readings) { o.Low -= o.Resolution / math.Sqrt(12) },
		func(o *readings) { o.On += o.Watch / math.Sqrt(12) },
		func(o *readings) { o.Off += o.Watch / math.Sqrt(12) },
	} {
		q := o
		nudge(&q)
		e, err := q.solved()
		if err != nil {
			continue
		}
		for i, f := range []Estimate{e.RateOn, e.RateOff, e.DeadTime, e.TimeConstant, e.SettlesOn} {
			if f.Known && figures[i].Known {
				sums[i] += (f.Value - figures[i].Value) * (f.Value - figures[i].Value)
			}
		}
	}
	for i, f := range figures {
		if f.Known {
			f.Error = math.Sqrt(sums[i])
		}
	}
}
