/** How the bicycle is ridden and kept: a ready profile, and changes to it. */

import { byId, debounced, h } from "./dom.js";
import { isOwnProfile } from "./question.js";
import * as words from "./words.js";

const { t } = words;
const CHOICES = {
  storage: ["heated-room", "unheated-shed", "covered-outdoors", "open"],
  rinsing: ["never", "monthly", "weekly", "after-wet-rides"],
  saltedRoads: ["by-climate", "yes", "no"],
  threadCompound: ["none", "oil", "grease", "anti-seize"],
  sealant: ["none", "ammonia-free", "ammoniated"],
};
const WET_SHARES = [-1, 0, 0.1, 0.25, 0.5, 0.75];
const SEA_SHARES = [0, 0.1, 0.25, 0.5, 1];

let app;

export function profileTitle(profile) {
  return words.firstOf([`page-profile-${profile.name}`], profile.title.split(":")[0]);
}

function current() {
  const { fields, own } = app.question();
  const ready = app.profiles.find((profile) => profile.name === fields.profile) ?? app.profiles[0];
  return { ready, value: { ...ready, ...own } };
}

function same(a, b) {
  return JSON.stringify(a) === JSON.stringify(b);
}

function set(name, value) {
  const { ready } = current();
  const { own } = app.question();
  if (same(ready[name], value)) {
    delete own[name];
  } else {
    own[name] = value;
  }
  mark();
  app.changed();
}

function mark() {
  byId("own-mark").hidden = !isOwnProfile(app.question());
}

function choice(name) {
  const { value } = current();
  return h(
    "label",
    {},
    h("span", {}, t(`page-${name}`)),
    h(
      "select",
      { id: `own-${name}`, onchange: (event) => set(name, event.target.value) },
      CHOICES[name].map((id) =>
        h("option", { value: id, selected: value[name] === id }, t(`page-${name}-${id}`)),
      ),
    ),
  );
}

function shares(name, steps) {
  const { value } = current();
  const known = steps.includes(value[name]) ? steps : [...steps, value[name]].sort((a, b) => a - b);
  return h(
    "label",
    {},
    h("span", {}, t(`page-${name}`)),
    h(
      "select",
      { id: `own-${name}`, onchange: (event) => set(name, Number(event.target.value)) },
      known.map((share) =>
        h(
          "option",
          { value: String(share), selected: value[name] === share },
          share < 0 ? t("page-by-climate") : words.percent(share),
        ),
      ),
    ),
  );
}

function amount(name, most) {
  const { value } = current();
  return h(
    "label",
    {},
    h("span", {}, t(`page-${name}`)),
    h("input", {
      id: `own-${name}`,
      type: "number",
      min: 0,
      max: most,
      step: "any",
      inputmode: "decimal",
      value: String(value[name]),
      onchange: (event) => {
        const given = Number(event.target.value);
        const within = Math.min(most, Math.max(0, Number.isFinite(given) ? given : 0));
        event.target.value = String(within);
        set(name, within);
      },
    }),
  );
}

function tick(name) {
  const { value } = current();
  return h(
    "label",
    { class: "tick" },
    h("input", {
      id: `own-${name}`,
      type: "checkbox",
      checked: value[name],
      onchange: (event) => set(name, event.target.checked),
    }),
    h("span", {}, t(`page-${name}`)),
  );
}

function months() {
  const { value } = current();
  const flip = debounced(() => {
    const ticked = [...document.querySelectorAll("#own-months input:checked")];
    set("months", ticked.map((box) => Number(box.value)));
  }, 60);
  return h(
    "fieldset",
    { class: "months", id: "own-months" },
    h("legend", {}, t("page-months")),
    Array.from({ length: 12 }, (_, at) => at + 1).map((month) =>
      h(
        "label",
        {},
        h("input", {
          type: "checkbox",
          value: String(month),
          checked: value.months.includes(month),
          "aria-label": words.monthName(month),
          onchange: flip,
        }),
        h("span", { "aria-hidden": "true" }, words.monthName(month, "narrow")),
      ),
    ),
  );
}

/** One line on a profile, from its own fields. */
function profileLine(profile) {
  return t("page-profile-line", {
    hours: words.number(profile.hoursPerWeek, 1),
    storage: t(`page-storage-${profile.storage}`),
    rinsing: t(`page-rinsing-${profile.rinsing}`),
  });
}

export function initRides(theApp) {
  app = theApp;
}

/** Draws the step anew: at the start, and when language or wheel change. */
export function drawRides() {
  const { ready } = current();
  const moreOpen = byId("rides").querySelector("details")?.open ?? false;
  byId("rides").replaceChildren(
    h(
      "label",
      {},
      h("span", {}, t("page-profile")),
      h(
        "select",
        {
          id: "profile",
          onchange: (event) => {
            app.question().fields.profile = event.target.value;
            app.question().own = {};
            drawRides();
            byId("profile").focus();
            app.changed();
          },
        },
        app.profiles.map((profile) =>
          h("option", { value: profile.name, selected: profile.name === ready.name }, profileTitle(profile)),
        ),
      ),
    ),
    h("p", { class: "hint" }, profileLine(ready)),
    h("p", { id: "own-mark", class: "hint", hidden: true }, t("page-own-profile")),
    h("div", { class: "grid2" }, choice("storage"), choice("rinsing")),
    h(
      "details",
      { open: moreOpen },
      h("summary", {}, t("page-more-rides")),
      months(),
      h(
        "div",
        { class: "grid2" },
        amount("hoursPerWeek", 60),
        amount("trainerHoursPerWeek", 30),
        shares("wetRideShare", WET_SHARES),
        shares("seaRideShare", SEA_SHARES),
        choice("saltedRoads"),
        choice("threadCompound"),
        choice("sealant"),
      ),
      tick("driedAfterWet"),
      tick("drainHoles"),
    ),
  );
  mark();
}
