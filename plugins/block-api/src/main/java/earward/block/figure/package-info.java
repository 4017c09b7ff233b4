/**
 * The names of figures: place, quantity, case; and here which of them a kit has.
 *
 * <p><b>The cases.</b> The signal cases are weak, test, strong, deepest and full-volume. All other
 * cases have no carrier: there a detector diode carries no current, an audio or carrier voltage is
 * 0, and what cannot exist without a signal does not exist. Full-output, battery-low and hottest
 * drive <em>amplifier ICs only</em>, whatever stands before them. A discrete stage, a push-pull
 * pair of transistors too, is at rest in them, so its currents, heat and the supply current that it
 * makes are those of its rest, hottest at the highest ambient.
 *
 * <table>
 * <caption>Which figures exist. A node is one of the block's, a test point's or a rail's own name,
 * such as {@code rail-main}; ground is none.</caption>
 * <tr><th>place</th><th>quantity</th><th>cases</th></tr>
 * <tr><td>node, test point, rail</td><td>dc-volts</td><td>all</td></tr>
 * <tr><td></td><td>audio-rms-volts, carrier-rms-volts, second- and third-carrier-rms-volts</td>
 *   <td>signal; 0 in the others</td></tr>
 * <tr><td></td><td>distortion, second-harmonic, third-harmonic: of the detector and of a clipping
 *   amplifier IC. A transistor that the carrier does not drive and an op-amp are linear about their
 *   rest: they add none, so this says nothing of crossover</td><td>signal, and only where more than
 *   1 µV of tone arrives</td></tr>
 * <tr><td></td><td>low-edge-hertz, high-edge-hertz: of the way from the front end's sidebands to
 *   there</td><td>signal; none where nothing makes an edge</td></tr>
 * <tr><td></td><td>response-deviation-decibels, response-deviation-hertz: largest deviation from
 *   the curve wanted, between lowest and highest tone, over that at the test tone</td>
 *   <td>signal</td></tr>
 * <tr><td></td><td>noise-rms-volts (over the audio band of the conditions, not weighted),
 *   a-weighted-noise-rms-volts (22.4 Hz to 22.4 kHz): thermal noise of all resistances and of the
 *   feed's sidebands, shot noise of diodes and transistors, input noise of amplifiers; nothing of
 *   the front end</td><td>all but unpowered</td></tr>
 * <tr><td>any part</td><td>dc-amperes, drop-volts, dissipation-watts: of DC, except as below</td>
 *   <td>all</td></tr>
 * <tr><td>diode or transistor that the carrier drives</td><td>carrier-peak-volts, detection-efficiency,
 *   carrier-input-ohms, load-ratio, the three clipping depths, reversal-depth, clean-depth</td>
 *   <td>signal</td></tr>
 * <tr><td>any diode</td><td>reverse-peak-volts: with the carrier where that drives it, else DC</td>
 *   <td>all</td></tr>
 * <tr><td>amplifier IC</td><td>supply-volts, peak-amperes, junction-celsius, surface-celsius;
 *   dissipation-watts with its output's power taken off</td><td>all; peak-amperes is 0 in
 *   hottest</td></tr>
 * <tr><td></td><td>clip-watts, ten-percent-watts</td><td>full-output, battery-low</td></tr>
 * <tr><td></td><td>load-ohms: in a kit that ends in a load</td><td>full-output</td></tr>
 * <tr><td></td><td>overload-decibels</td><td>signal</td></tr>
 * <tr><td>regulator, bipolar or field-effect transistor</td><td>junction-celsius</td>
 *   <td>all</td></tr>
 * <tr><td>battery, adaptor</td><td>supply-amperes</td><td>all</td></tr>
 * <tr><td></td><td>ripple-rejection-decibels (at the adaptor's ripple, 100 Hz for a battery),
 *   hum-rms-volts: at the path's end</td><td>all but unpowered</td></tr>
 * <tr><td></td><td>rail-loop-margin-decibels, rail-loop-hertz (none where the margin is
 *   infinite)</td><td>all but unpowered</td></tr>
 * <tr><td>battery</td><td>battery-hours</td><td>no-signal, test, full-volume,
 *   full-output</td></tr>
 * <tr><td>empty, in a block with a battery or adaptor</td><td>supply-amperes: the sum</td>
 *   <td>no-signal, test, strong, full-volume, full-output, battery-low, hottest</td></tr>
 * <tr><td>empty, in a block with an entry: its seam</td><td>onward-ohms, backward-ohms,
 *   loading-loss-decibels, at the case's own tone or at the lowest-tone- or the highest-tone-</td>
 *   <td>all</td></tr>
 * <tr><td></td><td>carrier-onward-ohms, carrier-backward-ohms where a thousandth of the carrier
 *   passes; load-ratio-without, behind a detector that keeps a load for DC</td>
 *   <td>signal</td></tr>
 * <tr><td></td><td>headroom-decibels: behind the detector, in a kit that ends in an amplifier
 *   IC</td><td>test, strong</td></tr>
 * <tr><td>potentiometer that a listener turns</td><td>knob-position, where it is at its
 *   worst</td><td>deepest, worst-turn; not a block's to check</td></tr>
 * <tr><td>the whole path, not a block's to check</td><td>power-stage-depth, output-rms-volts, output-watts,
 *   sound-decibels, signal-to-noise-decibels and a-weighted-signal-to-noise-decibels (also of the
 *   detector's exit and of the seams behind it), signal-to-hum-decibels</td><td></td></tr>
 * </table>
 *
 * <p><b>Signs.</b> dc-amperes is positive from the first terminal that the device lists to the
 * second: anode to cathode, A to B, TOP to BOTTOM. Of a transistor it is the current from collector
 * to emitter without the base's, of a field-effect transistor from drain to source: positive in an
 * npn or n-channel type, negative in a pnp or p-channel type. Of a battery or adaptor it is what it
 * gives, of an amplifier IC what it draws from the supply, of an op-amp what its output gives.
 *
 * <p>A check of a figure that the kit at hand does not have is not held; the review says so in a
 * note. The contract test says so too, with the cases that have it.
 */
@NullMarked
@Offered(since = 1)
package earward.block.figure;

import earward.block.mark.Offered;
import org.jspecify.annotations.NullMarked;
