// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.vessel;

/**
 * A set of draught marks.
 *
 * @param name such as {@code aft} or {@code forward}
 * @param x m forward of the aft perpendicular
 */
public record DraughtMark(String name, double x) {}
