package place

import (
	"fmt"
	"strings"
	"unicode"
	"unicode/utf8"
)

// quotedRunes is how much of a text a message repeats.
const quotedRunes = 60

// Quote puts text from a file between quotes for a message of one line: control, bidirectional and
// invisible characters, bytes that are not UTF-8, quotes and backslashes are escaped; what is longer
// than 60 characters is cut and ends in "…".
func Quote(text string) string {
	var b strings.Builder
	b.WriteByte('"')
	for n := 0; text != ""; n++ {
		if n == quotedRunes {
			b.WriteString("…")
			break
		}
		r, size := utf8.DecodeRuneInString(text)
		switch {
		case r == '"' || r == '\\':
			b.WriteByte('\\')
			b.WriteRune(r)
		default:
			writeVisible(&b, r, size, text[0])
		}
		text = text[size:]
	}
	b.WriteByte('"')
	return b.String()
}

// Visible returns text with everything escaped that a reader could not see or a terminal would obey.
func Visible(text string) string {
	var b strings.Builder
	for text != "" {
		r, size := utf8.DecodeRuneInString(text)
		writeVisible(&b, r, size, text[0])
		text = text[size:]
	}
	return b.String()
}

func writeVisible(b *strings.Builder, r rune, size int, first byte) {
	switch {
	case r == utf8.RuneError && size == 1:
		b.WriteString(escapedByte(first))
	case hidden(r):
		b.WriteString(escaped(r))
	default:
		b.WriteRune(r)
	}
}

// escaped returns r as \n, \x1b, \u202e or \U000e0001.
func escaped(r rune) string {
	switch {
	case r == '\n':
		return `\n`
	case r == '\r':
		return `\r`
	case r == '\t':
		return `\t`
	case r < 0x80:
		return fmt.Sprintf(`\x%02x`, r)
	case r <= 0xffff:
		return fmt.Sprintf(`\u%04x`, r)
	default:
		return fmt.Sprintf(`\U%08x`, r)
	}
}

func escapedByte(c byte) string { return fmt.Sprintf(`\x%02x`, c) }

// hidden tells whether r must not be printed as it is: control and format characters, spaces other
// than the plain one, unassigned and private ones, and letters and marks that leave no ink.
func hidden(r rune) bool { return !unicode.IsPrint(r) || unicode.Is(inkless, r) }

// inkless lists printable characters of Unicode that are drawn as nothing: those of the property
// Default_Ignorable_Code_Point that are letters or marks, and the empty braille pattern.
// Source: Unicode Character Database, DerivedCoreProperties.txt (from memory, unconfirmed).
var inkless = &unicode.RangeTable{
	R16: []unicode.Range16{
		{Lo: 0x034f, Hi: 0x034f, Stride: 1}, // combining grapheme joiner
		{Lo: 0x115f, Hi: 0x1160, Stride: 1}, // Hangul fillers
		{Lo: 0x17b4, Hi: 0x17b5, Stride: 1}, // Khmer inherent vowels
		{Lo: 0x180b, Hi: 0x180f, Stride: 1}, // Mongolian variation selectors
		{Lo: 0x2800, Hi: 0x2800, Stride: 1}, // empty braille pattern
		{Lo: 0x3164, Hi: 0x3164, Stride: 1}, // Hangul filler
		{Lo: 0xfe00, Hi: 0xfe0f, Stride: 1}, // variation selectors
		{Lo: 0xffa0, Hi: 0xffa0, Stride: 1}, // half-width Hangul filler
	},
	R32: []unicode.Range32{
		{Lo: 0xe0000, Hi: 0xe0fff, Stride: 1}, // tags and more variation selectors
	},
}

// width returns the columns a printable character takes on a terminal: 0 for combining marks, 2 for
// the wide characters of East Asia and most pictographs, otherwise 1.
func width(r rune) int {
	switch {
	case unicode.In(r, unicode.Mn, unicode.Me):
		return 0
	case unicode.Is(wide, r):
		return 2
	}
	return 1
}

// wide lists the larger blocks of East_Asian_Width W and F. Source: Unicode Standard Annex 11,
// EastAsianWidth.txt (from memory, unconfirmed); single wide signs outside these blocks are left out.
var wide = &unicode.RangeTable{
	R16: []unicode.Range16{
		{Lo: 0x1100, Hi: 0x115f, Stride: 1},
		{Lo: 0x2e80, Hi: 0x303e, Stride: 1},
		{Lo: 0x3041, Hi: 0x33ff, Stride: 1},
		{Lo: 0x3400, Hi: 0x4dbf, Stride: 1},
		{Lo: 0x4e00, Hi: 0x9fff, Stride: 1},
		{Lo: 0xa000, Hi: 0xa4cf, Stride: 1},
		{Lo: 0xac00, Hi: 0xd7a3, Stride: 1},
		{Lo: 0xf900, Hi: 0xfaff, Stride: 1},
		{Lo: 0xfe30, Hi: 0xfe6f, Stride: 1},
		{Lo: 0xff00, Hi: 0xff60, Stride: 1},
		{Lo: 0xffe0, Hi: 0xffe6, Stride: 1},
	},
	R32: []unicode.Range32{
		{Lo: 0x1f300, Hi: 0x1f64f, Stride: 1},
		{Lo: 0x1f900, Hi: 0x1f9ff, Stride: 1},
		{Lo: 0x20000, Hi: 0x3fffd, Stride: 1},
	},
}
