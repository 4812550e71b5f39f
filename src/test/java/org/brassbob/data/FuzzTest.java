// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.data;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTimeout;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.time.Duration;
import java.util.List;
import java.util.Random;
import org.brassbob.core.condition.Assessment;
import org.brassbob.core.condition.Assessor;
import org.brassbob.core.condition.Condition;
import org.brassbob.core.condition.Margin;
import org.brassbob.core.condition.TankFigures;
import org.brassbob.core.notice.NoticeCode;
import org.brassbob.core.round.SoundingRound;
import org.brassbob.core.vessel.Vessel;
import org.junit.jupiter.api.Test;

/**
 * Spoiled vessel folders and rounds, seeded. Each must end in faults with file and line, or in an assessment whose figures are numbers
 * and hang together.
 */
class FuzzTest {
    private static final int FOLDERS = 12_000;
    private static final int ROUNDS = 12_000;

    /** Even a bad file must not keep the officer waiting. */
    private static final Duration PATIENCE = Duration.ofSeconds(2);

    private int assessed;
    private int refused;

    @Test
    void spoiledFolders() {
        MemoryFolder good = SmallShip.folder();
        List<String> paths = good.paths();
        byte[] round = SmallShip.ROUND.getBytes(StandardCharsets.UTF_8);
        Random random = new Random(20260501);
        for (int i = 0; i < FOLDERS; i++) {
            String path = paths.get(random.nextInt(paths.size()));
            byte[] spoiled =
                    new Mutations(random.nextLong()).spoil(good.bytes(path).orElseThrow());
            String where = "folder " + i + ", " + path;
            assertTimeout(PATIENCE, () -> tryFolder(good.with(path, spoiled), round, where), where);
        }
        assertBothHappened();
    }

    @Test
    void spoiledRounds() {
        Vessel barge = VesselFolder.read(SmallShip.folder()).orElseThrow();
        Assessor assessor = Assessor.of(barge);
        byte[] round = SmallShip.ROUND.getBytes(StandardCharsets.UTF_8);
        Random random = new Random(20260502);
        for (int i = 0; i < ROUNDS; i++) {
            byte[] spoiled = new Mutations(random.nextLong()).spoil(round);
            String where = "round " + i + "\n" + new String(spoiled, StandardCharsets.UTF_8);
            assertTimeout(PATIENCE, () -> tryRound(barge, assessor, spoiled, where), where);
        }
        assertBothHappened();
    }

    private void assertBothHappened() {
        assertTrue(assessed > 500, "only " + assessed + " were assessed");
        assertTrue(refused > 500, "only " + refused + " were refused");
    }

    private void tryFolder(MemoryFolder folder, byte[] round, String where) {
        Loaded<Vessel> loaded = VesselFolder.read(folder);
        Vessel vessel = loaded.value();
        if (vessel == null) {
            refuse(loaded.problems(), where);
        } else {
            tryRound(vessel, Assessor.of(vessel), round, where);
        }
    }

    private void tryRound(Vessel vessel, Assessor assessor, byte[] round, String where) {
        Loaded<SoundingRound> loaded = RoundFile.read("r.csv", round, vessel);
        SoundingRound read = loaded.value();
        if (read == null) {
            refuse(loaded.problems(), where);
        } else {
            check(assessor.assess(read), where);
            assessed++;
        }
    }

    private void refuse(List<Problem> problems, String where) {
        assertTrue(!problems.isEmpty(), where);
        for (Problem problem : problems) {
            assertTrue(problem.line() >= 1 && problem.toString().lines().count() == 1, () -> where + ": " + problem);
        }
        refused++;
    }

    private static void check(Assessment a, String where) {
        Condition c = a.condition();
        double fsm = 0;
        for (TankFigures t : a.tanks()) {
            fsm += t.fsmByCode();
            assertTrue(
                    Double.isFinite(t.volume() + t.mass() + t.lcg() + t.tcg() + t.vcg() + t.gmLoss()),
                    () -> where + ": " + t);
            assertTrue(t.volume() >= 0 && t.volume() <= t.tank().capacity() * (1 + 1e-12), () -> where + ": " + t);
            assertTrue(t.fsmByCode() >= t.fsmAsSounded(), () -> where + ": " + t);
        }
        assertTrue(
                Double.isFinite(c.displacement() + c.gm() + c.kg() + c.trim() + c.draughtAft() + c.draughtForward()),
                () -> where + ": " + c);
        assertEquals(fsm / c.displacement(), c.fsByCode(), 1e-9, where);
        boolean lollIsTold = a.notices().stream().anyMatch(n -> n.code() == NoticeCode.LOLL_UNKNOWN);
        assertTrue(Double.isFinite(c.listDeg()) || lollIsTold, () -> where + ": " + c);
        boolean judged = Double.isFinite(a.margin().margin());
        boolean noCurve = a.notices().stream().anyMatch(n -> n.code() == NoticeCode.NO_LIMIT_CURVE);
        assertTrue(judged || noCurve, () -> where + ": " + a.margin());
        assertTrue(
                a.margin().state() != Margin.State.CLEAR
                        || a.margin().margin() >= a.margin().band(),
                () -> where + ": " + a.margin());
    }
}
