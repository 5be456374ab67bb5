package csource

import (
	"strings"

	"makebreak/translate/logic"
)

// names are the names that things have in C. They are chosen once, so that two
// things never share one and none is a word of the language. The names that
// the board's code uses come first and are what the program calls them.
type names struct {
	upper, lower string // the prefixes of macros and of everything else

	vars     map[*logic.Var]string // members of in, out and the state, and locals
	kept     map[*logic.Var]string // members of the record
	gathered map[*logic.Var]string // locals in which an output of flags is put together
	consts   map[*logic.Const]string
	enums    map[*logic.Enum]string // without prefix
	words    map[*logic.Enum][]string
	flags    map[*logic.Var][]string // of the output that they make up
	machines map[*logic.Var]string
	tables   map[*logic.Table]string // of the function; the points have _x and _y behind it
}

// scope is a set of names of which each is given away once.
type scope map[string]bool

func newScope(taken string) scope {
	s := scope{}
	for _, n := range strings.Fields(taken) {
		s[n] = true
	}
	return s
}

// take gives a name that is still free: the wanted one, or with underscores behind it.
func (s scope) take(want string) string {
	for s[want] {
		want += "_"
	}
	s[want] = true
	return want
}

// languageWords cannot name anything: keywords of C99 (ISO/IEC 9899:1999, 6.4.1)
// and of later C, and what the two standard headers of the program define.
const languageWords = `auto break case char const continue default do double else enum extern float for goto if inline int
long register restrict return short signed sizeof static struct switch typedef union unsigned void volatile while
_Bool _Complex _Imaginary _Alignas _Alignof _Atomic _Generic _Noreturn _Static_assert _Thread_local
alignas alignof asm constexpr nullptr static_assert thread_local typeof typeof_unqual
bool true false NULL main int8_t int16_t int32_t int64_t uint8_t uint16_t uint32_t uint64_t intptr_t uintptr_t intmax_t
uintmax_t size_t ptrdiff_t wchar_t`

func chooseNames(p *logic.Checked) *names {
	n := &names{
		upper: strings.ToUpper(p.ID), lower: p.ID,
		vars: map[*logic.Var]string{}, kept: map[*logic.Var]string{}, gathered: map[*logic.Var]string{},
		consts: map[*logic.Const]string{}, enums: map[*logic.Enum]string{}, words: map[*logic.Enum][]string{},
		flags: map[*logic.Var][]string{}, machines: map[*logic.Var]string{}, tables: map[*logic.Table]string{},
	}
	n.variables(p)
	n.functions(p)
	n.macros(p)
	return n
}

func (n *names) variables(p *logic.Checked) {
	for _, vs := range [][]*logic.Var{p.Inputs, p.Outputs, p.State} {
		members := newScope(languageWords)
		for _, v := range vs {
			n.vars[v] = members.take(v.Name)
		}
	}
	record := newScope(languageWords + " check")
	for _, v := range p.Survivors() {
		n.kept[v] = record.take(v.Name)
	}
	locals := newScope(languageWords + " m in out")
	for _, v := range p.Locals {
		if !among(p.Outputs, v) {
			n.vars[v] = locals.take(v.Name)
		}
	}
	for _, b := range p.Order {
		if f, ok := b.(*logic.Flags); ok {
			n.gathered[f.Out] = n.vars[f.Out]
			if among(p.Outputs, f.Out) {
				n.gathered[f.Out] = locals.take(f.Out.Name)
			}
		}
	}
}

func (n *names) functions(p *logic.Checked) {
	functions := newScope("start step remember check_word clamp_u16 clamp_i16 clamp_i32 toward_i16 toward_i32")
	tags := newScope("in out remembered")
	for _, vs := range [][]*logic.Var{p.State, p.Outputs, p.Locals} {
		for _, v := range vs {
			if v.Kind == logic.Word && n.enums[v.Enum] == "" {
				n.enums[v.Enum] = tags.take(v.Name)
			}
		}
	}
	for _, b := range p.Order {
		if m, ok := b.(*logic.Machine); ok {
			n.machines[m.Var] = n.lower + "_" + functions.take(m.Var.Name)
		}
	}
	for _, t := range p.Tables {
		name := t.Name
		for functions[name] || functions[name+"_x"] || functions[name+"_y"] {
			name += "_"
		}
		functions[name], functions[name+"_x"], functions[name+"_y"] = true, true, true
		n.tables[t] = n.lower + "_" + name
	}
}

func (n *names) macros(p *logic.Checked) {
	macros := newScope("H PORT_H STEP_MS FLASH READ_U8 READ_U16 READ_U32 READ_I8 READ_I16 READ_I32")
	take := func(want string) string { return n.upper + "_" + macros.take(strings.ToUpper(want)) }
	for _, b := range p.Order {
		if f, ok := b.(*logic.Flags); ok {
			for _, bit := range f.Bits {
				n.flags[f.Out] = append(n.flags[f.Out], take(f.Out.Name+"_"+bit.Name))
			}
		}
	}
	for _, e := range enumsOf(p) {
		for _, word := range e.Words {
			n.words[e] = append(n.words[e], take(n.enums[e]+"_"+word.Name))
		}
	}
	for _, c := range p.Consts {
		n.consts[c] = take(c.Name)
	}
}

// enumsOf lists the enumerations of a program in the order of their variables.
func enumsOf(p *logic.Checked) []*logic.Enum {
	var es []*logic.Enum
	seen := map[*logic.Enum]bool{}
	for _, vs := range [][]*logic.Var{p.State, p.Outputs, p.Locals} {
		for _, v := range vs {
			if v.Kind == logic.Word && !seen[v.Enum] {
				seen[v.Enum] = true
				es = append(es, v.Enum)
			}
		}
	}
	return es
}

func among(vs []*logic.Var, v *logic.Var) bool {
	for _, x := range vs {
		if x == v {
			return true
		}
	}
	return false
}

func (n *names) function(what string) string        { return n.lower + "_" + what }
func (n *names) macro(what string) string           { return n.upper + "_" + what }
func (n *names) tag(e *logic.Enum) string           { return "enum " + n.lower + "_" + n.enums[e] }
func (n *names) portName(what string) string        { return n.lower + "_port_" + what }
func (n *names) word(e *logic.Enum, i int64) string { return n.words[e][i] }
