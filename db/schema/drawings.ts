/** The draft of each site, its immutable revisions, what was set aside, and the writes already answered. */
import {
  boolean,
  index,
  integer,
  jsonb,
  pgEnum,
  pgTable,
  primaryKey,
  text,
  timestamp,
  uuid,
} from 'drizzle-orm/pg-core';
import type { Drawing } from '../../model/drawing/schema';
import type { Survey } from '../../model/drawing/surveySchema';
import type { PlanPoint } from '../../model/geometry/point';
import { user } from './auth';
import { sites } from './sites';

export const partEnum = pgEnum('part', ['drawing', 'survey']);

export const drafts = pgTable('drafts', {
  siteId: uuid('site_id')
    .primaryKey()
    .references(() => sites.id, { onDelete: 'cascade' }),
  drawing: jsonb('drawing').$type<Drawing>().notNull(),
  drawingVersion: integer('drawing_version').default(0).notNull(),
  survey: jsonb('survey').$type<Survey>().notNull(),
  surveyVersion: integer('survey_version').default(0).notNull(),
  /** The revision that it was last saved as or restored from. */
  afterRevision: integer('after_revision'),
  /** Whether it differs from that revision: worked out at each save, so that a list of sites need not compare drawings. */
  changedSince: boolean('changed_since').default(false).notNull(),
  /** Outlines of the walls for the list of sites, worked out at each save. */
  outline: jsonb('outline').$type<readonly (readonly PlanPoint[])[]>().notNull(),
  changedBy: text('changed_by').references(() => user.id, { onDelete: 'set null' }),
  changedAt: timestamp('changed_at', { withTimezone: true }).defaultNow().notNull(),
});

/** A drawing or survey that was refused because the draft had moved on, or that a restore replaced: kept until someone has dealt with it. */
export const setAside = pgTable(
  'set_aside',
  {
    id: uuid('id').primaryKey().defaultRandom(),
    siteId: uuid('site_id')
      .notNull()
      .references(() => sites.id, { onDelete: 'cascade' }),
    part: partEnum('part').notNull(),
    drawing: jsonb('drawing').$type<Drawing>(),
    survey: jsonb('survey').$type<Survey>(),
    savedBy: text('saved_by').references(() => user.id, { onDelete: 'set null' }),
    savedAt: timestamp('saved_at', { withTimezone: true }).defaultNow().notNull(),
  },
  (table) => [index('set_aside_site_id_index').on(table.siteId)],
);

/** What was issued: a trigger refuses every change and every removal but that of the whole site. */
export const revisions = pgTable(
  'revisions',
  {
    siteId: uuid('site_id')
      .notNull()
      .references(() => sites.id, { onDelete: 'cascade' }),
    /** 1, 2, 3 … within the site. */
    number: integer('number').notNull(),
    note: text('note').notNull(),
    drawing: jsonb('drawing').$type<Drawing>().notNull(),
    survey: jsonb('survey').$type<Survey>().notNull(),
    savedBy: text('saved_by')
      .notNull()
      .references(() => user.id, { onDelete: 'restrict' }),
    /** The name as it was on the day. */
    savedByName: text('saved_by_name').notNull(),
    savedAt: timestamp('saved_at', { withTimezone: true }).defaultNow().notNull(),
  },
  (table) => [primaryKey({ columns: [table.siteId, table.number] })],
);

/** What a write was answered, so that sending it again after a lost answer changes nothing and answers the same. */
export const writes = pgTable(
  'writes',
  {
    siteId: uuid('site_id')
      .notNull()
      .references(() => sites.id, { onDelete: 'cascade' }),
    writeId: uuid('write_id').notNull(),
    userId: text('user_id')
      .notNull()
      .references(() => user.id, { onDelete: 'cascade' }),
    kind: text('kind').notNull(),
    /** SHA-256 of what was asked: the same id with another content is refused. */
    asked: text('asked').notNull(),
    answer: jsonb('answer').notNull(),
    writtenAt: timestamp('written_at', { withTimezone: true }).defaultNow().notNull(),
  },
  (table) => [
    primaryKey({ columns: [table.siteId, table.writeId] }),
    index('writes_written_at_index').on(table.writtenAt),
  ],
);
