package org.evenbeam.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class VolumesCommandTest {
  @TempDir private Path folder;

  private Cli volumes(String weighings, String... options) throws IOException {
    Path file = Files.writeString(folder.resolve("W.csv"), weighings);
    String[] command = {
      "volumes", "--weighings", file.toString(), "--nominal", "1000", "--pressure", "1013"
    };
    String[] all = Arrays.copyOf(command, command.length + options.length);
    System.arraycopy(options, 0, all, command.length, options.length);
    return Cli.run(all);
  }

  /** ISO 8655-6:2002, table of Z: 1.0029 µL/mg at 20 °C and 101.3 kPa (from memory). */
  @Test
  void weighingsBecomeVolumesByThePublishedFactor() throws IOException {
    Cli cli =
        volumes(
            "mass_mg\n996.0\n997.0\n998.0\n",
            "--water-temperature",
            "20",
            "--simplified",
            "--json");

    JsonNode found = new ObjectMapper().readTree(cli.out());
    assertThat(cli.exit()).as(cli.err()).isZero();
    assertThat(found.get("z_factor").asDouble()).isCloseTo(1.0029, within(5e-5));
    assertThat(found.get("volumes_ul")).hasSize(3);
    double mean = 997 * found.get("z_factor").asDouble();
    assertThat(found.get("mean_ul").asDouble()).isCloseTo(mean, within(1e-9));
    assertThat(found.get("systematic_error_ul").asDouble()).isCloseTo(mean - 1000, within(1e-9));
    assertThat(found.get("coefficient_of_variation_percent").asDouble())
        .isCloseTo(100.0 / 997, within(1e-9));
  }

  @Test
  void aRoomOutsideTheFormulasIsRefusedByName() throws IOException {
    Cli cli = volumes("mass_mg\n996.0\n", "--water-temperature", "95");

    assertThat(cli.exit()).isEqualTo(2);
    assertThat(cli.out()).isEmpty();
    assertThat(cli.err()).contains("95");
  }

  @Test
  void badWeighingsAreNamedByTheirPlace() throws IOException {
    Cli cli = volumes("mass_mg\n996.0\nheavy\n", "--water-temperature", "20");

    assertThat(cli.exit()).isEqualTo(2);
    assertThat(cli.err()).contains("line 3, column 1 (mass_mg)");
  }
}
