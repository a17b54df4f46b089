package perveance.reference;

import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.LawParameter;

/**
 * Device laws as behavioural sources, written from their equations and not from the code: the
 * spread three-halves law is the integral of its density, written out by powers.
 */
final class SpiceLaw {
  private static final double ONSET_CURRENT = 0.3e-6;

  private final String name;
  private final String anode;
  private final String grid;
  private final String screen;
  private final String cathode;
  private final Map<String, Double> value = new TreeMap<>();
  private final List<String> lines;

  /** Writes the sources of one valve; nodes are names in the netlist. */
  SpiceLaw(List<String> lines, String name, DeviceLaw law, List<String> nodes) {
    this.lines = lines;
    this.name = name;
    this.anode = nodes.get(0);
    this.grid = nodes.get(1);
    this.screen = nodes.get(2);
    this.cathode = nodes.get(3);
    for (LawParameter p : law.parameters()) {
      value.put(p.key(), p.value());
    }
  }

  void write(DeviceLaw law) {
    switch (law.kind()) {
      case DIODE -> diode();
      case TRIODE -> triode();
      case PENTODE -> pentode();
    }
  }

  private void diode() {
    String width = number(1.5 * get("thermal_voltage"));
    String x = "(v(%s,%s)+%s)/%s".formatted(anode, cathode, of("contact_potential"), width);
    helper("x", "max(min(" + x + ",600),-200)");
    helper("w", "v(%1$s)>36 ? %2$s*v(%1$s) : %2$s*ln(1+exp(min(v(%1$s),36)))", node("x"), width);
    current("a", anode, "%s*pow(max(v(%s),1e-30),1.5)", of("perveance"), node("w"));
  }

  private void triode() {
    helper("r", "max(v(%s,%s),0)", anode, cathode);
    spreadCathode();
    String t2 = number(get("turn_back") * get("turn_back"));
    helper("q", "pow(%1$s/(%1$s+v(%2$s)*v(%2$s)),2)", t2, node("r"));
    gridCurrent();
    current("a", anode, "v(%s)*(1-v(%s))", node("ik"), node("q"));
    current(
        "g",
        grid,
        "v(%s)+v(%s)*v(%s)/(1+exp(-v(%s)))",
        node("ig"),
        node("ik"),
        node("q"),
        node("x"));
  }

  private void pentode() {
    helper(
        "r",
        "max(v(%1$s,%2$s)+%3$s*v(%4$s,%2$s),0)",
        screen,
        cathode,
        of("anode_influence"),
        anode);
    spreadCathode();
    gridCurrent();
    division();
    current("a", anode, "v(%s)*v(%s)", node("ik"), node("f"));
    current("s", screen, "v(%s)*(1-v(%s))", node("ik"), node("f"));
    current("g", grid, "v(%s)", node("ig"));
  }

  /** The cathode's current; of a remote cut-off grid two parts, one with a wider penetration. */
  private void spreadCathode() {
    double remote = value.getOrDefault("remote_share", 0.0);
    part("", (1 - remote) * get("perveance"), get("penetration"));
    if (remote == 0) {
      helper("ik", "v(%s)", node("p"));
      return;
    }
    part("r", remote * get("perveance"), get("penetration") * get("remote_penetration"));
    helper("ik", "v(%s)+v(%s)", node("p"), node("pr"));
  }

  /** I = 3 G / w^3 [u2^2 y^2.5 / 2.5 - 2 u2 y^3.5 / 3.5 + y^4.5 / 4.5] from max(u1, 0) to u2. */
  private void part(String suffix, double perveance, double meanPenetration) {
    String reach = node("r");
    for (int end = 1; end <= 2; end++) {
      double far = end == 1 ? -Math.sqrt(5) / 3 : Math.sqrt(5);
      double offset = get("contact_potential") + far * get("cathode_spread");
      double penetration = meanPenetration * (1 + far * get("spread"));
      helper(
          "u" + end + suffix,
          "max(v(%s,%s)+%s+%s*v(%s),0)",
          grid,
          cathode,
          number(offset),
          number(penetration),
          reach);
    }
    double width = get("cathode_spread") * 4 * Math.sqrt(5) / 3;
    double wider = meanPenetration * get("spread") * 4 * Math.sqrt(5) / 3;
    String upper = node("u2" + suffix);
    helper("w" + suffix, "%s+%s*v(%s)", number(width), number(wider), reach);
    for (int end = 1; end <= 2; end++) {
      helper(
          "i" + end + suffix,
          "pow(v(%1$s),2)*pow(v(%2$s),2.5)/2.5-2*v(%1$s)*pow(v(%2$s),3.5)/3.5"
              + "+pow(v(%2$s),4.5)/4.5",
          upper,
          node("u" + end + suffix));
    }
    helper(
        "p" + suffix,
        "3*%s*(v(%s)-v(%s))/pow(v(%s),3)",
        number(perveance),
        node("i2" + suffix),
        node("i1" + suffix),
        node("w" + suffix));
  }

  private void gridCurrent() {
    double width = 1.5 * get("thermal_voltage");
    double p = Math.pow(ONSET_CURRENT / get("grid_perveance"), 2.0 / 3);
    double origin = get("grid_onset") - width * Math.log(Math.exp(p / width) - 1);
    helper("x", "max((v(%s,%s)-(%s))/%s,-60)", grid, cathode, number(origin), number(width));
    helper(
        "ig",
        "%1$s*pow(%2$s*(v(%3$s)>36 ? v(%3$s) : ln(1+exp(min(v(%3$s),36)))),1.5)",
        of("grid_perveance"),
        number(width),
        node("x"));
  }

  /** The anode's share f = z / (1 + z^n)^(1/n) / (1 + q) of the cathode current. */
  private void division() {
    String va = "v(%s,%s)".formatted(anode, cathode);
    helper("va", "%1$s<0 ? 0 : (%1$s<0.1 ? %1$s*%1$s/0.2 : %1$s-0.05)", va);
    String vs = "v(%s,%s)".formatted(screen, cathode);
    helper("s", "%1$s>=1 ? %1$s : 1/(2-min(%1$s,1))", vs);
    helper("y", "v(%s)/max(v(%s),1e-9)", node("va"), node("s"));
    helper("ue", "pow(max(v(%s),1e-30)/%s,2/3)", node("ik"), of("perveance"));
    String fall =
        "(1+%1$s*(1-v(%2$s))/(v(%2$s)+%3$s))"
            .formatted(of("share_fall"), node("y"), of("share_offset"));
    String beam = "1";
    if (get("beam_width") > 0) {
      String ratio =
          "v(%s)/(%s*max(v(%s),1e-9)*%s)"
              .formatted(node("ue"), of("penetration"), node("s"), of("beam_width"));
      beam = "(1-exp(-pow(" + ratio + ",2)))";
    }
    helper("qs", "%s*%s*%s", of("screen_share"), beam, fall);
    helper("z", "v(%s)/(%s*v(%s)/%s+0.2)", node("va"), of("knee"), node("ue"), of("penetration"));
    helper(
        "f",
        "v(%1$s)*pow(1+pow(v(%1$s),%2$s),-1/%2$s)/(1+v(%3$s))",
        node("z"),
        of("knee_sharpness"),
        node("qs"));
  }

  private void helper(String suffix, String expression, Object... arguments) {
    lines.add(
        "B%1$s_%2$s %3$s 0 V=%4$s"
            .formatted(name, suffix, node(suffix), expression.formatted(arguments)));
  }

  private void current(String suffix, String from, String expression, Object... arguments) {
    String sense = name + "_" + suffix + "s";
    lines.add("V%1$s %2$s %1$s 0".formatted(sense, from));
    lines.add(
        "B%1$s_into_%2$s %3$s %4$s I=%5$s"
            .formatted(name, suffix, sense, cathode, expression.formatted(arguments)));
  }

  private String node(String suffix) {
    return name + "_" + suffix;
  }

  private double get(String key) {
    Double found = value.get(key);
    if (found == null) {
      throw new IllegalArgumentException("law has no " + key + ", only " + value.keySet());
    }
    return found;
  }

  private String of(String key) {
    return "(" + number(get(key)) + ")";
  }

  static String number(double value) {
    return String.format(Locale.ROOT, "%.17g", value);
  }
}
