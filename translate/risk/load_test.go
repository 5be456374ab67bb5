package risk

import "testing"

func TestBuiltinRulesAreSound(t *testing.T) {
	_, ds := (&Rules{byID: map[string]*Rule{}}).merge(builtin, "rules.yaml", false)
	for _, d := range ds {
		t.Errorf("%s:%d:%d: %s: %s (%s)", d.File, d.Line, d.Col, d.Path, d.Summary, d.Found)
	}
}

func BenchmarkLoad(b *testing.B) {
	for b.Loop() {
		(&Rules{byID: map[string]*Rule{}}).merge(builtin, "rules.yaml", false)
	}
}
