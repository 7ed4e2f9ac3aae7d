/** Puts the parts of the page together: one question (or two), one answer each. */

import { drawAir } from "./air.js";
import { drawAnswer, initAnswer } from "./answer.js";
import { Refused, ask, hangUp } from "./api.js";
import { byId, debounced, h } from "./dom.js";
import { initMap, relabelMap, showOnMap } from "./map.js";
import { initPlace, relabelPlace, showPlace, syncPlace } from "./place.js";
import { body, copyOf, hasPlace, movePlace, parameters, readAddress, writeAddress } from "./question.js";
import { drawRides, initRides } from "./rides.js";
import { drawWheel, initWheel } from "./wheel.js";
import * as words from "./words.js";

const { t } = words;
const QUIET_MS = 180;
const SLOW_MS = 4000;
const SAME_TOWN_DEG = 0.05;
const PREFERRED = {
  profile: "all-winter-commuter",
  rim: "carbon-bare",
  nipple: "aluminium-anodised-thin",
  interface: "none",
  spoke: "stainless",
};
const POSTCODE_COUNTRIES = ["US", "IN", "FR", "IT", "DE"];
const KINDS = ["rim", "nipple", "interface", "spoke"];

const noAnswer = () => ({ advice: null, others: null, refusal: null, waiting: false, slow: false });

const start = readAddress(location.search);
const app = {
  questions: start.questions,
  answers: start.questions.map(noAnswer),
  active: 0,
  view: start.view,
  profiles: [],
  parts: { rim: [], nipple: [], interface: [], spoke: [] },
  pairings: [],
  postcodeCountries: POSTCODE_COUNTRIES,
  question: () => app.questions[app.active],
  changed,
  remember,
  takePlace,
  pickPlace,
  compare,
  compareEnd,
  redrawQuestion,
  wordsFor,
};

function remember() {
  history.replaceState(null, "", writeAddress(app.questions, app.view));
}

/** Words for what the server refused, with what may stand there instead. */
function wordsFor(refusal) {
  const known = words.firstOf([`page-error-${refusal.code}`], "");
  if (known) {
    return known
      .replaceAll("{was}", refusal.was)
      .replaceAll("{allowed}", refusal.allowed)
      .replaceAll("{field}", refusal.field);
  }
  return refusal.status >= 400 && refusal.status < 500
    ? t("page-error-refused", { field: refusal.field, was: refusal.was, allowed: refusal.allowed })
    : t("page-error-failed");
}

/** Fills what a question leaves open, and mends a pairing that cannot be built. */
function complete(question) {
  const { fields } = question;
  const known = (list, id) => list.some((entry) => (entry.name ?? entry.id) === id);
  if (!known(app.profiles, fields.profile)) {
    fields.profile = known(app.profiles, PREFERRED.profile) ? PREFERRED.profile : app.profiles[0].name;
  }
  for (const kind of KINDS) {
    if (!known(app.parts[kind], fields[kind])) {
      fields[kind] = known(app.parts[kind], PREFERRED[kind]) ? PREFERRED[kind] : app.parts[kind][0].id;
    }
  }
  if (!fields["build-month"]) {
    fields["build-month"] = String(new Date().getMonth() + 1);
  }
  const fits = (pairing, kinds) => kinds.every((kind) => pairing[kind] === fields[kind]);
  if (app.pairings.length && !app.pairings.some((pairing) => fits(pairing, KINDS))) {
    const mended = app.pairings.find((pairing) => fits(pairing, ["rim", "nipple"])) ?? app.pairings.find((pairing) => fits(pairing, ["rim"]));
    if (mended) {
      Object.assign(fields, mended);
      return true;
    }
  }
  return false;
}

function isElsewhere(place, expected) {
  const [lat, lon] = expected.split(",").map(Number);
  return Math.abs(place.latitudeDeg - lat) > SAME_TOWN_DEG || Math.abs(place.longitudeDeg - lon) > SAME_TOWN_DEG;
}

async function answerOne(index) {
  const question = app.questions[index];
  const answer = app.answers[index];
  if (!hasPlace(question)) {
    hangUp(`advice-${index}`);
    hangUp(`others-${index}`);
    app.answers[index] = noAnswer();
    draw();
    return;
  }
  const lang = app.view.lang;
  const fetchFor = (line, options) =>
    ask(
      `${line}-${index}`,
      "/api/advice",
      body(question, app.profiles, lang, options) ? {} : { ...parameters(question, options), lang },
      body(question, app.profiles, lang, options),
    );
  answer.waiting = true;
  answer.slow = false;
  clearTimeout(answer.timer);
  answer.timer = setTimeout(() => {
    answer.slow = true;
    draw();
  }, SLOW_MS);
  draw();
  try {
    const advice = await fetchFor("advice");
    if (advice === null) {
      return;
    }
    if (answer.expected && isElsewhere(advice.place, answer.expected)) {
      movePlace(question, { at: answer.expected });
      answer.expected = null;
      remember();
      answerOne(index);
      return;
    }
    answer.advice = advice;
    answer.refusal = null;
    answer.others = null;
  } catch (refusal) {
    answer.refusal = refusal;
    answer.advice = null;
  }
  clearTimeout(answer.timer);
  answer.waiting = false;
  answer.slow = false;
  draw();
  performance.mark("answer");
  if (answer.advice) {
    try {
      const others = await fetchFor("others", { parts: ["rim"] });
      if (others) {
        answer.others = others;
        draw();
      }
    } catch {
      answer.others = { pairings: [] };
      draw();
    }
  }
}

const answerActive = debounced(() => answerOne(app.active), QUIET_MS);

/** The question has changed: mend it, put it in the address, ask anew. */
function changed() {
  if (complete(app.question())) {
    drawWheel();
    byId("town-word").textContent = t("page-mended");
  }
  remember();
  answerActive();
}

/**
 * Takes a place.
 *
 * @param expected "lat,lon" of the very town that was chosen, in case its name fits another one too
 */
function takePlace(place, expected = null) {
  movePlace(app.question(), place);
  app.answers[app.active].expected = expected;
  syncPlace();
  changed();
}

/** A point of the map: asked about only when it is on land, else it says so. */
async function pickPlace(at) {
  try {
    const spot = await ask("spot", "/api/map/spot", { at });
    if (spot === null) {
      return;
    }
    if (spot.land) {
      takePlace({ at });
      return;
    }
    throw new Refused(404, { error: spot.error, field: "at", was: at, allowed: spot.allowed });
  } catch (refusal) {
    answerActive.cancel();
    hangUp(`advice-${app.active}`);
    movePlace(app.question(), {});
    app.answers[app.active] = { ...noAnswer(), refusal };
    remember();
    draw();
  }
}

function compare() {
  app.questions = [app.questions[0], copyOf(app.questions[0])];
  app.answers = [app.answers[0], { ...app.answers[0] }];
  activate(1);
  remember();
}

function compareEnd() {
  app.questions = [app.questions[app.active]];
  app.answers = [app.answers[app.active]];
  activate(0);
  remember();
}

function activate(index) {
  app.active = index;
  redrawQuestion();
  draw();
}

function drawWheelTabs() {
  const box = byId("wheels");
  box.hidden = app.questions.length < 2;
  box.replaceChildren(
    ...app.questions.map((_, index) =>
      h(
        "button",
        {
          type: "button",
          "aria-pressed": String(index === app.active),
          onclick: () => {
            activate(index);
            byId("wheels").children[index].focus();
          },
        },
        t("page-wheel-letter", { letter: index === 0 ? "A" : "B" }),
      ),
    ),
  );
}

function redrawQuestion() {
  drawWheelTabs();
  syncPlace();
  drawRides();
  drawWheel();
}

let shownPlace = null;

function draw() {
  const { advice } = app.answers[app.active];
  document.body.classList.toggle("comparing", app.questions.length > 1);
  drawAnswer();
  drawAir(advice?.air);
  showPlace(advice?.place);
  if (advice && advice.place !== shownPlace) {
    shownPlace = advice.place;
    showOnMap(advice.place);
  }
}

function spokenHere() {
  const wanted = [app.view.lang, ...navigator.languages.map((tag) => tag.slice(0, 2))];
  const known = words.LANGUAGES.map(([id]) => id);
  return wanted.find((id) => known.includes(id)) ?? "en";
}

function dress() {
  document.documentElement.lang = app.view.lang;
  document.documentElement.dataset.theme = app.view.theme ?? "";
  words.measureIn(app.view.units === "us" ? "us" : "metric");
  for (const node of document.querySelectorAll("[data-t]")) {
    node.textContent = t(node.dataset.t);
  }
  for (const node of document.querySelectorAll("[data-t-label]")) {
    node.setAttribute("aria-label", t(node.dataset.tLabel));
  }
  document.title = `Saltspoke – ${t("page-claim")}`;
  byId("units").value = app.view.units === "us" ? "us" : "metric";
  byId("theme").value = app.view.theme ?? "";
}

async function setLanguage(lang) {
  const texts = await ask("texts", "/api/texts", { lang });
  if (texts) {
    app.view.lang = lang;
    words.speak(lang, texts);
  }
}

function initSettings() {
  byId("language").replaceChildren(
    ...words.LANGUAGES.map(([id, title]) => h("option", { value: id, selected: id === app.view.lang, lang: id }, title)),
  );
  byId("language").addEventListener("change", async (event) => {
    await setLanguage(event.target.value);
    remember();
    relabel();
    app.questions.forEach((_, index) => answerOne(index));
  });
  byId("units").addEventListener("change", (event) => {
    app.view.units = event.target.value === "us" ? "us" : "";
    remember();
    relabel();
  });
  byId("theme").addEventListener("change", (event) => {
    app.view.theme = event.target.value;
    remember();
    dress();
  });
  byId("question").addEventListener("submit", (event) => event.preventDefault());
}

function relabel() {
  dress();
  showCredits(app.about);
  relabelPlace();
  redrawQuestion();
  relabelMap();
  draw();
}

function showCredits(about) {
  const attributions = new Set((about.dataSet?.files ?? []).map((file) => file.attribution).filter(Boolean));
  byId("credits").replaceChildren(
    h("p", {}, t("page-credits")),
    h("details", {}, h("summary", {}, t("page-sources")), h("ul", {}, [...attributions].map((line) => h("li", {}, line)))),
  );
}

async function begin() {
  try {
    const lang = spokenHere();
    const [, profiles, parts, about] = await Promise.all([
      setLanguage(lang),
      ask("profiles", "/api/profiles"),
      ask("pairings", "/api/pairings"),
      ask("about", "/api/about"),
    ]);
    app.profiles = profiles.profiles;
    app.parts = { rim: parts.rims, nipple: parts.nipples, interface: parts.interfaces, spoke: parts.spokes };
    app.pairings = parts.pairings ?? [];
    app.postcodeCountries = about.postcodeCountries ?? POSTCODE_COUNTRIES;
    app.questions.forEach(complete);
    dress();
    initSettings();
    initPlace(app);
    initRides(app);
    initWheel(app);
    initAnswer(app);
    relabelPlace();
    redrawQuestion();
    initMap(app);
    app.about = about;
    showCredits(about);
    draw();
    if (app.questions.some(hasPlace)) {
      remember();
    }
    app.questions.forEach((_, index) => answerOne(index));
    document.documentElement.dataset.ready = "yes";
  } catch (failure) {
    const text = failure instanceof Refused ? "The program does not answer. Is it still running? Start it again, then reload this page." : String(failure);
    byId("verdict").replaceChildren(
      h(
        "div",
        { class: "word failed", role: "alert" },
        h("h3", {}, "No connection"),
        h("p", {}, text),
        h("button", { type: "button", onclick: () => location.reload() }, "Reload"),
      ),
    );
    if (!(failure instanceof Refused)) {
      throw failure;
    }
  }
}

begin();
