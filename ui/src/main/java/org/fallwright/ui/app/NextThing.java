package org.fallwright.ui.app;

import org.fallwright.core.advice.NotByPulling;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.site.Looked;
import org.fallwright.core.site.Site;
import org.fallwright.ui.document.OpenSite;
import org.fallwright.ui.text.Messages;

/** The one thing to do now. */
final class NextThing {
  private NextThing() {}

  static String of(OpenSite open) {
    if (open.site().isEmpty()) {
      return Messages.text("next.open");
    }
    if (!Double.isNaN(open.progress())) {
      return Messages.text("next.wait");
    }
    Site site = open.site().get();
    for (Looked.What what : Looked.What.values()) {
      if (site.found(what) == Looked.Found.NOT_LOOKED) {
        return Messages.text("next.look", Messages.of("looked", what));
      }
    }
    if (open.failure().isPresent() || open.plan().isEmpty()) {
      return Messages.text("next.plan-again");
    }
    if (NotByPulling.of(open.plan().get()).isPresent()) {
      return Messages.text("next.not-by-pulling");
    }
    return open.chosen().map(NextThing::of).orElse(Messages.text("next.change-site"));
  }

  private static String of(Judged j) {
    return switch (j.verdict()) {
      case WORKABLE -> Messages.text("next.prove");
      case TIGHT -> Messages.text("next.tight", weakest(j));
      case NOT_WORKABLE -> Messages.text("next.other-way");
      case CANNOT_JUDGE -> Messages.text("next.ask", weakest(j));
    };
  }

  private static String weakest(Judged j) {
    return j.weakest() == null ? "" : j.weakest().id();
  }
}
