package main

import (
	"fmt"
	"os"
	"path/filepath"
)

// piece is a file to be written.
type piece struct {
	path string
	data []byte
}

// write puts files in place only once all of them are written whole beside their places; where one cannot be put in
// place, those before it are taken back, so that there is the old set or the new one.
func write(pieces ...piece) (err error) {
	aside := make([]string, 0, len(pieces))
	defer func() {
		for _, a := range aside {
			os.Remove(a) // already renamed where all went well
		}
	}()
	for _, p := range pieces {
		if s, err := os.Stat(p.path); err == nil && !s.Mode().IsRegular() {
			return fmt.Errorf("soffit: %s is no file and cannot be written over: move it, or name another folder with --out", p.path)
		}
		name, err := writeAside(p)
		if err != nil {
			return fmt.Errorf("soffit: %w", err)
		}
		aside = append(aside, name)
	}
	var undo []func()
	for i, p := range pieces {
		kept := aside[i] + ".before"
		had := os.Rename(p.path, kept) == nil
		if err := os.Rename(aside[i], p.path); err != nil {
			if had {
				os.Rename(kept, p.path)
			}
			for _, u := range undo {
				u()
			}
			return fmt.Errorf("soffit: %w", err)
		}
		undo = append(undo, func() {
			os.Remove(p.path)
			if had {
				os.Rename(kept, p.path)
			}
		})
		if had {
			aside = append(aside, kept)
		}
	}
	return nil
}

// writeAside writes a piece whole to a file of its own beside its place.
func writeAside(p piece) (string, error) {
	f, err := os.CreateTemp(filepath.Dir(p.path), "."+filepath.Base(p.path)+".*")
	if err != nil {
		return "", err
	}
	_, err = f.Write(p.data)
	if e := f.Chmod(0o644); err == nil {
		err = e
	}
	if e := f.Close(); err == nil {
		err = e
	}
	if err != nil {
		os.Remove(f.Name())
	}
	return f.Name(), err
}
