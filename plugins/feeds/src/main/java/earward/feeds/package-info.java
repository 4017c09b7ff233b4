/** Feeds: what the front end puts into the detector. */
@NullMarked
package earward.feeds;

import org.jspecify.annotations.NullMarked;
