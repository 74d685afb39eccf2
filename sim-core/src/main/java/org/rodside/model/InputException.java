package org.rodside.model;

import java.util.List;

/** A user's file or value cannot be used. Carries every fault found, each a whole sentence with place and remedy. */
public final class InputException extends RuntimeException {

    private static final long serialVersionUID = 1L;

    private final transient List<String> faults;

    public InputException(List<String> faults) {
        super(String.join(System.lineSeparator(), faults));
        this.faults = List.copyOf(faults);
    }

    public InputException(String fault) {
        this(List.of(fault));
    }

    /** Every fault found, in the order of the file. */
    public List<String> faults() {
        return faults;
    }
}
