package main

import (
	"os"
	"path/filepath"
)

// piece is a file to be written.
type piece struct {
	path string
	data []byte
}

// write puts files in place only once all of them are written whole beside their places.
func write(pieces ...piece) (err error) {
	aside := make([]string, 0, len(pieces))
	defer func() {
		for _, a := range aside {
			os.Remove(a) // already renamed where all went well
		}
	}()
	for _, p := range pieces {
		f, err := os.CreateTemp(filepath.Dir(p.path), "."+filepath.Base(p.path)+".*")
		if err != nil {
			return err
		}
		aside = append(aside, f.Name())
		_, err = f.Write(p.data)
		if e := f.Chmod(0o644); err == nil {
			err = e
		}
		if e := f.Close(); err == nil {
			err = e
		}
		if err != nil {
			return err
		}
	}
	for i, p := range pieces {
		if err := os.Rename(aside[i], p.path); err != nil {
			return err
		}
	}
	return nil
}
