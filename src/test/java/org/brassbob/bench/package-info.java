// SPDX-License-Identifier: GPL-3.0-or-later

/** JMH benchmarks; run by {@code mvn -Pbench test-compile exec:exec}, never a gate. */
@NullMarked
package org.brassbob.bench;

import org.jspecify.annotations.NullMarked;
