/**
 * The workplace where the aeroplane's shape is changed and the roll is seen to follow. Views build
 * nodes and bind; {@code BuildModel} holds state and commands and knows no node.
 */
package org.rolltrace.ui.build;
