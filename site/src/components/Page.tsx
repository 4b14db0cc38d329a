/** What the browser's tab, a bookmark and a search result say of a page. */
export function Page({ title, description }: { title: string; description?: string }) {
  return (
    <>
      <title>{`${title} · Leatwright`}</title>
      {description && <meta name="description" content={description} />}
    </>
  )
}
