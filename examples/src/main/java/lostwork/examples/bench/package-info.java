/**
 * Speed, as ratios: each benchmark holds a part of the library against the same work written by hand.
 *
 * <pre>
 * mvn -q -P bench -pl examples -am package
 * java -jar examples/target/bench/benchmarks.jar            all of them
 * java -jar examples/target/bench/benchmarks.jar Water      those whose name contains "Water"
 * </pre>
 *
 * <p>The options are those of JMH ({@code -h} lists them); at the end {@link
 * lostwork.examples.bench.BenchmarkReport} prints the ratios beside what they are held to. Benchmarks run in rounds, every
 * one once a round in a process of its own, so that a busy machine disturbs a method and its baseline alike; a ratio is
 * the median over the rounds.
 *
 * <p>Methods of one class do the same work and return the same number, which a test checks, unless their comment says
 * otherwise.
 */
@NullMarked
package lostwork.examples.bench;

import org.jspecify.annotations.NullMarked;
