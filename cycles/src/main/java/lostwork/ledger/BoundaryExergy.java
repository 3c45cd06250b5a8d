package lostwork.ledger;

import lostwork.quantity.Power;

/**
 * One exergy flow across the boundary of the plant.
 *
 * @param port the port where it crosses
 * @param enters whether it enters the plant
 * @param rate the exergy rate, positive in that direction
 * @param role what it is to the owner of the plant
 */
public record BoundaryExergy(String port, boolean enters, Power rate, BoundaryRole role) {}
