//go:build deep && unfinished

package proofs

import (
	"fmt"
	"regexp"
	"strconv"
	"strings"
)

// mutant is a text of C with one thing changed.
type mutant struct{ what, text string }

var (
	comments    = regexp.MustCompile(`(?s)/\*.*?\*/`)
	definitions = regexp.MustCompile(`(?m)^#define \w+ (\(-)?(?:U?INT32_C\()?(\d+)`)
	numbers     = regexp.MustCompile(`\b(?:0x([0-9A-F]+)|(\d+))u?\b`)
	truths      = regexp.MustCompile(`\b(?:true|false)\b`)
	comparisons = regexp.MustCompile(` (<=|>=|==|!=|<|>)[ \n]`)
	junctions   = regexp.MustCompile(`&&|\|\|`)
	negations   = regexp.MustCompile(`!([^=])`)
	arithmetic  = regexp.MustCompile(` (\+|-|\*|/|\||&|>>)[ \n]`)
	assignments = regexp.MustCompile(`(?m)^ +((?:m->|out->|now\.|r->|\*r|[a-z_]\w*)[\w.>-]* = [^;]*;|[\w>.-]+\+\+;)`)
	locals      = regexp.MustCompile(`(?m)^    (?:const )?(bool|u?int\d+_t) \w+ = ([^;]*);`)
	enums       = regexp.MustCompile(`(?s)\nenum \w+ \{\n(.*?)\n\};`)
	enumerators = regexp.MustCompile(`(?m)^ +([A-Z]\w*) = \d+`)
	identifiers = regexp.MustCompile(`\b[A-Z]\w*\b`)
	flagBits    = regexp.MustCompile(`(?m)^#define (\w+) 0x[0-9A-F]{4}u`)
)

var other = map[string][]string{
	"<": {"<=", ">="}, "<=": {"<", ">"}, ">": {">=", "<="}, ">=": {">", "<"}, "==": {"!="}, "!=": {"=="},
	"&&": {"||"}, "||": {"&&"}, "true": {"false"}, "false": {"true"},
	"+": {"-"}, "-": {"+"}, "*": {"/", "+"}, "/": {"*"}, "|": {"&"}, "&": {"|"}, ">>": {"<<"},
}

// mutants changes a program, one thing at a time: every constant and number by
// one up and down, every truth value, every state and fault bit for the next
// of its kind, every comparison, junction, negation and operation for another,
// every assignment left out, every local worked out wrongly. Comments, static
// assertions, labels of cases and lengths of arrays are left alone.
func mutants(source, header string) []mutant {
	blank := func(s string) string { return strings.Repeat(" ", len(s)) }
	code := comments.ReplaceAllStringFunc(source, blank)
	var all []mutant
	add := func(from, to int, with string) {
		line := lineAt(source, from)
		for _, not := range []string{"typedef ", "case ", "#include", "#ifndef", "#define"} {
			if strings.HasPrefix(strings.TrimSpace(line), not) && !(not == "#define" && definitions.MatchString(line)) {
				return
			}
		}
		n := strings.Count(source[:from], "\n") + 1
		was := strings.Join(strings.Fields(source[from:to]), " ")
		all = append(all, mutant{
			what: fmt.Sprintf("%d: %s: %s -> %s", n, strings.TrimSpace(line), was, with),
			text: source[:from] + with + source[to:],
		})
	}
	around := func(from, to int, digits string, base int) {
		n, err := strconv.ParseUint(digits, base, 32)
		if err != nil {
			return
		}
		form := "%d"
		if base == 16 {
			form = "%X"
		}
		add(from, to, fmt.Sprintf(form, n+1))
		if n > 0 {
			add(from, to, fmt.Sprintf(form, n-1))
		}
	}
	for _, m := range definitions.FindAllStringSubmatchIndex(code, -1) {
		around(m[4], m[5], code[m[4]:m[5]], 10)
	}
	body := regexp.MustCompile(`(?m)^(?:#|typedef ).*$`).ReplaceAllStringFunc(code, blank)
	body = regexp.MustCompile(`\w+\[\d+\]`).ReplaceAllStringFunc(body, blank)
	for _, m := range numbers.FindAllStringSubmatchIndex(body, -1) {
		if m[2] >= 0 {
			around(m[2], m[3], body[m[2]:m[3]], 16)
		} else {
			around(m[4], m[5], body[m[4]:m[5]], 10)
		}
	}
	for _, find := range []*regexp.Regexp{comparisons, junctions, arithmetic, truths} {
		for _, m := range find.FindAllStringIndex(body, -1) {
			sign := strings.TrimSpace(body[m[0]:m[1]])
			from := m[0] + strings.Index(body[m[0]:m[1]], sign)
			for _, o := range other[sign] {
				add(from, from+len(sign), o)
			}
		}
	}
	for _, m := range negations.FindAllStringSubmatchIndex(body, -1) {
		add(m[0], m[0]+1, "")
	}
	for _, m := range assignments.FindAllStringSubmatchIndex(body, -1) {
		add(m[2], m[3], ";")
	}
	for _, m := range locals.FindAllStringSubmatchIndex(body, -1) {
		was := source[m[4]:m[5]]
		if body[m[2]:m[3]] == "bool" {
			add(m[4], m[5], "!("+was+")")
		} else {
			add(m[4], m[5], "("+was+") + 1")
		}
	}
	next := neighbours(header)
	for _, m := range identifiers.FindAllStringIndex(body, -1) {
		for _, o := range next[body[m[0]:m[1]]] {
			add(m[0], m[1], o)
		}
	}
	return all
}

// neighbours gives for each state the next one of its machine, and for each
// fault bit the next one.
func neighbours(header string) map[string][]string {
	next := map[string][]string{}
	ring := func(names []string) {
		for i, n := range names {
			if len(names) > 1 {
				next[n] = []string{names[(i+1)%len(names)]}
			}
		}
	}
	for _, e := range enums.FindAllStringSubmatch(header, -1) {
		var names []string
		for _, m := range enumerators.FindAllStringSubmatch(e[1], -1) {
			names = append(names, m[1])
		}
		ring(names)
	}
	var bits []string
	for _, m := range flagBits.FindAllStringSubmatch(header, -1) {
		bits = append(bits, m[1])
	}
	ring(bits)
	return next
}

func lineAt(s string, at int) string {
	from := strings.LastIndexByte(s[:at], '\n') + 1
	to := strings.IndexByte(s[at:], '\n')
	return s[from : at+to]
}
