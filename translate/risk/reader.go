package risk

import (
	"errors"
	"regexp"
	"slices"
	"sort"
	"strings"
	"unicode"

	"go.yaml.in/yaml/v4"

	"makebreak/survey"
)

// Bounds on a file of rules.
const (
	largestRuleFile = 1 << 20
	mostRules       = 1000
)

// ruleReader reads a file of rules and reports everything that is wrong with
// it, each with its place.
type ruleReader struct {
	file        string
	source      [][]rune // lines of the file
	known       map[string]*Rule
	diagnostics survey.Diagnostics
}

// runeLines splits a file for finding places in it.
func runeLines(data []byte) [][]rune {
	var lines [][]rune
	for line := range strings.SplitSeq(string(data), "\n") {
		lines = append(lines, []rune(line))
	}
	return lines
}

func (r *ruleReader) report(line, col int, path, summary, found, fits string) {
	r.diagnostics = append(r.diagnostics, survey.Diagnostic{
		Severity: survey.Error, File: r.file, Line: line, Col: col, Path: path, Summary: summary, Found: found, Fits: fits,
	})
}

func (r *ruleReader) at(n *yaml.Node, path, summary, found, fits string) {
	r.report(n.Line, n.Column, path, summary, found, fits)
}

func (r *ruleReader) read(data []byte) []*Rule {
	if len(data) > largestRuleFile {
		r.report(0, 0, "", "the file of rules is larger than 1 MB", "", "a smaller file")
		return nil
	}
	var doc yaml.Node
	if err := yaml.Load(data, &doc, yaml.WithUniqueKeys()); err != nil {
		r.syntax(err)
		return nil
	}
	root := &doc
	if doc.Kind == yaml.DocumentNode && len(doc.Content) == 1 {
		root = doc.Content[0]
	}
	if root.Kind != yaml.MappingNode {
		r.at(root, "", "a file of rules is a mapping", "", "rules: followed by a list")
		return nil
	}
	var rules []*Rule
	for i := 0; i+1 < len(root.Content); i += 2 {
		key, value := root.Content[i], root.Content[i+1]
		if key.Value != "rules" || value.Kind != yaml.SequenceNode {
			r.at(key, key.Value, "a file of rules has one key", key.Value, "rules: followed by a list")
			continue
		}
		rules = append(rules, r.rules(value)...)
	}
	return rules
}

// syntax reports what the YAML reader found.
func (r *ruleReader) syntax(err error) {
	var one *yaml.LoadError
	var many *yaml.LoadErrors
	switch {
	case errors.As(err, &many):
		for _, e := range many.Errors {
			r.report(e.Mark.Line, e.Mark.Column, "", e.Message, "", "")
		}
	case errors.As(err, &one):
		r.report(one.Mark.Line, one.Mark.Column, "", one.Message, "", "")
	default:
		r.report(0, 0, "", err.Error(), "", "")
	}
}

func (r *ruleReader) rules(list *yaml.Node) []*Rule {
	if len(list.Content) > mostRules {
		r.at(list, "rules", "too many rules", "", "at most 1000")
		return nil
	}
	var rules []*Rule
	seen := map[string]bool{}
	for i, node := range list.Content {
		path := "rules[" + number(float64(i), 0) + "]"
		rule := r.rule(node, path)
		if rule == nil {
			continue
		}
		if r.known[rule.ID] != nil || seen[rule.ID] {
			r.at(node, path+".id", "there is a rule of this name already", rule.ID,
				"another id: rules are added, never redefined or lowered")
			continue
		}
		seen[rule.ID] = true
		rules = append(rules, rule)
	}
	return rules
}

// ruleKeys are the keys of a rule; those that are true must be there.
var ruleKeys = map[string]bool{
	"id": true, "grade": true, "each": true, "when": true,
	"stop_when": false, "act_when": false, "note_when": false,
	"was": true, "becomes": true, "consequence": true, "needed": true,
	"basis": true, "status": true, "waits_for": false, "figure": false,
}

func (r *ruleReader) rule(node *yaml.Node, path string) *Rule {
	if node.Kind != yaml.MappingNode {
		r.at(node, path, "a rule is a mapping of keys", "", "id, grade, each, when, …")
		return nil
	}
	before := len(r.diagnostics)
	keys := r.keys(node, path)
	for _, key := range sortedKeys(ruleKeys) {
		if ruleKeys[key] && keys[key] == nil {
			r.at(node, path+"."+key, "a key is missing", "", key+": …")
		}
	}
	if len(r.diagnostics) > before {
		return nil
	}
	rule := r.words(keys, path)
	if len(r.diagnostics) > before {
		return nil
	}
	r.expressions(rule, keys, path)
	r.waits(rule, keys, path)
	if len(r.diagnostics) > before {
		return nil
	}
	return rule
}

// keys finds the values of a rule by key and reports the keys that no rule has
// and those that stand there twice.
func (r *ruleReader) keys(node *yaml.Node, path string) map[string]*yaml.Node {
	keys := map[string]*yaml.Node{}
	for i := 0; i+1 < len(node.Content); i += 2 {
		key, value := node.Content[i], node.Content[i+1]
		if _, ok := ruleKeys[key.Value]; !ok {
			r.at(key, path, "no key of a rule", key.Value, strings.Join(sortedKeys(ruleKeys), ", "))
			continue
		}
		if keys[key.Value] != nil {
			r.at(key, path+"."+key.Value, "the key stands there twice", key.Value, "once")
			continue
		}
		if key.Value != "waits_for" && value.Kind != yaml.ScalarNode {
			r.at(value, path+"."+key.Value, "must be a text", "", key.Value+": a text")
			continue
		}
		keys[key.Value] = value
	}
	return keys
}

func sortedKeys[V any](m map[string]V) []string {
	keys := make([]string, 0, len(m))
	for k := range m {
		keys = append(keys, k)
	}
	sort.Strings(keys)
	return keys
}

// words reads the keys of a rule that are plain words.
func (r *ruleReader) words(keys map[string]*yaml.Node, path string) *Rule {
	word := func(key string, allowed []string) string {
		n := keys[key]
		if !slices.Contains(allowed, n.Value) {
			r.at(n, path+"."+key, "not a word that fits here", n.Value, strings.Join(allowed, ", "))
		}
		return n.Value
	}
	rule := &Rule{
		ID: keys["id"].Value, Basis: keys["basis"].Value,
		Grade:  Grade(word("grade", []string{"stop", "act", "note"})),
		Each:   word("each", sortedKeys(things())),
		Status: word("status", []string{"sure", "second-hand", "from memory", "common practice"}),
	}
	if !identifier.MatchString(rule.ID) {
		r.at(keys["id"], path+".id", "not a name", rule.ID, "small letters, digits and _, at most 40")
	}
	return rule
}

var identifier = regexp.MustCompile(`^[a-z][a-z0-9_]{0,39}$`)

func (r *ruleReader) expressions(rule *Rule, keys map[string]*yaml.Node, path string) {
	for key, into := range map[string]**expression{
		"when": &rule.when, "stop_when": &rule.stopWhen, "act_when": &rule.actWhen, "note_when": &rule.noteWhen,
	} {
		if n := keys[key]; n != nil {
			e, f := compile(n.Value, rule.Each, aCondition)
			r.faultAt(n, path+"."+key, f)
			*into = e
		}
	}
	for key, into := range map[string]**template{
		"was": &rule.was, "becomes": &rule.becomes, "consequence": &rule.consequence, "needed": &rule.needed, "figure": &rule.figure,
	} {
		if n := keys[key]; n != nil {
			t, f := compileTemplate(n.Value, rule.Each)
			r.faultAt(n, path+"."+key, f)
			*into = t
		}
	}
	slices.SortStableFunc(r.diagnostics, func(a, b survey.Diagnostic) int {
		if a.Line != b.Line {
			return a.Line - b.Line
		}
		return a.Col - b.Col
	})
}

// waits reads waits_for and checks that it names the figures that the rule
// asks for.
func (r *ruleReader) waits(rule *Rule, keys map[string]*yaml.Node, path string) {
	n := keys["waits_for"]
	if n != nil {
		switch n.Kind {
		case yaml.ScalarNode:
			rule.WaitsFor = []string{n.Value}
		case yaml.SequenceNode:
			for _, c := range n.Content {
				rule.WaitsFor = append(rule.WaitsFor, c.Value)
			}
		default:
			r.at(n, path+".waits_for", "must be a name or a list of names", "", "waits_for: count_width")
		}
	}
	for _, name := range rule.asks() {
		if !slices.Contains(rule.WaitsFor, name) {
			place := keys["when"]
			r.at(place, path, "the rule asks for a figure that waits_for does not name", name, "waits_for: "+name)
		}
	}
}

// asks lists the figures that the rule's expressions ask for.
func (rule *Rule) asks() []string {
	var asked []string
	for _, e := range []*expression{rule.when, rule.stopWhen, rule.actWhen, rule.noteWhen} {
		if e != nil {
			for _, n := range e.figures {
				asked = addOnce(asked, n)
			}
		}
	}
	for _, t := range []*template{rule.was, rule.becomes, rule.consequence, rule.needed, rule.figure} {
		if t != nil {
			for _, n := range t.figures() {
				asked = addOnce(asked, n)
			}
		}
	}
	return asked
}

// faultAt reports a fault of an expression at its place in the file.
func (r *ruleReader) faultAt(n *yaml.Node, path string, f *fault) {
	if f == nil {
		return
	}
	line, col := r.place(n, f.offset)
	r.report(line, col, path, f.message, n.Value, "")
}

// place finds the rune of a text in the file, whichever way YAML lets it be
// written: it counts what is not white space from where the text begins.
func (r *ruleReader) place(n *yaml.Node, offset int) (line, col int) {
	line, col = n.Line, n.Column
	switch n.Style {
	case yaml.LiteralStyle, yaml.FoldedStyle:
		line, col = line+1, 1
	case yaml.SingleQuotedStyle, yaml.DoubleQuotedStyle:
		col++
	}
	left := 0
	for _, c := range firstRunes(n.Value, offset) {
		if !unicode.IsSpace(c) {
			left++
		}
	}
	for ; line <= len(r.source); line, col = line+1, 1 {
		for text := r.source[line-1]; col <= len(text); col++ {
			if unicode.IsSpace(text[col-1]) {
				continue
			}
			if left == 0 {
				return line, col
			}
			left--
		}
	}
	return n.Line, n.Column
}

func firstRunes(text string, n int) []rune {
	runes := []rune(text)
	return runes[:min(n, len(runes))]
}
