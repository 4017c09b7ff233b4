package earward.kit.design;

/**
 * The tuned circuits between aerial and kit, where their response was not measured.
 *
 * @param number how many single tuned circuits, from 1 to 12
 * @param quality loaded Q of each, from 1 to 500
 */
public record FrontEndCircuits(int number, double quality) {
  private static final int MOST = 12;
  private static final double MOST_QUALITY = 500;

  public FrontEndCircuits {
    if (number < 1 || number > MOST) {
      throw new IllegalArgumentException(
          "the front end has " + number + " tuned circuits; wanted are 1 to " + MOST);
    }
    if (!(quality >= 1 && quality <= MOST_QUALITY)) {
      throw new IllegalArgumentException(
          "the front end's tuned circuits have a Q of " + quality + "; wanted is 1 to 500");
    }
  }
}
