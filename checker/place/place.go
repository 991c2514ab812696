package place

import (
	"cmp"
	"strconv"
	"strings"
)

// A Place is a position in the input: a span of a line in a text file, or a cell of a schedule.
// The zero value is no place.
type Place struct {
	File      string // slash path as it was given
	Line      int    // from 1; 0 unknown
	Column    int    // in characters (Unicode code points) from 1; 0 unknown
	EndColumn int    // one past the last character; 0 unknown
	Sheet     string // sheet of a workbook; empty for a text file
	Cell      string // cell of the sheet, e.g. "C14"
}

// String returns the place in one of these forms:
//
//	file:line:column
//	file:line
//	file
//	file!Sheet!C14
//	file!Sheet
//	line:column      without file
//	line             without file
//	-                nothing known
//
// Characters of the names that cannot be printed are escaped.
func (p Place) String() string {
	parts := []string{}
	if p.File != "" {
		parts = append(parts, Visible(p.File))
	}
	if p.Sheet != "" || p.Cell != "" {
		parts = append(parts, Visible(p.Sheet))
		if p.Cell != "" {
			parts = append(parts, Visible(p.Cell))
		}
		return strings.Join(parts, "!")
	}
	if p.Line > 0 {
		parts = append(parts, strconv.Itoa(p.Line))
		if p.Column > 0 {
			parts = append(parts, strconv.Itoa(p.Column))
		}
	}
	if len(parts) == 0 {
		return "-"
	}
	return strings.Join(parts, ":")
}

// IsZero tells whether nothing is known of the place.
func (p Place) IsZero() bool { return p == Place{} }

// Compare orders places by file, sheet, line, column and end; cells by row, then column. It returns
// -1, 0 or +1, and 0 for equal places only.
func Compare(a, b Place) int {
	rowA, columnA := cellOrder(a.Cell)
	rowB, columnB := cellOrder(b.Cell)
	return cmp.Or(
		cmp.Compare(a.File, b.File),
		cmp.Compare(a.Sheet, b.Sheet),
		cmp.Compare(a.Line, b.Line),
		cmp.Compare(a.Column, b.Column),
		cmp.Compare(a.EndColumn, b.EndColumn),
		cmp.Compare(rowA, rowB),
		cmp.Compare(columnA, columnB),
		cmp.Compare(a.Cell, b.Cell),
	)
}

// cellOrder reads "C14" as row 14, column 3; what is no cell sorts before all cells.
func cellOrder(cell string) (row, column int) {
	letters := 0
	for letters < len(cell) && 'A' <= cell[letters] && cell[letters] <= 'Z' {
		column = column*26 + int(cell[letters]-'A') + 1
		letters++
	}
	row, err := strconv.Atoi(cell[letters:])
	if err != nil || letters == 0 || letters > 3 || row < 1 {
		return 0, 0
	}
	return row, column
}
