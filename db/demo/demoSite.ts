import type { Drawing } from '../../model/drawing/schema';
import type { Survey } from '../../model/drawing/surveySchema';

/** What a demo site is filled with: its revisions in order, and the draft that follows the last of them. */
export interface DemoSite {
  readonly name: string;
  readonly revisions: readonly {
    readonly note: string;
    readonly drawing: Drawing;
    readonly survey: Survey;
    readonly daysAgo: number;
  }[];
  readonly draft: { readonly drawing: Drawing; readonly survey: Survey };
}
