// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.vessel;

/**
 * A liquid carried aboard.
 *
 * @param id short id, as used in tanks.csv
 * @param name as shown
 * @param liquidClass what kind of liquid it is
 * @param density t/m3 at the reference temperature
 * @param referenceTempC temperature at which the density holds (°C)
 * @param expansion how the density changes with temperature
 */
public record Liquid(
        String id, String name, LiquidClass liquidClass, double density, double referenceTempC, Expansion expansion) {}
