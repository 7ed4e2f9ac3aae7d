"""Hourly ingest against DuckDB: the same packed CSV files, the same monthly wet hours, two threads.

    mvn -q -B -DskipTests package
    pip install duckdb
    python src/bench/stations_against_duckdb.py WORK_FOLDER 10 100

For each number of station years it writes an invented archive (10 years a station), times DuckDB and
`ingest stations` on it in turn, five times each, and checks that both count the same wet hours. The
ingest is given twice: reading, testing and counting alone, as it tells itself, and the whole command
with the start of the JVM, the shipped world, the tables and the stations left out in turn. DuckDB is
the query alone. Peak heap is that of the collector's log; HEAP sets its limit. DuckDB is a reference
here and no part of the program.
"""

import csv
import glob
import gzip
import os
import re
import subprocess
import sys
import time

import duckdb

JAR = "target/saltspoke.jar"
QUERY = """
SELECT station, month(time) AS month,
       count(*) FILTER (WHERE t > 0 AND 100 * exp(17.62 * td / (243.12 + td)
                                                  - 17.62 * t / (243.12 + t)) > 80) AS wet,
       count(*) AS hours
FROM read_csv('{files}', header = true, columns = {{
       'station': 'VARCHAR', 'lat': 'DOUBLE', 'lon': 'DOUBLE', 'elev': 'DOUBLE',
       'time': 'TIMESTAMP', 't': 'DOUBLE', 'td': 'DOUBLE', 'dir': 'DOUBLE', 'speed': 'DOUBLE'}})
GROUP BY ALL
"""


def by_duckdb(folder):
    begin = time.perf_counter()
    connection = duckdb.connect(config={"threads": 2})
    rows = connection.execute(QUERY.format(files=folder + "/*.csv.gz")).fetchall()
    return time.perf_counter() - begin, {(r[0], r[1]): (r[2], r[3]) for r in rows}


def by_ingest(folder, into, heap):
    log = into + ".gc"
    begin = time.perf_counter()
    told = subprocess.run(
        ["java", f"-Xmx{heap}", f"-Xlog:gc*=info:file={log}", "-jar", JAR, "ingest", "stations",
         folder, "--mapping", os.path.dirname(folder) + "/mapping.csv", "--least-years", "1",
         "--threads", "2", "--into", into],
        check=True, stdout=subprocess.DEVNULL, stderr=subprocess.PIPE, text=True).stderr
    rate = int(re.findall(r"rows, ([\d,]+) a second", told)[-1].replace(",", ""))
    spent = time.perf_counter() - begin
    counts = {}
    with gzip.open(glob.glob(into + "/station-months-*.gz")[0], "rt") as table:
        for row in csv.DictReader(table):
            counts[row["station"], int(row["month"])] = (float(row["wet_hours"]), int(row["reports"]))
    peak = max(int(m) for m in re.findall(r"(\d+)M->\d+M", open(log).read()) or ["0"])
    return spent, counts, peak, rate


def main():
    work = os.path.abspath(sys.argv[1])
    heap = os.environ.get("HEAP", "256m")
    for station_years in map(int, sys.argv[2:]):
        folder = f"{work}/a{station_years}/in"
        if not os.path.isdir(folder):
            subprocess.run(
                ["java", "-cp", "target/test-classes:target/classes",
                 "saltspoke.atlas.stations.InventedArchive", folder, str(station_years // 10), "10"],
                check=True)
        times = {"duckdb": [], "ingest": []}
        rates = []
        for _ in range(5):
            spent, theirs = by_duckdb(folder)
            times["duckdb"].append(spent)
            spent, ours, peak, rate = by_ingest(folder, f"{work}/a{station_years}/set", heap)
            rates.append(rate)
            times["ingest"].append(spent)
        rows = sum(hours for _, hours in theirs.values())
        days = [31, 28.25, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31]
        off = max(
            abs(ours[key][0] - wet * days[key[1] - 1] * 24 / hours)
            for key, (wet, hours) in theirs.items())
        reports = sum(r for _, r in ours.values())
        median = {name: sorted(t)[2] for name, t in times.items()}
        reading = sorted(rates)[2]
        duckdb_rate = rows / median["duckdb"]
        print(
            f"{station_years} station years, {rows:,} rows: "
            f"DuckDB {duckdb_rate:,.0f} rows/s; "
            f"ingest reading {reading:,} rows/s ({reading / duckdb_rate:.2f} of DuckDB), "
            f"whole command {rows / median['ingest']:,.0f} rows/s "
            f"({median['duckdb'] / median['ingest']:.2f}); "
            f"largest heap before a collection {peak} MB of {heap}; "
            f"largest difference {off:.3f} wet hours a month, {rows - reports} rows struck out")


if __name__ == "__main__":
    main()
