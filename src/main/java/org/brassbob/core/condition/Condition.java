// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.condition;

/**
 * The ship's condition.
 *
 * @param displacement t
 * @param lcg m forward of the aft perpendicular
 * @param tcg m to starboard of the centreline
 * @param kg height of the centre of gravity, solid (m)
 * @param kmt height of the transverse metacentre (m)
 * @param gmSolid KM − KG (m)
 * @param fsAsSounded free-surface correction at the levels as they are (m)
 * @param gmAsSounded GM less that (m)
 * @param fsByCode free-surface correction by 2008 IS Code part B 3.1 (m)
 * @param gm the corrected GM that is judged: GM less that (m)
 * @param kgFluid KG plus the correction by the code (m)
 * @param draughtAft at the aft perpendicular (m)
 * @param draughtForward at the forward perpendicular (m)
 * @param draughtMean amidships between them (m)
 * @param trim draught aft minus draught forward (m)
 * @param listDeg ° to starboard; NaN where it can't be worked out
 * @param lollDeg angle of loll (°); 0 where the corrected GM is not negative, NaN where it can't be worked out
 */
public record Condition(
        double displacement,
        double lcg,
        double tcg,
        double kg,
        double kmt,
        double gmSolid,
        double fsAsSounded,
        double gmAsSounded,
        double fsByCode,
        double gm,
        double kgFluid,
        double draughtAft,
        double draughtForward,
        double draughtMean,
        double trim,
        double listDeg,
        double lollDeg) {}
