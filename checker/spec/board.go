package spec

import (
	"crypto/sha256"
	"encoding/hex"
	"slices"
)

// A Board is a board file with everything its basis adds.
type Board struct {
	Content // what the file says, by the keys of the vocabulary

	Remarks []Remark // given but says nothing: to be asked, in the order of the file
	Doubts  []Doubt  // stated but unusual: to be confirmed, in the order of the file

	file       string
	digests    []FileDigest
	tree       *node // own file over its basis, before any `like:`
	incomplete bool  // a file of the basis could not be used
}

// A Remark is a value that is given but says nothing. The value is not said.
type Remark struct {
	At
	Text string // as written, e.g. "see drawing"; empty for an empty key
}

// A Doubt is a value outside what is usual and not confirmed. Nobody uses the value.
type Doubt struct {
	At
	Text  string // as written, e.g. "650 A"
	Usual string // the usual range, e.g. "100 A to 6300 A"
}

// A FileDigest identifies the content of a file that was read.
type FileDigest struct {
	Name   string // slash path: the board file as given, a basis relative to the same folder
	SHA256 string // of the bytes as they are, in hexadecimal
}

// File returns the name of the board file as given.
func (b *Board) File() string { return b.file }

// Files returns every file that was read, the board file first, then its basis and the basis of that.
func (b *Board) Files() []FileDigest { return slices.Clone(b.digests) }

func digest(name string, data []byte) FileDigest {
	sum := sha256.Sum256(data)
	return FileDigest{Name: name, SHA256: hex.EncodeToString(sum[:])}
}
