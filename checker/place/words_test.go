package place

import (
	"strings"
	"testing"
	"unicode/utf8"

	"pgregory.net/rapid"
)

func TestQuote(t *testing.T) {
	t.Parallel()
	for _, row := range []struct{ name, text, want string }{
		{"plain", "65 kA", `"65 kA"`},
		{"empty", "", `""`},
		{"letters of other scripts", "Ω é 電圧", `"Ω é 電圧"`},
		{"quote and backslash", `a"b\c`, `"a\"b\\c"`},
		{"line ends and tab", "a\nb\r\tc", `"a\nb\r\tc"`},
		{"escape sequence", "\x1b[31m", `"\x1b[31m"`},
		{"delete and C1", "\x7f\u009b", `"\x7f\u009b"`},
		{"bidirectional", "\u202eAk 56\u2066", `"\u202eAk 56\u2066"`},
		{"invisible", "a\u200bb\u00adc\u2060\ufeff", `"a\u200bb\u00adc\u2060\ufeff"`},
		{"inkless letters", "\u3164\u115f\u2800", `"\u3164\u115f\u2800"`},
		{"no-break space", "65\u00a0kA", `"65\u00a0kA"`},
		{"variation selector and tag", "a\ufe0f\U000e0041", `"a\ufe0f\U000e0041"`},
		{"not UTF-8", "a\xff\xc3", `"a\xff\xc3"`},
		{"sixty characters", strings.Repeat("Ω", 60), `"` + strings.Repeat("Ω", 60) + `"`},
		{"sixty-one characters", strings.Repeat("Ω", 61), `"` + strings.Repeat("Ω", 60) + `…"`},
	} {
		t.Run(row.name, func(t *testing.T) {
			t.Parallel()
			if got := Quote(row.text); got != row.want {
				t.Errorf("got %s, want %s", got, row.want)
			}
		})
	}
}

func TestQuoteIsHarmless(t *testing.T) {
	t.Parallel()
	rapid.Check(t, func(t *rapid.T) {
		text := string(rapid.SliceOf(rapid.Byte()).Draw(t, "bytes")) + rapid.String().Draw(t, "text")
		got := Quote(text)
		checkPrinted(t, got)
		if strings.Contains(got, "\n") || utf8.RuneCountInString(got) > 60*len(`\U000e0001`)+3 {
			t.Fatalf("too long or more than a line: %s", got)
		}
		if Visible(got) != got {
			t.Fatalf("escaped twice: %s and %s", got, Visible(got))
		}
	})
}

func TestNearest(t *testing.T) {
	t.Parallel()
	known := []string{"voltage", "rated_current", "peak_withstand", "short_time_withstand", "Icw", "gap", "A", "of", "supports", "support"}
	for _, row := range []struct{ name, word, want string }{
		{"same", "voltage", "voltage"},
		{"one dropped", "voltge", "voltage"},
		{"one added", "volttage", "voltage"},
		{"one changed", "voltagr", "voltage"},
		{"two swapped", "votlage", "voltage"},
		{"capitals", "VOLTAGE", "voltage"},
		{"separators", "Rated-Current", "rated_current"},
		{"spaces", "rated current", "rated_current"},
		{"no separators and a slip", "ratedcurent", "rated_current"},
		{"a third of a long word", "shrt_tme_wthstnd", "short_time_withstand"},
		{"short word", "icv", "Icw"},
		{"short word, two slips", "icvv", ""},
		{"other short word", "gab", "gap"},
		{"one letter is no hint", "B", ""},
		{"one letter in the other case is", "a", "A"},
		{"two letters, one slip", "on", "of"},
		{"the nearer of two", "suport", "support"},
		{"nothing like it", "altitude", ""},
		{"empty", "", ""},
		{"separators only", "_-", ""},
		{"endless", strings.Repeat("voltage", 100), ""},
	} {
		t.Run(row.name, func(t *testing.T) {
			t.Parallel()
			got, ok := Nearest(row.word, known)
			if got != row.want || ok != (row.want != "") {
				t.Errorf("got %q, %v, want %q", got, ok, row.want)
			}
		})
	}
	if got, _ := Nearest("bar", []string{"car", "bat", "tar"}); got != "bat" {
		t.Errorf("of equals got %q, want the first in alphabetical order", got)
	}
	if got, _ := Nearest("bar", []string{"tar", "bat", "car"}); got != "bat" {
		t.Errorf("the order of the list shows: %q", got)
	}
	if _, ok := Nearest("bar", nil); ok {
		t.Error("something was found in nothing")
	}
}

func TestDistance(t *testing.T) {
	t.Parallel()
	for _, row := range []struct {
		a, b string
		want int
	}{
		{"", "", 0}, {"", "abc", 3}, {"abc", "", 3}, {"abc", "abc", 0}, {"abc", "abd", 1}, {"abc", "acb", 1},
		{"ca", "abc", 3}, {"kitten", "sitting", 3}, {"Ωm", "mΩ", 1},
	} {
		if got := distance([]rune(row.a), []rune(row.b)); got != row.want {
			t.Errorf("%q to %q: got %d, want %d", row.a, row.b, got, row.want)
		}
	}
}

func TestDistanceProperties(t *testing.T) {
	t.Parallel()
	word := rapid.StringOfN(rapid.RuneFrom([]rune("abcΩ")), 0, 8, -1)
	rapid.Check(t, func(t *rapid.T) {
		a, b := []rune(word.Draw(t, "a")), []rune(word.Draw(t, "b"))
		d := distance(a, b)
		if d != distance(b, a) {
			t.Fatalf("%q to %q is not as far as back", string(a), string(b))
		}
		if (d == 0) != (string(a) == string(b)) || d > max(len(a), len(b)) || d < max(len(a), len(b))-min(len(a), len(b)) {
			t.Fatalf("%q to %q: %d", string(a), string(b), d)
		}
	})
}
