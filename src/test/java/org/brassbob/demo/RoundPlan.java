// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.demo;

import java.util.LinkedHashMap;
import java.util.Map;

/**
 * What stood in the tanks when an invented round was taken, in per cent of capacity, and how some of it was read. Tanks that are not
 * named were empty.
 */
final class RoundPlan {
    /** How a tank is written down. */
    record Entry(String kind, double percent, String temperature, String water, String note) {}

    private final String file;
    private final String start;
    private final Map<String, Entry> entries = new LinkedHashMap<>();
    private boolean byDraughts;
    private String sea = "1.025";

    RoundPlan(String file, String start) {
        this.file = file;
        this.start = start;
    }

    String file() {
        return file;
    }

    String start() {
        return start;
    }

    String sea() {
        return sea;
    }

    boolean byDraughts() {
        return byDraughts;
    }

    RoundPlan observedByDraughts(String seaDensity) {
        byDraughts = true;
        sea = seaDensity;
        return this;
    }

    /** The tank read by its usual gauge. */
    RoundPlan gauged(String tank, double percent) {
        return put(tank, new Entry("gauge", percent, "", "", ""));
    }

    RoundPlan warm(String tank, double percent, int temperatureC) {
        return put(tank, new Entry("gauge", percent, String.valueOf(temperatureC), "", ""));
    }

    RoundPlan withWater(String tank, double percent, int temperatureC, String water) {
        return put(
                tank, new Entry("gauge", percent, String.valueOf(temperatureC), water, "water-finding paste turned"));
    }

    RoundPlan percent(String tank, double percent) {
        return put(tank, new Entry("percent", percent, "", "", ""));
    }

    RoundPlan full(String tank) {
        return put(tank, new Entry("full", 100, "", "", "pressed up until it ran over"));
    }

    RoundPlan empty(String tank) {
        return put(tank, new Entry("empty", 0, "", "", "stripped"));
    }

    RoundPlan notTaken(String tank, double percent, String why) {
        return put(tank, new Entry("not-taken", percent, "", "", why));
    }

    private RoundPlan put(String tank, Entry entry) {
        entries.put(tank, entry);
        return this;
    }

    Entry of(String tank) {
        return entries.getOrDefault(tank, new Entry("gauge", 0, "", "", ""));
    }
}
