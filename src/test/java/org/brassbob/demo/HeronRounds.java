// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.demo;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import org.brassbob.core.vessel.Vessel;

/** Three rounds of an invented voyage: departure, three days out, arrival. */
final class HeronRounds {
    private HeronRounds() {}

    static void write(Vessel vessel, Path folder) throws IOException {
        RoundWriter writer = new RoundWriter(vessel);
        for (RoundPlan plan : List.of(departure(), threeDaysOut(), arrival())) {
            writer.write(plan, folder);
        }
    }

    private static RoundPlan departure() {
        return engineRoom(new RoundPlan("departure.csv", "2026-03-04T06:10:00+01:00"))
                .full("db3-p")
                .full("db3-s")
                .empty("dtc")
                .warm("fo1-p", 84, 42)
                .warm("fo1-s", 86, 42)
                .warm("go1-p", 88, 18)
                .warm("go1-s", 90, 18)
                .gauged("fw-p", 98.4)
                .gauged("fw-s", 98.6)
                .warm("hyd", 88, 16);
    }

    private static RoundPlan threeDaysOut() {
        return engineRoom(new RoundPlan("three-days-out.csv", "2026-03-07T06:05:00+00:00"))
                .full("db3-p")
                .full("db3-s")
                .notTaken("grey", 45, "gauge dead - fitter asked for")
                .notTaken("coff", 0, "no access - hatch lashed for sea")
                .gauged("db4-p", 46)
                .gauged("ap", 40)
                .gauged("db4-s", 45)
                .withWater("fo1-p", 55, 42, "0.020")
                .warm("fo1-s", 60, 42)
                .warm("go1-p", 78, 20)
                .warm("go1-s", 90, 20)
                .gauged("fw-p", 70)
                .gauged("fw-s", 76)
                .warm("hyd", 87, 18);
    }

    private static RoundPlan arrival() {
        return engineRoom(new RoundPlan("arrival.csv", "2026-03-10T15:20:00+00:00"))
                .observedByDraughts("1.021")
                .full("db3-p")
                .full("db3-s")
                .gauged("db1-c", 45)
                .gauged("db2-p", 62)
                .gauged("db2-s", 58)
                .warm("fo1-p", 22, 40)
                .warm("fo1-s", 31, 40)
                .warm("go1-p", 66, 17)
                .warm("go1-s", 88, 17)
                .gauged("fw-p", 42)
                .gauged("fw-s", 37)
                .full("ap")
                .warm("hyd", 87, 15);
    }

    /** The tanks that stand part filled all the time. */
    private static RoundPlan engineRoom(RoundPlan plan) {
        return plan.warm("fo-set", 71, 65)
                .warm("fo-srv", 82, 75)
                .warm("go-day", 85, 30)
                .warm("lo-stor", 64, 32)
                .warm("lo-sump", 58, 55)
                .percent("urea", 76)
                .gauged("bilge", 28)
                .gauged("sludge", 35)
                .percent("grey", 32)
                .percent("black", 24);
    }
}
