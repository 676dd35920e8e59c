package nappe.job;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.Collection;
import java.util.HexFormat;
import java.util.Map;
import java.util.TreeMap;
import nappe.formula.Value;
import nappe.method.MethodSheet;
import nappe.station.Design;

/**
 * The mark by which sheets, workbook and PDF are known to belong together: a hash of the typed values in a fixed order,
 * the texts of the methods with all they include, their tables and drawings, and the version; not of any file's bytes.
 */
public final class Fingerprint {
    private final StringBuilder text = new StringBuilder();

    private Fingerprint() {}

    /**
     * Sixteen hexadecimal digits in groups of four.
     *
     * @param drawings the texts of the figures, by the name of their method
     */
    public static String of(
            Design design, Collection<MethodSheet> methods, Map<String, String> drawings, String version) {
        Fingerprint fingerprint = new Fingerprint();
        fingerprint.add("version", version);
        methods.forEach(method -> {
            fingerprint.add("method " + method.name(), method.text());
            fingerprint.add("house", method.house());
            fingerprint.add("figure", drawings.getOrDefault(method.name(), ""));
        });
        fingerprint.add(design);
        return fingerprint.shown();
    }

    /** The first eight digits of the hash of a text. */
    public static String ofText(String text) {
        return hash(text).substring(0, 8);
    }

    private void add(String key, String value) {
        text.append(key)
                .append('=')
                .append(value.length())
                .append(':')
                .append(value)
                .append('\n');
    }

    private void add(Design design) {
        Design.Project p = design.project();
        add("project", joined(p.project(), p.firm(), p.client(), p.number(), p.subject(), p.revision()));
        add("date", p.date().toString());
        add("status", p.status());
        add(
                "system",
                joined(
                        p.system().name(),
                        p.letterPaper() + "",
                        p.flowUnit().text(),
                        p.headUnit().text(),
                        p.sealSpace() + ""));
        add("datum", p.datum());
        add("worked", p.workedCase());
        add("release", p.release());
        for (Design.Element element : design.elements()) {
            add("element", joined(element.tag(), element.title(), element.method()));
            add(element.typed());
        }
        for (Design.FlowCase one : design.cases()) {
            add("case", joined(one.name(), one.period(), one.year(), one.tailwaterReturn()));
            add("flow", shown(one.flow()));
            add("units", shown(one.units()));
            add("tailwater", shown(one.tailwater()));
            add(one.typed());
        }
        design.demands()
                .forEach(d -> add(
                        "demand",
                        joined(
                                d.tag(),
                                d.symbol(),
                                Boolean.toString(d.atMost()),
                                shown(d.value()),
                                d.description(),
                                d.citation(),
                                d.inCase())));
        design.combinations()
                .forEach(c -> add(
                        "combination",
                        joined(c.name(), c.flowOf(), c.levelOf(), Boolean.toString(c.canCoincide()), c.basis())));
        design.levels().forEach(pair -> add("level", joined(shown(pair.flow()), shown(pair.level()))));
        design.assumptions().forEach(a -> add("assumption", a.toString()));
        design.references().forEach(r -> add("reference", r));
        design.requirements().forEach(r -> add("requirement", r.toString()));
        design.revisions().forEach(r -> add("revision", r.toString()));
    }

    private void add(Map<String, Design.Typed> typed) {
        new TreeMap<>(typed).forEach((symbol, value) -> add(symbol, shown(value)));
    }

    private static String shown(Design.Typed typed) {
        Value value = typed.value();
        String content = value instanceof Value.Number number
                ? Double.toString(number.value()) + " " + typed.unit()
                : value instanceof Value.Word word ? word.text() : "";
        return joined(content, typed.source(), typed.standing());
    }

    /** The parts with their lengths, so that no two lists of parts give one text. */
    private static String joined(String... parts) {
        StringBuilder joined = new StringBuilder();
        for (String part : parts) {
            joined.append(part.length()).append(':').append(part).append('|');
        }
        return joined.toString();
    }

    private String shown() {
        String hash = hash(text.toString());
        return hash.substring(0, 4) + " " + hash.substring(4, 8) + " " + hash.substring(8, 12) + " "
                + hash.substring(12, 16);
    }

    private static String hash(String text) {
        try {
            byte[] digest = MessageDigest.getInstance("SHA-256").digest(text.getBytes(StandardCharsets.UTF_8));
            return HexFormat.of().formatHex(digest);
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException(e);
        }
    }
}
