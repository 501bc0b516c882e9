#!/usr/bin/env bash
# The whole front of a network with measures beside single deadlines of it by cbc and OR-Tools
# CP-SAT, on the same machine in the same run.
#
#   src/bench/compare-measures.sh [SIZE NODES SECONDS]     (default: 60 5500 60)
#
# Needs JDK 17, Maven, and Debian's package coinor-cbc. NODES is how many relaxations Dayworth
# solves for each finish on average, SECONDS what each of the others may take for a deadline.
set -euo pipefail
export LC_ALL=C
cd "$(dirname "$0")/../.."

command -v cbc >/dev/null || { echo "compare-measures: needs cbc (Debian package coinor-cbc)" >&2; exit 2; }
mvn -B -ntp -q -Pbench -DskipTests package
java -Xmx2g -cp target/benchmarks.jar dayworth.bench.MeasureComparison "${1:-60}" "${2:-5500}" "${3:-60}"
