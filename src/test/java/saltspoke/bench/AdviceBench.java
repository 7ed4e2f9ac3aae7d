package saltspoke.bench;

import java.util.List;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import saltspoke.advice.Advice;
import saltspoke.advice.AdviceRequest;
import saltspoke.advice.Advisor;
import saltspoke.advice.Finding;
import saltspoke.advice.PairingAdvice;
import saltspoke.advice.RiskLevel;
import saltspoke.advice.TestClimates;
import saltspoke.atmosphere.AirClimate;
import saltspoke.wheel.Catalogue;
import saltspoke.wheel.Profiles;
import saltspoke.wheel.WheelBuild;

/** Advice on the whole catalogue and on one pairing, warmed, on one thread. */
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 8, time = 2)
@Measurement(iterations = 5, time = 2)
@Fork(1)
@State(Scope.Benchmark)
public class AdviceBench {
  private final Advisor advisor = new Advisor(Catalogue.shipped());
  private final AirClimate air = TestClimates.all().get("maritime-salted");
  private final AdviceRequest all = ask(null, null, null, null);
  private final AdviceRequest one = ask("carbon-bare", "brass-nickel", "none", "stainless");

  private static AdviceRequest ask(String rim, String nipple, String between, String spoke) {
    return new AdviceRequest(
        Profiles.shipped().get("all-winter-commuter"),
        WheelBuild.USUAL,
        rim,
        nipple,
        between,
        spoke,
        RiskLevel.USUAL,
        10,
        0,
        Finding.NOT_LOOKED,
        true);
  }

  @Benchmark
  public Advice wholeCatalogue() {
    return advisor.advise(air, all);
  }

  @Benchmark
  public Advice onePairing() {
    return advisor.advise(air, one);
  }

  @Benchmark
  public List<PairingAdvice> wholeCatalogueWithoutChanges() {
    return advisor.pairings(air, all);
  }

  @Benchmark
  public List<PairingAdvice> onePairingWithoutChanges() {
    return advisor.pairings(air, one);
  }
}
