package org.fallwright.core.store;

import com.fasterxml.jackson.core.StreamReadFeature;
import com.fasterxml.jackson.core.StreamWriteFeature;
import com.fasterxml.jackson.core.json.JsonReadFeature;
import com.fasterxml.jackson.core.json.JsonWriteFeature;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import com.fasterxml.jackson.core.util.Separators;
import com.fasterxml.jackson.databind.DeserializationFeature;
import com.fasterxml.jackson.databind.MapperFeature;
import com.fasterxml.jackson.databind.ObjectWriter;
import com.fasterxml.jackson.databind.PropertyNamingStrategies;
import com.fasterxml.jackson.databind.cfg.CoercionAction;
import com.fasterxml.jackson.databind.cfg.CoercionInputShape;
import com.fasterxml.jackson.databind.cfg.MapperConfig;
import com.fasterxml.jackson.databind.introspect.AnnotatedClass;
import com.fasterxml.jackson.databind.introspect.JacksonAnnotationIntrospector;
import com.fasterxml.jackson.databind.json.JsonMapper;
import com.fasterxml.jackson.databind.type.LogicalType;
import java.util.Locale;

/** How the records of site and kit are spelled in JSON, and how strictly JSON is bound to them. */
final class SiteJson {
  /** Binds JSON to those records and refuses whatever the library would make fit. */
  static final JsonMapper MAPPER = mapper();

  /** Two spaces, line feed on every system, fields in the order of the records. */
  static final ObjectWriter WRITER =
      MAPPER.writer(
          new DefaultPrettyPrinter(
                  Separators.createDefaultInstance()
                      .withObjectEntrySpacing(Separators.Spacing.NONE)
                      .withObjectFieldValueSpacing(Separators.Spacing.AFTER)
                      .withArrayEmptySeparator("")
                      .withObjectEmptySeparator(""))
              .withObjectIndenter(new DefaultIndenter("  ", "\n")));

  private SiteJson() {}

  /** Name in the file of a record's component: {@code breakingLoadN} is breaking_load_N. */
  static String fieldName(String component) {
    return new FieldNames().translate(component);
  }

  /** Word in the file of an enum's constant: {@code DEAD_AND_EARTHED} is dead-and-earthed. */
  static String word(Enum<?> constant) {
    return constant.name().toLowerCase(Locale.ROOT).replace('_', '-');
  }

  private static JsonMapper mapper() {
    JsonMapper.Builder builder =
        JsonMapper.builder()
            .propertyNamingStrategy(new FieldNames())
            .annotationIntrospector(new Words())
            .enable(
                DeserializationFeature.FAIL_ON_UNKNOWN_PROPERTIES,
                DeserializationFeature.FAIL_ON_MISSING_CREATOR_PROPERTIES,
                DeserializationFeature.FAIL_ON_NULL_FOR_PRIMITIVES,
                DeserializationFeature.FAIL_ON_NUMBERS_FOR_ENUMS,
                DeserializationFeature.FAIL_ON_READING_DUP_TREE_KEY)
            .disable(DeserializationFeature.ACCEPT_FLOAT_AS_INT)
            .disable(MapperFeature.ALLOW_COERCION_OF_SCALARS)
            // let through here so that the field can be named; refused by Tree
            .enable(JsonReadFeature.ALLOW_NON_NUMERIC_NUMBERS)
            // refused by Tree on reading back, never quoted into a text
            .disable(JsonWriteFeature.WRITE_NAN_AS_STRINGS)
            // the shortest digits, the same on every Java
            .enable(StreamWriteFeature.USE_FAST_DOUBLE_WRITER)
            .disable(StreamReadFeature.INCLUDE_SOURCE_IN_LOCATION)
            .withCoercionConfig(
                LogicalType.Textual,
                c -> {
                  for (CoercionInputShape shape : CoercionInputShape.values()) {
                    c.setCoercion(shape, CoercionAction.Fail);
                  }
                });
    return builder.build();
  }

  private static final class FieldNames extends PropertyNamingStrategies.SnakeCaseStrategy {
    private static final long serialVersionUID = 1;

    @Override
    public String translate(String component) {
      return super.translate(component).replaceAll("_n$", "_N").replaceAll("_pa$", "_Pa");
    }
  }

  private static final class Words extends JacksonAnnotationIntrospector {
    private static final long serialVersionUID = 1;

    @Override
    public String[] findEnumValues(
        MapperConfig<?> config, AnnotatedClass type, Enum<?>[] constants, String[] names) {
      for (int i = 0; i < constants.length; i++) {
        names[i] = word(constants[i]);
      }
      return names;
    }
  }
}
