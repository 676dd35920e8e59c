package nappe.deliver.pdf;

import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Stream;
import nappe.results.Furniture;

/** What head and foot of every page say, cut to the room there is. Public for the template. */
public record Furnishing(
        String firm,
        String project,
        String client,
        String subject,
        String number,
        String revision,
        String date,
        String status,
        String fingerprint,
        String version,
        String release,
        List<String> cautions) {
    private static final double POINT_LINE = 25.4 / 72 * 1.2;

    static Furnishing of(Furniture furniture, PageSize page) {
        double wide = page.upright() * 0.62 - 3;
        double client = page.upright() * 0.43 - 3;
        double narrow = page.upright() * 0.19 - 3;
        return new Furnishing(
                fit(furniture.firm(), wide),
                fit(furniture.project(), wide),
                fit(furniture.client(), client),
                fit(furniture.subject(), wide),
                fit(furniture.number(), narrow),
                fit(furniture.revision(), narrow),
                furniture.date().toString(),
                fit(furniture.status(), narrow),
                XmlText.safe(furniture.fingerprint()),
                XmlText.safe(furniture.version()),
                XmlText.safe(furniture.release()),
                furniture.cautions().stream().map(XmlText::safe).toList());
    }

    /** One line for each field that was cut. */
    List<String> warnings(Furniture furniture) {
        Map<String, String> whole = new TreeMap<>(Map.of(
                "firm", furniture.firm(),
                "project", furniture.project(),
                "client", furniture.client(),
                "subject", furniture.subject(),
                "calculation number", furniture.number(),
                "revision", furniture.revision(),
                "status", furniture.status()));
        whole.values()
                .removeIf(text -> Stream.of(firm, project, client, subject, number, revision, status)
                        .anyMatch(printed -> printed.equals(XmlText.safe(text))));
        return whole.keySet().stream()
                .map(field -> "the " + field + " is too long for the head of the page and is cut there")
                .toList();
    }

    /** The height of the page foot in mm. */
    double footHeight(PageSize page) {
        double width = page.upright() * 0.72;
        double height = 2;
        for (String caution : cautions) {
            height += lines(caution, width, 7) * 7 * POINT_LINE;
        }
        return height + (release.isEmpty() ? 0 : lines(release, width, 8) * 8 * POINT_LINE + 1);
    }

    private static double lines(String text, double width, double size) {
        return Math.ceil(Typefaces.width(text, Typefaces.BOLD, size) / width);
    }

    /** The text, or as much of its start as one line holds, with dots. */
    private static String fit(String text, double width) {
        String safe = XmlText.safe(text);
        if (Typefaces.width(safe, Typefaces.BOLD, 8) <= width) {
            return safe;
        }
        StringBuilder start = new StringBuilder();
        double used = Typefaces.width("…", Typefaces.BOLD, 8);
        for (int character : safe.codePoints().toArray()) {
            used += Typefaces.width(Character.toString(character), Typefaces.BOLD, 8);
            if (used > width) {
                break;
            }
            start.appendCodePoint(character);
        }
        return start.toString().strip() + "…";
    }
}
