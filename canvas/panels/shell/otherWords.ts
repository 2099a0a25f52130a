/** The words of a site's screens besides the plan; the dictionary's mail, sheets' and server's own words never reach a screen. */
import { crew } from '../../../model/words/en/crew';
import { levels } from '../../../model/words/en/levels';
import { revisions } from '../../../model/words/en/revisions';
import { rules } from '../../../model/words/en/rules';
import { takeoff } from '../../../model/words/en/takeoff';
import { addWords } from '../../ui/words';

addWords({ crew, levels, revisions, rules, takeoff });
