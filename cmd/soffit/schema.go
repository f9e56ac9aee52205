package main

import (
	"io"

	"soffit/calc/design"
	"soffit/calc/member"
	"soffit/calc/trace"
)

type schemaCommand struct {
	Of string `arg:"" name:"of" help:"member: the member file. trace: the record of a design."`
}

func (c *schemaCommand) run(out, problems io.Writer) int {
	var schema []byte
	switch c.Of {
	case "member":
		schema = member.Schema(design.Options())
	case "trace":
		schema = trace.Schema
	default:
		say(problems, "soffit: schema: %s\n", unknown(c.Of, []string{"member", "trace"}))
		return noNote
	}
	if _, err := out.Write(schema); err != nil {
		say(problems, "soffit: %v\n", err)
		return noNote
	}
	return passes
}
