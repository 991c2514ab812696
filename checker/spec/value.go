package spec

import (
	"fmt"
	"regexp"
	"strconv"
	"strings"
	"time"
)

// A Name refers to an entry of a collection; it is only given if that entry exists.
type Name struct {
	Text string // the name, e.g. "TX1"
	In   string // the path of the collection, e.g. "sources"
}

// A Date is a day, or a month with Day 0.
type Date struct{ Year, Month, Day int }

// String prints 2026-03-14 or 2026-03; the zero date prints as nothing.
func (d Date) String() string {
	switch {
	case d == Date{}:
		return ""
	case d.Day == 0:
		return fmt.Sprintf("%04d-%02d", d.Year, d.Month)
	}
	return fmt.Sprintf("%04d-%02d-%02d", d.Year, d.Month, d.Day)
}

var dateForm = regexp.MustCompile(`^([0-9]{4})-([0-9]{2})(?:-([0-9]{2}))?$`)

// parseDate reads 2026-03-14, or 2026-03 where a month is enough. Written is false if the text has
// another form, real is false if the calendar has no such date or the year is not 1900 to 2199.
func parseDate(text string, monthIsEnough bool) (d Date, written, real bool) {
	m := dateForm.FindStringSubmatch(text)
	if m == nil || m[3] == "" && !monthIsEnough {
		return Date{}, false, false
	}
	// The pattern leaves nothing that Atoi could refuse but the empty day.
	d.Year, _ = strconv.Atoi(m[1])
	d.Month, _ = strconv.Atoi(m[2])
	d.Day, _ = strconv.Atoi(m[3])
	day := d.Day
	if m[3] == "" {
		day = 1
	}
	t := time.Date(d.Year, time.Month(d.Month), day, 0, 0, 0, 0, time.UTC)
	return d, true, t.Year() == d.Year && int(t.Month()) == d.Month && t.Day() == day && 1900 <= d.Year && d.Year < 2200
}

// An IPCode is a degree of protection by an enclosure.
// Source: IEC 60529, clause 4 (order of the elements; from memory, unconfirmed).
type IPCode struct {
	Text          string // as written, e.g. "IP4XD"
	First, Second int    // the numerals; -1 for X
	Additional    byte   // A to D, 0 if there is none
	Supplementary string // letters H, M, S, W; empty if there are none
}

var ipForm = regexp.MustCompile(`^IP([0-6X])([0-9X])([A-D])?([HMSW]{0,4})$`)

func parseIPCode(text string) (IPCode, bool) {
	m := ipForm.FindStringSubmatch(text)
	if m == nil {
		return IPCode{}, false
	}
	c := IPCode{Text: text, First: numeral(m[1]), Second: numeral(m[2]), Supplementary: m[4]}
	if m[3] != "" {
		c.Additional = m[3][0]
	}
	return c, true
}

func numeral(text string) int {
	if text == "X" {
		return -1
	}
	return int(text[0] - '0')
}

// saysNothing tells whether a text is given instead of a value: it asks to look elsewhere or later.
// Common practice in tender schedules, no source.
func saysNothing(text string) bool {
	return nothings[strings.TrimRight(strings.ToLower(strings.Join(strings.Fields(text), " ")), ".")]
}

var nothings = map[string]bool{
	"": true, "-": true, "--": true, "—": true, "–": true, "?": true, "??": true, "…": true, "~": true, "null": true, "nil": true,
	"n/a": true, "na": true, "n.a": true, "not applicable": true, "not available": true, "unknown": true, "not known": true,
	"tbc": true, "tba": true, "tbd": true, "t.b.c": true, "t.b.a": true, "t.b.d": true, "to be confirmed": true,
	"to be advised": true, "to be announced": true, "to be agreed": true, "to be defined": true, "to be determined": true, "later": true, "to follow": true,
	"see drawing": true, "see drawings": true, "as drawing": true, "as per drawing": true, "refer to drawing": true,
	"see data sheet": true, "see datasheet": true, "see schedule": true, "see specification": true, "see spec": true,
	"see offer": true, "see above": true, "see below": true, "see note": true, "see notes": true, "as specified": true,
	"by others": true, "by client": true, "by owner": true, "by manufacturer": true, "manufacturer's standard": true,
	"ipxx": true,
}
