import { useEffect, type ReactNode } from 'react';
import { LeeDrawing } from './LeeDrawing';

/** The cover of the notebook: what stands before anybody is known. */
export function FrontPage({ title, children }: { title: string; children: ReactNode }) {
  useEffect(() => {
    document.title = `${title} · Leeside`;
  }, [title]);
  return (
    <main className="mx-auto grid min-h-dvh max-w-6xl grid-cols-[minmax(0,1fr)] content-center gap-x-20 gap-y-10 px-5 py-10 desk:grid-cols-[minmax(0,1fr)_24rem]">
      <div className="stitched pe-0 desk:pe-16">
        <p className="text-2xl font-semibold tracking-tight">Leeside</p>
        <p className="mt-2 max-w-md text-faded">From spectrum analyzer sweeps to attenuation curves that stand up, and back from every number to the bytes that it came from.</p>
        <LeeDrawing />
      </div>
      <div className="self-center">
        <h1 className="mb-6 border-b border-edge pb-2 text-xl">{title}</h1>
        {children}
      </div>
    </main>
  );
}
