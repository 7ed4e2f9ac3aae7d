/** Pictures of an answer: class badges, spans of time, the year. Each carries its numbers as text. */

import { h, s } from "./dom.js";
import * as words from "./words.js";

const { t } = words;
export const CLASSES = ["C1", "C2", "C3", "C4", "C5", "CX"];
const HORIZON_MONTHS = 240;
const MOST_LOOKS = 8;
const LEAST_TICK_GAP = 150;
const TICKS = [1, 3, 6, 12, 24, 60, 120, 240];
const COIN_TOSS_BELOW = 0.6;

/** A corrosivity class: its name, a shade, and as many filled marks as its rank. */
export function badge(category, { small = false } = {}) {
  const rank = CLASSES.indexOf(category) + 1;
  return h(
    "span",
    { class: small ? "badge small" : "badge", "data-class": category },
    h("b", {}, category),
    s(
      "svg",
      { viewBox: "0 0 35 8", "aria-hidden": "true", focusable: "false" },
      CLASSES.map((_, at) =>
        s("rect", { x: at * 6 + 0.5, y: 0.5, width: 4, height: 7, class: at < rank ? "on" : "off" }),
      ),
    ),
  );
}

/** How sure the class is, in words; names both when it is a coin toss. */
export function sureness(probabilities) {
  const ranked = Object.entries(probabilities).sort((a, b) => b[1] - a[1]);
  const [first, second] = ranked;
  if (first[1] >= 0.9) {
    return t("page-sure", { category: first[0] });
  }
  if (first[1] >= COIN_TOSS_BELOW) {
    return t("page-likely", { category: first[0], share: words.percent(first[1]), other: second[0] });
  }
  return t("page-coin-toss", {
    category: first[0],
    share: words.percent(first[1]),
    other: second[0],
    otherShare: words.percent(second[1]),
  });
}

/** A bar cut by the probability of each class. */
export function probabilityBar(probabilities) {
  let x = 0;
  return s(
    "svg",
    { class: "probabilities", viewBox: "0 0 100 10", preserveAspectRatio: "none", "aria-hidden": "true" },
    CLASSES.map((category) => {
      const width = 100 * (probabilities[category] ?? 0);
      const bar = s("rect", { x, y: 0, width, height: 10, "data-class": category });
      x += width;
      return bar;
    }),
  );
}

/** Square-root scale: near months wide, far years narrow. */
const place = (months, most) => 1000 * Math.sqrt(Math.min(months, most) / most);

function scaleOf(pairing) {
  const ends = ["firstAttackMonths", "seizedMonths", "headLossMonths"]
    .map((name) => pairing[name])
    .filter((times) => !times.notApplicable)
    .map((times) => times.p90 ?? HORIZON_MONTHS);
  const need = Math.max(12, pairing.firstLookMonths * 1.5, ...ends);
  return TICKS.find((tick) => tick >= need) ?? HORIZON_MONTHS;
}

function bar(times, pairing, most) {
  const marks = [];
  for (let at = pairing.firstLookMonths; at <= most && marks.length < MOST_LOOKS; at += pairing.everyMonths) {
    marks.push(s("line", { x1: place(at, most), x2: place(at, most), y1: 0, y2: 24, class: "look" }));
    if (!(pairing.everyMonths > 0)) {
      break;
    }
  }
  const drawn = [];
  if (!times.notApplicable && times.p10 !== null) {
    const from = place(times.p10, most);
    const to = times.p90 === null ? 1000 : place(times.p90, most);
    drawn.push(s("rect", { x: from, y: 7, width: Math.max(4, to - from), height: 10, class: "span" }));
    if (times.median !== null) {
      const middle = place(times.median, most);
      drawn.push(s("rect", { x: middle - 3, y: 3, width: 6, height: 18, class: "middle" }));
    }
  }
  return s(
    "svg",
    { viewBox: "0 0 1000 24", preserveAspectRatio: "none", "aria-hidden": "true" },
    s("line", { x1: 0, x2: 1000, y1: 12, y2: 12, class: "base" }),
    marks,
    drawn,
  );
}

/** Ticks whose labels have room, counted from the far end. */
function labelled(most) {
  return TICKS.filter((tick) => tick <= most)
    .reverse()
    .reduce(
      (kept, tick) =>
        kept.length === 0 || place(kept.at(-1), most) - place(tick, most) > LEAST_TICK_GAP ? [...kept, tick] : kept,
      [],
    )
    .filter((tick) => place(tick, most) > LEAST_TICK_GAP);
}

/** When each state is reached, as spans on one scale. */
export function timesPicture(pairing) {
  const most = scaleOf(pairing);
  const row = (name, className) => {
    const times = pairing[name];
    return h(
      "div",
      { class: `time ${className}` },
      h("dt", {}, t(`page-${className}`), times.notApplicable ? null : h("small", {}, t(`page-at-${times.part}`))),
      h("dd", {}, h("span", { class: "range" }, words.timesRange(times)), bar(times, pairing, most)),
    );
  };
  const axis = s(
    "svg",
    { viewBox: "0 0 1000 6", preserveAspectRatio: "none", "aria-hidden": "true", class: "axis" },
    TICKS.filter((tick) => tick <= most).map((tick) =>
      s("line", { x1: place(tick, most), x2: place(tick, most), y1: 0, y2: 6, class: "tick" }),
    ),
  );
  const labels = h(
    "div",
    { class: "axis-labels", "aria-hidden": "true" },
    labelled(most).map((tick) => {
      const label = h("span", {}, words.shortSpan(tick));
      label.style.setProperty("--at", String(place(tick, most) / 10));
      return label;
    }),
  );
  return h(
    "div",
    { class: "times" },
    h(
      "dl",
      {},
      row("firstAttackMonths", "attack"),
      row("seizedMonths", "seized"),
      row("headLossMonths", "head-loss"),
    ),
    h("div", { class: "axis-row" }, h("div", {}, axis, labels)),
    h("p", { class: "hint" }, t("page-times-key")),
  );
}

function cell(value, most, className, text) {
  const height = most > 0 ? (100 * value) / most : 0;
  return h(
    "td",
    { title: text },
    s(
      "svg",
      { viewBox: "0 0 10 100", preserveAspectRatio: "none", "aria-hidden": "true", class: className },
      s("rect", { x: 0, y: 100 - height, width: 10, height }),
    ),
    h("span", { class: "unseen" }, text),
  );
}

/** The year: wetness, salt, damage, looks, and good months to build, in one table. */
export function yearPicture(year, ridden) {
  const { months } = year;
  const now = new Date().getMonth() + 1;
  const lane = (name, className, tell) => {
    const most = Math.max(...months.map((month) => month[name]));
    return h(
      "tr",
      { class: className },
      h("th", { scope: "row" }, t(`page-year-${className}`), h("small", {}, t("page-year-most", { value: tell(most) }))),
      months.map((month) => cell(month[name], most, className, tell(month[name]))),
    );
  };
  const marks = (className, chosen, symbol) =>
    h(
      "tr",
      { class: `marks ${className}` },
      h("th", { scope: "row" }, t(`page-year-${className}`)),
      months.map(({ month }) =>
        h(
          "td",
          {},
          chosen.includes(month)
            ? [symbol(), h("span", { class: "unseen" }, t(`page-year-${className}`))]
            : null,
        ),
      ),
    );
  const nipple = () =>
    s("svg", { viewBox: "0 0 12 14", "aria-hidden": "true" }, s("path", { d: "M0 0h12l-3 6v8H3V6z" }));
  const dot = () => s("svg", { viewBox: "0 0 12 14", "aria-hidden": "true" }, s("circle", { cx: 6, cy: 7, r: 3 }));
  const tickMark = () =>
    s(
      "svg",
      { viewBox: "0 0 12 14", "aria-hidden": "true" },
      s("path", { d: "M1 8l3.500 4L11 2", class: "stroke" }),
    );
  return h(
    "table",
    { class: "year" },
    h("caption", { class: "unseen" }, t("page-year")),
    h(
      "thead",
      {},
      h(
        "tr",
        {},
        h("td", {}),
        months.map(({ month }) =>
          h(
            "th",
            { scope: "col", class: month === now ? "this-month" : null, "aria-label": words.monthName(month) },
            h("span", { class: "wide-only" }, words.monthName(month, "short")),
            h("span", { class: "narrow-only", "aria-hidden": "true" }, words.monthName(month, "narrow")),
          ),
        ),
      ),
    ),
    h(
      "tbody",
      {},
      marks("look", year.lookMonths, nipple),
      lane("rimWetHours", "wet", (value) => words.hours(Math.round(value))),
      lane("chlorideInRimMgPerM2", "salt", (value) => t("page-salt-load", { value: words.rough(value) })),
      lane("damageShare", "damage", (value) => words.percent(value)),
      marks("ridden", ridden, dot),
      marks("build", year.bestBuildMonths, tickMark),
    ),
  );
}
