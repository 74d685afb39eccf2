package org.rodside.kinematics;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * The stages of a front that form a chain from the frame to one link (theory K3): each stage is driven by one cylinder, is
 * carried by one link of the stage before (the frame for the first), and moves relative to that carrier as a function of
 * its own stroke alone. Immutable.
 */
public final class StageChain {

    private final List<Stage> stages;

    private StageChain(List<Stage> stages) {
        this.stages = List.copyOf(stages);
    }

    /**
     * One stage.
     *
     * @param cylinder the cylinder that drives it
     * @param carrier body that carries it
     * @param members bodies that move with its stroke relative to the carrier
     * @param output member that carries the next stage, or the last link of the chain
     */
    public record Stage(int cylinder, int carrier, List<Integer> members, int output) {
        public Stage {
            members = List.copyOf(members);
        }
    }

    /** The stages from the frame outwards. */
    public List<Stage> stages() {
        return stages;
    }

    /**
     * Finds the chain.
     *
     * @param mechanism the mechanism
     * @param last body the chain must end in
     * @return empty where the mechanism does not form one such chain: a cylinder anchored on another link than the one that
     *     carries the pivot, a branch, or loops without closed form
     */
    public static Optional<StageChain> of(Mechanism mechanism, int last) {
        if (!mechanism.staged()) {
            return Optional.empty();
        }
        List<Group> groups = new ArrayList<>();
        for (Step step : mechanism.steps()) {
            boolean placed = step instanceof CylinderStep c
                    ? addCylinder(mechanism, groups, c)
                    : addPair(mechanism, groups, (PairStep) step);
            if (!placed) {
                return Optional.empty();
            }
        }
        return chain(groups, last);
    }

    private record Group(int cylinder, int carrier, List<Integer> members) {}

    private static boolean addCylinder(Mechanism mechanism, List<Group> groups, CylinderStep step) {
        for (int carrier : mechanism.bodiesAt(step.pivot())) {
            if (carrier != step.body() && mechanism.isOn(step.anchor(), carrier)) {
                groups.add(new Group(step.cylinder(), carrier, new ArrayList<>(List.of(step.body()))));
                return true;
            }
        }
        return false;
    }

    private static boolean addPair(Mechanism mechanism, List<Group> groups, PairStep step) {
        for (int i = groups.size() - 1; i >= 0; i--) {
            Group group = groups.get(i);
            boolean firstMoves = onMember(mechanism, group, step.firstPin());
            boolean secondMoves = onMember(mechanism, group, step.secondPin());
            boolean first = firstMoves || mechanism.isOn(step.firstPin(), group.carrier());
            boolean second = secondMoves || mechanism.isOn(step.secondPin(), group.carrier());
            if (first && second && (firstMoves || secondMoves)) {
                group.members().add(step.first());
                group.members().add(step.second());
                return true;
            }
        }
        return false;
    }

    private static boolean onMember(Mechanism mechanism, Group group, int pin) {
        return group.members().stream().anyMatch(member -> mechanism.isOn(pin, member));
    }

    private static Optional<StageChain> chain(List<Group> groups, int last) {
        List<Stage> stages = new ArrayList<>();
        for (int i = 0; i < groups.size(); i++) {
            Group group = groups.get(i);
            int output = i + 1 < groups.size() ? groups.get(i + 1).carrier() : last;
            boolean carried = i == 0
                    ? group.carrier() == 0
                    : group.carrier() == stages.get(i - 1).output();
            if (!carried || !group.members().contains(output)) {
                return Optional.empty();
            }
            stages.add(new Stage(group.cylinder(), group.carrier(), group.members(), output));
        }
        return Optional.of(new StageChain(stages));
    }
}
