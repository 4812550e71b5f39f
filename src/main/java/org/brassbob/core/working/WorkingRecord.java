// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.working;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Keeps the last step of every figure, in the order in which the figures were first worked out. */
public final class WorkingRecord implements Working {
    private final Map<String, Step> steps = new LinkedHashMap<>();

    @Override
    public boolean recording() {
        return true;
    }

    @Override
    public void step(Step step) {
        steps.put(step.figure(), step);
    }

    public List<Step> steps() {
        return List.copyOf(steps.values());
    }

    /** How a figure came about, named as in {@link Step#figure}. */
    public Optional<Step> of(String figure) {
        return Optional.ofNullable(steps.get(figure));
    }
}
