import { Suspense } from 'react';
import { Outlet, ScrollRestoration } from 'react-router-dom';
import { LoadingLines } from '../components/LoadingLines';
import { BottomBar, Spine, TopLine } from './Spine';

export function NotebookLayout() {
  return (
    <div className="flex min-h-dvh">
      <a href="#sheet" className="sr-only focus:not-sr-only focus:fixed focus:start-2 focus:top-2 focus:z-20 focus:bg-sheet focus:p-3">Skip to the sheet</a>
      <Spine />
      <div className="min-w-0 flex-1">
        <TopLine />
        <main id="sheet" tabIndex={-1} className="mx-auto max-w-[84rem] px-4 pt-6 pb-24 outline-none desk:px-10 desk:pt-8 desk:pb-12">
          <Suspense fallback={<LoadingLines what="the page" />}><Outlet /></Suspense>
        </main>
      </div>
      <BottomBar />
      <ScrollRestoration />
    </div>
  );
}
