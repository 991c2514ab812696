package fault_test

import (
	"math"
	"os"
	"strconv"
	"strings"
	"testing"

	"gopkg.in/yaml.v3"

	"boardproof/checker/units"
)

// printed is a number as a source prints it; half a unit of its last place is the most the
// print can be off.
type printed struct {
	value, half float64
}

func (p *printed) UnmarshalYAML(node *yaml.Node) error {
	v, err := strconv.ParseFloat(node.Value, 64)
	if err != nil {
		return err
	}
	places := 0
	if _, after, found := strings.Cut(node.Value, "."); found {
		places = len(after)
	}
	*p = printed{v, 0.5000001 * math.Pow10(-places)}
	return nil
}

// read loads a file of testdata/iec60909 and refuses keys the test does not know.
func read[T any](t *testing.T, name string) T {
	t.Helper()
	file, err := os.Open("../../testdata/iec60909/" + name)
	if err != nil {
		t.Fatal(err)
	}
	defer file.Close()
	decoder := yaml.NewDecoder(file)
	decoder.KnownFields(true)
	var data T
	if err := decoder.Decode(&data); err != nil {
		t.Fatal(err)
	}
	return data
}

// must returns the value of a function that may not fail here.
func must[U any](value U, err error) U {
	if err != nil {
		panic(err)
	}
	return value
}

// asPrinted compares with a printed value within its rounding.
func asPrinted(t *testing.T, what string, got float64, want printed) {
	t.Helper()
	if !(math.Abs(got-want.value) <= want.half) {
		t.Errorf("%s: computed %.6g, printed %v", what, got, want.value)
	}
}

// within compares with a relative tolerance and returns the deviation.
func within(t *testing.T, what string, got, want, tolerance float64) float64 {
	t.Helper()
	deviation := math.Abs(got/want - 1)
	if !(deviation <= tolerance) {
		t.Errorf("%s: computed %.7g, expected %.7g, relative difference %.2g above %g", what, got, want, deviation, tolerance)
	}
	return deviation
}

func milliohm(v units.Ohm) float64      { return float64(v) * 1e3 }
func kiloampere(v units.Ampere) float64 { return float64(v) / 1e3 }
