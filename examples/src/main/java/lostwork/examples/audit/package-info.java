/** The main job: a waste-heat audit of an invented works. */
package lostwork.examples.audit;
