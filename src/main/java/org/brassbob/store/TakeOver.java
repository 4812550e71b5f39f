// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.store;

import java.time.OffsetDateTime;

/**
 * An officer took over the ship: every reading before it counts as inherited.
 *
 * @param vesselId id of the ship
 * @param officer who took over
 * @param at with its offset
 */
public record TakeOver(String vesselId, String officer, OffsetDateTime at) {}
