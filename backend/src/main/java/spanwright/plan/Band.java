package spanwright.plan;

import java.util.List;

/**
 * A band the station works on.
 *
 * @param name shown to people
 * @param frequencies MHz, rising
 * @param weight in the score
 * @param receiveOnly solved, but not weighed on power or exposure
 */
public record Band(String name, List<Double> frequencies, double weight, boolean receiveOnly) {
  public Band {
    frequencies = frequencies == null ? List.of() : List.copyOf(frequencies);
  }

  /** The one of its frequencies that stands for the band [MHz]: the middle, of two the upper. */
  public double middleMHz() {
    return frequencies.get(frequencies.size() / 2);
  }
}
