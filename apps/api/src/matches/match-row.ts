import type { CheckView, MatchDetail, MatchRow } from '@linkfell/contracts';
import {
  tell,
  tellAsk,
  tellWork,
  whatWouldFit,
  type CheckAnswer,
  type FitQuestion,
} from '@linkfell/fit-engine';

import { frameEndWords } from '../frames/mount-words.js';
import { questionForFact } from '../measure-ups/fact-origins.js';
import type { FitCost } from '../plans/fit-cost.service.js';
import { drawnShock } from '../shocks/drawn-shock.js';
import { cellsOf } from './cells.js';
import type { Judged } from './judging.service.js';

const rank = { pass: 0, work: 1, unknown: 2, fail: 3 } as const;

/** The answer that decided the verdict, or null when all passed. */
export function decisive(answers: readonly CheckAnswer[]): CheckAnswer | null {
  const [worst] = [...answers].sort((a, b) => rank[b.answer] - rank[a.answer]);
  return worst && worst.answer !== 'pass' ? worst : null;
}

export function matchRow(judged: Judged, cost: FitCost): MatchRow {
  const { shock, judgement, entry } = judged;
  const reason = decisive(judgement.answers);
  return {
    sizeId: shock.sizeId,
    makerName: shock.makerName,
    modelName: shock.modelName,
    spring: shock.spring.kind,
    massG: shock.massG,
    sizeKey: shock.sizeKey,
    verdict: judgement.verdict,
    drawing: drawnShock(shock, judgement.reservoirPositionDeg),
    cells: cellsOf(shock, judgement, entry),
    reason: reason && tell(reason).short,
    price: {
      partsMinor: cost.partsMinor,
      selfFitMinor: cost.selfFitMinor,
      fittedMinor: cost.fittedMinor,
    },
    earliest: cost.earliest,
  };
}

function checkView(answer: CheckAnswer): CheckView {
  const told = tell(answer);
  return {
    check: answer.check,
    answer: answer.answer,
    code: answer.code,
    remark: answer.remark,
    say: told.short,
    figures: told.figures,
    ask: answer.ask.map((need) => ({
      whom: need.whom,
      question: questionForFact(need.fact),
      say: tellAsk(need),
    })),
  };
}

export function matchDetail(judged: Judged & { question: FitQuestion }, cost: FitCost): MatchDetail {
  const { judgement, entry, question } = judged;
  return {
    row: matchRow(judged, cost),
    entryText: entry
      ? `${entry.sizeKey ?? 'no published size'}; frame end ${frameEndWords(entry.frameEnd)}; link end ${frameEndWords(entry.linkEnd)}${entry.chip ? `; chip ${entry.chip}` : ''}`
      : 'no entry',
    wayRound: judgement.wayRound,
    checks: judgement.answers.map(checkView),
    parts: judgement.parts.map(({ name, end, quantity, confirmAtFitting }) => ({
      name,
      end,
      quantity,
      confirmAtFitting,
    })),
    work: judgement.work.map((need) => ({
      id: need.id,
      say: tellWork(need),
      workshopOnly: need.workshopOnly,
    })),
    instead: whatWouldFit(question, judgement),
    advice: judgement.advice.map((advice) => tell(advice).short),
    selfFitAllowed: judgement.selfFitAllowed,
  };
}
