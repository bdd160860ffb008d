/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.cli;

import org.eclipse.equinox.app.IApplication;
import org.eclipse.equinox.app.IApplicationContext;

/** The headless command as an Equinox application: takes the arguments that the framework leaves and returns the exit code. */
public final class CommandLineApplication implements IApplication {

    @Override
    public Object start(IApplicationContext context) {
        context.applicationRunning();
        Object arguments = context.getArguments().get(IApplicationContext.APPLICATION_ARGS);
        return Main.run(arguments instanceof String[] strings ? strings : new String[0]);
    }

    @Override
    public void stop() {
        // the command ends by itself, see Cancellation
    }
}
