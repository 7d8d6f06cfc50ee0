import '@testing-library/jest-dom/vitest';
import { cleanup } from '@testing-library/react';
import { afterEach } from 'vitest';
import { installBrowserGaps } from './browser-gaps';

installBrowserGaps();
afterEach(cleanup);
