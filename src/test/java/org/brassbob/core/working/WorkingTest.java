// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.working;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.brassbob.core.condition.Assessment;
import org.brassbob.core.condition.Condition;
import org.brassbob.core.condition.TankFigures;
import org.brassbob.core.table.LimitCurve.Kind;
import org.brassbob.core.table.SoundingTable.Argument;
import org.brassbob.core.vessel.Pipe;
import org.brassbob.core.working.Step.Input;
import org.brassbob.fixture.Hydrostatics;
import org.brassbob.fixture.Liquids;
import org.brassbob.fixture.RoundBuilder;
import org.brassbob.fixture.Shapes;
import org.brassbob.fixture.ShipBuilder;
import org.brassbob.fixture.Tables;
import org.brassbob.fixture.TankBuilder;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Every figure opens to how it came about (product.md rule 9). */
class WorkingTest {
    /** What a round works out to, and its working. */
    record Worked(Assessment assessment, WorkingRecord working, Assessment without) {
        double of(String figure) {
            return step(figure).value();
        }

        Step step(String figure) {
            return working.of(figure).orElseThrow(() -> new AssertionError("no step for " + figure));
        }

        /** The n-th input of a step. */
        double in(String figure, int n) {
            return step(figure).inputs().get(n).value();
        }
    }

    private static ShipBuilder ship() {
        TankBuilder tabled = TankBuilder.tabled(
                        "tabled", Tables.volumesOf(Shapes.net(Shapes.ruledWing(20, 20, 5, 1)), 12))
                .pipe(22, 2.2, 1.2, 4)
                .soundings(Tables.soundingsOf(
                        Shapes.net(Shapes.ruledWing(20, 20, 5, 1)),
                        new Pipe(22, 2.2, 1.2, 4),
                        TankBuilder.LBP,
                        9,
                        new double[] {-1, 0, 2},
                        new double[] {-3, 3}));
        return ShipBuilder.ship()
                .hydrostatics(Hydrostatics.boxes(100, 16, 1, 9, 33))
                .lightship(3000, 47, 0.05, 5.5)
                .weight("crane", 40, 60, 1, 12)
                .weight("cargo", 400, 55, 0, 6)
                .tanks(
                        tabled,
                        TankBuilder.box("fo", 5, 25, -7, -2, 0, 6)
                                .liquid(Liquids.fuelOil(0.96))
                                .consumable()
                                .residue(2),
                        TankBuilder.box("oily", 26, 30, -2, 2, 0, 2).liquid(Liquids.ofDensity(0.9)),
                        TankBuilder.box("heavy", 26, 30, 3, 5, 0, 2).liquid(Liquids.ofDensity(1.3)),
                        TankBuilder.box("mass", 31, 34, -2, 2, 0, 2),
                        TankBuilder.box("percent", 35, 38, -2, 2, 0, 2),
                        TankBuilder.box("volume", 39, 42, -2, 2, 0, 2),
                        TankBuilder.box("empty", 43, 46, -2, 2, 0, 2),
                        TankBuilder.box("full", 47, 50, -2, 2, 0, 2),
                        TankBuilder.box("dry", 50, 60, -2, 2, 0, 2).pipe(59, 0, 0, 2),
                        TankBuilder.box("unread", 70, 80, -4, 4, 0, 2),
                        TankBuilder.box("void", 90, 91, -2, 2, 0, 2).asVoid(),
                        TankBuilder.tabled("ullaged", Tables.constant(90, 85, 3, 2, 30))
                                .soundings(Tables.soundings(
                                        Argument.ULLAGE, new double[] {0, 1, 3}, new double[] {90, 50, 0})))
                .curve("gm", Kind.GM_REQUIRED, 0.3, 1000, 9000)
                .curve("kg", Kind.KG_LIMIT, 7, 1000, 9000);
    }

    private static RoundBuilder readings(RoundBuilder round) {
        return round.sounding("tabled", 2.1)
                .temperature(45)
                .density(0.97)
                .sounding("fo", 3)
                .water(0.2)
                .sounding("oily", 1)
                .water(0.2)
                .sounding("heavy", 1)
                .mass("mass", 20)
                .percent("percent", 40)
                .volume("volume", 10)
                .empty("empty")
                .full("full")
                .sounding("dry", 0)
                .ullage("ullaged", 0.4)
                .seaDensity(1.01);
    }

    private static Worked worked(ShipBuilder ship, RoundBuilder round) {
        WorkingRecord record = new WorkingRecord();
        var assessor = ship.assessor();
        Assessment assessment = assessor.assess(round.build(), null, record);
        return new Worked(assessment, record, assessor.assess(round.build()));
    }

    static Stream<Worked> rounds() {
        return Stream.of(
                worked(ship(), readings(RoundBuilder.round())),
                worked(
                        ship(),
                        readings(RoundBuilder.round().trim(0.7).list(-0.4)).curve("kg")),
                worked(
                        ship().massInAir(),
                        readings(RoundBuilder.round().trim(-5).list(8))),
                worked(ship().withoutCurve(), RoundBuilder.round()),
                worked(ship().lightship(3000, 47, 0.05, 9.5), readings(RoundBuilder.upright())));
    }

    @ParameterizedTest
    @MethodSource("rounds")
    void everyInputThatNamesAFigureIsThatFigure(Worked worked) {
        int named = 0;
        for (Step step : worked.working().steps()) {
            for (Input input : step.inputs()) {
                if (input.source().isEmpty()) {
                    named++;
                    assertEquals(
                            worked.of(input.name()), input.value(), 0, () -> step.figure() + " from " + input.name());
                }
            }
        }
        assertTrue(named > 100, "the steps hang together");
    }

    @ParameterizedTest
    @MethodSource("rounds")
    void recordingChangesNothing(Worked worked) {
        assertEquals(worked.without().condition(), worked.assessment().condition());
        assertEquals(worked.without().margin(), worked.assessment().margin());
        assertEquals(worked.without().tanks(), worked.assessment().tanks());
        assertEquals(worked.without().notices(), worked.assessment().notices());
    }

    @ParameterizedTest
    @MethodSource("rounds")
    void everyFigureOfATankHasItsStep(Worked worked) {
        for (TankFigures tank : worked.assessment().tanks()) {
            String id = tank.tank().id() + "/";
            assertEquals(tank.volume(), worked.of(id + "volume_m3"), 0);
            assertEquals(tank.fillPct(), worked.of(id + "fill_pct"), 0);
            assertEquals(tank.density(), worked.of(id + "density_t_m3"), 0);
            assertEquals(tank.mass(), worked.of(id + "mass_t"), 0);
            assertEquals(tank.lcg(), worked.of(id + "lcg_m"), 0);
            assertEquals(tank.tcg(), worked.of(id + "tcg_m"), 0);
            assertEquals(tank.vcg(), worked.of(id + "vcg_m"), 0);
            assertEquals(tank.fsmAsSounded(), worked.of(id + "fsm_as_sounded_tm"), 0);
            assertEquals(tank.fsmByCode(), worked.of(id + "fsm_by_code_tm"), 0);
            assertEquals(tank.gmLoss(), worked.of(id + "gm_loss_m"), 0);
            assertEquals(tank.sharePct(), worked.of(id + "share_pct"), 0);
            Optional<Step> age = worked.working().of(id + "age_h");
            assertEquals(tank.reading() == null, age.isEmpty());
            age.ifPresent(step -> assertEquals(tank.ageHours(), step.value(), 0));
        }
    }

    @ParameterizedTest
    @MethodSource("rounds")
    void everyFigureOfTheShipHasItsStep(Worked worked) {
        Condition c = worked.assessment().condition();
        assertEquals(c.displacement(), worked.of("ship/displacement_t"), 0);
        assertEquals(c.lcg(), worked.of("ship/lcg_m"), 0);
        assertEquals(c.tcg(), worked.of("ship/tcg_m"), 0);
        assertEquals(c.kg(), worked.of("ship/kg_m"), 0);
        assertEquals(c.kmt(), worked.of("ship/kmt_m"), 0);
        assertEquals(c.gmSolid(), worked.of("ship/gm_solid_m"), 0);
        assertEquals(c.fsAsSounded(), worked.of("ship/fs_as_sounded_m"), 0);
        assertEquals(c.gmAsSounded(), worked.of("ship/gm_as_sounded_m"), 0);
        assertEquals(c.fsByCode(), worked.of("ship/fs_by_code_m"), 0);
        assertEquals(c.gm(), worked.of("ship/gm_m"), 0);
        assertEquals(c.kgFluid(), worked.of("ship/kg_fluid_m"), 0);
        assertEquals(c.draughtAft(), worked.of("ship/draught_aft_m"), 0);
        assertEquals(c.draughtForward(), worked.of("ship/draught_forward_m"), 0);
        assertEquals(c.draughtMean(), worked.of("ship/draught_mean_m"), 0);
        assertEquals(c.trim(), worked.of("ship/trim_m"), 0);
        assertEquals(c.listDeg(), worked.of("ship/list_deg"), 0);
        assertEquals(c.lollDeg(), worked.of("ship/loll_deg"), 0);
        assertEquals(worked.assessment().margin().band(), worked.of("ship/band_m"), 0);
        assertEquals(worked.assessment().margin().gmRequired(), worked.of("ship/gm_required_m"), 0);
        assertEquals(worked.assessment().margin().margin(), worked.of("ship/margin_m"), 0);
    }

    @ParameterizedTest
    @MethodSource("rounds")
    void sumsAndQuotientsCanBeDoneAgainFromTheirInputs(Worked worked) {
        double mass = worked.step("ship/displacement_t").inputs().stream()
                .mapToDouble(Input::value)
                .sum();
        assertEquals(worked.of("ship/displacement_t"), mass, 1e-8);
        for (String moment : List.of("ship/moment_x_tm", "ship/moment_y_tm", "ship/moment_z_tm")) {
            List<Input> inputs = worked.step(moment).inputs();
            double sum = 0;
            for (int i = 0; i < inputs.size(); i += 2) {
                sum += inputs.get(i).value() * inputs.get(i + 1).value();
            }
            assertEquals(worked.of(moment), sum, 1e-6);
        }
        for (String quotient : List.of("ship/lcg_m", "ship/tcg_m", "ship/kg_m", "ship/fs_by_code_m", "fo/gm_loss_m")) {
            assertEquals(worked.of(quotient), worked.in(quotient, 0) / worked.in(quotient, 1), 1e-12);
        }
        double byCode = worked.step("ship/fsm_by_code_tm").inputs().stream()
                .mapToDouble(Input::value)
                .sum();
        assertEquals(worked.of("ship/fsm_by_code_tm"), byCode, 1e-8);
    }

    @ParameterizedTest
    @MethodSource("rounds")
    void draughtsAndTrimCanBeDoneAgainFromTheirInputs(Worked worked) {
        String trim = "ship/trim_m";
        double again = worked.in(trim, 0) * (worked.in(trim, 1) - worked.in(trim, 2)) / (100 * worked.in(trim, 3));
        assertEquals(worked.of(trim), again, 1e-12);
        String aft = "ship/draught_aft_m";
        assertEquals(
                worked.of(aft), worked.in(aft, 0) + worked.in(aft, 1) * worked.in(aft, 2) / worked.in(aft, 3), 1e-12);
        String gm = "ship/gm_m";
        assertEquals(worked.of(gm), worked.in(gm, 0) - worked.in(gm, 1), 1e-12);
        String km = "ship/kmt_m";
        double f = (worked.in(km, 0) - worked.in(km, 1)) / (worked.in(km, 3) - worked.in(km, 1));
        assertEquals(worked.of(km), worked.in(km, 2) + f * (worked.in(km, 4) - worked.in(km, 2)), 1e-12);
    }

    @Test
    void surfacesAndMassesCanBeDoneAgainFromTheirInputs() {
        Worked worked = worked(ship(), readings(RoundBuilder.round()));
        for (String id : List.of("tabled", "fo", "unread")) {
            for (String figure : List.of("/fsm_as_sounded_tm", "/fsm_by_code_tm", "/mass_t")) {
                assertEquals(worked.of(id + figure), worked.in(id + figure, 0) * worked.in(id + figure, 1), 1e-9);
            }
        }
        // Two surfaces: ρ·i + i of the interface·(ρ of the water − ρ).
        String oily = "oily/fsm_by_code_tm";
        assertEquals(5, worked.step(oily).inputs().size());
        double two = worked.in(oily, 0) * worked.in(oily, 1)
                + worked.in(oily, 2) * (worked.in(oily, 3) - worked.in(oily, 4));
        assertEquals(worked.of(oily), two, 1e-9);
        assertEquals(2, worked.step("heavy/fsm_by_code_tm").inputs().size());
        assertEquals(0, worked.step("full/fsm_by_code_tm").inputs().size());
        String vcg = "oily/vcg_m";
        double liquid = worked.in(vcg, 0) * worked.in(vcg, 1);
        double water = worked.in(vcg, 3) * (worked.in(vcg, 4) - worked.in(vcg, 1));
        assertEquals(worked.of(vcg), (liquid * worked.in(vcg, 2) + water * worked.in(vcg, 5)) / (liquid + water), 1e-9);
    }

    @Test
    void readingsAndRowsAreNamedWithTheirFilesAndLines() {
        Worked worked = worked(ship(), readings(RoundBuilder.round().trim(0.7).list(-0.4)));
        List<Input> inputs = worked.step("tabled/volume_m3").inputs();
        assertEquals("sounding", inputs.get(0).name());
        assertEquals("round.csv:2", inputs.get(0).source());
        // Two readings, two trims, two heels: eight cells of the table, and the volume lies among them.
        List<Input> cells =
                inputs.stream().filter(i -> i.name().equals("volume_m3")).toList();
        assertEquals(8, cells.size());
        assertTrue(cells.stream().allMatch(i -> i.source().startsWith("tank.sounding.csv:")));
        double least = cells.stream().mapToDouble(Input::value).min().orElseThrow();
        double most = cells.stream().mapToDouble(Input::value).max().orElseThrow();
        assertTrue(least < worked.of("tabled/volume_m3") && worked.of("tabled/volume_m3") < most);
        assertEquals(
                List.of("round.csv:3", "round.csv:3"),
                worked.step("fo/density_t_m3").inputs().stream()
                        .map(Input::source)
                        .toList());
        assertTrue(worked.step("ship/gm_required_m").inputs().stream()
                .anyMatch(i -> i.source().equals("gm.csv:2")));
        assertTrue(worked.step("dry/volume_m3").rule().contains("the less favourable end"));
        assertTrue(worked.step("void/volume_m3").rule().contains("dry"));
        assertTrue(worked.step("unread/volume_m3").rule().contains("lowest corrected GM"));
    }

    @Test
    void theLastStepOfAFigureStaysInTheFirstOnesPlace() {
        WorkingRecord record = new WorkingRecord();
        record.step(Step.of("a", "x_m", "first", 1));
        record.step(Step.of("b", "x_m", "other", 2));
        record.step(Step.of("a", "x_m", "second", 3));
        assertEquals(
                List.of("a/x_m", "b/x_m"),
                record.steps().stream().map(Step::figure).toList());
        assertEquals(3, record.of("a/x_m").orElseThrow().value(), 0);
        assertTrue(record.of("c/x_m").isEmpty());
        assertTrue(record.recording());
        assertFalse(Working.OFF.recording());
        Working.OFF.step(Step.of("a", "x_m", "nobody asked", 1));
        assertTrue(Step.of("a", "x_m", "r", 1, Input.from("y", 2, "z")).inputs().contains(Input.from("y", 2, "z")));
    }
}
