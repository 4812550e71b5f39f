// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.store;

import java.time.OffsetDateTime;

/**
 * A kept copy of a ship's data.
 *
 * @param sha256 fingerprint of the whole
 * @param vesselId id of the ship
 * @param name of the ship
 * @param addedAt with its offset
 */
public record VesselCopy(String sha256, String vesselId, String name, OffsetDateTime addedAt) {}
