package units

import (
	"slices"
	"strconv"
	"strings"
	"unicode"
)

// notANumber is the fault of a text that offers nothing to correct.
func (d *Dimension) notANumber(text string) *Fault {
	return &Fault{Kind: NotANumber, Got: quote(text), Want: d.phrase + " in plain digits", Hint: "write for example " + quote(d.example)}
}

// explainNumber says why a text does not begin with a plain number.
func (d *Dimension) explainNumber(text, trimmed string) *Fault {
	if trimmed == "" {
		return &Fault{Kind: Empty, Got: "nothing", Want: d.wantedWithUnit(), Hint: "write for example " + quote(d.example)}
	}
	first, _, _ := strings.Cut(strings.ToLower(strings.TrimLeft(trimmed, "+-\u2212.")), " ")
	if slices.Contains([]string{"nan", "inf", "infinity", "∞"}, first) {
		return &Fault{Kind: NotFinite, Got: quote(text), Want: d.phrase + " that is finite", Hint: "write for example " + quote(d.example)}
	}
	return d.explainDisguised(text, trimmed, "")
}

// explainDisguised recognises a number in a writing that is not accepted. Plain is the accepted
// number at the start of the text, empty when there is none; when the whole number is plain the
// result is nil, because the fault is then in the unit.
func (d *Dimension) explainDisguised(text, trimmed, plain string) *Fault {
	sign, body := "", trimmed
	if rest, found := cutMinus(body); found {
		sign, body = "-", rest
	} else if rest, found := strings.CutPrefix(body, "+"); found {
		body = rest
	}
	body = strings.TrimLeft(body, " ")
	if len(body) > 2 && (body[:2] == "0x" || body[:2] == "0X") && isHex(body[2]) {
		return d.notANumber(text)
	}
	head, tail := splitHead(body)
	if number, rest, ok := scientific(head, tail); ok {
		return d.rewritten(&Fault{Kind: NotANumber, Want: "a number without exponent"}, text, rest, withSign(sign, number))
	}
	if plain != "" && head == strings.TrimPrefix(plain, "-") {
		return nil
	}
	f := &Fault{}
	var ways []string
	f.Kind, ways = rewritings(head)
	switch {
	case len(ways) == 0 && severalNumbers(head):
		return &Fault{Kind: SeveralValues, Got: quote(text), Want: d.phrase + " and nothing else", Hint: "write for example " + quote(d.example)}
	case len(ways) == 0:
		return d.notANumber(text)
	case f.Kind == DecimalComma:
		f.Want = "a decimal point"
	case f.Kind == AmbiguousComma:
		f.Want = "a number without a comma, which can be read in two ways"
	case f.Kind == ThousandsSeparator:
		f.Want = "digits without separators"
	default:
		f.Want = d.phrase + " in plain digits"
	}
	for i := range ways {
		ways[i] = withSign(sign, ways[i])
	}
	return d.rewritten(f, text, tail, ways...)
}

// withSign puts the minus before a number, except before nought.
func withSign(sign, number string) string {
	if plainDecimal(number).digits == "" {
		return number
	}
	return sign + number
}

// rewritten completes f with the ways to write the number and the unit that follows it.
func (d *Dimension) rewritten(f *Fault, text, unit string, numbers ...string) *Fault {
	f.Got = quote(text)
	unit = strings.Trim(unit, " ")
	var ways []string
	for _, n := range numbers {
		switch _, known := d.spellings[unit]; {
		case known:
			ways = append(ways, quote(join(n, unit)))
		case unit == "":
			for _, u := range d.usual {
				ways = append(ways, quote(join(n, u)))
			}
		default:
			ways = append(ways, quote(n))
		}
	}
	f.Hint = "write " + either(ways)
	if _, known := d.spellings[unit]; !known && unit != "" {
		f.Hint = "write the number as " + either(ways)
	}
	return f
}

// severalNumbers reports a text such as "65-70", where a number is followed by another one.
func severalNumbers(head string) bool {
	rest := strings.TrimLeft(head, "0123456789.")
	return rest != head && strings.ContainsAny(rest, "0123456789")
}

// splitHead cuts text before the first character that can only belong to a unit or a word.
func splitHead(text string) (head, tail string) {
	end := strings.IndexFunc(text, func(r rune) bool {
		return !unicode.IsDigit(r) && !strings.ContainsRune(" .,'’_-\u2212+", r)
	})
	if end < 0 {
		end = len(text)
	}
	return strings.TrimRight(text[:end], " "), text[end:]
}

// scientific reads "1.2" followed by "e3 A" as "1200" followed by " A".
func scientific(head, tail string) (number, rest string, ok bool) {
	mantissa, after, plain := cutNumber(head)
	if !plain || after != "" || tail == "" || tail[0] != 'e' && tail[0] != 'E' {
		return "", "", false
	}
	rest = tail[1:]
	sign := ""
	if rest != "" && (rest[0] == '+' || rest[0] == '-') {
		sign, rest = rest[:1], rest[1:]
	}
	power := leadingDigits(rest)
	exponent, err := strconv.Atoi(sign + power)
	if err != nil || exponent < -maxDigits || exponent > maxDigits {
		return "", "", false
	}
	return plainDecimal(mantissa).shift(exponent).String(), rest[len(power):], true
}

// rewritings returns how the unsigned number in head is written plainly, and what kind of writing
// it was; no ways when it cannot be told.
func rewritings(head string) (FaultKind, []string) {
	joined, separated := joinGroups(head, " '’_")
	whole, fraction, comma := strings.Cut(joined, ",")
	switch points := strings.Count(joined, "."); {
	case joined == "":
		return NotANumber, nil
	case !comma && points <= 1:
		plain, ok := plainly(joined)
		if !ok {
			return NotANumber, nil
		}
		if separated {
			return ThousandsSeparator, []string{plain}
		}
		return NotANumber, []string{plain}
	case comma && points == 0 && !strings.Contains(fraction, ","):
		plain, ok := plainly(whole + "." + fraction)
		switch {
		case !ok:
			return NotANumber, nil
		case separated:
			return ThousandsSeparator, []string{plain}
		case len(fraction) == 3 && len(whole) >= 1 && len(whole) <= 3 && whole[0] != '0':
			return AmbiguousComma, []string{whole + fraction, plainDecimal(plain).String()}
		}
		return DecimalComma, []string{plain}
	}
	for _, separator := range []string{",", "."} {
		if ungrouped, found := joinGroups(joined, separator); found {
			if plain, ok := plainly(strings.Replace(ungrouped, ",", ".", 1)); ok {
				return ThousandsSeparator, []string{plain}
			}
		}
	}
	return NotANumber, nil
}

// joinGroups removes the separators from groups of three digits: "1 600.5" is "1600.5". It returns
// "" when separators stand elsewhere.
func joinGroups(text, separators string) (joined string, found bool) {
	if !strings.ContainsAny(text, separators) {
		return text, false
	}
	groups := strings.FieldsFunc(text, func(r rune) bool { return strings.ContainsRune(separators, r) })
	if len(groups) < 2 || len(groups[0]) > 3 || !allDigits(groups[0]) {
		return "", false
	}
	for i, g := range groups[1:] {
		digits := leadingDigits(g)
		last := i == len(groups)-2
		if len(digits) != 3 || !last && digits != g {
			return "", false
		}
	}
	return strings.Join(groups, ""), true
}

// plainly completes ".5" and "5." and confirms that nothing but digits and one point is left.
func plainly(text string) (string, bool) {
	whole, fraction, _ := strings.Cut(text, ".")
	if whole == "" {
		whole = "0"
	}
	if !allDigits(whole) || fraction != "" && !allDigits(fraction) || fraction == "" && !allDigits(strings.TrimSuffix(text, ".")) {
		return "", false
	}
	if fraction == "" {
		return whole, true
	}
	return whole + "." + fraction, true
}

func isHex(c byte) bool {
	return isDigit(c) || 'a' <= c && c <= 'f' || 'A' <= c && c <= 'F'
}
