// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.condition;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.brassbob.core.notice.Notice;
import org.brassbob.core.round.SoundingRound;
import org.brassbob.core.vessel.Vessel;

/**
 * A round worked out.
 *
 * @param vessel the ship
 * @param round the round
 * @param tanks every tank, in the order of the walk
 * @param condition the ship's condition
 * @param margin the verdict
 * @param notices what must be told, the gravest first
 */
public record Assessment(
        Vessel vessel,
        SoundingRound round,
        List<TankFigures> tanks,
        Condition condition,
        Margin margin,
        List<Notice> notices) {
    public Assessment {
        tanks = List.copyOf(tanks);
        notices = List.copyOf(notices);
    }

    /** The tanks that take something from GM, the largest first. */
    public List<TankFigures> slackest() {
        return tanks.stream()
                .filter(t -> t.rank() > 0)
                .sorted(Comparator.comparingInt(TankFigures::rank))
                .toList();
    }

    public Optional<TankFigures> tank(String id) {
        return tanks.stream().filter(t -> t.tank().id().equals(id)).findFirst();
    }
}
