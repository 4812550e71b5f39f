// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.condition;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.brassbob.core.notice.Notice;
import org.brassbob.core.notice.NoticeCode;
import org.brassbob.fixture.RoundBuilder;
import org.brassbob.fixture.ShipBuilder;
import org.brassbob.fixture.TankBuilder;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** A pipe that reads dry or brim-full says no more than that: the less favourable end counts and is told (product.md rule 1). */
class IntervalTest {
    /** 20 × 12 m; the pipe at the after end; low in the ship or high. */
    private static TankBuilder tank(double bottom) {
        return TankBuilder.box("t", 40, 60, -6, 6, bottom, bottom + 2).pipe(40, 0, bottom, 2);
    }

    private static ShipBuilder ship(double bottom) {
        return ShipBuilder.ship().lightship(3000, 6).tanks(tank(bottom));
    }

    private static double gm(double bottom, double trim, RoundBuilder round) {
        return ship(bottom).assess(round.trim(trim).list(0).build()).condition().gm();
    }

    @ParameterizedTest
    @CsvSource({"0, -2", "9, -2", "0, 2", "9, 2"})
    void dryPipeTakesTheWorseEnd(double bottom, double trim) {
        // By the head a wedge of 20·(20·0.02)/2·12 = 48 m3 hides from the pipe; by the stern nothing can.
        double hidden = trim < 0 ? 48 : 0;
        Assessment dry = ship(bottom)
                .assess(RoundBuilder.round().trim(trim).list(0).sounding("t", 0).build());
        double none = gm(bottom, trim, RoundBuilder.round().volume("t", 0));
        double all = gm(bottom, trim, RoundBuilder.round().volume("t", hidden));
        assertEquals(Math.min(none, all), dry.condition().gm(), 1e-9);
        List<Notice> notes = dry.tanks().get(0).notes();
        assertEquals(hidden > 0 ? 1 : 0, notes.size());
        if (hidden > 0) {
            assertEquals(NoticeCode.PIPE_DRY, notes.get(0).code());
            assertEquals(48, (double) notes.get(0).values().get(0), 1e-9);
            assertEquals(dry.tanks().get(0).volume(), notes.get(0).values().get(1));
        }
    }

    @ParameterizedTest
    @CsvSource({"0, -2", "9, -2", "0, 2", "9, 2"})
    void brimFullPipeTakesTheWorseEnd(double bottom, double trim) {
        double room = trim > 0 ? 48 : 0;
        Assessment brim = ship(bottom)
                .assess(RoundBuilder.round().trim(trim).list(0).ullage("t", 0).build());
        double full = gm(bottom, trim, RoundBuilder.round().volume("t", 480));
        double least = gm(bottom, trim, RoundBuilder.round().volume("t", 480 - room));
        assertEquals(Math.min(full, least), brim.condition().gm(), 1e-9);
        List<Notice> notes = brim.tanks().get(0).notes();
        assertEquals(room > 0 ? 1 : 0, notes.size());
        if (room > 0) {
            assertEquals(NoticeCode.PIPE_BRIM_FULL, notes.get(0).code());
            assertEquals(432, (double) notes.get(0).values().get(0), 1e-9);
        }
    }

    @Test
    void severalIntervalsAreJudgedTogether() {
        ShipBuilder ship = ShipBuilder.ship()
                .lightship(3000, 6)
                .tanks(
                        TankBuilder.box("low", 40, 60, -6, 6, 0, 2).pipe(40, 0, 0, 2),
                        TankBuilder.box("high", 40, 60, -6, 6, 9, 11).pipe(40, 0, 9, 2),
                        TankBuilder.box("unread", 60, 70, -6, 6, 0, 2));
        RoundBuilder dry = RoundBuilder.upright().trim(-2).sounding("low", 0).sounding("high", 0);
        double found = ship.assess(dry.build()).condition().gm();
        for (double low : new double[] {0, 48}) {
            for (double high : new double[] {0, 48}) {
                for (int unread = 0; unread <= 240; unread += 12) {
                    RoundBuilder round = RoundBuilder.upright()
                            .trim(-2)
                            .volume("low", low)
                            .volume("high", high)
                            .volume("unread", unread);
                    double gm = ship.assess(round.build()).condition().gm();
                    assertTrue(found <= gm + 1e-6, () -> found + " against " + gm);
                }
            }
        }
    }
}
