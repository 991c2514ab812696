package generate

import (
	"strings"
	"unicode"
)

// goName turns a key, type or word into the middle or start of a Go identifier:
// "rated_current" gives RatedCurrent, "type 1+2" gives Type1And2, "TN-S" gives TNS.
func goName(text string) string {
	var b strings.Builder
	for _, part := range strings.FieldsFunc(spellOut(text), separates) {
		if whole, ok := initialisms[part]; ok {
			b.WriteString(whole)
			continue
		}
		runes := []rune(part)
		b.WriteRune(unicode.ToUpper(runes[0]))
		b.WriteString(string(runes[1:]))
	}
	return b.String()
}

// initialisms are the parts of keys that Go spells in capitals.
var initialisms = map[string]string{"ip": "IP", "ppe": "PPE", "id": "ID"}

func separates(r rune) bool { return !unicode.IsLetter(r) && !unicode.IsDigit(r) }

// spellOut replaces the signs that tell two words apart.
func spellOut(text string) string {
	return strings.NewReplacer("+", " And ", "<", " Below ", ">", " Above ", "%", " Percent ", "≤", " Up To ", "≥", " From ").Replace(text)
}

// reserved are the identifiers of package spec written by hand; a generated one must differ.
var reserved = map[string]bool{
	"At": true, "Board": true, "ByVoltage": true, "Claims": true, "Conditions": true, "Content": true, "Date": true, "Doubt": true,
	"Doubted": true, "Entry": true, "Field": true, "FileDigest": true, "Given": true, "IPCode": true, "IsBoardFile": true,
	"Kind": true, "Leaf": true, "Leaves": true, "List": true, "Name": true, "Named": true, "NotSaid": true, "Options": true,
	"Outline": true, "Pair": true, "Pairs": true, "Range": true, "Read": true, "Remark": true, "Says": true, "State": true,
	"Stated": true, "StatedNone": true, "VoltageEntry": true, "Word": true, "WordList": true,
}

// fieldName is the Go name of a field. A key such as "at", whose name every object has already,
// gets the ending Field: AtField.
func fieldName(key string) string {
	if name := goName(key); !taken[name] {
		return name
	}
	return goName(key) + "Field"
}

// taken are the Go names that every object already has.
var taken = map[string]bool{
	"At": true, "Path": true, "Place": true, "Via": true, "From": true, "Says": true, "Leaf": true, "State": true, "Said": true,
}

// dimensionTypes are the types of package units by the name of their dimension.
var dimensionTypes = map[string]string{
	"current": "Ampere", "voltage": "Volt", "time": "Second", "length": "Metre", "area": "SquareMetre", "resistance": "Ohm",
	"resistance_per_length": "OhmPerMetre", "frequency": "Hertz", "apparent_power": "VoltAmpere", "power": "Watt",
	"temperature": "Celsius", "force": "Newton", "pressure": "Pascal", "energy": "Joule", "incident_energy": "JoulePerSquareMetre",
	"joule_integral": "AmpereSquaredSecond", "percentage": "Percentage", "multiple": "Multiple", "number": "Ratio",
}
