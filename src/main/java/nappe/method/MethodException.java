package nappe.method;

import java.util.List;
import java.util.stream.Collectors;
import nappe.source.TextFault;

/** A method sheet with faults; all of them. */
public final class MethodException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    private final transient List<TextFault> faults;

    public MethodException(List<TextFault> faults) {
        super(faults.stream().map(TextFault::toString).collect(Collectors.joining("\n")));
        this.faults = List.copyOf(faults);
    }

    public List<TextFault> faults() {
        return faults;
    }
}
