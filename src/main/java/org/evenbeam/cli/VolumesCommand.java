package org.evenbeam.cli;

import static org.evenbeam.wording.Words.Bundle.COMMAND;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.PrintWriter;
import java.math.BigDecimal;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import org.evenbeam.logbook.files.WeighingFiles;
import org.evenbeam.metrology.AmbientAir;
import org.evenbeam.metrology.VolumeErrors;
import org.evenbeam.metrology.WeighedVolume;
import org.evenbeam.metrology.ZFactor;
import org.evenbeam.wording.Figures;
import org.evenbeam.wording.Words;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;

/** Turns weighings of water into volumes and their errors, without a logbook (ISO 8655-6). */
@Command(
    name = "volumes",
    mixinStandardHelpOptions = true,
    description = {
      "Turns weighings of water into volumes, with systematic and random error (ISO 8655-6).",
      "Exit status: 0 done; 2 bad input."
    })
final class VolumesCommand implements Callable<Integer> {
  @Option(
      names = "--weighings",
      required = true,
      paramLabel = "FILE",
      description = "CSV with one column, mass_mg, in order.")
  private Path weighings;

  @Option(
      names = "--nominal",
      required = true,
      description = "The nominal or selected volume, in µL.")
  private BigDecimal nominal;

  @Option(
      names = "--water-temperature",
      required = true,
      description = "In °C, within 15 to 30 for the usual work.")
  private double waterTemperature;

  @Option(names = "--pressure", required = true, description = "Of the air, in hPa.")
  private double pressure;

  @Option(
      names = "--humidity",
      defaultValue = "50",
      description = "Relative, in %%; by default ${DEFAULT-VALUE}.")
  private double humidity;

  @Option(names = "--air-temperature", description = "In °C; by default that of the water.")
  private Optional<Double> airTemperature = Optional.empty();

  @Option(
      names = "--evaporation",
      defaultValue = "0",
      description = "Evaporated in each weighing, in mg; by default ${DEFAULT-VALUE}.")
  private BigDecimal evaporation;

  @Option(
      names = "--simplified",
      description = "By the simplified formulas of ISO/TR 20461 in place of Tanaka and CIPM-2007.")
  private boolean simplified;

  @Option(names = "--json", description = "Print one JSON object, every figure in full.")
  private boolean json;

  @Spec private CommandSpec spec;

  private final WeighingFiles files;
  private final Words words;
  private final Figures figures;

  VolumesCommand(WeighingFiles files, Words words, Figures figures) {
    this.files = files;
    this.words = words;
    this.figures = figures;
  }

  @Override
  public Integer call() {
    List<BigDecimal> masses = files.read(weighings);
    try {
      double z = zFactor();
      List<BigDecimal> volumes =
          masses.stream()
              .map(mass -> new WeighedVolume(mass, evaporation, z).microlitres())
              .toList();
      print(z, volumes, VolumeErrors.of(volumes, nominal));
      return 0;
    } catch (IllegalArgumentException outside) {
      PrintWriter errors = spec.commandLine().getErr();
      errors.println(words.text(COMMAND, "volumes.refused", outside.getMessage()));
      errors.flush();
      return Failure.STATUS;
    }
  }

  private double zFactor() {
    ZFactor formulas = simplified ? ZFactor.ISO_TR_20461 : ZFactor.TANAKA_CIPM_2007;
    double air = airTemperature.orElse(waterTemperature);
    return formulas.at(waterTemperature, AmbientAir.ofRoom(air, pressure, humidity));
  }

  private void print(double z, List<BigDecimal> volumes, VolumeErrors errors) {
    PrintWriter out = spec.commandLine().getOut();
    if (json) {
      out.println(json(z, volumes, errors).toPrettyString());
    } else {
      out.println(
          words.text(
              COMMAND,
              "volumes.found",
              Integer.toString(volumes.size()),
              figures.toPlaces(errors.mean(), 3),
              figures.signedToPlaces(errors.systematic(), 3),
              figures.signedToPlaces(errors.systematicPercent(), 2),
              figures.toPlaces(z, 5)));
      errors
          .randomPercent()
          .ifPresent(
              percent ->
                  out.println(
                      words.text(
                          COMMAND,
                          "volumes.random",
                          figures.toPlaces(errors.random().orElseThrow(), 3),
                          figures.toPlaces(percent, 2))));
    }
    out.flush();
  }

  private static ObjectNode json(double z, List<BigDecimal> volumes, VolumeErrors errors) {
    ObjectNode node = JsonNodeFactory.instance.objectNode();
    JsonNumbers.put(node, "z_factor", z);
    ArrayNode array = node.putArray("volumes_ul");
    volumes.forEach(array::add);
    JsonNumbers.put(node, "mean_ul", errors.mean());
    JsonNumbers.put(node, "systematic_error_ul", errors.systematic());
    JsonNumbers.put(node, "systematic_error_percent", errors.systematicPercent());
    JsonNumbers.put(node, "random_error_ul", errors.random());
    JsonNumbers.put(node, "coefficient_of_variation_percent", errors.randomPercent());
    return node;
  }
}
