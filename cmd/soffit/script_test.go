package main

import (
	"os"
	"path/filepath"
	"testing"

	"github.com/rogpeppe/go-internal/testscript"
)

func TestMain(m *testing.M) {
	testscript.Main(m, map[string]func(){"soffit": main})
}

// TestScripts runs the program as its user does.
func TestScripts(t *testing.T) {
	members, err := filepath.Abs("../../testdata/members")
	if err != nil {
		t.Fatal(err)
	}
	testscript.Run(t, testscript.Params{
		Dir: "testdata/script",
		Setup: func(env *testscript.Env) error {
			entries, err := os.ReadDir(members)
			if err != nil {
				return err
			}
			for _, e := range entries {
				data, err := os.ReadFile(filepath.Join(members, e.Name()))
				if err != nil {
					return err
				}
				if err := os.WriteFile(filepath.Join(env.WorkDir, e.Name()), data, 0o644); err != nil {
					return err
				}
			}
			return nil
		},
	})
}
