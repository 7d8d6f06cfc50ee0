import { expect, it } from 'vitest';
import { collectStyles } from './style-collector';

it('moves each rule once into the head and leaves the markup bare', () => {
  const { html, style } = collectStyles(
    '<style data-emotion="css-global g1">html{a:b}</style>' +
      '<style data-emotion="css x1">.css-x1{c:d}</style><p class="css-x1">One</p>' +
      '<style data-emotion="css x1">.css-x1{c:d}</style><p class="css-x1">Two</p>' +
      '<style data-emotion="css y2">.css-y2{e:f}</style><p class="css-y2">Three</p>',
  );
  expect(html).toBe('<p class="css-x1">One</p><p class="css-x1">Two</p><p class="css-y2">Three</p>');
  expect(style).toBe(
    '<style data-emotion="css-global g1">html{a:b}</style>' +
      '<style data-emotion="css x1 y2">.css-x1{c:d}.css-y2{e:f}</style>',
  );
});
