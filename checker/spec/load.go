package spec

import (
	"errors"
	"fmt"
	"io"
	"io/fs"
	"os"
	"path"
	"path/filepath"
	"strings"

	"boardproof/checker/place"
)

// longestChain is how many files may build on each other.
const longestChain = 8

// A loader reads a file and the files it builds on.
type loader struct {
	opt        Options
	root       string // absolute, symbolic links resolved where it exists
	problems   *place.Problems
	sources    place.Sources
	digests    []FileDigest
	chain      []string // the real paths of the files being loaded
	incomplete bool
}

func newLoader(file string, opt Options) *loader {
	l := &loader{opt: opt, problems: &place.Problems{}, sources: place.Sources{}}
	l.root = opt.Root
	if l.root == "" {
		l.root = rootAbove(filepath.Dir(file))
	}
	l.root = real(l.root)
	return l
}

// rootAbove returns the nearest folder at or above dir that has a .git, else dir.
func rootAbove(dir string) string {
	absolute, err := filepath.Abs(dir)
	if err != nil {
		return dir
	}
	for at := absolute; ; at = filepath.Dir(at) {
		if _, err := os.Stat(filepath.Join(at, ".git")); err == nil {
			return at
		}
		if at == filepath.Dir(at) {
			return absolute
		}
	}
}

// real returns the absolute path with symbolic links resolved as far as the path exists.
func real(name string) string {
	absolute, err := filepath.Abs(name)
	if err != nil {
		absolute = filepath.Clean(name)
	}
	if resolved, err := filepath.EvalSymlinks(absolute); err == nil {
		return resolved
	}
	if parent := filepath.Dir(absolute); parent != absolute {
		return filepath.Join(real(parent), filepath.Base(absolute))
	}
	return absolute
}

// load reads a file and merges it over its basis; named is the place that names the file. It returns
// nil if the file cannot be used.
func (l *loader) load(name string, named place.Place) *node {
	where := named
	if where.IsZero() {
		where = place.Place{File: name}
	}
	data, err := l.read(name)
	if err != nil {
		l.incomplete = true
		l.problems.Add(unreadable(where, name, err))
		return nil
	}
	l.sources[name] = data
	l.digests = append(l.digests, digest(name, data))
	l.chain = append(l.chain, real(filepath.FromSlash(name)))
	text, ok := checkText(name, data, l.problems)
	if !ok {
		l.incomplete = true
		return nil
	}
	own := decode(text, l.problems)
	if own == nil {
		l.incomplete = true
		return nil
	}
	k, ok := own.child("basis")
	if !ok || k.value.shape == faulty {
		l.incomplete = l.incomplete || ok
		return own
	}
	below, ok := l.basis(name, k)
	if !ok {
		l.incomplete = true
		return own
	}
	base := l.load(below, k.value.place)
	if base == nil {
		return own
	}
	return mergeBasis(own, base, k.value.place)
}

// basis checks the path behind `basis:` and returns it relative to where the board file's name is.
func (l *loader) basis(name string, k key) (string, bool) {
	v := k.value
	refuse := func(kind place.Kind, got, want, hint string) (string, bool) {
		at := v.place
		if v.shape != scalar || v.text == "" {
			at = k.place
		}
		l.problems.Add(place.Problem{Place: at, Path: "basis", Kind: kind, Got: got, Want: want, Hint: hint})
		return "", false
	}
	const relative = "a path relative to this file"
	switch {
	case v.shape != scalar || v.isSilent() || v.isNone():
		return refuse(place.WrongShape, v.describe(), relative, "write basis: ../basis.yaml, or leave the key out")
	case path.IsAbs(v.text) || filepath.IsAbs(v.text) || filepath.VolumeName(v.text) != "":
		return refuse(place.Unreadable, place.Quote(v.text)+", an absolute path", relative, "write basis: ../basis.yaml")
	case strings.Contains(v.text, `\`):
		return refuse(place.Unreadable, place.Quote(v.text), relative+" with / between its parts", "write basis: ../basis.yaml")
	case len(l.chain) >= longestChain:
		return refuse(place.TooDeep, fmt.Sprintf("a chain of more than %d files", longestChain), "a file with few files below it",
			"put what the files share into one basis")
	}
	below := path.Join(path.Dir(name), v.text)
	target := real(filepath.FromSlash(below))
	if inside, err := filepath.Rel(l.root, target); err != nil || inside == ".." || strings.HasPrefix(inside, ".."+string(filepath.Separator)) {
		return refuse(place.Unreadable, place.Quote(v.text)+", which leads out of the project", "a file inside the project",
			"move the basis into the project")
	}
	for _, before := range l.chain {
		if before == target {
			return refuse(place.Contradiction, place.Quote(v.text)+", which builds on this file itself", "files that do not build on each other in a circle", "")
		}
	}
	return below, true
}

// read returns the content of a file, at most a little more than the largest size.
func (l *loader) read(name string) ([]byte, error) {
	if l.opt.ReadFile != nil {
		return l.opt.ReadFile(name)
	}
	info, err := os.Stat(filepath.FromSlash(name))
	if err != nil {
		return nil, err
	}
	if !info.Mode().IsRegular() {
		return nil, errNoFile
	}
	f, err := os.Open(filepath.FromSlash(name))
	if err != nil {
		return nil, err
	}
	defer f.Close()
	return io.ReadAll(io.LimitReader(f, largestFile+1))
}

var errNoFile = errors.New("it is a folder or a device")

func unreadable(at place.Place, name string, err error) place.Problem {
	p := place.Problem{Place: at, Kind: place.Unreadable, Want: "a file that can be read"}
	inner := &fs.PathError{}
	switch {
	case errors.Is(err, fs.ErrNotExist):
		p.Kind, p.Got, p.Want, p.Hint = place.MissingFile, "no file "+place.Quote(name), "a board file", "check the path"
	case errors.Is(err, fs.ErrPermission):
		p.Got = place.Quote(name) + ", which may not be read"
	case errors.As(err, &inner):
		p.Got = place.Quote(name) + ": " + inner.Err.Error()
	default:
		p.Got = place.Quote(name) + ": " + err.Error()
	}
	return p
}
