package report_test

import (
	"bytes"
	"context"
	"encoding/json"
	"fmt"
	"html"
	"io"
	"os"
	"path/filepath"
	"regexp"
	"slices"
	"strings"
	"sync"
	"testing"
	"time"
	"unicode"
	"unicode/utf8"

	"github.com/charmbracelet/x/ansi"
	"github.com/yuin/goldmark"
	"github.com/yuin/goldmark/ast"
	"github.com/yuin/goldmark/extension"
	"github.com/yuin/goldmark/text"

	"boardproof/checker/facts"
	"boardproof/checker/report"
	"boardproof/checker/review"
	"boardproof/checker/rules"
	"boardproof/checker/spec"
)

// hostile is a text that means something to a program that reads our output.
type hostile struct{ name, text string }

// hostileTexts are those of testdata/hostile, and those that cannot be seen in a file.
func hostileTexts(t *testing.T) []hostile {
	t.Helper()
	data, err := os.ReadFile("../../testdata/hostile/texts.tsv")
	if err != nil {
		t.Fatal(err)
	}
	list := []hostile{
		{"one long word", strings.Repeat("X", 300)},
		{"a long word of wide signs", strings.Repeat("配電盤", 100)},
		{"a long path", strings.Repeat("a/b-c_", 50)},
		{"hidden signs", "a\u200bb\u00adc\u061cd\u2060e\ufefff\U000e0041g"},
		{"blanks", "a\u00a0b\u2003c\u3000d   e"},
	}
	for line := range strings.Lines(string(data)) {
		line = strings.TrimSuffix(line, "\n")
		if line == "" || strings.HasPrefix(line, "# ") {
			continue
		}
		name, text, ok := strings.Cut(line, "\t")
		if !ok {
			t.Fatalf("texts.tsv: the line %q has no tab", line)
		}
		list = append(list, hostile{name, text})
	}
	return list
}

// tame is put where a hostile text will stand; the report must have the same build.
const tame = "tame words"

// nameSlots are the marks of board.yaml that are names of entries, which may not hold
// all characters; the other marks are free text.
var nameSlots = []string{"document", "source", "section", "bars", "riser", "incomer", "feeder", "relay", "release"}

var slot = regexp.MustCompile(`«([a-z ]+)»`)

// arrangement puts a text and the mark of its place, which must not get lost, into
// one line.
type arrangement struct {
	name string
	put  func(text, mark string) string
}

var arrangements = []arrangement{
	{"at the beginning", func(text, mark string) string { return text + " " + mark }},
	{"at the end", func(text, mark string) string { return mark + " " + text }},
}

// markOf is a word that stands for a place of board.yaml and for nothing else.
func markOf(place string) string { return "Zq" + strings.ReplaceAll(place, " ", "") + "qZ" }

// valueAt is what stands at a mark of board.yaml.
func valueAt(place, what string, as arrangement) string {
	if slices.Contains(nameSlots, place) {
		what = strings.Map(func(r rune) rune {
			if strings.ContainsRune(".[]{}\"\\", r) {
				return -1
			}
			return r
		}, what)
		for utf8.RuneCountInString(what) > 55 {
			_, size := utf8.DecodeLastRuneInString(what)
			what = what[:len(what)-size]
		}
	}
	return strings.TrimSpace(as.put(strings.TrimSpace(what), markOf(place)))
}

// boardWith is board.yaml with a text in every place.
func boardWith(t *testing.T, what string, as arrangement) string {
	t.Helper()
	data, err := os.ReadFile("../../testdata/hostile/board.yaml")
	if err != nil {
		t.Fatal(err)
	}
	return slot.ReplaceAllStringFunc(string(data), func(found string) string {
		place := slot.FindStringSubmatch(found)[1]
		if place == "comment" {
			return what
		}
		return strings.NewReplacer(`\`, `\\`, `"`, `\"`).Replace(valueAt(place, what, as))
	})
}

var library = sync.OnceValues(func() (*rules.Pack, error) {
	pack, problems := rules.LoadOwn(facts.Terms(), rules.Options{})
	if problems.Len() > 0 {
		return nil, fmt.Errorf("the library cannot be used: %v", problems.All()[0])
	}
	return pack, nil
})

// reviewOf reviews the text of a board file.
func reviewOf(t *testing.T, name, text string, cures bool) *review.Review {
	t.Helper()
	pack, err := library()
	if err != nil {
		t.Fatal(err)
	}
	board, _, problems := spec.Read(name, spec.Options{ReadFile: func(string) ([]byte, error) { return []byte(text), nil }})
	if problems.Len() > 0 {
		t.Fatalf("the board cannot be read: %v", problems.All()[0])
	}
	on := time.Date(2026, 12, 1, 0, 0, 0, 0, time.UTC)
	reviews, err := review.Make(context.Background(), pack, []*spec.Board{board}, review.Options{On: on, Cures: cures})
	if err != nil {
		t.Fatal(err)
	}
	return reviews[0]
}

func set(t *testing.T, write func(io.Writer) error) string {
	t.Helper()
	var out bytes.Buffer
	if err := write(&out); err != nil {
		t.Fatal(err)
	}
	return out.String()
}

func markdownOf(t *testing.T, r *review.Review) string {
	t.Helper()
	return set(t, func(w io.Writer) error { return report.Markdown(w, r) })
}

// reader is markdown as the places that show a report read it: tables, bare
// addresses, struck text, tasks and footnotes.
func reader() goldmark.Markdown {
	return goldmark.New(goldmark.WithExtensions(extension.GFM, extension.Footnote))
}

// build is the build of a page without its words: kinds of blocks and spans in
// order, levels of headings, breaks of lines.
func build(source string) []string {
	var list []string
	root := reader().Parser().Parse(text.NewReader([]byte(source)))
	_ = ast.Walk(root, func(n ast.Node, entering bool) (ast.WalkStatus, error) {
		if !entering {
			return ast.WalkContinue, nil
		}
		switch n := n.(type) {
		case *ast.Text:
			if n.HardLineBreak() {
				list = append(list, "hard break")
			}
		case *ast.String:
		case *ast.Heading:
			list = append(list, fmt.Sprintf("%s %d", n.Kind(), n.Level))
		default:
			list = append(list, n.Kind().String())
		}
		return ast.WalkContinue, nil
	})
	return list
}

// forbiddenKinds never stand in a report: nothing in it is followed, loaded or run.
var forbiddenKinds = []string{"Link", "AutoLink", "Image", "RawHTML", "HTMLBlock", "FencedCodeBlock", "CodeBlock", "Blockquote", "TaskCheckBox", "Strikethrough", "Footnote", "FootnoteLink"}

func page(t *testing.T, source string) string {
	t.Helper()
	return set(t, func(w io.Writer) error { return reader().Convert([]byte(source), w) })
}

var tag = regexp.MustCompile(`<[^>]*>`)

// words is what a reader of the page sees.
func words(page string) string { return html.UnescapeString(tag.ReplaceAllString(page, "")) }

var firstHeading = regexp.MustCompile(`(?s)<h1[^>]*>(.*?)</h1>`)

// cells counts the cells of each row of each table in the source; the parser fills
// rows up and drops surplus cells, so that it cannot be asked.
func cells(source string) []string {
	var list []string
	for _, line := range strings.Split(source, "\n") {
		if strings.HasPrefix(line, "|") {
			list = append(list, fmt.Sprint(strings.Count(strings.ReplaceAll(strings.ReplaceAll(line, `\\`, ""), `\|`, ""), "|")))
		}
	}
	return list
}

func different(got, want []string) string {
	for i := range max(len(got), len(want)) {
		a, b := "(end)", "(end)"
		if i < len(got) {
			a = got[i]
		}
		if i < len(want) {
			b = want[i]
		}
		if a != b {
			return fmt.Sprintf("part %d is %s instead of %s", i+1, a, b)
		}
	}
	return ""
}

// TestHostileMarkdown: a hostile text changes the words of a report and nothing else.
func TestHostileMarkdown(t *testing.T) {
	t.Parallel()
	for i, as := range arrangements {
		cures := i == 0 // they cost most of the time, and name the same things
		plain := markdownOf(t, reviewOf(t, "board.yaml", boardWith(t, tame, as), cures))
		wantBuild, wantCells, wantWords := build(plain), cells(plain), words(page(t, plain))
		for _, c := range hostileTexts(t) {
			t.Run(c.name+" "+as.name, func(t *testing.T) {
				t.Parallel()
				got := markdownOf(t, reviewOf(t, "board.yaml", boardWith(t, c.text, as), cures))
				kinds := build(got)
				for _, kind := range forbiddenKinds {
					if slices.Contains(kinds, kind) {
						t.Errorf("the report has a %s", kind)
					}
				}
				if difference := different(kinds, wantBuild); difference != "" {
					t.Errorf("the report is built in another way: %s", difference)
				}
				if difference := different(cells(got), wantCells); difference != "" {
					t.Errorf("a row has another number of cells: %s", difference)
				}
				set := page(t, got)
				heading := firstHeading.FindStringSubmatch(set)
				if heading == nil {
					t.Fatal("the report has no heading")
				}
				if want := headingOf(c.text, as); words(heading[1]) != want {
					t.Errorf("the heading says\n%s\ninstead of\n%s", words(heading[1]), want)
				}
				seen := words(set)
				for _, place := range places(t) {
					mark := markOf(place)
					if n, want := strings.Count(seen, mark), strings.Count(wantWords, mark); n != want {
						t.Errorf("the text at «%s» is seen %d times instead of %d", place, n, want)
					}
				}
				checkVisible(t, got)
			})
		}
	}
}

// places are the marks of board.yaml without its comments.
func places(t *testing.T) []string {
	t.Helper()
	data, err := os.ReadFile("../../testdata/hostile/board.yaml")
	if err != nil {
		t.Fatal(err)
	}
	var list []string
	for _, found := range slot.FindAllStringSubmatch(string(data), -1) {
		if found[1] != "comment" && !slices.Contains(list, found[1]) {
			list = append(list, found[1])
		}
	}
	return list
}

// headingOf is the first heading in the words of the file: blanks are folded and
// hidden signs are written out.
func headingOf(what string, as arrangement) string {
	parts := make([]string, 0, 3)
	for i, place := range []string{"board", "revision", "title"} {
		part := seen(valueAt(place, what, as))
		if i == 1 {
			part = "revision " + part
		}
		parts = append(parts, part)
	}
	return "Review of " + strings.Join(parts, ", ")
}

func seen(what string) string {
	var out strings.Builder
	folded := strings.NewReplacer("::", ": :", "##[", "# #[").Replace(strings.Join(strings.Fields(what), " "))
	for _, r := range folded {
		switch {
		case r > 0xffff && !unicode.IsPrint(r):
			fmt.Fprintf(&out, `\U%08x`, r)
		case !unicode.IsPrint(r):
			fmt.Fprintf(&out, `\u%04x`, r)
		default:
			out.WriteRune(r)
		}
	}
	return out.String()
}

// checkVisible refuses everything that a terminal obeys or a reader cannot see.
func checkVisible(t *testing.T, output string) {
	t.Helper()
	for i, line := range strings.Split(output, "\n") {
		for _, r := range line {
			if unicode.IsControl(r) || unicode.Is(unicode.Cf, r) || r == '\u2028' || r == '\u2029' || r == utf8.RuneError {
				t.Errorf("line %d has the character U+%04X: %q", i+1, r, line)
				return
			}
		}
		if strings.HasPrefix(strings.TrimSpace(line), "::") {
			t.Errorf("line %d would be a command to a build server: %s", i+1, line)
			return
		}
	}
}

// TestHostileTerminal: no control character, no line that the terminal would fold,
// nothing lost.
func TestHostileTerminal(t *testing.T) {
	t.Parallel()
	const width = 80
	as := arrangements[0]
	for _, c := range append(hostileTexts(t), hostile{"tame", tame}) {
		t.Run(c.name, func(t *testing.T) {
			t.Parallel()
			r := reviewOf(t, "board.yaml", boardWith(t, c.text, as), false)
			got := set(t, func(w io.Writer) error { return report.Terminal(w, r, width, false) })
			checkVisible(t, got)
			wide := 0
			for i, line := range strings.Split(got, "\n") {
				if columns := ansi.StringWidth(line); columns > width {
					if wide++; wide <= 3 {
						t.Errorf("line %d has %d columns: %s", i+1, columns, line)
					}
				}
			}
			squeezed := squeeze(got)
			for _, place := range []string{"board", "title", "revision", "tenderer", "bars", "riser"} {
				if want := seen(valueAt(place, c.text, as)); !strings.Contains(squeezed, squeeze(want)) {
					t.Errorf("the text at «%s» is not seen as it is, %s", place, want)
				}
			}
			coloured := set(t, func(w io.Writer) error { return report.Terminal(w, r, width, true) })
			if difference := different(trimmed(ansi.Strip(coloured)), trimmed(got)); difference != "" {
				t.Errorf("with colour it says something else: %s", difference)
			}
		})
	}
}

func squeeze(text string) string { return strings.Join(strings.Fields(text), "") }

// trimmed is the lines without the blanks at their ends.
func trimmed(text string) []string {
	lines := strings.Split(text, "\n")
	for i, line := range lines {
		lines[i] = strings.TrimRight(line, " ")
	}
	return lines
}

// TestHostileJSON: the document is JSON, and holds the texts as they are in the file.
func TestHostileJSON(t *testing.T) {
	t.Parallel()
	as := arrangements[1]
	for _, c := range hostileTexts(t) {
		t.Run(c.name, func(t *testing.T) {
			t.Parallel()
			r := reviewOf(t, "board.yaml", boardWith(t, c.text, as), false)
			var doc struct {
				Boards []struct {
					Board, Title, Revision string
					OfferedBy              string `json:"offered_by"`
					Verdicts               []struct{ Subject string }
				}
			}
			written := set(t, func(w io.Writer) error { return report.JSON(w, []*review.Review{r}) })
			if err := json.Unmarshal([]byte(written), &doc); err != nil {
				t.Fatal(err)
			}
			b := doc.Boards[0]
			for place, got := range map[string]string{"board": b.Board, "title": b.Title, "revision": b.Revision, "tenderer": b.OfferedBy} {
				if want := valueAt(place, c.text, as); got != want {
					t.Errorf("«%s» is %q instead of %q", place, got, want)
				}
			}
			if bars := valueAt("bars", c.text, as); !slices.ContainsFunc(b.Verdicts, func(v struct{ Subject string }) bool { return v.Subject == bars }) {
				t.Errorf("no verdict is of the bars %q", bars)
			}
			var sheet struct{ Board string }
			written = set(t, func(w io.Writer) error { return report.WorksheetJSON(w, r.Facts, report.Chosen{}) })
			if err := json.Unmarshal([]byte(written), &sheet); err != nil {
				t.Fatal(err)
			}
			if sheet.Board != b.Board {
				t.Errorf("the worksheet is of %q instead of %q", sheet.Board, b.Board)
			}
		})
	}
}

// TestHostileWorksheet: the worksheet and the chain of every number can be printed on
// a terminal.
func TestHostileWorksheet(t *testing.T) {
	t.Parallel()
	as := arrangements[0]
	for _, c := range hostileTexts(t) {
		t.Run(c.name, func(t *testing.T) {
			t.Parallel()
			r := reviewOf(t, "board.yaml", boardWith(t, c.text, as), false)
			checkVisible(t, set(t, func(w io.Writer) error { return report.Worksheet(w, r.Facts) }))
			for _, s := range r.Facts.Subjects {
				if s.Kind == facts.Units || s.Kind == facts.Busbars && s.ID != valueAt("riser", c.text, as) {
					continue
				}
				for _, f := range s.Facts() {
					checkVisible(t, set(t, func(w io.Writer) error { return report.Chain(w, s, f) }))
				}
			}
		})
	}
}

// TestHostileFileName: the name of a file is text as well.
func TestHostileFileName(t *testing.T) {
	t.Parallel()
	as := arrangements[0]
	plain := markdownOf(t, reviewOf(t, "tame/board.yaml", boardWith(t, tame, as), false))
	for _, name := range []string{
		"# x.yaml", "a|b.yaml", "`a`.yaml", "**a**.yaml", "<script>.yaml", "[a](b).yaml", "a_b_c.yaml", "'; touch pwned; '.yaml", "a b.yaml", "::error::x.yaml", "\x1b[31m.yaml", "a\nb.yaml", "\u202e.yaml",
	} {
		t.Run(name, func(t *testing.T) {
			t.Parallel()
			r := reviewOf(t, filepath.ToSlash("tame/"+name), boardWith(t, tame, as), false)
			got := markdownOf(t, r)
			if difference := different(build(got), build(plain)); difference != "" {
				t.Errorf("the report is built in another way: %s", difference)
			}
			checkVisible(t, got)
			checkVisible(t, set(t, func(w io.Writer) error { return report.Terminal(w, r, 80, false) }))
			checkVisible(t, set(t, func(w io.Writer) error { return report.Worksheet(w, r.Facts) }))
		})
	}
}

var byHand = regexp.MustCompile("Check by hand: `([^`]*)`")

// TestCommandToCheckByHand: the command that a report gives can be pasted into a
// shell: it is five words, whatever the names of file and subject are.
func TestCommandToCheckByHand(t *testing.T) {
	t.Parallel()
	for _, c := range []struct{ file, bars string }{
		{"board.yaml", "main A"},
		{"board.yaml", "operator's bars"},
		{"board.yaml", "'; touch pwned; '"},
		{"board.yaml", "$(touch pwned)"},
		{"board.yaml", "-h"},
		{"my boards/board.yaml", "main A"},
		{"a; touch pwned;.yaml", "main A"},
		{"$(touch pwned).yaml", "main A"},
	} {
		t.Run(c.file+" "+c.bars, func(t *testing.T) {
			t.Parallel()
			text := strings.ReplaceAll(boardWith(t, "", arrangement{put: func(_, mark string) string { return mark }}), markOf("bars"), c.bars)
			commands := byHand.FindAllStringSubmatch(markdownOf(t, reviewOf(t, c.file, text, false)), -1)
			if len(commands) == 0 {
				t.Fatal("the report gives no command")
			}
			found := false
			for _, m := range commands {
				got, ok := shellWords(m[1])
				if !ok || len(got) < 5 || got[0] != "boardproof" || got[1] != "worksheet" || !slices.Contains(got, c.file) {
					t.Errorf("a shell reads %q of %s", got, m[1])
					continue
				}
				found = found || slices.Contains(got, c.bars)
			}
			if !found {
				t.Errorf("no command is about the bars %q: %q", c.bars, commands)
			}
		})
	}
}

// shellWords splits a command as a shell does; it is not ok where the shell would do
// more than split.
func shellWords(command string) (list []string, ok bool) {
	var word strings.Builder
	inWord := false
	for i := 0; i < len(command); i++ {
		switch c := command[i]; {
		case c == ' ':
			if inWord {
				list = append(list, word.String())
				word.Reset()
				inWord = false
			}
		case c == '\'':
			end := strings.IndexByte(command[i+1:], '\'')
			if end < 0 {
				return list, false
			}
			word.WriteString(command[i+1 : i+1+end])
			i += end + 1
			inWord = true
		case c == '\\' && i+1 < len(command):
			i++
			word.WriteByte(command[i])
			inWord = true
		case strings.IndexByte("\"$`;&|<>()*?[]#~!{}", c) >= 0:
			return list, false
		default:
			word.WriteByte(c)
			inWord = true
		}
	}
	if inWord {
		list = append(list, word.String())
	}
	return list, true
}
