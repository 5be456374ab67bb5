package sensing

import (
	"fmt"
	"math"
	"sort"
)

// Table turns counts into whole numbers of a unit by straight pieces between
// knots. The arithmetic is that of C with the operands in int32_t and the
// quotient cut off towards zero:
//
//	y0 + (y1 − y0) * (x − x0) / (x1 − x0)
//
// Below the first and above the last knot it stays at that knot's value.
type Table struct {
	X []uint16 // counts of the knots, rising; two or more
	Y []int16  // values of the knots, in units
}

// At gives the value at a count, bit for bit what the C prints.
func (t Table) At(count uint16) int16 {
	n := len(t.X)
	if count <= t.X[0] {
		return t.Y[0]
	}
	if count >= t.X[n-1] {
		return t.Y[n-1]
	}
	i := sort.Search(n, func(i int) bool { return t.X[i] > count })
	return between(t.X[i-1], t.X[i], t.Y[i-1], t.Y[i], count)
}

func between(x0, x1 uint16, y0, y1 int16, x uint16) int16 {
	rise, run := int32(y1)-int32(y0), int32(x1)-int32(x0)
	return int16(int32(y0) + rise*(int32(x)-int32(x0))/run)
}

// Pieces is the number of straight pieces.
func (t Table) Pieces() int { return len(t.X) - 1 }

// Bytes is the size of the knots in memory: two bytes for each count and each value.
func (t Table) Bytes() int { return 4 * len(t.X) }

// Fits32 proves that no intermediate of At leaves int32_t: the largest one of a
// piece is (y1 − y0) times (x1 − x0). It also wants counts that rise.
func (t Table) Fits32() error {
	if len(t.X) < 2 || len(t.X) != len(t.Y) {
		return fmt.Errorf("%d counts and %d values are no table", len(t.X), len(t.Y))
	}
	for i := 1; i < len(t.X); i++ {
		rise, run := int64(t.Y[i])-int64(t.Y[i-1]), int64(t.X[i])-int64(t.X[i-1])
		if run <= 0 {
			return fmt.Errorf("knot %d: count %d does not rise", i, t.X[i])
		}
		if max(rise, -rise)*run > math.MaxInt32 {
			return fmt.Errorf("knot %d: %d × %d does not fit 32 bits", i, rise, run)
		}
	}
	return nil
}

// Against compares the table with the exact values want[i] at count low+i, every
// one of them, and gives the largest difference in the unit of want, with the
// count where it is. unit is the size of one step of Y. monotone is false where
// the table turns back anywhere.
func (t Table) Against(low int64, want []float64, unit float64) (worst float64, at int64, monotone bool) {
	monotone = true
	rising := t.Y[len(t.Y)-1] >= t.Y[0]
	last := t.At(uint16(low))
	for i, w := range want {
		n := low + int64(i)
		v := t.At(uint16(n))
		if d := math.Abs(float64(v)*unit - w); d > worst {
			worst, at = d, n
		}
		if v != last && (v > last) != rising {
			monotone = false
		}
		last = v
	}
	return worst, at, monotone
}
