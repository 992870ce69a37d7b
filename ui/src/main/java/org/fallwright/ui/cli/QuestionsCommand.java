package org.fallwright.ui.cli;

import java.io.PrintWriter;
import org.fallwright.core.answers.Between;
import org.fallwright.core.answers.Questions;
import org.fallwright.core.plan.Plan;
import org.fallwright.ui.home.Home;
import picocli.CommandLine.Command;

@Command(
    name = "questions",
    description = "List what is still open on the site, what decides most first.")
final class QuestionsCommand extends AnswerCommand {
  QuestionsCommand(Home home) {
    super(home);
  }

  /**
   * The questions, and how the best setup stands between the ends of what was entered as ranges.
   */
  private record Open(Questions open, Between ranges) {}

  @Override
  Answer answer(Asked asked) {
    Plan plan = asked.plan();
    Questions q = Questions.of(asked.site(), asked.sources(), plan);
    Between b =
        plan.ranked().isEmpty()
            ? null
            : Between.of(asked.site(), asked.sources(), plan.ranked().get(0).setup());
    boolean stops = q.questions().stream().anyMatch(Questions.Question::stops);
    return new Answer(
        "questions",
        new Open(q, b),
        out -> tell(q, b, out),
        stops ? Exit.NOTHING_WORKABLE : Exit.DONE);
  }

  private static void tell(Questions q, Between b, PrintWriter out) {
    if (q.questions().isEmpty()) {
      out.println("Nothing is open.");
    }
    for (Questions.Question one : q.questions()) {
      out.println(
          (one.stops() ? "  ? " : "  - ")
              + one.text()
              + (one.stops() ? " Nothing is judged before." : "")
              + " Decides "
              + one.decides()
              + " of "
              + q.setups()
              + ".");
    }
    if (b != null && !b.ranges().isEmpty()) {
      out.println("Setup 1: " + b.sentence());
    }
  }
}
