package perveance.engine.analysis;

/**
 * What two tones at once make, their peaks together that of the drive.
 *
 * @param smpte side tones of the high tone, second and third order, rms over the high tone: the
 *     test of the SMPTE, low and high tone 4 to 1 [1]
 * @param ccif difference tone and both third-order tones, rms over the sum of the two tones: the
 *     test of the CCIF with two equal tones close together (IEC 60268-3, total difference-frequency
 *     distortion) [1]
 */
public record Intermodulation(double smpte, double ccif) {}
