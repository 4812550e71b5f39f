// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.contents;

import java.util.List;
import org.brassbob.core.notice.Notice;

/**
 * The volumes that a reading allows (m3). Low and high are the same unless the pipe reads dry or brim-full.
 *
 * @param low least volume
 * @param high greatest volume
 * @param notices what must be told about it
 */
public record VolumeRange(double low, double high, List<Notice> notices) {
    /** A single volume with nothing to tell. */
    public static VolumeRange of(double volume) {
        return new VolumeRange(volume, volume, List.of());
    }

    /** Whether the reading leaves a choice. */
    public boolean isInterval() {
        return high > low;
    }
}
