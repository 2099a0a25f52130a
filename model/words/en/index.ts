/** Every word on screen, on paper and in mail, in English: one namespace a file. */
import { auth } from './auth';
import { common } from './common';
import { coursing } from './coursing';
import { crew } from './crew';
import { lengths } from './lengths';
import { levels } from './levels';
import { mail } from './mail';
import { plan } from './plan';
import { poles } from './poles';
import { reasons } from './reasons';
import { revisions } from './revisions';
import { rules } from './rules';
import { server } from './server';
import { sheets } from './sheets';
import { sites } from './sites';
import { takeoff } from './takeoff';
import { walls } from './walls';

export const en = {
  common,
  auth,
  sites,
  plan,
  walls,
  coursing,
  poles,
  lengths,
  levels,
  revisions,
  takeoff,
  crew,
  reasons,
  rules,
  sheets,
  mail,
  server,
} as const;
