package generate

import "fmt"

// Generate reads the vocabulary and returns the Go source of package spec and the JSON Schema for
// editors. An unsound vocabulary gives one error that lists every fault with its line.
func Generate(vocabulary []byte) (goSource, jsonSchema []byte, err error) {
	m, err := sound(vocabulary)
	if err != nil {
		return nil, nil, err
	}
	goSource, err = m.goSource()
	if err != nil {
		return nil, nil, fmt.Errorf("the Go source made from the vocabulary does not parse: %w", err)
	}
	return goSource, m.jsonSchema(), nil
}

// Example returns a board file that says every field of the vocabulary once.
func Example(vocabulary []byte) ([]byte, error) {
	m, err := sound(vocabulary)
	if err != nil {
		return nil, err
	}
	return m.board(), nil
}

func sound(vocabulary []byte) (*model, error) {
	c := &complaints{}
	v := decode(vocabulary, c)
	if v == nil || len(c.errs) > 0 {
		return nil, c.err()
	}
	m := check(v, c)
	return m, c.err()
}
