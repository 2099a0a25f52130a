/** Changes of a survey, as pure functions. */
import type { Station, Survey } from '../../../model/drawing/surveySchema';
import type { Ticks } from '../../../model/length/ticks';

/** The survey with this measure-down at a station: over the reading it had, or as a new one under `id`. A rod survey stays as it is. */
export function withReading(survey: Survey, id: string, station: Station, down: Ticks): Survey {
  if (survey.method !== 'measureDown') return survey;
  const had = survey.readings.some((reading) => reading.id === id);
  const readings = had
    ? survey.readings.map((reading) => (reading.id === id ? { ...reading, down } : reading))
    : [...survey.readings, { id, station, down }];
  return { ...survey, readings };
}

/** The survey without these readings. A rod survey stays as it is: a row taken out of its book would break a set-up. */
export function withoutReadings(survey: Survey, ids: readonly string[]): Survey {
  if (survey.method !== 'measureDown') return survey;
  const gone = new Set(ids);
  return { ...survey, readings: survey.readings.filter((reading) => !gone.has(reading.id)) };
}
