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

// sensorKeys says which keys belong to which kinds.
var sensorKeys = map[string]string{
	"r25": "ntc", "r25_tolerance": "ntc", "beta": "ntc", "beta_tolerance": "ntc", "steinhart_hart": "ntc", "table": "ntc",
	"pull_up": "ntc pt100 pt1000", "pull_down": "ntc pt100 pt1000", "pull_up_tolerance": "ntc pt100 pt1000",
	"excitation": "ntc pt100 pt1000", "excitation_tolerance": "ntc pt100 pt1000", "self_heating": "ntc pt100 pt1000",
	"class": "pt100 pt1000 type_k type_j type_t", "wires": "pt100 pt1000", "lead": "ntc pt100 pt1000",
	"current": "pt100 pt1000", "gain": "pt100 pt1000 type_k type_j type_t millivolt",
	"offset":        "type_k type_j type_t",
	"cold_junction": "type_k type_j type_t", "cold_junction_error": "type_k type_j type_t", "open_reads": "type_k type_j type_t",
	"at": "linear", "error": "linear diode digital millivolt current", "at_25": "diode", "slope": "diode",
	"counts_per_kelvin": "digital", "stale_after": "digital", "full_scale": "millivolt current",
}

func (s *Sensor) sources() map[string]Source {
	return map[string]Source{
		"r25": s.R25.Source, "r25_tolerance": s.R25Tolerance.Source, "beta": s.Beta.Source, "beta_tolerance": s.BetaTolerance.Source,
		"steinhart_hart": s.SteinhartHart.Source, "table": s.Table.Source, "pull_up": s.PullUp.Source, "pull_down": s.PullDown.Source,
		"pull_up_tolerance": s.PullTolerance.Source, "excitation": s.Excitation.Source, "excitation_tolerance": s.ExcitationTol.Source,
		"self_heating": s.SelfHeating.Source, "class": s.Class.Source, "wires": s.Wires.Source, "lead": s.Lead.Source,
		"current": s.Current.Source, "gain": s.Gain.Source, "offset": s.Offset.Source, "cold_junction": s.ColdJunction.Source,
		"cold_junction_error": s.ColdJunctionError.Source, "open_reads": s.OpenReads.Source, "at": s.At.Source, "error": s.Error.Source,
		"at_25": s.At25.Source, "slope": s.Slope.Source, "counts_per_kelvin": s.CountsPerKelvin.Source, "stale_after": s.StaleAfter.Source,
		"full_scale": s.FullScale.Source,
	}
}

func (d *decoder) sensor(s *Survey, x *Sensor, w *wiring) {
	if !x.Kind.Set {
		return
	}
	kind := string(x.Kind.V)
	sources := x.sources()
	for _, k := range sortedKeys(sensorKeys) {
		kinds := strings.Fields(sensorKeys[k])
		d.belongs(sources[k], true, contains(kinds, kind), "kind: "+strings.Join(kinds, ", "))
	}
	d.refers(x.ColdJunction, w, "sensor")
	need := func(ok bool, what, fits string) {
		if !ok {
			d.failAt(x.Source, "key missing", "no "+what, fits)
		}
	}
	divider := count(x.PullUp.Set, x.PullDown.Set)
	switch x.Kind.V {
	case "ntc":
		need(x.R25.Set || x.SteinhartHart.Set || x.Table.Set, "r25", "r25: resistance at 25 degC")
		need(count(x.Beta.Set, x.SteinhartHart.Set, x.Table.Set) == 1, "curve, or more than one", "exactly one of beta, steinhart_hart, table")
		need(divider == 1, "divider, or two", "exactly one of pull_up and pull_down")
	case "pt100", "pt1000":
		need(divider == 1 || x.Current.Set, "front end", "pull_up, pull_down, or current with gain")
		need(!x.Current.Set || x.Gain.Set, "gain", "gain of the amplifier behind the current source")
		d.classOf(x, "AA", "A", "B", "C")
	case "type_k", "type_j", "type_t":
		need(x.Gain.Set, "gain", "gain: of the amplifier, so that the range fits the converter")
		d.classOf(x, "1", "2")
	case "linear":
		need(x.At.Set, "at", "at: [[0 degC, 0.4 V], [100 degC, 2.0 V]]")
	case "diode":
		need(x.At25.Set && x.Slope.Set, "at_25 and slope", "at_25: 0.6 V, slope: -2 mV/K")
	case "digital":
		need(x.CountsPerKelvin.Set && x.CountsPerKelvin.V > 0, "counts_per_kelvin", "counts_per_kelvin: 16")
	case "millivolt", "current":
		need(x.FullScale.Set && x.FullScale.V > 0, "full_scale", "full_scale: 30 mV")
	}
	d.positive(x)
	d.points(x)
	if x.Valid.Set && x.Valid.V[0] >= x.Valid.V[1] {
		d.failAt(x.Valid.Source, "lowest and highest change places", x.Valid.Text, "the lower temperature first")
	} else if own, ok := ownRange[x.Kind.V]; ok && own.source != "common practice" && x.Valid.Set && (x.Valid.V[0] < own.low-1e-9 || x.Valid.V[1] > own.high+1e-9) {
		d.failAt(x.Valid.Source, "beyond what this kind of sensor measures", x.Valid.Text, fmt.Sprintf("within %g degC to %g degC (%s)", own.low, own.high, own.source))
	}
}

func (d *decoder) classOf(x *Sensor, words ...string) {
	if x.Class.Set && !contains(words, x.Class.V) {
		d.failAt(x.Class.Source, "no tolerance class of this kind", quote(x.Class.V), oneOf(x.Class.V, words))
	}
}

// positive refuses zero where nothing would be left to measure.
func (d *decoder) positive(x *Sensor) {
	for _, f := range []Field[float64]{x.R25, x.Beta, x.PullUp, x.PullDown, x.Excitation, x.Current, x.Gain} {
		if f.Set && f.V <= 0 {
			d.failAt(f.Source, "must be more than nothing", f.Text, "a positive value")
		}
	}
	if x.Slope.Set && x.Slope.V == 0 {
		d.failAt(x.Slope.Source, "does not change with temperature", x.Slope.Text, "such as -2 mV/K")
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
