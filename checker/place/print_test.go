package place

import (
	"bytes"
	"slices"
	"strings"
	"testing"
	"unicode"
	"unicode/utf8"

	"pgregory.net/rapid"
)

func printed(src Sources, problems ...Problem) string {
	var ps Problems
	ps.Add(problems...)
	var b bytes.Buffer
	ps.Print(&b, src)
	return b.String()
}

func TestPrint(t *testing.T) {
	t.Parallel()
	board := "board: BL-MSB-1\nbusbars:\n  main A: {rated_current: 65, voltge: 400 V}\n"
	got := printed(Sources{"board.yaml": []byte(board)},
		Problem{Place: Place{File: "board.yaml", Line: 3, Column: 31, EndColumn: 37}, Kind: UnknownKey,
			Got: "the unknown key " + Quote("voltge"), Want: "a key of a busbar", Hint: `write "voltage"`},
		Problem{Place: Place{File: "board.yaml", Line: 3, Column: 27, EndColumn: 29}, Path: "busbars.main A.rated_current", Kind: NoUnit,
			Got: Quote("65"), Want: "a current with its unit", Hint: `write "65 kA"`},
		Problem{Place: Place{File: "offer.xlsx", Sheet: "Schedule", Cell: "C14"}, Path: "site.altitude", Kind: Empty, Got: "nothing", Want: "a length with its unit"},
		Problem{Place: Place{File: "board.yaml"}, Path: "site.altitude", Kind: MissingKey, Want: "the altitude", Related: []Place{{File: "basis.yaml", Line: 4, Column: 1}}},
		Problem{Place: Place{File: "absent.yaml", Line: 3, Column: 1}, Kind: MissingFile, Got: "no such file"},
	)
	want := `absent.yaml:3:1: found no such file
board.yaml: site.altitude: expected the altitude
    see basis.yaml:4:1
board.yaml:3:27: found "65", expected a current with its unit; write "65 kA"
      main A: {rated_current: 65, voltge: 400 V}
                              ^^
board.yaml:3:31: found the unknown key "voltge", expected a key of a busbar; write "voltage"
      main A: {rated_current: 65, voltge: 400 V}
                                  ^^^^^^
offer.xlsx!Schedule!C14: found nothing, expected a length with its unit
`
	if got != want {
		t.Errorf("got\n%s\nwant\n%s", got, want)
	}
}

func TestPrintLine(t *testing.T) {
	t.Parallel()
	long := strings.Repeat("abcdefghi ", 30)
	for _, row := range []struct {
		name        string
		source      string
		column, end int
		want        []string
	}{
		{"one column where the end is unknown", "voltage: 400", 10, 0, []string{"voltage: 400", "         ^"}},
		{"end before the column", "voltage: 400", 10, 3, []string{"voltage: 400", "         ^"}},
		{"no column", "voltage: 400", 0, 0, []string{"voltage: 400"}},
		{"behind the line", "voltage:", 9, 0, []string{"voltage:", "        ^"}},
		{"far behind the line", "voltage:", 90, 95, []string{"voltage:", "        ^"}},
		{"end behind the line", "voltage:", 6, 95, []string{"voltage:", "     ^^^"}},
		{"empty line", "", 1, 0, []string{"", "^"}},
		{"tab", "\ta:\tb", 5, 6, []string{"    a:  b", "        ^"}},
		{"marked tab", "\ta", 1, 2, []string{"    a", "^^^^"}},
		{"wide characters", "電圧: 400", 5, 8, []string{"電圧: 400", "      ^^^"}},
		{"marked wide characters", "電圧: 400", 1, 3, []string{"電圧: 400", "^^^^"}},
		{"combining mark", "e\u0301a: b", 5, 6, []string{"e\u0301a: b", "   ^"}},
		{"escape sequence", "a\x1b[31m: b", 2, 3, []string{`a\x1b[31m: b`, " ^^^^"}},
		{"bidirectional character", "a\u202eb: c", 3, 4, []string{`a\u202eb: c`, "       ^"}},
		{"no-break space", "65\u00a0kA", 3, 4, []string{`65\u00a0kA`, "  ^^^^^^"}},
		{"not UTF-8", "a\xff: b", 2, 3, []string{`a\xff: b`, " ^^^^"}},
		{"byte order mark", "\ufeffab: c", 1, 3, []string{"ab: c", "^^"}},
		{"cut at the end", long, 3, 5, []string{long[:98] + "…", "  ^^"}},
		{"cut at the beginning", long[:299], 299, 300, []string{"…" + long[201:299], " " + strings.Repeat(" ", 97) + "^"}},
		{"cut at both ends", long, 151, 153, []string{"…" + long[102:200] + "…", strings.Repeat(" ", 49) + "^^"}},
		{"marked more than is shown", long, 11, 250, []string{"…" + long[10:108] + "…", " " + strings.Repeat("^", 98)}},
		{"behind a long line", long[:299], 300, 301, []string{"…" + long[201:299], " " + strings.Repeat(" ", 98) + "^"}},
	} {
		t.Run(row.name, func(t *testing.T) {
			t.Parallel()
			out := printed(Sources{"f": []byte(row.source)}, Problem{Place: Place{File: "f", Line: 1, Column: row.column, EndColumn: row.end}, Got: "x"})
			got := strings.Split(strings.TrimSuffix(out, "\n"), "\n")[1:]
			for i := range row.want {
				row.want[i] = strings.TrimRight("    "+row.want[i], " ")
				if row.want[i] == "" {
					row.want[i] = "    "
				}
			}
			if !slices.Equal(got, row.want) {
				t.Errorf("got\n%s\nwant\n%s", strings.Join(got, "\n"), strings.Join(row.want, "\n"))
			}
		})
	}
}

func TestPrintFindsTheLine(t *testing.T) {
	t.Parallel()
	for _, row := range []struct {
		name, source string
		line         int
		want         string
	}{
		{"LF", "one\ntwo\nthree", 2, "    two\n"},
		{"CR LF", "one\r\ntwo\r\nthree", 2, "    two\n"},
		{"CR", "one\rtwo\rthree", 2, "    two\n"},
		{"last without end", "one\ntwo", 2, "    two\n"},
		{"beyond the file", "one\ntwo", 3, ""},
	} {
		t.Run(row.name, func(t *testing.T) {
			t.Parallel()
			out := printed(Sources{"f": []byte(row.source)}, Problem{Place: Place{File: "f", Line: row.line}, Got: "x"})
			if _, rest, _ := strings.Cut(out, "\n"); rest != row.want {
				t.Errorf("got %q, want %q", rest, row.want)
			}
		})
	}
}

func drawProblem(t *rapid.T) Problem {
	phrase := rapid.OneOf(rapid.SampledFrom([]string{"", "a list", "x\x1b[2J", "\u202e", "a\nb"}), rapid.String())
	return Problem{
		Place:   drawPlace(t),
		Path:    phrase.Draw(t, "path"),
		Kind:    rapid.SampledFrom(Kinds()).Draw(t, "kind"),
		Got:     phrase.Draw(t, "got"),
		Want:    phrase.Draw(t, "want"),
		Hint:    phrase.Draw(t, "hint"),
		Related: rapid.SliceOfN(rapid.Custom(drawPlace), 0, 2).Draw(t, "related"),
	}
}

func TestProblemsAreSortedWithoutDuplicates(t *testing.T) {
	t.Parallel()
	rapid.Check(t, func(t *rapid.T) {
		drawn := rapid.SliceOfN(rapid.Custom(drawProblem), 1, 8).Draw(t, "problems")
		drawn = append(drawn, rapid.SampledFrom(drawn).Draw(t, "again"))
		shuffled := rapid.Permutation(drawn).Draw(t, "shuffled")
		var one, other Problems
		one.Add(drawn...)
		for _, p := range shuffled {
			other.Add(p)
			other.Sort() // sorting between must not matter
		}
		all := one.All()
		for i := 1; i < len(all); i++ {
			if Compare(all[i-1].Place, all[i].Place) > 0 {
				t.Fatalf("%v before %v", all[i-1].Place, all[i].Place)
			}
			if compareProblems(all[i-1], all[i]) == 0 {
				t.Fatalf("%+v stands twice", all[i])
			}
		}
		for _, p := range drawn {
			if !slices.ContainsFunc(all, func(q Problem) bool { return compareProblems(p, q) == 0 }) {
				t.Fatalf("%+v was lost", p)
			}
		}
		if one.Len() != len(all) || one.Len() >= len(drawn) {
			t.Fatalf("%d of %d problems, Len says %d", len(all), len(drawn), one.Len())
		}
		var a, b bytes.Buffer
		one.Print(&a, nil)
		other.Print(&b, nil)
		if a.String() != b.String() {
			t.Fatalf("the order of adding shows:\n%s\n%s", a.String(), b.String())
		}
	})
}

// checkPrinted looks for what a terminal would obey or a reader could not see.
func checkPrinted(t interface{ Fatalf(string, ...any) }, out string) {
	if !utf8.ValidString(out) {
		t.Fatalf("not UTF-8: %q", out)
	}
	for _, r := range out {
		if r != '\n' && (!unicode.IsPrint(r) || unicode.Is(inkless, r)) {
			t.Fatalf("%U in %q", r, out)
		}
	}
	for line := range strings.Lines(out) {
		if !strings.HasPrefix(line, indent) {
			continue
		}
		if n := utf8.RuneCountInString(strings.TrimSuffix(line, "\n")); n > len(indent)+shownColumns+1 && !strings.Contains(line, "see ") {
			t.Fatalf("%d characters in %q", n, line)
		}
	}
}

func TestPrintIsHarmless(t *testing.T) {
	t.Parallel()
	rapid.Check(t, func(t *rapid.T) {
		text := rapid.OneOf(
			rapid.SliceOf(rapid.Byte()),
			rapid.Map(rapid.StringOfN(rapid.RuneFrom([]rune("ab\t電\u0301\x1b\u202e\u200b\r\n\ufeff\u3164 ")), 0, 400, -1), func(s string) []byte { return []byte(s) }),
		).Draw(t, "text")
		problems := rapid.SliceOfN(rapid.Custom(drawProblem), 1, 4).Draw(t, "problems")
		for i := range problems {
			problems[i].Place.Column *= rapid.SampledFrom([]int{1, 10, 40}).Draw(t, "stretch")
		}
		src := Sources{"a.yaml": text, "c\x1b.yaml": text, "": text}
		checkPrinted(t, printed(src, problems...))
	})
}

func FuzzPrint(f *testing.F) {
	f.Fuzz(func(t *testing.T, text []byte, line, column, end int, got string) {
		p := Problem{Place: Place{File: "f", Line: line, Column: column, EndColumn: end}, Got: Quote(got), Want: got}
		checkPrinted(t, printed(Sources{"f": text}, p))
	})
}
