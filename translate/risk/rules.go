// Package risk holds what an assessor would raise about the replacement of a
// mechanical temperature control, and judges it.
//
// The findings are data: rules.yaml holds one rule for each, with its grade,
// the condition over the sheet and the figures worked out from it, the texts
// and the basis. The judgement of dangers is not data: danger.go and
// barrier.go decide for every danger and every load which hardware is left,
// and hand the rules the result.
//
// A rule is evaluated over a View. Anything that the sheet does not say is
// "unknown" or NaN there and never counts as good.
package risk

import (
	_ "embed"
	"fmt"
	"slices"
	"sync"

	"makebreak/survey"
)

// Grade says what a finding does to the pack.
type Grade string

const (
	Stop Grade = "stop" // the program is withheld until the design changes; no answer lifts it
	Act  Grade = "act"  // needs an answer
	Note Grade = "note" // to be read
)

// rank orders grades, the worst first.
func (g Grade) rank() int { return slices.Index([]Grade{Stop, Act, Note}, g) }

// Rule is one finding that may be raised about each thing of a kind.
type Rule struct {
	ID       string
	Grade    Grade    // where none of the three below holds
	Each     string   // equipment danger load control sensor output signal timer path guard place
	Basis    string   // standard or common practice
	Status   string   // sure, second-hand, from memory, common practice
	WaitsFor []string // figures that it needs
	Site     bool     // comes from a site's own file

	when                              *expression
	stopWhen, actWhen, noteWhen       *expression // the first that holds decides the grade
	was, becomes, consequence, needed *template
	figure                            *template // the figure that an answer is about
}

// Rules is a list of rules in the order in which their findings are listed.
type Rules struct {
	list []*Rule
	byID map[string]*Rule
}

//go:embed rules.yaml
var builtin []byte

var load = sync.OnceValues(func() (*Rules, error) {
	rules, ds := (&Rules{byID: map[string]*Rule{}}).merge(builtin, "rules.yaml", false)
	if ds.HasErrors() {
		d := ds[0]
		return nil, fmt.Errorf("%s:%d:%d: %s: %s", d.File, d.Line, d.Col, d.Path, d.Summary)
	}
	return rules, nil
})

// Builtin gives the rules that come with the program. An error means that the
// program was built from broken data.
func Builtin() (*Rules, error) { return load() }

// Merge adds a site's own rules. It can add, never redefine or lower one: an
// id that is known already is an error. The receiver is left as it is; where
// the diagnostics hold errors, the result has only the sound rules.
func (r *Rules) Merge(site []byte, filename string) (*Rules, survey.Diagnostics) {
	return r.merge(site, filename, true)
}

func (r *Rules) merge(data []byte, filename string, site bool) (*Rules, survey.Diagnostics) {
	merged := &Rules{list: slices.Clone(r.list), byID: map[string]*Rule{}}
	for _, rule := range r.list {
		merged.byID[rule.ID] = rule
	}
	reader := &ruleReader{file: filename, source: runeLines(data), known: merged.byID}
	for _, rule := range reader.read(data) {
		rule.Site = site
		merged.list = append(merged.list, rule)
		merged.byID[rule.ID] = rule
	}
	return merged, reader.diagnostics
}

// All lists the rules in order.
func (r *Rules) All() []*Rule { return slices.Clone(r.list) }

// Rule finds a rule by its id.
func (r *Rules) Rule(id string) (*Rule, bool) {
	rule, ok := r.byID[id]
	return rule, ok
}
