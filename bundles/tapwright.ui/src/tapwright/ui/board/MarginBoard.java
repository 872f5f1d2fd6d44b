// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.board;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.function.Function;

import org.eclipse.core.resources.IProject;
import org.eclipse.core.resources.ResourcesPlugin;
import org.eclipse.jface.viewers.ArrayContentProvider;
import org.eclipse.jface.viewers.ColumnLabelProvider;
import org.eclipse.jface.viewers.TableViewer;
import org.eclipse.jface.viewers.TableViewerColumn;
import org.eclipse.jface.viewers.Viewer;
import org.eclipse.jface.viewers.ViewerComparator;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Image;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.ui.IEditorPart;
import org.eclipse.ui.PartInitException;
import org.eclipse.ui.ide.IDE;
import org.eclipse.ui.part.ViewPart;

import tapwright.ui.Tasks;
import tapwright.ui.editor.FilterEditor;
import tapwright.workspace.EvidenceListener;
import tapwright.workspace.PortfolioProject;

/** All filters of all portfolios, the worst first; double-click opens the requirement in question. UI thread. */
public final class MarginBoard extends ViewPart {

	/** Id of the view in this bundle's plugin.xml. */
	public static final String ID = "tapwright.ui.board";

	private TableViewer viewer;
	private Comparator<BoardRow> order = BoardRow.WORST_FIRST;
	private final EvidenceListener listener = portfolio -> evidenceChanged();

	@Override
	public void createPartControl(Composite parent) {
		viewer = new TableViewer(parent, SWT.FULL_SELECTION | SWT.MULTI | SWT.V_SCROLL | SWT.H_SCROLL);
		viewer.getTable().setHeaderVisible(true);
		viewer.setContentProvider(ArrayContentProvider.getInstance());
		column("Filter", 210, SWT.LEFT, BoardRow::name, BoardRow::image, Comparator.comparing(BoardRow::name));
		column("Verdict", 160, SWT.LEFT, BoardRow::summary, null, BoardRow.WORST_FIRST);
		column("Worst margin", 110, SWT.RIGHT, BoardRow::margin, null, Comparator.comparingDouble(BoardRow::marginValue));
		column("Requirement", 110, SWT.LEFT, BoardRow::requirement, null, Comparator.comparing(BoardRow::requirement));
		column("At", 100, SWT.RIGHT, BoardRow::place, null, Comparator.comparing(BoardRow::place));
		column("Statement", 330, SWT.LEFT, BoardRow::statement, null, Comparator.comparing(BoardRow::statement));
		column("Portfolio", 120, SWT.LEFT, BoardRow::portfolio, null, Comparator.comparing(BoardRow::portfolio));
		viewer.setComparator(new ViewerComparator() {
			@Override
			public int compare(Viewer unused, Object a, Object b) {
				return order.compare((BoardRow) a, (BoardRow) b);
			}
		});
		viewer.addDoubleClickListener(event -> open((BoardRow) viewer.getStructuredSelection().getFirstElement()));
		getSite().setSelectionProvider(viewer);
		PortfolioProject.addListener(listener);
		refresh();
	}

	private void column(String title, int width, int alignment, Function<BoardRow, String> text, Function<BoardRow, Image> image,
			Comparator<BoardRow> comparator) {
		var column = new TableViewerColumn(viewer, alignment);
		column.getColumn().setText(title);
		column.getColumn().setWidth(width);
		column.getColumn().setMoveable(true);
		column.setLabelProvider(new ColumnLabelProvider() {
			@Override
			public String getText(Object element) {
				return text.apply((BoardRow) element);
			}

			@Override
			public Image getImage(Object element) {
				return image == null ? null : image.apply((BoardRow) element);
			}
		});
		column.getColumn().addListener(SWT.Selection, event -> {
			boolean again = viewer.getTable().getSortColumn() == column.getColumn()
					&& viewer.getTable().getSortDirection() == SWT.UP;
			viewer.getTable().setSortColumn(column.getColumn());
			viewer.getTable().setSortDirection(again ? SWT.DOWN : SWT.UP);
			order = again ? comparator.reversed() : comparator;
			viewer.refresh();
		});
	}

	// build thread
	private void evidenceChanged() {
		getSite().getShell().getDisplay().asyncExec(this::refresh);
	}

	private void refresh() {
		if (viewer.getControl().isDisposed()) {
			return;
		}
		List<BoardRow> rows = new ArrayList<>();
		for (IProject project : ResourcesPlugin.getWorkspace().getRoot().getProjects()) {
			PortfolioProject.of(project).ifPresent(portfolio -> {
				portfolio.ensureVerified();
				portfolio.evidence().forEach(found -> rows.add(BoardRow.of(project.getName(), found)));
			});
		}
		viewer.setInput(rows);
	}

	private void open(BoardRow row) {
		if (row == null) {
			return;
		}
		try {
			IEditorPart editor = IDE.openEditor(getSite().getPage(), row.file());
			if (editor instanceof FilterEditor filter && !row.requirement().isEmpty()) {
				filter.showEvidence(row.requirement());
			}
		} catch (PartInitException e) {
			Tasks.show(row.file().getName() + " could not be opened", e);
		}
	}

	@Override
	public void setFocus() {
		viewer.getControl().setFocus();
	}

	@Override
	public void dispose() {
		PortfolioProject.removeListener(listener);
		super.dispose();
	}
}
