package survey

import (
	"fmt"
	"strings"
)

// ownRange is the range of temperature of each kind of sensor, in degC, with
// its source. The thermocouples stop where their tolerance classes do.
var ownRange = map[SensorKind]struct {
	low, high float64
	source    string
}{
	"ntc":     {-55, 150, "common practice"},
	"pt100":   {-200, 850, "IEC 60751"},
	"pt1000":  {-200, 850, "IEC 60751"},
	"type_k":  {-200, 1200, "IEC 60584-1"},
	"type_j":  {-200, 760, "IEC 60584-1, first range of the inverse polynomial"},
	"type_t":  {-200, 350, "IEC 60584-1"},
	"diode":   {-40, 125, "common practice"},
	"digital": {-55, 125, "common practice"},
}

func (d *decoder) sensor(s *Survey, x *Sensor, w *wiring) {
	if !x.Kind.Set {
		return
	}
	d.refers(x.ColdJunction, w, "sensor")
	d.coldJunction(s, x)
	if x.Excitation.Written() && !x.Excitation.Set && x.Excitation.Text == "unknown" {
		d.failAt(x.Excitation.Source, "the divider's supply has to be known", "unknown", "a voltage; or leave the key out where the divider hangs on the converter's reference")
	}
	need := func(ok bool, what, fits string) {
		if !ok {
			d.failAt(x.Source, "key missing", "no "+what, fits)
		}
	}
	one := func(fits string, set ...bool) {
		switch n := count(set...); n {
		case 0:
			d.failAt(x.Source, "key missing", "none of "+fits, "exactly one of "+fits)
		case 1:
		default:
			d.failAt(x.Source, "too many keys", fmt.Sprintf("%d of %s", n, fits), "exactly one of "+fits)
		}
	}
	switch x.Kind.V {
	case "ntc":
		need(given(x.R25) || given(x.SteinhartHart) || given(x.Table), "r25", "r25: resistance at 25 degC")
		one("beta, steinhart_hart, table", given(x.Beta), given(x.SteinhartHart), given(x.Table))
		one("pull_up, pull_down", given(x.PullUp), given(x.PullDown))
	case "pt100", "pt1000":
		one("pull_up, pull_down, current", given(x.PullUp), given(x.PullDown), given(x.Current))
		need(!given(x.Current) || given(x.Gain), "gain", "gain of the amplifier behind the current source")
		d.classOf(x, "AA", "A", "B", "C")
	case "type_k", "type_j", "type_t":
		need(given(x.Gain), "gain", "gain: of the amplifier, so that the range fits the converter")
		d.classOf(x, "1", "2")
	case "linear":
		need(given(x.At), "at", "at: [[0 degC, 0.4 V], [100 degC, 2.0 V]]")
	case "diode":
		need(given(x.At25) && given(x.Slope), "at_25 and slope", "at_25: 0.6 V, slope: -2 mV/K")
	case "digital":
		need(given(x.CountsPerKelvin), "counts_per_kelvin", "counts_per_kelvin: 16")
	case "millivolt", "current":
		need(given(x.FullScale), "full_scale", "full_scale: 30 mV")
	}
	d.errorFits(x)
	d.positive(x.R25, x.Beta, x.PullUp, x.PullDown, x.Excitation, x.Current, x.Gain, x.CountsPerKelvin, x.FullScale)
	if x.Slope.Set && x.Slope.V == 0 {
		d.failAt(x.Slope.Source, "does not change with temperature", x.Slope.Text, "such as -2 mV/K")
	}
	d.points(x)
	if x.Valid.Set && x.Valid.V[0] >= x.Valid.V[1] {
		d.failAt(x.Valid.Source, "lowest and highest change places", x.Valid.Text, "the lower temperature first")
	} else if own, ok := ownRange[x.Kind.V]; ok && own.source != "common practice" && x.Valid.Set && (x.Valid.V[0] < own.low-1e-9 || x.Valid.V[1] > own.high+1e-9) {
		d.failAt(x.Valid.Source, "beyond what this kind of sensor measures", x.Valid.Text, fmt.Sprintf("within %g degC to %g degC (%s)", own.low, own.high, own.source))
	}
}

// coldJunction wants a sensor that needs no cold junction itself.
func (d *decoder) coldJunction(s *Survey, x *Sensor) {
	for _, other := range s.Electronics.Sensors {
		if x.ColdJunction.Set && other.ID.V == x.ColdJunction.V && other.Kind.Set && !contains(ambientKinds, string(other.Kind.V)) {
			d.failAt(x.ColdJunction.Source, "no sensor for a cold junction", quote(x.ColdJunction.V)+", kind "+string(other.Kind.V), "a sensor of kind "+strings.Join(ambientKinds, ", "))
		}
	}
}

// ambientKinds are the kinds that measure a temperature without another sensor.
var ambientKinds = []string{"ntc", "pt100", "pt1000", "linear", "diode", "digital"}

func (d *decoder) classOf(x *Sensor, words ...string) {
	if x.Class.Set && !contains(words, x.Class.V) {
		d.failAt(x.Class.Source, "no tolerance class of this kind", quote(x.Class.V), oneOf(x.Class.V, words))
	}
}

// points wants tables that rise in temperature and go one way in the other column.
func (d *decoder) points(x *Sensor) {
	for _, t := range []struct {
		f       Field[[][2]float64]
		falling bool
	}{{x.Table, true}, {x.At, false}} {
		if !t.f.Set {
			continue
		}
		p := t.f.V
		ok := len(p) >= 2
		for i := 1; i < len(p); i++ {
			up := p[1][1] > p[0][1]
			ok = ok && p[i][0] > p[i-1][0] && (p[i][1] > p[i-1][1]) == up && p[i][1] != p[i-1][1] && !(t.falling && up)
		}
		if !ok {
			d.failAt(t.f.Source, "no curve that can be read backwards", t.f.Text, "two or more points, temperatures rising, the other column strictly one way")
		}
	}
}

// inSensorsRange wants thresholds that the new sensor can see.
func (d *decoder) inSensorsRange(s *Survey, c *Control) {
	if c.Plan.V != Replace && c.Plan.V != Monitor {
		return
	}
	for _, x := range s.Electronics.Sensors {
		if x.ID.V != c.Sensor.V || !x.ID.Set {
			continue
		}
		low, high, why := believed(x)
		if low >= high {
			return
		}
		for _, f := range []Field[float64]{c.BreaksAt, c.MakesAt} {
			if f.Set && (f.V <= low || f.V >= high) {
				d.failAt(f.Source, "outside the range of "+x.ID.V, f.Text, fmt.Sprintf("within %g degC to %g degC (%s)", low, high, why))
			}
		}
	}
}

// believed is the range of a sensor: as stated, or that of its kind.
func believed(x *Sensor) (low, high float64, why string) {
	switch {
	case x.Valid.Set:
		return x.Valid.V[0], x.Valid.V[1], "valid"
	case x.At.Set && len(x.At.V) >= 2:
		return x.At.V[0][0], x.At.V[len(x.At.V)-1][0], "at"
	}
	own := ownRange[x.Kind.V]
	return own.low, own.high, own.source
}

func count(set ...bool) int {
	n := 0
	for _, s := range set {
		if s {
			n++
		}
	}
	return n
}

// errorFits wants the error of a sensor in what it measures.
func (d *decoder) errorFits(x *Sensor) {
	if !x.Error.Set {
		return
	}
	dim := map[SensorKind]string{"millivolt": "voltage", "current": "current"}[x.Kind.V]
	if dim == "" {
		dim = "interval"
	}
	if _, m := quantity(x.Error.Text, dim); m != nil {
		d.failAt(x.Error.Source, "not an error of what this kind measures", x.Error.Text, "such as "+dimensions[dim].example)
	}
}
