import type { CheckView } from '@linkfell/contracts';
import { chakra } from '@chakra-ui/react';
import { useMutation, useQuery } from '@tanstack/react-query';
import { useNavigate, useParams } from 'react-router-dom';
import { Button } from '../../components/button';
import { ShockDrawing } from '../../components/drawing/shock-drawing';
import { LoadFailed } from '../../components/load-failed';
import { Notice } from '../../components/notice';
import { Page } from '../../components/page';
import { PageHeading } from '../../components/page-heading';
import { Skeleton } from '../../components/skeleton';
import { TextLink } from '../../components/text-link';
import { VerdictBadge } from '../../components/verdict-badge';
import { VerdictShape } from '../../components/verdict-shape';
import { verdictOfAnswer, verdictTones, verdictWords } from '../../components/verdict-words';
import { isApiProblem } from '../../lib/api-problem';
import { formatDayPlain } from '../../lib/format-date';
import { formatMoney } from '../../lib/format-money';
import { usePageTitle } from '../../lib/page-title';
import { createPlan, matchDetailQuery } from './api';
import { checkNames } from './check-names';

/** One shock with all its checks, figures and sources. */
export function MatchPage() {
  const { id = '', sizeId = '' } = useParams();
  const { data, error } = useQuery(matchDetailQuery(id, sizeId));
  const navigate = useNavigate();
  const plan = useMutation({
    mutationFn: () => createPlan(id, sizeId),
    onSuccess: (made) => void navigate(`/plans/${made.id}`),
  });
  const name = data ? `${data.row.makerName} ${data.row.modelName} ${data.row.sizeKey}` : 'One shock';
  usePageTitle(name);
  if (error) {
    return (
      <LoadFailed
        error={error}
        what="this shock"
        next={{ to: `/measure-up/${id}/matches`, label: 'To the fitting sheet' }}
      />
    );
  }
  if (!data) {
    return (
      <Page>
        <PageHeading>One shock</PageHeading>
        <Skeleton lines={8} what="Judging this shock" />
      </Page>
    );
  }
  const { row } = data;
  const buyable = row.verdict === 'bolts-straight-in' || row.verdict === 'fits-with-work';
  return (
    <Page>
      <chakra.p marginBottom="2">
        <TextLink
          to={`/measure-up/${id}/matches`}
          display="inline-flex"
          alignItems="center"
          minHeight="target"
        >
          Back to the fitting sheet
        </TextLink>
      </chakra.p>
      <PageHeading lead={row.reason ?? 'Nothing to buy or do beyond bolting it in.'}>{name}</PageHeading>
      <chakra.div display="flex" flexWrap="wrap" gap="4" alignItems="center" marginBottom="6">
        <VerdictBadge verdict={row.verdict} size="large" />
        {buyable ? (
          <>
            <Button size="large" busy={plan.isPending && 'Planning'} onClick={() => plan.mutate()}>
              Plan this shock
            </Button>
            <chakra.p>
              <strong>
                {row.price.fittedMinor === null
                  ? 'Not to be had at the moment'
                  : `${formatMoney(row.price.fittedMinor)} fitted`}
              </strong>
              {row.price.selfFitMinor === null ? '' : `, ${formatMoney(row.price.selfFitMinor)} self-fit`}
            </chakra.p>
          </>
        ) : null}
      </chakra.div>
      {plan.error ? (
        <chakra.div marginBottom="6">
          <Notice tone="brick" announce="alert" title="That did not work">
            <p>
              {isApiProblem(plan.error) ? (plan.error.detail ?? plan.error.title) : 'Try again in a moment.'}
            </p>
          </Notice>
        </chakra.div>
      ) : null}
      <chakra.div
        bg="paper"
        borderWidth="1px"
        borderColor="hair"
        borderRadius="card"
        padding={{ base: '3', md: '6' }}
        marginBottom="8"
      >
        <ShockDrawing figure={row.drawing} dimensions={['eye-to-eye', 'stroke', 'diameter']} ghost />
      </chakra.div>
      <chakra.p display="flex" flexWrap="wrap" columnGap="6" marginBottom="4">
        <TextLink to="curves" display="inline-flex" alignItems="center" minHeight="target">
          Curves beside your present shock
        </TextLink>
        {row.drawing.reservoir ? (
          <TextLink to="clearance" display="inline-flex" alignItems="center" minHeight="target">
            The reservoir’s room in the frame
          </TextLink>
        ) : null}
      </chakra.p>
      <chakra.p color="slate" marginBottom="6" maxWidth="line">
        Judged against this entry of the sheet: {data.entryText}.{' '}
        {data.wayRound === 'body-to-frame'
          ? 'The body faces the frame.'
          : data.wayRound
            ? 'The body faces the link.'
            : ''}
      </chakra.p>
      <Lines title="What would fit instead" lines={data.instead} />
      <Lines
        title="What it takes"
        lines={[
          ...data.parts.map((part) => `${part.quantity} x ${part.name}`),
          ...data.work.map(({ say }) => say),
        ]}
      />
      <chakra.h2 fontSize="xl" fontWeight="heavy" marginBottom="3">
        All checks
      </chakra.h2>
      <chakra.ul listStyleType="none" borderTopWidth="2px" borderColor="ink" marginBottom="8">
        {data.checks.map((check) => (
          <CheckItem key={check.check} check={check} measureUpId={id} />
        ))}
      </chakra.ul>
      <Lines title="Advice, which never counts in the verdict" lines={data.advice} />
    </Page>
  );
}

function Lines({ title, lines }: { title: string; lines: readonly string[] }) {
  if (lines.length === 0) return null;
  return (
    <chakra.section marginBottom="8" maxWidth="line">
      <chakra.h2 fontSize="xl" fontWeight="heavy" marginBottom="2">
        {title}
      </chakra.h2>
      <chakra.ul paddingLeft="5" listStyleType="disc">
        {lines.map((line) => (
          <li key={line}>{line}</li>
        ))}
      </chakra.ul>
    </chakra.section>
  );
}

const Shape = chakra('span', {
  base: { flexShrink: '0', marginTop: '1' },
  variants: {
    tone: {
      moss: { color: 'moss' },
      gorse: { color: 'gorse' },
      heather: { color: 'heather' },
      brick: { color: 'brick' },
    },
  },
});

function CheckItem({ check, measureUpId }: { check: CheckView; measureUpId: string }) {
  const verdict = verdictOfAnswer[check.answer];
  return (
    <chakra.li
      display="grid"
      gridTemplateColumns={{ base: 'auto 1fr', md: 'auto 12rem 1fr' }}
      columnGap="3"
      paddingBlock="3"
      borderBottomWidth="1px"
      borderColor="hair"
    >
      <Shape tone={verdictTones[verdict]}>
        <VerdictShape verdict={verdict} size={20} />
        <chakra.span srOnly>{verdictWords[verdict]}: </chakra.span>
      </Shape>
      <chakra.h3 fontSize="md" fontWeight="bold">
        {checkNames[check.check]}
      </chakra.h3>
      <chakra.div gridColumn={{ base: '2', md: '3' }}>
        <p>{check.say}</p>
        {check.figures.length > 0 ? (
          <chakra.dl
            fontSize="sm"
            marginTop="2"
            display="grid"
            gridTemplateColumns={{ base: '1fr', sm: 'auto auto 1fr' }}
            columnGap="4"
            rowGap="1"
          >
            {check.figures.map((figure, index) => (
              <chakra.div key={index} display={{ base: 'block', sm: 'contents' }}>
                <chakra.dt color="slate">{figure.label}</chakra.dt>
                <chakra.dd fontWeight="bold">{figure.text}</chakra.dd>
                <chakra.dd color="slate">
                  {figure.source.label}
                  {figure.source.date ? `, ${formatDayPlain(figure.source.date)}` : ''}
                </chakra.dd>
              </chakra.div>
            ))}
          </chakra.dl>
        ) : null}
        {check.ask.map((ask, index) => (
          <chakra.p key={index} fontSize="sm" marginTop="2">
            {ask.question ? (
              <TextLink
                to={`/measure-up/${measureUpId}/${ask.question}`}
                display="inline-flex"
                alignItems="center"
                minHeight="target"
              >
                {ask.say}
              </TextLink>
            ) : (
              ask.say
            )}
          </chakra.p>
        ))}
      </chakra.div>
    </chakra.li>
  );
}
