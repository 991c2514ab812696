package fault

import (
	"embed"
	"fmt"
	"slices"
	"strconv"
	"strings"
)

//go:embed tables/*.csv
var tables embed.FS

// anything stands in a table for a cell that sets no bound.
const anything = "any"

// row is one line of a table with the place it stands at.
type row struct {
	place string
	cells []string
}

// rows reads a table strictly: comment lines first, then exactly this header, then
// lines of as many cells, none of them blank or padded.
func rows(name string, header ...string) ([]row, error) {
	data, err := tables.ReadFile("tables/" + name)
	if err != nil {
		return nil, fmt.Errorf("table %s: %w", name, err)
	}
	return parse(name, string(data), header...)
}

// parse is rows without the file.
func parse(name, text string, header ...string) ([]row, error) {
	var out []row
	headed := false
	for i, line := range strings.Split(strings.TrimSuffix(text, "\n"), "\n") {
		place := fmt.Sprintf("%s:%d", name, i+1)
		if !headed && strings.HasPrefix(line, "#") {
			continue
		}
		cells := strings.Split(line, ",")
		if !headed {
			if !slices.Equal(cells, header) {
				return nil, fmt.Errorf("%s: found the header %q, expected %q", place, line, strings.Join(header, ","))
			}
			headed = true
			continue
		}
		if len(cells) != len(header) {
			return nil, fmt.Errorf("%s: found %d cells, expected %d", place, len(cells), len(header))
		}
		for k, cell := range cells {
			if cell == "" || strings.TrimSpace(cell) != cell {
				return nil, fmt.Errorf("%s: the cell %s is blank or padded", place, header[k])
			}
		}
		out = append(out, row{place, cells})
	}
	if len(out) == 0 {
		return nil, fmt.Errorf("table %s has no rows", name)
	}
	return out, nil
}

// numbers reads the cells with the given indexes as plain positive decimals or nought,
// multiplied by the size of the unit in the header.
func (r row) numbers(unit float64, columns ...int) ([]float64, error) {
	out := make([]float64, len(columns))
	for i, c := range columns {
		v, err := strconv.ParseFloat(r.cells[c], 64)
		if err != nil || v < 0 || strings.ContainsAny(r.cells[c], "eExXpPiInN_+") {
			return nil, fmt.Errorf("%s: found %q, expected a plain decimal", r.place, r.cells[c])
		}
		out[i] = v * unit
	}
	return out, nil
}
