package treadwork.io.c3d;

/**
 * Why a described plate cannot be used.
 *
 * @param file      for the message
 * @param plate     counted from 1
 * @param parameter of the group FORCE_PLATFORM that is at fault
 * @param code      of the finding
 * @param figure    what is stated, against what was expected
 */
record PlateFault(String file, int plate, String parameter, String code, String figure) {}
