package report

import (
	"bytes"
	"io"
	"regexp"
	"strings"

	"github.com/charmbracelet/glamour"
	"github.com/charmbracelet/glamour/ansi"
	xansi "github.com/charmbracelet/x/ansi"

	"boardproof/checker/review"
)

// Terminal writes the review for a terminal of the given width, with or without
// colour. Meaning never rests on colour alone. It is the only place that uses the
// renderer, so that it can be changed for another.
func Terminal(w io.Writer, r *review.Review, width int, colour bool) error {
	var page bytes.Buffer
	if err := Markdown(&page, r); err != nil {
		return err
	}
	return render(w, page.Bytes(), width, colour)
}

func render(w io.Writer, markdown []byte, width int, colour bool) error {
	renderer, err := glamour.NewTermRenderer(
		glamour.WithStyles(style(colour)),
		glamour.WithWordWrap(width-1), // it lets a comma or a period hang over
	)
	if err != nil {
		return err
	}
	out, err := renderer.RenderBytes(markdown)
	if err != nil {
		return err
	}
	text := trailingBlanks.ReplaceAllString(strings.TrimLeft(string(out), "\n"), "")
	// A word that is longer than the line is broken.
	_, err = io.WriteString(w, xansi.Hardwrap(text, width, true))
	return err
}

// trailingBlanks is the padding that the renderer puts behind every line.
var trailingBlanks = regexp.MustCompile(`(?m)[ \t]+$`)

// style is our own: no margins, no colour of the document as a whole (it would be
// set again for every blank), bold and a colour for headings only.
func style(colour bool) ansi.StyleConfig {
	heading := ansi.StylePrimitive{BlockSuffix: "\n", Bold: pointer(colour)}
	if colour {
		heading.Color = pointer("4")
	}
	strong := ansi.StylePrimitive{Bold: pointer(colour)}
	level := func(prefix string) ansi.StyleBlock {
		return ansi.StyleBlock{StylePrimitive: ansi.StylePrimitive{Prefix: prefix}}
	}
	return ansi.StyleConfig{
		Heading:     ansi.StyleBlock{StylePrimitive: heading},
		H1:          level(""),
		H2:          level("== "),
		H3:          level("-- "),
		Strong:      strong,
		Item:        ansi.StylePrimitive{BlockPrefix: "- "},
		Enumeration: ansi.StylePrimitive{BlockPrefix: ". "},
		List:        ansi.StyleList{LevelIndent: 2},
		Table: ansi.StyleTable{
			CenterSeparator: pointer("+"), ColumnSeparator: pointer("|"), RowSeparator: pointer("-"),
		},
	}
}

func pointer[T any](v T) *T { return &v }
