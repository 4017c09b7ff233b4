package earward.desktop.view;

import com.formdev.flatlaf.FlatDarkLaf;
import com.formdev.flatlaf.FlatLaf;
import com.formdev.flatlaf.FlatLightLaf;
import com.formdev.flatlaf.fonts.inter.FlatInterFont;
import com.formdev.flatlaf.util.FontUtils;
import earward.block.check.Severity;
import earward.desktop.model.Preferences.Theme;
import earward.drawing.Ink;
import earward.drawing.curve.CurveInk;
import java.awt.Color;
import java.awt.Font;
import java.awt.Toolkit;
import java.util.Locale;
import java.util.Map;
import javax.swing.UIManager;

/**
 * Colours and type of the window: warm grey like a drawing sheet, ink, and one copper, light or
 * dark. Every colour of text stands at least 4.5 : 1 against what is behind it.
 */
public final class Look {
  private static final int POINTS = 13;
  private static int percent = 100;

  private Look() {}

  /** Sets the look before the first window, or changes it under open windows. */
  public static void set(boolean dark) {
    FlatInterFont.installLazy();
    int points = Math.round(POINTS * percent / 100f);
    UIManager.put(
        "defaultFont", FontUtils.getCompositeFont(FlatInterFont.FAMILY, Font.PLAIN, points));
    UIManager.put("Component.focusWidth", 2);
    UIManager.put("ScrollBar.width", 11);
    UIManager.put("TabbedPane.tabHeight", 28);
    FlatLaf.setGlobalExtraDefaults(
        dark
            ? Map.of("@accentColor", "#E0A070", "@background", "#2A2926")
            : Map.of("@accentColor", "#8A4B1F", "@background", "#EFECE6"));
    if (dark) {
      FlatDarkLaf.setup();
    } else {
      FlatLightLaf.setup();
    }
  }

  /** Sets the look that is preferred. */
  public static void set(Theme theme, int textPercent) {
    percent = textPercent;
    set(theme == Theme.DARK || (theme == Theme.SYSTEM && systemDark()));
  }

  /** Changes the look of all open windows. */
  public static void change(Theme theme, int textPercent) {
    set(theme, textPercent);
    FlatLaf.updateUI();
  }

  /** Whether the desktop that the program runs on says that it is dark. */
  private static boolean systemDark() {
    Object name = Toolkit.getDefaultToolkit().getDesktopProperty("gnome.Net/ThemeName");
    return name != null && String.valueOf(name).toLowerCase(Locale.ROOT).contains("dark");
  }

  /** Whether the dark look is on. */
  public static boolean dark() {
    return FlatLaf.isLafDark();
  }

  private static Color of(int light, int dark) {
    return new Color(dark() ? dark : light);
  }

  /** Behind everything. */
  static Color ground() {
    return of(0xEFECE6, 0x2A2926);
  }

  /** Of cards, paper and what is written on. */
  static Color card() {
    return of(0xFBFAF7, 0x353330);
  }

  static Color ink() {
    return of(0x23262A, 0xEFEBE3);
  }

  static Color quiet() {
    return of(0x5A5750, 0xB9B3A8);
  }

  /** The one accent: the signal, and what is selected. */
  static Color copper() {
    return of(0x8A4B1F, 0xE0A070);
  }

  static Color line() {
    return of(0xBDB7AB, 0x57534C);
  }

  /** The colour of a severity; its shape and word say the same. */
  static Color severity(Severity severity) {
    return switch (severity) {
      case STOP -> of(0x9E1C12, 0xFF9C8C);
      case WEIGH -> of(0x7A4B00, 0xEDBE6A);
      case NOTE -> of(0x2F5573, 0xA3C4E0);
    };
  }

  /** The ink of circuit drawings. */
  static Ink drawing() {
    return new Ink(ink(), of(0x3A3F45, 0xC9C4BA), ink(), quiet(), copper(), card());
  }

  /** The ink of curves. */
  static CurveInk curves() {
    return new CurveInk(copper(), ink(), quiet(), ink(), severity(Severity.STOP), card(), small());
  }

  /** The font of notes and axes. */
  static Font small() {
    Font font = UIManager.getFont("defaultFont");
    return font.deriveFont(font.getSize2D() * 0.9f);
  }
}
