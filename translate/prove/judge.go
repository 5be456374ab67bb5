package prove

import (
	"slices"

	"makebreak/translate/logic"
)

// judge looks at the step just run: which goals are reached, which are nearer.
func (s *search) judge() {
	starting := s.isStart()
	if s.pattern != s.last {
		for i := range s.hits {
			s.judgeHit(&s.hits[i])
		}
		s.last = s.pattern
	}
	s.judgeAll(&s.watch)
	s.judgeAll(&s.changes)
	if starting {
		s.judgeAll(&s.starts)
	}
	if len(s.c.Never) > 0 && len(s.verdicts) == 0 {
		if p := s.probed.run.Violated(); p != nil {
			s.violate(p)
		}
	}
}

// isStart reports whether the step at hand is the first after a start with
// nothing remembered.
func (s *search) isStart() bool { return s.at.parent == nil && s.at.record == nil && s.held == 1 }

func (s *search) judgeHit(h *hit) {
	open := s.choices[h.n].open
	for i := 0; i < len(open); {
		g := open[i]
		d := s.away(g, h)
		if d > 0 {
			s.nearer(g, d)
			i++
			continue
		}
		s.reach(g)
		open = slices.Delete(open, i, i+1)
		s.choices[h.n].open = open
	}
}

// away is how far a goal of a choice is from being reached in this step.
// Deciding is not enough: the difference must show.
func (s *search) away(g *goal, h *hit) int {
	if g.atom == outcome && h.outcome == g.value {
		return 0
	}
	d := g.distance(h.atoms, h.same, h.next)
	if g.near == neighbour && s.asked(g) != g.wrong {
		d += 2
	}
	switch {
	case d > 0 || g.atom == outcome:
		return d + 1
	case s.due(g) && s.showsFlip(h):
		return 0
	}
	return 1
}

// asked is the state of the machine that the term of a goal asks, as the term
// sees it.
func (s *search) asked(g *goal) int64 {
	if g.choice.atoms[g.atom].Args[0].Op == logic.OpPrev {
		return s.probed.before[g.slot]
	}
	return s.probed.after[g.slot]
}

// due reports whether a goal is to be looked at closely in this step: always at
// first, less and less often while it makes no difference, and always again
// when sequences are put together.
func (s *search) due(g *goal) bool {
	if s.thorough {
		return true
	}
	if g.rest > 0 {
		g.rest--
		return false
	}
	g.checks++
	g.rest = min(g.checks/16, 12)
	return true
}

// showsFlip reports whether the step would have ended otherwise, had the
// decision come out the other way round.
func (s *search) showsFlip(h *hit) bool {
	if !h.asked {
		c := s.choices[h.n]
		if c.flipped == nil {
			c.flipped = c.flip()
		}
		h.asked, h.shown = true, s.differs(c.flipped, s.probed.before)
	}
	return h.shown
}

// differs reports whether another program, or the same from another state,
// ends the step at hand with other outputs or another state.
func (s *search) differs(r *logic.Run, before []int64) bool {
	r.Restore(before)
	r.Step(s.inputs)
	s.buf = r.Snapshot(s.buf)
	n := len(s.c.State)
	if !slices.Equal(s.buf[:n], s.probed.after[:n]) {
		return true
	}
	if !s.read {
		for i, v := range s.c.Outputs {
			s.out[i] = s.probed.run.Get(v)
		}
		s.read = true
	}
	for i, v := range s.c.Outputs {
		if r.Get(v) != s.out[i] {
			return true
		}
	}
	return false
}

// judgeAll looks at goals that are not about a decision.
func (s *search) judgeAll(open *[]*goal) {
	for i := 0; i < len(*open); {
		g := (*open)[i]
		if !s.happened(g) {
			i++
			continue
		}
		*open = slices.Delete(*open, i, i+1)
		s.reach(g)
	}
}

func (s *search) happened(g *goal) bool {
	switch {
	case g.seen != nil:
		return g.seen()
	case g.change != nil:
		return s.showsChange(g)
	}
	wrong := slices.Clone(s.probed.before)
	wrong[g.slot] = g.wrong
	return s.differs(s.plain, wrong)
}

// showsChange runs a changed program beside the step at hand.
func (s *search) showsChange(g *goal) bool {
	if !s.due(g) {
		return false
	}
	if g.changed == nil {
		g.changed = mutantRun(s.ready, g.change)
	}
	return s.differs(g.changed, s.probed.before)
}

// reach notes that a goal has been reached.
func (s *search) reach(g *goal) {
	g.done = true
	g.node = s.here()
	s.found = append(s.found, g)
	s.news = s.spent
	if g.choice != nil {
		if p := s.broken[g.choice]; p != nil {
			s.violate(p)
		}
	}
	if g.then != nil {
		g.then()
	}
}

// mostBest is how many states are kept for a goal.
const mostBest = 8

// nearer keeps the present state for a goal if it is nearer to it than any
// before, or as near and there is room; now and then in place of another.
func (s *search) nearer(g *goal, d int) {
	switch {
	case len(g.best) == 0 || d < g.dist:
		g.dist, g.tried = d, 0
		g.best = append(g.best[:0], s.here())
	case d == g.dist && len(g.best) < mostBest && g.best[len(g.best)-1] != s.at:
		g.best = append(g.best, s.here())
	case d == g.dist && s.random.below(8) == 0:
		g.best[s.random.below(len(g.best))] = s.here()
	}
}

func (s *search) violate(p *logic.Property) {
	for _, v := range s.violated {
		if v.property == p {
			return
		}
	}
	s.violated = append(s.violated, &violation{property: p, at: s.here()})
}
