package main

import (
	"fmt"
	"io/fs"
	"os"
	"path/filepath"
	"slices"
	"strings"

	"boardproof/checker/place"
	"boardproof/checker/spec"
)

// readBoards reads the board files that the arguments name; a folder stands for every
// board file below it, no argument for this folder. Problems of all files are
// reported together: a board that cannot be read is never left out in silence.
func readBoards(args []string, root string) ([]*spec.Board, error) {
	if len(args) == 0 {
		args = []string{"."}
	}
	names, err := boardFiles(args)
	if err != nil {
		return nil, err
	}
	var boards []*spec.Board
	problems := &place.Problems{}
	sources := place.Sources{}
	for _, name := range names {
		board, texts, found := spec.Read(name, spec.Options{Root: root})
		for _, p := range found.All() {
			problems.Add(p)
		}
		for file, text := range texts {
			sources[file] = text
		}
		boards = append(boards, board)
	}
	if problems.Len() > 0 {
		return nil, &problemsError{problems, sources, "no review was made"}
	}
	return boards, nil
}

// boardFiles lists the files to read, sorted, each once. A file named is taken as it
// is; in a folder only YAML files that are boards count, and folders whose name
// begins with a dot are passed over.
func boardFiles(args []string) ([]string, error) {
	var names, absent []string
	for _, arg := range args {
		info, err := os.Stat(arg)
		if err != nil {
			absent = append(absent, place.Quote(arg))
			continue
		}
		if !info.IsDir() {
			names = append(names, filepath.ToSlash(filepath.Clean(arg)))
			continue
		}
		below, err := boardFilesBelow(arg)
		if err != nil {
			return nil, err
		}
		if len(below) == 0 {
			return nil, fmt.Errorf(`found no board file below %s; a board file is a YAML file with a key "board"`, place.Quote(arg))
		}
		names = append(names, below...)
	}
	if len(absent) > 0 {
		return nil, fmt.Errorf("found no file or folder %s", strings.Join(absent, ", "))
	}
	slices.Sort(names)
	return slices.Compact(names), nil
}

func boardFilesBelow(folder string) ([]string, error) {
	var names []string
	err := filepath.WalkDir(folder, func(name string, entry fs.DirEntry, err error) error {
		if err != nil {
			return err
		}
		if entry.IsDir() {
			if name != folder && strings.HasPrefix(entry.Name(), ".") {
				return fs.SkipDir
			}
			return nil
		}
		if ext := filepath.Ext(name); ext != ".yaml" && ext != ".yml" {
			return nil
		}
		data, err := os.ReadFile(name)
		if err != nil {
			return err
		}
		if spec.IsBoardFile(data) {
			names = append(names, filepath.ToSlash(filepath.Clean(name)))
		}
		return nil
	})
	return names, err
}
