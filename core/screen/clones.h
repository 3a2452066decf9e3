// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

// PW_CLONES before a function of a kernel: GCC compiles it for each level of processors and the program takes
// the best at its start. Whole levels are named, since single features leave the compiler's cost model at the
// baseline. Other compilers and the sanitizers, which do not bear functions chosen at the start, have one.
#if defined(__GNUC__) && !defined(__clang__) && defined(__x86_64__) && !defined(__SANITIZE_ADDRESS__) &&     \
    !defined(__SANITIZE_THREAD__) && !defined(PW_ONE_LEVEL)
#define PW_CLONES __attribute__((target_clones("default", "arch=x86-64-v3", "arch=x86-64-v4")))
#else
#define PW_CLONES
#endif
