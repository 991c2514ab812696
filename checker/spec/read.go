package spec

import (
	"bytes"
	"path/filepath"
	"slices"

	"boardproof/checker/place"
)

// Options are the circumstances under which a file is read.
type Options struct {
	// Root is the folder that basis files must stay inside. Empty: the nearest folder above the file
	// that has a .git, else the folder of the file.
	Root string
	// ReadFile reads a file; nil for the files of the machine. The name is a slash path, that of the
	// board file as it was given.
	ReadFile func(name string) ([]byte, error)
}

// Read reads a board file and what it is based on. All problems of all files are returned together;
// with any problem the board is as complete as it can be and must not be judged. The sources are
// the texts of the files read, for printing the problems.
func Read(file string, opt Options) (*Board, place.Sources, *place.Problems) {
	l := newLoader(file, opt)
	b := &Board{file: filepath.ToSlash(file)}
	b.tree = l.load(b.file, place.Place{})
	b.digests = l.digests
	b.incomplete = l.incomplete
	b.fill(l.problems)
	return b, l.sources, l.problems
}

// fill walks over the tree and reads all values from it.
func (b *Board) fill(problems *place.Problems) {
	r := &reader{problems: problems, incomplete: b.incomplete, reported: map[report]bool{}}
	root := outline().root
	at := At{Place: place.Place{File: b.file, Line: 1, Column: 1, EndColumn: 1}}
	tree := b.tree
	if tree == nil {
		r.incomplete = true
	} else {
		at.Place = tree.place
		if k, ok := tree.child("board"); ok {
			at.Place = k.place
		}
		r.collectNames(root, tree, "")
	}
	s := slot{r: r, at: at, n: tree}
	o := s.object(root, fixedKey)
	readContent(&o, &b.Content)
	if tree != nil {
		r.checkWhole(&b.Content, tree)
	}
	slices.SortStableFunc(r.remarks, func(a, b Remark) int { return place.Compare(a.Place, b.Place) })
	slices.SortStableFunc(r.doubts, func(a, b Doubt) int { return place.Compare(a.Place, b.Place) })
	b.Remarks, b.Doubts = r.remarks, r.doubts
}

// IsBoardFile tells whether data is a board file: one whose top level has the key board. A file that
// cannot be parsed counts if a line begins with it. It is meant for picking files and does not say
// that the file is in order.
func IsBoardFile(data []byte) bool {
	for rest := data; len(rest) > 0; {
		line, after, _ := bytes.Cut(rest, []byte("\n"))
		if bytes.HasPrefix(line, []byte("board:")) || bytes.HasPrefix(line, []byte("\ufeffboard:")) {
			return true
		}
		rest = after
	}
	if len(data) > largestFile || !bytes.Contains(data, []byte("board")) {
		return false
	}
	document, err := parse(data)
	if err != nil || len(document.Content) == 0 {
		return false
	}
	for i, n := range document.Content[0].Content {
		if i%2 == 0 && n.Value == "board" {
			return document.Content[0].ShortTag() == "!!map"
		}
	}
	return false
}
