import { readFileSync, readdirSync } from 'node:fs';
import { readTraceBytes } from '@leeside/trace-reading/read-trace-file';
for (const f of process.argv.slice(2)) { const r = readTraceBytes(new Uint8Array(readFileSync(f)), { fileName: f.split('/').at(-1)! });
 console.log(f.split('/').at(-1), r.kind, r.kind==='read' ? r.sweeps.map(s=>`${s.name} ${s.sweep.level.length} ${s.sweep.frequencyHz[0]}..${s.sweep.frequencyHz.at(-1)} ${s.sweep.levelUnit} ${s.sweep.level[0]}`).join(' / ') + ' ' + JSON.stringify(r.transcription.settings)+ ' ' + r.doubts.map(d=>d.code).join(',') : r.kind==='question' ? JSON.stringify(r.questions) : JSON.stringify(r.problem)); }
