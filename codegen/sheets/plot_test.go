package sheets

import (
	"bytes"
	"encoding/xml"
	"image/png"
	"io"
	"math"
	"strings"
	"testing"
)

func hostilePlot() Plot {
	return Plot{
		Title: `</title><script>alert(1)</script>"&` + "\u202e\x1b[2J", About: "a <b> & 'c'", XLabel: "time & <min>", YLabel: "degC",
		Curves: []Curve{{Name: "old & <new>", X: []float64{0, 1, 2}, Y: []float64{54, 60, 54}}, {Name: "new", X: []float64{0, 2}, Y: []float64{55, 59}}},
		Levels: []Level{{Name: "break <60>", At: 60}, {Name: "make", At: 59.9}},
		Bands:  []Band{{0, 1}}, BandName: "on",
	}
}

// The picture is well-formed, and text from a sheet stays text in it.
func TestPlotIsWellFormedAndDefused(t *testing.T) {
	data := hostilePlot().SVG()
	var texts, elements []string
	d := xml.NewDecoder(bytes.NewReader(data))
	for {
		token, err := d.Token()
		if err == io.EOF {
			break
		}
		if err != nil {
			t.Fatalf("%v in\n%s", err, data)
		}
		switch x := token.(type) {
		case xml.StartElement:
			elements = append(elements, x.Name.Local)
			for _, a := range x.Attr {
				if strings.HasPrefix(a.Name.Local, "on") || a.Name.Local == "href" {
					t.Errorf("attribute %s", a.Name.Local)
				}
			}
		case xml.CharData:
			texts = append(texts, string(x))
		}
	}
	if strings.Contains(strings.Join(elements, " "), "script") {
		t.Errorf("elements: %v", elements)
	}
	if elements[0] != "svg" || elements[1] != "title" || elements[2] != "desc" {
		t.Errorf("no title and description first: %v", elements[:3])
	}
	all := strings.Join(texts, "|")
	for _, want := range []string{"<script>", "a <b> & 'c'", "break <60>", "old & <new>"} {
		if !strings.Contains(all, want) {
			t.Errorf("%q is not to be read in it", want)
		}
	}
	if strings.ContainsAny(string(data), "\u202e\x1b") || strings.Contains(string(data), "NaN") {
		t.Error("hidden characters or no numbers in the picture")
	}
}

func TestPlotInPixels(t *testing.T) {
	data, err := hostilePlot().PNG()
	if err != nil {
		t.Fatal(err)
	}
	picture, err := png.Decode(bytes.NewReader(data))
	if err != nil {
		t.Fatal(err)
	}
	if b := picture.Bounds(); b.Dx() != 1600 || b.Dy() != 840 {
		t.Fatalf("%v", b)
	}
	// The first curve has its peak at half the time: its colour is there, and
	// nowhere above.
	seen := func(x, y int) bool {
		r, g, b, _ := picture.At(x, y).RGBA()
		return r>>8 < 40 && g>>8 > 60 && g>>8 < 120 && b>>8 > 110
	}
	p := hostilePlot()
	xs, ys := p.scales()
	px, py := int(xs.at(1)*pixels), int(ys.at(60)*pixels)
	found := false
	for y := py - 4; y <= py+4; y++ {
		found = found || seen(px, y)
	}
	if !found {
		t.Error("no curve where its peak has to be")
	}
	again, err := hostilePlot().PNG()
	if err != nil || !bytes.Equal(data, again) {
		t.Error("two drawings differ")
	}
}

func TestPlotOfNothing(t *testing.T) {
	for _, p := range []Plot{{}, {Curves: []Curve{{X: []float64{0, 1}, Y: []float64{5, 5}}}}} {
		if s := string(p.SVG()); strings.Contains(s, "NaN") || strings.Contains(s, "Inf") {
			t.Errorf("no numbers in %s", s)
		}
	}
}

// Labels keep their order and a line's distance.
func TestLabelsApart(t *testing.T) {
	at := []float64{100, 101, 103, 300}
	out := apart(at, 15)
	for i := 1; i < len(out); i++ {
		if out[i]-out[i-1] < 15-0.5 {
			t.Errorf("%v", out)
		}
	}
	if math.Abs(out[3]-300) > 1e-9 {
		t.Errorf("a label that had room was moved: %v", out)
	}
	// round numbers: 1, 2 or 5 times a power of ten
	if got := ticks(53.4, 60.9, 6); len(got) != 4 || got[0] != 54 || got[3] != 60 {
		t.Errorf("%v", got)
	}
}
