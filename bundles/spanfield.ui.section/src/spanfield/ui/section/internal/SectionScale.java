/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.section.internal;

import org.eclipse.draw2d.geometry.Point;

/**
 * The one place where metres of the cross-section become pixels and back: offset to the right, elevation up. Immutable.
 *
 * @param pixelsPerMetre  scale, the same in both directions
 * @param originOffset    offset at pixel 0, in metres
 * @param originElevation elevation at pixel 0, in metres
 */
public record SectionScale(double pixelsPerMetre, double originOffset, double originElevation) {

    public SectionScale {
        if (!(pixelsPerMetre > 0)) {
            throw new IllegalArgumentException("a scale of " + pixelsPerMetre + " pixels per metre");
        }
    }

    /** The scale at which a region fits into a size, with its top left corner at pixel 0. */
    public static SectionScale fitting(double left, double right, double bottom, double top, int width, int height) {
        double scale = Math.min(Math.max(50, width) / (right - left), Math.max(50, height) / (top - bottom));
        double spareAcross = Math.max(50, width) / scale - (right - left);
        double spareUp = Math.max(50, height) / scale - (top - bottom);
        return new SectionScale(scale, left - spareAcross / 2, top + spareUp / 2);
    }

    /** The same origin at another scale. */
    public SectionScale zoomed(double factor) {
        return new SectionScale(pixelsPerMetre * factor, originOffset, originElevation);
    }

    /** Pixel of a place. */
    public Point toPixel(double offset, double elevation) {
        return new Point((int) Math.round((offset - originOffset) * pixelsPerMetre), (int) Math.round((originElevation - elevation) * pixelsPerMetre));
    }

    /** Offset at a pixel, in metres. */
    public double offset(int x) {
        return originOffset + x / pixelsPerMetre;
    }

    /** Elevation at a pixel, in metres. */
    public double elevation(int y) {
        return originElevation - y / pixelsPerMetre;
    }

    /** A length in pixels as metres. */
    public double metres(int pixels) {
        return pixels / pixelsPerMetre;
    }
}
