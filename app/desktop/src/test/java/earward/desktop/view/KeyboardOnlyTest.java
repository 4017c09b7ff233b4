package earward.desktop.view;

import static earward.desktop.view.WindowStage.onEventThread;
import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.api.Assumptions.assumeFalse;

import earward.block.check.Severity;
import earward.desktop.model.FindingRow;
import java.awt.Component;
import java.awt.Dimension;
import java.awt.GraphicsEnvironment;
import java.awt.KeyboardFocusManager;
import java.awt.Robot;
import java.awt.event.KeyEvent;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.function.Predicate;
import javax.swing.JButton;
import javax.swing.JDialog;
import javax.swing.JTextField;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * The designer's main job with nothing but keys: from the empty path to a saved design and a build
 * sheet without a STOP or WEIGH, in at most forty actions. A key, a chord, or words typed without a
 * pause are one action each; the list stands in the guide.
 */
class KeyboardOnlyTest {
  private static final int MOST_ACTIONS = 40;

  @TempDir private Path folder;
  private WindowStage stage;
  private Robot robot;
  private int actions;

  @BeforeEach
  void open() throws Exception {
    assumeFalse(GraphicsEnvironment.isHeadless(), "there is no display");
    stage = new WindowStage(folder.resolve("user"), new Dimension(1366, 768));
    robot = new Robot();
    robot.setAutoDelay(12);
    robot.setAutoWaitForIdle(true);
  }

  @AfterEach
  void close() throws Exception {
    if (stage != null) {
      stage.close();
    }
  }

  private void press(int... keys) {
    actions++;
    for (int key : keys) {
      robot.keyPress(key);
    }
    for (int i = keys.length - 1; i >= 0; i--) {
      robot.keyRelease(keys[i]);
    }
  }

  private void type(String words) {
    actions++;
    for (int i = 0; i < words.length(); i++) {
      char c = words.charAt(i);
      boolean shift = Character.isUpperCase(c);
      int key = KeyEvent.getExtendedKeyCodeForChar(c);
      if (shift) {
        robot.keyPress(KeyEvent.VK_SHIFT);
      }
      robot.keyPress(key);
      robot.keyRelease(key);
      if (shift) {
        robot.keyRelease(KeyEvent.VK_SHIFT);
      }
    }
  }

  private static void awaitFocus(String what, Predicate<Component> wanted) throws Exception {
    WindowStage.await(
        what,
        () -> {
          Component focus = KeyboardFocusManager.getCurrentKeyboardFocusManager().getFocusOwner();
          return focus != null && wanted.test(focus);
        });
  }

  private static boolean inDialog(Component focus) {
    return javax.swing.SwingUtilities.getWindowAncestor(focus) instanceof JDialog;
  }

  @Test
  void fromTheEmptyPathToASavedReviewCleanSheet() throws Exception {
    awaitFocus("the start page", each -> "start-empty".equals(each.getName()));
    press(KeyEvent.VK_SPACE);
    awaitFocus("the path", LevelPath.class::isInstance);
    press(KeyEvent.VK_F3);
    awaitFocus("the name of the kit", each -> "#conditions.title".equals(each.getName()));
    type("lamplight");
    press(KeyEvent.VK_ENTER);
    press(KeyEvent.VK_CONTROL, KeyEvent.VK_SHIFT, KeyEvent.VK_P);
    awaitFocus("the proposal", each -> "take".equals(each.getName()) && inDialog(each));
    press(KeyEvent.VK_ENTER);
    stage.awaitSolved();
    walkAndStepAValue();
    save(KeyEvent.VK_S, folder.resolve("lamplight.earward"));
    Path sheet = folder.resolve("lamplight.pdf");
    save(KeyEvent.VK_E, sheet);
    WindowStage.await("the sheet", () -> Files.isRegularFile(sheet));
    assertThat(actions).isLessThanOrEqualTo(MOST_ACTIONS);
    assertThat(onEventThread(() -> stage.workbench().unsaved())).isFalse();
    assertThat(onEventThread(() -> FindingRow.of(stage.workbench().kit().orElseThrow())))
        .noneMatch(row -> row.severity() != Severity.NOTE);
    assertThat(Files.readString(sheet, StandardCharsets.ISO_8859_1)).startsWith("%PDF");
    assertThat(onEventThread(() -> stage.workbench().design().title())).isEqualTo("lamplight");
  }

  /** To the detector, its first value a step up and down again. */
  private void walkAndStepAValue() throws Exception {
    press(KeyEvent.VK_F2);
    awaitFocus("the path", LevelPath.class::isInstance);
    press(KeyEvent.VK_RIGHT);
    String feed = onEventThread(() -> stage.workbench().selected());
    assertThat(feed).isEqualTo("feed");
    press(KeyEvent.VK_ENTER);
    awaitFocus("a field of the feed", each -> String.valueOf(each.getName()).startsWith("feed."));
    Component first =
        onEventThread(() -> KeyboardFocusManager.getCurrentKeyboardFocusManager().getFocusOwner());
    if (first instanceof JTextField field) {
      String before = onEventThread(field::getText);
      press(KeyEvent.VK_UP);
      String stepped = onEventThread(field::getText);
      assertThat(stepped).isNotEqualTo(before);
      press(KeyEvent.VK_ESCAPE);
      String back = onEventThread(field::getText);
      assertThat(back).isEqualTo(before);
    }
    stage.awaitSolved();
  }

  private void save(int key, Path to) throws Exception {
    press(KeyEvent.VK_CONTROL, key);
    awaitFocus("the file dialog", each -> each instanceof JTextField && inDialog(each));
    press(KeyEvent.VK_CONTROL, KeyEvent.VK_A);
    type(to.toString());
    press(KeyEvent.VK_ENTER);
    WindowStage.await(
        to.getFileName().toString(), () -> WindowStage.find(JDialog.class::isInstance) == null);
  }

  @Test
  void everyCommandHasANameAndNoTwoHaveTheSameKey() throws Exception {
    onEventThread(
        () -> {
          ((JButton) WindowStage.find("start-empty")).doClick(0);
          return "";
        });
    var keys =
        onEventThread(
            () -> {
              java.util.List<String> found = new java.util.ArrayList<>();
              var bar = stage.window().getJMenuBar();
              for (int i = 0; i < bar.getMenuCount(); i++) {
                for (Component item : bar.getMenu(i).getMenuComponents()) {
                  var accelerator = ((javax.swing.JMenuItem) item).getAccelerator();
                  assertThat(((javax.swing.JMenuItem) item).getText()).isNotBlank();
                  if (accelerator != null) {
                    found.add(accelerator.toString());
                  }
                }
              }
              return found;
            });
    assertThat(keys).hasSizeGreaterThan(25).doesNotHaveDuplicates();
  }
}
