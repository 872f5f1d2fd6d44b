// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.editor;

import java.util.List;
import java.util.function.Consumer;
import java.util.function.Predicate;

import org.eclipse.core.commands.AbstractHandler;
import org.eclipse.core.commands.ExecutionEvent;
import org.eclipse.emf.common.command.CommandStack;
import org.eclipse.emf.common.command.CommandStackListener;
import org.eclipse.ui.IEditorSite;
import org.eclipse.ui.IWorkbenchCommandConstants;
import org.eclipse.ui.handlers.IHandlerService;

/** Binds the workbench's Undo and Redo to a command stack while an editor is active. */
final class UndoHandlers {

	private final CommandStack stack;
	private final List<StackHandler> handlers;
	private final CommandStackListener listener;

	UndoHandlers(IEditorSite site, CommandStack stack) {
		this.stack = stack;
		this.handlers = List.of(new StackHandler(CommandStack::canUndo, CommandStack::undo),
				new StackHandler(CommandStack::canRedo, CommandStack::redo));
		this.listener = event -> handlers.forEach(StackHandler::update);
		IHandlerService service = site.getService(IHandlerService.class);
		service.activateHandler(IWorkbenchCommandConstants.EDIT_UNDO, handlers.get(0));
		service.activateHandler(IWorkbenchCommandConstants.EDIT_REDO, handlers.get(1));
		stack.addCommandStackListener(listener);
	}

	void dispose() {
		stack.removeCommandStackListener(listener);
		handlers.forEach(StackHandler::dispose);
	}

	private final class StackHandler extends AbstractHandler {

		private final Predicate<CommandStack> possible;
		private final Consumer<CommandStack> action;

		StackHandler(Predicate<CommandStack> possible, Consumer<CommandStack> action) {
			this.possible = possible;
			this.action = action;
			update();
		}

		void update() {
			setBaseEnabled(possible.test(stack));
		}

		@Override
		public Object execute(ExecutionEvent event) {
			if (possible.test(stack)) {
				action.accept(stack);
			}
			return null;
		}
	}
}
