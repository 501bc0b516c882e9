#!/usr/bin/env bash
# The whole exact curve by Dayworth's engine beside ONE deadline by a general linear-programming
# solver, clp, on the same machine in the same run.
#
#   src/bench/compare-clp.sh [SHAPE...]     (default: WIDE10K CHAIN10K; WIDE100K takes minutes)
#
# Needs JDK 17, Maven, and Debian's packages coinor-clp and time.
#
# How it is measured
# - clp: best of three processes, dual simplex with clp's own presolve, which is its default. Its
#   last line, "Optimal objective ... iterations time X", counts presolve, simplex and postsolve
#   but neither reading the file nor starting the process: that is the solve time to compare. Wall
#   time of the whole process, reading included, is printed beside it.
# - engine: best of three JMH iterations after three warm-up iterations in one process with 1 GB of
#   heap. The network lies in memory when the time starts, as the problem does in clp's solve time.
#   No file is read. "prices" is every breakpoint with its price and flow; "plans" is the same with
#   a plan at every breakpoint, chosen among equally cheap ones.
# - The ratio is prices / clp solve: below 1 the whole curve takes less time than one deadline.
set -euo pipefail
export LC_ALL=C
cd "$(dirname "$0")/../.."

[ -x /usr/bin/time ] || { echo "compare-clp: needs /usr/bin/time (Debian package time)" >&2; exit 2; }
command -v clp >/dev/null || { echo "compare-clp: needs clp (Debian package coinor-clp)" >&2; exit 2; }

shapes=("$@")
[ ${#shapes[@]} -gt 0 ] || shapes=(WIDE10K CHAIN10K)
jar=target/benchmarks.jar
scratch=$(mktemp -d)
trap 'rm -rf "$scratch"' EXIT

mvn -B -ntp -q -Pbench -DskipTests package

smallest() { sort -g | head -n 1; }

# Milliseconds, the best iteration of one benchmark on one network.
engine() {
  java -jar "$jar" "CurveBenchmark.$2\$" -p shape="$1" -foe true >"$scratch/jmh.log" \
    || { cat "$scratch/jmh.log" >&2; exit 1; }
  best=$(sed -nE 's/^Iteration +[0-9]+: ([0-9.]+) ms\/op.*/\1/p' "$scratch/jmh.log" | smallest)
  [ -n "$best" ] || { echo "compare-clp: no time in JMH's answer for $1" >&2; exit 1; }
  echo "$best"
}

rows=()
for shape in "${shapes[@]}"; do
  java -cp "$jar" dayworth.bench.GenerateNetwork "$shape" --lp "$scratch/$shape.lp"
  : >"$scratch/solve"
  : >"$scratch/wall"
  for _ in 1 2 3; do
    /usr/bin/time -f %e -a -o "$scratch/wall" \
      clp "$scratch/$shape.lp" -dualsimplex >"$scratch/clp.log"
    # clp ends with status 0 whether it has an answer or not, so its words decide.
    grep '^Optimal objective' "$scratch/clp.log" >"$scratch/optimal" \
      || { echo "compare-clp: clp found no optimum for $shape" >&2; exit 1; }
    sed -E 's/.*iterations time ([0-9.]+).*/\1/' "$scratch/optimal" >>"$scratch/solve"
  done
  prices=$(engine "$shape" prices)
  plans=$(engine "$shape" curve)
  rows+=("$shape $prices $plans $(smallest <"$scratch/solve") $(smallest <"$scratch/wall")")
done

printf '\n%-10s %10s %10s %12s %12s %15s\n' \
  network "prices s" "plans s" "clp solve s" "clp wall s" "prices / solve"
for row in "${rows[@]}"; do
  awk '{ printf "%-10s %10.2f %10.2f %12.2f %12.2f %15.2f\n",
         $1, $2 / 1000, $3 / 1000, $4, $5, $2 / 1000 / $4 }' <<<"$row"
done
