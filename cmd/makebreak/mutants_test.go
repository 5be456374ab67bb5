package main

import (
	"fmt"
	"regexp"
	"strconv"
	"strings"
)

// mutant is a text of C with one thing changed.
type mutant struct{ what, text string }

var (
	comment    = regexp.MustCompile(`(?s)/\*.*?\*/`)
	definition = regexp.MustCompile(`(?m)^#define \w+ (\d+)u?`)
	comparison = regexp.MustCompile(` (<=|>=|==|!=|<|>) `)
	junction   = regexp.MustCompile(`&&|\|\|`)
)

var other = map[string][]string{"<": {"<=", ">="}, "<=": {"<", ">"}, ">": {">=", "<="}, ">=": {">", "<"}, "==": {"!="}, "!=": {"=="}, "&&": {"||"}, "||": {"&&"}}

// mutants changes, one at a time, every constant by one up and down, every
// comparison and every junction. Comments and static assertions are left alone.
func mutants(source string) []mutant {
	blank := comment.ReplaceAllStringFunc(source, func(s string) string { return strings.Repeat(" ", len(s)) })
	var all []mutant
	add := func(from, to int, with string) {
		line := strings.Count(source[:from], "\n") + 1
		text := strings.Split(source, "\n")[line-1]
		all = append(all, mutant{
			what: fmt.Sprintf("%s: %s -> %s", strings.TrimSpace(text), source[from:to], with),
			text: source[:from] + with + source[to:],
		})
	}
	for _, m := range definition.FindAllStringSubmatchIndex(blank, -1) {
		n, _ := strconv.Atoi(source[m[2]:m[3]])
		add(m[2], m[3], strconv.Itoa(n+1))
		if n > 0 {
			add(m[2], m[3], strconv.Itoa(n-1))
		}
	}
	for _, find := range []*regexp.Regexp{comparison, junction} {
		for _, m := range find.FindAllStringIndex(blank, -1) {
			if strings.Contains(lineAt(source, m[0]), "typedef") {
				continue
			}
			sign := strings.TrimSpace(source[m[0]:m[1]])
			for _, o := range other[sign] {
				from := m[0] + strings.Index(source[m[0]:m[1]], sign)
				add(from, from+len(sign), o)
			}
		}
	}
	return all
}

func lineAt(s string, at int) string {
	from := strings.LastIndexByte(s[:at], '\n') + 1
	to := strings.IndexByte(s[at:], '\n')
	return s[from : at+to]
}
