import createCache from '@emotion/cache';
import { CacheProvider } from '@emotion/react';
import CssBaseline from '@mui/material/CssBaseline';
import { ThemeProvider } from '@mui/material/styles';
import { QueryClientProvider } from '@tanstack/react-query';
import type { ReactElement, ReactNode } from 'react';
import { styleNonce } from '../lib/nonce';
import { queryClient } from './query-client';
import { theme } from './theme/theme';

const styles = createCache({ key: 'em', nonce: styleNonce(), prepend: true });

export function Providers({ children }: { children: ReactNode }): ReactElement {
  return (
    <CacheProvider value={styles}>
      <ThemeProvider theme={theme} defaultMode="system" modeStorageKey="scheme" colorSchemeStorageKey="scheme-of" noSsr>
        <CssBaseline enableColorScheme />
        <QueryClientProvider client={queryClient}>{children}</QueryClientProvider>
      </ThemeProvider>
    </CacheProvider>
  );
}
