package catalogue

import "strings"

// What a contact or a valve does.
const (
	Makes   = "makes"
	Breaks  = "breaks"
	Opens   = "opens"
	Closes  = "closes"
	Stays   = "stays"
	Unknown = "unknown"
)

// Reads tells what the contact or valve of a control with the given action
// (breaks_on_rise, makes_on_rise and their names on fall, closes_on_rise,
// opens_on_rise, holds_while_hot) does when a failure makes its element read
// as given (a Failure's Reads). It is one of makes, breaks, opens, closes,
// stays and unknown. `makes` and `breaks` are also what a contact does that is
// already made or broken and now stays so for ever.
//
// An action that switches nothing (indicates), or that has no cold and hot
// side (pulses), gives unknown, except where the contact itself has failed.
func Reads(action, reading string) string {
	switch reading {
	case "stays":
		return Stays
	case "makes", "breaks":
		if valve(action) || action == "indicates" {
			return Unknown // it has no contact that could
		}
		return reading
	case "cold":
		return whenCold(action)
	case "hot":
		return opposite(whenCold(action))
	}
	return Unknown
}

func whenCold(action string) string {
	switch action {
	case "breaks_on_rise", "makes_on_fall":
		return Makes
	case "makes_on_rise", "breaks_on_fall":
		return Breaks
	case "closes_on_rise":
		return Opens
	case "opens_on_rise":
		return Closes
	case "holds_while_hot":
		return Closes
	}
	return Unknown
}

func opposite(outcome string) string {
	switch outcome {
	case Makes:
		return Breaks
	case Breaks:
		return Makes
	case Opens:
		return Closes
	case Closes:
		return Opens
	}
	return outcome
}

func valve(action string) bool {
	return action == "closes_on_rise" || action == "opens_on_rise" || action == "holds_while_hot"
}

func switches(action string) bool {
	switch action {
	case "breaks_on_rise", "makes_on_fall", "makes_on_rise", "breaks_on_fall", "pulses":
		return true
	}
	return false
}

// Energises reports whether a load wired through the contact or valve is then
// on or open; known is false for stays and unknown.
func Energises(outcome string) (on, known bool) {
	switch outcome {
	case Makes, Opens:
		return true, true
	case Breaks, Closes:
		return false, true
	}
	return false, false
}

// RefusedBy recognises a control that is not translated by the words of its
// description.
func (c *Catalogue) RefusedBy(what string) (*Refused, bool) {
	text := words(what)
	return find(c.Refused, func(r *Refused) bool {
		for _, phrase := range r.Phrases {
			if strings.Contains(text, words(phrase)) {
				return true
			}
		}
		return false
	})
}

// words gives the words of a text in small letters, each between two spaces,
// so that a phrase is found at word boundaries only.
func words(text string) string {
	fields := strings.FieldsFunc(strings.ToLower(text), func(r rune) bool {
		return !(r >= 'a' && r <= 'z' || r >= '0' && r <= '9' || r > 127)
	})
	return " " + strings.Join(fields, " ") + " "
}
