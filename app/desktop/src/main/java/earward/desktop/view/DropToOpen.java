package earward.desktop.view;

import java.awt.datatransfer.DataFlavor;
import java.awt.datatransfer.UnsupportedFlavorException;
import java.io.File;
import java.io.IOException;
import java.util.List;
import javax.swing.TransferHandler;

/** Opens design files that are dropped on a window. */
final class DropToOpen extends TransferHandler {
  private static final long serialVersionUID = 1L;

  private final transient Documents documents;

  DropToOpen(Documents documents) {
    this.documents = documents;
  }

  @Override
  public boolean canImport(TransferSupport support) {
    return support.isDataFlavorSupported(DataFlavor.javaFileListFlavor);
  }

  @Override
  public boolean importData(TransferSupport support) {
    try {
      List<?> dropped =
          (List<?>) support.getTransferable().getTransferData(DataFlavor.javaFileListFlavor);
      for (Object each : dropped) {
        if (each instanceof File file) {
          documents.open(file.toPath());
        }
      }
      return !dropped.isEmpty();
    } catch (UnsupportedFlavorException | IOException e) {
      return false;
    }
  }
}
