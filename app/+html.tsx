import type { ReactNode } from 'react';

import { pageCss, themeCss } from '@/components/ui/theme-css';

/** The page around every route of the export. */
export default function Html({ children }: { children: ReactNode }) {
  return (
    <html lang="en">
      <head>
        <meta charSet="utf-8" />
        <meta name="viewport" content="width=device-width, initial-scale=1" />
        <meta name="description" content="Sizes NTC inrush current limiters and PTC resettable fuses, and proves the choice by computation." />
        <style dangerouslySetInnerHTML={{ __html: themeCss + pageCss }} />
      </head>
      <body>{children}</body>
    </html>
  );
}
