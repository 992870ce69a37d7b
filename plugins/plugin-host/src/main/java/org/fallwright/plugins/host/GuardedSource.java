package org.fallwright.plugins.host;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import java.util.function.Supplier;
import org.fallwright.core.pull.HaulLine;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullRequest;
import org.fallwright.core.pull.PullSource;
import org.fallwright.core.pull.SourceDescription;

/**
 * A plugin's source behind a guard. The description is asked for once. Whatever else the plugin
 * throws, and every answer that is missing or out of range, becomes a {@link SourceFault}; only a
 * plain {@link IllegalArgumentException} with a sentence goes through, since by contract it says
 * what is wrong with the user's parameters. The plugin sees a copy of the parameters, so that it
 * cannot change the site.
 */
final class GuardedSource implements PullSource {
  private final String pluginId;
  private final PullSource source;
  private final SourceDescription description;

  /**
   * Takes a source in and asks what it is.
   *
   * @throws SourceFault if it does not say so properly
   */
  GuardedSource(String pluginId, PullSource source) {
    this.pluginId = pluginId;
    this.source = source;
    SourceDescription answer;
    try {
      answer = source.describe();
    } catch (Throwable thrown) {
      throw failed("describe its pull source", thrown);
    }
    if (answer == null) {
      throw nonsense("describes its pull source by nothing at all", null);
    }
    description = answer;
  }

  @Override
  public SourceDescription describe() {
    return description;
  }

  @Override
  public List<String> modes(ObjectNode parameters) {
    List<String> answer =
        guarded("list its modes", () -> copied(source.modes(parameters.deepCopy())));
    if (answer == null
        || answer.isEmpty()
        || answer.stream().anyMatch(m -> m == null || m.isBlank())
        || new HashSet<>(answer).size() != answer.size()) {
      throw nonsense("lists no usable modes", null);
    }
    return answer;
  }

  @Override
  public double lineHeightM(ObjectNode parameters) {
    double answer =
        guarded("say how high its line is", () -> source.lineHeightM(parameters.deepCopy()));
    if (!(answer >= 0 && answer <= 5)) {
      throw nonsense("says its line is " + answer + " m high; it must be from 0 to 5 m", null);
    }
    return answer;
  }

  @Override
  public HaulLine haulLine(ObjectNode parameters, String mode) {
    HaulLine answer =
        guarded("say what it is rigged with", () -> source.haulLine(parameters.deepCopy(), mode));
    if (answer == null && description.needsDriver()) {
      throw nonsense("needs another source to haul it and names no line for that", null);
    }
    return answer;
  }

  @Override
  public PullOffer offer(PullRequest request) {
    PullOffer answer =
        guarded(
            "work out its pull", () -> source.offer(request.with(request.parameters().deepCopy())));
    if (answer == null) {
      throw nonsense("gives no pull at all, not even none", null);
    }
    return answer;
  }

  private <T> T guarded(String what, Supplier<T> call) {
    try {
      return call.get();
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

  /**
   * The answer's own constructors refuse what is out of range while the plugin builds it: that is
   * the plugin's mistake, not the user's.
   */
  private static boolean isAnswerOutOfRange(IllegalArgumentException e) {
    String answer = PullOffer.class.getName();
    return Arrays.stream(e.getStackTrace())
        .map(StackTraceElement::getClassName)
        .anyMatch(name -> name.equals(answer) || name.startsWith(answer + "$"));
  }

  /** Subclasses, such as that of a number that does not parse, are no sentences for the user. */
  private static boolean isAboutParameters(IllegalArgumentException e) {
    return e.getClass() == IllegalArgumentException.class
        && e.getMessage() != null
        && !e.getMessage().isBlank();
  }

  private static List<String> copied(List<String> answer) {
    return answer == null ? null : Arrays.asList(answer.toArray(new String[0]));
  }

  private SourceFault failed(String what, Throwable thrown) {
    return new SourceFault(
        "The plugin \"" + pluginId + "\" failed to " + what + ": " + Plainly.said(thrown) + ".",
        thrown);
  }

  private SourceFault nonsense(String what, Throwable cause) {
    return new SourceFault("The plugin \"" + pluginId + "\" " + what + ".", cause);
  }
}
