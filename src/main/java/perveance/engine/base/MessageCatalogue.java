package perveance.engine.base;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Every kind of finding there is, over all topics. */
public final class MessageCatalogue {
  private MessageCatalogue() {}

  /**
   * Lists every kind of finding, topic by topic.
   *
   * @return all codes
   */
  public static List<MessageCode> all() {
    List<MessageCode> all = new ArrayList<>();
    all.addAll(List.of(HazardMessage.values()));
    all.addAll(List.of(RatingMessage.values()));
    all.addAll(List.of(PartMessage.values()));
    all.addAll(List.of(BiasMessage.values()));
    all.addAll(List.of(SignalMessage.values()));
    all.addAll(List.of(OutputMessage.values()));
    all.addAll(List.of(SupplyMessage.values()));
    all.addAll(List.of(DataMessage.values()));
    return List.copyOf(all);
  }

  /**
   * Finds a kind of finding by its code.
   *
   * @param code the code, such as "grid-current-first"
   * @return the kind, if there is one of that code
   */
  public static Optional<MessageCode> find(String code) {
    return all().stream().filter(message -> message.code().equals(code)).findFirst();
  }
}
