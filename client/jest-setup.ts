import '@testing-library/jest-dom/jest-globals';
import { jest } from '@jest/globals';
import { configure } from '@testing-library/react';

/** jsdom lays nothing out, so there is nowhere to scroll to. */
window.scrollTo = () => undefined;

/** A page's module is compiled when it is first gone to. */
configure({ asyncUtilTimeout: 20_000 });
jest.setTimeout(60_000);
