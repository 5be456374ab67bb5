package sheets

import (
	"fmt"
	"strings"

	"makebreak/translate/risk"
)

// Cautions stand in every paper of a pack. There is no way to leave them out.
var Cautions = []string{
	"This helps to plan; it decides nothing. Local codes, the equipment's listing or approval, and a licensed person decide.",
	"Independent hardware limits stay in place, hard-wired, and are tested before anything else is touched.",
	"Isolate, lock off and prove dead before working on the equipment.",
	"The C is a skeleton to start from. It has not been certified for any purpose; no claim of compliance is made for it.",
	"Software cannot see what it has no input for. A finding of grade stop is ended only by changing the design.",
}

// CautionsFor gives the cautions with, as the last one, the findings that are
// open, by number and name.
func CautionsFor(a *risk.Assessment) []string {
	return append(append([]string{}, Cautions...), open(a))
}

func open(a *risk.Assessment) string {
	var names []string
	for _, f := range a.Findings {
		if f.Open() {
			names = append(names, fmt.Sprintf("%d %s (%s, %s)", f.No, f.ID, f.Grade, f.About))
		}
	}
	text := "No finding is open."
	if len(names) > 0 {
		text = "Open findings: " + strings.Join(names, "; ") + "."
	}
	if n := len(a.Waiting) + len(a.NotJudged); n > 0 {
		text += fmt.Sprintf(" Not judged, for want of a figure: %d; risks.md says which.", n)
	}
	return text
}
