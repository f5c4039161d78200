/** Small, typed ways to find and make elements; text goes in as text, never as markup. */

/**
 * Finds the element of this id; the page's own markup promises that it is there.
 * @template {Element} T
 * @param {string} id
 * @param {new () => T} type
 * @returns {T}
 */
export function byId(id, type) {
  const found = document.getElementById(id);
  if (!(found instanceof type)) throw new Error(`The page has no ${type.name} called ${id}.`);
  return found;
}

/**
 * Finds a named part (`data-part`) inside a copy of a template.
 * @template {Element} T
 * @param {ParentNode} root
 * @param {string} name
 * @param {new () => T} type
 * @returns {T}
 */
export function part(root, name, type) {
  const found = root.querySelector(`[data-part="${name}"]`);
  if (!(found instanceof type)) throw new Error(`The template has no part called ${name}.`);
  return found;
}

/**
 * Copies a template that holds one element.
 * @param {string} id
 * @returns {HTMLElement}
 */
export function copyTemplate(id) {
  const copy = byId(id, HTMLTemplateElement).content.firstElementChild?.cloneNode(true);
  if (!(copy instanceof HTMLElement)) throw new Error(`The template ${id} is empty.`);
  return copy;
}

/**
 * Makes an element with attributes and children.
 * @template {keyof HTMLElementTagNameMap} K
 * @param {K} tag
 * @param {Record<string, string>} [attributes]
 * @param {...(Node | string)} children
 * @returns {HTMLElementTagNameMap[K]}
 */
export function create(tag, attributes = {}, ...children) {
  const element = document.createElement(tag);
  for (const [name, value] of Object.entries(attributes)) element.setAttribute(name, value);
  element.append(...children);
  return element;
}

/**
 * Makes an SVG element with attributes and children.
 * @template {keyof SVGElementTagNameMap} K
 * @param {K} tag
 * @param {Record<string, string | number>} [attributes]
 * @param {...(Node | string)} children
 * @returns {SVGElementTagNameMap[K]}
 */
export function createSvg(tag, attributes = {}, ...children) {
  const element = document.createElementNS('http://www.w3.org/2000/svg', tag);
  for (const [name, value] of Object.entries(attributes)) element.setAttribute(name, String(value));
  element.append(...children);
  return element;
}

/**
 * The value of the chosen radio button of a group.
 * @param {string} name
 * @returns {string}
 */
export function chosen(name) {
  const radio = document.querySelector(`input[name="${name}"]:checked`);
  return radio instanceof HTMLInputElement ? radio.value : '';
}

/**
 * Chooses one radio button of a group.
 * @param {string} name
 * @param {string} value
 */
export function choose(name, value) {
  for (const radio of document.querySelectorAll(`input[name="${name}"]`)) {
    if (radio instanceof HTMLInputElement) radio.checked = radio.value === value;
  }
}
