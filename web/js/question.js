/** The question of one wheel, and how the page's address holds one or two of them. */

/** Fields of a profile that can be changed on the page, with how the address writes them. */
const PROFILE_FIELDS = {
  months: { read: (text) => text.split(".").filter(Boolean).map(Number), write: (v) => v.join(".") },
  hoursPerWeek: { read: Number, write: String },
  wetRideShare: { read: Number, write: String },
  saltedRoads: { read: String, write: String },
  seaRideShare: { read: Number, write: String },
  trainerHoursPerWeek: { read: Number, write: String },
  storage: { read: String, write: String },
  rinsing: { read: String, write: String },
  driedAfterWet: { read: (text) => text === "true", write: String },
  drainHoles: { read: (text) => text === "true", write: String },
  threadCompound: { read: String, write: String },
  sealant: { read: String, write: String },
};

const PLACE_NAMES = ["place", "postcode", "country", "at", "elevation", "sea-distance", "setting"];
const WHEEL_NAMES = [
  "profile",
  "rim",
  "nipple",
  "interface",
  "spoke",
  "risk",
  "build-month",
  "age-months",
  "last-finding",
  "practice-limits",
  "spokes",
  "tension",
  "tape-sound",
  "hidden-nipples",
];
const PARTS = ["rim", "nipple", "interface", "spoke"];

/** A question: `fields` carry the server's names, `own` the changes to the ready profile. */
export function emptyQuestion() {
  return { fields: {}, own: {} };
}

export const copyOf = (question) => structuredClone(question);

export function hasPlace(question) {
  return Boolean(question.fields.at || question.fields.place || question.fields.postcode);
}

export const isOwnProfile = (question) => Object.keys(question.own).length > 0;

/** Puts a new place; what was known better about the old one no longer holds. */
export function movePlace(question, place) {
  for (const name of PLACE_NAMES) {
    delete question.fields[name];
  }
  Object.assign(question.fields, place);
}

/** Query parameters for the server. */
export function parameters(question, { parts = PARTS } = {}) {
  const result = {};
  for (const [name, value] of Object.entries(question.fields)) {
    if (!PARTS.includes(name) || parts.includes(name)) {
      result[name] = value;
    }
  }
  return result;
}

export function placeParameters(question) {
  return Object.fromEntries(
    Object.entries(question.fields).filter(([name]) => PLACE_NAMES.includes(name)),
  );
}

/** The body of a POST when the profile is the user's own, else null. */
export function body(question, profiles, lang, options) {
  if (!isOwnProfile(question)) {
    return null;
  }
  const ready = profiles.find((profile) => profile.name === question.fields.profile) ?? {};
  const { title, ...rest } = ready;
  return {
    ...parameters(question, options),
    lang,
    profile: { ...rest, ...question.own, name: "own", title: title ?? "own" },
  };
}

/** The page's address for one question, or two side by side. */
export function writeAddress(questions, view) {
  const query = new URLSearchParams();
  questions.forEach((question, index) => {
    const prefix = index === 0 ? "" : "b.";
    for (const name of [...PLACE_NAMES, ...WHEEL_NAMES]) {
      if (question.fields[name] !== undefined) {
        query.set(prefix + name, question.fields[name]);
      }
    }
    for (const [name, value] of Object.entries(question.own)) {
      query.set(`${prefix}own.${name}`, PROFILE_FIELDS[name].write(value));
    }
  });
  for (const [name, value] of Object.entries(view)) {
    if (value) {
      query.set(name, value);
    }
  }
  return `${location.pathname}?${query.toString().replaceAll("%2C", ",")}`;
}

/** The questions and the view that an address holds. */
export function readAddress(search) {
  const query = new URLSearchParams(search);
  const questions = [emptyQuestion()];
  const view = {};
  for (const [key, value] of query) {
    const second = key.startsWith("b.");
    const name = second ? key.slice(2) : key;
    if (value === "") {
      continue;
    }
    if (second && questions.length === 1) {
      questions.push(emptyQuestion());
    }
    const question = questions[second ? 1 : 0];
    if (name.startsWith("own.") && PROFILE_FIELDS[name.slice(4)]) {
      question.own[name.slice(4)] = PROFILE_FIELDS[name.slice(4)].read(value);
    } else if (PLACE_NAMES.includes(name) || WHEEL_NAMES.includes(name)) {
      question.fields[name] = value;
    } else if (["lang", "units", "theme", "layer"].includes(name)) {
      view[name] = value;
    }
  }
  return { questions, view };
}
