package mathset

import (
	"soffit/calc/formula"
	"soffit/report/draw"
)

// Invented values for symbols; those that are not here stay symbols.
var values = map[string]Operand{
	"α_cc": {Number: "1.00"}, "f_ck": {Number: "45", Unit: "MPa", Anchor: "materials/f-ck"}, "γ_C": {Number: "1.50"},
	"f_{p0,1k}": {Number: "1640", Unit: "MPa"}, "γ_S": {Number: "1.15"}, "x": {Number: "69.323", Unit: "mm"},
	"b_f": {Number: "1200", Unit: "mm"}, "h_f": {Number: "140", Unit: "mm"}, "F_p": {Number: "1996.5", Unit: "kN"},
	"ε_cu3": {Number: "3.5", Unit: "‰"}, "f_cm": {Number: "58", Unit: "MPa"}, "E_p": {Number: "195000", Unit: "MPa"},
	"I_c": {Number: "12345678", Unit: "10⁶ mm⁴"}, "A_c": {Number: "215000", Unit: "mm²"}, "t": {Number: "28", Unit: "d"},
	"M_g": {Number: "-83.3", Unit: "kN·m"}, "e_p": {Number: "312.4", Unit: "mm"}, "ψ_0": {Number: "-0.7"},
	"q": {Number: "12.5", Unit: "kN/m"}, "L": {Number: "18.30", Unit: "m"}, "a": {Number: "1.5e-3"},
}

// One of each thing that is set; several are of the standard's form, values and places are invented.
var formulas = []string{
	"f_cd = α_cc·f_ck/γ_C",
	"f_pd = f_{p0,1k}/γ_S",
	"F_p = Σ_i(A_{p,i}·f_pd)",
	"x = F_p/(η·f_cd·λ·b_f)",
	"ε_{p,i} = σ_{p,∞}/E_p + ε_cu3·(d_i − x)/x",
	"M_Rd = Σ_i(F_{p,i}·(d_i − λ·x/2))",
	"f_ctm = 0.30·(f_ck/[MPa])^(2/3)·[MPa]",
	"f_ctm = 2.12·ln(1 + f_cm/(10·[MPa]))·[MPa]",
	"E_cm = 22·(f_cm/(10·[MPa]))^0.3·[GPa]",
	"β_cc(t) = exp(s·(1 − sqrt(28·[d]/t)))",
	"σ_b = P_m0/A_c + P_m0·e_p·y_b/I_c − M_g·y_b/I_c",
	"k = min(1 + sqrt(200·[mm]/e_p); 2.0)",
	"η = cases(f_ck ≤ 50·[MPa]: 1.0; otherwise: 1.0 − (f_ck − 50·[MPa])/(200·[MPa]))",
	"φ(t,t_0) = φ_0·((t − t_0)/(β_H + t − t_0))^0.3",
	"φ_RH = 1 + (1 − RH/100)/(0.1·(h_0/[mm])^(1/3))·α_1·α_2",
	"Δσ_{p,c+s+r} = (ε_cs·E_p + 0.8·Δσ_pr + E_p/E_cm·φ(t,t_0)·σ_{c,QP})/(1 + E_p/E_cm·(A_p/A_c)·(1 + A_c/I_c·z_cp^2)·(1 + 0.8·φ(t,t_0)))",
	"M_Ed = q·L^2/8",
	"d' = d_i' + h_f'' − a",
	"σ_x = abs(M_g)·y_b/I_c",
	"z = −(e_p − y_b)·(x − h_f)",
	"ψ_{0,i} = max(γ_{G,j}·ξ; γ_Q·ψ_0)",
	"x_m = min_i(ε_{p,i}) + min_i(d_i − x) − max_j(q_j)",
	"V_Rdc = I_c·b_w/S_c·sqrt(f_ctd^2 + α_l·σ_cp·f_ctd)",
	"θ = cot(θ) + tan(α) + sin(2·θ) + ln(x/h_f)",
	"p = A'^2 + (A_p^2)^2 + (x/h_f)^2 + f_ck^2 + M_g^2 + A_p''^(2/3)",
	"f = f_f·j_j + (f)·p_p^y + y_g·T_T + V_V + P_p + Γ_y + f^f + Q_Q^Q",
	"κ = min(ε_cu3/x; min_i((ε_ud − ε_{p0,i})/(d_i − x)))",
	"r = sqrt(sqrt(x) + sqrt((a/b)/(c/d)))",
	"y = 2·(3·(4·(x + 1) + 2) + 1)·π",
	"c = cases(x ≤ h_f and λ·x > 0·[mm]: x; ψ_0 < 1 or (f_ck > 50·[MPa] and γ_C = 1.5): h_f/2; otherwise: 0·[mm])",
	"M = Σ_i(Σ_j(γ_{G,j}·G_{j,i}) + ψ_0)·L",
	"N = −Σ_i(−A_{p,i})",
}

// rowsOf numbers: values of indexed symbols by row.
var rowsOf = []Operand{{Number: "855.7", Unit: "kN"}, {Number: "-114.9", Unit: "kN"}, {Number: "12.3", Unit: "kN"},
	{Number: "7.5", Unit: "kN"}, {Number: "99", Unit: "kN"}}

func inSymbols() Setting { return Setting{Size: 10.5} }

func inNumbers(rows int) Setting {
	s := inSymbols()
	s.Len = func(string) int { return rows }
	s.Operand = func(n *formula.Symbol, at map[string]int) (Operand, bool) {
		for _, i := range n.Index {
			if r, ok := at[i]; ok {
				return rowsOf[r%len(rowsOf)], true
			}
		}
		o, ok := values[n.Name]
		return o, ok
	}
	return s
}

func whole(symbols, numbers Setting, f *formula.Formula) Row {
	return symbols.Symbol(f.Symbol).Related("=", symbols.Expr(f.Expr)).Related("=", numbers.Expr(f.Expr)).
		Related("=", numbers.Result("1234.5", "kN·m"))
}

func parsed(src string) *formula.Formula {
	f, err := formula.Parse(src)
	if err != nil {
		panic(src + ": " + err.Error())
	}
	return f
}

// sequence keeps texts, hidden ones too, in the order drawn.
type sequence struct {
	draw.Recorder
	list []string
}

func (s *sequence) Text(x, y draw.Pt, f draw.Face, size draw.Pt, t string) {
	s.list = append(s.list, t)
}
func (s *sequence) Hidden(x, y, size draw.Pt, t string) { s.list = append(s.list, t) }

// texts sets a row in one line and gives its texts in the order drawn.
func texts(r Row) []string {
	var s sequence
	r.Box().Draw(&s, 100, 100)
	return s.list
}
