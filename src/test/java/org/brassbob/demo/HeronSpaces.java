// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.demo;

import static org.brassbob.demo.SpaceCutter.across;
import static org.brassbob.demo.SpaceCutter.box;
import static org.brassbob.demo.SpaceCutter.outboard;

import java.util.LinkedHashMap;
import java.util.Map;

/**
 * The spaces of the demo coaster. From aft: peak under the steering gear with fresh water on both sides of it, engine room
 * (6.6 to 21 m), cofferdam, fuel across the ship (21.6 to 24 m), hold 2 (to 48 m), hold 1 (to 72 m), deep tank, thruster room, peak.
 * The tank top lies at 1.1 m; under the holds a pipe duct runs between the double-bottom tanks, and double sides stand outside them.
 */
final class HeronSpaces {
    private static final double TANK_TOP = 1.1;
    private static final double HOPPER_TOP = 3.4;
    private static final double PLATFORM = 4.4;
    private static final double PEAK_FLAT = 5.9;
    private static final double DECK = HeronLines.DEPTH;

    private static final double DUCT = 0.9;
    private static final double INNER_SIDE = 6.5;
    private static final double HOPPER_FOOT = 5.6;
    private static final double HOPPER_KNUCKLE = 2.4;

    private static final Range BUNKERS = Range.of(21.6, 24);
    private static final Range HOLD_2 = Range.of(24, 48);

    private final Map<String, Space> spaces = new LinkedHashMap<>();

    private HeronSpaces() {}

    /** All spaces by their ids. */
    static Map<String, Space> all() {
        HeronSpaces made = new HeronSpaces();
        made.addForward();
        made.addDoubleBottom();
        made.addSides();
        made.addBunkers();
        made.addEngineRoomBottom();
        made.addPlatform();
        made.addAft();
        return made.spaces;
    }

    private void addForward() {
        spaces.put("fp", across(Range.of(79.2, 85), 0, DECK));
        spaces.put("v-chain", box(Range.of(76.2, 78), Range.of(-1.1, 1.1), Range.of(PLATFORM, 7.6)));
        spaces.put("v-thruster", across(Range.of(75.6, 79.2), 0, PLATFORM));
        spaces.put("dt1-c", across(Range.of(72, 75.6), TANK_TOP, PEAK_FLAT));
        spaces.put("hyd", box(Range.of(73.2, 74.4), Range.of(-0.9, 0.9), Range.of(HOPPER_TOP, 4.9)));
        spaces.put("v-echo", box(Range.of(72, 73.8), Range.of(-0.8, 0.8), Range.of(0, TANK_TOP)));
    }

    /** The tanks at the after ends of the holds leave room for a bilge well in their tops. */
    private void addDoubleBottom() {
        spaces.put("db1-c", across(Range.of(60, 72), 0, TANK_TOP));
        addPair("db2", bottomWithWell(48, 49.2).then(bottom(49.2, 60)));
        addPair("db3", bottom(36, 48));
        addPair("db4", bottom(21.6, 24).then(bottomWithWell(24, 25.2)).then(bottom(25.2, 36)));
        spaces.put("v-duct", box(Range.of(21, 60), Range.of(-DUCT, DUCT), Range.of(0, TANK_TOP)));
    }

    private static Space bottom(double aft, double forward) {
        return outboard(Range.of(aft, forward), new Point(DUCT, 0), new Point(DUCT, TANK_TOP));
    }

    private static Space bottomWithWell(double aft, double forward) {
        return outboard(
                Range.of(aft, forward),
                new Point(DUCT, 0),
                new Point(DUCT, TANK_TOP),
                new Point(4.2, TANK_TOP),
                new Point(4.2, 0.5),
                new Point(5.4, 0.5),
                new Point(5.4, TANK_TOP));
    }

    private void addSides() {
        Point foot = new Point(HOPPER_FOOT, TANK_TOP);
        Point knuckle = new Point(INNER_SIDE, HOPPER_KNUCKLE);
        Point flat = new Point(INNER_SIDE, HOPPER_TOP);
        Point deck = new Point(INNER_SIDE, DECK);
        addPair("wt1", outboard(Range.of(48, 60), foot, knuckle, deck));
        addPair("ht2", outboard(HOLD_2, foot, knuckle, flat));
        addPair("wt2", outboard(HOLD_2, flat, deck));
    }

    private void addBunkers() {
        double division = 4.6;
        addPair("hfo", box(BUNKERS, Range.of(DUCT, division), Range.of(TANK_TOP, DECK)));
        addPair("lsfo", outboard(BUNKERS, new Point(division, TANK_TOP), new Point(division, DECK)));
        Space cofferdam = outboard(Range.of(21, 21.6), new Point(DUCT, 0), new Point(DUCT, DECK));
        spaces.put("v-coff", cofferdam.and(cofferdam.mirrored()));
    }

    private void addEngineRoomBottom() {
        double sumpSide = 1.4;
        addPair("mgo", outboard(Range.of(12, 21), new Point(sumpSide, 0), new Point(sumpSide, TANK_TOP)));
        spaces.put("v-sump", box(Range.of(12, 17.4), Range.of(-sumpSide, sumpSide), Range.of(0, TANK_TOP)));
        spaces.put("lo-sump", box(Range.of(12.6, 16.8), Range.of(-0.9, 0.9), Range.of(0.3, 1)));
        Point keel = new Point(0, 0);
        Point lid = new Point(0, TANK_TOP);
        spaces.put("sludge", outboard(Range.of(9, 12), keel, lid));
        spaces.put("bilge", outboard(Range.of(7.8, 12), keel, lid).mirrored());
    }

    private void addPlatform() {
        Range bay = Range.of(18.6, 21);
        Range height = Range.of(PLATFORM, DECK);
        Range inner = Range.of(1.2, 3.2);
        Range outer = Range.of(3.2, 5.2);
        spaces.put("hfo-sett", box(bay, outer, height));
        spaces.put("hfo-serv", box(bay, inner, height));
        spaces.put("lsfo-serv", box(bay, inner, height).mirrored());
        spaces.put("mgo-day", box(bay, outer, height).mirrored());
        Point foot = new Point(PLATFORM, PLATFORM);
        Point low = new Point(PLATFORM, PEAK_FLAT);
        spaces.put(
                "lo-stor",
                outboard(Range.of(15.6, 18), foot, new Point(PLATFORM, 7)).mirrored());
        spaces.put("urea", outboard(Range.of(13.2, 15.6), foot, low).mirrored());
        spaces.put("grey", outboard(Range.of(15, 18), foot, low));
        spaces.put("black", outboard(Range.of(12, 15), foot, low));
    }

    private void addAft() {
        addPair("fw", outboard(Range.of(0, 6.6), new Point(3, PEAK_FLAT), new Point(3, DECK)));
        spaces.put("ap", across(Range.of(0, 6.6), 0, PEAK_FLAT));
    }

    private void addPair(String id, Space starboard) {
        spaces.put(id + "-s", starboard);
        spaces.put(id + "-p", starboard.mirrored());
    }
}
