import { Migration } from '@mikro-orm/migrations'
import { tables } from './migrations/001-tables'
import { refusals } from './migrations/002-refusals'
import { actSnapshots } from './migrations/003-act-snapshots'
import { quickCompression } from './migrations/004-quick-compression'

class Tables extends Migration {
  override up() {
    this.addSql(tables)
  }
}

class Refusals extends Migration {
  override up() {
    this.addSql(refusals)
  }
}

class ActSnapshots extends Migration {
  override up() {
    this.addSql(actSnapshots)
  }
}

class QuickCompression extends Migration {
  override up() {
    this.addSql(quickCompression)
  }
}

/** Migrations in order, listed by hand so that they are bundled. A migration that has run is never edited. */
export const migrations = [
  { name: '001-tables', class: Tables },
  { name: '002-refusals', class: Refusals },
  { name: '003-act-snapshots', class: ActSnapshots },
  { name: '004-quick-compression', class: QuickCompression },
]
