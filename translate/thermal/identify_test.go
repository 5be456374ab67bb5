package thermal

import (
	"errors"
	"fmt"
	"math"
	"math/rand/v2"
	"os"
	"strings"
	"testing"
)

// Source: the worked example of the heated vessel. Its cycle determines its
// process once settles_off is known.
func TestObservedCycleGivesTheVessel(t *testing.T) {
	for _, lag := range []float64{0, 45} {
		f := steady(t, tank(lag))
		o := Observed{On: f.On, Off: f.Off, High: Given(f.High), Low: Given(f.Low), Make: 54, Break: 60, Lag: lag, SettlesOff: Given(18)}
		d, err := o.Identify()
		if err != nil {
			t.Fatal(err)
		}
		agrees(t, "settles on", d.SettlesOn.Value, 140, 1e-6)
		agrees(t, "time constant", d.TimeConstant.Value, 12600, 1e-6)
		agrees(t, "dead time", d.DeadTime.Value, 40, 1e-6)
		if !d.SettlesOn.Known || !d.DeadTime.Known || d.DeadTime.Error <= 0 {
			t.Errorf("%+v", d)
		}
	}
}

// With on and off times held exactly, loads that would settle at 90, 110, 140
// or 1000 degC give highs and lows within 0.03 K of each other (worked out
// independently of this program): the cycle alone does not tell them apart,
// and the two rates and the dead time it does give are those of the plant.
func TestObservedCycleAloneDoesNotTellTheLoad(t *testing.T) {
	f := steady(t, tank(0))
	o := Observed{On: f.On, Off: f.Off, High: Given(f.High), Low: Given(f.Low), Make: 54, Break: 60}
	d, err := o.Identify()
	if err != nil {
		t.Fatal(err)
	}
	if d.SettlesOn.Known || d.TimeConstant.Known || d.SettlesOn.Because == "" {
		t.Errorf("%+v", d)
	}
	agrees(t, "rate on", d.RateOn.Value, 83.0/12600, 5e-3)
	agrees(t, "rate off", d.RateOff.Value, -39.0/12600, 5e-3)
	isNear(t, "dead time", d.DeadTime.Value, 40, 3)
	again := steady(t, Loop{d.Process, Sensing{}, Switching{Make: 54, Break: 60}})
	agrees(t, "on again", again.On, f.On, 1e-8)
	agrees(t, "off again", again.Off, f.Off, 1e-8)

	r, err := d.TimeToDanger(60, 95, Estimate{}, true)
	if err != nil || r.Outcome != NotDetermined || r.AtLeast <= 0 {
		t.Errorf("%+v %v", r, err)
	}
	exact := 12600 * math.Log(80.0/45)
	if r.AtLeast > exact {
		t.Errorf("bound %g beyond the truth %g", r.AtLeast, exact)
	}
	r, err = d.TimeToDanger(60, 95, Given(140), true)
	if err != nil || r.Outcome != Reached {
		t.Fatalf("%+v %v", r, err)
	}
	agrees(t, "with worst stated", r.Seconds, exact, 0.01)
	if r, err = d.TimeToDanger(60, 95, Given(40), true); err != nil || r.Outcome != NotDetermined {
		t.Errorf("a worst below the cycle: %+v %v", r, err)
	}
	for _, settles := range []float64{90, 110, 140, 1000} {
		// the process that keeps on and off times: rates in the ratio of the times
		g := sameTimes(t, settles, f.On, f.Off)
		isNear(t, fmt.Sprintf("high of a load settling at %g", settles), g.High, f.High, 0.03)
		isNear(t, fmt.Sprintf("low of a load settling at %g", settles), g.Low, f.Low, 0.03)
	}
}

// sameTimes is the cycle of a load that settles elsewhere, with time constant
// and settles_off such that on and off times stay, dead time 40 s.
func sameTimes(t *testing.T, settles, on, off float64) Figures {
	t.Helper()
	p := Process{settles, 18, (settles - 57) / (83.0 / 12600), 40}
	p.Off = 57 - p.Tau*39/12600
	for range 200 {
		f := steady(t, Loop{p, Sensing{}, Switching{Make: 54, Break: 60}})
		p.Tau *= math.Sqrt(on / f.On)
		p.Off = 57 - (57-p.Off)*math.Pow(f.Off/off, 0.5)*math.Sqrt(on/f.On)
	}
	f := steady(t, Loop{p, Sensing{}, Switching{Make: 54, Break: 60}})
	agrees(t, "on time kept", f.On, on, 1e-6)
	agrees(t, "off time kept", f.Off, off, 1e-6)
	return f
}

func TestObservedCycleOfCooling(t *testing.T) {
	l := Loop{Process{-30, 25, 3600, 30}, Sensing{Lag: 30}, Switching{Make: -16, Break: -20}}
	f := steady(t, l)
	d, err := Observed{On: f.On, Off: f.Off, High: Given(f.High), Low: Given(f.Low), Make: -16, Break: -20, Lag: 30, SettlesOff: Given(25)}.Identify()
	if err != nil {
		t.Fatal(err)
	}
	agrees(t, "settles on", d.SettlesOn.Value, -30, 1e-6)
	agrees(t, "time constant", d.TimeConstant.Value, 3600, 1e-6)
	agrees(t, "dead time", d.DeadTime.Value, 30, 1e-5)
}

func TestObservedSaysWhatIsOpen(t *testing.T) {
	d, err := Observed{On: 968, Off: 2058, Make: 54, Break: 60}.Identify()
	if err != nil || d.RateOn.Known || d.DeadTime.Known || d.DeadTime.Because == "" {
		t.Errorf("times only: %+v %v", d, err)
	}
	d, err = Observed{On: 968, Off: 2058, High: Given(59), Low: Given(55), Make: 54, Break: 60}.Identify()
	if err != nil || d.DeadTime.Known || !d.RateOn.Known {
		t.Errorf("swing below the differential: %+v %v", d, err)
	}
	for name, o := range map[string]Observed{
		"no on time":       {Off: 10, Make: 54, Break: 60},
		"high below low":   {On: 1, Off: 1, High: Given(5), Low: Given(6), Make: 54, Break: 60},
		"equal edges":      {On: 1, Off: 1, Make: 60, Break: 60},
		"warm without":     {On: 1, Off: 1, Make: 54, Break: 60, SettlesOff: Given(58)},
		"negative lag":     {On: 1, Off: 1, Make: 54, Break: 60, Lag: -1},
		"endless off time": {On: 1, Off: math.Inf(1), Make: 54, Break: 60},
	} {
		var input *InputError
		if _, err := o.Identify(); !errors.As(err, &input) {
			t.Errorf("%s: %v", name, err)
		}
	}
}

// synthetic is a log of a loop by a thermometer of a resolution, with Gaussian
// noise, from make on. It uses the independent fixed-step integration.
func synthetic(l Loop, every, resolution, noise float64, cycles int, seed uint64) []Row {
	random := rand.New(rand.NewPCG(seed, 1))
	k := rungeKutta{l: l, step: every / 5, medium: l.Switching.Make, a: l.Switching.Make, b: l.Switching.Make}
	for range 6 { // three cycles to settle
		k.phase()
	}
	var rows []Row
	phases := 0
	next := k.now + random.Float64()*every
	before, mediumBefore := k.now, k.medium
	k.record = func(now float64, medium float64, on bool) {
		for ; next <= now; next += every {
			y := mediumBefore + (medium-mediumBefore)*(next-before)/(now-before) + noise*random.NormFloat64()
			rows = append(rows, Row{next, math.Round(y/resolution) * resolution, on})
		}
		before, mediumBefore = now, medium
	}
	for phases < 2*cycles {
		k.phase()
		phases++
	}
	return rows
}

// Known parameters come back from noisy logs at the resolution of an ordinary
// logger, 0.1 K, with 0.05 K of noise: 200 seeds, three and a half hours every
// 10 s. What the errors are is printed; the bounds asserted are twice what they
// were when this was written.
func TestIdentificationOver200Seeds(t *testing.T) {
	if testing.Short() {
		t.Skip("long")
	}
	const seeds = 200
	l := tank(45)
	var rateOn, rateOff, dead, settles, tau, onTime, offTime spread
	inside := 0
	for seed := range uint64(seeds) {
		rows := synthetic(l, 10, 0.1, 0.05, 4, seed)
		d, err := Identify(rows, Known{SettlesOff: Given(18)})
		if err != nil {
			t.Fatalf("seed %d: %v", seed, err)
		}
		if d.Fit.Doubt != "" || len(d.Fit.LeftOut) > 1 || !d.SettlesOn.Known {
			t.Fatalf("seed %d: %+v %+v", seed, d, d.Fit)
		}
		// the truth at d.At
		rateOn.add(d.RateOn.Value / ((140 - d.At) / 12600))
		rateOff.add(d.RateOff.Value / ((18 - d.At) / 12600))
		dead.add(d.DeadTime.Value - 40)
		settles.add(d.SettlesOn.Value - 140)
		tau.add(d.TimeConstant.Value / 12600)
		if math.Abs(d.DeadTime.Value-40) < 2*d.DeadTime.Error {
			inside++
		}
		f := steady(t, Loop{d.Process, Sensing{Lag: 45}, Switching{Make: 54, Break: 60}})
		onTime.add(f.On / 1031.766)
		offTime.add(f.Off / 2187.865)
	}
	t.Logf("over %d seeds, mean ± standard deviation: rate on %s, rate off %s (of the truth); dead time %s s off, settles_on %s K off, time constant %s (of the truth); predicted on %s, off %s (of the truth); dead time within two standard errors in %d",
		seeds, rateOn, rateOff, dead, settles, tau, onTime, offTime, inside)
	isNear(t, "rate on, mean", rateOn.mean(), 1, 0.005)
	isNear(t, "rate off, mean", rateOff.mean(), 1, 0.005)
	isNear(t, "dead time off, mean", dead.mean(), 0, 1.5)
	isNear(t, "settles on off, mean", settles.mean(), 0, 1.5)
	isNear(t, "predicted on, mean", onTime.mean(), 1, 0.005)
	if dead.deviation() > 3 || rateOn.deviation() > 0.01 || settles.deviation() > 3 {
		t.Errorf("spread: dead time %s s, rate on %s, settles on %s K", dead, rateOn, settles)
	}
	if inside < seeds*90/100 {
		t.Errorf("the dead time is within two standard errors in %d of %d only", inside, seeds)
	}
}

// spread gathers a mean and a standard deviation.
type spread struct{ n, sum, square float64 }

func (s *spread) add(v float64) { s.n++; s.sum += v; s.square += v * v }
func (s spread) mean() float64  { return s.sum / s.n }
func (s spread) deviation() float64 {
	return math.Sqrt(math.Max(0, s.square/s.n-s.mean()*s.mean()))
}
func (s spread) String() string { return fmt.Sprintf("%.4g ± %.2g", s.mean(), s.deviation()) }

// Without settles_off the same logs leave the load open, and say so.
func TestLogAloneDoesNotTellTheLoad(t *testing.T) {
	d, err := Identify(synthetic(tank(45), 10, 0.1, 0.05, 4, 7), Known{})
	if err != nil {
		t.Fatal(err)
	}
	if d.SettlesOn.Known || d.TimeConstant.Known || d.SettlesOff.Known {
		t.Errorf("%+v", d)
	}
	agrees(t, "rate on", d.RateOn.Value, (140-d.At)/12600, 0.02)
	agrees(t, "rate off", d.RateOff.Value, (18-d.At)/12600, 0.02)
	// but a log with a long heat-up shows where it goes
	long := Loop{Process{100, 20, 600, 20}, Sensing{Lag: 5}, Switching{Make: 30, Break: 90}}
	d, err = Identify(synthetic(long, 5, 0.1, 0.03, 4, 7), Known{})
	if err != nil || !d.SettlesOn.Known {
		t.Fatalf("%+v %v", d, err)
	}
	isNear(t, "settles on", d.SettlesOn.Value, 100, 1)
	isNear(t, "settles off", d.SettlesOff.Value, 20, 1)
	agrees(t, "time constant", d.TimeConstant.Value, 600, 0.02)
}

// Source: testdata/tank.csv, made by an independent simulation of a plant that
// is not first order; undisturbed on 521.5 s, off 8823 s.
func TestLogOfALayeredTank(t *testing.T) {
	file, err := os.Open("testdata/tank.csv")
	if err != nil {
		t.Fatal(err)
	}
	defer file.Close()
	rows, err := ReadLog(file)
	if err != nil || len(rows) != 3180 {
		t.Fatalf("%d rows, %v", len(rows), err)
	}
	d, err := Identify(rows, Known{Make: Given(55), Break: Given(61), Lag: 40})
	if err != nil {
		t.Fatal(err)
	}
	fit := d.Fit
	t.Logf("rms %.2g K, worst %.2g K, noise %.2g K; on %.5g s, off %.5g s; left out %+v", fit.RMS, fit.Worst, fit.Noise, fit.On, fit.Off, fit.LeftOut)
	agrees(t, "on as logged", fit.On, 521.5, 0.01)
	agrees(t, "off as logged", fit.Off, 8823, 0.01)
	f := steady(t, Loop{d.Process, Sensing{Lag: 40}, Switching{Make: 55, Break: 61}})
	agrees(t, "on predicted", f.On, 521.5, 0.01)
	agrees(t, "off predicted", f.Off, 8823, 0.01)
	if fit.Doubt == "" || !fit.FromCycle || fit.RMS < 2*fit.Noise {
		t.Errorf("the plant is not first order, but the fit says %+v", fit)
	}
	if d.SettlesOn.Known || d.TimeConstant.Known {
		t.Errorf("the load is not in the log: %+v", d)
	}
	covers := func(at float64) bool {
		for _, out := range fit.LeftOut {
			if out.From <= at && at <= out.To {
				return true
			}
		}
		return false
	}
	if !covers(15100) || !covers(22300) || covers(5000) || covers(18000) || covers(30000) {
		t.Errorf("left out: %+v", fit.LeftOut)
	}
	if d, err = Identify(rows, Known{SettlesOff: Given(19)}); err != nil || d.SettlesOn.Known {
		t.Errorf("with settles_off: %+v %v", d, err)
	}
}

// A draw-off in one phase and a pause of the logger are found and left out.
func TestDisturbedTimesAreLeftOut(t *testing.T) {
	rows := synthetic(tank(45), 10, 0.1, 0.05, 6, 3)
	clean, err := Identify(rows, Known{SettlesOff: Given(18)})
	if err != nil {
		t.Fatal(err)
	}
	// a pause of ten minutes, and a bulge of 3 K over ten minutes in an off phase
	var changes []int
	for i := 1; i < len(rows); i++ {
		if rows[i].On != rows[i-1].On {
			changes = append(changes, i)
		}
	}
	off := changes[4]
	if rows[off].On {
		off = changes[5]
	}
	disturbed := append([]Row(nil), rows...)
	for i := off + 40; i < off+100; i++ {
		disturbed[i].Temperature -= 3
	}
	disturbed = append(disturbed[:changes[1]+20], disturbed[changes[1]+80:]...)
	d, err := Identify(disturbed, Known{SettlesOff: Given(18)})
	if err != nil {
		t.Fatal(err)
	}
	if len(d.Fit.LeftOut) < 3 { // the beginning, the pause, the phase
		t.Errorf("%+v", d.Fit.LeftOut)
	}
	agrees(t, "rate on", d.RateOn.Value, (140-d.At)/12600, 0.02)
	agrees(t, "settles on", d.SettlesOn.Value, clean.SettlesOn.Value, 0.03)
}

func TestLogsThatSayTooLittle(t *testing.T) {
	rows := synthetic(tank(45), 10, 0.1, 0.05, 2, 1)
	first := 0
	for i := 1; i < len(rows); i++ {
		if rows[i].On != rows[0].On {
			first = i
			break
		}
	}
	second := first
	for i := first; i < len(rows); i++ {
		if rows[i].On != rows[first].On {
			second = i
			break
		}
	}
	for name, c := range map[string]struct {
		rows []Row
		want error
	}{
		"nothing":        {nil, ErrTooShort},
		"few rows":       {rows[:10], ErrTooShort},
		"one side":       {rows[:first], ErrOneSided},
		"one switching":  {rows[:second-1], ErrNoWhole},
		"all in the gap": {append(append([]Row(nil), rows[:first-60]...), rows[second+60:second+61]...), ErrOneSided},
	} {
		if _, err := Identify(c.rows, Known{}); !errors.Is(err, c.want) {
			t.Errorf("%s: %v, want %v", name, err, c.want)
		}
	}
	backwards := append([]Row(nil), rows...)
	backwards[30].Time = backwards[29].Time
	if _, err := Identify(backwards, Known{}); err == nil {
		t.Error("standing clock taken")
	}
}

func TestReadLog(t *testing.T) {
	rows, err := ReadLog(strings.NewReader("\ufefftime_s,state,room,temperature_c\n0,1,a,20.5\n10,0,b, 20.6\n"))
	if err != nil || len(rows) != 2 || rows[0] != (Row{0, 20.5, true}) || rows[1] != (Row{10, 20.6, false}) {
		t.Errorf("%v %v", rows, err)
	}
	for name, c := range map[string]struct{ text, says string }{
		"empty":          {"", "empty"},
		"header only":    {"time_s,temperature_c,state\n", "no row"},
		"wrong column":   {"time_s,temp,state\n0,20,1\n", "no column temperature_c"},
		"semicolons":     {"time_s;temperature_c;state\n0;20;1\n", "separated by commas"},
		"state":          {"time_s,temperature_c,state\n0,20,on\n", `line 2: state is "on"`},
		"state 2":        {"time_s,temperature_c,state\n0,20,2\n", "line 2: state is 2"},
		"not a number":   {"time_s,temperature_c,state\n0,20,1\n10,NaN,1\n", "line 3: temperature_c"},
		"infinite":       {"time_s,temperature_c,state\n0,20,1\n10,+Inf,1\n", "line 3: temperature_c"},
		"decimal comma":  {"time_s,temperature_c,state\n0,20,5,1\n", "line 2: 4 fields"},
		"backwards":      {"time_s,temperature_c,state\n0,20,1\n10,20,1\n5,20,1\n", "line 4: time_s is 5, not after 10"},
		"standing":       {"time_s,temperature_c,state\n0,20,1\n0,20,1\n", "line 3: time_s"},
		"short row":      {"time_s,temperature_c,state\n0,20\n", "line 2: 2 fields"},
		"absurd":         {"time_s,temperature_c,state\n0,-300,1\n", "no thermometer"},
		"torn quotation": {"time_s,temperature_c,state\n0,\"20,1\n", "line"},
	} {
		if _, err := ReadLog(strings.NewReader(c.text)); err == nil || !strings.Contains(err.Error(), c.says) {
			t.Errorf("%s: %v", name, err)
		}
	}
	// every error in one go, but not without end
	bad := "time_s,temperature_c,state\n" + strings.Repeat("x,20,1\n", 100)
	_, err = ReadLog(strings.NewReader(bad))
	if n := strings.Count(err.Error(), "line "); n != maxLogErrors {
		t.Errorf("%d errors listed", n)
	}
}

func FuzzReadLog(f *testing.F) {
	f.Add("time_s,temperature_c,state\n0,20,1\n10,20.1,0\n")
	f.Add("time_s;temperature_c;state\n0;20;1\n")
	f.Add("time_s,temperature_c,state\n0,\"20,1\n")
	f.Fuzz(func(t *testing.T, text string) {
		rows, err := ReadLog(strings.NewReader(text))
		if (err == nil) != (len(rows) > 0) {
			t.Fatalf("%d rows and %v", len(rows), err)
		}
		for i := 1; i < len(rows); i++ {
			if rows[i].Time <= rows[i-1].Time {
				t.Fatalf("times do not rise at row %d", i)
			}
		}
	})
}
