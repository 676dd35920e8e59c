package nappe.method;

import java.util.List;
import java.util.stream.Collectors;

/** A method sheet with faults; all of them. */
public final class MethodException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    private final transient List<MethodFault> faults;

    public MethodException(List<MethodFault> faults) {
        super(faults.stream().map(MethodFault::toString).collect(Collectors.joining("\n")));
        this.faults = List.copyOf(faults);
    }

    public List<MethodFault> faults() {
        return faults;
    }
}
