import { answerKind, checkIds as ofContracts, verdict, workId } from '@linkfell/contracts';
import { checkIds as ofEngine, type AnswerKind, type Verdict, type WorkId } from '@linkfell/fit-engine';

describe('the words that engine and contracts share', () => {
  it('are the same checks in the same order', () => expect([...ofContracts]).toEqual([...ofEngine]));

  it('are the same answers, verdicts and kinds of work', () => {
    // Assignments that only compile while both sides have the same words.
    const answers: Record<AnswerKind, true> = { pass: true, work: true, unknown: true, fail: true };
    const verdicts: Record<Verdict, true> = {
      'bolts-straight-in': true,
      'fits-with-work': true,
      'needs-an-answer': true,
      'wont-fit': true,
    };
    const work: Record<WorkId, true> = {
      'press-in-kit': true,
      'press-in-reuse': true,
      'travel-spacer': true,
      'fit-coil': true,
      'fit-remote': true,
      'route-external': true,
      'hold-open-part': true,
      'fit-shock': true,
    };
    expect(answerKind.options.toSorted()).toEqual(Object.keys(answers).toSorted());
    expect(verdict.options.toSorted()).toEqual(Object.keys(verdicts).toSorted());
    expect(workId.options.toSorted()).toEqual(Object.keys(work).toSorted());
  });
});
