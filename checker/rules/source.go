package rules

import (
	"crypto/sha256"
	"encoding/hex"
	"errors"
	"io/fs"
	"path"
	"slices"
	"strings"
	"unicode/utf8"

	"boardproof/checker/place"
)

const (
	limitsFile  = "limits.yaml"
	seriesFile  = "series.yaml"
	casesSuffix = "_cases.yaml"
	ruleSuffix  = ".rego"

	largestFile = 256 << 10 // bytes; a rule has about one kilobyte
	mostFiles   = 5000
)

// source is the text of a pack.
type source struct {
	dir    string // put before file names in places; empty if none
	rules  []file
	limits *file
	series *file
	cases  []file
}

type file struct {
	name   string // slash path inside the pack
	text   string
	sha256 string
}

// shown is a file's name as places have it.
func (s *source) shown(name string) string { return path.Join(s.dir, name) }

// collect reads the files of a pack. Files of other kinds are passed over; a name that is almost right
// is refused, so that no rule is left out by a slip of the pen.
func collect(fsys fs.FS, dir string, problems *place.Problems) *source {
	s := &source{dir: dir}
	seen := 0
	err := fs.WalkDir(fsys, ".", func(name string, entry fs.DirEntry, err error) error {
		if err != nil {
			problems.Add(unreadable(s.shown(name), err))
			if name == "." {
				return fs.SkipAll
			}
			return nil
		}
		base := path.Base(name)
		if entry.IsDir() {
			if strings.HasPrefix(base, ".") && name != "." {
				return fs.SkipDir
			}
			return nil
		}
		if seen++; seen > mostFiles {
			problems.Add(place.Problem{Place: place.Place{File: s.shown(".")}, Kind: place.TooLarge, Got: "more than 5000 files", Want: "the folder of a rule pack"})
			return fs.SkipAll
		}
		into, near := s.sort(base)
		if near != "" {
			problems.Add(place.Problem{Place: place.Place{File: s.shown(name)}, Kind: place.Rule, Got: "a file named " + place.Quote(base) + ", which would be passed over", Want: "a file of a rule pack", Hint: "name it " + near})
		}
		if into == nil {
			return nil
		}
		if f, ok := s.read(fsys, name, problems); ok {
			into(f)
		}
		return nil
	})
	if err != nil {
		problems.Add(unreadable(s.shown("."), err))
	}
	return s
}

// sort says where a file belongs, or which name was meant.
func (s *source) sort(base string) (into func(file), near string) {
	lower := strings.ToLower(base)
	for _, bad := range []string{".yml", ".yaml"} {
		if stem, ok := strings.CutSuffix(lower, bad); ok {
			name := stem + ".yaml"
			if name != base && (name == limitsFile || name == seriesFile || strings.HasSuffix(name, casesSuffix)) {
				return nil, name
			}
		}
	}
	switch {
	case base == limitsFile:
		return func(f file) { s.limits = &f }, ""
	case base == seriesFile:
		return func(f file) { s.series = &f }, ""
	case strings.HasSuffix(base, casesSuffix):
		return func(f file) { s.cases = append(s.cases, f) }, ""
	case strings.HasSuffix(lower, ruleSuffix) && !strings.HasPrefix(base, "."):
		if base != lower {
			return nil, lower
		}
		return func(f file) { s.rules = append(s.rules, f) }, ""
	}
	return nil, ""
}

func (s *source) read(fsys fs.FS, name string, problems *place.Problems) (file, bool) {
	at := place.Place{File: s.shown(name)}
	for _, top := range []string{limitsFile, seriesFile} {
		if path.Base(name) == top && name != top {
			problems.Add(place.Problem{Place: at, Kind: place.Rule, Got: top + " in a folder", Want: top + " at the top of the pack"})
			return file{}, false
		}
	}
	info, err := fs.Stat(fsys, name)
	if err == nil && info.Size() > largestFile {
		problems.Add(place.Problem{Place: at, Kind: place.TooLarge, Got: "more than 256 KiB", Want: "a small text file"})
		return file{}, false
	}
	var text []byte
	if err == nil {
		text, err = fs.ReadFile(fsys, name)
	}
	switch {
	case err != nil:
		problems.Add(unreadable(s.shown(name), err))
		return file{}, false
	case !utf8.Valid(text):
		problems.Add(place.Problem{Place: at, Kind: place.NotUTF8, Got: "bytes that are not UTF-8", Want: "UTF-8 text"})
		return file{}, false
	}
	sum := sha256.Sum256(text)
	return file{name: name, text: string(text), sha256: hex.EncodeToString(sum[:])}, true
}

func unreadable(name string, err error) place.Problem {
	reason := "it cannot be read"
	switch {
	case errors.Is(err, fs.ErrNotExist):
		reason = "nothing there"
	case errors.Is(err, fs.ErrPermission):
		reason = "a file that may not be read"
	}
	return place.Problem{Place: place.Place{File: name}, Kind: place.Unreadable, Got: reason, Want: "a readable file or folder of a rule pack"}
}

// digest is the SHA-256 over the names and contents of all files that can change a verdict.
func (s *source) digest() string {
	files := slices.Clone(s.rules)
	for _, f := range []*file{s.limits, s.series} {
		if f != nil {
			files = append(files, *f)
		}
	}
	slices.SortFunc(files, func(a, b file) int { return strings.Compare(a.name, b.name) })
	sum := sha256.New()
	for _, f := range files {
		sum.Write([]byte(f.name + "\x00" + f.sha256 + "\n"))
	}
	return hex.EncodeToString(sum.Sum(nil))
}
