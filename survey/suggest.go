package survey

import (
	"reflect"
	"strings"
)

func oneOf(found string, words []string) string {
	if len(words) == 1 {
		return words[0]
	}
	s := "one of " + strings.Join(words, ", ")
	if near := nearest(found, words); near != "" {
		s += "; did you mean " + near + "?"
	}
	return s
}

// nearest gives the word that is at most a third of its length away; between
// words of one or two characters nothing is near.
func nearest(found string, words []string) string {
	best, least := "", 1<<30
	for _, w := range words {
		if len(w) < 3 {
			continue
		}
		if n := distance(found, w); n < least {
			best, least = w, n
		}
	}
	if best == "" || least > (len(best)+2)/3 {
		return ""
	}
	return best
}

// distance is the number of single-character changes between two words
// (Levenshtein, 1965).
func distance(a, b string) int {
	if len(a) > 64 || len(b) > 64 {
		return 1 << 20
	}
	row := make([]int, len(b)+1)
	for j := range row {
		row[j] = j
	}
	for i := 1; i <= len(a); i++ {
		diagonal := row[0]
		row[0] = i
		for j := 1; j <= len(b); j++ {
			cost := diagonal
			if a[i-1] != b[j-1] {
				cost++
			}
			diagonal = row[j]
			row[j] = min(row[j]+1, row[j-1]+1, cost)
		}
	}
	return row[len(b)]
}

// readable is how many words a person looks through in a message.
const readable = 16

// didYouMean suggests a key of the section: the nearest one, or all of them.
func didYouMean(found string, keys []key) string {
	names := keyNames(keys)
	switch {
	case nearest(found, names) != "":
		return "did you mean " + nearest(found, names) + "?"
	case sectionOf(reflect.TypeFor[Survey](), found, "") != "":
		return "nothing here; it is a key of " + sectionOf(reflect.TypeFor[Survey](), found, "")
	case len(names) > readable:
		return "a key of this section; `makebreak survey schema` lists them"
	}
	return "one of " + strings.Join(names, ", ")
}

// sectionOf gives the path of the first section that has a key of this name.
func sectionOf(t reflect.Type, name, path string) string {
	for _, k := range keysOf(t) {
		if k.name == name && path != "" {
			return path
		}
	}
	for _, k := range keysOf(t) {
		inner := k.typ
		if inner.Kind() == reflect.Slice && inner.Elem().Kind() == reflect.Pointer {
			inner = inner.Elem().Elem()
		}
		if inner.Kind() != reflect.Struct || isField(inner) {
			continue
		}
		if found := sectionOf(inner, name, join(path, k.name)); found != "" {
			return found
		}
	}
	return ""
}

// didYouMeanName suggests a name of the sheet.
func didYouMeanName(found string, names []string) string {
	if near := nearest(found, names); near != "" {
		return "did you mean " + near + "?"
	}
	return "one of " + strings.Join(names, ", ")
}
