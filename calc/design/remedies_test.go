package design

import (
	"os"
	"testing"

	"soffit/calc/member"
)

// TestDeeperSectionLiftsTopping: bars in a topping rise with the top of the member, those of the member stay.
func TestDeeperSectionLiftsTopping(t *testing.T) {
	const file = "../../testdata/members/u-beam-bridge-deck.yaml"
	src, err := os.ReadFile(file)
	if err != nil {
		t.Fatal(err)
	}
	m, findings := member.Read(file, src, Options())
	if err := findings.Err(); err != nil {
		t.Fatal(err)
	}
	depth := m.Shape.Depth.Base()
	heights := map[string]float64{}
	for _, r := range m.Bars.Rows {
		heights[r.Name.Text] = r.Height.Base()
	}
	if deeperSection(m, 2) == "" || m.Shape.Depth.Base() != depth+100 {
		t.Fatalf("depth %s", m.Shape.Depth)
	}
	for _, r := range m.Bars.Rows {
		want := heights[r.Name.Text]
		if want > depth {
			want += 100
		}
		if r.Height.Base() != want {
			t.Errorf("%s at %s, want %g mm", r.Name.Text, r.Height, want)
		}
	}
	if heights["topping bars"] <= depth || heights["web bars"] >= depth {
		t.Errorf("the sample has no bars in its topping: %v", heights)
	}
}
