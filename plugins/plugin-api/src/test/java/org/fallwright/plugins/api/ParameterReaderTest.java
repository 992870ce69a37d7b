package org.fallwright.plugins.api;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.assertThatIllegalStateException;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import java.util.Set;
import org.fallwright.core.pull.Parameter;
import org.fallwright.core.pull.Parameter.Choice;
import org.fallwright.core.pull.SourceDescription;
import org.fallwright.core.pull.SourceDescription.PlaceKind;
import org.fallwright.core.pull.Wording;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ParameterReaderTest {
  private static final Wording SAID = new Wording("said", "dicho");
  private static final SourceDescription MULE =
      new SourceDescription(
          "mule",
          new Wording("mule", "mula"),
          Set.of(PlaceKind.SPOT),
          false,
          List.of(
              Parameter.number("mass_kg", "kg", 100, 700, SAID, SAID),
              Parameter.wholeNumber("legs", 1, 4, SAID, SAID).mayBeLeftOut(),
              Parameter.flag("willing", SAID, SAID).mayBeLeftOut(),
              Parameter.choice(
                      "gait",
                      SAID,
                      SAID,
                      Choice.of("walk", "walk", "paso"),
                      Choice.of("trot", "trot", "trote"))
                  .mayBeLeftOut(),
              Parameter.choices(
                      "loads", SAID, SAID, Choice.of("1", "1", "1"), Choice.of("2", "2", "2"))
                  .mayBeLeftOut(),
              Parameter.number("stride_m", "m", 0.1, 2, SAID, SAID).onlyWhere("gait", "trot")));

  @Test
  void readsEveryKindOfValue() {
    ParameterReader reader =
        read(
            "{'mass_kg':350.5,'legs':4,'willing':false,'gait':'trot','loads':[2,'1'],'stride_m':1}");
    assertThat(reader.number("mass_kg")).isEqualTo(350.5);
    assertThat(reader.wholeNumber("legs")).isEqualTo(4);
    assertThat(reader.flag("willing")).isFalse();
    assertThat(reader.choice("gait")).isEqualTo("trot");
    assertThat(reader.choices("loads")).containsExactly("1", "2");
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      quoteCharacter = '"',
      value = {
        "{'ears':2} | ears is not a parameter of the mule; it knows mass_kg, legs, willing, gait, loads, stride_m",
        "{'mass_kg':'heavy'} | mass_kg is \"heavy\"; it must be a number from 100 to 700 kg",
        "{'mass_kg':701} | mass_kg is 701 kg; it must be from 100 to 700 kg",
        "{'mass_kg':1e999} | mass_kg is infinite kg; it must be from 100 to 700 kg",
        "{'legs':2.5} | legs is 2.5; it must be a whole number from 1 to 4",
        "{'legs':0} | legs is 0; it must be from 1 to 4",
        "{'willing':1} | willing is 1; it must be true or false",
        "{'gait':'gallop'} | gait is \"gallop\"; it must be one of \"walk\", \"trot\"",
        "{'loads':[]} | loads is []; it must be a list of one or more of \"1\", \"2\", each at most once",
        "{'loads':[1,1]} | loads is [1,1]; it must be a list of one or more of \"1\", \"2\", each at most once",
        "{'loads':[3]} | loads is [3]; it must be a list of one or more of \"1\", \"2\", each at most once",
        "{'loads':[true]} | loads is [true]; it must be a list of one or more of \"1\", \"2\", each at most once",
      })
  void refusesAWrongValueInOneSentence(String json, String sentence) {
    assertThatIllegalArgumentException().isThrownBy(() -> read(json)).withMessage(sentence);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      quoteCharacter = '"',
      value = {
        "{} | mass_kg is missing; it must be a number from 100 to 700 kg",
        "{'mass_kg':null} | mass_kg is missing; it must be a number from 100 to 700 kg",
        "{'mass_kg':300,'gait':'trot'} | stride_m is missing; it must be a number from 0.1 to 2 m",
        "{'mass_kg':300,'gait':'walk','stride_m':1} | stride_m is 1; it must be left out where gait is \"walk\"",
        "{'mass_kg':300,'stride_m':1} | stride_m is 1; it must be left out where gait is not stated",
      })
  void refusesWhatIsMissingAndWhatDoesNotApply(String json, String sentence) {
    assertThatIllegalArgumentException().isThrownBy(() -> read(json)).withMessage(sentence);
  }

  @Test
  void whatMayBeLeftOutIsRefusedOnlyWhereItIsAskedFor() {
    ParameterReader reader = read("{'mass_kg':300,'legs':null}");
    assertThat(reader.isStated("legs")).isFalse();
    assertThat(reader.numberOrNull("stride_m")).isNull();
    assertThatIllegalArgumentException()
        .isThrownBy(() -> reader.wholeNumber("legs"))
        .withMessage("legs is missing; it must be a whole number from 1 to 4");
  }

  @Test
  void askingForWhatTheDescriptionDoesNotHaveIsTheSourcesOwnMistake() {
    assertThatIllegalStateException()
        .isThrownBy(() -> read("{'mass_kg':300,'legs':3}").number("legs"));
  }

  private static ParameterReader read(String json) {
    try {
      return new ParameterReader(
          MULE, (ObjectNode) new ObjectMapper().readTree(json.replace('\'', '"')));
    } catch (JsonProcessingException e) {
      throw new IllegalArgumentException("test input is not JSON", e);
    }
  }
}
