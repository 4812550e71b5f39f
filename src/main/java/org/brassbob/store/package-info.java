// SPDX-License-Identifier: GPL-3.0-or-later

/**
 * Keeps rounds, readings, weights, settings and the ship's data in one SQLite file. What a call has returned from is on the disk: each
 * user action is one transaction, written through (write-ahead log, synchronous FULL) before the call returns. Readings and weights are
 * only ever added; a correction names the reading that it corrects, and the first one stays.
 *
 * <p>{@link org.brassbob.store.Store} is the way in. Any call may throw {@link org.brassbob.store.StoreException}, whose message is one
 * line for the officer; after it nothing of that action is stored, and the store can be used further.
 */
@NullMarked
package org.brassbob.store;

import org.jspecify.annotations.NullMarked;
