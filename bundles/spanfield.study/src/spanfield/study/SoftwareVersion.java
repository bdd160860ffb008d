/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study;

/** Version of the software, as results state it. */
public final class SoftwareVersion {

    /** The version, the same as that of the bundles without their qualifier (a test holds that). */
    public static final String VERSION = "0.1.0";

    private SoftwareVersion() {
    }
}
