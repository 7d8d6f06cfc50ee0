import '@testing-library/jest-dom/vitest';
import { cleanup } from '@testing-library/react';
import { afterEach } from 'vitest';
import { installBrowserGaps } from './browser-gaps';

// Files that ask for the node environment have no browser to mend.
if (typeof window !== 'undefined') installBrowserGaps();
afterEach(cleanup);
