package nappe.input;

import java.util.List;
import java.util.stream.Collectors;

/** An input workbook that can't be worked with; carries every fault found, sheet by sheet. */
public final class InputRefused extends RuntimeException {
    private static final long serialVersionUID = 1L;

    private final transient List<Fault> faults;

    public InputRefused(List<Fault> faults) {
        super(faults.stream().map(Fault::toString).collect(Collectors.joining("\n")));
        this.faults = List.copyOf(faults);
    }

    public List<Fault> faults() {
        return faults;
    }
}
