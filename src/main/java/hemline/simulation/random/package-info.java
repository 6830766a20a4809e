/**
 * Random numbers and textures that depend only on a seed and a name, never on the order in which they are asked for.
 *
 * <p>May use: boundary, sweep and their base. Open {@link hemline.simulation.random.Streams} first. Generator:
 * Panneton, L'Ecuyer and Matsumoto (2006), ACM Trans. Math. Softw. 32:1-16 (WELL512a); seeds are spread with the mixing
 * function of Steele, Lea and Flood (2014), OOPSLA, 453-472 (SplitMix64).
 */
package hemline.simulation.random;
