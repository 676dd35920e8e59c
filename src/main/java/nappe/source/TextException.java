package nappe.source;

import java.util.List;
import java.util.stream.Collectors;

/** Texts that cannot be read as what they should be; all their faults. */
public final class TextException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    private final transient List<TextFault> faults;

    public TextException(List<TextFault> faults) {
        super(faults.stream().map(TextFault::toString).collect(Collectors.joining("\n")));
        this.faults = List.copyOf(faults);
    }

    public List<TextFault> faults() {
        return faults;
    }
}
