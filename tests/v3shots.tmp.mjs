import { chromium } from 'playwright-core';
import { AxeBuilder } from '@axe-core/playwright';
const only=process.argv[2]; 
const links=JSON.parse(process.env.LINKS||'[]');
const base='http://127.0.0.1:4472';
const browser=await chromium.launch({executablePath:'/usr/bin/chromium',args:['--headless','--no-sandbox','--disable-gpu','--disable-quic','--no-first-run','--disable-background-networking','--disable-component-update','--disable-sync']});
const pages=[['quotes','/counter/quotes'],['quote','/counter/quotes/1'],['quote-sent','/counter/quotes/3'],['quote-hand','/counter/quotes/2'],['new','/counter/quotes/new?customer=1&pattern=1'],['change','/counter/quotes/1/change'],['customers','/counter/customers'],['customer','/counter/customers/1'],['newc','/counter/customers/new'],...links.map((l,i)=>['link'+i,l]),['badlink','/c/nothing']];
for(const [w,h] of [[1440,960],[390,844]]){
 const ctx=await browser.newContext({viewport:{width:w,height:h}});
 const page=await ctx.newPage();
 page.on('console',m=>{if(m.type()==='error')console.log('CONSOLE',page.url(),m.text().slice(0,400));});
 page.on('pageerror',e=>console.log('PAGEERROR',page.url(),String(e).slice(0,500)));
 await page.goto(base+'/sign-in');
 await page.getByLabel('E-mail address').fill('owner@example.com');
 await page.getByLabel('Password').fill('marlpit-by-the-fen');
 await page.getByRole('button',{name:'Sign in'}).click();
 await page.waitForURL('**/today',{timeout:60000});
 for(const [name,path] of pages){
  if(only&&!only.split(',').includes(name))continue;
  await page.goto(base+path).catch(async e=>{console.log('RETRY',name,String(e).slice(0,80));await page.waitForTimeout(1500);await page.goto(base+path);}); await page.waitForLoadState('networkidle'); await page.waitForTimeout(700);
  await page.screenshot({path:`/tmp/v3/${name}-${w}.png`,fullPage:true});
  const r=await new AxeBuilder({page}).analyze();
  for(const v of r.violations)console.log('AXE',w,name,v.id,v.nodes.map(n=>n.html.slice(0,150)+' | '+(n.any[0]?.message||'')).slice(0,3));
  const sw=await page.evaluate(()=>document.documentElement.scrollWidth);
  if(sw>w)console.log('OVERFLOW',w,name,sw);
 }
 await ctx.close();
}
await browser.close();
