// node shot.mjs BASE email,password OUT path[,path...] [widths] [skies]
import { chromium } from 'playwright-core'
const [base, who, out, paths, widths = '1440', skies = 'day'] = process.argv.slice(2)
const browser = await chromium.launch({ executablePath: '/usr/bin/chromium', args: ['--no-sandbox','--disable-gpu','--disable-quic','--no-first-run','--disable-background-networking','--disable-component-update','--disable-sync'] })
const context = await browser.newContext({ viewport: { width: 1440, height: 900 } })
const page = await context.newPage()
page.on('console', m => { if (['error','warning'].includes(m.type())) console.log('console', m.type(), m.text().slice(0, 300)) })
page.on('pageerror', e => console.log('pageerror', String(e).slice(0, 300)))
const [email, password] = who.split(',')
if (email) {
  const csrf = await (await context.request.get(base + '/api/auth/csrf')).json()
  await context.request.post(base + '/api/auth/callback/credentials', { form: { csrfToken: csrf.csrfToken, email, password, json: 'true' }, headers: { origin: base } })
}
let n = 0
for (const path of paths.split(',')) for (const sky of skies.split(',')) for (const width of widths.split(',')) {
  const [w, h] = width.split('x').map(Number)
  await page.setViewportSize({ width: w, height: h || 900 })
  await context.addCookies([{ name: 'sky', value: sky, url: base }])
  const r = await page.goto(base + path, { waitUntil: 'networkidle' })
  await page.waitForTimeout(300)
  const file = `/tmp/plan/shots/${out}-${String(n++).padStart(2, '0')}-${w}-${sky}.png`
  const wide = await page.evaluate(() => document.documentElement.scrollWidth - innerWidth)
  await page.screenshot({ path: file, fullPage: !h })
  console.log(r.status(), page.url().replace(base, ''), file, wide > 0 ? 'SIDEWAYS ' + wide : '')
}
await browser.close()
