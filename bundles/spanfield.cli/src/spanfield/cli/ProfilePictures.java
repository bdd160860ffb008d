/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.cli;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import spanfield.report.plot.PlotOptions;
import spanfield.report.plot.ProfilePlot;
import spanfield.study.result.LateralProfile;

/**
 * The pictures of a profile that were asked for. The chart library is loaded only when there are any.
 *
 * @param svg   file of the SVG
 * @param pdf   file of the PDF
 * @param png   file of the PNG
 * @param width width of the PNG in pixels
 */
record ProfilePictures(Optional<Path> svg, Optional<Path> pdf, Optional<Path> png, int width) {

    private static final int USUAL_WIDTH_PIXELS = 1600;

    /** Reads the options and announces the files. */
    static ProfilePictures of(Args args, Results results) {
        Optional<Path> svg = args.path(Args.SVG);
        Optional<Path> pdf = args.path(Args.PDF);
        Optional<Path> png = args.path(Args.PNG);
        int width = args.value(Args.WIDTH).map(ProfilePictures::width).orElse(USUAL_WIDTH_PIXELS);
        if (png.isEmpty() && args.value(Args.WIDTH).isPresent()) {
            throw CommandException.argument("--width is for --png, which is not given; an SVG has no width in pixels");
        }
        svg.ifPresent(file -> results.announce("svg", file));
        pdf.ifPresent(file -> results.announce("pdf", file));
        png.ifPresent(file -> results.announce("png", file));
        return new ProfilePictures(svg, pdf, png, width);
    }

    private static int width(String text) {
        try {
            int width = Integer.parseInt(text);
            if (width >= ProfilePlot.LEAST_WIDTH_PIXELS && width <= ProfilePlot.GREATEST_WIDTH_PIXELS) {
                return width;
            }
        } catch (NumberFormatException other) {
            // the same answer as for a number out of range
        }
        throw CommandException.argument("--width '" + text + "' is not a whole number from " + ProfilePlot.LEAST_WIDTH_PIXELS + " to "
            + ProfilePlot.GREATEST_WIDTH_PIXELS);
    }

    /** A picture is drawn whole before any file is written. */
    private static byte[] drawn(Content picture) {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        try {
            picture.to(out);
        } catch (IOException failure) {
            throw new CommandException(ExitCode.COMPUTATION, "the picture cannot be drawn: " + failure.getMessage());
        }
        return out.toByteArray();
    }

    /** The pictures as files, in the order in which they were announced. */
    List<byte[]> draw(LateralProfile profile, Settings settings) {
        List<byte[]> pictures = new ArrayList<>();
        if (svg.isEmpty() && pdf.isEmpty() && png.isEmpty()) {
            return pictures;
        }
        try {
            ProfilePlot plot = new ProfilePlot(profile, new PlotOptions(settings.units(), settings.measure()));
            svg.ifPresent(file -> pictures.add(drawn(plot::svg)));
            pdf.ifPresent(file -> pictures.add(drawn(plot::pdf)));
            png.ifPresent(file -> pictures.add(drawn(out -> plot.png(out, width))));
        } catch (LinkageError | InternalError fonts) {
            // What the Java runtime throws where its font libraries, or any fonts at all, are missing.
            throw new CommandException(ExitCode.COMPUTATION, "the plot cannot be drawn, since Java finds no fonts; install fontconfig and a "
                + "font (Debian: apt-get install fontconfig fonts-dejavu-core)");
        }
        return pictures;
    }
}
