// SPDX-License-Identifier: EPL-2.0
package tapwright.cli;

import java.util.List;

import org.eclipse.equinox.app.IApplication;
import org.eclipse.equinox.app.IApplicationContext;

/** The headless command inside an Eclipse installation: {@code -application tapwright.cli.headless VERB ...}. */
public final class HeadlessApplication implements IApplication {

	@Override
	public Object start(IApplicationContext context) {
		var args = (String[]) context.getArguments().get(IApplicationContext.APPLICATION_ARGS);
		return Main.run(List.of(args), new Console(System.out, System.err, false));
	}

	@Override
	public void stop() {
		// a verb ends by itself; there is nothing to release
	}
}
