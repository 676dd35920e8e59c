package nappe.job;

import java.util.ArrayList;
import java.util.Collection;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import nappe.figure.FigureLibrary;
import nappe.method.MethodException;
import nappe.method.MethodLibrary;
import nappe.method.MethodSheet;
import nappe.source.CitedTable;
import nappe.source.HouseLibrary;
import nappe.source.TextException;
import nappe.source.TextFault;

/** Reads the texts of a house folder and gathers their faults: of the methods in use, or of all. */
public final class HouseReview {
    private static final Pattern INCLUDED = Pattern.compile("(?m)^include\\s+(\\S+)");

    private final HouseLibrary house;
    private final MethodLibrary methods;
    private final FigureLibrary figures;

    /** @param methods those of the house and the built-in ones */
    public HouseReview(HouseLibrary house, MethodLibrary methods) {
        this.house = house;
        this.methods = methods;
        this.figures = new FigureLibrary(house);
    }

    /** The faults of a method of the house: its sheet with all it includes, its tables, its figure and its check values. */
    public Set<TextFault> of(String method) {
        Set<TextFault> faults = new LinkedHashSet<>();
        if (!house.house("methods/" + method + ".txt").isEmpty()) {
            gather(faults, () -> {
                requireLimit(faults, methods.sheet(method));
                figures.of(methods.sheet(method));
            });
        }
        if (!house.house("checks/" + method + ".csv").isEmpty()) {
            gather(faults, () -> CheckRow.of(house, method + ".csv"));
        }
        return faults;
    }

    /** A package says where its results hold; a method without any limit would claim them everywhere. */
    private void requireLimit(Set<TextFault> faults, MethodSheet sheet) {
        if (sheet.limits().isEmpty()) {
            faults.add(TextFault.ofFile(
                    house.shown("methods/" + sheet.name() + ".txt"),
                    "a method states at least one limit of its use, such as: limit 0.06 m <= h_1 ; least head ; KEY",
                    "limit-missing"));
        }
    }

    /** The faults of all that the house has, used or not. */
    public Set<TextFault> all() {
        Set<TextFault> faults = new LinkedHashSet<>(house.strays());
        ownMethods().forEach(method -> faults.addAll(of(method)));
        for (String file : house.ownNames("tables")) {
            gather(faults, () -> CitedTable.from(house, withoutEnding(file)));
        }
        for (String file : house.ownNames("checks")) {
            gather(faults, () -> CheckRow.of(house, file));
        }
        for (String file : house.ownNames("figures")) {
            gather(faults, () -> house.text("figures/" + file));
            if (!ownMethods().contains(withoutEnding(file))) {
                faults.add(TextFault.ofFile(
                        house.shown("figures/" + file),
                        "there is no method of this name in the house to draw; a figure has the name of its method",
                        "figure-without-method"));
            }
        }
        for (String file : parts()) {
            gather(faults, () -> house.text("methods/" + file));
        }
        return faults;
    }

    private static void gather(Set<TextFault> faults, Runnable reading) {
        try {
            reading.run();
        } catch (MethodException e) {
            faults.addAll(e.faults());
        } catch (TextException e) {
            faults.addAll(e.faults());
        }
    }

    /** The methods of the house, in alphabetical order. */
    public List<String> ownMethods() {
        return house.ownNames("methods").stream()
                .map(HouseReview::withoutEnding)
                .filter(methods::knows)
                .toList();
    }

    private List<String> parts() {
        return house.ownNames("methods").stream()
                .filter(file -> !methods.knows(withoutEnding(file)))
                .toList();
    }

    /** What was not looked at, and why, in words. */
    public List<String> notLookedAt() {
        Set<String> included = ownMethods().stream()
                .flatMap(method ->
                        INCLUDED.matcher(methods.sheet(method).text()).results().map(result -> result.group(1)))
                .collect(Collectors.toSet());
        return java.util.stream.Stream.concat(
                        house.passedOver().stream(),
                        parts().stream()
                                .filter(file -> !included.contains(withoutEnding(file)))
                                .map(file -> house.shown("methods/" + file)
                                        + " was not checked: it does not start with \"method\", and no method of the"
                                        + " house includes it"))
                .toList();
    }

    /** Of what is not used: how many faults it has, in words; nothing of what has none. */
    public List<String> remarks(Collection<String> used) {
        List<String> remarks = new ArrayList<>();
        house.strays().forEach(stray -> remarks.add(stray.toString()));
        for (String method : ownMethods()) {
            if (!used.contains(method)) {
                remark(remarks, "house method " + method + ", not used here, has ", of(method));
            }
        }
        for (String file : house.ownNames("checks")) {
            if (!ownMethods().contains(withoutEnding(file))) {
                Set<TextFault> faults = new LinkedHashSet<>();
                gather(faults, () -> CheckRow.of(house, file));
                remark(remarks, "no check value of " + house.shown("checks/" + file) + " is run: it has ", faults);
            }
        }
        return remarks;
    }

    private static void remark(List<String> remarks, String what, Set<TextFault> faults) {
        if (!faults.isEmpty()) {
            remarks.add(what + (faults.size() == 1 ? "1 fault" : faults.size() + " faults")
                    + "; verify --house tells them");
        }
    }

    /** The check values of the house that can be read. */
    public List<CheckRow> rows() {
        return house.ownNames("checks").stream()
                .flatMap(file -> {
                    try {
                        return CheckRow.of(house, file).stream();
                    } catch (TextException e) {
                        return java.util.stream.Stream.empty();
                    }
                })
                .toList();
    }

    private static String withoutEnding(String file) {
        return file.substring(0, file.length() - 4);
    }
}
