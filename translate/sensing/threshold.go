package sensing

import (
	"fmt"
	"math"
)

// Side says which comparison a threshold is for.
type Side int

const (
	AtOrAbove Side = iota + 1 // true where the temperature is at the threshold or above
	AtOrBelow                 // true where it is at the threshold or below
)

// Round says how a threshold is brought to a count, in terms of the real
// temperature at which the program will switch.
type Round int

const (
	Nearest Round = iota + 1
	Down          // the real temperature is never above the one asked for
	Up            // … never below
)

func (r Round) String() string {
	return map[Round]string{Nearest: "to the nearest edge of a count", Down: "down", Up: "up"}[r]
}

// Threshold is a comparison in counts that stands for one in degrees.
type Threshold struct {
	Asked      float64 // degC
	Counts     int64   // compared with
	AtLeast    bool    // true: count ≥ Counts; false: count ≤ Counts
	SwitchesAt float64 // degC at which the comparison really changes
	CountWidth float64 // K a count there
	Working    string

	edge int64 // the comparison changes where the coordinate reaches this
	side Side
	ch   *Chain
}

// Compare is the comparison of the raw count with Counts: ">=" or "<=".
func (h Threshold) Compare() string {
	if h.AtLeast {
		return ">="
	}
	return "<="
}

// Threshold brings a temperature in degC to counts. The error is a RangeError
// where t is outside the believable range; another one says that the count
// would be outside the believable counts.
func (c *Chain) Threshold(t float64, side Side, round Round) (Threshold, error) {
	if !(t > c.low && t < c.high) {
		return Threshold{}, RangeError{c.Sensor.ID.V, fmt.Sprintf("%.6g degC", t), c.low, c.high, "degC"}
	}
	x := c.coordinate(t)
	below, above := math.Floor(x), math.Ceil(x)
	if r := math.Round(x); math.Abs(x-r) < 1e-7 {
		below, above = r, r
	}
	if !c.Rising() {
		below, above = above, below // colder first
	}
	var k float64
	switch round {
	case Down:
		k = below
	case Up:
		k = above
	default:
		k = below
		if math.Abs(c.edgeAt(int64(above))-t) < math.Abs(c.edgeAt(int64(below))-t) {
			k = above
		}
	}
	return c.threshold(t, side, int64(k), round)
}

func (c *Chain) threshold(asked float64, side Side, edge int64, round Round) (Threshold, error) {
	lo, hi := c.Believable()
	if edge <= lo || edge > hi {
		return Threshold{}, fmt.Errorf("%.6g degC would be count %d, outside the believable %d to %d", asked, edge, lo, hi)
	}
	h := Threshold{Asked: asked, AtLeast: (side == AtOrAbove) == c.Rising(), CountWidth: c.CountWidth(asked), edge: edge, side: side, ch: c}
	h.Counts = edge
	if !h.AtLeast {
		h.Counts = edge - 1
	}
	h.SwitchesAt = c.edgeAt(edge)
	word := "at least"
	if !h.AtLeast {
		word = "at most"
	}
	h.Working = fmt.Sprintf("%.6g degC is %.3f counts by %s; rounded %s: %s %d, which changes at %.4f degC; one count is %.3g K",
		asked, c.coordinate(asked), c.Curve.Name, round, word, h.Counts, h.SwitchesAt, h.CountWidth)
	return h, nil
}

// moved gives the same threshold a whole number of counts warmer (n > 0) or colder.
func (h Threshold) moved(n int64, why string) (Threshold, error) {
	if !h.ch.Rising() {
		n = -n
	}
	m, err := h.ch.threshold(h.Asked, h.side, h.edge+n, Nearest)
	m.Working = fmt.Sprintf("%s; moved by %d counts, %s: %d, which changes at %.4f degC", h.Working, n, why, m.Counts, m.SwitchesAt)
	return m, err
}

// leastApart is how many counts make and break stay apart at the least, so
// that noise of one count does not make the load chatter.
const leastApart = 2

// Apart moves the upper of two thresholds of one chain warmer, or the lower
// colder where keepUpper is set, until they are no less apart than asked for,
// and at least two counts. The error says that there is no room for it.
func Apart(lower, upper Threshold, keepUpper bool) (Threshold, Threshold, error) {
	asked := upper.Asked - lower.Asked
	if lower.ch == nil || lower.ch != upper.ch || !(asked > 0) {
		return lower, upper, fmt.Errorf("%.6g and %.6g degC are no lower and upper threshold of one sensor", lower.Asked, upper.Asked)
	}
	for {
		apart := upper.edge - lower.edge
		if !lower.ch.Rising() {
			apart = -apart
		}
		if upper.SwitchesAt-lower.SwitchesAt >= asked-1e-6 && apart >= leastApart {
			return lower, upper, nil
		}
		var err error
		if keepUpper {
			lower, err = lower.moved(-1, "so that the differential is not below the one asked for")
		} else {
			upper, err = upper.moved(1, "so that the differential is not below the one asked for")
		}
		if err != nil {
			return lower, upper, err
		}
	}
}
