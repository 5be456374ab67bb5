package survey

import _ "embed"

//go:embed template.yaml
var template []byte

// Template gives a commented sheet to start from. It reads without an error.
func Template() []byte { return append([]byte(nil), template...) }
