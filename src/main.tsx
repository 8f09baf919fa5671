import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { Providers } from '#src/app/providers.tsx';
import { followTheme } from '#src/lib/settings/theme.ts';
import '#src/app/styles.css';

followTheme();

const root = document.getElementById('root');
if (!root) throw new Error('index.html has no #root');
createRoot(root).render(
  <StrictMode>
    <Providers />
  </StrictMode>,
);
