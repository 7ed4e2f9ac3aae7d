#!/usr/bin/env bash
# Compares the program with the same fields and formulas in NumPy and SciPy: class of steel at the
# land points of a world grid, from the same files, in one run on the same machine.
# Usage: src/bench/compare.sh [STEP_DEG] after `mvn -B -q -DskipTests package`.
# Wall times mean something on a quiet machine only; CPU times bear some company.
# Needs GNU time, and python3 with numpy, scipy and tifffile (PYTHON names another one).
set -euo pipefail
cd "$(dirname "$0")/../.."
step="${1:-0.5}"
python="${PYTHON:-python3}"
work="$(mktemp -d)"
trap 'rm -rf "$work"' EXIT
class_path="target/saltspoke.jar:target/test-classes"

measured() { # name, command…
  local name="$1"
  shift
  /usr/bin/time -f "%e %U %S %M" -o "$work/$name.time" "$@"
  awk -v name="$name" \
    '{ printf "%-22s wall %7.2f s  CPU %7.2f s  peak memory %7.0f MB\n", name, $1, $2 + $3, $4 / 1024 }' \
    "$work/$name.time"
}

echo "== points and sea views at $step°, for both"
java -cp "$class_path" saltspoke.bench.SteelClassRun points climate-data "$work/points.f32" "$step"

echo "== class of steel"
measured java java -Xmx64m -XX:+UseParallelGC -cp "$class_path" \
  saltspoke.bench.SteelClassRun classes climate-data "$work/points.f32" "$work/java.u8"
measured numpy "$python" src/bench/steel_class.py climate-data "$work/points.f32" "$work/numpy.u8"
measured numpy-2-processes "$python" src/bench/steel_class.py climate-data "$work/points.f32" \
  "$work/numpy2.u8" --processes 2
measured numpy-in-pieces "$python" src/bench/steel_class.py climate-data "$work/points.f32" \
  "$work/numpy3.u8" --processes 2 --chunk 4096

"$python" - "$work" <<'PY'
import sys
import numpy as np

work = sys.argv[1]
java = np.fromfile(work + "/java.u8", dtype=np.uint8)
numpy = np.fromfile(work + "/numpy.u8", dtype=np.uint8)
same = (java == numpy).mean()
print(f"same class at {100 * same:.4f} % of {len(java)} points, {(java != numpy).sum()} differ")
for other in ("numpy", "numpy-2-processes", "numpy-in-pieces"):
    a = [float(x) for x in open(f"{work}/java.time").read().split()]
    b = [float(x) for x in open(f"{work}/{other}.time").read().split()]
    cpu = (a[1] + a[2]) / (b[1] + b[2])
    print(f"java over {other}: wall {a[0] / b[0]:.2f}, CPU {cpu:.2f}, memory {a[3] / b[3]:.2f}")
sys.exit(0 if same >= 0.999 else 1)
PY
