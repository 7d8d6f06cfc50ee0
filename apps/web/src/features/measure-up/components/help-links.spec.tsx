import { questionKeys } from '@linkfell/contracts';
import { screen } from '@testing-library/react';
import { expect, it } from 'vitest';
import { renderWithProviders } from '../../../testing/render-page';
import { topics } from '../../help/topics';
import { helpFor, HelpLinks } from './help-links';

it('leads from the question to its word, in a tab of its own', () => {
  renderWithProviders(<HelpLinks questionKey="eye-to-eye" />);
  const link = screen.getByRole('link', { name: 'What is eye-to-eye? (opens in a new tab)' });
  expect(link).toHaveAttribute('href', '/help/eye-to-eye');
  expect(link).toHaveAttribute('target', '_blank');
});

it('shows nothing where a question needs no explaining', () => {
  const { container } = renderWithProviders(<HelpLinks questionKey="budget" />);
  expect(container.querySelector('a')).toBeNull();
});

it('brings every help page to some question', () => {
  const linked = new Set(questionKeys.flatMap((key) => helpFor[key] ?? []));
  expect([...linked].sort()).toEqual(topics.map(({ path }) => path).sort());
});
