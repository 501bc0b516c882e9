package dayworth.bench;

import dayworth.engine.Curve;
import dayworth.engine.PieceWitness;
import dayworth.engine.stepping.Prices;
import dayworth.engine.stepping.Stepping;
import dayworth.network.Network;
import dayworth.value.SlopeScale;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/** The whole exact curve by the engine alone: no file is read and no answer is written. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.SingleShotTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Fork(value = 1, jvmArgsAppend = "-Xmx1g")
@Warmup(iterations = 3)
@Measurement(iterations = 3)
public class CurveBenchmark {

  /** Which network; the names of {@link Shape}. */
  @Param({"WIDE10K", "WIDE100K", "CHAIN10K"})
  public Shape shape;

  private Network network;
  private SlopeScale scale;

  /** Generates the network, outside the time that is taken. */
  @Setup
  public void generate() {
    network = shape.network();
    scale = Stepping.scaleFor(network).orElseThrow();
  }

  /** Every breakpoint with its price and its flow, which proves it: the method alone. */
  @Benchmark
  public Prices prices() {
    return Stepping.prices(network, scale);
  }

  /** The same with a plan at every breakpoint, chosen among ties by the tie rule. */
  @Benchmark
  public Curve curve() {
    return Stepping.curve(network, PieceWitness.NONE);
  }
}
