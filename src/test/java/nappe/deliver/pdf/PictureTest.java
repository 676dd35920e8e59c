package nappe.deliver.pdf;

import static org.assertj.core.api.Assertions.assertThat;

import com.lowagie.text.pdf.PdfReader;
import com.lowagie.text.pdf.parser.PdfTextExtractor;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import nappe.calculation.Block;
import nappe.figure.DrawnStation;
import nappe.results.Drawing;
import nappe.results.Results;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class PictureTest {
    static Stream<Map.Entry<String, Results>> stations() {
        return DrawnStation.all().entrySet().stream();
    }

    /** Every picture of a package, as on upright and on wide pages. */
    private static List<Picture> pictures(Results results) {
        List<Picture> pictures = new ArrayList<>();
        for (boolean wide : new boolean[] {false, true}) {
            Pictures made = new Pictures(results);
            results.figures().keySet().forEach(key -> made.parts(new Block.Figure(0, "", key), wide ? 240 : 170, wide));
            pictures.addAll(made.made().values());
        }
        return pictures;
    }

    @ParameterizedTest
    @MethodSource("stations")
    void nothingReachesOutOfItsPicture(Map.Entry<String, Results> station) {
        for (Picture picture : pictures(station.getValue())) {
            for (Ink ink : picture.inks()) {
                List<Ink.At> points = ink instanceof Ink.Stroke stroke
                        ? stroke.points()
                        : ink instanceof Ink.Fill fill ? fill.points() : ((Ink.Lettering) ink).corners();
                assertThat(points).as(picture.words() + " " + ink).allSatisfy(point -> {
                    assertThat(point.x()).isBetween(-0.5, picture.width() + 0.5);
                    assertThat(point.y()).isBetween(-0.5, picture.height() + 0.5);
                });
            }
        }
    }

    @ParameterizedTest
    @MethodSource("stations")
    void noTextLiesOnAnother(Map.Entry<String, Results> station) {
        for (Picture picture : pictures(station.getValue())) {
            List<Ink.Lettering> texts = picture.inks().stream()
                    .filter(Ink.Lettering.class::isInstance)
                    .map(Ink.Lettering.class::cast)
                    .filter(text -> !text.characters().isEmpty())
                    .toList();
            List<String> overlaps = new ArrayList<>();
            for (int i = 0; i < texts.size(); i++) {
                for (int j = i + 1; j < texts.size(); j++) {
                    if (Sketch.overlap(texts.get(i), texts.get(j))) {
                        overlaps.add(texts.get(i).characters() + " on "
                                + texts.get(j).characters());
                    }
                }
            }
            assertThat(overlaps).as(picture.words()).isEmpty();
        }
    }

    @Test
    void valuesInTheDrawingAreTextAndThoseOfTheRegister() throws IOException {
        Results results = java.util.Objects.requireNonNull(DrawnStation.all().get("foot"));
        String page = page(PdfDelivery.render(results).bytes(), "Section along the axis");
        Drawing drawing =
                (Drawing) java.util.Objects.requireNonNull(results.figures().get("X1 geometry"));
        for (Drawing.View view : drawing.views()) {
            for (Drawing.Dimension dimension : DrawingPicture.parts(view, Drawing.Dimension.class)) {
                assertThat(page)
                        .contains(Printed.value(results, dimension.value().cell()) + " ft");
            }
        }
        assertThat(page).contains("4.406 ft", "1.000 ft", "scale 1:20", "100.300 ft", "State of flow: free.");
    }

    private static String page(byte[] pdf, String words) throws IOException {
        try (PdfReader reader = new PdfReader(pdf)) {
            PdfTextExtractor extractor = new PdfTextExtractor(reader);
            for (int page = 1; page <= reader.getNumberOfPages(); page++) {
                String text = extractor.getTextFromPage(page).replaceAll("[\\s\\u00a0\\u2002\\u2009]+", " ");
                if (text.contains(words)) {
                    return text;
                }
            }
        }
        return "";
    }

    @Test
    void usualScalesAreTaken() {
        assertThat(DrawingPicture.scale(17.2)).isEqualTo(20);
        assertThat(DrawingPicture.scale(20)).isEqualTo(20);
        assertThat(DrawingPicture.scale(101)).isEqualTo(125);
        assertThat(DrawingPicture.scale(0.9)).isEqualTo(1);
    }
}
