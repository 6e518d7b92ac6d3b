import type { Look } from "./preferences";

// Browsers round the reading to 50 lux, so that a page cannot tell what stands on a screen nearby (W3C Ambient Light
// Sensor, section "Reduce accuracy"): darker than 25 lux reads as 0. Our own thresholds: a lit garage is about 100.
const NIGHT_BELOW_LUX = 50;
const DAY_FROM_LUX = 100;

/**
 * The look for the light here. Between the two thresholds it stays as it was, so that a cloud or a hand over the
 * phone does not make the screen flicker.
 */
export function lookByLight(lux: number, now: Look | null): Look {
  if (lux < NIGHT_BELOW_LUX) return "night";
  if (lux >= DAY_FROM_LUX) return "day";
  return now ?? "day";
}

/** The part of the browser's light sensor that is used; TypeScript's own types lack it. */
interface LightSensor extends EventTarget {
  readonly illuminance?: number | null;
  start: () => void;
  stop: () => void;
}
type SensorClass = new (options: { frequency: number }) => LightSensor;

function sensorClass(): SensorClass | null {
  return (globalThis as { AmbientLightSensor?: SensorClass }).AmbientLightSensor ?? null;
}

/** Whether this browser can measure light at all. */
export function canMeasureLight(): boolean {
  return sensorClass() !== null;
}

/** Calls `measured` with each reading in lux until what it returns is called. A refused sensor measures nothing. */
export function followLight(measured: (lux: number) => void): () => void {
  const Sensor = sensorClass();
  if (!Sensor) return () => {};
  try {
    const sensor = new Sensor({ frequency: 1 });
    sensor.addEventListener("reading", () => {
      if (typeof sensor.illuminance === "number") measured(sensor.illuminance);
    });
    sensor.addEventListener("error", () => {});
    sensor.start();
    return () => sensor.stop();
  } catch {
    return () => {};
  }
}
