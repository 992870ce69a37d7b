package org.fallwright.plugins.host;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Set;
import java.util.concurrent.Callable;
import java.util.concurrent.ConcurrentHashMap;
import java.util.function.Function;
import org.fallwright.core.pull.HaulLine;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullRequest;
import org.fallwright.core.pull.PullSource;
import org.fallwright.core.pull.SourceDescription;
import org.fallwright.core.pull.SourceFault;
import org.fallwright.core.pull.Wording;

/**
 * A plugin's source behind a guard. What it says of itself must be the same twice and is then kept;
 * the site's parameters are held against it before the plugin sees them. Whatever the plugin
 * throws, every answer that is missing, out of range or too large, and every call that does not
 * come back, becomes a {@link SourceFault}; only a plain {@link IllegalArgumentException} with a
 * sentence goes through, since by contract it says what is wrong with the user's parameters. After
 * a call that did not come back the source is asked nothing more. The plugin sees a copy of the
 * parameters, so that it cannot change the site.
 *
 * <p>Being stateless, a source answers the same to the same parameters; what does not hang on the
 * setup is therefore asked once for each of them.
 */
final class GuardedSource implements PullSource {
  private static final int MOST_MODES = 60;
  private static final int MOST_KEPT = 500;

  /** Records whose constructors refuse what a plugin answers, the message about the answer. */
  private static final Set<String> ANSWERS =
      Set.of(PullOffer.class.getName(), HaulLine.class.getName(), Wording.class.getName());

  private final String pluginId;
  private final PullSource source;
  private final Watch watch;
  private final SourceDescription description;
  private final Map<Question, Object> kept = new ConcurrentHashMap<>();
  private volatile SourceFault hung;

  /** What is asked of some parameters. */
  private record Question(String what, ObjectNode parameters, String mode) {}

  /**
   * Takes a source in and asks what it is.
   *
   * @throws SourceFault if it does not say so properly
   */
  GuardedSource(String pluginId, PullSource source, Watch watch) {
    this.pluginId = pluginId;
    this.source = source;
    this.watch = watch;
    SourceDescription answer = described();
    if (answer == null) {
      throw nonsense("describes its pull source by nothing at all", null);
    }
    if (!Objects.equals(answer, described())) {
      throw nonsense("describes its pull source differently each time it is asked", null);
    }
    description = answer;
  }

  private SourceDescription described() {
    try {
      return watch.within(source::describe);
    } catch (Throwable thrown) {
      throw failed("describe its pull source", thrown);
    }
  }

  @Override
  public SourceDescription describe() {
    return description;
  }

  @Override
  public List<String> modes(ObjectNode parameters) {
    return keep(
        new Question("modes", parameters, null),
        copy -> {
          description.check(copy);
          List<String> answer = guarded("list its modes", () -> copied(source.modes(copy)));
          if (answer == null
              || answer.isEmpty()
              || answer.size() > MOST_MODES
              || answer.stream().anyMatch(m -> m == null || m.isBlank() || m.length() > 100)
              || new HashSet<>(answer).size() != answer.size()) {
            throw nonsense("lists no usable modes", null);
          }
          return answer;
        });
  }

  @Override
  public double lineHeightM(ObjectNode parameters) {
    return keep(
        new Question("height", parameters, null),
        copy -> {
          double answer = guarded("say how high its line is", () -> source.lineHeightM(copy));
          if (!(answer >= 0 && answer <= 5)) {
            throw nonsense(
                "says its line is " + answer + " m high; it must be from 0 to 5 m", null);
          }
          return answer;
        });
  }

  @Override
  public HaulLine haulLine(ObjectNode parameters, String mode) {
    if (!description.needsDriver()) {
      return null;
    }
    return keep(
        new Question("haul", parameters, mode),
        copy -> {
          HaulLine answer =
              guarded("say what it is rigged with", () -> source.haulLine(copy, mode));
          if (answer == null) {
            throw nonsense("needs another source to haul it and names no line for that", null);
          }
          return answer;
        });
  }

  @Override
  public PullOffer offer(PullRequest request) {
    PullRequest copy = request.with(request.parameters().deepCopy());
    PullOffer answer = guarded("work out its pull", () -> source.offer(copy));
    if (answer == null) {
      throw nonsense("gives no pull at all, not even none", null);
    }
    return answer;
  }

  /** The answer to a question, from before if it was asked already. */
  private <T> T keep(Question question, Function<ObjectNode, T> ask) {
    @SuppressWarnings("unchecked") // a question has one kind of answer
    T before = (T) kept.get(question);
    if (before != null) {
      return before;
    }
    T answer = ask.apply(question.parameters().deepCopy());
    if (kept.size() < MOST_KEPT) {
      kept.put(
          new Question(question.what(), question.parameters().deepCopy(), question.mode()), answer);
    }
    return answer;
  }

  private <T> T guarded(String what, Callable<T> call) {
    if (hung != null) {
      throw hung;
    }
    try {
      return watch.within(call, () -> hang(what));
    } catch (Watch.Stopped stopped) {
      throw stopped;
    } catch (SourceFault fault) {
      throw fault == hung ? fault : failed(what, fault);
    } catch (IllegalArgumentException e) {
      if (isAnswerOutOfRange(e)) {
        throw nonsense("gives an impossible pull: " + Plainly.said(e), e);
      }
      if (isAboutParameters(e)) {
        throw e;
      }
      throw failed(what, e);
    } catch (Throwable thrown) { // a plugin may throw anything, linkage errors included
      throw failed(what, thrown);
    }
  }

  private SourceFault hang(String what) {
    hung = failed(what, watch.tooLong());
    return hung;
  }

  /**
   * The answer's own constructors refuse what is out of range while the plugin builds it: that is
   * the plugin's mistake, not the user's.
   */
  private static boolean isAnswerOutOfRange(IllegalArgumentException e) {
    return Arrays.stream(e.getStackTrace())
        .map(StackTraceElement::getClassName)
        .map(name -> name.contains("$") ? name.substring(0, name.indexOf('$')) : name)
        .anyMatch(ANSWERS::contains);
  }

  /** Subclasses, such as that of a number that does not parse, are no sentences for the user. */
  private static boolean isAboutParameters(IllegalArgumentException e) {
    return e.getClass() == IllegalArgumentException.class
        && e.getMessage() != null
        && !e.getMessage().isBlank();
  }

  private static List<String> copied(List<String> answer) {
    if (answer == null || answer.size() > MOST_MODES) {
      return null;
    }
    return Arrays.asList(answer.toArray(new String[0]));
  }

  private SourceFault failed(String what, Throwable thrown) {
    String how =
        thrown instanceof Watch.TooLong
            ? ": " + thrown.getMessage() + "; it is not asked again."
            : ": " + Plainly.said(thrown) + ".";
    return fault("failed to " + what + how, thrown);
  }

  private SourceFault nonsense(String what, Throwable cause) {
    return fault(what + ".", cause);
  }

  private SourceFault fault(String what, Throwable cause) {
    return new SourceFault(
        description == null ? pluginId : description.id(),
        "The plugin \"" + pluginId + "\" " + what,
        cause);
  }
}
