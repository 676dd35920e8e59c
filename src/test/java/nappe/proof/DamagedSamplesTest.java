package nappe.proof;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatCode;
import static org.assertj.core.api.Assertions.catchThrowableOfType;
import static org.junit.jupiter.api.Assertions.assertTimeoutPreemptively;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.TreeMap;
import java.util.stream.Stream;
import java.util.zip.ZipInputStream;
import nappe.deliver.xlsx.XlsxDelivery;
import nappe.formula.Value;
import nappe.input.Fault;
import nappe.input.InputReader;
import nappe.input.InputRefused;
import nappe.input.Zips;
import nappe.job.Job;
import nappe.method.MethodLibrary;
import nappe.source.BuiltInLibrary;
import nappe.station.Design;
import nappe.station.StationException;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * Thousands of small damages to the samples: each is refused in words, or reads as another design that legally might have been typed,
 * and that design gives results without a number that is none.
 */
class DamagedSamplesTest {
    private static final List<String> SAMPLES = List.of("return-weir.xlsx", "headworks.xlsx", "inlet-works.xlsx");
    private static final int LEAST = 2_000;
    private static final int MOST = 6_000;
    private static final Duration ENOUGH = Duration.ofSeconds(25);
    private static final int WORKED = 8;
    private static final MethodLibrary METHODS = new MethodLibrary(new BuiltInLibrary());

    @TempDir
    Path folder;

    private static byte[] sample(String name) throws IOException {
        return Files.readAllBytes(Package.INPUTS.resolve(name));
    }

    private static List<String> parts(byte[] sample) throws IOException {
        List<String> parts = new ArrayList<>();
        try (ZipInputStream in = new ZipInputStream(new java.io.ByteArrayInputStream(sample))) {
            for (var entry = in.getNextEntry(); entry != null; entry = in.getNextEntry()) {
                if (!entry.getName().startsWith("docProps")) {
                    parts.add(entry.getName());
                }
            }
        }
        return parts;
    }

    @Test
    void damageIsRefusedOrReadsAsALegalDesign() {
        assertTimeoutPreemptively(Duration.ofMinutes(10), this::damaged);
    }

    private void damaged() throws IOException {
        long start = System.nanoTime();
        Map<String, Integer> counts = new TreeMap<>();
        List<Design> others = new ArrayList<>();
        for (int seed = 0; seed < MOST; seed++) {
            if (seed >= LEAST && System.nanoTime() - start > ENOUGH.toNanos()) {
                break;
            }
            Random lot = new Random(seed);
            String name = SAMPLES.get(seed % SAMPLES.size());
            byte[] sound = sample(name);
            Damage damage = Damage.values()[lot.nextInt(Damage.values().length)];
            List<String> parts = parts(sound);
            String part = parts.get(lot.nextInt(parts.size()));
            Path file =
                    Zips.of(sound).damage(part, text -> damage.to(text, lot)).save(folder.resolve("in.xlsx"));
            String what = "seed " + seed + ": " + damage + " in " + part + " of " + name;
            try {
                Design read = InputReader.read(file, METHODS);
                boolean same = read.equals(Package.ofSample(name).design());
                counts.merge(same ? "same" : "other", 1, Integer::sum);
                if (!same && name.equals(SAMPLES.get(0))) {
                    others.add(read);
                }
            } catch (InputRefused e) {
                assertThat(e.faults()).as(what).isNotEmpty();
                counts.merge(
                        e.faults().stream().anyMatch(f -> f.sheet() != null) ? "refused in a sheet" : "refused",
                        1,
                        Integer::sum);
            } catch (RuntimeException | StackOverflowError e) {
                throw new AssertionError(what, e);
            }
        }
        System.out.println("Damaged samples: " + counts);
        int all = counts.values().stream().mapToInt(Integer::intValue).sum();
        int reached = counts.get("same") + counts.get("other") + counts.get("refused in a sheet");
        assertThat(all).isGreaterThanOrEqualTo(LEAST);
        assertThat(reached).as("damages that the reader of sheets has met").isGreaterThan(all / 2);
        assertThat(counts.get("refused in a sheet")).isGreaterThan(all / 10);
        assertThat(others).hasSizeGreaterThanOrEqualTo(WORKED);
        for (int i = 0; i < WORKED; i++) {
            work(others.get(i * others.size() / WORKED));
        }
    }

    /** A design that was read from a damaged file is worked like any other. */
    private static void work(Design design) throws IOException {
        Job.Done done;
        try {
            done = new Job(METHODS, "0.0.0").run(design, List.of());
        } catch (StationException e) {
            assertThat(e.faults()).isNotEmpty();
            return;
        }
        assertThat(done.results().values().values())
                .allMatch(v -> !(v instanceof Value.Number n) || Double.isFinite(n.value()));
        try (ZipInputStream in =
                new ZipInputStream(new java.io.ByteArrayInputStream(XlsxDelivery.render(done.results())))) {
            while (in.getNextEntry() != null) {
                assertThat(new String(in.readAllBytes(), StandardCharsets.UTF_8))
                        .doesNotContain("<v>NaN", "<v>Infinity", "<v>-Infinity");
            }
        }
    }

    /** The cells in which the numbers of a design were typed. */
    private static List<Design.Origin> numbers(Design design) {
        Stream<Design.Typed> typed = Stream.of(
                        design.cases().stream()
                                .flatMap(c -> Stream.concat(
                                        Stream.of(c.flow(), c.units(), c.tailwater()), c.typed().values().stream())),
                        design.elements().stream().flatMap(e -> e.typed().values().stream()),
                        design.levels().stream().flatMap(l -> Stream.of(l.flow(), l.level())),
                        design.demands().stream().map(Design.Demand::value))
                .flatMap(s -> s);
        return typed.filter(t -> t.value() instanceof Value.Number)
                .map(Design.Typed::origin)
                .distinct()
                .toList();
    }

    @Test
    void aDamagedEntryGivesNoDesign() throws IOException {
        int entries = 0;
        for (String name : SAMPLES) {
            byte[] sound = sample(name);
            Map<String, String> parts = Zips.of(sound).sheetParts();
            for (Design.Origin entry : numbers(Package.ofSample(name).design())) {
                entries++;
                String part = parts.get(entry.sheet());
                String start = "(<c r=\"" + entry.cell() + "\"[^>]*>)<v>[^<]*</v></c>";
                List<String> bad = new ArrayList<>();
                Damage.NO_NUMBERS.forEach(no -> bad.add("$1<v>" + no + "</v></c>"));
                bad.add("$0$0");
                bad.add("<c r=\"" + entry.cell() + "\" s=\"99999\"><v>1</v></c>");
                bad.add("<c r=\"" + entry.cell() + "\" t=\"s\"><v>99999</v></c>");
                bad.add("<c r=\"" + entry.cell() + "\" t=\"zz\"><v>1</v></c>");
                bad.add("<c r=\"" + entry.cell() + "\" t=\"e\"><v>#REF!</v></c>");
                bad.add("<c r=\"" + entry.cell() + "\" t=\"b\"><v>1</v></c>");
                bad.add("<c r=\"" + entry.cell() + "\"><f>1+1</f></c>");
                bad.add("<c r=\"" + entry.cell() + "9\"><v>1</v></c>");
                for (String by : bad) {
                    Path file = Zips.of(sound)
                            .change(part, text -> text.replaceFirst(start, by))
                            .save(folder.resolve("in.xlsx"));
                    InputRefused refused =
                            catchThrowableOfType(InputRefused.class, () -> InputReader.read(file, METHODS));
                    assertThat(refused).as(name + " " + entry + " " + by).isNotNull();
                    assertThat(refused.faults()).extracting(Fault::sheet).contains(entry.sheet());
                }
            }
        }
        assertThat(entries).isGreaterThan(50);
    }

    @Test
    void theSamplesThemselvesAreRead() {
        for (String name : SAMPLES) {
            assertThatCode(() -> InputReader.read(Package.INPUTS.resolve(name), METHODS))
                    .doesNotThrowAnyException();
        }
    }
}
