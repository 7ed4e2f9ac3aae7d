package saltspoke.atlas.stations;

import java.io.DataInput;
import java.io.DataOutput;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import saltspoke.atmosphere.stations.MonthSums;
import saltspoke.atmosphere.stations.YearStatistics;
import saltspoke.sources.hourly.HourlyStation;
import saltspoke.values.Refusal;

/** The stored form of an outcome; whole numbers are written in as few bytes as they need. */
final class OutcomeCodec {
  private static final int SEVEN_BITS = 7;
  private static final int MORE = 0x80;

  private OutcomeCodec() {}

  static void write(FileOutcome outcome, DataOutput out) throws IOException {
    out.writeUTF(outcome.file());
    out.writeBoolean(outcome.refusal().isPresent());
    if (outcome.refusal().isPresent()) {
      Refusal refusal = outcome.refusal().get();
      out.writeUTF(refusal.error());
      out.writeUTF(refusal.field());
      out.writeUTF(refusal.was());
      out.writeUTF(refusal.allowed());
      return;
    }
    number(out, outcome.years().size());
    for (StationYearRecord year : outcome.years()) {
      write(year, out);
    }
  }

  static FileOutcome read(DataInput in) throws IOException {
    String file = in.readUTF();
    if (in.readBoolean()) {
      return new FileOutcome(
          file,
          List.of(),
          Optional.of(Refusal.dataDamaged(in.readUTF(), in.readUTF(), in.readUTF(), in.readUTF())));
    }
    int count = (int) number(in);
    List<StationYearRecord> years = new ArrayList<>(count);
    for (int i = 0; i < count; i++) {
      years.add(year(in));
    }
    return new FileOutcome(file, years, Optional.empty());
  }

  private static void write(StationYearRecord entry, DataOutput out) throws IOException {
    HourlyStation station = entry.station();
    out.writeUTF(station.id());
    out.writeUTF(station.name());
    out.writeDouble(station.latitudeDeg());
    out.writeDouble(station.longitudeDeg());
    out.writeDouble(station.elevationM());
    out.writeByte(station.kind().ordinal());
    out.writeBoolean(station.utc());
    YearStatistics year = entry.year();
    YearStatistics.Quality quality = year.quality();
    for (long value :
        new long[] {
          year.year(),
          quality.rows(),
          quality.impossible(),
          quality.spikes(),
          quality.stuck(),
          quality.dewPointAbove(),
          quality.duplicates(),
          quality.reports(),
          quality.gaps(),
          quality.rhythm(),
          quality.tooFew(),
          quality.longGap()
        }) {
      number(out, value);
    }
    for (Optional<MonthSums> month : year.months()) {
      out.writeBoolean(month.isPresent());
      if (month.isPresent()) {
        for (long value : month.get().stored()) {
          number(out, value);
        }
      }
    }
  }

  private static StationYearRecord year(DataInput in) throws IOException {
    HourlyStation station =
        new HourlyStation(
            in.readUTF(),
            in.readUTF(),
            in.readDouble(),
            in.readDouble(),
            in.readDouble(),
            HourlyStation.Kind.values()[in.readByte()],
            in.readBoolean());
    int year = (int) number(in);
    YearStatistics.Quality quality =
        new YearStatistics.Quality(
            number(in),
            number(in),
            number(in),
            number(in),
            number(in),
            number(in),
            number(in),
            number(in),
            (int) number(in),
            (int) number(in),
            (int) number(in));
    List<Optional<MonthSums>> months = new ArrayList<>();
    for (int month = 0; month < 12; month++) {
      if (!in.readBoolean()) {
        months.add(Optional.empty());
        continue;
      }
      long[] stored = new long[MonthSums.SIZE];
      for (int i = 0; i < stored.length; i++) {
        stored[i] = number(in);
      }
      months.add(Optional.of(MonthSums.of(stored)));
    }
    return new StationYearRecord(station, new YearStatistics(year, quality, months));
  }

  /** Sign in the lowest bit, then seven bits a byte. */
  private static void number(DataOutput out, long value) throws IOException {
    long left = (value << 1) ^ (value >> (Long.SIZE - 1));
    while ((left & -MORE) != 0) {
      out.writeByte((int) (left & (MORE - 1)) | MORE);
      left >>>= SEVEN_BITS;
    }
    out.writeByte((int) left);
  }

  private static long number(DataInput in) throws IOException {
    long left = 0;
    int shift = 0;
    int part;
    do {
      part = in.readUnsignedByte();
      left |= (long) (part & (MORE - 1)) << shift;
      shift += SEVEN_BITS;
    } while ((part & MORE) != 0);
    return (left >>> 1) ^ -(left & 1);
  }
}
