// Keeps the practice phones fresh: asks once a second whether anything changed, then takes over only the items of
// the lists that did, so that what is typed, focused or scrolled stays as it is.

const pollMilliseconds = 1000
let seen = document.body.dataset.version

const children = (list) => [...list.children].filter((child) => child.dataset.key)

/** Makes `list` show the items of `fresh`; an item is known by its key and replaced only when it differs. */
function syncList(list, fresh) {
  const known = new Map(children(list).map((child) => [child.dataset.key, child]))
  const keep = list.hasAttribute('data-keep')
  let place = null
  for (const item of children(fresh)) {
    let own = known.get(item.dataset.key)
    known.delete(item.dataset.key)
    if (own && keep) syncInside(own, item)
    else if (own && own.outerHTML !== item.outerHTML) own = replaced(own, item)
    if (!own) own = document.importNode(item, true)
    const next = place ? place.nextElementSibling : list.firstElementChild
    if (own !== next) list.insertBefore(own, next)
    place = own
  }
  for (const gone of known.values()) gone.remove()
}

function replaced(own, item) {
  const focused = own.contains(document.activeElement)
  const copy = document.importNode(item, true)
  copy.hidden = own.hidden
  own.replaceWith(copy)
  if (focused) copy.querySelector('a')?.focus()
  return copy
}

function syncInside(own, fresh) {
  const lists = own.querySelectorAll('[data-list]')
  fresh.querySelectorAll('[data-list]').forEach((list, index) => {
    const screen = lists[index].parentElement
    const low = screen.scrollHeight - screen.scrollTop - screen.clientHeight < 24
    syncList(lists[index], list)
    if (low) screen.scrollTop = screen.scrollHeight
  })
  const back = own.querySelector('.back')
  back.setAttribute('href', fresh.querySelector('.back').getAttribute('href'))
}

async function refresh(address) {
  const answer = await fetch(address)
  const page = new DOMParser().parseFromString(await answer.text(), 'text/html')
  for (const id of ['lately', 'all', 'phones', 'troubles']) {
    syncList(document.getElementById(id), page.getElementById(id))
  }
  for (const id of ['hint', 'trouble', 'lately-part']) {
    document.getElementById(id).hidden = page.getElementById(id).hidden
  }
  for (const hidden of document.querySelectorAll('form input[type=hidden][name=open]')) {
    hidden.remove()
  }
  const open = new URLSearchParams(location.search).getAll('open')
  for (const form of document.forms) {
    for (const number of [...open].reverse()) {
      const input = Object.assign(document.createElement('input'), { type: 'hidden' })
      form.prepend(Object.assign(input, { name: 'open', value: number }))
    }
  }
  document.querySelector('main').className = page.querySelector('main').className
  seen = page.body.dataset.version
  filter()
}

/** The shelf is searched here; the server is asked for all of it. */
function addressNow() {
  const query = new URLSearchParams(location.search)
  query.delete('find')
  return `/?${query}`
}

function filter() {
  const wanted = document.getElementById('find').value.trim().toLowerCase()
  let found = 0
  for (const item of children(document.getElementById('all'))) {
    item.hidden = !item.dataset.find.includes(wanted)
    if (!item.hidden) found += 1
  }
  const text = found === 1 ? '1 phone' : `${found} phones`
  const count = document.getElementById('found')
  if (count.textContent !== text) count.textContent = text
}

const bottoms = () => {
  for (const screen of document.querySelectorAll('.screen')) screen.scrollTop = screen.scrollHeight
}

/** Opens or puts back phones without leaving the page. */
async function go(url) {
  const already = new Set([...document.querySelectorAll('.phone')].map((phone) => phone.id))
  if (url.search !== location.search) {
    history.pushState(null, '', url)
    await refresh(addressNow())
  }
  const target = url.hash ? document.getElementById(url.hash.slice(1)) : null
  if (!target) return
  const screen = target.querySelector('.screen')
  if (!already.has(target.id)) screen.scrollTop = screen.scrollHeight
  target.querySelector('textarea').focus({ preventScroll: true })
  target.scrollIntoView({ block: 'nearest' })
}

document.addEventListener('click', (event) => {
  const link = event.target.closest('a[data-go]')
  if (!link || event.metaKey || event.ctrlKey || event.shiftKey) return
  event.preventDefault()
  const putBack = link.classList.contains('back')
  go(new URL(link.getAttribute('href'), location.href)).then(() => {
    if (putBack) document.getElementById('find').focus()
  }, report)
})

document.addEventListener('submit', (event) => {
  const form = event.target
  if (form.matches('[role=search]')) event.preventDefault()
  if (form.matches('[data-any]')) {
    event.preventDefault()
    openTyped(form).catch(report)
  }
  if (!form.matches('[data-write]')) return
  event.preventDefault()
  send(form).catch(report)
})

/** The server knows what a number is: it leads to the tidy address, or says what is wrong. */
async function openTyped(form) {
  const answer = await fetch(`/?${new URLSearchParams(new FormData(form))}`)
  const page = new DOMParser().parseFromString(await answer.text(), 'text/html')
  const wrong = page.getElementById('refused')
  document.getElementById('refused')?.remove()
  const field = form.elements.any
  if (wrong) {
    field.setAttribute('aria-invalid', 'true')
    field.setAttribute('aria-describedby', 'refused')
    form.append(document.importNode(wrong, true))
    field.focus()
    return
  }
  field.removeAttribute('aria-invalid')
  field.removeAttribute('aria-describedby')
  const number = new URL(answer.url).searchParams.getAll('open').at(-1)
  if (field.value.trim() === '' || !number) return
  field.value = ''
  await go(new URL(`${answer.url}#phone-${number.slice(1)}`))
}

async function send(form) {
  const field = form.elements.body
  const body = field.value
  if (body.trim() === '') return
  field.value = ''
  const answer = await fetch('/practice/inbound', {
    method: 'POST',
    headers: { 'Content-Type': 'application/json' },
    body: JSON.stringify({ from: form.elements.from.value, body }),
  }).catch(() => null)
  if (!answer?.ok) {
    field.value = body
    return
  }
  const screen = form.parentElement.querySelector('.screen')
  await refresh(addressNow())
  screen.scrollTop = screen.scrollHeight
}

// As on a phone, the send key sends; a new line takes shift.
document.addEventListener('keydown', (event) => {
  const field = event.target
  if (event.key !== 'Enter' || event.shiftKey || event.isComposing) return
  if (!field.matches?.('[data-write] textarea')) return
  event.preventDefault()
  field.form.requestSubmit()
})

document.getElementById('find').addEventListener('input', filter)
window.addEventListener('popstate', () => {
  refresh(addressNow()).catch(report)
})

function report(error) {
  console.warn('the practice phones could not be refreshed', error)
}

async function poll() {
  const answer = await fetch('/version').catch(() => null)
  if (answer?.ok && String((await answer.json()).version) !== seen) await refresh(addressNow())
}

async function keepFresh() {
  await poll().catch(report)
  setTimeout(() => void keepFresh(), pollMilliseconds)
}

bottoms()
// The faces arrive later than the page and make texts taller.
void document.fonts.ready.then(bottoms)
void keepFresh()
