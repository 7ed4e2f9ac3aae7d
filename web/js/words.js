/** Sentences, numbers, dates and units in the language and units of the page. */

export const LANGUAGES = [
  ["en", "English"],
  ["de", "Deutsch"],
  ["fr", "Français"],
  ["it", "Italiano"],
  ["es", "Español"],
];

const KM_PER_MILE = 1.609344; // exact by definition
const M_PER_FOOT = 0.3048; // exact by definition
const MM_PER_INCH = 25.4; // exact by definition
const UM_PER_MIL = 25.4; // exact by definition

let sentences = {};
let language = "en";
let units = "metric";

export function speak(lang, texts) {
  language = lang;
  sentences = texts;
}

export function measureIn(system) {
  units = system;
}

/** The sentence of a code with its gaps filled; undefined gaps stay visible. */
export function t(code, values = {}) {
  const text = sentences[code] ?? code;
  return text.replace(/\{([A-Za-z0-9]+)\}/g, (gap, name) => values[name] ?? gap);
}

/** The first of several codes that has a sentence, else what is given last. */
export function firstOf(codes, otherwise) {
  const known = codes.find((code) => sentences[code] !== undefined);
  return known === undefined ? otherwise : sentences[known];
}

/** A note from the server: its own sentence in the page's language. */
export const say = (note) => note.text ?? t(note.code, note.args);

/** A note's sentence with some gaps filled by the page instead of the server. */
export function fill(note, values) {
  if (sentences[note.code] === undefined) {
    return say(note);
  }
  const args = Object.fromEntries(
    Object.entries(note.args ?? {}).map(([name, value]) => [name, typeof value === "number" ? rough(value) : value]),
  );
  return t(note.code, { ...args, ...values });
}

export function number(value, digits = 0) {
  return new Intl.NumberFormat(language, { maximumFractionDigits: digits }).format(value);
}

/** A number in about two significant digits, for quantities that are not known better. */
export function rough(value) {
  const size = Math.abs(value);
  const digits = size >= 10 ? 0 : size >= 1 ? 1 : size >= 0.1 ? 2 : 3;
  const stepped = size >= 100 ? Number(value.toPrecision(2)) : value;
  return number(stepped, digits);
}

export const roughRange = (q) =>
  rough(q.p10) === rough(q.p90) ? rough(q.p10) : `${rough(q.p10)}–${rough(q.p90)}`;

export function percent(share) {
  return new Intl.NumberFormat(language, { style: "percent", maximumFractionDigits: 0 }).format(share);
}

function counted(value, unit, digits = 0) {
  return new Intl.NumberFormat(language, {
    style: "unit",
    unit,
    unitDisplay: "long",
    maximumFractionDigits: digits,
  }).format(value);
}

function countedRange(from, to, unit, digits) {
  const format = new Intl.NumberFormat(language, {
    style: "unit",
    unit,
    unitDisplay: "long",
    maximumFractionDigits: digits,
  });
  return format.format(from) === format.format(to) ? format.format(from) : format.formatRange(from, to);
}

const WEEKS_PER_MONTH = 365.25 / 12 / 7;
const MONTHS_SHOWN_AS_YEARS = 36;

/** A span to act within, always rounded down: better a week early than a week late. */
function rounded(months) {
  if (months < 1) {
    return { unit: "week", value: Math.max(1, Math.floor(months * WEEKS_PER_MONTH)) };
  }
  return { unit: "month", value: months < 6 ? Math.floor(months * 2) / 2 : Math.floor(months) };
}

export function span(months) {
  const { unit, value } = rounded(months);
  return counted(value, unit, 1);
}

/** "every 3 months", as each language says it for one and for several. */
export function every(months) {
  const { unit, value } = rounded(months);
  return value === 1 ? t(`page-each-${unit}`) : t(`page-each-${unit}s`, { span: span(months) });
}

/** When a state is reached, as a range; what lies beyond the horizon says so. */
export function timesRange(times) {
  if (times.notApplicable) {
    return t("page-times-never");
  }
  if (times.p10 === null) {
    return t("page-times-beyond");
  }
  const inYears = (times.p90 ?? Infinity) > MONTHS_SHOWN_AS_YEARS && times.p10 >= 12;
  const unit = inYears ? "year" : "month";
  const scale = inYears ? 12 : 1;
  const digits = inYears && times.p10 / scale < 5 ? 1 : times.p10 / scale < 3 ? 1 : 0;
  if (times.p90 === null) {
    return t("page-times-open", { from: counted(times.p10 / scale, unit, digits) });
  }
  return countedRange(times.p10 / scale, times.p90 / scale, unit, digits);
}

export const minutes = (value) => counted(value, "minute");
export const hours = (value) => counted(value, "hour");

export function monthName(month, width = "long") {
  return new Intl.DateTimeFormat(language, { month: width, timeZone: "UTC" }).format(
    new Date(Date.UTC(2001, month - 1, 15)),
  );
}

export function dateIn(months, from = new Date()) {
  const days = Math.floor((months * 365.25) / 12);
  return new Date(from.getFullYear(), from.getMonth(), from.getDate() + days);
}

export function date(value) {
  return new Intl.DateTimeFormat(language, { day: "numeric", month: "long", year: "numeric" }).format(value);
}

export function monthAndYear(value) {
  return new Intl.DateTimeFormat(language, { month: "long", year: "numeric" }).format(value);
}

export function country(code) {
  if (!/^[A-Z]{2}$/.test(code ?? "")) {
    return code ?? "";
  }
  return new Intl.DisplayNames([language], { type: "region" }).of(code) ?? code;
}

const us = () => units === "us";
export const temperature = (c) => (us() ? `${number(c * 1.8 + 32)} °F` : `${number(c)} °C`);
export const rain = (mm) => (us() ? `${number(mm / MM_PER_INCH, 0)} in` : `${number(mm)} mm`);
export const loss = (q) =>
  us()
    ? `${roughRange({ p10: q.p10 / UM_PER_MIL, p90: q.p90 / UM_PER_MIL })} mil`
    : `${roughRange(q)} µm`;
export const height = (m) => (us() ? `${number(m / M_PER_FOOT)} ft` : `${number(m)} m`);
export function distance(km) {
  if (us()) {
    return `${number(km / KM_PER_MILE, km < 16 ? 1 : 0)} mi`;
  }
  return km < 1 ? `${number(km * 1000)} m` : `${number(km, km < 10 ? 1 : 0)} km`;
}

export const lengthUnits = () => (us() ? { height: "ft", distance: "mi" } : { height: "m", distance: "km" });
export const heightToMetres = (value) => (us() ? value * M_PER_FOOT : value);
export const heightFromMetres = (value) => (us() ? value / M_PER_FOOT : value);
export const distanceToKm = (value) => (us() ? value * KM_PER_MILE : value);
export const distanceFromKm = (value) => (us() ? value / KM_PER_MILE : value);

export function coordinates(lat, lon) {
  const ns = lat >= 0 ? t("page-north") : t("page-south");
  const ew = lon >= 0 ? t("page-east") : t("page-west");
  return `${number(Math.abs(lat), 2)}° ${ns}, ${number(Math.abs(lon), 2)}° ${ew}`;
}

/** The title of a catalogue part in the page's language. */
export function part(kind, id, title) {
  return firstOf([`page-${kind}-${id}`], title ?? id);
}

/** A mark on a time scale: months below two years, years beyond. */
export function shortSpan(months) {
  const inYears = months >= 24;
  return new Intl.NumberFormat(language, {
    style: "unit",
    unit: inYears ? "year" : "month",
    unitDisplay: "short",
  }).format(inYears ? months / 12 : months);
}
