/**
 * Two judges of a tour that share no code with the library: a bound that no tour can be shorter than, and a long run
 * of another method.
 */

/**
 * Held and Karp's 1-tree bound (1970): a minimum spanning tree of all places but one, with that one's two cheapest
 * edges, under place prices moved by subgradient steps. No tour is shorter.
 */
export function oneTreeBound(size, distance, upper, rounds = 1500) {
  const price = new Float64Array(size);
  const tree = { degree: new Int32Array(size), length: 0 };
  let best = -Infinity;
  let step = 1;
  for (let round = 0; round < rounds; round++) {
    growOneTree(size, distance, price, tree);
    const bound = tree.length - 2 * price.reduce((sum, value) => sum + value, 0);
    if (bound > best) best = bound;
    else step *= 0.995;
    let off = 0;
    for (let place = 0; place < size; place++) off += (tree.degree[place] - 2) ** 2;
    if (off === 0) break;
    const move = (step * (upper - bound)) / off;
    for (let place = 0; place < size; place++) price[place] += move * (tree.degree[place] - 2);
  }
  return best;
}

function growOneTree(size, distance, price, tree) {
  const priced = (a, b) => distance(a, b) + price[a] + price[b];
  const near = new Float64Array(size).fill(Infinity);
  const parent = new Int32Array(size).fill(-1);
  const inTree = new Uint8Array(size);
  tree.degree.fill(0);
  tree.length = 0;
  near[1] = 0;
  for (let grown = 1; grown < size; grown++) {
    let next = -1;
    for (let place = 1; place < size; place++)
      if (!inTree[place] && (next < 0 || near[place] < near[next])) next = place;
    inTree[next] = 1;
    if (parent[next] >= 0) {
      tree.length += near[next];
      tree.degree[next]++;
      tree.degree[parent[next]]++;
    }
    for (let place = 1; place < size; place++)
      if (!inTree[place] && priced(next, place) < near[place]) {
        near[place] = priced(next, place);
        parent[place] = next;
      }
  }
  const fromFirst = Array.from({ length: size - 1 }, (_, at) => at + 1).sort(
    (a, b) => priced(0, a) - priced(0, b),
  );
  for (const place of fromFirst.slice(0, 2)) {
    tree.length += priced(0, place);
    tree.degree[0]++;
    tree.degree[place]++;
  }
}

/** Simulated annealing with stretches turned around at random: a long run, its shortest tour's length. */
export function annealedLength(size, distance, random, steps = 20_000_000) {
  const order = Int32Array.from({ length: size }, (_, place) => place);
  const at = (position) => order[(position + size) % size];
  let length = 0;
  for (let position = 0; position < size; position++) length += distance(at(position), at(position + 1));
  let shortest = length;
  const hot = length / size;
  for (let step = 0; step < steps; step++) {
    const heat = hot * 1e-4 ** (step / steps);
    let low = Math.floor(random() * size);
    let high = Math.floor(random() * size);
    if (low > high) [low, high] = [high, low];
    if (high - low < 1 || high - low > size - 2) continue;
    const [before, first, last, after] = [at(low - 1), at(low), at(high), at(high + 1)];
    const change =
      distance(before, last) + distance(first, after) - distance(before, first) - distance(last, after);
    if (change > 0 && random() >= Math.exp(-change / heat)) continue;
    for (let a = low, b = high; a < b; a++, b--) [order[a], order[b]] = [order[b], order[a]];
    length += change;
    if (length < shortest) shortest = length;
  }
  return shortest;
}
