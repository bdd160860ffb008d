/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.cli;

import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;
import org.apache.commons.cli.CommandLine;
import org.apache.commons.cli.DefaultParser;
import org.apache.commons.cli.MissingArgumentException;
import org.apache.commons.cli.Option;
import org.apache.commons.cli.Options;
import org.apache.commons.cli.ParseException;
import org.apache.commons.cli.UnrecognizedOptionException;

/** The arguments behind a verb, read and checked. */
final class Args {

    static final Option CASE = option("case", "CASE", "only this load case, by identifier or name; may be given several times");
    static final Option STATION = option("station", "STATION",
        "only this station, by identifier or name; for a profile also any position along the corridor, in the unit of --length");
    static final Option UNITS = option("units", "uT|mG", "unit of the field (uT unless given)");
    static final Option LENGTH = option("length", "m|ft", "unit of lengths in the output and in --station (m unless given)");
    static final Option MEASURE = option("measure", "resultant|major",
        "scalar of the field in text and plots (resultant unless given); CSV holds both, limits are compared in their own");
    static final Option EARTH = option("earth", "none|images|exact", "earth model instead of the study's");
    static final Option ACCURACY = option("accuracy", "NUMBER", "relative accuracy instead of the study's, 1e-12 to 1e-2");
    static final Option FORMAT = option("format", "text|csv", "output for people or for programs (text unless given)");
    static final Option OUTPUT = option("output", "FILE", "write to this file instead of standard output; written whole or not at all");
    static final Option SVG = option("svg", "FILE", "also draw the profile as SVG");
    static final Option PDF = option("pdf", "FILE", "also draw the profile as PDF");
    static final Option PNG = option("png", "FILE", "also draw the profile as PNG");
    static final Option WIDTH = option("width", "PIXELS", "width of the PNG, 320 to 10000 (1600 unless given)");
    static final Option AT = option("at", "FILE",
        "points as CSV with the columns station_m, offset_m, height_m (or _ft), and name if wanted; - reads standard input");
    static final Option HELP = Option.builder("h").longOpt("help").desc("this help").get();

    /** Options of every verb that computes. */
    static final List<Option> COMPUTING = List.of(CASE, UNITS, LENGTH, MEASURE, EARTH, ACCURACY, FORMAT, OUTPUT);

    private final Verb verb;
    private final CommandLine line;

    private Args(Verb verb, CommandLine line) {
        this.verb = verb;
        this.line = line;
    }

    private static Option option(String name, String value, String text) {
        return Option.builder().longOpt(name).hasArg().argName(value).desc(text).get();
    }

    /**
     * Reads arguments.
     *
     * @throws CommandException when an option is unknown, lacks its value, or is given twice
     */
    static Args parse(Verb verb, List<String> arguments) {
        Options options = new Options();
        // The parser collects values in the options: each run gets its own.
        Stream.concat(verb.options().stream(), Stream.of(HELP)).forEach(option -> options.addOption((Option) option.clone()));
        try {
            CommandLine line = DefaultParser.builder().setAllowPartialMatching(false).setStripLeadingAndTrailingQuotes(false).get()
                .parse(options, arguments.toArray(String[]::new));
            Args args = new Args(verb, line);
            args.refuseRepetition();
            return args;
        } catch (UnrecognizedOptionException unknown) {
            throw CommandException.argument(unknownOption(verb, unknown.getOption()));
        } catch (MissingArgumentException missing) {
            throw CommandException.argument("--" + missing.getOption().getLongOpt() + " needs a value: " + missing.getOption().getArgName());
        } catch (ParseException other) {
            throw CommandException.argument(other.getMessage());
        }
    }

    private static String unknownOption(Verb verb, String option) {
        String name = option.contains("=") ? option.substring(0, option.indexOf('=')) : option;
        List<String> known = Stream.concat(verb.options().stream(), Stream.of(HELP)).map(o -> "--" + o.getLongOpt()).toList();
        Optional<String> near = Suggestions.nearest(name, known);
        if (near.isPresent()) {
            return verb.word() + " has no option '" + name + "'; did you mean '" + near.get() + "'?";
        }
        return verb.word() + " has no option '" + name + "'; see: spanfield help " + verb.word();
    }

    private void refuseRepetition() {
        for (Option option : verb.options()) {
            if (option != CASE && !(option == STATION && verb == Verb.EDGES) && all(option).size() > 1) {
                throw CommandException.argument("--" + option.getLongOpt() + " is given twice; give it once");
            }
        }
    }

    /** Whether help is asked for. */
    boolean help() {
        return line.hasOption("help");
    }

    /** What is not an option. */
    List<String> operands() {
        return line.getArgList();
    }

    /** The one study file. */
    String study() {
        if (operands().isEmpty()) {
            throw CommandException.argument(verb.word() + " needs a study file, for example: " + verb.examples().get(0));
        }
        if (operands().size() > 1) {
            throw CommandException.argument(verb.word() + " takes one study file, not " + operands().size() + " ('"
                + String.join("', '", operands()) + "')");
        }
        return operands().get(0);
    }

    /** The value of an option. */
    Optional<String> value(Option option) {
        return Optional.ofNullable(line.getOptionValue(option.getLongOpt()));
    }

    /** All values of an option. */
    List<String> all(Option option) {
        String[] values = line.getOptionValues(option.getLongOpt());
        return values == null ? List.of() : Arrays.asList(values);
    }

    /** The value of an option as one of some words. */
    <T> Optional<T> choice(Option option, Map<String, T> words) {
        return value(option).map(word -> {
            T choice = words.get(word);
            if (choice == null) {
                throw CommandException.argument("--" + option.getLongOpt() + " '" + word + "' is not known; choose "
                    + option.getArgName().replace("|", " or "));
            }
            return choice;
        });
    }

    /** The value of an option as a file name. */
    Optional<Path> path(Option option) {
        return value(option).map(text -> path(text, "--" + option.getLongOpt()));
    }

    /** A file name. */
    static Path path(String text, String what) {
        try {
            if (text.isBlank()) {
                throw CommandException.argument(what + " is empty; name a file");
            }
            return Path.of(text);
        } catch (InvalidPathException invalid) {
            throw CommandException.argument(what + " '" + text + "' is not a file name on this system: " + invalid.getReason());
        }
    }
}
