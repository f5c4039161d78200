/** Temperature, pressure, atmosphere, and what is held constant. */

import { byId } from '../dom.js';
import { unfold } from '../folds.js';
import { asText, emptyCase } from '../state.js';

/** @import { Case } from '../shiftgauge.js' */

const temperature = byId('temperature', HTMLInputElement);
const pressure = byId('pressure', HTMLInputElement);
const atmosphere = byId('atmosphere', HTMLInputElement);
const hold = byId('hold', HTMLSelectElement);
const volume = byId('volume', HTMLInputElement);
const band = byId('band', HTMLInputElement);
const USUAL_BAND = emptyCase().band;

/** @param {Case} question */
export function fill(question) {
  temperature.value = asText(question.temperature);
  pressure.value = asText(question.pressure);
  atmosphere.value = asText(question.atmosphere);
  hold.value = question.hold === 'volume' ? 'volume' : 'pressure';
  volume.value = asText(question.volume);
  band.value = question.band === null ? '' : asText(question.band);
  unfold('band-fold', band.value !== '' && band.value !== USUAL_BAND);
}

/**
 * With the volume held, the pressure or the volume may be left out: each follows from the other.
 * @param {Case} question
 * @returns {Case}
 */
export function read(question) {
  const atVolume = hold.value === 'volume';
  const noPressure = atVolume && pressure.value.trim() === '' && volume.value.trim() !== '';
  return {
    ...question,
    temperature: temperature.value,
    pressure: noPressure ? null : pressure.value,
    atmosphere: atmosphere.value,
    hold: atVolume ? 'volume' : 'pressure',
    volume: atVolume && volume.value.trim() !== '' ? volume.value : null,
    band: band.value.trim() === '' ? USUAL_BAND : band.value,
  };
}

export function render() {
  byId('volume-row', HTMLElement).hidden = hold.value !== 'volume';
  byId('band-shown', HTMLElement).textContent = band.value.trim() || USUAL_BAND;
}
