import { readFileSync } from 'node:fs'
import { readdirSync } from 'node:fs'
import { join, relative } from 'node:path'
import ts from 'typescript'

const root = process.cwd()

/** An endpoint as it stands in the sources. */
export interface SourceEndpoint {
  /** `METHOD /path` of a route handler, `file#name` of a server action. */
  readonly name: string
  /** The function its value comes from, such as workroomAction; empty when it is written out. */
  readonly wrapper: string
}

function sourceFiles(): string[] {
  const entries = readdirSync(join(root, 'app'), { recursive: true, withFileTypes: true })
  return entries
    .filter((entry) => entry.isFile() && /\.tsx?$/.test(entry.name))
    .map((entry) => relative(root, join(entry.parentPath, entry.name)))
}

const parsed = (file: string) =>
  ts.createSourceFile(file, readFileSync(join(root, file), 'utf8'), ts.ScriptTarget.ES2022, true)

function isExported(node: ts.Statement): boolean {
  return ts.canHaveModifiers(node)
    ? (ts.getModifiers(node) ?? []).some(({ kind }) => kind === ts.SyntaxKind.ExportKeyword)
    : false
}

function wrapperOf(value: ts.Expression | undefined): string {
  return value && ts.isCallExpression(value) && ts.isIdentifier(value.expression) ? value.expression.text : ''
}

/** The values that a file exports, each with the function it was wrapped by. */
function exportsOf(source: ts.SourceFile): { name: string; wrapper: string }[] {
  return source.statements.flatMap((statement) => {
    if (
      ts.isExportDeclaration(statement) &&
      statement.exportClause &&
      ts.isNamedExports(statement.exportClause)
    )
      return statement.isTypeOnly
        ? []
        : statement.exportClause.elements.map((element) => ({ name: element.name.text, wrapper: '' }))
    if (!isExported(statement)) return []
    if (ts.isFunctionDeclaration(statement)) return [{ name: statement.name?.text ?? 'default', wrapper: '' }]
    if (!ts.isVariableStatement(statement)) return []
    return statement.declarationList.declarations.map((declaration) => ({
      name: declaration.name.getText(),
      wrapper: wrapperOf(declaration.initializer),
    }))
  })
}

const methods = new Set(['GET', 'HEAD', 'POST', 'PUT', 'PATCH', 'DELETE', 'OPTIONS'])

function routePath(file: string): string {
  return file
    .replace(/^app/, '')
    .replace(/\/route\.tsx?$/, '')
    .replace(/\/\([^)]*\)/g, '')
}

const says = (node: ts.Node | undefined, words: string) =>
  node !== undefined &&
  ts.isExpressionStatement(node) &&
  ts.isStringLiteral(node.expression) &&
  node.expression.text === words

/** Actions written inside a component: none is allowed, because nothing would check who calls them. */
export function inlineActions(): string[] {
  return sourceFiles().filter((file) => {
    const source = parsed(file)
    let found = false
    const visit = (node: ts.Node) => {
      if (ts.isBlock(node) && says(node.statements[0], 'use server')) found = true
      ts.forEachChild(node, visit)
    }
    visit(source)
    return found
  })
}

/** Every route handler and server action in the sources. */
export function sourceEndpoints(): SourceEndpoint[] {
  return sourceFiles().flatMap((file) => {
    const isRoute = /(^|\/)route\.tsx?$/.test(file)
    if (!isRoute && !/['"]use server['"]/.test(readFileSync(join(root, file), 'utf8'))) return []
    const source = parsed(file)
    if (isRoute)
      return exportsOf(source)
        .filter(({ name }) => methods.has(name))
        .map(({ name, wrapper }) => ({ name: `${name} ${routePath(file)}`, wrapper }))
    if (!says(source.statements[0], 'use server')) return []
    return exportsOf(source).map(({ name, wrapper }) => ({ name: `${file}#${name}`, wrapper }))
  })
}
