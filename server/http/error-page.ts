import type { Problem } from '#shared/schemas/problem'

export type ErrorPage = (problem: Problem) => string

const fallbackTemplate = `<!doctype html>
<html lang="en">
<head>
<meta charset="utf-8">
<meta name="viewport" content="width=device-width, initial-scale=1">
<meta name="robots" content="noindex">
<meta name="color-scheme" content="light dark">
<title><!--title--> · Stillfits</title>
</head>
<body>
<main>
<h1><!--title--></h1>
<p><!--detail--></p>
<p><a href="/">Go to the start page</a></p>
<p><small>Status <!--status--> · request <!--request-id--></small></p>
</main>
</body>
</html>
`

function escapeHtml(text: string): string {
  return text.replace(/[&<>"']/g, (character) => `&#${character.charCodeAt(0)};`)
}

/** Fills a page that needs neither the database nor a script: `<!--title-->`, `<!--detail-->`, `<!--status-->`, `<!--request-id-->`. */
export function createErrorPage(template: string = fallbackTemplate): ErrorPage {
  return (problem) => {
    const parts: Readonly<Record<string, string>> = {
      title: problem.title,
      detail: problem.detail,
      status: String(problem.status),
      'request-id': problem.requestId,
    }
    return template.replace(/<!--(title|detail|status|request-id)-->/g, (_, key: string) =>
      escapeHtml(parts[key] ?? ''),
    )
  }
}
