/** The desk: a list of customers in, classes, split, states, demand and orders out. */

import { Refused, ask } from "./api.js";
import { byId, h, s } from "./dom.js";
import * as words from "./words.js";

const { t } = words;
const MOST_BYTES = 500_000;
const MOST_SHOWN = 200;
const CLASSES = ["C1", "C2", "C3", "C4", "C5", "CX"];
const FILES = ["rows", "refused", "split", "states", "demand", "orders"];

const desk = { lang: "en", text: null, result: null, region: "", sort: { by: "line", down: false }, map: null };

const SLASH = /\//;

/** A pairing's word for tables, said in the page's language. */
function pairing(word) {
  const [rim, nipple, between, spoke] = word.split(SLASH);
  const parts = [words.part("nipple", nipple), between === "none" ? null : words.part("interface", between)];
  return `${parts.filter(Boolean).join(" · ")} (${words.part("rim", rim)}, ${words.part("spoke", spoke)})`;
}

/** A file's text, in whatever usual encoding it is. */
async function read(file) {
  const bytes = new Uint8Array(await file.arrayBuffer());
  const utf16 = bytes[0] === 0xff && bytes[1] === 0xfe ? "utf-16le" : bytes[0] === 0xfe && bytes[1] === 0xff ? "utf-16be" : null;
  if (utf16) {
    return new TextDecoder(utf16).decode(bytes);
  }
  try {
    return new TextDecoder("utf-8", { fatal: true }).decode(bytes);
  } catch {
    return new TextDecoder("windows-1252").decode(bytes);
  }
}

function say(text) {
  byId("news").hidden = !text;
  byId("news").textContent = text;
}

async function work() {
  if (desk.text === null) {
    return;
  }
  byId("result").replaceChildren();
  say(t("page-working"));
  const parameters = { lang: desk.lang };
  for (const id of ["risk", "wanted-months", "pack", "lead-weeks"]) {
    parameters[id] = byId(id).value;
  }
  try {
    const result = await ask("stock", "/api/stock", parameters, desk.text);
    if (result) {
      desk.result = result;
      desk.region = "";
      say("");
      draw();
      byId("result").focus();
    }
  } catch (refusal) {
    desk.result = null;
    say(
      refusal.status >= 400 && refusal.status < 500
        ? t("page-error-refused", { field: refusal.field, was: refusal.was, allowed: refusal.allowed })
        : t(refusal.status === 0 ? "page-error-unreachable" : "page-error-failed"),
    );
  }
}

async function take(file) {
  if (!file) {
    return;
  }
  if (file.size > MOST_BYTES) {
    desk.text = null;
    byId("result").replaceChildren();
    say(t("page-stock-too-large", { kb: words.number(MOST_BYTES / 1000) }));
    return;
  }
  desk.text = await read(file);
  await work();
}

const regionName = (region) =>
  region.region ? `${region.region}, ${words.country(region.country)}` : words.country(region.country) || "–";

const chosen = () => (desk.region === "" ? desk.result.all : desk.result.regions[Number(desk.region)]);

function dominant(split) {
  return Object.entries(split.byClass).sort((a, b) => b[1] - a[1])[0][0];
}

function bar(label, share, colour, value) {
  return h(
    "div",
    { class: "desk-bar" },
    h("span", {}, label),
    s(
      "svg",
      { viewBox: "0 0 100 10", preserveAspectRatio: "none", role: "img", "aria-label": `${label}: ${value}` },
      s("rect", { width: 100, height: 10, fill: "var(--sunk)" }),
      s("rect", { width: Math.max(0, 100 * share), height: 10, fill: colour }),
    ),
    h("span", { class: "value" }, value),
  );
}

function bars(title, parts, wheels, name, colour) {
  return h(
    "section",
    { class: "desk-card" },
    h("h2", {}, title),
    Object.entries(parts)
      .sort((a, b) => b[1] - a[1])
      .map(([key, part]) => bar(name(key), part / wheels, colour(key), words.percent(part / wheels))),
  );
}

const column = (value, digits = 0) => h("td", { class: "figure" }, words.number(value, digits));

function states(split) {
  return h(
    "section",
    { class: "desk-card", tabindex: "0", "aria-label": t("page-stock-states") },
    h("h2", {}, t("page-stock-states")),
    h("p", { class: "hint" }, t("page-stock-states-word")),
    h(
      "table",
      {},
      h("thead", {}, h("tr", {}, ["year", "sound", "attacked", "seized", "lost"].map((key) => h("th", { scope: "col" }, t(`page-stock-${key}`))))),
      h(
        "tbody",
        {},
        split.states.map((at) =>
          h("tr", {}, h("th", { scope: "row" }, words.number(at.year)), column(at.sound), column(at.attacked), column(at.seized), column(at.lost)),
        ),
      ),
    ),
  );
}

function demand(split) {
  const most = Math.max(1e-9, ...split.demand.map((at) => Math.max(at.looks, at.rebuilds)));
  return h(
    "section",
    { class: "desk-card" },
    h("h2", {}, t("page-stock-demand")),
    split.demand.map((at) => [
      bar(`${words.monthName(at.month)}: ${t("page-stock-looks")}`, at.looks / most, "var(--act)", words.number(at.looks)),
      bar(`${words.monthName(at.month)}: ${t("page-stock-rebuilds")}`, at.rebuilds / most, "var(--damage)", words.number(at.rebuilds)),
    ]),
  );
}

function orders() {
  return h(
    "section",
    { class: "desk-card", tabindex: "0", "aria-label": t("page-stock-orders") },
    h("h2", {}, t("page-stock-orders")),
    h("p", { class: "hint" }, t("page-stock-orders-word")),
    h(
      "table",
      {},
      h("thead", {}, h("tr", {}, ["article", "pieces", "packs", "order-by"].map((key) => h("th", { scope: "col" }, t(`page-stock-${key}`))))),
      h(
        "tbody",
        {},
        desk.result.orders.map((line) =>
          h(
            "tr",
            {},
            h("th", { scope: "row" }, words.part(line.kind, line.id)),
            column(line.piecesNeeded),
            column(line.packs),
            h("td", {}, line.orderByMonth ? words.monthName(line.orderByMonth) : "–"),
          ),
        ),
      ),
    ),
  );
}

const COLUMNS = [
  ["line", (row) => row.line, (row) => words.number(row.line)],
  ["place", (row) => row.place, (row) => row.place],
  ["region", (row) => row.region, (row) => regionName(row)],
  ["wheels", (row) => row.wheels, (row) => words.number(row.wheels, 2)],
  ["class", (row) => row.class, (row) => row.class],
  ["recommended", (row) => row.recommended, (row) => pairing(row.recommended)],
  ["first", (row) => row.firstLookMonths, (row) => words.span(row.firstLookMonths)],
];

function rowsTable() {
  const region = desk.region === "" ? null : desk.result.regions[Number(desk.region)];
  const rows = desk.result.rows.filter((row) => !region || (row.region === region.region && row.country === region.country));
  const [, key] = COLUMNS.find(([id]) => id === desk.sort.by);
  const order = desk.sort.down ? -1 : 1;
  rows.sort((a, b) => {
    const [x, y] = [key(a), key(b)];
    return order * (typeof x === "number" ? x - y : String(x).localeCompare(String(y), desk.lang)) || a.line - b.line;
  });
  return h(
    "section",
    { class: "desk-card", tabindex: "0", "aria-label": t("page-stock-customers") },
    h("h2", {}, t("page-stock-customers")),
    h("p", { class: "hint" }, t("page-stock-shown", { shown: words.number(Math.min(MOST_SHOWN, rows.length)), all: words.number(rows.length) })),
    h(
      "table",
      { id: "customers" },
      h(
        "thead",
        {},
        h(
          "tr",
          {},
          COLUMNS.map(([id]) =>
            h(
              "th",
              { scope: "col", "aria-sort": desk.sort.by === id ? (desk.sort.down ? "descending" : "ascending") : "none" },
              h("button", { type: "button", id: `sort-${id}`, onclick: () => sortBy(id) }, t(`page-stock-${id}`)),
            ),
          ),
        ),
      ),
      h("tbody", {}, rows.slice(0, MOST_SHOWN).map((row) => h("tr", {}, COLUMNS.map(([, , text]) => h("td", {}, text(row)))))),
    ),
  );
}

function sortBy(id) {
  desk.sort = { by: id, down: desk.sort.by === id && !desk.sort.down };
  draw();
  byId(`sort-${id}`).focus();
}

function refused() {
  if (!desk.result.refusedRows.length) {
    return null;
  }
  return h(
    "section",
    { class: "desk-card", tabindex: "0", "aria-label": t("page-stock-refused-rows") },
    h("h2", {}, t("page-stock-refused-rows")),
    h(
      "ul",
      { id: "refused" },
      desk.result.refusedRows
        .slice(0, MOST_SHOWN)
        .map((row) => h("li", {}, `${t("page-stock-line")} ${row.line}: `, t("page-error-refused", { field: row.field, was: row.was, allowed: row.allowed }))),
    ),
  );
}

function downloads() {
  const link = (name, type, text) =>
    h(
      "button",
      {
        type: "button",
        class: "quiet",
        id: `take-${name.replace(".", "-")}`,
        onclick: () => {
          const address = URL.createObjectURL(new Blob([text], { type }));
          const anchor = h("a", { href: address, download: `saltspoke-${name}` });
          anchor.click();
          setTimeout(() => URL.revokeObjectURL(address), 60_000);
        },
      },
      name,
    );
  return h(
    "section",
    { class: "desk-card" },
    h("h2", {}, t("page-take")),
    h(
      "div",
      { class: "desk-downloads" },
      FILES.filter((name) => desk.result.files[name]).map((name) => link(`${name}.csv`, "text/csv", desk.result.files[name])),
      link("stock.json", "application/json", JSON.stringify({ ...desk.result, files: undefined, outlines: undefined })),
    ),
  );
}

const classColour = (category) => `var(--${category.toLowerCase()})`;

/** The regions of the list, each in the colour of the class that most of its wheels have. */
function map() {
  const box = h("div", { id: "regions", class: "desk-map", role: "application", "aria-label": t("page-stock-map-word") });
  const legend = h(
    "p",
    { class: "hint" },
    CLASSES.map((category) => [
      s("svg", { width: 14, height: 14, "aria-hidden": "true" }, s("rect", { width: 14, height: 14, fill: classColour(category), stroke: "var(--edge)" })),
      ` ${category}  `,
    ]),
  );
  return h("section", { class: "desk-card" }, h("h2", {}, t("page-stock-map")), box, legend);
}

function drawMap() {
  desk.map?.remove();
  desk.map = L.map("regions", { attributionControl: false, keyboard: false, zoomAnimation: false, worldCopyJump: true });
  const seen = [];
  desk.result.regions.forEach((region, index) => {
    const name = `${regionName(region)}: ${dominant(region)}`;
    for (const ring of desk.result.outlines[index]) {
      const colour = getComputedStyle(document.documentElement).getPropertyValue(`--${dominant(region).toLowerCase()}`).trim();
      const shape = L.polygon(ring, { color: "#15252a", weight: String(index) === desk.region ? 3 : 0.7, fillColor: colour, fillOpacity: 0.9 });
      shape.bindTooltip(name).on("click", () => choose(String(index))).addTo(desk.map);
      seen.push(shape.getBounds());
    }
  });
  if (seen.length) {
    desk.map.fitBounds(seen.reduce((all, next) => all.extend(next), L.latLngBounds(seen[0])));
  } else {
    desk.map.setView([45, 10], 3);
  }
}

function choose(region) {
  desk.region = region;
  draw();
  byId("region").focus();
}

function draw() {
  const { result } = desk;
  if (!result) {
    return;
  }
  const summary = t("page-stock-summary", {
    answered: words.number(result.answered),
    mended: words.number(result.mended),
    refused: words.number(result.refused),
    wheels: words.number(result.all.wheels, 2),
  });
  if (!result.answered) {
    byId("result").replaceChildren(h("div", { class: "desk-result" }, h("p", { class: "word" }, summary), refused()));
    return;
  }
  const split = chosen();
  const names = ["", ...result.regions.map((_, index) => String(index))].map((value) =>
    h(
      "option",
      { value, selected: value === desk.region },
      value === "" ? t("page-stock-all") : `${regionName(result.regions[Number(value)])} (${words.number(result.regions[Number(value)].wheels, 2)})`,
    ),
  );
  byId("result").replaceChildren(
    h(
      "div",
      { class: "desk-result" },
      h("p", { class: "word", id: "summary" }, summary),
      h(
        "section",
        { class: "step cautions" },
        h("h2", {}, t("page-cautions")),
        h("p", {}, `${t("caution-estimate")} ${t("caution-makers-limits")} ${t("caution-qualified-mechanic")}`),
      ),
      h(
        "div",
        { class: "desk-two" },
        map(),
        h(
          "div",
          { class: "desk-result" },
          h("label", { class: "desk-card" }, h("span", {}, t("page-stock-region")), h("select", { id: "region", onchange: (event) => choose(event.target.value) }, names)),
          bars(t("page-stock-by-class"), split.byClass, split.wheels, (key) => key, classColour),
          bars(t("page-stock-recommended"), split.byPairing, split.wheels, pairing, () => "var(--act)"),
          bars(t("page-stock-by-profile"), split.byProfile, split.wheels, (key) => words.firstOf([`page-profile-${key}`], key), () => "var(--wet)"),
        ),
      ),
      split.wheelsShortOfWanted > 0 ? h("p", { class: "word" }, t("page-stock-short", { wheels: words.number(split.wheelsShortOfWanted, 2) })) : null,
      h("div", { class: "desk-two" }, states(split), demand(split)),
      orders(),
      rowsTable(),
      refused(),
      downloads(),
    ),
  );
  drawMap();
}

async function setLanguage(lang) {
  const texts = await ask("texts", "/api/texts", { lang });
  if (!texts) {
    return;
  }
  desk.lang = lang;
  words.speak(lang, texts);
  document.documentElement.lang = lang;
  document.title = `Saltspoke – ${t("page-stock-claim")}`;
  for (const node of document.querySelectorAll("[data-t]")) {
    if (node.id !== "news" || desk.text === null) {
      node.textContent = t(node.dataset.t);
    }
  }
}

async function start() {
  const wanted = [new URLSearchParams(location.search).get("lang"), ...navigator.languages.map((tag) => tag.slice(0, 2))];
  const lang = wanted.find((id) => words.LANGUAGES.some(([known]) => known === id)) ?? "en";
  await setLanguage(lang);
  byId("language").replaceChildren(...words.LANGUAGES.map(([id, title]) => h("option", { value: id, selected: id === lang, lang: id }, title)));
  byId("language").addEventListener("change", async (event) => {
    await setLanguage(event.target.value);
    await work();
  });
  byId("file").addEventListener("change", (event) => take(event.target.files[0]));
  for (const id of ["risk", "wanted-months", "pack", "lead-weeks"]) {
    byId(id).addEventListener("change", work);
  }
  byId("list").addEventListener("submit", (event) => event.preventDefault());
  document.documentElement.dataset.ready = "yes";
}

start().catch((failure) => say(failure instanceof Refused ? t("page-error-unreachable") : String(failure)));
