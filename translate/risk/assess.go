package risk

import (
	"fmt"
	"slices"
	"sort"
	"strings"
)

// Finding is one thing that an assessor would raise about this sheet.
type Finding struct {
	No          int    // from 1, in the order of the list
	ID          string // of the rule
	Grade       Grade
	About       string // what it is about: an id of the sheet, or two with a stroke
	Was         string
	Becomes     string
	Consequence string
	Needed      string
	Basis       string // with its status
	Figure      string // the figure that it is about; empty where there is none

	Answer      string // what the responsible person decided, with role and date
	AnswerStale bool   // the answer was written about another figure
	// AnswerUnbound: the finding is about a figure and the answer does not say
	// which one it was written about.
	AnswerUnbound bool
}

// Open reports whether the finding still asks for something: a stop always
// does, an act until it has an answer that is not stale.
func (f *Finding) Open() bool {
	switch f.Grade {
	case Stop:
		return true
	case Act:
		return f.Answer == "" || f.AnswerStale
	}
	return false
}

// Waiting is a rule that could not be judged because nobody works out a
// figure that it needs.
type Waiting struct {
	ID      string
	Figures []string
}

// NotJudged is a rule that could not be judged about one thing because a
// figure is not determined.
type NotJudged struct {
	ID, About, Figure, Reason string
}

// UnusedAnswer is an answer of the sheet that belongs to no finding.
type UnusedAnswer struct {
	Finding, About string
	Path           string // in the sheet
}

// Assessment is the outcome for one sheet.
type Assessment struct {
	Findings  []Finding // stop first, then act, then note; in the order of the rules within
	Waiting   []Waiting
	NotJudged []NotJudged
	Unused    []UnusedAnswer
}

// Stopped reports whether a stop is open.
func (a *Assessment) Stopped() bool {
	return slices.ContainsFunc(a.Findings, func(f Finding) bool { return f.Grade == Stop })
}

// Assess judges every rule about everything it may be about. The error is one
// of a rule that failed while it ran, with the rule's id.
func (r *Rules) Assess(v *View) (*Assessment, error) {
	run := &assessor{view: v, env: names(v, newLookup(nil)), order: map[string]int{}, out: &Assessment{}}
	for i, rule := range r.list {
		run.order[rule.ID] = i
		if err := run.rule(rule); err != nil {
			return nil, fmt.Errorf("rule %s: %w", rule.ID, err)
		}
	}
	run.sort()
	run.answer()
	return run.out, nil
}

type assessor struct {
	view  *View
	env   map[string]any
	order map[string]int
	out   *Assessment
}

// item is one thing that a rule may be about.
type item struct {
	about string
	thing any
}

func (v *View) items(each string) []item {
	var list []item
	switch each {
	case "equipment":
		return []item{{v.Equipment.ID, v.Equipment}}
	case "danger":
		for _, d := range v.Dangers {
			list = append(list, item{d.ID, d})
		}
	case "load":
		for _, l := range v.Loads {
			list = append(list, item{l.ID, l})
		}
	case "control":
		for _, c := range v.Controls {
			list = append(list, item{c.ID, c})
		}
	case "sensor":
		for _, s := range v.Sensors {
			list = append(list, item{s.ID, s})
		}
	case "output":
		for _, o := range v.Outputs {
			list = append(list, item{o.Load, o})
		}
	case "signal":
		for _, s := range v.Signals {
			list = append(list, item{s.ID, s})
		}
	case "timer":
		for _, t := range v.Timers {
			list = append(list, item{t.ID, t})
		}
	case "path":
		for _, p := range v.Paths {
			list = append(list, item{p.Danger.ID + "/" + p.Load.ID, p})
		}
	case "guard":
		for _, g := range v.Guards {
			list = append(list, item{g.Control.ID + "/" + g.Danger.ID, g})
		}
	case "place":
		for _, p := range v.Places {
			list = append(list, item{p.ID, p})
		}
	}
	return list
}

func (a *assessor) rule(rule *Rule) error {
	missing := map[string]bool{}
	for _, it := range a.view.items(rule.Each) {
		figures := newLookup(a.view.computed.Figures)
		a.env["fig"], a.env["fig_reason"], a.env["has_fig"] = figures.value, figures.reason, figures.has
		if rule.Each != "equipment" {
			a.env[rule.Each] = it.thing
		}
		fired, err := a.one(rule, it)
		if err != nil {
			return err
		}
		for name := range figures.missing {
			missing[name] = true
		}
		if fired {
			continue
		}
		for _, name := range sortedKeys(figures.undetermined) {
			a.out.NotJudged = append(a.out.NotJudged, NotJudged{rule.ID, it.about, name, figures.undetermined[name]})
		}
	}
	if rule.Each != "equipment" {
		delete(a.env, rule.Each)
	}
	if len(missing) > 0 {
		a.out.Waiting = append(a.out.Waiting, Waiting{rule.ID, sortedKeys(missing)})
	}
	return nil
}

// one judges a rule about one thing and says whether it was raised.
func (a *assessor) one(rule *Rule, it item) (bool, error) {
	fires, err := a.holds(rule.when)
	if err != nil || !fires {
		return false, err
	}
	f := Finding{ID: rule.ID, About: it.about, Basis: rule.Basis + " (" + rule.Status + ")"}
	if rule.Basis == rule.Status {
		f.Basis = rule.Basis
	}
	if f.Grade, err = a.grade(rule); err != nil {
		return false, err
	}
	for _, text := range []struct {
		from *template
		into *string
	}{
		{rule.was, &f.Was}, {rule.becomes, &f.Becomes}, {rule.consequence, &f.Consequence}, {rule.needed, &f.Needed}, {rule.figure, &f.Figure},
	} {
		if text.from == nil {
			continue
		}
		if *text.into, err = text.from.fill(a.env); err != nil {
			return false, err
		}
	}
	a.out.Findings = append(a.out.Findings, f)
	return true, nil
}

// grade is that of the first condition that holds, the worst one first.
func (a *assessor) grade(rule *Rule) (Grade, error) {
	for _, c := range []struct {
		when  *expression
		grade Grade
	}{{rule.stopWhen, Stop}, {rule.actWhen, Act}, {rule.noteWhen, Note}} {
		holds, err := a.holds(c.when)
		if err != nil {
			return "", err
		}
		if holds {
			return c.grade, nil
		}
	}
	return rule.Grade, nil
}

func (a *assessor) holds(e *expression) (bool, error) {
	if e == nil {
		return false, nil
	}
	value, err := e.run(a.env)
	if err != nil {
		return false, err
	}
	return value == true, nil
}

func (a *assessor) sort() {
	list := a.out.Findings
	sort.SliceStable(list, func(i, k int) bool {
		x, y := &list[i], &list[k]
		switch {
		case x.Grade != y.Grade:
			return x.Grade.rank() < y.Grade.rank()
		case x.ID != y.ID:
			return a.order[x.ID] < a.order[y.ID]
		}
		return x.About < y.About
	})
	for i := range list {
		list[i].No = i + 1
	}
}

// answer gives every finding its answer and lists the answers that belong to
// none. An answer never changes a grade.
func (a *assessor) answer() {
	for _, ans := range a.view.answers {
		used := ans.finding == paperFinding && slices.Contains(papers, ans.about)
		for i := range a.out.Findings {
			f := &a.out.Findings[i]
			if f.ID != ans.finding || !a.isAbout(f, ans) {
				continue
			}
			used = true
			f.Answer = ans.String()
			f.AnswerStale = ans.figure != "" && ans.figure != f.Figure
			f.AnswerUnbound = ans.figure == "" && f.Figure != ""
		}
		if !used {
			a.out.Unused = append(a.out.Unused, UnusedAnswer{ans.finding, ans.about, ans.path})
		}
	}
}

// isAbout: an answer that names nothing is about the equipment.
func (a *assessor) isAbout(f *Finding, ans answer) bool {
	if ans.about == "" {
		return f.About == a.view.Equipment.ID
	}
	return f.About == ans.about
}

func (a answer) String() string {
	who := strings.Join(slices.DeleteFunc([]string{a.role, a.date}, func(s string) bool { return s == "" }), ", ")
	if who == "" {
		return a.text
	}
	return a.text + " (" + who + ")"
}
