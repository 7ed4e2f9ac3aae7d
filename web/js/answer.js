/** The answer: interval first and large, then why, and what to take away. */

import { Refused, download } from "./api.js";
import { badge, timesPicture, yearPicture } from "./charts.js";
import { byId, h } from "./dom.js";
import { calledPlace } from "./place.js";
import { body, isOwnProfile, parameters } from "./question.js";
import { profileTitle } from "./rides.js";
import { pairingTitle, partTitle } from "./wheel.js";
import * as words from "./words.js";

const { t } = words;
const KINDS = ["rim", "nipple", "interface", "spoke"];
const SHOWN_CHANGES = 7;
const WORTH_A_LINE = 1.1;
const URGENT_MONTHS = 1.5;
const OVERDUE_MONTHS = 0.1;

let app;

export function initAnswer(theApp) {
  app = theApp;
}

/** The pairing that was asked for, else the first of the answer. */
function asked(advice, question) {
  return (
    advice.pairings.find((pairing) =>
      KINDS.every((kind) => question.fields[kind] === undefined || pairing[kind] === question.fields[kind]),
    ) ?? advice.pairings[0]
  );
}

/** The reason that sets the interval, else the foremost. */
function limit(pairing) {
  const reason = pairing.reasons.find(({ code }) => code.endsWith(pairing.limitedBy)) ?? pairing.reasons[0];
  return reason ? words.say(reason) : "";
}

const firstLook = (pairing) =>
  pairing.firstLookMonths < OVERDUE_MONTHS ? t("page-now") : words.span(pairing.firstLookMonths);

const replaceBy = (pairing) =>
  pairing.replaceByMonths === null
    ? t("page-replace-none")
    : t("page-replace-when", {
        span: words.span(pairing.replaceByMonths),
        date: words.monthAndYear(words.dateIn(pairing.replaceByMonths)),
      });

const notes = (list, className) =>
  h("ul", { class: className }, list.map((note) => h("li", {}, words.say(note))));

function classRow(air) {
  return h(
    "ul",
    { class: "classes", "aria-label": t("page-classes") },
    air.corrosivity.map((metal) =>
      h("li", {}, h("span", {}, t(`page-metal-${metal.metal}`)), badge(metal.category, { small: true })),
    ),
  );
}

function tag(answer, question, index) {
  const { advice } = answer;
  const pairing = asked(advice, question);
  const urgent = pairing.firstLookMonths <= URGENT_MONTHS;
  return h(
    "article",
    { class: urgent ? "tag urgent" : "tag", "data-wheel": index === 0 ? "A" : "B" },
    h(
      "header",
      {},
      h("span", { class: "hole", "aria-hidden": "true" }),
      app.questions.length > 1 ? h("span", { class: "letter" }, index === 0 ? "A" : "B") : null,
      h(
        "p",
        { class: "what" },
        h("strong", {}, calledPlace(advice.place)),
        h("span", {}, profileTitle(advice.profile.name === "own" ? { ...advice.profile, name: question.fields.profile } : advice.profile)),
        isOwnProfile(question) ? h("span", {}, t("page-changed")) : null,
        h("span", {}, pairingTitle(pairing)),
      ),
    ),
    h(
      "p",
      { class: "interval" },
      h("span", { class: "lead" }, t("page-first-look")),
      h("span", { class: "big", "data-first-look": pairing.firstLookMonths }, firstLook(pairing)),
      h(
        "span",
        { class: "then" },
        t("page-by-date", { date: words.date(words.dateIn(pairing.firstLookMonths)) }),
        " ",
        h("strong", {}, t("page-then-every", { every: words.every(pairing.everyMonths) })),
      ),
    ),
    h("p", { class: "because" }, limit(pairing)),
    h(
      "dl",
      { class: "facts" },
      h("div", {}, h("dt", {}, t("page-replace")), h("dd", {}, replaceBy(pairing))),
      h(
        "div",
        {},
        h("dt", {}, t("page-look-kind")),
        h("dd", {}, t(`page-look-${pairing.lookKind}`), ", ", words.minutes(pairing.lookMinutes)),
      ),
      h("div", {}, h("dt", {}, t("page-seized")), h("dd", {}, words.timesRange(pairing.seizedMonths))),
    ),
    classRow(advice.air),
  );
}

function stateCard(title, text, ...more) {
  return h("div", { class: "word" }, h("h3", {}, title), h("p", {}, text), ...more);
}

function waiting(answer) {
  return h(
    "div",
    { class: "word waiting" },
    h("h3", {}, t(answer.slow ? "page-slow" : "page-working")),
    h("p", {}, t(answer.slow ? "page-slow-word" : "page-working-word")),
    h("span", { class: "rim-turn", "aria-hidden": "true" }),
    answer.slow
      ? h("button", { type: "button", onclick: () => app.changed() }, t("page-again"))
      : null,
  );
}

function empty() {
  return h(
    "div",
    { class: "word empty" },
    h("h3", {}, t("page-empty")),
    h("p", {}, t("page-empty-word")),
    h(
      "ol",
      {},
      ["page-empty-1", "page-empty-2", "page-empty-3"].map((code) => h("li", {}, t(code))),
    ),
    h("button", { type: "button", onclick: () => byId("town").focus() }, t("page-empty-start")),
  );
}

function failed(refusal) {
  const sea = refusal.code.includes("sea");
  const again = !(refusal.status >= 400 && refusal.status < 500);
  return h(
    "div",
    { class: "word failed", role: "alert" },
    h("h3", {}, t(sea ? "page-at-sea" : again ? "page-failed" : "page-refused")),
    h("p", {}, app.wordsFor(refusal)),
    again ? h("button", { type: "button", onclick: () => app.changed() }, t("page-again")) : null,
  );
}

function slot(index) {
  const answer = app.answers[index];
  const question = app.questions[index];
  if (answer.refusal) {
    return failed(answer.refusal);
  }
  if (!answer.advice) {
    return answer.waiting ? waiting(answer) : empty();
  }
  const drawn = tag(answer, question, index);
  if (answer.waiting) {
    drawn.classList.add("stale");
    drawn.setAttribute("aria-busy", "true");
    if (answer.slow) {
      return h("div", {}, waiting(answer), drawn);
    }
  }
  return drawn;
}

function fileName(extension) {
  return `saltspoke.${extension}`;
}

function takeAway() {
  const question = app.question();
  const lang = app.view.lang;
  const file = (extension, options) => {
    const label = t(`page-take-${extension}`);
    const path = extension === "json" ? "/api/advice" : `/api/advice.${extension}`;
    const units = extension === "pdf" && app.view.units === "us" ? { units: "us" } : {};
    const posted = body(question, app.profiles, lang, options);
    if (posted) {
      return h(
        "button",
        {
          type: "button",
          class: "quiet",
          onclick: async () => {
            try {
              await download(path, { ...posted, ...units }, fileName(extension));
            } catch (failure) {
              byId("taken").textContent = app.wordsFor(
                failure instanceof Refused ? failure : new Refused(0, { error: "unreachable" }),
              );
            }
          },
        },
        label,
      );
    }
    const query = new URLSearchParams({ ...parameters(question, options), lang, ...units });
    return h("a", { class: "button quiet", href: `${path}?${query}`, download: fileName(extension) }, label);
  };
  return h(
    "div",
    { class: "take", role: "group", "aria-label": t("page-take") },
    h("button", { type: "button", id: "print", onclick: () => window.print() }, t("page-print")),
    file("pdf"),
    file("ics"),
    file("csv", { parts: ["rim"] }),
    file("json"),
    h(
      "button",
      {
        type: "button",
        class: "quiet",
        id: "copy-link",
        onclick: async () => {
          try {
            await navigator.clipboard.writeText(location.href);
            byId("taken").textContent = t("page-copied");
          } catch {
            byId("taken").textContent = t("page-copy-by-hand");
          }
        },
      },
      t("page-copy"),
    ),
    app.questions.length === 1
      ? h("button", { type: "button", class: "quiet", id: "compare", onclick: app.compare }, t("page-compare"))
      : h("button", { type: "button", class: "quiet", id: "compare-end", onclick: app.compareEnd }, t("page-compare-end")),
    h("span", { id: "taken", role: "status" }),
  );
}

function cautions(advice) {
  return h(
    "section",
    { class: "cautions", "aria-labelledby": "cautions-head" },
    h("h3", { id: "cautions-head" }, t("page-cautions")),
    notes(advice.cautions),
  );
}

function block(id, title, ...content) {
  return h("section", { class: "block", id, "aria-labelledby": `${id}-head` }, h("h3", { id: `${id}-head` }, title), ...content);
}

function why(advice, pairing) {
  const air = advice.air.summary ? [advice.air.summary] : [];
  return block(
    "why",
    t("page-why"),
    notes([...pairing.reasons, ...air]),
    h("p", { class: "hint" }, t("page-penetration", { value: words.loss({ p10: pairing.meanPenetrationUmPerYear, p90: pairing.meanPenetrationUmPerYear }) })),
  );
}

/** The new part or choice of a change in words. */
function valueTitle({ field, value }) {
  if (KINDS.includes(field)) {
    return partTitle(field, value);
  }
  if (value === "true" || value === "false") {
    return t(value === "true" ? "page-saltedRoads-yes" : "page-saltedRoads-no");
  }
  if (field.endsWith("-share") || field.endsWith("Share")) {
    return Number(value) < 0 ? t("page-by-climate") : words.percent(Number(value));
  }
  return words.firstOf([`page-${camel(field)}-${value}`], value);
}

/** What a change is, with the title of the new part or choice in place of its id. */
function changeTitle(change) {
  const title = valueTitle(change);
  return words.fill(change.what, { value: title });
}

const camel = (name) => name.replace(/-(.)/g, (_, letter) => letter.toUpperCase());

function tryChange(change) {
  const field = camel(change.field);
  if (KINDS.includes(change.field)) {
    app.question().fields[change.field] = change.value;
  } else if (app.profiles[0][field] !== undefined && field !== "months") {
    const sample = app.profiles[0][field];
    app.question().own[field] =
      typeof sample === "boolean" ? change.value === "true" : typeof sample === "number" ? Number(change.value) : change.value;
  } else if (["risk", "tape-sound", "hidden-nipples", "build-month"].includes(change.field)) {
    app.question().fields[change.field] = change.value;
  } else {
    return null;
  }
  app.redrawQuestion();
  app.changed();
  byId("answer").focus();
  return change;
}

const canTry = (change) =>
  KINDS.includes(change.field) ||
  (app.profiles[0][camel(change.field)] !== undefined && camel(change.field) !== "months") ||
  ["risk", "tape-sound", "hidden-nipples", "build-month"].includes(change.field);

function changeRow(change) {
  const title = changeTitle(change);
  return h(
    "li",
    {},
    h("span", { class: "change-what" }, title),
    h("span", { class: "cost", "data-cost": change.cost }, t(`page-cost-${change.cost}`)),
    h(
      "span",
      { class: "change-gain" },
      t("page-change-gain", { first: words.span(change.firstLookMonths), every: words.every(change.everyMonths) }),
      h("small", {}, t("page-change-factor", { factor: words.number(change.factor, 1) })),
    ),
    canTry(change)
      ? h(
          "button",
          { type: "button", class: "quiet small", onclick: () => tryChange(change), "aria-label": `${t("page-try")}: ${title}` },
          t("page-try"),
        )
      : h("span", {}),
  );
}

function changes(advice) {
  const helpful = advice.changes.filter((change) => change.factor >= WORTH_A_LINE);
  const best = helpful.slice(0, SHOWN_CHANGES);
  const rest = advice.changes.filter((change) => !best.includes(change));
  return block(
    "changes",
    t("page-changes"),
    best.length
      ? h("ul", { class: "changes" }, best.map(changeRow))
      : h("p", {}, t("page-changes-none")),
    rest.length
      ? h(
          "details",
          {},
          h("summary", {}, t("page-changes-rest", { count: rest.length })),
          h("ul", { class: "changes" }, rest.map(changeRow)),
        )
      : null,
  );
}

function otherRow(pairing, chosen) {
  const title = [partTitle("nipple", pairing.nipple), pairing.interface === "none" ? null : partTitle("interface", pairing.interface)]
    .filter(Boolean)
    .join(" · ");
  return h(
    "tr",
    { class: chosen ? "chosen" : null },
    h("th", { scope: "row" }, title, chosen ? h("small", {}, t("page-asked")) : null),
    h("td", {}, firstLook(pairing)),
    h("td", {}, words.span(pairing.everyMonths)),
    h("td", { class: "wide-only" }, words.timesRange(pairing.seizedMonths)),
    h(
      "td",
      {},
      chosen
        ? null
        : h(
            "button",
            {
              type: "button",
              class: "quiet small",
              "aria-label": `${t("page-choose")}: ${title}`,
              onclick: () => {
                for (const kind of KINDS) {
                  app.question().fields[kind] = pairing[kind];
                }
                app.redrawQuestion();
                app.changed();
                byId("answer").focus();
              },
            },
            t("page-choose"),
          ),
    ),
  );
}

function othersTable(rows, focus) {
  const isFocus = (pairing) => KINDS.every((kind) => pairing[kind] === focus[kind]);
  return h(
    "table",
    { class: "others" },
    h(
      "thead",
      {},
      h(
        "tr",
        {},
        h("th", { scope: "col" }, t("page-nipple")),
        h("th", { scope: "col" }, t("page-first")),
        h("th", { scope: "col" }, t("page-every")),
        h("th", { scope: "col", class: "wide-only" }, t("page-seized")),
        h("td", {}),
      ),
    ),
    h("tbody", {}, rows.map((pairing) => otherRow(pairing, isFocus(pairing)))),
  );
}

function others(answer, focus) {
  if (!answer.others) {
    return block("others", t("page-others"), h("p", { class: "hint" }, t("page-working-word")));
  }
  const sameSpoke = answer.others.pairings.filter((pairing) => pairing.spoke === focus.spoke);
  const seen = new Set();
  const best = sameSpoke.filter((pairing) => {
    const first = !seen.has(pairing.nipple);
    seen.add(pairing.nipple);
    return first || KINDS.every((kind) => pairing[kind] === focus[kind]);
  });
  const rest = sameSpoke.filter((pairing) => !best.includes(pairing));
  return block(
    "others",
    t("page-others"),
    h("p", { class: "hint" }, t("page-others-word", { rim: partTitle("rim", focus.rim) })),
    othersTable(best, focus),
    rest.length
      ? h("details", {}, h("summary", {}, t("page-others-all", { count: rest.length })), othersTable(rest, focus))
      : null,
  );
}

function sideBySide() {
  if (app.questions.length < 2 || !app.answers.every((answer) => answer.advice)) {
    return null;
  }
  const pairs = app.answers.map((answer, index) => asked(answer.advice, app.questions[index]));
  const row = (title, tell) => h("tr", {}, h("th", { scope: "row" }, title), pairs.map((pairing, at) => h("td", {}, tell(pairing, app.answers[at].advice))));
  return block(
    "side-by-side",
    t("page-side-by-side"),
    h(
      "table",
      { class: "side" },
      h("thead", {}, h("tr", {}, h("td", {}), h("th", { scope: "col" }, "A"), h("th", { scope: "col" }, "B"))),
      h(
        "tbody",
        {},
        row(t("page-step-place"), (_, advice) => calledPlace(advice.place)),
        row(t("page-step-rides"), (_, advice) => profileTitle(advice.profile)),
        row(t("page-step-wheel"), pairingTitle),
        row(t("page-first"), firstLook),
        row(t("page-every"), (pairing) => words.span(pairing.everyMonths)),
        row(t("page-replace"), replaceBy),
        row(t("page-attack"), (pairing) => words.timesRange(pairing.firstAttackMonths)),
        row(t("page-seized"), (pairing) => words.timesRange(pairing.seizedMonths)),
        row(t("page-head-loss"), (pairing) => words.timesRange(pairing.headLossMonths)),
        row(t("page-air"), (_, advice) => advice.air.corrosivity.map((metal) => badge(metal.category, { small: true }))),
      ),
    ),
  );
}

function detailsOf(answer, question) {
  const { advice } = answer;
  const focus = asked(advice, question);
  return [
    takeAway(),
    cautions(advice),
    sideBySide(),
    why(advice, focus),
    block("times", t("page-times"), timesPicture(focus)),
    block("year", t("page-year"), yearPicture(advice.year, advice.profile.months)),
    changes(advice),
    others(answer, focus),
    block("look", t("page-how-to-look"), h("ol", { class: "steps" }, advice.look.map((note) => h("li", {}, words.say(note))))),
    h(
      "section",
      { class: "block stop", id: "stop", "aria-labelledby": "stop-head" },
      h("h3", { id: "stop-head" }, t("page-stop")),
      notes(advice.stopSigns),
    ),
    advice.flags.length + advice.air.flags.length
      ? h(
          "details",
          { class: "block", id: "assumed" },
          h("summary", {}, t("page-assumed", { count: advice.flags.length + advice.air.flags.length })),
          notes([...advice.flags, ...advice.air.flags]),
        )
      : null,
  ];
}

/** What a screen reader hears and the strip on a phone shows once an answer is there. */
function oneLine(answer, question) {
  const pairing = asked(answer.advice, question);
  return t("page-one-line", { first: firstLook(pairing), every: words.every(pairing.everyMonths) });
}

/** Draws everything that depends on the answers. */
export function drawAnswer() {
  const active = app.answers[app.active];
  byId("verdict").className = app.questions.length > 1 ? "two" : "one";
  byId("verdict").replaceChildren(...app.questions.map((_, index) => slot(index)));
  const openBefore = [...byId("details").querySelectorAll("details[open]")].map((box) => box.closest("[id]").id);
  const heldBy = document.activeElement?.closest("#details") ? document.activeElement.id : "";
  byId("details").replaceChildren(
    ...(active.advice && !active.refusal ? detailsOf(active, app.question()).filter(Boolean) : []),
  );
  for (const id of openBefore) {
    const box = byId(id);
    const fold = box?.matches("details") ? box : box?.querySelector("details");
    fold?.setAttribute("open", "");
  }
  if (heldBy) {
    byId(heldBy)?.focus({ preventScroll: true });
  }
  const settled = active.advice && !active.waiting && !active.refusal;
  const line = settled ? oneLine(active, app.question()) : "";
  if (byId("news").textContent !== line) {
    byId("news").textContent = line;
  }
  byId("strip").hidden = !settled;
  byId("strip").textContent = line;
}
