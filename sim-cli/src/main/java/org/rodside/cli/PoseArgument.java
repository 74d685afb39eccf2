package org.rodside.cli;

import java.util.Optional;
import org.rodside.io.PoseText;
import org.rodside.model.Linkage;
import picocli.CommandLine.Option;

/** The pose of {@code --at}. Use as {@code @Mixin PoseArgument pose}. */
final class PoseArgument {

    @Option(
            names = "--at",
            paramLabel = "POSE",
            description = "Pose as fractions of stroke, 0 retracted to 1 extended, e.g. boom=0.4,stick=0.5,bucket=0.3")
    private String text;

    boolean given() {
        return text != null;
    }

    /** Fraction of stroke of every cylinder in file order, where {@code --at} is given; every cylinder must be named. */
    Optional<double[]> fractions(Linkage linkage) {
        return Optional.ofNullable(text).map(at -> PoseText.fractions("--at", at, linkage));
    }

    /** Fraction of stroke of every cylinder in file order; those not named stand at a given fraction. */
    double[] fractions(Linkage linkage, double others) {
        return PoseText.fractions("--at", text == null ? "" : text, linkage, others);
    }
}
