/** Changes of a survey, as pure functions. */
import type { Station, Survey } from '../../../model/drawing/surveySchema';
import type { Ticks } from '../../../model/length/ticks';

/** The survey with this measure-down at a station: over the reading it had, or as a new one under `id`. */
export function withReading(survey: Survey, id: string, station: Station, down: Ticks): Survey {
  const had = survey.readings.some((reading) => reading.id === id);
  const readings = had
    ? survey.readings.map((reading) => (reading.id === id ? { ...reading, down } : reading))
    : [...survey.readings, { id, station, down }];
  return { ...survey, readings };
}

/** The survey without these readings. */
export function withoutReadings(survey: Survey, ids: readonly string[]): Survey {
  const gone = new Set(ids);
  return { ...survey, readings: survey.readings.filter((reading) => !gone.has(reading.id)) };
}
