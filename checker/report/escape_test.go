package report

import (
	"bytes"
	"html"
	"regexp"
	"strings"
	"testing"

	"github.com/yuin/goldmark"
	"github.com/yuin/goldmark/extension"
	"pgregory.net/rapid"
)

// contexts are the places of a page in which a text from a file stands, with what is
// built there around the text.
var contexts = []struct {
	name          string
	before, after string
	want          string
}{
	{"paragraph", "", "\n", "<p>§</p>\n"},
	{"heading", "# ", "\n", "<h1>§</h1>\n"},
	{"item", "- ", "\n", "<ul>\n<li>§</li>\n</ul>\n"},
	{"numbered item", "1. Please give **", "**: x\n", "<ol>\n<li>Please give <strong>§</strong>: x</li>\n</ol>\n"},
	{"second paragraph", "x\n\n", "\n\nx\n", "<p>x</p>\n<p>§</p>\n<p>x</p>\n"},
	{"line after a line", "x\n\n", "\n", "<p>x</p>\n<p>§</p>\n"},
	{"cell", "| a | b |\n|---|---|\n| ", " | x |\n", "<table>\n<thead>\n<tr>\n<th>a</th>\n<th>b</th>\n</tr>\n</thead>\n<tbody>\n<tr>\n<td>§</td>\n<td>x</td>\n</tr>\n</tbody>\n</table>\n"},
	{"last cell", "| a | b |\n|---|---|\n| x | ", " |\n", "<table>\n<thead>\n<tr>\n<th>a</th>\n<th>b</th>\n</tr>\n</thead>\n<tbody>\n<tr>\n<td>x</td>\n<td>§</td>\n</tr>\n</tbody>\n</table>\n"},
}

// nasty draws texts of the characters that mean something to markdown, and of words.
func nasty() *rapid.Generator[string] {
	piece := rapid.OneOf(
		rapid.SampledFrom([]string{
			"#", "*", "_", "`", "[", "]", "(", ")", "<", ">", "|", "\\", "~", "&", "!", "$", "-", "+", "=", ":", ".", ";", "'", "\"", "@", "{", "}", "%", "^",
			" ", "  ", "1", "12", "x", "x y", "main A", "&#35;", "&lt;", "---", "***", "```", "~~", "<b>", "<!--", "-->", "](", "![", "[ ]", "[x]", "\n", "\r\n", "\t", "\u202e", "\x1b[31m", "配", "é", "e\u0301",
		}),
		rapid.StringMatching(`[a-zA-Z0-9#*_\[\]()<>|\\~&!.+=-]{0,6}`),
	)
	return rapid.Custom(func(t *rapid.T) string {
		return strings.Join(rapid.SliceOfN(piece, 1, 8).Draw(t, "pieces"), "")
	})
}

func htmlOf(t interface{ Fatal(...any) }, source string) string {
	var out bytes.Buffer
	if err := goldmark.New(goldmark.WithExtensions(extension.Table, extension.Strikethrough, extension.TaskList, extension.Footnote)).Convert([]byte(source), &out); err != nil {
		t.Fatal(err)
	}
	return out.String()
}

// TestEscapedTextIsOnlyText: in every place of a page a text is shown as it is, with
// blanks folded and hidden signs written out, and builds nothing.
func TestEscapedTextIsOnlyText(t *testing.T) {
	t.Parallel()
	for _, c := range contexts {
		t.Run(c.name, func(t *testing.T) {
			t.Parallel()
			rapid.Check(t, func(t *rapid.T) {
				text := nasty().Draw(t, "text")
				shown := strings.TrimSpace(visible(text))
				if shown == "" {
					return // a cell or item without a text
				}
				checkShown(t, c.want, htmlOf(t, c.before+md(text)+c.after), shown)
			})
		})
	}
}

func checkShown(t interface {
	Fatal(...any)
	Fatalf(string, ...any)
}, want, got, shown string) {
	before, after, _ := strings.Cut(want, "§")
	inner, ok := strings.CutPrefix(got, before)
	if ok {
		inner, ok = strings.CutSuffix(inner, after)
	}
	if !ok || html.UnescapeString(inner) != shown || strings.ContainsAny(inner, "<>") {
		t.Fatalf("shown is\n%s\nexpected the text %q in\n%s", got, shown, want)
	}
}

// TestCodeIsOnlyText: the same for a code span, but for what cannot stand in it.
func TestCodeIsOnlyText(t *testing.T) {
	t.Parallel()
	replaced := strings.NewReplacer("`", "ˋ", "|", "¦")
	for _, c := range contexts {
		t.Run(c.name, func(t *testing.T) {
			t.Parallel()
			rapid.Check(t, func(t *rapid.T) {
				text := nasty().Draw(t, "text")
				shown := characterReference.ReplaceAllString(replaced.Replace(visible(text)), "＆$1")
				if strings.TrimSpace(shown) == "" {
					return
				}
				want := strings.ReplaceAll(c.want, "§", "<code>§</code>")
				checkShown(t, want, htmlOf(t, c.before+code(text)+c.after), shown)
			})
		})
	}
}

var oneLine = regexp.MustCompile(`[\x00-\x1f\x7f-\x9f\x{2028}\x{2029}\x{202a}-\x{202e}\x{2066}-\x{2069}]`)

// FuzzEscape: no text gets a control character or a line end through.
func FuzzEscape(f *testing.F) {
	for _, seed := range []string{"# x", "a|b", "1. x", "\x1b[31m", "a\nb", "\\", "`", "- x", "\xff", "\u2028"} {
		f.Add(seed)
	}
	f.Fuzz(func(t *testing.T, text string) {
		for name, got := range map[string]string{"md": md(text), "code": code(text), "visible": visible(text)} {
			if found := oneLine.FindString(got); found != "" {
				t.Errorf("%s(%q) has %q", name, text, found)
			}
		}
		if strings.TrimSpace(visible(text)) != "" {
			checkShown(t, contexts[0].want, htmlOf(t, md(text)+"\n"), strings.TrimSpace(visible(text)))
		}
	})
}
