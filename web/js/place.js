/** The place: typing with a list, postcode and country, the browser's own position, corrections. */

import { ask } from "./api.js";
import { byId, debounced, h } from "./dom.js";
import * as words from "./words.js";

const { t } = words;
const LEAST_LETTERS = 2;
const QUIET_MS = 140;
const SETTINGS = ["remote", "rural", "town", "city", "industrial", "port"];
const COORDINATES = /^\s*(-?\d{1,2}(?:\.\d+)?)\s*[,;\s]\s*(-?\d{1,3}(?:\.\d+)?)\s*$/;

let app;
let found = [];
let active = -1;

export function placeTitle(place) {
  const parts = [place.name, place.regionName, words.country(place.countryCode)];
  return parts.filter((text, index) => text && parts.indexOf(text) === index).join(", ");
}

/** How a place is called where its answer stands. */
export function calledPlace(place) {
  const title = placeTitle(place);
  return place.name ? title : [words.coordinates(place.latitudeDeg, place.longitudeDeg), title].filter(Boolean).join(", ");
}

function tell(text) {
  byId("town-word").textContent = text;
}

function closeList() {
  byId("towns").hidden = true;
  byId("town").setAttribute("aria-expanded", "false");
  byId("town").removeAttribute("aria-activedescendant");
  active = -1;
}

function mark(index) {
  const options = [...byId("towns").children];
  active = options.length ? (index + options.length) % options.length : -1;
  options.forEach((option, at) => option.setAttribute("aria-selected", String(at === active)));
  if (active >= 0) {
    byId("town").setAttribute("aria-activedescendant", options[active].id);
    options[active].scrollIntoView({ block: "nearest" });
  }
}

function choose(index) {
  const place = found[index];
  closeList();
  byId("town").value = place.title;
  tell("");
  app.takePlace(place.fields, place.at);
}

function showFound(places) {
  found = places;
  const list = byId("towns");
  list.replaceChildren(
    ...places.map((place, index) =>
      h(
        "li",
        {
          id: `town-${index}`,
          role: "option",
          "aria-selected": "false",
          onmousedown: (event) => event.preventDefault(),
          onclick: () => choose(index),
        },
        h("span", { class: "town-name" }, place.head),
        h("span", { class: "town-rest" }, place.rest),
      ),
    ),
  );
  const open = places.length > 0;
  list.hidden = !open;
  byId("town").setAttribute("aria-expanded", String(open));
  if (open) {
    mark(0);
  } else {
    closeList();
  }
}

const search = debounced(async (text) => {
  const point = COORDINATES.exec(text);
  if (point) {
    const at = `${Number(point[1])},${Number(point[2])}`;
    showFound([{ head: at, rest: t("page-point"), title: at, fields: { at } }]);
    tell(t("page-one-found"));
    return;
  }
  try {
    const answer = await ask("places", "/api/places", { q: text, lang: app.view.lang });
    if (!answer || byId("town").value.trim() !== text) {
      return;
    }
    showFound(
      answer.places.map((place) => ({
        head: place.name,
        rest: [place.regionName, words.country(place.countryCode)].filter(Boolean).join(", "),
        title: placeTitle(place),
        fields: { place: [place.name, place.regionName, place.countryName].filter(Boolean).join(", ") },
        at: `${place.latitudeDeg},${place.longitudeDeg}`,
      })),
    );
    tell(
      found.length === 0
        ? t("page-none-found")
        : found.length === 1
          ? t("page-one-found")
          : t("page-many-found", { count: found.length }),
    );
  } catch (refusal) {
    showFound([]);
    tell(app.wordsFor(refusal));
  }
}, QUIET_MS);

function typed() {
  const text = byId("town").value.trim();
  if (text.length < LEAST_LETTERS) {
    search.cancel();
    showFound([]);
    tell(text ? t("page-type-more") : "");
    return;
  }
  search(text);
}

function onKey(event) {
  const open = !byId("towns").hidden;
  if (event.key === "ArrowDown" || event.key === "ArrowUp") {
    event.preventDefault();
    if (open) {
      mark(active + (event.key === "ArrowDown" ? 1 : -1));
    } else {
      typed();
    }
  } else if (event.key === "Enter") {
    event.preventDefault();
    if (open && active >= 0) {
      choose(active);
    }
  } else if (event.key === "Escape" && open) {
    event.preventDefault();
    closeList();
  }
}

function findPostcode() {
  const postcode = byId("postcode").value.trim();
  if (!postcode) {
    tell(t("page-postcode-empty"));
    byId("postcode").focus();
    return;
  }
  byId("town").value = "";
  tell("");
  app.takePlace({ postcode, country: byId("country").value });
}

function here() {
  if (!navigator.geolocation) {
    tell(t("page-here-none"));
    return;
  }
  tell(t("page-here-asking"));
  navigator.geolocation.getCurrentPosition(
    ({ coords }) => {
      tell("");
      app.takePlace({ at: `${coords.latitude.toFixed(4)},${coords.longitude.toFixed(4)}` });
    },
    () => tell(t("page-here-none")),
    { timeout: 8000, maximumAge: 600_000 },
  );
}

function correct(name, input, fromShown) {
  const value = input.value.trim();
  if (value === "") {
    delete app.question().fields[name];
  } else {
    app.question().fields[name] = String(Math.round(fromShown(Number(value)) * 1000) / 1000);
  }
  app.changed();
}

export function initPlace(theApp) {
  app = theApp;
  const town = byId("town");
  town.addEventListener("input", typed);
  town.addEventListener("keydown", onKey);
  town.addEventListener("blur", closeList);
  byId("find-postcode").addEventListener("click", findPostcode);
  byId("postcode").addEventListener("keydown", (event) => {
    if (event.key === "Enter") {
      event.preventDefault();
      findPostcode();
    }
  });
  byId("country").addEventListener("change", () => {
    if (byId("postcode").value.trim()) {
      findPostcode();
    }
  });
  byId("here").addEventListener("click", here);
  byId("elevation").addEventListener("change", (e) => correct("elevation", e.target, words.heightToMetres));
  byId("sea-distance").addEventListener("change", (e) => correct("sea-distance", e.target, words.distanceToKm));
  byId("setting").addEventListener("change", (e) => {
    if (e.target.value) {
      app.question().fields.setting = e.target.value;
    } else {
      delete app.question().fields.setting;
    }
    app.changed();
  });
}

/** Writes the lists in the page's language. */
export function relabelPlace() {
  const country = byId("country");
  const before = country.value || app.question().fields.country || homeCountry();
  const codes = [...new Set([...app.postcodeCountries, before])].filter(Boolean);
  const titled = codes.map((code) => [code, words.country(code)]).sort((a, b) => a[1].localeCompare(b[1]));
  country.replaceChildren(...titled.map(([code, title]) => h("option", { value: code, selected: code === before }, title)));
  byId("setting").replaceChildren(
    h("option", { value: "" }, t("page-setting-guess")),
    ...SETTINGS.map((id) => h("option", { value: id }, t(`page-setting-${id}`))),
  );
  const units = words.lengthUnits();
  byId("elevation-label").textContent = t("page-elevation", { unit: units.height });
  byId("sea-label").textContent = t("page-sea-distance", { unit: units.distance });
  syncPlace();
}

function homeCountry() {
  const region = navigator.languages.map((tag) => new Intl.Locale(tag).region).find(Boolean);
  return app.postcodeCountries.includes(region) ? region : app.postcodeCountries[0];
}

/** Brings the fields in line with the active question. */
export function syncPlace() {
  const { fields } = app.question();
  const shown = (name, convert) =>
    fields[name] === undefined ? "" : String(Math.round(convert(Number(fields[name])) * 100) / 100);
  byId("elevation").value = shown("elevation", words.heightFromMetres);
  byId("sea-distance").value = shown("sea-distance", words.distanceFromKm);
  byId("setting").value = fields.setting ?? "";
  if (fields.postcode) {
    byId("postcode").value = fields.postcode;
    byId("country").value = fields.country;
  }
}

/** Shows where the answer of the active question stands. */
export function showPlace(place) {
  const line = byId("place-now");
  line.hidden = !place;
  if (place) {
    line.replaceChildren(
      h("strong", {}, calledPlace(place)),
      h("span", {}, t("page-place-facts", { height: words.height(place.elevationM), distance: words.distance(place.seaDistanceKm) })),
    );
    if (document.activeElement !== byId("town")) {
      byId("town").value = place.name ? placeTitle(place) : "";
    }
  }
}
