package org.rodside.hydraulics;

/**
 * One uniform part of a beam that is also a column, theory (C4): end moments, uniform transverse load, compression P.
 * Moments are positive where a downward load sags the beam. Valid for k·l below π; exact down to P = 0.
 */
final class BeamPart {

    /** Below this k·l the closed forms lose digits and their series, cut at the sixth power, is exact to rounding. */
    private static final double SERIES = 0.1;

    private final double length;
    private final double stiffness;
    private final double weight;
    private final double k;

    /**
     * A part.
     *
     * @param length in m
     * @param stiffness E·I; in N·m²
     * @param weight transverse load; in N/m
     * @param load compression, 0 or more; in N
     */
    BeamPart(double length, double stiffness, double weight, double load) {
        this.length = length;
        this.stiffness = stiffness;
        this.weight = weight;
        k = Math.sqrt(load / stiffness);
    }

    /** Turn of one end against the chord per moment at that end, l·ψ/(3EI); in rad/(N·m). */
    double turnPerNearMoment() {
        double z = k * length;
        double q = z * z;
        double psi = z < SERIES ? 1 + q * (1 / 15.0 + q * (2 / 315.0 + q / 1575)) : 3 / z * (1 / z - 1 / Math.tan(z));
        return length / (3 * stiffness) * psi;
    }

    /** Turn of one end against the chord per moment at the other end, l·φ/(6EI); in rad/(N·m). */
    double turnPerFarMoment() {
        double z = k * length;
        double q = z * z;
        double phi = z < SERIES
                ? 1 + q * (7 / 60.0 + q * (31 / 2520.0 + q * 127 / 100_800))
                : 6 / z * (1 / Math.sin(z) - 1 / z);
        return length / (6 * stiffness) * phi;
    }

    /** Turn of either end against the chord from the transverse load, w·l³·χ/(24EI); in rad. */
    double turnByWeight() {
        double u = k * length / 2;
        double q = u * u;
        double chi =
                2 * u < SERIES ? 1 + q * (2 / 5.0 + q * (17 / 105.0 + q * 62 / 945)) : 3 * (Math.tan(u) - u) / (u * q);
        return weight * length * length * length / (24 * stiffness) * chi;
    }

    /** Moment at x from the end with moment {@code near}; in N·m. */
    private double moment(double x, double near, double far) {
        double rest = length - x;
        double byWeight = 2 * weight * sinOverK(x / 2) * sinOverK(rest / 2) / Math.cos(k * length / 2);
        return (near * sinOverK(rest) + far * sinOverK(x)) / sinOverK(length) + byWeight;
    }

    /**
     * Largest moment in the part when neither end moment nor the transverse load is negative. Then M + w/k² is half a
     * cosine wave at most, with one peak, at tan(kx) = k·M′(0)/(k²·M(0) + w) from the near end.
     *
     * @param near moment at one end, 0 or more; in N·m
     * @param far moment at the other, 0 or more; in N·m
     * @return in N·m
     */
    double largestMoment(double near, double far) {
        double shear = (far - near * Math.cos(k * length)) / sinOverK(length)
                + weight * sinOverK(length / 2) / Math.cos(k * length / 2);
        double bend = k * k * near + weight;
        double peak = k > 0 ? Math.atan2(k * shear, bend) / k : shear / bend;
        double ends = Math.max(near, far);
        return peak > 0 && peak < length ? Math.max(ends, moment(peak, near, far)) : ends;
    }

    /** sin(kx)/k, which is x when k is 0; in m. */
    private double sinOverK(double x) {
        return k > 0 ? Math.sin(k * x) / k : x;
    }
}
