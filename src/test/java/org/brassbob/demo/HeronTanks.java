// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.demo;

import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;
import org.brassbob.core.geometry.SpaceShape;
import org.brassbob.core.geometry.SpaceShape.Loop;
import org.brassbob.core.geometry.SpaceShape.Point;
import org.brassbob.core.geometry.SpaceShape.Station;
import org.brassbob.core.table.Origin;

/** The spaces of Saltmarsh Heron: where each lies, what it holds, how it is sounded. */
final class HeronTanks {
    /** The side of the ship that a space lies on. */
    enum Side {
        STARBOARD,
        PORT,
        BOTH
    }

    /** How its section is made. */
    enum Form {
        TO_SHELL,
        HOPPER,
        BOX
    }

    /** A space: extent (m), and the columns of tanks.csv that are not worked out. */
    record Spec(
            String id,
            String name,
            String liquid,
            String mayHold,
            Form form,
            Side side,
            double aft,
            double forward,
            double inner,
            double outer,
            double floor,
            double crown,
            String gauge,
            double pipeTop,
            double fillLimitPct,
            double residue,
            String use,
            double steelPct,
            double rate,
            String space,
            String encloses) {
        boolean isPaired() {
            return id.endsWith("-p") || id.endsWith("-s");
        }

        String pair() {
            if (!isPaired()) {
                return "";
            }
            return id.substring(0, id.length() - 1) + (side == Side.PORT ? "s" : "p");
        }
    }

    private static final double TO_SHELL = 99;
    private static final double DECK = 8.2;
    private static final double PLATFORM = 7.2;
    private static final double FLOOR_PLATES = 2.6;

    private final List<Spec> specs = new ArrayList<>();

    private HeronTanks() {}

    static List<Spec> all() {
        HeronTanks tanks = new HeronTanks();
        tanks.forward();
        tanks.bottoms();
        tanks.wings();
        tanks.fuel();
        tanks.engineRoom();
        tanks.aft();
        return List.copyOf(tanks.specs);
    }

    private void forward() {
        ballast("fp", "FORE PEAK", Form.TO_SHELL, Side.BOTH, 77.5, 83, 0, TO_SHELL, 0, 6.4, 1.2);
        dry("chain", "CHAIN LOCKER", Form.BOX, 78, 80, 0, 1.2, 6.5, 8.0, DECK, 0.4);
        dry("bowthr", "BOW THRUSTER ROOM", Form.TO_SHELL, 74, 77.5, 0, 2.2, 0, 5.0, DECK, 0.6);
        ballast("dtc", "DEEP TK C", Form.TO_SHELL, Side.BOTH, 70, 74, 0, 4.6, 1.2, 6.2, 1.5, "hyd");
        tank(
                "hyd",
                "HYD OIL",
                "hyd",
                "",
                Form.BOX,
                Side.BOTH,
                71,
                73,
                0,
                1,
                1.6,
                3.8,
                "ullage",
                DECK,
                95,
                0.05,
                "consumable",
                1,
                5);
        dry("echo", "ECHO SOUNDER SPACE", Form.TO_SHELL, 73, 74, 0, 0.6, 0, 1.1, DECK, 0.1);
    }

    private void bottoms() {
        ballast("db1-c", "DB 1 C", Form.TO_SHELL, Side.BOTH, 60, 73, 0, 2.4, 0, 1.2, 1);
        pair("db1", "DB 1", Form.TO_SHELL, 60, 72, 2.4, TO_SHELL, 0, 1.2, 0.8);
        pair("db2", "DB 2", Form.TO_SHELL, 46, 60, 0.8, TO_SHELL, 0, 1.2, 2.0);
        pair("db3", "DB 3", Form.TO_SHELL, 32, 46, 0.8, TO_SHELL, 0, 1.2, 2.0);
        pair("db4", "DB 4", Form.TO_SHELL, 18, 32, 0.8, TO_SHELL, 0, 1.2, 2.0);
        dry("duct", "PIPE DUCT", Form.TO_SHELL, 18, 60, 0, 0.8, 0, 1.2, 2.4, 1.6);
    }

    private void wings() {
        pair("w1", "WING 1", Form.TO_SHELL, 60, 70, 5.2, TO_SHELL, 1.2, 7.4, 0.5);
        pair("w2", "WING 2", Form.TO_SHELL, 46, 60, 6.2, TO_SHELL, 3.2, 7.4, 0.9);
        pair("hop2", "HOPPER 2", Form.HOPPER, 46, 60, 5.4, TO_SHELL, 1.2, 3.2, 0.9);
        pair("w3", "WING 3", Form.TO_SHELL, 32, 46, 6.2, TO_SHELL, 1.2, 7.4, 0.6);
    }

    private void fuel() {
        for (Side side : List.of(Side.PORT, Side.STARBOARD)) {
            String suffix = side == Side.PORT ? "p" : "s";
            String painted = side == Side.PORT ? " P" : " S";
            tank(
                    "fo1-" + suffix,
                    "FO 1" + painted,
                    "vlsfo",
                    "",
                    Form.TO_SHELL,
                    side,
                    18,
                    21.5,
                    0,
                    6.1,
                    1.2,
                    7,
                    "sounding",
                    DECK,
                    90,
                    0.8,
                    "consumable",
                    1.5,
                    60);
            tank(
                    "go1-" + suffix,
                    "GO 1" + painted,
                    "mgo",
                    "",
                    Form.TO_SHELL,
                    side,
                    8,
                    14.5,
                    4.6,
                    TO_SHELL,
                    3.6,
                    6.6,
                    "sounding",
                    DECK,
                    95,
                    0.4,
                    "consumable",
                    1,
                    40);
        }
        tank(
                "fo-set",
                "FO SETTLING",
                "vlsfo",
                "",
                Form.BOX,
                Side.STARBOARD,
                14.6,
                17.2,
                4.0,
                6.4,
                3.8,
                6.8,
                "ullage",
                PLATFORM,
                90,
                0.3,
                "consumable",
                1,
                20);
        tank(
                "fo-srv",
                "FO SERVICE",
                "vlsfo",
                "",
                Form.BOX,
                Side.STARBOARD,
                14.6,
                17.2,
                1.6,
                3.9,
                4.2,
                6.8,
                "ullage",
                PLATFORM,
                90,
                0.3,
                "consumable",
                1,
                20);
        tank(
                "go-day",
                "GO DAY",
                "mgo",
                "",
                Form.BOX,
                Side.PORT,
                14.6,
                17.2,
                4.0,
                6.2,
                4.0,
                6.8,
                "remote",
                PLATFORM,
                95,
                0.2,
                "consumable",
                1,
                20);
        dry("coff", "COFFERDAM", Form.TO_SHELL, 17.3, 18, 0, 6.0, 1.2, 7, DECK, 0.6);
    }

    private void engineRoom() {
        tank(
                "lo-stor",
                "LO STORAGE",
                "lube",
                "",
                Form.BOX,
                Side.PORT,
                11,
                13,
                1.8,
                3.2,
                4.6,
                6.4,
                "ullage",
                PLATFORM,
                95,
                0.1,
                "consumable",
                1,
                5);
        tank(
                "lo-sump",
                "LO CIRC",
                "lube",
                "",
                Form.BOX,
                Side.BOTH,
                9.5,
                13,
                0,
                0.9,
                0.7,
                1.5,
                "sounding",
                FLOOR_PLATES,
                90,
                0.3,
                "consumable",
                2,
                5);
        tank(
                "bilge",
                "BILGE WATER",
                "oily",
                "",
                Form.TO_SHELL,
                Side.PORT,
                13.5,
                17.2,
                1.2,
                4.6,
                0,
                1.2,
                "sounding",
                FLOOR_PLATES,
                95,
                0.4,
                "consumable",
                2,
                10);
        tank(
                "sludge",
                "SLUDGE",
                "sludge",
                "",
                Form.TO_SHELL,
                Side.STARBOARD,
                13.5,
                17.2,
                1.2,
                3.6,
                0,
                1.2,
                "sounding",
                FLOOR_PLATES,
                90,
                0.3,
                "consumable",
                2,
                5);
        tank(
                "urea",
                "UREA",
                "urea",
                "",
                Form.BOX,
                Side.STARBOARD,
                9,
                11.5,
                1.6,
                3.2,
                4.4,
                6.6,
                "remote",
                PLATFORM,
                95,
                0.1,
                "consumable",
                1,
                5);
    }

    private void aft() {
        ballast("ap", "AFT PEAK", Form.TO_SHELL, Side.BOTH, 0, 6, 0, TO_SHELL, 0, 5.2, 1);
        dry("rudder", "RUDDER TRUNK", Form.BOX, -0.6, 0.6, 0, 0.7, 5.4, 7.8, DECK, 0.2);
        for (Side side : List.of(Side.PORT, Side.STARBOARD)) {
            String suffix = side == Side.PORT ? "p" : "s";
            String painted = side == Side.PORT ? " P" : " S";
            tank(
                    "fw-" + suffix,
                    "FW" + painted,
                    "fw",
                    "",
                    Form.TO_SHELL,
                    side,
                    1,
                    5.8,
                    1.2,
                    TO_SHELL,
                    5.3,
                    7.8,
                    "sounding",
                    DECK,
                    99,
                    0.5,
                    "consumable",
                    1,
                    20);
        }
        tank(
                "grey",
                "GREY WATER",
                "grey",
                "",
                Form.BOX,
                Side.PORT,
                6.4,
                8.4,
                1.2,
                3.2,
                4.8,
                6.6,
                "remote",
                PLATFORM,
                90,
                0.1,
                "consumable",
                1,
                10);
        tank(
                "black",
                "BLACK WATER",
                "black",
                "",
                Form.BOX,
                Side.STARBOARD,
                6.4,
                8.4,
                1.2,
                2.9,
                4.8,
                6.6,
                "remote",
                PLATFORM,
                90,
                0.1,
                "consumable",
                1,
                10);
    }

    private void ballast(
            String id,
            String name,
            Form form,
            Side side,
            double aft,
            double forward,
            double inner,
            double outer,
            double floor,
            double crown,
            double residue) {
        ballast(id, name, form, side, aft, forward, inner, outer, floor, crown, residue, "");
    }

    private void ballast(
            String id,
            String name,
            Form form,
            Side side,
            double aft,
            double forward,
            double inner,
            double outer,
            double floor,
            double crown,
            double residue,
            String encloses) {
        specs.add(new Spec(
                id,
                name,
                "sw",
                "",
                form,
                side,
                aft,
                forward,
                inner,
                outer,
                floor,
                crown,
                "sounding",
                DECK,
                100,
                residue,
                "fixed",
                2,
                150,
                "tank",
                encloses));
    }

    private void pair(
            String id,
            String name,
            Form form,
            double aft,
            double forward,
            double inner,
            double outer,
            double floor,
            double crown,
            double residue) {
        ballast(id + "-p", name + " P", form, Side.PORT, aft, forward, inner, outer, floor, crown, residue);
        ballast(id + "-s", name + " S", form, Side.STARBOARD, aft, forward, inner, outer, floor, crown, residue);
    }

    private void dry(
            String id,
            String name,
            Form form,
            double aft,
            double forward,
            double inner,
            double outer,
            double floor,
            double crown,
            double pipeTop,
            double residue) {
        specs.add(new Spec(
                id,
                name,
                "dry",
                "",
                form,
                Side.BOTH,
                aft,
                forward,
                inner,
                outer,
                floor,
                crown,
                "sounding",
                pipeTop,
                100,
                residue,
                "fixed",
                1,
                0,
                "void",
                ""));
    }

    private void tank(
            String id,
            String name,
            String liquid,
            String mayHold,
            Form form,
            Side side,
            double aft,
            double forward,
            double inner,
            double outer,
            double floor,
            double crown,
            String gauge,
            double pipeTop,
            double fillLimit,
            double residue,
            String use,
            double steel,
            double rate) {
        specs.add(new Spec(
                id, name, liquid, mayHold, form, side, aft, forward, inner, outer, floor, crown, gauge, pipeTop,
                fillLimit, residue, use, steel, rate, "tank", ""));
    }

    /** The shape of a space: stations at its ends and at every hull station between them. */
    static SpaceShape shape(Spec spec) {
        TreeSet<Double> xs = new TreeSet<>(List.of(spec.aft(), spec.forward()));
        if (spec.form() != Form.BOX) {
            for (double x : HeronLines.stations()) {
                if (x > spec.aft() && x < spec.forward()) {
                    xs.add(x);
                }
            }
        }
        List<Station> stations = new ArrayList<>();
        for (double x : xs) {
            stations.add(new Station(x, List.of(new Loop(1, section(spec, x)))));
        }
        return new SpaceShape(stations, Origin.computed(spec.id()));
    }

    private static List<Point> section(Spec spec, double x) {
        List<Point> half =
                switch (spec.form()) {
                    case TO_SHELL -> new HullCut(x).between(spec.inner(), spec.outer(), spec.floor(), spec.crown());
                    case HOPPER -> new HullCut(x).hopper(spec.inner(), spec.floor(), spec.crown());
                    case BOX ->
                        List.of(
                                new Point(spec.inner(), spec.floor()),
                                new Point(spec.outer(), spec.floor()),
                                new Point(spec.outer(), spec.crown()),
                                new Point(spec.inner(), spec.crown()));
                };
        List<Point> whole = spec.side() == Side.BOTH ? HullCut.bothSides(half) : half;
        double sign = spec.side() == Side.PORT ? -1 : 1;
        return whole.stream()
                .map(p -> new Point(Math.rint(sign * p.y() * 1e4) / 1e4 + 0.0, Math.rint(p.z() * 1e4) / 1e4))
                .toList();
    }
}
