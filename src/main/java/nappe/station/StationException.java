package nappe.station;

import java.util.List;

/** Entries that do not fit the methods they are for; all of them. */
public final class StationException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    private final transient List<DesignFault> faults;

    public StationException(List<DesignFault> faults) {
        super(faults.toString());
        this.faults = List.copyOf(faults);
    }

    public List<DesignFault> faults() {
        return faults;
    }
}
