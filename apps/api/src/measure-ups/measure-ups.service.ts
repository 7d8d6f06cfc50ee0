import {
  putAnswerBody,
  questionKeys,
  type LinkView,
  type MeasureUpView,
  type QuestionKey,
  type StoredAnswer,
} from '@linkfell/contracts';
import { contradictsSheet, findSizeKey, mountFamily } from '@linkfell/fit-engine';
import { Inject, Injectable } from '@nestjs/common';
import { DataSource, IsNull, type EntityManager } from 'typeorm';

import { Clock } from '../common/clock.js';
import { CommonException } from '../common/problems/problem.exception.js';
import { hashToken, newToken } from '../common/token.js';
import { toFieldProblems } from '../common/validation/zod.pipe.js';
import { CONFIG, type Config } from '../config/config.js';
import { inTransaction } from '../database/in-transaction.js';
import { FramesService } from '../frames/frames.service.js';
import { frameName, type FrameSheetData } from '../frames/sheet.js';
import { sheetView } from '../frames/sheet-view.js';
import { Town } from '../organisations/town.entity.js';
import { known, type Answers } from './answers.js';
import { askedQuestions, readyForMatches } from './asked-questions.js';
import { factsFromAnswers, type RiderSide } from './facts-from-answers.js';
import { MeasureUpAnswer } from './measure-up-answer.entity.js';
import { MeasureUpLink } from './measure-up-link.entity.js';
import { MeasureUp } from './measure-up.entity.js';
import { MeasureUpsException } from './measure-ups.exception.js';
import { presentDrawing, sizeResult, sizeView } from './size-view.js';

/** A measure-up with all that follows from it. */
export interface OpenMeasureUp {
  id: string;
  revision: number;
  createdAt: Date;
  updatedAt: Date;
  answers: Answers;
  sheet: FrameSheetData | null;
  side: RiderSide;
}

const isQuestion = (text: string): text is QuestionKey => (questionKeys as string[]).includes(text);

@Injectable()
export class MeasureUpsService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly frames: FramesService,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  async create(accountId: string | null): Promise<MeasureUpView> {
    const now = this.clock.now();
    const made = await this.dataSource.manager.save(MeasureUp, { accountId, createdAt: now, updatedAt: now });
    return this.view(made.id);
  }

  /** @throws CommonException "not-found" */
  async open(id: string, manager: EntityManager = this.dataSource.manager): Promise<OpenMeasureUp> {
    const measureUp = await manager.findOne(MeasureUp, { where: { id }, relations: { answers: true } });
    if (!measureUp) throw new CommonException('not-found');
    const answers: Answers = { values: {}, days: {} };
    for (const { question, value, updatedAt } of measureUp.answers) {
      answers.values[question] = value;
      answers.days[question] = updatedAt.toISOString().slice(0, 10);
    }
    const frame = known(answers, 'frame');
    const sheet = frame?.kind === 'listed' ? await this.frames.sheet(frame.frameId) : null;
    return { ...measureUp, answers, sheet, side: factsFromAnswers(answers, sheet) };
  }

  async view(id: string): Promise<MeasureUpView> {
    const { revision, createdAt, updatedAt, answers, sheet, side } = await this.open(id);
    const size = sizeResult(side);
    const questions = askedQuestions(answers, sheet, contradictsSheet(side.frame, side.rider, size));
    const frame = known(answers, 'frame');
    return {
      id,
      revision,
      createdAt: createdAt.toISOString(),
      updatedAt: updatedAt.toISOString(),
      answers: answers.values,
      questions,
      next: questions.find((question) => question.state === 'open')?.key ?? null,
      title: titleOf(frame, sheet),
      sheet: sheet && sheetView(sheet),
      size: sizeView(size, sheet, mountFamily(side.frame, side.present)),
      drawing: presentDrawing(side, size),
      readyForMatches: readyForMatches(questions),
    };
  }

  /** Keeps one answer. Two tabs may answer at once: the row of the measure-up is locked, each gets a revision. */
  async answer(id: string, question: string, body: unknown): Promise<MeasureUpView> {
    if (!isQuestion(question)) throw new CommonException('not-found');
    const parsed = putAnswerBody(question).safeParse(body);
    if (!parsed.success) {
      throw new CommonException('invalid', { errors: toFieldProblems(parsed.error.issues) });
    }
    const value = await this.checked(question, parsed.data as StoredAnswer);
    await this.change(id, async (manager, revision, now) => {
      await manager.upsert(
        MeasureUpAnswer,
        { measureUpId: id, question, value: value as object, revision, updatedAt: now },
        ['measureUpId', 'question'],
      );
    });
    return this.view(id);
  }

  async forget(id: string, question: string): Promise<MeasureUpView> {
    if (!isQuestion(question)) throw new CommonException('not-found');
    await this.change(id, async (manager) => {
      await manager.delete(MeasureUpAnswer, { measureUpId: id, question });
    });
    return this.view(id);
  }

  /** A link that opens this measure-up elsewhere; its token is written down nowhere, only its hash. */
  async createLink(id: string): Promise<LinkView> {
    const token = newToken();
    await this.dataSource.manager.insert(MeasureUpLink, {
      measureUpId: id,
      tokenHash: hashToken(token),
      createdAt: this.clock.now(),
    });
    return { url: `${this.config.PUBLIC_URL}/measure-up/open#${token}` };
  }

  async revokeLinks(id: string): Promise<void> {
    await this.dataSource.manager.update(
      MeasureUpLink,
      { measureUpId: id, revokedAt: IsNull() },
      { revokedAt: this.clock.now() },
    );
  }

  /** @returns the measure-up behind a link's token */
  async byToken(token: string): Promise<string> {
    const link = await this.dataSource.manager.findOneBy(MeasureUpLink, {
      tokenHash: hashToken(token),
      revokedAt: IsNull(),
    });
    if (!link) throw new CommonException('not-found');
    return link.measureUpId;
  }

  private async change(
    id: string,
    work: (manager: EntityManager, revision: number, now: Date) => Promise<void>,
  ): Promise<void> {
    const now = this.clock.now();
    await inTransaction(this.dataSource, async (manager) => {
      const measureUp = await manager.findOne(MeasureUp, {
        where: { id },
        lock: { mode: 'pessimistic_write' },
      });
      if (!measureUp) throw new CommonException('not-found');
      const revision = measureUp.revision + 1;
      await work(manager, revision, now);
      await manager.update(MeasureUp, { id }, { revision, updatedAt: now });
    });
  }

  /** What a schema cannot know: that the frame, the town and the size exist. */
  private async checked(question: QuestionKey, answer: StoredAnswer): Promise<StoredAnswer> {
    if (answer.state !== 'known') return answer;
    const values: Answers = { values: { [question]: answer }, days: {} };
    const frame = known(values, 'frame');
    if (frame?.kind === 'listed' && !(await this.frames.sheet(frame.frameId))) {
      throw new MeasureUpsException('no-such-frame', {
        errors: [{ pointer: '/value/frameId', detail: 'Choose a frame from the list, or describe yours' }],
      });
    }
    const place = known(values, 'place');
    if (place && !(await this.dataSource.manager.existsBy(Town, { id: place.townId }))) {
      throw new MeasureUpsException('no-such-town', {
        errors: [{ pointer: '/value/townId', detail: 'Choose a town from the list' }],
      });
    }
    const printed = known(values, 'printed-size');
    if (printed) {
      const sizeKey = findSizeKey(printed.text);
      if (!sizeKey) {
        throw new MeasureUpsException('not-a-size', {
          errors: [{ pointer: '/value/text', detail: 'A size looks like 210x55 or 7.875 x 2.25' }],
        });
      }
      return { state: 'known', value: { text: printed.text, sizeKey } };
    }
    return answer;
  }
}

function titleOf(frame: ReturnType<typeof known<'frame'>>, sheet: FrameSheetData | null): string {
  if (sheet) {
    const year = frame?.kind === 'listed' ? frame.modelYear : null;
    return year ? `${frameName(sheet)}, ${year}` : frameName(sheet);
  }
  return frame?.kind === 'described' ? frame.name : 'Your measure-up';
}
