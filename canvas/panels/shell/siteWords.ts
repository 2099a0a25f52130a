/** The words of every screen of a site; the dictionary's mail, sheets' and server's own words never reach a screen. */
import { crew } from '../../../model/words/en/crew';
import { lengths } from '../../../model/words/en/lengths';
import { levels } from '../../../model/words/en/levels';
import { plan } from '../../../model/words/en/plan';
import { poles } from '../../../model/words/en/poles';
import { reasons } from '../../../model/words/en/reasons';
import { revisions } from '../../../model/words/en/revisions';
import { rules } from '../../../model/words/en/rules';
import { sheets } from '../../../model/words/en/sheets';
import { takeoff } from '../../../model/words/en/takeoff';
import { walls } from '../../../model/words/en/walls';
import { addWords } from '../../ui/words';

addWords({ crew, lengths, levels, plan, poles, reasons, revisions, rules, sheets, takeoff, walls });
