import { act, cleanup, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { setMedia } from '../testing/browser-gaps';
import { renderRoutes } from '../testing/render-page';
import { ErrorPage } from './error-page';
import { Shell } from './layout/shell';
import { routeObjects } from './route-objects';

const answerOfMe = vi.fn<() => unknown>();
beforeEach(() => {
  answerOfMe.mockReturnValue({ account: null });
  vi.stubGlobal('fetch', () => Promise.resolve(Response.json(answerOfMe())));
  setMedia();
  localStorage.clear();
  document.documentElement.className = '';
});

afterEach(() => vi.unstubAllGlobals());

const heading = (name: RegExp | string) => screen.findByRole('heading', { level: 1, name });

describe('the shell', () => {
  it('leads by keyboard past the header, into the page', async () => {
    renderRoutes(routeObjects(), '/contact');
    await heading('Contact');
    await userEvent.tab();
    expect(screen.getByRole('link', { name: 'Skip to the page' })).toHaveFocus();
    expect(document.querySelector('#main')).toHaveAttribute('tabindex', '-1');
  });

  it('brings title and focus to each page that is arrived at', async () => {
    renderRoutes(routeObjects(), '/contact');
    await heading('Contact');
    expect(document.title).toBe('Contact – Linkfell');
    expect(document.body).toHaveFocus();
    const company = within(screen.getByRole('navigation', { name: 'Company' }));
    await userEvent.click(company.getByRole('link', { name: 'Returns' }));
    const arrived = await heading('Returns and refunds');
    await waitFor(() => expect(arrived).toHaveFocus());
    expect(document.title).toBe('Returns and refunds – Linkfell');
  });

  it('leads to the desk whoever is signed in, and all others to the sign-in', async () => {
    renderRoutes(routeObjects(), '/contact');
    const main = within(await screen.findByRole('navigation', { name: 'Main' }));
    expect(main.getByRole('link', { name: 'Sign in' })).toHaveAttribute('href', '/sign-in');
    await waitFor(() => expect(answerOfMe).toHaveBeenCalled());
    expect(main.queryByRole('link', { name: 'Desk' })).not.toBeInTheDocument();
    cleanup();
    answerOfMe.mockReturnValue({ account: { id: 'a1' } });
    renderRoutes(routeObjects(), '/contact');
    expect(await screen.findByRole('link', { name: 'Desk' })).toHaveAttribute('href', '/desk');
    expect(screen.queryByRole('link', { name: 'Sign in' })).not.toBeInTheDocument();
  });

  it('follows at once when a page learns of signing in and out', async () => {
    const { queries } = renderRoutes(routeObjects(), '/contact');
    await heading('Contact');
    act(() => void queries.setQueryData(['me'], { account: { id: 'a1' } }));
    expect(await screen.findByRole('link', { name: 'Desk' })).toBeInTheDocument();
    act(() => queries.clear());
    const company = within(screen.getByRole('navigation', { name: 'Company' }));
    await userEvent.click(company.getByRole('link', { name: 'Returns' }));
    expect(await screen.findByRole('link', { name: 'Sign in' })).toBeInTheDocument();
  });

  it('says what is wrong at an address where nothing is', async () => {
    renderRoutes(routeObjects(), '/nothing/here');
    await heading('This end is not connected');
    expect(document.title).toBe('Page not found – Linkfell');
    expect(screen.getByRole('link', { name: 'Go to the front page' })).toHaveAttribute('href', '/');
  });

  it('keeps header and way out when a page fails', async () => {
    const silent = vi.spyOn(console, 'error').mockImplementation(() => undefined);
    const Failing = () => {
      throw new Error('broken');
    };
    const page = { path: '/', element: <Failing /> };
    renderRoutes([{ element: <Shell />, children: [{ errorElement: <ErrorPage />, children: [page] }] }]);
    await heading('This page could not be shown');
    expect(document.title).toBe('Error: This page failed – Linkfell');
    expect(screen.getByRole('navigation', { name: 'Main' })).toBeInTheDocument();
    expect(screen.getByRole('button', { name: 'Load the page again' })).toBeInTheDocument();
    silent.mockRestore();
  });

  it('tells when the network is gone, and when it is back', async () => {
    renderRoutes(routeObjects(), '/contact');
    await heading('Contact');
    const online = vi.spyOn(navigator, 'onLine', 'get').mockReturnValue(false);
    // The notice listens only once its effects have run, a moment after the page is seen.
    act(() => void window.dispatchEvent(new Event('offline')));
    expect(await screen.findByText(/You are offline/)).toBeInTheDocument();
    online.mockReturnValue(true);
    act(() => void window.dispatchEvent(new Event('online')));
    await waitFor(() => expect(screen.queryByText(/You are offline/)).not.toBeInTheDocument());
    online.mockRestore();
  });
});

describe('colour mode', () => {
  it('follows the system until the reader chooses, and remembers the choice', async () => {
    setMedia('(prefers-color-scheme: dark)');
    renderRoutes(routeObjects(), '/contact');
    await heading('Contact');
    expect(screen.getByRole('radio', { name: 'Same as system' })).toBeChecked();
    await userEvent.click(screen.getByRole('radio', { name: 'Light' }));
    expect(document.documentElement).toHaveClass('light');
    expect(localStorage.getItem('linkfell.colour-mode')).toBe('light');
    await userEvent.click(screen.getByRole('radio', { name: 'Same as system' }));
    expect(document.documentElement).toHaveClass('dark');
    expect(localStorage.getItem('linkfell.colour-mode')).toBeNull();
  });
});
