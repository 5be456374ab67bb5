package faults

import (
	"fmt"

	"makebreak/translate"
)

// grade orders the ways in which something can end.
type grade int

const (
	works   grade = iota // as it should
	safe                 // in the safe state
	bounded              // wrong for a while, then ended
	wrong                // wrong, and nothing ends it
	unsure               // cannot be told
)

// end is how something ends for a load.
type end struct {
	grade grade
	text  string
}

// stateWord is what a load is called when on or off.
func stateWord(l *translate.Switched, on bool) string {
	opens := l.Load.Kind.V.Opens()
	switch {
	case opens && on:
		return "open"
	case opens:
		return "closed"
	case on:
		return "on"
	}
	return "off"
}

// staysOr says how a load ends that is left in a state.
func staysIn(l *translate.Switched, on bool, why string) end {
	if on == l.Load.SafeState.V.Energised() {
		return end{safe, fmt.Sprintf("goes or stays %s, its safe state%s", stateWord(l, on), why)}
	}
	return end{wrong, fmt.Sprintf("stays %s; nothing in the control ends it%s", stateWord(l, on), why)}
}

// verdict compares how a function ended with the old part and ends now, with
// the hardware that stays on both sides.
func verdict(before, now end) (Verdict, string) {
	switch {
	case before.grade == unsure || now.grade == unsure:
		return Unknown, ""
	case now.grade < before.grade:
		return Stronger, ""
	case now.grade == before.grade && now.grade == wrong:
		return Kept, "no worse, and no better: nothing ended it before, and nothing does now"
	case now.grade == before.grade:
		return Kept, ""
	case now.grade == works || now.grade == safe:
		return Kept, "" // from working to the safe state: no protection is lost
	case now.grade == wrong:
		return Lost, ""
	}
	return Weaker, ""
}

// worst is the verdict over several causes.
func worst(vs []Verdict) Verdict {
	order := []Verdict{Stronger, Kept, Unknown, Weaker, Lost}
	at := 0
	for _, v := range vs {
		for i, o := range order {
			if v == o && i > at {
				at = i
			}
		}
	}
	return order[at]
}
