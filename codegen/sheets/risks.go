package sheets

import (
	"fmt"
	"strings"

	"makebreak/translate/risk"
)

// RiskColumns are the columns of risks.csv.
var RiskColumns = []string{"no", "finding", "grade", "about", "was", "becomes", "consequence", "needed", "basis", "answer"}

// RiskRows gives one row a finding.
func RiskRows(findings []risk.Finding) [][]string {
	var rows [][]string
	for _, f := range findings {
		rows = append(rows, []string{
			fmt.Sprint(f.No), f.ID, string(f.Grade), f.About, f.Was, f.Becomes, f.Consequence, f.Needed, f.Basis, AnswerText(f),
		})
	}
	return rows
}

// AnswerText quotes the answer to a finding, and says where it no longer holds.
func AnswerText(f risk.Finding) string {
	switch {
	case f.Answer == "":
		return ""
	case f.Grade == risk.Stop:
		return f.Answer + " (a stop is not lifted by an answer)"
	case f.AnswerStale:
		return f.Answer + " (stale: written about another figure than " + f.Figure + ")"
	case f.AnswerUnbound:
		return f.Answer + " (does not say which figure it was written about; now " + f.Figure + ")"
	}
	return f.Answer
}

// Summary counts the findings in one sentence.
func Summary(findings []risk.Finding) string {
	n := map[risk.Grade]int{}
	open := 0
	for _, f := range findings {
		n[f.Grade]++
		if f.Grade == risk.Act && f.Open() {
			open++
		}
	}
	return fmt.Sprintf("%d stop, %d act (%d without a valid answer), %d note", n[risk.Stop], n[risk.Act], open, n[risk.Note])
}

// Risks prints risks.md.
func Risks(title string, a *risk.Assessment) string {
	var b strings.Builder
	fmt.Fprintf(&b, "# Risks: %s\n\n", Markdown(title))
	cautions(&b, a)
	fmt.Fprintf(&b, "%s.\n", Summary(a.Findings))
	sections := []struct {
		grade      risk.Grade
		head, lead string
	}{
		{risk.Stop, "Stop", "The C is withheld until the design changes. No answer lifts a stop."},
		{risk.Act, "Act", "Each needs an answer by the responsible person."},
		{risk.Note, "Note", "To be known."},
	}
	for _, s := range sections {
		first := true
		for _, f := range a.Findings {
			if f.Grade != s.grade {
				continue
			}
			if first {
				fmt.Fprintf(&b, "\n## %s\n\n%s\n", s.head, s.lead)
				first = false
			}
			finding(&b, f)
		}
	}
	notJudged(&b, a)
	return b.String()
}

func cautions(b *strings.Builder, a *risk.Assessment) {
	for _, c := range CautionsFor(a) {
		fmt.Fprintf(b, "> - %s\n", Markdown(c))
	}
	b.WriteString("\n")
}

func finding(b *strings.Builder, f risk.Finding) {
	fmt.Fprintf(b, "\n### %d. %s: %s\n\n", f.No, Markdown(f.ID), Markdown(f.About))
	for _, l := range []struct{ word, text string }{
		{"Was", f.Was}, {"Becomes", f.Becomes}, {"Consequence", f.Consequence}, {"Needed", f.Needed}, {"Basis", f.Basis},
	} {
		if l.text != "" {
			fmt.Fprintf(b, "- %s: %s\n", l.word, Markdown(l.text))
		}
	}
	switch answer := AnswerText(f); {
	case answer != "":
		fmt.Fprintf(b, "- Answer: %s\n", Markdown(answer))
	case f.Grade == risk.Act:
		b.WriteString("- Answer: **open**\n")
	}
}

// notJudged lists what could not be judged, so that silence is not read as a
// clean bill.
func notJudged(b *strings.Builder, a *risk.Assessment) {
	if len(a.Waiting)+len(a.NotJudged)+len(a.Unused) == 0 {
		return
	}
	b.WriteString("\n## Not judged\n\n")
	for _, w := range a.Waiting {
		fmt.Fprintf(b, "- %s: waits for a figure that is not worked out yet: %s\n", Markdown(w.ID), Markdown(strings.Join(w.Figures, ", ")))
	}
	for _, n := range a.NotJudged {
		fmt.Fprintf(b, "- %s about %s: %s is not determined: %s\n", Markdown(n.ID), Markdown(n.About), Markdown(n.Figure), Markdown(n.Reason))
	}
	for _, u := range a.Unused {
		fmt.Fprintf(b, "- the answer to %s about %s (%s) belongs to no finding\n", Markdown(u.Finding), Markdown(u.About), Markdown(u.Path))
	}
}
