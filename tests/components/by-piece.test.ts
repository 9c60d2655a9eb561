import { expect, it } from 'vitest'
import { byPiece } from '@/components/sheet/by-piece'

it('groups what stands on one piece and keeps the drafting order', () => {
  const on = (piece: string, id: string) => ({ piece, id })
  const list = [on('front', 'a'), on('front', 'b'), on('back', 'c'), on('front', 'd')]
  expect(byPiece(list).map(({ piece, items }) => [piece, items.map((item) => item.id).join('')])).toEqual([
    ['front', 'ab'],
    ['back', 'c'],
    ['front', 'd'],
  ])
  expect(byPiece([])).toEqual([])
})
