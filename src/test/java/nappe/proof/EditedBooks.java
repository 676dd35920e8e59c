package nappe.proof;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.function.IntFunction;
import nappe.deliver.xlsx.Recalculated;
import nappe.deliver.xlsx.Spoiler;
import nappe.proof.Typing.Head;
import nappe.station.Design;

/**
 * Issued workbooks of samples into which a checker types, stored results spoilt. One run of LibreOffice recalculates them
 * all, when the first is asked for: it takes longer to start than to read a small one.
 */
final class EditedBooks {
    private record Book(String sample, List<Typing> typings) {}

    private final Path folder;
    private final Map<Book, Path> files = new LinkedHashMap<>();
    private IntFunction<Map<String, Object>> byLibreOffice;

    /**
     * All edits of some samples.
     *
     * @param folder for files, kept until the last is asked for
     */
    EditedBooks(Path folder, String... samples) throws IOException {
        this.folder = folder;
        for (String sample : samples) {
            for (List<Typing> typings : CheckersEdits.of(sample).values()) {
                add(sample, typings);
            }
        }
    }

    /** One more, before the first is asked for. */
    void add(String sample, List<Typing> typings) throws IOException {
        Package issued = Package.ofSample(sample);
        Edited edited = new Edited(Spoiler.spoil(issued.workbook()));
        typings.forEach(typing -> edited.type(typing.place(issued), typing.content()));
        files.put(new Book(sample, typings), file(edited.bytes()));
    }

    /** What LibreOffice gives for one that was added. */
    Map<String, Object> byLibreOffice(String sample, List<Typing> typings) throws IOException {
        if (byLibreOffice == null) {
            byLibreOffice = Recalculated.byLibreOffice(
                    List.copyOf(files.values()), Files.createTempDirectory(folder, "recalculated"));
        }
        return byLibreOffice.apply(List.copyOf(files.keySet()).indexOf(new Book(sample, typings)));
    }

    /** What Gnumeric gives for one that was added. */
    Map<String, Object> byGnumeric(String sample, List<Typing> typings) {
        return Recalculated.byGnumeric(Objects.requireNonNull(files.get(new Book(sample, typings))));
    }

    /** The sample issued anew with what was typed, its flows found as issued. */
    static Package anew(String sample, List<Typing> typings) {
        Package issued = Package.ofSample(sample);
        Design design = issued.design();
        for (Typing typing : typings) {
            design = inJava(typing).in(design, issued);
        }
        return Package.of(design, issued.found());
    }

    /** In the workbook "not given" is a word; in the input it is an entry left blank. */
    private static Typing inJava(Typing typing) {
        return typing instanceof Head head && "not given".equals(head.content())
                ? new Head(head.of(), head.tag(), null)
                : typing;
    }

    /** The values that a workbook stores. */
    Map<String, Object> stored(Package of) throws IOException {
        return Recalculated.asStored(file(of.workbook()));
    }

    private Path file(byte[] workbook) throws IOException {
        return Files.write(Files.createTempFile(folder, "book", ".xlsx"), workbook);
    }

    /**
     * Where an edited workbook of a sample, recalculated, and the sample issued anew part.
     *
     * @param byGnumericToo of so many edits one is recalculated by Gnumeric too
     */
    List<String> faults(String sample, int byGnumericToo) {
        List<String> faults = new ArrayList<>();
        int[] done = {0};
        CheckersEdits.of(sample).forEach((what, typings) -> {
            try {
                Package anew = anew(sample, typings);
                Map<String, Object> expected = anew.live(stored(anew));
                Comparison comparison =
                        Comparison.of(anew.live(byLibreOffice(sample, typings)), expected, anew.results());
                System.out.println(sample + ", " + what + ": " + comparison);
                comparison.faults().forEach(fault -> faults.add(what + ", LibreOffice: " + fault));
                if (done[0]++ % byGnumericToo == 0) {
                    Comparison.of(anew.live(byGnumeric(sample, typings)), expected, anew.results())
                            .faults()
                            .forEach(fault -> faults.add(what + ", Gnumeric: " + fault));
                }
            } catch (IOException e) {
                throw new UncheckedIOException(e);
            }
        });
        return faults;
    }
}
