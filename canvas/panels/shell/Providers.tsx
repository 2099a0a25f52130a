import { QueryClientProvider } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { queryClient } from '../../client/queryClient';
import { installFonts } from '../../ui/fontFaces';
import { ThemeProvider } from '../../ui/theme';
import { ToastHost } from '../../ui/Toast';

installFonts();

/** What every screen stands on: the theme, the answers of the server, and the toast. */
export function Providers({ children }: { children: ReactNode }) {
  return (
    <QueryClientProvider client={queryClient}>
      <ThemeProvider>
        {children}
        <ToastHost />
      </ThemeProvider>
    </QueryClientProvider>
  );
}
