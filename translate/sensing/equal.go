package sensing

import "math"

// EqualSpacing is the plain table for comparison: knots at equal distances,
// each the whole value nearest to the curve, with the same arithmetic and
// within the same bound. It needs no counts in memory, two bytes a knot.
type EqualSpacing struct {
	Pieces int
	Bytes  int
	Worst  float64
	Found  bool // false: no number of pieces keeps the bound
}

// equal is a table of equal pieces over the values want, count 0 the first.
type equal struct {
	want        []float64
	unit, bound float64
	pieces      int
}

// equalSpacing finds the smallest number of equal pieces that keeps the bound.
func equalSpacing(want []float64, bound, unit float64) EqualSpacing {
	e := equal{want, unit, bound, 0}
	last := len(want) - 1
	failed := 0 // the count that failed last is tried first
	for e.pieces = 1; e.pieces <= last; e.pieces++ {
		if _, _, ok := e.piece(e.holding(failed)); !ok {
			continue
		}
		worst := 0.0
		ok := true
		for i := 0; i < e.pieces && ok; i++ {
			var w float64
			if w, failed, ok = e.piece(i); ok {
				worst = math.Max(worst, w)
			}
		}
		if ok {
			return EqualSpacing{Pieces: e.pieces, Bytes: 2 * (e.pieces + 1), Worst: worst, Found: true}
		}
	}
	return EqualSpacing{}
}

func (e equal) knot(i int) int { return i * (len(e.want) - 1) / e.pieces }

// holding is the piece in which a count lies.
func (e equal) holding(count int) int {
	i := count * e.pieces / (len(e.want) - 1)
	for i > 0 && e.knot(i) >= count {
		i--
	}
	for i < e.pieces-1 && e.knot(i+1) < count {
		i++
	}
	return i
}

// piece gives the largest error in a piece, or the count where it is beyond
// the bound.
func (e equal) piece(i int) (worst float64, at int, ok bool) {
	x0, x1 := e.knot(i), e.knot(i+1)
	y0, y1 := math.Round(e.want[x0]/e.unit), math.Round(e.want[x1]/e.unit)
	if math.Abs(y1-y0)*float64(x1-x0) > math.MaxInt32 {
		return 0, x0, false
	}
	for x := x0; x <= x1; x++ {
		v := between(uint16(x0), uint16(x1), int16(y0), int16(y1), uint16(x))
		d := math.Abs(float64(v)*e.unit - e.want[x])
		if d > e.bound*(1+1e-9) {
			return d, x, false
		}
		worst = math.Max(worst, d)
	}
	return worst, 0, true
}
