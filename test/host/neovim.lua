-- Runs in Neovim after the set-up that extension/docs/editors.md gives: a design is opened, and what a user would see is asked for.
local passed, failed = 0, 0
local function say(text)
  io.stdout:write(text .. '\n')
end
local function check(name, ok, detail)
  if ok then
    passed = passed + 1
    say('ok - ' .. name)
  else
    failed = failed + 1
    say('not ok - ' .. name .. ': ' .. vim.inspect(detail))
  end
end
local function until_true(look)
  return vim.wait(15000, look, 50)
end

local folder = vim.env.DESIGNS
vim.cmd('edit ' .. folder .. '/unit_forgotten.gainmodule.yaml')
local buffer = vim.api.nvim_get_current_buf()
local function request(method, params)
  local answers = vim.lsp.buf_request_sync(buffer, method, params, 10000) or {}
  for _, answer in pairs(answers) do
    if answer.result then return answer.result end
  end
end
local function document()
  return { uri = vim.uri_from_bufnr(buffer) }
end
local function position_of(text, by)
  for line, content in ipairs(vim.api.nvim_buf_get_lines(buffer, 0, -1, false)) do
    local at = content:find(text, 1, true)
    if at then return { line = line - 1, character = at - 1 + (by or 0) } end
  end
end

check('the server attaches', until_true(function()
  return #vim.lsp.get_active_clients() > 0
end), vim.lsp.get_active_clients())
check('the forgotten unit is a problem on its line', until_true(function()
  local found = vim.diagnostic.get(buffer)
  return #found == 1 and found[1].code == 'missing-unit'
end), vim.diagnostic.get(buffer))

local problem = vim.diagnostic.get(buffer)[1] or { lnum = 0, col = 0 }
local at = { line = problem.lnum, character = problem.col }
local actions = request('textDocument/codeAction', {
  textDocument = document(),
  range = { start = at, ['end'] = at },
  context = { diagnostics = {} },
})
local fix
for _, action in ipairs(actions or {}) do
  if action.title:find('mm', 1, true) then fix = fix or action end
end
check('a fix writes the unit', fix ~= nil, actions)
if fix then vim.lsp.util.apply_workspace_edit(fix.edit, 'utf-16') end
check('then there is no problem any more', until_true(function()
  return #vim.diagnostic.get(buffer) == 0
end), vim.diagnostic.get(buffer))

local hover = request('textDocument/hover', { textDocument = document(), position = position_of('output_reflectivity', 3) })
check('the hover tells the pulse', hover ~= nil and hover.contents.value:find('mJ', 1, true) ~= nil, hover)
local lenses = request('textDocument/codeLens', { textDocument = document() })
check('the lens tells the pulse', lenses ~= nil and #lenses == 1 and lenses[1].command.title:find('mJ', 1, true) ~= nil, lenses)
local items = request('textDocument/completion', { textDocument = document(), position = position_of('profile: flat', 9) })
check('completion gives the profiles', items ~= nil and #(items.items or items) == 2, items)
local symbols = request('textDocument/documentSymbol', { textDocument = document() })
check('symbols are there', symbols ~= nil and #symbols > 5, symbols)

vim.api.nvim_buf_set_lines(buffer, 0, 0, false, { '# typed' })
vim.api.nvim_buf_set_lines(buffer, 2, 2, false, { 'colour: green' })
check('typing is followed', until_true(function()
  local found = vim.diagnostic.get(buffer)
  return #found == 1 and found[1].code == 'unknown-key'
end), vim.diagnostic.get(buffer))

say(passed .. ' passed, ' .. failed .. ' failed')
vim.cmd('qall!')
