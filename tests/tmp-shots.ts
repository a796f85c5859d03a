import { browser, closeBrowser } from './support/browser.ts';
import { signInAs, settled } from './support/steps.ts';
import { AxeBuilder } from '@axe-core/playwright';
const base='http://127.0.0.1:4377';
const b=await browser();
const paths=process.argv.slice(3);
for (const [w,h] of [[1440,900],[390,844]] as const){
  const c=await b.newContext({baseURL:base,viewport:{width:w,height:h}});
  const p=await c.newPage();
  p.on('console',m=>{ if(m.type()==='error') console.log('console',m.text())});
  await signInAs(p,base,process.argv[2] as 'owner');
  for(const path of paths){
    await p.goto(path); await settled(p);
    const name=path.replace(/[^a-z0-9]+/gi,'_');
    await p.screenshot({path:`/tmp/shots/${name}_${w}.png`,fullPage:true});
    const {violations}=await new AxeBuilder({page:p}).analyze();
    const wide=await p.evaluate(()=>document.documentElement.scrollWidth>window.innerWidth);
    console.log(path,w,violations.map(v=>v.id+' '+v.nodes[0]?.target),wide?'WIDE':'');
  }
  await c.close();
}
await closeBrowser();
