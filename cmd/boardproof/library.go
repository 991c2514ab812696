package main

import (
	"boardproof/checker/facts"
	"boardproof/checker/rules"
)

// loading is the rule library on its way: it compiles while the files are read.
type loading chan loaded

type loaded struct {
	pack *rules.Pack
	err  error
}

func startLoading() loading {
	c := make(loading, 1)
	go func() {
		pack, err := loadLibrary()
		c <- loaded{pack, err}
	}()
	return c
}

func (c loading) wait() (*rules.Pack, error) {
	l := <-c
	return l.pack, l.err
}

// loadLibrary loads the embedded rules. A problem in them is a defect of the program.
func loadLibrary() (*rules.Pack, error) {
	pack, problems := rules.LoadOwn(facts.Terms(), rules.Options{})
	if problems.Len() > 0 {
		return nil, &problemsError{problems, nil, "the rule library cannot be used"}
	}
	return pack, nil
}
