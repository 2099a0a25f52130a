/** The words of the plan and of the wall and the pole beside it. */
import { lengths } from '../../../model/words/en/lengths';
import { plan } from '../../../model/words/en/plan';
import { poles } from '../../../model/words/en/poles';
import { reasons } from '../../../model/words/en/reasons';
import { walls } from '../../../model/words/en/walls';
import { addWords } from '../../ui/words';

addWords({ lengths, plan, poles, reasons, walls });
