// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.store;

import java.time.OffsetDateTime;
import org.brassbob.core.vessel.Weight;
import org.jspecify.annotations.Nullable;

/**
 * A weight as it stood from a time on.
 *
 * @param name of the weight
 * @param weight null: it went ashore
 * @param at with its offset
 * @param who entered it
 */
public record WeightEntry(String name, @Nullable Weight weight, OffsetDateTime at, String who) {}
