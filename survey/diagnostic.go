package survey

// Severity of a diagnostic; the zero value is invalid.
type Severity int

const (
	Error   Severity = iota + 1 // the sheet cannot be used
	Warning                     // it can, but read this
)

// Diagnostic is one thing that is wrong with a sheet.
type Diagnostic struct {
	Severity Severity
	File     string
	Line     int    // 1-based; 0 when it has no place
	Col      int    // 1-based, in characters
	Path     string // key path, such as controls[1].breaks_at
	Summary  string // one short sentence
	Found    string // what stands there
	Fits     string // what would fit, "did you mean …" included
}

// Diagnostics is a list in the order of the sheet. It is deliberately not an
// error: an empty list must never be mistaken for a failure.
type Diagnostics []Diagnostic

// HasErrors reports whether any of them is an Error.
func (ds Diagnostics) HasErrors() bool {
	for _, d := range ds {
		if d.Severity == Error {
			return true
		}
	}
	return false
}
