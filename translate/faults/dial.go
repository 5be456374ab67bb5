package faults

import (
	"fmt"

	"makebreak/translate"
)

// dial takes the wiper off a dial that the user keeps, and reads off what the
// control then works at.
func (a *assessor) dial(l *translate.Switched, k *translate.Contact, function string) {
	before := end{unsure, "unknown: a knob that slips on its spindle still turns; the old dial had no wire to break"}
	b, ok := a.brought(l.Load.ID.V, true)
	now := end{unsure, "unknown: the program could not be brought to switch the load"}
	if ok {
		b.set(k.Dial.Raw.Name, 0)
		b.steps(settling(a.spec))
		now = end{wrong, "goes on at the dial's last setting and does not notice"}
		switch {
		case b.run.Get(k.Dial.Believed) != 0:
		case k.PID != nil:
			now = end{bounded, fmt.Sprintf("holds the set point of the sheet, %s, and reports it", translate.Degrees(k.Control.DialMark().V))}
		default:
			now = end{bounded, fmt.Sprintf("works at the set point of the sheet, makes at %s and breaks at %s, and reports it",
				translate.Degrees(k.Control.MakesAt.V), translate.Degrees(k.Control.BreaksAt.V))}
		}
	}
	a.add(function, k.Control.ID.V, "wiper, track or wire of the dial broken", before, now, now, "program run with the dial's input at 0")
}
