package nappe.bench;

import java.io.IOException;
import java.lang.management.ManagementFactory;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;

/**
 * Measures, in one run, how long a package takes: its stages; the program as it is started; the bare libraries writing
 * the same cells and words; LibreOffice converting the workbook of the package to PDF. All in turn, round by round.
 */
public final class Speed {
    private static final List<String> FLAGS =
            List.of(
            "-XX:+UseSerialGC",
            "-XX:TieredStopAtLevel=1",
            "-XX:+UseTransparentHugePages",
            "-Xshare:auto",
            "-Xlog:disable");
    private static final int WARM = 6;

    /** The last stage that the program tells; both files, written side by side, what was loaded for them before. */
    private static final String WRITING = "as told: writing the workbook and setting the PDF";

    private final Path jar;
    private final Path out;
    private final int rounds;

    private Speed(Path jar, Path out, int rounds) {
        this.jar = jar;
        this.out = out;
        this.rounds = rounds;
    }

    /** JAR, FOLDER, then {@code [-n ROUNDS] [INPUT.xlsx ...]}. */
    public static void main(String[] args) throws IOException, InterruptedException {
        // else the library that reads the workbook complains on standard output
        System.setProperty("log4j.provider", "org.apache.logging.log4j.simple.internal.SimpleProvider");
        System.setProperty("org.apache.logging.log4j.simplelog.level", "OFF");
        List<String> rest = new ArrayList<>(List.of(args).subList(2, args.length));
        int rounds = 5;
        if (!rest.isEmpty() && rest.get(0).equals("-n")) {
            rounds = Integer.parseInt(rest.get(1));
            rest = rest.subList(2, rest.size());
        }
        if (rest.isEmpty()) {
            rest = List.of("sample-inputs/headworks.xlsx", "sample-inputs/return-weir.xlsx");
        }
        Speed speed = new Speed(Path.of(args[0]).toAbsolutePath(), Path.of(args[1]).toAbsolutePath(), rounds);
        System.out.printf(
                Locale.ROOT,
                "Java %s, %d processors, %d rounds%n",
                Runtime.version(),
                Runtime.getRuntime().availableProcessors(),
                rounds);
        for (String input : rest) {
            speed.measure(Path.of(input));
        }
    }

    private void measure(Path input) throws IOException, InterruptedException {
        Path launcher = Path.of("src/launch/nappe").toAbsolutePath();
        Path folder = out.resolve("package");
        List<String> launched = List.of(launcher.toString(), "issue", input.toString(), "-o", folder.toString());
        // once before, which makes the archives of loaded classes
        run(launched);
        Path workbook = newest(folder, ".xlsx");
        Content content = Content.of(workbook, newest(folder, ".pdf"));
        Path saved = out.resolve("content.bin");
        ContentFile.save(content, saved);
        Path bareArchive = out.resolve("bare.jsa");
        Files.deleteIfExists(bareArchive);
        run(bare("xssf", saved, "-XX:ArchiveClassesAtExit=" + bareArchive));
        Path archive = out.resolve("nappe.jsa");
        Files.deleteIfExists(archive);
        run(told(input, folder, "-XX:ArchiveClassesAtExit=" + archive));
        boolean hasOffice = has("soffice");
        if (hasOffice) {
            run(office(workbook));
        }
        System.out.printf(
                Locale.ROOT,
                "%n%s: %d sheets, %d cells of which %d formulas, %d styles; %d pages, %d words, %d strokes; %d links%n",
                input.getFileName(),
                content.sheets().size(),
                content.cells(),
                content.formulas(),
                content.styles(),
                content.pages().size(),
                content.words(),
                content.marks(),
                content.links());
        Figures stages = new Figures();
        Figures whole = new Figures();
        Figures processors = new Figures();
        for (int round = 0; round < rounds; round++) {
            String launch = "nappe issue, by the launcher";
            take(whole, processors, launch, launched);
            take(
                    whole,
                    processors,
                    "nappe issue, java -jar without flags",
                    List.of("java", "-jar", jar.toString(), "issue", input.toString(), "-o", folder.toString()));
            take(whole, processors, "bare libraries, XSSF", bare("xssf", saved, "-XX:SharedArchiveFile=" + bareArchive));
            readLaps(stages, "bare XSSF: ");
            take(whole, processors, "bare libraries, SXSSF", bare("sxssf", saved, "-XX:SharedArchiveFile=" + bareArchive));
            readLaps(stages, "bare SXSSF: ");
            if (hasOffice) {
                take(whole, processors, "LibreOffice, workbook to PDF", office(workbook));
            }
            run(told(input, folder, "-XX:SharedArchiveFile=" + archive));
            readLaps(stages, "as told: ");
            run(stages(input, 1));
            readLaps(stages, "cold: ");
        }
        run(stages(input, WARM));
        List<String> warm = Files.readAllLines(printed());
        int turns = 0;
        for (String line : warm) {
            String[] lap = line.split("\t");
            if (lap[0].equals("end")) {
                turns++;
            } else if (turns >= WARM / 2) {
                stages.add("warm: " + lap[0], Double.parseDouble(lap[1]));
            }
        }
        for (String way : List.of("XSSF", "SXSSF")) {
            String both = "bare " + way + ": both files";
            stages.addSum(both, "bare " + way + ": workbook", "bare " + way + ": PDF");
            stages.addRatio("RATIO of writing the files to bare " + way, WRITING, both);
        }
        for (Figures figures : List.of(whole, processors)) {
            String launch = "nappe issue, by the launcher";
            figures.addRatio("RATIO to the bare libraries, XSSF", launch, "bare libraries, XSSF");
            figures.addRatio("RATIO to the bare libraries, SXSSF", launch, "bare libraries, SXSSF");
            if (hasOffice) {
                figures.addRatio("RATIO to LibreOffice", launch, "LibreOffice, workbook to PDF");
            }
        }
        System.out.println(" Whole processes, seconds on the wall:");
        whole.print();
        System.out.println(" The same, seconds of processors:");
        processors.print();
        System.out.println(" Stages, seconds on the wall (as told: of the program as it is started; cold: one after the other on one"
                + " thread; warm: the same without flags, runs " + (WARM / 2 + 1) + " to " + WARM + " of one Java):");
        stages.print();
        System.out.printf(
                Locale.ROOT,
                " Load of the machine at the end: %.1f%n",
                ManagementFactory.getOperatingSystemMXBean().getSystemLoadAverage());
    }

    private void take(Figures whole, Figures processors, String name, List<String> command)
            throws IOException, InterruptedException {
        Commands.Took took = run(command);
        whole.add(name, took.wall());
        processors.add(name, took.processor());
    }

    private Path printed() {
        return out.resolve("printed.txt");
    }

    private Commands.Took run(List<String> command) throws IOException, InterruptedException {
        return Commands.run(printed(), command);
    }

    /** The stages that the last command printed. */
    private void readLaps(Figures figures, String before) throws IOException {
        for (String line : Files.readAllLines(printed())) {
            String[] lap = line.split("\t");
            if (lap.length == 2 && !lap[0].equals("end")) {
                figures.add(before + lap[0], Double.parseDouble(lap[1]));
            }
        }
    }

    private List<String> bare(String way, Path saved, String archive) {
        List<String> command = new ArrayList<>(List.of("java"));
        command.addAll(FLAGS);
        command.add(archive);
        command.addAll(List.of(
                "-cp", classPath(), "nappe.bench.Bare", saved.toString(), out.resolve("bare").toString(), way));
        return command;
    }

    private List<String> told(Path input, Path folder, String archive) {
        List<String> command = new ArrayList<>(List.of("java"));
        command.addAll(FLAGS);
        command.add(archive);
        command.addAll(List.of(
                "-cp", classPath(), "nappe.cli.ToldStages", "issue", input.toString(), "-o", folder.toString()));
        return command;
    }

    /** Cold as the launcher starts it; warm as Java runs by itself. */
    private List<String> stages(Path input, int times) {
        List<String> command = new ArrayList<>(List.of("java"));
        if (times == 1) {
            command.addAll(FLAGS);
        }
        command.addAll(List.of(
                "-cp",
                classPath(),
                "nappe.bench.Stages",
                input.toString(),
                out.resolve("stages").toString(),
                Integer.toString(times)));
        return command;
    }

    private String classPath() {
        return jar + System.getProperty("path.separator") + out.resolve("bench.jar");
    }

    private List<String> office(Path workbook) {
        return List.of(
                "soffice",
                "-env:UserInstallation=" + out.resolve("office").toUri(),
                "--headless",
                "--convert-to",
                "pdf",
                "--outdir",
                out.resolve("converted").toString(),
                workbook.toString());
    }

    private static boolean has(String program) {
        return Stream.of(System.getenv("PATH").split(System.getProperty("path.separator")))
                .anyMatch(folder -> Files.isExecutable(Path.of(folder, program)));
    }

    private static Path newest(Path folder, String ending) throws IOException {
        try (Stream<Path> files = Files.walk(folder)) {
            return files.filter(file -> file.toString().endsWith(ending))
                    .max(java.util.Comparator.comparingLong(file -> file.toFile().lastModified()))
                    .orElseThrow();
        }
    }
}
