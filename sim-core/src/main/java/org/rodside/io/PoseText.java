package org.rodside.io;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.regex.Pattern;
import org.rodside.model.Cylinder;
import org.rodside.model.InputException;
import org.rodside.model.Linkage;
import org.rodside.model.Tool;

/** Reads a pose as typed on the command line, {@code boom=0.4,stick=0.5,bucket=0.3}: fractions of stroke. */
public final class PoseText {

    private final String option;
    private final List<String> names;
    private final double[] fractions;
    private final boolean[] given;
    private final List<String> faults = new ArrayList<>();

    private PoseText(String option, Linkage linkage) {
        this.option = option;
        this.names = linkage.cylinders().stream().map(Cylinder::name).toList();
        this.fractions = new double[names.size()];
        this.given = new boolean[names.size()];
    }

    /**
     * A pose in which every cylinder must be named.
     *
     * @param option name of the option the text was given to, for messages, e.g. {@code --at}
     * @param text name=fraction pairs with commas between
     * @return fraction of stroke of every cylinder, 0 retracted to 1 extended, in file order
     * @throws InputException with every fault of the text
     */
    public static double[] fractions(String option, String text, Linkage linkage) {
        PoseText pose = new PoseText(option, linkage);
        pose.read(text);
        for (int i = 0; i < pose.names.size(); i++) {
            if (!pose.given[i]) {
                pose.fault("cylinder " + pose.names.get(i) + " is missing; name every one of "
                        + String.join(", ", pose.names));
            }
        }
        return pose.result();
    }

    /**
     * A pose in which cylinders that are not named stand at a given fraction.
     *
     * @param option name of the option the text was given to, for messages
     * @param text name=fraction pairs with commas between; may be empty
     * @param others fraction of stroke of the cylinders not named; no unit
     * @return fraction of stroke of every cylinder, 0 retracted to 1 extended, in file order
     * @throws InputException with every fault of the text
     */
    public static double[] fractions(String option, String text, Linkage linkage, double others) {
        PoseText pose = new PoseText(option, linkage);
        Arrays.fill(pose.fractions, others);
        if (!text.isBlank()) {
            pose.read(text);
        }
        return pose.result();
    }

    /**
     * Where the cylinders of a lift stand: the curl cylinder at a fraction, those that neither hoist, crowd nor curl at half
     * stroke or as typed.
     *
     * @throws InputException with every fault; naming a cylinder that hoists, crowds or curls is one
     */
    public static double[] others(String option, Optional<String> text, Linkage linkage, double curl) {
        double[] fractions = fractions(option, text.orElse(""), linkage, 0.5);
        Tool tool = linkage.tool().orElse(null);
        List<String> wrong = new ArrayList<>();
        for (int c = 0; c < fractions.length; c++) {
            String name = linkage.cylinders().get(c).name();
            boolean duty = tool != null
                    && (name.equals(tool.curl())
                            || name.equals(tool.hoist().orElse(""))
                            || name.equals(tool.crowd().orElse("")));
            if (duty && text.isPresent() && Pattern.matches(".*(^|,)\\s*" + name + "\\s*=.*", text.get())) {
                wrong.add(option + ": cylinder " + name + " hoists, crowds or curls here and is not free to be set"
                        + " (--curl sets the curl cylinder)");
            }
            fractions[c] = tool != null && name.equals(tool.curl()) ? curl : fractions[c];
        }
        if (!wrong.isEmpty()) {
            throw new InputException(wrong);
        }
        return fractions;
    }

    /** One fraction of stroke, 0 retracted to 1 extended; no unit. */
    public static double fraction(String option, String text) {
        double fraction = LoadText.isNumber(text.strip()) ? Double.parseDouble(text.strip()) : Double.NaN;
        if (!(fraction >= 0 && fraction <= 1)) {
            throw new InputException(option
                    + ": a fraction of stroke from 0 (retracted) to 1 (extended) is wanted, found '" + text + "'");
        }
        return fraction;
    }

    /** A pose of a linkage as it would be typed, for messages. */
    public static String example(Linkage linkage) {
        return String.join(
                ",", linkage.cylinders().stream().map(c -> c.name() + "=0.5").toList());
    }

    /**
     * Index of a cylinder typed by name.
     *
     * @throws InputException where no cylinder has the name, with the nearest one
     */
    public static int cylinder(String option, String name, Linkage linkage) {
        List<String> names = linkage.cylinders().stream().map(Cylinder::name).toList();
        if (!names.contains(name)) {
            throw new InputException(
                    option + ": no cylinder is named '" + name + "'; " + NearestName.advice(name, names));
        }
        return names.indexOf(name);
    }

    private double[] result() {
        if (!faults.isEmpty()) {
            throw new InputException(faults);
        }
        return fractions;
    }

    private void read(String text) {
        for (String part : text.split(",", -1)) {
            String pair = part.strip();
            int equals = pair.indexOf('=');
            if (equals < 1) {
                fault("'" + pair + "' is not CYLINDER=FRACTION, for example " + names.get(0) + "=0.5");
                continue;
            }
            set(pair.substring(0, equals).strip(), pair.substring(equals + 1).strip());
        }
    }

    private void set(String name, String value) {
        int index = names.indexOf(name);
        if (index < 0) {
            fault("no cylinder is named '" + name + "'; " + NearestName.advice(name, names));
            return;
        }
        if (given[index]) {
            fault("cylinder " + name + " is given twice");
        }
        given[index] = true;
        if (!LoadText.isNumber(value)) {
            fault(name + ": '" + value + "' is not a number; a fraction of stroke from 0 to 1 is wanted");
            return;
        }
        double fraction = Double.parseDouble(value);
        if (!(fraction >= 0 && fraction <= 1)) {
            fault(name + ": " + value + " is outside 0 (retracted) to 1 (extended)");
        }
        fractions[index] = fraction;
    }

    private void fault(String what) {
        faults.add(option + ": " + what);
    }
}
