package sensing

import (
	"errors"
	"fmt"
	"math"
)

// Fitted is a conversion table with what was proved about it.
type Fitted struct {
	Table
	Unit    float64 // of the values, K (V or A where the sensor is no thermometer)
	Bound   float64 // asked for, in the same unit as Worst
	Worst   float64 // largest error over every count of the range
	WorstAt int64   // count where it is
	Low     int64   // first and last count of the range
	High    int64
	// AtLeast is the number of pieces below which no table of this kind keeps
	// the bound; Fewest says that this table has no more than that.
	AtLeast int
	Fewest  bool
	Equal   EqualSpacing
	Working string
}

// Fit makes the table of a chain over its believable counts: the fewest
// straight pieces whose error stays within bound, in K, at every count. The
// exact value of a count is the temperature in its middle. unit is the size
// of one step of the values, such as 0.01 K.
func (c *Chain) Fit(bound, unit float64) (Fitted, error) {
	low, high := c.Believable()
	return c.fit(low, high, bound, unit)
}

// FitBetween makes the table as Fit does, over the believable counts between
// two temperatures in degC only. Beyond them it stays at the value of its end,
// so that it says no more than "at least" or "at most" there.
func (c *Chain) FitBetween(from, to, bound, unit float64) (Fitted, error) {
	low, high := c.Believable()
	a, errA := c.Count(math.Max(from, c.low))
	b, errB := c.Count(math.Min(to, c.high))
	if err := errors.Join(errA, errB); err != nil {
		return Fitted{}, err
	}
	return c.fit(max(low, min(a, b)), min(high, max(a, b)), bound, unit)
}

func (c *Chain) fit(low, high int64, bound, unit float64) (Fitted, error) {
	if c.Signed() {
		return Fitted{}, fmt.Errorf("a sensor with signed counts needs no table: it is linear")
	}
	f, err := FitTable(low, c.middles(low, high), bound, unit)
	if err != nil {
		return f, err
	}
	f.Working = fmt.Sprintf("%s, counts %d to %d: %s", c.Curve.Name, low, high, f.Working)
	return f, nil
}

// FitTable makes a table for the exact values want[i] at count low+i, which
// must rise or fall throughout.
//
// "Fewest" is meant among tables with knots on counts of the range, values in
// whole units, and the arithmetic of Table.
func FitTable(low int64, want []float64, bound, unit float64) (Fitted, error) {
	f := Fitted{Unit: unit, Bound: bound, Low: low, High: low + int64(len(want)) - 1}
	if len(want) < 2 || low < 0 || f.High > math.MaxUint16 {
		return f, fmt.Errorf("counts %d to %d are no range for a table", low, f.High)
	}
	g, err := newGates(want, bound, unit)
	if err != nil {
		return f, err
	}
	knots, atLeast := g.fewest()
	if knots == nil {
		return f, fmt.Errorf("no table in whole steps of %g keeps within %g", unit, bound)
	}
	knots = tightened(knots, want, bound, unit)
	for _, k := range knots {
		f.X = append(f.X, uint16(low+int64(k.x)))
		f.Y = append(f.Y, int16(g.sign*k.y))
	}
	f.AtLeast, f.Fewest = atLeast, f.Pieces() == atLeast
	if err := f.prove(want); err != nil {
		return f, err
	}
	f.Equal = equalSpacing(want, bound, unit)
	f.Working = f.text()
	return f, nil
}

// tightenings is how often the bound of a table is halved or given back while
// the number of pieces stays the same.
const tightenings = 5

// tightened looks for a table with as many pieces and a smaller error.
func tightened(knots []knot, want []float64, bound, unit float64) []knot {
	low, high := 0.0, bound
	for range tightenings {
		middle := (low + high) / 2
		g, err := newGates(want, middle, unit)
		if err == nil {
			if better := g.with(len(knots) - 1); better != nil {
				knots, high = better, middle
				continue
			}
		}
		low = middle
	}
	return knots
}

// prove goes through every count.
func (f *Fitted) prove(want []float64) error {
	if err := f.Fits32(); err != nil {
		return err
	}
	var monotone bool
	f.Worst, f.WorstAt, monotone = f.Against(f.Low, want, f.Unit)
	switch {
	case !monotone:
		return fmt.Errorf("the table turns back")
	case f.Worst > f.Bound+2e-9*f.Unit:
		return fmt.Errorf("count %d is %g from the curve, more than %g", f.WorstAt, f.Worst, f.Bound)
	}
	return nil
}

func (f *Fitted) text() string {
	why := fmt.Sprintf("at least %d are needed", f.AtLeast)
	if f.Fewest {
		why = "proved to be the fewest"
	}
	equal := "equal spacing does not keep the bound"
	if f.Equal.Found {
		equal = fmt.Sprintf("equal spacing needs %s, %d bytes, worst %.3g K", pieces(f.Equal.Pieces), f.Equal.Bytes, f.Equal.Worst)
	}
	return fmt.Sprintf("%s (%s), %d bytes, worst error %.3g K at count %d of %.3g K allowed, in steps of %g K; %s",
		pieces(f.Pieces()), why, f.Bytes(), f.Worst, f.WorstAt, f.Bound, f.Unit, equal)
}

func pieces(n int) string {
	if n == 1 {
		return "1 piece"
	}
	return fmt.Sprintf("%d pieces", n)
}

// gates are the whole values allowed at each count, as a rising curve; sign is
// −1 where the curve falls, and the values are then turned over. Cutting off
// towards zero is a floor for a rising table and its mirror for a falling one,
// so that a piece is good where its straight line L keeps
// lowest ≤ L < highest + 1 at every count.
type gates struct {
	lowest, highest []int64
	sign            int64
}

func newGates(want []float64, bound, unit float64) (*gates, error) {
	if !(bound > 0) || !(unit > 0) || math.IsInf(bound, 0) || math.IsInf(unit, 0) {
		return nil, fmt.Errorf("bound %g and unit %g must be more than nothing", bound, unit)
	}
	g := &gates{sign: 1}
	if want[len(want)-1] < want[0] {
		g.sign = -1
	}
	g.lowest, g.highest = make([]int64, len(want)), make([]int64, len(want))
	last := math.Inf(-1)
	for i, w := range want {
		w *= float64(g.sign)
		if !(w > last) {
			return nil, fmt.Errorf("the curve does not go one way at value %d", i)
		}
		last = w
		lo, hi := math.Ceil((w-bound)/unit-1e-9), math.Floor((w+bound)/unit+1e-9)
		if lo > hi {
			return nil, fmt.Errorf("no whole step of %g lies within %g of %g: a finer unit or a wider bound", unit, bound, w)
		}
		if lo < -math.MaxInt16 || hi > math.MaxInt16 {
			return nil, fmt.Errorf("%g in steps of %g does not fit 16 bits: a coarser unit", float64(g.sign)*w, unit)
		}
		g.lowest[i], g.highest[i] = int64(lo), int64(hi)
	}
	return g, nil
}
