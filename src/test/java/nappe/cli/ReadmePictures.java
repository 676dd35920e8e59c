package nappe.cli;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import nappe.Tools;
import nappe.input.SampleStations;

/** Makes the pictures of the README from runs of the program; needs LibreOffice, poppler and ImageMagick. */
final class ReadmePictures {
    private static final Path DOCS = Path.of("src/docs");

    private final Path folder;

    private ReadmePictures(Path folder) {
        this.folder = folder;
    }

    public static void main(String[] args) throws IOException {
        ReadmePictures pictures = new ReadmePictures(Files.createTempDirectory("nappe-pictures"));
        pictures.blank();
        pictures.issued();
        pictures.refused();
    }

    private void blank() throws IOException {
        Path blank = folder.resolve("station.xlsx");
        run("blank", "F1=parshall-flume", "A1=approach-channel", "--units", "US", "-o", blank);
        Path printed = printed(blank);
        for (String[] one : List.of(
                new String[] {"F1.h_g: head read", "blank-flows.png"},
                new String[] {"A1: Approach channel", "blank-device.png"})) {
            picture(printed, one[0], one[1]);
            cut(DOCS.resolve(one[1]), "-gravity", "North", "-crop", "100%x62%+0+0", "+repage");
        }
    }

    private void refused() throws IOException {
        Path wrong = SampleStations.headworks()
                .set("Flows", "D9", "0,5")
                .set("Flows", "E10", "MDG")
                .entry("F1", "size", "3 feet", null, "invented slip", "known")
                .entry("A1", "n", null, "1", "invented slip", "assumed")
                .save(folder.resolve("wrong.xlsx"));
        Path marked = folder.resolve("wrong-marked.xlsx");
        run("inspect", wrong, "--marked", marked);
        picture(printed(marked), "What is wrong and how to mend it", "marked.png");
    }

    private void issued() throws IOException {
        run("issue", "sample-inputs/headworks.xlsx", "-o", folder.resolve("output"));
        try (Stream<Path> all = Files.walk(folder.resolve("output"))) {
            Path pdf = all.filter(path -> path.toString().endsWith(".pdf"))
                    .findFirst()
                    .orElseThrow();
            picture(pdf, "Approvals, to be filled in by hand", "cover.png");
            picture(pdf, "What governs each case", "overview.png");
            picture(pdf, "submerged discharge, 1967 form", "worked.png");
            picture(pdf, "Geometry and levels, case", "geometry.png");
            picture(pdf, "Rating curve", "rating.png");
        }
    }

    private static void run(Object... args) {
        NappeTest.Said said = NappeTest.nappe(args);
        System.err.println(said.err());
    }

    private Path printed(Path workbook) throws IOException {
        Tools.run(
                "soffice",
                "--headless",
                "-env:UserInstallation=" + folder.resolve("office").toUri(),
                "--convert-to",
                "pdf",
                "--outdir",
                folder.toString(),
                workbook.toString());
        return folder.resolve(workbook.getFileName().toString().replace(".xlsx", ".pdf"));
    }

    /** The first page with these words, cut to what is on it. */
    private void picture(Path pdf, String words, String name) throws IOException {
        Path text = folder.resolve("pages.txt");
        Tools.run("pdftotext", "-layout", pdf.toString(), text.toString());
        List<String> pages = List.of(Files.readString(text).split("\f"));
        int page = 1;
        while (page <= pages.size() && !pages.get(page - 1).contains(words)) {
            page++;
        }
        if (page > pages.size()) {
            throw new IllegalStateException("no page of " + pdf + " says \"" + words + "\"");
        }
        Path file = DOCS.resolve(name);
        String number = Integer.toString(page);
        String bare = file.toString().replaceAll("\\.png$", "");
        Tools.run("pdftoppm", "-r", "62", "-png", "-singlefile", "-f", number, "-l", number, pdf.toString(), bare);
        cut(file);
    }

    /** Cuts a picture to what is on it, after what is asked for. */
    private static void cut(Path file, String... first) throws IOException {
        List<String> command = new ArrayList<>(List.of("convert", file.toString()));
        command.addAll(List.of(first));
        command.addAll(List.of("-trim", "-bordercolor", "white", "-border", "8", "-colors", "48", "+dither", "-strip"));
        command.add(file.toString());
        Tools.run(command.toArray(String[]::new));
    }
}
