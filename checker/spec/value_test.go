package spec

import (
	"strings"
	"testing"
)

func TestDates(t *testing.T) {
	t.Parallel()
	for _, c := range []struct {
		text          string
		month         bool
		written, real bool
		printed       string
	}{
		{"2026-03-14", false, true, true, "2026-03-14"},
		{"2026-03-14", true, true, true, "2026-03-14"},
		{"2026-03", true, true, true, "2026-03"},
		{"2026-03", false, false, false, ""},
		{"2024-02-29", false, true, true, "2024-02-29"},
		{"2026-02-29", false, true, false, "2026-02-29"},
		{"2026-00-10", false, true, false, "2026-00-10"},
		{"2026-03-00", true, true, false, "2026-03"},
		{"2026-13", true, true, false, "2026-13"},
		{"1899-12-31", false, true, false, "1899-12-31"},
		{"14.3.2026", false, false, false, ""},
		{"2026-3-14", false, false, false, ""},
	} {
		d, written, real := parseDate(c.text, c.month)
		if written != c.written || real != c.real || d.String() != c.printed {
			t.Errorf("%s: %s %t %t", c.text, d, written, real)
		}
	}
}

func TestIPCodes(t *testing.T) {
	t.Parallel()
	for text, want := range map[string]IPCode{
		"IP42": {"IP42", 4, 2, 0, ""}, "IP2X": {"IP2X", 2, -1, 0, ""}, "IPXXB": {"IPXXB", -1, -1, 'B', ""},
		"IP4XD": {"IP4XD", 4, -1, 'D', ""}, "IP23CS": {"IP23CS", 2, 3, 'C', "S"}, "IP69": {"IP69", 6, 9, 0, ""},
	} {
		if got, ok := parseIPCode(text); !ok || got != want {
			t.Errorf("%s: %v %t", text, got, ok)
		}
	}
	for _, text := range []string{"IP", "IP7X", "IP4", "IP42E", "ip42", "IP 42", "42", "IP42 ", "IP421"} {
		if got, ok := parseIPCode(text); ok {
			t.Errorf("%q gives %v", text, got)
		}
	}
}

func TestSaysNothing(t *testing.T) {
	t.Parallel()
	for _, text := range []string{"", " ", "-", "?", "n/a", "N.A.", "TBC", "t.b.a.", "see  drawing", "See Drawing.", "by others", "To be confirmed", "IPXX"} {
		if !saysNothing(text) {
			t.Errorf("%q says something", text)
		}
	}
	for _, text := range []string{"none", "0", "no", "IP2X", "drawing 12", "x"} {
		if saysNothing(text) {
			t.Errorf("%q says nothing", text)
		}
	}
}

func TestWords(t *testing.T) {
	t.Parallel()
	if w := CoveringKind(0); w.Text() != "" || w.Rank() != 0 {
		t.Errorf("zero is the word %q", w.Text())
	}
	if l := CoveringKind(1).List(); l.Number("wibble") != 0 || l.Text(len(l.Words)+1) != "" || len(l.Words) != len(l.Descriptions) {
		t.Error("a word that is not in the list")
	}
	if w := UnitDutyIncomer; w.Rank() != 0 {
		t.Error("a list without order gives a rank")
	}
}

// What is meant to be none is answered with how to say so.
func TestHints(t *testing.T) {
	t.Parallel()
	for text, want := range map[string]string{
		"board: B\nprotection: {R: {instantaneous: \"off\"}}\n":                             `write instantaneous: none if there is none`,
		"board: B\nsite: {flood_level: \"no\"}\n":                                           `write flood_level: none if there is none`,
		"board: B\nsite: {dust: not present}\n":                                             `write dust: none if there is none`,
		"board: B\nsite: {altitud: 12 m}\n":                                                 `write "altitude"`,
		"board: B\nbusbars: {A: {spans: 3}}\n":                                              `the key belongs to busbars.*.supports.spans`,
		"board: B\nsite: {basis: x}\n":                                                      `write basis: at the top of the file`,
		"board: B\nsite: {wibblewobble: x}\n":                                               `known here: location, altitude`,
		"board: B\nsections: {A: {bars: main C}}\nbusbars: {main A: {conductor: copper}}\n": `write "main A"`,
		"board: B\nsite: {animals: off}\n":                                                  `write no`,
		"board: B\nsite: {altitude: {valu: 1 m}}\n":                                         `write "value"`,
		"board: B\nunits: {Q1: {duty: coupler, between: [A, A]}}\nsections: {A: m}\nbusbars: {m: {conductor: copper}}\n": `write between: [A, B]`,
		"board: B\nunits: {Q1: {duty: coupler, connects: G}}\nsources: {G: {kind: generator}}\n":                         `write between: for a coupler, or the duty incomer`,
	} {
		if _, printed, _ := readText(text, nil); !strings.Contains(printed, want) {
			t.Errorf("%s: want %s, got\n%s", text, want, printed)
		}
	}
}
