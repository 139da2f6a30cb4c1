import { validationReport } from '#server/validation/validation-run'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'signed-in' }, async () => validationReport())
