import { act, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { setMedia } from '../../testing/browser-gaps';
import { readDimensions } from '../../testing/read-drawing';
import { renderWithProviders } from '../../testing/render-page';
import { FrontPage } from './front-page';
import { cyclePosition } from './use-cycle';

const eyeToEye = (): number =>
  readDimensions(screen.getByRole('img', { name: /deciding dimensions/ })).find(
    ({ key }) => key === 'eye-to-eye',
  )?.mm ?? Number.NaN;

beforeEach(() => {
  setMedia();
  vi.useFakeTimers({ shouldAdvanceTime: true });
});
afterEach(() => vi.useRealTimers());
const wait = (ms: number) => act(() => vi.advanceTimersByTimeAsync(ms));

describe('the front page', () => {
  it('has one thing to do', () => {
    renderWithProviders(<FrontPage />);
    expect(screen.getByRole('link', { name: 'Start your measure-up' })).toHaveAttribute(
      'href',
      '/measure-up',
    );
    expect(screen.getAllByRole('heading', { level: 1 })).toHaveLength(1);
  });

  it('cycles the drawing until it is paused, and goes on from there', async () => {
    const user = userEvent.setup({ advanceTimers: (ms) => vi.advanceTimersByTime(ms) });
    renderWithProviders(<FrontPage />);
    expect(eyeToEye()).toBe(210);
    await wait(2000);
    expect(eyeToEye()).toBeLessThan(205);
    await user.click(screen.getByRole('button', { name: 'Pause' }));
    const resting = eyeToEye();
    await wait(1500);
    expect(eyeToEye()).toBe(resting);
    await user.click(screen.getByRole('button', { name: 'Play' }));
    await wait(2000);
    expect(eyeToEye()).not.toBe(resting);
  });

  it('stays still, without a button for it, for readers who want no motion', async () => {
    setMedia('(prefers-reduced-motion: reduce)');
    renderWithProviders(<FrontPage />);
    await wait(3000);
    expect(eyeToEye()).toBe(210);
    expect(screen.queryByRole('button', { name: 'Pause' })).not.toBeInTheDocument();
  });
});

describe('the cycle', () => {
  it('starts and ends extended, and never leaves the stroke', () => {
    expect(cyclePosition(0)).toBe(0);
    expect(cyclePosition(0.45)).toBe(1);
    expect(cyclePosition(0.99)).toBeCloseTo(0, 5);
    for (let turn = 0; turn < 2; turn += 0.01) {
      expect(cyclePosition(turn)).toBeGreaterThanOrEqual(0);
      expect(cyclePosition(turn)).toBeLessThanOrEqual(1);
    }
  });

  it('has no jump from one moment to the next', () => {
    for (let turn = 0; turn < 1; turn += 0.005) {
      expect(Math.abs(cyclePosition(turn + 0.005) - cyclePosition(turn))).toBeLessThan(0.03);
    }
  });
});
