package text

import (
	"bytes"

	"github.com/yuin/goldmark/ast"
	"github.com/yuin/goldmark/parser"
	gm "github.com/yuin/goldmark/text"
)

// value is {key} in narrative: the value of a symbol or of an entry's full key.
type value struct {
	ast.BaseInline
	key  string
	at   int  // offset in the source
	open bool // the closing brace is missing
}

var kindValue = ast.NewNodeKind("Value")

func (v *value) Kind() ast.NodeKind { return kindValue }

func (v *value) Dump(source []byte, level int) {
	ast.DumpHelper(v, source, level, map[string]string{"Key": v.key}, nil)
}

// valueParser reads {key}; braces within the key, as in {f_{p0,1k}}, come in pairs.
type valueParser struct{}

func (valueParser) Trigger() []byte { return []byte{'{'} }

func (valueParser) Parse(parent ast.Node, block gm.Reader, pc parser.Context) ast.Node {
	line, segment := block.PeekLine()
	depth := 0
	for i, b := range line {
		switch b {
		case '{':
			depth++
		case '}':
			depth--
		}
		if depth == 0 {
			block.Advance(i + 1)
			return &value{key: string(bytes.TrimSpace(line[1:i])), at: segment.Start}
		}
	}
	block.Advance(1)
	return &value{at: segment.Start, open: true}
}
