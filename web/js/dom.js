/** Builds elements without ever parsing markup from a string. */

const SVG = "http://www.w3.org/2000/svg";

function append(node, children) {
  for (const child of children.flat(Infinity)) {
    if (child !== null && child !== undefined && child !== false) {
      node.append(child);
    }
  }
  return node;
}

/** An HTML element; `on…` properties become listeners, the rest attributes. */
export function h(tag, properties = {}, ...children) {
  const node = document.createElement(tag);
  for (const [name, value] of Object.entries(properties)) {
    if (value === null || value === undefined || value === false) {
      continue;
    }
    if (name.startsWith("on")) {
      node.addEventListener(name.slice(2), value);
    } else if (name === "value" || name === "checked" || name === "selected") {
      node[name] = value;
    } else {
      node.setAttribute(name, value === true ? "" : value);
    }
  }
  return append(node, children);
}

/** An SVG element. */
export function s(tag, attributes = {}, ...children) {
  const node = document.createElementNS(SVG, tag);
  for (const [name, value] of Object.entries(attributes)) {
    if (value !== null && value !== undefined && value !== false) {
      node.setAttribute(name, value);
    }
  }
  return append(node, children);
}

export const byId = (id) => document.getElementById(id);

/** Calls `work` once things have been quiet for `milliseconds`. */
export function debounced(work, milliseconds) {
  let timer = 0;
  const call = (...values) => {
    clearTimeout(timer);
    timer = setTimeout(() => work(...values), milliseconds);
  };
  call.cancel = () => clearTimeout(timer);
  return call;
}
