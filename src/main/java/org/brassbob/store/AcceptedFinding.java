// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.store;

import java.time.OffsetDateTime;

/**
 * A warning of the audit that an officer accepted with the ship's data.
 *
 * @param text the finding in a line
 * @param at with its offset
 * @param who accepted it
 */
public record AcceptedFinding(String text, OffsetDateTime at, String who) {}
