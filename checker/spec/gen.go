//go:build ignore

// Gen writes what is made from the vocabulary: go generate ./checker/spec
package main

import (
	"fmt"
	"os"

	"boardproof/checker/spec/generate"
)

func main() {
	if err := run(); err != nil {
		fmt.Fprintln(os.Stderr, err)
		os.Exit(1)
	}
}

func run() error {
	vocabulary, err := os.ReadFile("../../policies/board.yaml")
	if err != nil {
		return err
	}
	source, schema, err := generate.Generate(vocabulary)
	if err != nil {
		return err
	}
	example, err := generate.Example(vocabulary)
	if err != nil {
		return err
	}
	for name, data := range map[string][]byte{
		"board_gen.go": source, "../../policies/board.schema.json": schema, "testdata/full.yaml": example,
	} {
		if err := os.WriteFile(name, data, 0o644); err != nil {
			return err
		}
	}
	return nil
}
