/** The map: layers drawn by the server, names, the value under the pointer, picking a place. */

import { ask } from "./api.js";
import { byId, debounced, h } from "./dom.js";
import * as words from "./words.js";

const { t } = words;
const L = window.L;
const LAYERS = [
  "class-carbon-steel",
  "class-zinc",
  "class-copper",
  "class-aluminium",
  "wet-hours",
  "chloride",
  "near-freezing-days",
];
const MOST_ZOOM = 11;
const QUIET_MS = 160;
const START = { centre: [48, 6], zoom: 3 };
const MOST_LATITUDE = 85;

let app;
let map;
let tiles;
let marker;
let names;
let legend = null;

const layerNow = () => (LAYERS.includes(app.view.layer) ? app.view.layer : LAYERS[0]);

function round(latlng) {
  const { lat, lng } = latlng.wrap();
  return `${lat.toFixed(4)},${lng.toFixed(4)}`;
}

async function pick(latlng) {
  if (Math.abs(latlng.lat) > MOST_LATITUDE) {
    return;
  }
  const at = round(latlng);
  putMarker(latlng.wrap());
  app.pickPlace(at);
}

function putMarker(latlng) {
  if (!marker) {
    marker = L.marker(latlng, {
      draggable: true,
      keyboard: true,
      autoPan: true,
      alt: t("page-marker"),
      title: t("page-marker"),
      icon: L.icon({ iconUrl: "/img/pin.svg", iconSize: [28, 36], iconAnchor: [14, 35] }),
    }).addTo(map);
    marker.on("dragend", () => pick(marker.getLatLng()));
  }
  marker.setLatLng(latlng);
}

const readValue = debounced(async (latlng) => {
  const at = round(latlng);
  const layer = layerNow();
  try {
    const value = await ask("value", "/api/value", { layer, at });
    if (value) {
      byId("pointer").textContent = tellValue(value);
    }
  } catch {
    byId("pointer").textContent = "";
  }
}, QUIET_MS);

/** A value under the pointer in words; a class with how sure it is. */
function tellValue(value) {
  if (value.value === null || value.value === undefined) {
    return t("page-pointer-sea");
  }
  if (value.category) {
    const known = value.probability === undefined || value.probability === null;
    return known
      ? t("page-pointer-class", { category: value.category })
      : t(value.coinToss ? "page-pointer-toss" : "page-pointer-sure", {
          category: value.category,
          share: words.percent(value.probability),
        });
  }
  return t("page-pointer-value", { value: words.rough(value.value), unit: legend?.unit ?? "" });
}

function drawLegend() {
  const box = byId("legend");
  if (!legend) {
    box.replaceChildren();
    return;
  }
  box.replaceChildren(
    h(
      "ul",
      { class: "legend", "aria-label": t("page-legend") },
      legend.steps.map((step) => {
        const swatch = h("span", { class: "swatch", "aria-hidden": "true" });
        swatch.style.setProperty("background-color", step.colour);
        return h("li", {}, swatch, h("span", {}, step.label));
      }),
      legend.hatched
        ? h("li", {}, h("span", { class: "swatch hatch", "aria-hidden": "true" }), h("span", {}, t("page-legend-toss")))
        : null,
    ),
    h("p", { class: "hint" }, legend.unit ? t("page-legend-unit", { unit: legend.unit }) : t("page-legend-class")),
  );
}

async function showLayer() {
  const layer = layerNow();
  byId("layer").value = layer;
  tiles?.remove();
  tiles = L.tileLayer(`/api/tiles/${layer}/{z}/{x}/{y}.png`, {
    maxZoom: MOST_ZOOM,
    className: "value-tiles",
  });
  tiles.on("loading", () => {
    byId("pointer").textContent = t("page-map-drawing");
  });
  tiles.on("load", () => {
    if (byId("pointer").textContent === t("page-map-drawing")) {
      byId("pointer").textContent = "";
    }
  });
  tiles.addTo(map);
  legend = null;
  try {
    legend = await ask("legend", `/api/legend/${layer}`);
  } catch {
    legend = null;
  }
  drawLegend();
}

/** Names of countries that fit at this zoom, largest first. */
async function showNames() {
  names = L.layerGroup().addTo(map);
  let known;
  try {
    known = await ask("names", "/api/map/names.json");
  } catch {
    return;
  }
  const draw = () => {
    names.clearLayers();
    const bounds = map.getBounds().pad(0.1);
    const taken = [];
    for (const name of known?.names ?? []) {
      const latlng = L.latLng(name.latitudeDeg, name.longitudeDeg);
      if (!bounds.contains(latlng) || name.fromZoom > map.getZoom()) {
        continue;
      }
      const at = map.latLngToContainerPoint(latlng);
      const title = words.country(name.countryCode) || name.name;
      const half = title.length * 3.6;
      if (taken.some((other) => Math.abs(other.x - at.x) < half + other.half && Math.abs(other.y - at.y) < 16)) {
        continue;
      }
      taken.push({ x: at.x, y: at.y, half });
      const label = h("span", {}, title);
      names.addLayer(
        L.marker(latlng, {
          interactive: false,
          keyboard: false,
          icon: L.divIcon({ className: "map-name", html: label, iconSize: [0, 0] }),
        }),
      );
    }
  };
  map.on("zoomend moveend", draw);
  showNames.draw = draw;
  draw();
}

export function initMap(theApp) {
  app = theApp;
  map = L.map("map", {
    center: START.centre,
    zoom: START.zoom,
    minZoom: 1,
    maxZoom: MOST_ZOOM,
    worldCopyJump: true,
    attributionControl: false,
    zoomControl: false,
    maxBounds: [
      [-MOST_LATITUDE, -Infinity],
      [MOST_LATITUDE, Infinity],
    ],
    zoomAnimation: !matchMedia("(prefers-reduced-motion: reduce)").matches,
  });
  map.on("click", (event) => pick(event.latlng));
  map.on("mousemove", (event) => readValue(event.latlng));
  map.on("mouseout", () => {
    readValue.cancel();
    byId("pointer").textContent = "";
  });
  byId("map").addEventListener("keydown", (event) => {
    if (event.key === "Enter" && event.target === byId("map")) {
      event.preventDefault();
      pick(map.getCenter());
    }
  });
  byId("map-centre").addEventListener("click", () => pick(map.getCenter()));
  byId("layer").addEventListener("change", (event) => {
    app.view.layer = event.target.value;
    app.remember();
    showLayer();
  });
  new ResizeObserver(() => map.invalidateSize({ animate: false })).observe(byId("map"));
  relabelMap();
  showLayer();
  showNames();
}

/** Writes the words of the map in the page's language. */
export function relabelMap() {
  byId("layer").replaceChildren(
    ...LAYERS.map((id) => h("option", { value: id, selected: id === layerNow() }, t(`page-layer-${id}`))),
  );
  map.zoomControl?.remove();
  map.zoomControl = L.control
    .zoom({ zoomInTitle: t("page-zoom-in"), zoomOutTitle: t("page-zoom-out") })
    .addTo(map);
  if (marker) {
    marker.remove();
    const at = marker.getLatLng();
    marker = null;
    putMarker(at);
  }
  showNames.draw?.();
  drawLegend();
}

/** Moves the marker to where an answer stands, and the view if it is out of sight. */
export function showOnMap(place) {
  if (!place) {
    return;
  }
  const latlng = L.latLng(place.latitudeDeg, place.longitudeDeg);
  putMarker(latlng);
  if (!map.getBounds().pad(-0.15).contains(latlng)) {
    map.setView(latlng, Math.max(map.getZoom(), 7), { animate: false });
  }
}
