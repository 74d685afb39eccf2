package org.rodside.units;

/** Every unit Rodside reads or prints; the only place where a conversion factor is written. */
public enum Unit {
    METRE("m", 1),
    MILLIMETRE("mm", 1e-3),
    CENTIMETRE("cm", 1e-2),
    /** Exactly 25.4 mm: international yard and pound agreement, 1959. */
    INCH("in", 0.0254),
    FOOT("ft", 0.3048),
    SQUARE_CENTIMETRE("cm2", 1e-4),
    SQUARE_INCH("in2", 0.0254 * 0.0254),
    RADIAN("rad", 1),
    DEGREE("deg", Math.PI / 180),
    NEWTON("N", 1),
    KILONEWTON("kN", 1e3),
    /** One pound mass under standard gravity: 0.45359237 kg × 9.80665 m/s². */
    POUND_FORCE("lbf", 0.45359237 * 9.80665),
    PASCAL("Pa", 1),
    KILOPASCAL("kPa", 1e3),
    MEGAPASCAL("MPa", 1e6),
    BAR("bar", 1e5),
    PSI("psi", 0.45359237 * 9.80665 / (0.0254 * 0.0254)),
    KILOGRAM("kg", 1),
    TONNE("t", 1e3),
    /** Exactly 0.45359237 kg: international yard and pound agreement, 1959. */
    POUND("lb", 0.45359237),
    KILONEWTON_METRE("kNm", 1e3),
    POUND_FORCE_FOOT("lbf_ft", 0.45359237 * 9.80665 * 0.3048),
    MILLIMETRE_PER_SECOND("mm_s", 1e-3),
    INCH_PER_SECOND("in_s", 0.0254),
    LITRE_PER_MINUTE("L_min", 1e-3 / 60),
    /** US liquid gallon of 231 cubic inches a minute. */
    GALLON_PER_MINUTE("gal_min", 231 * 0.0254 * 0.0254 * 0.0254 / 60),
    KILOWATT("kW", 1e3),
    /** 550 ft·lbf/s. */
    HORSEPOWER("hp", 550 * 0.3048 * 0.45359237 * 9.80665),
    KILOJOULE("kJ", 1e3),
    FOOT_POUND_FORCE("ft_lbf", 0.3048 * 0.45359237 * 9.80665),
    SECOND("s", 1),
    CUBIC_METRE("m3", 1),
    CUBIC_YARD("yd3", 0.9144 * 0.9144 * 0.9144),
    ONE("", 1);

    private final String symbol;
    private final double si;

    Unit(String symbol, double si) {
        this.symbol = symbol;
        this.si = si;
    }

    /** As written in linkage files and, after an underscore, in keys and column names; empty for {@link #ONE}. */
    public String symbol() {
        return symbol;
    }

    /** Size of one of this unit in the SI unit of its kind (m, rad, N, Pa, kg, s and products of them). */
    public double inSi() {
        return si;
    }

    /** A value given in this unit, in SI. */
    public double toSi(double value) {
        return value * si;
    }

    /** A value given in SI, in this unit. */
    public double fromSi(double value) {
        return value / si;
    }
}
