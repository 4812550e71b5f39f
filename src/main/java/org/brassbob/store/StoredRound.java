// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.store;

import java.time.OffsetDateTime;
import org.jspecify.annotations.Nullable;

/**
 * A round as stored.
 *
 * @param id its number
 * @param draft as started, with the latest sight of the ship
 * @param finishedAt null while it is in progress
 * @param readings how many readings count (corrected ones do not)
 */
public record StoredRound(long id, RoundDraft draft, @Nullable OffsetDateTime finishedAt, int readings) {}
