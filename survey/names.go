package survey

import "strings"

// reserved words cannot be names: they are words of C (ISO/IEC 9899:1999 6.4.1
// and later), of C++ (ISO/IEC 14882), of the headers that the emitted C uses,
// or of the expression language.
var reserved = words(`
auto break case char const continue default do double else enum extern float for goto if inline int long register
restrict return short signed sizeof static struct switch typedef union unsigned void volatile while
alignas alignof atomic bool complex constexpr false generic imaginary noreturn nullptr static_assert thread_local true typeof
and and_eq asm bitand bitor catch char8_t char16_t char32_t class co_await co_return co_yield compl concept consteval
constinit const_cast decltype delete dynamic_cast explicit export friend mutable namespace new noexcept not not_eq operator
or or_eq private protected public reinterpret_cast requires static_cast template this throw try typeid typename using
virtual wchar_t xor xor_eq final override import module
int8_t int16_t int32_t int64_t uint8_t uint16_t uint32_t uint64_t size_t ptrdiff_t main null errno
nil in let var matches contains startswith endswith all none any one filter map count sum
fault unknown`)

func words(text string) map[string]bool {
	m := map[string]bool{}
	for _, w := range strings.Fields(text) {
		m[w] = true
	}
	return m
}
