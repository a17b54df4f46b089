package perveance.desktop.view;

import java.util.Optional;
import java.util.function.Supplier;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import perveance.desktop.task.LatestOnly;
import perveance.desktop.viewmodel.Desk;
import perveance.desktop.viewmodel.DocumentException;

/**
 * Makes files beside the window, which stays alive meanwhile: says what is being made, and can be
 * stopped. A newer order takes the place of an older one.
 */
final class SideWork {
  private final Desk desk;
  private final ReadOnlyStringWrapper making = new ReadOnlyStringWrapper("");
  private final LatestOnly<Order, Made> orders;

  SideWork(Desk desk) {
    this.desk = desk;
    orders = desk.bench().aside((order, progress) -> made(order), this::deliver);
  }

  /** What is done with a file that is made. */
  interface Delivery {
    void take(byte[] content) throws DocumentException;
  }

  private record Order(String what, Supplier<byte[]> maker, Delivery delivery) {}

  private record Made(Order order, byte[] content, Optional<RuntimeException> trouble) {}

  /** What is being made, a few words; empty when nothing is. */
  ReadOnlyStringProperty making() {
    return making.getReadOnlyProperty();
  }

  /** Orders something; what comes of it is delivered on the window's thread. */
  void order(String what, Supplier<byte[]> maker, Delivery delivery) {
    making.set(what);
    orders.ask(new Order(what, maker, delivery));
  }

  /** Nobody wants it any more: nothing will be delivered. */
  void stop() {
    if (!making.get().isEmpty()) {
      orders.cancel();
      desk.bench().say("Stopped: " + making.get() + ". Nothing was written.");
      making.set("");
    }
  }

  private static Made made(Order order) {
    try {
      return new Made(order, order.maker().get(), Optional.empty());
    } catch (RuntimeException e) {
      return new Made(order, new byte[0], Optional.of(e));
    }
  }

  private void deliver(Made made) {
    making.set("");
    if (made.trouble().isPresent()) {
      desk.asking()
          .tell(
              "This was not finished: " + made.order().what() + ".",
              String.valueOf(made.trouble().get()),
              "The chassis is as it was. Try again; if it fails again, report the line above.");
      return;
    }
    try {
      made.order().delivery().take(made.content());
    } catch (DocumentException e) {
      desk.asking().tell(e.what(), e.why(), e.remedy());
    }
  }
}
