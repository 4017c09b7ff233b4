package earward.engine;

import java.util.List;

/**
 * The complex audio response from the recovered envelope to one place.
 *
 * @param points ascending in frequency as they were asked for
 */
public record Response(List<Point> points) {
  /**
   * The response at one frequency.
   *
   * @param hertz frequency
   * @param real real part, volts per volt of recovered envelope
   * @param imaginary imaginary part
   */
  public record Point(double hertz, double real, double imaginary) {
    /** Magnitude, volts per volt. */
    public double magnitude() {
      return Math.hypot(real, imaginary);
    }
  }

  public Response {
    points = List.copyOf(points);
  }
}
