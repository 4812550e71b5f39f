// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.cli;

import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Model.OptionSpec;
import picocli.CommandLine.Model.PositionalParamSpec;
import picocli.CommandLine.ParseResult;

/** Options that several calls share. */
final class Options {
    private Options() {}

    static CommandSpec command(String... description) {
        CommandSpec spec = CommandSpec.create();
        spec.usageMessage().description(description).sortOptions(false);
        spec.addOption(OptionSpec.builder("-h", "--help")
                .usageHelp(true)
                .description("show this help")
                .build());
        return spec;
    }

    static PositionalParamSpec vessel() {
        return PositionalParamSpec.builder()
                .index("0")
                .arity("1")
                .paramLabel("VESSEL")
                .type(String.class)
                .description("the ship's folder, such as vessel-data/heron")
                .build();
    }

    static OptionSpec json() {
        return OptionSpec.builder("--json")
                .description("print one JSON document instead of text")
                .build();
    }

    static OptionSpec text(String name, String label, boolean required, String... description) {
        return OptionSpec.builder(name)
                .paramLabel(label)
                .type(String.class)
                .required(required)
                .description(description)
                .build();
    }

    static OptionSpec flag(String name, String... description) {
        return OptionSpec.builder(name).description(description).build();
    }

    static String vessel(ParseResult given) {
        return given.matchedPositionalValue(0, "");
    }
}
