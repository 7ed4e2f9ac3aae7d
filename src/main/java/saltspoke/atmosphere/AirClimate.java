package saltspoke.atmosphere;

import java.util.List;
import saltspoke.places.Place;
import saltspoke.values.Note;
import saltspoke.values.Quantiles;

/**
 * The whole answer about the outside air at a place.
 *
 * @param months January to December
 * @param chlorideDepositionMgPerM2Day annual mean sea-salt chloride deposition, wet candle
 * @param so2DepositionMgPerM2Day annual mean
 * @param setting as guessed or given
 * @param settingGiven whether the user gave it
 * @param wetnessClass τ1..τ5 of ISO 9223
 * @param salinityClass S0..S3
 * @param sulfurClass P0..P3
 * @param corrosivity one entry per metal, in the order of {@link Metal}
 * @param summary one plain sentence: the class, how sure, and what decides
 * @param flags everything outside a fitted range, clamped or assumed
 */
public record AirClimate(
    Place place,
    List<MonthAir> months,
    AnnualAir annual,
    Quantiles chlorideDepositionMgPerM2Day,
    Quantiles so2DepositionMgPerM2Day,
    Setting setting,
    boolean settingGiven,
    String wetnessClass,
    String salinityClass,
    String sulfurClass,
    List<MetalCorrosivity> corrosivity,
    RoadSalt roadSalt,
    Note summary,
    List<Note> flags) {
  public AirClimate {
    months = List.copyOf(months);
    corrosivity = List.copyOf(corrosivity);
    flags = List.copyOf(flags);
  }
}
