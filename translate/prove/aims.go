package prove

import (
	"fmt"

	"makebreak/translate/logic"
)

// setGoals lists all that is wanted of the program.
func (s *search) setGoals() {
	verdict := map[*logic.Var]*logic.Property{}
	for i, v := range s.verdicts {
		verdict[v] = s.c.Never[i]
	}
	slots := map[*logic.Var]int{}
	for i, v := range s.c.State {
		slots[v] = i
	}
	for _, c := range s.choices {
		switch p := verdict[c.part.writes]; {
		case c.part.expr == nil:
		case p != nil:
			s.broken[c] = p
			c.open = []*goal{{Goal: Goal{Kind: OutcomeGoal, Text: p.Name + " broken"}, soft: true, choice: c, atom: outcome, value: true}}
		case c.block < s.own:
			c.open = goalsOf(c, s.ready.Ranges, slots)
		}
		s.goals = append(s.goals, c.open...)
	}
	for i, b := range s.ready.Order[:s.own] {
		s.watchBlock(b, slots)
		s.changesOf(i, b)
	}
	for _, m := range tableMutants(s.ready.Program) {
		s.change(m.What, m.Program)
	}
	s.watchSurvivors(slots)
	s.startValues()
	for _, gs := range [][]*goal{s.watch, s.changes, s.starts} {
		s.goals = append(s.goals, gs...)
	}
}

func (s *search) see(g Goal, seen func() bool) *goal {
	w := &goal{Goal: g, seen: seen}
	s.watch = append(s.watch, w)
	return w
}

func (s *search) watchBlock(b logic.Block, slots map[*logic.Var]int) {
	switch b := b.(type) {
	case *logic.Set:
		i := slots[b.Var]
		s.see(Goal{Kind: ChangeGoal, Text: "change of " + b.Var.Name}, func() bool { return s.probed.after[i] != s.probed.before[i] })
	case *logic.Timer:
		s.watchTimer(b.Var, b.Limit, slots)
	case *logic.Machine:
		s.watchMachine(b, slots[b.Var])
		if b.Timer != nil {
			s.watchTimer(b.Timer, b.Limit, slots)
		}
	}
}

func (s *search) watchTimer(v *logic.Var, limit *logic.Const, slots map[*logic.Var]int) {
	i, l := slots[v], limit.Value
	s.see(Goal{Kind: TimerGoal, Text: fmt.Sprintf("%s reaches %s (%d)", v.Name, limit.Name, l)},
		func() bool { return s.probed.after[i] == l })
	s.see(Goal{Kind: TimerGoal, Text: fmt.Sprintf("%s stays at %s (%d)", v.Name, limit.Name, l)},
		func() bool { return s.probed.after[i] == l && s.probed.before[i] == l })
}

func (s *search) watchMachine(m *logic.Machine, i int) {
	words := m.Var.Enum.Words
	for n, w := range words {
		s.see(Goal{Kind: StateGoal, Machine: m.Var.Name, To: w.Name, Text: m.Var.Name + " is " + w.Name},
			func() bool { return s.probed.after[i] == int64(n) })
	}
	for _, st := range m.At {
		for _, t := range st.Goes {
			if t.When != nil {
				continue
			}
			way := &transition{machine: m, from: st.Is, way: t}
			from, to := int64(st.Is), int64(t.To)
			s.see(Goal{Kind: TransitionGoal, Machine: m.Var.Name, From: words[from].Name, To: words[to].Name, Text: fmt.Sprintf("%s (%s)", way, t.Why)},
				func() bool { return s.probed.before[i] == from && s.probed.after[i] == to })
		}
	}
}

// watchSurvivors wants a start from each value that can be remembered: both
// ends of a number, every other value.
func (s *search) watchSurvivors(slots map[*logic.Var]int) {
	for _, v := range s.c.Survivors() {
		i := slots[v]
		values := []int64{v.Range.Lo, v.Range.Hi}
		if v.Kind != logic.Int {
			values = nil
			for n := v.Range.Lo; n <= v.Range.Hi; n++ {
				values = append(values, n)
			}
		}
		for _, n := range values {
			g := s.see(Goal{Kind: StartGoal, Text: fmt.Sprintf("%s starts as remembered: %s", v.Name, named(v, n))},
				func() bool { return s.probed.after[i] == n })
			g.then = func() { g.root = s.rememberedRoot() }
		}
	}
}

func named(v *logic.Var, n int64) string {
	if v.Kind == logic.Word {
		return v.Enum.Words[n].Name
	}
	return fmt.Sprint(n)
}

// startValues wants every start value to show.
func (s *search) startValues() {
	for i, v := range s.c.State {
		for _, d := range []int64{-1, 1} {
			if v.Range.Holds(v.Start + d) {
				g := &goal{slot: i, wrong: v.Start + d}
				g.Kind, g.Text = StartGoal, fmt.Sprintf("%s starts at %s, not %s", v.Name, named(v, v.Start), named(v, v.Start+d))
				s.starts = append(s.starts, g)
			}
		}
	}
}

func (s *search) change(what string, p *logic.Program) {
	g := &goal{change: p}
	g.Kind, g.Text = ChangeGoal, what
	s.changes = append(s.changes, g)
}

// changesOf wants every number that is worked with to show, and every action
// of a transition. Numbers that are only compared with have goals of their own.
func (s *search) changesOf(i int, b logic.Block) {
	for n, p := range parts(b) {
		at := 0
		var visit func(e *logic.Expr, worked, divides bool)
		visit = func(e *logic.Expr, worked, divides bool) {
			here := at
			at++
			if _, number := isConst(e); worked && !(number && here == 0) {
				s.changeNode(i, n, here, p, e, divides)
			}
			for k, a := range e.Args {
				visit(a, works(e, k, worked), divisor(e, k))
			}
		}
		visit(p.expr, !p.choice, false)
	}
	m, ok := b.(*logic.Machine)
	if !ok {
		return
	}
	for _, st := range m.At {
		for k, t := range st.Goes {
			for n, a := range t.Do {
				way := &transition{machine: m, from: st.Is, way: t}
				s.change(fmt.Sprintf("%s: change of %s", way, a.Var.Name), withBlock(s.ready.Program, i, withoutAction(m, st.Is, k, n)))
			}
		}
	}
}

// works reports whether the k-th operand of a node is worked with, rather than
// decided on.
func works(e *logic.Expr, k int, worked bool) bool {
	switch {
	case e.Op == logic.OpSelect && k == 0:
		return false
	case e.Op.IsCompare():
		_, number := isConst(e.Args[k])
		return e.Args[k].Kind == logic.Int && !number && !reads(e.Args[k])
	}
	return worked
}

func (s *search) changeNode(i, n, at int, p part, e *logic.Expr, divides bool) {
	cs := changes(e, divides)
	if e.Op == logic.OpConst {
		for _, d := range []int64{-1, 1} {
			if v := e.Const.Value + d; v != 0 || !divides {
				cs = append(cs, change{fmt.Sprintf("%s%+d", e.Const.Name, d), logic.Lit(v)})
			}
		}
	}
	for _, c := range cs {
		block := replaced(s.ready.Order[i], n, func(whole *logic.Expr) *logic.Expr {
			return edited(whole, at, func(*logic.Expr) *logic.Expr { return c.to })
		})
		s.change(fmt.Sprintf("%s: not %s", p.where, c.what), withBlock(s.ready.Program, i, block))
	}
}
