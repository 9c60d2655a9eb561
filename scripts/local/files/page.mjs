import { localPage, pageHeaders, plain } from '../page.mjs'

/**
 * Answers with the list of what the store holds: names and sizes, never the contents, which are somebody's.
 * @param {import('node:http').ServerResponse} response
 * @param {import('./store.mjs').Kept[]} objects
 */
export function filesPage(response, objects) {
  const rows = objects.map(
    ({ key, size, modified, headers }) =>
      `<tr><td>${plain(key)}</td><td>${plain(headers['content-type'])}</td><td><time datetime="${modified}">${modified}</time></td><td class="figure">${size} bytes</td></tr>`,
  )
  const table = `<table><thead><tr><th scope="col">Name</th><th scope="col">Kind</th><th scope="col">Kept at</th><th scope="col" class="figure">Size</th></tr></thead><tbody>${rows.join('')}</tbody></table>`
  response
    .writeHead(200, pageHeaders())
    .end(
      localPage(
        'Local files',
        `<p class="note">What Chalkfold stores on this machine, in place of an object store. It is read through Chalkfold only.</p>${objects.length > 0 ? table : '<p>Nothing is stored yet.</p>'}`,
      ),
    )
}
