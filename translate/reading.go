package translate

import (
	"fmt"
	"math"

	"makebreak/survey"
	"makebreak/translate/logic"
	"makebreak/translate/sensing"
)

// Reading is a probe's temperature in the program, in whole steps of Unit K.
// It is worked out only where counts alone do not do: beside a dial that is
// turned, for a continuous output, for an indication.
type Reading struct {
	Value *logic.Var
	Unit  float64 // K for one whole step
	Low   int64   // what the reading can be: it stays there beyond the table
	High  int64
	table *logic.Table
}

// in brings a temperature, or a difference, to whole steps.
func (r Reading) in(degrees float64) int64 { return int64(math.Round(degrees / r.Unit)) }

// Conversion is the table of one sensor, with what was proved about it. A
// sensor that is linear in whole counts has no Fitted, but two points.
type Conversion struct {
	Sensor   string
	From, To float64 // degC, the span it is good for
	Unit     float64 // K
	Bound    float64 // K, the largest error allowed
	Bytes    int
	Pieces   int
	Worst    float64 // K, the largest error over every count
	Working  string
	table    *logic.Table
}

// span is what a part needs of a temperature, degC.
type span struct{ low, high float64 }

func (s span) with(o span) span { return span{math.Min(s.low, o.low), math.Max(s.high, o.high)} }

// roomAround is how far a conversion reaches beyond what is needed of it, K,
// so that a reading at its end is told apart from one just outside the band.
const roomAround = 2.0

// conversions works out the tables of all sensors of which a temperature is
// needed.
func (b *builder) conversions() {
	for _, s := range b.survey.Electronics.Sensors {
		chain := b.spec.Chains[s.ID.V]
		if chain == nil {
			continue
		}
		need, ok := b.spanOf(s)
		if !ok {
			continue
		}
		c, err := convert(chain, need)
		if err != nil {
			b.fail(s.Source, "no conversion table for "+s.ID.V, err.Error(), "another front end, or a narrower range")
			continue
		}
		b.spec.Conversions = append(b.spec.Conversions, c)
		fs, about := &b.spec.Figures, s.ID.V
		fs.add(about, "table_bytes", float64(c.Bytes), "bytes", s.Path, c.Working)
		fs.add(about, "table_pieces", float64(c.Pieces), "", s.Path, c.Working)
		fs.add(about, "table_error", c.Worst, "K", s.Path, "largest difference from the exact curve over every count: "+c.Working)
	}
}

// spanOf is what all the parts that need a sensor's temperature ask for.
func (b *builder) spanOf(s *survey.Sensor) (need span, any bool) {
	for _, c := range b.survey.Controls {
		if c.Sensor.V != s.ID.V || c.Plan.V != survey.Replace || !b.translated(c) {
			continue
		}
		if n, ok := b.spanFor(c); ok {
			if any {
				n = n.with(need)
			}
			need, any = n, true
		}
	}
	return need, any
}

// spanFor is the span of temperature that a control needs, where it needs one.
func (b *builder) spanFor(c *survey.Control) (span, bool) {
	switch {
	case c.Action.V == survey.Indicates:
		low, high := b.spec.Chains[c.Sensor.V].Valid()
		return span{low, high}, true
	case b.continuous(c):
		t, _ := b.settingsOf(c.ID.V)
		return pidSpan(c, t), true
	case c.Modulating():
		low, high := band(c)
		return span{low - roomAround, high + roomAround}, true
	case c.DialStays():
		low, high := b.dialEdges(c)
		return span{low - roomAround - known(c.Anticipator.Rise), high + roomAround}, true
	case anticipates(c):
		makes, breaks := b.wanted(c)
		low, high := math.Min(makes, breaks), math.Max(makes, breaks)
		return span{low - roomAround - c.Anticipator.Rise.V, high + roomAround}, true
	}
	return span{}, false
}

// convert chooses unit and bound, and fits the table. Hundredths of a kelvin
// fit 16 bits up to 320 degC, tenths beyond. The bound is half a count where a
// count is coarse: a table need not be better than what it converts.
func convert(chain *sensing.Chain, need span) (*Conversion, error) {
	low, high := chain.Valid()
	need = span{math.Max(need.low, low), math.Min(need.high, high)}
	c := &Conversion{Sensor: chain.Sensor.ID.V, From: need.low, To: need.high, Unit: 0.01, Bound: 0.05}
	if math.Max(math.Abs(need.low), math.Abs(need.high)) > 320 {
		c.Unit, c.Bound = 0.1, 0.5
	}
	c.Bound = math.Max(c.Bound, chain.CountWidth((need.low+need.high)/2)/2)
	what := "temperature of " + c.Sensor
	unit := fmt.Sprintf("%g K", c.Unit)
	if chain.Signed() {
		return c, c.linear(chain, need, what, unit)
	}
	f, err := chain.FitBetween(need.low, need.high, c.Bound, c.Unit)
	if err != nil {
		return nil, err
	}
	c.Bytes, c.Pieces, c.Worst, c.Working = f.Bytes(), f.Pieces(), f.Worst, f.Working
	c.table = &logic.Table{Name: c.Sensor + "_temperature", What: what, Unit: unit, Working: f.Working}
	for i := range f.X {
		c.table.X = append(c.table.X, int64(f.X[i]))
		c.table.Y = append(c.table.Y, int64(f.Y[i]))
	}
	return c, nil
}

// linear is the table of a sensor whose signed count is proportional to its
// temperature: two points.
func (c *Conversion) linear(chain *sensing.Chain, need span, what, unit string) error {
	x0, err := chain.Count(need.low)
	if err != nil {
		return err
	}
	x1, err := chain.Count(need.high)
	if err != nil {
		return err
	}
	perKelvin := chain.Sensor.CountsPerKelvin.V
	at := func(n int64) int64 { return int64(math.Round(float64(n) / perKelvin / c.Unit)) }
	c.table = &logic.Table{Name: c.Sensor + "_temperature", What: what, Unit: unit, X: []int64{x0, x1}, Y: []int64{at(x0), at(x1)}}
	for n := x0; n <= x1; n++ {
		v := at(x0) + (at(x1)-at(x0))*(n-x0)/(x1-x0)
		c.Worst = math.Max(c.Worst, math.Abs(float64(v)*c.Unit-float64(n)/perKelvin))
	}
	c.Bytes, c.Pieces = 8, 1
	c.Working = fmt.Sprintf("linear, %g counts a kelvin: 1 piece, 8 bytes, worst error %.3g K over counts %d to %d", perKelvin, c.Worst, x0, x1)
	c.table.Working = c.Working
	return nil
}

// reading declares, once for a probe, its temperature in this step.
func (b *builder) reading(p *Probe) Reading {
	if p.reading != nil {
		return *p.reading
	}
	id := p.Sensor.ID.V
	for _, c := range b.spec.Conversions {
		if c.Sensor != id {
			continue
		}
		t := c.table
		t.Name = b.name(t.Name)
		b.prog.Tables = append(b.prog.Tables, t)
		r := Reading{Unit: c.Unit, table: t, Low: min(t.Y[0], t.Y[len(t.Y)-1]), High: max(t.Y[0], t.Y[len(t.Y)-1])}
		r.Value = &logic.Var{Name: b.name(id, "reading"), What: t.What + " in steps of " + t.Unit, Kind: logic.Int, Range: logic.Range{Lo: r.Low, Hi: r.High}, Start: r.Low}
		b.add(&logic.Define{Var: r.Value, As: logic.Lookup(t, logic.Use(p.Value))})
		p.reading = &r
	}
	return *p.reading
}
