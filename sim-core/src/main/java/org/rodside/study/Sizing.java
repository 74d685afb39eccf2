package org.rodside.study;

import java.util.ArrayList;
import java.util.List;
import java.util.function.DoubleConsumer;
import java.util.function.IntFunction;
import org.rodside.hydraulics.Column;
import org.rodside.hydraulics.CylinderArea;
import org.rodside.hydraulics.CylinderPressure;
import org.rodside.hydraulics.LoadedColumn;
import org.rodside.hydraulics.PreferredSizes;
import org.rodside.model.Cylinder;
import org.rodside.model.Tube;

/**
 * Bores and rods that would carry the worst loads of the drawn machine (theory W2). The loads are those of the machine as it
 * is: a larger cylinder also makes larger tool forces, so a change wants a new search for loads.
 */
public final class Sizing {

    /** Rods thinner than this share of the bore are not offered: common practice, no source; no unit. */
    private static final double THINNEST_ROD = 0.4;

    /** Rods thicker than this share of the bore are not offered: common practice, no source; no unit. */
    private static final double THICKEST_ROD = 0.8;

    /** A pressure met exactly still carries, whatever the last digits do; no unit. */
    private static final double ROUNDING = 1e-9;

    /** Bores offered from the smallest that carries upwards. */
    private static final int BORES_OFFERED = 4;

    private final Front front;
    private final SizeQuestion question;
    private final List<PushProfile> profiles;
    private final LoadsAnswer loads;

    private Sizing(Front front, SizeQuestion question, LoadsAnswer loads, List<PushProfile> profiles) {
        this.front = front;
        this.question = question;
        this.loads = loads;
        this.profiles = profiles;
    }

    /**
     * Finds the sizes for every cylinder.
     *
     * @param loads worst loads of the same front
     * @return rows by cylinder; the present cylinder's own row first, then pairs that carry, smallest bore and rod first
     */
    public static List<SizeRow> find(
            Front front, LoadsAnswer loads, SizeQuestion question, int threads, DoubleConsumer progress) {
        List<PushProfile> profiles = new ArrayList<>();
        List<LoadCase> cases = loads.cases();
        new Chunks(threads, done -> {})
                .<PushProfile>inOrder(cases.size(), () -> i -> new PushProfile(front, cases.get(i)), profiles::add);
        Sizing sizing = new Sizing(front, question, loads, profiles);
        List<SizeRow> rows = new ArrayList<>();
        int cylinders = front.mechanism().cylinders();
        new Chunks(threads, progress)
                .<List<SizeRow>>inOrder(cylinders, () -> (IntFunction<List<SizeRow>>) sizing::rows, rows::addAll);
        return rows;
    }

    private List<SizeRow> rows(int c) {
        Cylinder present = front.linkage().cylinders().get(c);
        List<SizeRow> rows = new ArrayList<>();
        rows.add(row(c, present, true));
        int bores = 0;
        for (double bore : PreferredSizes.BORES) {
            int before = rows.size();
            for (double rod : PreferredSizes.RODS) {
                if (rod >= THINNEST_ROD * bore && rod <= THICKEST_ROD * bore) {
                    addIfItCarries(c, resized(present, bore, rod), rows);
                }
            }
            bores += rows.size() > before ? 1 : 0;
            if (bores == BORES_OFFERED) {
                break;
            }
        }
        return rows;
    }

    private void addIfItCarries(int c, Cylinder cylinder, List<SizeRow> rows) {
        if (pressureFits(c, cylinder)) {
            SizeRow row = row(c, cylinder, false);
            if (row.carries()) {
                rows.add(row);
            }
        }
    }

    /** The same cylinder with another bore and rod, and the tube that usually goes with them. */
    static Cylinder resized(Cylinder present, double bore, double rod) {
        Tube tube = new Tube(
                present.retracted() - Cylinder.TUBE_LENGTH_ROD_SHARE * rod, Cylinder.TUBE_OUTSIDE_OVER_BORE * bore);
        return new Cylinder(
                present.name(),
                present.capPin(),
                present.rodPin(),
                present.count(),
                bore,
                rod,
                present.retracted(),
                present.stroke(),
                present.working(),
                present.relief(),
                present.back(),
                present.friction(),
                present.mass(),
                present.harderShare(),
                tube,
                present.yield());
    }

    private double worst(int c, LoadsAnswer.Sense sense) {
        return loads.cylinders().stream()
                .filter(load -> load.cylinder() == c && load.sense() == sense)
                .mapToDouble(load -> Math.abs(load.total()))
                .max()
                .orElse(0);
    }

    /** Cap side pressure that drives the worst push against back pressure and friction, theory (H4); in Pa. */
    private double pushPressure(int c, Cylinder cylinder) {
        double push = worst(c, LoadsAnswer.Sense.PUSH);
        return push == 0 ? 0 : CylinderPressure.of(cylinder, false).drivingCap(push);
    }

    /** As {@link #pushPressure} for the worst pull, rod side; in Pa. */
    private double pullPressure(int c, Cylinder cylinder) {
        double pull = worst(c, LoadsAnswer.Sense.PULL);
        return pull == 0 ? 0 : CylinderPressure.of(cylinder, false).drivingRod(-pull);
    }

    private boolean pressureFits(int c, Cylinder cylinder) {
        return pushPressure(c, cylinder)
                        <= (1 + ROUNDING)
                                * question.pressure().orElse(cylinder.working().cap())
                && pullPressure(c, cylinder)
                        <= (1 + ROUNDING)
                                * question.pressure().orElse(cylinder.working().rod());
    }

    private SizeRow row(int c, Cylinder cylinder, boolean present) {
        PushProfile.Worst worst = null;
        Column column = Column.of(cylinder);
        for (PushProfile profile : profiles) {
            PushProfile.Worst here = profile.smallestFactor(c, column);
            worst = worst == null || here.factor() < worst.factor() ? here : worst;
        }
        CylinderArea area = CylinderArea.of(cylinder);
        return new SizeRow(
                c,
                cylinder,
                pushPressure(c, cylinder),
                pullPressure(c, cylinder),
                worst.factor(),
                loadedFactor(c, cylinder, worst),
                mass(cylinder),
                Math.abs(area.supply(question.speed())),
                Math.abs(area.supply(-question.speed())),
                present,
                pressureFits(c, cylinder) && worst.factor() >= question.factor());
    }

    /** Smallest factor of the loaded column at its hardest pose and at the largest push of every stroke. */
    private double loadedFactor(int c, Cylinder cylinder, PushProfile.Worst worst) {
        if (question.eccentricity().isEmpty() || Double.isInfinite(worst.factor())) {
            return Double.NaN;
        }
        LoadedColumn column = LoadedColumn.of(cylinder, question.eccentricity().getAsDouble(), 0);
        double least = loadedFactor(column, cylinder, worst);
        for (PushProfile profile : profiles) {
            for (PushProfile.Worst push : profile.pushes(c)) {
                least = Math.min(least, loadedFactor(column, cylinder, push));
            }
        }
        return least;
    }

    private static double loadedFactor(LoadedColumn column, Cylinder cylinder, PushProfile.Worst at) {
        return column.capacity(at.length(), at.inclination(), cylinder.yield()) / (at.push() * cylinder.harderShare());
    }

    /** Steel of tube and rod without eyes, piston and gland; in kg. */
    static double mass(Cylinder cylinder) {
        double outside = cylinder.tube().outside();
        double tube = outside * outside - cylinder.bore() * cylinder.bore();
        double rodLength = cylinder.extended() - cylinder.tube().length();
        double rod = cylinder.rod() * cylinder.rod();
        return Math.PI / 4 * LoadedColumn.STEEL * (tube * cylinder.tube().length() + rod * rodLength);
    }
}
