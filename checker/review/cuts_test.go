package review_test

import (
	"slices"
	"strings"
	"testing"
)

// cut is a text with one thing taken out.
type cut struct {
	what string // the line it began on
	item bool   // an item of a list, not a key
	text string
}

// cutsOf takes out, one at a time, every key with all that is indented below it, every item
// of a list, and every key and item inside braces and brackets.
func cutsOf(text string) []cut {
	lines := strings.SplitAfter(text, "\n")
	var all []cut
	for i, line := range lines {
		bare := strings.TrimSpace(line)
		if bare == "" || strings.HasPrefix(bare, "#") {
			continue
		}
		end := i + 1
		for end < len(lines) && (strings.TrimSpace(lines[end]) == "" || indent(lines[end]) > indent(line)) {
			end++
		}
		all = append(all, cut{bare, strings.HasPrefix(bare, "- "), strings.Join(slices.Concat(lines[:i], lines[end:]), "")})
		for _, s := range spans(line) {
			all = append(all, cut{
				"[" + line[s.from:s.to] + "] in " + bare, s.item,
				strings.Join(lines[:i], "") + line[:s.cutFrom] + line[s.cutTo:] + strings.Join(lines[i+1:], ""),
			})
		}
	}
	return all
}

func indent(line string) int { return len(line) - len(strings.TrimLeft(line, " ")) }

// span is one part between commas inside braces or brackets.
type span struct {
	from, to       int
	cutFrom, cutTo int // with one comma
	item           bool
}

func spans(line string) []span {
	type open struct {
		at     int
		item   bool
		commas []int
	}
	var found []span
	var stack []open
	quoted := false
	for i, r := range line {
		switch {
		case r == '"':
			quoted = !quoted
		case quoted:
		case r == '#' && len(stack) == 0:
			return found
		case r == '{' || r == '[':
			stack = append(stack, open{at: i, item: r == '['})
		case r == ',' && len(stack) > 0:
			stack[len(stack)-1].commas = append(stack[len(stack)-1].commas, i)
		case (r == '}' || r == ']') && len(stack) > 0:
			o := stack[len(stack)-1]
			stack = stack[:len(stack)-1]
			edges := slices.Concat([]int{o.at}, o.commas, []int{i})
			for k := range len(edges) - 1 {
				s := span{from: edges[k] + 1, to: edges[k+1], cutFrom: edges[k] + 1, cutTo: edges[k+1], item: o.item}
				switch {
				case k > 0:
					s.cutFrom = edges[k] // with the comma before
				case len(edges) > 2:
					s.cutTo = edges[k+1] + 1 // the first goes with the comma behind
				}
				found = append(found, s)
			}
		}
	}
	return found
}

func TestCutsOf(t *testing.T) {
	t.Parallel()
	const text = "a: 1\nb:\n  # why\n  c: {d: 1, e: [x, \"y, z\"]}\n  - f\ng: 2\n"
	want := []cut{
		{"a: 1", false, "b:\n  # why\n  c: {d: 1, e: [x, \"y, z\"]}\n  - f\ng: 2\n"},
		{"b:", false, "a: 1\ng: 2\n"},
		{"c: {d: 1, e: [x, \"y, z\"]}", false, "a: 1\nb:\n  # why\n  - f\ng: 2\n"},
		{"[x] in c: {d: 1, e: [x, \"y, z\"]}", true, "a: 1\nb:\n  # why\n  c: {d: 1, e: [ \"y, z\"]}\n  - f\ng: 2\n"},
		{"[ \"y, z\"] in c: {d: 1, e: [x, \"y, z\"]}", true, "a: 1\nb:\n  # why\n  c: {d: 1, e: [x]}\n  - f\ng: 2\n"},
		{"[d: 1] in c: {d: 1, e: [x, \"y, z\"]}", false, "a: 1\nb:\n  # why\n  c: { e: [x, \"y, z\"]}\n  - f\ng: 2\n"},
		{"[ e: [x, \"y, z\"]] in c: {d: 1, e: [x, \"y, z\"]}", false, "a: 1\nb:\n  # why\n  c: {d: 1}\n  - f\ng: 2\n"},
		{"- f", true, "a: 1\nb:\n  # why\n  c: {d: 1, e: [x, \"y, z\"]}\ng: 2\n"},
		{"g: 2", false, "a: 1\nb:\n  # why\n  c: {d: 1, e: [x, \"y, z\"]}\n  - f\n"},
	}
	if got := cutsOf(text); !slices.Equal(got, want) {
		t.Errorf("got\n%+v\nwant\n%+v", got, want)
	}
}
