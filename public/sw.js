/*
 * Opens Chalkfold without the network. It keeps the files of one build and that build's empty desk (/desk), which finds
 * the draft on this device by itself. Pages and data are never kept here: they are somebody's.
 *
 * Each build registers under its own name (?build=…) and has a cache of its own, so that what is served from here is
 * never a mix of two builds. A new worker takes over when no other page is open that still lives on the old one.
 */
const build = new URL(self.location.href).searchParams.get('build')
const prefix = 'chalkfold-'
const desk = '/desk'
const own = prefix + build

self.addEventListener('install', (event) => event.waitUntil(fill()))
self.addEventListener('activate', (event) => event.waitUntil(dropOthers()))
self.addEventListener('message', (event) => {
  if (event.data === 'take over') void self.skipWaiting()
})

self.addEventListener('fetch', (event) => {
  const { request } = event
  const { origin, pathname } = new URL(request.url)
  if (request.method !== 'GET' || origin !== self.location.origin) return
  if (pathname.startsWith('/_next/static/') || pathname.startsWith('/icons/'))
    event.respondWith(keptOrFetched(request))
  // A file that is downloaded is no page: its failure is the browser's to tell.
  else if (request.mode === 'navigate' && !pathname.startsWith('/api/')) event.respondWith(openPage(request))
})

/** Keeps the whole build, or nothing: a build that is replaced while we read it is not taken. */
async function fill() {
  const { files } = await present()
  const cache = await caches.open(own)
  await cache.addAll([...files, '/icons/mark.svg'])
  const page = await fetch(desk, { cache: 'no-store', credentials: 'omit' })
  if (!page.ok || page.redirected) throw new Error('The desk did not come.')
  await present()
  await cache.put(desk, page)
}

async function present() {
  const answer = await fetch('/api/shell', { cache: 'no-store', credentials: 'omit' })
  const shell = await answer.json()
  if (shell.build === build) return shell
  await caches.delete(own)
  throw new Error('The server has another build by now.')
}

async function dropOthers() {
  const names = await caches.keys()
  const others = names.filter((name) => name.startsWith(prefix) && name !== own)
  await Promise.all(others.map((name) => caches.delete(name)))
}

async function keptOrFetched(request) {
  return (await kept(request)) ?? fetch(request)
}

/** From our own build; from another's only when it is not in ours, which a name made of the contents allows. */
async function kept(request) {
  const cache = await caches.open(own)
  const options = { ignoreVary: true }
  return (await cache.match(request, options)) ?? caches.match(request, options)
}

async function openPage(request) {
  await letNextTakeOver()
  try {
    const answer = await fetch(request)
    // The machine before the application answers for it when it is gone.
    if (answer.status !== 502 && answer.status !== 504) return answer
    return (await kept(desk)) ?? answer
  } catch (error) {
    const page = await kept(desk)
    if (page) return page
    throw error
  }
}

/** The page that asks is about to be replaced: when it is the only one, nothing lives on this build any more. */
async function letNextTakeOver() {
  const next = self.registration.waiting
  if (!next) return
  const pages = await self.clients.matchAll({ type: 'window', includeUncontrolled: true })
  if (pages.length <= 1) next.postMessage('take over')
}
