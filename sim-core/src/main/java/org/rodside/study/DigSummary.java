package org.rodside.study;

import java.util.Optional;

/**
 * What a sweep of digging forces met.
 *
 * @param poses number of poses in the sweep
 * @param assembled number of them that assemble
 * @param curl largest curl force met and where, with weights and all limits; empty where no pose has one
 * @param crowd largest crowd force met and where
 */
public record DigSummary(long poses, long assembled, Optional<DigForce> curl, Optional<DigForce> crowd) {}
