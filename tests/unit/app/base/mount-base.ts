import { mount, type ComponentMountingOptions } from '@vue/test-utils'
import axe from 'axe-core'
import type { Component } from 'vue'

/** Base components refer to one another by name, as the framework registers them. */
const found = import.meta.glob<{ default: Component }>('../../../../app/components/base/*.vue', { eager: true })
const components = Object.fromEntries(Object.entries(found).map(([path, module]) => [path.replace(/^.*\/(\w+)\.vue$/, '$1'), module.default]))

export function mountBase(component: Component, options: ComponentMountingOptions<Component> = {}) {
  return mount(component, { attachTo: document.body, ...options, global: { components, stubs: { NuxtLink: { props: ['to'], template: '<a href="#"><slot /></a>' } }, ...options.global } })
}

/** Rules that hold of a part as well as of a page; colours are judged in the browser. */
export async function faultsOf(element: Element): Promise<string[]> {
  const { violations } = await axe.run(element, { rules: { 'color-contrast': { enabled: false }, 'region': { enabled: false } } })
  return violations.map(violation => `${violation.id}: ${violation.nodes[0]?.html}`)
}
