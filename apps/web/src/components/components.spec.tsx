import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { describe, expect, it, vi } from 'vitest';
import { renderWithProviders } from '../testing/render-page';
import { Button } from './button';
import { Dialog } from './dialog';
import { Disclosure } from './disclosure';
import { LinkButton } from './link-button';
import { Notice } from './notice';
import { Skeleton } from './skeleton';
import { SpecTable } from './spec-table';
import { StepList } from './step-list';
import { VerdictBadge } from './verdict-badge';
import { verdictWords } from './verdict-words';

describe('buttons', () => {
  it('do nothing while busy, say what goes on, and stay where the focus is', async () => {
    const pressed = vi.fn();
    renderWithProviders(
      <Button busy="Saving" onClick={pressed}>
        Save
      </Button>,
    );
    const button = screen.getByRole('button', { name: 'Saving' });
    await userEvent.click(button);
    expect(pressed).not.toHaveBeenCalled();
    expect(button).toHaveFocus();
    expect(button).toHaveAttribute('aria-disabled', 'true');
  });

  it('are pressed by keyboard, and links stay links', async () => {
    const pressed = vi.fn();
    renderWithProviders(
      <>
        <Button onClick={pressed}>Save</Button>
        <LinkButton to="/contact" tone="plain">
          Write
        </LinkButton>
      </>,
    );
    await userEvent.tab();
    await userEvent.keyboard('{Enter}');
    expect(pressed).toHaveBeenCalledTimes(1);
    expect(screen.getByRole('link', { name: 'Write' })).toHaveAttribute('href', '/contact');
  });
});

describe('verdicts', () => {
  const verdicts = Object.keys(verdictWords) as (keyof typeof verdictWords)[];

  it('have each a word and a shape of their own', () => {
    renderWithProviders(
      verdicts.map((verdict) => (
        <p key={verdict} data-testid={verdict}>
          <VerdictBadge verdict={verdict} />
        </p>
      )),
    );
    const seen = verdicts.map((verdict) => screen.getByTestId(verdict));
    expect(seen.map((badge) => badge.textContent)).toEqual([
      'Bolts straight in',
      'Fits with parts or work',
      'Needs an answer first',
      'Won’t fit',
    ]);
    expect(new Set(seen.map((badge) => badge.querySelector('svg')?.innerHTML)).size).toBe(4);
  });
});

describe('the step list', () => {
  it('says where the reader is, and leads back only to what was begun', () => {
    renderWithProviders(
      <StepList
        label="Measure-up"
        steps={[
          { name: 'Frame', state: 'done', to: '/frame' },
          { name: 'Present shock', state: 'now', to: '/shock' },
          { name: 'Spring', state: 'open' },
        ]}
      />,
    );
    const nav = within(screen.getByRole('navigation', { name: 'Measure-up' }));
    const [frame, shock, spring] = nav.getAllByRole('listitem');
    expect(frame).toHaveTextContent('Frame: done');
    expect(shock).toHaveAttribute('aria-current', 'step');
    expect(spring).toHaveTextContent('Spring: not yet');
    // Shown from tablets upwards; on a telephone the bars alone are too thin to press.
    expect(nav.getAllByRole('link', { hidden: true }).map((link) => link.getAttribute('href'))).toEqual([
      '/frame',
    ]);
  });
});

describe('the spec table', () => {
  it('has a row header for every figure', () => {
    renderWithProviders(
      <SpecTable
        caption="Size"
        rows={[{ label: 'Stroke', value: '52.5', unit: 'mm', source: 'printed on the shock' }]}
      />,
    );
    const row = within(screen.getByRole('table', { name: 'Size' })).getByRole('row');
    expect(within(row).getByRole('rowheader')).toHaveTextContent('Stroke');
    expect(
      within(row)
        .getAllByRole('cell')
        .map((cell) => cell.textContent),
    ).toEqual(['52.5', 'mm']);
  });
});

function Asking() {
  const [open, setOpen] = useState(false);
  return (
    <>
      <Button onClick={() => setOpen(true)}>Ask</Button>
      <Dialog open={open} title="Sure?" onClose={() => setOpen(false)}>
        It cannot be undone.
      </Dialog>
    </>
  );
}

describe('what opens and closes', () => {
  it('is the native dialog, named by its title', async () => {
    renderWithProviders(<Asking />);
    expect(screen.queryByRole('dialog')).not.toBeInTheDocument();
    await userEvent.click(screen.getByRole('button', { name: 'Ask' }));
    const dialog = screen.getByRole('dialog', { name: 'Sure?' });
    await userEvent.click(within(dialog).getByRole('button', { name: 'Close' }));
    expect(screen.queryByRole('dialog')).not.toBeInTheDocument();
  });

  it('is the native disclosure', async () => {
    renderWithProviders(<Disclosure summary="Where do I find this?">On the body.</Disclosure>);
    expect(screen.getByText('On the body.')).not.toBeVisible();
    await userEvent.click(screen.getByText('Where do I find this?'));
    expect(screen.getByText('On the body.')).toBeVisible();
  });
});

describe('what is said without being asked', () => {
  it('is announced only where it appears later', () => {
    renderWithProviders(
      <>
        <Notice title="Note">Always here.</Notice>
        <Notice tone="brick" announce="alert">
          The card was declined.
        </Notice>
        <Skeleton what="Loading the matches" />
      </>,
    );
    expect(screen.getByRole('alert')).toHaveTextContent('The card was declined.');
    expect(screen.getByRole('status')).toHaveTextContent('Loading the matches');
    expect(screen.getByRole('alert')).not.toHaveTextContent('Always here.');
  });
});
