import type { PlanView } from '@linkfell/contracts';
import { chakra } from '@chakra-ui/react';
import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { Bill } from '../../components/bill';
import { Cautions } from '../../components/cautions';
import { ShockDrawing } from '../../components/drawing/shock-drawing';
import { ChoiceGroup } from '../../components/forms/choice-group';
import { Field } from '../../components/forms/field';
import { Select } from '../../components/forms/select';
import { LinkButton } from '../../components/link-button';
import { LoadFailed } from '../../components/load-failed';
import { Notice } from '../../components/notice';
import { Page } from '../../components/page';
import { PageHeading } from '../../components/page-heading';
import { Skeleton } from '../../components/skeleton';
import { SlotPicker } from '../../components/slot-picker';
import { TextLink } from '../../components/text-link';
import { VerdictBadge } from '../../components/verdict-badge';
import { isApiProblem } from '../../lib/api-problem';
import { formatDay, formatDayShort, formatDateTime } from '../../lib/format-date';
import { formatMoney, formatMoneyExact } from '../../lib/format-money';
import { usePageTitle } from '../../lib/page-title';
import { planQuery, useChoices } from './api';
import { CheckoutForm } from './checkout-form';

const Section = chakra('section', {
  base: { borderTopWidth: '2px', borderColor: 'ink', paddingTop: '5', marginBottom: '10' },
});
const Title = chakra('h2', { base: { fontSize: 'xl', fontWeight: 'heavy', marginBottom: '4' } });

/** One shock chosen: parts, fitting, total, then pay. */
export function PlanPage() {
  const { planId = '' } = useParams();
  const { data: plan, error } = useQuery(planQuery(planId));
  usePageTitle(plan ? `Plan: ${plan.shock.modelName}` : 'Plan');
  if (error)
    return (
      <LoadFailed error={error} what="this plan" next={{ to: '/measure-up', label: 'Your measure-up' }} />
    );
  if (!plan) {
    return (
      <Page>
        <PageHeading>Your plan</PageHeading>
        <Skeleton lines={8} what="Working out your plan" />
      </Page>
    );
  }
  return <Plan plan={plan} />;
}

function Plan({ plan }: { plan: PlanView }) {
  const choose = useChoices(plan.id);
  const { shock, choices } = plan;
  const name = `${shock.makerName} ${shock.modelName} ${shock.sizeKey}`;
  const fixable = plan.missing.filter(({ code }) => code !== 'choose-slot');
  return (
    <Page css={{ '& > *': { maxWidth: '56rem' } }}>
      <chakra.p marginBottom="2">
        <TextLink
          to={`/measure-up/${plan.measureUpId}/matches`}
          display="inline-flex"
          alignItems="center"
          minHeight="target"
        >
          Back to the fitting sheet
        </TextLink>
      </chakra.p>
      <PageHeading
        above={`Plan for ${plan.title}`}
        lead={plan.reason ?? 'Nothing to buy or do beyond bolting it in.'}
      >
        {name}
      </PageHeading>
      <chakra.div
        display="grid"
        gap="6"
        gridTemplateColumns={{ base: '1fr', md: '1fr 1fr' }}
        alignItems="center"
        marginBottom="8"
      >
        <ShockDrawing figure={shock.drawing} dimensions={['eye-to-eye', 'stroke']} />
        <div>
          <VerdictBadge verdict={plan.verdict} size="large" />
          <chakra.p marginTop="3">
            Spring for you: <strong>{plan.spring}</strong>
          </chakra.p>
        </div>
      </chakra.div>
      {plan.orderReference ? (
        <chakra.div marginBottom="8">
          <Notice title="This plan has an order">
            <p>
              <TextLink to={`/orders/${plan.orderReference}`}>Open order {plan.orderReference}</TextLink>
            </p>
          </Notice>
        </chakra.div>
      ) : null}
      {choose.error ? (
        <chakra.div marginBottom="6">
          <Notice tone="brick" announce="alert" title="That choice was not kept">
            <p>{isApiProblem(choose.error) ? (choose.error.detail ?? choose.error.title) : 'Try again.'}</p>
          </Notice>
        </chakra.div>
      ) : null}
      <Section>
        <Title>Parts, and who sells them</Title>
        {plan.items.map((item) => (
          <Field
            key={item.itemId}
            id={item.itemId}
            label={`${item.quantity > 1 ? `${item.quantity} x ` : ''}${item.name}`}
            hint={item.note ?? undefined}
          >
            {(control) =>
              item.offers.length === 0 ? (
                <Notice tone="brick">
                  <p>Sold out everywhere at the moment.</p>
                </Notice>
              ) : (
                <Select
                  {...control}
                  value={choices.listings[item.itemId] ?? ''}
                  onChange={(event) => choose.mutate({ listings: { [item.itemId]: event.target.value } })}
                >
                  {item.offers.map((offer) => (
                    <option key={offer.listingId} value={offer.listingId}>
                      {offer.shopName}, {formatMoneyExact(offer.priceMinor)}
                      {offer.available <= 2 ? `, ${offer.available} left` : ''}, leaves{' '}
                      {formatDayShort(offer.dispatchDay)} at the earliest
                    </option>
                  ))}
                </Select>
              )
            }
          </Field>
        ))}
      </Section>
      <Section>
        <Title>Fitting</Title>
        <chakra.ul paddingLeft="5" listStyleType="disc" marginBottom="4">
          {plan.work.map(({ say }, index) => (
            <li key={index}>{say}</li>
          ))}
        </chakra.ul>
        {plan.selfFit.allowed ? (
          <ChoiceGroup
            id="fit"
            name="fit"
            legend="Who does it?"
            choices={[
              {
                value: 'workshop',
                label: 'A partner workshop',
                hint: 'Parts go there; it fits the shock and sets it up',
              },
              {
                value: 'self',
                label: 'I fit it myself',
                hint: 'Parts come to you. You need the tools and the makers’ manuals',
              },
            ]}
            value={choices.fit}
            onChange={(fit) => choose.mutate({ fit })}
          />
        ) : (
          <chakra.p marginBottom="4">
            <strong>For a workshop.</strong> {plan.selfFit.reason}
          </chakra.p>
        )}
        {choices.fit === 'workshop' ? <Workshop plan={plan} choose={choose.mutate} /> : null}
        {choices.fit === 'self' && plan.partsArriveDay ? (
          <p>Parts arrive by {formatDay(plan.partsArriveDay)}.</p>
        ) : null}
      </Section>
      <Section>
        <Title>What it costs</Title>
        <Bill {...plan} />
      </Section>
      <Section>
        <Cautions lines={plan.cautions} />
      </Section>
      <Section>
        <Title>Pay</Title>
        {plan.missing.length > 0 ? (
          <chakra.div marginBottom="6" maxWidth="form">
            <Notice tone="heather" title="Before you can pay" announce="status">
              <chakra.ul paddingLeft="5" listStyleType="disc">
                {plan.missing.map(({ code, say }) => (
                  <li key={code}>{say}</li>
                ))}
              </chakra.ul>
              {fixable.some(({ code }) => code === 'not-judged-fit') ? (
                <LinkButton tone="plain" to={`/measure-up/${plan.measureUpId}/matches/${shock.sizeId}`}>
                  See what is not known
                </LinkButton>
              ) : null}
            </Notice>
          </chakra.div>
        ) : null}
        <CheckoutForm plan={plan} ready={plan.missing.length === 0} keeping={choose.isPending} />
      </Section>
    </Page>
  );
}

function Workshop({ plan, choose }: { plan: PlanView; choose: ReturnType<typeof useChoices>['mutate'] }) {
  const { choices } = plan;
  const workshop = plan.workshops.find(({ id }) => id === choices.workshopId);
  return (
    <>
      <ChoiceGroup
        id="workshopId"
        name="workshopId"
        legend="Workshop"
        choices={plan.workshops.map((each) => ({
          value: each.id,
          label: `${each.name}, ${each.town}`,
          hint: [
            formatMoney(each.priceMinor),
            `${each.minutes} minutes`,
            each.distanceKm === null ? null : `${each.distanceKm} km`,
            each.earliest ? `from ${formatDateTime(each.earliest, each.timeZone)}` : 'no free date',
          ]
            .filter(Boolean)
            .join(' · '),
        }))}
        value={choices.workshopId}
        onChange={(workshopId) =>
          choose({
            workshopId,
            slotStart: plan.workshops.find(({ id }) => id === workshopId)?.earliest ?? null,
          })
        }
      />
      {workshop ? (
        <SlotPicker
          key={workshop.id}
          id="slotStart"
          slots={plan.slots}
          zone={workshop.timeZone}
          value={choices.slotStart}
          onPick={(slotStart) => choose({ slotStart })}
        />
      ) : null}
      <chakra.p color="slate" fontSize="sm">
        The workshop has one working day to accept. Parts are sent only when it has; dates count from its
        latest answer.
      </chakra.p>
    </>
  );
}
