package spec

import (
	"bytes"
	"fmt"
	"strings"
	"unicode/utf8"

	"boardproof/checker/place"
)

// largestFile is the number of bytes a file may have; a board of a hundred units has about a tenth.
const largestFile = 4 << 20

// A sourceText is a file that was found to be harmless text.
type sourceText struct {
	name   string
	data   []byte // without byte order mark
	lines  []string
	starts map[int][]int // of the characters of a line, by line
}

// checkText refuses what is no plain text and cuts the rest into lines. It reports the first fault
// only: what follows a wrong byte is seldom worth reading.
func checkText(name string, data []byte, problems *place.Problems) (*sourceText, bool) {
	if len(data) > largestFile {
		problems.Add(place.Problem{Place: place.Place{File: name}, Kind: place.TooLarge,
			Got: fmt.Sprintf("a file of more than %d MiB", largestFile>>20), Want: fmt.Sprintf("at most %d MiB", largestFile>>20),
			Hint: "give each board a file of its own and put what they share into a basis"})
		return nil, false
	}
	data = bytes.TrimPrefix(data, []byte("\ufeff"))
	line, column := 1, 1
	for i := 0; i < len(data); {
		r, size := rune(data[i]), 1
		if r >= utf8.RuneSelf {
			r, size = utf8.DecodeRune(data[i:])
		}
		at := place.Place{File: name, Line: line, Column: column, EndColumn: column + 1}
		switch {
		case r == utf8.RuneError && size == 1:
			problems.Add(place.Problem{Place: at, Kind: place.NotUTF8, Got: fmt.Sprintf("the byte 0x%02x, which is not UTF-8", data[i]),
				Want: "UTF-8 text", Hint: "save the file in the encoding UTF-8"})
			return nil, false
		case forbidden(r):
			problems.Add(controlCharacter(at, "", r))
			return nil, false
		case r == '\n' || r == '\r' && (i+1 == len(data) || data[i+1] != '\n'):
			line, column = line+1, 1
		default:
			column++
		}
		i += size
	}
	text := strings.ReplaceAll(strings.ReplaceAll(string(data), "\r\n", "\n"), "\r", "\n")
	return &sourceText{name: name, data: data, lines: strings.Split(text, "\n")}, true
}

// forbidden tells whether a character could deceive the eye or a terminal: the control characters
// C0 (without tab and line ends), DEL and C1, the line and paragraph separators, which YAML takes
// for line ends, and the marks, embeddings, overrides and isolates of bidirectional text.
func forbidden(r rune) bool {
	switch {
	case r == '\t' || r == '\n' || r == '\r':
		return false
	case r < 0x20 || 0x7f <= r && r <= 0x9f:
		return true
	}
	return 0x200e <= r && r <= 0x200f || 0x2028 <= r && r <= 0x202e || 0x2066 <= r && r <= 0x2069
}

func controlCharacter(at place.Place, path string, r rune) place.Problem {
	what := "a control character"
	if r > 0x9f {
		what = "an invisible character that changes the direction or the lines of text"
	}
	return place.Problem{Place: at, Path: path, Kind: place.ControlCharacter, Got: fmt.Sprintf("%s, U+%04X", what, r),
		Want: "letters, digits and signs that can be seen", Hint: "delete the character"}
}

// line returns a line of the file, counted from 1; empty beyond its end.
func (s *sourceText) line(number int) string {
	if number < 1 || number > len(s.lines) {
		return ""
	}
	return s.lines[number-1]
}

// longLine is the number of bytes from which the starts of characters are worth remembering.
const longLine = 500

// from returns the text of a line from a column on, counted in characters from 1. The starts of the
// characters of a long line are remembered, so that many values on one line take no longer.
func (s *sourceText) from(line, column int) string {
	text := s.line(line)
	if len(text) < longLine {
		for ; column > 1 && text != ""; column-- {
			_, size := utf8.DecodeRuneInString(text)
			text = text[size:]
		}
		return text
	}
	starts, known := s.starts[line]
	if !known {
		for i := range text {
			starts = append(starts, i)
		}
		if s.starts == nil {
			s.starts = map[int][]int{}
		}
		s.starts[line] = starts
	}
	if column < 1 || column > len(starts) {
		return ""
	}
	return text[starts[column-1]:]
}
