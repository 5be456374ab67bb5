package sheets

import (
	"bytes"
	"encoding/json"
	"fmt"
	"unicode/utf16"

	"makebreak/survey"
)

// JSON prints a value with two blanks of indent and its signs as they are.
// Hidden characters of a text become JSON's own escapes: a reader of JSON gets
// them back, and a terminal never sees them.
func JSON(v any) ([]byte, error) {
	var b bytes.Buffer
	e := json.NewEncoder(&b)
	e.SetEscapeHTML(false)
	e.SetIndent("", "  ")
	if err := e.Encode(v); err != nil {
		return nil, err
	}
	return escapeHidden(b.String()), nil
}

// escapeHidden needs no parser: outside of its strings, JSON holds no hidden
// character but the line feeds of its indent.
func escapeHidden(s string) []byte {
	var b bytes.Buffer
	for _, r := range s {
		switch {
		case r == '\n' || !survey.Hidden(r):
			b.WriteRune(r)
		case r > 0xffff:
			high, low := utf16.EncodeRune(r)
			fmt.Fprintf(&b, `\u%04x\u%04x`, high, low)
		default:
			fmt.Fprintf(&b, `\u%04x`, r)
		}
	}
	return b.Bytes()
}
