// SPDX-License-Identifier: EPL-2.0
package tapwright.charts;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;

import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.swt.SWT;
import org.eclipse.swt.dnd.Clipboard;
import org.eclipse.swt.dnd.ImageTransfer;
import org.eclipse.swt.dnd.TextTransfer;
import org.eclipse.swt.dnd.Transfer;
import org.eclipse.swt.graphics.Image;
import org.eclipse.swt.graphics.ImageData;
import org.eclipse.swt.graphics.ImageLoader;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.FileDialog;
import org.eclipse.swt.widgets.Menu;
import org.eclipse.swt.widgets.MenuItem;

/** The context menu of a picture: zooms, copy and save. UI thread. */
final class PlotMenu {

	private final PlotView view;

	PlotMenu(PlotView view, Control area) {
		this.view = view;
		var menu = new Menu(area);
		add(menu, "Show &everything\tHome", view::zoomHome);
		add(menu, "&Previous zoom\tBackspace", view::zoomBack);
		add(menu, "&Next zoom\tShift+Backspace", view::zoomForward);
		new MenuItem(menu, SWT.SEPARATOR);
		add(menu, "Copy p&icture", this::copyPicture);
		add(menu, "Copy &data", this::copyData);
		add(menu, "&Save as...", this::save);
		area.setMenu(menu);
	}

	private static void add(Menu menu, String text, Runnable action) {
		var item = new MenuItem(menu, SWT.PUSH);
		item.setText(text);
		item.addListener(SWT.Selection, event -> action.run());
	}

	private void copyPicture() {
		Image image = view.image();
		try {
			copy(image.getImageData(), ImageTransfer.getInstance());
		} finally {
			image.dispose();
		}
	}

	private void copyData() {
		copy(PlotCsv.write(view.plot(), '\t'), TextTransfer.getInstance());
	}

	private void copy(Object content, Transfer transfer) {
		var clipboard = new Clipboard(view.getDisplay());
		try {
			clipboard.setContents(new Object[] { content }, new Transfer[] { transfer });
		} finally {
			clipboard.dispose();
		}
	}

	private void save() {
		var dialog = new FileDialog(view.getShell(), SWT.SAVE);
		dialog.setText("Save Picture or Data");
		dialog.setFilterNames(new String[] { "Drawing (*.svg)", "Pixels (*.png)", "Data (*.csv)" });
		dialog.setFilterExtensions(new String[] { "*.svg", "*.png", "*.csv" });
		dialog.setFileName("picture.svg");
		dialog.setOverwrite(true);
		String chosen = dialog.open();
		if (chosen == null) {
			return;
		}
		try {
			writeWhole(Path.of(chosen), content(chosen));
		} catch (IOException e) {
			MessageDialog.openError(view.getShell(), "Not saved", chosen + " could not be written: " + e.getMessage());
		}
	}

	private byte[] content(String name) {
		if (name.endsWith(".png")) {
			return png();
		}
		if (name.endsWith(".csv")) {
			return PlotCsv.write(view.plot(), ',').getBytes(StandardCharsets.UTF_8);
		}
		return PlotSvg.write(view.plot(), view.window(), view.getSize().x, view.getSize().y, PlotSvg.Palette.ofTheme())
				.getBytes(StandardCharsets.UTF_8);
	}

	private byte[] png() {
		Image image = view.image();
		try {
			var loader = new ImageLoader();
			loader.data = new ImageData[] { image.getImageData() };
			var bytes = new ByteArrayOutputStream();
			loader.save(bytes, SWT.IMAGE_PNG);
			return bytes.toByteArray();
		} finally {
			image.dispose();
		}
	}

	// A reader finds the old file or the new one, never a part.
	private static void writeWhole(Path target, byte[] content) throws IOException {
		Path temporary = Files.createTempFile(target.toAbsolutePath().getParent(), ".picture", ".tmp");
		try {
			Files.write(temporary, content);
			Files.move(temporary, target, StandardCopyOption.REPLACE_EXISTING);
		} finally {
			Files.deleteIfExists(temporary);
		}
	}
}
