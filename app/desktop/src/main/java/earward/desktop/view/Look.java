package earward.desktop.view;

import com.formdev.flatlaf.FlatDarkLaf;
import com.formdev.flatlaf.FlatLaf;
import com.formdev.flatlaf.FlatLightLaf;
import com.formdev.flatlaf.fonts.inter.FlatInterFont;
import com.formdev.flatlaf.util.FontUtils;
import earward.block.check.Severity;
import java.awt.Color;
import java.awt.Font;
import javax.swing.UIManager;

/** Colours and type of the window: graphite and brass, light or dark. */
public final class Look {
  private static final int POINTS = 13;

  private Look() {}

  /** Sets the look before the first window, or changes it under open windows. */
  public static void set(boolean dark) {
    FlatInterFont.installLazy();
    UIManager.put(
        "defaultFont", FontUtils.getCompositeFont(FlatInterFont.FAMILY, Font.PLAIN, POINTS));
    UIManager.put("Component.focusWidth", 1);
    UIManager.put("ScrollBar.width", 11);
    if (dark) {
      FlatDarkLaf.setup();
    } else {
      FlatLightLaf.setup();
    }
  }

  /** Changes the look of all open windows. */
  public static void change(boolean dark) {
    set(dark);
    FlatLaf.updateUI();
  }

  /** Whether the dark look is on. */
  public static boolean dark() {
    return FlatLaf.isLafDark();
  }

  static Color ground() {
    return dark() ? new Color(0x22272C) : new Color(0xF4F1EA);
  }

  static Color card() {
    return dark() ? new Color(0x2F363D) : Color.WHITE;
  }

  static Color ink() {
    return dark() ? new Color(0xECE8DF) : new Color(0x24282C);
  }

  static Color quiet() {
    return dark() ? new Color(0xA7ADB3) : new Color(0x5C636A);
  }

  /** The colour of the signal and of what is selected. */
  static Color brass() {
    return dark() ? new Color(0xD9A441) : new Color(0x8F5F00);
  }

  static Color line() {
    return dark() ? new Color(0x4A525A) : new Color(0xCFC8BA);
  }

  /** The colour of a severity; its shape and word say the same. */
  static Color severity(Severity severity) {
    return switch (severity) {
      case STOP -> dark() ? new Color(0xFF8A75) : new Color(0xA52714);
      case WEIGH -> dark() ? new Color(0xF0B95A) : new Color(0x875300);
      case NOTE -> dark() ? new Color(0x8FBCE6) : new Color(0x2B5F91);
    };
  }
}
