// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.store;

import java.time.Instant;
import org.brassbob.core.round.ReadingKind;

/**
 * A tank's readings over a stretch of time, of one kind.
 *
 * @param first time of the first reading of the stretch
 * @param kind what they state
 * @param least value, in the unit of the kind
 * @param mean value
 * @param greatest value
 * @param count how many readings
 */
public record TrendPoint(Instant first, ReadingKind kind, double least, double mean, double greatest, int count) {}
