package org.rodside.reference;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.rodside.units.Unit.POUND_FORCE;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.rodside.model.Linkage;
import org.rodside.reference.Example.Forces;
import org.rodside.study.DigForce;
import org.rodside.study.Digging;
import org.rodside.study.Edge;

/**
 * Forces of linkages with cylinders against the figures of textbooks. Files are read, compiled and answered as a user's
 * are. Cylinders: + push, so a book's C is plus here and its T minus. Books with masses in kg take g = 9.81 m/s² and ours
 * is the standard 9.80665: all loads are weights, so their figures are scaled by the ratio. Books in pounds need nothing.
 */
class BookStaticsTest {

    /** Book's g over ours; no unit. */
    private static final double BOOK_G = 9.81 / Linkage.GRAVITY;

    /** Half of the last of two printed decimals, and a hair: F_EF of 6-91 is 8.175, a tie; in kN or kip. */
    private static final double TWO_DECIMALS = 0.005 + 1e-6;

    /** Half of the last of three digits without decimals, as in 158 kN; in kN. */
    private static final double WHOLE = 0.5;

    /** Half of the last digit of figures in kN printed with one decimal; in kN. */
    private static final double ONE_DECIMAL = 0.05;

    /** Half of the last digit of figures in N printed with two or three decimals; the coarser; in N. */
    private static final double CENTINEWTON = 0.005;

    /** Half of the last digit of figures in N printed with one decimal; in N. */
    private static final double DECINEWTON = 0.05;

    /** Half of the last digit of figures in N printed to tens, as in 158 130 N; in N. */
    private static final double TEN_NEWTONS = 5;

    /** Half of the last of four decimals, and the twelve digits of the drawn pins; in N. */
    private static final double FOUR_DECIMALS = 6e-5;

    /** A force in N of ours as the book has it, in kN. */
    private static double kN(double force) {
        return force * BOOK_G / 1000;
    }

    private static double kip(double force) {
        return POUND_FORCE.fromSi(force) / 1000;
    }

    /** Hibbeler, Statics, 14th ed., 6-91, front loader (seen; F_AD from memory): F_EF 8.18 kN T, F_AD 158 kN C. */
    @Test
    void hibbelerFrontLoader() {
        Forces forces = new Example("hibbeler-6-91").carrying(0);
        assertEquals(-8.18, kN(forces.cylinder("EF")), TWO_DECIMALS);
        assertEquals(158, kN(forces.cylinder("AD")), WHOLE);
        assertEquals(-8175.0, BOOK_G * forces.cylinder("EF"), DECINEWTON);
        assertEquals(158130, BOOK_G * forces.cylinder("AD"), TEN_NEWTONS);
    }

    /**
     * Hibbeler, Statics, 14th ed., 6-81, hoist (seen): F_FB 1938.87 N, F_DB 2601.27 N, E_x = E_y = 613.125 N. The senses
     * are ours: FB props the boom, DB holds B up, the boom pulls its foot E up and forward.
     */
    @Test
    void hibbelerHoist() {
        Forces forces = new Example("hibbeler-6-81").carrying(0);
        assertEquals(1938.87, BOOK_G * forces.cylinder("FB"), CENTINEWTON);
        assertEquals(-2601.27, BOOK_G * forces.cylinder("DB"), CENTINEWTON);
        assertEquals(-613.125, BOOK_G * forces.x("E", "boom"), CENTINEWTON);
        assertEquals(-613.125, BOOK_G * forces.y("E", "boom"), CENTINEWTON);
    }

    /** Hibbeler, Statics, 13th ed., 6-117, engine hoist (memory): AB at 76.41°, 9.23 kN C, C_x 2.17, C_y 7.01 kN. */
    @Test
    void hibbelerEngineHoist() {
        Example example = new Example("hibbeler-6-117");
        Forces forces = example.carrying(0);
        assertEquals(0.86121, forces.pose().length(example.mechanism.cylinder("AB")), 5e-6);
        assertEquals(76.41, example.direction(forces.pose(), "B", "A"), 0.005);
        assertEquals(9.23, kN(forces.cylinder("AB")), TWO_DECIMALS);
        assertEquals(-2.17, kN(forces.x("C", "boom")), TWO_DECIMALS);
        assertEquals(-7.01, kN(forces.y("C", "boom")), TWO_DECIMALS);
    }

    /**
     * Hibbeler, Statics, 12th ed., 6-110, lever of a bucket (memory, sizes only): AC 2.51, AB 3.08, AD 3.43 kip. The
     * senses are ours: the weight turns the bucket clockwise about E below C, so AC is pulled and pulls A down and to the
     * right; then AB pulls A up, and AD takes both horizontal parts in tension.
     */
    @Test
    void hibbelerBucketLever() {
        Forces forces = new Example("hibbeler-6-110").carrying(0);
        assertEquals(2.51, kip(forces.tension("AC", "A", "C")), TWO_DECIMALS);
        assertEquals(-3.08, kip(forces.cylinder("AB")), TWO_DECIMALS);
        assertEquals(3.43, kip(forces.tension("AD", "D", "A")), TWO_DECIMALS);
    }

    /**
     * Meriam and Kraige, Statics, tractor shovel, 500 kg (answers seen, placement ours): HF 5.05, IJ 9.06, BC 15.4 kN. The
     * senses are ours: the load ahead of D pulls HF, and HF turns the bell crank so that I leans on J.
     */
    @Test
    void meriamTractorShovel() {
        Forces forces = new Example("meriam-tractor-shovel").carrying(0);
        assertEquals(5.05, kN(forces.tension("HF", "H", "F")), TWO_DECIMALS);
        assertEquals(9.06, kN(forces.cylinder("IJ")), TWO_DECIMALS);
        assertEquals(15.4, kN(forces.cylinder("BC")), ONE_DECIMAL);
    }

    /** The same with 610 kg, 110 of them as payload (answers seen): IJ 11 051.9516 N, BC 18 807.1714 N. */
    @Test
    void meriamTractorShovelLoaded() {
        Forces forces = new Example("meriam-tractor-shovel").carrying(110);
        assertEquals(11051.9516, BOOK_G * forces.cylinder("IJ"), FOUR_DECIMALS);
        assertEquals(18807.1714, BOOK_G * forces.cylinder("BC"), FOUR_DECIMALS);
    }

    /**
     * Beer and Johnston, Statics, front loader with a central linkage (memory): GH 4.09 kip, BC 4.91 kip C, each of the two
     * EF 10.69 kip C. GH is pulled: the load hangs ahead of J, below G.
     */
    @Test
    void beerAndJohnstonFrontLoader() {
        Forces forces = new Example("beer-johnston-front-loader").carrying(0);
        int twins = 2;
        assertEquals(4.09, kip(forces.tension("GH", "H", "G")), TWO_DECIMALS);
        assertEquals(4.91, kip(forces.cylinder("BC")), TWO_DECIMALS);
        assertEquals(10.69, kip(forces.cylinder("EF")) / twins, TWO_DECIMALS);
    }

    /**
     * SAE J1179, bucket digging force by moment arms, F·(d_A·d_C/d_B)/d_D (form of the standard; figures computed from that
     * form outside this project's code): idler at four angles, 30 MPa on a 110 mm bore, no weights.
     */
    @ParameterizedTest
    @CsvSource({"70, 73371.8", "85, 78796.8", "100, 75438.9", "115, 54571.4"})
    void bucketForceByMomentArms(double idler, double force) {
        Example example = new Example("j1179-bucket-linkage");
        double[] fractions = example.drawn();
        example.turn(fractions, "bucket", "idler-pin", "idler-end", idler);
        DigForce ours = new Digging(example.front, Edge.TIP).curlAt(fractions, true);
        assertEquals(force, ours.force(), DECINEWTON);
        assertEquals("bucket.working.cap", ours.limit());
    }
}
