package org.rodside.report;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.rodside.kinematics.Mechanism;
import org.rodside.kinematics.PoseBuffer;
import org.rodside.model.Cylinder;
import org.rodside.model.Link;
import org.rodside.model.Linkage;
import org.rodside.model.Machine;
import org.rodside.model.Point;
import org.rodside.report.DrawnPose.Body;
import org.rodside.report.DrawnPose.Cloud;
import org.rodside.report.DrawnPose.Strut;

/** Turns a solved pose into what is drawn of it. */
public final class PoseDrawing {

    private PoseDrawing() {}

    /** What is drawn of a pose; in m, machine axes; keeps nothing of the buffer. */
    public static DrawnPose of(PoseBuffer pose) {
        Mechanism mechanism = pose.mechanism();
        Linkage linkage = mechanism.linkage();
        List<Body> links = new ArrayList<>();
        for (Link link : linkage.links()) {
            int body = mechanism.body(link.name());
            links.add(new Body(
                    link.name(), places(pose, body, List.copyOf(link.points().values()))));
        }
        List<Strut> struts = new ArrayList<>();
        for (Cylinder cylinder : linkage.cylinders()) {
            int index = mechanism.cylinder(cylinder.name());
            Cloud ends = pins(pose, mechanism.capPin(index), mechanism.rodPin(index));
            struts.add(new Strut(
                    cylinder.name(),
                    ends,
                    cylinder.tube().length(),
                    cylinder.tube().outside(),
                    cylinder.rod()));
        }
        int[] all = new int[mechanism.pins()];
        for (int i = 0; i < all.length; i++) {
            all[i] = i;
        }
        Body frame = new Body(Linkage.FRAME, places(pose, mechanism.body(Linkage.FRAME), List.of()));
        return new DrawnPose(frame, links, struts, pins(pose, all), ground(linkage));
    }

    private static DrawnPose.Ground ground(Linkage linkage) {
        if (linkage.machine().isEmpty()) {
            return new DrawnPose.Ground(false, OptionalDouble.empty(), OptionalDouble.empty());
        }
        Machine machine = linkage.machine().get();
        return new DrawnPose.Ground(
                true, OptionalDouble.of(machine.tippingFront()), OptionalDouble.of(machine.tippingRear()));
    }

    private static Cloud pins(PoseBuffer pose, int... pins) {
        double[] x = new double[pins.length];
        double[] y = new double[pins.length];
        for (int i = 0; i < pins.length; i++) {
            x[i] = pose.pinX(pins[i]);
            y[i] = pose.pinY(pins[i]);
        }
        return new Cloud(x, y);
    }

    /** Pins of a body, then points given as drawn. */
    private static Cloud places(PoseBuffer pose, int body, List<Point> drawn) {
        int[] pins = pose.mechanism().pinsOf(body);
        double[] x = new double[pins.length + drawn.size()];
        double[] y = new double[x.length];
        for (int i = 0; i < x.length; i++) {
            Point point = i < pins.length ? null : drawn.get(i - pins.length);
            x[i] = point == null ? pose.pinX(pins[i]) : pose.x(body, point.x(), point.y());
            y[i] = point == null ? pose.pinY(pins[i]) : pose.y(body, point.x(), point.y());
        }
        return new Cloud(x, y);
    }
}
