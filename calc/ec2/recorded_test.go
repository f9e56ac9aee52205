package ec2_test

import (
	"math"
	"strings"
	"testing"

	"soffit/calc/clause"
	"soffit/calc/creep"
	"soffit/calc/ec2"
	"soffit/calc/quantity"
	"soffit/calc/trace"
)

// TestRecordedThroughTime records an invented heat-cured concrete over stages, the implicit axis, with its temperature history
// and two rows of tendons, and holds the record against its closure and against the laws on plain numbers.
func TestRecordedThroughTime(t *testing.T) {
	n := trace.New(trace.Document{Program: "test", Title: "invented", InputName: "x.yaml"})
	stages := n.Axis("stage", "stage", "", []string{"release", "erection", "end of life"})
	history := n.Axis("history", "row", "i", []string{"wait", "heat", "after"})
	rows := n.Axis("tendons", "row", "i", []string{"low", "high"})
	c := n.Chapter("time", "Time")
	parse := func(list string) (out []quantity.Literal) {
		for _, s := range strings.Split(list, ", ") {
			l, err := quantity.Parse(s)
			if err != nil {
				t.Fatal(err)
			}
			out = append(out, l)
		}
		return out
	}
	count := 0
	given := func(b *trace.Block, axis *trace.Axis, symbol, values string) {
		l := parse(values)
		count++
		g := &clause.Given{ID: "g" + string(rune('a'-1+count)), Symbol: symbol, Name: symbol, Unit: l[0].Unit.String()}
		if axis == nil {
			b.Given(g, l[0], "invented")
			return
		}
		b.GivenRows(g, axis, l, "invented")
	}

	b := c.Block("concrete", "Concrete", stages)
	for _, v := range [][2]string{{"f_ck", "50 MPa"}, {"f_cm", "58 MPa"}, {"f_ctm", "4.0716 MPa"}, {"E_cm", "37.278 GPa"}, {"s", "0.2"}, {"α", "1"}, {"α_ds1", "6"}, {"α_ds2", "0.11"},
		{"RH", "70 %"}, {"h_0", "180 mm"}, {"t_0", "18 h"}, {"t_s", "1 d"}, {"α_c", "1e-5 1/K"}} {
		given(b, nil, v[0], v[1])
	}
	given(b, stages, "t", "18 h, 60 d, 18250 d")
	given(b, history, "T_i", "20 °C, 60 °C, 20 °C")
	given(b, history, "t_{b,i}", "0 h, 3 h, 12 h")
	given(b, history, "t_{e,i}", "3 h, 12 h, 100000 d")
	b.Steps(ec2.HistoryDuration, ec2.EquivalentAge, ec2.GreatestTemperature)
	b.Require(ec2.HeatCured)
	b.Steps(ec2.RelaxationEquivalentTime, ec2.StrengthGrowthByHistory, ec2.MeanStrengthAtAge, ec2.MeanTensileStrengthAtAge, ec2.SecantModulusAtAge,
		ec2.HistoryDurationAtLoading, ec2.EquivalentAgeAtLoading, ec2.LoadingAge)
	b.Steps(creepStrengths...)
	b.Steps(ec2.CreepHumidity, ec2.CreepStrength, ec2.CreepLoadingAge, ec2.CreepDelay, ec2.CreepDevelopment, ec2.NotionalCreep, ec2.CreepCoefficient, ec2.TangentModulus)
	b.Steps(ec2.ShrinkageHumidity, ec2.DryingShrinkageBasic, ec2.ShrinkageSize, ec2.DryingDevelopment, ec2.DryingShrinkage, ec2.ShrinkageHeatCured,
		ec2.DryingDevelopmentAtLoading, ec2.DryingShrinkageAtLoading, ec2.ShrinkageHeatCuredAtLoading, ec2.ShrinkageSinceLoading)

	l := c.Block("losses", "Losses", stages, trace.Take(b)...)
	for _, v := range [][2]string{{"E_p", "195 GPa"}, {"A_p", "2000 mm²"}, {"A_c", "400000 mm²"}, {"I_c", "50000 10⁶ mm⁴"}, {"z_cp", "300 mm"}} {
		given(l, nil, v[0], v[1])
	}
	given(l, rows, "E_{p,i}", "195 GPa, 195 GPa")
	given(l, rows, "f_{pk,i}", "1860 MPa, 1860 MPa")
	given(l, rows, "ρ_{1000,i}", "2.5 %, 2.5 %")
	given(l, rows, "σ_{pi,i}", "1350 MPa, 1300 MPa")
	given(l, rows, "σ_{c,QP,i}", "12 MPa, 4 MPa")
	given(l, stages, "t_r", "40 h, 1462 h, 500000 h")
	l.Steps(ec2.InitialStressRatio, ec2.Relaxation2, ec2.RelaxationGross, ec2.LongTermLoss)

	if err := n.Err(); err != nil {
		t.Fatal(err)
	}
	if proved, differences := trace.Closure(n); proved == 0 || len(differences) > 0 {
		t.Errorf("%d values proved, %v", proved, differences)
	}

	// The same by the laws on plain numbers; five printed digits part them.
	law := creep.Concrete{Fck: 50, Ecm: 37_278, Humidity: 0.7, Size: 180, Cement: creep.R, DryFrom: 1, HeatCured: true,
		History: creep.History{{From: 0, To: 0.125, Temperature: 20}, {From: 0.125, To: 0.5, Temperature: 60}, {From: 0.5, To: 100_000, Temperature: 20}}}
	strand := creep.Steel{Class: 2, Rho1000: 0.025}
	t0, release := 0.75, 40.0
	for i, age := range []float64{0.75, 60, 18250} {
		for key, want := range map[string]float64{
			"time.concrete/mean-strength-at-age":         law.Strength(age),
			"time.concrete/mean-tensile-strength-at-age": law.Tensile(age),
			"time.concrete/secant-modulus-at-age":        law.Modulus(age),
			"time.concrete/creep-coefficient":            law.Creep(age, t0),
			"time.concrete/shrinkage-since-loading":      law.Shrinkage(age) - law.Shrinkage(t0),
			"time.concrete/relaxation-equivalent-time":   law.History.RelaxationHours(age) / 24,
		} {
			if got := trace.LineOf(n.Entry(key)).Values[i]; !(math.Abs(got-want) <= 1e-4*math.Abs(want)) {
				t.Errorf("%s at %g d: %g, want %g", key, age, got, want)
			}
		}
		hours := []float64{release, 1462, 500_000}[i] + law.History.RelaxationHours(age)
		for row, stress := range []float64{1350, 1300} {
			phi, relaxed := law.Creep(age, t0), stress*strand.Relaxation(stress/1860, hours)
			ratio := 195.0 / 37.278
			want := ((law.Shrinkage(age)-law.Shrinkage(t0))*195_000 + 0.8*relaxed + ratio*phi*[]float64{12, 4}[row]) / (1 + ratio*2000/400_000*(1+400_000.0*300*300/5e10)*(1+0.8*phi))
			if got := trace.LineOf(n.Entry("time.losses/long-term-loss")).Values[2*i+row]; !(math.Abs(got-want) <= 0.03) {
				t.Errorf("loss of row %d at %g d: %g MPa, want %g", row, age, got, want)
			}
		}
	}
}
