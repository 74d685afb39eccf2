package org.rodside.io;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.rodside.model.InputException;
import org.rodside.units.Unit;

/** Reads load cases as typed on the command line, {@code NAME=FX,FY,PAYLOAD}. */
public final class CaseText {

    /** Beyond this nothing that fills a bucket weighs; in kg/m³. */
    private static final double HEAVIEST = 25_000;

    private CaseText() {}

    /** A density in kg/m³, above zero; the usual one where the option is not given. */
    public static double density(String option, Optional<String> text, double usual) {
        if (text.isEmpty()) {
            return usual;
        }
        double density = LoadText.number(option, text.get(), "kg/m3");
        if (!(density >= 0 && density <= HEAVIEST)) {
            throw new InputException(option + ": must be from 0 to 25000 kg/m3, found " + text.get());
        }
        return density;
    }

    /**
     * Load cases.
     *
     * @param option name of the option, for messages
     * @param texts each {@code NAME=FX,FY,PAYLOAD}: kN, kN, kg
     * @param taken names that are in use already
     * @return by name: x and y part of the force (N) and payload (kg), in the order given
     * @throws InputException with every fault
     */
    public static Map<String, double[]> read(String option, List<String> texts, List<String> taken) {
        Map<String, double[]> cases = new LinkedHashMap<>();
        List<String> faults = new ArrayList<>();
        for (String text : texts) {
            try {
                int equals = text.indexOf('=');
                String name = equals < 0 ? "" : text.substring(0, equals).strip();
                if (!name.matches("[A-Za-z][A-Za-z0-9-]*")) {
                    throw new InputException(
                            option + ": NAME=FX,FY,PAYLOAD is wanted, the name a letter and then letters,"
                                    + " digits or '-'; found '" + text + "'");
                }
                if (taken.contains(name) || cases.containsKey(name)) {
                    throw new InputException(option + ": there is a case '" + name + "' already; choose another name");
                }
                cases.put(name, load(option + " " + name, text.substring(equals + 1)));
            } catch (InputException e) {
                faults.addAll(e.faults());
            }
        }
        if (!faults.isEmpty()) {
            throw new InputException(faults);
        }
        return cases;
    }

    private static double[] load(String option, String text) {
        String[] parts = text.split(",", -1);
        if (parts.length != 3) {
            throw new InputException(
                    option + ": three numbers FX,FY,PAYLOAD in kN, kN, kg are wanted, found '" + text + "'");
        }
        return new double[] {
            Unit.KILONEWTON.toSi(LoadText.number(option, parts[0], "kN")),
            Unit.KILONEWTON.toSi(LoadText.number(option, parts[1], "kN")),
            LoadText.mass(option, Optional.of(parts[2]))
        };
    }
}
