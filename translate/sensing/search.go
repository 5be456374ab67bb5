package sensing

import (
	"math"
	"math/bits"
	"slices"
)

// fewest looks for the table with the fewest pieces. It tries as many pieces
// as there must be at least, then one more, and so on. atLeast is the number
// below which there is no table: a number of pieces that was searched in full
// without success is ruled out.
func (g *gates) fewest() (knots []knot, atLeast int) {
	last := len(g.lowest) - 1
	s, before := newSearch(g), g.before()
	atLeast = len(before) - 1
	for n := atLeast; n <= last; n++ {
		knots, complete := s.in(n, before)
		if knots != nil {
			return knots, atLeast
		}
		if complete && atLeast == n {
			atLeast++
		}
	}
	return nil, atLeast
}

// with looks for a table of n pieces, nil where none is found.
func (g *gates) with(n int) []knot {
	before := g.before()
	if len(before)-1 > n {
		return nil
	}
	knots, _ := newSearch(g).in(n, before)
	return knots
}

// Limits of the search for one number of pieces. Within the first it looks at
// every knot; beyond, it follows an even choice of them, which can cost a
// piece or a proof, never the bound.
const (
	fullSearch  = 12_000_000 // steps from count to count
	thinnedList = 192        // knots followed from each number of pieces
	widestGate  = 64         // values tried at one count
)

type knot struct {
	x int   // count, from the first of the range
	y int64 // value in units, as a rising curve
}

// search goes from all knots that n pieces reach to all that n + 1 reach.
type search struct {
	*gates
	width int      // values at a count, at most
	every bool     // every allowed value is tried
	seen  []uint64 // by count: values already reached
	prior []int32  // by knot: the knot before it
	next  []int32  // knots reached with one piece more
	steps int
}

func newSearch(g *gates) *search {
	s := &search{gates: g}
	for i := range g.lowest {
		s.width = max(s.width, int(g.highest[i]-g.lowest[i])+1)
	}
	s.every = s.width <= widestGate
	s.width = min(s.width, widestGate)
	s.seen = make([]uint64, len(g.lowest))
	s.prior = make([]int32, len(g.lowest)*s.width)
	return s
}

// in looks for a table of n pieces. A knot after k of them is of use only from
// before[n−k] on. complete says that no knot was left out.
func (s *search) in(n int, before []int) (knots []knot, complete bool) {
	clear(s.seen)
	s.steps = 0
	complete = s.every
	from := s.start()
	for k := 1; k <= n; k++ {
		useful := 0
		if rest := n - k; rest < len(before) {
			useful = before[rest]
		}
		s.next = s.next[:0]
		if most := s.affordable(n); len(from) > most {
			from, complete = thin(from, most), false
		}
		for _, a := range from {
			if end, ok := s.walk(a, useful); ok {
				return s.path(end), complete
			}
		}
		from = slices.Clone(s.next)
	}
	return nil, complete
}

// affordable is how many knots may be followed, pieces being about 1/n of the
// range long.
func (s *search) affordable(n int) int {
	return max(thinnedList, (fullSearch-s.steps)*n/len(s.lowest))
}

// thin makes an even choice of knots, the last one included.
func thin(from []int32, most int) []int32 {
	slices.Sort(from)
	kept := make([]int32, most)
	for i := range kept {
		kept[i] = from[(i+1)*len(from)/most-1]
	}
	return kept
}

// values at a count: how many are tried, and how far apart first and last are.
func (s *search) values(x int) (n, spread int64) {
	spread = s.highest[x] - s.lowest[x]
	return min(spread+1, int64(s.width)), spread
}

func (s *search) y(x int, j int64) int64 {
	n, spread := s.values(x)
	if n == spread+1 {
		return s.lowest[x] + j
	}
	return s.lowest[x] + j*spread/(n-1)
}

func (s *search) knot(k int32) knot {
	x := int(k) / s.width
	return knot{x, s.y(x, int64(int(k)%s.width))}
}

func (s *search) start() []int32 {
	n, _ := s.values(0)
	from := make([]int32, n)
	for j := range from {
		from[j] = int32(j)
		s.prior[j] = -1
	}
	s.seen[0] = math.MaxUint64
	return from
}

// walk follows every straight piece that begins at a knot, and notes the knots
// from count useful on where it may end. It reports the last count when it
// gets there.
//
// The slopes that pass all gates so far are an/ad ≤ slope < bn/bd, kept as
// whole fractions so that nothing is rounded.
func (s *search) walk(k int32, useful int) (end int32, ok bool) {
	a := s.knot(k)
	an, ad, bn, bd := int64(0), int64(1), int64(math.MaxInt32), int64(1)
	last := len(s.lowest) - 1
	for x := a.x + 1; x <= last; x++ {
		dx := int64(x - a.x)
		if x >= useful {
			if e, found := s.mark(k, a, x, span{an, ad, bn, bd}); found && x == last {
				return e, true
			}
		}
		lo, hi := s.lowest[x]-a.y, s.highest[x]+1-a.y
		if lo*ad > an*dx {
			an, ad = lo, dx
		}
		if hi*bd < bn*dx {
			bn, bd = hi, dx
		}
		if an*bd >= bn*ad {
			s.steps += int(dx)
			return 0, false
		}
	}
	s.steps += last - a.x
	return 0, false
}

// span is a range of slopes, an/ad ≤ slope < bn/bd.
type span struct{ an, ad, bn, bd int64 }

// mark notes the values at count x on which a piece from a may end.
func (s *search) mark(k int32, a knot, x int, p span) (end int32, found bool) {
	n, spread := s.values(x)
	open := ^s.seen[x] & (1<<(n-1)<<1 - 1)
	if open == 0 {
		return 0, false
	}
	// A quotient of whole numbers below 2^53 is exact where it comes out even.
	dx := int64(x - a.x)
	lowest := a.y + int64(math.Ceil(float64(p.an*dx)/float64(p.ad)))
	highest := a.y + min(int64(math.Ceil(float64(p.bn*dx)/float64(p.bd)))-1, math.MaxInt32/dx)
	lowest, highest = max(lowest, s.lowest[x]), min(highest, s.highest[x])
	if lowest > highest {
		return 0, false
	}
	if n == spread+1 {
		open &= (1<<(highest-s.lowest[x])<<1 - 1) &^ (1<<(lowest-s.lowest[x]) - 1)
	}
	for ; open != 0; open &= open - 1 {
		j := bits.TrailingZeros64(open)
		if y := s.y(x, int64(j)); y < lowest || y > highest {
			continue
		}
		s.seen[x] |= 1 << j
		end, found = int32(x*s.width+j), true
		s.prior[end] = k
		s.next = append(s.next, end)
	}
	return end, found
}

// path is the way to a knot from the first count.
func (s *search) path(end int32) []knot {
	var ks []knot
	for k := end; k >= 0; k = s.prior[k] {
		ks = append(ks, s.knot(k))
	}
	slices.Reverse(ks)
	return ks
}
