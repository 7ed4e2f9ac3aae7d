package saltspoke.atlas.stations;

import saltspoke.atmosphere.stations.YearStatistics;
import saltspoke.sources.hourly.HourlyStation;

/** One year of one station as one file tells it. */
public record StationYearRecord(HourlyStation station, YearStatistics year) {}
