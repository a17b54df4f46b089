package perveance.engine.base;

/**
 * Physical constants, each from the CODATA recommended values of 2018 (E. Tiesinga et al., "CODATA
 * recommended values of the fundamental physical constants: 2018", Rev. Mod. Phys. 93, 025010,
 * 2021) or computed from them.
 */
public final class PhysicalConstants {
  /** Elementary charge, exact in the SI of 2019 [C]. */
  public static final double ELEMENTARY_CHARGE = 1.602176634e-19;

  /** Mass of the electron, CODATA 2018 [kg]. */
  public static final double ELECTRON_MASS = 9.1093837015e-31;

  /** Electric constant, the permittivity of vacuum, CODATA 2018 [F/m]. */
  public static final double VACUUM_PERMITTIVITY = 8.8541878128e-12;

  /** Boltzmann constant, exact in the SI of 2019 [J/K]. */
  public static final double BOLTZMANN = 1.380649e-23;

  /** Planck constant, exact in the SI of 2019 [J s]. */
  public static final double PLANCK = 6.62607015e-34;

  /**
   * Factor P0 of the three-halves law between parallel planes, J = P0 V^1.5 / d^2 with P0 = (4/9)
   * eps0 sqrt(2 e / m) (C. D. Child, Phys. Rev. (Series I) 32, 492, 1911; I. Langmuir, Phys. Rev.
   * 2, 450, 1913) [A V^-1.5].
   */
  public static final double PLANE_SPACE_CHARGE =
      4.0 / 9.0 * VACUUM_PERMITTIVITY * Math.sqrt(2.0 * ELEMENTARY_CHARGE / ELECTRON_MASS);

  /**
   * Factor of the three-halves law between coaxial cylinders, I = factor (l / r) V^1.5 / beta^2,
   * equal to 2 pi P0 (I. Langmuir and K. B. Blodgett, Phys. Rev. 22, 347, 1923) [A V^-1.5].
   */
  public static final double CYLINDER_SPACE_CHARGE = 2.0 * Math.PI * PLANE_SPACE_CHARGE;

  /**
   * Universal factor of thermionic emission, A0 = 4 pi m k^2 e / h^3 (S. Dushman, Phys. Rev. 21,
   * 623, 1923) [A m^-2 K^-2].
   */
  public static final double RICHARDSON =
      4.0
          * Math.PI
          * ELECTRON_MASS
          * BOLTZMANN
          * BOLTZMANN
          * ELEMENTARY_CHARGE
          / (PLANCK * PLANCK * PLANCK);

  /**
   * Reference temperature for noise, 290 K (H. T. Friis, "Noise figures of radio receivers", Proc.
   * IRE 32, 419, 1944) [K].
   */
  public static final double STANDARD_NOISE_TEMPERATURE = 290.0;

  private PhysicalConstants() {}

  /**
   * Returns the voltage equivalent of a temperature, k T / e.
   *
   * @param temperature absolute temperature, above 0 [K]
   * @return the thermal voltage [V]
   */
  public static double thermalVoltage(double temperature) {
    if (!(temperature > 0) || Double.isInfinite(temperature)) {
      throw new IllegalArgumentException("temperature is not above 0 and finite: " + temperature);
    }
    return BOLTZMANN * temperature / ELEMENTARY_CHARGE;
  }
}
