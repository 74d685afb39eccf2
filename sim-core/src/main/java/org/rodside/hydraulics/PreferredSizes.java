package org.rodside.hydraulics;

import java.util.List;

/**
 * Preferred bores and rod diameters of hydraulic cylinders, ISO 3320 (recalled, the page was not seen; second-choice bores
 * included).
 */
public final class PreferredSizes {

    /** Bore diameters, rising; in m. */
    public static final List<Double> BORES = List.of(
            0.025, 0.032, 0.040, 0.050, 0.063, 0.080, 0.090, 0.100, 0.110, 0.125, 0.140, 0.160, 0.180, 0.200, 0.220,
            0.250, 0.280, 0.320, 0.360, 0.400, 0.450, 0.500);

    /** Bore diameters that the standard marks as second choice, rising; in m. */
    public static final List<Double> SECOND_CHOICE_BORES =
            List.of(0.090, 0.110, 0.140, 0.180, 0.220, 0.280, 0.360, 0.450);

    /** Rod diameters, rising; in m. */
    public static final List<Double> RODS = List.of(
            0.012, 0.014, 0.016, 0.018, 0.020, 0.022, 0.025, 0.028, 0.032, 0.036, 0.040, 0.045, 0.050, 0.056, 0.063,
            0.070, 0.080, 0.090, 0.100, 0.110, 0.125, 0.140, 0.160, 0.180, 0.200, 0.220, 0.250, 0.280, 0.320, 0.360);

    private PreferredSizes() {}
}
