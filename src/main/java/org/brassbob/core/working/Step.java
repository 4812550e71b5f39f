// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.working;

import java.util.List;

/**
 * One figure and how it came about.
 *
 * @param figure what was worked out, as {@code about/key}, such as {@code db2-p/volume_m3} or {@code ship/gm_m}
 * @param rule the rule in words or as a formula
 * @param value the result, in the unit that the key names
 * @param inputs what went in
 */
public record Step(String figure, String rule, double value, List<Input> inputs) {
    public Step {
        inputs = List.copyOf(inputs);
    }

    /**
     * A step with its inputs.
     *
     * @param about the tank's id, or {@code ship}
     * @param key the figure's key, with its unit
     */
    public static Step of(String about, String key, String rule, double value, Input... inputs) {
        return new Step(about + "/" + key, rule, value, List.of(inputs));
    }

    /**
     * Something that went into a step.
     *
     * @param name its key with its unit; where it is itself a figure of the working, that figure's name
     * @param value its value
     * @param source where it was taken from: a file and line, a reading, a published source; empty for a figure of the working
     */
    public record Input(String name, double value, String source) {
        /** A figure that has a step of its own. */
        public static Input figure(String about, String key, double value) {
            return new Input(about + "/" + key, value, "");
        }

        /** A value taken from somewhere. */
        public static Input from(String name, double value, String source) {
            return new Input(name, value, source);
        }
    }
}
