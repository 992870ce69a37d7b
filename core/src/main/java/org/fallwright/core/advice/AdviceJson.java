package org.fallwright.core.advice;

import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.StreamWriteFeature;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import com.fasterxml.jackson.databind.ObjectWriter;
import com.fasterxml.jackson.databind.PropertyNamingStrategies;
import com.fasterxml.jackson.databind.SerializerProvider;
import com.fasterxml.jackson.databind.json.JsonMapper;
import com.fasterxml.jackson.databind.module.SimpleModule;
import com.fasterxml.jackson.databind.ser.std.StdSerializer;
import java.io.IOException;
import java.math.BigDecimal;
import java.math.MathContext;
import java.nio.charset.StandardCharsets;
import java.util.LinkedHashMap;
import java.util.Map;
import org.fallwright.core.plan.Check;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.site.Site;

/**
 * Writes the advice for other programs to read. SI throughout, the unit in each field's name or
 * beside it; a check stands as its id and ratio. A number has nine significant digits; one that is
 * infinite or that nobody can say is null. The same advice gives the same bytes.
 */
public final class AdviceJson {
  /** Name of the format, first field of the document. */
  public static final String FORMAT = "fallwright-advice";

  /** Version written. */
  public static final int VERSION = 1;

  private static final MathContext DIGITS = new MathContext(9);
  private static final ObjectWriter WRITER = writer();

  private AdviceJson() {}

  /**
   * The document, UTF-8, ending with a line feed.
   *
   * @param program version of the program
   */
  public static byte[] write(Site site, Advice advice, String program) {
    return write(FORMAT, site, program, "advice", advice);
  }

  /**
   * A document of the same make that holds another answer.
   *
   * @param format name of the format
   * @param program version of the program
   * @param name field that holds the answer
   * @param answer a record, or a list of records
   */
  public static byte[] write(String format, Site site, String program, String name, Object answer) {
    Map<String, Object> doc = new LinkedHashMap<>();
    doc.put("format", format);
    doc.put("version", VERSION);
    doc.put("program", program);
    doc.put("units", "SI");
    doc.put("site", site.name());
    doc.put("rule_set", site.ruleSet());
    doc.put(name, answer);
    try {
      return (WRITER.writeValueAsString(doc) + "\n").getBytes(StandardCharsets.UTF_8);
    } catch (JsonProcessingException e) {
      throw new IllegalStateException("a record of values could not be written", e);
    }
  }

  /** The setup that the advice is for: its choices, verdict and sentence. */
  private record Subject(
      org.fallwright.core.plan.Setup setup, Verdict verdict, Check weakest, String sentence) {}

  private record CheckRef(String check, double ratio) {}

  private static ObjectWriter writer() {
    SimpleModule ours = new SimpleModule();
    ours.addSerializer(Double.class, new Number());
    ours.addSerializer(double.class, new Number());
    ours.addSerializer(
        Verdict.class, new As<>(Verdict.class, (v, out) -> out.writeString(v.word())));
    ours.addSerializer(
        LimitsCard.Tree.class,
        new As<>(LimitsCard.Tree.class, (t, out) -> out.writeString(t.word())));
    ours.addSerializer(
        Check.class,
        new As<>(Check.class, (c, out) -> out.writePOJO(new CheckRef(c.id(), c.ratio()))));
    ours.addSerializer(
        Judged.class,
        new As<>(
            Judged.class,
            (j, out) ->
                out.writePOJO(new Subject(j.setup(), j.verdict(), j.weakest(), j.sentence()))));
    DefaultIndenter lines = new DefaultIndenter("  ", "\n");
    return JsonMapper.builder()
        .enable(StreamWriteFeature.WRITE_BIGDECIMAL_AS_PLAIN)
        .propertyNamingStrategy(new Named())
        .addModule(ours)
        .build()
        .writer(new DefaultPrettyPrinter().withObjectIndenter(lines).withArrayIndenter(lines));
  }

  /** Lower case words, but newtons and newton metres as such: tension_N, moment_Nm. */
  private static final class Named extends PropertyNamingStrategies.SnakeCaseStrategy {
    private static final long serialVersionUID = 1;

    @Override
    public String translate(String input) {
      return super.translate(input).replaceFirst("_n(m?)$", "_N$1");
    }
  }

  private static final class Number extends StdSerializer<Double> {
    private static final long serialVersionUID = 1;

    Number() {
      super(Double.class);
    }

    @Override
    public void serialize(Double v, JsonGenerator out, SerializerProvider p) throws IOException {
      if (!Double.isFinite(v)) {
        out.writeNull();
      } else {
        out.writeNumber(
            v == 0 ? BigDecimal.ZERO : new BigDecimal(v).round(DIGITS).stripTrailingZeros());
      }
    }
  }

  /** Writes a value. */
  private interface Written<T> {
    void to(T value, JsonGenerator out) throws IOException;
  }

  private static final class As<T> extends StdSerializer<T> {
    private static final long serialVersionUID = 1;
    private final transient Written<T> how;

    As(Class<T> type, Written<T> how) {
      super(type);
      this.how = how;
    }

    @Override
    public void serialize(T value, JsonGenerator out, SerializerProvider p) throws IOException {
      how.to(value, out);
    }
  }
}
