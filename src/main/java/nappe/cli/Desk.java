package nappe.cli;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collection;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.function.Consumer;
import nappe.input.InputReader;
import nappe.input.InputRefused;
import nappe.job.CheckRow;
import nappe.job.HouseReview;
import nappe.job.Job;
import nappe.method.MethodLibrary;
import nappe.source.BuiltInLibrary;
import nappe.source.HouseLibrary;
import nappe.source.TextException;
import nappe.source.TextFault;
import nappe.station.Design;
import nappe.station.DesignCheck;
import nappe.station.DesignFault;
import org.jspecify.annotations.Nullable;

/** What the commands share: the methods, built in and of the house, the check values, one design carried through. */
final class Desk {
    private final BuiltInLibrary builtIn = new BuiltInLibrary();
    private final MethodLibrary methods;
    private final @Nullable HouseLibrary house;
    private final @Nullable HouseReview review;

    Desk() {
        this(null);
    }

    /**
     * @param folder of the house's own methods, or null
     * @throws TextException where it cannot be used at all
     */
    Desk(@Nullable Path folder) {
        HouseLibrary own = folder == null ? null : HouseLibrary.open(folder, builtIn);
        this.house = own;
        this.methods = new MethodLibrary(own == null ? builtIn : own);
        this.review = own == null ? null : new HouseReview(own, methods);
    }

    MethodLibrary methods() {
        return methods;
    }

    /** The house folder, or null. */
    @Nullable
    HouseLibrary house() {
        return house;
    }

    /** What reads the house folder as a whole, or null where none is named. */
    @Nullable
    HouseReview review() {
        return review;
    }

    /** The built-in check values, and those of the house. */
    List<CheckRow> checks() {
        List<CheckRow> rows = new ArrayList<>(CheckRow.builtIn(builtIn));
        if (review != null) {
            rows.addAll(review.rows());
        }
        return rows;
    }

    /** Refuses with all faults of the methods named, where any has one. */
    void requireSound(Collection<String> names) {
        if (review != null) {
            Set<TextFault> faults = new LinkedHashSet<>();
            names.forEach(name -> faults.addAll(review.of(name)));
            if (!faults.isEmpty()) {
                throw new TextException(List.copyOf(faults));
            }
        }
    }

    /** What is wrong in the house folder and does not hinder the methods named, in words. */
    List<String> remarks(Collection<String> names) {
        return review == null ? List.of() : review.remarks(names);
    }

    /** Computes a design that was read and checked, and tells the stages. */
    Job.Done compute(Design design, Consumer<String> stage) {
        return new Job(methods, Nappe.version()).telling(stage).run(design, this::checks);
    }

    /** Reads an input workbook; where its methods have faults, these are told and not what follows from them. */
    Design read(Path input) {
        AskedMethods asked = new AskedMethods(methods);
        try {
            Design design = InputReader.read(input, asked);
            requireSound(asked.asked());
            List<DesignFault> faults = DesignCheck.faults(design, methods::sheet);
            if (!faults.isEmpty()) {
                throw Failures.at(String.valueOf(input.getFileName()), faults);
            }
            return design;
        } catch (InputRefused e) {
            requireSound(asked.asked());
            throw e;
        }
    }
}
