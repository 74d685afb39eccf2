package org.rodside.soil;

/** Why there is, or is not, a wedge of ground in front of a blade. */
public enum WedgeStatus {
    /** The factors are numbers. */
    FOUND("a wedge was found"),
    /** The rake angle is not between 0 and 180°. */
    RAKE_OUT_OF_RANGE("the rake angle must be between 0 and 180 degrees"),
    /** The ground has no friction, or the angles of friction make no sense: Nγ has no smallest value over β. */
    NO_FRICTION(
            "the friction angle of the ground must be above 0 and below 90 degrees, that of the blade 0 to below 90"),
    /** Rake and friction angles reach 180° together, so no failure plane rises to the surface: α + δ + φ ≥ 180°. */
    NO_FAILURE_PLANE("rake angle and both friction angles together reach 180 degrees");

    private final String reason;

    WedgeStatus(String reason) {
        this.reason = reason;
    }

    /** A sentence part that a reader can act on. */
    public String reason() {
        return reason;
    }
}
