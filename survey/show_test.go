package survey

import (
	"strings"
	"testing"

	"github.com/google/go-cmp/cmp"
	"go.yaml.in/yaml/v4"
	"pgregory.net/rapid"
)

// A sheet printed in full is a sheet: read again, it says the same, and printed
// again, it has the same keys and values.
func TestShownSheetReadsBack(t *testing.T) {
	for name, data := range goodSheets(t) {
		first, _ := Read(name, data)
		shown := inFull(first)
		second, diags := Read(name, []byte(shown))
		if len(diags) > 0 {
			t.Errorf("%s in full does not read:\n%v\n%s", name, diags, shown)
			continue
		}
		if diff := cmp.Diff(withoutComments(first), withoutComments(second)); diff != "" {
			t.Errorf("%s (- first, + read back):\n%s", name, diff)
		}
	}
}

func inFull(s *Survey) string {
	var b strings.Builder
	for _, e := range s.Entries() {
		b.WriteString(e.String() + "\n")
	}
	return b.String()
}

func withoutComments(s *Survey) []string {
	var lines []string
	for _, e := range s.Entries() {
		e.Assumed, e.From = "", ""
		lines = append(lines, e.String())
	}
	return lines
}

// What is assumed or worked out is marked as such; what is written is not.
func TestShownSheetSaysWhatIsAssumed(t *testing.T) {
	s, diags := Read("sheet.yaml", []byte(oneStat("set_point: 60 degC, marks: break, differential: 10 degF")))
	if diags.HasErrors() {
		t.Fatal(diags)
	}
	shown := inFull(s)
	for _, line := range []string{
		"      set_point: 60 degC\n",
		"      breaks_at: 60 degC   # worked out of set_point 60 degC, marks break, differential 10 degF\n",
		"      makes_at: 54.4444 degC   # worked out of set_point 60 degC, marks break, differential 10 degF\n",
		"      reset: automatic   # assumed: not stated\n",
		"    called_every: 250 ms   # assumed: common practice for temperature\n",
		"      rest: off   # assumed: common practice: most loads rest with no supply\n",
	} {
		if !strings.Contains(shown, strings.TrimLeft(line, " ")) {
			t.Errorf("not shown: %s", line)
		}
	}
	if t.Failed() {
		t.Log(shown)
	}
}

// Any text comes back from YAML as it was written.
func TestTextsInYAML(t *testing.T) {
	check := func(text string) string {
		var back struct{ K string }
		if err := yaml.Load([]byte("k: "+asYAML(text)+"   # assumed: x\n"), &back); err != nil {
			return err.Error()
		}
		if back.K != text {
			return back.K
		}
		return ""
	}
	for _, text := range []string{"", "a: b", "a # b", "- a", "-", "'", `"`, "{a}", "[a]", "*a", "&a", "!a", "%a", "@a", "`a`", "a\nb", "null", "~", " a ", "...", "---", `\`, `probe > "60 degC"`, "<b>", "60 °C", "# a", "a:", "?", "| a"} {
		if got := check(text); got != "" && text != "null" && text != "~" {
			t.Errorf("%q as %s came back as %q", text, asYAML(text), got)
		}
	}
	rapid.Check(t, func(rt *rapid.T) {
		text := rapid.StringMatching(`[ -~°Ωé]{0,12}`).Draw(rt, "text")
		n := yaml.Node{}
		if err := yaml.Load([]byte("k: "+asYAML(text)+"   # assumed: x\n"), &n); err != nil {
			rt.Fatalf("%q as %s: %v", text, asYAML(text), err)
		}
		if got := n.Content[0].Content[1]; got.Value != text || got.Kind != yaml.ScalarNode {
			rt.Fatalf("%q as %s came back as %q", text, asYAML(text), got.Value)
		}
	})
}
