import { recipe as recipeSchema, type ColumnRecipe, type Recipe } from '#shared/schemas/data'
import type { GuessReply, PreviewReply } from '#shared/schemas/dataReplies'
import { quantityList } from './dataWords'

export interface DraftColumn {
  at: number
  name: string
  samples: readonly string[]
  isTaken: boolean
  /** The file names no unit here, and nobody has said one yet. */
  isUnitOpen: boolean
  title: string
  role: ColumnRecipe['role']
  quantity: string
  unit: string
  /** As typed: codes with commas or blanks between. */
  codes: string
  heightM: string
}

const columnDraft = (column: GuessReply['columns'][number]): DraftColumn => {
  const said = column.suggestion
  return {
    at: column.at, name: column.name, samples: column.samples, isTaken: column.isTaken, isUnitOpen: column.isUnitOpen,
    title: said?.title ?? (column.name || `column ${column.at + 1}`).slice(0, 80), role: said?.role ?? 'value', quantity: said?.quantity ?? 'other', unit: said?.unit ?? '1',
    codes: (said?.missingCodes ?? []).join(' '), heightM: said?.heightM === null || said?.heightM === undefined ? '' : String(said.heightM),
  }
}

export const codesOf = (typed: string): string[] => [...new Set(typed.split(/[\s;]+|,(?=\s|$)/).filter(code => code !== ''))].slice(0, 20)

function columnRecipe(column: DraftColumn): ColumnRecipe {
  const height = Number(column.heightM.replace(',', '.'))
  return {
    name: column.name, at: column.at, role: column.role, title: column.title.trim() || column.name, quantity: column.quantity, unit: column.unit.trim() || '1', decimals: null,
    missingCodes: codesOf(column.codes), heightM: column.heightM.trim() === '' || !Number.isFinite(height) ? null : height,
  }
}

/** What a person says about an uploaded file, and what the first rows become by it: asked again after each change. */
export function useImportDraft(path: Ref<string>, guess: Ref<GuessReply>) {
  const columns = ref<DraftColumn[]>([])
  const draft = ref<Recipe>(guess.value.recipe)
  const preview = ref<PreviewReply | null>(null)
  const previewError = ref<unknown>(null)
  const isAsking = ref(false)

  watch(guess, (fresh) => {
    columns.value = fresh.columns.map(columnDraft)
    draft.value = { ...fresh.recipe }
  }, { immediate: true })

  const recipe = computed<Recipe>(() => ({ ...draft.value, columns: columns.value.filter(column => column.isTaken).map(columnRecipe) }))
  const checked = computed(() => recipeSchema.safeParse(recipe.value))
  const problems = computed(() => checked.value.success ? [] : checked.value.error.issues.map(issue => ({ path: issue.path.join('.'), message: issue.message })))

  function chooseQuantity(column: DraftColumn, key: string): void {
    column.quantity = key
    column.unit = quantityList.find(entry => entry.key === key)?.units[0]?.ucum ?? '1'
    column.isUnitOpen = false
  }

  let asked = 0
  async function ask(): Promise<void> {
    asked += 1
    const mine = asked
    if (!checked.value.success) {
      preview.value = null
      return
    }
    isAsking.value = true
    try {
      const answer = await $fetch<PreviewReply>(`${path.value}/preview`, { method: 'POST', body: { recipe: recipe.value } })
      if (mine !== asked) return
      preview.value = answer
      previewError.value = null
    }
    catch (error) {
      if (mine !== asked) return
      preview.value = null
      previewError.value = error
    }
    finally {
      if (mine === asked) isAsking.value = false
    }
  }
  let timer: ReturnType<typeof setTimeout> | undefined
  watch(recipe, () => {
    clearTimeout(timer)
    timer = setTimeout(() => void ask(), 300)
  }, { deep: true })
  onMounted(() => void ask())
  onBeforeUnmount(() => clearTimeout(timer))

  return { columns, draft, recipe, problems, preview, previewError, isAsking, chooseQuantity }
}
