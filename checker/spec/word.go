package spec

import "slices"

// A Word is a value from a fixed list of the vocabulary. Each list has its own Go type with one
// constant for each word, so that code never spells a word.
type Word interface {
	~uint8
	Text() string    // as the file spells it; empty for zero, which is no word
	Rank() int       // from 1 in the order of the list; 0 where the list has no order
	List() *WordList // the list the word belongs to
}

// A WordList is the words one kind of value may take.
type WordList struct {
	Name, Title  string
	Ordered      bool     // the words stand from the lowest to the highest
	Words        []string // as the file spells them
	Descriptions []string // what each word means
}

// Text returns the word with that number, counted from 1; empty if there is none.
func (l *WordList) Text(number int) string {
	if number < 1 || number > len(l.Words) {
		return ""
	}
	return l.Words[number-1]
}

// Rank returns the rank of the word with that number; 0 where the list has no order.
func (l *WordList) Rank(number int) int {
	if !l.Ordered || l.Text(number) == "" {
		return 0
	}
	return number
}

// Number returns the number of a word, counted from 1; 0 if it is not in the list.
func (l *WordList) Number(text string) int { return slices.Index(l.Words, text) + 1 }
