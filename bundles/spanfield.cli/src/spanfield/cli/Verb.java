/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.cli;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.apache.commons.cli.Option;

/** What the command can do. Everything that the help says about a verb is here. */
enum Verb {

    CHECK("check", "STUDY...", "list everything that is wrong or doubtful in studies", List.of(Args.FORMAT, Args.OUTPUT),
        List.of("spanfield check line.spanfield", "spanfield check examples/*/*.spanfield")),

    EDGES("edges", "STUDY", "field at the edges of the right-of-way, greatest values, margins to the limits",
        join(List.of(Args.STATION), Args.COMPUTING),
        List.of("spanfield edges line.spanfield", "spanfield edges line.spanfield --case rating --case peak --units mG --length ft",
            "spanfield edges line.spanfield --format csv --output edges.csv")),

    PROFILE("profile", "STUDY", "lateral profile at a station, as a table and as a plot",
        join(List.of(Args.STATION, Args.SVG, Args.PDF, Args.PNG, Args.WIDTH), Args.COMPUTING),
        List.of("spanfield profile line.spanfield", "spanfield profile line.spanfield --station 'Mid-span 2-3' --png profile.png",
            "spanfield profile line.spanfield --station 175 --format csv --output profile.csv --svg profile.svg")),

    POINTS("points", "STUDY --at FILE", "field at points that are read from CSV", join(List.of(Args.AT), Args.COMPUTING),
        List.of("spanfield points line.spanfield --at points.csv",
            "printf 'station_m,offset_m,height_m\\n80,25,1\\n' | spanfield points line.spanfield --at - --format csv"));

    private final String word;
    private final String operands;
    private final String summary;
    private final List<Option> options;
    private final List<String> examples;

    Verb(String word, String operands, String summary, List<Option> options, List<String> examples) {
        this.word = word;
        this.operands = operands;
        this.summary = summary;
        this.options = options;
        this.examples = examples;
    }

    private static List<Option> join(List<Option> first, List<Option> then) {
        return Stream.concat(first.stream(), then.stream()).toList();
    }

    /** The verb as typed. */
    String word() {
        return word;
    }

    /** What follows the verb, for the help. */
    String operands() {
        return operands;
    }

    /** What it does, for the help. */
    String summary() {
        return summary;
    }

    /** Its options, without --help, which all verbs have. */
    List<Option> options() {
        return options;
    }

    /** Whole command lines. */
    List<String> examples() {
        return examples;
    }

    /** All words in order. */
    static List<String> words() {
        return Stream.of(values()).map(Verb::word).toList();
    }

    static Optional<Verb> ofWord(String word) {
        return Stream.of(values()).filter(verb -> verb.word.equals(word)).findFirst();
    }
}
