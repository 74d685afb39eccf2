package org.rodside.study;

import java.util.Optional;

/**
 * What a sweep of digging forces met.
 *
 * @param poses number of poses in the sweep
 * @param ideal true where weights, friction, back pressure, tipping and slip were left out
 * @param assembled number of them that assemble
 * @param curl largest curl force met and where; empty where no pose has one
 * @param crowd largest crowd force met and where
 */
public record DigSummary(
        long poses, boolean ideal, long assembled, Optional<DigForce> curl, Optional<DigForce> crowd) {}
