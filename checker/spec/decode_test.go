package spec

import (
	"fmt"
	"testing"
)

// Columns count characters, and a place spans the value as it is written.
func TestPlacesInTheText(t *testing.T) {
	t.Parallel()
	for _, c := range []struct{ name, text, want string }{
		{"plain", "title: main board", "2:8-18"},
		{"with comment", "title: main board   # A", "2:8-18"},
		{"double quotes", `title: "a \" b"  `, "2:8-16"},
		{"single quotes", `title: 'it''s' # x`, "2:8-15"},
		{"wide letters", `title: 漢字 B`, "2:8-12"},
		{"anchor", "title: &name  main board", "2:15-25"},
		{"folded", "title: >-\n  main\n  board", "2:8-10"},
		{"over two lines", "title: main\n  board", "2:8-12"},
		{"crlf", "title: main board\r", "2:8-18"},
		{"behind umlauts", `documents: {Ä: {title: öö}}`, "2:24-26"},
	} {
		t.Run(c.name, func(t *testing.T) {
			t.Parallel()
			b, printed, n := readText("board: B\n"+c.text+"\n", nil)
			if n > 0 {
				t.Fatal(printed)
			}
			at := b.Title.At
			if b.Documents.Said() {
				at = b.Documents.Entries[0].Value.Title.At
			}
			if got := fmt.Sprintf("%d:%d-%d", at.Place.Line, at.Place.Column, at.Place.EndColumn); got != c.want {
				t.Errorf("%s, want %s", got, c.want)
			}
		})
	}
}

// A value behind an alias stands where it is written; the alias is a step on the way.
func TestAlias(t *testing.T) {
	t.Parallel()
	b, printed, n := readText("board: B\nsite: {altitude: &h 12 m}\nunits: {Q1: &q {device: {icm: 145 kA}}, Q2: *q}\n", nil)
	if n > 0 {
		t.Fatal(printed)
	}
	icm := b.Units.Entries[1].Value.Device.Icm
	if icm.Value != 145e3 || icm.Place.Column != 31 || via(icm.At) != "board.yaml:3:45" {
		t.Errorf("%v through %s", icm, via(icm.At))
	}
}
