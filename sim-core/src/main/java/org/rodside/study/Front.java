package org.rodside.study;

import java.util.List;
import java.util.Optional;
import org.rodside.hydraulics.CylinderLimits;
import org.rodside.kinematics.Mechanism;
import org.rodside.kinematics.PoseSolver;
import org.rodside.model.InputException;
import org.rodside.model.Linkage;
import org.rodside.model.Machine;
import org.rodside.model.Point;
import org.rodside.model.Tool;
import org.rodside.statics.Masses;

/** A linkage made ready for questions: mechanism, masses, cylinder limits and the places of the tool. Immutable. */
public final class Front {

    private final Mechanism mechanism;
    private final Masses masses;
    private final List<CylinderLimits> limits;
    private final List<CylinderLimits> idealLimits;

    private Front(Linkage linkage) {
        mechanism = Mechanism.of(linkage);
        masses = new Masses(mechanism);
        limits = linkage.cylinders().stream()
                .map(c -> CylinderLimits.of(c, false))
                .toList();
        idealLimits = linkage.cylinders().stream()
                .map(c -> CylinderLimits.of(c, true))
                .toList();
    }

    /**
     * Compiles a linkage for questions.
     *
     * @throws InputException where the drawing shows a loop at its dead centre
     */
    public static Front of(Linkage linkage) {
        Front front = new Front(linkage);
        if (!front.mechanism.staged()) {
            front.movesAsDrawn();
        }
        return front;
    }

    /** Counting freedoms does not show a part that is locked while another is loose: the drawn pose does. */
    private void movesAsDrawn() {
        FrontSolver solver = new FrontSolver(this);
        boolean moves = solver.place(drawnFractions()) == PoseSolver.ASSEMBLED;
        for (int c = 0; c < mechanism.cylinders() && moves; c++) {
            solver.travel(c);
            for (int body = 1; body < mechanism.bodies(); body++) {
                moves &= Double.isFinite(solver.motion().omega(body));
            }
        }
        if (!moves) {
            throw new InputException(
                    "links: the linkage cannot move as drawn: one part of it is locked while another is loose,"
                            + " or it stands at a dead centre; check which pins the links share, or draw another pose");
        }
    }

    public Linkage linkage() {
        return mechanism.linkage();
    }

    public Mechanism mechanism() {
        return mechanism;
    }

    public Masses masses() {
        return masses;
    }

    /** Limits of a cylinder; ideal leaves friction and back pressure out. */
    public CylinderLimits limits(int cylinder, boolean ideal) {
        return ideal ? idealLimits.get(cylinder) : limits.get(cylinder);
    }

    public Optional<Machine> machine() {
        return linkage().machine();
    }

    /** The tool; where the file has none, an error that says so. */
    public Tool tool() {
        return linkage().tool().orElseThrow(() -> needs("tool"));
    }

    /** The machine under the front; where the file has none, an error that says so. */
    public Machine machineOrFault() {
        return machine().orElseThrow(() -> needs("machine"));
    }

    /** Body of the tool link. */
    public int toolBody() {
        return mechanism.body(tool().link());
    }

    public Place tip() {
        return place(tool().tip());
    }

    public Place fill() {
        return place(tool().fill());
    }

    public Place hook() {
        return place(tool().hook());
    }

    public Place lip() {
        return place(tool().lip().orElseThrow(() -> needs("tool.lip")));
    }

    public Place heel() {
        return place(tool().heel().orElseThrow(() -> needs("tool.heel")));
    }

    /** Fraction of stroke of each cylinder in the drawn pose; no unit. */
    public double[] drawnFractions() {
        double[] fractions = new double[mechanism.cylinders()];
        for (int c = 0; c < fractions.length; c++) {
            fractions[c] = (mechanism.drawnLength(c) - mechanism.retracted(c)) / mechanism.stroke(c);
        }
        return fractions;
    }

    /** The cylinder that curls. */
    public int curl() {
        return mechanism.cylinder(tool().curl());
    }

    /** The cylinder that crowds; -1 where the file names none. */
    public int crowd() {
        return tool().crowd().map(mechanism::cylinder).orElse(-1);
    }

    /** The cylinder that hoists; -1 where the file names none. */
    public int hoist() {
        return tool().hoist().map(mechanism::cylinder).orElse(-1);
    }

    /** A named point or pin of the tool link. */
    public Place place(String name) {
        Point point = mechanism.place(toolBody(), name);
        return new Place(name, toolBody(), point.x(), point.y());
    }

    /** The error of a study that needs what the file leaves out. */
    public static InputException needs(String path) {
        return new InputException(path + ": this command needs it and the linkage file does not give it; add \"" + path
                + "\" as described in docs/linkage-file.md");
    }
}
