package units

import (
	"regexp"
	"slices"
	"strings"
)

// spaces are the characters that count as a space in a value: space, tab, no-break space, thin
// space and narrow no-break space.
const spaces = " \t\u00a0\u2009\u202f"

// Pattern returns an anchored regular expression for a JSON Schema that accepts the texts that
// Parse accepts and no others. It keeps to what ECMA-262 and RE2 read alike.
func (d *Dimension) Pattern() string {
	const (
		space  = "[" + spaces + "]"
		digits = "[0-9]{1,15}"
	)
	units := d.Spellings()
	slices.SortStableFunc(units, func(a, b string) int { return len(b) - len(a) })
	for i, u := range units {
		units[i] = strings.ReplaceAll(regexp.QuoteMeta(u), " ", space)
	}
	unit := ""
	if len(units) > 0 {
		unit = space + "*(?:" + strings.Join(units, "|") + ")"
	}
	return "^" + space + "*[-\u2212]?" + digits + `(?:\.` + digits + ")?" + unit + space + "*$"
}
