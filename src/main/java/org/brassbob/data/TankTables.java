// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.data;

import org.brassbob.core.geometry.SpaceShape;
import org.brassbob.core.table.SoundingTable;
import org.brassbob.core.table.VolumeTable;
import org.jspecify.annotations.Nullable;

/**
 * The files of one tank, where it has them.
 *
 * @param anyFault whether one of them has a fault, so that what it lacks is no second fault
 */
record TankTables(
        @Nullable SoundingTable soundings,
        @Nullable VolumeTable volumes,
        @Nullable SpaceShape shape,
        boolean anyFault) {}
