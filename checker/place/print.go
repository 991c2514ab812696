package place

import (
	"bytes"
	"io"
	"strings"
	"unicode/utf8"
)

// Sources holds the text of files by the name their places carry.
type Sources map[string][]byte

const (
	indent       = "    "
	shownColumns = 100 // how much of a long line is printed
	tabStop      = 4
)

// Print writes the problems sorted and without duplicates. For each: place and sentence; the line of
// the file, where src has it, with a caret line under the columns; the related places.
//
//	board.yaml:3:18: found "65", expected a current with its unit; write "65 kA"
//	      rated_current: 65
//	                     ^^
//
// Lines longer than 100 columns are cut around the caret. Tabs are printed as spaces, wide
// characters count two columns, and what cannot be printed is escaped. Errors of w are not reported.
func (ps *Problems) Print(w io.Writer, src Sources) {
	lines := map[string][][]byte{}
	var out bytes.Buffer
	for _, p := range ps.All() {
		out.WriteString(p.line() + "\n")
		if text, ok := sourceLine(lines, src, p.Place); ok {
			out.WriteString(excerpt(text, p.Place.Column, p.Place.EndColumn))
		}
		for _, r := range p.Related {
			out.WriteString(indent + "see " + r.String() + "\n")
		}
	}
	_, _ = w.Write(out.Bytes())
}

// sourceLine returns the line of p; lines remembers the files already split.
func sourceLine(lines map[string][][]byte, src Sources, p Place) ([]byte, bool) {
	text, known := src[p.File]
	if !known || p.Line < 1 || p.Sheet != "" {
		return nil, false
	}
	if _, split := lines[p.File]; !split {
		lines[p.File] = splitLines(text)
	}
	if p.Line > len(lines[p.File]) {
		return nil, false
	}
	return lines[p.File][p.Line-1], true
}

// splitLines cuts at LF, CR LF and CR. A byte order mark is no character of the first line.
func splitLines(text []byte) [][]byte {
	text = bytes.TrimPrefix(text, []byte("\ufeff"))
	text = bytes.ReplaceAll(text, []byte("\r\n"), []byte("\n"))
	text = bytes.ReplaceAll(text, []byte("\r"), []byte("\n"))
	return bytes.Split(text, []byte("\n"))
}

// A cell is what one character of the source becomes on the page.
type cell struct {
	text  string
	width int
}

func cellsOf(line []byte) []cell {
	var cells []cell
	column := 0
	for len(line) > 0 {
		r, size := utf8.DecodeRune(line)
		c := cell{width: 1}
		switch {
		case r == '\t':
			c.width = tabStop - column%tabStop
			c.text = strings.Repeat(" ", c.width)
		case r == utf8.RuneError && size == 1:
			c.text = escapedByte(line[0])
			c.width = len(c.text)
		case hidden(r):
			c.text = escaped(r)
			c.width = len(c.text)
		default:
			c.text, c.width = string(r), width(r)
		}
		cells = append(cells, c)
		column += c.width
		line = line[size:]
	}
	return cells
}

// excerpt returns the line and, where the column is known, the caret line under [column, end).
func excerpt(line []byte, column, end int) string {
	cells := cellsOf(line)
	first := min(max(column-1, 0), len(cells))
	past := min(max(end-1, first+1), max(len(cells), first+1))
	from, to := window(cells, first, past)

	var text, carets strings.Builder
	if from > 0 {
		text.WriteString("…")
		carets.WriteString(" ")
	}
	for i := from; i < to; i++ {
		text.WriteString(cells[i].text)
		mark := " "
		if i >= first && i < past {
			mark = "^"
		}
		carets.WriteString(strings.Repeat(mark, cells[i].width))
	}
	if first == len(cells) { // just behind the line: something is missing there
		carets.WriteString("^")
	}
	if to < len(cells) {
		text.WriteString("…")
	}
	lead := indent
	if line := strings.TrimLeft(text.String(), " "); strings.HasPrefix(line, "::") || strings.HasPrefix(line, "##[") {
		lead = "  | " // some build servers take such a line for a command
	}
	s := lead + strings.TrimRight(text.String(), " ") + "\n"
	if marks := strings.TrimRight(carets.String(), " "); column > 0 && marks != "" {
		s += indent + marks + "\n"
	}
	return s
}

// window returns the range of cells to print: all of them, or about a hundred columns with the
// marked ones in the middle, or the beginning of the marked ones where they are more.
func window(cells []cell, first, past int) (from, to int) {
	total := 0
	for _, c := range cells {
		total += cost(c)
	}
	if total <= shownColumns {
		return 0, len(cells)
	}
	from, to = first, first
	room := shownColumns - 2 // for the two signs of omission
	for to < past && to < len(cells) && cost(cells[to]) <= room {
		room -= cost(cells[to])
		to++
	}
	for grown := true; grown; {
		grown = false
		if from > 0 && cost(cells[from-1]) <= room {
			from--
			room -= cost(cells[from])
			grown = true
		}
		if to < len(cells) && cost(cells[to]) <= room {
			room -= cost(cells[to])
			to++
			grown = true
		}
	}
	return from, to
}

// cost counts a combining mark as a column, so that a line of nothing else is cut as well.
func cost(c cell) int { return max(c.width, 1) }
