package design

import (
	"fmt"
	"strings"

	"soffit/calc/clause"
	"soffit/calc/ec2"
	"soffit/calc/member"
	"soffit/calc/quantity"
	"soffit/calc/trace"
	"soffit/templates"
)

// basisChapter states what the design rests on: the code, every national parameter, assumptions and limits.
func (j *job) basisChapter(c *trace.Chapter) {
	b := c.Block("code", "Code and situation", nil)
	s := &j.m.Basis
	b.Text("code", fmt.Sprintf("Code: %s, with EN 1990. Combination of actions at the ultimate limit state: %s. Consequence class %s; "+
		"supervision of the design %s; design working life %s.%s Cement class %s, which decides nothing in this note.\n\nThe clause and equation numbers were recalled, not checked against "+
		"the opened standard, when the program was written.", literal(s.Code.Text), s.Combination.Text, s.ConsequenceClass.Text,
		s.SupervisionLevel.Text, s.DesignWorkingLife, exposures(s.Exposure), j.m.Concrete.CementClass.Text))
	j.nationalParameters(c)
	b = c.Block("assumptions", "Assumptions and defaults", nil)
	b.Text("assumptions", j.assumptions())
	b = c.Block("signs", "Signs, units and rounding", nil)
	b.Text("signs", templates.Text("signs"))
	b = c.Block("limits", "What this note covers, and what it does not", nil)
	b.Text("limits", templates.Text("limits"))
}

// literal keeps text of the member file from being read as Markdown or as a value.
func literal(s string) string {
	return markup.Replace(s)
}

var markup = strings.NewReplacer("{", "(", "}", ")", "`", "'", "*", `\*`, "_", `\_`, "[", `\[`, "]", `\]`, "<", `\<`, "|", `\|`, "#", `\#`, `\`, `\\`)

func exposures(list []member.Word) string {
	if len(list) == 0 {
		return ""
	}
	words := make([]string, len(list))
	for i, w := range list {
		words[i] = w.Text
	}
	return " Exposure: " + strings.Join(words, ", ") + "."
}

// nationalParameters lists every parameter with its value and source. Expressions are listed in words here and
// evaluated where they are used.
func (j *job) nationalParameters(c *trace.Chapter) {
	b := c.Block("parameters", "Nationally determined parameters", nil)
	j.parameters = b
	expressions := []string{}
	for i := range ec2.Parameters {
		p := &ec2.Parameters[i]
		own := j.own(p)
		switch {
		case p.Formula != nil:
			f, source := j.formula(p.Formula)
			if tree, err := f.Parsed(); err == nil {
				expressions = append(expressions, fmt.Sprintf("`%s` (%s; %s)", tree, p.Given.Ref, literal(source)))
			}
		case p.Rows != nil:
			j.combinationFactors(b, p, own)
		case own != nil:
			b.Given(&p.Given, own.Value.Literal, nationalSource(own))
		default:
			l, err := quantity.Parse(p.Value)
			if err == nil {
				b.Given(&p.Given, l, "recommended value")
			}
		}
	}
	b.Text("expressions", "Parameters that are expressions: "+strings.Join(expressions, "; ")+".")
}

func nationalSource(p *member.NationalParameter) string {
	return fmt.Sprintf("%s (member file, line %d)", p.Source.Text, p.Pos.Line)
}

// own finds what the member file says of a parameter.
func (j *job) own(p *ec2.Parameter) *member.NationalParameter {
	list := j.m.Basis.NationalParameters
	for i := range list {
		if list[i].Key == p.Given.Symbol {
			return &list[i]
		}
	}
	return nil
}

// formula is a recommended expression or what the member file puts in its place, with its source.
func (j *job) formula(f *clause.Formula) (*clause.Formula, string) {
	for i := range ec2.Parameters {
		p := &ec2.Parameters[i]
		if p.Formula != f {
			continue
		}
		if own := j.own(p); own != nil {
			text := own.Expression.Text
			if text == "" {
				text = own.Value.Number
				if u := own.Value.Unit.String(); u != "" {
					text += "·[" + u + "]"
				}
			}
			return f.With(text, fmt.Sprintf("national parameter %s, line %d of the member file", own.Key, own.Pos.Line)), nationalSource(own)
		}
	}
	return f, "recommended expression"
}

// combinationFactors lists ψ₀, ψ₁, ψ₂ of the categories.
func (j *job) combinationFactors(b *trace.Block, p *ec2.Parameter, own *member.NationalParameter) {
	axis := j.n.Axis("category", "category of action", "j", p.Rows)
	for k, symbol := range []string{"ψ_{0,j}", "ψ_{1,j}", "ψ_{2,j}"} {
		values := make([]quantity.Literal, len(p.Rows))
		source := "recommended values"
		for r := range p.Rows {
			values[r] = plain(p.Table[r][k], "")
			if own != nil {
				values[r] = own.Table[r].Values[k].Literal
				source = nationalSource(own)
			}
		}
		b.GivenRows(def(fmt.Sprintf("psi-%d", k), symbol, [...]string{"Combination value", "Frequent value", "Quasi-permanent value"}[k], "", p.Given.Ref), axis, values, source)
	}
}

// assumptions lists every default that the member file left to stand and what each simplification affects.
func (j *job) assumptions() string {
	var b strings.Builder
	add := func(format string, args ...any) { fmt.Fprintf(&b, "- "+format+"\n", args...) }
	add("Losses of prestress are those stated in the member file, row by row, and leave out what permanent loads add to the tendon stress. They decide the prestrain, and through it the resistance where tendons do not yield; the transmission length follows the stress after release.")
	if j.ducted() {
		add("Tendons are anchored at the ends of the concrete, are grouted before any load but the self-weight acts, and lie in one vertical plane each: friction counts changes of direction in elevation alone.")
		add("Losses beside friction are alike over the whole length of a tendon, draw-in among them.")
	} else {
		add("Tendons end at the ends of the concrete; their bond starts at the end of the debonded length, which carries nothing.")
	}
	if j.hasTopping() {
		add("Topping and member act together without slip once the topping is hard; creep and shrinkage of one against the other are left out, and the strain that the member has by then is elastic. The fresh topping takes γ_Q while it is cast, as a construction load.")
	}
	switch j.law() {
	case "block":
		add("The concrete in compression acts as the rectangular block of 3.1.7(3).")
	default:
		bare := pick(j.hasTopping(), "; the bare member while it is built the rectangular block of 3.1.7(3)", "")
		add("The concrete in compression follows the %s diagram, 3.1.7, in fibres%s.", j.law(), bare)
	}
	if j.hasAxial() {
		add("Axial forces act at the centroid of the bare section from end to end; the section is asked beside the least and beside the greatest of them, each with every moment. Second-order effects are left out.")
	}
	if j.anyDeflected() {
		add("Deflected tendons lose nothing by friction where they are held down beyond the losses stated.")
	}
	add("Loads act on the whole width; their positions are measured from end A of the concrete. Bearings are knife edges at their middles.")
	add("The compressed flange is held against lateral buckling%s.", pick(j.hasTopping(), ", also while the topping is cast", ""))
	if j.m.Shape.Kind.Text == "hollow unit" {
		add("The concrete that fills the joints between units is neither in the self-weight nor in the section: write its weight as an action. EN 1168 stands beside EN 1992-1-1 for such units.")
	}
	if len(j.m.Bars.Rows) > 0 {
		add("Bars are straight and end %s mm from the ends of the concrete; each α of 8.4.4 is taken as 1.", endCover)
	}
	for _, d := range j.defaults() {
		add("%s", d)
	}
	return b.String()
}

// defaults are the values that the member file left out, with the reason of each.
func (j *job) defaults() []string {
	var out []string
	say := func(what string, o member.Origin, value string) {
		if !o.Given && value != "" && o.Why != "" {
			out = append(out, fmt.Sprintf("%s: %s, by default (%s).", what, value, o.Why))
		}
	}
	m := j.m
	say("Code", m.Basis.Code.Origin, m.Basis.Code.Text)
	say("Consequence class", m.Basis.ConsequenceClass.Origin, m.Basis.ConsequenceClass.Text)
	say("Supervision level", m.Basis.SupervisionLevel.Origin, m.Basis.SupervisionLevel.Text)
	say("Design working life", m.Basis.DesignWorkingLife.Origin, m.Basis.DesignWorkingLife.String())
	say("Cement class", m.Concrete.CementClass.Origin, m.Concrete.CementClass.Text)
	say("Aggregate", m.Concrete.Aggregate.Origin, m.Concrete.Aggregate.Text)
	say("Steel diagram of the tendons", j.steelDiagram().Origin, j.steelDiagram().Text+" upper branch")
	say("Release", m.Strands.Release.Origin, m.Strands.Release.Text)
	if len(m.Bars.Rows) > 0 {
		say("Steel diagram of the bars", m.Bars.SteelDiagram.Origin, m.Bars.SteelDiagram.Text+" upper branch")
	}
	return out
}
