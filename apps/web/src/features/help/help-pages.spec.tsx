import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import type { ComponentType } from 'react';
import { describe, expect, it } from 'vitest';
import { readDimensions } from '../../testing/read-drawing';
import { renderWithProviders } from '../../testing/render-page';
import { AirOrCoilPage } from './pages/air-or-coil-page';
import { EyeToEyePage } from './pages/eye-to-eye-page';
import { HardwarePage } from './pages/hardware-page';
import { HelpIndexPage } from './pages/help-index-page';
import { RemotePage } from './pages/remote-page';
import { ReservoirPage } from './pages/reservoir-page';
import { StrokePage } from './pages/stroke-page';
import { TrunnionPage } from './pages/trunnion-page';
import { topics, type TopicPath } from './topics';

const pages: Record<TopicPath, ComponentType> = {
  '/help/eye-to-eye': EyeToEyePage,
  '/help/stroke-is-not-travel': StrokePage,
  '/help/trunnion': TrunnionPage,
  '/help/hardware': HardwarePage,
  '/help/air-or-coil': AirOrCoilPage,
  '/help/reservoir': ReservoirPage,
  '/help/remote': RemotePage,
};

const figure = (name: string | RegExp, key: string): number | undefined =>
  readDimensions(screen.getByRole('img', { name })).find((dimension) => dimension.key === key)?.length;

describe.each(topics)('$title', ({ path, title }) => {
  it('has its heading, a drawing, its cautions, and the way to every other word', () => {
    const Topic = pages[path];
    renderWithProviders(<Topic />, path);
    expect(screen.getByRole('heading', { level: 1, name: title })).toBeInTheDocument();
    expect(screen.getAllByRole('img').length).toBeGreaterThanOrEqual(1);
    expect(screen.getByText('Please read')).toBeInTheDocument();
    const others = within(screen.getByRole('navigation', { name: 'Also explained' })).getAllByRole('link');
    expect(others.map((link) => link.getAttribute('href'))).toEqual(
      topics.filter((topic) => topic.path !== path).map((topic) => topic.path),
    );
    expect(screen.getByRole('link', { name: 'Start your measure-up' })).toHaveAttribute(
      'href',
      '/measure-up',
    );
  });
});

describe('the index of help', () => {
  it('leads to every page, its drawings kept from those who hear it', () => {
    renderWithProviders(<HelpIndexPage />, '/help');
    for (const { path, title } of topics) {
      const heading = screen.getByRole('heading', { level: 2, name: title });
      expect(heading.closest('a')).toHaveAttribute('href', path);
    }
    expect(screen.queryAllByRole('img')).toEqual([]);
  });
});

describe('what the drawings measure', () => {
  it('is eye-to-eye and stroke, and the same length from edge to edge', () => {
    renderWithProviders(<EyeToEyePage />);
    expect(figure('Air shock, 210 × 55 mm', 'eye-to-eye')).toBeCloseTo(210, 5);
    expect(figure('Air shock, 210 × 55 mm', 'stroke')).toBeCloseTo(55, 5);
    const otherWays = 'Measuring without finding the centres';
    expect(figure(otherWays, 'same-edge')).toBeCloseTo(210, 5);
    expect((figure(otherWays, 'outside') ?? 0) - 26).toBeCloseTo(210, 5);
  });

  it('is a trunnion 25 mm shorter than the eyelet shock behind it', () => {
    renderWithProviders(<TrunnionPage />);
    const drawing = screen.getByRole('img', { name: /before an eyelet shock/ });
    expect(drawing).toHaveAccessibleDescription(/Grey behind it.*210 × 55/);
    expect(figure(/before an eyelet shock/, 'eye-to-eye')).toBeCloseTo(185, 5);
  });

  it('follows the wheel: the shock shortens by its stroke while the wheel goes its travel', async () => {
    renderWithProviders(<StrokePage />);
    const drawn = () => figure('The rear of a bike: wheel, swingarm and shock', 'eye-to-eye');
    await userEvent.click(screen.getByRole('button', { name: 'Extended' }));
    expect(drawn()).toBeCloseTo(210, 5);
    await userEvent.click(screen.getByRole('button', { name: 'Fully in' }));
    expect(drawn()).toBeCloseTo(155, 5);
    expect(screen.getByRole('button', { name: 'Fully in' })).toHaveAttribute('aria-pressed', 'true');
    expect(figure('The rear of a bike: wheel, swingarm and shock', 'travel')).toBeCloseTo(140, 5);
    expect(screen.getByText('55 mm')).toBeInTheDocument();
  });

  it('turns the reservoir about the body', async () => {
    renderWithProviders(<ReservoirPage />);
    const [drawing] = screen.getAllByRole('img');
    expect(drawing).toHaveAccessibleDescription(/above the body/);
    await userEvent.click(screen.getByRole('button', { name: 'Below' }));
    expect(drawing).toHaveAccessibleDescription(/below the body/);
    expect(screen.getByText('180°')).toBeInTheDocument();
  });
});
