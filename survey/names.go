package survey

import "strings"

// reserved words cannot be names: they are words of C (ISO/IEC 9899:1999 6.4.1
// and later), of C++ (ISO/IEC 14882), of the headers that the emitted C uses,
// or of the expression language. linux, unix and i386 are macros where GNU
// dialects of C are compiled for these; far to pdata are words of compilers for
// 8-bit controllers.
var reserved = words(`
auto break case char const continue default do double else enum extern float for goto if inline int long register
restrict return short signed sizeof static struct switch typedef union unsigned void volatile while
alignas alignof atomic bool complex constexpr false generic imaginary noreturn nullptr static_assert thread_local true typeof
and and_eq asm bitand bitor catch char8_t char16_t char32_t class co_await co_return co_yield compl concept consteval
constinit const_cast decltype delete dynamic_cast explicit export friend mutable namespace new noexcept not not_eq operator
or or_eq private protected public reinterpret_cast requires static_cast template this throw try typeid typename using
virtual wchar_t xor xor_eq final override import module
int8_t int16_t int32_t int64_t uint8_t uint16_t uint32_t uint64_t int_least8_t int_least16_t int_least32_t int_least64_t
uint_least8_t uint_least16_t uint_least32_t uint_least64_t int_fast8_t int_fast16_t int_fast32_t int_fast64_t uint_fast8_t
uint_fast16_t uint_fast32_t uint_fast64_t intptr_t uintptr_t intmax_t uintmax_t size_t ptrdiff_t main null errno
linux unix i386 far near huge interrupt bit sbit sfr sfr16 xdata idata pdata
nil in let var matches contains startswith endswith all none any one filter map count sum
fault unknown`)

// takenFiles are ids that make no file name: the pack holds <id>.h and <id>.c.
// The first are headers of C (ISO/IEC 9899:2011 7.1.2), the others are devices
// on some file systems.
var takenFiles = words(`
assert complex ctype errno fenv float inttypes iso646 limits locale math setjmp signal stdalign stdarg stdatomic stdbool
stddef stdint stdio stdlib stdnoreturn string tgmath threads time uchar wchar wctype
aux con nul prn com0 com1 com2 com3 com4 com5 com6 com7 com8 com9 lpt0 lpt1 lpt2 lpt3 lpt4 lpt5 lpt6 lpt7 lpt8 lpt9`)

func words(text string) map[string]bool {
	m := map[string]bool{}
	for _, w := range strings.Fields(text) {
		m[w] = true
	}
	return m
}
