package dayworth.bench;

import dayworth.network.Network;

/** The networks that are timed; parameters of the benchmarks are spelled as here. */
public enum Shape {
  /** 10,000 activities, many near-critical chains, about 800 days. */
  WIDE10K,
  /** 100,000 activities, many near-critical chains, about 1,050 days. */
  WIDE100K,
  /** 10,000 activities in one chain of overlaps, about 21,900 days. */
  CHAIN10K;

  /** The network; always the same one. */
  public Network network() {
    return switch (this) {
      case WIDE10K -> NetworkGenerator.wide(10_000, 51, 20_261);
      case WIDE100K -> NetworkGenerator.wide(100_000, 65, 20_262);
      case CHAIN10K -> NetworkGenerator.chain(10_000, 20_263);
    };
  }
}
