package spec

import (
	"fmt"
	"io/fs"
	"strings"
	"testing"
)

// readText reads a board from memory; the other files are there for its basis.
func readText(text string, others map[string]string) (*Board, string, int) {
	b, src, problems := Read("board.yaml", Options{Root: ".", ReadFile: func(name string) ([]byte, error) {
		if name == "board.yaml" {
			return []byte(text), nil
		}
		if t, ok := others[name]; ok {
			return []byte(t), nil
		}
		return nil, fmt.Errorf("%s: %w", name, fs.ErrNotExist)
	}})
	var out strings.Builder
	problems.Print(&out, src)
	return b, out.String(), problems.Len()
}

func TestHostileInput(t *testing.T) {
	t.Parallel()
	bomb := "title: &a [x, x, x, x, x, x, x, x, x, x]\n"
	for i := 'b'; i < 'i'; i++ {
		bomb += fmt.Sprintf("%c: &%c [%s]\n", i, i, strings.TrimSuffix(strings.Repeat("*"+string(i-1)+", ", 10), ", "))
	}
	for _, c := range []struct{ name, text, want string }{
		{"empty", "", `board.yaml:1: found an empty file, expected a board file; begin with board: and the name of the board`},
		{"comments only", "# nothing\n", `board.yaml:1: found an empty file, expected a board file; begin with board: and the name of the board`},
		{"a list", "- a\n", `board.yaml:1:1: found a list, expected a mapping of keys and values; begin with board: and the name of the board`},
		{"a text", "hello\n", `board.yaml:1:1: found "hello", expected a mapping of keys and values; begin with board: and the name of the board`},
		{"too large", "board: B\n" + strings.Repeat("# padding\n", largestFile/10), `board.yaml: found a file of more than 4 MiB, expected at most 4 MiB; give each board a file of its own and put what they share into a basis`},
		{"too deep", "board: B\ntitle: " + strings.Repeat("[", 70) + strings.Repeat("]", 70) + "\n", `board.yaml:2:72: found values nested more than 64 deep, expected a few levels`},
		{"alias of itself", "board: B\ntitle: &a [*a]\n", `board.yaml:2:12: found an alias of the part it stands in, expected a value; write the value out`},
		{"alias bomb", "board: B\n" + bomb, "found more than 100000 values, repeated ones included, expected a board file of ordinary size; take out the aliases that repeat large parts, or use like: and basis:"},
		{"unknown alias", "board: B\ntitle: *gone\n", `board.yaml:2:8: found the alias "*gone", which is defined nowhere above, expected a value; write the value out, or put it between quotes if the * belongs to it`},
		{"repeated key", "board: B\ntitle: a\ntitle: b\n", `board.yaml:3:1: found "title" a second time; it stands already in line 2, expected each key once; keep one of the two`},
		{"second document", "board: B\n---\nboard: C\n", `board.yaml:2:1: found a second document in the file, expected one board; give each board a file of its own, or delete the line ---`},
		{"not UTF-8", "board: B\ntitle: caf\xe9\n", `board.yaml:2:11: found the byte 0xe9, which is not UTF-8, expected UTF-8 text; save the file in the encoding UTF-8`},
		{"raw escape", "board: B\ntitle: \x1b[31m\n", `board.yaml:2:8: found a control character, U+001B, expected letters, digits and signs that can be seen; delete the character`},
		{"escaped escape", "board: B\ntitle: \"\\x1b[31m\"\n", `board.yaml:2:8: found a control character, U+001B, expected letters, digits and signs that can be seen; delete the character`},
		{"escaped in a key", "board: B\n\"ti\\u202etle\": a\n", `board.yaml:2:1: found an invisible character that changes the direction or the lines of text, U+202E, expected letters, digits and signs that can be seen; delete the character`},
		{"override in a comment", "board: B # \u202e\n", `board.yaml:1:12: found an invisible character that changes the direction or the lines of text, U+202E, expected letters, digits and signs that can be seen; delete the character`},
		{"direction mark", "board: \u200fB\n", `U+200F`},
		{"isolate", "board: B\u2066\n", `U+2066`},
		{"next line", "board: B\u0085\n", `found a control character, U+0085`},
		{"delete", "board: B\x7f\n", `found a control character, U+007F`},
		{"custom tag", "board: !ship B\n", `board.yaml:1:8: found a tag "!ship", expected a value without tag; delete the tag and keep the value`},
		{"library tag", "board: B\ntitle: !!python/object:os.system x\n", `board.yaml:2:8: found a tag "!!python/object:os.system", expected a value without tag; delete the tag and keep the value`},
		{"plain tag", "board: B\ntitle: !!str 12\n", `board.yaml:2:8: found a tag "!!str"`},
		{"merge key", "board: B\n<<: {title: a}\n", `board.yaml:2:1: found the merge key "<<", expected keys of the vocabulary; write like: with the name of the entry to copy, or basis: with the file to build on`},
		{"list as key", "board: B\n? [a, b]\n: c\n", `board.yaml:2:3: found a key that is a list, a mapping or an alias, expected a plain key`},
		{"empty key", "board: B\n\"\": c\n", `board.yaml:2:1: found an empty key, expected a key in front of the colon`},
		{"tab", "board: B\ndocuments:\n\tD1: {title: a}\n", `board.yaml:3:2: found "D1: {title: a}", expected a line indented with blanks; replace the tabs at the beginning of the line by blanks`},
		{"colon in a text", "board: B\ntitle: a: b\n", `board.yaml:2:1: found "title: a: b", expected one key and one value on a line; put a text that contains ": " between quotes, and check the indent of the line above`},
		{"open bracket", "board: B\ntitle: [a\n", `board.yaml:2:1: found "title: [a", expected a closing ] for each [; close the list, or put the text between quotes`},
		{"open brace", "board: B\ntitle: {a: b\n", `board.yaml:2:1: found "title: {a: b", expected a closing } for each {; close the mapping, or put the text between quotes`},
		{"open quote", "board: B\ntitle: \"a\n", `expected a closing quote; close the text with the quote it begins with`},
		{"percent sign", "board: B\ntitle: %a\n", `board.yaml:2:1: found "title: %a", expected a value; put a text that begins with % between quotes`},
		{"no colon", "board: B\ntitle\nrevision: C\n", `board.yaml:2:1: found "title", expected a key, a colon, a blank and a value; check the indent and the colon of this line and the one above`},
		{"wrong indent", "board: B\ndocuments:\n    D1: {title: a}\n  D2: {title: b}\n", `board.yaml:4:3: found "D2: {title: b}", expected a line that follows the indent of the lines above; check indent, colons, quotes and brackets of this line and the one above`},
		{"no board", "title: a\n", `board.yaml:1:1: found no key "board", expected the name of the board; write board: with the name of the board`},
	} {
		t.Run(c.name, func(t *testing.T) {
			t.Parallel()
			_, printed, n := readText(c.text, nil)
			if n != 1 || !strings.Contains(strings.SplitN(printed, "\n", 2)[0], c.want) {
				t.Errorf("got %d problems, want the one\n%s\ngot\n%s", n, c.want, printed)
			}
		})
	}
}

func TestHarmlessInput(t *testing.T) {
	t.Parallel()
	for name, text := range map[string]string{
		"byte order mark": "\ufeffboard: B\n", "line ends of two": "board: B\r\ntitle: a\r\n", "old line ends": "board: B\rtitle: a\r",
		"document marks": "---\nboard: B\n...\n", "quotes": "\"board\": 'B'\n", "alias": "board: &b B\ntitle: *b\n",
		"umlauts": "board: B\ntitle: Schalttafel für Süd\n",
	} {
		t.Run(name, func(t *testing.T) {
			t.Parallel()
			b, printed, n := readText(text, nil)
			if n != 0 || b.Board.Value != "B" {
				t.Errorf("got %q and the problems %s", b.Board.Value, printed)
			}
		})
	}
}

// A file of a few kilobytes must not be able to ask for much memory or time.
func TestHostileSize(t *testing.T) {
	t.Parallel()
	wide := &strings.Builder{}
	wide.WriteString("board: B\nunits:\n")
	for i := range 30_000 {
		fmt.Fprintf(wide, "  U%d: {like: U%d}\n", i, i+1)
	}
	oneLine := "board: B\ntitle: [" + strings.Repeat("ä, ", 90_000) + "x]\n"
	many := "board: B\n" + strings.Repeat("title: a\n", 20_000)
	for name, text := range map[string]string{"entries that copy each other": wide.String(), "one line": oneLine, "repeated keys": many} {
		t.Run(name, func(t *testing.T) {
			t.Parallel()
			if _, _, n := readText(text, nil); n == 0 {
				t.Error("no problem")
			}
		})
	}
}
