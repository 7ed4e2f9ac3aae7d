/** The air at the place: class per metal with its sureness, what decides, road salt apart. */

import { badge, probabilityBar, sureness } from "./charts.js";
import { byId, h } from "./dom.js";
import * as words from "./words.js";

const { t } = words;

function metal(entry) {
  return h(
    "li",
    { "data-metal": entry.metal },
    h("span", { class: "metal" }, t(`page-metal-${entry.metal}`)),
    badge(entry.category),
    probabilityBar(entry.categoryProbability),
    h(
      "p",
      {},
      sureness(entry.categoryProbability),
      " ",
      t("page-first-year", { loss: words.loss(entry.firstYearLossUm) }),
    ),
  );
}

function fact(title, value) {
  return h("div", {}, h("dt", {}, title), h("dd", {}, value));
}

function monthsTable(air) {
  const row = (title, tell) =>
    h("tr", {}, h("th", { scope: "row" }, title), air.months.map((month) => h("td", {}, tell(month))));
  return h(
    "div",
    { class: "scroll", tabindex: "0", role: "region", "aria-label": t("page-air-months") },
    h(
      "table",
      { class: "months-table" },
      h(
        "thead",
        {},
        h(
          "tr",
          {},
          h("td", {}),
          air.months.map(({ month }) => h("th", { scope: "col" }, words.monthName(month, "short"))),
        ),
      ),
      h(
        "tbody",
        {},
        row(t("page-temperature"), (month) => words.temperature(month.temperatureC)),
        row(t("page-humidity"), (month) => `${words.number(month.relativeHumidityPct)} %`),
        row(t("page-wet-hours"), (month) => words.number(month.wetHours)),
        row(t("page-rain"), (month) => words.rain(month.rainMm)),
        row(t("page-near-freezing"), (month) => words.number(month.nearFreezingDays)),
        row(t("page-frost"), (month) => words.number(month.frostDays)),
      ),
    ),
  );
}

function roadSalt(salt) {
  const none = salt.treatmentsPerWinter.p90 < 0.5;
  return h(
    "div",
    { class: "road-salt" },
    h("h3", {}, t("page-road-salt")),
    h(
      "p",
      {},
      none
        ? t("page-road-salt-none")
        : t("page-road-salt-some", {
            range: words.roughRange(salt.treatmentsPerWinter),
            practice: t(`page-practice-${salt.practice}`),
            confidence: t(`page-confidence-${salt.practiceConfidence}`),
          }),
    ),
    h("p", { class: "hint" }, t("page-road-salt-apart")),
  );
}

/** Draws the air of an answer, or nothing when there is none. */
export function drawAir(air) {
  const box = byId("air-body");
  const open = box.querySelector("details")?.open ?? false;
  if (!air) {
    box.replaceChildren(h("p", { class: "hint" }, t("page-air-empty")));
    return;
  }
  box.replaceChildren(
    air.summary ? h("p", { class: "summary" }, words.say(air.summary)) : "",
    h("ul", { class: "metals" }, air.corrosivity.map(metal)),
    h(
      "dl",
      { class: "facts" },
      fact(t("page-wet-hours-year"), t("page-hours-a-year", { value: words.number(air.annual.wetHours) })),
      fact(
        t("page-chloride"),
        t("page-deposition", { range: words.roughRange(air.chlorideDepositionMgPerM2Day) }),
      ),
      fact(t("page-so2"), t("page-deposition", { range: words.roughRange(air.so2DepositionMgPerM2Day) })),
      fact(
        t("page-setting"),
        `${t(`page-setting-${air.setting}`)}${air.settingGiven ? "" : ` (${t("page-guessed")})`}`,
      ),
      fact(t("page-near-freezing-year"), t("page-days-a-year", { value: words.number(air.annual.nearFreezingDays) })),
      fact(
        t("page-mean"),
        `${words.temperature(air.annual.temperatureC)}, ${words.number(air.annual.relativeHumidityPct)} %`,
      ),
      fact(t("page-iso-classes"), [air.wetnessClass, air.salinityClass, air.sulfurClass].join(" · ")),
    ),
    roadSalt(air.roadSalt),
    h("details", { open }, h("summary", {}, t("page-air-months")), monthsTable(air)),
  );
}
