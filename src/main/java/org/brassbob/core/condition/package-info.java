// SPDX-License-Identifier: GPL-3.0-or-later

/**
 * From the tanks to the margin: displacement, KG, hydrostatics, draughts, trim, list, solid and corrected GM, the limit, and what each
 * free surface takes. {@link org.brassbob.core.condition.Assessor} is the way in.
 */
@NullMarked
package org.brassbob.core.condition;

import org.jspecify.annotations.NullMarked;
