/** The wheel: four parts, how it is built, its age, and the risk that is accepted. */

import { byId, h } from "./dom.js";
import * as words from "./words.js";

const { t } = words;
const KINDS = ["rim", "nipple", "interface", "spoke"];
const RISKS = ["cautious", "usual", "relaxed"];
const FINDINGS = ["not-looked", "clean", "powder", "one-stiff"];
const USUAL = { spokes: 28, tension: 1100 };

let app;

const partsOf = (kind) => app.parts[kind];

export function partTitle(kind, id) {
  return words.part(kind, id, partsOf(kind)?.find((part) => part.id === id)?.title);
}

/** The four parts of a pairing in one line. */
export function pairingTitle(pairing) {
  const between = pairing.interface === "none" ? [] : [partTitle("interface", pairing.interface)];
  return [partTitle("nipple", pairing.nipple), ...between, partTitle("rim", pairing.rim)].join(" · ");
}

function put(name, value, usual) {
  if (value === usual || value === "") {
    delete app.question().fields[name];
  } else {
    app.question().fields[name] = String(value);
  }
  app.changed();
}

function partChoice(kind) {
  const chosen = app.question().fields[kind];
  return h(
    "label",
    { class: kind === "rim" || kind === "nipple" ? "wide" : "" },
    h("span", {}, t(`page-${kind}`)),
    h(
      "select",
      {
        id: kind,
        onchange: (event) => {
          app.question().fields[kind] = event.target.value;
          app.changed();
        },
      },
      partsOf(kind).map((part) =>
        h("option", { value: part.id, selected: part.id === chosen }, partTitle(kind, part.id)),
      ),
    ),
  );
}

function amount(name, least, most, usual) {
  return h(
    "label",
    {},
    h("span", {}, t(`page-${name}`)),
    h("input", {
      id: name,
      type: "number",
      min: least,
      max: most,
      step: name === "spokes" ? 1 : "any",
      value: app.question().fields[name] ?? String(usual),
      onchange: (event) => put(name, event.target.value, String(usual)),
    }),
  );
}

function tick(name, usual) {
  const given = app.question().fields[name];
  return h(
    "label",
    { class: "tick" },
    h("input", {
      id: name,
      type: "checkbox",
      checked: given === undefined ? usual : given === "true",
      onchange: (event) => put(name, event.target.checked, usual),
    }),
    h("span", {}, t(`page-${name}`)),
  );
}

function age() {
  const { fields } = app.question();
  return [
    h(
      "label",
      {},
      h("span", {}, t("page-age-months")),
      h("input", {
        id: "age-months",
        type: "number",
        min: 0,
        max: 240,
        step: "any",
        value: fields["age-months"] ?? "0",
        onchange: (event) => {
          if (!(Number(event.target.value) > 0)) {
            delete fields["last-finding"];
          }
          put("age-months", Number(event.target.value) > 0 ? event.target.value : "");
          drawWheel();
        },
      }),
    ),
    h(
      "label",
      {},
      h("span", {}, t("page-last-finding")),
      h(
        "select",
        {
          id: "last-finding",
          disabled: !fields["age-months"],
          onchange: (event) => put("last-finding", event.target.value, "not-looked"),
        },
        FINDINGS.map((id) =>
          h(
            "option",
            { value: id, selected: (fields["last-finding"] ?? "not-looked") === id },
            t(`page-finding-${id}`),
          ),
        ),
      ),
    ),
  ];
}

function buildMonth() {
  const chosen = Number(app.question().fields["build-month"]);
  return h(
    "label",
    { class: "wide" },
    h("span", {}, t("page-build-month")),
    h(
      "select",
      { id: "build-month", onchange: (event) => put("build-month", event.target.value) },
      Array.from({ length: 12 }, (_, at) => at + 1).map((month) =>
        h("option", { value: String(month), selected: month === chosen }, words.monthName(month)),
      ),
    ),
  );
}

function risk() {
  const chosen = app.question().fields.risk ?? "usual";
  return h(
    "fieldset",
    { class: "segments" },
    h("legend", {}, t("page-risk")),
    RISKS.map((id) =>
      h(
        "label",
        {},
        h("input", {
          type: "radio",
          name: "risk",
          value: id,
          checked: id === chosen,
          onchange: () => put("risk", id, "usual"),
        }),
        h("span", {}, t(`page-risk-${id}`)),
      ),
    ),
  );
}

export function initWheel(theApp) {
  app = theApp;
}

/** Draws the step anew: at the start, and when language or wheel change. */
export function drawWheel() {
  const box = byId("wheel");
  const moreOpen = box.querySelector("details")?.open ?? false;
  const focused = document.activeElement?.id;
  box.replaceChildren(
    h("div", { class: "grid2" }, KINDS.map(partChoice)),
    risk(),
    h(
      "details",
      { open: moreOpen },
      h("summary", {}, t("page-more-wheel")),
      h(
        "div",
        { class: "grid2" },
        age(),
        buildMonth(),
        amount("spokes", 12, 48, USUAL.spokes),
        amount("tension", 300, 2000, USUAL.tension),
      ),
      tick("tape-sound", true),
      tick("hidden-nipples", false),
      tick("practice-limits", true),
    ),
  );
  if (focused && box.querySelector(`#${CSS.escape(focused)}`)) {
    byId(focused).focus();
  }
}
