package sensing

// stops gives the gates where straight lines end that pass through all gates,
// each from the gate where the last one ended, where lines need not join.
// Going as far as possible with each is then best, for a line that passes
// gates passes any run of them; no table can have fewer pieces than these
// lines.
func (g *gates) stops() []int {
	at := []int{0}
	for x, last := 0, len(g.lowest)-1; x < last; {
		x = g.furthest(x)
		at = append(at, x)
	}
	return at
}

// before gives the gates left of which more than 0, 1, 2 … lines are needed to
// get to the last one. There are as many as it takes from the first, and one.
func (g *gates) before() []int {
	at := g.mirrored().stops()
	for i, x := range at {
		at[i] = len(g.lowest) - 1 - x
	}
	return at
}

// mirrored is the same curve seen from the right: still rising.
func (g *gates) mirrored() *gates {
	n := len(g.lowest)
	m := &gates{lowest: make([]int64, n), highest: make([]int64, n), sign: g.sign}
	for i := range n {
		m.lowest[n-1-i], m.highest[n-1-i] = -g.highest[i]-1, -g.lowest[i]-1
	}
	return m
}

// furthest is the last gate that one line from the gate at x can reach. The set
// of lines that pass is kept by its two extreme ones and the convex hulls that
// they turn about (O'Rourke, Communications of the ACM 24, 1981, 574).
func (g *gates) furthest(x int) int {
	upper, lower := &hull{turn: 1}, &hull{turn: -1}
	var steep, flat line // the extreme lines
	for i := x; i < len(g.lowest); i++ {
		top, bottom := point{int64(i), g.highest[i] + 1}, point{int64(i), g.lowest[i]}
		switch i {
		case x:
		case x + 1:
			steep, flat = line{point{int64(x), g.lowest[x]}, top}, line{point{int64(x), g.highest[x] + 1}, bottom}
		default:
			if steep.side(bottom) > 0 || flat.side(top) < 0 {
				return i - 1
			}
			if steep.side(top) < 0 {
				steep = line{lower.touch(top), top}
			}
			if flat.side(bottom) > 0 {
				flat = line{upper.touch(bottom), bottom}
			}
		}
		upper.add(top)
		lower.add(bottom)
	}
	return len(g.lowest) - 1
}

type point struct{ x, y int64 }

type line struct{ from, to point }

// side is positive for a point above the line, negative below.
func (l line) side(p point) int64 {
	return (p.y-l.from.y)*(l.to.x-l.from.x) - (l.to.y-l.from.y)*(p.x-l.from.x)
}

// hull is a chain of points that bulges down (turn 1) or up (turn −1), from
// the point that the extreme line last turned about.
type hull struct {
	turn  int64
	chain []point
}

func (h *hull) add(p point) {
	n := len(h.chain)
	for n >= 2 && h.turn*(line{h.chain[n-2], h.chain[n-1]}).side(p) <= 0 {
		n--
	}
	h.chain = append(h.chain[:n], p)
}

// touch gives the point of the chain where a line from p to the right touches
// it, and drops the points before it. A chain that bulges up is touched by the
// flattest such line from above, one that bulges down by the steepest from below.
func (h *hull) touch(p point) point {
	i := 0
	for i+1 < len(h.chain) && h.turn*(line{h.chain[i], p}).side(h.chain[i+1]) <= 0 {
		i++
	}
	h.chain = h.chain[i:]
	return h.chain[0]
}
