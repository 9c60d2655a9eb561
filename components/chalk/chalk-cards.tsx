'use client'

import type { ChalkGuide, ChalkSheet } from '@/drafting/chalk/guide'
import type { Piece } from '@/drafting/contract'
import { typesetFractions } from '@/drafting/drawing/typeset'
import { Button } from '@/components/ui/button'
import { Card } from '@/components/ui/card'
import { classes } from '@/components/ui/classes'
import { Note } from '@/components/ui/error-note'
import { PieceSketch } from './piece-sketch'
import { useTicks } from './ticks'

/** One thing to do at the table. */
interface Task {
  readonly id: string
  readonly letter?: string
  /** What is measured, large. */
  readonly measure?: string
  readonly words: string
}

/** The chalk guide on a phone at the cutting table: large, in order, each mark ticked off once it is on the cloth. */
export function ChalkCards({
  guide,
  pieces,
  version,
}: {
  readonly guide: ChalkGuide
  readonly pieces: readonly Piece[]
  /** Id of the version: ticks belong to it. */
  readonly version: string
}) {
  const { ticked, tick, clear } = useTicks(`chalk:${version}`)
  const all = guide.sheets.flatMap(tasksOf)
  const done = all.filter(({ id }) => ticked.includes(id)).length
  return (
    <div className="grid gap-8">
      <div className="sticky top-0 z-10 flex items-center justify-between gap-4 bg-ground py-2">
        <p role="status" className="font-semibold">
          {done} of {all.length} done
        </p>
        <Button look="quiet" disabled={done === 0} onClick={clear}>
          Begin again
        </Button>
      </div>
      <ul className="list-disc pl-5">
        {guide.rules.map((rule) => (
          <li key={rule}>{rule}</li>
        ))}
      </ul>
      {guide.sheets.map((sheet) => {
        const piece = pieces.find(({ id }) => id === sheet.id)
        return (
          <Card key={sheet.id} title={sheet.name}>
            <div className="grid gap-5 md:grid-cols-[minmax(0,20rem)_1fr]">
              <div className="grid content-start gap-3">
                {piece && <PieceSketch piece={piece} sheet={sheet} />}
                {sheet.fold.words.map((words) => (
                  <p key={words}>{typesetFractions(words)}</p>
                ))}
                {sheet.cutting.map((words) => (
                  <Note key={words} kind="info">
                    {words}
                  </Note>
                ))}
              </div>
              <ol className="grid content-start">
                {tasksOf(sheet).map((task) => (
                  <TaskRow
                    key={task.id}
                    task={task}
                    done={ticked.includes(task.id)}
                    onTick={(on) => tick(task.id, on)}
                  />
                ))}
              </ol>
            </div>
          </Card>
        )
      })}
      <Card title="Walk the seams">
        <ul className="grid gap-2">
          {guide.checks.map(({ name, words, agrees }) => (
            <li key={name} className="flex flex-wrap justify-between gap-x-4">
              <span>{name}</span>
              <span className={classes('font-semibold', !agrees && 'text-madder')}>
                {typesetFractions(words)}
                {!agrees && ': look again'}
              </span>
            </li>
          ))}
        </ul>
      </Card>
    </div>
  )
}

function TaskRow({
  task,
  done,
  onTick,
}: {
  readonly task: Task
  readonly done: boolean
  readonly onTick: (on: boolean) => void
}) {
  return (
    <li className="border-b hairline last:border-0">
      <label
        className={classes(
          'flex min-h-11 items-start gap-3 py-2.5',
          done && 'line-through decoration-walnut',
        )}
      >
        <input
          type="checkbox"
          checked={done}
          onChange={({ target }) => onTick(target.checked)}
          className="mt-1 size-6 shrink-0 accent-indigo"
        />
        {task.letter && <span className="w-8 shrink-0 text-xl font-semibold">{task.letter}</span>}
        <span className="min-w-0">
          {task.measure && (
            <span className="block text-lg leading-snug font-semibold">{typesetFractions(task.measure)}</span>
          )}
          <span className={task.measure ? 'text-walnut' : undefined}>{typesetFractions(task.words)}</span>
        </span>
      </label>
    </li>
  )
}

function tasksOf(sheet: ChalkSheet): readonly Task[] {
  const marks = sheet.layings.flatMap(({ words, marks: read }) =>
    read.map(({ letter, at, distance, words: why }): Task => ({
      // A mark may have no letter, but no two stand on one spot.
      id: `${sheet.id}/mark/${at.x.toFixed(1)} ${at.y.toFixed(1)}`,
      letter,
      measure: distance ? `${words} ${distance}` : undefined,
      words: why,
    })),
  )
  const lines = sheet.curves.map(({ edge, words, straight, off }): Task => ({
    id: `${sheet.id}/line/${edge}`,
    measure: off ? `${straight}. ${off}` : straight,
    words,
  }))
  const rest = [...sheet.allowances, ...sheet.notches].map((words, index): Task => ({
    id: `${sheet.id}/rest/${index}`,
    words,
  }))
  return [...marks, ...lines, ...rest]
}
