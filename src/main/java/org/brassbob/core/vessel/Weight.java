// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.vessel;

import org.jspecify.annotations.Nullable;

/**
 * A weight aboard that is neither light ship nor tank contents: cargo, stores, the constant.
 *
 * @param name as in weights.csv
 * @param at mass (t) and centre (m)
 * @param massUncertaintyPct standard uncertainty of the mass, per cent of it, where given
 * @param vcgUncertainty standard uncertainty of the height of its centre (m), where given
 */
public record Weight(String name, MassPoint at, @Nullable Double massUncertaintyPct, @Nullable Double vcgUncertainty) {}
