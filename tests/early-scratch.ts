import { curveFromSweeps } from '@leeside/attenuation/curve-from-sweeps';
import { groupCurves } from '@leeside/attenuation/curves-of-session';
import { makeSweep } from '@leeside/trace-reading/sweep';
import { judgeCurve, gateHolds } from '/work/main/sample-data/truth/judge-curve.js';
import { makeTruthSet } from '/work/main/sample-data/truth/make-truth-set.js';
import { truthVariants, variantName } from '/work/main/tests/truth/truth-variants.js';
function parse(bytes: Uint8Array, looks:number, v:any){
  const utf16 = bytes[0]===0xff; const text = Buffer.from(utf16?bytes.slice(2):bytes).toString(utf16?'utf16le':'utf8');
  const f:number[]=[],l:number[]=[];
  for(const line of text.split(/\r?\n/)){ const c=line.split(/[,\t]/); if(c.length!==2) continue; const a=Number(c[0]),b=Number(c[1]); if(!Number.isFinite(a)||!Number.isFinite(b)) continue; f.push(a);l.push(b);} 
  const settings = v.settingsWritten? {rbwHz:v.rbwHz,vbwHz:v.rbwHz*3,detector:v.combined==='held'?'peak':'rms',traceMode:v.combined==='held'?'max hold':'average',held:looks,attenuationDb:0,referenceLevelDbm:10}:{};
  const made:any = (makeSweep as any)({frequencyHz:f, level:l, levelUnit:'dBm', settings});
  return made.sweep ?? made;
}
const only:number[]=[]; let fails=0,total=0;

const pick=(a:any[],i:number)=>a[i%a.length];
let variantsR:any[]=[]; const N=Number(process.argv[2]??60), S=Number(process.argv[3]??0);
let st=12345+S; const rnd=()=>{st=(Math.imul(st,1664525)+1013904223)>>>0; return st/2**32};
const ch=(a:any[])=>a[Math.floor(rnd()*a.length)];
for(let i=0;i<N;i++){ const n=ch([1,2,3,5,8,10,20,30,50,100,200,1000]); const style=ch(['continuous','continuous','comb','comb','spot']); const points=style==='spot'?ch([600,801,1001]):n>=500?ch([600,1001]):ch([600,601,1001,1501,2001,4001]);
 variantsR.push({seed:5000+S*100+i,style,points,looks:{reference:n,enclosed:n,noise:n},combined:rnd()<0.12?'averaged':'held',noiseSweep:rnd()<0.7,rbwHz:ch((style==="spot"?[1000,3000,10000,30000,100000]:[1000,3000,10000,30000,100000,1000000])),layout:'plain',settingsWritten:rnd()<0.7,referencePoints:rnd()<0.7?points:ch([700,1001,2001]),combSpacingBins:ch([12,13,20,40]),quantumDb:ch([0.01,0.1])});}
for (const v0 of variantsR){
  if(only.length && !only.includes(v0.seed)) continue;
  const v={referencePoints:v0.points,combSpacingBins:20,quantumDb:0.01,...v0, layout: 'plain' as const};
  const {files,truth}=makeTruthSet(v);
  try{
  const traces=files.map((file,i)=>({traceId:file.name,role:file.role,sweep:parse(file.bytes,v.looks[file.role],v),sampleId:file.role==='enclosed'?'s':null,condition:'',polarisation:'',position:'',measuredAtMs:Date.parse(file.measuredAt),uploadOrder:i,chainLossDb:null,transmitLevelDbm:null,pairedWith:null}));
  const g=groupCurves(traces as any,[]);
  const t0=Date.now();
  const r:any=curveFromSweeps({...g[0]!.input,parameters:{floorMarginDb:6,driftLimitDb:3,standsForRatio:1.1},requirement:null});
  const gates=r.points?judgeCurve(r.points,truth):[]; total++; const bad=gates.filter(x=>!gateHolds(x)); if(bad.length===0&&r.points) {continue;} fails++; console.log(variantName(v), g.length, r.kind, r.reason??'', r.style, r.floorSource, r.driftDb?.toFixed(2), r.points?.frequencyHz.length, Date.now()-t0+'ms', r.doubts.map((d:any)=>d.code).join('|').slice(0,150));
  if(r.points) for(const gate of judgeCurve(r.points,truth)) console.log('   ', gateHolds(gate)?'ok  ':'FAIL', gate.name, gate.passed+'/'+gate.of, gate.of?(gate.passed/gate.of).toFixed(4):'', gate.neededShare);
  }catch(e){console.log(variantName(v),'THROW',(e as Error).stack?.slice(0,400))}
}

console.log(`fails ${fails} of ${total}`);
