/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.cli;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.cli.Option;

/** Help texts, made from the verbs and options themselves. */
final class Help {

    private static final int WIDTH = 96;
    private static final int OPTION_COLUMN = 32;

    private Help() {
    }

    /** The help of the command. */
    static String general() {
        StringBuilder out = new StringBuilder("Magnetic field of overhead lines across a right-of-way, from a study file.\n\nUsage: spanfield VERB ...\n\n");
        for (Verb verb : Verb.values()) {
            entry(out, "  " + verb.word() + " " + verb.operands(), verb.summary());
        }
        entry(out, "  help [VERB]", "this help, or that of a verb with its options and examples");
        entry(out, "  --version", "version of the program and of Java");
        out.append("\nExamples:\n");
        for (Verb verb : Verb.values()) {
            out.append("  ").append(verb.examples().get(0)).append('\n');
        }
        return out.append('\n').append(exitCodes()).append('\n').append(caution()).toString();
    }

    /** The help of a verb. */
    static String of(Verb verb) {
        StringBuilder out = new StringBuilder("Usage: spanfield ").append(verb.word()).append(' ').append(verb.operands())
            .append(" [options]\n\n").append(sentence(verb.summary())).append("\n\nOptions:\n");
        List<Option> options = new ArrayList<>(verb.options());
        options.add(Args.HELP);
        for (Option option : options) {
            String value = option.hasArg() ? " " + option.getArgName() : "";
            entry(out, "  --" + option.getLongOpt() + value, option.getDescription());
        }
        out.append("\nExamples:\n");
        verb.examples().forEach(example -> out.append("  ").append(example).append('\n'));
        return out.append('\n').append(exitCodes()).toString();
    }

    private static String sentence(String text) {
        return Character.toUpperCase(text.charAt(0)) + text.substring(1) + ".";
    }

    private static String exitCodes() {
        StringBuilder out = new StringBuilder("Exit codes:\n");
        for (ExitCode code : ExitCode.values()) {
            out.append("  ").append(code.number()).append("  ").append(code.meaning()).append('\n');
        }
        return out.toString();
    }

    private static String caution() {
        return "For planning and screening. Local codes and licensed practice decide; live lines can kill.\n";
    }

    /** A term and its explanation, the latter wrapped behind a fixed column. */
    private static void entry(StringBuilder out, String term, String text) {
        StringBuilder line = new StringBuilder(term);
        if (term.length() >= OPTION_COLUMN) {
            out.append(term).append('\n');
            line = new StringBuilder();
        }
        line.append(" ".repeat(OPTION_COLUMN - line.length()));
        for (String word : text.split(" ")) {
            boolean first = line.toString().isBlank() || line.length() == OPTION_COLUMN;
            if (!first && line.length() + 1 + word.length() > WIDTH) {
                out.append(line).append('\n');
                line = new StringBuilder(" ".repeat(OPTION_COLUMN));
                first = true;
            }
            line.append(first ? "" : " ").append(word);
        }
        out.append(line).append('\n');
    }
}
