//go:build ignore

// Writes policies/index.json from the rule files beside it. Run by go generate.
package main

import (
	"fmt"
	"os"

	"boardproof/checker/rules"
)

func main() {
	const dir = "../../policies"
	text, problems := rules.Index(os.DirFS(dir))
	if problems.Len() > 0 {
		problems.Print(os.Stderr, nil)
		os.Exit(1)
	}
	if err := os.WriteFile(dir+"/index.json", text, 0o644); err != nil {
		fmt.Fprintln(os.Stderr, err)
		os.Exit(1)
	}
}
