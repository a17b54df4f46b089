package perveance.engine.stage;

import java.util.List;
import java.util.Optional;
import perveance.engine.base.NearMiss;

/** All kinds of stage there are; a new kind is named here and nowhere else. */
public final class StageKinds {
  private static final List<StageKind> ALL =
      List.of(
          new CommonCathode(),
          new CathodeFollower(),
          new PushPullOutput(),
          new SingleEndedOutput(),
          new LongTailedPair(),
          new Concertina(),
          new GroundedGrid(),
          new Cascode(),
          new TotemPole(),
          new MuFollower(),
          new WhiteFollower(),
          new ChokeLoad(),
          new Paraphase());

  private StageKinds() {}

  /**
   * All kinds, commonest first.
   *
   * @return kinds
   */
  public static List<StageKind> all() {
    return ALL;
  }

  /**
   * Finds a kind.
   *
   * @param name name in the chassis file
   * @return the kind, or empty
   */
  public static Optional<StageKind> find(String name) {
    return ALL.stream().filter(kind -> kind.name().equals(name)).findFirst();
  }

  /**
   * The name that a wrong one was probably meant to be.
   *
   * @param name as found
   * @return name of a kind, or empty
   */
  public static Optional<String> nearest(String name) {
    return NearMiss.suggest(name, ALL.stream().map(StageKind::name).toList());
  }
}
